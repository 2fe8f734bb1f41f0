/**
 * What the tendons of a pour leave without precompression behind one of its edges.
 *
 * A tendon compresses where the spread of one of its ends and that of the other both reach. Counted at an edge are all
 * tendon ends of its pour, in pans as well, that point out at it within half a right angle. Each pour stands alone: the
 * spread of the next pour does not come across the joint.
 */

import type { EdgeFrame } from '../frame'
import { add, dot, isInside, ROUNDING, scale, sidesOf } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import { perConcrete } from '../memo'
import type { Anchor, Hardware, Point } from '../model'
import { clippedTo } from './clip'
import type { PlanPoint } from './closed-form'
import { type Bound } from './envelope'
import { inwardOf, roomOf, spreadFrom, spreadOutline, type EntryFace, type Room } from './spread'

/** How spread is taken. */
export interface SpreadAsk {
  /** To each side of the tendon, rad. */
  readonly angle: number
  readonly startsAt: 'bearing-face' | 'device-end'
  /** Behind the bulbs of a bonded dead end, mm, before which nothing is counted; 0 counts from the bulbs. */
  readonly bondOf: (anchor: Anchor) => number
}

/** What bounds the depth without precompression: the side of a spread, or the concrete's far face. */
export interface Limit {
  /** The tendon end whose spread it is; null for the concrete. */
  readonly end: NearEnd | null
  /** Where the straight side begins. */
  readonly start: PlanPoint
  /** Along the edge for each mm of depth, positive; 0 for a face. */
  readonly slope: number
}

export type DepthBound = Bound<Limit>

/** A tendon end that compresses the concrete behind an edge. */
export interface NearEnd {
  readonly anchorId: string
  readonly chainage: number
  /** Sides of its spread as it opens, in the edge's own coordinates. */
  readonly bounds: readonly DepthBound[]
  /** Spread of the tendon's other end, as chainage and depth; null while that end is open. */
  readonly other: readonly Point[] | null
  readonly reach: Reach
}

/** How far along the edge a spread can come at a depth: `half + (depth - start) * steepest`, mm. */
export interface Reach {
  readonly half: number
  readonly start: number
  readonly steepest: number
}

/** Everything that can bound the depth behind an edge. */
export interface EdgeSpreads {
  /** By chainage. */
  readonly ends: readonly NearEnd[]
  /** Of the end that comes furthest. */
  readonly reach: Reach
  readonly concrete: readonly DepthBound[]
  /** Deeper than the concrete, mm. */
  readonly beyond: number
}

/** An end that leans further than half a right angle from the normal of an edge compresses another edge. */
const SQUARE_COSINE = Math.SQRT1_2

/** Spread of the tendons behind one edge, by the pour that it belongs to. */
export function spreadsOfEdge(index: LayoutIndex, edgeId: string, ask: SpreadAsk): EdgeSpreads {
  const frame = found(index.frames, edgeId, 'edge')
  const { pourId } = found(index.edges, edgeId, 'edge')
  const room = roomOfPour(index, pourId)
  const ends = endsOfPour(index, pourId)
    .filter(({ inward }) => dot(inward, frame.inward) > SQUARE_COSINE)
    .map((end) => nearEnd(index, { end, frame, room, ask }))
    .sort((a, b) => a.chainage - b.chainage || (a.anchorId < b.anchorId ? -1 : 1))
  return {
    ends,
    reach: furthest(ends.map(({ reach }) => reach)),
    concrete: concreteBounds(frame, room),
    beyond: 4 * room.size,
  }
}

/** Two edges on one side of one line as if their pours were one; the far faces of the concrete are left out. */
export function joinedSpreads(one: EdgeSpreads, other: EdgeSpreads): EdgeSpreads {
  return {
    ends: [...one.ends, ...other.ends].sort((a, b) => a.chainage - b.chainage || (a.anchorId < b.anchorId ? -1 : 1)),
    reach: furthest([one.reach, other.reach]),
    concrete: [],
    beyond: Math.max(one.beyond, other.beyond),
  }
}

const furthest = (reaches: readonly Reach[]): Reach =>
  reaches.reduce(
    (most, { half, start, steepest }) => ({
      half: Math.max(most.half, half),
      start: Math.min(most.start, start),
      steepest: Math.max(most.steepest, steepest),
    }),
    { half: 0, start: 0, steepest: 0 },
  )

const roomOfPour = perConcrete((index, pourId): Room => roomOf(found(index.pours, pourId, 'pour').outline))

// Ends of tendons in plan -----------------------------------------------------------------------------------------

interface PlanEnd {
  readonly anchor: Anchor
  readonly hardware: Hardware
  readonly at: Point
  readonly inward: Point
}

const endsOfPour = perConcrete((index, pourId): readonly PlanEnd[] => {
  const atEdges = (index.edgesOfPour.get(pourId) ?? []).flatMap(({ id }) => index.anchorsOfEdge.get(id) ?? [])
  const inPans = (index.pansOfPour.get(pourId) ?? []).flatMap(({ id }) => index.anchorsOfPan.get(id) ?? [])
  return [...atEdges, ...inPans].flatMap((anchor) => planEnd(index, anchor) ?? [])
})

function planEnd(index: LayoutIndex, anchor: Anchor): PlanEnd | null {
  const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
  const pan = anchor.panId === null ? undefined : index.pans.get(anchor.panId)
  if (pan) return { anchor, hardware, at: { x: pan.x, y: pan.y }, inward: inwardOf(pan.azimuth) }
  const frame = anchor.edgeId === null ? undefined : index.frames.get(anchor.edgeId)
  if (!frame) return null
  return {
    anchor,
    hardware,
    at: frame.pointAt(anchor.chainage, anchor.setBack),
    inward: inwardOf(frame.outwardAzimuth + anchor.skew),
  }
}

