import { randomInt } from 'node:crypto'
import { v7 as uuidv7 } from 'uuid'
import { write, type Tx } from '../db/client'
import { DEMO_COMPANY, DEMO_PEOPLE, type DemoPerson } from '../db/seed/demo-company'
import { demoLayout } from '../db/seed/demo-layout'
import { checkStored, type Checking, type ToCheck } from './checking'
import { storeImport } from './job-import'
import { hashPassword } from './password'
import { insertCompany } from './stores/company'
import { insertJobMember } from './stores/job'
import type { JobKey } from './stores/job-key'
import { hasAnyPerson, insertPerson, setMember } from './stores/person'

export interface DemoSignIn extends DemoPerson {
  /** Shown once; the database keeps its hash alone. */
  readonly password: string
}

export interface DemoSeeding extends Checking {
  readonly now: () => number
  /** Null unless other machines reach this server. */
  readonly publicUrl: string | null
}

/**
 * Fills an empty database with the demo: its company, five people and the job with all of them on it. The layout goes
 * in as an imported file does.
 * @returns sign-ins to show once; null where there is anybody in the database already.
 * @throws where the server is reachable under a public address: the demo is not for there.
 */
export async function seedDemo({ db, check, now, publicUrl }: DemoSeeding): Promise<readonly DemoSignIn[] | null> {
  if (publicUrl !== null) throw new Error(`The demo does not go onto a server that is reachable at ${publicUrl}.`)
  if (hasAnyPerson(db)) return null
  const people = await Promise.all(DEMO_PEOPLE.map(withPassword))
  const { key, toCheck } = write(db, (tx) => storeDemo(tx, { db, now }, people))
  await checkStored({ db, check }, key, toCheck)
  return people.map(({ name, email, roles, password }) => ({ name, email, roles, password }))
}

interface NewPerson extends DemoSignIn {
  readonly id: string
  readonly passwordHash: string
}

async function withPassword(person: DemoPerson): Promise<NewPerson> {
  const password = newPassword()
  return { ...person, id: uuidv7(), password, passwordHash: await hashPassword(password) }
}

/** Letters and digits that look alike are left out: passwords are read off a screen. */
const SIGNS = 'abcdefghjkmnpqrstuvwxyz23456789'
const newPassword = (): string => Array.from({ length: 4 }, newGroup).join('-')
const newGroup = (): string => Array.from({ length: 4 }, () => SIGNS[randomInt(SIGNS.length)]).join('')

/** In one transaction; what the import does in its own becomes part of it. */
function storeDemo(
  tx: Tx,
  { db, now }: Pick<DemoSeeding, 'db' | 'now'>,
  people: readonly NewPerson[],
): { key: JobKey; toCheck: ToCheck } {
  const companyId = uuidv7()
  const nowMs = now()
  insertCompany(tx, { id: companyId, ...DEMO_COMPANY, nowMs })
  for (const { id, name, email, passwordHash, roles } of people) {
    insertPerson(tx, { id, name, email, passwordHash, nowMs })
    setMember(tx, { companyId, personId: id, roles, nowMs })
  }
  const detailer = people.find(({ roles }) => roles.includes('detailer'))
  if (!detailer) throw new Error('The demo has no detailer to make its job.')
  const { jobId, toCheck } = storeImport(
    { db, now, person: detailer, company: { id: companyId, roles: detailer.roles } },
    demoLayout(),
  )
  const stamp = { personId: detailer.id, atMs: now() }
  for (const { id } of people) insertJobMember(tx, { companyId, jobId }, { personId: id, stamp })
  return { key: { companyId, jobId }, toCheck }
}
