import { beforeEach, describe, expect, test } from 'vitest'
import { COMMON_PASSWORDS } from '@/server/common-passwords-table'
import { isObvious } from '@/server/password'
import { companiesOf, credentialsByEmail } from '@/server/stores/person'
import { invitation } from '@/db/schema/membership'
import { audit } from '@/db/schema/record'
import { openDatabase } from '@/db/client'
import { acceptInvitation, firstInvitationLink, invitationByToken } from '@/server/invite'
import { contextFor } from './context'
import { PASSWORD, addPerson, get, openTestServer, post, query, setCookieOf, type TestServer } from './server'

const DAY_MS = 24 * 60 * 60_000

let server: TestServer
let admin: string
let nowMs: number
beforeEach(async () => {
  nowMs = Date.now()
  server = openTestServer({ now: () => nowMs })
  admin = await server.cookieOf(server.company.personId('admin'))
})

const INVITED = { email: 'new@north.example', name: 'New Person', roles: ['drafter', 'inspector'] }
async function invite(changes: Record<string, unknown> = {}): Promise<{ id: string; link: string; token: string }> {
  const input = { companyId: 'north', ...INVITED, ...changes }
  const { body } = await post(server, 'invitation.create', { cookie: admin }).send(input).expect(200)
  const { id, link } = body.result.data as { id: string; link: string }
  return { id, link, token: link.split('/').at(-1) ?? '' }
}
const accept = (token: string, password = PASSWORD) =>
  post(server, 'invitation.accept').send({ token, name: 'New Person', password })

describe('an invitation', () => {
  test('is mailed with its link, which the admin sees too and the table does not hold', async () => {
    const { link, token } = await invite()
    expect(link).toMatch(/^http:\/\/localhost:4180\/invite\/[\w-]{43}$/) // 32 bytes in base64url
    expect(server.mails).toHaveLength(1)
    expect(server.mails[0]?.to).toBe(INVITED.email)
    expect(server.mails[0]?.text).toContain(link)
    expect(JSON.stringify(server.db.select().from(invitation).all())).not.toContain(token)
    expect(JSON.stringify(server.db.select().from(audit).all())).not.toContain(token)
  })

  test('says what it offers to whoever holds it, and signs them in', async () => {
    const { token } = await invite()
    const { body } = await get(server, query('invitation.byToken', { token })).expect(200)
    expect(body.result.data).toEqual({ companyName: 'Company north', ...INVITED })
    const response = await accept(token).expect(200)
    expect(response.body.result.data.companies).toEqual([
      { id: 'north', name: 'Company north', roles: ['drafter', 'inspector'] },
    ])
    expect(setCookieOf(response)).not.toBeNull()
  })

  test('works once, also when two use it at the same time', async () => {
    const { token } = await invite()
    const answers = await Promise.all([accept(token), accept(token), accept(token)])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 404, 404])
    await accept(token).expect(404)
    await get(server, query('invitation.byToken', { token })).expect(404)
  })

  test('is open to a millisecond before seven days and not from then on', async () => {
    const { token } = await invite()
    nowMs += 7 * DAY_MS - 1
    await get(server, query('invitation.byToken', { token })).expect(200)
    nowMs += 1
    await accept(token).expect(404)
  })

  test('that was withdrawn is not open, nor listed', async () => {
    const { id, token } = await invite()
    await post(server, 'invitation.withdraw', { cookie: admin })
      .send({ companyId: 'north', invitationId: id })
      .expect(200)
    await accept(token).expect(404)
    const { body } = await get(server, query('invitation.list', { companyId: 'north' }), { cookie: admin })
    expect(body.result.data).toEqual([])
  })

  test('of another company is not an admin’s to withdraw', async () => {
    const { id } = await invite()
    const other = { companyId: 'north', invitationId: `${id}x` }
    await post(server, 'invitation.withdraw', { cookie: admin }).send(other).expect(404)
  })

  test('takes no account over: whoever has one gives its password', async () => {
    const { token } = await invite({ email: 'ada@south.example' })
    const id = addPerson(server, { email: 'ada@south.example', roles: ['inspector'] })
    const before = credentialsByEmail(server.db, 'ada@south.example')?.passwordHash
    const refusal = await accept(token, 'a password of my own').expect(400)
    expect(refusal.body.error.data.problem.field).toBe('password')
    expect(setCookieOf(refusal)).toBeNull()
    await accept(token, PASSWORD).expect(200)
    expect(credentialsByEmail(server.db, 'ada@south.example')?.passwordHash).toBe(before)
    expect(companiesOf(server.db, id)[0]?.roles).toEqual(['drafter', 'inspector'])
  })

  test('to somebody who is in the company already is refused', async () => {
    const input = { companyId: 'north', ...INVITED, email: 'drafter@north.example' }
    await post(server, 'invitation.create', { cookie: admin }).send(input).expect(409)
  })

  test('cannot be aimed at another address by whoever accepts it', async () => {
    const { token } = await invite()
    const input = { token, email: 'other@north.example', name: 'X', password: PASSWORD }
    const { body } = await post(server, 'invitation.accept').send(input).expect(200)
    expect(body.result.data.person.email).toBe(INVITED.email)
  })
})

