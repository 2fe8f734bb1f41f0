import { and, eq } from 'drizzle-orm'
import type { Connection } from '../../db/client'
import { batch } from '../../db/schema/record'
import type { JobKey } from './job-key'

export interface StoredBatch extends JobKey {
  readonly id: string
  readonly personId: string
  /** SHA-256 of the batch as it was sent. */
  readonly payloadHash: string
  /** The answer as JSON text. */
  readonly answer: string
  readonly changeNumber: number
  readonly atMs: number
}

export const batchById = (
  db: Connection,
  { companyId, id }: { companyId: string; id: string },
): StoredBatch | undefined =>
  db
    .select()
    .from(batch)
    .where(and(eq(batch.companyId, companyId), eq(batch.id, id)))
    .get()

export function insertBatch(db: Connection, row: StoredBatch): void {
  db.insert(batch).values(row).run()
}
