/** Edge wedges of every gap of an edge, by each angle of spread that is shown. */

import { basisOf } from '../bases'
import { gapsOfEdge, type Gap } from '../gaps'
import { ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import { perConcrete } from '../memo'
import type { Clause, Step } from '../step'
import { edgeWedge, type PlanPoint } from './closed-form'
import { depthStep } from './depth-step'
import { spreadsOfEdge, type EdgeSpreads } from './edge-spreads'
import { areaUnder, deepest, outlineUnder } from './envelope'
import { bondLength, shownSpreads, type ShownSpread } from './shown-spreads'
import { wedgeLine, type Range, type WedgeLine } from './wedge-line'

/** Spread of an edge's tendons from the bulbs of bonded dead ends, and from the end of their transmission length. */
export interface SpreadPair {
  readonly fromBulbs: EdgeSpreads
  /** Null where no tendon of the pour ends in a bond. */
  readonly fromBond: EdgeSpreads | null
}

export interface SpreadDepth {
  readonly title: string
  /** rad */
  readonly angle: number
  readonly clause: Clause
  /** The deeper of the next two, mm, and its area, mm2. */
  readonly depth: number
  readonly area: number
  readonly depthFromBulbs: number
  readonly depthFromBond: number | null
  readonly areaFromBulbs: number
  readonly areaFromBond: number | null
  readonly steps: readonly Step[]
}

/** The wedge of one gap by the spread in use; from the slab edge, in the edge's own coordinates, mm and mm2. */
export interface GapWedge extends SpreadDepth {
  readonly gap: Gap
  readonly apex: PlanPoint
  /** One, from the start of the gap round to its end. */
  readonly polygons: readonly (readonly PlanPoint[])[]
  /** Lengths behind which no tendon compresses from this edge to the face across. */
  readonly throughs: readonly Range[]
  /** By every angle shown, the one in use first. */
  readonly depthBySpread: readonly SpreadDepth[]
}

/** The wedges of an edge by the id of their gap's zone. */
export const wedgesOfEdge: (index: LayoutIndex, edgeId: string) => ReadonlyMap<string, GapWedge> = perConcrete(
  (index, edgeId) => wedgesOfGaps(index, edgeId, gapsOfEdge(index, edgeId)),
)

/** The wedges of some gaps of an edge, likewise. */
export function wedgesOfGaps(index: LayoutIndex, edgeId: string, gaps: readonly Gap[]): Map<string, GapWedge> {
  const shown = shownSpreads(index).map((spread) => ({ spread, pair: spreadPair(index, edgeId, spread) }))
  return new Map(
    gaps.flatMap((gap): [string, GapWedge][] => {
      const made = shown.map(({ spread, pair }) => wedgeBy(index, { gap, spread, pair }))
      const [used] = made
      if (!used) return []
      return [[gap.id, { ...used.depth, ...used.place, gap, depthBySpread: made.map(({ depth }) => depth) }]]
    }),
  )
}

/** The spreads behind an edge by the angle in use. */
export const usedSpreads: (index: LayoutIndex, edgeId: string) => SpreadPair = perConcrete((index, edgeId) => {
  const [used] = shownSpreads(index)
  return spreadPair(index, edgeId, used ?? { angle: basisOf(index.layout.job).spread.value })
})

function spreadPair(index: LayoutIndex, edgeId: string, { angle }: Pick<ShownSpread, 'angle'>): SpreadPair {
  const { job } = index.layout
  const startsAt = job.settings.spreadStart
  const isBonded = index.layout.hardware.some(({ kind }) => kind === 'bonded-splay')
  return {
    fromBulbs: spreadsOfEdge(index, edgeId, { angle, startsAt, bondOf: () => 0 }),
    fromBond: isBonded
      ? spreadsOfEdge(index, edgeId, { angle, startsAt, bondOf: bondLength(index, basisOf(job)) })
      : null,
  }
}

interface Measured {
  readonly line: WedgeLine
  readonly apex: PlanPoint
  readonly area: number
}

/** The line over a length of an edge, its deepest place and the area before it. */
export function measuredWedge(spreads: EdgeSpreads, range: Range): Measured {
  const line = wedgeLine(spreads, range)
  return {
    line,
    apex: deepest(line.pieces) ?? { chainage: range.from, depth: 0 },
    area: areaUnder(line.pieces),
  }
}

function wedgeBy(
  index: LayoutIndex,
  of: { readonly gap: Gap; readonly spread: ShownSpread; readonly pair: SpreadPair },
): { readonly depth: SpreadDepth; readonly place: Pick<GapWedge, 'apex' | 'polygons' | 'throughs'> } {
  const { gap, spread, pair } = of
  const bulbs = measuredWedge(pair.fromBulbs, gap)
  const bond = pair.fromBond && measuredWedge(pair.fromBond, gap)
  // The spread that begins later lies within the one from the bulbs: its wedge is never the smaller one.
  const deeper = bond ?? bulbs
  return {
    depth: {
      title: spread.title,
      angle: spread.angle,
      clause: spread.clause,
      depth: deeper.apex.depth,
      area: deeper.area,
      depthFromBulbs: bulbs.apex.depth,
      depthFromBond: bond?.apex.depth ?? null,
      areaFromBulbs: bulbs.area,
      areaFromBond: bond?.area ?? null,
      steps: stepsOf(index, { gap, spread, deeper }),
    },
    place: {
      apex: deeper.apex,
      polygons: [outlineUnder(deeper.line.pieces)],
      throughs: deeper.line.throughs,
    },
  }
}

/** The closed form's own line where it gives the depth: each side with its plate and set-back. */
function stepsOf(
  index: LayoutIndex,
  of: { readonly gap: Gap; readonly spread: ShownSpread; readonly deeper: Measured },
): readonly Step[] {
  const { gap, spread, deeper } = of
  const frame = found(index.frames, gap.edgeId, 'edge')
  const startsAt = index.layout.job.settings.spreadStart
  const closed = edgeWedge(frame, gap, { angle: spread.angle, startsAt })
  const meaning = `depth of the edge wedge from the slab edge, spread at ${degrees(spread.angle)} degrees (${spread.title})`
  if (closed && Math.abs(closed.depth - deeper.apex.depth) <= ROUNDING) {
    return closed.steps.map((line) => ({ ...line, meaning }))
  }
  return [depthStep(deeper.line.pieces, deeper.apex, meaning)]
}

const degrees = (angle: number): string => String(Math.round((angle * 1800) / Math.PI) / 10)
