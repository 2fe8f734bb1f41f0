import { basisOf } from '../bases'
import type { Basis } from '../bases/basis'
import { layoutIndex, steelKey, type LayoutIndex } from '../layout-index'
import type { Anchor, Edge, Layout, Pan, SteelKind, SteelShape, SteelZone } from '../model'
import type { Zone } from '../result'
import { edgeBarPieces, straightBarPieces, type BarPieces } from '../steel/bar-pieces'
import { anchorMark, zonesOfPour } from '../zones'
import type { BarShape, Dimensions } from './bar-standards'

/** An edge or a pan: what a schedule calls a member. */
export interface Member {
  readonly id: string
  readonly name: string
  readonly kind: 'edge' | 'pan'
}

/** Bars of one shape in one zone, as asked for: dimensions not yet rounded. */
export interface ZoneBars {
  readonly member: Member
  readonly zoneId: string
  readonly zoneName: string
  readonly shape: BarShape
  readonly kind: SteelKind
  /** Bars in this zone. */
  readonly count: number
  /** Steel of the layout, or local steel that comes with the anchor's hardware. */
  readonly source: 'layout' | 'hardware'
  /** How they were cut and lapped; whole sentences. */
  readonly notes: readonly string[]
}

/** Steel whose place does not exist in the layout: a gap that an added anchor has split, say. */
export interface UnplacedSteel {
  readonly steelId: string
  readonly message: string
}

export interface PourBars {
  readonly bars: readonly ZoneBars[]
  readonly unplaced: readonly UnplacedSteel[]
}

/**
 * Every bar of a pour, zone by zone: the layout's steel, and the hardware's local steel at each anchor cast with the
 * pour that has no steel of that kind of its own. Straight bars come in pieces within the stock length, lapped.
 */
export function barsOf(layout: Layout, pourId: string): PourBars {
  const index = layoutIndex(layout)
  const pieces = piecesFor(index, pourId)
  const zones = new Map(zonesOfPour(index, pourId).map((zone) => [zone.id, zone]))
  const bars: ZoneBars[] = []
  const unplaced: UnplacedSteel[] = []
  for (const steel of layout.steel) {
    if (steel.pourId !== pourId) continue
    const place = placeOf(steel.zone, zones, index)
    if (place) bars.push(...(pieces(place, steel.shape, steel.zone) ?? zoneBars(place, steel.shape, 'layout')))
    else unplaced.push({ steelId: steel.id, message: NO_PLACE[steel.zone.kind] })
  }
  return { bars: [...bars, ...hardwareBars(index, pourId)], unplaced }
}

const NO_PLACE: Readonly<Record<SteelZone['kind'], string>> = {
  anchor: 'These bars belong to an anchor that is no longer there. Remove them or give them to another anchor.',
  gap: 'These bars belong to a gap that is no longer there. Remove them or give them to the gaps that took its place.',
  edge: 'These bars belong to an edge that is not part of this pour. Remove them or give them to an edge of it.',
  pan: 'These bars belong to a pan that is not part of this pour. Remove them or give them to a pan of it.',
  joint: 'These bars belong to a joint that is not at this pour. Remove them or give them to a joint of it.',
}

function hardwareBars(index: LayoutIndex, pourId: string): readonly ZoneBars[] {
  return index.layout.anchors.flatMap((anchor) => {
    const local = index.hardware.get(anchor.hardwareId)?.localSteel
    if (anchor.castWithPourId !== pourId || !local) return []
    const own = index.steelOfZone.get(`anchor:${anchor.id}`) ?? []
    if (own.some((steel) => steel.pourId === pourId && steel.shape.kind === local.kind)) return []
    const place = anchorPlace(anchor, index)
    return place ? zoneBars(place, local, 'hardware') : []
  })
}

interface Place {
  readonly member: Member
  readonly zoneId: string
  readonly zoneName: string
}

const memberOf = (record: Edge | Pan, kind: Member['kind']): Member => ({ id: record.id, name: record.mark, kind })

function member(edgeId: string | null, panId: string | null, index: LayoutIndex): Member | null {
  const edge = edgeId === null ? undefined : index.edges.get(edgeId)
  if (edge) return memberOf(edge, 'edge')
  const pan = panId === null ? undefined : index.pans.get(panId)
  return pan ? memberOf(pan, 'pan') : null
}

