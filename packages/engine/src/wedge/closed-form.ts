/**
 * Edge wedge of a gap by the closed form: the plan area at the edge between the spread of two neighbouring tendon ends.
 *
 * Only the two ends beside the gap are looked at. Behind pans that stop short the spread of tendons further along covers
 * part of the area, so that this depth is the larger one there.
 */

import type { EdgeFrame } from '../frame'
import type { Gap, TendonEnd } from '../gaps'
import { ROUNDING, signedArea } from '../geometry'
import { step, type Clause, type Step } from '../step'

const GEOMETRY: Clause = { source: 'Geometry of spread', section: 'closed form', tag: 'derived' }

/** Where a spread of 45 degrees is assumed in place of the basis's own. */
export const USUAL_SPREAD = Math.PI / 4

interface WedgeSpread {
  /** Angle between the tendon and the side of its spread, rad. */
  readonly angle: number
  /** Where the spread begins: at the bearing face, or at the end of the anchor device. */
  readonly startsAt: 'bearing-face' | 'device-end'
}

/** Plan place in the edge's own coordinates, mm. */
export interface PlanPoint {
  readonly chainage: number
  readonly depth: number
}

export interface EdgeWedge {
  /** From the slab edge to the deepest place without precompression, mm: the deeper of the two below. */
  readonly depth: number
  /** With the spread of bonded dead ends from their bulbs. */
  readonly depthFromBulbs: number
  /** With it from the end of their transmission length lpt2; null where neither end is bonded. */
  readonly depthFromBond: number | null
  /** Deepest place of the outline below. */
  readonly apex: PlanPoint
  /** Outline of the deeper wedge, from the start of the gap round to its end. */
  readonly outline: readonly PlanPoint[]
  /** mm2 */
  readonly area: number
  readonly steps: readonly Step[]
}

/** One side of a wedge: the spread of a tendon end, as far as it opens into the gap. */
interface Side {
  readonly chainage: number
  /** From the tendon's end to the side of its plate or splay towards the gap, along the edge. */
  readonly half: number
  readonly start: number
  /** Tangent of the angle that the side of the spread makes with the normal of the edge. */
  readonly slope: number
}

/**
 * Null where no tendon points at the edge, where a tendon leans so far that its spread never opens into the gap, and
 * where a tendon stands beyond the end of its edge, so that the gap has no length.
 */
export function edgeWedge(frame: EdgeFrame, gap: Gap, spread: WedgeSpread): EdgeWedge | null {
  if ((!gap.after && !gap.before) || gap.to < gap.from - ROUNDING) return null
  const sides = (isFromBond: boolean) => ({
    after: gap.after && sideOf(gap.after, { spread, isFromBond, towards: 1 }),
    before: gap.before && sideOf(gap.before, { spread, isFromBond, towards: -1 }),
  })
  const fromBulbs = sides(false)
  if ([fromBulbs.after, fromBulbs.before].some((side) => side && side.slope <= 0)) return null
  const isBonded = [gap.after, gap.before].some((end) => bondOf(end) > 0)
  const bulbs = wedgeBetween(gap, fromBulbs)
  const bond = isBonded ? wedgeBetween(gap, sides(true)) : null
  const deeper = bond && bond.depth > bulbs.depth ? bond : bulbs
  return { ...deeper, depthFromBulbs: bulbs.depth, depthFromBond: bond?.depth ?? null }
}

const bondOf = (end: TendonEnd | null): number => end?.hardware.transmissionLength ?? 0

/** A skewed tendon carries its plate round and the start of its bond aside. */
function sideOf(
  end: TendonEnd,
  { spread, isFromBond, towards }: { spread: WedgeSpread; isFromBond: boolean; towards: 1 | -1 },
): Side {
  const device = spread.startsAt === 'device-end' ? end.hardware.deviceLength : 0
  const behind = device + (isFromBond ? bondOf(end) : 0)
  const [sin, cos] = [towards * Math.sin(end.lean), Math.cos(end.lean)]
  return {
    chainage: end.chainage,
    half: (end.width / 2) * cos + behind * sin,
    start: end.setBack + behind * cos - (end.width / 2) * sin,
    slope: Math.tan(spread.angle + towards * end.lean),
  }
}

