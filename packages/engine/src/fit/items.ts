/** What takes up room in the concrete: bars, and the bodies that bars must keep clear of. */

import type { PlacedBar } from '../placed/bar'
import { roundedPath, type Vec } from '../placed/centre-line'
import type { PlanFrame } from '../placed/pan-frame'
import { convex, pieceToConvex, type Ends } from './convex'
import { boxOf, segmentsApart, type Box3, type Piece } from './distance'

export interface FitBar {
  readonly kind: 'bar'
  readonly bar: PlacedBar
  /** Bars of one set share it: their own pitch is checked once. */
  readonly setId: string
  /** Trade word and place: links of E6-03. */
  readonly name: string
  readonly pourId: string
  /** Centre line in space, bends square. */
  readonly path: readonly Vec[]
  readonly box: Box3
  /** The centre line with its bends at their radius, cut into straight pieces. */
  readonly pieces: () => readonly Piece[]
  /** The same with its bends square, and how far these may be from where the bend runs, mm. */
  readonly square: () => readonly Piece[]
  readonly cornerCut: number
}

export interface FitBody {
  readonly kind: 'body'
  readonly what: 'plate' | 'pocket' | 'duct' | 'recess' | 'wall' | 'sleeve' | 'column bar'
  readonly name: string
  readonly zoneId: string | null
  readonly box: Box3
  /** Clear distance from a piece of a bar, negative by how far it stands inside. */
  readonly clearOf: (piece: Piece) => number
}

export type Item = FitBar | FitBody

/** Places in a frame's own coordinates as places in space. */
export function spaceOf(frame: PlanFrame): (chainage: number, depth: number, height: number) => Vec {
  const { x, y } = frame.pointAt(0, 0)
  const { along, inward } = frame
  return (chainage, depth, height) => ({
    x: x + chainage * along.x + depth * inward.x,
    y: y + chainage * along.y + depth * inward.y,
    z: height,
  })
}

interface BarPlace {
  readonly bar: PlacedBar
  readonly setId: string
  readonly name: string
  readonly pourId: string
  readonly frame: PlanFrame
  /** Inside radius of its bends, mm. */
  readonly bendRadius: number
}

export function fitBar({ bar, frame, bendRadius, ...rest }: BarPlace): FitBar {
  const at = spaceOf(frame)
  const path = bar.path.map(({ chainage, depth, height }) => at(chainage, depth, height))
  const radius = bar.diameter / 2
  const isBent = path.length > 2
  const line = () => (isBent && bar.kind !== 'spiral' ? roundedPath(path, bar.isClosed, bendRadius + radius) : path)
  const pieces = once(() => piecesOf(line(), bar))
  return {
    kind: 'bar',
    bar,
    path,
    box: boxOf(path, radius),
    pieces,
    square: bar.kind === 'spiral' ? pieces : once(() => piecesOf(path, bar)),
    cornerCut: isBent ? (Math.SQRT2 - 1) * (bendRadius + radius) : 0,
    ...rest,
  }
}

function once<T>(make: () => T): () => T {
  let kept: { readonly value: T } | null = null
  return () => (kept ??= { value: make() }).value
}

function piecesOf(line: readonly Vec[], { diameter, isClosed }: PlacedBar): Piece[] {
  const radius = diameter / 2
  const first = line[0]
  const points = isClosed && first ? [...line, first] : line
  const pieces = points.slice(1).flatMap((b, i): Piece[] => {
    const a = points[i]
    return a ? [{ a, b, radius }] : []
  })
  const [only] = pieces
  return pieces.length === 1 && only ? [withinEnds(only)] : pieces
}

/** A straight bar ends flat: its round-ended piece stops half a diameter short, so that it does not reach beyond. */
function withinEnds({ a, b, radius }: Piece): Piece {
  const length = Math.hypot(b.x - a.x, b.y - a.y, b.z - a.z)
  const share = Math.min(0.5, radius / length)
  const between = (from: Vec, to: Vec): Vec => ({
    x: from.x + share * (to.x - from.x),
    y: from.y + share * (to.y - from.y),
    z: from.z + share * (to.z - from.z),
  })
  return { a: between(a, b), b: between(b, a), radius }
}

type Named = Pick<FitBody, 'what' | 'name' | 'zoneId'>

/** A body with flat sides; its planes are worked out when something comes near. */
export function flatBody(ends: Ends, named: Named): FitBody {
  const body = once(() => convex(ends))
  const box = boxOf([...ends.near, ...ends.far], 0)
  return { kind: 'body', ...named, box, clearOf: (piece) => pieceToConvex(piece, body()) }
}

/** A round body from a to b whose radius changes evenly. */
export function roundBody(axis: { a: Vec; b: Vec; from: number; to: number }, named: Named): FitBody {
  const { a, b, from, to } = axis
  const clearOf = (piece: Piece) => {
    const { distance, at } = segmentsApart(piece.a, piece.b, [a, b])
    return distance - piece.radius - (from + at * (to - from))
  }
  return { kind: 'body', ...named, box: boxOf([a, b], Math.max(from, to)), clearOf }
}

/** How far bars look for what is beside them, mm: more than the clear gap that is asked for between two bars. */
export const REACH = 50

/** How far from a body bars are looked for, mm: they may touch it. */
export const TO_BODY = 5

/** Least clear distance between a bar and a body; infinite where they are farther apart than is looked for. */
export function clearOfBody(bar: FitBar, body: FitBody): number {
  if (!bar.square().some((piece) => isNear(piece, body.box, TO_BODY + bar.cornerCut))) return Infinity
  const near = bar.pieces().filter((piece) => isNear(piece, body.box, TO_BODY))
  return near.reduce((nearest, piece) => Math.min(nearest, body.clearOf(piece)), Infinity)
}

/**
 * Least clear distance between those pieces of two bars that a rule lets count; infinite where there are none near.
 *
 * First with the bends square, which is out by what a bend cuts off its corner: bars farther apart than `matters` even
 * so are infinitely far.
 */
export function clearOfBar(
  one: FitBar,
  other: FitBar,
  { matters, counts = () => true }: { matters: number; counts?: (piece: Piece, otherPiece: Piece) => boolean },
): number {
  const cut = one.cornerCut + other.cornerCut
  if (cut === 0) return least(one.pieces(), other.pieces(), counts)
  if (least(one.square(), other.square(), counts) - cut > matters) return Infinity
  return least(piecesNear(one, other.box), piecesNear(other, one.box), counts)
}

function least(
  ones: readonly Piece[],
  others: readonly Piece[],
  counts: (piece: Piece, otherPiece: Piece) => boolean,
): number {
  let nearest = Infinity
  for (const piece of ones) {
    for (const beside of others) {
      if (!counts(piece, beside)) continue
      const away = segmentsApart(piece.a, piece.b, [beside.a, beside.b]).distance - piece.radius - beside.radius
      if (away < nearest) nearest = away
    }
  }
  return nearest
}

function piecesNear(bar: FitBar, box: Box3): readonly Piece[] {
  const pieces = bar.pieces()
  return pieces.length === 1 ? pieces : pieces.filter((piece) => isNear(piece, box, REACH))
}

function isNear({ a, b, radius }: Piece, { min, max }: Box3, within: number): boolean {
  const by = radius + within
  return (
    Math.min(a.x, b.x) - by <= max.x &&
    Math.max(a.x, b.x) + by >= min.x &&
    Math.min(a.y, b.y) - by <= max.y &&
    Math.max(a.y, b.y) + by >= min.y &&
    Math.min(a.z, b.z) - by <= max.z &&
    Math.max(a.z, b.z) + by >= min.z
  )
}
