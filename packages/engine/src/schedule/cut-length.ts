import { step, type Step } from '../step'
import {
  DIMENSION_NAMES,
  shapeRuleOf,
  sizeOf,
  type BarShape,
  type BarStandard,
  type DimensionName,
  type Dimensions,
  type ShapeLimit,
  type ShapeProblem,
  type ShapeRule,
  type ShapeValues,
} from './bar-standards'
import { overallSides } from './overall-sides'

/** A length of a bar as scheduled: `length` is rounded up, `calculated` is not; mm, and kg for one bar. */
export interface CutLength {
  readonly calculated: number
  readonly length: number
  readonly massEach: number
  readonly steps: readonly Step[]
}

/** Sums of decimals may end a hair above a whole step; a millionth of a step is no reason for 25 mm more. */
const HAIR = 1e-6
const roundedUp = (value: number, to: number): number => Math.ceil(value / to - HAIR) * to
const roundedNearest = (value: number, to: number): number => Math.round(value / to) * to

const isTurns = (code: string, name: DimensionName): boolean => code === '77' && name === 'C'

/** @returns the bar with each dimension (not a number of turns) at the nearest step that the standard schedules. */
export function roundedShape(bar: BarShape, standard: BarStandard): BarShape {
  const dimensions: Partial<Record<DimensionName, number>> = {}
  for (const name of DIMENSION_NAMES) {
    const value = bar.dimensions[name]
    if (value === undefined) continue
    dimensions[name] = isTurns(bar.code, name) ? value : roundedNearest(value, standard.dimensionStep)
  }
  return { ...bar, dimensions }
}

/**
 * Cut length by the shape's formula, rounded up to the next step of the standard, and the mass of one bar.
 *
 * @returns null where shape or size is not known or a dimension is missing; `shapeProblems` says which.
 */
export function cutLength(bar: BarShape, standard: BarStandard): CutLength | null {
  const rule = shapeRuleOf(standard, bar.code)
  const size = sizeOf(standard, bar.diameter)
  if (!rule || !size || givenProblems(bar, rule).some((problem) => problem.severity === 'error')) return null
  const first = rule.length?.({ dimensions: bar.dimensions, size }) ?? typedLengthStep(bar, standard)
  const length = roundedUp(first.value, standard.lengthStep)
  const rounded = step(
    {
      symbol: 'L25',
      meaning: `length of each bar, up to the next ${standard.lengthStep} mm`,
      formula: 'n * s',
      unit: 'mm',
      clause: standard.roundingClause,
    },
    { n: length / standard.lengthStep, s: standard.lengthStep },
    ({ n, s }) => n * s,
  )
  return { calculated: first.value, length, massEach: (length / 1000) * size.massPerMetre, steps: [first, rounded] }
}

function typedLengthStep(bar: BarShape, standard: BarStandard): Step {
  const clause = { source: standard.name, section: 'shape 99, length as drawn', tag: 'practice' } as const
  const line = { symbol: 'L', meaning: 'cut length typed beside the drawn shape', formula: 'L0', unit: 'mm', clause }
  return step(line, { L0: bar.typedLength ?? 0 }, ({ L0 }) => L0)
}

/**
 * Everything about a bar that cannot be bent or ordered as it is, each with what would be right.
 *
 * @param stockLength longest bar that is delivered, mm; a coil-fed helix or ring is not held to it.
 */
export function shapeProblems(bar: BarShape, standard: BarStandard, stockLength: number): readonly ShapeProblem[] {
  const rule = shapeRuleOf(standard, bar.code)
  if (!rule)
    return [error('code', `Shape ${bar.code} is not known here. ${choice(standard.shapes.map((s) => s.code))}`)]
  const size = sizeOf(standard, bar.diameter)
  if (!size) {
    const sizes = standard.sizes.map((each) => String(each.diameter))
    return [error('diameter', `${bar.diameter} mm is no bar size of ${standard.name}. ${choice(sizes)}`)]
  }
  const given = givenProblems(bar, rule)
  if (given.length > 0) return given
  const values = { dimensions: bar.dimensions, size }
  return [
    ...rule.limits.flatMap((limit) => limitProblem(limit, values)),
    ...lengthProblems(bar, standard, stockLength),
    ...overallProblems(bar),
    ...angleProblems(bar.code, bar.dimensions),
  ]
}

