import type { JobData } from '@wedgeline/contract'
import { sourceOf } from './basis-form'

type Setting = keyof JobData['settings']

interface Words {
  readonly name: Setting
  readonly label: string
  readonly unit?: string
  readonly hint?: string
  readonly usual?: { readonly range: string; readonly source: string }
}

export interface SettingChoice {
  readonly value: string
  readonly label: string
}

export type SettingField =
  | (Words & { readonly kind: 'number' | 'text' })
  | (Words & { readonly kind: 'choice'; readonly options: readonly SettingChoice[] })
  /** Several of a few numbers. */
  | (Words & { readonly kind: 'sizes'; readonly sizes: readonly number[] })

export interface SettingGroup {
  readonly title: string
  readonly fields: readonly SettingField[]
}

const PRACTICE = 'common practice'

/** What the pours of a job have in common, by subject; usual friction and spread are those of the basis. */
export const settingGroups = (basis: string): readonly SettingGroup[] => [
  { title: 'Anchors', fields: ANCHORS },
  { title: 'Tendons', fields: tendonFields(basis) },
  { title: 'Edge wedges', fields: wedgeFields(basis) },
  { title: 'Bars', fields: BARS },
  { title: 'Fit', fields: FIT },
]

const ANCHORS: readonly SettingField[] = [
  {
    name: 'pocketToFaceMinMm',
    kind: 'number',
    label: 'Pocket to the nearest face, at least',
    unit: 'mm',
    usual: { range: '20 to 40', source: PRACTICE },
  },
  {
    name: 'pocketToPocketMinMm',
    kind: 'number',
    label: 'Pocket to pocket, at least',
    unit: 'mm',
    usual: { range: '20 to 50', source: PRACTICE },
  },
  {
    name: 'nearFrom',
    kind: 'number',
    label: 'A result is near from',
    hint: 'Share of the limit, 0.90 or more.',
    usual: { range: '0.90 to 0.95', source: PRACTICE },
  },
]

function tendonFields(basis: string): readonly SettingField[] {
  const { friction } = sourceOf(basis)
  const { source, section, tag } = friction.clause
  const from = `${source}, ${section}${tag === 'memory' ? ', from memory' : ''}`
  const mu = { unit: '1/rad', usual: { range: friction.mu, source: from } }
  const wobble = { unit: 'per m', usual: { range: friction.wobble, source: from } }
  return [
    {
      name: 'frictionFamily',
      kind: 'choice',
      label: 'Wobble stands',
      hint: 'One family’s k is mu times the other’s: take both numbers from one source.',
      options: [
        { value: 'inside', label: 'with mu: mu (angle + k x), k in rad per m' },
        { value: 'outside', label: 'beside mu: mu angle + k x, k in 1 per m' },
      ],
      usual: { range: friction.family === 'inside' ? 'with mu' : 'beside mu', source: from },
    },
    { name: 'frictionMu', kind: 'number', label: 'Friction mu, nominal', ...mu },
    { name: 'frictionWobblePerM', kind: 'number', label: 'Wobble k, nominal', ...wobble },
    {
      name: 'frictionMuLow',
      kind: 'number',
      label: 'Friction mu, lowest credible',
      hint: 'The lowest pair leaves the most force at a dead end.',
      ...mu,
    },
    { name: 'frictionWobbleLowPerM', kind: 'number', label: 'Wobble k, lowest credible', ...wobble },
    {
      name: 'frictionMuHigh',
      kind: 'number',
      label: 'Friction mu, highest credible',
      hint: 'The highest pair leaves the least precompression.',
      ...mu,
    },
    { name: 'frictionWobbleHighPerM', kind: 'number', label: 'Wobble k, highest credible', ...wobble },
    {
      name: 'deadEndForce',
      kind: 'choice',
      label: 'Force for checks at dead ends',
      options: [
        { value: 'jacking', label: 'The force while jacking' },
        { value: 'after-friction', label: 'After friction, with the lowest pair' },
      ],
      usual: { range: 'the force while jacking', source: PRACTICE },
    },
  ]
}

