import { step, type Clause, type Step } from '../step'
import type { DimensionName, ShapeLimit, ShapeRule, ShapeValues } from './bar-standards'
import {
  atLeast,
  atMost,
  betweenBends,
  closedLinkLimits,
  crankLimits,
  endAtLeast,
  equalHooks,
  helixLimits,
  largeRadiusLimits,
  ringOutside,
  semicircle,
} from './shape-limits'

/**
 * Shapes and cut lengths of BS 8666. L is the formula's length: a true 90 degree bend at r = 2 d takes 2.07 d where the
 * formula takes 2 d, and the formula is what is ordered and paid for, so it is not improved on.
 */

const FORMULA_2005: Clause = { source: 'BS 8666:2005', section: 'Table 3', tag: 'digest' }
const FORMULA_2020: Clause = { source: 'BS 8666:2020', section: 'Table 5', tag: 'secondary' }
/** 2020 takes another hook diameter in shape 47; how is not known here, so the form of 2005 stands, marked unsure. */
const FORMULA_47_IN_2020: Clause = { source: 'BS 8666:2005', section: 'Table 3', tag: 'memory-unsure' }

/** The formula's letters: dimensions by name, d and r of the size. A dimension that is not given counts 0. */
type Letters = Readonly<Record<DimensionName | 'd' | 'r', number>>
type Letter = keyof Letters

function letters({ dimensions, size }: ShapeValues): Letters {
  const { A = 0, B = 0, C = 0, D = 0, E = 0, R = 0 } = dimensions
  return { A, B, C, D, E, R, d: size.diameter, r: size.bendRadius }
}

interface Form {
  readonly formula: string
  readonly uses: readonly Letter[]
  readonly compute: (v: Letters) => number
}

function lengthStep(form: Form, clause: Clause, values: ShapeValues): Step {
  const all = letters(values)
  const used = Object.fromEntries(form.uses.map((name) => [name, all[name]]))
  const line = { symbol: 'L', meaning: 'cut length on the centre line', formula: form.formula, unit: 'mm', clause }
  return step(line, form.formula.includes('pi') ? { pi: Math.PI, ...used } : used, () => form.compute(all))
}

type Head = Pick<ShapeRule, 'code' | 'title' | 'needs' | 'free'> & { readonly also?: readonly DimensionName[] }
type Edition = (clause: Clause) => ShapeRule

const shape =
  (head: Head, form: Form, limits: readonly ShapeLimit[] = []): Edition =>
  (clause) => ({ also: [], ...head, length: (values) => lengthStep(form, clause, values), limits })

const bar00 = shape(
  { code: '00', title: 'straight', needs: ['A'], free: null },
  { formula: 'A', uses: ['A'], compute: (v) => v.A },
)

const bar11 = shape(
  { code: '11', title: 'one bend of 90 degrees', needs: ['A', 'B'], free: 'B' },
  { formula: 'A + B - 0.5 * r - d', uses: ['A', 'B', 'r', 'd'], compute: (v) => v.A + v.B - 0.5 * v.r - v.d },
  [endAtLeast('A'), endAtLeast('B')],
)

const bar12 = shape(
  { code: '12', title: 'one bend of 90 degrees with radius R', needs: ['A', 'B', 'R'], free: 'B' },
  {
    formula: 'A + B - 0.43 * R - 1.2 * d',
    uses: ['A', 'B', 'R', 'd'],
    compute: (v) => v.A + v.B - 0.43 * v.R - 1.2 * v.d,
  },
  [endAtLeast('A'), endAtLeast('B'), ...largeRadiusLimits],
)

const bar13 = shape(
  { code: '13', title: 'hairpin with a semicircle', needs: ['A', 'B', 'C'], free: 'C' },
  {
    formula: 'A + 0.57 * B + C - 1.6 * d',
    uses: ['A', 'B', 'C', 'd'],
    compute: (v) => v.A + 0.57 * v.B + v.C - 1.6 * v.d,
  },
  [...semicircle('B', 'A'), ...semicircle('B', 'C').slice(1)],
)

const bar15 = shape(
  { code: '15', title: 'one bend other than 90 degrees', needs: ['A', 'C'], also: ['B', 'D'], free: 'C' },
  { formula: 'A + C', uses: ['A', 'C'], compute: (v) => v.A + v.C },
  [endAtLeast('A'), endAtLeast('C')],
)

