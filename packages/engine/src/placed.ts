/** Every bar of an edge as a line in space, for drawings and for whatever counts or fits bars. */

import type { Box } from './bodies'
import { leanOf } from './frame'
import { gapsOfEdge } from './gaps'
import { found, type LayoutIndex } from './layout-index'
import type { Anchor, Steel, SteelShape, SteelZone } from './model'
import { edgeBars, transverseBars, wedgeBars, type Placing } from './placed/along-edge'
import type { Drawn, PlacedBar } from './placed/bar'
import { fromFaceOf, hairpins, links, spiral } from './placed/behind-face'

/**
 * The bars of an edge: those entered for it, its anchors and its gaps, and the local steel of the hardware where an
 * anchor has none of that kind of its own. Bars round pans and across joints: `barsOfPan`, `barsOfJoint`.
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
  const shape = hardwareSteelOf(index, anchor)
  if (!shape) return []
  const zone: SteelZone = { kind: 'anchor', anchorId: anchor.id }
  return drawn(index, { placing, anchor, shape, zone }).map((bar) =>
    placed(bar, { steel: null, zoneId: `anchor:${anchor.id}`, anchor, shape }),
  )
}

/** Local steel that comes with an anchor's hardware, unless steel of that kind has been entered for the anchor. */
export function hardwareSteelOf(index: LayoutIndex, anchor: Anchor): SteelShape | null {
  const shape = found(index.hardware, anchor.hardwareId, 'hardware').localSteel
  const hasOwn = (index.steelOfZone.get(`anchor:${anchor.id}`) ?? []).some((steel) => steel.shape.kind === shape?.kind)
  return hasOwn ? null : shape
}

/** A drawn bar with what it belongs to. */
export function placed(
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
    layer: null,
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
  const fromFace = anchor && fromFaceOf({ ...anchor, lean: leanOf(placing.frame, anchor.skew) })
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
