/** How much of a straight bar counts where it is not developed in full. */

import type { Anchorage } from '../bases/basis'

/** Share of its area with which a bar counts that runs `past` mm beyond a line: nothing below the least length. */
export function developedShare(past: number, { length, least }: Pick<Anchorage, 'length' | 'least'>): number {
  if (past >= length) return 1
  return past < least ? 0 : past / length
}
