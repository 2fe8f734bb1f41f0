import type { Database } from 'better-sqlite3'
import { readMigrationFiles } from 'drizzle-orm/migrator'

/**
 * Applies the migrations that the database has not had, all in one transaction, and keeps it only when no row was lost
 * and no reference broken. Generated SQL rebuilds a table by dropping it; with foreign keys on, that would delete the
 * rows that point at it, and inside a transaction they cannot be turned off. So they go off first, on the connection.
 * The list of what was applied is the one that drizzle's own tools read.
 * @throws when rows were lost or references broken; the database is then as it was.
 */
export function migrateGuarded(client: Database, folder: string): void {
  client.pragma('foreign_keys = OFF')
  client.transaction(() => applyPending(client, folder)).immediate()
}

function applyPending(client: Database, folder: string): void {
  client.exec(
    'create table if not exists __drizzle_migrations (id integer primary key, hash text not null, created_at numeric)',
  )
  const last = client.prepare('select max(created_at) from __drizzle_migrations').pluck().get()
  const pending = readMigrationFiles({ migrationsFolder: folder }).filter(
    ({ folderMillis }) => folderMillis > Number(last ?? 0),
  )
  if (pending.length === 0) return
  const before = countRows(client)
  const note = client.prepare('insert into __drizzle_migrations (hash, created_at) values (?, ?)')
  for (const { sql, hash, folderMillis } of pending) {
    for (const statement of sql) client.exec(statement)
    note.run(hash, folderMillis)
  }
  assertNothingLost(before, countRows(client))
  const broken = client.pragma('foreign_key_check') as { table: string; parent: string }[]
  const [first] = broken
  if (first) {
    throw new Error(
      `The migration leaves ${broken.length} broken references, the first from ${first.table} to ${first.parent}.`,
    )
  }
}

function assertNothingLost(before: ReadonlyMap<string, number>, after: ReadonlyMap<string, number>): void {
  for (const [table, count] of before) {
    const left = after.get(table) ?? 0
    if (left !== count) throw new Error(`The migration would change the rows of ${table} from ${count} to ${left}.`)
  }
}

function countRows(client: Database): Map<string, number> {
  const tables = client
    .prepare<[], string>(
      "select name from sqlite_master where type = 'table' and name not like 'sqlite_%' and name <> '__drizzle_migrations'",
    )
    .pluck()
    .all()
  return new Map(tables.map((name) => [name, Number(client.prepare(`select count(*) from "${name}"`).pluck().get())]))
}
