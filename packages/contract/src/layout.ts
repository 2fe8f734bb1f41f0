import type { Layout } from '@wedgeline/engine'
import { z } from 'zod'
import { anywhere, azimuth, barDiameter, idSchema, label, notNegative, positive, share, text } from './fields'
import { hardwareSchema, jackSchema, strandTypeSchema } from './hardware-schema'
import { toSi } from './si'
import { steelSchema } from './steel-schema'

/**
 * The layout of a job: everything that a pour's checks and bars are made from. The layout file and the API share it.
 * Lengths mm, forces kN, stresses MPa, angles degrees; each name ends in its unit.
 */

export const LAYOUT_FORMAT = 'wedgeline.layout'
export const LAYOUT_VERSION = 1

/** Sizes that a layout may have; docs/layout-format.md names them. */
export const LIMITS = { anchors: 20_000, pours: 200, edges: 2_000, corners: 200, steel: 60_000 } as const

const pointSchema = z.strictObject({ xMm: anywhere, yMm: anywhere })
const outline = z.array(pointSchema).min(3, 'needs three points or more').max(LIMITS.corners)

/** Friction of a tendon in its duct, from memory of EN 1992-1-1 5.10.5.2; low and high are what is still credible. */
const friction = {
  frictionMu: z.number().min(0.01).max(1).default(0.19),
  frictionWobblePerM: z.number().min(0).max(0.1).default(0.0075),
  frictionMuLow: z.number().min(0.01).max(1).default(0.15),
  frictionWobbleLowPerM: z.number().min(0).max(0.1).default(0.005),
  frictionMuHigh: z.number().min(0.01).max(1).default(0.25),
  frictionWobbleHighPerM: z.number().min(0).max(0.1).default(0.01),
}

export const jobSettingsSchema = z.strictObject({
  pocketToFaceMinMm: notNegative.default(25),
  pocketToPocketMinMm: notNegative.default(25),
  clearGapMinMm: notNegative.default(20),
  nearFrom: z.number().min(0.9, 'must be 0.90 or more').max(1).default(0.95),
  fykMPa: z.number().min(200).max(700).default(500),
  stockLengthMm: z.number().min(3000).max(18000).default(12000),
  barStandard: z.enum(['bs-8666-2020', 'bs-8666-2005']).default('bs-8666-2020'),
  reinforcementGrade: label(12).default('B500B'),
  wedgeSpreadDeg: z.number().min(15).max(60).nullable().default(null),
  spreadStart: z.enum(['bearing-face', 'device-end']).default('bearing-face'),
  frictionFamily: z.enum(['inside', 'outside']).default('inside'),
  ...friction,
  deadEndForce: z.enum(['jacking', 'after-friction']).default('jacking'),
  crackWidthMm: z.number().min(0.1).max(0.4).default(0.3),
  crackTensileMPa: z.number().min(0.5).max(8).nullable().default(null),
  crackAgeDays: positive.max(365).nullable().default(null),
  crackCompressionMPa: notNegative.max(10).default(0),
  exposure: text(60).default(''),
  restraint: text(120).default(''),
  barSizesMm: z.array(barDiameter).min(1, 'needs at least one size').max(9).default([8, 10, 12, 16, 20]),
  oneLengthWithinMm: notNegative.max(1000).default(100),
  oneLengthMassKg: notNegative.max(200).default(5),
  bentDeductionMm: notNegative.max(50).default(10),
})

export const acceptedReadingSchema = z.strictObject({
  readingId: label(64),
  acceptedBy: label(120),
  acceptedAtMs: z.number().int(),
  reason: label(2000),
})

const factorSchema = z.strictObject({
  name: label(40),
  value: z.number().positive().max(100),
  reason: label(500),
})

export const BASES = ['en-1992', 'as-3600'] as const
const jobSchema = z.strictObject({
  id: idSchema,
  number: label(40),
  title: label(120),
  timeZone: label(60).default('Europe/London'),
  basis: z.enum(BASES).default('en-1992'),
  factors: z.array(factorSchema).max(40).default([]),
  readings: z.array(acceptedReadingSchema).max(40).default([]),
  settings: jobSettingsSchema.prefault({}),
})

export const levelSchema = z.strictObject({ id: idSchema, mark: label(12), title: text(120).default('') })

