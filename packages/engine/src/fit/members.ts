/** Bars and bodies member by member: an edge with its anchors, a pan, a joint. */

import type { EdgeFrame } from '../frame'
import { found, type LayoutIndex } from '../layout-index'
import { perIndex } from '../memo'
import type { Edge, SteelKind } from '../model'
import { placedBars } from '../placed'
import { barsOfJoint, edgeOfJoint } from '../placed/across-joint'
import type { PlacedBar } from '../placed/bar'
import { panFrame, type PlanFrame } from '../placed/pan-frame'
import { barsOfPan } from '../placed/round-pan'
import { barStandardById } from '../schedule/bs-8666'
import { sizeOf } from '../schedule/bar-standards'
import type { Zone } from '../result'
import { anchorMark } from '../zones'
import { bodiesOfEdge, bodiesOfPan } from './bodies-of'
import { boxOf, type Box3 } from './distance'
import { fitBar, type FitBar, type FitBody } from './items'

export interface Member {
  /** Kind and id: `edge:E6`. */
  readonly key: string
  readonly pourId: string
  readonly levelId: string
  /** Frame of the edge; null for a pan. */
  readonly edgeFrame: EdgeFrame | null
  readonly bars: readonly FitBar[]
  readonly bodies: readonly FitBody[]
}

/** Inside radius over diameter of a bend in a bar that the standard does not list. */
const USUAL_BEND = 2

const WORDS: Readonly<Record<SteelKind, string>> = {
  spiral: 'spiral',
  links: 'links',
  hairpins: 'hairpin',
  'edge-bars': 'edge bar',
  'transverse-bars': 'transverse bar',
  'wedge-bars': 'wedge bar',
  trimmers: 'trimmer',
  diagonals: 'diagonal',
  'tie-back-bars': 'tie-back bar',
  'lap-bars': 'lap bar',
}

/** The member that a zone's bars are placed with; null where a zone has none of its own. */
export function memberKeyOf(zone: Zone): string | null {
  if (zone.kind === 'joint') return zone.id
  if (zone.panId !== null) return `pan:${zone.panId}`
  const isAtEdge = zone.kind === 'anchor' || zone.kind === 'gap' || zone.kind === 'edge'
  return isAtEdge && zone.edgeId !== null ? `edge:${zone.edgeId}` : null
}

/** @throws where the key names nothing in the layout. */
export const memberOf = perIndex((index: LayoutIndex, key: string): Member => {
  const { frame, mark, ...place } = placeOfMember(index, key)
  return {
    ...place,
    bars: barsPlaced(index, key).map((bar) => asFitBar(index, bar, { frame, mark, pourId: place.pourId })),
    bodies: bodiesOfMember(index, key),
  }
})

/** The bars of one zone alone, as `memberOf` has them among all others. */
export function barsOfZone(index: LayoutIndex, key: string, zoneId: string): FitBar[] {
  const place = placeOfMember(index, key)
  const anchorId = zoneId.startsWith('anchor:') ? zoneId.slice('anchor:'.length) : null
  const anchorsOfEdge =
    anchorId === null
      ? index.anchorsOfEdge
      : new Map([...index.anchorsOfEdge].map(([id, all]) => [id, all.filter((anchor) => anchor.id === anchorId)]))
  const alone = { ...index, anchorsOfEdge, steelOfZone: new Map([[zoneId, index.steelOfZone.get(zoneId) ?? []]]) }
  return barsPlaced(alone, key).flatMap((bar) => (bar.zoneId === zoneId ? [asFitBar(index, bar, place)] : []))
}

interface PlaceOfMember extends Omit<Member, 'bars' | 'bodies'> {
  readonly frame: PlanFrame
  readonly mark: string
}

const idOf = (key: string): string => key.slice(key.indexOf(':') + 1)

function placeOfMember(index: LayoutIndex, key: string): PlaceOfMember {
  const levelOf = (pourId: string) => found(index.pours, pourId, 'pour').levelId
  if (key.startsWith('pan:')) {
    const pan = found(index.pans, idOf(key), 'pan')
    const { pourId, mark } = pan
    return { key, pourId, levelId: levelOf(pourId), edgeFrame: null, frame: panFrame(pan), mark }
  }
  const edge = edgeOfMember(index, key)
  const frame = found(index.frames, edge.id, 'edge')
  const mark = key.startsWith('joint:')
    ? `joint ${found(index.edgeLines, edge.edgeLineId, 'edge line').mark}`
    : edge.mark
  return { key, pourId: edge.pourId, levelId: levelOf(edge.pourId), edgeFrame: frame, frame, mark }
}

