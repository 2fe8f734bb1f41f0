/** The parts of a result that every family fills in the same way. */

import type { Basis } from '../bases/basis'
import type { LayoutIndex } from '../layout-index'
import type { Compared, Refused } from '../result'
import { statusOfDistance, statusOfRatio } from '../status'
import type { Step } from '../step'

/** What every check of a job needs beside its place. */
export interface CheckContext {
  readonly index: LayoutIndex
  readonly basis: Basis
  /** Share of a limit from which a result is called near. */
  readonly nearFrom: number
}

export type Head = Pick<Compared, 'zoneId' | 'family' | 'name' | 'plane' | 'stage' | 'limitKind' | 'clause' | 'notes'>

interface Answer {
  readonly demand: number
  readonly limit: number
  readonly unit: string
  readonly steps: readonly Step[]
}

/** A demand against a limit of strength or steel. `readings` are those that it rests on. */
export function byRatio(
  context: CheckContext,
  head: Head,
  answer: Answer & { readonly readings: readonly string[] },
): Compared {
  const { demand, limit, readings } = answer
  const accepted = statusOfRatio({ demand, limit, nearFrom: context.nearFrom })
  const isOpen = readings.some((id) => !context.basis.isAccepted(id))
  return comparison(head, answer, {
    compares: 'ratio',
    status: isOpen ? 'needs-judgement' : accepted,
    statusOnceAccepted: accepted,
    utilisation: utilisationOf(answer),
    spare: null,
    readingIds: readings,
    mend: null,
  })
}

/** What is there against the least that is asked for, by difference. */
export function atLeast(head: Head, answer: Answer): Compared {
  const spare = answer.demand - answer.limit
  const status = statusOfDistance(spare)
  return comparison(head, answer, {
    compares: 'at-least',
    status,
    statusOnceAccepted: status,
    utilisation: null,
    spare,
    readingIds: [],
    mend: null,
  })
}

type Verdict = Pick<
  Compared,
  'compares' | 'status' | 'statusOnceAccepted' | 'utilisation' | 'spare' | 'readingIds' | 'mend'
>

/** Written out, since spreading a check thousands of times in a pour costs more than the check. */
export function comparison(
  head: Omit<Head, 'plane'> & Partial<Pick<Head, 'plane'>>,
  answer: Answer,
  verdict: Verdict,
): Compared {
  return {
    kind: 'compared',
    zoneId: head.zoneId,
    family: head.family,
    name: head.name,
    plane: head.plane ?? null,
    stage: head.stage,
    limitKind: head.limitKind,
    clause: head.clause,
    notes: head.notes,
    status: verdict.status,
    demand: answer.demand,
    limit: answer.limit,
    unit: answer.unit,
    compares: verdict.compares,
    utilisation: verdict.utilisation,
    spare: verdict.spare,
    steps: answer.steps,
    readingIds: verdict.readingIds,
    statusOnceAccepted: verdict.statusOnceAccepted,
    mend: verdict.mend,
  }
}

export function refusal(head: Head, why: Pick<Refused, 'code' | 'field' | 'message'>): Refused {
  return { ...head, ...why, kind: 'refused', status: 'not-covered' }
}

/** Null where there is nothing to compare with: a demand above 0 is then over, with no number that says by how much. */
function utilisationOf({ demand, limit }: Answer): number | null {
  if (limit > 0) return demand / limit
  return demand > 0 ? null : 0
}
