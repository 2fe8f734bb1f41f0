import { spreadOf } from '@wedgeline/engine/bases'
import { alongAzimuth, found, panOutline } from '@wedgeline/engine/geometry'
import { cornerWedges, wedgesOfEdge } from '@wedgeline/engine/wedges'
import type { Anchor, Edge, EdgeFrame, LayoutIndex, LengthKind, Point, Pour, Tendon } from '@wedgeline/engine'

/** What the plan of a pour draws, in mm on the ground. Nothing here knows of px. */
export interface PlanData {
  readonly outline: readonly Point[]
  readonly regions: readonly PlanArea[]
  readonly obstructions: readonly PlanArea[]
  readonly pans: readonly PlanArea[]
  readonly edges: readonly PlanEdge[]
  readonly tendons: readonly PlanTendon[]
  readonly anchors: readonly PlanAnchor[]
  readonly wedges: readonly PlanArea[]
  /** Without precompression along either edge of a corner. */
  readonly corners: readonly PlanArea[]
  readonly gridLines: readonly { readonly name: string; readonly point: Point; readonly direction: Point }[]
}

export interface PlanArea {
  readonly id: string
  readonly mark: string
  readonly outline: readonly Point[]
}

export interface PlanEdge {
  readonly id: string
  readonly mark: string
  readonly from: Point
  readonly to: Point
  /** Unit vector out of the slab. */
  readonly outward: Point
  readonly lengths: readonly { readonly kind: LengthKind; readonly from: Point; readonly to: Point }[]
}

export interface PlanTendon {
  readonly id: string
  readonly path: readonly Point[]
  /** Only one end is known: the line is a stub that says which way the tendon runs. */
  readonly isOpen: boolean
}

export interface PlanAnchor {
  readonly id: string
  readonly isLive: boolean
  readonly point: Point
  /** Unit vector along the tendon, inwards. */
  readonly inward: Point
  /** Plate or splay, mm. */
  readonly width: number
  /** Sides of the spread from the plate's two ends to where a neighbour's spread takes over. */
  readonly spread: readonly (readonly [Point, Point])[]
}

/** How much of a tendon with an open end is drawn, mm. */
const STUB = 2500

/** The plan of one pour. @throws where the pour or what it refers to is not in the layout. */
export function planData(index: LayoutIndex, pourId: string): PlanData {
  const pour = found(index.pours, pourId, 'pour')
  const edges = index.edgesOfPour.get(pourId) ?? []
  const tendons = index.tendonsOfPour.get(pourId) ?? []
  const wedges = edges.flatMap((edge) => wedgesOf(index, edge))
  return {
    outline: pour.outline,
    regions: pour.regions,
    obstructions: index.layout.obstructions.filter(
      ({ levelId, outline }) => levelId === pour.levelId && isBeside(outline, pour.outline),
    ),
    pans: (index.pansOfPour.get(pourId) ?? []).map((pan) => ({ id: pan.id, mark: pan.mark, outline: panOutline(pan) })),
    edges: edges.map((edge) => planEdge(index, edge)),
    tendons: tendons.flatMap((tendon) => planTendon(index, tendon)),
    anchors: tendons.flatMap((tendon) =>
      (index.anchorsOfTendon.get(tendon.id) ?? []).map((anchor) => planAnchor(index, pour, anchor)),
    ),
    wedges,
    corners: cornersOf(index, pourId),
    gridLines: index.layout.gridLines.map(({ name, x, y, azimuth }) => ({
      name,
      point: { x, y },
      direction: alongAzimuth(azimuth),
    })),
  }
}

/** Things further off than this belong to the drawing of another pour, mm. */
const BESIDE = 1500

function isBeside(thing: readonly Point[], slab: readonly Point[]): boolean {
  const [xs, ys] = [slab.map(({ x }) => x), slab.map(({ y }) => y)]
  const within = (value: number, all: readonly number[]) =>
    value >= Math.min(...all) - BESIDE && value <= Math.max(...all) + BESIDE
  return thing.some(({ x, y }) => within(x, xs) && within(y, ys))
}

