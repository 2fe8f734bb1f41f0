import { beforeEach, describe, expect, test } from 'vitest'
import { networkOf } from '@/server/throttle'
import { rateLimit } from '@/db/schema/session'
import { signIn } from '@/server/sign-in'
import { addPerson, openTestServer, PASSWORD, type TestServer } from './server'
import { contextFor } from './context'

const EMAIL = 'ada@north.example'
const OFFICE = '192.0.2.10'
const SECOND_MS = 1000
const MINUTE_MS = 60 * SECOND_MS

let server: TestServer
let nowMs: number
beforeEach(() => {
  server = openTestServer()
  addPerson(server, { email: EMAIL, roles: ['detailer'] })
  nowMs = Date.UTC(2026, 0, 5)
})

/** 'in', 'wrong', or the seconds to wait. */
async function attempt(address: string, password = 'a guess', email = EMAIL): Promise<'in' | 'wrong' | number> {
  const context = { ...contextFor(server, null), address, now: () => nowMs }
  const error = await signIn(context, { email, password }).then(
    () => null,
    (reason: unknown) => reason as { kind: string; details: { retryAfterS?: number } },
  )
  if (error === null) return 'in'
  return error.kind === 'throttled' ? (error.details.retryAfterS ?? Infinity) : 'wrong'
}

describe('guessing at one account from one address', () => {
  test('five attempts are free; then each waits 1, 2, 4, 8, 16, 32, at most 60 s', async () => {
    for (let count = 0; count < 5; count++) expect(await attempt(OFFICE)).toBe('wrong')
    for (const waitS of [1, 2, 4, 8, 16, 32, 60, 60, 60]) {
      expect(await attempt(OFFICE)).toBe(waitS)
      nowMs += waitS * SECOND_MS - 1
      expect(await attempt(OFFICE)).toBe(1) // a millisecond short
      nowMs += 1
      expect(await attempt(OFFICE)).toBe('wrong')
    }
  })

  test('in a day gets at most the 5 free ones, 6 while the wait grows and one a minute', async () => {
    let checked = 0
    const endMs = nowMs + 24 * 60 * MINUTE_MS
    while (nowMs < endMs) {
      const answer = await attempt(OFFICE, 'a guess')
      if (answer === 'wrong') checked++
      else nowMs += Number(answer) * SECOND_MS
    }
    expect(checked).toBeLessThanOrEqual(5 + 6 + 24 * 60)
    expect(checked).toBeGreaterThan(24 * 60 - 60)
  }, 240_000)

  test('a hundred at once are no more than five', async () => {
    const answers = await Promise.all(Array.from({ length: 100 }, () => attempt(OFFICE)))
    expect(answers.filter((answer) => answer === 'wrong')).toHaveLength(5)
  })

  test('the right password gets in once the wait is over, and the count begins anew', async () => {
    for (let count = 0; count < 5; count++) await attempt(OFFICE)
    expect(await attempt(OFFICE, PASSWORD)).toBe(1)
    nowMs += SECOND_MS
    expect(await attempt(OFFICE, PASSWORD)).toBe('in')
    for (let count = 0; count < 5; count++) expect(await attempt(OFFICE)).toBe('wrong')
  })
})

describe('guessing at one account from many addresses', () => {
  const guessFromEverywhere = async (count: number) => {
    const answers: unknown[] = []
    for (let n = 0; n < count; n++) answers.push(await attempt(`198.51.100.${n}`))
    return answers
  }

  test('is held back for all of them together after twenty', async () => {
    const answers = await guessFromEverywhere(40)
    expect(answers.filter((answer) => answer === 'wrong')).toHaveLength(20)
  })

  test('does not hold back the owner where they signed in before', async () => {
    expect(await attempt(OFFICE, PASSWORD)).toBe('in')
    await guessFromEverywhere(40)
    expect(await attempt(OFFICE, PASSWORD)).toBe('in')
  })

  test('holds back the owner in a new place by a minute at most', async () => {
    for (let n = 0; n < 20; n++) await attempt(`198.51.100.${n}`)
    const waitS = await attempt('203.0.113.1', PASSWORD)
    expect(waitS).toBeGreaterThan(0)
    expect(waitS).toBeLessThanOrEqual(60)
    nowMs += Number(waitS) * SECOND_MS
    expect(await attempt('203.0.113.1', PASSWORD)).toBe('in')
  })
})

test('one password tried on many accounts from one address is held back after fifty', async () => {
  const answers: unknown[] = []
  for (let n = 0; n < 80; n++) answers.push(await attempt(OFFICE, 'Spring2026', `person${n}@north.example`))
  expect(answers.filter((answer) => answer === 'wrong')).toHaveLength(50)
}, 60_000)

test('an own account does not wipe out guesses at others', async () => {
  addPerson(server, { email: 'eve@north.example', roles: ['drafter'] })
  let checked = 0
  for (let n = 0; n < 100; n++) {
    if ((await attempt(OFFICE, 'a guess', `person${n}@north.example`)) === 'wrong') checked++
    await attempt(OFFICE, PASSWORD, 'eve@north.example')
  }
  expect(checked).toBeLessThanOrEqual(50)
}, 60_000)

test('the table holds neither addresses of people nor of machines, and forgets', async () => {
  await attempt(OFFICE)
  const text = JSON.stringify(server.db.select().from(rateLimit).all())
  expect(text).not.toContain(EMAIL)
  expect(text).not.toContain(OFFICE)
  nowMs += 60 * MINUTE_MS
  await attempt('203.0.113.9', 'a guess', 'other@north.example')
  expect(server.db.select().from(rateLimit).all()).toHaveLength(3) // pair, account and address of the last one alone
})

test('an IPv6 address counts as its /64, IPv4 as itself however it is written', () => {
  expect(networkOf('2001:db8:1:2:3:4:5:6')).toBe('2001:db8:1:2::/64')
  expect(networkOf('2001:DB8:1:2::9')).toBe(networkOf('2001:db8:1:2:ffff::1'))
  expect(networkOf('2001:0db8:0001:0002::9')).toBe('2001:db8:1:2::/64')
  expect(networkOf('2001:db8::1')).toBe('2001:db8:0:0::/64')
  expect(networkOf('::1')).toBe('0:0:0:0::/64')
  expect(networkOf('::ffff:192.0.2.1')).toBe('192.0.2.1')
})
