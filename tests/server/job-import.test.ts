import { describe, expect, test } from 'vitest'
import { v7 as uuidv7 } from 'uuid'
import type { LayoutFile } from '@wedgeline/contract'
import { demoLayout } from '@/db/seed/demo-layout'
import { openTestCompany, type TestCompany } from './company'
import { sampleLayout } from './layout-sample'

/** The layout with every id replaced by the place where it is first defined, so that two layouts compare by content. */
function withoutIds(layout: LayoutFile): unknown {
  const names = new Map<string, string>()
  const define = (rows: readonly { id: string }[], place: string) =>
    rows.forEach((row, i) => names.set(row.id, `${place}[${i}]`))
  const byName = <T extends { name: string }>(rows: readonly T[]) =>
    [...rows].sort((a, b) => (a.name < b.name ? -1 : 1))
  const ordered = {
    ...layout,
    hardware: byName(layout.hardware),
    jacks: byName(layout.jacks),
    strandTypes: byName(layout.strandTypes),
    barMarks: [...layout.barMarks].sort((a, b) => a.mark - b.mark),
  }
  for (const [table, rows] of Object.entries(ordered)) if (Array.isArray(rows)) define(rows, table)
  ordered.pours.forEach((pour, i) => {
    define(pour.outline, `pours[${i}].outline`)
    define(pour.mats, `pours[${i}].mats`)
    define(pour.stages, `pours[${i}].stages`)
    define(pour.regions, `pours[${i}].regions`)
  })
  ordered.edges.forEach((edge, i) => define(edge.lengths, `edges[${i}].lengths`))
  const renamed = JSON.stringify(ordered, (key, value: unknown) =>
    typeof value === 'string' && /^id$|Id$/.test(key) ? (names.get(value) ?? 'job') : value,
  )
  return JSON.parse(renamed)
}

async function importAs(company: TestCompany, layout: LayoutFile): Promise<LayoutFile> {
  const engineer = company.as('engineer')
  const { jobId } = await engineer.job.importLayout({ companyId: company.id, layout })
  return (await engineer.layout.byJob({ jobId })).layout
}

describe('a layout file that is imported and exported', () => {
  test('comes back equal but for its ids, for a job that was made a moment ago and holds nothing', async () => {
    const company = openTestCompany()
    const detailer = company.as('detailer')
    const id = uuidv7()
    await detailer.job.create({ id, companyId: company.id, number: '1', title: 'New' })
    const { layout } = await detailer.layout.byJob({ jobId: id })
    expect(layout).toMatchObject({ levels: [], pours: [] })
    expect(withoutIds(await importAs(company, layout))).toEqual(withoutIds(layout))
  })

  test('comes back equal but for its ids, for a small pour', async () => {
    const back = await importAs(openTestCompany(), sampleLayout())
    expect(withoutIds(back)).toEqual(withoutIds(sampleLayout()))
  })

  test('comes back equal but for its ids, for the demo', async () => {
    const back = await importAs(openTestCompany(), demoLayout())
    expect(withoutIds(back)).toEqual(withoutIds(demoLayout()))
  })
})
