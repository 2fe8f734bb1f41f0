import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { openDatabase, type Db } from '@/db/client'
import { DEMO_PEOPLE } from '@/db/seed/demo-company'
import { demoLayout } from '@/db/seed/demo-layout'
import { isPassword } from '@/server/password'
import { seedDemo } from '@/server/seed-demo'
import { companiesOf, credentialsByEmail } from '@/server/stores/person'
import { jobPeople, jobsOf } from '@/server/stores/job'
import { loadLayout } from '@/server/stores/layout'
import { checkHere } from './check-here'

let db: Db
beforeEach(() => {
  db = openDatabase(':memory:')
})
afterEach(() => db.$client.close())

const NOW = () => Date.UTC(2026, 0, 5, 8)

describe('the demo in an empty database', () => {
  test('has one company, a person for each role and the job with all of them on it', async () => {
    const signIns = (await seedDemo({ db, check: checkHere, now: NOW, publicUrl: null })) ?? []
    expect(signIns.map(({ email }) => email)).toEqual(DEMO_PEOPLE.map(({ email }) => email))
    expect(new Set(signIns.map(({ password }) => password)).size).toBe(5)
    for (const { email, password, roles } of signIns) {
      const person = credentialsByEmail(db, email)
      if (!person) throw new Error(`${email} is not there`)
      expect(await isPassword(person.passwordHash, password)).toBe(true)
      expect(new Set(companiesOf(db, person.id)[0]?.roles)).toEqual(new Set(roles))
      expect(jobsOf(db, person.id)).toHaveLength(1)
    }
    expect(new Set(signIns.flatMap(({ roles }) => roles))).toEqual(
      new Set(['detailer', 'engineer', 'drafter', 'inspector', 'admin']),
    )
  })

  test('keeps every row of the layout, and waits for the engineer: no reading is accepted', async () => {
    await seedDemo({ db, check: checkHere, now: NOW, publicUrl: null })
    const person = credentialsByEmail(db, DEMO_PEOPLE[0]?.email ?? '')
    const job = jobsOf(db, person?.id ?? '')[0]
    const company = companiesOf(db, person?.id ?? '')[0]
    if (!job || !company) throw new Error('the demo has no job')
    const stored = loadLayout(db, { companyId: company.id, jobId: job.id })
    const file = demoLayout()
    for (const table of [
      'pours',
      'edges',
      'pans',
      'tendons',
      'anchors',
      'steel',
      'hardware',
      'concreteResults',
    ] as const) {
      expect(stored[table]).toHaveLength(file[table].length)
    }
    expect(stored.job.basis).toBe('en-1992')
    expect(stored.job.readings).toEqual([])
    expect(jobPeople(db, { companyId: company.id, jobId: job.id })).toHaveLength(5)
  })

  test('leaves a database with people in it alone', async () => {
    await seedDemo({ db, check: checkHere, now: NOW, publicUrl: null })
    expect(await seedDemo({ db, check: checkHere, now: NOW, publicUrl: null })).toBeNull()
  })

  test('is refused on a server with a public address, and stores nothing', async () => {
    await expect(seedDemo({ db, check: checkHere, now: NOW, publicUrl: 'https://floors.example' })).rejects.toThrow(
      /public|reachable/,
    )
    expect(credentialsByEmail(db, DEMO_PEOPLE[0]?.email ?? '')).toBeUndefined()
  })
})
