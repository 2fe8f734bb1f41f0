import type { Schedule, ScheduleRow } from '@wedgeline/engine'
import { useMemo } from 'react'
import { Table, type Column } from '@/components/ui/table'
import { massOf, massText, metresText } from './schedule-words'

const DIMENSIONS = ['A', 'B', 'C', 'D'] as const

const columns: readonly Column<ScheduleRow>[] = [
  { key: 'member', head: 'Member', cell: ({ member }) => member?.name ?? 'cancelled' },
  { key: 'mark', head: 'Mark', isRowHead: true, cell: ({ mark }) => mark },
  { key: 'size', head: 'Type and size', cell: ({ typeAndSize }) => typeAndSize },
  { key: 'members', head: 'Members', align: 'end', cell: ({ members }) => members },
  { key: 'each', head: 'In each', align: 'end', cell: ({ inEach }) => inEach },
  { key: 'total', head: 'Total', align: 'end', cell: ({ total }) => total },
  { key: 'length', head: 'Length, mm', align: 'end', cell: ({ length }) => length ?? 'see problems' },
  { key: 'code', head: 'Shape', align: 'end', cell: ({ code }) => code },
  ...DIMENSIONS.map((name): Column<ScheduleRow> => ({
    key: name,
    head: name,
    align: 'end',
    cell: ({ dimensions }) => dimensions[name] ?? '',
  })),
  { key: 'E', head: 'E/R', align: 'end', cell: ({ dimensions }) => dimensions.E ?? dimensions.R ?? '' },
  { key: 'mass', head: 'Mass, kg', align: 'end', cell: (row) => massText(massOf(row)) },
]

/** Every bar mark in a line: the columns in which a yard reads them. */
export function ScheduleTable({ schedule }: { readonly schedule: Schedule }) {
  const rows = useMemo(() => schedule.rows.map((row, at) => ({ ...row, at })), [schedule.rows])
  return (
    <Table
      caption="Bar marks; lengths and dimensions in mm"
      columns={columns}
      rows={rows}
      rowKey={({ at }) => String(at)}
      foot={{ member: 'Total', mass: massText(schedule.mass) }}
      maxHeight={640}
    />
  )
}

/** Totals by type and size. */
export function TotalsTable({ schedule }: { readonly schedule: Schedule }) {
  return (
    <Table
      caption="Totals by type and size"
      columns={[
        { key: 'size', head: 'Type and size', isRowHead: true, cell: ({ typeAndSize }) => typeAndSize },
        { key: 'bars', head: 'Bars', align: 'end', cell: ({ bars }) => bars },
        { key: 'metres', head: 'Length, m', align: 'end', cell: ({ metres }) => metresText(metres) },
        { key: 'per', head: 'kg a metre', align: 'end', cell: ({ massPerMetre }) => massPerMetre.toFixed(3) },
        { key: 'mass', head: 'Mass, kg', align: 'end', cell: ({ mass }) => massText(mass) },
      ]}
      rows={schedule.totals}
      rowKey={({ typeAndSize }) => typeAndSize}
      foot={{ size: 'All', metres: metresText(schedule.metres), mass: massText(schedule.mass) }}
    />
  )
}