export const gridLineSchema = z.strictObject({
  id: idSchema,
  name: label(12),
  xMm: anywhere,
  yMm: anywhere,
  azimuthDeg: azimuth,
})

export const edgeLineSchema = z.strictObject({
  id: idSchema,
  levelId: idSchema,
  mark: label(12),
  xMm: anywhere,
  yMm: anywhere,
  azimuthDeg: azimuth,
})

export const jointSchema = z.strictObject({
  id: idSchema,
  edgeLineId: idSchema,
  kind: z.enum(['construction', 'movement']),
  firstPourId: idSchema,
})

export const obstructionSchema = z.strictObject({
  id: idSchema,
  levelId: idSchema,
  kind: z.enum(['column', 'wall', 'opening', 'sleeve', 'upstand']),
  mark: label(20),
  note: text(200).default(''),
  outline,
  cageCoverMm: notNegative.nullable().default(null),
  cageBars: text(60).default(''),
})

const stageSchema = z.strictObject({
  id: idSchema,
  name: label(40),
  share,
  strengthMPa: positive.max(120),
})

const regionSchema = z.strictObject({
  id: idSchema,
  mark: label(20),
  kind: z.enum(['edge-beam', 'band', 'drop', 'fold']),
  outline,
  topMm: anywhere,
  soffitMm: anywhere,
  coverMm: notNegative,
  linkDiameterMm: notNegative.max(40),
})

const matLayerSchema = z.strictObject({
  id: idSchema,
  face: z.enum(['top', 'bottom']),
  azimuthDeg: azimuth,
  diameterMm: barDiameter,
  spacingMm: positive,
  isOuter: z.boolean(),
  spareShare: z.number().min(0).max(1).default(0),
  spareBy: label(120).nullable().default(null),
})

/** Bars that reach the site together, by the edges and pans that they are for. */
const deliverySchema = z.strictObject({
  id: idSchema,
  name: label(40),
  /** Day of the year as ISO 8601 writes it; null where none is agreed. */
  neededOn: z.iso.date('must be a day such as 2026-03-09').nullable().default(null),
  edgeIds: z.array(idSchema).max(LIMITS.corners).default([]),
  panIds: z.array(idSchema).max(5000).default([]),
})

const cornerSchema = z.strictObject({ id: idSchema, xMm: anywhere, yMm: anywhere })

export const pourSchema = z.strictObject({
  id: idSchema,
  levelId: idSchema,
  mark: label(12),
  title: text(120).default(''),
  thicknessMm: positive,
  concrete: label(20),
  fckMPa: positive.max(120),
  aggregateMm: positive.max(80).default(20),
  coverTopMm: notNegative,
  coverSoffitMm: notNegative,
  coverEdgeMm: notNegative,
  outline: z.array(cornerSchema).min(3, 'needs three corners or more').max(LIMITS.corners),
  regions: z.array(regionSchema).max(100).default([]),
  mats: z.array(matLayerSchema).max(12).default([]),
  stages: z.array(stageSchema).min(1, 'needs at least one stage').max(6),
  markPrefix: z.string().trim().max(6).default(''),
  firstMark: z.number().int('must be a whole number').min(1).max(9000).default(1),
  deliveries: z.array(deliverySchema).max(20).default([]),
})

const edgeLengthSchema = z.strictObject({
  id: idSchema,
  fromMm: anywhere,
  toMm: anywhere,
  kind: z.enum(['free', 'construction-joint', 'movement-joint', 'against-wall']),
  topMm: anywhere,
  soffitMm: anywhere,
  jackClearMm: notNegative.nullable().default(null),
  access: text(200).default(''),
})

export const edgeSchema = z.strictObject({
  id: idSchema,
  pourId: idSchema,
  edgeLineId: idSchema,
  mark: label(12),
  cornerId: idSchema,
  isChord: z.boolean().default(false),
  lengths: z.array(edgeLengthSchema).min(1, 'needs at least one length').max(60),
})

