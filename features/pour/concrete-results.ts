import { parseNumber } from '@/components/ui/number-text'
import { strengthAtStages } from '@wedgeline/engine/geometry'
import type { ConcreteResult, Pour, StageStrength, StrengthSet } from '@wedgeline/engine'

/** How sets of specimens read and how they are typed. */

/** Begins with the words by which the engine knows a set that lay beside its pour. */
export const ON_SITE = 'on site beside the pour'

const figure = (strength: number): string => String(Math.round(strength * 100) / 100)

/** What is recorded against a stage, in a sentence. Whether to stress is for a named engineer to decide. */
export function stageWords({ stage, sets, reachedBy }: StageStrength): string {
  const asked = `${stage.name}, ${figure(stage.strength)} MPa`
  if (reachedBy) return `${asked}: reached at ${reachedBy.ageHours} h, lowest ${figure(reachedBy.lowest)}.`
  if (sets.length === 0) return `${asked}: nothing recorded against ${stage.name}. A named engineer decides.`
  return `${asked}: no set cured on site reaches it. A named engineer decides.`
}

export interface SetAgainstStage {
  readonly stageId: string
  readonly words: string
  readonly status: 'within' | 'over' | 'needs-judgement'
}

export interface SetRow {
  readonly set: StrengthSet
  /** Against the stages that it was broken for. */
  readonly against: readonly SetAgainstStage[]
}

/** Each set of the pour, youngest first, against the stages that it was broken for. */
export function setRows(pour: Pour, results: readonly ConcreteResult[]): readonly SetRow[] {
  const rows = new Map<string, { readonly set: StrengthSet; readonly against: SetAgainstStage[] }>()
  for (const { stage, sets } of strengthAtStages(pour, results)) {
    for (const set of sets) {
      const row = rows.get(set.id) ?? { set, against: [] }
      rows.set(set.id, row)
      row.against.push({ stageId: stage.id, ...setAgainst(set, stage) })
    }
  }
  return [...rows.values()].sort((a, b) => a.set.ageHours - b.set.ageHours)
}

function setAgainst(set: StrengthSet, { name, strength }: StageStrength['stage']): Omit<SetAgainstStage, 'stageId'> {
  const spare = set.lowest - strength
  const words = `${name}: ${figure(set.lowest)} of ${figure(strength)}, ${spare < 0 ? `short by ${figure(-spare)}` : `spare ${figure(spare)}`}`
  if (!set.isSiteCured) return { words: `${words}; not cured on site`, status: 'needs-judgement' }
  return { words, status: spare < 0 ? 'over' : 'within' }
}

export type TypedStrengths = { readonly strengths: readonly number[] } | { readonly problem: string }

/** Reads strengths that are typed with blanks, semicolons or new lines between them. */
export function typedStrengths(text: string): TypedStrengths {
  const parts = text.split(/[\s;]+|,\s+/).filter((part) => part !== '' && part !== 'MPa')
  if (parts.length === 0) return { problem: 'Type the strength of each specimen: 21.4 22.4 23.1.' }
  const strengths: number[] = []
  for (const part of parts) {
    const read = parseNumber(part, { unit: 'MPa', separator: null })
    if (read.kind !== 'number' || read.value <= 0 || read.value > STRENGTH_MAX)
      return {
        problem: `"${part}" is not a strength; each is a number above 0, to ${STRENGTH_MAX} MPa: 21.4 22.4 23.1.`,
      }
    strengths.push(read.value)
  }
  if (strengths.length > SPECIMENS_MAX) return { problem: `A set has up to ${SPECIMENS_MAX} specimens.` }
  return { strengths }
}

const STRENGTH_MAX = 200
const SPECIMENS_MAX = 60
