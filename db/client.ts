import { fileURLToPath } from 'node:url'
import Database from 'better-sqlite3'
import { drizzle, type BetterSQLite3Database } from 'drizzle-orm/better-sqlite3'
import type { BaseSQLiteDatabase } from 'drizzle-orm/sqlite-core'
import { migrateGuarded } from './migrate'
import * as schema from './schema'

export type Db = BetterSQLite3Database<typeof schema> & { readonly $client: Database.Database }
/** The database inside a transaction. */
export type Tx = Parameters<Parameters<Db['transaction']>[0]>[0]
/** The database, inside or outside a transaction. */
export type Connection = BaseSQLiteDatabase<'sync', Database.RunResult, typeof schema>

const MIGRATIONS = fileURLToPath(new URL('../drizzle', import.meta.url))
const BUSY_TIMEOUT_MS = 5000
/** SQLite's number for FULL. */
const SYNCHRONOUS_FULL = 2

/**
 * Opens the database at `path` (':memory:' for one that lives in memory), brings it to today's schema and makes sure
 * that it keeps what it is given: write-ahead log, full synchronisation, foreign keys.
 * @throws when a setting does not hold or a migration would lose rows; the database is then as it was.
 */
export function openDatabase(path: string): Db {
  const client = new Database(path, { timeout: BUSY_TIMEOUT_MS })
  try {
    client.pragma('journal_mode = WAL')
    client.pragma('synchronous = FULL')
    migrateGuarded(client, MIGRATIONS)
    client.pragma('foreign_keys = ON')
    assertSettings(client)
  } catch (error) {
    client.close()
    throw error
  }
  return drizzle({ client, schema })
}

/** Runs `work` in a transaction that holds the right to write from its start. `work` must not be async. */
export const write = <T>(db: Db, work: (tx: Tx) => T): T => db.transaction(work, { behavior: 'immediate' })

function assertSettings(client: Database.Database): void {
  const expected = {
    journal_mode: client.memory ? 'memory' : 'wal',
    synchronous: SYNCHRONOUS_FULL,
    foreign_keys: 1,
    busy_timeout: BUSY_TIMEOUT_MS,
  }
  for (const [name, value] of Object.entries(expected)) {
    const found: unknown = client.pragma(name, { simple: true })
    if (found !== value) throw new Error(`The database's ${name} is ${String(found)} and must be ${value}.`)
  }
}
