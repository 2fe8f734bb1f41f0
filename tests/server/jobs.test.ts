import { beforeEach, describe, expect, test } from 'vitest'
import { v7 as uuidv7 } from 'uuid'
import { ENGINE_VERSION, applyCommands, jobSettingsSchema, type Command } from '@wedgeline/contract'
import { recheckOutdated } from '@/server/checking'
import { recordAudit } from '@/server/stores/audit'
import { addCompany, openTestCompany, type Caller, type TestCompany } from './company'
import { sampleLayout } from './layout-sample'
import { checkHere } from './check-here'

let company: TestCompany
let detailer: Caller
let engineer: Caller
let admin: Caller
beforeEach(() => {
  company = openTestCompany()
  detailer = company.as('detailer')
  engineer = company.as('engineer')
  admin = company.as('admin')
})

const codeOf = (call: Promise<unknown>) =>
  call.then(
    () => 'OK',
    (error: unknown) => (error as { code: string }).code,
  )
const newJob = (id = uuidv7()) => ({ id, companyId: company.id, number: '26-002', title: 'Invented car park' })
async function importSample(): Promise<string> {
  const { jobId } = await detailer.job.importLayout({ companyId: company.id, layout: sampleLayout() })
  await detailer.job.addMember({ jobId, personId: company.personId('engineer') })
  return jobId
}

describe('a new job', () => {
  test('is listed for whoever made it, with that person on it', async () => {
    const { id } = await detailer.job.create(newJob())
    expect(await detailer.job.list()).toMatchObject([{ id, number: '26-002', pours: [], readingsProposed: 0 }])
    expect(await detailer.job.byId({ jobId: id })).toMatchObject({
      id,
      companyId: company.id,
      timeZone: 'Europe/London',
      basis: 'en-1992',
      settings: jobSettingsSchema.parse({}),
      factors: [],
      readings: [],
      members: [{ id: company.personId('detailer'), roles: ['detailer'] }],
      myRoles: ['detailer'],
    })
    expect(await engineer.job.list()).toEqual([])
    expect(await codeOf(engineer.job.byId({ jobId: id }))).toBe('NOT_FOUND')
  })

  test('sent again is one job; its id for another one is refused', async () => {
    const job = newJob()
    await detailer.job.create(job)
    expect(await detailer.job.create(job)).toEqual({ id: job.id })
    expect(await detailer.job.list()).toHaveLength(1)
    expect(await codeOf(detailer.job.create({ ...job, title: 'Another' }))).toBe('CONFLICT')
    expect(await codeOf(engineer.job.create(job))).toBe('CONFLICT')
    const south = addCompany(company.db, 'south')
    expect(await codeOf(south.as('detailer').job.create({ ...job, companyId: 'south' }))).toBe('CONFLICT')
  })

  test('takes a time zone by its name alone', async () => {
    expect(await codeOf(detailer.job.create({ ...newJob(), timeZone: 'Mars/Base' }))).toBe('BAD_REQUEST')
  })

  test('is for a detailer or an engineer to make', async () => {
    for (const role of ['drafter', 'inspector', 'admin'] as const) {
      expect(await codeOf(company.as(role).job.create(newJob())), role).toBe('FORBIDDEN')
    }
  })
})

describe('a job', () => {
  test('is listed with its pours, their anchors and what the checks found', async () => {
    const jobId = await importSample()
    const [listed] = await detailer.job.list()
    const [pour] = listed?.pours ?? []
    expect(pour).toMatchObject({ mark: 'P1', state: 'draft', anchors: 4 })
    const found = Object.values(pour?.counts ?? {}).reduce((all, count) => all + count, 0)
    expect(found).toBeGreaterThan(0)
    expect(listed?.id).toBe(jobId)
  })

  test('takes a basis with factors from an engineer alone, and only factors that the basis has', async () => {
    const jobId = await importSample()
    const change = {
      jobId,
      basis: 'en-1992' as const,
      settings: jobSettingsSchema.parse({ nearFrom: 0.92 }),
      factors: [],
    }
    expect(await codeOf(detailer.job.setBasis(change))).toBe('FORBIDDEN')
    await engineer.job.setBasis(change)
    expect((await detailer.job.byId({ jobId })).settings.nearFrom).toBe(0.92)
    const wrong = { ...change, factors: [{ name: 'no-such-factor', value: 1, reason: 'none' }] }
    expect(await codeOf(engineer.job.setBasis(wrong))).toBe('BAD_REQUEST')
  })

  test('keeps somebody on it, and takes only people of its company', async () => {
    const jobId = await importSample()
    addCompany(company.db, 'south')
    expect(await codeOf(detailer.job.addMember({ jobId, personId: 'south-engineer' }))).toBe('NOT_FOUND')
    await detailer.job.removeMember({ jobId, personId: company.personId('engineer') })
    expect(await codeOf(detailer.job.removeMember({ jobId, personId: company.personId('detailer') }))).toBe('CONFLICT')
    await admin.job.addMember({ jobId, personId: company.personId('drafter') })
    expect((await detailer.job.byId({ jobId })).members.map(({ id }) => id)).toEqual([
      company.personId('detailer'),
      company.personId('drafter'),
    ])
  })
})

