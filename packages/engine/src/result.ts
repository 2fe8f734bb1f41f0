import type { Clause, Step } from './step'

/** The families of checks, in the order in which they are listed. */
export const FAMILIES = [
  'bearing',
  'bursting-thickness',
  'bursting-plan',
  'spalling',
  'depth-change',
  'cover',
  'spacing',
  'straight-length',
  'edge-wedge',
  'joint',
  'pan-access',
  'pan-bars',
  'tendon',
  'dead-end',
  'precompression',
  'fit',
  'anchorage',
  'strength',
] as const
export type Family = (typeof FAMILIES)[number]

/** Families of checks as people call them, on screens and in workbooks. */
export const FAMILY_WORDS: Readonly<Record<Family, string>> = {
  bearing: 'bearing',
  'bursting-thickness': 'bursting in the thickness',
  'bursting-plan': 'bursting in plan',
  spalling: 'spalling and edge tension',
  'depth-change': 'depth change',
  cover: 'cover to the anchor',
  spacing: 'spacing and edge distance',
  'straight-length': 'straight length',
  'edge-wedge': 'edge wedge',
  joint: 'construction joint',
  'pan-access': 'pan access',
  'pan-bars': 'pan bars',
  tendon: 'tendon',
  'dead-end': 'dead end',
  precompression: 'precompression',
  fit: 'fit of the steel',
  anchorage: 'anchorage and laps',
  strength: 'strength at stressing',
}

/** Worst first is the order of severity in `STATUSES`. */
export const STATUSES = ['stop', 'not-covered', 'over', 'needs-judgement', 'near', 'within'] as const
export type Status = (typeof STATUSES)[number]

/** The word for each status, as it stands in a sentence. */
export const STATUS_WORDS: Readonly<Record<Status, string>> = {
  stop: 'stop',
  'not-covered': 'not covered',
  over: 'over',
  'needs-judgement': 'needs judgement',
  near: 'near',
  within: 'within',
}

/** C code, H hardware, P common practice. */
export type LimitKind = 'C' | 'H' | 'P'

export type ZoneKind = 'anchor' | 'group' | 'gap' | 'edge' | 'corner' | 'joint' | 'pan' | 'tendon' | 'strip' | 'pour'

/** A place that checks and bars belong to. `id` is stable: kind and the ids that it is made of. */
export interface Zone {
  readonly id: string
  readonly kind: ZoneKind
  /** As people say it: E6-03, E6 gap 03 to 04, E6 edge. */
  readonly name: string
  readonly pourId: string
  readonly edgeId: string | null
  readonly panId: string | null
  /** Chainage of the zone on its edge line, for the strip; null in a pan. */
  readonly from: number | null
  readonly to: number | null
}

interface CheckHead {
  readonly zoneId: string
  readonly family: Family
  /** Name of the comparison, in trade words: Bursting in plan, Height above soffit. */
  readonly name: string
  readonly plane: 'thickness' | 'plan' | null
  readonly stage: string | null
  readonly limitKind: LimitKind
  readonly clause: Clause
  /** What else a reader must know: windows, bars not counted, warnings. Whole sentences. */
  readonly notes: readonly string[]
}

/** The method answers. A demand over its limit is still an answer. */
export interface Compared extends CheckHead {
  readonly kind: 'compared'
  readonly status: Exclude<Status, 'not-covered'>
  readonly demand: number
  readonly limit: number
  readonly unit: string
  /**
   * Strength and steel compare by ratio: demand over limit. Distances (and an approval's strength) compare by
   * difference: demand is what is there, limit what is asked for; `at-least` and `at-most` say which side is within.
   */
  readonly compares: 'ratio' | 'at-least' | 'at-most'
  /**
   * Demand over limit, for ratios; null for distances, and for a demand above 0 with a limit of 0 (no steel at all),
   * which is over by more than any number says and comes before every other ratio.
   */
  readonly utilisation: number | null
  /** What is left over, for distances: positive is spare, negative is short; null for ratios. */
  readonly spare: number | null
  readonly steps: readonly Step[]
  /** The readings that the result rests on; its status is needs-judgement until an engineer accepts them all. */
  readonly readingIds: readonly string[]
  /** What the status is once the readings are accepted; equal to status otherwise. */
  readonly statusOnceAccepted: Exclude<Status, 'not-covered'>
  /** Set where `status` is the one on readings that are proposed and not accepted (`onProposedReadings`). */
  readonly isOnProposed?: true
  /** The layout field that mends it, where one does, with the value that would just do; named as in a refusal. */
  readonly mend: { readonly field: string; readonly value: number } | null
}

/** The method does not answer: the layout lies outside what its clause or hardware covers. */
export interface Refused extends CheckHead {
  readonly kind: 'refused'
  readonly status: 'not-covered'
  readonly code: RefusalCode
  /** The anchor's own field by its name, another record's as `tendon.strands`. */
  readonly field: string
  readonly message: string
}

export type RefusalCode =
  | 'OUTSIDE_METHOD'
  | 'OUTSIDE_APPROVAL'
  | 'UNEVEN_ROW'
  | 'DEPTH_CHANGE'
  | 'NOT_YET_CHECKED'
  | 'MISSING_INPUT'
  | 'ANCHORS_ACT_AS_ONE'

/** Common practice: measured against what is usual. Carries no status and colours nothing. */
export interface Advice extends CheckHead {
  readonly kind: 'advice'
  readonly measured: number
  readonly usual: string
  readonly unit: string
  readonly isUsual: boolean
}

export type Check = Compared | Refused | Advice

export interface ZoneResult {
  readonly zone: Zone
  readonly checks: readonly Check[]
  /** Worst status of the checks; null where there is nothing but advice. */
  readonly status: Status | null
  /** Families of checks that apply here and that this version does not make. */
  readonly notYetChecked: readonly Family[]
}

export interface PourResult {
  readonly pourId: string
  readonly basis: string
  readonly zones: readonly ZoneResult[]
  readonly counts: Readonly<Record<Status, number>>
}
