/** Which anchors and gaps an edit can reach, edge by edge. */

import { closeAnchors } from '../close-anchors'
import { gapsOfEdge, type Gap } from '../gaps'
import { distanceToSegment, dot, ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, Edge, Point, SteelZone } from '../model'
import { inwardOf } from '../wedge/spread'
import { wedgesOfEdge } from '../wedge/wedges-of-edge'
import type { Changed, Edit } from './edit'
import type { Reaches } from './reach'

export interface TouchedEdge {
  readonly edge: Edge
  readonly anchorIds: ReadonlySet<string>
  readonly gapIds: ReadonlySet<string>
  readonly gaps: readonly Gap[]
  /** Lengths of the edge that hold them all, growing, mm. */
  readonly ranges: readonly Range[]
  /** Of these, what stands so near to a change that its bars may touch something else than before; likewise. */
  readonly fitted: ReadonlySet<string>
  readonly fittedRanges: readonly Range[]
  /** Only the spread of tendons comes here: nothing of the gap's own or beside it changed. */
  readonly spreadAlone: ReadonlySet<string>
}

export interface Range {
  readonly from: number
  readonly to: number
}

export interface Editing {
  readonly was: LayoutIndex
  readonly index: LayoutIndex
  readonly edit: Edit
  readonly reaches: Reaches
}

/** A place at which something changed, as it was or as it is now. */
interface Place {
  readonly edgeId: string | null
  readonly chainage: number
  readonly point: Point
  readonly inward: Point
  /** Something there changed itself; otherwise it is the other end of a tendon that did. */
  readonly isChanged: boolean
}

/** A length of an edge within which something changed. */
interface Window {
  readonly at: number
  readonly anchors: number
  readonly gaps: number
  /** Its neighbours are felt however far they stand. */
  readonly isInRow: boolean
  readonly isChanged: boolean
}

/** Ends of tendons whose own row, tendon or other end changed, by id. */
export interface ChangedEnds {
  readonly tendonIds: ReadonlySet<string>
  readonly changed: ReadonlySet<string>
  readonly others: ReadonlySet<string>
}

export function changedEnds({ was, index, edit }: Editing): ChangedEnds {
  const rows = <Row>(changes: readonly Changed<Row>[]): Row[] =>
    changes.flatMap(({ before, after }) => [before, after].filter((row) => row !== null))
  const anchors = rows(edit.anchors)
  const ofTendon = (tendonId: string) => [was, index].flatMap((one) => one.anchorsOfTendon.get(tendonId) ?? [])
  const own = rows(edit.tendons).map(({ id }) => id)
  const tendonIds = new Set([...own, ...anchors.map(({ tendonId }) => tendonId)])
  const all = [...tendonIds].flatMap(ofTendon).map(({ id }) => id)
  const isFelt = index.layout.job.settings.deadEndForce !== 'jacking'
  const changed = new Set([
    ...anchors.map(({ id }) => id),
    ...own.flatMap(ofTendon).map(({ id }) => id),
    ...(isFelt ? all : []),
  ])
  return { tendonIds, changed, others: new Set(all.filter((id) => !changed.has(id))) }
}

/** Every edge that the edit reaches, of whatever pour. */
export function touchedEdges(editing: Editing, ends: ChangedEnds): TouchedEdge[] {
  const places = placesOf(editing, ends)
  return editing.index.layout.edges.flatMap((edge) => touched(editing, edge, places) ?? [])
}

// Places --------------------------------------------------------------------------------------------------------------

function placesOf(editing: Editing, { changed, others }: ChangedEnds): Place[] {
  const { was, index, edit } = editing
  const ofId = (id: string, isChanged: boolean) =>
    [was, index].flatMap((one) => {
      const anchor = one.anchors.get(id)
      return anchor ? [placeOf(one, anchor, isChanged)] : []
    })
  const zones = edit.steel.flatMap(({ before, after }) => [before, after].flatMap((row) => (row ? [row.zone] : [])))
  return [
    ...[...changed].flatMap((id) => ofId(id, true)),
    ...[...others].flatMap((id) => ofId(id, false)),
    ...zones.flatMap((zone) => endsOfZone(zone).flatMap((id) => ofId(id, true))),
    ...zones.flatMap((zone) => endsOfEdge(index, zone)),
  ]
}

