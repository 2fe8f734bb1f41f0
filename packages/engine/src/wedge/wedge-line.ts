/** The line behind which an edge has precompression, over a gap or any other length of it. */

import { ROUNDING } from '../geometry'
import { isWithin } from './clip'
import { boundsWithOther, type DepthBound, type EdgeSpreads, type Limit, type NearEnd } from './edge-spreads'
import { cutDown, depthAt, flat, type Piece } from './envelope'

export type LinePiece = Piece<Limit>

/** Chainages, mm. */
export interface Range {
  readonly from: number
  readonly to: number
}

export interface WedgeLine {
  readonly pieces: readonly LinePiece[]
  /** Lengths of the edge behind which no tendon compresses anywhere, from this edge to the face across. */
  readonly throughs: readonly Range[]
}

/**
 * The line over a length of an edge.
 *
 * Behind each place it stands where the first tendon compresses. Where none does from side to side, it stands where the
 * spread from this edge would have reached: what lies beyond belongs to the wedge of the opposite edge, and the length
 * is told as one that goes through.
 */
export function wedgeLine(spreads: EdgeSpreads, range: Range): WedgeLine {
  const open = flat({ ...range, depth: spreads.beyond, source: BEYOND })
  const near = cutBy(spreads, open, ({ bounds }) => bounds)
  if (near.every(isReachedFromBoth)) return { pieces: near, throughs: [] }
  const both = cutBy(spreads, open, boundsWithOther)
  return {
    pieces: both.flatMap((piece) => (piece.source.end ? [piece] : partsOf(near, piece))),
    throughs: joined(both.filter(({ source }) => source.end === null)),
  }
}

const BEYOND: Limit = { end: null, start: { chainage: 0, depth: 0 }, slope: 0 }

/** Ends are taken from the range outwards, as far as the spread of any end can still come nearer than the line. */
function cutBy(
  spreads: EdgeSpreads,
  open: readonly LinePiece[],
  boundsOf: (end: NearEnd) => readonly DepthBound[],
): readonly LinePiece[] {
  const { ends, concrete } = spreads
  const [first, last] = [open[0], open.at(-1)]
  if (!first || !last) return open
  let line = open
  const walk = (at: number, by: 1 | -1) => {
    for (let i = at; i >= 0 && i < ends.length; i += by) {
      const end = ends[i]
      if (!end) return
      const away = by > 0 ? end.chainage - last.to : first.from - end.chainage
      if (away > reachAt(spreads, line)) return
      for (const bound of boundsOf(end)) line = cutDown(line, bound)
    }
  }
  const after = firstAfter(ends, first.from)
  walk(after, 1)
  walk(after - 1, -1)
  for (const bound of concrete) line = cutDown(line, bound)
  return line
}

function reachAt({ reach, ends }: EdgeSpreads, line: readonly LinePiece[]): number {
  const depth = line.reduce((most, { depthFrom, depthTo }) => Math.max(most, depthFrom, depthTo), 0)
  return ends.length === 0 ? 0 : reach.half + (depth - reach.start) * reach.steepest
}

/** Place of the first end beyond a chainage, by halving. */
function firstAfter(ends: readonly NearEnd[], chainage: number): number {
  let [low, high] = [0, ends.length]
  while (low < high) {
    const half = Math.floor((low + high) / 2)
    if ((ends[half]?.chainage ?? Infinity) <= chainage) low = half + 1
    else high = half
  }
  return low
}

/** On the rim of the other end's spread it says no, and the parts inside are then looked for one by one. */
function isReachedFromBoth({ source: { end }, from, to, depthFrom, depthTo }: LinePiece): boolean {
  if (!end) return false
  const { other } = end
  return other === null || (isWithin(from, depthFrom, other) && isWithin(to, depthTo, other))
}

function partsOf(line: readonly LinePiece[], { from, to }: Range): LinePiece[] {
  return line.flatMap((piece) => {
    const [start, end] = [Math.max(from, piece.from), Math.min(to, piece.to)]
    if (end - start <= ROUNDING) return []
    return [{ ...piece, from: start, to: end, depthFrom: depthAt(piece, start), depthTo: depthAt(piece, end) }]
  })
}

/** Neighbouring pieces as one length. */
function joined(pieces: readonly LinePiece[]): Range[] {
  return pieces.reduce<Range[]>((ranges, { from, to }) => {
    const last = ranges.at(-1)
    if (!last || from - last.to > ROUNDING) return [...ranges, { from, to }]
    return [...ranges.slice(0, -1), { from: last.from, to }]
  }, [])
}
