import { step, type Clause, type Step } from '../step'
import type { CrackChoice, CrackInput, CrackRule } from './basis'
import { meanTensile } from './en-1992-anchorage'
import { EN_CRACK_EDGE_BARS, EN_CRACK_MINIMUM, EN_CRACK_STRONGER } from './en-1992-readings'

/** EN 1992-1-1:2004, 7.3: steel of a section in full tension that keeps cracks to a width. Table and Eq. 7.7N from memory. */
const MINIMUM: Clause = { source: 'EN 1992-1-1:2004', section: '7.3.2(2) Eq. 7.1', tag: 'read' }
const TABLE: Clause = { source: 'EN 1992-1-1:2004', section: '7.3.3(2) Table 7.2N', tag: 'memory' }
const BAR_SIZE: Clause = { source: 'EN 1992-1-1:2004', section: '7.3.3(2) Eq. 7.7N', tag: 'memory' }
const TENSILE: Clause = { source: 'EN 1992-1-1:2004', section: 'Table 3.1', tag: 'memory' }
const PROPORTION: Clause = { source: 'EN 1992-1-1:2004', section: '7.3.4(1), by proportion', tag: 'derived' }

/** Table 7.2N: steel stress (MPa) against the largest bar (mm), by crack width; from the highest stress to the lowest. */
const LARGEST_BAR: readonly { readonly width: number; readonly rows: readonly (readonly [number, number])[] }[] = [
  {
    width: 0.4,
    rows: [
      [450, 6],
      [400, 8],
      [360, 10],
      [320, 12],
      [280, 16],
      [240, 20],
      [200, 32],
      [160, 40],
    ],
  },
  {
    width: 0.3,
    rows: [
      [450, 5],
      [400, 6],
      [360, 8],
      [320, 10],
      [280, 12],
      [240, 16],
      [200, 25],
      [160, 32],
    ],
  },
  {
    width: 0.2,
    rows: [
      [400, 4],
      [360, 5],
      [320, 6],
      [280, 8],
      [240, 12],
      [200, 16],
      [160, 25],
    ],
  },
]

/** Width and stress steps below which no column is printed. */
const WIDTH_STEP = 0.1
const NARROWEST = 0.2

/** Every degree of crack control, from the least to the most. */
export function crackChoices(fyk: number): readonly CrackChoice[] {
  return [
    { readingId: EN_CRACK_EDGE_BARS, title: 'Ordinary edge bars only', steel: () => null },
    {
      readingId: EN_CRACK_MINIMUM,
      title: 'Least steel for the job’s crack width',
      steel: (input) => crackSteel(input, input.crackWidth, fyk),
    },
    {
      readingId: EN_CRACK_STRONGER,
      title: 'Steel for a crack width one step less',
      steel: (input) => crackSteel(input, Math.max(input.crackWidth - WIDTH_STEP, input.crackWidth / 2), fyk),
    },
  ]
}

/**
 * Eq. 7.1 in full tension, kc = 1. Compression is no part of it: a section that cracks carries fct,eff on its whole area
 * whatever has compressed it before.
 */
function crackSteel(input: CrackInput, width: number, fyk: number): CrackRule {
  const fct = tensileOf(input)
  const size = correctedBar(input, fct.value)
  const stresses = stressOf(size.value, width)
  const tableStress = stresses.at(-1)?.value ?? 0
  const stress = step(
    {
      symbol: 'sigmaS',
      meaning: 'Steel stress, not above yield',
      formula: 'min(sigmaT, fyk)',
      unit: 'MPa',
      clause: MINIMUM,
    },
    { sigmaT: tableStress, fyk },
    (v) => Math.min(v.sigmaT, v.fyk),
  )
  const k = shareOfSelfStress(input.thickness)
  const As = step(
    {
      symbol: 'AsCrack',
      meaning: 'Least steel per metre, both faces together',
      formula: 'kc * k * fctEff * 1000 * h / sigmaS',
      unit: 'mm2/m',
      clause: MINIMUM,
    },
    { kc: 1, k: k.value, fctEff: fct.value, h: input.thickness, sigmaS: stress.value },
    (v) => (v.kc * v.k * v.fctEff * 1000 * v.h) / v.sigmaS,
  )
  return {
    areaPerMetre: As.value,
    spacingMax: null,
    clause: MINIMUM,
    steps: [fct, size, ...stresses, stress, k, As],
  }
}