describe('results of an older engine', () => {
  test('are made again at the start', async () => {
    await importSample()
    const sql = company.db.$client
    sql.exec(`update pour_result set engine_version = '0.0.0+old', counts = '{}'`)
    const failures: unknown[] = []
    await recheckOutdated({ db: company.db, check: checkHere }, 1, (_key, error) => failures.push(error))
    expect(failures).toEqual([])
    expect(sql.prepare('select engine_version from pour_result').pluck().all()).toEqual([ENGINE_VERSION])
    expect((await detailer.job.list())[0]?.pours[0]?.counts).toHaveProperty('over')
  })
})

describe('a reading', () => {
  test('is accepted once by an engineer in their name, and withdrawn', async () => {
    const jobId = await importSample()
    const reading = { jobId, readingId: 'en-window', reason: 'As the elastic figures show.' }
    expect(await codeOf(detailer.reading.accept(reading))).toBe('FORBIDDEN')
    expect(await codeOf(engineer.reading.accept({ ...reading, readingId: 'nothing' }))).toBe('BAD_REQUEST')
    const [before] = await engineer.job.list()
    await engineer.reading.accept(reading)
    expect(await codeOf(engineer.reading.accept(reading))).toBe('CONFLICT')
    const [after] = await engineer.job.list()
    expect(before?.readingsProposed).toBe((after?.readingsProposed ?? 0) + 1)
    expect((await detailer.job.byId({ jobId })).readings).toMatchObject([
      { readingId: 'en-window', acceptedBy: 'north engineer', reason: reading.reason },
    ])
    await engineer.reading.withdraw({ jobId, readingId: 'en-window' })
    expect((await detailer.job.byId({ jobId })).readings).toEqual([])
    expect(await codeOf(engineer.reading.withdraw({ jobId, readingId: 'en-window' }))).toBe('NOT_FOUND')
  })
})

describe('a question with several answers', () => {
  test('takes one answer at a time, and waits no longer once it has one', async () => {
    const jobId = await importSample()
    const waiting = async () => (await engineer.job.list())[0]?.readingsProposed
    const before = await waiting()
    await engineer.reading.accept({ jobId, readingId: 'en-crack-edge-bars', reason: 'Free to shorten.' })
    // The proposed answer to the same question is not accepted, yet it is no longer asked for.
    expect(await waiting()).toBe((before ?? 0) - 1)
    await engineer.reading.accept({ jobId, readingId: 'en-crack-stronger', reason: 'Edge is seen.' })
    const { readings } = await detailer.job.byId({ jobId })
    expect(readings.map(({ readingId }) => readingId)).toEqual(['en-crack-stronger'])
  })
})

describe('another basis', () => {
  test('a job begins with the friction usual in its own code (AS 3600 3.4.2.4, EN 1992-1-1 5.10.5.2; from memory)', async () => {
    const frictionOf = async (basis: 'en-1992' | 'as-3600') => {
      const { id: jobId } = await detailer.job.create({ ...newJob(), basis })
      const { frictionMu, frictionWobblePerM } = (await detailer.job.byId({ jobId })).settings
      return [frictionMu, frictionWobblePerM]
    }
    expect(await frictionOf('en-1992')).toEqual([0.19, 0.0075])
    expect(await frictionOf('as-3600')).toEqual([0.2, 0.02])
  })

  const change = (
    jobId: string,
    basis: 'en-1992' | 'as-3600',
    factors: { name: string; value: number; reason: string }[],
  ) => engineer.job.setBasis({ jobId, basis, settings: jobSettingsSchema.parse({}), factors })

  test('withdraws the readings and drops the factors of the one before, and the record says so', async () => {
    const jobId = await importSample()
    await change(jobId, 'en-1992', [{ name: 'gammaP', value: 1.3, reason: 'National annex' }])
    await engineer.reading.accept({ jobId, readingId: 'en-window', reason: 'As the elastic figures show.' })
    expect(await codeOf(change(jobId, 'as-3600', [{ name: 'gammaP', value: 1.3, reason: 'Of the other' }]))).toBe(
      'BAD_REQUEST',
    )
    expect((await detailer.job.byId({ jobId })).readings).toHaveLength(1)
    await change(jobId, 'as-3600', [])
    expect(await detailer.job.byId({ jobId })).toMatchObject({ basis: 'as-3600', readings: [], factors: [] })
    const withdrawn = company.db.$client
      .prepare("select count(*) from audit where what = 'reading.withdraw'")
      .pluck()
      .get()
    expect(withdrawn).toBe(1)
  })

  test('the same basis again withdraws nothing', async () => {
    const jobId = await importSample()
    await engineer.reading.accept({ jobId, readingId: 'en-window', reason: 'As the elastic figures show.' })
    await change(jobId, 'en-1992', [])
    expect((await detailer.job.byId({ jobId })).readings).toHaveLength(1)
  })
})

