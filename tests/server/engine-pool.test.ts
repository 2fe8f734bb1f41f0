import { afterAll, describe, expect, test } from 'vitest'
import { readLayout, toEngine } from '@wedgeline/contract'
import { enginePool } from '@/server/workers/engine-pool'
import { demoLayout } from '@/db/seed/demo-layout'
import { checkHere, engineHere } from './check-here'

const pool = enginePool()
afterAll(() => pool.close())

function demo() {
  const read = readLayout(demoLayout())
  if (!read.ok) throw new Error('the demo cannot be read')
  const layout = toEngine(read.layout)
  return { layout, pourIds: layout.pours.map(({ id }) => id) }
}

describe('the engine in a thread', () => {
  test('finds what it finds on the thread of the caller', async () => {
    expect(await pool.check(demo())).toEqual(await checkHere(demo()))
  }, 30_000)

  test('leaves the thread of the caller free meanwhile', async () => {
    let turns = 0
    const ticking = setInterval(() => (turns += 1), 1)
    await Promise.all(Array.from({ length: 8 }, () => pool.check(demo())))
    clearInterval(ticking)
    // Eight checks of the demo take a tenth of a second and more; a blocked thread would not tick at all.
    expect(turns).toBeGreaterThan(5)
  }, 30_000)

  test('a layout that contradicts itself fails that call alone', async () => {
    const { layout, pourIds } = demo()
    await expect(pool.check({ layout: { ...layout, edgeLines: [] }, pourIds })).rejects.toThrow()
    expect(await pool.check({ layout, pourIds: [] })).toEqual([])
  }, 30_000)

  test('schedules and writes the workbook that it writes on the thread of the caller', async () => {
    const { layout, pourIds } = demo()
    const pourId = pourIds.at(-1) ?? ''
    expect(await pool.schedule({ layout, pourId })).toEqual(await engineHere.schedule({ layout, pourId }))
    const about = {
      reference: '26-001-P3',
      preparedBy: 'A. Drafter',
      preparedOn: '2026-01-05',
      preparedAtMs: Date.UTC(2026, 0, 5, 8),
      engineVersion: 'test',
    }
    const there = await pool.writeWorkbook({ layout, pourId, about })
    const here = await engineHere.writeWorkbook({ layout, pourId, about })
    if (!there.isWritten || !here.isWritten) throw new Error('the demo has an error in its schedule')
    expect(Buffer.from(there.bytes).equals(Buffer.from(here.bytes))).toBe(true)
    expect(there.newMarks).toEqual(here.newMarks)
  }, 60_000)
})
