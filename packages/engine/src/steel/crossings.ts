import type { BondPlace } from '../bases/basis'
import type {
  EdgeBarsShape,
  HairpinShape,
  LinksShape,
  MatLayer,
  SpiralShape,
  SteelShape,
  TransverseBarsShape,
} from '../model'
import { turnsOf } from '../placed/behind-face'
import { bondPlaceOf } from './bond'

export type Plane = 'thickness' | 'plan'

/** The place behind one anchor at which bars are counted. */
export interface CountPlace {
  /** The anchor's chainage and the two ends of its edge, on the edge line. */
  readonly chainage: number
  readonly edgeFrom: number
  readonly edgeTo: number
  /** Chainages at which the edge's top or soffit steps, where its bars stop. */
  readonly breaks: readonly number[]
  /** Cover of bar ends at the ends of the edge. */
  readonly cover: number
  /** From the slab edge to the bearing face. */
  readonly setBack: number
  readonly plateWidth: number
  /** Section depth at the anchor, and the covers of its faces. */
  readonly depth: number
  readonly coverTop: number
  readonly coverSoffit: number
  /** Outward azimuth of the edge, rad. */
  readonly azimuth: number
  readonly mats: readonly MatLayer[]
  /** From the plane to the middle of a set of bars behind an anchor: 0 but for anchors that act as one. */
  readonly aside?: number
}

/** Bars of one set that cross a plane behind an anchor. */
export interface Crossings {
  /** Trade word for one and for several. */
  readonly noun: readonly [string, string]
  readonly diameter: number
  /** Where they cross, behind the bearing face. */
  readonly positions: readonly number[]
  /** Times that one of them crosses at its position. */
  readonly legs: number
  /** Length of straight bar past the anchor's line on the shorter side; null where the bar is bent round and anchored. */
  readonly pastLine: number | null
  /** Where they lie for their bond; of bent ones no height is known. */
  readonly bond: BondPlace
  readonly notes: readonly string[]
}

/** The set does not cross the plane: why, in a sentence; null where it stands elsewhere and nobody would ask. */
export interface NoCrossing {
  readonly reason: string | null
}

/** Where the bars of a set cross a longitudinal plane through the anchor's axis, or that of anchors that act as one. */
export function crossingsOf(shape: SteelShape, plane: Plane, place: CountPlace): Crossings | NoCrossing {
  const missed = missedBy(shape, plane, place.aside ?? 0)
  if (missed !== null) return { reason: missed }
  switch (shape.kind) {
    case 'spiral':
      return spiralCrossings(shape, place)
    case 'links':
      return linkCrossings(shape, place)
    case 'hairpins':
      return hairpinCrossings(shape, plane, place)
    case 'edge-bars':
      return plane === 'plan'
        ? edgeBarCrossings(shape, place)
        : { reason: 'Edge bars run along the edge and do not count in the thickness.' }
    case 'transverse-bars':
      return plane === 'plan'
        ? transverseCrossings(shape, place)
        : { reason: 'Transverse bars run along the edge and do not count in the thickness.' }
    case 'wedge-bars':
      return { reason: 'Wedge bars run along the tendons and do not count against bursting.' }
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return { reason: 'Bars round a pan or across a joint do not count against bursting.' }
  }
}

/** A closed or bent bar reaches as far aside as half its own size; beyond that it does not cross the plane. */
function missedBy(shape: SteelShape, plane: Plane, aside: number): string | null {
  const size = sizeAcross(shape, plane)
  if (size === null || aside < size / 2) return null
  const noun = shape.kind === 'spiral' ? 'A spiral stands' : `Some ${shape.kind} stand`
  return `${noun} ${Math.round(aside)} beside the middle of the group and ${shape.kind === 'spiral' ? 'does' : 'do'} not cross it.`
}

function sizeAcross(shape: SteelShape, plane: Plane): number | null {
  if (shape.kind === 'spiral') return shape.outside
  if (shape.kind === 'links') return plane === 'plan' ? shape.width : shape.height
  if (shape.kind === 'hairpins') return (shape.lies === 'upright') === (plane === 'thickness') ? shape.bend : null
  return null
}

const series = (count: number, at: (k: number) => number): readonly number[] =>
  Array.from({ length: Math.max(0, Math.floor(count)) }, (_, k) => at(k))