describe('hardware', () => {
  test('is stored by an admin and comes back as it was given', async () => {
    const { hardware, jacks, strandTypes } = sampleLayout()
    const [jack] = jacks
    const [plate] = hardware
    const [strandType] = strandTypes
    if (!jack || !plate || !strandType) throw new Error('the sample has one of each')
    const { id: companyId } = company
    expect(await codeOf(detailer.hardware.save({ companyId, hardware: plate }))).toBe('FORBIDDEN')
    expect(await codeOf(admin.hardware.save({ companyId, hardware: plate }))).toBe('BAD_REQUEST')
    await admin.hardware.saveJack({ companyId, jack })
    await admin.hardware.save({ companyId, hardware: plate })
    await admin.hardware.saveStrandType({ companyId, strandType })
    expect(await detailer.hardware.list({ companyId })).toEqual({ hardware, jacks, strandTypes })
    const changed = { ...plate, approval: null, hole: null, pocket: null, drawInMm: 5 }
    await admin.hardware.save({ companyId, hardware: changed })
    expect((await detailer.hardware.list({ companyId })).hardware).toEqual([changed])
  })

  test('whose sizes contradict one another is refused with the field', async () => {
    const { id: companyId } = company
    const [plate] = sampleLayout().hardware
    const [strandType] = sampleLayout().strandTypes
    if (!plate || !strandType) throw new Error('the sample has one of each')
    const messageOf = (call: Promise<unknown>) =>
      call.then(
        () => '',
        (error: unknown) => (error as Error).message,
      )
    // The plate is 220 mm wide: a hole of 220 mm leaves nothing of it.
    const hole = { widthMm: 220, heightMm: 20, isRound: false }
    const wide = admin.hardware.save({ companyId, hardware: { ...plate, jackId: null, hole } })
    expect(await messageOf(wide)).toContain('hardware.hole.widthMm')
    const weak = admin.hardware.saveStrandType({ companyId, strandType: { ...strandType, proofLoadKN: 279 } })
    expect(await messageOf(weak)).toContain('strandType.proofLoadKN')
  })

  test('that a job uses is checked again when it changes', async () => {
    const jobId = await importSample()
    const { id: companyId } = company
    const [plate] = (await detailer.hardware.list({ companyId })).hardware
    if (!plate) throw new Error('the sample brings one')
    const countsOf = async () => (await detailer.job.list()).find(({ id }) => id === jobId)?.pours[0]?.counts
    const before = await countsOf()
    // Anchors stand 1500 mm apart: with 1600 mm asked for and no approval that says less, every pair is too close.
    await admin.hardware.save({ companyId, hardware: { ...plate, approval: null, spacingAlongMinMm: 1600 } })
    const after = await countsOf()
    expect(after?.over).toBeGreaterThan(before?.over ?? 0)
  })
})

