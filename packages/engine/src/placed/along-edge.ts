/** Straight bars along an edge and across its gaps. */

import type { EdgeFrame } from '../frame'
import { tendonEndsOfEdge } from '../gaps'
import type { LayoutIndex } from '../layout-index'
import type { Anchor, EdgeBarsShape, Pour, SteelZone, TransverseBarsShape, WedgeBarsShape } from '../model'
import { sectionBehind, type Section } from '../section'
import { evenly, type Drawn } from './bar'
import { layersOf, type Layer } from './layers'

export interface Placing {
  readonly pour: Pour
  readonly frame: EdgeFrame
}

/** Beside a step the section is asked for this far away, mm. */
const NEXT_TO = 1

/** Parallel to the edge, centred on the anchor, counted from its bearing face. */
export function transverseBars(shape: TransverseBarsShape, { pour, frame }: Placing, anchor: Anchor): Drawn[] {
  return evenly(shape.count, anchor.setBack + shape.first, shape.pitch).flatMap((depth) => {
    const section = sectionBehind(pour, { frame, chainage: anchor.chainage, depth })
    return layersOf(section, { ...shape, way: frame.along, mats: pour.mats }).map(({ face, height }) => ({
      layer: face,
      path: [-0.5, 0.5].map((share) => ({ chainage: anchor.chainage + share * shape.length, depth, height })),
    }))
  })
}

/** Straight bars, in pieces where the edge's top or soffit steps. */
export function edgeBars(shape: EdgeBarsShape, placing: Placing): Drawn[] {
  const { pour, frame } = placing
  const pieces = piecesOf(shape, frame)
  const rows = [
    { layers: 'top', count: shape.countTop },
    { layers: 'bottom', count: shape.countBottom },
  ] as const
  return rows.flatMap(({ layers, count }) =>
    evenly(count, shape.first, shape.pitch).flatMap((depth) =>
      pieces.flatMap((piece) => {
        const section = sectionBehind(pour, { frame, chainage: (piece[0] + piece[1]) / 2, depth })
        const bars = { layers, diameter: shape.diameter, way: frame.along, mats: pour.mats }
        return layersOf(section, bars).map((layer) => {
          const ends = clearOfSteps(placing, { piece, shape, section, layer, depth })
          return {
            layer: layer.face,
            path: ends.map((chainage) => ({ chainage, depth, height: layer.height })),
          }
        })
      }),
    ),
  )
}

function piecesOf({ from, to }: EdgeBarsShape, frame: EdgeFrame): [number, number][] {
  const steps = frame.steps.filter((chainage) => chainage > from && chainage < to)
  const cuts = [from, ...steps, to]
  return cuts.slice(1).map((end, i) => [cuts[i] ?? from, end])
}

/** A bar above the next length's top or below its soffit ends at the side of the step, with its cover. */
function clearOfSteps(
  { pour, frame }: Placing,
  of: { piece: [number, number]; shape: EdgeBarsShape; section: Section; layer: Layer; depth: number },
): [number, number] {
  const { piece, shape, section, layer, depth } = of
  const short = section.coverEdge + section.linkDiameter
  const isCutBy = (chainage: number) => {
    const beyond = sectionBehind(pour, { frame, chainage, depth })
    const half = shape.diameter / 2
    return layer.height - half < beyond.soffit || layer.height + half > beyond.top
  }
  const [from, to] = piece
  return [
    from > shape.from && isCutBy(from - NEXT_TO) ? from + short : from,
    to < shape.to && isCutBy(to + NEXT_TO) ? to - short : to,
  ]
}

/** Parallel to the tendons, spread evenly over the gap, from the edge's cover inward. */
export function wedgeBars(
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
    return layersOf(section, { ...shape, way: frame.inward, mats: pour.mats }).map(({ face, height }) => ({
      layer: face,
      path: depths.map((depth) => ({ chainage, depth, height })),
    }))
  })
}