function wedgeFields(basis: string): readonly SettingField[] {
  const { spread } = sourceOf(basis).make({ factors: [], readings: [], fyk: 500 })
  const own = Math.round((spread.value * 1800) / Math.PI) / 10
  return [
    {
      name: 'wedgeSpreadDeg',
      kind: 'number',
      label: 'Spread of force behind an anchor, to each side',
      unit: '°',
      hint: `Left empty, the basis’s own: ${own}°.`,
      usual: { range: '30 to 45', source: PRACTICE },
    },
    {
      name: 'spreadStart',
      kind: 'choice',
      label: 'The spread begins at',
      options: [
        { value: 'bearing-face', label: 'the bearing face' },
        { value: 'device-end', label: 'the end of the anchor device' },
      ],
      usual: { range: 'the bearing face', source: PRACTICE },
    },
    ...CRACKS,
  ]
}

const CRACKS: readonly SettingField[] = [
  {
    name: 'crackWidthMm',
    kind: 'number',
    label: 'Crack width aimed at',
    unit: 'mm',
    hint: 'Counts where the basis sizes crack steel by it.',
    usual: { range: '0.2 to 0.3', source: PRACTICE },
  },
  {
    name: 'crackTensileMPa',
    kind: 'number',
    label: 'Tensile strength when it cracks',
    unit: 'MPa',
    hint: 'Left empty, the mean at 28 days.',
    usual: { range: '1.5 to 3.5', source: PRACTICE },
  },
  {
    name: 'crackAgeDays',
    kind: 'number',
    label: 'Age at which it is expected to crack',
    unit: 'days',
    usual: { range: '1 to 7 for early cracks', source: PRACTICE },
  },
  {
    name: 'crackCompressionMPa',
    kind: 'number',
    label: 'Compression counted against cracking',
    unit: 'MPa',
    hint: 'Average, by the engineer; 0 at edges and beside walls. Never taken from P/A.',
    usual: { range: '0', source: PRACTICE },
  },
  {
    name: 'exposure',
    kind: 'text',
    label: 'Exposure of the edges',
    hint: 'In words or by its class, B1 for instance.',
  },
  {
    name: 'restraint',
    kind: 'text',
    label: 'What holds the slab against shortening',
    hint: 'Core walls at both ends, for instance.',
  },
]

const BARS: readonly SettingField[] = [
  {
    name: 'fykMPa',
    kind: 'number',
    label: 'Reinforcement, yield strength',
    unit: 'MPa',
    usual: { range: '400 to 600', source: 'EN 1992-1-1, 3.2.2(3), from memory' },
  },
  {
    name: 'reinforcementGrade',
    kind: 'text',
    label: 'Reinforcement, grade',
    hint: 'As the schedule prints it.',
    usual: { range: 'B500B', source: PRACTICE },
  },
  {
    name: 'stockLengthMm',
    kind: 'number',
    label: 'Longest bar of the yard',
    unit: 'mm',
    hint: 'Longer edge bars are split, with laps placed.',
    usual: { range: '6000 or 12000', source: PRACTICE },
  },
  {
    name: 'barStandard',
    kind: 'choice',
    label: 'Standard of the schedule',
    hint: 'Shapes, lengths and smallest dimensions are those of the edition.',
    options: [
      { value: 'bs-8666-2020', label: 'BS 8666:2020' },
      { value: 'bs-8666-2005', label: 'BS 8666:2005' },
    ],
  },
  {
    name: 'barSizesMm',
    kind: 'sizes',
    label: 'Bar sizes that a proposal may use',
    unit: 'mm',
    sizes: [6, 8, 10, 12, 16, 20, 25, 32, 40],
    usual: { range: '8 to 20', source: PRACTICE },
  },
  {
    name: 'oneLengthWithinMm',
    kind: 'number',
    label: 'Wedges take one length when they differ by',
    unit: 'mm',
    hint: 'This much or less.',
    usual: { range: '100', source: PRACTICE },
  },
  {
    name: 'oneLengthMassKg',
    kind: 'number',
    label: 'One length in a wedge unless it costs more than',
    unit: 'kg',
    usual: { range: '2 to 10', source: PRACTICE },
  },
]

const FIT: readonly SettingField[] = [
  {
    name: 'clearGapMinMm',
    kind: 'number',
    label: 'Clear gap between bars, at least',
    unit: 'mm',
    hint: 'What concrete has to pass through.',
    usual: { range: '20 to 25', source: 'common practice; the aggregate of a pour may ask for more' },
  },
  {
    name: 'bentDeductionMm',
    kind: 'number',
    label: 'Off a bent bar between two faces of concrete',
    unit: 'mm',
    hint: 'So that it fits where the forms stand a little closer.',
    usual: { range: '10 to 1 m, 15 to 2 m, 20 above', source: 'BS 8110 Table 3.24, from memory' },
  },
]
