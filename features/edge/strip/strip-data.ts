import {
  alongAzimuth,
  anchorMark,
  dot,
  found,
  panOutline,
  placedBars,
  tendonEndsOfEdge,
} from '@wedgeline/engine/geometry'
import { cornerWedges, wedgesOfEdge } from '@wedgeline/engine/wedges'
import type {
  AnchorEnd,
  EdgeFrame,
  HairpinShape,
  LayoutIndex,
  LinksShape,
  PlacedBar,
  SpiralShape,
  TendonEnd,
} from '@wedgeline/engine'

/** What the bands of a strip draw, in mm and the edge's own coordinates. Nothing here knows of px. */
export interface StripData {
  readonly frame: EdgeFrame
  readonly ends: readonly StripEnd[]
  readonly lengths: readonly StripLength[]
  readonly bars: readonly PlacedBar[]
  readonly wedges: readonly StripWedge[]
  /** Areas at the ends of the edge without precompression along either edge. */
  readonly corners: readonly Outline[]
  readonly pans: readonly Outline[]
  readonly obstructions: readonly Outline[]
  readonly gridCrossings: readonly { readonly name: string; readonly chainage: number }[]
  readonly highest: number
  readonly lowest: number
}

type Outline = readonly { readonly chainage: number; readonly depth: number }[]

export interface StripEnd {
  readonly id: string
  readonly mark: string
  readonly end: AnchorEnd
  readonly isInPan: boolean
  readonly chainage: number
  readonly setBack: number
  readonly heightAbove: number
  /** Plate or splay. */
  readonly width: number
  readonly height: number
  readonly pocketWidth: number | null
  readonly lean: number
  readonly local: LocalOnFace | null
}

/** Area at the edge between two spreads, without precompression square to the edge: as in the checks of its gap. */
export interface StripWedge {
  readonly zoneId: string
  readonly depth: number
  /** mm2 */
  readonly area: number
  readonly middle: number
  readonly outline: Outline
}

/** Local steel as it is seen on the face. */
export interface LocalOnFace {
  readonly width: number
  readonly height: number
  readonly diameter: number
  readonly isRound: boolean
}

export interface StripLength {
  readonly id: string
  readonly from: number
  readonly to: number
  readonly top: number
  readonly soffit: number
  readonly coverTop: number
  readonly coverSoffit: number
  readonly isAgainst: boolean
}

/** Grid lines that run within this of square to the edge are marked on its axis. */
const SQUARE_ENOUGH = Math.cos(Math.PI / 6)

/** The strip of one edge. @throws where the edge or what it refers to is not in the layout. */
export function stripData(index: LayoutIndex, edgeId: string): StripData {
  const frame = found(index.frames, edgeId, 'edge')
  const edge = found(index.edges, edgeId, 'edge')
  const pour = found(index.pours, edge.pourId, 'pour')
  const lengths = edge.lengths.map((length): StripLength => ({
    ...length,
    coverTop: pour.coverTop,
    coverSoffit: pour.coverSoffit,
    isAgainst: length.kind === 'against-wall',
  }))
  return {
    frame,
    lengths,
    ends: tendonEndsOfEdge(index, edgeId).map((end) => stripEnd(index, end)),
    bars: placedBars(index, edgeId),
    wedges: wedgesOf(index, edgeId),
    corners: cornersOf(index, { pourId: pour.id, edgeId, frame }),
    pans: (index.pansOfPour.get(pour.id) ?? []).map((pan) => panOutline(pan).map((point) => frame.local(point))),
    obstructions: index.layout.obstructions
      .filter(({ levelId }) => levelId === pour.levelId)
      .map(({ outline }) => outline.map((point) => frame.local(point))),
    gridCrossings: gridCrossings(index, frame),
    highest: Math.max(...lengths.map(({ top }) => top)),
    lowest: Math.min(...lengths.map(({ soffit }) => soffit)),
  }
}

function wedgesOf(index: LayoutIndex, edgeId: string): readonly StripWedge[] {
  return [...wedgesOfEdge(index, edgeId)].flatMap(([zoneId, { gap, depth, area, polygons }]): StripWedge[] => {
    const [outline] = polygons
    if (!outline || (!gap.after && !gap.before)) return []
    return [{ zoneId, depth, area, middle: (gap.from + gap.to) / 2, outline }]
  })
}

function cornersOf(
  index: LayoutIndex,
  { pourId, edgeId, frame }: { readonly pourId: string; readonly edgeId: string; readonly frame: EdgeFrame },
): readonly Outline[] {
  return [...cornerWedges(index, pourId).values()]
    .filter(({ before, after }) => before.id === edgeId || after.id === edgeId)
    .flatMap(({ polygons }) => polygons.map((polygon) => polygon.map((point) => frame.local(point))))
}

function stripEnd(
  index: LayoutIndex,
  { anchor, hardware, panId, chainage, setBack, width, lean }: TendonEnd,
): StripEnd {
  const own = (index.steelOfZone.get(`anchor:${anchor.id}`) ?? []).map(({ shape }) => shape).find(isLocal)
  return {
    id: anchor.id,
    mark: anchorMark(index, anchor),
    end: anchor.end,
    isInPan: panId !== null,
    chainage,
    setBack,
    heightAbove: anchor.height,
    width,
    height: hardware.plate.height,
    pocketWidth: hardware.pocket?.width ?? null,
    lean,
    local: localOnFace(own ?? hardware.localSteel),
  }
}

type LocalShape = SpiralShape | LinksShape | HairpinShape
const isLocal = (shape: { readonly kind: string }): shape is LocalShape =>
  shape.kind === 'spiral' || shape.kind === 'links'

function localOnFace(shape: LocalShape | null): LocalOnFace | null {
  if (shape?.kind === 'spiral') {
    return { width: shape.outside, height: shape.outside, diameter: shape.diameter, isRound: true }
  }
  if (shape?.kind === 'links') {
    return { width: shape.width, height: shape.height, diameter: shape.diameter, isRound: false }
  }
  return null
}

function gridCrossings(index: LayoutIndex, frame: EdgeFrame): StripData['gridCrossings'] {
  return index.layout.gridLines.flatMap(({ name, x, y, azimuth }) => {
    const direction = alongAzimuth(azimuth)
    const square = dot(direction, frame.inward)
    if (Math.abs(square) < SQUARE_ENOUGH) return []
    const { chainage, depth } = frame.local({ x, y })
    const lean = dot(direction, frame.along) / square
    return [{ name, chainage: chainage - depth * lean }]
  })
}
