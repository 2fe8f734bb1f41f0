import type { Schedule, ScheduleRow } from '@wedgeline/engine'
import { massOf } from '../schedule/schedule-words'

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
