/** The area at a corner that has precompression square to neither of its two edges. */

import { cornerId, cornersOfPour, type EdgeCorner } from '../corners'
import { found, type LayoutIndex } from '../layout-index'
import { ROUNDING, signedArea } from '../geometry'
import { perConcrete } from '../memo'
import type { Edge, Point } from '../model'
import { sharedArea } from './clip'
import { wedgesOfEdge, type GapWedge } from './wedges-of-edge'

export interface CornerWedge extends EdgeCorner {
  /** Of the gaps that end at the corner, along the edge before it and the one after it. */
  readonly wedgeBefore: GapWedge | null
  readonly wedgeAfter: GapWedge | null
  /** mm2; 0 where one of the two spreads reaches into the corner, and at a re-entrant corner. */
  readonly area: number
  /** In plan; they do not overlap. */
  readonly polygons: readonly (readonly Point[])[]
  /** How far the area reaches from the corner along each edge, mm. */
  readonly alongBefore: number
  readonly alongAfter: number
}

/** Corners of a pour by the id of their zone. */
export const cornerWedges: (index: LayoutIndex, pourId: string) => ReadonlyMap<string, CornerWedge> = perConcrete(
  (index, pourId) =>
    new Map(cornersOfPour(index, pourId).map((corner) => [cornerId(corner), cornerWedge(index, corner)])),
)

function cornerWedge(index: LayoutIndex, corner: EdgeCorner): CornerWedge {
  const wedgeBefore = wedgeAt(index, corner.before, corner.corner)
  const wedgeAfter = wedgeAt(index, corner.after, corner.corner)
  const polygons = wedgeBefore && wedgeAfter ? sharedArea(inPlan(index, wedgeBefore), inPlan(index, wedgeAfter)) : []
  const reach = (edge: Edge) => {
    const { local } = found(index.frames, edge.id, 'edge')
    const zero = local(corner.corner).chainage
    return polygons.flat().reduce((most, point) => Math.max(most, Math.abs(local(point).chainage - zero)), 0)
  }
  return {
    ...corner,
    wedgeBefore,
    wedgeAfter,
    area: polygons.reduce((sum, polygon) => sum + Math.abs(signedArea(polygon)), 0),
    polygons,
    alongBefore: reach(corner.before),
    alongAfter: reach(corner.after),
  }
}

/** The wedge of the gap that ends at a corner. */
function wedgeAt(index: LayoutIndex, edge: Edge, corner: Point): GapWedge | null {
  const { chainage } = found(index.frames, edge.id, 'edge').local(corner)
  const wedges = [...wedgesOfEdge(index, edge.id).values()]
  return wedges.find(({ gap }) => [gap.from, gap.to].some((end) => Math.abs(end - chainage) <= ROUNDING)) ?? null
}

function inPlan(index: LayoutIndex, { gap, polygons }: GapWedge): Point[] {
  const { pointAt } = found(index.frames, gap.edgeId, 'edge')
  return (polygons[0] ?? []).map(({ chainage, depth }) => pointAt(chainage, depth))
}
