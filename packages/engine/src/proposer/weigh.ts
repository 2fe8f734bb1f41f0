/** Mass and marks of steel that is only thought of, by the same rules as the schedule. */

import type { CheckContext } from '../checks/outcome'
import type { SteelShape, SteelZone } from '../model'
import { barKey, typeLetterOf } from '../schedule/bar-key'
import type { BarShape } from '../schedule/bar-standards'
import { barCount, bentShape, cutOf } from '../schedule/bars'
import { barStandardById, BS_8666_2020 } from '../schedule/bs-8666'
import { cutLength, roundedShape, shapeProblems } from '../schedule/cut-length'

export interface Weighed {
  /** kg, with the length of each bar rounded up as it is ordered. */
  readonly mass: number
  /** Keys of its bars, sorted: one for each mark. */
  readonly keys: readonly string[]
  /** Why one of its bars cannot be bent or ordered; null where all can. */
  readonly problem: string | null
}

/** Where steel is entered, and the pour that it is scheduled with. */
export interface WeighedPlace {
  readonly zone: SteelZone
  readonly pourId: string
}

export interface Weigher {
  readonly weigh: (shapes: readonly SteelShape[], place: WeighedPlace) => Weighed
  /** Mass of bars as they are entered, kg: quick, and without the laps of bars that come in pieces. */
  readonly roughly: (shapes: readonly SteelShape[]) => number
  /** What a bar's mark stands for: equal for bars that are the same in the yard. */
  readonly keyOf: (bar: BarShape) => string
}

interface Bars {
  readonly bar: BarShape
  readonly count: number
}

/** How a layout's bar standard and grade weigh and mark bars. */
export function weigherOf(context: CheckContext): Weigher {
  const { settings } = context.index.layout.job
  const standard = barStandardById(settings.barStandard) ?? BS_8666_2020
  const letter = typeLetterOf(settings.reinforcementGrade)
  const weighOne = ({ bar, count }: Bars): Weighed => {
    const rounded = roundedShape(bar, standard)
    const problem = shapeProblems(rounded, standard, settings.stockLength).find(({ severity }) => severity === 'error')
    const each = cutLength(rounded, standard)?.massEach ?? 0
    return { mass: count * each, keys: [barKey({ letter, shape: rounded })], problem: problem?.message ?? null }
  }
  const massPerMetre = new Map(standard.sizes.map((size) => [size.diameter, size.massPerMetre]))
  const roughly = (shape: SteelShape): number => {
    const bar = bentShape(shape)
    if (shape.kind !== 'edge-bars')
      return barCount(shape) * (cutLength(roundedShape(bar, standard), standard)?.massEach ?? 0)
    return (barCount(shape) * (bar.dimensions.A ?? 0) * (massPerMetre.get(shape.diameter) ?? 0)) / 1000
  }
  return {
    roughly: (shapes) => shapes.reduce((sum, shape) => sum + roughly(shape), 0),
    keyOf: (bar) => barKey({ letter, shape: roundedShape(bar, standard) }),
    weigh: (shapes, place) => {
      const all = shapes.flatMap((shape) => barsOfSet(context, shape, place)).map(weighOne)
      return {
        mass: all.reduce((sum, { mass }) => sum + mass, 0),
        keys: [...new Set(all.flatMap(({ keys }) => keys))].sort(),
        problem: all.find(({ problem }) => problem !== null)?.problem ?? null,
      }
    },
  }
}

/** Bars along an edge, and straight ones over the stock length, come in pieces, lapped; every other set as it is. */
function barsOfSet({ index, basis }: CheckContext, shape: SteelShape, { zone, pourId }: WeighedPlace): Bars[] {
  const bar = bentShape(shape)
  const cut = cutOf({ index, basis, pourId }, shape, zone)
  if (!cut) return [{ bar, count: barCount(shape) }]
  return cut.pieces.map(({ from, to }) => ({ bar: { ...bar, dimensions: { A: to - from } }, count: 1 }))
}
