import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import fc from 'fast-check'
import { beforeEach, describe, expect, test } from 'vitest'
import { v7 as uuidv7 } from 'uuid'
import { ENGINE_VERSION, applyCommands, type Command, type LayoutFile } from '@wedgeline/contract'
import { openDatabase } from '@/db/client'
import { checkStored, recheckOutdated } from '@/server/checking'
import { batchFor, failure, first, setAnchor, type Seen } from './batches'
import { companyOn, openTestCompany, type Caller, type TestCompany } from './company'
import { sampleLayout } from './layout-sample'
import { checkHere } from './check-here'

let company: TestCompany
let detailer: Caller
let jobId: string

/** Imports the sample for a detailer; the engineer is put on the job as well. */
async function openJob(): Promise<void> {
  company = openTestCompany()
  detailer = company.as('detailer')
  jobId = (await detailer.job.importLayout({ companyId: company.id, layout: sampleLayout() })).jobId
  await detailer.job.addMember({ jobId, personId: company.personId('engineer') })
}
beforeEach(openJob)

const load = () => detailer.layout.byJob({ jobId })
const batchOf = (seen: Seen, commands: Command[]) => batchFor(jobId, seen, commands)

describe('a batch', () => {
  test('is stored and counts its units up', async () => {
    const seen = await load()
    const anchor = first(seen.layout.anchors)
    const answer = await detailer.layout.applyBatch(batchOf(seen, [setAnchor(anchor.id, { chainageMm: 1650 })]))
    const now = await load()
    expect(now.layout.anchors[0]).toEqual({ ...anchor, chainageMm: 1650 })
    const unit = `edge:${anchor.edgeId}`
    expect(Object.keys(answer.versions)).toEqual([unit])
    expect(answer.versions[unit]).toBeGreaterThan(seen.versions[unit] ?? 0)
    expect(now.versions).toEqual({ ...seen.versions, ...answer.versions })
    expect(answer.results.length).toBeGreaterThan(0)
    expect(
      answer.results
        .flatMap(({ checks }) => checks)
        .every((check) => check.kind !== 'compared' || check.steps.length === 0),
    ).toBe(true)
  })

  test('sent again by the same person gets the same answer and is stored once', async () => {
    const seen = await load()
    const batch = batchOf(seen, [setAnchor(first(seen.layout.anchors).id, { heightMm: 120 })])
    const answer = await detailer.layout.applyBatch(batch)
    expect(await detailer.layout.applyBatch(batch)).toEqual(answer)
    const entries = await detailer.audit.list({ jobId })
    expect(entries.filter(({ what }) => what === 'layout.applyBatch')).toHaveLength(1)
  })

  test('whose id was used for another one is refused, and so is the same one from somebody else', async () => {
    const seen = await load()
    const id = first(seen.layout.anchors).id
    const batch = batchOf(seen, [setAnchor(id, { heightMm: 120 })])
    await detailer.layout.applyBatch(batch)
    const other = { ...batch, commands: [setAnchor(id, { heightMm: 130 })] }
    expect((await failure(detailer.layout.applyBatch(other)))?.code).toBe('CONFLICT')
    expect((await failure(company.as('engineer').layout.applyBatch(batch)))?.code).toBe('CONFLICT')
    expect(first((await load()).layout.anchors).heightMm).toBe(120)
  })

  test('that is stale is refused with both values and nothing of it is stored', async () => {
    const seen = await load()
    const [one, two] = seen.layout.anchors
    await detailer.layout.applyBatch(batchOf(seen, [setAnchor(one?.id ?? '', { chainageMm: 1600, heightMm: 115 })]))
    const mine = [
      setAnchor(one?.id ?? '', { chainageMm: 1700, setBackMm: 100 }),
      setAnchor(two?.id ?? '', { heightMm: 99 }),
    ]
    const refusal = await failure(company.as('engineer').layout.applyBatch(batchOf(seen, mine)))
    expect(refusal?.code).toBe('CONFLICT')
    expect(refusal?.details.conflicts).toEqual([
      { table: 'anchors', id: one?.id, field: 'chainageMm', mine: 1700, theirs: 1600 },
    ])
    const now = await load()
    expect(refusal?.details.versions).toEqual({ [`edge:${one?.edgeId}`]: now.versions[`edge:${one?.edgeId}`] })
    expect(now.layout.anchors.slice(0, 2)).toEqual([{ ...one, chainageMm: 1600, heightMm: 115 }, two])
  })

  test('that changes a row which somebody took away meanwhile is a conflict of the row', async () => {
    const seen = await load()
    const steel = first(seen.layout.steel)
    await detailer.layout.applyBatch(batchOf(seen, [{ type: 'remove', table: 'steel', id: steel.id }]))
    const mine: Command[] = [{ type: 'set', table: 'steel', id: steel.id, changes: { isLocked: true } }]
    const refusal = await failure(company.as('engineer').layout.applyBatch(batchOf(seen, mine)))
    expect(refusal?.details.conflicts).toEqual([
      { table: 'steel', id: steel.id, field: 'id', mine: { isLocked: true }, theirs: null },
    ])
  })

  test('that names no base for a unit which is there is stale', async () => {
    const seen = await load()
    const batch = batchOf(seen, [setAnchor(first(seen.layout.anchors).id, { heightMm: 120 })])
    expect((await failure(detailer.layout.applyBatch({ ...batch, bases: {} })))?.code).toBe('CONFLICT')
  })

  test('whose last command fails leaves nothing', async () => {
    const seen = await load()
    const rows = company.db.$client.prepare('select count(*) from audit').pluck()
    const entries = rows.get()
    const good = seen.layout.anchors.map(({ id }) => setAnchor(id, { heightMm: 121 }))
    const batch = { ...batchOf(seen, good), commands: [...good, setAnchor('nobody', { heightMm: 1 })] }
    expect(await failure(detailer.layout.applyBatch(batch))).toMatchObject({
      code: 'BAD_REQUEST',
      table: 'anchors',
      field: 'id',
    })
    const bad = {
      ...batchOf(seen, good),
      commands: [...good, setAnchor(first(seen.layout.anchors).id, { setBackMm: -1 })],
    }
    expect(await failure(detailer.layout.applyBatch(bad))).toMatchObject({ code: 'BAD_REQUEST', field: 'setBackMm' })
    expect(await load()).toEqual(seen)
    expect(rows.get()).toBe(entries)
  })

  test('that would leave a reference to nothing is refused with the row that names it', async () => {
    const seen = await load()
    const { edgeId, tendonId } = first(seen.layout.anchors)
    for (const command of [
      { type: 'remove', table: 'edges', id: edgeId ?? '' },
      { type: 'remove', table: 'tendons', id: tendonId },
      setAnchor(first(seen.layout.anchors).id, { hardwareId: 'nothing' }),
    ] satisfies Command[]) {
      expect((await failure(detailer.layout.applyBatch(batchOf(seen, [command]))))?.code).toBe('BAD_REQUEST')
    }
    expect(await load()).toEqual(seen)
  })

  test('that sets a spare share needs an engineer', async () => {
    const seen = await load()
    const pour = first(seen.layout.pours)
    const mats = pour.mats.map((mat) => ({ ...mat, spareShare: 0.5, spareBy: 'A. Person' }))
    const commands: Command[] = [{ type: 'set', table: 'pours', id: pour.id, changes: { mats } }]
    expect((await failure(detailer.layout.applyBatch(batchOf(seen, commands))))?.code).toBe('FORBIDDEN')
    await company.as('engineer').layout.applyBatch(batchOf(seen, commands))
    const stored = await load()
    expect(stored.layout.pours[0]?.mats).toEqual(mats)
    const title: Command[] = [{ type: 'set', table: 'pours', id: pour.id, changes: { title: 'North' } }]
    await detailer.layout.applyBatch(batchOf(stored, title))
    expect((await load()).layout.pours[0]).toMatchObject({ title: 'North', mats })
  })

  test('by a drafter takes the prefix of marks, the first mark and deliveries of a pour, and nothing else', async () => {
    await detailer.job.addMember({ jobId, personId: company.personId('drafter') })
    const drafter = company.as('drafter')
    const seen = await load()
    const { id } = first(seen.layout.pours)
    const setPour = (changes: Record<string, unknown>): Command => ({ type: 'set', table: 'pours', id, changes })
    const deliveries = [{ id: 'd1', name: 'First load', neededOn: '2026-03-09', edgeIds: ['e1'], panIds: [] }]
    const own = { markPrefix: 'N', firstMark: 20, deliveries }
    const refused = [
      [setPour({ ...own, title: 'North' })],
      [setPour(own), setAnchor(first(seen.layout.anchors).id, { heightMm: 120 })],
      [{ type: 'remove', table: 'steel', id: first(seen.layout.steel).id }],
      [{ type: 'insert', table: 'steel', row: { ...first(seen.layout.steel), id: 'more' } }],
      [{ type: 'set', table: 'levels', id: first(seen.layout.levels).id, changes: { mark: 'L9' } }],
    ] satisfies Command[][]
    for (const commands of refused) {
      const refusal = await failure(drafter.layout.applyBatch(batchOf(seen, commands)))
      expect(refusal).toMatchObject({ code: 'FORBIDDEN', message: expect.stringContaining('deliveries of a pour') })
    }
    expect(await load()).toEqual(seen)
    await drafter.layout.applyBatch(batchOf(seen, [setPour(own)]))
    expect(first((await load()).layout.pours)).toEqual({ ...first(seen.layout.pours), ...own })
  })

  test('whose spare share names nobody who says so is refused with the field', async () => {
    const seen = await load()
    const pour = first(seen.layout.pours)
    const withSpare = (spareBy: string | null) => {
      const mats = pour.mats.map((mat) => ({ ...mat, spareShare: 0.01, spareBy }))
      const commands: Command[] = [{ type: 'set', table: 'pours', id: pour.id, changes: { mats } }]
      const unit = `pour:${pour.id}`
      return { id: uuidv7(), jobId, bases: { [unit]: seen.versions[unit] ?? 0 }, commands }
    }
    const engineer = company.as('engineer')
    for (const spareBy of [null, '', '  ']) {
      // An empty name is refused while its row is read, a missing one with what the row says.
      expect(await failure(engineer.layout.applyBatch(withSpare(spareBy)))).toMatchObject({
        code: 'BAD_REQUEST',
        field: 'mats.0.spareBy',
      })
    }
    await engineer.layout.applyBatch(withSpare('A. Person'))
  })

  test('of a person without the role, off the job or of another job is refused', async () => {
    const seen = await load()
    const batch = batchOf(seen, [setAnchor(first(seen.layout.anchors).id, { heightMm: 120 })])
    await detailer.job.addMember({ jobId, personId: company.personId('inspector') })
    expect((await failure(company.as('inspector').layout.applyBatch(batch)))?.code).toBe('FORBIDDEN')
    expect((await failure(company.as('drafter').layout.applyBatch(batch)))?.code).toBe('NOT_FOUND')
  })
})

