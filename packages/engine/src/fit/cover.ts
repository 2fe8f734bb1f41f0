/** Cover of a bar to every face of the concrete that it lies in. */

import {
  distanceBetweenSegments,
  distanceToSegment,
  dot,
  isInside,
  ROUNDING,
  scale,
  sidesOf,
  subtract,
  turnedLeft,
  unit,
} from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import { perIndex } from '../memo'
import type { Point, Pour } from '../model'
import type { PlacedBar } from '../placed/bar'
import type { Vec } from '../placed/centre-line'
import { sectionAt, sectionBehind, type Section } from '../section'
import { boxesNear, boxOf, type Box3 } from './distance'
import type { FitBar } from './items'
import type { Member } from './members'

export interface Cover {
  readonly bar: FitBar
  /** soffit, top, edge E6, opening O2. */
  readonly face: string
  /** mm, negative by how far the bar stands outside. */
  readonly measured: number
  readonly need: number
}

/** Faces farther away than this have cover enough, mm. */
const FAR = 200

/** Just beyond a side of a region the section is asked for this far away, mm. */
const NEXT_TO = 1

/** An upright side of the concrete; null heights: from soffit to top. */
interface Side {
  readonly name: string
  readonly ends: readonly [Point, Point]
  readonly box: Box3
  readonly region: readonly Point[] | null
}

interface Straight {
  readonly a: Vec
  readonly b: Vec
}

/** Every face near a bar with the cover that it needs there. */
export function coversOf(index: LayoutIndex, member: Member, bar: FitBar): Cover[] {
  const pour = found(index.pours, bar.pourId, 'pour')
  const straights = straightsOf(bar)
  const middle = bar.path[Math.floor(bar.path.length / 2)] ?? bar.path[0]
  if (!middle || straights.length === 0) return []
  const at = { x: (bar.box.min.x + bar.box.max.x) / 2, y: (bar.box.min.y + bar.box.max.y) / 2 }
  const needs = sectionOf(member, pour, at)
  return [
    ...toTopAndSoffit({ member, pour, bar, straights, needs }),
    ...toSides(index, { member, pour, bar, straights, needs }),
  ]
}

interface Asked {
  readonly member: Member
  readonly pour: Pour
  readonly bar: FitBar
  readonly straights: readonly Straight[]
  /** The section that the bar is placed in: its covers are asked for. */
  readonly needs: Section
}

function straightsOf({ path, bar }: FitBar): Straight[] {
  const [first] = path
  const points = bar.isClosed && first ? [...path, first] : path
  return points.slice(1).flatMap((b, i) => {
    const a = points[i]
    return a ? [{ a, b }] : []
  })
}

function sectionOf({ edgeFrame }: Member, pour: Pour, point: Point): Section {
  return edgeFrame ? sectionBehind(pour, { frame: edgeFrame, ...edgeFrame.local(point) }) : sectionAt(pour, point)
}

/** Closed links and hairpins stand between a region's links, with the region's cover; other bars lie inside them. */
const insideLinks = ({ bar }: FitBar, { linkDiameter }: Section): number =>
  bar.kind === 'links' || bar.kind === 'hairpins' ? 0 : linkDiameter

const UP: Vec = { x: 0, y: 0, z: 1 }

// Top and soffit ----------------------------------------------------------------------------------------------------

function toTopAndSoffit({ member, pour, bar, straights, needs }: Asked): Cover[] {
  const links = insideLinks(bar, needs)
  let [toTop, toSoffit] = [Infinity, Infinity]
  const isInOne = !isCut({ member, pour, bar })
  for (const straight of straights) {
    const thick = halfAcross(straight, UP, bar.bar)
    const within = ({ a, b }: Straight, section: Section) => {
      toTop = Math.min(toTop, section.top - Math.max(a.z, b.z) - thick)
      toSoffit = Math.min(toSoffit, Math.min(a.z, b.z) - thick - section.soffit)
    }
    if (isInOne) within(straight, needs)
    else for (const part of inOneSection({ member, pour, bar }, straight)) within(part, part.section)
  }
  return [
    { bar, face: 'top', measured: toTop, need: needs.coverTop + links },
    { bar, face: 'soffit', measured: toSoffit, need: needs.coverSoffit + links },
  ]
}

/**
 * Half of the bar's size in a direction: nothing along the bar, whose ends are flat, all of it across. A spiral is drawn
 * by its corners, which lie on its circle and take the whole.
 */
function halfAcross({ a, b }: Straight, way: Vec, { kind, diameter }: PlacedBar): number {
  if (kind === 'spiral') return diameter / 2
  const [x, y, z] = [b.x - a.x, b.y - a.y, b.z - a.z]
  const along = (x * way.x + y * way.y + z * way.z) / (Math.hypot(x, y, z) || 1)
  return (diameter / 2) * Math.sqrt(Math.max(0, 1 - along * along))
}