export const panSchema = z.strictObject({
  id: idSchema,
  pourId: idSchema,
  mark: label(12),
  xMm: anywhere,
  yMm: anywhere,
  azimuthDeg: azimuth,
  alongMm: positive,
  acrossMm: positive,
  depthMm: positive,
  jackId: idSchema.nullable().default(null),
  jackTiltDeg: z.number().min(0).max(45).default(12),
  bentNoseDeg: z.number().min(0).max(45).default(0),
  headroomMm: notNegative.nullable().default(null),
  /** The engineer's own tie force behind the pan, where a strut-and-tie model gives one. */
  tieBackForceKN: positive.nullable().default(null),
  tieBackReason: text(500).default(''),
})

export const tendonSchema = z.strictObject({
  id: idSchema,
  pourId: idSchema,
  mark: label(20),
  strandTypeId: idSchema,
  strands: z.number().int('must be a whole number').min(1, 'must be 1 or more').max(61),
  jackingRatio: z.number().gt(0, 'must be more than 0').max(0.95),
  stressedFrom: z.enum(['one-end', 'both-ends']).default('one-end'),
  path: z.array(pointSchema).max(40).default([]),
  lengthMm: positive.nullable().default(null),
  drapeDeg: notNegative.max(360).nullable().default(null),
})

export const anchorSchema = z.strictObject({
  id: idSchema,
  tendonId: idSchema,
  edgeId: idSchema.nullable(),
  panId: idSchema.nullable(),
  number: z.number().int().min(1).max(9999),
  end: z.enum(['live', 'dead']),
  hardwareId: idSchema,
  castWithPourId: idSchema,
  stressedWithPourId: idSchema,
  chainageMm: anywhere,
  heightMm: anywhere,
  setBackMm: notNegative,
  skewDeg: z.number().min(-60).max(60).default(0),
  elevationDeg: z.number().min(-45).max(45).default(0),
  straightBehindMm: notNegative.nullable().default(null),
})

const barMarkSchema = z.strictObject({
  id: idSchema,
  pourId: idSchema,
  mark: z.number().int().min(1).max(9999),
  key: label(200),
})

export const concreteResultSchema = z.strictObject({
  id: idSchema,
  pourId: idSchema,
  ageHours: positive,
  cured: text(120),
  certificate: text(120),
  specimensMPa: z.array(positive.max(200)).min(1, 'needs at least one specimen').max(60),
})

export const layoutSchema = z.strictObject({
  format: z.literal(LAYOUT_FORMAT, `must be "${LAYOUT_FORMAT}"`),
  version: z.literal(LAYOUT_VERSION, `must be ${LAYOUT_VERSION}, the only version that this build reads`),
  job: jobSchema,
  levels: z.array(levelSchema).max(100),
  gridLines: z.array(gridLineSchema).max(400).default([]),
  strandTypes: z.array(strandTypeSchema).max(100).default([]),
  jacks: z.array(jackSchema).max(100).default([]),
  hardware: z.array(hardwareSchema).max(200).default([]),
  edgeLines: z.array(edgeLineSchema).max(LIMITS.edges).default([]),
  joints: z.array(jointSchema).max(200).default([]),
  obstructions: z.array(obstructionSchema).max(5000).default([]),
  pours: z.array(pourSchema).max(LIMITS.pours),
  edges: z.array(edgeSchema).max(LIMITS.edges).default([]),
  pans: z.array(panSchema).max(5000).default([]),
  tendons: z.array(tendonSchema).max(LIMITS.anchors).default([]),
  anchors: z.array(anchorSchema).max(LIMITS.anchors).default([]),
  steel: z.array(steelSchema).max(LIMITS.steel).default([]),
  barMarks: z.array(barMarkSchema).max(LIMITS.steel).default([]),
  concreteResults: z.array(concreteResultSchema).max(5000).default([]),
})

export type LayoutFile = z.output<typeof layoutSchema>
export type LayoutInput = z.input<typeof layoutSchema>
export type JobData = z.output<typeof jobSchema>
export type PourData = z.output<typeof pourSchema>
export type EdgeData = z.output<typeof edgeSchema>
export type EdgeLineData = z.output<typeof edgeLineSchema>
export type PanData = z.output<typeof panSchema>
export type TendonData = z.output<typeof tendonSchema>
export type AnchorData = z.output<typeof anchorSchema>

/** A layout file in the engine's units and names. */
export const toEngine = (file: LayoutFile): Layout => toSi(file)
