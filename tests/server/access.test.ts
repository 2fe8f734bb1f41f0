import type { AnyTRPCProcedure } from '@trpc/server'
import { v7 as uuidv7 } from 'uuid'
import { beforeAll, describe, expect, test } from 'vitest'
import { ROLES, type LayoutFile, type Role } from '@wedgeline/contract'
import { write } from '@/db/client'
import { HTTP_ROUTES } from '@/server/http/routes'
import { appRouter } from '@/server/router'
import { insertFile } from '@/server/stores/file'
import { insertInvitation } from '@/server/stores/invitation'
import { insertPerson, setMember } from '@/server/stores/person'
import { createCallerFactory } from '@/server/trpc/builders'
import type { Context } from '@/server/trpc/context'
import { hashToken } from '@/server/session'
import { addCompany } from './company'
import { contextFor } from './context'
import { sampleLayout } from './layout-sample'
import { PASSWORD, PASSWORD_HASH, get, openTestServer, type TestServer } from './server'

/**
 * Who may call what, over every procedure of the router and every route of the table. A new one that is not listed
 * here fails. Callers: the five roles, each held alone by somebody on the job; nobody; somebody with every role in
 * another company and on a job there; somebody with every role but admin in this company who is not on the job; an
 * admin of this company who is not on the job.
 */

const CALLERS = [...ROLES, 'nobody', 'other company', 'off the job', 'admin off the job'] as const
type CallerName = (typeof CALLERS)[number]

/** What stands in the way: nothing, 401, 403 or 404. */
type Verdict = 'yes' | 'sign in' | 'no role' | 'not there'

const row = (
  roles: readonly Role[],
  rest: Record<Exclude<CallerName, Role>, Verdict>,
): Record<CallerName, Verdict> => ({
  ...(Object.fromEntries(ROLES.map((role) => [role, roles.includes(role) ? 'yes' : 'no role'])) as Record<
    Role,
    Verdict
  >),
  ...rest,
})

/** Somebody signed in or not. */
const anybody = row(ROLES, { nobody: 'yes', 'other company': 'yes', 'off the job': 'yes', 'admin off the job': 'yes' })
const signedIn = row(ROLES, {
  nobody: 'sign in',
  'other company': 'yes',
  'off the job': 'yes',
  'admin off the job': 'yes',
})
/** Somebody in the company, whichever its jobs. */
const inCompany = (...roles: Role[]) =>
  row(roles, {
    nobody: 'sign in',
    'other company': 'not there',
    'off the job': roles.some((role) => role !== 'admin') ? 'yes' : 'no role',
    'admin off the job': roles.includes('admin') ? 'yes' : 'no role',
  })
/** Somebody on the job. */
const onJob = (...roles: Role[]) =>
  row(roles, {
    nobody: 'sign in',
    'other company': 'not there',
    'off the job': 'not there',
    'admin off the job': 'not there',
  })
const peopleOfJob = (...roles: Role[]) => ({ ...onJob(...roles), 'admin off the job': 'yes' as const })

const ALL = ROLES
const EXPECTED: Record<string, Record<CallerName, Verdict>> = {
  'session.me': anybody,
  'session.signIn': anybody,
  'session.signOut': anybody,
  'invitation.byToken': anybody,
  'invitation.accept': anybody,
  'invitation.list': inCompany('admin'),
  'invitation.create': inCompany('admin'),
  'invitation.withdraw': inCompany('admin'),
  'people.list': inCompany(...ALL),
  'people.setRoles': inCompany('admin'),
  'people.remove': inCompany('admin'),
  'company.byId': inCompany(...ALL),
  'company.update': inCompany('admin'),
  'hardware.list': inCompany(...ALL),
  'hardware.save': inCompany('admin'),
  'hardware.saveJack': inCompany('admin'),
  'hardware.saveStrandType': inCompany('admin'),
  'job.list': signedIn,
  'job.create': inCompany('detailer', 'engineer'),
  'job.importLayout': inCompany('detailer', 'engineer'),
  'job.byId': onJob(...ALL),
  'job.update': onJob('detailer', 'engineer'),
  'job.setBasis': onJob('engineer'),
  'job.addMember': peopleOfJob('detailer', 'engineer', 'admin'),
  'job.removeMember': peopleOfJob('detailer', 'engineer', 'admin'),
  'layout.byJob': onJob(...ALL),
  'layout.applyBatch': onJob('detailer', 'engineer'),
  'reading.accept': onJob('engineer'),
  'reading.withdraw': onJob('engineer'),
  'schedule.byPour': onJob(...ALL),
  'schedule.export': onJob('drafter', 'detailer', 'engineer'),
  'audit.list': onJob(...ALL),
  'GET /healthz': anybody,
  'GET /readyz': anybody,
  'GET /exports/:id': onJob(...ALL),
}

