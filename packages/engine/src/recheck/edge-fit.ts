/**
 * Fit of the bars that run along a whole edge. They meet the steel of every anchor: pairs that stand away from the touched
 * places are carried over, and are judged in the order in which all pairs of the edge would be.
 */

import type { FitBar, Item } from '../fit/items'
import { memberOf } from '../fit/members'
import { pairsOf, type Pair } from '../fit/pairs'
import { gapsOfEdge } from '../gaps'
import { found, type LayoutIndex } from '../layout-index'
import { madeAlready, perIndex, remember } from '../memo'

interface Indexes {
  readonly was: LayoutIndex
  readonly index: LayoutIndex
  readonly kept: LayoutIndex
}

/** Pairs of the whole edge with a bar of its own zone in them, in their order. */
export const pairsAlong = perIndex((index, key): readonly Pair[] =>
  pairsOf(index, key).filter((pair) => isAlong(pair, key)),
)

const zoneOf = (item: Item): string | null => (item.kind === 'bar' ? item.bar.zoneId : item.zoneId)
const isAlong = ({ bar, other }: Pair, key: string): boolean => zoneOf(bar) === key || zoneOf(other) === key

/**
 * An index whose fit of the edge's own zone is that of the whole edge.
 *
 * @param key the edge's own zone and its member: `edge:E6`.
 */
export function edgeFitIndex({ was, index, kept }: Indexes, key: string): LayoutIndex {
  const edgeId = key.slice('edge:'.length)
  const axis = axisOf(index, edgeId)
  const isMadeAnew = madeAnew(index, kept)
  const before = (madeAlready(pairsAlong, was, key) ?? pairsAlong(was, key)).filter((pair) => {
    const zones = [zoneOf(pair.bar), zoneOf(pair.other)].filter((zone) => zone !== key)
    return zones.length > 0 && !zones.every(isMadeAnew)
  })
  for (const bars of [madeAlready(memberOf, was, key)?.bars, memberOf(kept, key).bars]) rankBars(bars ?? [], key)
  const near = pairsOf(kept, key).filter((pair) => isAlong(pair, key))
  const pairs = [...before, ...near]
    .map((pair) => ({ pair, place: placed(pair, axis) }))
    .sort((one, other) => byPlace(one.place, other.place))
    .map(({ pair }) => pair)
  const along = { ...kept }
  remember(memberOf, { index: along, key }, memberOf(kept, key))
  remember(pairsOf, { index: along, key }, pairs)
  remember(pairsAlong, { index, key }, pairs)
  return along
}

/** Whether a zone's bars and bodies are worked out again round the touched places, or are there no more. */
function madeAnew(index: LayoutIndex, kept: LayoutIndex): (zoneId: string | null) => boolean {
  const keptAnchors = new Set([...kept.anchorsOfEdge.values()].flat().map(({ id }) => id))
  const gapsOf = (one: LayoutIndex) =>
    new Set(index.layout.edges.flatMap(({ id }) => gapsOfEdge(one, id).map((gap) => gap.id)))
  const [gaps, keptGaps] = [gapsOf(index), gapsOf(kept)]
  return (zoneId) => {
    if (zoneId === null) return true
    if (zoneId.startsWith('gap:')) return keptGaps.has(zoneId) || !gaps.has(zoneId)
    if (!zoneId.startsWith('anchor:')) return true
    const anchor = index.anchors.get(zoneId.slice('anchor:'.length))
    return anchor === undefined || anchor.edgeId === null || keptAnchors.has(anchor.id)
  }
}

// Order ---------------------------------------------------------------------------------------------------------------

type Axis = 'x' | 'y'

function axisOf(index: LayoutIndex, edgeId: string): Axis {
  const { x, y } = found(index.frames, edgeId, 'edge').along
  return Math.abs(x) >= Math.abs(y) ? 'x' : 'y'
}

/** Bars of the edge's own zone by their order in it: they often begin at one place. */
const ranks = new WeakMap<FitBar, number>()
const OTHERS = Number.MAX_SAFE_INTEGER

function rankBars(bars: readonly FitBar[], key: string): void {
  for (const [rank, bar] of bars.filter((one) => one.bar.zoneId === key).entries()) ranks.set(bar, rank)
}

interface PairPlace {
  readonly isInSet: boolean
  /** Of the one that begins first: where, and its rank; then of the other. */
  readonly by: readonly [number, number, number, number]
}

function placed({ bar, other }: Pair, axis: Axis): PairPlace {
  const of = (item: Item): [number, number] => [
    item.box.min[axis],
    item.kind === 'bar' ? (ranks.get(item) ?? OTHERS) : OTHERS,
  ]
  const [one, two] = [of(bar), of(other)]
  const isFirst = one[0] < two[0] || (one[0] === two[0] && one[1] <= two[1])
  const isInSet = other.kind === 'bar' && other.setId === bar.setId
  return { isInSet, by: isFirst ? [...one, ...two] : [...two, ...one] }
}

/** As a sweep along the axis meets them; pairs within a set come after all others, in their own order. */
function byPlace(one: PairPlace, other: PairPlace): number {
  if (one.isInSet || other.isInSet) return Number(one.isInSet) - Number(other.isInSet)
  const at = one.by.findIndex((value, i) => value !== other.by[i])
  return at === -1 ? 0 : (one.by[at] ?? 0) - (other.by[at] ?? 0)
}
