import type { DimensionName, Dimensions } from './bar-standards'

/** One side of the rectangle round a bent bar, with the dimension that sets it; mm. */
export interface OverallSide {
  readonly field: DimensionName
  readonly value: number
}

/** Each side is the longest of its dimensions; a sloping part is taken with its whole length. */
const SIDES: Readonly<Record<string, readonly [readonly DimensionName[], readonly DimensionName[]]>> = {
  '11': [['A'], ['B']],
  '12': [['A'], ['B']],
  '13': [['A', 'C'], ['B']],
  '15': [['A'], ['C']],
  '21': [['A', 'C'], ['B']],
  '22': [
    ['A', 'C'],
    ['B', 'D'],
  ],
  '25': [['A', 'B'], ['E']],
  '26': [['B'], ['A', 'C']],
  '31': [
    ['A', 'C'],
    ['B', 'D'],
  ],
  '33': [['A'], ['B']],
  '41': [
    ['B', 'D'],
    ['A', 'C', 'E'],
  ],
  '44': [
    ['B', 'D'],
    ['A', 'C', 'E'],
  ],
  '47': [['A'], ['B']],
  '51': [['A'], ['B']],
  '63': [['A'], ['B']],
}

/** @returns the two sides round a bent bar; null for straight bars, rings, helices and drawn shapes. */
export function overallSides(code: string, dimensions: Dimensions): readonly [OverallSide, OverallSide] | null {
  const sides = SIDES[code]
  if (!sides) return null
  const longest = (names: readonly DimensionName[]): OverallSide =>
    names.reduce<OverallSide>(
      (so, name) => {
        const value = dimensions[name] ?? 0
        return value > so.value ? { field: name, value } : so
      },
      { field: names[0] ?? 'A', value: 0 },
    )
  return [longest(sides[0]), longest(sides[1])]
}
