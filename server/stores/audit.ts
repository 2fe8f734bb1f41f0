import { and, asc, desc, eq, gt, isNotNull, lt, or } from 'drizzle-orm'
import { v7 as uuidv7 } from 'uuid'
import type { Connection } from '../../db/client'
import { audit } from '../../db/schema/record'
import { person } from '../../db/schema/person'
import type { JobKey } from './job-key'

export interface AuditEntry {
  readonly companyId: string
  /** Null for what belongs to the company and not to a job. */
  readonly jobId: string | null
  readonly personId: string
  readonly atMs: number
  /** Name of the procedure: layout.applyBatch. */
  readonly what: string
  /** What changed, as it was and as it is; plain JSON, null where there was or is nothing. */
  readonly before: unknown
  readonly after: unknown
  readonly changeNumber?: number
}

/** Adds to the record of who did what; to be called in the transaction that does it. */
export function recordAudit(db: Connection, entry: AuditEntry): void {
  db.insert(audit)
    .values({ id: uuidv7(), ...entry, changeNumber: entry.changeNumber ?? null })
    .run()
}

/** The latest entries of a job, newest first; with `before` those that come after that one in this order. */
export function auditOf(
  db: Connection,
  { companyId, jobId }: JobKey,
  page: { limit: number; before?: { atMs: number; id: string } | undefined },
) {
  return db
    .select({
      id: audit.id,
      atMs: audit.atMs,
      personName: person.name,
      what: audit.what,
      before: audit.before,
      after: audit.after,
    })
    .from(audit)
    .innerJoin(person, eq(person.id, audit.personId))
    .where(and(eq(audit.companyId, companyId), eq(audit.jobId, jobId), page.before && isBefore(page.before)))
    .orderBy(desc(audit.atMs), desc(audit.id))
    .limit(page.limit)
    .all()
}

/** Entries of one instant are told apart by their ids, so that none is left out between two pages. */
const isBefore = ({ atMs, id }: { atMs: number; id: string }) =>
  or(lt(audit.atMs, atMs), and(eq(audit.atMs, atMs), lt(audit.id, id)))

/** What was there after each change of the layout since `changeNumber`, oldest first. */
export const changesSince = (db: Connection, { companyId, jobId }: JobKey, changeNumber: number): unknown[] =>
  db
    .select({ after: audit.after })
    .from(audit)
    .where(
      and(
        eq(audit.companyId, companyId),
        eq(audit.jobId, jobId),
        isNotNull(audit.changeNumber),
        gt(audit.changeNumber, changeNumber),
      ),
    )
    .orderBy(asc(audit.changeNumber))
    .all()
    .map(({ after }) => after)
