import type { AcceptedReading, StrandType } from '../model'
import { step, type Clause, type Step } from '../step'
import type {
  Basis,
  BasisInput,
  BasisSource,
  BearingInput,
  BearingRule,
  Factor,
  FactorInUse,
  TieInput,
  TieRule,
} from './basis'
import { LAP, LAP_STAGGER, linkHook, anchorage, clearGap, isGoodBond, lap } from './en-1992-anchorage'
import { crackChoices } from './en-1992-crack'
import { faceSteel } from './en-1992-face'
import {
  EN_DEAD_END,
  EN_JOINT,
  EN_OWN_PRISM,
  EN_READINGS,
  EN_SHORTFALL,
  EN_STEEL_300,
  EN_STEEL_ALT,
  EN_TIE_BACK,
  EN_TIE_BACK_OWN,
  EN_WINDOW,
} from './en-1992-readings'
import { transmission } from './en-1992-transmission'
import { otherTieBacks, tieBack } from './tie-back'

const SOURCE = 'EN 1992-1-1:2004'
const clause = (section: string, tag: Clause['tag']): Clause => ({ source: SOURCE, section, tag })

const FORCE = clause('2.4.2.2(3)', 'memory')
const JACKING = clause('5.10.2.1(1)', 'memory')
const LOCK_OFF = clause('5.10.3(2)', 'memory')
const CONCRETE = clause('3.1.6(1)', 'memory')
const BEARING = clause('6.7(2) Eq. 6.63', 'digest')
const BEARING_AREA = clause('6.7(3) Fig. 6.29', 'memory')
const TIE = clause('6.5.3(3) Eq. 6.58', 'digest')
const CRACK_STRESS = clause('8.10.3(4)', 'memory')
const YIELD = clause('2.4.2.4(1), 3.2.7', 'memory')
const SPREAD = clause('8.10.3(5)', 'memory')

/** No clause gives a largest angle; the range usual for simple anchor rules. */
const INCLINATION: Clause = { source: 'Common practice', section: 'range of simple anchor rules', tag: 'practice' }

const FACTORS = [
  {
    name: 'gammaP',
    title: 'Factor on prestress for local effects, gamma P,unfav',
    recommended: 1.2,
    least: 1,
    most: 2,
    unit: '-',
    clause: FORCE,
  },
  {
    name: 'gammaC',
    title: 'Factor on concrete, gamma C',
    recommended: 1.5,
    least: 1,
    most: 2,
    unit: '-',
    clause: clause('2.4.2.4(1)', 'memory'),
  },
  {
    name: 'alphaCc',
    title: 'Factor for long-term effects on compression, alpha cc',
    recommended: 1,
    least: 0.8,
    most: 1,
    unit: '-',
    clause: CONCRETE,
  },
  {
    name: 'alphaCt',
    title: 'Factor for long-term effects on tension, alpha ct',
    recommended: 1,
    least: 0.5,
    most: 1,
    unit: '-',
    clause: clause('3.1.6(2)', 'memory'),
  },
  {
    name: 'gammaS',
    title: 'Factor on reinforcement, gamma S',
    recommended: 1.15,
    least: 1,
    most: 2,
    unit: '-',
    clause: clause('2.4.2.4(1)', 'memory'),
  },
  {
    name: 'sigmaS',
    title: 'Steel stress with which no crack width is checked',
    recommended: 300,
    least: 50,
    most: 300,
    unit: 'MPa',
    clause: CRACK_STRESS,
  },
  {
    name: 'kBreaking',
    title: 'Jacking, share of breaking load, k1',
    recommended: 0.8,
    least: 0.5,
    most: 0.95,
    unit: '-',
    clause: JACKING,
  },
  {
    name: 'kProof',
    title: 'Jacking, share of proof load, k2',
    recommended: 0.9,
    least: 0.5,
    most: 0.95,
    unit: '-',
    clause: JACKING,
  },
  {
    name: 'kBreakingAfter',
    title: 'After lock-off, share of breaking load, k7',
    recommended: 0.75,
    least: 0.5,
    most: 0.95,
    unit: '-',
    clause: LOCK_OFF,
  },
  {
    name: 'kProofAfter',
    title: 'After lock-off, share of proof load, k8',
    recommended: 0.85,
    least: 0.5,
    most: 0.95,
    unit: '-',
    clause: LOCK_OFF,
  },
] as const satisfies readonly Factor[]

type FactorName = (typeof FACTORS)[number]['name']
type FactorValues = Readonly<Record<FactorName, number>>

/** Eq. 6.63 may not count on a supporting area wider or higher than three plates. */
const SPREAD_AREA_MAX = 3

export const EN_1992: BasisSource = {
  id: 'en-1992',
  title: 'EN 1992-1-1:2004',
  factors: FACTORS,
  readings: EN_READINGS,
  friction: {
    family: 'inside',
    mu: '0.15 to 0.25, nominal 0.19',
    wobble: '0.005 to 0.01',
    begin: {
      nominal: { mu: 0.19, wobblePerM: 0.0075 },
      low: { mu: 0.15, wobblePerM: 0.005 },
      high: { mu: 0.25, wobblePerM: 0.01 },
    },
    clause: clause('5.10.5.2 Eq. 5.45', 'memory'),
  },
  make,
}

