import { sql } from 'drizzle-orm'
import { check, foreignKey, integer, primaryKey, real, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { HardwareData } from '@wedgeline/contract'
import { allPositive, isJson, noneNegative, oneOf, stamps } from './columns'
import { company } from './person'

const companyId = () =>
  text('company_id')
    .notNull()
    .references(() => company.id)

export const strandType = sqliteTable(
  'strand_type',
  {
    companyId: companyId(),
    id: text('id').notNull(),
    name: text('name').notNull(),
    diameterMm: real('diameter_mm').notNull(),
    areaMm2: real('area_mm2').notNull(),
    breakingLoadKN: real('breaking_load_kn').notNull(),
    proofLoadKN: real('proof_load_kn').notNull(),
    modulusMPa: real('modulus_mpa').notNull().default(195_000),
    ...stamps(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    allPositive('strand_type_sizes', [t.diameterMm, t.areaMm2, t.breakingLoadKN, t.proofLoadKN]),
  ],
)

export const jack = sqliteTable(
  'jack',
  {
    companyId: companyId(),
    id: text('id').notNull(),
    name: text('name').notNull(),
    description: text('description').notNull(),
    closedLengthMm: real('closed_length_mm').notNull(),
    strokeMm: real('stroke_mm').notNull(),
    strandTailMm: real('strand_tail_mm').notNull(),
    handRoomMm: real('hand_room_mm').notNull(),
    bodyDiameterMm: real('body_diameter_mm').notNull(),
    noseDiameterMm: real('nose_diameter_mm').notNull(),
    noseLengthMm: real('nose_length_mm').notNull(),
    bentNoseMaxDeg: real('bent_nose_max_deg').notNull(),
    sideRoomMm: real('side_room_mm').notNull(),
    roomAboveMm: real('room_above_mm').notNull(),
    ...stamps(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    allPositive('jack_sizes', [t.closedLengthMm, t.bodyDiameterMm, t.noseDiameterMm]),
    noneNegative('jack_rooms', [t.strokeMm, t.strandTailMm, t.handRoomMm, t.noseLengthMm, t.sideRoomMm, t.roomAboveMm]),
    check('jack_bent_nose', sql`${t.bentNoseMaxDeg} between 0 and 45`),
  ],
)

export const hardware = sqliteTable(
  'hardware',
  {
    companyId: companyId(),
    id: text('id').notNull(),
    name: text('name').notNull(),
    description: text('description').notNull(),
    kind: text('kind', { enum: ['plate', 'bonded-splay'] }).notNull(),
    ends: text('ends', { enum: ['live', 'dead', 'both'] }).notNull(),
    strandsMax: integer('strands_max').notNull(),
    /** Null where the hardware has no approval; its strengths are rows of `approval_strength`. */
    approvalReference: text('approval_reference'),
    plateWidthMm: real('plate_width_mm').notNull(),
    plateHeightMm: real('plate_height_mm').notNull(),
    holeWidthMm: real('hole_width_mm'),
    holeHeightMm: real('hole_height_mm'),
    holeIsRound: integer('hole_is_round', { mode: 'boolean' }),
    ductWidthMm: real('duct_width_mm').notNull(),
    ductHeightMm: real('duct_height_mm').notNull(),
    ductIsRound: integer('duct_is_round', { mode: 'boolean' }).notNull(),
    pocketWidthMm: real('pocket_width_mm'),
    pocketHeightMm: real('pocket_height_mm'),
    pocketDepthMm: real('pocket_depth_mm'),
    deviceLengthMm: real('device_length_mm').notNull(),
    splayLengthMm: real('splay_length_mm'),
    transmissionLengthMm: real('transmission_length_mm'),
    spacingAlongMinMm: real('spacing_along_min_mm').notNull(),
    spacingHeightMinMm: real('spacing_height_min_mm').notNull(),
    edgeAlongMinMm: real('edge_along_min_mm').notNull(),
    edgeHeightMinMm: real('edge_height_min_mm').notNull(),
    straightBehindMinMm: real('straight_behind_min_mm').notNull(),
    strandTailMinMm: real('strand_tail_min_mm').notNull(),
    drawInMm: real('draw_in_mm').notNull(),
    localSteel: text('local_steel', { mode: 'json' }).$type<NonNullable<HardwareData['localSteel']>>(),
    jackId: text('jack_id'),
    ...stamps(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.jackId], foreignColumns: [jack.companyId, jack.id] }),
    oneOf('hardware_kind', t.kind, ['plate', 'bonded-splay']),
    oneOf('hardware_ends', t.ends, ['live', 'dead', 'both']),
    check('hardware_strands', sql`${t.strandsMax} between 1 and 61`),
    allPositive('hardware_sizes', [t.plateWidthMm, t.plateHeightMm, t.ductWidthMm, t.ductHeightMm]),
    allPositive('hardware_hole', [t.holeWidthMm, t.holeHeightMm]),
    allPositive('hardware_pocket', [t.pocketWidthMm, t.pocketHeightMm, t.pocketDepthMm]),
    allPositive('hardware_lengths', [t.splayLengthMm, t.transmissionLengthMm]),
    allPositive('hardware_distances', [t.spacingAlongMinMm, t.spacingHeightMinMm, t.edgeAlongMinMm, t.edgeHeightMinMm]),
    noneNegative('hardware_tails', [t.deviceLengthMm, t.straightBehindMinMm, t.strandTailMinMm, t.drawInMm]),
    check(
      'hardware_hole_whole',
      sql`(${t.holeWidthMm} is null) = (${t.holeHeightMm} is null) and (${t.holeWidthMm} is null) = (${t.holeIsRound} is null)`,
    ),
    check(
      'hardware_pocket_whole',
      sql`(${t.pocketWidthMm} is null) = (${t.pocketHeightMm} is null) and (${t.pocketWidthMm} is null) = (${t.pocketDepthMm} is null)`,
    ),
    isJson('hardware_local_steel_json', t.localSteel),
  ],
)

export const approvalStrength = sqliteTable(
  'approval_strength',
  {
    companyId: text('company_id').notNull(),
    hardwareId: text('hardware_id').notNull(),
    position: integer('position').notNull(),
    share: real('share').notNull(),
    strengthMinMPa: real('strength_min_mpa').notNull(),
    spacingAlongMinMm: real('spacing_along_min_mm').notNull(),
    spacingHeightMinMm: real('spacing_height_min_mm').notNull(),
    edgeAlongMinMm: real('edge_along_min_mm').notNull(),
    edgeHeightMinMm: real('edge_height_min_mm').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.hardwareId, t.position] }),
    foreignKey({
      columns: [t.companyId, t.hardwareId],
      foreignColumns: [hardware.companyId, hardware.id],
    }).onDelete('restrict'),
    check('approval_strength_share', sql`${t.share} > 0 and ${t.share} <= 1`),
    check('approval_strength_strength', sql`${t.strengthMinMPa} > 0 and ${t.strengthMinMPa} <= 120`),
    allPositive('approval_strength_distances', [
      t.spacingAlongMinMm,
      t.spacingHeightMinMm,
      t.edgeAlongMinMm,
      t.edgeHeightMinMm,
    ]),
  ],
)
