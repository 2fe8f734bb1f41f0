/**
 * The part of a layout round one zone. Whether bars can be fixed is worked out for a whole member and those beside it;
 * to try one zone's bars again and again only what could touch them is kept. The outcome is checked on the whole layout.
 */

import { distanceToSegment } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, Edge, Point } from '../model'
import type { Zone } from '../result'
import { wedgesOfEdge } from '../wedge/wedges-of-edge'

/** Bars of places farther than this from where a zone's own may lie hardly ever meet them, mm. */
const NEAR = 1500

/** How far bars of a zone run into the slab, mm: behind an anchor over the window in plan, across a joint with their laps. */
const DEEP = { anchor: 2000, group: 2000, pan: 4000, joint: 2000 } as const

/** @returns the whole layout for an edge, whose bars run from end to end. */
export function nearbyIndex(index: LayoutIndex, zone: Zone): LayoutIndex {
  const line = lineOf(index, zone)
  if (!line) return index
  const isNear = nearnessTo(index, zone, line)
  const edges = index.layout.edges.filter((edge) => edge.id === zone.edgeId || isBeside(index, edge, { line, isNear }))
  const edgeIds = new Set(edges.map(({ id }) => id))
  const pans = index.layout.pans.filter(isNear)
  const panIds = new Set(pans.map(({ id }) => id))
  const anchorsOfEdge = new Map(
    edges.map(({ id }) => [
      id,
      (index.anchorsOfEdge.get(id) ?? []).filter((anchor) => isNear(placeOf(index, anchor, id))),
    ]),
  )
  const anchorsOfPan = new Map(pans.map(({ id }) => [id, index.anchorsOfPan.get(id) ?? []]))
  const anchors = [...anchorsOfEdge.values(), ...anchorsOfPan.values()].flat()
  const anchorIds = new Set(anchors.map(({ id }) => id))
  const steel = index.layout.steel.filter(({ zone: at, shape }) => {
    // Wedge bars are moved clear of what they meet.
    if (shape.kind === 'wedge-bars') return false
    if (at.kind === 'anchor') return anchorIds.has(at.anchorId)
    if (at.kind === 'pan') return panIds.has(at.panId)
    return at.kind === 'joint' ? `joint:${at.jointId}` === zone.id : edgeIds.has(at.edgeId)
  })
  return {
    ...index,
    concrete: {},
    anchorsOfEdge,
    anchorsOfPan,
    steelOfZone: new Map([...index.steelOfZone].filter(([, [first]]) => first !== undefined && steel.includes(first))),
    layout: {
      ...index.layout,
      edges,
      pans,
      joints: index.layout.joints.filter(({ id }) => `joint:${id}` === zone.id),
      anchors,
      steel,
      obstructions: index.layout.obstructions.filter(({ outline }) => outline.some(isNear)),
    },
  }
}

/** Whether a place lies near where bars of the zone may be: behind its length of edge, or round its pan. */
function nearnessTo(index: LayoutIndex, zone: Zone, line: readonly [Point, Point]): (point: Point) => boolean {
  const { edgeId, from, to } = zone
  if (zone.panId !== null || edgeId === null || from === null || to === null) {
    return (point) => distanceToSegment(point, ...line) <= DEEP.pan
  }
  const frame = found(index.frames, edgeId, 'edge')
  const deep = deepOf(index, zone)
  return (point) => {
    const { chainage, depth } = frame.local(point)
    return chainage >= from - NEAR && chainage <= to + NEAR && depth >= -NEAR && depth <= deep + NEAR
  }
}

function deepOf(index: LayoutIndex, { id, kind, edgeId }: Zone): number {
  if (kind === 'gap') return wedgesOfEdge(index, edgeId ?? '').get(id)?.depth ?? DEEP.anchor
  return kind === 'joint' ? DEEP.joint : DEEP.anchor
}

/** From one end of a zone to the other; a pan is a point. Null for a whole edge. */
function lineOf(index: LayoutIndex, { kind, edgeId, panId, from, to }: Zone): [Point, Point] | null {
  if (panId !== null) {
    const pan = found(index.pans, panId, 'pan')
    return [pan, pan]
  }
  if (edgeId === null || from === null || to === null || kind === 'edge') return null
  const { pointAt } = found(index.frames, edgeId, 'edge')
  return [pointAt(from, 0), pointAt(to, 0)]
}

function placeOf(index: LayoutIndex, { chainage, setBack }: Anchor, edgeId: string): Point {
  return found(index.frames, edgeId, 'edge').pointAt(chainage, setBack)
}

/** Bars along such an edge, or at one of its anchors, may come near. */
function isBeside(
  index: LayoutIndex,
  { id }: Edge,
  { line: [a, b], isNear }: { readonly line: readonly [Point, Point]; readonly isNear: (point: Point) => boolean },
): boolean {
  const frame = found(index.frames, id, 'edge')
  const [start, end] = [frame.pointAt(frame.from, 0), frame.pointAt(frame.to, 0)]
  const away = [
    distanceToSegment(a, start, end),
    distanceToSegment(b, start, end),
    distanceToSegment(start, a, b),
    distanceToSegment(end, a, b),
  ]
  const hasNear = (index.anchorsOfEdge.get(id) ?? []).some((anchor) => isNear(placeOf(index, anchor, id)))
  return Math.min(...away) <= NEAR || hasNear
}
