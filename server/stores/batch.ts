import { and, eq } from 'drizzle-orm'
import type { Connection } from '../../db/client'
import { batch } from '../../db/schema/record'
import type { JobKey } from './job-key'

export interface StoredBatch extends JobKey {
  readonly id: string
  readonly personId: string
  /** SHA-256 of the batch as it was sent. */
  readonly payloadHash: string
  /** Version of each unit that it touched, once it was stored. */
  readonly versions: Readonly<Record<string, number>>
  /** Pours that were checked again for it. */
  readonly pourIds: readonly string[]
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
  db.insert(batch)
    .values({ ...row, pourIds: [...row.pourIds] })
    .run()
}
