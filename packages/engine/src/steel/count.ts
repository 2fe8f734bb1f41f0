import type { Anchorage, Window } from '../bases/basis'
import type { MatLayer, SteelShape } from '../model'
import { step, type Clause, type Step } from '../step'
import { crossingsOf, type CountPlace, type Crossings, type NoCrossing, type Plane } from './crossings'

/** Counting legs is statics; the window comes from the basis. */
const COUNTING: Clause = { source: 'Statics', section: 'legs that cross the plane inside its window', tag: 'derived' }

export interface CountInput {
  readonly plane: Plane
  readonly window: Window
  readonly place: CountPlace
  /** Of `setsAcross` for the same plane and place: the same for every window. */
  readonly sets: readonly SetAcross[]
  /** Anchorage that the straight bars of a set need past the line. */
  readonly anchorageOf: (set: Crossings) => Anchorage
}

export type SetAcross = Crossings | NoCrossing

/** @param asides from the plane to the anchor that each shape stands behind, in the same order; without it 0. */
export function setsAcross(of: {
  readonly plane: Plane
  readonly place: CountPlace
  readonly shapes: readonly SteelShape[]
  readonly asides?: readonly number[]
}): readonly SetAcross[] {
  const { plane, place, shapes, asides } = of
  return shapes.map((shape, at) => {
    const aside = asides?.[at] ?? 0
    return crossingsOf(shape, plane, aside === (place.aside ?? 0) ? place : { ...place, aside })
  })
}

export interface Counted {
  /** Area inside the window, mm2. */
  readonly area: number
  /** Area between the bearing face and the window, mm2. */
  readonly beforeWindow: number
  /** A counted set starts within its own pitch of the bearing face, so that it carries on to the face. */
  readonly isCarriedToFace: boolean
  readonly steps: readonly Step[]
  /** Whole sentences: what does not count, and why. */
  readonly notes: readonly string[]
}

interface SetCount {
  readonly line: Step | null
  readonly beforeWindow: number
  readonly isCarriedToFace: boolean
  readonly notes: readonly string[]
}

const NOTHING = { line: null, beforeWindow: 0, isCarriedToFace: false } as const

/**
 * Steel that counts against bursting in one plane behind one anchor, mm2.
 *
 * Each bar counts only where it crosses the plane inside the window behind the bearing face, and a straight bar only
 * as far as its length past the anchor's line develops it.
 */
export function countSteel(input: CountInput): Counted {
  const sets = input.sets.map((set, at) => countSet(set, input, at))
  const mats = input.plane === 'plan' ? input.place.mats.filter(({ spareShare }) => spareShare > 0) : []
  const all = [...sets, ...mats.map((mat, at) => countMat(mat, input, sets.length + at))]
  const lines = all.flatMap(({ line }) => (line ? [line] : []))
  const total = step(
    {
      symbol: 'AsCounted',
      meaning: `Steel counted from ${round(input.window.from)} to ${round(input.window.to)} behind the bearing face`,
      formula: lines.length > 0 ? lines.map(({ symbol }) => symbol).join(' + ') : '0',
      unit: 'mm2',
      clause: COUNTING,
    },
    Object.fromEntries(lines.map(({ symbol, value }) => [symbol, value])),
    (v) => Object.values(v).reduce((sum, value) => sum + value, 0),
  )
  return {
    area: total.value,
    beforeWindow: all.reduce((sum, { beforeWindow }) => sum + beforeWindow, 0),
    isCarriedToFace: all.some(({ isCarriedToFace }) => isCarriedToFace),
    steps: [...lines, total],
    notes: [...new Set(all.flatMap(({ notes }) => notes))],
  }
}

const round = (mm: number): number => Math.round(mm)
const barArea = (diameter: number): number => (Math.PI * diameter ** 2) / 4
const planeName = (plane: Plane): string => (plane === 'plan' ? 'in plan' : 'in the thickness')

