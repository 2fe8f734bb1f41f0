/** The spread of a tendon end in plan: where the force has reached, between two sides that open at an angle. */

import { add, alongAzimuth, cross, dot, isInside, ROUNDING, scale, sidesOf, subtract, turnedLeft } from '../geometry'
import type { Point } from '../model'

/** Where a tendon's force enters the concrete in plan, mm. */
export interface EntryFace {
  /** Middle of the face across which it enters. */
  readonly at: Point
  /** Unit vector along the tendon, away from the face into the slab. */
  readonly inward: Point
  /** Width of the face square to the tendon. */
  readonly width: number
}

/** The two sides of a spread in plan, each from the face on. */
export interface Spread {
  readonly face: EntryFace
  readonly left: readonly Point[]
  readonly right: readonly Point[]
}

/** The concrete that a spread stays in. */
export interface Room {
  readonly outline: readonly Point[]
  /** Longer than any way through it, mm. */
  readonly size: number
  /** Whether the outline has a corner that points into it; otherwise no side is met before the far end. */
  readonly isReentrant: boolean
}

/** How often a side may follow the outline; a corner is passed once at most. */
const TURNS_PER_SIDE = 2

export function roomOf(outline: readonly Point[]): Room {
  const xs = outline.map(({ x }) => x)
  const ys = outline.map(({ y }) => y)
  const size = Math.hypot(Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys))
  const sides = sidesOf(outline)
  const isReentrant = sides.some((side, i) => {
    const next = sides[(i + 1) % sides.length]
    return next !== undefined && cross(subtract(side[1], side[0]), subtract(next[1], next[0])) < -ROUNDING
  })
  return { outline, size, isReentrant }
}

/**
 * The spread from a face at an angle to each side of the tendon (rad).
 *
 * A side that meets the outline follows it, and starts again at the re-entrant corner where the outline falls back.
 */
export function spreadFrom(face: EntryFace, angle: number, room: Room): Spread {
  const across = turnedLeft(face.inward)
  const [sin, cos] = [Math.sin(angle), Math.cos(angle)]
  const side = (sign: 1 | -1): Point[] => {
    const start = add(face.at, scale(across, (sign * face.width) / 2))
    const direction = add(scale(face.inward, cos), scale(across, sign * sin))
    return tracedSide({ start, direction, axis: face.inward }, room)
  }
  return { face, left: side(1), right: side(-1) }
}

/** The spread as one closed outline, open far behind: for what lies inside it. */
export function spreadOutline({ face, left, right }: Spread, room: Room): readonly Point[] {
  const beyond = (point: Point | undefined) => (point ? [add(point, scale(face.inward, room.size))] : [])
  return [...right, ...beyond(right.at(-1)), ...beyond(left.at(-1)), ...[...left].reverse()]
}

interface Ray {
  readonly start: Point
  readonly direction: Point
  readonly axis: Point
}

function tracedSide(ray: Ray, room: Room): Point[] {
  const far = (from: Point) => add(from, scale(ray.direction, 4 * room.size))
  if (!room.isReentrant) return [ray.start, far(ray.start)]
  const sides = sidesOf(room.outline)
  const points = [ray.start]
  let from = ray.start
  for (let i = 0; i < TURNS_PER_SIDE * sides.length; i++) {
    const hit = firstExit(from, ray.direction, sides)
    if (!hit) return [...points, far(from)]
    const along = alongWall({ hit, ray, sides, outline: room.outline })
    points.push(hit.at, ...along.points)
    if (!along.goesOnFrom) return points
    from = along.goesOnFrom
  }
  return points
}

interface Exit {
  readonly at: Point
  readonly side: number
}

/** Where a ray first leaves the concrete: the outline runs counter-clockwise, so it then crosses to a side's right. */
function firstExit(from: Point, direction: Point, sides: readonly (readonly [Point, Point])[]): Exit | null {
  let nearest = Infinity
  let found: Exit | null = null
  for (const [side, [a, b]] of sides.entries()) {
    const run = subtract(b, a)
    const turn = cross(run, direction)
    if (turn >= 0) continue
    const away = subtract(a, from)
    const t = cross(away, run) / cross(direction, run)
    const share = cross(away, direction) / cross(direction, run)
    if (t <= ROUNDING || share < -1e-12 || share > 1 + 1e-12 || t >= nearest) continue
    nearest = t
    found = { at: add(from, scale(direction, t)), side }
  }
  return found
}

/** Along the outline from where a side meets it, as long as that leads on; ends where the side may start again. */
function alongWall(of: {
  readonly hit: Exit
  readonly ray: Ray
  readonly sides: readonly (readonly [Point, Point])[]
  readonly outline: readonly Point[]
}): { readonly points: readonly Point[]; readonly goesOnFrom: Point | null } {
  const { hit, ray, sides, outline } = of
  const points: Point[] = []
  const first = sides[hit.side]
  if (!first) return { points, goesOnFrom: null }
  const isForward = dot(subtract(first[1], first[0]), ray.axis) > 0
  for (let i = 0; i < sides.length; i++) {
    const side = sides[(hit.side + (isForward ? i : -i) + sides.length) % sides.length]
    if (!side) break
    const [start, end] = isForward ? side : [side[1], side[0]]
    if (dot(subtract(end, start), ray.axis) <= ROUNDING) break
    points.push(end)
    if (isOpen(end, ray.direction, outline)) return { points, goesOnFrom: end }
  }
  return { points, goesOnFrom: null }
}

/** Whether the concrete goes on from a corner in a direction; looked at 1 mm away. */
const isOpen = (corner: Point, direction: Point, outline: readonly Point[]): boolean =>
  isInside(add(corner, direction), outline)

/** Direction of a tendon into the slab, from its outward azimuth (rad). */
export const inwardOf = (outwardAzimuth: number): Point => scale(alongAzimuth(outwardAzimuth), -1)