interface Sides {
  readonly after: Side | null
  readonly before: Side | null
}

function wedgeBetween(gap: Gap, sides: Sides): Pick<EdgeWedge, 'depth' | 'apex' | 'outline' | 'area' | 'steps'> {
  const depthAt = (chainage: number) =>
    Math.min(reachOf(sides.after, chainage - gap.from), reachOf(sides.before, gap.to - chainage))
  const points = breaksOf(gap, sides).map((chainage) => ({ chainage, depth: depthAt(chainage) }))
  const apex = points.reduce((deepest, point) => (point.depth > deepest.depth ? point : deepest))
  const outline = [{ chainage: gap.from, depth: 0 }, ...points, { chainage: gap.to, depth: 0 }]
  const area = Math.abs(signedArea(outline.map(({ chainage, depth }) => ({ x: chainage, y: depth }))))
  return { depth: apex.depth, apex, outline, area, steps: [depthStep(gap, sides, apex.depth)] }
}

/** Depth at which a spread covers the place that far from its tendon along the edge. */
function reachOf(side: Side | null, away: number): number {
  if (!side) return Infinity
  return side.start + Math.max(0, away - side.half) / side.slope
}

/** Chainages at which the depth changes its slope, growing: plate edges, and where the two spreads meet. */
function breaksOf(gap: Gap, sides: Sides): number[] {
  const { after, before } = sides
  const candidates = [
    gap.from,
    ...(after ? [after.chainage + after.half] : []),
    ...(before ? [before.chainage - before.half] : []),
    ...meetings(after, before),
    gap.to,
  ]
  const inside = candidates.filter((chainage) => chainage >= gap.from - ROUNDING && chainage <= gap.to + ROUNDING)
  const rising = inside.sort((a, b) => a - b)
  return rising.filter((chainage, i) => i === 0 || chainage - (rising[i - 1] ?? chainage) > ROUNDING)
}

/** Where the two spreads can meet: line on line, or the line of one on the start of the other. */
function meetings(after: Side | null, before: Side | null): number[] {
  if (!after || !before) return []
  const depth = meetingDepth(after, before)
  return [
    after.chainage + after.half + (depth - after.start) * after.slope,
    after.chainage + after.half + (before.start - after.start) * after.slope,
    before.chainage - before.half - (after.start - before.start) * before.slope,
  ]
}

function meetingDepth(after: Side, before: Side): number {
  const clear = before.chainage - after.chainage - after.half - before.half
  return (clear + after.start * after.slope + before.start * before.slope) / (after.slope + before.slope)
}

/** The line that gives the depth found: both spreads, one spread to the end or to its neighbour, or a start alone. */
function depthStep(gap: Gap, sides: Sides, depth: number): Step {
  const { after, before } = sides
  const line = { symbol: 'd', meaning: 'depth of the edge wedge from the slab edge', unit: 'mm', clause: GEOMETRY }
  const isFound = (value: number) => Math.abs(value - depth) <= ROUNDING
  if (after && before && isFound(meetingDepth(after, before))) {
    return step(
      { ...line, formula: '(s - (a1 + a2) / 2 + e1 * t1 + e2 * t2) / (t1 + t2)' },
      {
        s: gap.to - gap.from,
        a1: 2 * after.half,
        a2: 2 * before.half,
        e1: after.start,
        e2: before.start,
        t1: after.slope,
        t2: before.slope,
      },
      (v) => (v.s - (v.a1 + v.a2) / 2 + v.e1 * v.t1 + v.e2 * v.t2) / (v.t1 + v.t2),
    )
  }
  const one = [after, before].find((side) => side !== null && isFound(reachOf(side, gap.to - gap.from)))
  if (one) {
    return step(
      { ...line, formula: 'e + max(0, s - a / 2) / t' },
      { s: gap.to - gap.from, a: 2 * one.half, e: one.start, t: one.slope },
      (v) => v.e + Math.max(0, v.s - v.a / 2) / v.t,
    )
  }
  return step({ ...line, formula: 'e' }, { e: depth }, (v) => v.e)
}
