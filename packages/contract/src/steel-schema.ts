import { z } from 'zod'
import { anywhere, barDiameter, count, idSchema, notNegative, positive } from './fields'

/** Reinforcement: the shapes that can be fixed, and the zone that each belongs to. */

const spiral = {
  kind: z.literal('spiral'),
  diameterMm: barDiameter,
  outsideMm: positive,
  pitchMm: positive,
  turns: z.number().min(1).max(40),
  flatTurns: z.number().min(0).max(4).default(0),
  firstMm: anywhere.default(0),
}
const links = {
  kind: z.literal('links'),
  diameterMm: barDiameter,
  widthMm: positive,
  heightMm: positive,
  hookMm: positive,
  count: count.min(1),
  firstMm: anywhere,
  pitchMm: positive,
}
const hairpins = {
  kind: z.literal('hairpins'),
  diameterMm: barDiameter,
  legMm: positive,
  bendMm: positive,
  count: count.min(1),
  lies: z.enum(['upright', 'flat']).default('upright'),
  firstMm: anywhere.default(0),
  pitchMm: notNegative.default(0),
}
const layers = z.enum(['top', 'bottom', 'both'])

export const steelShapeSchema = z.discriminatedUnion('kind', [
  z.strictObject(spiral),
  z.strictObject(links),
  z.strictObject(hairpins),
  z.strictObject({
    kind: z.literal('edge-bars'),
    diameterMm: barDiameter,
    countTop: count,
    countBottom: count,
    firstMm: positive,
    pitchMm: positive,
    fromMm: anywhere,
    toMm: anywhere,
  }),
  z.strictObject({
    kind: z.literal('transverse-bars'),
    diameterMm: barDiameter,
    lengthMm: positive,
    count: count.min(1),
    layers,
    firstMm: notNegative,
    pitchMm: positive,
  }),
  z.strictObject({
    kind: z.literal('wedge-bars'),
    diameterMm: barDiameter,
    lengthMm: positive,
    count: count.min(1),
    layers,
  }),
  z.strictObject({
    kind: z.enum(['trimmers', 'diagonals', 'tie-back-bars', 'lap-bars']),
    diameterMm: barDiameter,
    lengthMm: positive,
    count: count.min(1),
    layers,
    runs: z.enum(['along', 'across']).default('along'),
    pitchMm: positive.default(100),
  }),
])

const isTested = z.boolean()
export const localSteelSchema = z.discriminatedUnion('kind', [
  z.strictObject({ isTested, ...spiral }),
  z.strictObject({ isTested, ...links }),
  z.strictObject({ isTested, ...hairpins }),
])

const steelZoneSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('anchor'), anchorId: idSchema }),
  z.strictObject({
    kind: z.literal('gap'),
    edgeId: idSchema,
    afterAnchorId: idSchema.nullable(),
    beforeAnchorId: idSchema.nullable(),
  }),
  z.strictObject({ kind: z.literal('edge'), edgeId: idSchema }),
  z.strictObject({ kind: z.literal('pan'), panId: idSchema }),
  z.strictObject({ kind: z.literal('joint'), jointId: idSchema }),
])

export const steelSchema = z.strictObject({
  id: idSchema,
  pourId: idSchema,
  zone: steelZoneSchema,
  shape: steelShapeSchema,
  source: z.enum(['by-hand', 'proposed', 'hardware']).default('by-hand'),
  isLocked: z.boolean().default(false),
})

export type SteelData = z.output<typeof steelSchema>
export type SteelShapeData = z.output<typeof steelShapeSchema>
export type SteelZoneData = z.output<typeof steelZoneSchema>
