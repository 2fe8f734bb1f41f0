import { mkdirSync, mkdtempSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import Database from 'better-sqlite3'
import { getTableConfig, type SQLiteTable } from 'drizzle-orm/sqlite-core'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import * as schema from '@/db/schema'
import { openDatabase } from '@/db/client'
import { migrateGuarded } from '@/db/migrate'
import { addCompany, openTestCompany } from './company'
import { sampleLayout } from './layout-sample'

const MIGRATIONS = join(import.meta.dirname, '../../drizzle')

describe('the schema', () => {
  const WITHOUT_COMPANY = ['company', 'person', 'session', 'verification_token', 'rate_limit']
  const tables = Object.values(schema).map((table) => getTableConfig(table as SQLiteTable))

  test('holds every table that starts with its company, but for those that belong to no company', () => {
    const keyless = tables.filter(({ primaryKeys }) => primaryKeys[0]?.columns[0]?.name !== 'company_id')
    expect(keyless.map(({ name }) => name).sort()).toEqual([...WITHOUT_COMPANY].sort())
  })

  test('starts every reference between rows of companies with the company', () => {
    const loose = tables.flatMap(({ name, foreignKeys }) =>
      foreignKeys
        .map((key) => key.reference())
        .filter(({ foreignTable }) => !WITHOUT_COMPANY.includes(getTableConfig(foreignTable).name))
        .filter(
          ({ columns, foreignColumns }) =>
            columns[0]?.name !== 'company_id' || foreignColumns[0]?.name !== 'company_id',
        )
        .map(({ columns }) => `${name}: ${columns.map((column) => column.name).join(', ')}`),
    )
    expect(loose).toEqual([])
  })

  test('indexes every unique key of a company from the company on', () => {
    const loose = tables
      .filter(({ name }) => !WITHOUT_COMPANY.includes(name))
      .flatMap(({ uniqueConstraints }) => uniqueConstraints)
      .filter(({ columns }) => columns[0]?.name !== 'company_id')
    expect(loose).toEqual([])
  })
})

describe('a reference', () => {
  const anchorTo = (column: string) =>
    `update anchor set ${column} = ? where id = (select min(id) from anchor where company_id = ? and job_id = ?)`

  test('across companies cannot be stored, in any column of an anchor', async () => {
    const north = openTestCompany()
    const south = addCompany(north.db, 'south')
    const jobs = await Promise.all(
      [north, south].map((each) =>
        each.as('detailer').job.importLayout({ companyId: each.id, layout: sampleLayout() }),
      ),
    )
    const theirs = (await south.as('detailer').layout.byJob({ jobId: jobs[1]?.jobId ?? '' })).layout
    const foreign = {
      tendon_id: theirs.tendons[0]?.id,
      edge_id: theirs.edges[0]?.id,
      hardware_id: theirs.hardware[0]?.id,
      cast_with_pour_id: theirs.pours[0]?.id,
      stressed_with_pour_id: theirs.pours[0]?.id,
    }
    for (const [column, id] of Object.entries(foreign)) {
      expect(id).toBeDefined()
      const run = () => north.db.$client.prepare(anchorTo(column)).run(id, north.id, jobs[0]?.jobId)
      expect(run, column).toThrow('FOREIGN KEY constraint failed')
    }
  })

  test('into another job of the same company cannot be stored', async () => {
    const north = openTestCompany()
    const detailer = north.as('detailer')
    const one = await detailer.job.importLayout({ companyId: north.id, layout: sampleLayout() })
    const two = await detailer.job.importLayout({ companyId: north.id, layout: sampleLayout() })
    const theirs = (await detailer.layout.byJob({ jobId: two.jobId })).layout
    const run = () => north.db.$client.prepare(anchorTo('edge_id')).run(theirs.edges[0]?.id, north.id, one.jobId)
    expect(run).toThrow('FOREIGN KEY constraint failed')
  })
})

describe('the rules of the tables', () => {
  let sql: Database.Database
  beforeEach(async () => {
    const north = openTestCompany()
    await north.as('detailer').job.importLayout({ companyId: north.id, layout: sampleLayout() })
    sql = north.db.$client
  })

  test.each([
    ['a pour without thickness', 'update pour set thickness_mm = 0'],
    ['a stage with no share', 'update stage set share = 0'],
    ['a stage with more than the whole', 'update stage set share = 1.0001'],
    ['a mat with more than all of it spare', 'update mat_layer set spare_share = 1.01'],
    ['an anchor both at an edge and in a pan', 'update anchor set pan_id = (select id from pan)'],
    ['an anchor nowhere', 'update anchor set edge_id = null'],
    [
      'steel of an anchor that names an edge too',
      `update steel set edge_id = (select id from edge) where zone_kind = 'anchor'`,
    ],
    ['steel of an edge that names none', `update steel set edge_id = null where zone_kind = 'edge'`],
    ['steel of a kind of zone that there is not', `update steel set zone_kind = 'roof'`],
    ['steel whose shape is no JSON', `update steel set shape = 'links'`],
    ['a tendon over the largest jacking ratio', 'update tendon set jacking_ratio = 0.951'],
    ['hardware with half a hole', 'update hardware set hole_width_mm = null'],
    ['an approval with a negative strength', 'update approval_strength set strength_min_mpa = -1'],
  ])('refuse %s', (_what, statement) => {
    expect(() => sql.exec(statement)).toThrow('CHECK constraint failed')
  })

  test.each([
    ['share 1 of a stage', 'update stage set share = 1'],
    ['spare share 0 and 1', 'update mat_layer set spare_share = 1'],
    ['jacking ratio 0.95', 'update tendon set jacking_ratio = 0.95'],
  ])('take %s, which lies on the limit', (_what, statement) => {
    expect(() => sql.exec(statement)).not.toThrow()
  })

  test('keep one bar to a mark and one mark to a bar within a pour', () => {
    const give = (id: string, mark: number, key: string) =>
      sql
        .prepare(
          'insert into bar_mark (company_id, job_id, id, pour_id, mark, key, created_at_ms) select company_id, job_id, ?, id, ?, ?, 0 from pour',
        )
        .run(id, mark, key)
    give('one', 1, 'B12 00 A1000')
    expect(() => give('two', 1, 'B12 00 A2000')).toThrow('UNIQUE constraint failed')
    expect(() => give('two', 2, 'B12 00 A1000')).toThrow('UNIQUE constraint failed')
  })

  test('never let an entry of the audit be changed or deleted', () => {
    expect(() => sql.exec(`update audit set what = 'nothing'`)).toThrow('audit rows are never changed')
    expect(() => sql.exec('delete from audit')).toThrow('audit rows are never deleted')
  })
})

describe('opening a database', () => {
  test('holds the settings that keep what it is given', () => {
    const folder = mkdtempSync(join(tmpdir(), 'wedgeline-'))
    const { $client: sql } = openDatabase(join(folder, 'data.sqlite'))
    expect(sql.pragma('journal_mode', { simple: true })).toBe('wal')
    expect(sql.pragma('synchronous', { simple: true })).toBe(2)
    expect(sql.pragma('foreign_keys', { simple: true })).toBe(1)
    expect(sql.pragma('busy_timeout', { simple: true })).toBe(5000)
    sql.close()
    rmSync(folder, { recursive: true })
  })
})

describe('a migration', () => {
  let folder: string
  let sql: Database.Database
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'wedgeline-'))
    mkdirSync(join(folder, 'meta'))
    sql = new Database(':memory:')
  })
  afterEach(() => {
    sql.close()
    rmSync(folder, { recursive: true })
  })

  /** Writes one migration a statement list, in the form of the generator, and applies what is new. */
  function migrate(...migrations: string[][]): void {
    const entries = migrations.map((_, i) => ({ idx: i, version: '6', when: i + 1, tag: `000${i}`, breakpoints: true }))
    writeFileSync(join(folder, 'meta/_journal.json'), JSON.stringify({ version: '7', dialect: 'sqlite', entries }))
    migrations.forEach((statements, i) => {
      writeFileSync(join(folder, `000${i}.sql`), statements.join('\n--> statement-breakpoint\n'))
    })
    migrateGuarded(sql, folder)
  }
  const START = [
    'create table parent (id text primary key)',
    'create table child (id text primary key, parent_id text references parent(id) on delete cascade)',
  ]
  const ROWS = "insert into parent values ('a'); insert into child values ('b', 'a')"
  const REBUILD = [
    'create table new_parent (id text primary key, note text)',
    'insert into new_parent (id) select id from parent',
    'drop table parent',
    'alter table new_parent rename to parent',
  ]
  const count = (table: string) => sql.prepare(`select count(*) from ${table}`).pluck().get()

  test('that rebuilds a table keeps the rows that point at it', () => {
    migrate(START)
    sql.pragma('foreign_keys = ON')
    sql.exec(ROWS)
    migrate(START, REBUILD)
    expect(count('child')).toBe(1)
    expect(count('parent')).toBe(1)
  })

  test('that would lose rows is undone whole', () => {
    migrate(START)
    sql.exec(ROWS)
    expect(() => migrate(START, ['alter table parent add column note text', 'delete from child'])).toThrow(
      'The migration would change the rows of child from 1 to 0.',
    )
    expect(count('child')).toBe(1)
    expect(() => sql.prepare('select note from parent')).toThrow('no such column')
  })

  test('that would break a reference is undone whole', () => {
    migrate(START)
    sql.exec(ROWS)
    expect(() => migrate(START, ["update child set parent_id = 'nobody'"])).toThrow('broken references')
    expect(sql.prepare('select parent_id from child').pluck().get()).toBe('a')
  })

  test('is applied once', () => {
    migrate(START)
    migrate(START)
    expect(count('__drizzle_migrations')).toBe(1)
  })

  /** A table rebuild reads well and loses data quietly: each DROP TABLE carries the reason why it is right. */
  test('of the project drops no table without a line that says who looked at it', () => {
    const files = readdirSync(MIGRATIONS).filter((name) => name.endsWith('.sql'))
    expect(files.length).toBeGreaterThan(0)
    expect(files.flatMap((name) => unreviewedDrops(readFileSync(join(MIGRATIONS, name), 'utf8')))).toEqual([])
  })

  test('is found when it drops a table unreviewed', () => {
    expect(unreviewedDrops('DROP TABLE `job`;')).toEqual(['DROP TABLE `job`;'])
    expect(unreviewedDrops('-- reviewed: rebuilt above with all rows\nDROP TABLE `job`;')).toEqual([])
  })
})

function unreviewedDrops(text: string): string[] {
  const lines = text.split('\n')
  return lines.filter((line, i) => /drop\s+table/i.test(line) && !/^\s*-- reviewed: \S/.test(lines[i - 1] ?? ''))
}
