import { and, eq } from 'drizzle-orm'
import type { SQLiteColumn, SQLiteTable } from 'drizzle-orm/sqlite-core'

/** Which job of which company. */
export interface JobKey {
  readonly companyId: string
  readonly jobId: string
}

/** Who stores something, and when. */
export interface Stamp {
  readonly personId: string
  readonly atMs: number
}

/** Columns of a row that is stored for the first time. */
export const created = ({ personId, atMs }: Stamp) => ({
  createdAtMs: atMs,
  createdBy: personId,
  updatedAtMs: atMs,
  updatedBy: personId,
})

/** Columns of a row that is stored again. */
export const updated = ({ personId, atMs }: Stamp) => ({ updatedAtMs: atMs, updatedBy: personId })

export type JobTable = SQLiteTable & { companyId: SQLiteColumn; jobId: SQLiteColumn }

/** Condition for the rows of one job of one company. */
export const ofJob = (table: JobTable, { companyId, jobId }: JobKey) =>
  and(eq(table.companyId, companyId), eq(table.jobId, jobId))
