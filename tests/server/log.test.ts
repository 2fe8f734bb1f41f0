import { expect, test } from 'vitest'
import { serverLog } from '@/server/log'
import { person } from '@/db/schema/person'
import { write } from '@/db/client'
import { addPerson, get, openTestServer, post, query, setCookieOf, signIn } from './server'

test('a secret that goes through the server is never in its log', async () => {
  const server = openTestServer()
  addPerson(server, { email: 'ada@north.example', roles: ['admin'] })
  const admin = await server.cookieOf(server.company.personId('admin'))
  const secrets: string[] = ['planted-password-1', 'planted-password-2', 'planted-token-in-a-link', 'planted-cookie']

  await signIn(server, 'ada@north.example', 'planted-password-1').expect(400)
  const token = (setCookieOf(await signIn(server, 'ada@north.example')) ?? '').split(/[=;]/)[1] ?? ''
  secrets.push(token)
  const invited = { companyId: 'north', email: 'new@north.example', name: 'New', roles: ['drafter'] }
  const { body } = await post(server, 'invitation.create', { cookie: admin }).send(invited).expect(200)
  const inviteToken = String(body.result.data.link).split('/').at(-1) ?? ''
  secrets.push(inviteToken)
  await get(server, query('invitation.byToken', { token: inviteToken })).expect(200)
  await get(server, `/invite/${inviteToken}`).set('Accept', 'text/html')
  await get(server, '/invite/planted-token-in-a-link/more?token=planted-token-in-a-link')
  await get(server, query('session.me'), { cookie: '__Host-session=planted-cookie' })
  const accepted = { token: inviteToken, name: 'New', password: 'planted-password-2' }
  // A query that fails with the password's hash among its values.
  server.db.$client.exec(
    'CREATE TRIGGER refuse BEFORE INSERT ON person BEGIN SELECT RAISE(ABORT, $$no$$); END'.replaceAll('$$', "'"),
  )
  await post(server, 'invitation.accept').send(accepted).expect(500)

  const log = server.log()
  expect(log).toContain('impossible state')
  expect(log).toContain('/invite/[token]')
  for (const secret of secrets) {
    expect(secret.length).toBeGreaterThan(10)
    expect(log).not.toContain(secret)
  }
  expect(log).not.toMatch(/\$argon2id|[?&]input=|"cookie"|"headers"/)
})

test('a secret that is logged by its name by mistake is blotted out', () => {
  let text = ''
  const log = serverLog({ level: 'info', stream: { write: (line) => void (text += line) } })
  const secret = 'planted'
  log.info({ password: secret, input: { token: secret, deep: { cookie: secret } }, link: secret }, 'by mistake')
  expect(text).not.toContain(secret)
  expect(text).toContain('[Redacted]')
})

test('an error of a query is logged with its SQL and place and without its values', () => {
  const { db, company } = openTestServer()
  let text = ''
  const log = serverLog({ level: 'info', stream: { write: (line) => void (text += line) } })
  try {
    const row = { id: company.personId('admin'), email: 'x@x.example', name: 'planted-value' }
    write(db, (tx) =>
      tx
        .insert(person)
        .values({ ...row, passwordHash: 'planted-hash', createdAtMs: 0, updatedAtMs: 0 })
        .run(),
    )
  } catch (error) {
    log.error({ err: error }, 'failed')
  }
  expect(text).toContain('UNIQUE constraint failed')
  expect(text).toMatch(/log\.test\.ts/)
  expect(text).not.toContain('planted')
})