/** The parts of a straight piece between the sides of regions and the steps of the edge, each with its section. */
function inOneSection(
  { member, pour, bar }: Pick<Asked, 'member' | 'pour' | 'bar'>,
  { a, b }: Straight,
): (Straight & { readonly section: Section })[] {
  const inside = cutsOf({ member, pour, bar }, { a, b })
  if (inside.length === 0)
    return [{ a, b, section: sectionOf(member, pour, { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 }) }]
  const cuts = [0, ...inside.sort((one, other) => one - other), 1]
  const at = (share: number): Vec => ({
    x: a.x + share * (b.x - a.x),
    y: a.y + share * (b.y - a.y),
    z: a.z + share * (b.z - a.z),
  })
  return cuts.slice(1).flatMap((to, i) => {
    const from = cuts[i] ?? 0
    if (to - from < ROUNDING && cuts.length > 2) return []
    return [{ a: at(from), b: at(to), section: sectionOf(member, pour, at((from + to) / 2)) }]
  })
}

function cutsOf({ member, pour, bar }: Pick<Asked, 'member' | 'pour' | 'bar'>, { a, b }: Straight): number[] {
  const sides = pour.regions.flatMap(({ outline }) => sidesOf(outline).filter((ends) => touchesInPlan(bar.box, ends)))
  const frame = member.edgeFrame
  const steps = (frame?.steps ?? []).flatMap((chainage): [Point, Point][] =>
    frame ? [[frame.pointAt(chainage, 0), frame.pointAt(chainage, FAR)]] : [],
  )
  return [
    ...sides.flatMap((side) => crossing({ a, b }, { side, isEndless: false })),
    ...steps.flatMap((side) => crossing({ a, b }, { side, isEndless: true })),
  ]
}

/** Whether a side of a region or a step of the edge lies where the bar is. */
function isCut({ member: { edgeFrame }, pour, bar }: Pick<Asked, 'member' | 'pour' | 'bar'>): boolean {
  if (edgeFrame && edgeFrame.steps.length > 0) return true
  return pour.regions.some(({ outline }) => sidesOf(outline).some((ends) => touchesInPlan(bar.box, ends)))
}

function touchesInPlan({ min, max }: Box3, [a, b]: readonly [Point, Point]): boolean {
  return (
    Math.max(a.x, b.x) >= min.x &&
    Math.min(a.x, b.x) <= max.x &&
    Math.max(a.y, b.y) >= min.y &&
    Math.min(a.y, b.y) <= max.y
  )
}

/** Where on the way from a to b a side is crossed in plan. */
function crossing(
  { a, b }: Straight,
  { side: [c, d], isEndless }: { side: readonly [Point, Point]; isEndless: boolean },
): number[] {
  const [u, v, w] = [subtract(b, a), subtract(d, c), subtract(c, a)]
  const turn = u.x * v.y - u.y * v.x
  if (turn === 0) return []
  const share = (w.x * v.y - w.y * v.x) / turn
  const along = (w.x * u.y - w.y * u.x) / turn
  return share > 0 && share < 1 && (isEndless || (along >= 0 && along <= 1)) ? [share] : []
}

// Sides -------------------------------------------------------------------------------------------------------------

function toSides(index: LayoutIndex, asked: Asked): Cover[] {
  const { member, bar } = asked
  const sides = sidesOfPour(index, bar.pourId)
  const isJoint = member.key.startsWith('joint:')
  const near = (isJoint ? sidesAtJoint(index, member) : sides).filter((side) => boxesNear(side.box, bar.box, FAR))
  return near.flatMap((side) => (side.region ? stepFace(asked, side) : outerFace(index, asked, side)))
}

function outerFace(index: LayoutIndex, asked: Asked, side: Side): Cover[] {
  const { bar, straights, needs } = asked
  let least: Omit<Cover, 'bar' | 'face'> | null = null
  for (const straight of straights) {
    const found = coverAt(asked, side, straight)
    if (!least || found.measured - found.need < least.measured - least.need) least = found
  }
  if (!least) return []
  const outside = outermost(index, asked, side)
  const covered = outside === null ? least : { measured: outside, need: needs.coverEdge }
  return [{ bar, face: side.name, ...covered }]
}

/** A bar's end stands between a region's links: its cover alone is asked for. */
function coverAt({ bar, needs }: Asked, { ends }: Side, straight: Straight): Omit<Cover, 'bar' | 'face'> {
  const normal = turnedLeft(unit(subtract(ends[1], ends[0])))
  const thick = halfAcross(straight, { ...normal, z: 0 }, bar.bar)
  const isEnd = thick < bar.bar.diameter / 4
  return {
    measured: distanceBetweenSegments([straight.a, straight.b], ends) - thick,
    need: needs.coverEdge + (isEnd ? 0 : insideLinks(bar, needs)),
  }
}

