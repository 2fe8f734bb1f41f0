import { STATUSES } from '@wedgeline/engine/result'
import type { Status, ZoneResult } from '@wedgeline/engine'

/** How many of something stand at each status. */
export type Counts = Readonly<Record<Status, number>>

/** Statuses that something has, worst first. */
export const statusesIn = (counts: Counts): readonly Status[] => STATUSES.filter((status) => counts[status] > 0)

/** Checks of some zones by status; advice has none. */
export const countChecks = (zones: readonly ZoneResult[]): Counts =>
  countOf(zones.flatMap(({ checks }) => checks.map((check) => (check.kind === 'advice' ? null : check.status))))

/** Zones by the status of their worst check. */
export const countZones = (zones: readonly ZoneResult[]): Counts => countOf(zones.map(({ status }) => status))

function countOf(statuses: readonly (Status | null)[]): Counts {
  const counts = { stop: 0, 'not-covered': 0, over: 0, 'needs-judgement': 0, near: 0, within: 0 }
  for (const status of statuses) if (status !== null) counts[status] += 1
  return counts
}
