import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest'
import { hashPassword, isPassword } from '@/server/password'
import { hashToken } from '@/server/session'
import type { Me } from '@/server/sign-in'
import { session } from '@/db/schema/session'
import { PASSWORD, addPerson, get, openTestServer, post, query, setCookieOf, signIn, type TestServer } from './server'

const DAY_MS = 24 * 60 * 60_000
const EMAIL = 'ada@north.example'

let server: TestServer
let personId: string
beforeEach(() => {
  server = openTestServer()
  personId = addPerson(server, { email: EMAIL, roles: ['detailer', 'admin'] })
})
afterEach(() => void vi.useRealTimers())

const me = async (cookie: string) => {
  const response = await get(server, query('session.me'), { cookie }).expect(200)
  return response.body.result.data as Me | null
}
const cookieFrom = (response: { headers: Record<string, unknown> }): string =>
  (setCookieOf(response) ?? '').split(';')[0] ?? ''
const tokenIn = (cookie: string) => cookie.split('=')[1] ?? ''

describe('signing in', () => {
  test('sets a __Host- cookie: Secure, HttpOnly, SameSite=Lax, whole site, no domain, seven days', async () => {
    const response = await signIn(server, EMAIL).expect(200)
    const cookie = setCookieOf(response) ?? ''
    const parts = cookie.split('; ').slice(1).sort()
    expect(parts).toEqual(['HttpOnly', `Max-Age=${7 * 24 * 60 * 60}`, 'Path=/', 'SameSite=Lax', 'Secure'])
    expect(response.body.result.data.person).toEqual({ id: personId, name: EMAIL, email: EMAIL })
    expect((await me(cookieFrom(response)))?.companies).toEqual([
      { id: 'north', name: 'Company north', roles: ['admin', 'detailer'] },
    ])
  })

  test('keeps the hash of the token and never the token', async () => {
    const token = tokenIn(cookieFrom(await signIn(server, EMAIL)))
    const rows = server.db.select().from(session).all()
    expect(rows.map(({ id }) => id)).toEqual([hashToken(token)])
    expect(JSON.stringify(rows)).not.toContain(token)
  })

  test('takes the address in any case and with blanks round it', async () => {
    await signIn(server, `  ${EMAIL.toUpperCase()} `).expect(200)
  })

  test('fixation: a token that was there before is not taken over, and the old session ends', async () => {
    const planted = '__Host-session=token-that-somebody-else-chose-before-sign-in'
    const first = await post(server, 'session.signIn', { cookie: planted }).send({ email: EMAIL, password: PASSWORD })
    expect(cookieFrom(first)).not.toBe(planted)
    expect(await me(planted)).toBeNull()
    const again = await post(server, 'session.signIn', { cookie: cookieFrom(first) }).send({
      email: EMAIL,
      password: PASSWORD,
    })
    expect(cookieFrom(again)).not.toBe(cookieFrom(first))
    expect(await me(cookieFrom(first))).toBeNull()
    expect(await me(cookieFrom(again))).not.toBeNull()
  })

  test('an unknown address and a wrong password get the same answer', async () => {
    const wrong = await signIn(server, EMAIL, 'not the password').expect(400)
    const unknown = await signIn(server, 'nobody@north.example', 'not the password').expect(400)
    expect(unknown.body).toEqual(wrong.body)
    expect(setCookieOf(wrong)).toBeNull()
  })

  test('an unknown address takes as much work as a known one', async () => {
    // Ten checks each against a hash of the real cost; without the work the unknown one would take well under a tenth.
    const real = await hashPassword('some other password')
    const timeOf = async (hash: string | null) => {
      const startedAt = performance.now()
      for (let count = 0; count < 10; count++) await isPassword(hash, 'a guess')
      return performance.now() - startedAt
    }
    await timeOf(null)
    const [unknownMs, knownMs] = [await timeOf(null), await timeOf(real)]
    expect(unknownMs).toBeGreaterThan(knownMs / 4)
    expect(knownMs).toBeGreaterThan(unknownMs / 4)
  })

  test('hashes are Argon2id with 19 MiB, 2 passes, 1 lane (19 * 1024 = 19456 KiB)', async () => {
    expect(await hashPassword('some other password')).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
  })
})

