/** Transverse bars spread over the plan window behind an anchor: sized from the area that is missing. */

import type { Window } from '../bases/basis'
import type { TransverseBarsShape } from '../model'
import { area, downTo, upTo } from './candidate'

export interface TransverseNeed {
  /** Area that is missing in the window, mm2. */
  readonly short: number
  readonly window: Window
  /** Length past the anchor's line at which a bar counts in full, and below which it does not count, mm. */
  readonly developed: (diameter: number) => { readonly length: number; readonly least: number }
  readonly sizes: readonly number[]
  readonly plateWidth: number
  /** From the anchor to the line that the bars cross: 0 but for anchors that act as one. */
  readonly aside: number
  /** From the anchor to the cover at the nearer end of the edge; endless where the slab goes on. */
  readonly toEnd: number
  /** Layers that the bars may lie in: bars of both faces stop at a step of the soffit, those of one face may pass it. */
  readonly layers: readonly TransverseBarsShape['layers'][]
  /** Least distance between two bars side by side, mm, beside their diameter. */
  readonly clearGap: number
}

/** A bar as the yard knows it: what two zones may have in common. */
export interface StraightBar {
  readonly diameter: number
  readonly length: number
}

/** Straight bars are ordered in steps of this length, mm. */
const LENGTH_STEP = 25
/** Bars are set out in steps of this, mm. */
const PITCH_STEP = 25
const FIRST_STEP = 5

/** For each size the bar that is developed in full past both sides of the plate (common practice), as far as there is room. */
export function transverseBars(need: TransverseNeed): StraightBar[] {
  return need.sizes.map((diameter) => ({
    diameter,
    length: Math.min(
      upTo(need.plateWidth + 2 * need.developed(diameter).length, LENGTH_STEP),
      downTo(2 * need.toEnd, LENGTH_STEP),
    ),
  }))
}

/** The sets of one bar that cover the need, set out in the window alone and from the bearing face on. */
export function transverseSets(need: TransverseNeed, { diameter, length }: StraightBar): TransverseBarsShape[] {
  const { length: full, least } = need.developed(diameter)
  const past = length / 2 - need.aside
  const isShort = length / 2 < Math.min(need.plateWidth / 2 + full, need.toEnd - LENGTH_STEP)
  if (isShort || length > 2 * need.toEnd || past < least) return []
  const share = Math.min(1, past / full)
  return need.layers.flatMap((layers) => {
    const perPlace = (layers === 'both' ? 2 : 1) * area(diameter) * share
    return spreadOut(need, { diameter, length, layers, count: Math.ceil(need.short / perPlace - 1e-9) })
  })
}

function spreadOut(
  { window, clearGap }: TransverseNeed,
  bars: Pick<TransverseBarsShape, 'diameter' | 'length' | 'layers' | 'count'>,
): TransverseBarsShape[] {
  const { from, to } = window
  const pitch = downTo((to - from) / bars.count, PITCH_STEP)
  if (pitch < bars.diameter + clearGap) return []
  const set = { kind: 'transverse-bars', ...bars, pitch } as const
  const first = upTo(from + (to - from - (bars.count - 1) * pitch) / 2, FIRST_STEP)
  const fromFace = upTo(pitch / 2, FIRST_STEP)
  const reaching = Math.ceil((from - fromFace) / pitch) + bars.count
  return [
    { ...set, first },
    { ...set, count: reaching, first: fromFace },
  ]
}
