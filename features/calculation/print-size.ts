import type { Check } from '@wedgeline/engine'
import { clauseText } from '../checks/words'
import { formulaParts, putIn, figureText } from './formula-text'
import { isPlain, meaningOf, nameOf } from './check-words'
import { newNotes, shownSteps, type ShownStep } from './shown-steps'

/** How large a zone's sheet is printed: by name of its zoom in public/theme.css, with what one side of A4 then holds. */
const SIZES = [
  { density: 'zone-large', lines: 96, signs: 74 },
  { density: 'zone-usual', lines: 138, signs: 86 },
  { density: 'zone-small', lines: Infinity, signs: 104 },
] as const

export type PrintSize = (typeof SIZES)[number]

export interface PrintedCheck {
  readonly check: Check
  readonly steps: readonly ShownStep[]
  readonly notes: readonly string[]
}

/** A line that stands above is left out where the check is within: nobody repeats it twice. */
export function printedChecks(checks: readonly Check[]): readonly PrintedCheck[] {
  const steps = shownSteps(checks)
  const notes = newNotes(checks)
  return checks.map((check, at) => ({
    check,
    steps: (steps[at] ?? []).filter(({ isAbove }) => !isAbove || !isPlain(check)),
    notes: notes[at] ?? [],
  }))
}

/** The largest type with which a zone keeps to one side; the smallest is 6.5 pt. */
export function printSize(checks: readonly PrintedCheck[], headLines: number): PrintSize {
  const [large, usual, small] = SIZES
  const fits = ({ lines, signs }: PrintSize) => headLines + linesOf(checks, signs) <= lines
  return fits(large) ? large : fits(usual) ? usual : small
}

const linesOf = (checks: readonly PrintedCheck[], signs: number): number =>
  checks.reduce((sum, printed) => sum + linesOfCheck(printed, signs), 0)

function linesOfCheck({ check, steps, notes }: PrintedCheck, signs: number): number {
  const over = (length: number) => Math.ceil(length / signs)
  const head = over(nameOf(check).length + clauseText(check.clause).length + 50)
  const sums = steps.map(({ step, isAbove }) => {
    const formula = formulaParts(step.formula).reduce(
      (sum, { text, below }) => sum + text.length + (below?.length ?? 0),
      0,
    )
    const numbers = putIn(step.formula, step.values).length + figureText(step.value).length
    return over(step.symbol.length + formula + numbers + (isAbove ? 8 : meaningOf(step, check).length) + 12)
  })
  return [...sums, ...notes.map(({ length }) => over(length))].reduce((sum, lines) => sum + lines, head + 0.4)
}
