import type { LayoutFile } from '@wedgeline/contract'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { NumberField } from '@/components/ui/number-field'
import { Section } from '@/components/ui/screen'
import { Empty } from '@/components/ui/states'
import { Table } from '@/components/ui/table'
import { TextField } from '@/components/ui/text-field'
import { useToast } from '@/components/ui/toast'
import { useJobDraft } from '../editing/job-draft'

type GridLine = LayoutFile['gridLines'][number]

/** The building's named lines, which every place is called after. */
export function GridSection() {
  const { layout, canEdit } = useJobDraft()
  const [open, setOpen] = useState<GridLine | 'new' | null>(null)
  const lines = [...layout.gridLines].sort((a, b) => a.name.localeCompare(b.name, 'en', { numeric: true }))
  const add = <Button label="Add a grid line" onPress={() => setOpen('new')} />
  return (
    <Section title="Grid" actions={canEdit && lines.length > 0 ? add : null}>
      {lines.length === 0 ? (
        <Empty
          what="There is no grid line yet."
          firstStep="Name the lines of the building; anchors and bars are then found by grid and offset."
          action={canEdit ? add : null}
        />
      ) : (
        <View style={styles.table}>
          <Table
            caption="Grid lines"
            columns={[
              { key: 'name', head: 'Line', isRowHead: true, cell: ({ name }) => name },
              { key: 'direction', head: 'Runs', cell: ({ azimuthDeg }) => directionText(azimuthDeg) },
              { key: 'east', head: 'Through, east mm', align: 'end', cell: ({ xMm }) => xMm },
              { key: 'north', head: 'Through, north mm', align: 'end', cell: ({ yMm }) => yMm },
            ]}
            rows={lines}
            rowKey={({ id }) => id}
            {...(canEdit ? { onSelect: setOpen } : {})}
            maxHeight={320}
          />
        </View>
      )}
      {open ? <GridLineDialog line={open === 'new' ? null : open} onClose={() => setOpen(null)} /> : null}
    </Section>
  )
}

/** north, east, or degrees clockwise from north. */
function directionText(azimuthDeg: number): string {
  const turned = ((azimuthDeg % 360) + 360) % 360
  const words = ['north', 'east', 'south', 'west']
  return words[turned / 90] ?? `${turned}° from north`
}

function GridLineDialog({ line, onClose }: { line: GridLine | null; onClose: () => void }) {
  const { layout, edit, undo } = useJobDraft()
  const say = useToast()
  const [name, setName] = useState(line?.name ?? '')
  const [at, setAt] = useState<{ xMm: number | null; yMm: number | null; azimuthDeg: number | null }>(line ?? START)
  const [isTried, setTried] = useState(false)
  const nameError = nameProblem(name, layout.gridLines, line)
  const save = () => {
    setTried(true)
    const { xMm, yMm, azimuthDeg } = at
    if (nameError || xMm === null || yMm === null || azimuthDeg === null) return
    const row = { name: name.trim(), xMm, yMm, azimuthDeg }
    edit({
      label: line ? `Change grid line ${row.name}` : `Add grid line ${row.name}`,
      commands: line
        ? [{ type: 'set', table: 'gridLines', id: line.id, changes: row }]
        : [{ type: 'insert', table: 'gridLines', row: { id: newId(), ...row } }],
    })
    onClose()
  }
  const remove = (gone: GridLine) => {
    edit({ label: `Remove grid line ${gone.name}`, commands: [{ type: 'remove', table: 'gridLines', id: gone.id }] })
    say({ words: `Grid line ${gone.name} removed.`, action: { label: 'Undo', onPress: undo } })
    onClose()
  }
  return (
    <Dialog
      title={line ? `Grid line ${line.name}` : 'New grid line'}
      isOpen
      onClose={onClose}
      actions={
        <>
          {line ? <Button kind="quiet" label="Remove" onPress={() => remove(line)} /> : null}
          <Button label="Cancel" onPress={onClose} />
          <Button kind="main" label={line ? 'Keep' : 'Add'} onPress={save} />
        </>
      }
    >
      <View style={styles.fields}>
        <TextField
          label="Name"
          hint="A, B or 1, 2, as on the drawings."
          value={name}
          onChangeText={setName}
          onEnter={save}
          error={isTried ? nameError : undefined}
          maxLength={12}
          autoFocus
          required
        />
        <NumberField
          label="Runs through, east"
          unit="mm"
          hint="Any one point of the line, counted from the job’s zero."
          value={at.xMm}
          onCommit={(xMm) => setAt({ ...at, xMm })}
          error={missing(isTried, at.xMm)}
          required
        />
        <NumberField
          label="Runs through, north"
          unit="mm"
          value={at.yMm}
          onCommit={(yMm) => setAt({ ...at, yMm })}
          error={missing(isTried, at.yMm)}
          required
        />
        <NumberField
          label="Direction"
          unit="°"
          hint="Clockwise from north: 0 runs north, 90 runs east."
          value={at.azimuthDeg}
          onCommit={(azimuthDeg) => setAt({ ...at, azimuthDeg })}
          error={missing(isTried, at.azimuthDeg)}
          required
        />
      </View>
    </Dialog>
  )
}

const START = { xMm: 0, yMm: 0, azimuthDeg: 0 }
const missing = (isTried: boolean, value: number | null) => (isTried && value === null ? 'Type a number.' : undefined)

function nameProblem(name: string, lines: readonly GridLine[], own: GridLine | null): string | undefined {
  const wanted = name.trim()
  if (wanted === '') return 'Type the name of the line.'
  const isTaken = lines.some((line) => line.name === wanted && line.id !== own?.id)
  return isTaken ? `There is a grid line ${wanted} already. Give this one another name.` : undefined
}

const styles = StyleSheet.create({ fields: { gap: space.m }, table: { maxWidth: 720 } })
