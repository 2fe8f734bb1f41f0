/** Force while jacking and after lock-off against the limits of the strand. */

import { jackingForce } from '../force'
import { found } from '../layout-index'
import type { Anchor, StrandType, Tendon } from '../model'
import type { Check, Compared } from '../result'
import type { Step } from '../step'
import { isNoForce } from '../tendon/friction'
import { mostForces, tendonForces, type TendonForces } from '../tendon/profile'
import { byRatio, refusal, type CheckContext, type Head } from './outcome'

interface AtAnchor {
  readonly zoneId: string
  readonly anchor: Anchor
  readonly tendon: Tendon
  readonly strand: StrandType
  readonly stage: string | null
}

/** Checks of the tendon's force at a live anchor; a dead end is not jacked and nothing is compared there. */
export function forceChecks(context: CheckContext, zoneId: string, anchor: Anchor): readonly Check[] {
  if (anchor.end === 'dead') return []
  const { index } = context
  const tendon = found(index.tendons, anchor.tendonId, 'tendon')
  const strand = found(index.strandTypes, tendon.strandTypeId, 'strand type')
  const stage = found(index.pours, tendon.pourId, 'pour').stages.at(-1)?.name ?? null
  const at = { zoneId, anchor, tendon, strand, stage }
  return [checkJackingForce(at, context), ...checkLockOff(at, context)]
}

function headOf({ zoneId, stage }: AtAnchor, name: string, clause: Head['clause']): Head {
  return { zoneId, family: 'tendon', name, plane: null, stage, limitKind: 'C', clause, notes: [] }
}

/** Above the limit is over, not refused: the engineer may lower the jacking ratio or choose other strand. */
function checkJackingForce(of: AtAnchor, context: CheckContext): Compared {
  const force = jackingForce(of.tendon, of.strand)
  const steps = context.basis.jackingLimit(of.strand, of.tendon.strands)
  const limit = steps.at(-1)?.value ?? 0
  const check = byRatio(context, headOf(of, 'Force while jacking', context.basis.clauses.jacking), {
    demand: force.value,
    limit,
    unit: 'N',
    steps: [force, ...steps],
    readings: [],
  })
  if (check.status !== 'over') return check
  const value = limit / (of.tendon.strands * of.strand.breakingLoad)
  return { ...check, mend: { field: 'tendon.jackingRatio', value } }
}

/**
 * Force left at the anchor once its wedges have drawn in.
 *
 * Without the drape it is still known not to be more than with bends and wobble alone: within the limit by that it is
 * within; beyond it nothing can be said, and the check is not covered. A basis without such a limit has no check.
 */
function checkLockOff(of: AtAnchor, context: CheckContext): readonly Check[] {
  const limits = context.basis.lockOffLimit?.(of.strand, of.tendon.strands)
  return limits ? [lockOffAgainst(limits, of, context)] : []
}

function lockOffAgainst(limits: readonly Step[], of: AtAnchor, context: CheckContext): Check {
  const limit = limits.at(-1)
  const head = headOf(of, 'Force after lock-off', limit?.clause ?? context.basis.clauses.jacking)
  const answer = (forces: TendonForces, notes: readonly string[]): Compared =>
    byRatio(
      context,
      { ...head, notes: [...notes, ...reachNote(of, forces)] },
      {
        demand: forces.lockedAt(placeOf(of.anchor, forces)),
        limit: limit?.value ?? 0,
        unit: 'N',
        steps: [...forces.steps.friction, ...(forces.steps.drawIn.get(of.anchor.id) ?? []), ...limits],
        readings: [],
      },
    )
  const forces = tendonForces(context.index, of.tendon.id, 'nominal')
  if (!isNoForce(forces)) return answer(forces, lowNote(of, context))
  if (forces.field !== 'tendon.drape') return refusal(head, forces)
  const most = mostForces(context.index, of.tendon)
  if (isNoForce(most)) return refusal(head, most)
  const bound = answer(most, [
    `${forces.message} Counted here with bends in plan and wobble alone: whatever the drape, the force is not more.`,
  ])
  return bound.status === 'over' ? refusal(head, forces) : bound
}

const placeOf = (anchor: Anchor, { ends, length }: TendonForces): number => (ends[0].id === anchor.id ? 0 : length)

const kN = (force: number): string => (force / 1000).toFixed(1)

/** The low pair leaves the most at the anchor. */
function lowNote({ anchor, tendon }: AtAnchor, { index }: CheckContext): readonly string[] {
  const low = tendonForces(index, tendon.id, 'low')
  if (isNoForce(low)) return []
  return [
    `With the lowest credible friction ${kN(low.lockedAt(placeOf(anchor, low)))} kN, with the nominal pair as shown.`,
  ]
}

function reachNote({ anchor }: AtAnchor, forces: TendonForces): readonly string[] {
  const isWhole = forces.wholeDrawIn.includes(anchor.id)
  return isWhole ? ['Draw-in is felt as far as the other end, where the force falls as well.'] : []
}