function countSet(set: SetAcross, input: CountInput, at: number): SetCount {
  if ('reason' in set) return { ...NOTHING, notes: set.reason === null ? [] : [set.reason] }
  const { window } = input
  let [inside, before] = [0, 0]
  for (const x of set.positions) {
    if (x >= window.from && x <= window.to) inside += 1
    else if (x >= 0 && x < window.from) before += 1
  }
  const { share, note } = developedShare(set, input)
  const notes = [...set.notes, ...outsideNote(set, inside, input), ...(note === null ? [] : [note])]
  const each = set.legs * barArea(set.diameter)
  const beforeWindow = before * each * share
  if (inside === 0 || share === 0) return { ...NOTHING, beforeWindow, notes }
  const line = step(
    {
      symbol: `As${at + 1}`,
      meaning: `${inside} of ${set.positions.length} ${set.noun[1]} of ${set.diameter}, ${set.legs} legs each`,
      formula: 'n * legs * A * share',
      unit: 'mm2',
      clause: COUNTING,
    },
    { n: inside, legs: set.legs, A: barArea(set.diameter), share },
    (v) => v.n * v.legs * v.A * v.share,
  )
  return { line, beforeWindow, isCarriedToFace: startsAtFace(set.positions), notes }
}

function startsAtFace(positions: readonly number[]): boolean {
  let [first, second] = [Infinity, Infinity]
  for (const x of positions) {
    if (x < 0 || x === first || x === second) continue
    if (x < first) [first, second] = [x, first]
    else if (x < second) second = x
  }
  return second < Infinity && first <= second - first
}

/** A straight bar counts in proportion to its length past the line, and not at all below the least length. */
function developedShare(set: Crossings, input: CountInput): { share: number; note: string | null } {
  if (set.pastLine === null) return { share: 1, note: null }
  const { length, least } = input.anchorageOf(set)
  if (set.pastLine >= length) return { share: 1, note: null }
  const past = `${round(set.pastLine)} past the anchor's line`
  if (set.pastLine < least) {
    return { share: 0, note: `The ${set.noun[1]} do not count: ${past}, ${Math.ceil(least)} is the least.` }
  }
  const share = set.pastLine / length
  return { share, note: `The ${set.noun[1]} count with ${share.toFixed(2)}: ${past}, ${Math.ceil(length)} wanted.` }
}

function outsideNote(set: Crossings, inside: number, { window, plane }: CountInput): readonly string[] {
  const { positions, noun } = set
  const outside = positions.length - inside
  if (outside === 0) return []
  const range = `${round(window.from)} to ${round(window.to)} behind the bearing face`
  if (inside === 0) {
    const what = `${outside} ${outside === 1 ? noun[0] : noun[1]} not counted ${planeName(plane)}`
    const last = Math.max(...positions)
    const first = Math.min(...positions)
    if (last < window.from) return [`${what}: they end ${round(window.from - last)} before the window (${range}).`]
    if (first > window.to) return [`${what}: they start ${round(first - window.to)} beyond the window (${range}).`]
    return [`${what}: they stand on both sides of the window (${range}).`]
  }
  const before = positions.filter((x) => x < window.from).length
  const where = [
    ...(before > 0 ? [`${before} before the window`] : []),
    ...(outside > before ? [`${outside - before} beyond it`] : []),
  ].join(', ')
  const [what] = [`${outside} of ${positions.length} ${noun[1]} not counted ${planeName(plane)}`]
  return [`${what}: ${where.replace(/^(\d+) beyond it/, '$1 beyond the window')} (${range}).`]
}

/** Mat bars count with the share that a named person says is spare, by their direction along the edge. */
function countMat(mat: MatLayer, { window, place }: CountInput, at: number): SetCount {
  const alongEdge = Math.abs(Math.sin(mat.azimuth - place.azimuth))
  const perLength = (mat.spareShare * barArea(mat.diameter) * alongEdge ** 2) / mat.spacing
  const line = step(
    {
      symbol: `As${at + 1}`,
      meaning: `Spare share of the ${mat.face} mat, ${mat.diameter} at ${mat.spacing}`,
      formula: 'spare * A / s * l * c * c',
      unit: 'mm2',
      clause: COUNTING,
    },
    { spare: mat.spareShare, A: barArea(mat.diameter), s: mat.spacing, l: window.to - window.from, c: alongEdge },
    (v) => ((v.spare * v.A) / v.s) * v.l * v.c * v.c,
  )
  const notes = [
    `The ${mat.face} mat counts with its spare share of ${mat.spareShare}, named by ${mat.spareBy ?? 'nobody'}.`,
  ]
  return { line: line.value > 0 ? line : null, beforeWindow: perLength * window.from, isCarriedToFace: true, notes }
}