const bar21 = shape(
  { code: '21', title: 'hairpin', needs: ['A', 'B', 'C'], free: 'C' },
  {
    formula: 'A + B + C - r - 2 * d',
    uses: ['A', 'B', 'C', 'r', 'd'],
    compute: (v) => v.A + v.B + v.C - v.r - 2 * v.d,
  },
  [endAtLeast('A'), endAtLeast('C'), betweenBends('B')],
)

const head22: Head = { code: '22', title: 'bend and semicircle', needs: ['A', 'B', 'C', 'D'], free: 'D' }
const limits22 = [endAtLeast('A'), ...semicircle('C', 'D')]
const bar22In2005 = shape(
  head22,
  {
    formula: 'A + B + C + D - 1.5 * r - 3 * d',
    uses: ['A', 'B', 'C', 'D', 'r', 'd'],
    compute: (v) => v.A + v.B + v.C + v.D - 1.5 * v.r - 3 * v.d,
  },
  limits22,
)
const bar22In2020 = shape(
  head22,
  {
    formula: 'A + B + 0.57 * C + D - 0.5 * r - 2.6 * d',
    uses: ['A', 'B', 'C', 'D', 'r', 'd'],
    compute: (v) => v.A + v.B + 0.57 * v.C + v.D - 0.5 * v.r - 2.6 * v.d,
  },
  limits22,
)

const bar25 = shape(
  { code: '25', title: 'two sloping ends', needs: ['A', 'B', 'E'], also: ['C', 'D'], free: 'E' },
  { formula: 'A + B + E', uses: ['A', 'B', 'E'], compute: (v) => v.A + v.B + v.E },
  [endAtLeast('A'), endAtLeast('B')],
)

const bar26 = shape(
  { code: '26', title: 'crank', needs: ['A', 'B', 'C'], also: ['D'], free: 'C' },
  { formula: 'A + B + C', uses: ['A', 'B', 'C'], compute: (v) => v.A + v.B + v.C },
  [endAtLeast('A'), endAtLeast('C'), ...crankLimits],
)

const bar31 = shape(
  { code: '31', title: 'three bends one way', needs: ['A', 'B', 'C', 'D'], free: 'D' },
  {
    formula: 'A + B + C + D - 1.5 * r - 3 * d',
    uses: ['A', 'B', 'C', 'D', 'r', 'd'],
    compute: (v) => v.A + v.B + v.C + v.D - 1.5 * v.r - 3 * v.d,
  },
  [endAtLeast('A'), endAtLeast('D'), betweenBends('B'), betweenBends('C')],
)

const bar33 = shape(
  { code: '33', title: 'closed loop with round ends', needs: ['A', 'B', 'C'], free: 'C' },
  {
    formula: '2 * A + 1.7 * B + 2 * C - 4 * d',
    uses: ['A', 'B', 'C', 'd'],
    compute: (v) => 2 * v.A + 1.7 * v.B + 2 * v.C - 4 * v.d,
  },
  [atLeast('A', (v) => 12 * v.size.diameter + 30, 'the loop must be 12 d + 30 long'), ...semicircle('B', 'C')],
)

/** Hat and crank of four bends share one length. */
const fourBends = (code: string, title: string): Edition =>
  shape(
    { code, title, needs: ['A', 'B', 'C', 'D', 'E'], free: 'E' },
    {
      formula: 'A + B + C + D + E - 2 * r - 4 * d',
      uses: ['A', 'B', 'C', 'D', 'E', 'r', 'd'],
      compute: (v) => v.A + v.B + v.C + v.D + v.E - 2 * v.r - 4 * v.d,
    },
    [endAtLeast('A'), endAtLeast('E'), ...(['B', 'C', 'D'] as const).map(betweenBends)],
  )
const bar41 = fourBends('41', 'hat or chair')
const bar44 = fourBends('44', 'hat with the ends turned')

/** A link's hooks: lengths C = D where they are given, the formula for the shortest hooks where they are not. */
interface LinkForms {
  readonly given: Form
  readonly shortest: Form
}
const link =
  (head: Head, forms: LinkForms, limits: readonly ShapeLimit[]): Edition =>
  (clause) => ({
    also: ['C', 'D'],
    ...head,
    length: (values) => lengthStep(values.dimensions.C === undefined ? forms.shortest : forms.given, clause, values),
    limits,
  })

