import { FAMILY_WORDS } from '@wedgeline/engine/result'
import type { Clause, Tag } from '@wedgeline/engine'
import { TAG_WORDS } from '../checks/words'
import type { Method, MethodFamily } from './method'

/** How sure we are of a clause; a distance of the job's own hardware is as sure as what was entered. */
export type Sureness = Tag | 'entered'

/** The surest first. */
export const SURENESS: readonly Sureness[] = [
  'read',
  'digest',
  'secondary',
  'derived',
  'computed',
  'memory',
  'memory-unsure',
  'practice',
  'entered',
]

/** Sources that a job brings itself. */
export const JOB_HARDWARE = 'Hardware or its approval'
export const JOB_JACK = 'Jack of the job'

export const surenessOf = ({ source, tag }: Pick<Clause, 'source' | 'tag'>): Sureness =>
  source === JOB_HARDWARE || source === JOB_JACK ? 'entered' : tag

export function surenessWords(sureness: Sureness): string {
  if (sureness === 'read') return 'read'
  return sureness === 'entered' ? 'as entered in the job' : TAG_WORDS[sureness]
}

export interface SurenessCount {
  readonly sureness: Sureness
  readonly words: string
  readonly count: number
}

/** How many clauses there are of each kind of sureness; kinds without any are left out. */
export const surenessCounts = (clauses: readonly Pick<Clause, 'source' | 'tag'>[]): readonly SurenessCount[] =>
  SURENESS.map((sureness) => ({
    sureness,
    words: surenessWords(sureness),
    count: clauses.filter((clause) => surenessOf(clause) === sureness).length,
  })).filter(({ count }) => count > 0)

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)

export const familyTitle = (family: MethodFamily): string =>
  capital(family === 'schedule' ? 'bar schedule' : FAMILY_WORDS[family])

/** Formulas under the family in which each is used first, in the order in which they stand. */
export function methodsByFamily(
  methods: readonly Method[],
): readonly { readonly family: MethodFamily; readonly list: readonly Method[] }[] {
  const families = [...new Set(methods.map(({ families: [first] }) => first ?? 'schedule'))]
  return families.map((family) => ({
    family,
    list: methods.filter(({ families: [first] }) => (first ?? 'schedule') === family),
  }))
}
