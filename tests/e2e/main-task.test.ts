import { readFileSync } from 'node:fs'
import { readLayoutText, toEngine, type LayoutFile } from '@wedgeline/contract'
import { checkPour, scheduleOf, type Compared, type ZoneResult } from '@wedgeline/engine'
import type { Browser, Locator, Page } from 'playwright-core'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { focusCell } from './anchor-grid'
import { keyboard, thumbs } from './hands'
import { startProduct, type Product } from './product'
import { arrive, heading, launchBrowser, openVisit, SIZE_NAMES } from './visit'
import { engineRows, readWorkbook, scheduleRows, totalRows } from './workbook'

/** The job that the product is there for, from nothing to a bar schedule, through the screens alone. */

let product: Product
let browser: Browser
beforeAll(async () => {
  ;[product, browser] = await Promise.all([startProduct({ withDemo: true }), launchBrowser()])
})
afterAll(async () => {
  await browser?.close()
  await product?.stop()
})

const TYPED = [1500, 3000, 4500, 6000, 7500, 9000, 10_500, 12_000]
const PASTED = [13_500, 15_000, 16_500, 18_000, 19_500, 21_000, 22_500, 24_000]
const COPIED = `Distance\tHeight\tStrands\n${PASTED.map((at) => `${at}\t110\t4`).join('\n')}\n`
const LOW = 'E1-03'
/** S4 needs 75 from its centre to the soffit (invented approval), and its links of 140 a cover of 30: 70 + 30. */
const LOW_MM = 62
const MENDED_MM = 100

test.each(SIZE_NAMES)('%s: new job, pour, 16 anchors, one mended, calculation, workbook', async (size) => {
  const visit = await openVisit(browser, { origin: product.origin, size })
  const { page, context } = visit
  const hands = size === 'wide' ? keyboard : thumbs
  await arrive(page, '/', product.signInOf('detailer'))
  const jobPath = await beginJob(page, size)
  const pourPath = await makePour(page)
  await page.getByRole('link', { name: 'Open edge E1' }).click()
  await heading(page, /^Edge E1/)

  await hands.typeAnchors(page, TYPED)
  expect(await hands.chainages(page)).toEqual(TYPED)
  if (size === 'wide') {
    await context.grantPermissions(['clipboard-read', 'clipboard-write'])
    await page.evaluate((text) => navigator.clipboard.writeText(text), COPIED)
    await focusCell(page, 'next', 'Chainage, mm')
    await page.keyboard.press('Control+v')
    expect(await hands.chainages(page)).toEqual([...TYPED, ...PASTED])
    await page.getByRole('button', { name: 'Undo: Add 8 anchors' }).click()
    expect(await hands.chainages(page)).toEqual(TYPED)
  }
  await pasteInDialog(page)
  expect(await hands.chainages(page)).toEqual([...TYPED, ...PASTED])

  await hands.typeHeight(page, LOW, LOW_MM)
  const sheet = hands.sheet(page, LOW)
  const low = check(sheet, /Centre above soffit.* 62 mm, needs 75 mm.*short by 13 mm/)
  await low.waitFor()
  await sheet.getByText('Kept as typed.').first().waitFor()
  expect(await hands.heightOf(page, LOW)).toBe(LOW_MM)
  await sheet
    .getByRole('button', { name: /^Use \d+$/ })
    .first()
    .click()
  await low.waitFor({ state: 'detached' })
  await expect.poll(() => hands.heightOf(page, LOW)).toBe(MENDED_MM)
  expect(await check(sheet, /^over/).count()).toBe(0)

  await giveTransverseBars(sheet)
  await page.screenshot({ path: `test-results/main-task-${size}.png` })
  await sheet.getByRole('link', { name: 'Calculation, every step' }).click()
  await heading(page, `Calculation, ${LOW}`)
  // The head stands before the steps are worked out.
  await page
    .getByText(/Demand .* limit /)
    .first()
    .waitFor()
  await unfold(page)
  const shown = await page.getByRole('main').innerText()

  const workbook = await exportWorkbook(page, pourPath)
  const layout = await exportLayout(page, jobPath)
  const pourId = layout.pours[0]?.id ?? ''
  const { zones } = checkPour(toEngine(layout), { pourId, withSteps: true })
  compareSteps(
    shown,
    zones.find(({ zone }) => zone.name === LOW),
  )
  expect(planRatios(zones)).toHaveLength(16)
  expect(Math.max(...planRatios(zones))).toBeLessThan(1)
  await compareWorkbook(workbook, { layout, pourId, zones })
})

/** Checks that are within fold their steps away. */
async function unfold(page: Page): Promise<void> {
  const folded = page.getByRole('button', { name: /^Steps and notes of/ })
  while ((await folded.count()) > 0) await folded.first().click()
}

const check = (sheet: Locator, name: RegExp) => sheet.getByRole('button', { name })

async function beginJob(page: Page, size: string): Promise<string> {
  await page.getByRole('button', { name: 'New job' }).click()
  const dialog = page.getByRole('dialog', { name: 'New job' })
  await dialog.getByLabel('Number').fill(`2301-${size}`)
  await dialog.getByLabel('Title').fill('Harrowby Store (invented)')
  await dialog.getByRole('button', { name: 'Begin the job' }).click()
  await heading(page, /Harrowby Store/)
  return new URL(page.url()).pathname
}

