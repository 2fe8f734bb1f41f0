/** Plane geometry in mm: x runs east, y north. Nothing here knows of edges or anchors. */

import type { Point } from './model'

/** Rounding of trigonometry that is not a distance on site, mm. */
export const ROUNDING = 1e-6

const QUARTER_TURN = Math.PI / 2

export const add = (a: Point, b: Point): Point => ({ x: a.x + b.x, y: a.y + b.y })

export const subtract = (a: Point, b: Point): Point => ({ x: a.x - b.x, y: a.y - b.y })

export const scale = (a: Point, by: number): Point => ({ x: a.x * by, y: a.y * by })

export const dot = (a: Point, b: Point): number => a.x * b.x + a.y * b.y

/** Positive where `b` lies counter-clockwise of `a`. */
export const cross = (a: Point, b: Point): number => a.x * b.y - a.y * b.x

export const distance = (a: Point, b: Point): number => Math.hypot(b.x - a.x, b.y - a.y)

/** `a` turned by a quarter counter-clockwise. */
export const turnedLeft = (a: Point): Point => ({ x: -a.y, y: a.x })

/** The vector of length 1 in the direction of `a`. @throws where `a` has no length. */
export function unit(a: Point): Point {
  const length = Math.hypot(a.x, a.y)
  if (length === 0) throw new Error('A vector without length has no direction.')
  return scale(a, 1 / length)
}

/** Unit vector of an azimuth (rad, clockwise from north); quarter turns are exact, so that squares stay square. */
export function alongAzimuth(azimuth: number): Point {
  const quarters = azimuth / QUARTER_TURN
  if (Math.abs(quarters - Math.round(quarters)) < 1e-12) {
    const turn = ((Math.round(quarters) % 4) + 4) % 4
    return { x: turn === 1 ? 1 : turn === 3 ? -1 : 0, y: turn === 0 ? 1 : turn === 2 ? -1 : 0 }
  }
  return { x: Math.sin(azimuth), y: Math.cos(azimuth) }
}

/** Azimuth of a vector, rad, 0 up to one turn. */
export function azimuthOf(vector: Point): number {
  const azimuth = Math.atan2(vector.x, vector.y)
  return azimuth < 0 ? azimuth + 4 * QUARTER_TURN : azimuth
}

/** The sides of a closed outline, each from its corner to the next; made once for each outline, which never changes. */
export function sidesOf(outline: readonly Point[]): readonly (readonly [Point, Point])[] {
  const known = sidesMade.get(outline)
  if (known) return known
  const sides = outline.flatMap((corner, i): [Point, Point][] => {
    const next = outline[(i + 1) % outline.length]
    return next ? [[corner, next]] : []
  })
  sidesMade.set(outline, sides)
  return sides
}

const sidesMade = new WeakMap<readonly Point[], readonly (readonly [Point, Point])[]>()

/**
 * Area in mm2 by the shoelace rule: positive where the corners run counter-clockwise. Its sides are not kept: many
 * outlines are asked for their area and nothing else.
 */
export function signedArea(outline: readonly Point[]): number {
  let sum = 0
  for (let i = 0; i < outline.length; i++) {
    const [a, b] = [outline[i], outline[(i + 1) % outline.length]]
    if (a && b) sum += cross(a, b)
  }
  return sum / 2
}

/** The point of the segment from `a` to `b` nearest to `point`. */
function nearestOnSegment(point: Point, a: Point, b: Point): Point {
  const side = subtract(b, a)
  const length2 = dot(side, side)
  if (length2 === 0) return a
  const share = Math.min(1, Math.max(0, dot(subtract(point, a), side) / length2))
  return add(a, scale(side, share))
}

/** Distance in mm from `point` to the segment from `a` to `b`. */
export function distanceToSegment(point: Point, a: Point, b: Point): number {
  return distance(point, nearestOnSegment(point, a, b))
}

/** Whether two segments cross or touch. */
function segmentsMeet([a, b]: readonly [Point, Point], [c, d]: readonly [Point, Point]): boolean {
  const turns = (p: Point, q: Point, r: Point) => Math.sign(cross(subtract(q, p), subtract(r, p)))
  const [c1, d1, a1, b1] = [turns(a, b, c), turns(a, b, d), turns(c, d, a), turns(c, d, b)]
  if (c1 !== d1 && a1 !== b1) return true
  const lies = (p: Point, q: Point, r: Point) => distanceToSegment(r, p, q) === 0
  return lies(a, b, c) || lies(a, b, d) || lies(c, d, a) || lies(c, d, b)
}

/** Distance in mm between two segments; 0 where they cross or touch. */
export function distanceBetweenSegments(first: readonly [Point, Point], second: readonly [Point, Point]): number {
  if (segmentsMeet(first, second)) return 0
  const ends = [
    ...first.map((end) => distanceToSegment(end, second[0], second[1])),
    ...second.map((end) => distanceToSegment(end, first[0], first[1])),
  ]
  return Math.min(...ends)
}

/** Whether a point lies inside an outline or on it. */
export function isInside(point: Point, outline: readonly Point[]): boolean {
  const sides = sidesOf(outline)
  if (sides.some(([a, b]) => distanceToSegment(point, a, b) <= ROUNDING)) return true
  const crossings = sides.filter(
    ([a, b]) => a.y > point.y !== b.y > point.y && point.x < a.x + ((point.y - a.y) / (b.y - a.y)) * (b.x - a.x),
  )
  return crossings.length % 2 === 1
}

/** The first two sides of an outline that cross or touch elsewhere than at their own corner, by index; null if none. */
export function selfCrossing(outline: readonly Point[]): { readonly first: number; readonly second: number } | null {
  const sides = sidesOf(outline)
  for (const [first, side] of sides.entries()) {
    for (const [offset, other] of sides.slice(first + 1).entries()) {
      const second = first + 1 + offset
      const meets = second === first + 1 || (first === 0 && second === sides.length - 1) ? foldsBack : segmentsMeet
      if (meets(side, other)) return { first, second }
    }
  }
  return null
}

/** Neighbouring sides share a corner; they are wrong only where one runs back over the other. */
function foldsBack([a, b]: readonly [Point, Point], [c, d]: readonly [Point, Point]): boolean {
  const [u, v] = [subtract(b, a), subtract(d, c)]
  return cross(u, v) === 0 && dot(u, v) < 0
}
