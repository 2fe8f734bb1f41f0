/** Two end gaps on both sides of a pour boundary as one, for the stages in which both pours are there and stressed. */

import { gapsOfEdge, type Gap } from '../gaps'
import { ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import type { Edge } from '../model'
import { joinedSpreads } from './edge-spreads'
import { measuredWedge, usedSpreads } from './wedges-of-edge'

export interface JoinedGap {
  /** The edge and the pour beyond the boundary. */
  readonly otherMark: string
  readonly otherPour: string
  readonly from: number
  readonly to: number
  /** From the slab edge by the spread in use, mm; the deeper of bulbs and bond. */
  readonly depth: number
  /** mm2, of the gap on both sides. */
  readonly area: number
}

/** Null where the gap does not end at the boundary to another pour that has tendons along the same line and side. */
export function gapAcross(index: LayoutIndex, gap: Gap): JoinedGap | null {
  if (gap.after && gap.before) return null
  const edge = found(index.edges, gap.edgeId, 'edge')
  const end = gap.before === null ? gap.to : gap.from
  const other = neighbourAt(index, edge, end)
  const beyond = other && gapsOfEdge(index, other.id).at(gap.before === null ? 0 : -1)
  if (!other || !beyond) return null
  const [after, before] = gap.before === null ? [gap.after, beyond.before] : [beyond.after, gap.before]
  if (!after || !before) return null
  const range = { from: after.chainage, to: before.chainage }
  const [own, others] = [usedSpreads(index, edge.id), usedSpreads(index, other.id)]
  const bulbs = measuredWedge(joinedSpreads(own.fromBulbs, others.fromBulbs), range)
  const bond = own.fromBond && others.fromBond && measuredWedge(joinedSpreads(own.fromBond, others.fromBond), range)
  const deeper = bond ?? bulbs
  return {
    otherMark: other.mark,
    otherPour: found(index.pours, other.pourId, 'pour').mark,
    ...range,
    depth: deeper.apex.depth,
    area: deeper.area,
  }
}

/** The edge of another pour that goes on from an end of this one, on the same line and side. */
function neighbourAt(index: LayoutIndex, edge: Edge, end: number): Edge | null {
  const frame = found(index.frames, edge.id, 'edge')
  const onLine = index.edgesOfLine.get(edge.edgeLineId) ?? []
  const next = onLine.find((other) => {
    const beside = found(index.frames, other.id, 'edge')
    const isSameSide = beside.runsLeftToRight === frame.runsLeftToRight
    const touches = [beside.from, beside.to].some((one) => Math.abs(one - end) <= ROUNDING)
    return other.pourId !== edge.pourId && isSameSide && touches
  })
  return next ?? null
}
