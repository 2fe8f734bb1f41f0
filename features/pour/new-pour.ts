import type { LayoutFile } from '@wedgeline/contract'
import { fckOf, OWN_CONCRETE, USUAL_STAGES } from './concrete'
import type { TypedOutline } from './outline-editor'
import { outlineProblem, rectangle, wholeCorners, type TypedCorner } from './outline-input'
import type { PlanPoint, TypedPour } from './pour-commands'
import type { StageValues } from './stages-editor'

/** What stands in the form for a new pour. */
export interface PourForm {
  readonly mark: string
  readonly title: string
  /** Id of a level of the job, or null for a new one. */
  readonly levelId: string | null
  readonly levelMark: string
  readonly thicknessMm: number | null
  /** Name of a class, or the word for concrete of one's own. */
  readonly concrete: string
  readonly ownName: string
  readonly ownFckMPa: number | null
  readonly coverTopMm: number | null
  readonly coverSoffitMm: number | null
  readonly coverEdgeMm: number | null
  readonly stages: readonly StageValues[]
  readonly outline: TypedOutline
}

export type PourField = keyof PourForm

/** A form that lacks nothing but a mark where one is taken and the sizes: a rectangle takes few keys. */
export function emptyForm(layout: LayoutFile): PourForm {
  const last = layout.pours.at(-1)
  return {
    mark: freeMark(layout),
    title: '',
    levelId: last?.levelId ?? layout.levels[0]?.id ?? null,
    levelMark: '',
    thicknessMm: last?.thicknessMm ?? null,
    concrete: last && fckOf(last.concrete) !== null ? last.concrete : 'C32/40',
    ownName: '',
    ownFckMPa: null,
    coverTopMm: last?.coverTopMm ?? 30,
    coverSoffitMm: last?.coverSoffitMm ?? 30,
    coverEdgeMm: last?.coverEdgeMm ?? 30,
    stages: USUAL_STAGES.map((stage) => ({ id: stage.name, ...stage })),
    outline: {
      way: 'rectangle',
      eastMm: null,
      northMm: null,
      originXMm: 0,
      originYMm: 0,
      corners: Array.from({ length: 4 }, () => ({ xMm: null, yMm: null })),
    },
  }
}

function freeMark({ pours }: LayoutFile): string {
  const taken = new Set(pours.map(({ mark }) => mark))
  let number = pours.length + 1
  while (taken.has(`P${number}`)) number += 1
  return `P${number}`
}

/** The corners that the form stands for, as far as they are typed. */
export function cornersOf({
  way,
  eastMm,
  northMm,
  originXMm,
  originYMm,
  corners,
}: TypedOutline): readonly TypedCorner[] {
  if (way === 'corners') return corners
  if (!eastMm || !northMm || originXMm === null || originYMm === null) return []
  return rectangle({ along: eastMm, across: northMm }, { xMm: originXMm, yMm: originYMm })
}

export const drawnCorners = (outline: TypedOutline): readonly PlanPoint[] => wholeCorners(cornersOf(outline))

export type ReadForm =
  | { readonly ok: true; readonly pour: TypedPour }
  | { readonly ok: false; readonly problems: Readonly<Partial<Record<PourField, string>>> }

/** Reads the form whole: every field that is wrong says what would be right. */
export function readForm(form: PourForm, layout: LayoutFile): ReadForm {
  const problems = problemsOf(form, layout)
  const { thicknessMm, coverTopMm, coverSoffitMm, coverEdgeMm } = form
  const concrete = concreteOf(form)
  const isWhole = thicknessMm !== null && coverTopMm !== null && coverSoffitMm !== null && coverEdgeMm !== null
  if (Object.keys(problems).length > 0 || !isWhole || !concrete) return { ok: false, problems }
  const level = form.levelId === null ? { mark: form.levelMark.trim(), title: '' } : { id: form.levelId }
  const stages = form.stages.map(({ name, share, strengthMPa }) => ({ name, share, strengthMPa }))
  return {
    ok: true,
    pour: {
      mark: form.mark.trim(),
      title: form.title.trim(),
      level,
      thicknessMm,
      ...concrete,
      coverTopMm,
      coverSoffitMm,
      coverEdgeMm,
      stages,
      outline: drawnCorners(form.outline),
    },
  }
}

