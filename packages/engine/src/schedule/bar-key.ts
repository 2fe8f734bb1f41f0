import { DIMENSION_NAMES, type BarShape, type DimensionName } from './bar-standards'

/**
 * What a mark stands for, as text: type and size, shape, dimensions. Two bars with one key are the same bar in the
 * yard. Example: `B12 77 A230 B55 C6 F2`, where F counts flat turns; a drawn shape ends in `L` and its length.
 */

/** Letter before the size: 500 of any ductility class, of one class only, or something else that the notes describe. */
export type TypeLetter = 'H' | 'A' | 'B' | 'C' | 'X'

/** BS 8666 type letter of a grade, from memory: B500B is B, grade 500 without a class H, any other X. */
export function typeLetterOf(grade: string): TypeLetter {
  const withClass = /^B?500\s*([ABC])$/i.exec(grade.trim())?.[1]?.toUpperCase()
  if (withClass === 'A' || withClass === 'B' || withClass === 'C') return withClass
  return /^(H|B?500)$/i.test(grade.trim()) ? 'H' : 'X'
}

export interface TypedBar {
  readonly letter: TypeLetter
  readonly shape: BarShape
}

/** The key of a bar: equal for bars that are the same in the yard, and readable by `barOfKey`. */
export function barKey({ letter, shape }: TypedBar): string {
  const words = [`${letter}${shape.diameter}`, shape.code]
  for (const name of DIMENSION_NAMES) {
    const value = shape.dimensions[name]
    if (value !== undefined) words.push(`${name}${value}`)
  }
  if (shape.flatTurns > 0) words.push(`F${shape.flatTurns}`)
  if (shape.typedLength !== null) words.push(`L${shape.typedLength}`)
  return words.join(' ')
}

const isDimension = (name: string): name is DimensionName => DIMENSION_NAMES.some((each) => each === name)
const isLetter = (name: string): name is TypeLetter => ['H', 'A', 'B', 'C', 'X'].includes(name)

/** @returns the bar that a key was written from; null where the text is no key. */
export function barOfKey(key: string): TypedBar | null {
  const [size = '', code = '', ...rest] = key.split(' ')
  const letter = size.slice(0, 1)
  const diameter = Number(size.slice(1))
  if (!isLetter(letter) || !(diameter > 0) || !/^\d\d$/.test(code)) return null
  const dimensions: Partial<Record<DimensionName, number>> = {}
  let flatTurns = 0
  let typedLength: number | null = null
  for (const word of rest) {
    const name = word.slice(0, 1)
    const value = Number(word.slice(1))
    if (word.length < 2 || !Number.isFinite(value)) return null
    if (name === 'F') flatTurns = value
    else if (name === 'L') typedLength = value
    else if (isDimension(name)) dimensions[name] = value
    else return null
  }
  return { letter, shape: { code, diameter, dimensions, typedLength, flatTurns } }
}
