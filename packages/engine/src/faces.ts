/** The faces of concrete beside an anchor, other than the edge or recess that it stands at, and how far away they are. */

import type { Box } from './bodies'
import type { AnchorFrame } from './frame'
import {
  distanceBetweenSegments,
  distanceToSegment,
  dot,
  isInside,
  ROUNDING,
  sidesOf,
  subtract,
  unit,
} from './geometry'
import { found, type LayoutIndex } from './layout-index'
import type { Anchor, Edge, Point, Pour } from './model'
import { besideFace, panFrame } from './pan-frame'
import { panOutline } from './pan-outline'

export interface NearFace {
  /** As a person says it: edge E7-ER, opening O2, side of the deeper length. */
  readonly name: string
  /** mm; of a body negative by how far it stands outside the concrete. */
  readonly distance: number
}

interface Side {
  readonly name: string
  readonly ends: readonly [Point, Point]
}

/** Chords of one curved edge turn by less than this from one to the next. */
const CHORD_TURN_COSINE = Math.cos(Math.PI / 6)

/** Distances from an anchor's centre to every other face of its pour, nearest first. */
export function facesFromCentre(index: LayoutIndex, anchor: Anchor): NearFace[] {
  const place = placeOf(index, anchor)
  if (!place) return []
  const centre = place.frame.pointAt(anchor.chainage, anchor.setBack)
  const faces = facesBeside(index, place).map(({ name, ends }) => ({
    name,
    distance: distanceToSegment(centre, ...ends),
  }))
  const { chainage, height } = anchor
  const asBox = { fromChainage: chainage, toChainage: chainage, fromHeight: height, toHeight: height }
  return [...nearestOfEachName(faces), ...profileSides(place.frame, asBox)].sort((a, b) => a.distance - b.distance)
}

/**
 * The face nearest to a body of an anchor, other than its own edge; null where there is none.
 *
 * A body that stands partly outside has the distance of its outermost corner from the concrete, negative.
 */
export function nearestFace(index: LayoutIndex, anchor: Anchor, body: Box): NearFace | null {
  const place = placeOf(index, anchor)
  if (!place) return null
  const sides = facesBeside(index, place)
  const rim = rectangleOf(place.frame, body)
  const near = whereInside(index, place, { body, sides })
  const isCorner = (corner: Point) => isOutside(corner, place.pour.outline, openingsOf(index, place.pour))
  const outside = near ? [] : rim.filter(isCorner)
  const faces = outside.length > 0 ? outermost(outside, sides) : clearances(rim, near ?? sides)
  return [...faces, ...profileSides(place.frame, body)].sort((a, b) => a.distance - b.distance)[0] ?? null
}

interface Place {
  /** Id of the edge or pan. */
  readonly id: string
  /** Null for a pan. */
  readonly edge: Edge | null
  readonly pour: Pour
  readonly frame: AnchorFrame
}

function placeOf(index: LayoutIndex, anchor: Anchor): Place | null {
  const edge = index.edges.get(anchor.edgeId ?? '')
  if (edge) {
    const [pour, frame] = [found(index.pours, edge.pourId, 'pour'), found(index.frames, edge.id, 'edge')]
    return { id: edge.id, edge, pour, frame }
  }
  const pan = index.pans.get(anchor.panId ?? '')
  if (!pan) return null
  return { id: pan.id, edge: null, pour: found(index.pours, pan.pourId, 'pour'), frame: panFrame(index, pan.id) }
}

/**
 * The sides that can be the nearest to a body well inside the concrete; null where it may stand outside. A body that
 * no side comes as near as its half diagonal lies inside with its middle.
 */
function whereInside(
  index: LayoutIndex,
  { frame, pour }: Place,
  { body, sides }: { readonly body: Box; readonly sides: readonly Side[] },
): readonly Side[] | null {
  const middle = frame.pointAt((body.fromChainage + body.toChainage) / 2, (body.fromDepth + body.toDepth) / 2)
  const radius = Math.hypot(body.toChainage - body.fromChainage, body.toDepth - body.fromDepth) / 2
  const away = sides.map(({ ends }) => distanceToSegment(middle, ...ends))
  const least = away.reduce((nearest, distance) => Math.min(nearest, distance), Infinity)
  if (least <= radius + ROUNDING || isOutside(middle, pour.outline, openingsOf(index, pour))) return null
  return sides.filter((_, i) => (away[i] ?? Infinity) - radius <= least)
}

/** Kept beside an index, which never changes: every anchor of an edge asks for the same. By edge or pan. */
const KEPT = new WeakMap<LayoutIndex, Map<string, readonly Side[]>>()

function facesBeside(index: LayoutIndex, place: Place): readonly Side[] {
  const ofEdges = KEPT.get(index) ?? new Map<string, readonly Side[]>()
  const sides = ofEdges.get(place.id) ?? [
    ...otherSides(index, place),
    ...openingSides(index, place),
    ...panSides(index, place),
  ]
  KEPT.set(index, ofEdges.set(place.id, sides))
  return sides
}

