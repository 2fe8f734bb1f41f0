/** An edge's own coordinates: chainage along its line, depth into the slab, height. */

import { add, alongAzimuth, azimuthOf, dot, scale, subtract, turnedLeft } from './geometry'
import type { Edge, EdgeLength, EdgeLine, Layout, Point, Pour } from './model'

/** A place in an edge's own coordinates, mm: depth counts into the slab, height from the pour's soffit datum. */
export interface LocalPoint {
  readonly chainage: number
  readonly depth: number
  readonly height: number
}

/** What the frame of an edge and that of a pan's bearing face have in common. */
export interface AnchorFrame {
  /** Chainage of the two ends: of the edge on its edge line, or of the concrete beside a pan's bearing face, mm. */
  readonly from: number
  readonly to: number
  /** Unit vector in which chainage grows. */
  readonly along: Point
  /** Unit vector into the slab, square to `along`. */
  readonly inward: Point
  /** Azimuth of the outward normal, rad. */
  readonly outwardAzimuth: number
  /** Chainage grows from left to right for somebody outside who faces the slab. */
  readonly runsLeftToRight: boolean
  readonly pointAt: (chainage: number, depth: number) => Point
  readonly local: (point: Point) => { readonly chainage: number; readonly depth: number }
  readonly topAt: (chainage: number) => number
  readonly soffitAt: (chainage: number) => number
  /** Chainages at which top or soffit steps, growing. */
  readonly steps: readonly number[]
}

export interface EdgeFrame extends AnchorFrame {
  readonly edgeId: string
  /** The length of the edge at a chainage; where two lengths meet, the one that begins there. */
  readonly lengthAt: (chainage: number) => EdgeLength
}

/**
 * Frame of one side of a pour's outline.
 *
 * The outline runs counter-clockwise, so the slab lies left of each side whatever way chainage runs on its line.
 * @throws where the edge's corner is not one of the outline's or the edge has no length: references are checked before.
 */
export function frameOfSide(of: { readonly edge: Edge; readonly line: EdgeLine; readonly pour: Pour }): EdgeFrame {
  const { edge, line, pour } = of
  const [start, end] = sideOf(edge, pour)
  const along = alongAzimuth(line.azimuth)
  const runsLeftToRight = dot(subtract(end, start), along) > 0
  const inward = runsLeftToRight ? turnedLeft(along) : scale(turnedLeft(along), -1)
  const chainageOf = (point: Point) => dot(subtract(point, line), along)
  const ends = [chainageOf(start), chainageOf(end)]
  const lengths = [...edge.lengths].sort((a, b) => a.from - b.from)
  const lengthAt = (chainage: number) => lengthOf(edge, lengths, chainage)
  return {
    edgeId: edge.id,
    from: Math.min(...ends),
    to: Math.max(...ends),
    along,
    inward,
    outwardAzimuth: azimuthOf(scale(inward, -1)),
    runsLeftToRight,
    pointAt: (chainage, depth) => add(add({ x: line.x, y: line.y }, scale(along, chainage)), scale(inward, depth)),
    local: (point) => ({ chainage: chainageOf(point), depth: dot(subtract(point, line), inward) }),
    lengthAt,
    topAt: (chainage) => lengthAt(chainage).top,
    soffitAt: (chainage) => lengthAt(chainage).soffit,
    steps: lengths.flatMap((length, i) => {
      const before = lengths[i - 1]
      return before && (before.top !== length.top || before.soffit !== length.soffit) ? [length.from] : []
    }),
  }
}

/** Frame of one edge of a layout, for a single look-up; `layoutIndex` holds the frames of all. */
export function edgeFrame(layout: Layout, edgeId: string): EdgeFrame {
  const edge = layout.edges.find((candidate) => candidate.id === edgeId)
  const line = layout.edgeLines.find((candidate) => candidate.id === edge?.edgeLineId)
  const pour = layout.pours.find((candidate) => candidate.id === edge?.pourId)
  if (!edge || !line || !pour) throw new Error(`Edge "${edgeId}", its edge line or its pour is not in the layout.`)
  return frameOfSide({ edge, line, pour })
}

/** The two corners of the side that an edge stands for, in the order of the outline. */
function sideOf(edge: Edge, pour: Pour): [Point, Point] {
  const at = pour.outline.findIndex((corner) => corner.id === edge.cornerId)
  const start = pour.outline[at]
  const end = pour.outline[(at + 1) % pour.outline.length]
  if (!start || !end)
    throw new Error(`Edge ${edge.mark}: no corner of pour ${pour.mark} has the id "${edge.cornerId}".`)
  return [start, end]
}

/** Outside all lengths the nearest one counts, so that a bar or a plate that overhangs is still measured. */
function lengthOf(edge: Edge, lengths: readonly EdgeLength[], chainage: number): EdgeLength {
  const length = lengths.findLast((candidate) => candidate.from <= chainage) ?? lengths[0]
  if (!length) throw new Error(`Edge ${edge.mark} has no length.`)
  return length
}

/**
 * Turn of a tendon's inward direction towards growing chainage, rad.
 *
 * Skew turns the outward axis clockwise. Somebody outside who faces the slab then sees the tendon lean to the right as
 * it goes in, which is towards growing chainage where chainage runs from left to right.
 */
export function leanOf(frame: AnchorFrame, skew: number): number {
  return frame.runsLeftToRight ? skew : 0 - skew
}
