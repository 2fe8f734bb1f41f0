/** Force while jacking against the limit of the strand. */

import { jackingForce } from '../force'
import type { StrandType, Tendon } from '../model'
import type { Check } from '../result'
import { byRatio, type CheckContext } from './outcome'

/** Above the limit is over, not refused: the engineer may lower the jacking ratio or choose other strand. */
export function checkJackingForce(
  of: { readonly zoneId: string; readonly tendon: Tendon; readonly strand: StrandType; readonly stage: string | null },
  context: CheckContext,
): Check {
  const force = jackingForce(of.tendon, of.strand)
  const steps = context.basis.jackingLimit(of.strand, of.tendon.strands)
  const limit = steps.at(-1)?.value ?? 0
  const check = byRatio(
    context,
    {
      zoneId: of.zoneId,
      family: 'tendon',
      name: 'Force while jacking',
      plane: null,
      stage: of.stage,
      limitKind: 'C',
      clause: context.basis.clauses.jacking,
      notes: ['The force after lock-off is not yet checked.'],
    },
    { demand: force.value, limit, unit: 'N', steps: [force, ...steps], readings: [] },
  )
  if (check.status !== 'over') return check
  const value = limit / (of.tendon.strands * of.strand.breakingLoad)
  return { ...check, mend: { field: 'tendon.jackingRatio', value } }
}
