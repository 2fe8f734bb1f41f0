import { beforeEach, describe, expect, test, vi } from 'vitest'
import { audit } from '@/db/schema/record'
import { verificationToken } from '@/db/schema/session'
import { PASSWORD, addPerson, get, openTestServer, post, query, signIn, type TestServer } from './server'

const MINUTE_MS = 60_000
const EMAIL = 'ada@north.example'
const NEW_PASSWORD = 'seven quiet lanterns'

let server: TestServer
let personId: string
let nowMs: number
beforeEach(() => {
  nowMs = Date.now()
  server = openTestServer({ now: () => nowMs })
  personId = addPerson(server, { email: EMAIL, roles: ['detailer'] })
})

const ask = (email = EMAIL) => post(server, 'session.askReset').send({ email })
const reset = (token: string, password = NEW_PASSWORD) =>
  post(server, 'session.resetPassword').send({ token, password })

/** The token of the link that is mailed next. */
async function askedToken(): Promise<string> {
  const count = server.mails.length
  await ask().expect(200)
  await vi.waitFor(() => expect(server.mails).toHaveLength(count + 1))
  return /\/reset\/([\w-]+)/.exec(server.mails.at(-1)?.text ?? '')?.[1] ?? ''
}

/** What is done after an answer has been given. */
const afterwards = () => new Promise((resolve) => setTimeout(resolve, 20))

describe('a link to a new password', () => {
  test('goes by mail to the address of the account; the table and the log do not hold it', async () => {
    const token = await askedToken()
    expect(token).toMatch(/^[\w-]{43}$/) // 32 bytes in base64url
    expect(server.mails[0]?.to).toBe(EMAIL)
    expect(server.mails[0]?.text).toContain(`http://localhost:4180/reset/${token}`)
    await get(server, `/reset/${token}`).set('Accept', 'text/html')
    expect(JSON.stringify(server.db.select().from(verificationToken).all())).not.toContain(token)
    expect(server.log()).not.toContain(token)
    expect(server.log()).toContain('/reset/[token]')
  })

  test('an unknown address gets the same answer and no mail', async () => {
    const known = await ask().expect(200)
    const unknown = await ask('nobody@north.example').expect(200)
    expect(unknown.body).toEqual(known.body)
    await vi.waitFor(() => expect(server.mails).toHaveLength(1))
    await afterwards()
    expect(server.mails).toHaveLength(1)
    expect(server.db.select().from(verificationToken).all()).toHaveLength(1)
  })

  test('takes a new password, once, and the old one no longer does', async () => {
    const token = await askedToken()
    await reset(token).expect(200)
    await signIn(server, EMAIL).expect(400)
    await signIn(server, EMAIL, NEW_PASSWORD).expect(200)
    const again = await reset(token, 'another new password').expect(404)
    expect(again.body.error.message).toContain('Ask for a new one')
    await signIn(server, EMAIL, NEW_PASSWORD).expect(200)
  })

  test('works once when two use it at the same time', async () => {
    const token = await askedToken()
    const answers = await Promise.all([reset(token), reset(token, 'another new password')])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 404])
  })

  test('ends every session of the person, of nobody else, and closes their other links', async () => {
    const [first, second] = [await askedToken(), await askedToken()]
    const own = await server.cookieOf(personId)
    const other = await server.cookieOf(server.company.personId('admin'))
    await reset(first).expect(200)
    const me = async (cookie: string) =>
      (await get(server, query('session.me'), { cookie })).body.result.data as unknown
    expect(await me(own)).toBeNull()
    expect(await me(other)).not.toBeNull()
    await reset(second).expect(404)
  })

  test('is open for an hour: there at 60 minutes less a millisecond, gone at 60', async () => {
    const [one, two] = [await askedToken(), await askedToken()]
    nowMs += 60 * MINUTE_MS - 1
    await reset(one).expect(200)
    nowMs += 1
    await reset(two).expect(404)
    const third = await askedToken()
    nowMs += 60 * MINUTE_MS
    await reset(third).expect(404)
  })

  test('an obvious password is refused and the link stays open', async () => {
    const token = await askedToken()
    const { body } = await reset(token, 'password123').expect(400)
    expect(body.error.data.problem.field).toBe('password')
    await reset(token, 'short').expect(400)
    await reset(token).expect(200)
  })

  test('a made-up one opens nothing, and neither does the token of an invitation', async () => {
    const admin = await server.cookieOf(server.company.personId('admin'))
    const invited = { companyId: 'north', email: 'new@north.example', name: 'New', roles: ['drafter'] }
    const { body } = await post(server, 'invitation.create', { cookie: admin }).send(invited).expect(200)
    await reset(String(body.result.data.link).split('/').at(-1) ?? '').expect(404)
    await reset('a'.repeat(43)).expect(404)
    await signIn(server, EMAIL, PASSWORD).expect(200)
  })

  test('is recorded where the person is at work, without the password or the token', async () => {
    const token = await askedToken()
    await reset(token).expect(200)
    const rows = server.db.select().from(audit).all()
    expect(rows.map(({ what, companyId, personId: by }) => [what, companyId, by])).toEqual([
      ['session.resetPassword', 'north', personId],
    ])
    expect(JSON.stringify(rows)).not.toMatch(new RegExp(`${token}|${NEW_PASSWORD}`))
  })
})

describe('asking again and again', () => {
  test('three are free, the fourth waits a second, known and unknown addresses alike', async () => {
    for (const email of [EMAIL, 'nobody@north.example']) {
      for (let count = 0; count < 3; count++) await ask(email).expect(200)
      const { body } = await ask(email).expect(429)
      expect(body.error.data.retryAfterS).toBe(1)
    }
  })

  test('mails no more than three links an hour to anybody', async () => {
    for (let count = 0; count < 3; count++) await askedToken()
    nowMs += 2000
    await ask().expect(200)
    await afterwards()
    expect(server.mails).toHaveLength(3)
    nowMs += 61 * MINUTE_MS
    await askedToken()
    expect(server.mails).toHaveLength(4)
  })

  test('says nothing to whoever asks when the mail cannot be sent, and logs it', async () => {
    server.mails.push = () => {
      throw new Error('no mail today')
    }
    await ask().expect(200)
    await vi.waitFor(() => expect(server.log()).toContain('mail failed'))
  })
})
