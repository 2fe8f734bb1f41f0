/**
 * The strip without precompression at a construction joint: the wedges of both sides together.
 *
 * Within a length of the joint all bars are of one length, so that the deepest place of each side counts, even where the
 * two do not lie quite opposite each other.
 */

import { gapsOfEdge, type Gap } from '../gaps'
import { ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import { perConcrete } from '../memo'
import type { Edge, Joint } from '../model'
import type { Range } from './wedge-line'
import { measuredWedge, usedSpreads, type SpreadPair } from './wedges-of-edge'

/** The deepest place of each side, mm from the joint. */
export interface StripWidth {
  /** Chainage of the deeper one. */
  readonly at: number
  readonly first: number
  readonly second: number
  readonly width: number
  /** mm2, both sides. */
  readonly area: number
}

/** The strip along one gap of the joint. */
export interface StripLength extends Range {
  /** The gap of the first side, for its name. */
  readonly gap: Gap
  readonly fromBulbs: StripWidth
  /** Null where no tendon ends in a bond. */
  readonly fromBond: StripWidth | null
  /** The wider of the two. */
  readonly governing: StripWidth
}

/** Two edges that face each other across a joint, the pour cast first named first. */
export interface JointStrip {
  readonly joint: Joint
  readonly first: Edge
  readonly second: Edge
  readonly lengths: readonly StripLength[]
}

/** The strips of a joint: one for each pair of edges that face each other across it. */
export const jointStrips: (index: LayoutIndex, jointId: string) => readonly JointStrip[] = perConcrete(
  (index, jointId) => {
    const joint = found(index.joints, jointId, 'joint')
    return facingPairs(index, joint).map(([first, second]) => ({
      joint,
      first,
      second,
      lengths: stripLengths(index, first, second),
    }))
  },
)

/** The edge of the pour cast first comes first; between two later pours the one listed first. */
function facingPairs(index: LayoutIndex, { edgeLineId, firstPourId }: Joint): [Edge, Edge][] {
  const edges = index.edgesOfLine.get(edgeLineId) ?? []
  return edges.flatMap((one, i) =>
    edges.slice(i + 1).flatMap((other): [Edge, Edge][] => {
      if (!isFacing(index, one, other)) return []
      return other.pourId === firstPourId ? [[other, one]] : [[one, other]]
    }),
  )
}

function isFacing(index: LayoutIndex, one: Edge, other: Edge): boolean {
  const [a, b] = [found(index.frames, one.id, 'edge'), found(index.frames, other.id, 'edge')]
  return a.runsLeftToRight !== b.runsLeftToRight && Math.min(a.to, b.to) - Math.max(a.from, b.from) > ROUNDING
}

/** By the gaps of the side that has tendon ends, the first side's where both have. */
function stripLengths(index: LayoutIndex, first: Edge, second: Edge): StripLength[] {
  const [own, other] = [gapsOfEdge(index, first.id), gapsOfEdge(index, second.id)]
  const frames = [first, second].map(({ id }) => found(index.frames, id, 'edge'))
  const [from, to] = [Math.max(...frames.map((one) => one.from)), Math.min(...frames.map((one) => one.to))]
  const sides: Sides = [usedSpreads(index, first.id), usedSpreads(index, second.id)]
  return (own.length > 1 ? own : other).flatMap((gap): StripLength[] => {
    const range = { from: Math.max(gap.from, from), to: Math.min(gap.to, to) }
    if (range.to - range.from <= ROUNDING) return []
    const fromBulbs = widest(sides, range, ({ fromBulbs: bulbs }) => bulbs)
    const isBonded = sides.some(({ fromBond }) => fromBond !== null)
    const fromBond = isBonded ? widest(sides, range, (pair) => pair.fromBond ?? pair.fromBulbs) : null
    return [{ ...range, gap, fromBulbs, fromBond, governing: fromBond ?? fromBulbs }]
  })
}

type Sides = readonly [SpreadPair, SpreadPair]

function widest(sides: Sides, range: Range, of: (pair: SpreadPair) => SpreadPair['fromBulbs']): StripWidth {
  const [first, second] = [measuredWedge(of(sides[0]), range), measuredWedge(of(sides[1]), range)]
  const deeper = second.apex.depth > first.apex.depth ? second : first
  return {
    at: deeper.apex.chainage,
    first: first.apex.depth,
    second: second.apex.depth,
    width: first.apex.depth + second.apex.depth,
    area: first.area + second.area,
  }
}
