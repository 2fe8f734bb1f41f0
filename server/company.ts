import { write, type Connection } from '../db/client'
import { recordAudit } from './stores/audit'
import { companyById, updateCompany, type CompanyRow } from './stores/company'
import type { CompanyCall } from './trpc/context'

/** A company that the caller was found to be in. */
export function theCompany(db: Connection, id: string): CompanyRow {
  const found = companyById(db, id)
  if (!found) throw new Error(`Company ${id} has members and no row.`)
  return found
}

/** Stores the company's name and note. */
export function renameCompany(
  { db, company, person, now }: CompanyCall,
  { name, note }: { name: string; note: string },
): void {
  const nowMs = now()
  write(db, (tx) => {
    const before = theCompany(tx, company.id)
    const after = { id: company.id, name, note }
    updateCompany(tx, { ...after, nowMs })
    const entry = { companyId: company.id, jobId: null, personId: person.id, atMs: nowMs }
    recordAudit(tx, { ...entry, what: 'company.update', before, after })
  })
}
