import { beforeEach, describe, expect, test } from 'vitest'
import { layoutSchema, type LayoutFile } from '@wedgeline/contract'
import { addCompany, openTestCompany, type TestCompany } from './company'
import { sampleLayout } from './layout-sample'

let company: TestCompany
let detailer: ReturnType<TestCompany['as']>
beforeEach(() => {
  company = openTestCompany()
  detailer = company.as('detailer')
})

const codeOf = (call: Promise<unknown>) =>
  call.then(
    () => 'OK',
    (error: unknown) => (error as { code: string }).code,
  )
const messageOf = (call: Promise<unknown>) =>
  call.then(
    () => 'OK',
    (error: unknown) => (error as Error).message,
  )
async function made({ isUnfiled }: { readonly isUnfiled: boolean }, layout: LayoutFile = sampleLayout()) {
  const { jobId } = await detailer.job.importLayout({ companyId: company.id, layout, isUnfiled })
  return jobId
}
const layoutOf = async (jobId: string) => (await detailer.layout.byJob({ jobId })).layout
const listed = async (jobId: string) => (await detailer.job.list()).find(({ id }) => id === jobId)

describe('a quick edge', () => {
  test('is a job that says that it is unfiled, and an ordinary import is not', async () => {
    const [quick, job] = [await made({ isUnfiled: true }), await made({ isUnfiled: false })]
    expect(await detailer.job.byId({ jobId: quick })).toMatchObject({ isUnfiled: true })
    expect(await detailer.job.byId({ jobId: job })).toMatchObject({ isUnfiled: false })
    expect([await listed(quick), await listed(job)]).toMatchObject([{ isUnfiled: true }, { isUnfiled: false }])
  })

  test('is listed with its worst check and, on readings that are proposed, with none that needs judgement for them', async () => {
    // Cylinders cured elsewhere are for an engineer to judge whatever is read into a clause.
    const layout = { ...sampleLayout(), concreteResults: [] }
    const quick = await listed(await made({ isUnfiled: true }, layout))
    const job = await listed(await made({ isUnfiled: false }, layout))
    expect(job?.pours[0]?.worst).toBeNull()
    expect(job?.pours[0]?.counts['needs-judgement']).toBeGreaterThan(0)
    const [pour] = quick?.pours ?? []
    expect(pour?.counts['needs-judgement']).toBe(0)
    expect(pour?.worst).toMatchObject({
      zone: expect.any(String),
      check: expect.any(String),
      status: expect.any(String),
    })
    const sum = (counts = {}) => Object.values<number>(counts).reduce((total, each) => total + each, 0)
    expect(sum(pour?.counts)).toBe(sum(job?.pours[0]?.counts))
  })

  test('cannot be exported until it has a number and a title of its own', async () => {
    const jobId = await made({ isUnfiled: true })
    const pourId = (await layoutOf(jobId)).pours[0]?.id ?? ''
    expect(await codeOf(detailer.schedule.byPour({ jobId, pourId }))).toBe('OK')
    expect(await messageOf(detailer.schedule.export({ jobId, pourId }))).toMatch(/^A quick edge cannot be issued/)
    await detailer.job.update({ jobId, number: '26-050', title: 'Kept' })
    expect(await detailer.job.byId({ jobId })).toMatchObject({ isUnfiled: false, number: '26-050' })
    expect(await codeOf(detailer.schedule.export({ jobId, pourId }))).toBe('OK')
    const [, , update] = await detailer.audit.list({ jobId })
    expect(update).toMatchObject({ what: 'job.update', before: { isUnfiled: true }, after: { isUnfiled: false } })
  })

  test('carries no bar mark: nobody has been handed one', async () => {
    const layout = sampleLayout()
    const barMarks = [{ id: 'm1', pourId: 'p1', mark: 7, key: 'H10|00|2000' }]
    expect((await layoutOf(await made({ isUnfiled: true }, { ...layout, barMarks }))).barMarks).toEqual([])
    expect((await layoutOf(await made({ isUnfiled: false }, { ...layout, barMarks }))).barMarks).toHaveLength(1)
  })
})

