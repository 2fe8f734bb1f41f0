import type { LayoutFile } from '@wedgeline/contract'
import type { Browser, Locator, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { cell, grid, typeOver } from './anchor-grid'
import { startProduct, type Product } from './product'
import { storedDemo, type Stored } from './stored-layout'
import { arrive, launchBrowser, openVisit, type Size, type Visit } from './visit'

/** What becomes of typed values that are undone, reloaded, cut off or changed by two people, on the demo's edges. */

let product: Product
let browser: Browser
let stored: Stored
let demo: LayoutFile

beforeAll(async () => {
  ;[product, browser] = await Promise.all([startProduct({ withDemo: true }), launchBrowser()])
  stored = await storedDemo(product)
  demo = await stored.layout()
})
afterAll(async () => {
  await browser?.close()
  await product?.stop()
})

const HEIGHT = 'Height, mm'
/** What a browser says of a server that it cannot reach. */
const OUT_OF_REACH = /ERR_INTERNET_DISCONNECTED/

async function visitEdge(mark: string, size: Size, role: 'detailer' | 'engineer' = 'detailer'): Promise<Visit> {
  const visit = await openVisit(browser, { origin: product.origin, size })
  await arrive(visit.page, edgePath(mark), product.signInOf(role))
  await isOpen(visit.page, mark)
  return visit
}

function edgePath(mark: string): string {
  const edge = demo.edges.find((each) => each.mark === mark)
  return `/jobs/${stored.jobId}/edges/${edge?.id}`
}

const isOpen = (page: Page, mark: string) =>
  page.getByRole('heading', { level: 1, name: new RegExp(`^Edge ${mark}`) }).waitFor()

const saved = (page: Page) =>
  page
    .getByRole('status')
    .filter({ hasText: /^Saved/ })
    .first()
    .waitFor()

/** The renderer ends at once, as when a phone takes its memory: nothing in the page runs any more. */
async function killTab(page: Page): Promise<void> {
  const session = await page.context().newCDPSession(page)
  const gone = page.waitForEvent('crash')
  session.send('Page.crash').catch(() => undefined)
  await gone
  await page.close()
}

/** Opens an anchor's sheet on a phone; its field for the height. */
async function heightField(page: Page, mark: string): Promise<Locator> {
  await page
    .getByRole('button', { name: new RegExp(`^${mark} `) })
    .last()
    .click()
  return page.getByRole('dialog').getByLabel('Height above soffit, mm')
}

/** Types into the field of a phone's sheet, without leaving it. */
async function typeHeight(page: Page, mark: string, text: string): Promise<void> {
  const field = await heightField(page, mark)
  await field.click()
  await field.press('Control+A')
  await field.pressSequentially(text)
}

describe('undo', () => {
  test('takes back a typed value as one step, by key and by button, and the server holds what stands', async () => {
    const { page } = await visitEdge('E1', 'wide')
    const before = await (await cell(page, 'E1-02', HEIGHT)).textContent()
    await typeOver(page, { row: 'E1-02', column: HEIGHT, text: '131' })
    await page.keyboard.press('Enter')
    await page.getByRole('button', { name: 'Undo: E1-02: height' }).waitFor()
    await saved(page)
    expect(await stored.heightOf('E1', 2)).toBe(131)
    await page.keyboard.press('Control+z')
    expect(await (await cell(page, 'E1-02', HEIGHT)).textContent()).toBe(before)
    await page.keyboard.press('Control+Shift+z')
    expect(await (await cell(page, 'E1-02', HEIGHT)).textContent()).toBe('131')
    await page.getByRole('button', { name: /^Undo/ }).click()
    expect(await (await cell(page, 'E1-02', HEIGHT)).textContent()).toBe(before)
    await expect.poll(() => stored.heightOf('E1', 2)).toBe(Number(before))
  })

  test('brings back a removed anchor with its bars', async () => {
    const { page } = await visitEdge('E2-P1', 'wide')
    const steelOf = async () => (await cell(page, 'E2-P1-03', 'Steel')).textContent()
    const before = await steelOf()
    expect(before).toContain('12 ⌀10')
    await (await cell(page, 'E2-P1-03', HEIGHT)).click()
    await page.keyboard.press('Delete')
    await page.getByRole('rowheader', { name: 'E2-P1-03' }).waitFor({ state: 'detached' })
    await page.keyboard.press('Control+z')
    await page.getByRole('rowheader', { name: 'E2-P1-03' }).waitFor()
    expect(await steelOf()).toBe(before)
  })
})

describe('a tab that ends in the middle of typing', () => {
  test('wide: reloaded straight after the last key, everything typed is there', async () => {
    const { page } = await visitEdge('E1', 'wide')
    await typeOver(page, { row: 'E1-03', column: HEIGHT, text: '118' })
    await page.reload()
    await isOpen(page, 'E1')
    expect(await (await cell(page, 'E1-03', HEIGHT)).textContent()).toBe('118')
    await expect.poll(() => stored.heightOf('E1', 3)).toBe(118)
  })

  test('wide: killed 1 s after the last key, nothing is lost', async () => {
    const { page, newTab } = await visitEdge('E1', 'wide')
    await typeOver(page, { row: 'E1-04', column: HEIGHT, text: '121' })
    await page.waitForTimeout(1000)
    await killTab(page)
    const tab = await newTab()
    await tab.goto(edgePath('E1'))
    await isOpen(tab, 'E1')
    expect(await (await cell(tab, 'E1-04', HEIGHT)).textContent()).toBe('121')
    expect(await stored.heightOf('E1', 4)).toBe(121)
  })

  test('wide: killed while the server is out of reach, it is sent once the edge is opened again', async () => {
    const visit = await visitEdge('E1', 'wide')
    const { page, context, newTab } = visit
    visit.expect(OUT_OF_REACH)
    await context.setOffline(true)
    await typeOver(page, { row: 'E1-06', column: HEIGHT, text: '122' })
    await page.waitForTimeout(1000)
    await page.getByText('Not sent yet: the server cannot be reached. Your work is kept here.').waitFor()
    await killTab(page)
    await context.setOffline(false)
    const tab = await newTab()
    await tab.goto(edgePath('E1'))
    await isOpen(tab, 'E1')
    expect(await (await cell(tab, 'E1-06', HEIGHT)).textContent()).toBe('122')
    await expect.poll(() => stored.heightOf('E1', 6)).toBe(122)
  })

  test('phone: killed 1 s after the last key in a field that was not left, nothing is lost', async () => {
    const { page, newTab } = await visitEdge('E1', 'phone')
    await typeHeight(page, 'E1-07', '123')
    await page.waitForTimeout(1000)
    await killTab(page)
    const tab = await newTab()
    await tab.goto(edgePath('E1'))
    await isOpen(tab, 'E1')
    expect(await (await heightField(tab, 'E1-07')).inputValue()).toBe('123')
    await expect.poll(() => stored.heightOf('E1', 7)).toBe(123)
  })
})

describe('two people at one edge', () => {
  /** The detailer's value is stored first; the engineer's tab does not know. Returns both visits. */
  async function clash(number: number, theirs: string, mine: string): Promise<{ detailer: Visit; engineer: Visit }> {
    const mark = `E3-0${number}`
    const detailer = await visitEdge('E3', 'wide')
    const engineer = await visitEdge('E3', 'wide', 'engineer')
    // The refusal is an answer of status 409, which the browser notes as an error.
    engineer.expect(/^console: Failed to load resource: .* 409 /)
    await typeOver(detailer.page, { row: mark, column: HEIGHT, text: theirs })
    await detailer.page.keyboard.press('Enter')
    await expect.poll(() => stored.heightOf('E3', number)).toBe(Number(theirs))
    await typeOver(engineer.page, { row: mark, column: HEIGHT, text: mine })
    await engineer.page.keyboard.press('Enter')
    const refusal = engineer.page.getByRole('alert').filter({ hasText: 'Somebody else changed the same place' })
    const row = refusal.getByRole('row').filter({ hasText: mark })
    await row.waitFor()
    const [, yours, other] = await row.getByRole('cell').allTextContents()
    expect([yours, other]).toEqual([`${mine} mm`, `${theirs} mm`])
    // What was typed still stands, and is stored nowhere.
    expect(await (await cell(engineer.page, mark, HEIGHT)).textContent()).toBe(mine)
    expect(await stored.heightOf('E3', number)).toBe(Number(theirs))
    return { detailer, engineer }
  }

  test('the second is refused with both values, and can keep theirs', async () => {
    const { engineer } = await clash(1, '112', '114')
    await engineer.page.getByRole('button', { name: 'Keep theirs' }).click()
    await engineer.page.getByRole('alert').waitFor({ state: 'detached' })
    expect(await (await cell(engineer.page, 'E3-01', HEIGHT)).textContent()).toBe('112')
    expect(await stored.heightOf('E3', 1)).toBe(112)
  })

  test('the second is refused with both values, and can keep mine', async () => {
    const { engineer } = await clash(2, '113', '116')
    await engineer.page.getByRole('button', { name: 'Keep mine' }).click()
    await engineer.page.getByRole('alert').waitFor({ state: 'detached' })
    expect(await (await cell(engineer.page, 'E3-02', HEIGHT)).textContent()).toBe('116')
    await expect.poll(() => stored.heightOf('E3', 2)).toBe(116)
  })
})

test('an inspector reads an edge and can change nothing', async () => {
  const visit = await openVisit(browser, { origin: product.origin, size: 'wide' })
  const { page } = visit
  await arrive(page, edgePath('E1'), product.signInOf('inspector'))
  await isOpen(page, 'E1')
  const before = await (await cell(page, 'E1-02', HEIGHT)).textContent()
  await typeOver(page, { row: 'E1-02', column: HEIGHT, text: '99' })
  expect(await (await cell(page, 'E1-02', HEIGHT)).textContent()).toBe(before)
  expect(await grid(page).getByRole('rowheader', { name: 'next' }).count()).toBe(0)
  expect(await page.getByRole('button', { name: 'Paste anchors' }).count()).toBe(0)
})
