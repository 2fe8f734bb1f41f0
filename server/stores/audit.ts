import { v7 as uuidv7 } from 'uuid'
import type { Tx } from '../../db/client'
import { audit } from '../../db/schema/record'

export interface AuditEntry {
  readonly companyId: string
  /** Null for what belongs to the company and not to a job. */
  readonly jobId: string | null
  readonly personId: string
  readonly atMs: number
  /** Name of the procedure. */
  readonly what: string
  readonly before: unknown
  readonly after: unknown
  /** The job's change count, where the layout changed. */
  readonly changeNumber?: number
}

/** Notes who changed what, in the transaction that changes it. */
export function recordAudit(tx: Tx, entry: AuditEntry): void {
  tx.insert(audit)
    .values({ id: uuidv7(), ...entry })
    .run()
}
