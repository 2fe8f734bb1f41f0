import { sql } from 'drizzle-orm'
import {
  check,
  foreignKey,
  index,
  integer,
  primaryKey,
  real,
  sqliteTable,
  text,
  uniqueIndex,
} from 'drizzle-orm/sqlite-core'
import type { JobData } from '@wedgeline/contract'
import { allPositive, isJson, oneOf, stamps } from './columns'
import { membership } from './membership'
import { company, person } from './person'

const BASES = ['en-1992', 'as-3600'] as const

export const job = sqliteTable(
  'job',
  {
    companyId: text('company_id')
      .notNull()
      .references(() => company.id),
    /** Unique over all companies: the job of a call names its company. */
    id: text('id').notNull(),
    number: text('number').notNull(),
    title: text('title').notNull(),
    timeZone: text('time_zone').notNull(),
    basis: text('basis', { enum: BASES }).notNull(),
    settings: text('settings', { mode: 'json' }).$type<JobData['settings']>().notNull(),
    /** Version of the job's own unit: levels, grid, edge lines, joints, obstructions. */
    layoutVersion: integer('layout_version').notNull().default(0),
    /** Counts accepted batches; a touched unit takes it as its version, so that no version ever comes twice. */
    changeCount: integer('change_count').notNull().default(0),
    /** Made from a quick edge and not yet given a number and a title of its own. */
    isUnfiled: integer('is_unfiled', { mode: 'boolean' }).notNull().default(false),
    ...stamps(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('job_id').on(t.id),
    oneOf('job_basis', t.basis, BASES),
    isJson('job_settings_json', t.settings),
    check('job_counts', sql`${t.layoutVersion} between 0 and ${t.changeCount}`),
  ],
)

export const jobMember = sqliteTable(
  'job_member',
  {
    companyId: text('company_id').notNull(),
    jobId: text('job_id').notNull(),
    personId: text('person_id').notNull(),
    createdAtMs: integer('created_at_ms').notNull(),
    createdBy: text('created_by')
      .notNull()
      .references(() => person.id),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.jobId, t.personId] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [job.companyId, job.id] }),
    foreignKey({
      columns: [t.companyId, t.personId],
      foreignColumns: [membership.companyId, membership.personId],
    }),
    index('job_member_person').on(t.companyId, t.personId),
  ],
)

/** A national factor that differs from the basis's recommended value. */
export const jobFactor = sqliteTable(
  'job_factor',
  {
    companyId: text('company_id').notNull(),
    jobId: text('job_id').notNull(),
    position: integer('position').notNull(),
    name: text('name').notNull(),
    value: real('value').notNull(),
    reason: text('reason').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.jobId, t.name] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [job.companyId, job.id] }),
    allPositive('job_factor_value', [t.value]),
  ],
)

/** A reading of the basis that an engineer has accepted for the job. */
export const acceptedReading = sqliteTable(
  'accepted_reading',
  {
    companyId: text('company_id').notNull(),
    jobId: text('job_id').notNull(),
    readingId: text('reading_id').notNull(),
    /** Name at the time; a reading that came in with a file keeps the name that the file gives. */
    acceptedBy: text('accepted_by').notNull(),
    /** Who accepted it here, or brought in the file. */
    personId: text('person_id')
      .notNull()
      .references(() => person.id, { onDelete: 'restrict' }),
    acceptedAtMs: integer('accepted_at_ms').notNull(),
    reason: text('reason').notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.jobId, t.readingId] }),
    foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [job.companyId, job.id] }).onDelete('restrict'),
  ],
)
