/** Anchors so close that they act as one on the concrete: rules for a single anchor do not hold for them. */

import { jackingForce } from './force'
import type { EdgeFrame } from './frame'
import { ROUNDING } from './geometry'
import { found, type LayoutIndex } from './layout-index'
import { perConcrete } from './memo'
import type { Anchor } from './model'
import { step, type Clause, type Step } from './step'

/** The share of the prism is AS 3600 12.5.3's; the share of the plate is from bridge practice (JTG 3362 8.2.2). */
const PLAN: Clause = { source: 'Close anchors in plan', section: '2 a and 0.3 of the prism of the pair', tag: 'digest' }
const THICKNESS: Clause = { source: 'AS 3600:2018', section: '12.5.3', tag: 'digest' }

const PLATES_APART = 2
const PRISM_SHARE = 0.3
const DEPTH_SHARE = 0.3

export interface CloseGroup {
  readonly plane: 'plan' | 'thickness'
  /** By chainage, then height. */
  readonly anchorIds: readonly string[]
  /** The comparisons by which its members were joined, in that order. */
  readonly steps: readonly Step[]
}

interface Pair {
  readonly spacing: number
  /** The wider plate. */
  readonly plate: number
  /** From the pair's centre to the middle of the gap, or the end of the edge, on either side. */
  readonly toOuterBefore: number
  readonly toOuterAfter: number
}

/**
 * Below which spacing along the edge a pair acts as one in plan, mm.
 *
 * The larger of twice the wider plate and 0.3 of the prism that the pair would have as one anchor.
 */
export function closeBelow(pair: Omit<Pair, 'spacing'>): Step {
  const { plate, toOuterBefore, toOuterAfter } = pair
  return step(
    {
      symbol: 'sc',
      meaning: 'spacing below which two anchors act as one in plan',
      formula: 'max(2 * a, 0.3 * 2 * min(l1, l2))',
      unit: 'mm',
      clause: PLAN,
    },
    { a: plate, l1: toOuterBefore, l2: toOuterAfter },
    () => limitOf(pair),
  )
}

const limitOf = ({ plate, toOuterBefore, toOuterAfter }: Omit<Pair, 'spacing'>): number =>
  Math.max(PLATES_APART * plate, PRISM_SHARE * 2 * Math.min(toOuterBefore, toOuterAfter))

/** Whether a pair acts as one in plan. */
export const actsAsOne = (pair: Pair): boolean => pair.spacing < limitOf(pair) - ROUNDING

/** Every group of two or more anchors of an edge that act as one, in plan and in the thickness. */
export const closeAnchors = perConcrete((index, edgeId): readonly CloseGroup[] => {
  const anchors = index.anchorsOfEdge.get(edgeId) ?? []
  return [...closeInPlan(index, edgeId, anchors), ...closeInThickness(index, edgeId, anchors)]
})

// In plan -----------------------------------------------------------------------------------------------------------

interface Cluster {
  readonly anchors: readonly Anchor[]
  readonly from: number
  readonly to: number
  /** Where the resultant of its forces stands. */
  readonly centre: number
  readonly force: number
  /** Widest plate. */
  readonly plate: number
  readonly steps: readonly Step[]
}

/** The nearest pair is joined first and then counts as one anchor; repeated until no pair is close. */
function closeInPlan(index: LayoutIndex, edgeId: string, anchors: readonly Anchor[]): CloseGroup[] {
  const frame = found(index.frames, edgeId, 'edge')
  let clusters = anchors.map((anchor) => clusterOf(index, anchor))
  // Each round joins a pair or more, so that there are fewer rounds than anchors.
  for (let round = 1; round < anchors.length; round++) {
    const close = closePairs(frame, clusters)
    if (close.length === 0) break
    clusters = joined(clusters, nearestOf(close))
  }
  return clusters.flatMap(({ anchors: members, steps }) =>
    members.length > 1 ? [{ plane: 'plan' as const, anchorIds: members.map(({ id }) => id), steps }] : [],
  )
}

function clusterOf(index: LayoutIndex, anchor: Anchor): Cluster {
  const { chainage } = anchor
  const plate = found(index.hardware, anchor.hardwareId, 'hardware').plate.width
  return {
    anchors: [anchor],
    from: chainage,
    to: chainage,
    centre: chainage,
    force: forceOf(index, anchor),
    plate,
    steps: [],
  }
}

function forceOf(index: LayoutIndex, anchor: Anchor): number {
  const tendon = found(index.tendons, anchor.tendonId, 'tendon')
  const strand = found(index.strandTypes, tendon.strandTypeId, 'strand type')
  return jackingForce(tendon, strand).value
}

interface ClosePair extends Pair {
  /** Place of its first cluster. */
  readonly at: number
}

