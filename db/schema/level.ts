import { real, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { isJson, noneNegative, oneOf, stamps } from './columns'
import { jobKeys, layoutKeys, sameJob } from './job-rows'
import type { LayoutFile } from '@wedgeline/contract'

export const level = sqliteTable(
  'level',
  { ...jobKeys(), mark: text('mark').notNull(), title: text('title').notNull(), ...stamps() },
  (t) => layoutKeys('level', t),
)

export const gridLine = sqliteTable(
  'grid_line',
  {
    ...jobKeys(),
    name: text('name').notNull(),
    xMm: real('x_mm').notNull(),
    yMm: real('y_mm').notNull(),
    azimuthDeg: real('azimuth_deg').notNull(),
    ...stamps(),
  },
  (t) => layoutKeys('grid_line', t),
)

export const edgeLine = sqliteTable(
  'edge_line',
  {
    ...jobKeys(),
    levelId: text('level_id').notNull(),
    mark: text('mark').notNull(),
    xMm: real('x_mm').notNull(),
    yMm: real('y_mm').notNull(),
    azimuthDeg: real('azimuth_deg').notNull(),
    ...stamps(),
  },
  (t) => [...layoutKeys('edge_line', t), sameJob(t, t.levelId, level)],
)

const OBSTRUCTION_KINDS = ['column', 'wall', 'opening', 'sleeve', 'upstand'] as const

export const obstruction = sqliteTable(
  'obstruction',
  {
    ...jobKeys(),
    levelId: text('level_id').notNull(),
    kind: text('kind', { enum: OBSTRUCTION_KINDS }).notNull(),
    mark: text('mark').notNull(),
    note: text('note').notNull(),
    outline: text('outline', { mode: 'json' }).$type<LayoutFile['obstructions'][number]['outline']>().notNull(),
    cageCoverMm: real('cage_cover_mm'),
    cageBars: text('cage_bars').notNull(),
    ...stamps(),
  },
  (t) => [
    ...layoutKeys('obstruction', t),
    sameJob(t, t.levelId, level),
    oneOf('obstruction_kind', t.kind, OBSTRUCTION_KINDS),
    isJson('obstruction_outline_json', t.outline),
    noneNegative('obstruction_cage_cover', [t.cageCoverMm]),
  ],
)
