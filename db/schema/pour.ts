import { sql } from 'drizzle-orm'
import { check, integer, real, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core'
import type { PourData } from '@wedgeline/contract'
import { allPositive, isJson, noneNegative, oneOf, stamps } from './columns'
import { jobKeys, layoutKeys, sameJob } from './job-rows'
import { edgeLine, level } from './level'

export const pour = sqliteTable(
  'pour',
  {
    ...jobKeys(),
    levelId: text('level_id').notNull(),
    mark: text('mark').notNull(),
    title: text('title').notNull(),
    thicknessMm: real('thickness_mm').notNull(),
    concrete: text('concrete').notNull(),
    fckMPa: real('fck_mpa').notNull(),
    aggregateMm: real('aggregate_mm').notNull(),
    coverTopMm: real('cover_top_mm').notNull(),
    coverSoffitMm: real('cover_soffit_mm').notNull(),
    coverEdgeMm: real('cover_edge_mm').notNull(),
    markPrefix: text('mark_prefix').notNull().default(''),
    firstMark: integer('first_mark').notNull().default(1),
    deliveries: text('deliveries', { mode: 'json' }).$type<PourData['deliveries']>().notNull().default([]),
    version: integer('version').notNull(),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('pour', t),
    sameJob(t, t.levelId, level),
    allPositive('pour_sizes', [t.thicknessMm, t.fckMPa, t.aggregateMm]),
    check('pour_fck', sql`${t.fckMPa} <= 120`),
    noneNegative('pour_covers', [t.coverTopMm, t.coverSoffitMm, t.coverEdgeMm]),
  ],
)

export const joint = sqliteTable(
  'joint',
  {
    ...jobKeys(),
    edgeLineId: text('edge_line_id').notNull(),
    kind: text('kind', { enum: ['construction', 'movement'] }).notNull(),
    firstPourId: text('first_pour_id').notNull(),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('joint', t),
    sameJob(t, t.edgeLineId, edgeLine),
    sameJob(t, t.firstPourId, pour),
    oneOf('joint_kind', t.kind, ['construction', 'movement']),
  ],
)

/** Key columns of the rows that a pour consists of, in their order. */
const pourPart = () => ({ ...jobKeys(), pourId: text('pour_id').notNull(), position: integer('position').notNull() })

export const corner = sqliteTable(
  'corner',
  { ...pourPart(), xMm: real('x_mm').notNull(), yMm: real('y_mm').notNull() },
  (t) => [
    ...layoutKeys('corner', t),
    sameJob(t, t.pourId, pour),
    unique('corner_position').on(t.companyId, t.pourId, t.position),
  ],
)

const REGION_KINDS = ['edge-beam', 'band', 'drop', 'fold'] as const

export const region = sqliteTable(
  'region',
  {
    ...pourPart(),
    mark: text('mark').notNull(),
    kind: text('kind', { enum: REGION_KINDS }).notNull(),
    outline: text('outline', { mode: 'json' }).$type<PourData['regions'][number]['outline']>().notNull(),
    topMm: real('top_mm').notNull(),
    soffitMm: real('soffit_mm').notNull(),
    coverMm: real('cover_mm').notNull(),
    linkDiameterMm: real('link_diameter_mm').notNull(),
  },
  (t) => [
    ...layoutKeys('region', t),
    sameJob(t, t.pourId, pour),
    unique('region_position').on(t.companyId, t.pourId, t.position),
    oneOf('region_kind', t.kind, REGION_KINDS),
    isJson('region_outline_json', t.outline),
    noneNegative('region_sizes', [t.coverMm, t.linkDiameterMm]),
  ],
)

export const matLayer = sqliteTable(
  'mat_layer',
  {
    ...pourPart(),
    face: text('face', { enum: ['top', 'bottom'] }).notNull(),
    azimuthDeg: real('azimuth_deg').notNull(),
    diameterMm: real('diameter_mm').$type<PourData['mats'][number]['diameterMm']>().notNull(),
    spacingMm: real('spacing_mm').notNull(),
    isOuter: integer('is_outer', { mode: 'boolean' }).notNull(),
    spareShare: real('spare_share').notNull(),
    spareBy: text('spare_by'),
  },
  (t) => [
    ...layoutKeys('mat_layer', t),
    sameJob(t, t.pourId, pour),
    unique('mat_layer_position').on(t.companyId, t.pourId, t.position),
    oneOf('mat_layer_face', t.face, ['top', 'bottom']),
    allPositive('mat_layer_sizes', [t.diameterMm, t.spacingMm]),
    check('mat_layer_spare', sql`${t.spareShare} between 0 and 1`),
  ],
)

export const stage = sqliteTable(
  'stage',
  {
    ...pourPart(),
    name: text('name').notNull(),
    share: real('share').notNull(),
    strengthMPa: real('strength_mpa').notNull(),
  },
  (t) => [
    ...layoutKeys('stage', t),
    sameJob(t, t.pourId, pour),
    unique('stage_position').on(t.companyId, t.pourId, t.position),
    check('stage_share', sql`${t.share} > 0 and ${t.share} <= 1`),
    check('stage_strength', sql`${t.strengthMPa} > 0 and ${t.strengthMPa} <= 120`),
  ],
)

export const concreteResult = sqliteTable(
  'concrete_result',
  {
    ...jobKeys(),
    pourId: text('pour_id').notNull(),
    ageHours: real('age_hours').notNull(),
    cured: text('cured').notNull(),
    certificate: text('certificate').notNull(),
    specimensMPa: text('specimens_mpa', { mode: 'json' }).$type<number[]>().notNull(),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('concrete_result', t),
    sameJob(t, t.pourId, pour),
    allPositive('concrete_result_age', [t.ageHours]),
    isJson('concrete_result_specimens_json', t.specimensMPa),
  ],
)

/** A mark once given keeps its bar and is never given again. */
export const barMark = sqliteTable(
  'bar_mark',
  {
    ...jobKeys(),
    pourId: text('pour_id').notNull(),
    mark: integer('mark').notNull(),
    key: text('key').notNull(),
    createdAtMs: integer('created_at_ms').notNull(),
  },
  (t) => [
    ...layoutKeys('bar_mark', t),
    sameJob(t, t.pourId, pour),
    unique('bar_mark_mark').on(t.companyId, t.pourId, t.mark),
    unique('bar_mark_key').on(t.companyId, t.pourId, t.key),
    check('bar_mark_range', sql`${t.mark} between 1 and 9999`),
  ],
)
