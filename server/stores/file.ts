import { eq } from 'drizzle-orm'
import type { Connection } from '../../db/client'
import { file } from '../../db/schema/record'

export interface FileRow {
  readonly companyId: string
  readonly id: string
  /** Null for what belongs to the company and not to a job. */
  readonly jobId: string | null
  readonly sha256: string
  readonly name: string
  readonly type: string
  readonly bytes: number
  readonly createdAtMs: number
  readonly createdBy: string
}

export function insertFile(db: Connection, row: FileRow): void {
  db.insert(file).values(row).run()
}

/** Files whose id this is, one for each company that has one; whoever asks is checked against the row. */
export const filesById = (db: Connection, id: string): FileRow[] => db.select().from(file).where(eq(file.id, id)).all()
