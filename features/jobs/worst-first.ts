import { STATUSES } from '@wedgeline/engine/result'
import type { Counts } from '../checks/counts'

interface Counted {
  readonly counts: Counts
}

/** Sorts what has the worst check, and then the most of them, to the front; a new list. */
export function worstFirst<T>(rows: readonly T[], pours: (row: T) => readonly Counted[]): readonly T[] {
  const keys = new Map(rows.map((row) => [row, keyOf(pours(row))]))
  return [...rows].sort((a, b) => compare(keys.get(b) ?? [], keys.get(a) ?? []))
}

const keyOf = (pours: readonly Counted[]): readonly number[] =>
  STATUSES.map((status) => pours.reduce((total, { counts }) => total + counts[status], 0))

function compare(a: readonly number[], b: readonly number[]): number {
  const at = a.findIndex((value, index) => value !== b[index])
  return at < 0 ? 0 : (a[at] ?? 0) - (b[at] ?? 0)
}
