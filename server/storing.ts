import Database from 'better-sqlite3'
import { conflict, refused } from './failure'

/**
 * Runs what stores something. The rules of the tables are the last guard behind the contract's; what they turn away is
 * the sender's to mend.
 * @throws Failure for a row that breaks a rule of its table; anything else as it came.
 */
export function storing<T>(work: () => T): T {
  try {
    return work()
  } catch (error) {
    if (!(error instanceof Database.SqliteError) || !error.code.startsWith('SQLITE_CONSTRAINT')) throw error
    switch (error.code) {
      case 'SQLITE_CONSTRAINT_PRIMARYKEY':
      case 'SQLITE_CONSTRAINT_UNIQUE':
        throw conflict(
          'An id in this change is in use already. Nothing was stored; give each new row an id of its own.',
        )
      case 'SQLITE_CONSTRAINT_FOREIGNKEY':
        throw refused('This change names a row that is not there, or takes away one that others name.', 'id')
      default:
        throw refused('A value in this change is outside what its table takes. Nothing was stored.', '')
    }
  }
}
