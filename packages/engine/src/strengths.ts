/** The sets of specimens of a pour, and the stages of stressing that they were broken for. */

import type { LayoutIndex } from './layout-index'
import type { ConcreteResult, Pour, Stage } from './model'

/** A set whose curing begins with these words lay beside its pour; any other counts for nothing until somebody judges it. */
const ON_SITE = /^\s*on site\b/i

export interface StrengthSet {
  readonly id: string
  readonly ageHours: number
  /** Lowest specimen and mean of the set, MPa. */
  readonly lowest: number
  readonly mean: number
  readonly isSiteCured: boolean
}

export interface StageStrength {
  readonly stage: Stage
  /** Sets that were broken for this stage, youngest first. */
  readonly sets: readonly StrengthSet[]
  /** The first of them that lay beside the pour and is strong enough; null where none is recorded. */
  readonly reachedBy: StrengthSet | null
}

/**
 * The sets of a pour by the stage that each was broken for: the first stage that no younger set reached, and those
 * after it that the set reaches as well. A set of a pour that has reached every stage belongs to the last one.
 */
export function strengthAtStages(pour: Pour, results: readonly ConcreteResult[]): StageStrength[] {
  const { stages } = pour
  const setsOf = new Map<Stage, StrengthSet[]>(stages.map((stage) => [stage, []]))
  let open = 0
  for (const set of setsOfPour(pour.id, results)) {
    const first = Math.min(open, stages.length - 1)
    const short = stages.findIndex((stage, at) => at >= first && set.lowest < stage.strength)
    const after = short < 0 ? stages.length : short
    for (const stage of stages.slice(first, Math.max(after, first + 1))) setsOf.get(stage)?.push(set)
    if (set.isSiteCured) open = Math.max(open, after)
  }
  return stages.map((stage) => {
    const sets = setsOf.get(stage) ?? []
    return { stage, sets, reachedBy: sets.find((set) => set.isSiteCured && set.lowest >= stage.strength) ?? null }
  })
}

export const hasStrengths = ({ layout }: LayoutIndex, pourId: string): boolean =>
  layout.concreteResults.some((result) => result.pourId === pourId)

function setsOfPour(pourId: string, results: readonly ConcreteResult[]): StrengthSet[] {
  return results
    .filter((result) => result.pourId === pourId && result.specimens.length > 0)
    .map(({ id, ageHours, cured, specimens }) => ({
      id,
      ageHours,
      lowest: Math.min(...specimens),
      mean: specimens.reduce((sum, strength) => sum + strength, 0) / specimens.length,
      isSiteCured: ON_SITE.test(cured),
    }))
    .sort((a, b) => a.ageHours - b.ageHours || (a.id < b.id ? -1 : 1))
}