describe('edits of one edge at the same time', () => {
  test('50 races: what is accepted and what conflicts add up, and the last accepted value stands', async () => {
    const engineer = company.as('engineer')
    for (let race = 0; race < 50; race++) {
      const seen = await load()
      const { id } = first(seen.layout.anchors)
      const values = [100 + race * 0.1, 101 + race * 0.1]
      const outcomes = await Promise.all(
        [detailer, engineer].map((person, i) =>
          failure(person.layout.applyBatch(batchOf(seen, [setAnchor(id, { heightMm: values[i] })]))),
        ),
      )
      const accepted = outcomes.flatMap((outcome, i) => (outcome === null ? [values[i]] : []))
      expect(accepted).toHaveLength(1)
      expect(outcomes.filter((outcome) => outcome?.code === 'CONFLICT')).toHaveLength(1)
      expect(first((await load()).layout.anchors).heightMm).toBe(accepted[0])
    }
    const entries = await detailer.audit.list({ jobId, limit: 200 })
    expect(entries.filter(({ what }) => what === 'layout.applyBatch')).toHaveLength(50)
  })
})

describe('results', () => {
  const storedResult = () =>
    company.db.$client.prepare('select engine_version, change_number, counts from pour_result').get() as {
      engine_version: string
      change_number: number
      counts: string
    }

  test('are of the engine that layout.byJob names, and of the change that was stored', async () => {
    const seen = await load()
    await detailer.layout.applyBatch(batchOf(seen, [setAnchor(first(seen.layout.anchors).id, { chainageMm: 1650 })]))
    const { engineVersion, versions } = await load()
    expect(engineVersion).toBe(ENGINE_VERSION)
    // Package version, then the first 12 hex digits of the hash over the engine's source.
    expect(engineVersion).toMatch(/^\d+\.\d+\.\d+\+[0-9a-f]{12}$/)
    const unit = `edge:${first(seen.layout.anchors).edgeId}`
    expect(storedResult()).toMatchObject({ engine_version: engineVersion, change_number: versions[unit] })
  })

  test('of an earlier change never replace those of a later one', async () => {
    const seen = await load()
    await detailer.layout.applyBatch(batchOf(seen, [setAnchor(first(seen.layout.anchors).id, { chainageMm: 1650 })]))
    const later = storedResult()
    const key = { companyId: company.id, jobId }
    const pourIds = [first(seen.layout.pours).id]
    const check = (changeNumber: number) =>
      checkStored({ db: company.db, check: checkHere }, key, {
        layout: { ...seen.layout, anchors: [] },
        pourIds,
        changeNumber,
        atMs: 0,
      })
    await check(later.change_number - 1)
    expect(storedResult()).toEqual(later)
    await check(later.change_number)
    expect(storedResult().counts).not.toBe(later.counts)
  })

  test('are left alone for a pour that somebody took away meanwhile', async () => {
    const { layout } = await load()
    const toCheck = { layout, pourIds: [first(layout.pours).id], changeNumber: 9, atMs: 0 }
    company.db.$client.exec('delete from pour_result')
    company.db.$client.exec(`pragma foreign_keys = off; update pour set id = 'other'; pragma foreign_keys = on`)
    const checking = { db: company.db, check: checkHere }
    const { results } = await checkStored(checking, { companyId: company.id, jobId }, toCheck)
    expect(results.length).toBeGreaterThan(0)
    expect(storedResult()).toBeUndefined()
  })

  test('are made when the batch is sent again, or at the start, where the server stopped before it had them', async () => {
    const seen = await load()
    const batch = batchOf(seen, [setAnchor(first(seen.layout.anchors).id, { chainageMm: 1650 })])
    const answer = await detailer.layout.applyBatch(batch)
    const right = storedResult()
    const stopBefore = () => company.db.$client.exec(`update pour_result set engine_version = '', counts = '{}'`)
    stopBefore()
    expect(await detailer.layout.applyBatch(batch)).toEqual(answer)
    expect(storedResult().counts).toBe(right.counts)
    stopBefore()
    await recheckOutdated({ db: company.db, check: checkHere }, 0, (_key, error) => {
      throw error
    })
    expect(storedResult()).toMatchObject({ engine_version: ENGINE_VERSION, counts: right.counts })
  })
})

