import fc from 'fast-check'
import { beforeAll, describe, expect, test } from 'vitest'
import { badInputs } from './bad-input'
import { PROCEDURES, openPopulated, type Populated } from './populated'
import { get, post } from './server'

/** 100 of each in every run of the tests; `npm run soak` sets 2,000. */
const RUNS = Number(process.env.BAD_INPUTS ?? 100)
const WIRE_RUNS = Math.ceil(RUNS / 20)
const SEED = 20_260_105
const REFUSALS = ['BAD_REQUEST', 'UNAUTHORIZED', 'FORBIDDEN', 'NOT_FOUND', 'CONFLICT', 'TOO_MANY_REQUESTS']

let populated: Populated
beforeAll(async () => {
  populated = await openPopulated()
})

const reasonOf = (reason: unknown) => reason as { code: string; cause?: unknown }

describe.each(Object.keys(PROCEDURES))('%s', (path) => {
  test(
    'takes or refuses whatever comes, and never breaks',
    async () => {
      const property = fc.asyncProperty(badInputs(populated.inputs[path]), async (input) => {
        const failure = await populated.tried(() =>
          populated.call('everything', path, input).then(() => null, reasonOf),
        )
        if (failure && !REFUSALS.includes(failure.code)) throw new Error(failure.code, { cause: failure.cause })
      })
      await fc.assert(property, { numRuns: RUNS, seed: SEED })
    },
    RUNS * 400,
  )

  test(
    'answers whatever comes over the wire with 200 or 4xx and without a stack',
    async () => {
      const { server, people } = populated
      const cookie = await server.cookieOf(people.everything)
      // Addresses have an end: 16 kB of headers are what Node.js reads.
      const ask = (body: string) =>
        PROCEDURES[path]?._def.type === 'query'
          ? get(server, `/trpc/${path}?input=${encodeURIComponent(body).slice(0, 4000)}`, { cookie })
          : post(server, path, { cookie }).send(body)
      const json = badInputs(populated.inputs[path]).map(toJson)
      const property = fc.asyncProperty(json, async (body) => {
        const { status, text } = await populated.tried(async () => ask(body))
        expect(status === 200 || (status >= 400 && status < 500)).toBe(true)
        expect(text).not.toMatch(/\bat .*\.(ts|js):\d+|node_modules/)
      })
      await fc.assert(property, { numRuns: WIRE_RUNS, seed: SEED })
    },
    RUNS * 400,
  )
})

/** As text that a client could send; what JSON has no word for becomes a word that JSON does not know. */
function toJson(value: unknown): string {
  try {
    return (
      JSON.stringify(value, (_key, inner: unknown): unknown => (typeof inner === 'bigint' ? String(inner) : inner)) ??
      'NaN'
    )
  } catch {
    return '{'
  }
}
