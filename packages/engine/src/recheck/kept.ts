/** The part of a layout that the touched places are worked out from. */

import { distanceToSegment, ROUNDING } from '../geometry'
import { found, rowsOf, type LayoutIndex } from '../layout-index'
import type { Anchor, Edge, Point } from '../model'
import type { Reaches } from './reach'
import { besides, type Range, type TouchedEdge } from './touched'

export interface Around {
  readonly touched: readonly TouchedEdge[]
  readonly reaches: Reaches
  /** Lines and points in plan round which everything is kept as well: pans, joints. */
  readonly lines: readonly Line[]
  /** For bars and bodies alone: only what stands within reach of them. */
  readonly isForFit: boolean
}

export type Line = readonly [Point, Point]

/** The same index with the anchors alone that stand near enough to what is touched; pans are all kept. */
export function keptIndex(index: LayoutIndex, around: Around): LayoutIndex {
  const lines = [...around.lines, ...around.touched.flatMap((one) => linesOf(index, one, around))]
  const anchorsOfEdge = new Map(
    index.layout.edges.map(({ id }): [string, readonly Anchor[]] => [id, keptOf(index, id, { around, lines })]),
  )
  const { edges } = index.layout
  return { ...index, concrete: {}, anchorsOfEdge, rowOfEdge: rowsOf(edges, { frames: index.frames, anchorsOfEdge }) }
}

const rangesOf = ({ ranges, fittedRanges }: TouchedEdge, { isForFit }: Around): readonly Range[] =>
  isForFit ? fittedRanges : ranges

function linesOf({ frames }: LayoutIndex, one: TouchedEdge, around: Around): Line[] {
  const { pointAt } = found(frames, one.edge.id, 'edge')
  return rangesOf(one, around).map(({ from, to }) => [pointAt(from, 0), pointAt(to, 0)])
}

/** Beyond the touched places the row goes on by as many places. */
const PLACES_BEYOND = 3

function keptOf(
  index: LayoutIndex,
  edgeId: string,
  { around, lines }: { readonly around: Around; readonly lines: readonly Line[] },
): readonly Anchor[] {
  const { touched, reaches } = around
  const anchors = index.anchorsOfEdge.get(edgeId) ?? []
  const frame = found(index.frames, edgeId, 'edge')
  const edge = found(index.edges, edgeId, 'edge')
  const kept = new Set<Anchor>()
  for (const one of touched) {
    const margin = around.isForFit ? reaches.along : marginOf(one, reaches)
    const local = found(index.frames, one.edge.id, 'edge')
    const isOwn = isInOneRow(index, one.edge, edge)
    if (!isOwn && (around.isForFit || one.edge.pourId !== edge.pourId)) continue
    for (const range of rangesOf(one, around)) {
      for (const anchor of anchors) {
        const { chainage, depth } = local.local(frame.pointAt(anchor.chainage, anchor.setBack))
        const away = isOwn ? awayFrom(range, anchor.chainage) : awayFrom(range, chainage) - 2 * Math.abs(depth)
        if (away <= margin) kept.add(anchor)
      }
      if (!isOwn || around.isForFit) continue
      for (const anchor of besides(anchors, { at: range.from, way: -1, places: PLACES_BEYOND })) kept.add(anchor)
      for (const anchor of besides(anchors, { at: range.to, way: 1, places: PLACES_BEYOND })) kept.add(anchor)
    }
  }
  const near = lines.filter((line) => isLineNear(line, frame, reaches.inPlan))
  for (const anchor of near.length > 0 ? anchors : []) {
    const point = frame.pointAt(anchor.chainage, anchor.setBack)
    if (near.some((line) => distanceToSegment(point, ...line) <= reaches.inPlan)) kept.add(anchor)
  }
  return anchors.filter((anchor) => kept.has(anchor))
}

function marginOf({ gaps, gapIds }: TouchedEdge, { along, gapBase, gapShare }: Reaches): number {
  const widest = gaps.reduce((most, { id, from, to }) => (gapIds.has(id) ? Math.max(most, to - from) : most), 0)
  return Math.max(along, gapBase + gapShare * widest)
}

const awayFrom = ({ from, to }: Range, chainage: number): number => Math.max(from - chainage, chainage - to, 0)

function isInOneRow(index: LayoutIndex, one: Edge, other: Edge): boolean {
  const way = ({ id }: Edge) => found(index.frames, id, 'edge').runsLeftToRight
  return one.edgeLineId === other.edgeLineId && way(one) === way(other)
}

function isLineNear(
  [a, b]: Line,
  frame: { readonly from: number; readonly to: number; readonly pointAt: (chainage: number, depth: number) => Point },
  reach: number,
): boolean {
  const [start, end] = [frame.pointAt(frame.from, 0), frame.pointAt(frame.to, 0)]
  const away = [
    distanceToSegment(a, start, end),
    distanceToSegment(b, start, end),
    distanceToSegment(start, a, b),
    distanceToSegment(end, a, b),
  ]
  return Math.min(...away) <= reach + ROUNDING
}
