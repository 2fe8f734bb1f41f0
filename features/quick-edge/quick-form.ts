import type { HardwareData, JobData, StrandTypeData } from '@wedgeline/contract'
import type { Usual } from '@/components/ui/field'
import { USUAL } from '../pour/concrete'

/** What a quick edge asks beside the anchors; a company's hardware gives a sensible value for each. */
export interface QuickForm {
  readonly basis: JobData['basis']
  readonly thicknessMm: number | null
  readonly concrete: string
  readonly firstStrengthMPa: number | null
  readonly fullStrengthMPa: number | null
  readonly coverTopMm: number | null
  readonly coverSoffitMm: number | null
  readonly coverEdgeMm: number | null
  readonly hardwareId: string
  readonly strandTypeId: string
  readonly strands: number | null
  readonly jackingRatio: number | null
  /** Null: the edge ends as far beyond the last anchor as it starts before the first. */
  readonly lengthMm: number | null
  readonly goesOnAtStart: boolean
  readonly goesOnAtEnd: boolean
  readonly depthBehindMm: number | null
  /** Clear room outside the edge, for the jack; null where it is not known. */
  readonly jackClearMm: number | null
}

/** Names of the fields that hold a number. */
export type QuickNumber = {
  [K in keyof QuickForm]: QuickForm[K] extends number | null ? K : never
}[keyof QuickForm]

export interface NumberRule {
  readonly name: QuickNumber
  readonly label: string
  readonly unit?: string
  readonly usual?: Usual
  readonly hint?: string
  readonly least: number
  readonly most: number
  readonly isWhole?: boolean
  readonly isOptional?: boolean
}

const PRACTICE = 'common practice'

/** Share of the force that the first stage puts on. */
export const FIRST_SHARE = 0.25

export const NUMBER_RULES: readonly NumberRule[] = [
  { name: 'thicknessMm', label: 'Thickness', unit: 'mm', usual: USUAL.thickness, least: 100, most: 3000 },
  {
    name: 'firstStrengthMPa',
    label: 'Strength at 25 % of the force',
    unit: 'MPa',
    usual: USUAL.firstStrength,
    least: 1,
    most: 120,
  },
  {
    name: 'fullStrengthMPa',
    label: 'Strength at the whole force',
    unit: 'MPa',
    usual: USUAL.fullStrength,
    least: 1,
    most: 120,
  },
  { name: 'coverTopMm', label: 'Cover at the top', unit: 'mm', usual: USUAL.cover, least: 0, most: 200 },
  { name: 'coverSoffitMm', label: 'Cover at the soffit', unit: 'mm', usual: USUAL.cover, least: 0, most: 200 },
  { name: 'coverEdgeMm', label: 'Cover at the edge', unit: 'mm', usual: USUAL.cover, least: 0, most: 200 },
  {
    name: 'strands',
    label: 'Strands of a tendon',
    usual: { range: '3 to 5', source: `flat slabs, ${PRACTICE}` },
    least: 1,
    most: 61,
    isWhole: true,
  },
  {
    name: 'jackingRatio',
    label: 'Jacking force, share of breaking load',
    usual: { range: '0.75 to 0.80', source: 'EN 1992-1-1 5.10.2.1, from memory' },
    least: 0.1,
    most: 0.95,
  },
  {
    name: 'lengthMm',
    label: 'Length of the edge',
    unit: 'mm',
    hint: 'Left empty: as far beyond the last anchor as the first stands from the start.',
    least: 300,
    most: 200_000,
    isOptional: true,
  },
  {
    name: 'depthBehindMm',
    label: 'Depth of slab behind the edge',
    unit: 'mm',
    usual: { range: '6000 to 15000', source: PRACTICE },
    least: 500,
    most: 200_000,
  },
  {
    name: 'jackClearMm',
    label: 'Clear room outside the edge',
    unit: 'mm',
    usual: { range: '1000 to 1500', source: `the jack decides, ${PRACTICE}` },
    hint: 'Left empty: the jack is not checked.',
    least: 0,
    most: 100_000,
    isOptional: true,
  },
]

