/** Bars of a stressing pan, in the pan's own coordinates. */

import type { LocalPoint } from '../frame'
import { add, scale } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, Pan, PlacedBarsShape, Pour, SteelShape } from '../model'
import { hardwareSteelOf, placed } from '../placed'
import { sectionAt } from '../section'
import { about, evenly, type Drawn, type PlacedBar } from './bar'
import { fromFaceOf, hairpins, links, spiral } from './behind-face'
import { layersOf } from './layers'
import { panFrame } from './pan-frame'

/**
 * The bars entered for a pan and its anchors, and the local steel of their hardware (common practice for the places).
 *
 * Tie-back and lap bars lie symmetrical about the tendon at their pitch, their middle at the bearing face. Trimmers
 * lie half on each side of the recess, the odd one on the first, from a cover outside its sides outwards at the pitch.
 * Diagonals lie at each corner at 45 degrees to the sides, from a cover outside it outwards.
 */
export function barsOfPan(index: LayoutIndex, panId: string): PlacedBar[] {
  const pan = found(index.pans, panId, 'pan')
  const pour = found(index.pours, pan.pourId, 'pour')
  const zoneId = `pan:${panId}`
  return [
    ...(index.steelOfZone.get(zoneId) ?? []).flatMap((steel) =>
      roundPan(pan, pour, steel.shape).map((bar) => placed(bar, { steel, zoneId, anchor: null, shape: steel.shape })),
    ),
    ...(index.anchorsOfPan.get(panId) ?? []).flatMap((anchor) => behindPlate(index, anchor)),
  ]
}

function behindPlate(index: LayoutIndex, anchor: Anchor): PlacedBar[] {
  const zoneId = `anchor:${anchor.id}`
  const own = (index.steelOfZone.get(zoneId) ?? []).map((steel) => ({ steel, shape: steel.shape }))
  const hardware = hardwareSteelOf(index, anchor)
  return [...own, ...(hardware ? [{ steel: null, shape: hardware }] : [])].flatMap(({ steel, shape }) =>
    local(shape, anchor).map((bar) => placed(bar, { steel, zoneId, anchor, shape })),
  )
}

function local(shape: SteelShape, anchor: Anchor): Drawn[] {
  const fromFace = fromFaceOf({ ...anchor, lean: anchor.skew })
  if (shape.kind === 'spiral') return [spiral(shape, fromFace)]
  if (shape.kind === 'links') return links(shape, fromFace)
  return shape.kind === 'hairpins' ? hairpins(shape, fromFace) : []
}

/** A bar in plan: its middle, and the direction along it as parts of chainage and depth. */
interface Line {
  readonly chainage: number
  readonly depth: number
  readonly way: readonly [chainage: number, depth: number]
}

function roundPan(pan: Pan, pour: Pour, shape: SteelShape): Drawn[] {
  switch (shape.kind) {
    case 'trimmers':
      return laid(pan, pour, { shape, lines: trimmers(pan, pour, shape) })
    case 'diagonals':
      return laid(pan, pour, { shape, lines: diagonals(pan, pour, shape) })
    case 'tie-back-bars':
    case 'lap-bars':
      return laid(pan, pour, { shape, lines: tieBacks(shape) })
    case 'spiral':
    case 'links':
    case 'hairpins':
    case 'edge-bars':
    case 'transverse-bars':
    case 'wedge-bars':
      return []
  }
}

function tieBacks({ runs, count, pitch }: PlacedBarsShape): Line[] {
  return about(0, count, pitch).map((offset) =>
    runs === 'along'
      ? { chainage: offset, depth: 0, way: [0, 1] as const }
      : { chainage: 0, depth: offset, way: [1, 0] as const },
  )
}

function trimmers(pan: Pan, pour: Pour, { runs, count, pitch, diameter }: PlacedBarsShape): Line[] {
  const away = pour.coverEdge + diameter / 2
  const first = evenly(Math.ceil(count / 2), away, pitch)
  const second = evenly(Math.floor(count / 2), away, pitch)
  if (runs === 'along') {
    const line = (chainage: number): Line => ({ chainage, depth: -pan.along / 2, way: [0, 1] })
    return [...first.map((by) => line(-pan.across / 2 - by)), ...second.map((by) => line(pan.across / 2 + by))]
  }
  const line = (depth: number): Line => ({ chainage: 0, depth, way: [1, 0] })
  return [...first.map((by) => line(by)), ...second.map((by) => line(-pan.along - by))]
}

function diagonals(pan: Pan, pour: Pour, { count, pitch, diameter }: PlacedBarsShape): Line[] {
  const corners = [-1, 1].flatMap((side) => [
    { side, end: 1, depth: 0 },
    { side, end: -1, depth: -pan.along },
  ])
  return corners.flatMap(({ side, end, depth }) =>
    evenly(count, pour.coverEdge + diameter / 2, pitch).map((by): Line => ({
      chainage: side * (pan.across / 2 + by * Math.SQRT1_2),
      depth: depth + end * by * Math.SQRT1_2,
      way: [side * Math.SQRT1_2, -end * Math.SQRT1_2],
    })),
  )
}

function laid(pan: Pan, pour: Pour, { shape, lines }: { shape: PlacedBarsShape; lines: readonly Line[] }): Drawn[] {
  const frame = panFrame(pan)
  return lines.flatMap(({ chainage, depth, way: [along, inward] }) => {
    const section = sectionAt(pour, frame.pointAt(chainage, depth))
    const way = add(scale(frame.along, along), scale(frame.inward, inward))
    return layersOf(section, { ...shape, way, mats: pour.mats }).map(({ face, height }) => ({
      layer: face,
      path: [-0.5, 0.5].map((share): LocalPoint => ({
        chainage: chainage + share * shape.length * along,
        depth: depth + share * shape.length * inward,
        height,
      })),
    }))
  })
}