function make(input: BasisInput): Basis {
  const factors: readonly FactorInUse[] = FACTORS.map((factor) => {
    const set = input.factors.find(({ name }) => name === factor.name)
    return { ...factor, value: set?.value ?? factor.recommended, reason: set?.reason ?? null }
  })
  const values = Object.fromEntries(factors.map(({ name, value }) => [name, value])) as FactorValues
  const accepted = new Set(input.readings.map(({ readingId }) => readingId))
  const steelReading = steelReadingOf(input.readings)
  return {
    id: EN_1992.id,
    title: EN_1992.title,
    factors,
    readings: EN_READINGS,
    isAccepted: (readingId) => accepted.has(readingId),
    steelReading,
    windowReading: EN_WINDOW,
    ownPrismReading: { id: EN_OWN_PRISM, ratioMax: 0.6 },
    jackingLimit: (strand, strands) =>
      strandLimit({ strand, strands, kBreaking: values.kBreaking, kProof: values.kProof, clause: JACKING }),
    lockOffLimit: (strand, strands) =>
      strandLimit({ strand, strands, kBreaking: values.kBreakingAfter, kProof: values.kProofAfter, clause: LOCK_OFF }),
    bearing: (one) => bearing(one, values),
    tie: (one) => tie(one, { values, fyk: input.fyk, steelReading }),
    window: (b) => ({ from: 0.2 * b, to: b }),
    faceSteel: (one) => faceSteel(one, faceFactors(values, input.fyk, steelReading)),
    planRow: { equalReadingId: null, isUnevenCovered: true, clause: TIE },
    crackChoices: crackChoices(input.fyk),
    tieBack: {
      readingId: EN_TIE_BACK,
      ownReadingId: EN_TIE_BACK_OWN,
      rule: (one) => tieBack(one, input.fyk),
      beside: otherTieBacks,
    },
    transmission: (one) => transmission(one, values),
    deadEndReading: EN_DEAD_END,
    jointReading: EN_JOINT,
    shortfallReading: EN_SHORTFALL,
    anchorage: (one) => anchorage(one, values),
    isGoodBond,
    lap: (one, share) => lap(one, share, values),
    lapStagger: LAP_STAGGER,
    clearGap,
    barStress: input.fyk / values.gammaS,
    linkHook,
    spread: { value: Math.atan(2 / 3), clause: SPREAD },
    inclinationMax: { value: (20 * Math.PI) / 180, clause: INCLINATION },
    clauses: {
      jacking: JACKING,
      tie: TIE,
      window: EN_READINGS.find(({ id }) => id === EN_WINDOW)?.clause ?? TIE,
      bearing: BEARING,
      lap: LAP,
    },
  }
}

/** The one accepted last; the proposed one until then. */
function steelReadingOf(readings: readonly AcceptedReading[]): string {
  const [last] = readings
    .filter(({ readingId }) => readingId === EN_STEEL_300 || readingId === EN_STEEL_ALT)
    .sort((one, other) => other.acceptedAtMs - one.acceptedAtMs)
  return last?.readingId ?? EN_STEEL_300
}

/** By the job's bursting reading: 300 MPa for the factored force, or the smaller of yield and 1.2 times 300 MPa. */
function faceFactors({ gammaP, gammaS, sigmaS }: FactorValues, fyk: number, steelReading: string) {
  const stress = steelReading === EN_STEEL_300 ? sigmaS : Math.min(fyk / gammaS, gammaP * sigmaS)
  return { gammaP, gammaS, fyk, stress, stressClause: CRACK_STRESS }
}

/** The strand's characteristic strengths are given as loads of one strand, so stress limits become force limits. */
function strandLimit(of: {
  strand: StrandType
  strands: number
  kBreaking: number
  kProof: number
  clause: Clause
}): readonly Step[] {
  const { strand, strands, kBreaking, kProof } = of
  return [
    step(
      {
        symbol: 'Pmax',
        meaning: 'Largest force of the tendon: the smaller share of breaking load and proof load',
        formula: 'n * min(kBreaking * Fpk, kProof * Fp01k)',
        unit: 'N',
        clause: of.clause,
      },
      { n: strands, kBreaking, Fpk: strand.breakingLoad, kProof, Fp01k: strand.proofLoad },
      (v) => v.n * Math.min(v.kBreaking * v.Fpk, v.kProof * v.Fp01k),
    ),
  ]
}

/** The force that local effects are designed for. */
function designForce(P: number, gammaP: number): Step {
  return step(
    { symbol: 'F', meaning: 'Design force', formula: 'gammaP * P', unit: 'N', clause: FORCE },
    { gammaP, P },
    (v) => v.gammaP * v.P,
  )
}

/**
 * Pressure behind a plate: net area for the stress, gross for the ratio of areas, both shown.
 *
 * Ac1 has the plate's shape and is concentric with it (6.7(3)), so one enlargement k holds in both directions and
 * sqrt(Ac1 / Ac0) = k; the section, neighbours and edges limit it.
 */