function placeOf(index: LayoutIndex, anchor: Anchor, isChanged: boolean): Place {
  const { edgeId, panId, chainage, setBack, skew } = anchor
  if (edgeId === null) {
    const pan = found(index.pans, panId ?? '', 'pan')
    return { edgeId, chainage, point: pan, inward: inwardOf(pan.azimuth), isChanged }
  }
  const frame = found(index.frames, edgeId, 'edge')
  return {
    edgeId,
    chainage,
    point: frame.pointAt(chainage, setBack),
    inward: inwardOf(frame.outwardAzimuth + skew),
    isChanged,
  }
}

function endsOfZone(zone: SteelZone): string[] {
  if (zone.kind === 'anchor') return [zone.anchorId]
  return zone.kind === 'gap' ? [zone.afterAnchorId, zone.beforeAnchorId].filter((id) => id !== null) : []
}

/** The end of an edge that a gap reaches to. */
function endsOfEdge(index: LayoutIndex, zone: SteelZone): Place[] {
  if (zone.kind !== 'gap') return []
  const frame = index.frames.get(zone.edgeId)
  if (!frame) return []
  const at = [...(zone.afterAnchorId === null ? [frame.from] : []), ...(zone.beforeAnchorId === null ? [frame.to] : [])]
  return at.map((chainage) => ({
    edgeId: zone.edgeId,
    chainage,
    point: frame.pointAt(chainage, 0),
    inward: frame.inward,
    isChanged: true,
  }))
}

// Windows -------------------------------------------------------------------------------------------------------------

/** Looser than the half right angle within which a tendon end counts at an edge. */
const FACING_COSINE = 0.6

/** Along an edge for each mm that an end stands off it. */
const SPREAD_PER_DEPTH = 2

function windowsOf({ index, reaches }: Editing, edge: Edge, places: readonly Place[]): Window[] {
  const frame = found(index.frames, edge.id, 'edge')
  const line = [frame.pointAt(frame.from, 0), frame.pointAt(frame.to, 0)] as const
  return places.flatMap((place): Window[] => {
    const { chainage, depth } = frame.local(place.point)
    const { isChanged } = place
    const at = place.edgeId === edge.id ? place.chainage : chainage
    if (isInRow(index, edge, place)) {
      const anchors = isChanged ? reaches.along : 0
      return [{ at, anchors, gaps: Math.max(anchors, reaches.gapBase), isInRow: true, isChanged }]
    }
    const isNear = isChanged && distanceToSegment(place.point, ...line) <= reaches.inPlan
    const isFacing = isOfPour(index, edge, place) && dot(place.inward, frame.inward) > FACING_COSINE
    const spread = isFacing ? reaches.gapBase + SPREAD_PER_DEPTH * Math.abs(depth) : 0
    if (!isNear && !isFacing) return []
    const anchors = isNear ? reaches.inPlan : -1
    return [{ at, anchors, gaps: Math.max(anchors, spread), isInRow: false, isChanged }]
  })
}

function isInRow(index: LayoutIndex, edge: Edge, { edgeId }: Place): boolean {
  if (edgeId === null || edgeId === edge.id) return edgeId === edge.id
  const other = found(index.edges, edgeId, 'edge')
  const way = ({ id }: Edge) => found(index.frames, id, 'edge').runsLeftToRight
  return other.edgeLineId === edge.edgeLineId && way(other) === way(edge)
}

const isOfPour = (index: LayoutIndex, edge: Edge, { edgeId, point }: Place): boolean =>
  edgeId === null
    ? (index.pansOfPour.get(edge.pourId) ?? []).some((pan) => pan === point)
    : found(index.edges, edgeId, 'edge').pourId === edge.pourId

// Anchors and gaps ----------------------------------------------------------------------------------------------------

