/** Tendon ends along an edge and the gaps between them. */

import { leanOf, type EdgeFrame } from './frame'
import { alongAzimuth, dot, ROUNDING } from './geometry'
import { found, gapId, type LayoutIndex } from './layout-index'
import type { Anchor, Hardware, Pan } from './model'

/** One end of a tendon that points at an edge: from the edge itself or from a pan behind it. */
export interface TendonEnd {
  readonly anchor: Anchor
  readonly hardware: Hardware
  readonly panId: string | null
  readonly chainage: number
  /** From the slab edge to the bearing face, or to the bulbs of a bonded dead end. */
  readonly setBack: number
  /** Plate or splay, along the edge. */
  readonly width: number
  /** Turn of the inward direction towards growing chainage, rad. */
  readonly lean: number
}

/** Between two neighbouring tendon ends, or from the last one to the end of the edge (null). */
export interface Gap {
  readonly id: string
  readonly edgeId: string
  readonly pourId: string
  readonly after: TendonEnd | null
  readonly before: TendonEnd | null
  readonly from: number
  readonly to: number
}

/** Beyond half a right angle a pan's tendon stands square to another edge rather than to this one. */
const SQUARE_COSINE = Math.SQRT1_2

/** The gaps of one edge within its pour, by chainage; an edge that no tendon points at has one, from end to end. */
export function gapsOfEdge(index: LayoutIndex, edgeId: string): Gap[] {
  const edge = found(index.edges, edgeId, 'edge')
  const frame = found(index.frames, edgeId, 'edge')
  const ends: (TendonEnd | null)[] = [null, ...tendonEndsOfEdge(index, edgeId), null]
  return ends.slice(1).flatMap((before, i): Gap[] => {
    const after = ends[i] ?? null
    // Anchors one above the other stand at one place along the edge: there is no gap between them.
    if (after && before && before.chainage - after.chainage <= ROUNDING) return []
    return [
      {
        id: gapId(edgeId, after?.anchor.id ?? null, before?.anchor.id ?? null),
        edgeId,
        pourId: edge.pourId,
        after,
        before,
        from: after?.chainage ?? frame.from,
        to: before?.chainage ?? frame.to,
      },
    ]
  })
}

/** Every tendon end that points at an edge, by chainage: its own anchors, and those in pans whose jack faces it. */
export function tendonEndsOfEdge(index: LayoutIndex, edgeId: string): TendonEnd[] {
  const edge = found(index.edges, edgeId, 'edge')
  const frame = found(index.frames, edgeId, 'edge')
  const own = (index.anchorsOfEdge.get(edgeId) ?? []).map((anchor) => edgeEnd(index, frame, anchor))
  const inPans = (index.pansOfPour.get(edge.pourId) ?? [])
    .filter((pan) => edgeFacedBy(index, pan) === edgeId)
    .flatMap((pan) => (index.anchorsOfPan.get(pan.id) ?? []).map((anchor) => panEnd(index, { frame, pan, anchor })))
  return [...own, ...inPans].sort(
    (a, b) => a.chainage - b.chainage || a.anchor.height - b.anchor.height || (a.anchor.id < b.anchor.id ? -1 : 1),
  )
}

/** The edge of its pour that a pan's jack points at: the first that its axis meets, and that it stands square to. */
export function edgeFacedBy(index: LayoutIndex, pan: Pan): string | null {
  const axis = alongAzimuth(pan.azimuth)
  const met = (index.edgesOfPour.get(pan.pourId) ?? []).flatMap((edge) => {
    const frame = found(index.frames, edge.id, 'edge')
    const towards = -dot(axis, frame.inward)
    const { chainage, depth } = frame.local(pan)
    if (towards < SQUARE_COSINE || depth < 0) return []
    const reached = chainage + (dot(axis, frame.along) * depth) / towards
    return reached >= frame.from && reached <= frame.to ? [{ id: edge.id, away: depth / towards }] : []
  })
  return met.sort((a, b) => a.away - b.away)[0]?.id ?? null
}

function edgeEnd(index: LayoutIndex, frame: EdgeFrame, anchor: Anchor): TendonEnd {
  const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
  return {
    anchor,
    hardware,
    panId: null,
    chainage: anchor.chainage,
    setBack: anchor.setBack,
    width: hardware.plate.width,
    lean: leanOf(frame, anchor.skew),
  }
}

function panEnd(
  index: LayoutIndex,
  { frame, pan, anchor }: { readonly frame: EdgeFrame; readonly pan: Pan; readonly anchor: Anchor },
): TendonEnd {
  const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
  const { chainage, depth } = frame.local(pan)
  const skew = Math.asin(sineOfTurn(frame.outwardAzimuth, pan.azimuth))
  return {
    anchor,
    hardware,
    panId: pan.id,
    chainage,
    setBack: depth,
    width: hardware.plate.width,
    lean: leanOf(frame, skew),
  }
}

/** Sine of the clockwise turn from one azimuth to another; exact for square directions. */
function sineOfTurn(from: number, to: number): number {
  const [a, b] = [alongAzimuth(from), alongAzimuth(to)]
  return a.y * b.x - a.x * b.y
}
