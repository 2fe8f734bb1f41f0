/** The one place that maps a kind of zone to the steel that is tried in it. */

import { anchorSteel, unique } from './anchor-steel'
import type { Bench, Place } from './bench'
import type { Candidate, Candidates } from './candidate'
import { edgeSteel } from './edge-steel'
import { gapSteel } from './gap-steel'
import { groupSteel } from './group-steel'
import { jointSteel } from './joint-steel'
import { panSteel } from './pan-steel'
import type { Situation } from './situations'
import type { StraightBar } from './transverse-bars'

export function candidatesFor(bench: Bench, place: Place, shared: readonly StraightBar[]): Candidates {
  switch (place.zone.kind) {
    case 'anchor':
      return unblocked(anchorSteel(bench, place, shared).candidates)
    case 'pan':
      return panSteel(bench, place)
    case 'group':
      return unblocked(groupSteel(bench, place, shared).candidates)
    case 'edge':
      return unblocked(edgeSteel(bench, place))
    case 'gap':
      return unblocked(gapSteel(bench, place, shared).candidates)
    case 'joint':
      return jointSteel(bench, place)
    case 'corner':
    case 'tendon':
    case 'strip':
    case 'pour':
      return unblocked([])
  }
}

const unblocked = (candidates: readonly Candidate[]): Candidates => ({ candidates, blocked: [] })

/** Bars that are offered to every situation, so that a few marks can serve them all. */
const SHARED_MAX = 24

/** The bars that situations would like for themselves: those of most zones first. */
export function sharedBars(bench: Bench, situations: readonly Situation[]): StraightBar[] {
  const wanted = new Map<string, { readonly bar: StraightBar; zones: number }>()
  for (const { example, places } of situations) {
    for (const bar of unique(ownBars(bench, example))) {
      const key = `${bar.diameter}x${bar.length}`
      const known = wanted.get(key) ?? { bar, zones: 0 }
      wanted.set(key, { bar, zones: known.zones + places.length })
    }
  }
  return [...wanted.values()]
    .sort((a, b) => b.zones - a.zones || a.bar.diameter - b.bar.diameter || a.bar.length - b.bar.length)
    .slice(0, SHARED_MAX)
    .map(({ bar }) => bar)
}

function ownBars(bench: Bench, place: Place): readonly StraightBar[] {
  if (place.zone.kind === 'gap') return gapSteel(bench, place, []).bars
  return place.zone.kind === 'group' ? groupSteel(bench, place, []).bars : anchorSteel(bench, place, []).bars
}
