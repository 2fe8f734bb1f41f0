/** The printed line that gives the depth of a wedge from what bounds it on both sides of its deepest place. */

import { ROUNDING } from '../geometry'
import { step, type Clause, type Step } from '../step'
import type { PlanPoint } from './closed-form'
import type { LinePiece } from './wedge-line'

const SPREAD: Clause = { source: 'Geometry of spread', section: 'outline of the spreads', tag: 'derived' }

/**
 * Two sides that meet; one side as far as a place on the edge; or a face or the concrete alone. `c` is the chainage at
 * which a side begins, `e` its depth there, `t` how far it goes along the edge for each mm of depth.
 */
export function depthStep(pieces: readonly LinePiece[], apex: PlanPoint, meaning: string): Step {
  const line = { symbol: 'd', meaning, unit: 'mm', clause: SPREAD }
  const touching = pieces.filter(
    (piece) => isAt(piece.from, piece.depthFrom, apex) || isAt(piece.to, piece.depthTo, apex),
  )
  const rising = touching.find((piece) => piece.source.slope > 0 && piece.depthTo > piece.depthFrom)
  const falling = touching.find((piece) => piece.source.slope > 0 && piece.depthTo < piece.depthFrom)
  const [one, other] = [rising?.source, falling?.source]
  const meeting = one && other && meetingStep(line, one, other)
  if (meeting && Math.abs(meeting.value - apex.depth) <= ROUNDING) return meeting
  const alone = [one, other].find((side) => side && Math.abs(reachOf(side, apex.chainage) - apex.depth) <= ROUNDING)
  if (alone) {
    return step(
      { ...line, formula: 'e + abs(x - c) / t' },
      { e: alone.start.depth, x: apex.chainage, c: alone.start.chainage, t: alone.slope },
      (v) => v.e + Math.abs(v.x - v.c) / v.t,
    )
  }
  return step({ ...line, formula: 'e' }, { e: apex.depth }, (v) => v.e)
}

type Source = LinePiece['source']

const meetingStep = (line: Pick<Step, 'symbol' | 'meaning' | 'unit' | 'clause'>, one: Source, other: Source): Step =>
  step(
    { ...line, formula: '(c2 - c1 + e1 * t1 + e2 * t2) / (t1 + t2)' },
    {
      c1: one.start.chainage,
      c2: other.start.chainage,
      e1: one.start.depth,
      e2: other.start.depth,
      t1: one.slope,
      t2: other.slope,
    },
    (v) => (v.c2 - v.c1 + v.e1 * v.t1 + v.e2 * v.t2) / (v.t1 + v.t2),
  )

const reachOf = ({ start, slope }: Source, chainage: number): number =>
  start.depth + Math.abs(chainage - start.chainage) / slope

const isAt = (chainage: number, depth: number, point: PlanPoint): boolean =>
  Math.abs(chainage - point.chainage) <= ROUNDING && Math.abs(depth - point.depth) <= ROUNDING
