/** Laps of edge bars: of sets entered one after the other, and of bars split at the stock length. */

import type { AnchorageInput } from '../bases/basis'
import type { EdgeBarsShape } from '../model'
import type { Compared, Zone } from '../result'
import { edgeBarInput, edgeBarPieces, type BarPiece, type BarPieces } from '../steel/bar-pieces'
import { lapCheck, lapStep, pastLine, worstOfEach } from './anchorage-length'
import type { CheckContext } from './outcome'

/** One check for laps between sets and one for laps of pieces, each the one with the least to spare. */
export function edgeLapChecks(context: CheckContext, zone: Zone): readonly Compared[] {
  const shapes = (context.index.steelOfZone.get(zone.id) ?? [])
    .flatMap(({ shape }) => (shape.kind === 'edge-bars' ? [shape] : []))
    .sort((one, other) => one.from - other.from)
  return worstOfEach([...setLaps(context, zone, shapes), ...shapes.flatMap((shape) => pieceLaps(context, zone, shape))])
}

/** Sets in one line overlap where one ends and the next begins: all their bars are lapped at one section there. */
function setLaps(context: CheckContext, zone: Zone, shapes: readonly EdgeBarsShape[]): readonly Compared[] {
  return shapes.flatMap((shape, i): readonly Compared[] => {
    const next = shapes.slice(i + 1).find((other) => isInLine(shape, other))
    const overlap = next ? shape.to - next.from : 0
    if (!next || overlap <= 0 || next.to <= shape.to) return []
    const at = (shape.to + next.from) / 2
    const thicker = next.diameter > shape.diameter ? next : shape
    const layer = shape.countTop > 0 && next.countTop > 0 ? 'top' : 'bottom'
    const edgeId = zone.edgeId ?? ''
    const input = edgeBarInput(context.index, context.basis, { shape: thicker, edgeId, at, layer, beside: 2 })
    const past = pastLine(
      {
        meaning: 'Overlap of the two sets of edge bars',
        formula: 'to - from',
        values: { to: shape.to, from: next.from },
      },
      overlap,
    )
    const notes = [`From chainage ${Math.round(next.from)} to ${Math.round(shape.to)}.`, ...bondNote(input)]
    return [lapCheck(zone, { name: 'Laps of edge bars', past, lap: lapStep(context, input, 1), notes })]
  })
}

/** At one depth from the edge, and in a layer that both have. */
function isInLine(one: EdgeBarsShape, other: EdgeBarsShape): boolean {
  const isNear = Math.abs(one.first - other.first) <= (one.diameter + other.diameter) / 2
  return isNear && ((one.countTop > 0 && other.countTop > 0) || (one.countBottom > 0 && other.countBottom > 0))
}

/** What the schedule splits it laps by the length that is asked for; whether each lap is clear of anchors is said. */
function pieceLaps(context: CheckContext, zone: Zone, shape: EdgeBarsShape): readonly Compared[] {
  const { index, basis } = context
  const edgeId = zone.edgeId ?? ''
  const made = edgeBarPieces(index, basis, { shape, edgeId })
  return (['top', 'bottom'] as const).flatMap((layer) => lapsOfLayer(context, zone, { shape, layer, made }))
}

interface Split {
  readonly shape: EdgeBarsShape
  readonly layer: BarPiece['layer']
  readonly made: BarPieces
}

/** The shortest lap of a layer: bars at the top of a deep section need longer ones than those below. */
function lapsOfLayer(context: CheckContext, zone: Zone, { shape, layer, made }: Split): readonly Compared[] {
  const { share, notes } = made
  const laps = made.laps.filter((lap) => lap.layer === layer)
  const [first] = laps
  if (!first) return []
  const shortest = laps.reduce((so, lap) => (lap.to - lap.from < so.to - so.from ? lap : so), first)
  const at = (shortest.from + shortest.to) / 2
  const input = edgeBarInput(context.index, context.basis, { shape, edgeId: zone.edgeId ?? '', at, layer, beside: 2 })
  const past = pastLine(
    {
      meaning: 'Shortest lap of the pieces',
      formula: 'to - from',
      values: { to: shortest.to, from: shortest.from },
    },
    shortest.to - shortest.from,
  )
  return [
    lapCheck(zone, {
      name: 'Laps of split edge bars',
      past,
      lap: lapStep(context, input, share),
      notes: [...notes, ...bondNote(input)],
    }),
  ]
}

const bondNote = ({ isGoodBond }: AnchorageInput): readonly string[] =>
  isGoodBond ? [] : ['Poor bond is taken: these bars lie high in a deep section.']
