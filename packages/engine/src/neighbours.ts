/** The anchors beside an anchor in its row: same edge line, same side, whatever pour. */

import type { LayoutIndex } from './layout-index'
import type { Anchor } from './model'

export interface Neighbours {
  /** The nearest to either side along the edge, those one above the other included. */
  readonly nearest: readonly Anchor[]
  /** All whose distance along the edge is below `reach`, the nearest among them. */
  readonly within: readonly Anchor[]
}

/** Neighbours of an anchor at an edge; none for an anchor in a pan. */
export function neighboursOf(index: LayoutIndex, anchor: Anchor, reach: number): Neighbours {
  const row = index.rowOfEdge.get(anchor.edgeId ?? '') ?? []
  const at = positionOf(row, anchor)
  const sides = [walk(row, { from: at, by: -1, anchor, reach }), walk(row, { from: at, by: 1, anchor, reach })]
  return {
    nearest: [-1, 1].flatMap((by) => row[at + by] ?? []),
    within: sides.flat(),
  }
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