/** An anchor's bars are cast with it, whichever pour its edge belongs to. */
function anchorPlace(anchor: Anchor, index: LayoutIndex): Place | null {
  const of = member(anchor.edgeId, anchor.panId, index)
  return of && { member: of, zoneId: `anchor:${anchor.id}`, zoneName: anchorMark(index, anchor) }
}

function placeOf(steelZone: SteelZone, zones: ReadonlyMap<string, Zone>, index: LayoutIndex): Place | null {
  if (steelZone.kind === 'anchor') {
    const anchor = index.anchors.get(steelZone.anchorId)
    return anchor ? anchorPlace(anchor, index) : null
  }
  const zone = zones.get(steelKey(steelZone))
  const of = zone ? member(zone.edgeId, zone.panId, index) : null
  return zone && of ? { member: of, zoneId: zone.id, zoneName: zone.name } : null
}

// Shapes ------------------------------------------------------------------------------------------------------------

function zoneBars(place: Place, shape: SteelShape, source: ZoneBars['source']): readonly ZoneBars[] {
  const count = barCount(shape)
  return count === 0 ? [] : [{ ...place, shape: bentShape(shape), kind: shape.kind, count, source, notes: [] }]
}

type PiecesOf = (place: Place, shape: SteelShape, zone: SteelZone) => readonly ZoneBars[] | null

/** Edge bars, and other straight bars over the stock length, by the lengths of their pieces; null for all others. */
function piecesFor(index: LayoutIndex, pourId: string): PiecesOf {
  const { job } = index.layout
  const basis = basisOf(job)
  return (place, shape, zone) => {
    const cut = cutOf({ index, basis, pourId }, shape, zone)
    if (!cut) return null
    const counts = new Map<number, number>()
    for (const { from, to } of cut.pieces) {
      const length = Math.round((to - from) * 10) / 10
      counts.set(length, (counts.get(length) ?? 0) + 1)
    }
    return [...counts].map(([length, count]) => ({
      ...place,
      shape: { code: '00', diameter: shape.diameter, dimensions: { A: length }, typedLength: null, flatTurns: 0 },
      kind: shape.kind,
      count,
      source: 'layout',
      notes: cut.notes,
    }))
  }
}

interface Cutting {
  readonly index: LayoutIndex
  readonly basis: Basis
  readonly pourId: string
}

/** The pieces of edge bars and of other straight bars over the stock length; null for bars that come as they are. */
export function cutOf({ index, basis, pourId }: Cutting, shape: SteelShape, zone: SteelZone): BarPieces | null {
  if (shape.kind === 'edge-bars') {
    return zone.kind === 'edge' ? edgeBarPieces(index, basis, { shape, edgeId: zone.edgeId }) : null
  }
  const pour = index.pours.get(pourId)
  if (!pour || !('layers' in shape) || shape.length <= index.layout.job.settings.stockLength) return null
  const { diameter, length, count, layers } = shape
  const [countTop, countBottom] = [layers === 'bottom' ? 0 : count, layers === 'top' ? 0 : count]
  return straightBarPieces(index, basis, { diameter, length, pour, countTop, countBottom })
}

const LAYERS = { top: 1, bottom: 1, both: 2 } as const

/** Bars of one set; where bars lie in layers there is one in each layer at every position. */
export function barCount(shape: SteelShape): number {
  switch (shape.kind) {
    case 'spiral':
      return 1
    case 'links':
    case 'hairpins':
      return shape.count
    case 'edge-bars':
      return shape.countTop + shape.countBottom
    case 'transverse-bars':
    case 'wedge-bars':
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return shape.count * LAYERS[shape.layers]
  }
}

export function bentShape(shape: SteelShape): BarShape {
  const bar = (code: string, dimensions: Dimensions, flatTurns = 0): BarShape => ({
    code,
    diameter: shape.diameter,
    dimensions,
    typedLength: null,
    flatTurns,
  })
  switch (shape.kind) {
    case 'spiral':
      return bar('77', { A: shape.outside, B: shape.pitch, C: shape.turns }, shape.flatTurns)
    case 'links':
      return bar('51', { A: shape.width, B: shape.height, C: shape.hook, D: shape.hook })
    case 'hairpins':
      return bar('21', { A: shape.leg, B: shape.bend, C: shape.leg })
    case 'edge-bars':
      return bar('00', { A: Math.abs(shape.to - shape.from) })
    case 'transverse-bars':
    case 'wedge-bars':
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return bar('00', { A: shape.length })
  }
}
