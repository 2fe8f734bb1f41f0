import {
  LAYOUT_FORMAT,
  LAYOUT_VERSION,
  applyCommands,
  readLayout,
  type EdgeData,
  type HardwareData,
  type JackData,
  type LayoutFile,
  type LayoutInput,
  type StrandTypeData,
} from '@wedgeline/contract'
import { insertAnchors, type TypedAnchor } from '../edge/anchor-commands'
import { fckOf } from '../pour/concrete'
import { FIRST_SHARE, type QuickForm } from './quick-form'

/** Ids hold still while somebody types: the drawing and the bars refer to them. Storing gives new ones. */
export const POUR_ID = 'quick-pour'
export const EDGE_ID = 'quick-edge'
const IDS = { job: 'quick-job', level: 'quick-level', line: 'quick-line' } as const

export interface CompanyHardware {
  readonly hardware: readonly HardwareData[]
  readonly jacks: readonly JackData[]
  readonly strandTypes: readonly StrandTypeData[]
}

export interface QuickInput {
  readonly form: QuickForm
  readonly anchors: readonly TypedAnchor[]
  readonly company: CompanyHardware
  /** Number and title under which it is kept. */
  readonly name: { readonly number: string; readonly title: string; readonly timeZone: string }
}

export type QuickLayout =
  { readonly ok: true; readonly layout: LayoutFile } | { readonly ok: false; readonly problems: readonly string[] }

/** One edge of one pour as a layout file: what is checked and drawn here is what is kept. */
export function quickLayout(input: QuickInput): QuickLayout {
  const { form, anchors } = input
  const span = spanOf(form, anchors)
  const read = readLayout(bare(input, span))
  if (!read.ok) return { ok: false, problems: sentences(read.problems) }
  const [edge] = read.layout.edges
  if (!edge) return { ok: false, problems: ['The edge could not be made.'] }
  const layout = withAnchors(read.layout, edge, input)
  // What is kept is read by the server in the same way: a layout that it would refuse is not shown either.
  const whole = readLayout(layout)
  return whole.ok ? { ok: true, layout: whole.layout } : { ok: false, problems: sentences(whole.problems) }
}

const sentences = (
  problems: readonly { readonly severity: string; readonly field: string; readonly message: string }[],
) => problems.filter(({ severity }) => severity === 'refused').map(({ field, message }) => `${field}: ${message}.`)

interface Span {
  readonly fromMm: number
  readonly toMm: number
}

/**
 * Where the edge runs. Where the slab goes on past an end it is taken up to the middle of a gap like the last one, which
 * is the plane of symmetry of an edge that goes on evenly.
 */
export function spanOf(form: QuickForm, anchors: readonly Pick<TypedAnchor, 'chainageMm'>[]): Span {
  const at = anchors.map(({ chainageMm }) => chainageMm).sort((a, b) => a - b)
  const [first = 0] = at
  const last = at.at(-1) ?? first
  const typed = form.lengthMm ?? last + Math.max(first, 0)
  const half = (one: number, other: number | undefined) => (other === undefined ? 0 : Math.abs(other - one) / 2)
  return {
    fromMm: form.goesOnAtStart ? Math.min(0, first - half(first, at[1])) : 0,
    toMm: form.goesOnAtEnd ? Math.max(typed, last + half(last, at.at(-2))) : typed,
  }
}

function bare({ form, company, name }: QuickInput, { fromMm, toMm }: Span): LayoutInput {
  const depth = form.depthBehindMm ?? 0
  const corner = (id: string, xMm: number, yMm: number) => ({ id, xMm, yMm })
  return {
    format: LAYOUT_FORMAT,
    version: LAYOUT_VERSION,
    job: { id: IDS.job, ...name, basis: form.basis },
    levels: [{ id: IDS.level, mark: 'L1' }],
    hardware: [...company.hardware],
    jacks: [...company.jacks],
    strandTypes: [...company.strandTypes],
    // Chainage runs east and the slab lies north of it: seen from outside it runs from left to right.
    edgeLines: [{ id: IDS.line, levelId: IDS.level, mark: 'E1', xMm: 0, yMm: 0, azimuthDeg: 90 }],
    pours: [
      {
        id: POUR_ID,
        levelId: IDS.level,
        mark: 'P1',
        title: 'Quick edge',
        thicknessMm: form.thicknessMm ?? 0,
        concrete: form.concrete,
        fckMPa: fckOf(form.concrete) ?? 0,
        coverTopMm: form.coverTopMm ?? 0,
        coverSoffitMm: form.coverSoffitMm ?? 0,
        coverEdgeMm: form.coverEdgeMm ?? 0,
        outline: [
          corner('c1', fromMm, 0),
          corner('c2', toMm, 0),
          corner('c3', toMm, depth),
          corner('c4', fromMm, depth),
        ],
        stages: [
          { id: 's1', name: '25 %', share: FIRST_SHARE, strengthMPa: form.firstStrengthMPa ?? 0 },
          { id: 's2', name: 'full', share: 1, strengthMPa: form.fullStrengthMPa ?? 0 },
        ],
      },
    ],
    edges: [
      {
        id: EDGE_ID,
        pourId: POUR_ID,
        edgeLineId: IDS.line,
        mark: 'E1',
        cornerId: 'c1',
        lengths: [
          {
            ...{ id: 'n1', fromMm, toMm, kind: 'free' },
            ...{ topMm: form.thicknessMm ?? 0, soffitMm: 0, jackClearMm: form.jackClearMm },
          },
        ],
      },
    ],
  }
}

function withAnchors(layout: LayoutFile, edge: EdgeData, { form, anchors }: QuickInput): LayoutFile {
  let made = 0
  const newId = () => `quick-${++made}`
  const { commands } = insertAnchors(
    { layout, edge, newId },
    anchors.map((anchor) => ({
      ...anchor,
      strands: anchor.strands ?? form.strands ?? undefined,
      hardwareId: anchor.hardwareId ?? (anchor.end === 'dead' ? undefined : form.hardwareId),
    })),
  )
  const filled = applyCommands(layout, commands).layout
  const { strandTypeId, jackingRatio } = form
  return {
    ...filled,
    tendons: filled.tendons.map((tendon) => ({
      ...tendon,
      strandTypeId,
      jackingRatio: jackingRatio ?? tendon.jackingRatio,
    })),
  }
}

/** Number and title of a quick edge that nobody has named, from the instant at which it was begun. */
export function nameOf(atMs: number, timeZone: string): QuickInput['name'] {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    ...{ month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit', hourCycle: 'h23' },
  }).formatToParts(atMs)
  const part = (type: string) => parts.find((each) => each.type === type)?.value ?? ''
  const day = new Intl.DateTimeFormat('en-GB', { timeZone, day: 'numeric', month: 'long' }).format(atMs)
  return {
    number: `Q-${part('month')}${part('day')}-${part('hour')}${part('minute')}`,
    title: `Quick edge of ${day}`,
    timeZone,
  }
}
