import type { Check, Step } from '@wedgeline/engine'

export interface ShownStep {
  readonly step: Step
  /** It stands word for word further up the sheet: its meaning need not be read twice. */
  readonly isAbove: boolean
}

/** The steps of each check in the order in which they are shown. Checks may hold the very same step. */
export function shownSteps(checks: readonly Check[]): readonly (readonly ShownStep[])[] {
  const seen = new Set<string>()
  return checks.map((check) => {
    if (check.kind !== 'compared') return []
    return check.steps.map((step): ShownStep => {
      const line = `${step.symbol}|${step.meaning}|${step.formula}|${step.value}`
      const isAbove = seen.has(line)
      seen.add(line)
      return { step, isAbove }
    })
  })
}

/** Notes that no check further up has, for print: the same sentence need not stand there twice. */
export function newNotes(checks: readonly Check[]): readonly (readonly string[])[] {
  const seen = new Set<string>()
  return checks.map(({ notes }) =>
    notes.filter((note) => {
      if (seen.has(note)) return false
      seen.add(note)
      return true
    }),
  )
}
