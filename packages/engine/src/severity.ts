/** Worst first. */

import { STATUSES, type Check, type Compared, type Status } from './result'

/** The worst status of some checks, in the order of `bySeverity`; null where there is nothing but advice. */
export function worstOf(checks: readonly Check[]): Status | null {
  let worst: Check | null = null
  for (const check of checks) if (worst === null || rankOfCheck(check) < rankOfCheck(worst)) worst = check
  return worst && statusOf(worst)
}

/**
 * Order of two checks: by status, those that need judgement by what they become once accepted; then ratios by ratio,
 * with no steel at all first, then distances by what is short or least to spare. Advice comes last. A check that only
 * waits for something to be entered comes after what is wrong with what is there: a new anchor's missing drape does not
 * hide its missing steel.
 */
export function bySeverity(one: Check, other: Check): number {
  const byStatus = rankOfCheck(one) - rankOfCheck(other)
  if (byStatus !== 0 || one.kind !== 'compared' || other.kind !== 'compared') return byStatus
  return (
    rankOf(one.statusOnceAccepted) - rankOf(other.statusOnceAccepted) ||
    Number(one.compares !== 'ratio') - Number(other.compares !== 'ratio') ||
    badness(other) - badness(one)
  )
}

/** How many checks hold each status. */
export function countStatuses(checks: readonly Check[]): Readonly<Record<Status, number>> {
  const counts: Record<Status, number> = {
    stop: 0,
    'not-covered': 0,
    over: 0,
    'needs-judgement': 0,
    near: 0,
    within: 0,
  }
  for (const check of checks) if (check.kind !== 'advice') counts[check.status] += 1
  return counts
}

const statusOf = (check: Check): Status | null => (check.kind === 'advice' ? null : check.status)

const AFTER_JUDGEMENT = STATUSES.indexOf('needs-judgement') + 0.5

const rankOfCheck = (check: Check): number =>
  check.kind === 'refused' && check.code === 'MISSING_INPUT' ? AFTER_JUDGEMENT : rankOf(statusOf(check))

const rankOf = (status: Status | null): number => (status === null ? STATUSES.length : STATUSES.indexOf(status))

/** Finite, so that two checks without any steel compare as equal. */
function badness({ compares, utilisation, spare }: Compared): number {
  if (compares === 'ratio') return utilisation ?? Number.MAX_VALUE
  return -(spare ?? 0)
}
