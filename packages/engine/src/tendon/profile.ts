/** Force along a whole tendon: while jacked, after lock-off, and its elongation. */

import { jackingForce } from '../force'
import { found, type LayoutIndex } from '../layout-index'
import { perConcrete } from '../memo'
import type { Anchor, Tendon } from '../model'
import { step, type Clause, type Step } from '../step'
import { drawIn, type DrawIn } from './draw-in'
import {
  courseOf,
  frictionExponent,
  frictionPair,
  isNoForce,
  type Course,
  type NoForce,
  type PairName,
} from './friction'

const STRAIN: Clause = { source: 'Statics', section: 'strain summed along the tendon', tag: 'derived' }

/** A tendon's forces with one pair of friction coefficients. Places count from `ends[0]`, mm; forces in N. */
export interface TendonForces {
  /** A live end stands first. */
  readonly ends: readonly [Anchor, Anchor]
  readonly length: number
  readonly jackedAt: (place: number) => number
  readonly lockedAt: (place: number) => number
  /** Where the diagram after lock-off turns, growing, both ends among them. */
  readonly turns: readonly number[]
  /** Total over both ends while jacked, mm; `net` less the draw-in. */
  readonly elongation: number
  readonly net: number
  /** Live anchors whose draw-in is felt as far as the other end. */
  readonly wholeDrawIn: readonly string[]
  readonly steps: {
    readonly friction: readonly Step[]
    /** By anchor: for each live end its draw-in. */
    readonly drawIn: ReadonlyMap<string, readonly Step[]>
    readonly elongation: Step
  }
}

/** Force diagram for a screen: plain data, with the high pair beside the nominal one. */
export interface ForceProfile {
  readonly tendonId: string
  /** The anchor that `at` counts from, and the one at the other end. */
  readonly fromAnchorId: string
  readonly toAnchorId: string
  readonly length: number
  readonly nominal: ProfileLine
  readonly high: ProfileLine
}

interface ProfileLine {
  readonly points: readonly { readonly at: number; readonly jacked: number; readonly locked: number }[]
  readonly elongation: number
}

/** Even steps in which a diagram is drawn, beside the places at which it turns. */
const DRAWN_STEPS = 24

/** Force diagram of one tendon, or why there is none. @throws where no tendon has the id. */
export function forceProfile(index: LayoutIndex, tendonId: string): ForceProfile | NoForce {
  const nominal = tendonForces(index, tendonId, 'nominal')
  if (isNoForce(nominal)) return nominal
  const high = tendonForces(index, tendonId, 'high')
  if (isNoForce(high)) return high
  const [from, to] = nominal.ends
  return {
    tendonId,
    fromAnchorId: from.id,
    toAnchorId: to.id,
    length: nominal.length,
    nominal: lineOf(nominal),
    high: lineOf(high),
  }
}

/** One function for each pair, so that what they have made can be carried over. */
export const forcesKept: Readonly<Record<PairName, (index: LayoutIndex, tendonId: string) => TendonForces | NoForce>> =
  {
    nominal: perConcrete((index, tendonId) => forcesOf(index, found(index.tendons, tendonId, 'tendon'), 'nominal')),
    low: perConcrete((index, tendonId) => forcesOf(index, found(index.tendons, tendonId, 'tendon'), 'low')),
    high: perConcrete((index, tendonId) => forcesOf(index, found(index.tendons, tendonId, 'tendon'), 'high')),
  }

/** Forces of one tendon, all stages done, or why there are none. @throws where no tendon has the id. */
export const tendonForces = (index: LayoutIndex, tendonId: string, pair: PairName): TendonForces | NoForce =>
  forcesKept[pair](index, tendonId)

/**
 * Forces that are not exceeded at a live end whatever the tendon's drape is: bends in plan and wobble alone. More friction makes draw-in be felt over less length, so that it takes more force at the anchor.
 */
export const mostForces = (index: LayoutIndex, tendon: Tendon): TendonForces | NoForce =>
  forcesOf(index, { ...tendon, drape: 0 }, 'nominal')

function forcesOf(index: LayoutIndex, tendon: Tendon, pair: PairName): TendonForces | NoForce {
  const ends = endsOf(index, tendon)
  if (isNoForce(ends)) return ends
  const course = courseOf(index, tendon)
  if (isNoForce(course)) return course
  const live = tendon.stressedFrom === 'both-ends' ? ends : ends.slice(0, 1)
  return alongTendon({ index, tendon, ends, live, course, pair })
}

/** Both ends of a tendon, a live one first; refused where its ends and how it is stressed do not agree. */
export function endsOf(index: LayoutIndex, tendon: Tendon): readonly [Anchor, Anchor] | NoForce {
  const { mark, stressedFrom } = tendon
  const anchors = index.anchorsOfTendon.get(tendon.id) ?? []
  const [first, second] = [...anchors].sort((a, b) => Number(a.end === 'dead') - Number(b.end === 'dead'))
  if (!first || !second || anchors.length !== 2) {
    const message = `Tendon ${mark} has ${anchors.length} of 2 ends. Enter an anchor at each end.`
    return { code: 'MISSING_INPUT', field: 'anchors', message }
  }
  const live = anchors.filter(({ end }) => end === 'live').length
  const wanted = stressedFrom === 'both-ends' ? 2 : 1
  if (live === wanted) return [first, second]
  const message =
    `Tendon ${mark} is stressed from ${wanted === 2 ? 'both ends' : 'one end'} and has ${live} live ` +
    `${live === 1 ? 'end' : 'ends'}. Give it ${wanted}, or change how it is stressed.`
  return { code: 'OUTSIDE_METHOD', field: 'tendon.stressedFrom', message }
}

