/** A distance against the least that is asked for, as a result. */

import type { Compared } from '../result'
import { statusOfDistance } from '../status'
import type { Step } from '../step'

export interface DistanceCheck extends Pick<
  Compared,
  'zoneId' | 'family' | 'name' | 'stage' | 'limitKind' | 'clause' | 'notes'
> {
  readonly demand: number
  readonly limit: number
  /** Clear concrete between solid bodies or from a body to a face: none left is a stop. */
  readonly isClearance: boolean
  readonly steps: readonly Step[]
  readonly mend: Compared['mend']
}

/** Compares in mm: `demand` is what is there, `limit` the least. Never near, and decided on the full number. */
export function distanceCheck(check: DistanceCheck): Compared {
  const { demand, limit } = check
  const spare = demand - limit
  const status = statusOfDistance(spare, check.isClearance ? demand : undefined)
  // Written out, since spreading a check thousands of times in a pour costs more than the check.
  return {
    kind: 'compared',
    zoneId: check.zoneId,
    family: check.family,
    name: check.name,
    plane: null,
    stage: check.stage,
    limitKind: check.limitKind,
    clause: check.clause,
    notes: check.notes,
    status,
    demand,
    limit,
    unit: 'mm',
    compares: 'at-least',
    utilisation: null,
    spare,
    steps: check.steps,
    readingIds: [],
    statusOnceAccepted: status,
    mend: check.mend,
  }
}
