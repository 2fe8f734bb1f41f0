import { eq } from 'drizzle-orm'
import { person } from '@/db/schema'
import type { Context } from '@/server/trpc/context'
import { createHash } from 'node:crypto'
import { serverLog } from '@/server/log'
import { engineHere } from './check-here'
import type { TestServer } from './server'

const { id, name, email } = person
const personOf = (db: TestServer['db'], personId: string) =>
  db.select({ id, name, email }).from(person).where(eq(id, personId)).get() ?? null

/** What a procedure is called with by this person, without HTTP round it; null for nobody. */
export const contextFor = ({ db }: Pick<TestServer, 'db'>, personId: string | null): Context => ({
  db,
  person: personId === null ? null : personOf(db, personId),
  files: {
    save: (_companyId, bytes) =>
      Promise.resolve({ sha256: createHash('sha256').update(bytes).digest('hex'), sizeBytes: bytes.byteLength }),
    open: () => Promise.reject(new Error('There is no such file.')),
  },
  mail: { send: () => Promise.resolve() },
  log: serverLog({ level: 'silent' }),
  ...engineHere,
  now: () => Date.now(),
  appUrl: 'http://localhost:4180',
  address: '192.0.2.1',
  session: { start: () => Promise.resolve(), end: () => Promise.resolve() },
})
