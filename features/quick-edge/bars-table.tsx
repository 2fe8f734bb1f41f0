import type { Schedule } from '@wedgeline/engine'
import { Table } from '@/components/ui/table'
import { massText } from '../schedule/schedule-words'
import { markLines } from './mark-lines'

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
        { key: 'mass', head: 'kg', align: 'end', cell: ({ massKg }) => massText(massKg), width: 70 },
        { key: 'code', head: 'Shape', align: 'end', cell: ({ code }) => code, width: 60 },
        { key: 'dimensions', head: 'Dimensions, mm', cell: ({ dimensions }) => dimensions, width: 200 },
      ]}
      foot={{ mark: 'All', mass: massText(schedule.mass) }}
    />
  )
}