describe('a session', () => {
  test('is over as soon as its person signed out, for a copy of the cookie too', async () => {
    const cookie = cookieFrom(await signIn(server, EMAIL))
    const out = await post(server, 'session.signOut', { cookie }).expect(200)
    expect(setCookieOf(out)).toMatch(/^__Host-session=; .*Max-Age=0/)
    expect(await me(cookie)).toBeNull()
    expect(server.db.select().from(session).all()).toEqual([])
  })

  test('ends after seven idle days: there at 7 days less a second, gone at 7 days', async () => {
    vi.useFakeTimers({ toFake: ['Date'] })
    // Whole seconds: Lucia keeps them without fractions.
    vi.setSystemTime(Date.UTC(2026, 0, 5))
    const cookie = await server.cookieOf(personId)
    vi.setSystemTime(Date.UTC(2026, 0, 12) - 1000)
    expect(await me(cookie)).not.toBeNull()
    const other = await server.cookieOf(personId)
    vi.setSystemTime(Date.UTC(2026, 0, 19) - 1000)
    expect(await me(other)).toBeNull()
  })

  test('is renewed in use by the same token, never by the id in the table', async () => {
    vi.useFakeTimers({ toFake: ['Date'] })
    vi.setSystemTime(Date.UTC(2026, 0, 5))
    const cookie = await server.cookieOf(personId)
    vi.setSystemTime(Date.UTC(2026, 0, 5, 0, 0, 59)) // under a minute: not written down
    expect(setCookieOf(await get(server, query('session.me'), { cookie }))).toBeNull()
    vi.setSystemTime(Date.UTC(2026, 0, 5, 0, 1)) // a minute
    const renewed = cookieFrom(await get(server, query('session.me'), { cookie }))
    expect(renewed).toBe(cookie)
  })

  test('idles from its last use: used on day 1, it is there seven days later less a second and gone at seven', async () => {
    vi.useFakeTimers({ toFake: ['Date'] })
    for (const [late, isThere] of [
      [-1000, true],
      [0, false],
    ] as const) {
      vi.setSystemTime(Date.UTC(2026, 0, 5))
      const cookie = await server.cookieOf(personId)
      vi.setSystemTime(Date.UTC(2026, 0, 6))
      await me(cookie)
      vi.setSystemTime(Date.UTC(2026, 0, 13) + late)
      expect((await me(cookie)) !== null).toBe(isThere)
    }
  })

  test('ends after thirty days however often it is used', async () => {
    vi.useFakeTimers({ toFake: ['Date'] })
    const startMs = Date.UTC(2026, 0, 5)
    vi.setSystemTime(startMs)
    const cookie = await server.cookieOf(personId)
    for (let day = 3; day < 30; day += 3) {
      vi.setSystemTime(startMs + day * DAY_MS)
      expect(await me(cookie)).not.toBeNull()
    }
    vi.setSystemTime(startMs + 30 * DAY_MS - 1)
    expect(await me(cookie)).not.toBeNull()
    vi.setSystemTime(startMs + 30 * DAY_MS)
    expect(await me(cookie)).toBeNull()
  })

  test('a made-up, an empty and an endless token are nobody', async () => {
    for (const token of ['', 'x', 'a'.repeat(6000), '%00', '../../etc', "' or 1=1 --"]) {
      expect(await me(`__Host-session=${token}`)).toBeNull()
    }
  })
})

describe('a change of roles', () => {
  const rename = (cookie: string) =>
    post(server, 'company.update', { cookie }).send({ companyId: 'north', name: 'North', note: '' })

  test('holds from the next call on', async () => {
    const cookie = await server.cookieOf(personId)
    await rename(cookie).expect(200)
    await server.company.as('admin').people.setRoles({ companyId: 'north', personId, roles: ['inspector'] })
    await rename(cookie).expect(403)
    expect((await me(cookie))?.companies[0]?.roles).toEqual(['inspector'])
    await server.company.as('admin').people.setRoles({ companyId: 'north', personId, roles: ['admin'] })
    await rename(cookie).expect(200)
  })

  test('gives the session another id at the next call, with the same absolute end', async () => {
    vi.useFakeTimers({ toFake: ['Date'] })
    const startMs = Date.UTC(2026, 0, 5)
    vi.setSystemTime(startMs)
    const cookie = await server.cookieOf(personId)
    const [before] = server.db.select().from(session).all()
    await server.company.as('admin').people.setRoles({ companyId: 'north', personId, roles: ['inspector'] })
    vi.setSystemTime(startMs + DAY_MS)
    // Three at once, as a screen sends them: all are answered and one of them gets the other id.
    const answers = await Promise.all([1, 2, 3].map(() => get(server, query('session.me'), { cookie }).expect(200)))
    expect(answers.map(({ body }) => (body.result.data as Me).person.id)).toEqual([personId, personId, personId])
    const renewed = answers.map(cookieFrom).filter((value) => value !== '')
    expect(renewed).toHaveLength(1)
    expect(renewed[0]).not.toBe(cookie)
    const id = hashToken(tokenIn(renewed[0] ?? ''))
    const row = server.db
      .select()
      .from(session)
      .all()
      .find((each) => each.id === id)
    expect(row).toMatchObject({ absoluteEndAtMs: before?.absoluteEndAtMs, createdAtMs: startMs, isRenewalDue: false })
    // What was under way is answered for a minute, without the old cookie being set again.
    vi.setSystemTime(startMs + DAY_MS + 59_999)
    const late = await get(server, query('session.me'), { cookie }).expect(200)
    expect([late.body.result.data.person.id, setCookieOf(late)]).toEqual([personId, null])
    vi.setSystemTime(startMs + DAY_MS + 60_000)
    expect(await me(cookie)).toBeNull()
    expect(await me(renewed[0] ?? '')).not.toBeNull()
  })

  test('and a sign-out in the same call leaves no session behind', async () => {
    const cookie = await server.cookieOf(personId)
    await server.company.as('admin').people.setRoles({ companyId: 'north', personId, roles: ['inspector'] })
    await post(server, 'session.signOut', { cookie }).expect(200)
    expect(server.db.select().from(session).all()).toEqual([])
  })

  test('somebody taken out of the company reads nothing of it from the next call on', async () => {
    const cookie = await server.cookieOf(personId)
    await get(server, query('people.list', { companyId: 'north' }), { cookie }).expect(200)
    await server.company.as('admin').people.remove({ companyId: 'north', personId })
    await get(server, query('people.list', { companyId: 'north' }), { cookie }).expect(404)
    expect((await me(cookie))?.companies).toEqual([])
  })

  test('the last admin stays one: neither role nor person can be taken away', async () => {
    const admin = server.company.as('admin')
    await admin.people.remove({ companyId: 'north', personId })
    const last = server.company.personId('admin')
    await expect(admin.people.setRoles({ companyId: 'north', personId: last, roles: [] })).rejects.toThrow(
      /admin first/,
    )
    await expect(admin.people.remove({ companyId: 'north', personId: last })).rejects.toThrow(/admin first/)
    await admin.people.setRoles({ companyId: 'north', personId: last, roles: ['admin', 'detailer'] })
  })
})
