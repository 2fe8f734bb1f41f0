/** Mass and marks of steel that is only thought of, by the same rules as the schedule. */

import type { Layout, SteelShape } from '../model'
import type { BarShape } from '../schedule/bar-standards'
import { barKey, typeLetterOf } from '../schedule/bar-key'
import { barCount, bentShape } from '../schedule/bars'
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

export interface Weigher {
  readonly weigh: (shapes: readonly SteelShape[]) => Weighed
  /** What a bar's mark stands for: equal for bars that are the same in the yard. */
  readonly keyOf: (bar: BarShape) => string
}

/** How a layout's bar standard and grade weigh and mark bars. */
export function weigherOf({ job }: Layout): Weigher {
  const standard = barStandardById(job.settings.barStandard) ?? BS_8666_2020
  const letter = typeLetterOf(job.settings.reinforcementGrade)
  const weighOne = (shape: SteelShape): Weighed => {
    const bar = roundedShape(bentShape(shape), standard)
    const problem = shapeProblems(bar, standard, job.settings.stockLength).find(({ severity }) => severity === 'error')
    const each = cutLength(bar, standard)?.massEach ?? 0
    return { mass: barCount(shape) * each, keys: [barKey({ letter, shape: bar })], problem: problem?.message ?? null }
  }
  return {
    keyOf: (bar) => barKey({ letter, shape: roundedShape(bar, standard) }),
    weigh: (shapes) => {
      const all = shapes.map(weighOne)
      return {
        mass: all.reduce((sum, { mass }) => sum + mass, 0),
        keys: [...new Set(all.flatMap(({ keys }) => keys))].sort(),
        problem: all.find(({ problem }) => problem !== null)?.problem ?? null,
      }
    },
  }
}
