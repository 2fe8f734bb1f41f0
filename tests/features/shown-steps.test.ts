import type { Check, Compared, Step } from '@wedgeline/engine'
import { expect, test } from 'vitest'
import { newNotes, shownSteps } from '@/features/calculation/shown-steps'
import { printedChecks, printSize } from '@/features/calculation/print-size'

const clause = { source: 'Test', section: '1', tag: 'derived' } as const
const stepOf = (symbol: string, value: number): Step => ({
  symbol,
  meaning: `meaning of ${symbol}`,
  formula: 'a',
  values: { a: value },
  value,
  unit: 'N',
  clause,
})
const checkOf = (steps: readonly Step[], more: Partial<Compared> = {}): Check => ({
  kind: 'compared',
  zoneId: 'anchor:a',
  family: 'bursting-plan',
  name: 'Bursting in plan',
  plane: 'plan',
  stage: null,
  limitKind: 'C',
  clause,
  notes: [],
  status: 'over',
  statusOnceAccepted: 'over',
  demand: 2,
  limit: 1,
  unit: 'mm2',
  compares: 'ratio',
  utilisation: 2,
  spare: null,
  steps,
  readingIds: [],
  mend: null,
  ...more,
})

test('a step that two checks hold in common is in full where it stands first, and above after that', () => {
  // One and the same object in both checks: the first one once said that it stands above itself.
  const force = stepOf('P', 588_800)
  const [first, second] = shownSteps([checkOf([force]), checkOf([force, stepOf('T', 1)])])
  expect(first?.map(({ isAbove }) => isAbove)).toEqual([false])
  expect(second?.map(({ isAbove }) => isAbove)).toEqual([true, false])
})

test('a step of another value is another step', () => {
  const [, second] = shownSteps([checkOf([stepOf('P', 1)]), checkOf([stepOf('P', 2)])])
  expect(second?.map(({ isAbove }) => isAbove)).toEqual([false])
})

test('in print a note stands once', () => {
  const note = 'The tendon stands 2 degrees out of square.'
  expect(newNotes([checkOf([], { notes: [note] }), checkOf([], { notes: [note, 'Another.'] })])).toEqual([
    [note],
    ['Another.'],
  ])
})

test('in print a check that is within leaves out the steps above; one that is not says so of them', () => {
  const force = stepOf('P', 588_800)
  const [, over, within] = printedChecks([
    checkOf([force]),
    checkOf([force]),
    checkOf([force, stepOf('T', 1)], { status: 'within' }),
  ])
  expect(over?.steps.map(({ isAbove }) => isAbove)).toEqual([true])
  expect(within?.steps.map(({ step }) => step.symbol)).toEqual(['T'])
})

test('the more there is to print, the smaller the type', () => {
  const printed = (count: number) =>
    printedChecks([checkOf(Array.from({ length: count }, (_, i) => stepOf(`s${i}`, i)))])
  expect([5, 105, 500].map((count) => printSize(printed(count), 8).density)).toEqual([
    'zone-large',
    'zone-usual',
    'zone-small',
  ])
})
