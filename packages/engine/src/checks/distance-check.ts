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
export function distanceCheck({ isClearance, demand, limit, ...rest }: DistanceCheck): Compared {
  const spare = demand - limit
  const status = statusOfDistance(spare, isClearance ? demand : undefined)
  return {
    ...rest,
    kind: 'compared',
    plane: null,
    demand,
    limit,
    unit: 'mm',
    compares: 'at-least',
    status,
    statusOnceAccepted: status,
    utilisation: null,
    spare,
    readingId: null,
  }
}
