import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle'
import { and, eq } from 'drizzle-orm'
import type { Adapter } from 'lucia'
import type { Db, Tx } from '../../db/client'
import { person } from '../../db/schema/person'
import { session } from '../../db/schema/session'

/** What Lucia reads and writes sessions through. */
export const sessionAdapter = (db: Db): Adapter => new DrizzleSQLiteAdapter(db, session, person)

/** Every session of a person is due for another id: what they may do has changed. */
export function renewSessionsOf(tx: Tx, personId: string): void {
  tx.update(session).set({ isRenewalDue: true }).where(eq(session.userId, personId)).run()
}

export function endSessionsOf(tx: Tx, personId: string): void {
  tx.delete(session).where(eq(session.userId, personId)).run()
}

/** Lets a session that is due for another id end at `endAtMs`. True for the one call that did it. */
export const retireSession = (db: Db, id: string, endAtMs: number): boolean =>
  db
    .update(session)
    .set({ isRenewalDue: false, absoluteEndAtMs: endAtMs })
    .where(and(eq(session.id, id), eq(session.isRenewalDue, true)))
    .run().changes === 1
