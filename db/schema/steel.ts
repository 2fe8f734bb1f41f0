import { sql } from 'drizzle-orm'
import { check, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { SteelShapeData } from '@wedgeline/contract'
import { isJson, oneOf, stamps } from './columns'
import { anchor, edge, pan } from './edge'
import { jobKeys, layoutKeys, pointsAt, sameJob } from './job-rows'
import { joint, pour } from './pour'

const ZONE_KINDS = ['anchor', 'gap', 'edge', 'pan', 'joint'] as const
const SOURCES = ['by-hand', 'proposed', 'hardware'] as const

/** A set of bars; which columns name its zone follows from the kind of zone. */
export const steel = sqliteTable(
  'steel',
  {
    ...jobKeys(),
    pourId: text('pour_id').notNull(),
    zoneKind: text('zone_kind', { enum: ZONE_KINDS }).notNull(),
    anchorId: text('anchor_id'),
    edgeId: text('edge_id'),
    afterAnchorId: text('after_anchor_id'),
    beforeAnchorId: text('before_anchor_id'),
    panId: text('pan_id'),
    jointId: text('joint_id'),
    shape: text('shape', { mode: 'json' }).$type<SteelShapeData>().notNull(),
    source: text('source', { enum: SOURCES }).notNull(),
    isLocked: integer('is_locked', { mode: 'boolean' }).notNull(),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('steel', t),
    sameJob(t, t.pourId, pour),
    sameJob(t, t.anchorId, anchor),
    sameJob(t, t.edgeId, edge),
    sameJob(t, t.afterAnchorId, anchor),
    sameJob(t, t.beforeAnchorId, anchor),
    sameJob(t, t.panId, pan),
    sameJob(t, t.jointId, joint),
    pointsAt('steel_anchor', t, t.anchorId),
    pointsAt('steel_edge', t, t.edgeId),
    pointsAt('steel_after_anchor', t, t.afterAnchorId),
    pointsAt('steel_before_anchor', t, t.beforeAnchorId),
    pointsAt('steel_pan', t, t.panId),
    oneOf('steel_zone_kind', t.zoneKind, ZONE_KINDS),
    check('steel_zone_anchor', sql`(${t.anchorId} is not null) = (${t.zoneKind} = 'anchor')`),
    check('steel_zone_edge', sql`(${t.edgeId} is not null) = (${t.zoneKind} in ('gap', 'edge'))`),
    check('steel_zone_gap', sql`${t.zoneKind} = 'gap' or (${t.afterAnchorId} is null and ${t.beforeAnchorId} is null)`),
    check('steel_zone_pan', sql`(${t.panId} is not null) = (${t.zoneKind} = 'pan')`),
    check('steel_zone_joint', sql`(${t.jointId} is not null) = (${t.zoneKind} = 'joint')`),
    isJson('steel_shape_json', t.shape),
    oneOf('steel_source', t.source, SOURCES),
  ],
)