function touched(editing: Editing, edge: Edge, changes: readonly Place[]): TouchedEdge | null {
  const { was, index, reaches } = editing
  const windows = windowsOf(editing, edge, changes)
  const thorough = throughGaps(editing, edge, changes)
  if (windows.length === 0 && thorough.length === 0) return null
  const anchors = index.anchorsOfEdge.get(edge.id) ?? []
  const anchorIds = new Set(windows.flatMap((window) => anchorsIn(anchors, window)))
  for (const one of [was, index]) withGroups(one, edge.id, anchorIds)
  const gaps = gapsOfEdge(index, edge.id)
  const through = new Set(thorough)
  const isTouched = ({ id, from, to, after, before }: Gap) =>
    through.has(id) ||
    [after, before].some((end) => end !== null && anchorIds.has(end.anchor.id)) ||
    windows.some((window) => {
      const away = Math.max(from - window.at, window.at - to, 0)
      return away <= window.gaps + reaches.gapShare * (to - from)
    })
  const reached = gaps.filter(isTouched)
  if (anchorIds.size === 0 && reached.length === 0) return null
  const isBeside = ({ after, before }: Gap) =>
    [after, before].some((end) => end !== null && anchorIds.has(end.anchor.id))
  const near = windows.filter(({ isChanged, anchors: reach }) => isChanged && reach >= 0)
  const isFitted = ({ from, to }: Range) =>
    near.some((window) => Math.max(from - window.at, window.at - to, 0) <= window.anchors + ROUNDING)
  const places = anchors.map(({ id, chainage }) => ({ id: `anchor:${id}`, from: chainage, to: chainage }))
  const fitted = [...gaps, ...places].filter(isFitted)
  const own = places.filter(({ id }) => anchorIds.has(id.slice('anchor:'.length)))
  const fittedIds = new Set(fitted.map(({ id }) => id))
  return {
    edge,
    anchorIds,
    gapIds: new Set(reached.map(({ id }) => id)),
    gaps,
    ranges: merged([...reached, ...own].map(({ from, to }) => ({ from, to }))),
    fitted: fittedIds,
    fittedRanges: merged(fitted.map(({ from, to }) => ({ from, to }))),
    spreadAlone: new Set(reached.filter((gap) => !fittedIds.has(gap.id) && !isBeside(gap)).map(({ id }) => id)),
  }
}

/** Those within reach and, in a row, the next two places at which anchors stand on either side. */
function anchorsIn(anchors: readonly Anchor[], { at, anchors: reach, isInRow: isRow, isChanged }: Window): string[] {
  const near = anchors.filter(({ chainage }) => Math.abs(chainage - at) <= reach + ROUNDING)
  if (!isRow || !isChanged) return near.map(({ id }) => id)
  const beside = [...besides(anchors, { at, way: -1 }), ...besides(anchors, { at, way: 1 })]
  return [...near, ...beside].map(({ id }) => id)
}

const NEXT = 2

/** Anchors at the next places beside a chainage, those at the chainage itself among them. */
export function besides(
  anchors: readonly Anchor[],
  { at, way, places = NEXT }: { readonly at: number; readonly way: 1 | -1; readonly places?: number },
): Anchor[] {
  const onward = anchors.filter(({ chainage }) => (chainage - at) * way >= -ROUNDING)
  const growing = way === 1 ? onward : onward.reverse()
  const found: Anchor[] = []
  let [count, last] = [0, at]
  for (const anchor of growing) {
    if (Math.abs(anchor.chainage - last) > ROUNDING) {
      if (count === places) break
      count += 1
      last = anchor.chainage
    }
    found.push(anchor)
  }
  return found
}

/** A group is touched as a whole. */
function withGroups(index: LayoutIndex, edgeId: string, anchorIds: Set<string>): void {
  const groups = index.edges.has(edgeId) ? closeAnchors(index, edgeId) : []
  let isGrowing = groups.length > 0
  while (isGrowing) {
    const size = anchorIds.size
    for (const group of groups) {
      if (group.anchorIds.some((id) => anchorIds.has(id))) for (const id of group.anchorIds) anchorIds.add(id)
    }
    isGrowing = anchorIds.size > size
  }
}

/** Behind such a gap no tendon compresses: any end of its pour could. */
function throughGaps({ was }: Editing, edge: Edge, places: readonly Place[]): string[] {
  const frame = found(was.frames, edge.id, 'edge')
  const isFelt = places.some((place) => isOfPour(was, edge, place) && dot(place.inward, frame.inward) > FACING_COSINE)
  if (!isFelt) return []
  return [...wedgesOfEdge(was, edge.id)].flatMap(([id, { throughs }]) => (throughs.length > 0 ? [id] : []))
}

/** Lengths that meet or overlap as one. */
export function merged(ranges: readonly Range[]): Range[] {
  const growing = [...ranges].sort((a, b) => a.from - b.from)
  const result: Range[] = []
  for (const range of growing) {
    const last = result.at(-1)
    if (last && range.from <= last.to + ROUNDING)
      result[result.length - 1] = { from: last.from, to: Math.max(last.to, range.to) }
    else result.push(range)
  }
  return result
}