function bearing(input: BearingInput, { gammaP, gammaC, alphaCc }: FactorValues): BearingRule {
  const F = designForce(input.P, gammaP)
  const { steps: areas, gross, net, supporting } = bearingAreas(input)
  const stress = step(
    { symbol: 'sigma', meaning: 'Pressure on the net area', formula: 'F / Anet', unit: 'MPa', clause: BEARING },
    { F: F.value, Anet: net },
    (v) => v.F / v.Anet,
  )
  const fcd = step(
    {
      symbol: 'fcd',
      meaning: 'Design strength of the concrete at this stage',
      formula: 'alphaCc * fck / gammaC',
      unit: 'MPa',
      clause: CONCRETE,
    },
    { alphaCc, fck: input.strength, gammaC },
    (v) => (v.alphaCc * v.fck) / v.gammaC,
  )
  const limit = step(
    {
      symbol: 'sigmaRd',
      meaning: 'Largest pressure',
      formula: 'min(fcd * sqrt(Ac1 / Ac0), 3 * fcd)',
      unit: 'MPa',
      clause: BEARING,
    },
    { fcd: fcd.value, Ac1: supporting, Ac0: gross },
    (v) => Math.min(v.fcd * Math.sqrt(v.Ac1 / v.Ac0), 3 * v.fcd),
  )
  return {
    demand: stress.value,
    limit: limit.value,
    clause: BEARING,
    steps: [F, ...areas, stress, fcd, limit],
    notes: [],
  }
}

/** Gross, net and supporting area, mm2. */
function bearingAreas(input: BearingInput) {
  const gross = step(
    { symbol: 'Ac0', meaning: 'Gross area of the plate', formula: 'w * h', unit: 'mm2', clause: BEARING },
    { w: input.plateWidth, h: input.plateHeight },
    (v) => v.w * v.h,
  )
  const net = step(
    {
      symbol: 'Anet',
      meaning: 'Area that bears: plate less hole',
      formula: 'Ac0 - Ahole',
      unit: 'mm2',
      clause: BEARING,
    },
    { Ac0: gross.value, Ahole: input.holeArea },
    (v) => v.Ac0 - v.Ahole,
  )
  const k = step(
    {
      symbol: 'k',
      meaning: 'Enlargement of the plate to the supporting area of its shape',
      formula: 'min(bFree / w, hFree / h, kMax)',
      unit: '-',
      clause: BEARING_AREA,
    },
    {
      bFree: input.widthFree,
      w: input.plateWidth,
      hFree: input.heightFree,
      h: input.plateHeight,
      kMax: SPREAD_AREA_MAX,
    },
    (v) => Math.min(v.bFree / v.w, v.hFree / v.h, v.kMax),
  )
  const supporting = step(
    { symbol: 'Ac1', meaning: 'Supporting area', formula: 'k * k * Ac0', unit: 'mm2', clause: BEARING_AREA },
    { k: k.value, Ac0: gross.value },
    (v) => v.k * v.k * v.Ac0,
  )
  return { steps: [gross, net, k, supporting], gross: gross.value, net: net.value, supporting: supporting.value }
}

/** Tie across the prism and the steel for it. */
function tie({ P, a, b }: TieInput, how: { values: FactorValues; fyk: number; steelReading: string }): TieRule {
  const { gammaP, gammaS, sigmaS } = how.values
  const F = designForce(P, gammaP)
  const T = step(
    {
      symbol: 'T',
      meaning: 'Bursting force, partial discontinuity',
      formula: '0.25 * F * (b - a) / b',
      unit: 'N',
      clause: TIE,
    },
    { F: F.value, a, b },
    (v) => (0.25 * v.F * (v.b - v.a)) / v.b,
  )
  if (how.steelReading === EN_STEEL_300) {
    const As = step(
      { symbol: 'As', meaning: 'Steel asked for', formula: 'T / sigmaS', unit: 'mm2', clause: CRACK_STRESS },
      { T: T.value, sigmaS },
      (v) => v.T / v.sigmaS,
    )
    return { area: As.value, stress: sigmaS, clause: TIE, steps: [F, T, As], notes: [] }
  }
  const fyd = step(
    { symbol: 'fyd', meaning: 'Design yield strength', formula: 'fyk / gammaS', unit: 'MPa', clause: YIELD },
    { fyk: how.fyk, gammaS },
    (v) => v.fyk / v.gammaS,
  )
  const As = step(
    {
      symbol: 'As',
      meaning: 'Steel asked for: strength with the factored force, crack width with the unfactored force',
      formula: 'max(T / fyd, T / gammaP / sigmaS)',
      unit: 'mm2',
      clause: CRACK_STRESS,
    },
    { T: T.value, fyd: fyd.value, gammaP, sigmaS },
    (v) => Math.max(v.T / v.fyd, v.T / v.gammaP / v.sigmaS),
  )
  return { area: As.value, stress: T.value / As.value, clause: TIE, steps: [F, T, fyd, As], notes: [] }
}
