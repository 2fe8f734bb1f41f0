import pino from 'pino'
import type { Role } from '@wedgeline/contract'
import { openDatabase, write, type Db } from '@/db/client'
import { appRouter } from '@/server/router'
import { insertCompany } from '@/server/stores/company'
import { insertPerson, setMember } from '@/server/stores/person'
import { createCallerFactory } from '@/server/trpc/builders'
import type { Context } from '@/server/trpc/context'
import { engineHere } from './check-here'

/** A company with one person per role, on a database of its own: in memory unless a path is given. */

const createCaller = createCallerFactory(appRouter)
export type Caller = ReturnType<typeof createCaller>

export interface TestCompany {
  readonly db: Db
  readonly id: string
  /** Procedures as called by the person who has this role alone. */
  as(role: Role): Caller
  personId(role: Role): string
}

/** One second later at every call, so that entries have an order. */
let clockMs = Date.UTC(2026, 0, 5, 8)
const tick = () => (clockMs += 1000)

export const openTestCompany = (path = ':memory:'): TestCompany => addCompany(openDatabase(path), 'north')

/** Puts one more company into the database. */
export function addCompany(db: Db, id: string): TestCompany {
  const roles: Role[] = ['detailer', 'engineer', 'drafter', 'inspector', 'admin']
  write(db, (tx) => {
    insertCompany(tx, { id, name: `Company ${id}`, note: '', nowMs: tick() })
    for (const role of roles) {
      const person = { id: `${id}-${role}`, name: `${id} ${role}`, email: `${role}@${id}.example` }
      insertPerson(tx, { ...person, passwordHash: '-', nowMs: tick() })
      setMember(tx, { companyId: id, personId: person.id, roles: [role], nowMs: tick() })
    }
  })
  return companyOn(db, id)
}

/** A company that the database holds already. */
export function companyOn(db: Db, id: string): TestCompany {
  const personId = (role: Role) => `${id}-${role}`
  return {
    db,
    id,
    personId,
    as: (role) =>
      createCaller(contextOf(db, { id: personId(role), name: `${id} ${role}`, email: `${role}@${id}.example` })),
  }
}

const contextOf = (db: Db, person: Context['person']): Context => ({
  db,
  person,
  files: {
    save: (_companyId, bytes) => Promise.resolve({ sha256: 'a'.repeat(64), sizeBytes: bytes.byteLength }),
    open: () => Promise.reject(new Error('not read here')),
  },
  mail: { send: () => Promise.resolve() },
  ...engineHere,
  log: pino({ level: 'silent' }),
  now: tick,
  appUrl: 'http://localhost:4180',
  address: '127.0.0.1',
  session: { start: () => Promise.resolve(), end: () => Promise.resolve() },
})
