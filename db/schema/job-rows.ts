import { foreignKey, index, primaryKey, text, unique, type AnySQLiteColumn } from 'drizzle-orm/sqlite-core'
import { job } from './job'

/** Key columns of every row of a job's layout. */
export const jobKeys = () => ({
  companyId: text('company_id').notNull(),
  jobId: text('job_id').notNull(),
  id: text('id').notNull(),
})

interface JobKeys {
  readonly companyId: AnySQLiteColumn
  readonly jobId: AnySQLiteColumn
  readonly id: AnySQLiteColumn
}

/**
 * Keys of a layout table. The unique key over company, job and id is what other rows of the same job point at, so that
 * a reference into another job or company cannot be stored; it is also the index by which a job is loaded.
 */
export const layoutKeys = (name: string, t: JobKeys) => [
  primaryKey({ columns: [t.companyId, t.id] }),
  unique(`${name}_of_job`).on(t.companyId, t.jobId, t.id),
  foreignKey({ columns: [t.companyId, t.jobId], foreignColumns: [job.companyId, job.id] }),
]

/** Foreign key to a row of the same job. An empty column points at nothing. */
export const sameJob = (t: JobKeys, column: AnySQLiteColumn, target: JobKeys) =>
  foreignKey({
    columns: [t.companyId, t.jobId, column],
    foreignColumns: [target.companyId, target.jobId, target.id],
  })

/** Index on a column that points at rows of the same job: a row that goes is looked for in it. */
export const pointsAt = (name: string, t: JobKeys, column: AnySQLiteColumn) =>
  index(name).on(t.companyId, t.jobId, column)
