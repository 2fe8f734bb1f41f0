import type { LayoutFile } from './layout'
import { anchorProblems } from './problems/anchors'
import { edgeProblems } from './problems/edges'
import { jobFactorProblems } from './problems/factors'
import { hardwareProblems } from './problems/hardware'
import { nameProblems } from './problems/names'
import { pourProblems } from './problems/pours'
import type { Problem } from './problems/problem'
import { referenceProblems } from './problems/references'
import { steelProblems } from './problems/steel'
import { stopProblems } from './problems/stops'
import { timeZoneProblems } from './problems/time-zone'

export { fieldOf, type Problem } from './problems/problem'
export { hardwareProblems } from './problems/hardware'
export { isTimeZone } from './problems/time-zone'
export { alongLine } from './problems/outline'

/**
 * Everything that a layout of the right shape may still have wrong. A problem that is `refused` contradicts the
 * layout itself and nothing may be stored; a `stop` is kept as typed.
 */
export function layoutProblems(layout: LayoutFile): Problem[] {
  return [
    ...nameProblems(layout),
    ...timeZoneProblems(layout),
    ...jobFactorProblems(layout),
    ...referenceProblems(layout),
    ...pourProblems(layout),
    ...edgeProblems(layout),
    ...hardwareProblems(layout),
    ...anchorProblems(layout),
    ...steelProblems(layout),
    ...stopProblems(layout),
  ]
}
