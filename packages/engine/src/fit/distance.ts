/** Distances in space between straight pieces, mm. */

import type { Vec } from '../placed/centre-line'

/** A straight piece of a bar's centre line, with half its diameter. */
export interface Piece {
  readonly a: Vec
  readonly b: Vec
  readonly radius: number
}

/** Box in space. */
export interface Box3 {
  readonly min: Vec
  readonly max: Vec
}

interface Nearest {
  readonly distance: number
  /** Where on the second segment, 0 to 1. */
  readonly at: number
}

const clamp = (value: number): number => Math.min(1, Math.max(0, value))

/** Shortest distance between the segments from a to b and from c to d, either of which may be a point. */
export function segmentsApart(a: Vec, b: Vec, [c, d]: readonly [Vec, Vec]): Nearest {
  const [ux, uy, uz] = [b.x - a.x, b.y - a.y, b.z - a.z]
  const [vx, vy, vz] = [d.x - c.x, d.y - c.y, d.z - c.z]
  const [wx, wy, wz] = [a.x - c.x, a.y - c.y, a.z - c.z]
  const uu = ux * ux + uy * uy + uz * uz
  const vv = vx * vx + vy * vy + vz * vz
  const uv = ux * vx + uy * vy + uz * vz
  const uw = ux * wx + uy * wy + uz * wz
  const vw = vx * wx + vy * wy + vz * wz
  const cross = uu * vv - uv * uv
  // Nearly parallel: any place on the first will do to begin with.
  let s = cross > 1e-9 * uu * vv ? clamp((uv * vw - vv * uw) / cross) : 0
  let t = vv > 0 ? (uv * s + vw) / vv : 0
  if (t < 0 || t > 1 || vv === 0) {
    t = clamp(t)
    s = uu > 0 ? clamp((uv * t - uw) / uu) : 0
  }
  const [x, y, z] = [wx + s * ux - t * vx, wy + s * uy - t * vy, wz + s * uz - t * vz]
  return { distance: Math.sqrt(x * x + y * y + z * z), at: t }
}

/** The box round some points, `by` outside them. */
export function boxOf(points: readonly Vec[], by: number): Box3 {
  let [x0, y0, z0, x1, y1, z1] = [Infinity, Infinity, Infinity, -Infinity, -Infinity, -Infinity]
  for (const { x, y, z } of points) {
    if (x < x0) x0 = x
    if (x > x1) x1 = x
    if (y < y0) y0 = y
    if (y > y1) y1 = y
    if (z < z0) z0 = z
    if (z > z1) z1 = z
  }
  return { min: { x: x0 - by, y: y0 - by, z: z0 - by }, max: { x: x1 + by, y: y1 + by, z: z1 + by } }
}

/** Whether two boxes come nearer to each other than `within` in every direction. */
export const boxesNear = (one: Box3, other: Box3, within: number): boolean =>
  one.min.x - within <= other.max.x &&
  other.min.x - within <= one.max.x &&
  one.min.y - within <= other.max.y &&
  other.min.y - within <= one.max.y &&
  one.min.z - within <= other.max.z &&
  other.min.z - within <= one.max.z