describe('a new password', () => {
  test.each(['1234567', 'short', ''])('%o has fewer than 8 characters and is refused', async (password) => {
    await accept((await invite()).token, password).expect(400)
  })

  test.each(['password', 'Password1', 'QWERTYUIOP', 'aaaaaaaaaa', 'wedgeline1', 'new@north.example'])(
    '%s is refused as obvious and the invitation stays open',
    async (password) => {
      const { token } = await invite()
      const { body } = await accept(token, password).expect(400)
      expect(body.error.data.problem.field).toBe('password')
      await accept(token).expect(200)
    },
  )

  test.each(['eight ch', 'ünïcödé ☃ words', 'x'.repeat(63) + 'y', `  lead and trail  `])(
    '%o is taken',
    async (password) => {
      await accept((await invite()).token, password).expect(200)
      await post(server, 'session.signIn').send({ email: INVITED.email, password }).expect(200)
    },
  )

  test('the list holds nothing shorter than what is refused anyway, and small letters alone', () => {
    for (const word of COMMON_PASSWORDS) {
      expect(word.length).toBeGreaterThanOrEqual(8)
      expect(word).toBe(word.toLowerCase())
      expect(isObvious(word.toUpperCase(), 'a@b.example')).toBe(true)
    }
  })
})

describe('an empty database', () => {
  const tokenOf = (link: string | null) => link?.split('/').at(-1) ?? ''
  const setUp = () => {
    const db = openDatabase(':memory:')
    return { db, context: contextFor({ db }, null) }
  }
  const ada = { name: 'Ada', email: 'ada@north.example', password: PASSWORD }

  test('lets the first person in as admin and detailer only', async () => {
    const { db, context } = setUp()
    const token = tokenOf(firstInvitationLink(context))
    expect(invitationByToken(context, token).email).toBeNull()
    const { companies } = await acceptInvitation(context, { token, ...ada })
    expect(companies.map(({ roles }) => roles)).toEqual([['admin', 'detailer']])
    await expect(acceptInvitation(context, { token, ...ada, email: 'b@north.example' })).rejects.toThrow(/not open/)
    expect(firstInvitationLink(context)).toBeNull()
    db.$client.close()
  })

  test('needs a mail address from the first person', async () => {
    const { context } = setUp()
    const token = tokenOf(firstInvitationLink(context))
    await expect(acceptInvitation(context, { token, name: 'Ada', password: PASSWORD })).rejects.toThrow(/mail address/)
  })

  test('started again prints another link, and the one before stops working', async () => {
    const { context } = setUp()
    const first = tokenOf(firstInvitationLink(context))
    const second = tokenOf(firstInvitationLink(context))
    await expect(acceptInvitation(context, { token: first, ...ada })).rejects.toThrow(/not open/)
    await acceptInvitation(context, { token: second, ...ada })
  })
})
