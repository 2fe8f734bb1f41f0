/** Whether steel in a zone does, by the zone's own checks. */

import { CHECKS_OF_FAMILY, FAMILIES_OF_ZONE } from '../checks/families'
import { fitChecksOfTrial } from '../checks/fit'
import type { CheckContext } from '../checks/outcome'
import { found, type LayoutIndex } from '../layout-index'
import { perConcrete } from '../memo'
import type { Check, Compared, Family, Zone } from '../result'
import { bySeverity, worstOf } from '../severity'
import { zonesOfPour } from '../zones'
import type { WorstCheck } from './proposal'

/** Families that ask for steel, then those that ask whether it holds and can be fixed: the quick ones first. */
const NEEDS: readonly Family[] = [
  'bursting-thickness',
  'bursting-plan',
  'dead-end',
  'spalling',
  'edge-wedge',
  'joint',
  'pan-bars',
]
const HOLDS: readonly Family[] = ['anchorage', 'fit']

/** Where checks are asked: the whole layout, and for the fit of bars that are tried the part round their zone. */
export interface Ground {
  readonly context: CheckContext
  /** Null checks the fit in the whole layout. */
  readonly near: { readonly trial: LayoutIndex; readonly settled: LayoutIndex; readonly zone: Zone } | null
}

const ofZone = ({ kind }: Zone, families: readonly Family[]): readonly Family[] =>
  families.filter((family) => FAMILIES_OF_ZONE[kind].includes(family))

/** Face tension at anchors and gaps is met by the bars along their edge: its needs are the edge's. */
const zonesBeside = perConcrete((index, edgeId): readonly Zone[] => {
  const { pourId } = found(index.edges, edgeId, 'edge')
  return zonesOfPour(index, pourId).filter(
    (zone) => zone.edgeId === edgeId && (zone.kind === 'anchor' || zone.kind === 'gap'),
  )
})

function checksOf(context: CheckContext, zone: Zone, families: readonly Family[]): Check[] {
  return ofZone(zone, families).flatMap((family) => ofFamily(context, zone, family))
}

function ofFamily(context: CheckContext, zone: Zone, family: Family): readonly Check[] {
  const make = CHECKS_OF_FAMILY[family]
  if (family !== 'spalling') return make(context, zone) ?? []
  if (zone.kind !== 'edge') return []
  return zonesBeside(context.index, zone.edgeId ?? '').flatMap((beside) => make(context, beside) ?? [])
}

/** A comparison of steel: its demand falls to nobody but the bars of the zone. */
export const isNeed = (check: Check): check is Compared =>
  check.kind === 'compared' && check.compares === 'ratio' && check.unit.startsWith('mm2')

const isMet = ({ statusOnceAccepted }: Compared): boolean =>
  statusOnceAccepted === 'within' || statusOnceAccepted === 'near'

/** Needs of a zone, met or not. */
export const needsOf = (context: CheckContext, zone: Zone): readonly Compared[] =>
  checksOf(context, zone, NEEDS).filter(isNeed)

export const unmetOf = (needs: readonly Compared[]): readonly Compared[] => needs.filter((check) => !isMet(check))

/** What was wrong with a zone's bars before anything was tried: it cannot be held against a candidate. */
export function faultsBefore(ground: Ground, zone: Zone): ReadonlySet<string> {
  const faults = ofZone(zone, HOLDS)
    .flatMap((family) => held(ground, zone, family))
    .filter((check) => check.kind === 'compared' && !isMet(check))
  return new Set(faults.map(signOf))
}

const signOf = (check: Check): string =>
  check.kind === 'compared' ? `${check.family}|${check.name}|${check.demand}|${check.limit}` : ''

/** The first check that stops steel in a zone; null where it passes them all. */
export function stoppedBy(ground: Ground, zone: Zone, before: ReadonlySet<string>): Compared | null {
  for (const family of ofZone(zone, NEEDS)) {
    const stopped = ofFamily(ground.context, zone, family).find((check) => isNeed(check) && !isMet(check))
    if (stopped?.kind === 'compared') return stopped
  }
  return heldBy(ground, zone, before)
}

/** The first check of anchorage, laps and fit that stops steel in a zone. */
export function heldBy(ground: Ground, zone: Zone, before: ReadonlySet<string>): Compared | null {
  for (const family of ofZone(zone, HOLDS)) {
    const stopped = held(ground, zone, family).find(
      (check) => check.kind === 'compared' && !isMet(check) && !before.has(signOf(check)),
    )
    if (stopped?.kind === 'compared') return stopped
  }
  return null
}

function held({ context, near }: Ground, zone: Zone, family: Family): readonly Check[] {
  if (family !== 'fit' || near === null) return ofFamily(context, zone, family)
  return fitChecksOfTrial(near.trial, near.zone, near.settled)
}

/** The worst of a zone's checks on which its bars bear. */
export function worstCheck(context: CheckContext, zone: Zone): WorstCheck | null {
  const checks = [...checksOf(context, zone, [...NEEDS, ...HOLDS])].sort(bySeverity)
  const status = worstOf(checks)
  const [worst] = checks
  if (status === null || !worst || worst.kind === 'advice') return null
  return { name: worst.name, status, by: worst.kind === 'refused' ? worst.message : outBy(worst) }
}

/** How a comparison stands, in words. */
export function outBy({ compares, demand, limit, unit, utilisation, spare }: Compared): string {
  if (compares !== 'ratio') {
    const by = Math.round((spare ?? 0) * 10) / 10
    return by < 0 ? `short by ${-by} ${unit}` : `spare ${by} ${unit}`
  }
  if (utilisation === null) return `${Math.ceil(demand)} ${unit} asked for, none there`
  // A ratio shows rounded up, so that 1.00 never stands for more.
  return `${(Math.ceil(utilisation * 100 - 1e-9) / 100).toFixed(2)}: ${Math.round(demand)} of ${Math.round(limit)} ${unit}`
}
