/** A pan's bearing face as an edge of its own: chainage counts along the face from its middle, depth behind it. */

import type { AnchorFrame } from './frame'
import { add, alongAzimuth, azimuthOf, dot, ROUNDING, scale, sidesOf, subtract, turnedLeft } from './geometry'
import { found, type LayoutIndex } from './layout-index'
import { perConcrete } from './memo'
import type { Point } from './model'
import { panOutline } from './pan-outline'
import { regionAt } from './section'

/** The line on which concrete beside the bearing face is looked for runs this far behind it, mm. */
const BEHIND = 1

/** Frame of a pan's bearing face; its two ends are the outline, an opening or another recess beside it. */
export const panFrame = perConcrete((index, panId): AnchorFrame => {
  const pan = found(index.pans, panId, 'pan')
  const pour = found(index.pours, pan.pourId, 'pour')
  const axis = alongAzimuth(pan.azimuth)
  const [along, inward] = [turnedLeft(axis), scale(axis, -1)]
  const local = (point: Point) => {
    const from = subtract(point, pan)
    return { chainage: dot(from, along), depth: dot(from, inward) }
  }
  const region = regionAt(pour, pan)
  const { top, soffit } = region ?? { top: pour.thickness, soffit: 0 }
  const crossings = outlinesBeside(index, pan.id).flatMap((outline) =>
    sidesOf(outline).flatMap(([a, b]) => crossing(local(a), local(b))),
  )
  return {
    from: Math.max(-Infinity, ...crossings.filter((at) => at <= 0)),
    to: Math.min(Infinity, ...crossings.filter((at) => at > 0)),
    along,
    inward,
    outwardAzimuth: azimuthOf(axis),
    runsLeftToRight: true,
    pointAt: (chainage, depth) => add(add({ x: pan.x, y: pan.y }, scale(along, chainage)), scale(inward, depth)),
    local,
    topAt: () => top,
    soffitAt: () => soffit,
    steps: [],
  }
})

/** The outline of the pour, openings in it and the recesses of its other pans. */
function outlinesBeside(index: LayoutIndex, panId: string): (readonly Point[])[] {
  const pour = found(index.pours, found(index.pans, panId, 'pan').pourId, 'pour')
  const recesses = (index.pansOfPour.get(pour.id) ?? []).filter((other) => other.id !== panId).map(panOutline)
  const openings = (index.openingsOfLevel.get(pour.levelId) ?? []).map(({ outline }) => outline)
  return [pour.outline, ...openings, ...recesses]
}

interface Local {
  readonly chainage: number
  readonly depth: number
}

/** Where a side crosses the line just behind the bearing face. */
function crossing(a: Local, b: Local): number[] {
  const [below, above] = [a.depth - BEHIND, b.depth - BEHIND]
  if (below > 0 === above > 0) return []
  return [a.chainage + ((b.chainage - a.chainage) * below) / (below - above)]
}

/** The part of a side that stands beside or behind a bearing face; null where all of it lies in front or in line. */
export function besideFace(frame: AnchorFrame, [a, b]: readonly [Point, Point]): readonly [Point, Point] | null {
  const [first, second] = [frame.local(a).depth, frame.local(b).depth]
  if (Math.max(first, second) <= ROUNDING) return null
  if (first >= 0 && second >= 0) return [a, b]
  const met = add(a, scale(subtract(b, a), first / (first - second)))
  return first >= 0 ? [a, met] : [met, b]
}
