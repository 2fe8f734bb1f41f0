import type { Method, MethodFamily } from './method'
import { surenessOf, type Sureness } from './method-words'

/** What narrows the list; null leaves it whole. Values that nothing has leave nothing. */
export interface MethodFilter {
  readonly basis: string | null
  readonly family: MethodFamily | null
  readonly sureness: Sureness | null
}

/** The methods that are asked for, each with those of its clauses that are; the schedule belongs to every basis. */
export function narrowed(methods: readonly Method[], filter: MethodFilter): readonly Method[] {
  return methods.flatMap((method) => {
    if (filter.family !== null && !method.families.includes(filter.family)) return []
    const clauses = method.clauses.filter(
      (clause) =>
        (filter.basis === null || clause.bases.length === 0 || clause.bases.includes(filter.basis)) &&
        (filter.sureness === null || surenessOf(clause) === filter.sureness),
    )
    return clauses.length === 0 ? [] : [{ ...method, clauses }]
  })
}
