import { v7 as uuidv7 } from 'uuid'
import { beforeAll, describe, expect, test } from 'vitest'
import { ROLES, type Role } from '@wedgeline/contract'
import { HTTP_ROUTES } from '@/server/http/routes'
import { CALLERS, PROCEDURES, openPopulated, type CallerName, type Populated } from './populated'
import { get } from './server'

/**
 * Who may call what, over every procedure of the router and every route of the table. A new one that is not listed
 * here fails. Callers: the five roles, each held alone by somebody on the job; nobody; somebody with every role in
 * another company and on a job there; somebody with every role but admin in this company who is not on the job; an
 * admin of this company who is not on the job.
 */

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
  'session.askReset': anybody,
  'session.resetPassword': anybody,
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
  'job.fileQuickEdge': onJob('detailer', 'engineer'),
  'job.setBasis': onJob('engineer'),
  'job.addMember': peopleOfJob('detailer', 'engineer', 'admin'),
  'job.removeMember': peopleOfJob('detailer', 'engineer', 'admin'),
  'layout.byJob': onJob(...ALL),
  'layout.applyBatch': onJob('drafter', 'detailer', 'engineer'),
  'reading.accept': onJob('engineer'),
  'reading.withdraw': onJob('engineer'),
  'schedule.byPour': onJob(...ALL),
  'schedule.export': onJob('drafter', 'detailer', 'engineer'),
  'audit.list': onJob(...ALL),
  'GET /healthz': anybody,
  'GET /readyz': anybody,
  'GET /exports/:id': onJob(...ALL),
}

const CALL_CODES: Record<string, Verdict> = { UNAUTHORIZED: 'sign in', FORBIDDEN: 'no role', NOT_FOUND: 'not there' }
const STATUS_CODES: Record<number, Verdict> = { 200: 'yes', 401: 'sign in', 403: 'no role', 404: 'not there' }

let populated: Populated
beforeAll(async () => {
  populated = await openPopulated()
})

async function verdictOf(name: CallerName, path: string): Promise<Verdict> {
  const error: unknown = await populated.tried(() =>
    populated.call(name, path, populated.inputs[path]).then(
      () => null,
      (reason: unknown) => reason,
    ),
  )
  if (error === null) return 'yes'
  const verdict = CALL_CODES[(error as { code: string }).code]
  if (!verdict) throw new Error(`${path} as ${name} failed otherwise`, { cause: error })
  return verdict
}

test('every procedure and route has a line in the table, and every line one of them', () => {
  const found = [
    ...Object.keys(PROCEDURES),
    ...HTTP_ROUTES.map(({ method, path }) => `${method.toUpperCase()} ${path}`),
  ]
  expect(Object.keys(EXPECTED).sort()).toEqual(found.sort())
  expect(Object.keys(populated.inputs).sort()).toEqual(Object.keys(PROCEDURES).sort())
})

describe.each(Object.keys(PROCEDURES))('%s', (path) => {
  test.each(CALLERS)('called by %s', async (name) => {
    expect(await verdictOf(name, path)).toBe(EXPECTED[path]?.[name])
  })

  test('refuses a key that it does not know', async () => {
    const input = populated.inputs[path]
    if (input === undefined) {
      // Takes nothing: whatever is sent changes nothing about whose data it is.
      expect(await populated.call('nobody', path, { companyId: 'north', personId: 'x' }).catch(codeOf)).toEqual(
        await populated.call('nobody', path, undefined).catch(codeOf),
      )
      return
    }
    const roles = ROLES.filter((role) => EXPECTED[path]?.[role] === 'yes')
    const call = populated.tried(() => populated.call(roles[0] ?? 'admin', path, { ...(input as object), surprise: 1 }))
    expect(await call.catch(codeOf)).toBe('BAD_REQUEST')
  })
})

const codeOf = (reason: unknown): string => (reason as { code: string }).code

describe.each(HTTP_ROUTES)('$method $path', ({ method, path }) => {
  test.each(CALLERS)('called by %s', async (name) => {
    const cookie = name === 'nobody' ? '' : await populated.server.cookieOf(populated.people[name])
    const { status } = await get(populated.server, path.replace(':id', populated.fileId), { cookie })
    expect(STATUS_CODES[status]).toBe(EXPECTED[`${method.toUpperCase()} ${path}`]?.[name])
  })
})

test('a job that does not exist, another one and one of another company answer alike', async () => {
  const read = (name: CallerName, id: string) =>
    populated.call(name, 'job.byId', { jobId: id }).catch((reason: unknown) => ({
      ...(reason as object),
      text: String(reason),
    }))
  const unknown = await read('other company', uuidv7())
  expect(await read('other company', populated.jobId)).toEqual(unknown)
  expect(await read('off the job', populated.jobId)).toEqual(unknown)
})

test('a company that does not exist and another one answer alike', async () => {
  const read = (companyId: string) => populated.call('other company', 'people.list', { companyId }).catch(String)
  expect(await read('north')).toBe(await read('nowhere'))
  expect(await read('north')).toContain('There is no such company')
})