const error = (field: string, message: string): ShapeProblem => ({ field, severity: 'error', message })
const choice = (names: readonly string[]): string => `Use one of ${names.join(', ')}.`
const shown = (value: number): string => String(Math.round(value * 10) / 10)

function givenProblems(bar: BarShape, rule: ShapeRule): readonly ShapeProblem[] {
  const problems: ShapeProblem[] = []
  for (const name of DIMENSION_NAMES) {
    const value = bar.dimensions[name]
    const isNeeded = rule.needs.includes(name)
    if (value === undefined) {
      if (isNeeded) problems.push(error(name, `${name} is missing. Shape ${rule.code} needs ${rule.needs.join(', ')}.`))
    } else if (!Number.isFinite(value) || value <= 0) {
      problems.push(error(name, `${name} must be a length of more than 0 mm.`))
    } else if (!isNeeded && !rule.also.includes(name)) {
      problems.push(error(name, `Shape ${rule.code} has no ${name}. Leave it empty.`))
    }
  }
  const typed = bar.typedLength
  if (rule.length === null && (typed === null || !Number.isFinite(typed) || typed <= 0)) {
    problems.push(error('length', 'A drawn shape (99) needs its cut length, typed, of more than 0 mm.'))
  }
  return problems
}

function limitProblem(limit: ShapeLimit, values: ShapeValues): readonly ShapeProblem[] {
  const value = values.dimensions[limit.field]
  if (value === undefined) return []
  const bound = limit.bound(values)
  const isWithin = limit.side === 'at-least' ? value >= bound : value <= bound
  if (isWithin) return []
  const compared = limit.side === 'at-least' ? 'less' : 'more'
  const side = limit.side === 'at-least' ? 'or more' : 'or less'
  const bar = `a ${values.size.diameter} mm bar`
  return [
    error(
      limit.field,
      `${limit.field} ${shown(value)} is ${compared} than ${shown(bound)}: ${limit.because}. For ${bar} make ${limit.field} ${shown(bound)} ${side}.${limit.otherwise}`,
    ),
  ]
}

/** Helices and rings are bent from coil, where the stock length of straight bars does not bind. */
const COIL_FED = ['75', '77']

function lengthProblems(bar: BarShape, standard: BarStandard, stockLength: number): readonly ShapeProblem[] {
  const cut = cutLength(bar, standard)
  if (!cut || COIL_FED.includes(bar.code) || cut.length <= stockLength) return []
  const field = bar.code === '00' ? 'A' : 'length'
  return [error(field, `${cut.length} is longer than the ${stockLength} stock length; split it into lapped bars.`)]
}

/** A bent bar goes by road while the shorter side of the rectangle round it is no more than this, mm (from memory). */
const SHORTER_SIDE_MAX = 2750

function overallProblems({ code, dimensions }: BarShape): readonly ShapeProblem[] {
  const sides = overallSides(code, dimensions)
  if (!sides) return []
  const [shorter] = [...sides].sort((a, b) => a.value - b.value)
  if (!shorter || shorter.value <= SHORTER_SIDE_MAX) return []
  const message = `The shorter side of the bent bar, ${shorter.field} ${shown(shorter.value)}, is more than ${SHORTER_SIDE_MAX} (from memory): it may not travel by road. Make ${shorter.field} ${SHORTER_SIDE_MAX} or less, lap two bars, or agree it with the yard.`
  return [{ field: shorter.field, severity: 'warning', message }]
}

/** Up to here the formula of a sloping bar is close enough. */
const SLOPE_MAX_SIN = Math.SQRT1_2

function angleProblems(code: string, { B, D }: Dimensions): readonly ShapeProblem[] {
  if (code !== '26' || B === undefined || D === undefined || D <= B * SLOPE_MAX_SIN) return []
  const message = `The crank slopes at more than 45 degrees (D ${D} over B ${B}): its length is approximate. Draw it as shape 99 with the true length.`
  return [{ field: 'D', severity: 'warning', message }]
}
