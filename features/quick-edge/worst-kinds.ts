import { STATUSES } from '@wedgeline/engine/result'
import type { Check, Status, ZoneResult } from '@wedgeline/engine'
import { isOnProposed } from '../checks/proposed'
import { outcomeText } from '../checks/words'

/** Checks of one name and status, by the worst of them. */
export interface WorstKind {
  readonly name: string
  readonly status: Status
  /** Figure of the worst, or why the method does not answer. */
  readonly words: string
  /** Zone of the worst, and how many others are like it. */
  readonly place: string
  readonly isOnProposed: boolean
}

type Counted = Exclude<Check, { readonly kind: 'advice' }>

/** What is not within, worst first, one line for checks that say the same of several places. */
export function worstKinds(zones: readonly ZoneResult[]): readonly WorstKind[] {
  const kinds = new Map<string, { first: Counted; zone: string; count: number }>()
  for (const { zone, checks } of zones) {
    for (const check of checks) {
      if (check.kind === 'advice' || check.status === 'within') continue
      const key = `${check.status} ${check.family} ${check.name}`
      const known = kinds.get(key)
      if (!known) kinds.set(key, { first: check, zone: zone.name, count: 1 })
      else {
        known.count += 1
        if (isWorse(check, known.first)) Object.assign(known, { first: check, zone: zone.name })
      }
    }
  }
  return [...kinds.values()]
    .map(({ first, zone, count }): WorstKind => ({
      name: first.name,
      status: first.status,
      words: first.kind === 'refused' ? first.message : outcomeText(first),
      place: count === 1 ? zone : `${zone} and ${count - 1} more`,
      isOnProposed: isOnProposed(first),
    }))
    .sort((one, other) => rank(one.status) - rank(other.status))
}

const rank = (status: Status): number => STATUSES.indexOf(status)

function isWorse(one: Counted, other: Counted): boolean {
  if (one.kind !== 'compared' || other.kind !== 'compared') return false
  if (one.compares === 'ratio') return (one.utilisation ?? Infinity) > (other.utilisation ?? Infinity)
  return (one.spare ?? 0) < (other.spare ?? 0)
}
