import { z } from 'zod'
import { idSchema, label, notNegative, positive, rectangle, share, text } from './fields'
import { localSteelSchema } from './steel-schema'

/** What a company presses and bears on: strand types, jacks, anchorages with their approval. */

export const strandTypeSchema = z.strictObject({
  id: idSchema,
  name: label(60),
  diameterMm: positive,
  areaMm2: positive,
  breakingLoadKN: positive,
  proofLoadKN: positive,
  modulusMPa: z.number().min(150_000).max(250_000).default(195_000),
})

export const jackSchema = z.strictObject({
  id: idSchema,
  name: label(60),
  description: text(200).default(''),
  closedLengthMm: positive,
  strokeMm: notNegative,
  strandTailMm: notNegative,
  handRoomMm: notNegative,
  bodyDiameterMm: positive,
  noseDiameterMm: positive,
  noseLengthMm: notNegative,
  bentNoseMaxDeg: z.number().min(0).max(45),
  sideRoomMm: notNegative,
  roomAboveMm: notNegative,
})

const opening = z.strictObject({ ...rectangle, isRound: z.boolean() })

const distances = {
  spacingAlongMinMm: positive,
  spacingHeightMinMm: positive,
  edgeAlongMinMm: positive,
  edgeHeightMinMm: positive,
}

const approvalSchema = z.strictObject({
  reference: label(120),
  strengths: z
    .array(z.strictObject({ share, strengthMinMPa: positive.max(120), ...distances }))
    .min(1, 'needs at least one smallest strength')
    .max(12),
})

export const hardwareSchema = z.strictObject({
  id: idSchema,
  name: label(60),
  description: text(200).default(''),
  kind: z.enum(['plate', 'bonded-splay']),
  ends: z.enum(['live', 'dead', 'both']),
  strandsMax: z.number().int().min(1).max(61),
  approval: approvalSchema.nullable().default(null),
  plate: z.strictObject(rectangle),
  hole: opening.nullable(),
  duct: opening,
  pocket: z.strictObject({ ...rectangle, depthMm: positive }).nullable(),
  deviceLengthMm: notNegative.default(0),
  splayLengthMm: positive.nullable().default(null),
  transmissionLengthMm: positive.nullable().default(null),
  ...distances,
  straightBehindMinMm: notNegative,
  strandTailMinMm: notNegative,
  drawInMm: notNegative,
  localSteel: localSteelSchema.nullable().default(null),
  jackId: idSchema.nullable().default(null),
})

export type HardwareData = z.output<typeof hardwareSchema>
export type StrandTypeData = z.output<typeof strandTypeSchema>
export type JackData = z.output<typeof jackSchema>