/** A rectangle of 26 by 12 m, 220 mm of C32/40. */
async function makePour(page: Page): Promise<string> {
  await page.getByRole('link', { name: 'Add the first pour' }).click()
  await heading(page, 'New pour')
  const main = page.getByRole('main')
  await main.getByLabel('Title').fill('Deck')
  await main.getByLabel('Mark of the new level').fill('L1')
  await main.getByLabel('Thickness, mm').fill('220')
  await main.getByLabel('Size east, mm').fill('26 m')
  await main.getByLabel('Size north, mm').fill('12000')
  await main.getByRole('button', { name: 'Make pour P1' }).click()
  await heading(page, /^Pour P1/)
  return new URL(page.url()).pathname
}

async function pasteInDialog(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Paste anchors' }).click()
  const dialog = page.getByRole('dialog', { name: 'Paste anchors' })
  await dialog.getByLabel('Distance, height, strands, end, hardware, set-back').fill(COPIED)
  await dialog.getByText('8 anchors from 13500 to 24000 mm.').waitFor()
  await dialog.getByRole('button', { name: 'Put 8 on the edge' }).click()
  await dialog.waitFor({ state: 'detached' })
}

async function giveTransverseBars(sheet: Locator): Promise<void> {
  await check(sheet, /Bursting in plan.*no steel/).waitFor()
  await sheet.getByRole('button', { name: 'Add transverse bars' }).click()
  await sheet.getByRole('button', { name: 'Give the same to the other 15 live anchors' }).click()
  await check(sheet, /Bursting in plan.* 0\.\d\d/).waitFor()
}

async function exportWorkbook(page: Page, pourPath: string): Promise<string> {
  await page.goto(pourPath)
  await page.getByRole('navigation', { name: 'Pages of pour P1' }).getByRole('link', { name: 'Schedule' }).click()
  await heading(page, 'Pour P1, bar schedule')
  const begun = page.waitForEvent('download')
  await page.getByRole('button', { name: 'Export workbook' }).click()
  const download = await begun
  expect(download.suggestedFilename()).toMatch(/^2301-\w+-P1 bar schedule\.xlsx$/)
  return download.path()
}

async function exportLayout(page: Page, jobPath: string): Promise<LayoutFile> {
  await page.goto(jobPath)
  await page.getByRole('button', { name: 'More' }).click()
  const begun = page.waitForEvent('download')
  await page.getByRole('menuitem', { name: 'Export the layout file' }).click()
  const read = readLayoutText(readFileSync(await (await begun).path(), 'utf8'))
  if (!read.ok) throw new Error(`The exported layout cannot be read: ${JSON.stringify(read.problems)}`)
  return read.layout
}

const isCompared = (each: ZoneResult['checks'][number]): each is Compared => each.kind === 'compared'

/** Every step's result stands on the sheet, to six figures, with its unit. */
function compareSteps(shown: string, zone: ZoneResult | undefined): void {
  const steps = zone?.checks.filter(isCompared).flatMap(({ steps }) => steps) ?? []
  expect(steps.length).toBeGreaterThan(10)
  const plain = shown.replaceAll('−', '-').replaceAll('\u202f', '')
  for (const { value, unit, symbol } of steps) {
    const isWhole = Number.isInteger(value) || Math.abs(value) >= 1e5
    const figure = isWhole ? Math.round(value) : Number(value.toPrecision(5))
    expect(plain, symbol).toContain(` = ${figure}${unit === '-' ? '' : ` ${unit.replace('mm2', 'mm²')}`}`)
  }
}

const planRatios = (zones: readonly ZoneResult[]): readonly number[] =>
  zones.flatMap(({ checks }) =>
    checks
      .filter(isCompared)
      .flatMap(({ family, utilisation }) => (family === 'bursting-plan' ? (utilisation ?? NaN) : [])),
  )

async function compareWorkbook(
  path: string,
  {
    layout,
    pourId,
    zones,
  }: { readonly layout: LayoutFile; readonly pourId: string; readonly zones: readonly ZoneResult[] },
): Promise<void> {
  const notYet = [...new Set(zones.flatMap(({ notYetChecked }) => notYetChecked))]
  const schedule = scheduleOf(toEngine(layout), pourId, notYet)
  // Closed links of the hardware and transverse bars, each at 16 anchors: 16 x 4 links, 16 x 12 bars of 1500.
  expect(schedule.rows.map(({ total }) => total).sort((a, b) => a - b)).toEqual([64, 192])
  const book = await readWorkbook(path)
  const rows = scheduleRows(book)
  expect(rows.map((row) => row.slice(0, -1))).toEqual(engineRows(schedule).map((row) => row.slice(0, -1)))
  rows.forEach((row, at) => expect(row.at(-1)).toBeCloseTo(Number(engineRows(schedule)[at]?.at(-1)), 6))
  const totals = totalRows(book)
  const expected = [
    ...schedule.totals.map(({ typeAndSize, bars, metres, massPerMetre, mass }) => [
      typeAndSize,
      bars,
      metres,
      massPerMetre,
      mass,
    ]),
    ['All bars', 256, schedule.metres, null, schedule.mass],
  ]
  expect(totals.map(([size]) => size)).toEqual(expected.map(([size]) => size))
  totals.forEach((row, at) =>
    row.slice(1).forEach((value, k) => {
      const wanted = expected[at]?.[k + 1] ?? null
      if (typeof wanted === 'number') expect(value).toBeCloseTo(wanted, 6)
      else expect(value).toBe(wanted)
    }),
  )
}
