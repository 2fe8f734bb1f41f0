/**
 * How deep the concrete behind an edge has no precompression, place by place along it: a line of straight pieces, cut
 * down by the sides of spreads. Everything is in the edge's own coordinates, mm.
 */

import { ROUNDING } from '../geometry'
import type { PlanPoint } from './closed-form'

/** A side of a spread or of the concrete: behind it (deeper) nothing is asked for. */
export interface Bound<Source> {
  readonly a: PlanPoint
  readonly b: PlanPoint
  readonly source: Source
}

/** One straight piece of the line; `source` is what bounds the depth there. */
export interface Piece<Source> {
  readonly from: number
  readonly to: number
  readonly depthFrom: number
  readonly depthTo: number
  readonly source: Source
}

/** A flat line at one depth, to be cut down by bounds. */
export function flat<Source>(of: {
  readonly from: number
  readonly to: number
  readonly depth: number
  readonly source: Source
}): readonly Piece<Source>[] {
  const { from, to, depth, source } = of
  return to - from > ROUNDING ? [{ from, to, depthFrom: depth, depthTo: depth, source }] : []
}

/** The line cut down to a bound wherever the bound is the nearer one. A bound square to the edge cuts nothing. */
export function cutDown<Source>(line: readonly Piece<Source>[], bound: Bound<Source>): readonly Piece<Source>[] {
  const [left, right] = bound.a.chainage <= bound.b.chainage ? [bound.a, bound.b] : [bound.b, bound.a]
  if (right.chainage - left.chainage <= ROUNDING) return line
  const nearest = Math.min(left.depth, right.depth)
  const isMet = (piece: Piece<Source>) =>
    piece.to > left.chainage && piece.from < right.chainage && Math.max(piece.depthFrom, piece.depthTo) > nearest
  if (!line.some(isMet)) return line
  const rising = { left, right, source: bound.source }
  const cut: Piece<Source>[] = []
  for (const piece of line) {
    if (isMet(piece)) cut.push(...cutPiece(piece, rising))
    else cut.push(piece)
  }
  return cut
}

interface Rising<Source> {
  readonly left: PlanPoint
  readonly right: PlanPoint
  readonly source: Source
}

function cutPiece<Source>(piece: Piece<Source>, bound: Rising<Source>): Piece<Source>[] {
  const from = Math.max(piece.from, bound.left.chainage)
  const to = Math.min(piece.to, bound.right.chainage)
  if (to - from <= ROUNDING) return [piece]
  return [
    ...partOf(piece, piece.from, from),
    ...lowerOf(piece, { from, to, depthFrom: depthOn(bound, from), depthTo: depthOn(bound, to), source: bound.source }),
    ...partOf(piece, to, piece.to),
  ]
}

/** The nearer of two pieces over the same chainage, in two parts where they cross. */
function lowerOf<Source>(piece: Piece<Source>, other: Piece<Source>): Piece<Source>[] {
  const { from, to } = other
  const [own] = partOf(piece, from, to)
  if (!own) return []
  const [atFrom, atTo] = [own.depthFrom - other.depthFrom, own.depthTo - other.depthTo]
  if (atFrom <= ROUNDING && atTo <= ROUNDING) return [own]
  if (atFrom >= -ROUNDING && atTo >= -ROUNDING) return [other]
  const meeting = from + ((to - from) * atFrom) / (atFrom - atTo)
  const [first, second] = atFrom < 0 ? [own, other] : [other, own]
  return [...partOf(first, from, meeting), ...partOf(second, meeting, to)]
}

function partOf<Source>(piece: Piece<Source>, from: number, to: number): Piece<Source>[] {
  if (to - from <= ROUNDING) return []
  if (from === piece.from && to === piece.to) return [piece]
  return [{ ...piece, from, to, depthFrom: depthAt(piece, from), depthTo: depthAt(piece, to) }]
}

/** Depth of a piece at a chainage, mm. */
export function depthAt({ from, to, depthFrom, depthTo }: Omit<Piece<unknown>, 'source'>, chainage: number): number {
  if (chainage === from) return depthFrom
  if (chainage === to) return depthTo
  return depthFrom + ((depthTo - depthFrom) * (chainage - from)) / (to - from)
}

const depthOn = ({ left, right }: Rising<unknown>, chainage: number): number =>
  depthAt({ from: left.chainage, to: right.chainage, depthFrom: left.depth, depthTo: right.depth }, chainage)

/** mm2, exactly: a trapezium under each piece. */
export function areaUnder(line: readonly Piece<unknown>[]): number {
  return line.reduce((sum, { from, to, depthFrom, depthTo }) => sum + ((to - from) * (depthFrom + depthTo)) / 2, 0)
}

/** The deepest place of the line, the first of several; null for a line without length. */
export function deepest(line: readonly Piece<unknown>[]): PlanPoint | null {
  const points = pointsOf(line)
  return points.reduce<PlanPoint | null>(
    (most, point) => (most && most.depth >= point.depth - ROUNDING ? most : point),
    null,
  )
}

/** The area between the edge and the line, from its start round to its end. */
export function outlineUnder(line: readonly Piece<unknown>[]): readonly PlanPoint[] {
  const [first, last] = [line[0], line.at(-1)]
  if (!first || !last) return []
  const round = [{ chainage: first.from, depth: 0 }, ...pointsOf(line), { chainage: last.to, depth: 0 }]
  return withoutMiddles(round)
}

function pointsOf(line: readonly Piece<unknown>[]): PlanPoint[] {
  return line.flatMap(({ from, to, depthFrom, depthTo }) => [
    { chainage: from, depth: depthFrom },
    { chainage: to, depth: depthTo },
  ])
}

/** Leaves out what stands twice, and what lies on the straight line between its neighbours. */
function withoutMiddles(points: readonly PlanPoint[]): PlanPoint[] {
  const kept: PlanPoint[] = []
  for (const point of points) {
    const last = kept.at(-1)
    if (last && isSame(last, point)) continue
    const beforeLast = kept.at(-2)
    if (last && beforeLast && isBetween(last, beforeLast, point)) kept.pop()
    kept.push(point)
  }
  return kept
}

const isSame = (a: PlanPoint, b: PlanPoint): boolean =>
  Math.abs(a.chainage - b.chainage) <= ROUNDING && Math.abs(a.depth - b.depth) <= ROUNDING

function isBetween(point: PlanPoint, a: PlanPoint, b: PlanPoint): boolean {
  const [u, v] = [b.chainage - a.chainage, b.depth - a.depth]
  const away = (point.chainage - a.chainage) * v - (point.depth - a.depth) * u
  return Math.abs(away) <= ROUNDING * Math.hypot(u, v)
}
