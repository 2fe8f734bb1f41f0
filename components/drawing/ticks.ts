/** A run of chainage on a drawing: mm at one end and px along it. */
export interface AxisScale {
  readonly fromMm: number
  readonly toMm: number
  /** Position on the drawing, px, of a chainage in mm. May run from right to left. */
  readonly at: (mm: number) => number
}

const STEPS = [1, 2, 5]

/** At most this many ticks on one axis, whatever is asked for. */
const TICKS_MAX = 400

/**
 * Chainages to mark: multiples of 1, 2 or 5 times a power of ten.
 *
 * @param minGapPx least distance between neighbours, px
 * @returns mm, ascending; empty where the run has no length on the drawing
 */
export function ticksOf(scale: AxisScale, minGapPx: number): number[] {
  const length = scale.toMm - scale.fromMm
  const pxPerMm = Math.abs(scale.at(scale.toMm) - scale.at(scale.fromMm)) / length
  if (!(length > 0) || !(pxPerMm > 0) || !Number.isFinite(pxPerMm)) return []
  const step = roundStep(Math.max(minGapPx / pxPerMm, length / TICKS_MAX))
  const first = Math.ceil(scale.fromMm / step)
  const last = Math.floor(scale.toMm / step)
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => (first + index) * step)
}

/** The least of 1, 2, 5, 10, 20, ... that is not below `least`; at least 1 mm. */
export function roundStep(least: number): number {
  const power = 10 ** Math.max(0, Math.floor(Math.log10(least)))
  const times = STEPS.find((each) => each * power >= least) ?? 10
  return Math.max(1, times * power)
}
