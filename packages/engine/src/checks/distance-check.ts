/** A distance against the least that is asked for, as a result. */

import type { Compared } from '../result'
import { statusOfDistance } from '../status'
import type { Step } from '../step'
import { comparison } from './outcome'

interface DistanceCheck extends Pick<
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
  return comparison(
    check,
    { demand, limit, unit: 'mm', steps: check.steps },
    {
      compares: 'at-least',
      status,
      statusOnceAccepted: status,
      utilisation: null,
      spare,
      readingIds: [],
      mend: check.mend,
    },
  )
}
