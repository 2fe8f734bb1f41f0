import type { EdgeData, LayoutFile } from '@wedgeline/contract'
import { StatusMark } from '@/components/ui/status-mark'
import { Table } from '@/components/ui/table'
import type { Change } from '../../editing/draft'
import type { AnchorRow } from './anchor-rows'
import { EDITABLE_COLUMNS } from './columns'

export interface AnchorTableProps {
  readonly layout: LayoutFile
  readonly edge: EdgeData
  readonly rows: readonly AnchorRow[]
  readonly selected: string | null
  readonly canEdit: boolean
  readonly onSelect: (zoneId: string) => void
  readonly onEdit: (change: Change) => void
  /** Anchors typed or pasted below the last row. */
  readonly onInsert: (text: string) => string | null
  readonly onRemove: (anchorIds: readonly string[]) => void
}

/** The anchors of an edge to read and pick; on a phone an anchor is changed on its sheet. */
export function AnchorTable({ rows, edge, selected, onSelect }: AnchorTableProps) {
  return (
    <Table
      caption={`Anchors of edge ${edge.mark}`}
      rows={rows}
      rowKey={({ anchor }) => `anchor:${anchor.id}`}
      selectedKey={selected}
      onSelect={({ anchor }) => onSelect(`anchor:${anchor.id}`)}
      columns={[
        { key: 'mark', head: 'Anchor', isRowHead: true, cell: ({ mark }) => mark },
        ...EDITABLE_COLUMNS.map(({ key, head, align, text }) => ({
          key,
          head,
          align,
          cell: (row: AnchorRow) => text(row) ?? '–',
        })),
        { key: 'steel', head: 'Steel', cell: ({ steel }) => steel || 'none' },
        {
          key: 'worst',
          head: 'Worst check',
          cell: ({ worst }) => (worst ? <StatusMark status={worst.status} words={worst.words} kind="figure" /> : '–'),
        },
      ]}
    />
  )
}
