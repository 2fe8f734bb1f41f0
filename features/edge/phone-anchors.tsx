import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { StatusMark } from '@/components/ui/status-mark'
import { Table } from '@/components/ui/table'
import { TextField } from '@/components/ui/text-field'
import { colour, space } from '@/components/theme'
import { useJobDraft } from '../editing/job-draft'
import type { AnchorRow } from './table/anchor-rows'

export interface PhoneAnchorsProps {
  readonly rows: readonly AnchorRow[]
  readonly zone: string | null
  readonly canEdit: boolean
  readonly onSelect: (zoneId: string) => void
  /** Answers why the text cannot be read; null when it went on the edge. */
  readonly onInsert: (text: string) => string | null
}

/** The anchors under the strip on a phone, which shows their heights; one press opens an anchor's sheet, where it is changed. */
export function PhoneAnchors({ rows, zone, canEdit, onSelect, onInsert }: PhoneAnchorsProps) {
  return (
    <View style={styles.all}>
      <Table
        caption="Anchors of this edge"
        rows={rows}
        rowKey={({ anchor }) => `anchor:${anchor.id}`}
        selectedKey={zone}
        onSelect={({ anchor }) => onSelect(`anchor:${anchor.id}`)}
        columns={[
          { key: 'mark', head: 'Anchor', isRowHead: true, cell: ({ mark, anchor }) => `${mark} ${anchor.end}` },
          { key: 'chainage', head: 'Chainage, mm', align: 'end', cell: ({ anchor }) => anchor.chainageMm },
          {
            key: 'worst',
            head: 'Worst check',
            cell: ({ worstShort }) =>
              worstShort ? <StatusMark status={worstShort.status} words={worstShort.words} kind="figure" /> : '–',
          },
        ]}
      />
      {canEdit ? <NextAnchor onInsert={onInsert} /> : null}
    </View>
  )
}

/** One line that takes the next anchor: 900, or 900 110 4. */
function NextAnchor({ onInsert }: Pick<PhoneAnchorsProps, 'onInsert'>) {
  const [text, setText] = useState('')
  const [problem, setProblem] = useState<string | null>(null)
  const add = () => {
    const refused = onInsert(text)
    setProblem(refused)
    if (refused === null) setText('')
  }
  return (
    <View style={styles.next}>
      <View style={styles.grow}>
        <TextField
          label="Next anchor: distance, height, strands"
          hint="Only the distance is needed; the rest is taken from the anchor before it."
          value={text}
          onChangeText={setText}
          onEnter={add}
          inputMode="text"
          {...(problem ? { error: problem } : {})}
        />
      </View>
      <Button label="Add" icon={<Icon name="plus" />} disabled={text.trim() === ''} onPress={add} />
    </View>
  )
}

/** In thumb's reach under a sheet: the anchors before and after. */
export function SheetBar({ rows, zone, onSelect }: Pick<PhoneAnchorsProps, 'rows' | 'zone' | 'onSelect'>) {
  const { undo, canUndo, canEdit } = useJobDraft()
  const at = rows.findIndex(({ anchor }) => `anchor:${anchor.id}` === zone)
  const [before, after] = at < 0 ? [undefined, undefined] : [rows[at - 1], rows[at + 1]]
  const go = (row: AnchorRow | undefined) => row && onSelect(`anchor:${row.anchor.id}`)
  return (
    <>
      <View style={styles.grow}>
        <Button
          kind="quiet"
          large
          label={before?.mark ?? 'First'}
          icon={<Icon name="back" />}
          disabled={!before}
          onPress={() => go(before)}
        />
      </View>
      {canEdit ? (
        <Button kind="quiet" large label="Undo" icon={<Icon name="undo" />} disabled={!canUndo} onPress={undo} />
      ) : null}
      <View style={styles.grow}>
        <Button
          kind="quiet"
          large
          label={after?.mark ?? 'Last'}
          icon={<Icon name="forward" />}
          disabled={!after}
          onPress={() => go(after)}
        />
      </View>
    </>
  )
}

const styles = StyleSheet.create({
  all: { backgroundColor: colour.paper, padding: space.s, gap: space.m },
  next: { flexDirection: 'row', alignItems: 'flex-end', gap: space.s },
  grow: { flex: 1, minWidth: 0 },
})