/** All sides of the outline but the edge's own, sides in line with it and the next chords of the same curve. */
function otherSides(index: LayoutIndex, { edge, pour, frame }: Place): Side[] {
  const edges = new Map((index.edgesOfPour.get(pour.id) ?? []).map((other) => [other.cornerId, other]))
  return sidesOf(pour.outline).flatMap((ends, i): Side[] => {
    const corner = pour.outline[i]
    const other = corner && edges.get(corner.id)
    const isInLine = ends.every((end) => Math.abs(frame.local(end).depth) <= ROUNDING)
    if (isInLine || (edge?.isChord && other?.isChord && turnsLittle(frame, ends))) return []
    const seen = edge === null ? besideFace(frame, ends) : ends
    return seen === null ? [] : [{ name: other ? `edge ${other.mark}` : 'the next side of the outline', ends: seen }]
  })
}

/** To an anchor in a pan the recesses of other pans are faces, as far as they stand beside and behind its bearing face. */
function panSides(index: LayoutIndex, { id, edge, pour, frame }: Place): Side[] {
  if (edge !== null) return []
  const others = (index.pansOfPour.get(pour.id) ?? []).filter((pan) => pan.id !== id)
  return others.flatMap((pan) =>
    sidesOf(panOutline(pan)).flatMap((ends): Side[] => {
      const seen = besideFace(frame, ends)
      return seen === null ? [] : [{ name: `pan ${pan.mark}`, ends: seen }]
    }),
  )
}

function turnsLittle(frame: AnchorFrame, [a, b]: readonly [Point, Point]): boolean {
  return Math.abs(dot(unit(subtract(b, a)), frame.along)) > CHORD_TURN_COSINE
}

const openingsOf = (index: LayoutIndex, pour: Pour) => index.openingsOfLevel.get(pour.levelId) ?? []

function openingSides(index: LayoutIndex, { pour, edge, frame }: Place): Side[] {
  return openingsOf(index, pour).flatMap(({ mark, outline }) =>
    sidesOf(outline).flatMap((ends): Side[] => {
      const seen = edge === null ? besideFace(frame, ends) : ends
      return seen === null ? [] : [{ name: `opening ${mark}`, ends: seen }]
    }),
  )
}

function nearestOfEachName(faces: readonly NearFace[]): NearFace[] {
  const nearest = new Map<string, NearFace>()
  for (const face of faces) {
    const known = nearest.get(face.name)
    if (!known || face.distance < known.distance) nearest.set(face.name, face)
  }
  return [...nearest.values()]
}

function rectangleOf(frame: AnchorFrame, { fromChainage, toChainage, fromDepth, toDepth }: Box): Point[] {
  return [
    frame.pointAt(fromChainage, fromDepth),
    frame.pointAt(toChainage, fromDepth),
    frame.pointAt(toChainage, toDepth),
    frame.pointAt(fromChainage, toDepth),
  ]
}

function isOutside(
  point: Point,
  outline: readonly Point[],
  openings: readonly { outline: readonly Point[] }[],
): boolean {
  const isClearOf = (sides: readonly Point[]) =>
    sidesOf(sides).every(([a, b]) => distanceToSegment(point, a, b) > ROUNDING)
  return !isInside(point, outline) || openings.some((hole) => isInside(point, hole.outline) && isClearOf(hole.outline))
}

function clearances(rim: readonly Point[], sides: readonly Side[]): NearFace[] {
  const rimSides = sidesOf(rim)
  return sides.map(({ name, ends }) => ({
    name,
    distance: Math.min(...rimSides.map((side) => distanceBetweenSegments(side, ends))),
  }))
}

function outermost(outside: readonly Point[], sides: readonly Side[]): NearFace[] {
  const faces = outside.flatMap((corner) => {
    const byDistance = sides.map(({ name, ends }) => ({ name, distance: distanceToSegment(corner, ...ends) }))
    return byDistance.sort((a, b) => a.distance - b.distance).slice(0, 1)
  })
  return faces.map(({ name, distance }) => ({ name, distance: -distance }))
}

type FaceRange = Pick<Box, 'fromChainage' | 'toChainage' | 'fromHeight' | 'toHeight'>

/** Where the next length of the edge is less deep or less high, its neighbour's side is a face for what lies beyond. */
function profileSides(frame: AnchorFrame, body: FaceRange): NearFace[] {
  const middle = (body.fromChainage + body.toChainage) / 2
  return frame.steps.flatMap((step) => {
    const isBefore = middle < step
    const beyond = sectionAt(frame, isBefore ? step : step - ROUNDING)
    if (body.fromHeight >= beyond.soffit - ROUNDING && body.toHeight <= beyond.top + ROUNDING) return []
    const own = sectionAt(frame, middle)
    if (beyond.soffit <= own.soffit && beyond.top >= own.top) return []
    const distance = isBefore ? step - body.toChainage : body.fromChainage - step
    return [{ name: 'the side of the next length of the edge', distance }]
  })
}

const sectionAt = (frame: AnchorFrame, chainage: number) => ({
  top: frame.topAt(chainage),
  soffit: frame.soffitAt(chainage),
})