describe('undo', () => {
  /** Batches that every layout made from the sample can take: rows are chosen by their place in today's table. */
  const step = fc.oneof(
    fc.record({ kind: fc.constant('move' as const), at: fc.nat(20), value: fc.integer({ min: 400, max: 11_000 }) }),
    fc.record({ kind: fc.constant('height' as const), at: fc.nat(20), value: fc.integer({ min: 60, max: 160 }) }),
    fc.record({ kind: fc.constant('remove-steel' as const), at: fc.nat(20), value: fc.constant(0) }),
    fc.record({ kind: fc.constant('add-steel' as const), at: fc.nat(20), value: fc.integer({ min: 1, max: 9 }) }),
    fc.record({ kind: fc.constant('pour' as const), at: fc.nat(20), value: fc.integer({ min: 200, max: 300 }) }),
    fc.record({ kind: fc.constant('lengths' as const), at: fc.nat(20), value: fc.integer({ min: 1000, max: 11_000 }) }),
    fc.record({ kind: fc.constant('grid' as const), at: fc.nat(20), value: fc.integer({ min: 0, max: 20_000 }) }),
  )

  test('random runs of batches, each undone by its inverse, return the exact layout', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(step, { minLength: 1, maxLength: 8 }), async (steps) => {
        await openJob()
        const start = await load()
        const inverses: Command[][] = []
        for (const each of steps) {
          const seen = await load()
          const commands = commandsOf(seen.layout, each)
          const { inverse } = applyCommands(seen.layout, commands)
          await detailer.layout.applyBatch(batchOf(seen, commands))
          inverses.unshift([...inverse])
        }
        for (const inverse of inverses) await detailer.layout.applyBatch(batchOf(await load(), inverse))
        expect((await load()).layout).toEqual(start.layout)
      }),
      { numRuns: 10, seed: 20260105 },
    )
  })

  type Step = {
    kind: 'move' | 'height' | 'remove-steel' | 'add-steel' | 'pour' | 'lengths' | 'grid'
    at: number
    value: number
  }

  function commandsOf(layout: LayoutFile, { kind, at, value }: Step): Command[] {
    const pick = <T>(rows: readonly T[]): T => first(rows.slice(at % rows.length))
    const anchor = pick(layout.anchors)
    const pour = first(layout.pours)
    const edge = first(layout.edges)
    const steel = layout.steel[at % Math.max(1, layout.steel.length)]
    switch (kind) {
      case 'move':
        return [setAnchor(anchor.id, { chainageMm: value })]
      case 'height':
        return layout.anchors.map(({ id }) => setAnchor(id, { heightMm: value }))
      case 'remove-steel':
        return steel ? [{ type: 'remove', table: 'steel', id: steel.id }] : [setAnchor(anchor.id, { heightMm: 100 })]
      case 'add-steel': {
        const shape = {
          kind: 'links',
          diameterMm: 10,
          widthMm: 300,
          heightMm: 150,
          hookMm: 100,
          count: value,
          firstMm: 40,
          pitchMm: 50,
        }
        const zone = { kind: 'anchor', anchorId: anchor.id }
        return [{ type: 'insert', table: 'steel', row: { id: uuidv7(), pourId: pour.id, zone, shape } }]
      }
      case 'pour':
        return [
          {
            type: 'set',
            table: 'pours',
            id: pour.id,
            changes: { coverTopMm: value / 10, stages: pour.stages.slice(-1) },
          },
        ]
      case 'lengths': {
        const lengths = [
          { id: uuidv7(), fromMm: 0, toMm: value, kind: 'free', topMm: 220, soffitMm: 0 },
          { id: uuidv7(), fromMm: value, toMm: 12_000, kind: 'free', topMm: 220, soffitMm: 0 },
        ]
        return [{ type: 'set', table: 'edges', id: edge.id, changes: { lengths } }]
      }
      case 'grid':
        return [
          {
            type: 'insert',
            table: 'gridLines',
            row: { id: uuidv7(), name: `X${value}`, xMm: value, yMm: 0, azimuthDeg: 0 },
          },
        ]
    }
  }
})

