/** Every bar of an edge as a line in space, for drawings and for whatever counts or fits bars. */

import type { Box } from './bodies'
import { leanOf, type EdgeFrame, type LocalPoint } from './frame'
import { gapsOfEdge, tendonEndsOfEdge } from './gaps'
import { found, type LayoutIndex } from './layout-index'
import type {
  Anchor,
  EdgeBarsShape,
  HairpinShape,
  LinksShape,
  Pour,
  SpiralShape,
  Steel,
  SteelKind,
  SteelShape,
  SteelZone,
  TransverseBarsShape,
  WedgeBarsShape,
} from './model'
import { sectionBehind, type Section } from './section'

export interface PlacedBar {
  /** Null for steel that comes with the hardware and has not been entered. */
  readonly steelId: string | null
  /** The zone that the bar belongs to, as in `Zone`. */
  readonly zoneId: string
  readonly anchorId: string | null
  readonly kind: SteelKind
  readonly diameter: number
  /** Centre line. Bends are drawn square. */
  readonly path: readonly LocalPoint[]
  /** The last point joins the first. */
  readonly isClosed: boolean
  /** The turns of a spiral, by distance from the bearing face along the tendon; empty for other bars. */
  readonly turns: readonly SpiralTurn[]
}

interface SpiralTurn {
  /** Middle of the turn, mm behind the bearing face. */
  readonly behind: number
  /** A flat end turn, which closes the spiral and is not counted. */
  readonly isFlat: boolean
}

/** A place from an anchor's bearing face: along the edge, behind the face along the tendon, and up, mm. */
type FromFace = (across: number, behind: number, up: number) => LocalPoint

interface Placing {
  readonly pour: Pour
  readonly frame: EdgeFrame
}

type Drawn = Pick<PlacedBar, 'path'> & Partial<Pick<PlacedBar, 'isClosed' | 'turns'>>

/** Straight pieces that draw one turn of a spiral. */
const PIECES_PER_TURN = 24

/**
 * The bars of an edge: those entered for it, its anchors and its gaps, and the local steel of the hardware where an
 * anchor has none of that kind of its own. Trimmers and other bars placed round pans and joints are not among them.
 */
export function placedBars(index: LayoutIndex, edgeId: string): PlacedBar[] {
  const edge = found(index.edges, edgeId, 'edge')
  const placing: Placing = { pour: found(index.pours, edge.pourId, 'pour'), frame: found(index.frames, edgeId, 'edge') }
  const zones = [`edge:${edgeId}`, ...gapsOfEdge(index, edgeId).map((gap) => gap.id)]
  return [
    ...zones.flatMap((zoneId) => enteredBars(index, { placing, zoneId, anchor: null })),
    ...(index.anchorsOfEdge.get(edgeId) ?? []).flatMap((anchor) => [
      ...enteredBars(index, { placing, zoneId: `anchor:${anchor.id}`, anchor }),
      ...hardwareBars(index, placing, anchor),
    ]),
  ]
}

/** The box round a bar, half its diameter outside its centre line. */
export function boxRound(bar: PlacedBar): Box {
  const half = bar.diameter / 2
  const range = (values: readonly number[]): [number, number] => [
    values.reduce((least, value) => Math.min(least, value), Infinity) - half,
    values.reduce((most, value) => Math.max(most, value), -Infinity) + half,
  ]
  const [fromChainage, toChainage] = range(bar.path.map((point) => point.chainage))
  const [fromDepth, toDepth] = range(bar.path.map((point) => point.depth))
  const [fromHeight, toHeight] = range(bar.path.map((point) => point.height))
  return { fromChainage, toChainage, fromDepth, toDepth, fromHeight, toHeight }
}

/** Flat turns first and last, in equal number with the odd one last; between them the turns at the pitch. */
export function turnsOf({ turns, flatTurns, first, pitch }: SpiralShape): SpiralTurn[] {
  const active = Math.max(0, turns - flatTurns)
  const flatFirst = Math.floor(flatTurns / 2)
  const flat = (behind: number, count: number) => Array.from({ length: count }, () => ({ behind, isFlat: true }))
  return [
    ...flat(first, flatFirst),
    ...Array.from({ length: active }, (_, i) => ({ behind: first + (i + 0.5) * pitch, isFlat: false })),
    ...flat(first + active * pitch, flatTurns - flatFirst),
  ]
}

