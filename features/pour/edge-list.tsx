import type { LayoutIndex, PourResult } from '@wedgeline/engine'
import { router } from 'expo-router'
import { useMemo } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { follow } from '@/components/ui/follow'
import { StatusMark } from '@/components/ui/status-mark'
import { Table, type Column } from '@/components/ui/table'
import { Text } from '@/components/ui/text'
import { statusesIn } from '../checks/counts'
import { edgeRows, type EdgeRow } from './edge-rows'

export interface EdgeListProps {
  readonly jobId: string
  readonly pourId: string
  readonly index: LayoutIndex
  readonly result: PourResult | null
  readonly onLengths: (edgeId: string) => void
  /** Stands in a narrow column: one edge below the other rather than a table. */
  readonly isColumn: boolean
}

/** The edges of a pour in words: where, how long, how many anchors, and what is worst. */
export function EdgeList({ jobId, pourId, index, result, onLengths, isColumn }: EdgeListProps) {
  const rows = useMemo(() => edgeRows(index, pourId, result), [index, pourId, result])
  if (isColumn) {
    return (
      <View>
        {rows.map((row) => (
          <EdgeCard key={row.id} jobId={jobId} row={row} onLengths={() => onLengths(row.id)} />
        ))}
      </View>
    )
  }
  const columns: Column<EdgeRow>[] = [
    { key: 'mark', head: 'Edge', isRowHead: true, cell: ({ mark }) => mark },
    { key: 'where', head: 'From, to', cell: ({ where }) => where || '–' },
    { key: 'kinds', head: 'Kind', cell: ({ kinds }) => kinds },
    { key: 'length', head: 'Length, mm', align: 'end', cell: ({ lengthMm }) => Math.round(lengthMm) },
    { key: 'live', head: 'Live', align: 'end', cell: ({ live }) => live },
    { key: 'dead', head: 'Dead', align: 'end', cell: ({ dead }) => dead },
    { key: 'counts', head: 'Checks', cell: (row) => <Counts row={row} /> },
    { key: 'worst', head: 'Worst', cell: (row) => <WorstOf row={row} /> },
    {
      key: 'lengths',
      head: 'Along the edge',
      align: 'end',
      cell: (row) => (
        <View onClick={(event) => event.stopPropagation()}>
          <Button kind="quiet" label={`Lengths of ${row.mark}`} onPress={() => onLengths(row.id)} />
        </View>
      ),
    },
  ]
  return (
    <Table
      caption="Edges of the pour"
      columns={columns}
      rows={rows}
      rowKey={({ id }) => id}
      onSelect={({ id }) => router.push(`/jobs/${jobId}/edges/${id}`)}
    />
  )
}

function EdgeCard({ jobId, row, onLengths }: { jobId: string; row: EdgeRow; onLengths: () => void }) {
  const href = `/jobs/${jobId}/edges/${row.id}` as const
  return (
    <View style={styles.card}>
      <Pressable role="link" href={href} onPress={(event) => follow(event, href)} style={styles.open}>
        <Text kind="strong">{`Edge ${row.mark}`}</Text>
        <Text kind="small" tone="soft">
          {[row.where, `${Math.round(row.lengthMm)} mm`, row.kinds].filter(Boolean).join(' · ')}
        </Text>
        <Text kind="small" tone="soft">{`${row.live} live, ${row.dead} dead ends`}</Text>
        <Counts row={row} />
        {row.worst ? <WorstOf row={row} /> : null}
      </Pressable>
      <Button kind="quiet" label="Lengths" onPress={onLengths} />
    </View>
  )
}

function Counts({ row: { counts } }: { readonly row: EdgeRow }) {
  if (!counts) return <Text tone="soft">…</Text>
  const shown = statusesIn(counts)
  if (shown.length === 0) return <Text tone="soft">no check yet</Text>
  return (
    <View style={styles.counts}>
      {shown.map((status) => (
        <StatusMark key={status} status={status} words={String(counts[status])} size={14} kind="figure" />
      ))}
    </View>
  )
}

function WorstOf({ row: { worst } }: { readonly row: EdgeRow }) {
  if (!worst) return <Text tone="soft">–</Text>
  return <StatusMark status={worst.status} words={`${worst.zoneName}: ${worst.words}`} size={14} kind="figure" />
}

const styles = StyleSheet.create({
  card: { flexDirection: 'row', alignItems: 'center', borderBottomWidth: 1, borderColor: colour.rule },
  open: { flex: 1, minWidth: 0, paddingVertical: space.s, gap: 2 },
  counts: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.m },
})
