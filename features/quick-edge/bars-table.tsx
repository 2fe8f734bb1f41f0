import type { Schedule, ScheduleRow } from '@wedgeline/engine'
import { Table } from '@/components/ui/table'
import { massOf, massText } from '../schedule/schedule-words'

/** Bars of one mark in all places together. */
export interface MarkLine {
  readonly mark: string
  readonly typeAndSize: string
  readonly code: string
  readonly total: number
  readonly lengthMm: number | null
  readonly massKg: number | null
  /** Dimensions as they are bent, for shapes that are no straight bar: A 130, B 300. */
  readonly dimensions: string
}

/** A schedule has a line for each member; here a mark is one line. */
export function markLines({ rows }: Pick<Schedule, 'rows'>): readonly MarkLine[] {
  const lines = new Map<string, MarkLine>()
  for (const row of rows) {
    if (row.member === null) continue
    const known = lines.get(row.mark)
    const massKg = massOf(row)
    lines.set(row.mark, {
      mark: row.mark,
      typeAndSize: row.typeAndSize,
      code: row.code,
      total: (known?.total ?? 0) + row.total,
      lengthMm: row.length,
      massKg: massKg === null || known?.massKg === null ? null : (known?.massKg ?? 0) + massKg,
      dimensions: dimensionsOf(row),
    })
  }
  return [...lines.values()]
}

function dimensionsOf({ code, dimensions }: ScheduleRow): string {
  if (code === '00') return 'straight'
  return Object.entries(dimensions)
    .filter(([, value]) => typeof value === 'number')
    .map(([name, value]) => `${name.toUpperCase()} ${String(value)}`)
    .join(', ')
}

/** Bars by mark with their counts and kilograms. */
export function BarsTable({ schedule }: { readonly schedule: Schedule }) {
  return (
    <Table
      caption="Bars by mark"
      rows={markLines(schedule)}
      rowKey={({ mark }) => mark}
      columns={[
        { key: 'mark', head: 'Mark', isRowHead: true, cell: ({ mark }) => mark, width: 60 },
        { key: 'size', head: 'Type and size', cell: ({ typeAndSize }) => typeAndSize, width: 100 },
        { key: 'total', head: 'Bars', align: 'end', cell: ({ total }) => total, width: 60 },
        { key: 'length', head: 'Length, mm', align: 'end', cell: ({ lengthMm }) => lengthMm ?? '–', width: 90 },
        { key: 'code', head: 'Shape', align: 'end', cell: ({ code }) => code, width: 60 },
        { key: 'dimensions', head: 'Dimensions, mm', cell: ({ dimensions }) => dimensions, width: 200 },
        { key: 'mass', head: 'kg', align: 'end', cell: ({ massKg }) => massText(massKg), width: 70 },
      ]}
      foot={{ mark: 'All', mass: massText(schedule.mass) }}
    />
  )
}
