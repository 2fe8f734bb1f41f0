import type { ProposedZone, Steel, SteelShape, WorstCheck } from '@wedgeline/engine'
import { STEEL_NAMES } from '@wedgeline/engine/result'
import { unitText } from '../checks/words'
import { steelWords } from '../edge/steel-words'

export const kg = (mass: number): string => `${mass.toFixed(1)} kg`

/** One set of bars as a list shows it: transverse bars 8 ⌀10 × 1400. */
export const setWords = (shape: SteelShape): string => `${STEEL_NAMES[shape.kind]} ${steelWords(shape)}`

/** Old steel with what keeps it where it is: a lock, or that a person entered it. */
export function oldWords({ shape, source, isLocked }: Steel): string {
  const kept = isLocked ? ', locked' : source === 'proposed' ? '' : ', by hand'
  return `${setWords(shape)}${kept}`
}

export const worstLine = (worst: WorstCheck | null): string =>
  worst ? `${worst.name}, ${unitText(worst.by)}` : 'no check'

/** What is said of a zone with all its steel: what stays, goes and comes, and the masses. */
export function changeWords({ old, removes, adds, massOld, massNew }: ProposedZone) {
  const goes = old.filter(({ id }) => removes.includes(id))
  const stays = old.filter(({ id }) => !removes.includes(id))
  const listed = (words: readonly string[]) => (words.length > 0 ? words.join('; ') : 'no bars')
  return {
    old: listed([...stays, ...goes].map(oldWords)),
    new: listed([...stays.map(oldWords), ...adds.map(setWords)]),
    mass: `${kg(massOld)} before, ${kg(massNew)} after`,
  }
}