const bar47 = link(
  { code: '47', title: 'open link', needs: ['A', 'B'], free: null },
  {
    given: {
      formula: '2 * A + B + 2 * C + 1.5 * r - 3 * d',
      uses: ['A', 'B', 'C', 'r', 'd'],
      compute: (v) => 2 * v.A + v.B + 2 * v.C + 1.5 * v.r - 3 * v.d,
    },
    shortest: {
      formula: '2 * A + B + max(21 * d, 240)',
      uses: ['A', 'B', 'd'],
      compute: (v) => 2 * v.A + v.B + Math.max(21 * v.d, 240),
    },
  },
  [endAtLeast('C'), atMost('C', (v) => v.dimensions.A ?? 0, 'a hook may not be longer than the side A'), ...equalHooks],
)

const bar51 = link(
  { code: '51', title: 'closed link', needs: ['A', 'B'], free: null },
  {
    given: {
      formula: '2 * (A + B + C) - 2.5 * r - 5 * d',
      uses: ['A', 'B', 'C', 'r', 'd'],
      compute: (v) => 2 * (v.A + v.B + v.C) - 2.5 * v.r - 5 * v.d,
    },
    shortest: {
      formula: '2 * A + 2 * B + max(16 * d, 160)',
      uses: ['A', 'B', 'd'],
      compute: (v) => 2 * v.A + 2 * v.B + Math.max(16 * v.d, 160),
    },
  },
  closedLinkLimits,
)

const bar63 = link(
  { code: '63', title: 'double link', needs: ['A', 'B'], free: null },
  {
    given: {
      formula: '2 * A + 3 * B + 2 * C - 3 * r - 6 * d',
      uses: ['A', 'B', 'C', 'r', 'd'],
      compute: (v) => 2 * v.A + 3 * v.B + 2 * v.C - 3 * v.r - 6 * v.d,
    },
    shortest: {
      formula: '2 * A + 3 * B + max(14 * d, 150)',
      uses: ['A', 'B', 'd'],
      compute: (v) => 2 * v.A + 3 * v.B + Math.max(14 * v.d, 150),
    },
  },
  closedLinkLimits,
)

const head75: Head = { code: '75', title: 'ring', needs: ['A', 'B'], free: 'B' }
const bar75In2005 = shape(
  head75,
  { formula: 'pi * (A - d) + B', uses: ['A', 'B', 'd'], compute: (v) => Math.PI * (v.A - v.d) + v.B },
  [ringOutside],
)
const bar75In2020 = shape(
  head75,
  { formula: 'pi * (A - d) + B + 25', uses: ['A', 'B', 'd'], compute: (v) => Math.PI * (v.A - v.d) + v.B + 25 },
  [ringOutside],
)

const FLAT_HELIX: Form = {
  formula: 'C * pi * (A - d)',
  uses: ['A', 'C', 'd'],
  compute: (v) => v.C * Math.PI * (v.A - v.d),
}
/** Above a pitch of a fifth of the diameter the slope counts; nearly every helix behind a slab anchor is so steep. */
const STEEP_HELIX: Form = {
  formula: 'C * sqrt((pi * (A - d)) * (pi * (A - d)) + B * B)',
  uses: ['A', 'B', 'C', 'd'],
  compute: (v) => v.C * Math.sqrt((Math.PI * (v.A - v.d)) ** 2 + v.B ** 2),
}
const bar77: Edition = (clause) => ({
  code: '77',
  title: 'helix',
  needs: ['A', 'B', 'C'],
  also: [],
  free: null,
  length: (values) => {
    const { A, B } = letters(values)
    return lengthStep(B > A / 5 ? STEEP_HELIX : FLAT_HELIX, clause, values)
  },
  limits: helixLimits,
})

const bar99: Edition = () => ({
  code: '99',
  title: 'drawn shape',
  needs: [],
  also: ['A', 'B', 'C', 'D', 'E', 'R'],
  free: null,
  length: null,
  limits: [],
})

const SAME_IN_BOTH = [
  bar00,
  bar11,
  bar12,
  bar13,
  bar15,
  bar21,
  bar25,
  bar26,
  bar31,
  bar33,
  bar41,
  bar44,
  bar51,
  bar63,
  bar77,
  bar99,
]
const inOrder = (rules: readonly ShapeRule[]): readonly ShapeRule[] =>
  [...rules].sort((a, b) => (a.code < b.code ? -1 : 1))

export const shapes2005 = inOrder([...SAME_IN_BOTH, bar22In2005, bar47, bar75In2005].map((rule) => rule(FORMULA_2005)))
export const shapes2020 = inOrder([
  ...[...SAME_IN_BOTH, bar22In2020, bar75In2020].map((rule) => rule(FORMULA_2020)),
  bar47(FORMULA_47_IN_2020),
])
