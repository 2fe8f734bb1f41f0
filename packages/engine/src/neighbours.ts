/** The anchors beside an anchor: of its row at an edge, or those that face the same way beside its pan. */

import { alongAzimuth, dot, ROUNDING } from './geometry'
import { found, type LayoutIndex } from './layout-index'
import type { Anchor, Pan, Point } from './model'
import { panFrame } from './pan-frame'

export interface Neighbours {
  /** The nearest to either side along the edge, those one above the other included. */
  readonly nearest: readonly Anchor[]
  /** All whose distance along the edge is below `reach`, the nearest among them. */
  readonly within: readonly Anchor[]
}

/**
 * Neighbours of an anchor: at an edge those on the same edge line and side, whatever their pour; beside a pan those of
 * its pour that face the same way, with their chainage measured along the pan's bearing face.
 */
export function neighboursOf(index: LayoutIndex, anchor: Anchor, reach: number): Neighbours {
  const row = anchor.panId === null ? (index.rowOfEdge.get(anchor.edgeId ?? '') ?? []) : rowOfPan(index, anchor)
  const at = positionOf(row, anchor)
  const sides = [walk(row, { from: at, by: -1, anchor, reach }), walk(row, { from: at, by: 1, anchor, reach })]
  return {
    nearest: [-1, 1].flatMap((by) => row[at + by] ?? []),
    within: sides.flat(),
  }
}

/** Anchors turned from the pan by no more than this stand in one row with it. */
const SAME_WAY_COSINE = Math.cos(Math.PI / 9)

/**
 * The anchor of a pan with all that stand beside it, by chainage along its bearing face.
 *
 * One further in front or behind than it is aside does not count: at 45 degrees neither force has spread to the other.
 */
export function rowOfPan(index: LayoutIndex, anchor: Anchor): readonly Anchor[] {
  const pan = found(index.pans, anchor.panId ?? '', 'pan')
  const frame = panFrame(index, pan.id)
  const beside = facingAlike(index, pan).flatMap((other) => {
    const { chainage, depth } = frame.local(placeOf(index, other))
    return Math.abs(depth) <= Math.abs(chainage) + ROUNDING ? [{ ...other, chainage }] : []
  })
  const row = [anchor, ...beside.filter(({ id }) => id !== anchor.id)]
  return row.sort((a, b) => a.chainage - b.chainage || a.height - b.height || (a.id < b.id ? -1 : 1))
}

function facingAlike(index: LayoutIndex, pan: Pan): Anchor[] {
  const axis = alongAzimuth(pan.azimuth)
  const isAlike = (outward: Point) => dot(axis, outward) >= SAME_WAY_COSINE
  const pans = (index.pansOfPour.get(pan.pourId) ?? []).filter(({ azimuth }) => isAlike(alongAzimuth(azimuth)))
  const edges = (index.edgesOfPour.get(pan.pourId) ?? []).filter(({ id }) =>
    isAlike(alongAzimuth(found(index.frames, id, 'edge').outwardAzimuth)),
  )
  return [
    ...pans.flatMap(({ id }) => index.anchorsOfPan.get(id) ?? []),
    ...edges.flatMap(({ id }) => index.anchorsOfEdge.get(id) ?? []),
  ]
}

function placeOf(index: LayoutIndex, { edgeId, panId, chainage, setBack }: Anchor): Point {
  if (edgeId === null) return found(index.pans, panId ?? '', 'pan')
  return found(index.frames, edgeId, 'edge').pointAt(chainage, setBack)
}

function walk(
  row: readonly Anchor[],
  { from, by, anchor, reach }: { from: number; by: 1 | -1; anchor: Anchor; reach: number },
): Anchor[] {
  const near: Anchor[] = []
  for (let i = from + by; i >= 0 && i < row.length; i += by) {
    const other = row[i]
    if (!other || Math.abs(other.chainage - anchor.chainage) >= reach) break
    near.push(other)
  }
  return near
}

/** By halving on chainage, then along the few that stand at the same place. */
function positionOf(row: readonly Anchor[], anchor: Anchor): number {
  let [low, high] = [0, row.length]
  while (low < high) {
    const half = Math.floor((low + high) / 2)
    if ((row[half]?.chainage ?? Infinity) < anchor.chainage) low = half + 1
    else high = half
  }
  for (let i = low; i < row.length; i++) if (row[i]?.id === anchor.id) return i
  return low
}