function faceOf({ anchor, hardware, at, inward }: PlanEnd, { startsAt, bondOf }: SpreadAsk): EntryFace {
  const behind = (startsAt === 'device-end' ? hardware.deviceLength : 0) + bondOf(anchor)
  return { at: add(at, scale(inward, behind)), inward, width: hardware.plate.width }
}

function otherEndOf(index: LayoutIndex, { id, tendonId }: Anchor): PlanEnd | null {
  const [other, third] = (index.anchorsOfTendon.get(tendonId) ?? []).filter((anchor) => anchor.id !== id)
  return other && !third ? planEnd(index, other) : null
}

// Bounds in an edge's own coordinates ------------------------------------------------------------------------------

interface EndPlace {
  readonly end: PlanEnd
  readonly frame: EdgeFrame
  readonly room: Room
  readonly ask: SpreadAsk
}

function nearEnd(index: LayoutIndex, { end, frame, room, ask }: EndPlace): NearEnd {
  const spread = spreadFrom(faceOf(end, ask), ask.angle, room)
  const [left, right] = [spread.left.map(frame.local), spread.right.map(frame.local)]
  const around = [...left].reverse().concat(right)
  const starts = [...left.slice(0, 1), ...right.slice(0, 1)]
  const chainage = frame.local(end.at).chainage
  const other = otherEndOf(index, end.anchor)
  const lean = Math.acos(Math.min(1, dot(end.inward, frame.inward)))
  const near: { -readonly [K in keyof NearEnd]: NearEnd[K] } = {
    anchorId: end.anchor.id,
    chainage,
    bounds: [],
    other: other && otherOutline({ end: other, frame, room, ask }),
    reach: {
      half: Math.max(...starts.map((point) => Math.abs(point.chainage - chainage))),
      start: Math.min(...starts.map(({ depth }) => depth)),
      steepest: ask.angle + lean < STEEPEST ? Math.tan(ask.angle + lean) : Infinity,
    },
  }
  near.bounds = around.slice(1).flatMap((point, i) => {
    const from = around[i]
    return from ? boundsBetween(from, point, near) : []
  })
  return near
}

/** A side that leans more than this from the normal reaches as far as one likes. */
const STEEPEST = 1.5

/** Its own pour may be another one; without walls in the way its spread then runs straight. */
function otherOutline({ end, frame, room, ask }: EndPlace): readonly Point[] {
  const own = isInside(end.at, room.outline) ? room : { ...room, isReentrant: false, size: 4 * room.size }
  return spreadOutline(spreadFrom(faceOf(end, ask), ask.angle, own), own)
    .map(frame.local)
    .map(({ chainage, depth }) => ({ x: chainage, y: depth }))
}

/** A side that begins in front of the edge bounds from the edge on. */
function boundsBetween(from: PlanPoint, to: PlanPoint, end: NearEnd | null): DepthBound[] {
  const [shallow, deep] = from.depth <= to.depth ? [from, to] : [to, from]
  const rise = deep.depth - shallow.depth
  const along = Math.abs(deep.chainage - shallow.chainage)
  const source: Limit = { end, start: shallow, slope: rise > ROUNDING ? along / rise : 0 }
  const atEdge = (point: PlanPoint): PlanPoint => ({ chainage: point.chainage, depth: Math.max(0, point.depth) })
  if (shallow.depth >= 0 || deep.depth <= 0) return [{ a: atEdge(shallow), b: atEdge(deep), source }]
  const share = -shallow.depth / rise
  const meeting = { chainage: shallow.chainage + (deep.chainage - shallow.chainage) * share, depth: 0 }
  return [
    { a: atEdge(shallow), b: meeting, source },
    { a: meeting, b: deep, source },
  ]
}

/** The sides of the outline behind the edge. */
function concreteBounds(frame: EdgeFrame, { outline }: Room): DepthBound[] {
  return sidesOf(outline).flatMap(([a, b]) => {
    const [from, to] = [frame.local(a), frame.local(b)]
    if (Math.max(from.depth, to.depth) <= ROUNDING) return []
    return behindEdge(from, to).flatMap(([one, other]) => boundsBetween(one, other, null))
  })
}

/** The part of a side that lies behind the line of the edge. */
function behindEdge(a: PlanPoint, b: PlanPoint): [PlanPoint, PlanPoint][] {
  const [shallow, deep] = a.depth <= b.depth ? [a, b] : [b, a]
  if (shallow.depth >= 0) return [[shallow, deep]]
  const share = -shallow.depth / (deep.depth - shallow.depth)
  return [[{ chainage: shallow.chainage + (deep.chainage - shallow.chainage) * share, depth: 0 }, deep]]
}

/** The bounds of an end as far as the spread of the tendon's other end reaches them. */
export function boundsWithOther({ bounds, other }: NearEnd): readonly DepthBound[] {
  if (!other) return bounds
  const inPlane = ({ chainage, depth }: PlanPoint): Point => ({ x: chainage, y: depth })
  const back = ({ x, y }: Point): PlanPoint => ({ chainage: x, depth: y })
  return bounds.flatMap(({ a, b, source }) =>
    clippedTo(inPlane(a), inPlane(b), other).map(([from, to]) => ({ a: back(from), b: back(to), source })),
  )
}
