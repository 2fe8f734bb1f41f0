/**
 * An endless row of equal anchors at one spacing on a straight face, by linear elasticity.
 *
 * The stress along the face is sigma = - sum p_n (1 - k x) e^(-k x) cos(k y) with p_n = 2 P / (n pi a t) sin(n pi a / s)
 * and k = 2 pi n / s. From a depth x inwards its resultant is sum p_n x e^(-k x) cos(k y), which is greatest where the
 * stress changes its sign. On an anchor's line (y = 0) and midway (y = s / 2) the sum has a closed form, since
 * sum e^(-n z) sin(n b) / n = atan(sin b / (e^z - cos b)).
 */

import { step, type Clause, type Step } from './step'

export const ROW: Clause = {
  source: 'Elastic theory',
  section: 'endless row of equal anchors, exact series',
  tag: 'computed',
}

/** What a row gives at one place along the face. */
export interface RowTension {
  /** Depth at which the stress along the face changes its sign, over the spacing. */
  readonly depthShare: number
  /** Resultant of the tension, over one anchor's force. */
  readonly share: number
}

/** Tension at the face midway between two anchors; `ratio` is plate over spacing, above 0 and below 1. */
export const tensionMidway = (ratio: number): RowTension => greatest((depth) => midway(depth, ratio))

/** Tension inside the slab on an anchor's line, as far as it reaches inwards. */
export const tensionOnLine = (ratio: number): RowTension => greatest((depth) => onLine(depth, ratio))

function midway(depth: number, ratio: number): number {
  const b = Math.PI * ratio
  return ((2 * depth) / b) * Math.atan(Math.sin(b) / (Math.exp(2 * Math.PI * depth) + Math.cos(b)))
}

function onLine(depth: number, ratio: number): number {
  const b = Math.PI * ratio
  return ((2 * depth) / b) * Math.atan(Math.sin(b) / (Math.exp(2 * Math.PI * depth) - Math.cos(b)))
}

const ROUNDS = 40
const GOLDEN = (Math.sqrt(5) - 1) / 2

/** By golden section: both sums rise once and fall once, and have done so within half a spacing. */
function greatest(of: (depth: number) => number): RowTension {
  let [low, high] = [0, 0.5]
  for (let round = 0; round < ROUNDS; round++) {
    const [first, second] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)]
    if (of(first) < of(second)) low = first
    else high = second
  }
  const depthShare = (low + high) / 2
  return { depthShare, share: of(depthShare) }
}

/** Face force midway between two anchors of a row, N, from the force of one of them. */
export function faceForce({
  P,
  a,
  s,
}: {
  readonly P: number
  readonly a: number
  readonly s: number
}): readonly Step[] {
  const depth = step(
    {
      symbol: 'xFace',
      meaning: 'Depth over which the face is in tension midway, where the sum is greatest',
      formula: 'r * s',
      unit: 'mm',
      clause: ROW,
    },
    { r: tensionMidway(a / s).depthShare, s },
    (v) => v.r * v.s,
  )
  const force = step(
    {
      symbol: 'T',
      meaning: 'Force along the face midway between the anchors, all stressed',
      formula: '2 * P * xFace / (pi * a) * atan(sin(pi * a / s) / (exp(2 * pi * xFace / s) + cos(pi * a / s)))',
      unit: 'N',
      clause: ROW,
    },
    { P, xFace: depth.value, pi: Math.PI, a, s },
    (v) =>
      ((2 * v.P * v.xFace) / (v.pi * v.a)) *
      Math.atan(Math.sin((v.pi * v.a) / v.s) / (Math.exp((2 * v.pi * v.xFace) / v.s) + Math.cos((v.pi * v.a) / v.s))),
  )
  return [depth, force]
}
