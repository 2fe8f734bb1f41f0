import { sql } from 'drizzle-orm'
import { check, foreignKey, integer, real, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core'
import type { TendonData } from '@wedgeline/contract'
import { allPositive, isJson, noneNegative, oneOf, stamps } from './columns'
import { hardware, jack, strandType } from './hardware'
import { jobKeys, layoutKeys, pointsAt, sameJob } from './job-rows'
import { edgeLine } from './level'
import { corner, pour } from './pour'

export const edge = sqliteTable(
  'edge',
  {
    ...jobKeys(),
    pourId: text('pour_id').notNull(),
    edgeLineId: text('edge_line_id').notNull(),
    mark: text('mark').notNull(),
    cornerId: text('corner_id').notNull(),
    isChord: integer('is_chord', { mode: 'boolean' }).notNull(),
    version: integer('version').notNull(),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('edge', t),
    sameJob(t, t.pourId, pour),
    sameJob(t, t.edgeLineId, edgeLine),
    sameJob(t, t.cornerId, corner),
  ],
)

const LENGTH_KINDS = ['free', 'construction-joint', 'movement-joint', 'against-wall'] as const

export const edgeLength = sqliteTable(
  'edge_length',
  {
    ...jobKeys(),
    edgeId: text('edge_id').notNull(),
    position: integer('position').notNull(),
    fromMm: real('from_mm').notNull(),
    toMm: real('to_mm').notNull(),
    kind: text('kind', { enum: LENGTH_KINDS }).notNull(),
    topMm: real('top_mm').notNull(),
    soffitMm: real('soffit_mm').notNull(),
    jackClearMm: real('jack_clear_mm'),
    access: text('access').notNull(),
  },
  (t) => [
    ...layoutKeys('edge_length', t),
    sameJob(t, t.edgeId, edge),
    unique('edge_length_position').on(t.companyId, t.edgeId, t.position),
    oneOf('edge_length_kind', t.kind, LENGTH_KINDS),
    noneNegative('edge_length_jack', [t.jackClearMm]),
  ],
)

export const pan = sqliteTable(
  'pan',
  {
    ...jobKeys(),
    pourId: text('pour_id').notNull(),
    mark: text('mark').notNull(),
    xMm: real('x_mm').notNull(),
    yMm: real('y_mm').notNull(),
    azimuthDeg: real('azimuth_deg').notNull(),
    alongMm: real('along_mm').notNull(),
    acrossMm: real('across_mm').notNull(),
    depthMm: real('depth_mm').notNull(),
    jackId: text('jack_id'),
    jackTiltDeg: real('jack_tilt_deg').notNull(),
    bentNoseDeg: real('bent_nose_deg').notNull(),
    headroomMm: real('headroom_mm'),
    tieBackForceKN: real('tie_back_force_kn'),
    tieBackReason: text('tie_back_reason').notNull().default(''),
    version: integer('version').notNull(),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('pan', t),
    sameJob(t, t.pourId, pour),
    foreignKey({ columns: [t.companyId, t.jackId], foreignColumns: [jack.companyId, jack.id] }),
    allPositive('pan_sizes', [t.alongMm, t.acrossMm, t.depthMm]),
    noneNegative('pan_headroom', [t.headroomMm]),
    check('pan_angles', sql`${t.jackTiltDeg} between 0 and 45 and ${t.bentNoseDeg} between 0 and 45`),
  ],
)

export const tendon = sqliteTable(
  'tendon',
  {
    ...jobKeys(),
    pourId: text('pour_id').notNull(),
    mark: text('mark').notNull(),
    strandTypeId: text('strand_type_id').notNull(),
    strands: integer('strands').notNull(),
    jackingRatio: real('jacking_ratio').notNull(),
    stressedFrom: text('stressed_from', { enum: ['one-end', 'both-ends'] }).notNull(),
    path: text('path', { mode: 'json' }).$type<TendonData['path']>().notNull(),
    lengthMm: real('length_mm'),
    drapeDeg: real('drape_deg'),
    version: integer('version').notNull(),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('tendon', t),
    sameJob(t, t.pourId, pour),
    foreignKey({ columns: [t.companyId, t.strandTypeId], foreignColumns: [strandType.companyId, strandType.id] }),
    check('tendon_strands', sql`${t.strands} between 1 and 61`),
    check('tendon_ratio', sql`${t.jackingRatio} > 0 and ${t.jackingRatio} <= 0.95`),
    oneOf('tendon_stressed_from', t.stressedFrom, ['one-end', 'both-ends']),
    isJson('tendon_path_json', t.path),
    allPositive('tendon_length', [t.lengthMm]),
    noneNegative('tendon_drape', [t.drapeDeg]),
  ],
)

export const anchor = sqliteTable(
  'anchor',
  {
    ...jobKeys(),
    tendonId: text('tendon_id').notNull(),
    edgeId: text('edge_id'),
    panId: text('pan_id'),
    number: integer('number').notNull(),
    end: text('end', { enum: ['live', 'dead'] }).notNull(),
    hardwareId: text('hardware_id').notNull(),
    castWithPourId: text('cast_with_pour_id').notNull(),
    stressedWithPourId: text('stressed_with_pour_id').notNull(),
    chainageMm: real('chainage_mm').notNull(),
    heightMm: real('height_mm').notNull(),
    setBackMm: real('set_back_mm').notNull(),
    skewDeg: real('skew_deg').notNull(),
    elevationDeg: real('elevation_deg').notNull(),
    straightBehindMm: real('straight_behind_mm'),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('anchor', t),
    sameJob(t, t.tendonId, tendon),
    sameJob(t, t.edgeId, edge),
    sameJob(t, t.panId, pan),
    sameJob(t, t.castWithPourId, pour),
    sameJob(t, t.stressedWithPourId, pour),
    foreignKey({ columns: [t.companyId, t.hardwareId], foreignColumns: [hardware.companyId, hardware.id] }),
    pointsAt('anchor_tendon', t, t.tendonId),
    pointsAt('anchor_edge', t, t.edgeId),
    pointsAt('anchor_pan', t, t.panId),
    check('anchor_place', sql`(${t.edgeId} is null) <> (${t.panId} is null)`),
    check('anchor_number', sql`${t.number} between 1 and 9999`),
    oneOf('anchor_end', t.end, ['live', 'dead']),
    noneNegative('anchor_distances', [t.setBackMm, t.straightBehindMm]),
    check('anchor_angles', sql`${t.skewDeg} between -60 and 60 and ${t.elevationDeg} between -45 and 45`),
  ],
)