describe('an import', () => {
  test('uses hardware of the same name and content, and adds what differs', async () => {
    const { id: companyId } = company
    await detailer.job.importLayout({ companyId, layout: sampleLayout() })
    await detailer.job.importLayout({ companyId, layout: sampleLayout() })
    expect((await detailer.hardware.list({ companyId })).hardware).toHaveLength(1)
    const other = sampleLayout()
    const layout = { ...other, hardware: other.hardware.map((row) => ({ ...row, drawInMm: 7 })) }
    await detailer.job.importLayout({ companyId, layout })
    const { hardware, jacks, strandTypes } = await detailer.hardware.list({ companyId })
    expect([hardware.length, jacks.length, strandTypes.length]).toEqual([2, 1, 1])
  })

  test('of a layout that contradicts itself is refused with the field, and nothing is stored', async () => {
    const layout = sampleLayout()
    const broken = { ...layout, anchors: layout.anchors.map((anchor) => ({ ...anchor, tendonId: 'nobody' })) }
    const refusal = await detailer.job.importLayout({ companyId: company.id, layout: broken }).then(
      () => null,
      (error: unknown) => error as { code: string; message: string },
    )
    expect(refusal?.code).toBe('BAD_REQUEST')
    expect(refusal?.message).toContain('anchors[0].tendonId')
    expect(await detailer.job.list()).toEqual([])
    expect((await detailer.hardware.list({ companyId: company.id })).hardware).toEqual([])
  })

  test('by a detailer leaves accepted readings and spare shares to an engineer, and says so', async () => {
    const layout = sampleLayout()
    const reading = { readingId: 'en-window', acceptedBy: 'Somebody', acceptedAtMs: 1, reason: 'Elsewhere' }
    const pours = layout.pours.map((pour) => ({
      ...pour,
      mats: pour.mats.map((mat) => ({ ...mat, spareShare: 0.3, spareBy: 'Somebody' })),
    }))
    const bold = { ...layout, pours, job: { ...layout.job, readings: [reading] } }
    const asDetailer = await detailer.job.importLayout({ companyId: company.id, layout: bold })
    expect(asDetailer.leftOut).toHaveLength(2)
    const plain = (await detailer.layout.byJob({ jobId: asDetailer.jobId })).layout
    expect(plain.job.readings).toEqual([])
    expect(plain.pours[0]?.mats[0]).toMatchObject({ spareShare: 0, spareBy: null })
    const asEngineer = await engineer.job.importLayout({ companyId: company.id, layout: bold })
    expect(asEngineer.leftOut).toEqual([])
    const whole = (await engineer.layout.byJob({ jobId: asEngineer.jobId })).layout
    expect(whole.job.readings).toEqual([reading])
    expect(whole.pours[0]?.mats[0]).toMatchObject({ spareShare: 0.3, spareBy: 'Somebody' })
  })
})

describe('a schedule', () => {
  test('that is exported keeps its marks whatever is added later', async () => {
    const jobId = await importSample()
    const seen = await detailer.layout.byJob({ jobId })
    const [pour] = seen.layout.pours
    const pourId = pour?.id ?? ''
    const planned = await detailer.schedule.byPour({ jobId, pourId })
    expect(planned.rows.length).toBeGreaterThan(0)
    expect((await detailer.layout.byJob({ jobId })).layout.barMarks).toEqual([])
    const { name } = await detailer.schedule.export({ jobId, pourId })
    expect(name).toBe('26-001-P1 bar schedule.xlsx')
    const marks = (rows: readonly { key: string; mark: string }[]) => new Map(rows.map(({ key, mark }) => [key, mark]))
    const given = marks(planned.rows)
    // 6 mm sorts before every bar that is there, so without stored marks it would take mark 01.
    const zone = { kind: 'anchor', anchorId: seen.layout.anchors[3]?.id }
    const shape = {
      kind: 'transverse-bars',
      diameterMm: 6,
      lengthMm: 900,
      count: 2,
      layers: 'both',
      firstMm: 60,
      pitchMm: 60,
    }
    const commands: Command[] = [{ type: 'insert', table: 'steel', row: { id: uuidv7(), pourId, zone, shape } }]
    const { units } = applyCommands(seen.layout, commands)
    const bases = Object.fromEntries(units.map((unit) => [unit, seen.versions[unit] ?? 0]))
    await detailer.layout.applyBatch({ id: uuidv7(), jobId, bases, commands })
    const later = marks((await detailer.schedule.byPour({ jobId, pourId })).rows)
    expect(later.size).toBe(given.size + 1)
    for (const [key, mark] of given) expect(later.get(key)).toBe(mark)
  })

  test('exported by two at the same time gives each bar one mark', async () => {
    const jobId = await importSample()
    const pourId = (await detailer.layout.byJob({ jobId })).layout.pours[0]?.id ?? ''
    await Promise.all([detailer.schedule.export({ jobId, pourId }), engineer.schedule.export({ jobId, pourId })])
    const { barMarks } = (await detailer.layout.byJob({ jobId })).layout
    expect(barMarks.length).toBeGreaterThan(0)
    expect(new Set(barMarks.map(({ key }) => key)).size).toBe(barMarks.length)
    const audit = await detailer.audit.list({ jobId })
    expect(audit.filter(({ what }) => what === 'schedule.giveMarks')).toHaveLength(1)
    expect(audit.filter(({ what }) => what === 'schedule.export')).toHaveLength(2)
  })

  test('of a pour of another job is not found; an inspector reads it and does not export it', async () => {
    const jobId = await importSample()
    const other = await importSample()
    const pourId = (await detailer.layout.byJob({ jobId: other })).layout.pours[0]?.id ?? ''
    expect(await codeOf(detailer.schedule.byPour({ jobId, pourId }))).toBe('NOT_FOUND')
    await detailer.job.addMember({ jobId: other, personId: company.personId('inspector') })
    expect(await codeOf(company.as('inspector').schedule.byPour({ jobId: other, pourId }))).toBe('OK')
    expect(await codeOf(company.as('inspector').schedule.export({ jobId: other, pourId }))).toBe('FORBIDDEN')
  })
})

