import type { StrandType } from '../model'
import { step, type Clause, type Step } from '../step'
import { anchorage, clearGap, isGoodBond, LAP_STAGGER, lap, linkHook, transmission } from './as-3600-anchorage'
import { AS_CRACK_CHOICES } from './as-3600-crack'
import {
  AS_DEAD_END,
  AS_JOINT,
  AS_OWN_PRISM,
  AS_READINGS,
  AS_SHORTFALL,
  AS_ROW,
  AS_TIE_BACK,
  AS_TIE_BACK_OWN,
} from './as-3600-readings'
import type {
  Basis,
  BasisInput,
  BasisSource,
  BearingInput,
  BearingRule,
  Factor,
  FactorInUse,
  FaceInput,
  TieInput,
  TieRule,
} from './basis'
import { otherTieBacks, tieBack } from './tie-back'

const clause = (section: string, tag: Clause['tag']): Clause => ({ source: 'AS 3600:2018', section, tag })

const ZONE = clause('12.5.4', 'digest')
const FACE = clause('12.5.5', 'digest')
const ROW = clause('12.5.3', 'digest')
const STEEL = clause('12.5.6', 'digest')
const BEARING = clause('12.6', 'memory')
const JACKING = clause('17.3.4.6', 'memory')
const TRANSFER = clause('2.4, factor where prestress is adverse', 'memory-unsure')
const SPREAD = clause('12.5, 1 in 1 for the steel of the zone', 'digest')

/** No clause gives a largest angle; the range usual for simple anchor rules. */
const INCLINATION: Clause = { source: 'Common practice', section: 'range of simple anchor rules', tag: 'practice' }

/** The other value that is met for prestress at transfer where it is adverse (from memory); shown beside. */
const TRANSFER_OTHER = 1.15

const FACTORS = [
  {
    name: 'transferFactor',
    title: 'Factor on prestress at transfer where it is adverse',
    recommended: 1,
    least: 1,
    most: 1.5,
    unit: '-',
    clause: TRANSFER,
  },
  {
    name: 'phiBearing',
    title: 'Capacity reduction factor for bearing, phi',
    recommended: 0.6,
    least: 0.4,
    most: 0.6,
    unit: '-',
    clause: BEARING,
  },
  {
    name: 'sigmaBursting',
    title: 'Steel stress in the end zone',
    recommended: 150,
    least: 50,
    most: 150,
    unit: 'MPa',
    clause: STEEL,
  },
  {
    name: 'kJacking',
    title: 'Jacking, share of breaking load: 0.85 for stress-relieved strand, otherwise 0.75',
    recommended: 0.85,
    least: 0.5,
    most: 0.85,
    unit: '-',
    clause: JACKING,
  },
] as const satisfies readonly Factor[]

type FactorName = (typeof FACTORS)[number]['name']
type FactorValues = Readonly<Record<FactorName, number>>

