import { STATUSES } from '@wedgeline/engine/result'
import type { Check, Family, PourResult, Status, ZoneResult } from '@wedgeline/engine'

/** Checks of one zone that a filter leaves, worst first as the engine gives them. */
export interface ZoneRow {
  readonly result: ZoneResult
  readonly checks: readonly Check[]
}

const severity = ({ status }: ZoneResult): number => (status === null ? STATUSES.length : STATUSES.indexOf(status))

/** Zones with at least one check of a status, or with any check at all for null; worst zones first. */
export function zoneRows({ zones }: PourResult, status: Status | null): readonly ZoneRow[] {
  const rows = zones.map((result): ZoneRow => ({
    result,
    checks: status === null ? result.checks : result.checks.filter((check) => statusOf(check) === status),
  }))
  return rows.filter(({ checks }) => checks.length > 0).sort((a, b) => severity(a.result) - severity(b.result))
}

const statusOf = (check: Check): Status | null => (check.kind === 'advice' ? null : check.status)

/** Families that some zone of the pour was not checked for, with how many zones. */
export function notYetByFamily({ zones }: PourResult): readonly { readonly family: Family; readonly zones: number }[] {
  const counts = new Map<Family, number>()
  for (const family of zones.flatMap((zone) => zone.notYetChecked)) counts.set(family, (counts.get(family) ?? 0) + 1)
  return [...counts].map(([family, count]) => ({ family, zones: count }))
}

/** Readings that checks of the pour rest on and that no engineer has accepted yet, with how many checks wait for each. */
export function waitingReadings(
  { zones }: PourResult,
  accepted: ReadonlySet<string>,
): readonly { readonly readingId: string; readonly checks: number }[] {
  const counts = new Map<string, number>()
  for (const check of zones.flatMap((zone) => zone.checks)) {
    if (check.kind !== 'compared' || check.status !== 'needs-judgement') continue
    for (const id of check.readingIds) {
      if (!accepted.has(id)) counts.set(id, (counts.get(id) ?? 0) + 1)
    }
  }
  return [...counts].map(([readingId, count]) => ({ readingId, checks: count }))
}

/** The status that the address asks for; null for anything else. */
export const askedStatus = (text: string | undefined): Status | null =>
  STATUSES.find((status) => status === text) ?? null
