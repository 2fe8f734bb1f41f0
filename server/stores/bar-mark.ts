import { and, count, eq } from 'drizzle-orm'
import { v7 as uuidv7 } from 'uuid'
import type { NewMark } from '@wedgeline/engine'
import type { Connection } from '../../db/client'
import { barMark } from '../../db/schema'
import type { JobKey } from './job-key'

/** Adds marks that were given; a mark that is given already or a bar that has one is refused by the table. */
export function insertBarMarks(
  db: Connection,
  { companyId, jobId }: JobKey,
  { marks, atMs }: { marks: readonly (NewMark & { readonly id?: string })[]; atMs: number },
): void {
  for (const mark of marks) {
    db.insert(barMark)
      .values({ companyId, jobId, id: uuidv7(), ...mark, createdAtMs: atMs })
      .run()
  }
}

/** How many marks a job has given; they are added and never taken away. */
export const countBarMarks = (db: Connection, { companyId, jobId }: JobKey): number =>
  db
    .select({ marks: count() })
    .from(barMark)
    .where(and(eq(barMark.companyId, companyId), eq(barMark.jobId, jobId)))
    .get()?.marks ?? 0
