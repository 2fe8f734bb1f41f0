import type { Schedule, ScheduleRow } from '@wedgeline/engine'
import { STEEL_NAMES } from '@wedgeline/engine/result'
import { useMemo } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Table, type Column } from '@/components/ui/table'
import { massOf, massText, metresText } from './schedule-words'
import { ShapeFigure } from './shape-figure'

const DIMENSIONS = ['A', 'B', 'C', 'D'] as const

const columns: readonly Column<ScheduleRow>[] = [
  { key: 'mark', head: 'Mark', isRowHead: true, cell: ({ mark }) => mark },
  { key: 'size', head: 'Type and size', cell: ({ typeAndSize }) => typeAndSize },
  { key: 'members', head: 'Members', align: 'end', cell: ({ members }) => members },
  { key: 'each', head: 'In each', align: 'end', cell: ({ inEach }) => inEach },
  { key: 'total', head: 'Total', align: 'end', cell: ({ total }) => total },
  { key: 'length', head: 'Length, mm', align: 'end', cell: ({ length }) => length ?? 'see problems' },
  { key: 'code', head: 'Code', align: 'end', cell: ({ code }) => code },
  { key: 'shape', head: 'Shape', cell: ({ code }) => <ShapeFigure code={code} size={0.8} /> },
  ...DIMENSIONS.map((name): Column<ScheduleRow> => ({
    key: name,
    head: name,
    align: 'end',
    cell: ({ dimensions }) => dimensions[name] ?? '',
  })),
  { key: 'E', head: 'E/R', align: 'end', cell: ({ dimensions }) => dimensions.E ?? dimensions.R ?? '' },
  { key: 'mass', head: 'Mass, kg', align: 'end', cell: (row) => massText(massOf(row)) },
]

/** The bar marks of each edge and pan in a table of its own, in the columns in which a yard reads them. */
export function ScheduleTables({ schedule }: { readonly schedule: Schedule }) {
  const groups = useMemo(() => groupsOf(schedule.rows), [schedule.rows])
  return groups.map(({ name, rows }) => {
    const bars = rows.reduce((sum, { total }) => sum + total, 0)
    const mass = rows.reduce((sum, row) => sum + (massOf(row) ?? 0), 0)
    return (
      <View key={name} style={styles.group}>
        <Table
          caption={`${name}: ${bars} ${bars === 1 ? 'bar' : 'bars'}; lengths and dimensions in mm`}
          showCaption
          columns={columns}
          rows={rows}
          rowKey={({ mark, inEach }) => `${mark} ${inEach}`}
          foot={{ mark: 'Total', total: bars, mass: massText(mass) }}
        />
      </View>
    )
  })
}

interface MemberRows {
  readonly name: string
  readonly rows: readonly ScheduleRow[]
}

/** Rows come by member; cancelled marks stand last. */
function groupsOf(rows: readonly ScheduleRow[]): readonly MemberRows[] {
  const groups = new Map<string, ScheduleRow[]>()
  for (const row of rows) {
    const name = row.member?.name ?? 'Cancelled marks'
    groups.set(name, [...(groups.get(name) ?? []), row])
  }
  return [...groups].map(([name, own]) => ({ name, rows: own }))
}

/** By kind of bar. */
export function KindsTable({ schedule }: { readonly schedule: Schedule }) {
  return (
    <Table
      caption="Totals by kind of bar"
      columns={[
        { key: 'kind', head: 'Kind', isRowHead: true, cell: ({ kind }) => STEEL_NAMES[kind] },
        { key: 'bars', head: 'Bars', align: 'end', cell: ({ bars }) => bars },
        { key: 'metres', head: 'Length, m', align: 'end', cell: ({ metres }) => metresText(metres) },
        { key: 'mass', head: 'Mass, kg', align: 'end', cell: ({ mass }) => massText(mass) },
      ]}
      rows={schedule.kinds}
      rowKey={({ kind }) => kind}
    />
  )
}

/** By delivery, with the edges and pans that are in it. */
export function DeliveriesTable({ schedule }: { readonly schedule: Schedule }) {
  return (
    <Table
      caption="Totals by delivery"
      columns={[
        { key: 'name', head: 'Delivery', isRowHead: true, cell: ({ name }) => name },
        { key: 'day', head: 'Needed on', cell: ({ neededOn }) => neededOn ?? 'no day agreed' },
        { key: 'members', head: 'Members', wraps: true, cell: ({ members }) => members.join(', ') || 'no bars' },
        { key: 'bars', head: 'Bars', align: 'end', cell: ({ bars }) => bars },
        { key: 'mass', head: 'Mass, kg', align: 'end', cell: ({ mass }) => massText(mass) },
      ]}
      rows={schedule.deliveries}
      rowKey={({ id }) => id ?? 'none'}
      foot={{ name: 'All', mass: massText(schedule.mass) }}
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

const styles = StyleSheet.create({ group: { paddingBottom: space.l } })
