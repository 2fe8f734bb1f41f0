/** Mass and marks of steel that is only thought of, by the same rules as the schedule. */

import type { CheckContext } from '../checks/outcome'
import type { SteelShape, SteelZone } from '../model'
import { barKey, typeLetterOf } from '../schedule/bar-key'
import type { BarShape } from '../schedule/bar-standards'
import { barCount, bentShape } from '../schedule/bars'
import { barStandardById, BS_8666_2020 } from '../schedule/bs-8666'
import { cutLength, roundedShape, shapeProblems } from '../schedule/cut-length'
import { edgeBarPieces } from '../steel/bar-pieces'

export interface Weighed {
  /** kg, with the length of each bar rounded up as it is ordered. */
  readonly mass: number
  /** Keys of its bars, sorted: one for each mark. */
  readonly keys: readonly string[]
  /** Why one of its bars cannot be bent or ordered; null where all can. */
  readonly problem: string | null
}

export interface Weigher {
  readonly weigh: (shapes: readonly SteelShape[], zone: SteelZone) => Weighed
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
  return {
    keyOf: (bar) => barKey({ letter, shape: roundedShape(bar, standard) }),
    weigh: (shapes, zone) => {
      const all = shapes.flatMap((shape) => barsOfSet(context, shape, zone)).map(weighOne)
      return {
        mass: all.reduce((sum, { mass }) => sum + mass, 0),
        keys: [...new Set(all.flatMap(({ keys }) => keys))].sort(),
        problem: all.find(({ problem }) => problem !== null)?.problem ?? null,
      }
    },
  }
}

/** Bars along an edge come in pieces, lapped; every other set in bars as they are. */
function barsOfSet({ index, basis }: CheckContext, shape: SteelShape, zone: SteelZone): Bars[] {
  const bar = bentShape(shape)
  if (shape.kind !== 'edge-bars' || zone.kind !== 'edge') return [{ bar, count: barCount(shape) }]
  return edgeBarPieces(index, basis, { shape, edgeId: zone.edgeId }).pieces.map(({ from, to }) => ({
    bar: { ...bar, dimensions: { A: to - from } },
    count: 1,
  }))
}
