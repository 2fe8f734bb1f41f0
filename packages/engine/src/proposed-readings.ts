/** What results become on readings that are proposed and that nobody has accepted, as a quick edge shows them. */

import type { Check, PourResult, ZoneResult } from './result'
import { bySeverity, countStatuses, worstOf } from './severity'

/**
 * The result with every check at the status that it has once its readings are accepted, sorted and counted anew. Such a
 * check says so of itself (`isOnProposed`); all others are as they were.
 */
export function onProposedReadings(result: PourResult): PourResult {
  const zones = result.zones.map(zoneOnProposed)
  return { ...result, zones, counts: countStatuses(zones.flatMap(({ checks }) => checks)) }
}

function zoneOnProposed(zone: ZoneResult): ZoneResult {
  if (!zone.checks.some(waits)) return zone
  const checks = zone.checks.map(checkOnProposed).sort(bySeverity)
  return { ...zone, checks, status: worstOf(checks) }
}

const checkOnProposed = (check: Check): Check =>
  check.kind === 'compared' && waits(check) ? { ...check, status: check.statusOnceAccepted, isOnProposed: true } : check

/** Needs judgement for its readings alone: a result that needs it whatever is accepted stays as it is. */
const waits = (check: Check): boolean =>
  check.kind === 'compared' &&
  check.status === 'needs-judgement' &&
  check.statusOnceAccepted !== 'needs-judgement' &&
  check.readingIds.length > 0
