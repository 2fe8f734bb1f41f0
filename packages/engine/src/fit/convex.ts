/** A convex body with six flat sides: plate, pocket, recess, flat duct, wall. */

import type { Vec } from '../placed/centre-line'
import { segmentsApart, type Piece } from './distance'

/** Corners of one end in turn, and those of the other end opposite to them. */
export interface Ends {
  readonly near: readonly Vec[]
  readonly far: readonly Vec[]
}

interface Plane {
  readonly normal: Vec
  readonly offset: number
}

export interface Convex {
  readonly planes: readonly Plane[]
  readonly ribs: readonly (readonly [Vec, Vec])[]
}

const minus = (a: Vec, b: Vec): Vec => ({ x: a.x - b.x, y: a.y - b.y, z: a.z - b.z })
const times = (a: Vec, b: Vec): number => a.x * b.x + a.y * b.y + a.z * b.z
const square = (a: Vec, b: Vec): Vec => ({
  x: a.y * b.z - a.z * b.y,
  y: a.z * b.x - a.x * b.z,
  z: a.x * b.y - a.y * b.x,
})

/** Both ends have the same number of corners, three or more; every side is flat. */
export function convex({ near, far }: Ends): Convex {
  const all = [...near, ...far]
  const middle = all.reduce(
    (sum, { x, y, z }) => ({ x: sum.x + x / all.length, y: sum.y + y / all.length, z: sum.z + z / all.length }),
    { x: 0, y: 0, z: 0 },
  )
  const around = near.flatMap((corner, i) => {
    const next = (i + 1) % near.length
    const [after, opposite, opposed] = [near[next], far[i], far[next]]
    return after && opposite && opposed ? [{ corner, after, opposite, opposed }] : []
  })
  const sides: readonly (readonly Vec[])[] = [
    near,
    far,
    ...around.map(({ corner, after, opposite, opposed }) => [corner, after, opposed, opposite]),
  ]
  return {
    planes: sides.flatMap((side) => planeOf(side, middle) ?? []),
    ribs: around.flatMap(({ corner, after, opposite, opposed }) => [
      [corner, after] as const,
      [opposite, opposed] as const,
      [corner, opposite] as const,
    ]),
  }
}

/** Outward from the middle; null for a side that has no area, as where a body runs out to nothing. */
function planeOf(corners: readonly Vec[], middle: Vec): Plane | null {
  const [a, b, c, d] = corners
  if (!a || !b || !c) return null
  const across = d ? square(minus(c, a), minus(d, b)) : square(minus(b, a), minus(c, a))
  const length = Math.sqrt(times(across, across))
  if (length < 1e-6) return null
  const sign = times(across, minus(a, middle)) < 0 ? -1 : 1
  const normal = { x: (sign * across.x) / length, y: (sign * across.y) / length, z: (sign * across.z) / length }
  return { normal, offset: times(normal, a) }
}

/** Clear distance from a piece to the body: negative by how far the piece stands inside it. */
export function pieceToConvex({ a, b, radius }: Piece, body: Convex): number {
  const inside = deepest(a, b, body.planes)
  if (inside <= 0) return inside - radius
  const ribs = body.ribs.reduce((least, rib) => Math.min(least, segmentsApart(a, b, rib).distance), Infinity)
  return Math.min(ribs, overFace(a, body.planes), overFace(b, body.planes)) - radius
}

/** Least, along the segment, of the distance outside the farthest plane: 0 or less where the segment enters the body. */
function deepest(a: Vec, b: Vec, planes: readonly Plane[]): number {
  const lines = planes.map(({ normal, offset }) => ({ from: times(normal, a) - offset, to: times(normal, b) - offset }))
  const at = (share: number) =>
    lines.reduce((most, { from, to }) => Math.max(most, from + share * (to - from)), -Infinity)
  // The greatest of straight lines is least at an end or where two of them cross.
  let least = Math.min(at(0), at(1))
  for (const [i, one] of lines.entries()) {
    for (const other of lines.slice(i + 1)) {
      const closing = one.from - one.to - (other.from - other.to)
      const share = closing === 0 ? -1 : (one.from - other.from) / closing
      if (share > 0 && share < 1) least = Math.min(least, at(share))
    }
  }
  return least
}

/** Distance of a point over a face of the body that it stands square above; infinite elsewhere. */
function overFace(point: Vec, planes: readonly Plane[]): number {
  for (const { normal, offset } of planes) {
    const away = times(normal, point) - offset
    if (away < 0) continue
    const foot = { x: point.x - away * normal.x, y: point.y - away * normal.y, z: point.z - away * normal.z }
    if (planes.every((other) => times(other.normal, foot) - other.offset <= 1e-6)) return away
  }
  return Infinity
}
