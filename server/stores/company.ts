import { eq } from 'drizzle-orm'
import type { Connection, Tx } from '../../db/client'
import { company } from '../../db/schema/person'

export interface CompanyRow {
  readonly id: string
  readonly name: string
  readonly note: string
}

export const companyById = (db: Connection, id: string): CompanyRow | undefined =>
  db.select({ id: company.id, name: company.name, note: company.note }).from(company).where(eq(company.id, id)).get()

export const firstCompanyId = (db: Connection): string | undefined =>
  db.select({ id: company.id }).from(company).limit(1).get()?.id

export function insertCompany(tx: Tx, { nowMs, ...row }: CompanyRow & { nowMs: number }): void {
  tx.insert(company)
    .values({ ...row, createdAtMs: nowMs, updatedAtMs: nowMs })
    .run()
}

export function updateCompany(tx: Tx, { id, name, note, nowMs }: CompanyRow & { nowMs: number }): void {
  tx.update(company).set({ name, note, updatedAtMs: nowMs }).where(eq(company.id, id)).run()
}