function concreteOf({ concrete, ownName, ownFckMPa }: PourForm): Pick<TypedPour, 'concrete' | 'fckMPa'> | null {
  if (concrete !== OWN_CONCRETE) {
    const fckMPa = fckOf(concrete)
    return fckMPa === null ? null : { concrete, fckMPa }
  }
  return ownFckMPa === null ? null : { concrete: ownName.trim() || `fck ${ownFckMPa}`, fckMPa: ownFckMPa }
}

function problemsOf(form: PourForm, layout: LayoutFile): Partial<Record<PourField, string>> {
  const found: [PourField, string | null][] = [
    ['mark', markProblem(form.mark.trim(), layout)],
    ['levelMark', form.levelId === null && form.levelMark.trim() === '' ? 'The new level needs a mark, as L2.' : null],
    ['thicknessMm', thicknessProblem(form)],
    ['ownFckMPa', form.concrete === OWN_CONCRETE ? positive(form.ownFckMPa, 'The cylinder strength') : null],
    ['coverTopMm', notNegative(form.coverTopMm, 'The cover at the top')],
    ['coverSoffitMm', notNegative(form.coverSoffitMm, 'The cover at the soffit')],
    ['coverEdgeMm', notNegative(form.coverEdgeMm, 'The cover at edges')],
    ['stages', stagesProblem(form.stages)],
    ['outline', outlineWords(form.outline)],
  ]
  return Object.fromEntries(found.filter(([, problem]) => problem !== null))
}

function markProblem(mark: string, { pours }: LayoutFile): string | null {
  if (mark === '') return 'The pour needs a mark, as P3.'
  if (mark.length > 12) return 'The mark has more than 12 letters and figures. Keep it short, as P3.'
  return pours.some((pour) => pour.mark === mark) ? `There is a pour ${mark} already. Choose another mark.` : null
}

function thicknessProblem({ thicknessMm, coverTopMm, coverSoffitMm }: PourForm): string | null {
  const missing = positive(thicknessMm, 'The thickness')
  if (missing || thicknessMm === null) return missing
  const covers = (coverTopMm ?? 0) + (coverSoffitMm ?? 0)
  return thicknessMm > covers ? null : `${thicknessMm} mm leaves no room between covers of ${covers} mm in all.`
}

const positive = (value: number | null, what: string): string | null =>
  value === null ? `${what} is needed.` : value > 0 ? null : `${what} must be more than 0.`

const notNegative = (value: number | null, what: string): string | null =>
  value === null ? `${what} is needed.` : value >= 0 ? null : `${what} must be 0 or more.`

function stagesProblem(stages: readonly StageValues[]): string | null {
  for (const [at, stage] of stages.entries()) {
    const before = stages[at - 1]
    if (stage.share <= 0 || stage.share > 1)
      return `Stage ${stage.name}: the share must be more than 0 and at most 100 %.`
    if (stage.strengthMPa <= 0) return `Stage ${stage.name}: the strength must be more than 0 MPa.`
    if (before && stage.share <= before.share)
      return `Stage ${stage.name}: the share must be more than the stage before.`
    if (before && stage.strengthMPa < before.strengthMPa) {
      return `Stage ${stage.name}: the strength must not be below the ${before.strengthMPa} MPa of the stage before.`
    }
  }
  return stages.at(-1)?.share === 1 ? null : 'The last stage must have the whole force, 100 %.'
}

function outlineWords(outline: TypedOutline): string | null {
  const { way, eastMm, northMm, originXMm, originYMm } = outline
  if (way === 'corners') return outlineProblem(outline.corners)
  if (eastMm === null || northMm === null) return 'The rectangle needs its size east and its size north.'
  if (eastMm <= 0 || northMm <= 0) return 'The sizes of the rectangle must be more than 0.'
  return originXMm === null || originYMm === null
    ? 'The south-west corner needs its x and its y; 0 and 0 will do.'
    : null
}
