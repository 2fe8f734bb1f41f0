/** What an edit changed, row by row. */

import type { Anchor, Layout, Steel, Tendon } from '../model'

export interface Changed<Row> {
  /** Null where the row is new. */
  readonly before: Row | null
  /** Null where it was taken out. */
  readonly after: Row | null
}

export interface Edit {
  readonly anchors: readonly Changed<Anchor>[]
  readonly tendons: readonly Changed<Tendon>[]
  readonly steel: readonly Changed<Steel>[]
}

/** Tables on which anything may hang. */
const WHOLE = [
  'job',
  'levels',
  'strandTypes',
  'jacks',
  'hardware',
  'edgeLines',
  'joints',
  'obstructions',
  'pours',
  'edges',
  'pans',
] as const satisfies readonly (keyof Layout)[]

/**
 * The rows of anchors, tendons and steel that differ; null where something else did, or rows stand in another order.
 *
 * Rows are the same where they are one object, or hold the same values. Grid lines and bar marks are read by no check,
 * concrete results by that of their pour alone.
 */
export function editOf(before: Layout, after: Layout): Edit | null {
  if (WHOLE.some((table) => !isSame(before[table], after[table]))) return null
  const anchors = changedRows(before.anchors, after.anchors)
  const tendons = changedRows(before.tendons, after.tendons)
  const steel = changedRows(before.steel, after.steel)
  return anchors && tendons && steel ? { anchors, tendons, steel } : null
}

function changedRows<Row extends { readonly id: string }>(
  before: readonly Row[],
  after: readonly Row[],
): readonly Changed<Row>[] | null {
  if (before === after) return []
  const known = new Map(before.map((row, at) => [row.id, { row, at }]))
  const changed: Changed<Row>[] = []
  let last = -1
  for (const row of after) {
    const was = known.get(row.id)
    if (!was) {
      changed.push({ before: null, after: row })
      continue
    }
    if (was.at < last) return null
    last = was.at
    known.delete(row.id)
    if (!isSame(was.row, row)) changed.push({ before: was.row, after: row })
  }
  for (const { row } of known.values()) changed.push({ before: row, after: null })
  return changed
}

/** One object, or plain data of the same values. */
export function isSame(one: unknown, other: unknown): boolean {
  if (Object.is(one, other)) return true
  if (typeof one !== 'object' || typeof other !== 'object' || one === null || other === null) return false
  const [entries, others] = [Object.entries(one), other as Readonly<Record<string, unknown>>]
  return (
    entries.length === Object.keys(others).length &&
    Array.isArray(one) === Array.isArray(other) &&
    entries.every(([key, value]) => key in others && isSame(value, others[key]))
  )
}
