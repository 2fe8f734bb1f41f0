/** Mat bars that the recess of a pan cuts. */

import type { MatLayer } from './model'
import { barArea } from './steel/pan-steel'
import { sineBetween, type PanPlace } from './pan-place'
import { step, type Clause, type Step } from './step'

const PRACTICE: Clause = {
  source: 'Common practice',
  section: 'bars cut by a recess, worst position of the mat',
  tag: 'practice',
}

export interface MatCut {
  readonly mat: MatLayer
  /** Direction of the bars, along the jack's axis or across it, whichever is nearer. */
  readonly runs: 'along' | 'across'
  /** Bars cut, and those that only lie within cover of the recess: they count as cut. */
  readonly cut: Step
  readonly counted: Step
  readonly area: Step
}

/** Half a right angle divides bars along the axis from bars across it. */
const DIAGONAL = Math.SQRT1_2

/** Rounding of a quotient of two lengths as they are typed. */
const QUOTIENT_ROUNDING = 1e-9

/** The layers of the mats that the recess reaches, each with the bars that it takes in the worst position. */
export function matCuts(place: PanPlace): MatCut[] {
  return place.pour.mats.filter((mat) => reaches(place, mat)).map((mat, at) => cutOf(place, mat, at))
}

/** The recess is let in from the top; bottom bars are cut where its floor lies at or below their upper side. */
function reaches({ pan, pour, top, soffit, coverSoffit }: PanPlace, mat: MatLayer): boolean {
  if (pan.depth <= 0) return false
  if (mat.face === 'top') return true
  const outer = pour.mats.filter(({ face, isOuter }) => face === 'bottom' && isOuter)
  const below = mat.isOuter ? 0 : Math.max(0, ...outer.map(({ diameter }) => diameter))
  return top - pan.depth < soffit + coverSoffit + below + mat.diameter
}

function cutOf(place: PanPlace, mat: MatLayer, at: number): MatCut {
  const { pan, coverTop } = place
  const across = Math.abs(sineBetween(mat.azimuth, pan.azimuth))
  const runs = across > DIAGONAL ? 'across' : 'along'
  const cosine = Math.sqrt(Math.max(0, 1 - across ** 2))
  const size = across * pan.along + cosine * pan.across
  const what = `${mat.face} bars of ${mat.diameter} that run ${runs} the pan`
  const nth = at + 1
  const cut = barsOver(size, mat, { symbol: `Ncut${nth}`, meaning: `Cut: ${what}` })
  const reach = size + 2 * coverTop
  const counted = barsOver(reach, mat, { symbol: `N${nth}`, meaning: `Cut or within cover of the recess: ${what}` })
  const area = step(
    { symbol: `Acut${nth}`, meaning: 'Area of these bars', formula: `N${nth} * A`, unit: 'mm2', clause: PRACTICE },
    { [`N${nth}`]: counted.value, A: barArea(mat.diameter) },
    (v) => (v[`N${nth}`] ?? 0) * v.A,
  )
  return { mat, runs, cut, counted, area }
}

/** A length that begins at a bar meets one bar more than it has whole spacings. */
function barsOver(length: number, { spacing }: MatLayer, of: Pick<Step, 'symbol' | 'meaning'>): Step {
  const whole = Math.floor(length / spacing + QUOTIENT_ROUNDING)
  const meaning = `${of.meaning}; whole spacings of ${spacing} in ${Math.round(length * 10) / 10}, and one`
  return step(
    { symbol: of.symbol, meaning, formula: 'm + 1', unit: '', clause: PRACTICE },
    { m: whole },
    (v) => v.m + 1,
  )
}
