import { TRPCError } from '@trpc/server'
import { readLayout, type LayoutFile } from '@wedgeline/contract'
import { Failure } from '@/server/failure'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { loadLayout } from '@/server/stores/layout'
import { demoWith, placeOf } from '../contract/layout-edits'
import { CONTRADICTIONS, WRONG_FIELDS } from '../contract/malformed-tables'
import { openTestCompany, type TestCompany } from './company'

let company: TestCompany
beforeAll(() => {
  company = openTestCompany()
})
afterAll(() => company.db.$client.close())

/** Rows of every table, so that half a layout left behind anywhere shows. */
function rowCounts(): Record<string, unknown> {
  const sql = company.db.$client
  const tables = sql.prepare("select name from sqlite_master where type = 'table'").pluck().all() as string[]
  return Object.fromEntries(tables.map((name) => [name, sql.prepare(`select count(*) from "${name}"`).pluck().get()]))
}

const importIt = (layout: unknown) => company.as('detailer').job.importLayout({ companyId: company.id, layout })

async function refusalOf(layout: unknown): Promise<TRPCError> {
  const error: unknown = await importIt(layout).catch((reason: unknown) => reason)
  if (!(error instanceof TRPCError)) throw new Error(`not refused: ${JSON.stringify(error)}`)
  return error
}

describe('a malformed layout is refused whole', () => {
  test.each([...WRONG_FIELDS, ...CONTRADICTIONS])('$what', async ({ path, value }) => {
    const layout = demoWith(path, value)
    const before = rowCounts()
    const error = await refusalOf(layout)
    expect(error.code).toBe('BAD_REQUEST')
    expect(rowCounts()).toEqual(before)
  })

  test('with every field and message that the command line prints', async () => {
    for (const { path, value, field } of [...WRONG_FIELDS, ...CONTRADICTIONS].filter((_, i) => i % 4 === 0)) {
      const layout = demoWith(path, value)
      const refusal = await refusalOf(layout)
      const problems = refusal.cause instanceof Failure ? refusal.cause.details.problems : undefined
      const printed = readLayout(layout).problems.filter(({ severity }) => severity === 'refused')
      expect(problems).toEqual(printed.map((problem) => ({ field: problem.field, message: problem.message })))
      expect(problems?.map((problem) => problem.field)).toContain(field)
      expect(refusal.message).toContain(`${printed[0]?.field}: ${printed[0]?.message}`)
    }
  })

  test.each([undefined, null, 'text', 7, [], {}])('%j is no layout', async (layout) => {
    expect((await refusalOf(layout)).code).toBe('BAD_REQUEST')
  })
})

test('an anchor typed off its edge is stored as typed', async () => {
  const { jobId } = await importIt(demoWith('anchors.0.chainageMm', 19_300))
  const stored: LayoutFile = loadLayout(company.db, { companyId: company.id, jobId })
  const tendon = stored.tendons.find(({ mark }) => mark === 'L1P1-N01')
  const chainages = stored.anchors.filter(({ tendonId }) => tendonId === tendon?.id).map(({ chainageMm }) => chainageMm)
  // Its other end stays at 900 on E4.
  expect(chainages.sort((a, b) => a - b)).toEqual([900, 19_300])
  expect(placeOf('anchors', 'L1P1-N01S')).toBe(0)
})