describe('the audit', () => {
  test('has an entry for every change, with who, and what was there before and after', async () => {
    const jobId = await importSample()
    await detailer.job.update({ jobId, number: '26-009', title: 'Renamed' })
    const settings = jobSettingsSchema.parse({})
    await engineer.job.setBasis({ jobId, basis: 'en-1992', settings, factors: [] })
    await engineer.reading.accept({ jobId, readingId: 'en-window', reason: 'Seen' })
    await engineer.reading.withdraw({ jobId, readingId: 'en-window' })
    const seen = await detailer.layout.byJob({ jobId })
    const [anchor] = seen.layout.anchors
    const unit = `edge:${anchor?.edgeId}`
    const commands: Command[] = [{ type: 'set', table: 'anchors', id: anchor?.id ?? '', changes: { heightMm: 99 } }]
    await detailer.layout.applyBatch({ id: uuidv7(), jobId, bases: { [unit]: seen.versions[unit] ?? 0 }, commands })
    await detailer.schedule.export({ jobId, pourId: seen.layout.pours[0]?.id ?? '' })
    await detailer.job.removeMember({ jobId, personId: company.personId('engineer') })
    const entries = await detailer.audit.list({ jobId })
    expect(entries.map(({ what }) => what)).toEqual([
      'job.removeMember',
      'schedule.export',
      'schedule.giveMarks',
      'layout.applyBatch',
      'reading.withdraw',
      'reading.accept',
      'job.setBasis',
      'job.update',
      'job.addMember',
      'job.importLayout',
    ])
    expect(entries[3]).toMatchObject({
      personName: 'north detailer',
      before: [{ table: 'anchors', id: anchor?.id, row: { heightMm: 110 } }],
      after: [{ table: 'anchors', id: anchor?.id, row: { heightMm: 99 } }],
    })
    expect(entries[7]).toMatchObject({ before: { number: '26-001' }, after: { number: '26-009', title: 'Renamed' } })
  })

  test('is read a page at a time, newest first', async () => {
    const jobId = await importSample()
    await detailer.job.update({ jobId, number: '1', title: 'A' })
    await detailer.job.update({ jobId, number: '2', title: 'B' })
    const [newest] = await detailer.audit.list({ jobId, limit: 1 })
    const older = await detailer.audit.list({ jobId, before: { atMs: newest?.atMs ?? 0, id: newest?.id ?? '' } })
    expect(newest).toMatchObject({ after: { number: '2' } })
    expect(older[0]).toMatchObject({ after: { number: '1' } })
    expect(older).toHaveLength(3)
  })

  test('leaves none out between two pages where several were stored in one instant', async () => {
    const jobId = await importSample()
    const entry = { companyId: company.id, jobId, personId: company.personId('detailer'), atMs: Date.UTC(2099, 0, 1) }
    for (let n = 0; n < 5; n++) recordAudit(company.db, { ...entry, what: `entry ${n}`, before: null, after: null })
    const seen: string[] = []
    let before: { atMs: number; id: string } | undefined
    for (let page = 0; page < 3; page++) {
      const entries = await detailer.audit.list({ jobId, limit: 2, ...(before ? { before } : {}) })
      seen.push(...entries.map(({ what }) => what))
      before = entries.at(-1)
      before = before && { atMs: before.atMs, id: before.id }
    }
    expect(seen).toEqual(['entry 4', 'entry 3', 'entry 2', 'entry 1', 'entry 0', 'job.addMember'])
  })
})