/** How far a bar's path reaches outside past this side, negative; null where it stays inside. */
function outermost(index: LayoutIndex, { member, pour, bar, straights }: Asked, side: Side): number | null {
  const outside = bar.path.filter((point) => isOutside(index, { member, pour }, point))
  if (outside.length === 0) return null
  const all = member.key.startsWith('joint:') ? sidesAtJoint(index, member) : sidesOfPour(index, pour.id)
  const reaches = outside.flatMap((point) => {
    const own = distanceToSegment(point, ...side.ends)
    const isNearest = all.every(({ ends, region }) => region || own <= distanceToSegment(point, ...ends) + ROUNDING)
    return isNearest ? [own] : []
  })
  const normal = turnedLeft(unit(subtract(side.ends[1], side.ends[0])))
  const thick = straights.reduce(
    (most, straight) => Math.max(most, halfAcross(straight, { ...normal, z: 0 }, bar.bar)),
    0,
  )
  return reaches.length === 0 ? null : -Math.max(...reaches) - thick
}

function isOutside(index: LayoutIndex, { member, pour }: Pick<Asked, 'member' | 'pour'>, point: Point): boolean {
  const pours = member.key.startsWith('joint:') ? poursOfLevel(index, pour.levelId) : [pour]
  if (!pours.some(({ outline }) => isInside(point, outline))) return true
  return (index.openingsOfLevel.get(pour.levelId) ?? []).some(
    ({ outline }) =>
      isInside(point, outline) && sidesOf(outline).every((ends) => distanceToSegment(point, ...ends) > ROUNDING),
  )
}

const poursOfLevel = (index: LayoutIndex, levelId: string): readonly Pour[] =>
  index.layout.pours.filter((pour) => pour.levelId === levelId)

/** Outline, openings and the sides of regions of a pour. */
const sidesOfPour = perIndex((index: LayoutIndex, pourId: string): readonly Side[] => {
  const pour = found(index.pours, pourId, 'pour')
  const edges = new Map((index.edgesOfPour.get(pourId) ?? []).map((edge) => [edge.cornerId, edge]))
  const side = (name: string, ends: readonly [Point, Point], region: readonly Point[] | null = null): Side => ({
    name,
    ends,
    region,
    box: upright(ends),
  })
  return [
    ...sidesOf(pour.outline).map((ends, i) => {
      const edge = edges.get(pour.outline[i]?.id ?? '')
      return side(edge ? `edge ${edge.mark}` : 'the side of the pour', ends)
    }),
    ...(index.openingsOfLevel.get(pour.levelId) ?? []).flatMap(({ mark, outline }) =>
      sidesOf(outline).map((ends) => side(`opening ${mark}`, ends)),
    ),
    ...pour.regions.flatMap(({ mark, outline }) =>
      sidesOf(outline).map((ends) => side(`side of ${mark}`, ends, outline)),
    ),
  ]
})

/** Bars across a joint run from one pour into the next: the sides on the joint's line are no faces to them. */
function sidesAtJoint(index: LayoutIndex, { edgeFrame, levelId }: Member): Side[] {
  return poursOfLevel(index, levelId)
    .flatMap(({ id }) => sidesOfPour(index, id))
    .filter(({ ends }) => !ends.every((end) => Math.abs(edgeFrame?.local(end).depth ?? Infinity) <= ROUNDING))
}

/** Heights are compared later: a side reaches through the whole depth. */
function upright(ends: readonly [Point, Point]): Box3 {
  const { min, max } = boxOf(
    ends.map(({ x, y }) => ({ x, y, z: 0 })),
    0,
  )
  return { min: { ...min, z: -Infinity }, max: { ...max, z: Infinity } }
}

/** The side of a deeper part, for bars below the soffit or above the top of what lies beyond it. */
function stepFace(asked: Asked, side: Side): Cover[] {
  const { member, pour, bar, straights, needs } = asked
  const { region, ends } = side
  const { min, max } = bar.box
  if (!region || (min.z >= 0 && max.z <= pour.thickness)) return []
  const [from, to] = ends
  const along = unit(subtract(to, from))
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  const share = Math.min(length - NEXT_TO, Math.max(NEXT_TO, dot(subtract(middleOf(bar), from), along)))
  const foot = { x: from.x + share * along.x, y: from.y + share * along.y }
  const beyond = [-NEXT_TO, NEXT_TO]
    .map((by) => ({ x: foot.x + by * turnedLeft(along).x, y: foot.y + by * turnedLeft(along).y }))
    .find((point) => !isInside(point, region))
  if (!beyond || !isInside(beyond, pour.outline) || !isInside(middleOf(bar), region)) return []
  const { top, soffit } = sectionOf(member, pour, beyond)
  if (min.z >= soffit - ROUNDING && max.z <= top + ROUNDING) return []
  const outside = bar.path
    .filter((point) => !isInside(point, region))
    .map((point) => distanceToSegment(point, from, to))
  const covers = straights.map((straight) => coverAt(asked, side, straight))
  const least = covers.reduce((one, other) => (other.measured - other.need < one.measured - one.need ? other : one))
  const reach = outside.length > 0 ? { measured: -Math.max(...outside), need: needs.coverEdge } : least
  return [{ bar, face: side.name, ...reach }]
}

const middleOf = ({ box }: FitBar): Point => scale({ x: box.min.x + box.max.x, y: box.min.y + box.max.y }, 0.5)