const TOKEN = 'an-invitation-token-for-this-test-alone'
const CALL_CODES: Record<string, Verdict> = { UNAUTHORIZED: 'sign in', FORBIDDEN: 'no role', NOT_FOUND: 'not there' }
const STATUS_CODES: Record<number, Verdict> = { 200: 'yes', 401: 'sign in', 403: 'no role', 404: 'not there' }
const procedures = appRouter._def.procedures as unknown as Record<string, AnyTRPCProcedure>
const createCaller = createCallerFactory(appRouter)

let server: TestServer
let jobId: string
let pourId: string
let fileId: string
let inputs: Record<string, unknown>
const people = {} as Record<Exclude<CallerName, 'nobody'>, string>

beforeAll(async () => {
  server = openTestServer()
  const { company } = server
  const detailer = company.as('detailer')
  jobId = (await detailer.job.importLayout({ companyId: company.id, layout: sampleLayout() })).jobId
  for (const role of ROLES) {
    people[role] = company.personId(role)
    if (role !== 'detailer') await detailer.job.addMember({ jobId, personId: people[role] })
  }
  addOutsiders()
  const { layout, versions } = await detailer.layout.byJob({ jobId })
  pourId = layout.pours[0]?.id ?? ''
  await company.as('engineer').reading.accept({ jobId, readingId: READING, reason: 'As the test needs.' })
  await addRecords()
  inputs = validInputs({ layout, versions })
})

/** One that is accepted before the calls and one that is not. */
const READING = 'en-window'
const OTHER_READING = 'en-own-prism'

function addOutsiders() {
  const { db, company } = server
  const south = addCompany(db, 'south')
  const add = (id: string, companyId: string, roles: readonly Role[]) =>
    write(db, (tx) => {
      insertPerson(tx, { id, name: id, email: `${id}@x.example`, passwordHash: PASSWORD_HASH, nowMs: 0 })
      setMember(tx, { companyId, personId: id, roles, nowMs: 0 })
    })
  people['other company'] = 'everything-in-south'
  people['off the job'] = 'off-the-job'
  people['admin off the job'] = 'admin-off-the-job'
  add(people['other company'], south.id, ROLES)
  add(
    people['off the job'],
    company.id,
    ROLES.filter((role) => role !== 'admin'),
  )
  add(people['admin off the job'], company.id, ['admin'])
  add('leaver', company.id, ['inspector'])
}

/** An open invitation and a stored file. */
async function addRecords() {
  const { db, company, files } = server
  const companyId = company.id
  const roles: Role[] = ['drafter']
  write(db, (tx) => {
    const times = { createdAtMs: 0, createdBy: people.admin, expiresAtMs: Date.UTC(2100, 0, 1) }
    const invitation = { companyId, id: 'invitation-1', email: 'new@x.example', name: 'New', roles }
    insertInvitation(tx, { ...invitation, tokenHash: hashToken(TOKEN), ...times })
  })
  const { sha256 } = await files.save(companyId, Buffer.from('bars'))
  fileId = uuidv7()
  insertFile(db, {
    ...{ companyId, id: fileId, jobId, sha256, name: 'bars.txt', type: 'text/plain', bytes: 4 },
    ...{ createdAtMs: 0, createdBy: people.detailer },
  })
}

/** An input for each procedure that a caller with the right to it gets an answer to. */
function validInputs({ layout, versions }: { layout: LayoutFile; versions: Readonly<Record<string, number>> }) {
  const companyId = server.company.id
  const anchor = layout.anchors[0]
  const sample = sampleLayout()
  return {
    'session.me': undefined,
    'session.signIn': { email: 'leaver@x.example', password: PASSWORD },
    'session.signOut': undefined,
    'invitation.byToken': { token: TOKEN },
    'invitation.accept': { token: TOKEN, name: 'New', password: PASSWORD },
    'invitation.list': { companyId },
    'invitation.create': { companyId, email: 'newer@x.example', name: 'Newer', roles: ['drafter'] },
    'invitation.withdraw': { companyId, invitationId: 'invitation-1' },
    'people.list': { companyId },
    'people.setRoles': { companyId, personId: 'leaver', roles: ['drafter'] },
    'people.remove': { companyId, personId: 'leaver' },
    'company.byId': { companyId },
    'company.update': { companyId, name: 'North', note: '' },
    'hardware.list': { companyId },
    'hardware.save': { companyId, hardware: { ...layout.hardware[0], id: 'h9', name: 'Other plate' } },
    'hardware.saveJack': { companyId, jack: layout.jacks[0] },
    'hardware.saveStrandType': { companyId, strandType: layout.strandTypes[0] },
    'job.list': undefined,
    'job.create': { id: uuidv7(), companyId, number: '7', title: 'Seven' },
    'job.importLayout': { companyId, layout: sample },
    'job.byId': { jobId },
    'job.update': { jobId, number: '8', title: 'Eight' },
    'job.setBasis': { jobId, basis: 'en-1992', settings: layout.job.settings, factors: [] },
    'job.addMember': { jobId, personId: 'leaver' },
    'job.removeMember': { jobId, personId: people.inspector },
    'layout.byJob': { jobId },
    'layout.applyBatch': {
      id: uuidv7(),
      jobId,
      bases: { [`edge:${anchor?.edgeId}`]: versions[`edge:${anchor?.edgeId}`] },
      commands: [{ type: 'set', table: 'anchors', id: anchor?.id, changes: { heightMm: 111 } }],
    },
    'reading.accept': { jobId, readingId: OTHER_READING, reason: 'As well.' },
    'reading.withdraw': { jobId, readingId: READING },
    'schedule.byPour': { jobId, pourId },
    'schedule.export': { jobId, pourId },
    'audit.list': { jobId, limit: 10 },
  } satisfies Record<string, unknown>
}

