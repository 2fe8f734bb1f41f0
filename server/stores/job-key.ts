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

export const created = ({ personId, atMs }: Stamp) => ({
  createdAtMs: atMs,
  createdBy: personId,
  updatedAtMs: atMs,
  updatedBy: personId,
})

export const updated = ({ personId, atMs }: Stamp) => ({ updatedAtMs: atMs, updatedBy: personId })

export type JobTable = SQLiteTable & { companyId: SQLiteColumn; jobId: SQLiteColumn }

export const ofJob = (table: JobTable, { companyId, jobId }: JobKey) =>
  and(eq(table.companyId, companyId), eq(table.jobId, jobId))
