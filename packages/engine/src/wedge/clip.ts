/** Straight pieces and slices of plane outlines. Nothing here knows of edges or spreads. */

import { add, cross, isInside, scale, sidesOf, subtract } from '../geometry'
import type { Point } from '../model'

/** The parts of the straight line from `a` to `b` that lie inside an outline or on it. */
export function clippedTo(a: Point, b: Point, outline: readonly Point[]): readonly (readonly [Point, Point])[] {
  const run = subtract(b, a)
  const at = (share: number) => add(a, scale(run, share))
  const cuts = [0, ...sidesOf(outline).flatMap(([c, d]) => crossing({ a, run }, c, d)), 1].sort(
    (one, other) => one - other,
  )
  return cuts.slice(1).flatMap((to, i): [Point, Point][] => {
    const from = cuts[i] ?? 0
    if (to - from <= 1e-12 || !isInside(at((from + to) / 2), outline)) return []
    return [[at(from), at(to)]]
  })
}

/** Whether a place lies within an outline and not on its rim; quicker than `isInside`, for it measures no distances. */
export function isWithin(x: number, y: number, outline: readonly Point[]): boolean {
  let within = false
  let before = outline.at(-1)
  for (const corner of outline) {
    if (before && before.y > y !== corner.y > y) {
      const crossing = before.x + ((y - before.y) * (corner.x - before.x)) / (corner.y - before.y)
      if (x < crossing) within = !within
    }
    before = corner
  }
  return within
}

/** Share of a run from `a` at which it crosses the segment from `c` to `d`. */
function crossing({ a, run }: { readonly a: Point; readonly run: Point }, c: Point, d: Point): number[] {
  const side = subtract(d, c)
  const turn = cross(run, side)
  if (turn === 0) return []
  const away = subtract(c, a)
  const share = cross(away, side) / turn
  const onSide = cross(away, run) / turn
  return share > 0 && share < 1 && onSide >= 0 && onSide <= 1 ? [share] : []
}

/** What two plane areas share: trapezia that do not overlap, from left to right. */
export function sharedArea(one: readonly Point[], other: readonly Point[]): readonly (readonly Point[])[] {
  const sides = [...sidesOf(one), ...sidesOf(other)]
  const corners = [...one, ...other].map(({ x }) => x)
  const meetings = sides.flatMap(([a, b], i) =>
    sides.slice(i + 1).flatMap(([c, d]) => {
      const run = subtract(b, a)
      return crossing({ a, run }, c, d).map((share) => a.x + run.x * share)
    }),
  )
  const cuts = [...corners, ...meetings].sort((a, b) => a - b)
  return cuts.slice(1).flatMap((to, i) => {
    const from = cuts[i] ?? to
    return to - from <= 1e-6 ? [] : slices({ from, to, one, other })
  })
}

/** Between two neighbouring cuts no sides cross, so that each slice is a trapezium. */
function slices(of: {
  readonly from: number
  readonly to: number
  readonly one: readonly Point[]
  readonly other: readonly Point[]
}): Point[][] {
  const { from, to } = of
  const [first, second] = [spansAt(of.one, from, to), spansAt(of.other, from, to)]
  return first.flatMap((a) =>
    second.flatMap((b): Point[][] => {
      const [low, high] = [higher(a.low, b.low), lower(a.high, b.high)]
      if (low.from + low.to >= high.from + high.to - 1e-6) return []
      return [
        [
          { x: from, y: low.from },
          { x: to, y: low.to },
          { x: to, y: high.to },
          { x: from, y: high.from },
        ],
      ]
    }),
  )
}

/** A side of an outline over a slice: its height at both ends. */
interface Run {
  readonly from: number
  readonly to: number
}

const middle = ({ from, to }: Run): number => (from + to) / 2
const higher = (a: Run, b: Run): Run => (middle(a) >= middle(b) ? a : b)
const lower = (a: Run, b: Run): Run => (middle(a) <= middle(b) ? a : b)

function spansAt(outline: readonly Point[], from: number, to: number): { readonly low: Run; readonly high: Run }[] {
  const x = (from + to) / 2
  const runs = sidesOf(outline)
    .filter(([a, b]) => a.x > x !== b.x > x)
    .map(([a, b]): Run => {
      const yAt = (place: number) => a.y + ((b.y - a.y) * (place - a.x)) / (b.x - a.x)
      return { from: yAt(from), to: yAt(to) }
    })
    .sort((one, other) => middle(one) - middle(other))
  return runs.flatMap((low, i) => {
    const high = runs[i + 1]
    return i % 2 === 0 && high ? [{ low, high }] : []
  })
}