function enteredBars(
  index: LayoutIndex,
  { placing, zoneId, anchor }: { readonly placing: Placing; readonly zoneId: string; readonly anchor: Anchor | null },
): PlacedBar[] {
  return (index.steelOfZone.get(zoneId) ?? []).flatMap((steel) =>
    drawn(index, { placing, anchor, shape: steel.shape, zone: steel.zone }).map((bar) =>
      placed(bar, { steel, zoneId, anchor, shape: steel.shape }),
    ),
  )
}

function hardwareBars(index: LayoutIndex, placing: Placing, anchor: Anchor): PlacedBar[] {
  const shape = found(index.hardware, anchor.hardwareId, 'hardware').localSteel
  const zoneId = `anchor:${anchor.id}`
  const hasOwn = (index.steelOfZone.get(zoneId) ?? []).some((steel) => steel.shape.kind === shape?.kind)
  if (!shape || hasOwn) return []
  const zone: SteelZone = { kind: 'anchor', anchorId: anchor.id }
  return drawn(index, { placing, anchor, shape, zone }).map((bar) =>
    placed(bar, { steel: null, zoneId, anchor, shape }),
  )
}

function placed(
  bar: Drawn,
  of: { steel: Steel | null; zoneId: string; anchor: Anchor | null; shape: SteelShape },
): PlacedBar {
  return {
    steelId: of.steel?.id ?? null,
    zoneId: of.zoneId,
    anchorId: of.anchor?.id ?? null,
    kind: of.shape.kind,
    diameter: of.shape.diameter,
    isClosed: false,
    turns: [],
    ...bar,
  }
}

/** One place maps a kind of steel to its geometry. Kinds that need an anchor are empty without one. */
function drawn(
  index: LayoutIndex,
  at: {
    readonly placing: Placing
    readonly anchor: Anchor | null
    readonly shape: SteelShape
    readonly zone: SteelZone
  },
): Drawn[] {
  const { placing, anchor, shape } = at
  const fromFace = anchor && fromFaceOf(placing.frame, anchor)
  switch (shape.kind) {
    case 'spiral':
      return fromFace ? [spiral(shape, fromFace)] : []
    case 'links':
      return fromFace ? links(shape, fromFace) : []
    case 'hairpins':
      return fromFace ? hairpins(shape, fromFace) : []
    case 'transverse-bars':
      return anchor ? transverseBars(shape, placing, anchor) : []
    case 'edge-bars':
      return edgeBars(shape, placing)
    case 'wedge-bars':
      return at.zone.kind === 'gap' ? wedgeBars(index, { shape, placing, zone: at.zone }) : []
    case 'trimmers':
    case 'diagonals':
    case 'tie-back-bars':
    case 'lap-bars':
      return []
  }
}

/** Behind runs in along the tendon: it leans in plan with the skew and falls with the outward elevation. */
function fromFaceOf(frame: EdgeFrame, anchor: Anchor): FromFace {
  const lean = leanOf(frame, anchor.skew)
  const [sinLean, cosLean] = [Math.sin(lean), Math.cos(lean)]
  const [sinUp, cosUp] = [Math.sin(anchor.elevation), Math.cos(anchor.elevation)]
  return (across, behind, up) => ({
    chainage: anchor.chainage + across * cosLean + behind * sinLean * cosUp + up * sinLean * sinUp,
    depth: anchor.setBack - across * sinLean + behind * cosLean * cosUp + up * cosLean * sinUp,
    height: anchor.height - behind * sinUp + up * cosUp,
  })
}

function spiral(shape: SpiralShape, at: FromFace): Drawn {
  const radius = (shape.outside - shape.diameter) / 2
  const turns = turnsOf(shape)
  const points = turns.flatMap((turn) =>
    Array.from({ length: PIECES_PER_TURN }, (_, i) => {
      const share = i / PIECES_PER_TURN
      const behind = turn.isFlat ? turn.behind : turn.behind + (share - 0.5) * shape.pitch
      const angle = share * 2 * Math.PI
      return at(radius * Math.cos(angle), behind, radius * Math.sin(angle))
    }),
  )
  const last = turns.at(-1)
  const end = last ? [at(radius, last.isFlat ? last.behind : last.behind + shape.pitch / 2, 0)] : []
  return { path: [...points, ...end], turns }
}

function links({ count, first, pitch, width, height, diameter }: LinksShape, at: FromFace): Drawn[] {
  const [across, up] = [(width - diameter) / 2, (height - diameter) / 2]
  return evenly(count, first, pitch).map((behind) => ({
    path: [at(-across, behind, -up), at(across, behind, -up), at(across, behind, up), at(-across, behind, up)],
    isClosed: true,
  }))
}

