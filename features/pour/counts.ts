import { STATUSES } from '@wedgeline/engine/result'
import type { Status, ZoneResult } from '@wedgeline/engine'

/** Worst first. */
export const SHOWN_COUNTS: readonly Status[] = STATUSES

/** How many checks of some zones have each status. */
export function countsOf(zones: readonly ZoneResult[]): Readonly<Record<Status, number>> {
  const counts = { stop: 0, 'not-covered': 0, over: 0, 'needs-judgement': 0, near: 0, within: 0 }
  for (const { checks } of zones) {
    for (const check of checks) {
      if (check.kind !== 'advice') counts[check.status] += 1
    }
  }
  return counts
}
