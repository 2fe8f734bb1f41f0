/** Friction along a tendon: its total angle, the exponent of the law, and the pair of coefficients it is worked with. */

import { azimuthOf, distance, subtract } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, JobSettings, Point, Tendon } from '../model'
import { step, type Clause, type Step } from '../step'

const GEOMETRY: Clause = {
  source: 'Geometry of the tendon',
  section: 'sum of its changes of direction',
  tag: 'derived',
}

const INSIDE: Clause = {
  source: 'Friction along a tendon',
  section: 'wobble inside mu (EN 1992-1-1 Eq. 5.45, AS 3600 3.4.2.4)',
  tag: 'memory',
}

const OUTSIDE: Clause = {
  source: 'Friction along a tendon',
  section: 'wobble beside mu (ACI 318-11 18.6.2, JTG 3362 6.2.2)',
  tag: 'memory',
}

/** The nominal pair is the expected one; the low pair leaves the most force behind it, the high pair the least. */
export type PairName = 'nominal' | 'low' | 'high'

export interface FrictionPair {
  readonly family: JobSettings['frictionFamily']
  readonly mu: number
  /** rad/mm where it stands inside the bracket with mu, 1/mm where it stands beside it. */
  readonly wobble: number
}

export function frictionPair(settings: JobSettings, name: PairName): FrictionPair {
  const family = settings.frictionFamily
  switch (name) {
    case 'nominal':
      return { family, mu: settings.frictionMu, wobble: settings.frictionWobble }
    case 'low':
      return { family, mu: settings.frictionMuLow, wobble: settings.frictionWobbleLow }
    case 'high':
      return { family, mu: settings.frictionMuHigh, wobble: settings.frictionWobbleHigh }
  }
}

/** Why no force along the tendon can be worked out: the field, and a sentence that says what would be right. */
export interface NoForce {
  readonly code: 'MISSING_INPUT' | 'OUTSIDE_METHOD'
  readonly field: string
  readonly message: string
}

/** Length and total angle of a tendon between its two ends, mm and rad. */
export interface Course {
  readonly length: number
  readonly angle: number
  readonly steps: readonly Step[]
}

export const isNoForce = <T extends object>(one: T | NoForce): one is NoForce => 'code' in one && 'message' in one

/** The course of a tendon; what is missing where a length, an end or a drape is not entered: none is read as 0. */
export function courseOf(index: LayoutIndex, tendon: Tendon): Course | NoForce {
  const { length, drape, mark } = tendon
  if (length === null) {
    return {
      code: 'MISSING_INPUT',
      field: 'tendon.length',
      message: `The length of tendon ${mark} is not entered. Enter its plan length between the two bearing faces.`,
    }
  }
  const bends = bendsOf(index, tendon)
  if (isNoForce(bends)) return bends
  if (drape === null) {
    return {
      code: 'MISSING_INPUT',
      field: 'tendon.drape',
      message: `The drape of tendon ${mark} is not entered. Enter its total change of angle in height; 0 for a flat tendon.`,
    }
  }
  const plan = planAngle(bends)
  const angle = step(
    { symbol: 'theta', meaning: 'Total change of angle', formula: 'plan + drape', unit: 'rad', clause: GEOMETRY },
    { plan: plan.value, drape },
    (v) => v.plan + v.drape,
  )
  return { length, angle: angle.value, steps: [plan, angle] }
}

/** The exponent of the friction law over a whole tendon. */
export function frictionExponent({ length, angle }: Pick<Course, 'length' | 'angle'>, pair: FrictionPair): Step {
  const line = { symbol: 'u', meaning: 'Exponent of friction over the whole tendon', unit: '-' }
  const values = { mu: pair.mu, theta: angle, k: pair.wobble, L: length }
  return pair.family === 'inside'
    ? step({ ...line, formula: 'mu * (theta + k * L)', clause: INSIDE }, values, (v) => v.mu * (v.theta + v.k * v.L))
    : step({ ...line, formula: 'mu * theta + k * L', clause: OUTSIDE }, values, (v) => v.mu * v.theta + v.k * v.L)
}

/** Force left at the far end of the tendon while it is jacked, N. */
export function forceAfterFriction(jacking: number, exponent: Step): Step {
  return step(
    {
      symbol: 'Pfar',
      meaning: 'Force at the far end after friction',
      formula: 'Pjack * exp(0 - u)',
      unit: 'N',
      clause: exponent.clause,
    },
    { Pjack: jacking, u: exponent.value },
    (v) => v.Pjack * Math.exp(0 - v.u),
  )
}

/** Where an anchor's bearing face stands in plan. */
export function placeInPlan(index: LayoutIndex, anchor: Anchor): Point {
  if (anchor.panId !== null) return found(index.pans, anchor.panId, 'pan')
  return found(index.frames, anchor.edgeId ?? '', 'edge').pointAt(anchor.chainage, anchor.setBack)
}

/** The turn at each bend of the path, rad, from the straight lines before and behind it. */
export function bendsOf(index: LayoutIndex, tendon: Tendon): readonly number[] | NoForce {
  if (tendon.path.length === 0) return []
  const ends = index.anchorsOfTendon.get(tendon.id) ?? []
  const [first, last] = ends
  if (!first || !last || ends.length !== 2) {
    return {
      code: 'MISSING_INPUT',
      field: 'tendon.path',
      message: `Tendon ${tendon.mark} has ${ends.length} of 2 ends: the angle of its path in plan needs both.`,
    }
  }
  const points = pathBetween(placeInPlan(index, first), tendon.path, placeInPlan(index, last))
  const sides = points.slice(1).flatMap((point, i) => {
    const before = points[i]
    return before && distance(before, point) > 0 ? [azimuthOf(subtract(point, before))] : []
  })
  return sides.slice(1).map((azimuth, i) => turnBetween(sides[i] ?? azimuth, azimuth))
}

/** The path is entered from either end: its first bend stands nearer to where it starts. */
function pathBetween(first: Point, path: readonly Point[], last: Point): readonly Point[] {
  const onward = lengthOf([first, ...path, last])
  const back = lengthOf([last, ...path, first])
  return onward <= back ? [first, ...path, last] : [last, ...path, first]
}

const lengthOf = (points: readonly Point[]): number =>
  points.slice(1).reduce((sum, point, i) => sum + distance(points[i] ?? point, point), 0)

function turnBetween(from: number, to: number): number {
  const turn = Math.abs(to - from)
  return Math.min(turn, 2 * Math.PI - turn)
}

function planAngle(bends: readonly number[]): Step {
  const values = Object.fromEntries(bends.map((bend, i) => [`bend${i + 1}`, bend]))
  return step(
    {
      symbol: 'plan',
      meaning: bends.length === 0 ? 'Bends in plan: none, straight between its ends' : 'Bends in plan',
      formula: bends.length === 0 ? '0' : Object.keys(values).join(' + '),
      unit: 'rad',
      clause: GEOMETRY,
    },
    values,
    (v) => Object.values(v).reduce((sum, bend) => sum + bend, 0),
  )
}
