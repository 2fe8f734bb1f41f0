/** Straight bars along an edge and across its gaps. */

import type { EdgeFrame } from '../frame'
import { tendonEndsOfEdge, type TendonEnd } from '../gaps'
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

/**
 * Parallel to the tendons, spread evenly over the gap, from the edge's cover inward; the outermost clear of a pocket that
 * reaches to their height, and with cover at the end of the edge.
 */
export function wedgeBars(
  index: LayoutIndex,
  of: { shape: WedgeBarsShape; placing: Placing; zone: SteelZone & { kind: 'gap' } },
): Drawn[] {
  const { shape, zone } = of
  const { pour, frame } = of.placing
  const ends = tendonEndsOfEdge(index, zone.edgeId)
  const endOf = (anchorId: string | null) => ends.find(({ anchor }) => anchor.id === anchorId)
  const [after, before] = [endOf(zone.afterAnchorId), endOf(zone.beforeAnchorId)]
  const [from, to] = [after?.chainage ?? frame.from, before?.chainage ?? frame.to]
  const pitch = (to - from) / shape.count
  const sectionOf = (chainage: number) =>
    sectionBehind(pour, { frame, chainage, depth: coverOf(chainage) + shape.length / 2 })
  const coverOf = (chainage: number) => sectionBehind(pour, { frame, chainage, depth: 0 }).coverEdge
  const coverInside = (chainage: number) => {
    const { coverEdge, linkDiameter } = sectionBehind(pour, { frame, chainage, depth: 0 })
    return coverEdge + linkDiameter
  }
  const layersAt = (chainage: number) => layersOf(sectionOf(chainage), { ...shape, way: frame.inward, mats: pour.mats })
  return layersAt((from + to) / 2).flatMap(({ face }) => {
    const heightAt = (chainage: number) => layersAt(chainage).find((layer) => layer.face === face)?.height ?? 0
    const clear = (end: TendonEnd | undefined, chainage: number) =>
      clearAt(end, { bar: shape.diameter, height: heightAt(chainage), cover: coverInside(chainage) })
    const first = Math.max(from + pitch / 2, from + clear(after, from + pitch / 2))
    const last = Math.min(to - pitch / 2, to - clear(before, to - pitch / 2))
    const step = shape.count > 1 ? (last - first) / (shape.count - 1) : 0
    return evenly(shape.count, first, step).map((chainage) => {
      const [height, depth] = [heightAt(chainage), coverOf(chainage)]
      return { layer: face, path: [depth, depth + shape.length].map((at) => ({ chainage, depth: at, height })) }
    })
  })
}

/** From the end of a gap to the axis of its first bar, at least, mm. */
function clearAt(
  end: TendonEnd | undefined,
  { bar, height, cover }: { readonly bar: number; readonly height: number; readonly cover: number },
): number {
  if (!end) return cover + bar / 2
  const { pocket } = end.hardware
  if (end.panId !== null || !pocket) return 0
  const isLevel = Math.abs(height - end.anchor.height) < (pocket.height + bar) / 2
  return isLevel ? (pocket.width + bar) / 2 : 0
}
