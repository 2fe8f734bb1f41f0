import type { Check, Step } from '@wedgeline/engine'
import { clauseText } from '../checks/words'

/** What a step is; the clause is left out where it is the one that the head of the check names. */
export function meaningOf({ meaning, clause }: Step, check: Check): string {
  const own = clauseText(clause)
  return own === clauseText(check.clause) ? meaning : `${meaning}; ${own}`
}

const PLANE_WORDS = { thickness: 'in the thickness', plan: 'in plan' } as const

/** A check by its name, plane and stage. */
export function nameOf({ name, plane, stage }: Check): string {
  const place = plane === null || name.includes(PLANE_WORDS[plane]) ? '' : ` ${PLANE_WORDS[plane]}`
  return `${name}${place}${stage === null ? '' : `, stage ${stage}`}`
}

/** Plainly within: nothing to decide, and no reading to accept. */
export const isPlain = (check: Check): boolean => check.kind === 'compared' && check.status === 'within'