/** In numbers alone: a pair is looked at in every round, and written out as a step once, when it is joined. */
function closePairs(frame: EdgeFrame, clusters: readonly Cluster[]): ClosePair[] {
  const close: ClosePair[] = []
  for (const [at, first] of clusters.entries()) {
    const second = clusters[at + 1]
    if (!second) break
    const [before, after] = [clusters[at - 1], clusters[at + 2]]
    const centre = centreOf(first, second)
    const pair: ClosePair = {
      at,
      spacing: second.from - first.to,
      plate: Math.max(first.plate, second.plate),
      toOuterBefore: centre - (before ? (before.to + first.from) / 2 : frame.from),
      toOuterAfter: (after ? (second.to + after.from) / 2 : frame.to) - centre,
    }
    if (actsAsOne(pair)) close.push(pair)
  }
  return close
}

/** Pairs equally near are joined in the same round, so that an edge read from its other end gives the same groups. */
function nearestOf(pairs: readonly ClosePair[]): ReadonlyMap<number, ClosePair> {
  const least = pairs.reduce((nearest, { spacing }) => Math.min(nearest, spacing), Infinity)
  return new Map(pairs.filter(({ spacing }) => spacing <= least + ROUNDING).map((pair) => [pair.at, pair]))
}

function joined(clusters: readonly Cluster[], pairs: ReadonlyMap<number, ClosePair>): Cluster[] {
  const result: Cluster[] = []
  for (const [i, cluster] of clusters.entries()) {
    const pair = pairs.get(i - 1)
    const last = pair && result.pop()
    result.push(pair && last ? join(last, cluster, closeBelow(pair)) : cluster)
  }
  return result
}

function centreOf(first: Cluster, second: Cluster): number {
  return (first.force * first.centre + second.force * second.centre) / (first.force + second.force)
}

function join(first: Cluster, second: Cluster, limit: Step): Cluster {
  return {
    anchors: [...first.anchors, ...second.anchors],
    from: first.from,
    to: second.to,
    centre: centreOf(first, second),
    force: first.force + second.force,
    plate: Math.max(first.plate, second.plate),
    steps: [...first.steps, ...second.steps, limit],
  }
}

// In the thickness --------------------------------------------------------------------------------------------------

/** Only anchors one above the other, whose plates overlap along the edge, share a prism in the thickness. */
function closeInThickness(index: LayoutIndex, edgeId: string, anchors: readonly Anchor[]): CloseGroup[] {
  const frame = found(index.frames, edgeId, 'edge')
  const halfOf = (anchor: Anchor) => found(index.hardware, anchor.hardwareId, 'hardware').plate.width / 2
  const widest = anchors.reduce((most, anchor) => Math.max(most, halfOf(anchor)), 0)
  let groups: CloseGroup[] = []
  for (const [i, first] of anchors.entries()) {
    const depth = frame.topAt(first.chainage) - frame.soffitAt(first.chainage)
    for (let j = i + 1; j < anchors.length; j++) {
      const second = anchors[j]
      if (!second || second.chainage - first.chainage >= halfOf(first) + widest) break
      const isAbove = second.chainage - first.chainage < halfOf(first) + halfOf(second) - ROUNDING
      const isClose = Math.abs(second.height - first.height) < DEPTH_SHARE * depth - ROUNDING
      if (isAbove && isClose) groups = withPair(groups, [first.id, second.id], depthStep(depth))
    }
  }
  const order = new Map(anchors.map(({ id }, at) => [id, at]))
  const placeOf = (id: string) => order.get(id) ?? 0
  return groups.map((group) => ({
    ...group,
    anchorIds: [...group.anchorIds].sort((one, other) => placeOf(one) - placeOf(other)),
  }))
}

/** A pair joins the groups that hold either of its anchors into one. */
function withPair(groups: readonly CloseGroup[], pair: readonly string[], limit: Step): CloseGroup[] {
  const isTouched = ({ anchorIds }: CloseGroup) => pair.some((id) => anchorIds.includes(id))
  const touched = groups.filter(isTouched)
  const joint: CloseGroup = {
    plane: 'thickness',
    anchorIds: [...new Set([...touched.flatMap(({ anchorIds }) => anchorIds), ...pair])],
    steps: [...touched.flatMap(({ steps }) => steps), limit],
  }
  return [...groups.filter((group) => !isTouched(group)), joint]
}

function depthStep(D: number): Step {
  return step(
    {
      symbol: 'zc',
      meaning: 'distance in height below which two anchors act as one',
      formula: '0.3 * D',
      unit: 'mm',
      clause: THICKNESS,
    },
    { D },
    (v) => DEPTH_SHARE * v.D,
  )
}
