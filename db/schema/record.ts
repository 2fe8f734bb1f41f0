import { sql } from 'drizzle-orm'
import { check, foreignKey, index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import type { PourResult, ZoneResult } from '@wedgeline/engine'
import { isJson, oneOf } from './columns'
import { job } from './job'
import { jobKeys, layoutKeys } from './job-rows'
import { company, person } from './person'
import { pour } from './pour'

/**
 * A batch of commands that was stored, with what its sender was answered, so that a repeat gets the same. Results are
 * not kept with it: they would be most of the database, and the latest ones of each pour are what counts.
 */
export const batch = sqliteTable(
  'batch',
  {
    ...jobKeys(),
    personId: text('person_id')
      .notNull()
      .references(() => person.id, { onDelete: 'restrict' }),
    payloadHash: text('payload_hash').notNull(),
    versions: text('versions', { mode: 'json' }).$type<Record<string, number>>().notNull(),
    pourIds: text('pour_ids', { mode: 'json' }).$type<string[]>().notNull(),
    changeNumber: integer('change_number').notNull(),
    atMs: integer('at_ms').notNull(),
  },
  (t) => [
    ...layoutKeys('batch', t),
    isJson('batch_versions_json', t.versions),
    isJson('batch_pour_ids_json', t.pourIds),
  ],
)

/** Who did what and when, with what was there before and after. Rows are added, never changed or deleted. */
export const audit = sqliteTable(
  'audit',
  {
    companyId: text('company_id')
      .notNull()
      .references(() => company.id, { onDelete: 'restrict' }),
    id: text('id').notNull(),
    /** Null for what belongs to the company and not to a job. */
    jobId: text('job_id'),
    personId: text('person_id')
      .notNull()
      .references(() => person.id, { onDelete: 'restrict' }),
    atMs: integer('at_ms').notNull(),
    /** Name of the procedure. */
    what: text('what').notNull(),
    before: text('before', { mode: 'json' }).$type<unknown>(),
    after: text('after', { mode: 'json' }).$type<unknown>(),
    /** The job's change count, where the layout changed. */
    changeNumber: integer('change_number'),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [job.companyId, job.id] }).onDelete('restrict'),
    index('audit_job_at').on(t.companyId, t.jobId, t.atMs, t.id),
    index('audit_job_change').on(t.companyId, t.jobId, t.changeNumber),
  ],
)

/** Latest results of a pour, without steps. */
export const pourResult = sqliteTable(
  'pour_result',
  {
    companyId: text('company_id').notNull(),
    jobId: text('job_id').notNull(),
    pourId: text('pour_id').notNull(),
    results: text('results', { mode: 'json' }).$type<ZoneResult[]>().notNull(),
    counts: text('counts', { mode: 'json' }).$type<PourResult['counts']>().notNull(),
    /** Readings that the results rest on, accepted or not. */
    readingIds: text('reading_ids', { mode: 'json' }).$type<string[]>().notNull(),
    engineVersion: text('engine_version').notNull(),
    changeNumber: integer('change_number').notNull(),
    atMs: integer('at_ms').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.jobId, t.pourId] }),
    foreignKey({
      columns: [t.companyId, t.jobId, t.pourId],
      foreignColumns: [pour.companyId, pour.jobId, pour.id],
    }),
    isJson('pour_result_results_json', t.results),
    isJson('pour_result_counts_json', t.counts),
    isJson('pour_result_reading_ids_json', t.readingIds),
  ],
)

/** A stored file; its content lies in the file store under company and SHA-256. */
export const file = sqliteTable(
  'file',
  {
    companyId: text('company_id')
      .notNull()
      .references(() => company.id),
    id: text('id').notNull(),
    /** Null for what belongs to the company and not to a job. */
    jobId: text('job_id'),
    sha256: text('sha256').notNull(),
    name: text('name').notNull(),
    type: text('type').notNull(),
    bytes: integer('bytes').notNull(),
    createdAtMs: integer('created_at_ms').notNull(),
    createdBy: text('created_by')
      .notNull()
      .references(() => person.id, { onDelete: 'restrict' }),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [job.companyId, job.id] }).onDelete('restrict'),
    index('file_id').on(t.id),
    check('file_sha256', sql`length(${t.sha256}) = 64`),
    check('file_bytes', sql`${t.bytes} >= 0`),
  ],
)

const TASK_STATES = ['waiting', 'running', 'done', 'failed'] as const

/** Long work that a client asks after; whoever runs it holds it until `leaseEndAtMs`. */
export const task = sqliteTable(
  'task',
  {
    companyId: text('company_id')
      .notNull()
      .references(() => company.id),
    id: text('id').notNull(),
    jobId: text('job_id'),
    kind: text('kind').notNull(),
    state: text('state', { enum: TASK_STATES }).notNull(),
    input: text('input', { mode: 'json' }).$type<unknown>().notNull(),
    answer: text('answer', { mode: 'json' }).$type<unknown>(),
    attempts: integer('attempts').notNull().default(0),
    leaseEndAtMs: integer('lease_end_at_ms'),
    createdAtMs: integer('created_at_ms').notNull(),
    createdBy: text('created_by')
      .notNull()
      .references(() => person.id),
    updatedAtMs: integer('updated_at_ms').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [job.companyId, job.id] }),
    oneOf('task_state', t.state, TASK_STATES),
    index('task_state_lease').on(t.state, t.leaseEndAtMs),
    check('task_lease', sql`(${t.state} = 'running') = (${t.leaseEndAtMs} is not null)`),
  ],
)