/** `first` reaches the outside of the bend; legs are measured from there. Several stand centred on the anchor. */
function hairpins({ count, first, pitch, leg, bend, diameter, lies }: HairpinShape, at: FromFace): Drawn[] {
  const half = (bend - diameter) / 2
  const [atBend, atEnd] = [first + diameter / 2, first + leg]
  return evenly(count, (-(count - 1) * pitch) / 2, pitch).map((offset) => {
    const side = (sign: 1 | -1, behind: number) =>
      lies === 'upright' ? at(offset, behind, sign * half) : at(sign * half, behind, offset)
    return { path: [side(1, atEnd), side(1, atBend), side(-1, atBend), side(-1, atEnd)] }
  })
}

function transverseBars(shape: TransverseBarsShape, { pour, frame }: Placing, anchor: Anchor): Drawn[] {
  return evenly(shape.count, anchor.setBack + shape.first, shape.pitch).flatMap((depth) => {
    const section = sectionBehind(pour, { frame, chainage: anchor.chainage, depth })
    return layerHeights(section, shape).map((height) => ({
      path: [-0.5, 0.5].map((share) => ({ chainage: anchor.chainage + share * shape.length, depth, height })),
    }))
  })
}

/** Straight bars, in pieces where the edge's top or soffit steps. */
function edgeBars(shape: EdgeBarsShape, placing: Placing): Drawn[] {
  const pieces = piecesOf(shape, placing.frame)
  const rows = [
    { layers: 'top', count: shape.countTop },
    { layers: 'bottom', count: shape.countBottom },
  ] as const
  return rows.flatMap(({ layers, count }) =>
    evenly(count, shape.first, shape.pitch).flatMap((depth) =>
      pieces.flatMap(([from, to]) => {
        const { pour, frame } = placing
        const section = sectionBehind(pour, { frame, chainage: (from + to) / 2, depth })
        return layerHeights(section, { layers, diameter: shape.diameter }).map((height) => ({
          path: [from, to].map((chainage) => ({ chainage, depth, height })),
        }))
      }),
    ),
  )
}

function piecesOf({ from, to }: EdgeBarsShape, frame: EdgeFrame): [number, number][] {
  const steps = frame.steps.filter((chainage) => chainage > from && chainage < to)
  const cuts = [from, ...steps, to]
  return cuts.slice(1).map((end, i) => [cuts[i] ?? from, end])
}

/** Spread evenly over the gap, from the edge's cover inward. */
function wedgeBars(
  index: LayoutIndex,
  of: { shape: WedgeBarsShape; placing: Placing; zone: SteelZone & { kind: 'gap' } },
): Drawn[] {
  const { shape, zone } = of
  const { pour, frame } = of.placing
  const ends = tendonEndsOfEdge(index, zone.edgeId)
  const chainageOf = (anchorId: string | null, end: number) =>
    anchorId === null ? end : (ends.find((candidate) => candidate.anchor.id === anchorId)?.chainage ?? end)
  const from = chainageOf(zone.afterAnchorId, frame.from)
  const pitch = (chainageOf(zone.beforeAnchorId, frame.to) - from) / shape.count
  return evenly(shape.count, from + pitch / 2, pitch).flatMap((chainage) => {
    const { coverEdge } = sectionBehind(pour, { frame, chainage, depth: 0 })
    const depths = [coverEdge, coverEdge + shape.length]
    const section = sectionBehind(pour, { frame, chainage, depth: coverEdge + shape.length / 2 })
    return layerHeights(section, shape).map((height) => ({
      path: depths.map((depth) => ({ chainage, depth, height })),
    }))
  })
}

/** Heights of bars that lie against the cover, inside a region's links. */
function layerHeights(
  { top, soffit, coverTop, coverSoffit, linkDiameter }: Section,
  { layers, diameter }: { readonly layers: 'top' | 'bottom' | 'both'; readonly diameter: number },
): number[] {
  const inside = linkDiameter + diameter / 2
  return [
    ...(layers === 'bottom' ? [] : [top - coverTop - inside]),
    ...(layers === 'top' ? [] : [soffit + coverSoffit + inside]),
  ]
}

function evenly(count: number, first: number, pitch: number): number[] {
  return Array.from({ length: count }, (_, i) => first + i * pitch)
}
