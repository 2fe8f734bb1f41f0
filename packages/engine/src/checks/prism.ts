/** The prisms of one anchor in both planes, and what its row would give. */

import type { AnchorSite } from '../anchor-site'
import { ROUNDING } from '../geometry'
import { tensionOnLine } from '../row-series'
import { step, type Clause, type Step } from '../step'

const GEOMETRY: Clause = { source: 'Statics', section: 'symmetric prism', tag: 'derived' }

/** From this on the wider side is called wide: above it a row is no longer near equal. */
const WIDE_GAP_MIN = 1.2

/** A prism in one plane: its dimension, and the plate's in that plane. */
export interface Prism {
  readonly title: string
  readonly a: number
  readonly b: Step
}

/** `a` is the height of the plate, or of several from out to out. Off centre the anchor's own prism is smaller than the section and asks for less; the prism at mid-thickness is there for comparison. */
export function thicknessPrisms(
  a: number,
  { toTop, toSoffit, top, soffit }: Pick<AnchorSite, 'toTop' | 'toSoffit' | 'top' | 'soffit'>,
): {
  readonly own: Prism
  /** Null where the anchor stands at mid-thickness. */
  readonly middle: Prism | null
} {
  const b = step(
    {
      symbol: 'b',
      meaning: 'Own prism: twice the nearer face',
      formula: '2 * min(cTop, cSoffit)',
      unit: 'mm',
      clause: GEOMETRY,
    },
    { cTop: toTop, cSoffit: toSoffit },
    (v) => 2 * Math.min(v.cTop, v.cSoffit),
  )
  const own: Prism = { title: 'own prism', a, b }
  if (Math.abs(toTop - toSoffit) <= ROUNDING) return { own, middle: null }
  const whole = step(
    { symbol: 'b', meaning: 'Prism at mid-thickness', formula: 'top - soffit', unit: 'mm', clause: GEOMETRY },
    { top, soffit },
    (v) => v.top - v.soffit,
  )
  return { own, middle: { title: 'mid-thickness', a, b: whole } }
}

interface Sides {
  readonly before: number
  readonly after: number
}

/** How far the force may spread along the edge on each side of a place. */
export interface PlanSides {
  readonly own: Sides
  /** Once the next pour is cast; the same where there is none. */
  readonly joined: Sides
  /** The end of the edge, and not a neighbour, stands on that side. */
  readonly isEndBefore: boolean
  readonly isEndAfter: boolean
}

/**
 * On each side half the gap to the neighbour, or the distance to the end; where the slab goes on, the other side counts.
 *
 * For one anchor `first` and `last` are the same; of anchors that act as one they are the outermost, so that the gaps
 * between its members do not limit the spread from `chainage`.
 */
export function planSides(first: AnchorSite, last: AnchorSite, chainage: number): PlanSides {
  const [toFirst, toLast] = [chainage - first.anchor.chainage, last.anchor.chainage - chainage]
  const plus = (distance: number | null, more: number) => (distance === null ? null : distance + more)
  const before = plus(first.halfGapBefore ?? first.toStart, toFirst)
  const after = plus(last.halfGapAfter ?? last.toEnd, toLast)
  const own = {
    before: before ?? after ?? chainage - first.frame.from,
    after: after ?? before ?? first.frame.to - chainage,
  }
  return {
    own,
    joined: {
      before: plus(first.jointGapBefore, toFirst) ?? own.before,
      after: plus(last.jointGapAfter, toLast) ?? own.after,
    },
    isEndBefore: first.halfGapBefore === null,
    isEndAfter: last.halfGapAfter === null,
  }
}

/**
 * In plan twice the nearer half-gap or end of the edge. Beside a pour boundary the gap that runs across it gives
 * another prism once both pours are cast; null where it changes nothing.
 *
 * @param a width of the plate, or of several from out to out.
 */
export function planPrisms(
  a: number,
  { own: sides, joined }: PlanSides,
): { readonly own: Prism; readonly acrossBoundary: Prism | null } {
  const own = twiceNearer('Prism: twice the nearer half-gap or end of the edge', sides)
  const both = twiceNearer('Prism with the next pour cast: twice the nearer half-gap', joined)
  const isSame = Math.abs(both.value - own.value) <= ROUNDING
  return {
    own: { title: 'own prism', a, b: own },
    acrossBoundary: isSame ? null : { title: 'prism with the next pour cast', a, b: both },
  }
}

const twiceNearer = (meaning: string, { before, after }: Sides): Step =>
  step(
    { symbol: 'b', meaning, formula: '2 * min(before, after)', unit: 'mm', clause: GEOMETRY },
    { before, after },
    (v) => 2 * Math.min(v.before, v.after),
  )

/** What a reader must know of a prism in plan: a wide gap or the end of the edge that sets it. */
export function planNotes({ own: { before, after }, isEndBefore, isEndAfter }: PlanSides): readonly string[] {
  const [smaller, larger] = [Math.min(before, after), Math.max(before, after)]
  const notes: string[] = []
  if (larger > WIDE_GAP_MIN * smaller) {
    const sides = `${Math.round(smaller)} and ${Math.round(larger)} to its two sides`
    notes.push(`Beside a wide gap (${sides}) the prism rule is on the unsafe side; the elastic value is not yet made.`)
  }
  const isByEnd = (isEndBefore && before === smaller) || (isEndAfter && after === smaller)
  if (isByEnd) notes.push('The end of the edge sets the prism: near a corner a small distance lowers the force.')
  return notes
}

/** What an endless row of the same anchors would give, beside the prism; nothing where the row is uneven. */
export function rowNotes(site: AnchorSite, { a, b }: Prism): readonly string[] {
  if (!site.isInEqualRow || a >= b.value) return []
  const { share } = tensionOnLine(a / b.value)
  const P = site.force.value
  const row = `An endless row at this spacing gives ${share.toFixed(3)} P = ${(P * share * 1e-3).toFixed(1)} kN unfactored on the anchor's line (computed).`
  return [row]
}
