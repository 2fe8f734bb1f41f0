/** Candidates of wedge bars across a gap: long enough to be anchored past the wedge, as many as its crack steel asks for. */

import { anchorageOf } from '../checks/crack-steel'
import { found } from '../layout-index'
import type { WedgeBarsShape } from '../model'
import { sectionBehind } from '../section'
import { wedgesOfEdge } from '../wedge/wedges-of-edge'
import { contextWith, type Bench, type Place } from './bench'
import { area, upTo, type Candidate } from './candidate'
import type { StraightBar } from './transverse-bars'
import { needsOf, unmetOf } from './verdict'

const LENGTH_STEP = 25
/** Places for bars that a rule's largest spacing may ask for beyond the area. */
const COUNT_MAX = 200

/** Largest spacings that rules ask for, mm; a place or two more move bars clear of a step. */
const SPACINGS = [300, 200] as const

export interface GapSteel {
  readonly candidates: readonly Candidate[]
  readonly bars: readonly StraightBar[]
}

/** @param shared lengths that other wedges take, tried where they are long enough. */
export function gapSteel(bench: Bench, place: Place, shared: readonly StraightBar[]): GapSteel {
  const bars = barsFor(bench, place)
  const all = bars.flatMap((own) => [
    own,
    ...shared.filter(({ diameter, length }) => diameter === own.diameter && length > own.length),
  ])
  return { bars, candidates: all.flatMap((bar) => setOf(bench, place, bar)) }
}

/** For each size the shortest bar that counts in full. */
function barsFor({ context, sizes }: Bench, { zone }: Place): StraightBar[] {
  const { index, basis } = context
  const wedge = wedgesOfEdge(index, zone.edgeId ?? '').get(zone.id)
  if (!wedge) return []
  const { apex, depth } = wedge
  const pour = found(index.pours, zone.pourId, 'pour')
  const frame = found(index.frames, zone.edgeId ?? '', 'edge')
  const { coverEdge } = sectionBehind(pour, { frame, chainage: apex.chainage, depth: 0 })
  const { top, soffit, coverTop, coverSoffit } = sectionBehind(pour, { frame, ...apex })
  const at = { pour, thickness: top - soffit, cover: Math.max(coverTop, coverSoffit) }
  return sizes.map(({ diameter }) => ({
    diameter,
    length: upTo(
      depth + anchorageOf(basis, { ...at, diameter }, { diameter, layers: 'both' }) - coverEdge,
      LENGTH_STEP,
    ),
  }))
}

/** What the crack rule asks for hangs on the bar: the check is asked with one bar of that size in place. */
function setOf(bench: Bench, place: Place, { diameter, length }: StraightBar): Candidate[] {
  const shapeOf = (count: number): WedgeBarsShape => ({ kind: 'wedge-bars', diameter, length, count, layers: 'both' })
  const [need] = unmetOf(needsOf(contextWith(bench, place, [shapeOf(1)]), place.zone))
  const width = (place.zone.to ?? 0) - (place.zone.from ?? 0)
  if (!need) return [{ shapes: [shapeOf(1)] }]
  const perPlace = (2 * area(diameter) * 1000) / width
  const count = 1 + Math.ceil((need.demand - need.limit) / perPlace - 1e-9)
  if (!(count <= COUNT_MAX)) return []
  const spacings = SPACINGS.map((spacing) => Math.ceil(width / spacing)).filter((places) => places > count + 2)
  return [count, count + 1, count + 2, ...spacings].map((places) => ({ shapes: [shapeOf(places)] }))
}