function edgeOfMember(index: LayoutIndex, key: string): Edge {
  if (!key.startsWith('joint:')) return found(index.edges, idOf(key), 'edge')
  const edge = edgeOfJoint(index, found(index.joints, idOf(key), 'joint'))
  if (!edge) throw new Error(`No edge lies on the line of joint "${idOf(key)}".`)
  return edge
}

function barsPlaced(index: LayoutIndex, key: string): readonly PlacedBar[] {
  if (key.startsWith('pan:')) return barsOfPan(index, idOf(key))
  return key.startsWith('joint:') ? barsOfJoint(index, idOf(key)) : placedBars(index, idOf(key))
}

function bodiesOfMember(index: LayoutIndex, key: string): readonly FitBody[] {
  if (key.startsWith('pan:')) return bodiesOfPan(index, found(index.pans, idOf(key), 'pan'))
  return key.startsWith('joint:') ? [] : bodiesOfEdge(index, found(index.edges, idOf(key), 'edge'))
}

function asFitBar(
  index: LayoutIndex,
  bar: PlacedBar,
  { frame, pourId, mark }: Pick<PlaceOfMember, 'frame' | 'pourId' | 'mark'>,
): FitBar {
  const standard = barStandardById(index.layout.job.settings.barStandard)
  return fitBar({
    bar,
    frame,
    pourId,
    setId: bar.steelId ?? `hardware:${bar.anchorId}:${bar.kind}`,
    name: `${WORDS[bar.kind]} of ${placeOf(index, bar, mark)}`,
    bendRadius: (standard && sizeOf(standard, bar.diameter)?.bendRadius) ?? USUAL_BEND * bar.diameter,
  })
}

function placeOf(index: LayoutIndex, { anchorId, zoneId, path }: PlacedBar, mark: string): string {
  if (anchorId !== null) return anchorMark(index, found(index.anchors, anchorId, 'anchor'))
  return zoneId.startsWith('gap:') ? `${mark} at chainage ${Math.round(path[0]?.chainage ?? 0)}` : mark
}

// Which members lie beside one another ------------------------------------------------------------------------------

interface Extent {
  readonly key: string
  readonly levelId: string
  readonly box: Box3
}

/** Members of the same level whose bars may come near, the member itself left out; nothing of them is placed yet. */
export function membersBeside(index: LayoutIndex, key: string): string[] {
  const all = extents(index, '')
  const own = all.find((extent) => extent.key === key)
  if (!own) return []
  const { min, max } = own.box
  return all.flatMap(({ key: other, levelId, box }) => {
    const isBeside = box.min.x <= max.x && box.max.x >= min.x && box.min.y <= max.y && box.max.y >= min.y
    return other !== key && levelId === own.levelId && isBeside ? [other] : []
  })
}

/** In plan each member with as much round it as its longest bar reaches. */
const extents = perIndex((index: LayoutIndex): readonly Extent[] => {
  const reach = longestReach(index)
  const levelOf = (pourId: string) => found(index.pours, pourId, 'pour').levelId
  const side = (frame: EdgeFrame) => [frame.pointAt(frame.from, 0), frame.pointAt(frame.to, 0)]
  const round = (points: readonly { readonly x: number; readonly y: number }[], by: number) =>
    boxOf(
      points.map(({ x, y }) => ({ x, y, z: 0 })),
      by,
    )
  return [
    ...index.layout.edges.map(({ id, pourId }) => ({
      key: `edge:${id}`,
      levelId: levelOf(pourId),
      box: round(side(found(index.frames, id, 'edge')), reach),
    })),
    ...index.layout.pans.map((pan) => ({
      key: `pan:${pan.id}`,
      levelId: levelOf(pan.pourId),
      box: round([pan], pan.along + pan.across + reach),
    })),
    ...index.layout.joints.flatMap((joint) => {
      const edge = edgeOfJoint(index, joint)
      if (!edge) return []
      const box = round(side(found(index.frames, edge.id, 'edge')), reach)
      return [{ key: `joint:${joint.id}`, levelId: levelOf(edge.pourId), box }]
    }),
  ]
})

/** How far from where it stands any bar or body of the layout reaches, and a metre more. */
export function longestReach({ layout }: Pick<LayoutIndex, 'layout'>): number {
  const local = layout.hardware.flatMap(({ localSteel, straightBehindMin, splayLength }) => [
    straightBehindMin,
    splayLength ?? 0,
    localSteel && 'leg' in localSteel ? localSteel.leg + localSteel.first : 0,
  ])
  const entered = layout.steel.map(({ shape }) => {
    if ('length' in shape) return shape.length
    return 'leg' in shape ? shape.leg + shape.first : 0
  })
  const straight = layout.anchors.map(({ straightBehind, setBack }) => (straightBehind ?? 0) + setBack)
  return [...local, ...entered, ...straight].reduce((most, length) => Math.max(most, length), 0) + 1000
}