export const AS_3600: BasisSource = {
  id: 'as-3600',
  title: 'AS 3600:2018',
  factors: FACTORS,
  readings: AS_READINGS,
  friction: {
    family: 'inside',
    mu: 'flat duct 0.20, round metal duct 0.15 to 0.20, greased strand 0.15',
    wobble: '0.016 to 0.024',
    begin: {
      nominal: { mu: 0.2, wobblePerM: 0.02 },
      low: { mu: 0.15, wobblePerM: 0.016 },
      high: { mu: 0.2, wobblePerM: 0.024 },
    },
    clause: clause('3.4.2.4', 'memory'),
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
  return {
    id: AS_3600.id,
    title: AS_3600.title,
    factors,
    readings: AS_READINGS,
    isAccepted: (readingId) => accepted.has(readingId),
    steelReading: null,
    windowReading: null,
    ownPrismReading: { id: AS_OWN_PRISM, ratioMax: 0.6 },
    jackingLimit: (strand, strands) => jackingLimit(strand, strands, values),
    lockOffLimit: null,
    bearing: (one) => bearing(one, values),
    tie: (one) => tie(one, values),
    window: (D) => ({ from: 0.2 * D, to: D }),
    faceSteel: (one) => faceSteel(one, values),
    planRow: { equalReadingId: AS_ROW, isUnevenCovered: false, clause: ROW },
    crackChoices: AS_CRACK_CHOICES,
    tieBack: {
      readingId: AS_TIE_BACK,
      ownReadingId: AS_TIE_BACK_OWN,
      rule: (one) => tieBack(one, input.fyk),
      beside: otherTieBacks,
    },
    transmission,
    deadEndReading: AS_DEAD_END,
    jointReading: AS_JOINT,
    shortfallReading: AS_SHORTFALL,
    anchorage: (one) => anchorage(one, input.fyk),
    isGoodBond,
    // 13.1 gives lengths for the yield strength itself.
    barStress: input.fyk,
    linkHook,
    lap: (one, share) => lap(one, share, input.fyk),
    lapStagger: LAP_STAGGER,
    clearGap,
    spread: { value: Math.PI / 4, clause: SPREAD },
    inclinationMax: { value: (20 * Math.PI) / 180, clause: INCLINATION },
    clauses: { jacking: JACKING, tie: ZONE, window: STEEL, bearing: BEARING, lap: clause('13.2.2', 'secondary') },
  }
}

function jackingLimit(strand: StrandType, strands: number, { kJacking }: FactorValues): readonly Step[] {
  return [
    step(
      {
        symbol: 'Pmax',
        meaning: 'Largest force of the tendon: a share of its breaking load',
        formula: 'n * kJacking * Fpb',
        unit: 'N',
        clause: JACKING,
      },
      { n: strands, kJacking, Fpb: strand.breakingLoad },
      (v) => v.n * v.kJacking * v.Fpb,
    ),
  ]
}

/**
 * Pressure behind a plate: net area for the stress, gross for the ratio of areas, both shown.
 *
 * A2 is the base of a frustum of 1 along the tendon to 2 across, of the plate's shape and concentric with it; in a slab
 * its section, neighbours and edges limit it before the depth does.
 */
function bearing(input: BearingInput, { transferFactor, phiBearing }: FactorValues): BearingRule {
  const { steps: areas, gross, net, supporting } = bearingAreas(input)
  const stress = step(
    { symbol: 'sigma', meaning: 'Pressure on the net area', formula: 'kP * P / Anet', unit: 'MPa', clause: BEARING },
    { kP: transferFactor, P: input.P, Anet: net },
    (v) => (v.kP * v.P) / v.Anet,
  )
  const limit = step(
    {
      symbol: 'phiFb',
      meaning: 'Largest pressure at the strength of this stage',
      formula: 'phi * min(0.9 * fc * sqrt(A2 / A1), 1.8 * fc)',
      unit: 'MPa',
      clause: BEARING,
    },
    { phi: phiBearing, fc: input.strength, A2: supporting, A1: gross },
    (v) => v.phi * Math.min(0.9 * v.fc * Math.sqrt(v.A2 / v.A1), 1.8 * v.fc),
  )
  const other = (stress.value * TRANSFER_OTHER) / transferFactor
  return {
    demand: stress.value,
    limit: limit.value,
    clause: BEARING,
    steps: [...areas, stress, limit],
    notes: otherNote(transferFactor, `${other.toFixed(2)} MPa of ${limit.value.toFixed(2)} MPa`),
  }
}

/** Gross, net and supporting area, mm2. */
function bearingAreas(input: BearingInput) {
  const gross = step(
    { symbol: 'A1', meaning: 'Gross area of the plate', formula: 'w * h', unit: 'mm2', clause: BEARING },
    { w: input.plateWidth, h: input.plateHeight },
    (v) => v.w * v.h,
  )
  const net = step(
    {
      symbol: 'Anet',
      meaning: 'Area that bears: plate less hole',
      formula: 'A1 - Ahole',
      unit: 'mm2',
      clause: BEARING,
    },
    { A1: gross.value, Ahole: input.holeArea },
    (v) => v.A1 - v.Ahole,
  )
  const k = step(
    {
      symbol: 'k',
      meaning: 'Enlargement of the plate to the supporting area of its shape',
      formula: 'min(bFree / w, hFree / h)',
      unit: '-',
      clause: BEARING,
    },
    { bFree: input.widthFree, w: input.plateWidth, hFree: input.heightFree, h: input.plateHeight },
    (v) => Math.min(v.bFree / v.w, v.hFree / v.h),
  )
  const supporting = step(
    { symbol: 'A2', meaning: 'Supporting area', formula: 'k * k * A1', unit: 'mm2', clause: BEARING },
    { k: k.value, A1: gross.value },
    (v) => v.k * v.k * v.A1,
  )
  return { steps: [gross, net, k, supporting], gross: gross.value, net: net.value, supporting: supporting.value }
}

/** Dispersion steel of the symmetric prism, for the unfactored force while jacking. */
function tie({ P, a, b }: TieInput, { transferFactor, sigmaBursting }: FactorValues): TieRule {
  const kr = step(
    { symbol: 'kr', meaning: 'Plate over prism', formula: 'a / D', unit: '-', clause: ZONE },
    { a, D: b },
    (v) => v.a / v.D,
  )
  const T = step(
    { symbol: 'T', meaning: 'Bursting force', formula: '0.25 * kP * P * (1 - kr)', unit: 'N', clause: ZONE },
    { kP: transferFactor, P, kr: kr.value },
    (v) => 0.25 * v.kP * v.P * (1 - v.kr),
  )
  return steelFor(T, [kr, T], { transferFactor, sigmaBursting })
}

/** Steel along the loaded face; the clause sets no floor of its own. */
function faceSteel({ T }: FaceInput, { transferFactor, sigmaBursting }: FactorValues): TieRule {
  const force = step(
    { symbol: 'Tf', meaning: 'Force along the loaded face', formula: 'kP * T', unit: 'N', clause: FACE },
    { kP: transferFactor, T },
    (v) => v.kP * v.T,
  )
  return steelFor(force, [force], { transferFactor, sigmaBursting })
}

function steelFor(
  force: Step,
  steps: readonly Step[],
  { transferFactor, sigmaBursting }: Pick<FactorValues, 'transferFactor' | 'sigmaBursting'>,
): TieRule {
  const As = step(
    { symbol: 'As', meaning: 'Steel asked for', formula: 'T / sigmaS', unit: 'mm2', clause: STEEL },
    { T: force.value, sigmaS: sigmaBursting },
    (v) => v.T / v.sigmaS,
  )
  const other = (As.value * TRANSFER_OTHER) / transferFactor
  return {
    area: As.value,
    stress: sigmaBursting,
    clause: force.clause,
    steps: [...steps, As],
    notes: otherNote(transferFactor, `${Math.round(other)} mm2 asked for`),
  }
}

/** What the other factor on the prestress would give; empty where the job uses it. */
function otherNote(transferFactor: number, numbers: string): readonly string[] {
  if (transferFactor === TRANSFER_OTHER) return []
  return [`With a factor of 1.15 on the prestress at transfer (from memory): ${numbers}.`]
}