describe('two servers on one database', () => {
  test('see what the other stored, and a stale batch is stale on either', async () => {
    await inFolder(async (path) => {
      const there = companyOn(openDatabase(path), company.id)
      try {
        const seen = await load()
        const { id, edgeId } = first(seen.layout.anchors)
        await there.as('detailer').layout.applyBatch(batchOf(seen, [setAnchor(id, { heightMm: 118 })]))
        const late = await failure(detailer.layout.applyBatch(batchOf(seen, [setAnchor(id, { heightMm: 119 })])))
        expect(late?.details.conflicts).toEqual([{ table: 'anchors', id, field: 'heightMm', mine: 119, theirs: 118 }])
        expect((await load()).versions[`edge:${edgeId}`]).toBeGreaterThan(seen.versions[`edge:${edgeId}`] ?? 0)
      } finally {
        there.db.$client.close()
      }
    })
  })
})

describe('a restart', () => {
  test('keeps every row, version and result', async () => {
    await inFolder(async (path) => {
      const seen = await load()
      await detailer.layout.applyBatch(batchOf(seen, [setAnchor(first(seen.layout.anchors).id, { heightMm: 117 })]))
      const before = [await load(), await detailer.job.list(), await detailer.audit.list({ jobId })]
      company.db.$client.close()
      company = companyOn(openDatabase(path), company.id)
      detailer = company.as('detailer')
      expect([await load(), await detailer.job.list(), await detailer.audit.list({ jobId })]).toEqual(before)
    })
  })
})

/** Runs `work` with the sample in a database that lies in a file, and takes the file away afterwards. */
async function inFolder(work: (path: string) => Promise<void>): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'wedgeline-'))
  const path = join(folder, 'data.sqlite')
  company = openTestCompany(path)
  detailer = company.as('detailer')
  jobId = (await detailer.job.importLayout({ companyId: company.id, layout: sampleLayout() })).jobId
  try {
    await work(path)
  } finally {
    company.db.$client.close()
    rmSync(folder, { recursive: true })
  }
}