function tensileOf({ tensile, fck }: CrackInput): Step {
  const meaning = tensile === null ? 'Mean tensile strength at 28 days' : 'Tensile strength when it cracks, by the job'
  return step(
    { symbol: 'fctEff', meaning, formula: 'fctm', unit: 'MPa', clause: TENSILE },
    { fctm: tensile ?? meanTensile(fck) },
    (v) => v.fctm,
  )
}

/** The bar that the table is read at: Eq. 7.7N turned round, with hcr the whole thickness in full tension. */
function correctedBar({ diameter, thickness, cover }: CrackInput, fctEff: number): Step {
  return step(
    {
      symbol: 'phiS',
      meaning: 'Bar size at which the table is read',
      formula: 'd / (fctEff / 2.9 * h / (8 * (c + d / 2)))',
      unit: 'mm',
      clause: BAR_SIZE,
    },
    { d: diameter, fctEff, h: thickness, c: cover },
    (v) => v.d / (((v.fctEff / 2.9) * v.h) / (8 * (v.c + v.d / 2))),
  )
}

/** k of 7.3.2(2): self-stress that is not even through the depth. */
function shareOfSelfStress(thickness: number): Step {
  return step(
    {
      symbol: 'k',
      meaning: 'Share for self-stress: 1.0 to 300 thick, 0.65 from 800',
      formula: 'max(0.65, min(1, 1 - 0.35 * (h - 300) / 500))',
      unit: '-',
      clause: MINIMUM,
    },
    { h: thickness },
    (v) => Math.max(0.65, Math.min(1, 1 - (0.35 * (v.h - 300)) / 500)),
  )
}

/** Stress for a bar and a crack width; a width between two columns takes the narrower one. */
function stressOf(bar: number, width: number): readonly Step[] {
  const column = LARGEST_BAR.find((one) => one.width <= width + 1e-9) ?? LARGEST_BAR.at(-1)
  const read = readColumn(bar, column?.rows ?? [])
  if (width >= NARROWEST - 1e-9) return [read]
  const lowered = step(
    {
      symbol: 'sigmaT',
      meaning: 'Stress for a width below 0.2, in proportion (on the safe side: Eq. 7.8 falls faster)',
      formula: 'sigmaT02 * w / 0.2',
      unit: 'MPa',
      clause: PROPORTION,
    },
    { sigmaT02: read.value, w: width },
    (v) => (v.sigmaT02 * v.w) / 0.2,
  )
  return [{ ...read, symbol: 'sigmaT02' }, lowered]
}

function readColumn(bar: number, rows: readonly (readonly [number, number])[]): Step {
  const line = { symbol: 'sigmaT', unit: 'MPa', clause: TABLE }
  const after = rows.findIndex(([, largest]) => largest >= bar)
  const [upper, lower] = [rows[after - 1], rows[after]]
  if (upper && lower) {
    return step(
      {
        ...line,
        meaning: 'Stress of the table, between its rows',
        formula: 's1 + (s2 - s1) * (phiS - d1) / (d2 - d1)',
      },
      { s1: upper[0], s2: lower[0], phiS: bar, d1: upper[1], d2: lower[1] },
      (v) => v.s1 + ((v.s2 - v.s1) * (v.phiS - v.d1)) / (v.d2 - v.d1),
    )
  }
  if (lower) {
    return step({ ...line, meaning: 'Highest stress of the table', formula: 's' }, { s: lower[0] }, (v) => v.s)
  }
  const [s, d] = rows.at(-1) ?? [0, 1]
  return step(
    {
      ...line,
      meaning: 'Beyond the largest bar of the table, in proportion',
      formula: 's * d / phiS',
      clause: PROPORTION,
    },
    { s, d, phiS: bar },
    (v) => (v.s * v.d) / v.phiS,
  )
}
