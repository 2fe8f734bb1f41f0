import { add, alongAzimuth, dot, scale, subtract, turnedLeft } from '../geometry'
import type { Pan, Point } from '../model'

/** Plan coordinates of an edge, a pan or a joint: along it, and square to it into the concrete. */
export interface PlanFrame {
  readonly along: Point
  readonly inward: Point
  readonly pointAt: (chainage: number, depth: number) => Point
}

/** A pan's own coordinates: chainage across it from the tendon, depth behind its bearing face. */
export function panFrame(pan: Pick<Pan, 'x' | 'y' | 'azimuth'>): PlanFrame & {
  readonly local: (point: Point) => { readonly chainage: number; readonly depth: number }
} {
  const axis = alongAzimuth(pan.azimuth)
  const [along, inward] = [turnedLeft(axis), scale(axis, -1)]
  return {
    along,
    inward,
    pointAt: (chainage, depth) => add(add({ x: pan.x, y: pan.y }, scale(along, chainage)), scale(inward, depth)),
    local: (point) => ({ chainage: dot(subtract(point, pan), along), depth: dot(subtract(point, pan), inward) }),
  }
}
