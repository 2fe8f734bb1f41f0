import type { LayoutFile } from '@wedgeline/contract'
import { useState } from 'react'
import { View } from 'react-native'
import { v7 as newId } from 'uuid'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Section } from '@/components/ui/screen'
import { Table } from '@/components/ui/table'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { useToast } from '@/components/ui/toast'
import { useJobDraft } from '../editing/job-draft'

type Level = LayoutFile['levels'][number]

/** The levels of the building; pours and walls stand on them. */
export function LevelSection() {
  const { layout, canEdit } = useJobDraft()
  const [open, setOpen] = useState<Level | 'new' | null>(null)
  const add = <Button label="Add a level" onPress={() => setOpen('new')} />
  return (
    <Section title="Levels" actions={canEdit ? add : null}>
      {layout.levels.length === 0 ? (
        <Text tone="soft">There is no level yet; the first pour brings its own.</Text>
      ) : (
        <View style={{ maxWidth: 720 }}>
          <Table
            caption="Levels"
            columns={[
              { key: 'mark', head: 'Level', isRowHead: true, cell: ({ mark }) => mark },
              { key: 'title', head: 'Title', wraps: true, cell: ({ title }) => title || '–' },
              { key: 'pours', head: 'Pours', cell: ({ id }) => poursOn(layout, id).join(', ') || 'none' },
            ]}
            rows={layout.levels}
            rowKey={({ id }) => id}
            {...(canEdit ? { onSelect: setOpen } : {})}
          />
        </View>
      )}
      {open ? <LevelDialog level={open === 'new' ? null : open} onClose={() => setOpen(null)} /> : null}
    </Section>
  )
}

const poursOn = ({ pours }: LayoutFile, id: string): string[] =>
  pours.filter(({ levelId }) => levelId === id).map(({ mark }) => mark)

function LevelDialog({ level, onClose }: { level: Level | null; onClose: () => void }) {
  const { layout, edit, undo } = useJobDraft()
  const say = useToast()
  const [mark, setMark] = useState(level?.mark ?? '')
  const [title, setTitle] = useState(level?.title ?? '')
  const [isTried, setTried] = useState(false)
  const problem = markProblem(mark, layout.levels, level)
  const heldBy = level ? whatStandsOn(layout, level.id) : []
  const save = () => {
    setTried(true)
    if (problem) return
    const row = { mark: mark.trim(), title: title.trim() }
    edit({
      label: level ? `Change level ${row.mark}` : `Add level ${row.mark}`,
      commands: level
        ? [{ type: 'set', table: 'levels', id: level.id, changes: row }]
        : [{ type: 'insert', table: 'levels', row: { id: newId(), ...row } }],
    })
    onClose()
  }
  const remove = (gone: Level) => {
    edit({ label: `Remove level ${gone.mark}`, commands: [{ type: 'remove', table: 'levels', id: gone.id }] })
    say({ words: `Level ${gone.mark} removed.`, action: { label: 'Undo', onPress: undo } })
    onClose()
  }
  return (
    <Dialog
      title={level ? `Level ${level.mark}` : 'New level'}
      isOpen
      onClose={onClose}
      actions={
        <>
          {level && heldBy.length === 0 ? <Button kind="quiet" label="Remove" onPress={() => remove(level)} /> : null}
          <Button label="Cancel" onPress={onClose} />
          <Button kind="main" label={level ? 'Keep' : 'Add'} onPress={save} />
        </>
      }
    >
      <TextField
        label="Mark"
        hint="L1, for instance."
        value={mark}
        onChangeText={setMark}
        onEnter={save}
        error={isTried ? problem : undefined}
        maxLength={12}
        autoFocus
        required
      />
      <TextField label="Title" value={title} onChangeText={setTitle} onEnter={save} maxLength={120} />
      {heldBy.length > 0 ? (
        <Text kind="small" tone="soft">{`It cannot be removed while it holds ${heldBy.join(', ')}.`}</Text>
      ) : null}
    </Dialog>
  )
}

function markProblem(mark: string, levels: readonly Level[], own: Level | null): string | undefined {
  const wanted = mark.trim()
  if (wanted === '') return 'Type the mark of the level.'
  const isTaken = levels.some((level) => level.mark === wanted && level.id !== own?.id)
  return isTaken ? `There is a level ${wanted} already. Give this one another mark.` : undefined
}

/** A level goes once nothing stands on it; the last one stays. */
function whatStandsOn(layout: LayoutFile, id: string): string[] {
  const on = (rows: readonly { readonly levelId: string }[]) => rows.filter(({ levelId }) => levelId === id).length
  const counted = [
    [on(layout.pours), 'pour', 'pours'],
    [on(layout.edgeLines), 'edge line', 'edge lines'],
    [on(layout.obstructions), 'column, wall or opening', 'columns, walls or openings'],
  ] as const
  const held = counted.flatMap(([count, one, many]) => (count > 0 ? [`${count} ${count === 1 ? one : many}`] : []))
  return layout.levels.length === 1 ? [...held, 'the only place of the job'] : held
}
