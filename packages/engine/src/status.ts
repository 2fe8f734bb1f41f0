/** The one place that turns a comparison into a status. */

import { ROUNDING } from './geometry'
import type { Status } from './result'

/** Given to a comparison; "not covered" belongs to refusals and "needs judgement" to readings. */
type Comparison = Extract<Status, 'stop' | 'over' | 'near' | 'within'>

/**
 * Status of a distance, in mm. Distances are never near.
 *
 * @param spare what is left over: what is there less what is asked for; negative is short.
 * @param clearance clear concrete between solid bodies, or from a body to a face of the concrete: none or less is a
 *   stop, for two bodies stand in one place or one stands outside the concrete. Left out where nothing solid is meant.
 */
export function statusOfDistance(spare: number, clearance = Infinity): Comparison {
  if (clearance <= ROUNDING) return 'stop'
  return spare < -ROUNDING ? 'over' : 'within'
}

/** Status of strength or steel: over is decided on the full number, near from the job's share of the limit. */
export function statusOfRatio(of: {
  readonly demand: number
  readonly limit: number
  readonly nearFrom: number
}): Comparison {
  const { demand, limit, nearFrom } = of
  if (demand > limit) return 'over'
  return demand > 0 && demand >= nearFrom * limit ? 'near' : 'within'
}
