import type { Check, ZoneResult } from '@wedgeline/engine'

export const READING_NOT_ACCEPTED = 'reading not accepted'

/** Whether the status shown is one on a reading that nobody has accepted, as in a quick edge. */
export const isOnProposed = (check: Check): boolean => check.kind === 'compared' && check.isOnProposed === true

/** How many of the checks stand on readings that are not accepted. */
export const countOnProposed = (zones: readonly ZoneResult[]): number =>
  zones.reduce((total, { checks }) => total + checks.filter(isOnProposed).length, 0)