describe('filing a quick edge into a job', () => {
  test('moves its pour with edge, anchors, tendons and steel, checked, and takes the quick edge away', async () => {
    const [quick, job] = [await made({ isUnfiled: true }), await made({ isUnfiled: false })]
    const before = await layoutOf(job)
    const filed = await detailer.job.fileQuickEdge({
      jobId: quick,
      intoJobId: job,
      mark: 'Q1',
      level: { id: before.levels[0]?.id ?? '' },
    })
    const after = await layoutOf(job)
    for (const table of ['pours', 'edges', 'edgeLines', 'tendons', 'anchors', 'steel', 'obstructions'] as const) {
      expect(after[table], table).toHaveLength(2 * before[table].length)
      expect(after[table].slice(0, before[table].length)).toEqual(before[table])
    }
    expect(after.levels).toEqual(before.levels)
    expect(after.gridLines).toEqual(before.gridLines)
    expect(filed).toMatchObject({ jobId: job, pourId: after.pours[1]?.id, edgeIds: [after.edges[1]?.id] })
    expect(after.pours[1]?.mark).toBe('Q1')
    expect((await listed(job))?.pours[1]?.counts).toEqual((await listed(job))?.pours[0]?.counts)
    expect(await listed(quick)).toBeUndefined()
    expect(await codeOf(detailer.layout.byJob({ jobId: quick }))).toBe('NOT_FOUND')
    expect((await detailer.audit.list({ jobId: job }))[0]).toMatchObject({
      what: 'job.fileQuickEdge',
      after: { from: { jobId: quick }, pourId: filed.pourId, mark: 'Q1' },
    })
  })

  test('gives taken marks the next free number, and stands clear of what the level holds', async () => {
    const layout = sampleLayout()
    const named = (mark: string): LayoutFile => ({ ...layout, edges: layout.edges.map((edge) => ({ ...edge, mark })) })
    const quick = await made({ isUnfiled: true }, named('E1'))
    const job = await made({ isUnfiled: false }, named('E1'))
    const before = await layoutOf(job)
    const level = { id: before.levels[0]?.id ?? '' }
    await detailer.job.fileQuickEdge({ jobId: quick, intoJobId: job, mark: 'Q1', level })
    const after = await layoutOf(job)
    expect(after.edges.map(({ mark }) => mark)).toEqual(['E1', 'E3'])
    // The line S of the sample is taken as well and was named first.
    expect(after.edgeLines.map(({ mark }) => mark)).toEqual(['S', 'E2'])
    const ys = after.pours.map(({ outline }) => outline.map(({ yMm }) => yMm))
    // 5 m between the lowest corner there and the highest that came.
    expect(Math.min(...(ys[0] ?? [])) - Math.max(...(ys[1] ?? []))).toBe(5000)
    const [line, other] = after.edgeLines
    expect((line?.yMm ?? 0) - (other?.yMm ?? 0)).toBe((ys[0]?.[0] ?? 0) - (ys[1]?.[0] ?? 0))
  })

  test('makes a new level where one is asked for, and the place then stays', async () => {
    const [quick, job] = [await made({ isUnfiled: true }), await made({ isUnfiled: false })]
    await detailer.job.fileQuickEdge({ jobId: quick, intoJobId: job, mark: 'P1', level: { mark: 'L9' } })
    const { levels, pours, edges } = await layoutOf(job)
    expect(levels.map(({ mark }) => mark)).toEqual(['L1', 'L9'])
    expect(pours[1]).toMatchObject({ levelId: levels[1]?.id, mark: 'P1' })
    expect(pours[1]?.outline.map(({ xMm, yMm }) => [xMm, yMm])).toEqual(
      pours[0]?.outline.map(({ xMm, yMm }) => [xMm, yMm]),
    )
    expect(edges.map(({ mark }) => mark)).toEqual([edges[0]?.mark, edges[0]?.mark])
  })

  test('stores nothing where it cannot: a mark that is taken, a level that is gone, no quick edge, into a quick edge', async () => {
    const [quick, job, other] = [
      await made({ isUnfiled: true }),
      await made({ isUnfiled: false }),
      await made({ isUnfiled: true }),
    ]
    const before = await layoutOf(job)
    const level = { id: before.levels[0]?.id ?? '' }
    const file = (change: object) =>
      messageOf(detailer.job.fileQuickEdge({ jobId: quick, intoJobId: job, mark: 'Q1', level, ...change }))
    expect(await file({ mark: before.pours[0]?.mark })).toMatch(/has a pour \w+ already/)
    expect(await file({ level: { id: 'gone' } })).toMatch(/^That level is not in the job/)
    expect(await file({ level: { mark: 'L1' } })).toMatch(/has a level L1 already/)
    expect(await file({ intoJobId: other })).toMatch(/^That is a quick edge as well/)
    expect(await file({ jobId: job })).toMatch(/^This is an ordinary job/)
    expect(await layoutOf(job)).toEqual(before)
    expect(await listed(quick)).toBeDefined()
  })

  test('refuses a quick edge that has grown a second pour', async () => {
    const layout = sampleLayout()
    const [pour] = layout.pours
    const anew = <T extends { id: string }>(rows: readonly T[] = []) =>
      rows.map((row) => ({ ...row, id: `${row.id}b` }))
    const parts = { outline: anew(pour?.outline), mats: anew(pour?.mats), stages: anew(pour?.stages) }
    const second = layoutSchema.shape.pours.parse([{ ...pour, ...parts, id: 'p2', mark: 'P2' }])
    const quick = await made({ isUnfiled: true }, { ...layout, pours: [...layout.pours, ...second] })
    const job = await made({ isUnfiled: false })
    const filing = { jobId: quick, intoJobId: job, mark: 'Q1', level: { mark: 'L2' } }
    expect(await messageOf(detailer.job.fileQuickEdge(filing))).toMatch(/has 2 pours by now/)
  })

  test('needs both jobs to be the caller’s to edit', async () => {
    const [quick, job] = [await made({ isUnfiled: true }), await made({ isUnfiled: false })]
    const engineer = company.as('engineer')
    await detailer.job.addMember({ jobId: quick, personId: company.personId('engineer') })
    const filing = { jobId: quick, intoJobId: job, mark: 'Q1', level: { mark: 'L2' } }
    expect(await codeOf(engineer.job.fileQuickEdge(filing))).toBe('NOT_FOUND')
    const south = addCompany(company.db, 'south')
    const { jobId: abroad } = await south
      .as('detailer')
      .job.importLayout({ companyId: south.id, layout: sampleLayout() })
    expect(await codeOf(detailer.job.fileQuickEdge({ ...filing, intoJobId: abroad }))).toBe('NOT_FOUND')
    expect(await codeOf(detailer.job.fileQuickEdge(filing))).toBe('OK')
    expect(await codeOf(detailer.job.fileQuickEdge(filing))).toBe('NOT_FOUND')
  })
})