function callAs(name: CallerName, path: string, input: unknown): Promise<unknown> {
  const id = name === 'nobody' ? null : people[name]
  const context: Context = contextFor(server, id)
  const [area = '', procedure = ''] = path.split('.')
  const caller = createCaller(context) as unknown as Record<
    string,
    Record<string, (value: unknown) => Promise<unknown>>
  >
  return caller[area]?.[procedure]?.(input) ?? Promise.reject(new Error(`There is no ${path}.`))
}

/** Calls and puts the database back as it was. */
async function tried<T>(work: () => Promise<T>): Promise<T> {
  server.db.$client.exec('BEGIN')
  try {
    return await work()
  } finally {
    server.db.$client.exec('ROLLBACK')
  }
}

async function verdictOf(name: CallerName, path: string): Promise<Verdict> {
  const error: unknown = await tried(() =>
    callAs(name, path, inputs[path]).then(
      () => null,
      (reason: unknown) => reason,
    ),
  )
  if (error === null) return 'yes'
  const verdict = CALL_CODES[(error as { code: string }).code]
  if (!verdict) throw error
  return verdict
}

test('every procedure and route has a line in the table, and every line one of them', () => {
  const found = [
    ...Object.keys(procedures),
    ...HTTP_ROUTES.map(({ method, path }) => `${method.toUpperCase()} ${path}`),
  ]
  expect(Object.keys(EXPECTED).sort()).toEqual(found.sort())
  expect(Object.keys(inputs).sort()).toEqual(Object.keys(procedures).sort())
})

describe.each(Object.keys(procedures))('%s', (path) => {
  test.each(CALLERS)('called by %s', async (name) => {
    expect(await verdictOf(name, path)).toBe(EXPECTED[path]?.[name])
  })

  test('refuses a key that it does not know', async () => {
    const input = inputs[path]
    if (input === undefined) {
      // Takes nothing: whatever is sent changes nothing about whose data it is.
      expect(await callAs('nobody', path, { companyId: 'north', personId: 'x' }).catch(codeOf)).toEqual(
        await callAs('nobody', path, undefined).catch(codeOf),
      )
      return
    }
    const roles = ROLES.filter((role) => EXPECTED[path]?.[role] === 'yes')
    const call = tried(() => callAs(roles[0] ?? 'admin', path, { ...(input as object), surprise: 1 }))
    expect(await call.catch(codeOf)).toBe('BAD_REQUEST')
  })
})

const codeOf = (reason: unknown): string => (reason as { code: string }).code

describe.each(HTTP_ROUTES)('$method $path', ({ method, path }) => {
  test.each(CALLERS)('called by %s', async (name) => {
    const cookie = name === 'nobody' ? '' : await server.cookieOf(people[name])
    const { status } = await get(server, path.replace(':id', fileId), { cookie })
    expect(STATUS_CODES[status]).toBe(EXPECTED[`${method.toUpperCase()} ${path}`]?.[name])
  })
})

test('a job that does not exist, another one and one of another company answer alike', async () => {
  const read = (name: CallerName, id: string) =>
    callAs(name, 'job.byId', { jobId: id }).catch((reason: unknown) => ({
      ...(reason as object),
      text: String(reason),
    }))
  const unknown = await read('other company', uuidv7())
  expect(await read('other company', jobId)).toEqual(unknown)
  expect(await read('off the job', jobId)).toEqual(unknown)
})

test('a company that does not exist and another one answer alike', async () => {
  const read = (companyId: string) => callAs('other company', 'people.list', { companyId }).catch(String)
  expect(await read('north')).toBe(await read('nowhere'))
  expect(await read('north')).toContain('There is no such company')
})