interface Company {
  readonly hardware: readonly HardwareData[]
  readonly strandTypes: readonly StrandTypeData[]
}

/** A form that needs nothing but a paste: the first live hardware of the company and what its approval asks for. */
export function usualForm({ hardware, strandTypes }: Company): QuickForm {
  const first = hardware.find(({ ends }) => ends !== 'dead') ?? hardware[0]
  return {
    basis: 'en-1992',
    thicknessMm: 220,
    concrete: 'C32/40',
    firstStrengthMPa: 9,
    fullStrengthMPa: 22,
    coverTopMm: 30,
    coverSoffitMm: 30,
    coverEdgeMm: 30,
    hardwareId: first?.id ?? '',
    strandTypeId: strandTypes[0]?.id ?? '',
    strands: null,
    jackingRatio: 0.8,
    lengthMm: null,
    goesOnAtStart: false,
    goesOnAtEnd: false,
    depthBehindMm: 10_000,
    jackClearMm: null,
    ...(first ? ofHardware(first) : {}),
  }
}

/** What follows from the hardware: as many strands as it holds, strengths of its approval, a slab that it fits in. */
export function ofHardware({
  strandsMax,
  approval,
  edgeHeightMinMm,
}: HardwareData): Pick<QuickForm, 'strands' | 'firstStrengthMPa' | 'fullStrengthMPa' | 'thicknessMm'> {
  const needed = (share: number, usual: number): number => {
    const lines = approval?.strengths ?? []
    return lines.find((line) => line.share >= share)?.strengthMinMPa ?? lines.at(-1)?.strengthMinMPa ?? usual
  }
  return {
    strands: strandsMax,
    firstStrengthMPa: needed(FIRST_SHARE, 9),
    fullStrengthMPa: needed(1, 22),
    thicknessMm: Math.max(220, Math.ceil((2 * edgeHeightMinMm) / 10) * 10),
  }
}

export type QuickProblems = Readonly<Partial<Record<QuickNumber | 'hardwareId' | 'strandTypeId', string>>>

/** What is wrong with each field and what would be right; empty where the form can be used. */
export function formProblems(form: QuickForm, { hardware, strandTypes }: Company): QuickProblems {
  const numbers = NUMBER_RULES.map((rule) => [rule.name, numberProblem(form[rule.name], rule)] as const)
  const has = (rows: readonly { readonly id: string }[], id: string) => rows.some((row) => row.id === id)
  const found: (readonly [string, string | null])[] = [
    ...numbers,
    [
      'hardwareId',
      has(hardware, form.hardwareId) ? null : 'This hardware is not in the company’s list. Choose another.',
    ],
    [
      'strandTypeId',
      has(strandTypes, form.strandTypeId) ? null : 'This strand is not in the company’s list. Choose another.',
    ],
    ...(tooThin(form) ?? []),
    ...(falling(form) ?? []),
  ]
  return Object.fromEntries(found.filter(([, problem]) => problem !== null))
}

function numberProblem(value: number | null, rule: NumberRule): string | null {
  const { label, unit, least, most, isWhole, isOptional } = rule
  if (value === null) return isOptional ? null : `${label} is needed.`
  if (isWhole && !Number.isInteger(value)) return `${label} must be a whole number.`
  if (value >= least && value <= most) return null
  return `${label} must be from ${least} to ${most}${unit ? ` ${unit}` : ''}.`
}

function tooThin({ thicknessMm, coverTopMm, coverSoffitMm }: QuickForm): [string, string][] | null {
  if (thicknessMm === null || coverTopMm === null || coverSoffitMm === null) return null
  const covers = coverTopMm + coverSoffitMm
  return thicknessMm > covers
    ? null
    : [['thicknessMm', `${thicknessMm} mm leaves no room between covers of ${covers} mm in all.`]]
}

function falling({ firstStrengthMPa, fullStrengthMPa }: QuickForm): [string, string][] | null {
  if (firstStrengthMPa === null || fullStrengthMPa === null || fullStrengthMPa >= firstStrengthMPa) return null
  return [['fullStrengthMPa', `Must not be below the ${firstStrengthMPa} MPa of the first stage.`]]
}
