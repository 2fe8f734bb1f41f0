/** A schedule's sums: by size, by delivery and by kind of bar; and its longest bar. */

import type { Delivery, SteelKind } from '../model'
import { sizeOf, type BarStandard } from './bar-standards'
import type { Member, ZoneBars } from './bars'
import { cutLength, roundedShape } from './cut-length'
import type { ScheduleRow } from './schedule-row'
import type { TypeLetter } from './bar-key'
import { inText } from './in-text'

export interface ScheduleTotal {
  readonly typeAndSize: string
  readonly letter: TypeLetter
  readonly diameter: number
  readonly massPerMetre: number
  readonly bars: number
  readonly metres: number
  /** kg */
  readonly mass: number
}

/** Bars that reach the site together; null id for the members that no delivery names. */
export interface ScheduleDelivery {
  readonly id: string | null
  readonly name: string
  readonly neededOn: string | null
  /** Marks of edges and pans, in the order of the schedule. */
  readonly members: readonly string[]
  readonly bars: number
  readonly metres: number
  /** kg */
  readonly mass: number
}

export interface ScheduleKind {
  readonly kind: SteelKind
  readonly bars: number
  readonly metres: number
  /** kg */
  readonly mass: number
}

export const NOT_ASSIGNED = 'not assigned'

/** The first delivery that names the member; null where none does. */
export function deliveryOf(deliveries: readonly Delivery[], member: Member): Delivery | null {
  return (
    deliveries.find(({ edgeIds, panIds }) => (member.kind === 'edge' ? edgeIds : panIds).includes(member.id)) ?? null
  )
}

/** In the pour's order, and last what is not assigned; empty where the pour has no deliveries. */
export function deliveryTotals(
  deliveries: readonly Delivery[],
  rows: readonly ScheduleRow[],
): readonly ScheduleDelivery[] {
  if (deliveries.length === 0) return []
  const none = { id: null, name: NOT_ASSIGNED, neededOn: null }
  return [...deliveries, none].flatMap(({ id, name, neededOn }) => {
    const own = rows.filter((row) => row.member !== null && row.deliveryId === id)
    if (own.length === 0 && id === null) return []
    const millimetres = own.reduce((sum, { total, length }) => sum + total * (length ?? 0), 0)
    return [
      {
        id,
        name,
        neededOn,
        members: [...new Set(own.flatMap(({ member }) => (member ? [member.name] : [])))],
        bars: own.reduce((sum, { total }) => sum + total, 0),
        metres: millimetres / 1000,
        mass: own.reduce((sum, { total, massEach }) => sum + total * (massEach ?? 0), 0),
      },
    ]
  })
}

/** By kind of bar: local steel first, then along and across the edge, then round pans and across joints. */
export function kindTotals(bars: readonly ZoneBars[], standard: BarStandard): readonly ScheduleKind[] {
  const totals = new Map<SteelKind, { bars: number; readonly millimetres: Map<number, number> }>()
  for (const { kind, shape, count } of bars) {
    const cut = cutLength(roundedShape(shape, standard), standard)
    const sums = totals.get(kind) ?? { bars: 0, millimetres: new Map<number, number>() }
    const before = sums.millimetres.get(shape.diameter) ?? 0
    sums.millimetres.set(shape.diameter, before + count * (cut?.length ?? 0))
    totals.set(kind, { ...sums, bars: sums.bars + count })
  }
  return [...totals]
    .map(([kind, { bars: number, millimetres }]) => ({ kind, bars: number, ...sumsOf(millimetres, standard) }))
    .sort((a, b) => KIND_ORDER.indexOf(a.kind) - KIND_ORDER.indexOf(b.kind))
}

/** Whole millimetres by size, thin bars first, so that the order of the steel leaves no trace in the last digit. */
function sumsOf(bySize: ReadonlyMap<number, number>, standard: BarStandard): { metres: number; mass: number } {
  const sizes = [...bySize].sort(([a], [b]) => a - b)
  return {
    metres: sizes.reduce((sum, [, millimetres]) => sum + millimetres, 0) / 1000,
    mass: sizes.reduce((sum, [diameter, millimetres]) => {
      return sum + (millimetres / 1000) * (sizeOf(standard, diameter)?.massPerMetre ?? 0)
    }, 0),
  }
}

const KIND_ORDER: readonly SteelKind[] = [
  'spiral',
  'links',
  'hairpins',
  'transverse-bars',
  'edge-bars',
  'wedge-bars',
  'trimmers',
  'diagonals',
  'tie-back-bars',
  'lap-bars',
]

/** The longest bar that is ordered, with its mark; null where no length is known. */
export function longestBar(rows: readonly ScheduleRow[]): { readonly mark: string; readonly length: number } | null {
  return rows.reduce<{ mark: string; length: number } | null>((longest, { mark, length, total }) => {
    if (total === 0 || length === null || (longest && longest.length >= length)) return longest
    return { mark, length }
  }, null)
}

/** By type and size, thin bars first. */
export function totalsOf(rows: readonly ScheduleRow[], standard: BarStandard): readonly ScheduleTotal[] {
  const totals = new Map<string, ScheduleTotal>()
  for (const { typeAndSize, letter, diameter, total, length } of rows) {
    if (total === 0 || length === null) continue
    const massPerMetre = sizeOf(standard, diameter)?.massPerMetre ?? 0
    const before = totals.get(typeAndSize)
    // Whole millimetres are added, so that no fraction creeps in and a spreadsheet's sum agrees to the last digit.
    const metres = (Math.round((before?.metres ?? 0) * 1000) + total * length) / 1000
    const bars = (before?.bars ?? 0) + total
    totals.set(typeAndSize, { typeAndSize, letter, diameter, massPerMetre, bars, metres, mass: metres * massPerMetre })
  }
  return [...totals.values()].sort((a, b) => a.diameter - b.diameter || inText(a.letter, b.letter))
}
