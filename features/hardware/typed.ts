import {
  hardwareProblems,
  hardwareSchema,
  jackSchema,
  strandTypeSchema,
  type HardwareData,
  type JackData,
  type StrandTypeData,
} from '@wedgeline/contract'
import type { z } from 'zod'

/** The same data while somebody types it: a number that is not there yet is null. */
export type Typed<T> = T extends number
  ? number | null
  : T extends readonly (infer Item)[]
    ? readonly Typed<Item>[]
    : T extends object
      ? { readonly [K in keyof T]: Typed<T[K]> }
      : T

export type TypedHardware = Typed<HardwareData>
export type TypedApproval = NonNullable<TypedHardware['approval']>
export type TypedSteel = NonNullable<TypedHardware['localSteel']>

/** First message of each field by its path: `plate.widthMm`. */
export type Errors = Readonly<Record<string, string>>

export interface Read<T> {
  readonly data: T | null
  readonly errors: Errors
}

export const readJack = (typed: unknown): Read<JackData> => read(jackSchema, typed)

/** By the schema, and by what its sizes say of one another. */
export function readHardware(typed: unknown): Read<HardwareData> {
  const { data, errors } = read(hardwareSchema, typed)
  return data ? sound(data, { hardware: [data], strandTypes: [] }) : { data, errors }
}

export function readStrandType(typed: unknown): Read<StrandTypeData> {
  const { data, errors } = read(strandTypeSchema, typed)
  return data ? sound(data, { hardware: [], strandTypes: [data] }) : { data, errors }
}

function sound<T>(data: T, rows: Parameters<typeof hardwareProblems>[0]): Read<T> {
  const refused = hardwareProblems(rows).filter(({ severity }) => severity === 'refused')
  if (refused.length === 0) return { data, errors: {} }
  // A path begins with the table and the row, which the form is about as a whole.
  const messages = refused.map(({ path, message }): [string, string] => [path.slice(2).join('.'), `${message}.`])
  return { data: null, errors: Object.fromEntries(messages.reverse()) }
}

function read<S extends z.ZodType>(schema: S, typed: unknown): Read<z.output<S>> {
  const result = schema.safeParse(typed, { error: wordsOf })
  if (result.success) return { data: result.data, errors: {} }
  const messages = result.error.issues.map(({ path, message }): [string, string] => [
    path.map(String).join('.'),
    `It ${message}.`,
  ])
  return { data: null, errors: Object.fromEntries(messages.reverse()) }
}

/** Words for what the schema has no sentence of its own for. */
function wordsOf(issue: z.core.$ZodRawIssue): string | undefined {
  if (issue.code === 'invalid_type') return issue.expected === 'number' ? 'needs a number' : 'cannot be read'
  if (issue.code === 'too_small') return `must be ${String(issue.minimum)} or more`
  if (issue.code === 'too_big') return `must be at most ${String(issue.maximum)}`
  return undefined
}

const NO_SIZE = { widthMm: null, heightMm: null }

const NO_DISTANCES = {
  spacingAlongMinMm: null,
  spacingHeightMinMm: null,
  edgeAlongMinMm: null,
  edgeHeightMinMm: null,
}

export const newHardware = (id: string): TypedHardware => ({
  id,
  name: '',
  description: '',
  kind: 'plate',
  ends: 'live',
  strandsMax: null,
  approval: null,
  plate: NO_SIZE,
  hole: { ...NO_SIZE, isRound: false },
  duct: { ...NO_SIZE, isRound: false },
  pocket: { ...NO_SIZE, depthMm: null },
  deviceLengthMm: 0,
  splayLengthMm: null,
  transmissionLengthMm: null,
  ...NO_DISTANCES,
  straightBehindMinMm: null,
  strandTailMinMm: null,
  drawInMm: null,
  localSteel: null,
  jackId: null,
})

export const NEW_STRENGTH: TypedApproval['strengths'][number] = { share: null, strengthMinMPa: null, ...NO_DISTANCES }

/** A round opening has one size; the form asks for it once. */
export function roundsAligned(typed: TypedHardware): TypedHardware {
  const one = <T extends { readonly isRound: boolean; readonly widthMm: number | null }>(opening: T): T =>
    opening.isRound ? { ...opening, heightMm: opening.widthMm } : opening
  return { ...typed, hole: typed.hole && one(typed.hole), duct: one(typed.duct) }
}

/** What a bonded splay cannot have goes; what was typed for a plate comes back with the form that keeps it. */
export function asKind(typed: TypedHardware, kind: TypedHardware['kind']): TypedHardware {
  if (kind === 'bonded-splay') return { ...typed, kind, ends: 'dead', hole: null, pocket: null }
  return { ...typed, kind, splayLengthMm: null, hole: typed.hole ?? { ...NO_SIZE, isRound: false } }
}

export const newSteel = (kind: TypedSteel['kind']): TypedSteel => {
  const base = { isTested: false, diameterMm: null, firstMm: null, pitchMm: null }
  if (kind === 'spiral') return { ...base, kind, outsideMm: null, turns: null, flatTurns: 0 }
  if (kind === 'links') return { ...base, kind, widthMm: null, heightMm: null, hookMm: null, count: null }
  return { ...base, kind, legMm: null, bendMm: null, count: null, lies: 'upright' }
}
