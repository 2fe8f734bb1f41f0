/** Corners of a pour's outline between two edges along which tendons end. */

import { tendonEndsOfEdge } from './gaps'
import { cross, ROUNDING, sidesOf, subtract } from './geometry'
import type { LayoutIndex } from './layout-index'
import type { Corner, Edge } from './model'

export interface EdgeCorner {
  readonly corner: Corner
  /** In the order of the outline: the edge that ends at the corner, and the one that begins there. */
  readonly before: Edge
  readonly after: Edge
  /** The corner points into the concrete. */
  readonly isReentrant: boolean
}

/** Corners with tendon ends along both of their edges; re-entrant ones with tendon ends along either. Not within a curve. */
export function cornersOfPour(index: LayoutIndex, pourId: string): EdgeCorner[] {
  const outline = index.pours.get(pourId)?.outline ?? []
  const edges = new Map((index.edgesOfPour.get(pourId) ?? []).map((edge) => [edge.cornerId, edge]))
  const sides = sidesOf(outline)
  return outline.flatMap((corner, i): EdgeCorner[] => {
    const at = (i + outline.length - 1) % outline.length
    const [before, after] = [edges.get(outline[at]?.id ?? ''), edges.get(corner.id)]
    const [sideBefore, sideAfter] = [sides[at], sides[i]]
    if (!before || !after || !sideBefore || !sideAfter) return []
    const turn = cross(subtract(sideBefore[1], sideBefore[0]), subtract(sideAfter[1], sideAfter[0]))
    const isReentrant = turn < -ROUNDING
    if (Math.abs(turn) <= ROUNDING || (before.isChord && after.isChord)) return []
    const withEnds = [before, after].filter(({ id }) => tendonEndsOfEdge(index, id).length > 0)
    return withEnds.length === 2 || (isReentrant && withEnds.length === 1)
      ? [{ corner, before, after, isReentrant }]
      : []
  })
}

export const cornerId = ({ corner }: Pick<EdgeCorner, 'corner'>): string => `corner:${corner.id}`
