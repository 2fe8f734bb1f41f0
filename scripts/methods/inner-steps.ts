import { basisOf, type Basis, type Layout, type Step } from '@wedgeline/engine'
import type { SeenStep } from './collect'

/**
 * Formulas inside the bases of which a calculation prints the result alone: anchorage and laps, hooks, windows, spread.
 * Worked for one bar: 12 mm in 32 MPa, 30 to its face, straight, in good bond, all lapped at one section. A test
 * evaluates each text and compares it with what the engine gives.
 */
export const BAR = { diameter: 12, strength: 32, stress: 500 / 1.15, cd: 30, isGoodBond: true, isBent: false } as const
const PRISM = 1000

export interface InnerStep extends Pick<
  Step,
  'symbol' | 'meaning' | 'formula' | 'values' | 'unit' | 'clause' | 'value'
> {
  readonly family: SeenStep['family']
}

type Line = readonly [symbol: string, meaning: string, formula: string, values: Step['values'], value: number]

/** What each basis works out without printing its lines. */
export function innerSteps(basis: Basis): readonly InnerStep[] {
  const found = basis.anchorage(BAR)
  const lap = basis.lap(BAR, 1)
  const hook = basis.linkHook(BAR.diameter)
  const { anchorage, laps } = basis.id === 'en-1992' ? EUROPEAN : AUSTRALIAN
  const window = basis.window(PRISM)
  const share = window.from / PRISM
  return [
    ...anchorage(found).map(withClause('anchorage', 'mm', found.clause)),
    ...laps(found, lap).map(withClause('anchorage', 'mm', basis.clauses.lap)),
    ...[hookLine(basis.id, hook.length)].map(withClause('anchorage', 'mm', hook.clause)),
    ...windowLines(share, window).map(withClause('bursting-plan', 'mm', basis.clauses.window)),
    ...[spreadLine(basis)].map(withClause('edge-wedge', 'rad', basis.spread.clause)),
  ]
}

export const innerSeen = (layout: Layout): readonly SeenStep[] =>
  innerSteps(basisOf(layout.job)).map(({ family, ...step }) => ({ family, basis: layout.job.basis, step }))

const withClause =
  (family: SeenStep['family'], unit: string, clause: Step['clause']) =>
  ([symbol, meaning, formula, values, value]: Line): InnerStep => ({
    family,
    symbol,
    meaning,
    formula,
    values,
    value,
    unit: /^(alpha|k\d)/.test(symbol) ? '-' : symbol.startsWith('f') ? 'MPa' : unit,
    clause: CLAUSES[symbol] ?? clause,
  })

/** Tables beside the clause, both from memory. */
const CLAUSES: Readonly<Record<string, Step['clause']>> = {
  fctm: { source: 'EN 1992-1-1:2004', section: 'Table 3.1', tag: 'memory' },
  alpha2: { source: 'EN 1992-1-1:2004', section: 'Table 8.2', tag: 'memory' },
}

type Found = ReturnType<Basis['anchorage']>
interface Rules {
  readonly anchorage: (found: Found) => readonly Line[]
  readonly laps: (found: Found, lap: number) => readonly Line[]
}

const d = BAR.diameter
const fctm = 0.3 * Math.cbrt(BAR.strength) ** 2
const alpha2 = 1 - (0.15 * (BAR.cd - d)) / d
const EUROPEAN: Rules = {
  anchorage: ({ bond, required, least, length }) => [
    [
      'fctm',
      'Mean tensile strength of concrete up to C50/60',
      '0.3 * exp(2 / 3 * log(fck))',
      { fck: BAR.strength },
      fctm,
    ],
    [
      'fbd',
      'Bond strength: eta1 1.0 in good and 0.7 in poor bond, eta2 1.0 up to 32 mm',
      '2.25 * eta1 * eta2 * alphaCt * 0.7 * fctm / gammaC',
      { eta1: 1, eta2: 1, alphaCt: 1, fctm, gammaC: 1.5 },
      bond,
    ],
    ['lmin', 'Least anchorage', 'max(0.3 * lb, 10 * d, 100)', { lb: required, d }, least],
    [
      'alpha2',
      'Credit for cover to a straight bar',
      'min(1, max(0.7, 1 - 0.15 * (cd - d) / d))',
      { cd: BAR.cd, d },
      alpha2,
    ],
    ['lbd', 'Anchorage', 'max(alpha1 * alpha2 * lb, lmin)', { alpha1: 1, alpha2, lb: required, lmin: least }, length],
  ],
  laps: ({ required }, lap) => [
    [
      'alpha6',
      'Factor for the share of bars lapped at one section, per cent',
      'min(1.5, max(1, sqrt(rho1 / 25)))',
      { rho1: 100 },
      1.5,
    ],
    [
      'l0',
      'Lap',
      'max(alpha1 * alpha2 * alpha6 * lb, 0.3 * alpha6 * lb, 15 * d, 200)',
      { alpha1: 1, alpha2, alpha6: 1.5, lb: required, d },
      lap,
    ],
  ],
}

const FSY = 500
const k2 = (132 - d) / 100
const basic = (0.5 * alpha2 * FSY * d) / (k2 * Math.sqrt(BAR.strength))
const shortest = 0.058 * FSY * d
const AUSTRALIAN: Rules = {
  anchorage: ({ required, least }) => [
    ['k3', 'Credit for cover', 'min(1, max(0.7, 1 - 0.15 * (cd - d) / d))', { cd: BAR.cd, d }, alpha2],
    [
      'Lsytb',
      'Length that develops the yield strength: k1 1.3 with more than 300 of concrete below, strength up to 65 MPa',
      'max(0.5 * k1 * k3 * fsy * d / ((132 - d) / 100 * sqrt(fc)), 0.058 * fsy * k1 * d)',
      { k1: 1, k3: alpha2, fsy: FSY, d, fc: BAR.strength },
      Math.max(basic, shortest),
    ],
    [
      'Lst',
      'Length that develops a stress',
      'sigma / fsy * Lsytb',
      { sigma: BAR.stress, fsy: FSY, Lsytb: Math.max(basic, shortest) },
      required,
    ],
    ['lmin', 'Least length that counts', '12 * d', { d }, least],
  ],
  laps: (_, lap) => [
    [
      'Lsytlap',
      'Lap: k7 1.0 where half of the bars are lapped and half their strength is enough, otherwise 1.25',
      'max(k7 * 0.5 * k1 * k3 * fsy * d / ((132 - d) / 100 * sqrt(fc)), 0.058 * fsy * k1 * d)',
      { k7: 1.25, k1: 1, k3: alpha2, fsy: FSY, d, fc: BAR.strength },
      lap,
    ],
  ],
}

const hookLine = (basis: string, length: number): Line => {
  const formula = basis === 'en-1992' ? 'max(10 * d, 70)' : 'max(4 * d, 70)'
  return ['lHook', 'Straight end of the hook of a closed link past its bend', formula, { d }, length]
}

const windowLines = (share: number, { from, to }: ReturnType<Basis['window']>): readonly Line[] => [
  ['xFrom', 'Behind the bearing face steel counts from here', `${share} * b`, { b: PRISM }, from],
  ['xTo', 'and as far as here', 'b', { b: to }, to],
]

const spreadLine = ({ id, spread }: Basis): Line =>
  id === 'en-1992'
    ? ['beta', 'Angle of spread behind an anchor', 'atan(2 / 3)', {}, spread.value]
    : ['beta', 'Angle of spread behind an anchor', 'atan(1)', {}, spread.value]
