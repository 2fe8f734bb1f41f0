import 'fake-indexeddb/auto'
import { TRPCClientError } from '@trpc/client'
import { afterEach, expect, test, vi } from 'vitest'
import { failureOf, isAnswer } from '@/lib/failure'
import { createQueryClient, forgetAnswers, keepAnswers } from '@/lib/query'

const ADA = { personId: 'ada', companyIds: ['north'] }
const KEEP = { keep: true }
const stops: (() => void)[] = []
afterEach(() => {
  for (const stop of stops.splice(0)) stop()
})

/** A fresh client as after a reload, with what this owner kept. */
async function reload(owner: typeof ADA) {
  const client = createQueryClient()
  stops.push(keepAnswers(client, owner))
  await settled()
  return client
}
/** Longer than the persister waits before it writes (1 s). */
const settled = () => new Promise((resolve) => setTimeout(resolve, 1200))

const fill = (client: ReturnType<typeof createQueryClient>, key: string, meta?: Record<string, unknown>) =>
  client.fetchQuery({ queryKey: [key], queryFn: () => `answer ${key}`, ...(meta ? { meta } : {}) })

test('only answers marked to be kept outlive a reload, and for nobody else', async () => {
  const client = await reload(ADA)
  await fill(client, 'kept', KEEP)
  await fill(client, 'passing')
  await settled()
  const again = await reload(ADA)
  expect(again.getQueryData(['kept'])).toBe('answer kept')
  expect(again.getQueryData(['passing'])).toBeUndefined()
  expect((await reload({ ...ADA, personId: 'eve' })).getQueryData(['kept'])).toBeUndefined()
  expect((await reload({ ...ADA, companyIds: ['north', 'south'] })).getQueryData(['kept'])).toBeUndefined()
})

test('signing out forgets them, and leaves who is signed in to be set', async () => {
  const client = await reload(ADA)
  await fill(client, 'kept', KEEP)
  client.setQueryData([['session', 'me'], { type: 'query' }], null)
  await settled()
  for (const stop of stops.splice(0)) stop()
  await forgetAnswers(client)
  expect(client.getQueryData(['kept'])).toBeUndefined()
  expect(client.getQueryData([['session', 'me'], { type: 'query' }])).toBeNull()
  expect((await reload(ADA)).getQueryData(['kept'])).toBeUndefined()
})

const answered = (code: string, more: Record<string, unknown> = {}) =>
  TRPCClientError.from({ error: { code: -32000, message: 'A sentence.', data: { code, fields: null, ...more } } })

test('an error that the server answered is not asked again; where none came, twice more', async () => {
  vi.useFakeTimers({ shouldAdvanceTime: true, advanceTimeDelta: 500 })
  const client = createQueryClient()
  const refused = vi.fn(() => Promise.reject(answered('FORBIDDEN')))
  await expect(client.fetchQuery({ queryKey: ['a'], queryFn: refused, retry: retryOf(client) })).rejects.toThrow()
  expect(refused).toHaveBeenCalledTimes(1)
  const silent = vi.fn(() => Promise.reject(new TypeError('fetch failed')))
  await expect(client.fetchQuery({ queryKey: ['b'], queryFn: silent, retry: retryOf(client) })).rejects.toThrow()
  expect(silent).toHaveBeenCalledTimes(3)
  vi.useRealTimers()
})
const retryOf = (client: ReturnType<typeof createQueryClient>) => client.getDefaultOptions().queries?.retry ?? false

test('a failure is read as a sentence, fields and a time to wait', () => {
  expect(failureOf(new TypeError('fetch failed'))).toMatchObject({ code: 'unreachable', fields: {} })
  expect(isAnswer(new TypeError('fetch failed'))).toBe(false)
  const bad = answered('BAD_REQUEST', { fields: { email: ['must be a mail address', 'second'] }, problem: null })
  expect(failureOf(bad)).toMatchObject({ code: 'BAD_REQUEST', fields: { email: 'It must be a mail address.' } })
  const wrong = answered('BAD_REQUEST', { problem: { table: null, id: null, field: 'password', message: 'Wrong.' } })
  expect(failureOf(wrong).fields).toEqual({ password: 'Wrong.' })
  expect(failureOf(answered('TOO_MANY_REQUESTS', { retryAfterS: 8 })).retryAfterS).toBe(8)
})
