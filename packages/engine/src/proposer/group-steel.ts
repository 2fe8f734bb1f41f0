/** Candidates of bars in plan behind anchors that act as one: centred on the member nearest to their resultant. */

import { centreOf, groupsOfEdge, outToOut } from '../anchor-groups'
import type { Bench, Place } from './bench'
import type { Candidate } from './candidate'
import { planNeed } from './anchor-steel'
import { transverseBars, transverseSets, type StraightBar } from './transverse-bars'
import { needsOf, unmetOf } from './verdict'

/** Moved so far into the slab they stand clear of the member's own bars, mm. */
const ASIDE = [0, 35, -35] as const

export interface GroupSteel {
  readonly candidates: readonly Candidate[]
  readonly bars: readonly StraightBar[]
}

export function groupSteel(bench: Bench, { zone, steelZone }: Place, shared: readonly StraightBar[]): GroupSteel {
  const group = groupsOfEdge(bench.context.index, zone.edgeId ?? '').find(({ id }) => id === zone.id)
  const lead = group?.members.find(({ anchor }) => steelZone.kind === 'anchor' && anchor.id === steelZone.anchorId)
  const plan = unmetOf(needsOf(bench.context, zone)).find((need) => need.plane === 'plan')
  const alone = group && lead && plan ? planNeed(bench, lead, plan) : null
  if (!group || !lead || !alone) return { candidates: [], bars: [] }
  const { along } = outToOut(group.members)
  const aside = Math.abs(lead.anchor.chainage - centreOf(group.members).chainage)
  const reach = Math.max(along.to - lead.anchor.chainage, lead.anchor.chainage - along.from)
  const need = { ...alone, aside, plateWidth: 2 * reach }
  const own = transverseBars(need)
  const sets = [...own, ...shared].flatMap((bar) => transverseSets(need, bar))
  const moved = sets.flatMap((set) => ASIDE.map((by) => ({ ...set, first: set.first + by })))
  return { candidates: moved.map((set) => ({ shapes: [set] })), bars: own }
}
