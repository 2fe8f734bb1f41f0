/** The strip between a pan and the edge that its tendon would have run to: no tendon presses it together. */

import { edgeFacedBy, gapsOfEdge, type Gap } from './gaps'
import { found, type LayoutIndex } from './layout-index'
import { slabBeyond, type PanPlace } from './pan-place'

export interface PanStrip {
  readonly edgeMark: string
  /** From the bearing face to the edge along the jack's axis, mm. */
  readonly length: number
  /** Half the gap to the next tendon end on each side, or all of it to the end of the edge; left and right of the axis. */
  readonly left: number
  readonly right: number
  /** How far behind the bearing face the spread of this tendon meets its neighbours', mm. */
  readonly wedge: number
}

/** Null where the jack faces no edge of its pour. `spread` is the angle of spread behind an anchor, rad. */
export function panStrip(index: LayoutIndex, place: PanPlace, spread: number): PanStrip | null {
  const { pan, at } = place
  const edgeId = edgeFacedBy(index, pan)
  const length = slabBeyond(place)
  if (edgeId === null || !at || !Number.isFinite(length)) return null
  const gaps = gapsOfEdge(index, edgeId)
  const gapAfter = gaps.find(({ after }) => after?.anchor.id === at.anchor.id)
  const gapBefore = gaps.find(({ before }) => before?.anchor.id === at.anchor.id)
  const { runsLeftToRight } = found(index.frames, edgeId, 'edge')
  // Somebody outside who faces the slab looks against the jack's axis: their right is its left.
  const [leftGap, rightGap] = runsLeftToRight ? [gapAfter, gapBefore] : [gapBefore, gapAfter]
  const plate = at.hardware.plate.width
  const wedges = [gapBefore, gapAfter].flatMap((gap) => (gap ? [wedgeOf(gap, { plate, spread })] : []))
  return {
    edgeMark: found(index.edges, edgeId, 'edge').mark,
    length,
    left: leftGap ? widthOf(leftGap) : 0,
    right: rightGap ? widthOf(rightGap) : 0,
    wedge: Math.max(0, ...wedges),
  }
}

const isInner = ({ after, before }: Gap): boolean => after !== null && before !== null

function widthOf(gap: Gap): number {
  const width = gap.to - gap.from
  return isInner(gap) ? width / 2 : width
}

function wedgeOf(gap: Gap, { plate, spread }: { readonly plate: number; readonly spread: number }): number {
  return (widthOf(gap) - plate / 2) / Math.tan(spread)
}