/** A turn crosses each plane twice, taken at its middle; flat end turns close the spiral and do not count. */
function spiralCrossings(shape: SpiralShape, place: CountPlace): Crossings {
  const { flatTurns } = shape
  const flat = flatTurns === 1 ? '1 flat end turn does not count.' : `${flatTurns} flat end turns do not count.`
  return {
    noun: ['turn of the spiral', 'turns of the spiral'],
    diameter: shape.diameter,
    positions: turnsOf(shape).flatMap(({ behind, isFlat }) => (isFlat ? [] : [behind])),
    legs: 2,
    pastLine: null,
    bond: bondPlaceOf(place, shape),
    notes: flatTurns > 0 ? [flat] : [],
  }
}

/** A closed link crosses with two legs in each plane. */
function linkCrossings(shape: LinksShape, place: CountPlace): Crossings {
  return {
    noun: ['link', 'links'],
    diameter: shape.diameter,
    positions: series(shape.count, (k) => shape.first + k * shape.pitch),
    legs: 2,
    pastLine: null,
    bond: bondPlaceOf(place, shape),
    notes: [],
  }
}

/**
 * The legs run along the tendon and cross neither plane; the bend crosses the one that it stands in, once. Upright
 * hairpins further to the side than half the plate and half the section depth are past the reach of the anchor
 * (spread at 45 degrees to the middle of the tension; common practice, no source).
 */
function hairpinCrossings(shape: HairpinShape, plane: Plane, place: CountPlace): Crossings | NoCrossing {
  const crosses = shape.lies === 'upright' ? 'thickness' : 'plan'
  if (crosses !== plane) {
    const why =
      shape.lies === 'upright' ? 'stand upright and do not count in plan' : 'lie flat and do not count in the thickness'
    return { reason: `The hairpins ${why}.` }
  }
  const reach = place.plateWidth / 2 + place.depth / 2
  const aside = series(shape.count, (k) => Math.abs(k - (shape.count - 1) / 2) * shape.pitch)
  const inReach = shape.lies === 'flat' ? shape.count : aside.filter((offset) => offset <= reach).length
  const lost = shape.count - inReach
  return {
    noun: ['hairpin', 'hairpins'],
    diameter: shape.diameter,
    positions: series(inReach, () => shape.first + shape.diameter / 2),
    legs: 1,
    pastLine: null,
    bond: bondPlaceOf(place, shape),
    notes:
      lost > 0
        ? [`${lost} of ${shape.count} hairpins not counted: more than ${Math.round(reach)} beside the anchor.`]
        : [],
  }
}

/** Edge bars lie from the slab edge; the window counts from the bearing face. */
function edgeBarCrossings(shape: EdgeBarsShape, place: CountPlace): Crossings | NoCrossing {
  const { chainage, setBack, breaks } = place
  const from = Math.max(shape.from, ...breaks.filter((at) => at <= chainage))
  const to = Math.min(shape.to, ...breaks.filter((at) => at > chainage))
  if (chainage <= from || chainage >= to) return { reason: null }
  const at = (k: number) => shape.first + k * shape.pitch - setBack
  return {
    noun: ['edge bar', 'edge bars'],
    diameter: shape.diameter,
    positions: [...series(shape.countTop, at), ...series(shape.countBottom, at)],
    legs: 1,
    pastLine: Math.min(chainage - from, to - chainage),
    bond: bondPlaceOf(place, shape),
    notes: [],
  }
}

/** Centred on the anchor; an end of the edge cuts them short. */
function transverseCrossings(shape: TransverseBarsShape, place: CountPlace): Crossings {
  const toEnd = Math.min(place.chainage - place.edgeFrom, place.edgeTo - place.chainage) - place.cover
  return {
    noun: ['transverse bar', 'transverse bars'],
    diameter: shape.diameter,
    positions: series(shape.count, (k) => shape.first + k * shape.pitch).flatMap((x) =>
      shape.layers === 'both' ? [x, x] : [x],
    ),
    legs: 1,
    pastLine: Math.max(0, Math.min(shape.length / 2 - (place.aside ?? 0), toEnd)),
    bond: bondPlaceOf(place, shape),
    notes: [],
  }
}