interface Along {
  readonly index: LayoutIndex
  readonly tendon: Tendon
  readonly ends: readonly [Anchor, Anchor]
  readonly live: readonly Anchor[]
  readonly course: Course
  readonly pair: PairName
}

function alongTendon(of: Along): TendonForces | NoForce {
  const { index, tendon, course } = of
  const { length: L } = course
  const strand = found(index.strandTypes, tendon.strandTypeId, 'strand type')
  const jacking = jackingForce(tendon, strand)
  const exponent = frictionExponent(course, frictionPair(index.layout.job.settings, of.pair))
  const [P0, u, E, A] = [jacking.value, exponent.value, strand.modulus, tendon.strands * strand.area]
  const drawn = of.live.map((anchor) => {
    const w = found(index.hardware, anchor.hardwareId, 'hardware').drawIn
    return { anchor, w, at: drawIn({ P0, u, L, w, E, A }) }
  })
  const slack = drawn.find(({ at }) => at.locked <= 0)
  if (slack) return noForceLeft(tendon, slack.w)
  const lambda = u / L
  const jackedFrom = (place: number) => P0 * Math.exp(-lambda * place)
  const lockedFrom = (one: DrawIn, place: number) =>
    place < one.reach || one.isWhole ? one.locked * Math.exp(lambda * place) : jackedFrom(place)
  const fromBoth = (at: (end: number, place: number) => number, place: number) =>
    Math.max(...drawn.map((_, end) => at(end, end === 0 ? place : L - place)))
  const elongation = elongationStep({ P0, u, L, E, A }, drawn.length)
  return {
    ends: of.ends,
    length: L,
    jackedAt: (place) => fromBoth((_, from) => jackedFrom(from), place),
    lockedAt: (place) => fromBoth((end, from) => lockedFrom(drawn[end]?.at ?? NOT_DRAWN, from), place),
    turns: turnsOf(
      drawn.map(({ at }) => at),
      L,
    ),
    elongation: elongation.value,
    net: elongation.value - drawn.reduce((sum, { w }) => sum + w, 0),
    wholeDrawIn: drawn.flatMap(({ anchor, at }) => (at.isWhole ? [anchor.id] : [])),
    steps: {
      friction: [jacking, ...course.steps, exponent],
      drawIn: new Map(drawn.map(({ anchor, at }) => [anchor.id, at.steps])),
      elongation,
    },
  }
}

const NOT_DRAWN: DrawIn = { reach: 0, isWhole: false, locked: 0, steps: [] }

function noForceLeft({ mark }: Tendon, w: number): NoForce {
  const message = `A draw-in of ${w} mm takes the whole force out of tendon ${mark}, which is too short for it.`
  return { code: 'OUTSIDE_METHOD', field: 'tendon.length', message }
}

/** From both ends the larger of two forces counts at each place; equal jacking forces meet in the middle. */
function turnsOf(drawn: readonly DrawIn[], L: number): readonly number[] {
  const [first, second] = drawn.map(({ reach }) => reach)
  const places = [0, first ?? 0, ...(second === undefined ? [] : [L / 2, L - second]), L]
  return [...new Set(places)].sort((a, b) => a - b)
}

interface Strained {
  readonly P0: number
  readonly u: number
  readonly L: number
  readonly E: number
  readonly A: number
}

/** The mean of an exponential: P0 (1 - e^-u) / u; from both ends each half has half the exponent. */
function elongationStep({ P0, u, L, E, A }: Strained, ends: number): Step {
  const line = { symbol: 'dL', unit: 'mm', clause: STRAIN }
  const meaning = ends === 1 ? 'Elongation while jacking' : 'Elongation while jacking, both ends together'
  if (u < 1e-9) {
    return step(
      { ...line, meaning: `${meaning}, without friction`, formula: 'P0 * L / (E * A)' },
      { P0, L, E, A },
      (v) => (v.P0 * v.L) / (v.E * v.A),
    )
  }
  return step(
    { ...line, meaning, formula: 'P0 * (1 - exp(0 - u / n)) / (u / n) * L / (E * A)' },
    { P0, u, n: ends, L, E, A },
    (v) => (((v.P0 * (1 - Math.exp(0 - v.u / v.n))) / (v.u / v.n)) * v.L) / (v.E * v.A),
  )
}

function lineOf(forces: TendonForces): ProfileLine {
  const even = Array.from({ length: DRAWN_STEPS + 1 }, (_, i) => (i * forces.length) / DRAWN_STEPS)
  const places = [...new Set([...even, ...forces.turns])].sort((a, b) => a - b)
  return {
    points: places.map((at) => ({ at, jacked: forces.jackedAt(at), locked: forces.lockedAt(at) })),
    elongation: forces.elongation,
  }
}