function planEdge(index: LayoutIndex, edge: Edge): PlanEdge {
  const frame = found(index.frames, edge.id, 'edge')
  return {
    id: edge.id,
    mark: edge.mark,
    from: frame.pointAt(frame.from, 0),
    to: frame.pointAt(frame.to, 0),
    outward: { x: -frame.inward.x, y: -frame.inward.y },
    lengths: edge.lengths.map(({ kind, from, to }) => ({
      kind,
      from: frame.pointAt(from, 0),
      to: frame.pointAt(to, 0),
    })),
  }
}

/** As in the checks of the gaps; an edge that no tendon points at has none to show. */
function wedgesOf(index: LayoutIndex, edge: Edge): PlanArea[] {
  const { pointAt } = found(index.frames, edge.id, 'edge')
  return [...wedgesOfEdge(index, edge.id)].flatMap(([id, { gap, polygons }]) =>
    gap.after || gap.before
      ? polygons.map((polygon) => ({
          id,
          mark: '',
          outline: polygon.map(({ chainage, depth }) => pointAt(chainage, depth)),
        }))
      : [],
  )
}

const cornersOf = (index: LayoutIndex, pourId: string): PlanArea[] =>
  [...cornerWedges(index, pourId)].flatMap(([id, { polygons }]) =>
    polygons.map((outline, i) => ({ id: `${id}:${i}`, mark: '', outline })),
  )

interface Placed {
  readonly point: Point
  readonly inward: Point
}

/** Bearing face of an anchor in plan; null where its edge or pan is not there. */
function placeOf(index: LayoutIndex, anchor: Anchor): Placed | null {
  const pan = anchor.panId === null ? undefined : index.pans.get(anchor.panId)
  if (pan) {
    const axis = alongAzimuth(pan.azimuth)
    return { point: { x: pan.x, y: pan.y }, inward: { x: -axis.x, y: -axis.y } }
  }
  const frame: EdgeFrame | undefined = anchor.edgeId === null ? undefined : index.frames.get(anchor.edgeId)
  if (!frame) return null
  const outward = alongAzimuth(frame.outwardAzimuth + anchor.skew)
  return {
    point: frame.pointAt(anchor.chainage, anchor.setBack),
    inward: { x: -outward.x, y: -outward.y },
  }
}

function planTendon(index: LayoutIndex, tendon: Tendon): PlanTendon[] {
  const ends = (index.anchorsOfTendon.get(tendon.id) ?? []).flatMap((anchor) => placeOf(index, anchor) ?? [])
  const [first, second] = ends
  if (!first) return []
  if (second) return [{ id: tendon.id, path: [first.point, ...tendon.path, second.point], isOpen: false }]
  return [{ id: tendon.id, path: [first.point, moved(first.point, first.inward, STUB)], isOpen: true }]
}

function planAnchor(index: LayoutIndex, pour: Pour, anchor: Anchor): PlanAnchor {
  const place = placeOf(index, anchor) ?? { point: pour.outline[0] ?? { x: 0, y: 0 }, inward: { x: 0, y: 1 } }
  const { width } = found(index.hardware, anchor.hardwareId, 'hardware').plate
  const across = { x: place.inward.y, y: -place.inward.x }
  const angle = spreadOf(index.layout.job)
  const sides = ([1, -1] as const).map((way): readonly [Point, Point] => {
    const start = moved(place.point, across, (way * width) / 2)
    const direction = {
      x: place.inward.x * Math.cos(angle) + way * across.x * Math.sin(angle),
      y: place.inward.y * Math.cos(angle) + way * across.y * Math.sin(angle),
    }
    return [start, moved(start, direction, SPREAD_DRAWN)]
  })
  return { id: anchor.id, isLive: anchor.end === 'live', ...place, width, spread: sides }
}

/** Length of the sides of a spread that are drawn, mm. */
const SPREAD_DRAWN = 900

const moved = (from: Point, direction: Point, by: number): Point => ({
  x: from.x + direction.x * by,
  y: from.y + direction.y * by,
})
