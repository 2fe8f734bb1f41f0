import AxeBuilder from '@axe-core/playwright'
import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { startProduct, type Product } from './product'
import { arrive, heading, launchBrowser, openVisit, SIZE_NAMES } from './visit'

/** One edge pasted, answered, printed on one A4 in under two minutes, and kept in a job afterwards. */

let product: Product
let browser: Browser
beforeAll(async () => {
  ;[product, browser] = await Promise.all([startProduct({ withDemo: true }), launchBrowser()])
})
afterAll(async () => {
  await browser?.close()
  await product?.stop()
})

const CHAINAGES = Array.from({ length: 12 }, (_, at) => 600 + 1200 * at)
const COPIED = `Distance\tHeight\tStrands\n${CHAINAGES.map((at) => `${at}\t110\t4`).join('\n')}\n`

/** Looking, deciding and moving the hand before each action: more than most people take, s. */
const PACE_S = 3
const BUDGET_S = 120

/** Counts what a person does, and does it no faster than a person would. */
function person(page: Page) {
  const begun = Date.now()
  const done: string[] = []
  return {
    done,
    seconds: () => (Date.now() - begun) / 1000,
    async does(what: string, act: () => Promise<unknown>) {
      await page.waitForTimeout(PACE_S * 1000)
      await act()
      done.push(what)
    },
  }
}

const pasteBox = (page: Page) => page.getByLabel(/^Anchors: distance, height/)
const button = (page: Page, name: string) => page.getByRole('button', { name, exact: true })

/** Pages of a PDF: each has an object of this type. */
const pagesOf = (pdf: Buffer): number => (pdf.toString('latin1').match(/\/Type\s*\/Page(?!s)/g) ?? []).length

async function proposed(page: Page): Promise<void> {
  await page.getByRole('heading', { name: /^Bars, \d+ kg$/ }).waitFor()
  await page.getByText('working out …').waitFor({ state: 'detached' })
  await expect
    .poll(() => page.getByRole('button', { name: 'Print on one A4' }).isEnabled(), { timeout: 30_000 })
    .toBe(true)
}

async function violations(page: Page): Promise<readonly string[]> {
  const found = await new AxeBuilder({ page })
    .setLegacyMode(true)
    .options({ resultTypes: ['violations'] })
    .analyze()
  return found.violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join('\n')}`)
}

test.each(SIZE_NAMES)('%s: paste, bars, one A4 in under two minutes; then kept and filed', async (size) => {
  const visit = await openVisit(browser, { origin: product.origin, size })
  const { page } = visit
  await arrive(page, '/', product.signInOf('detailer'))
  await heading(page, 'Jobs')
  const hand = person(page)
  await hand.does('open the page', () => page.getByRole('link', { name: 'Quick edge', exact: true }).click())
  await heading(page, 'Quick edge')
  await hand.does('paste', () => pasteBox(page).fill(COPIED))
  await page.getByText('12 anchors read, from 600 to 13800 mm.').waitFor()
  // Plan and face stand there before anything is stored.
  await page.getByRole('img', { name: 'Plan and face of the edge' }).first().waitFor()
  await proposed(page)
  await hand.does('propose bars', () => button(page, 'Propose bars').click())
  await page
    .getByText(/Proposed for|Every check is within|crack steel/)
    .first()
    .waitFor()
  await proposed(page)
  let isPrinted = false
  await page.exposeFunction('printed', () => (isPrinted = true))
  await page.evaluate('window.print = () => window.printed()')
  await hand.does('print', () => button(page, 'Print on one A4').click())
  await expect.poll(() => isPrinted).toBe(true)
  const pdf = await page.pdf({ preferCSSPageSize: true, path: `test-results/quick-edge-${size}.pdf` })
  expect(hand.seconds()).toBeLessThan(BUDGET_S)
  expect(hand.done).toEqual(['open the page', 'paste', 'propose bars', 'print'])
  console.info(
    `Quick edge, ${size}: ${hand.done.length} actions, ${hand.seconds().toFixed(0)} s at ${PACE_S} s an action`,
  )
  expect(pagesOf(pdf)).toBe(1)
  await page.emulateMedia({ media: 'print' })
  const sheet = await page.getByRole('main').innerText()
  expect(sheet).toContain('QUICK EDGE, NOT FILED. Readings not accepted.')
  expect(sheet).toMatch(/Bars, [\d.]+ kg in all/)
  expect(sheet).toContain('Results assist a qualified engineer and do not replace one.')
  for (const mark of ['E1-01', 'E1-12']) expect(sheet).toContain(mark)
  await page.emulateMedia({ media: 'screen' })
  expect(await violations(page)).toEqual([])
  expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0)
  await page.screenshot({ path: `test-results/quick-edge-${size}.png`, fullPage: true })

  await button(page, 'Keep it').click()
  await heading(page, /^Edge E1/)
  await page.getByText(/^Quick edge, not filed\./).waitFor()
  const edgePath = new URL(page.url()).pathname
  await page.goto('/')
  await page.getByRole('heading', { name: 'Quick edges, not yet filed' }).waitFor()
  await page.getByRole('list', { name: 'Quick edges, not yet filed' }).getByText('12 anchors').waitFor()
  await page.goto(edgePath)
  await button(page, 'Keep in a job').click()
  const dialog = page.getByRole('dialog', { name: 'Keep in a job' })
  if (size === 'wide') {
    await dialog.getByLabel('Number').fill('2302-Q')
    await dialog.getByLabel('Title').fill('Harrowby Annexe (invented)')
    await dialog.getByRole('button', { name: 'Keep it' }).click()
    await page.getByText(/^Quick edge, not filed\./).waitFor({ state: 'detached' })
    await page.goto('/')
    await page.getByRole('link', { name: /Harrowby Annexe/ }).waitFor()
  } else {
    await dialog.getByRole('button', { name: 'Into a job' }).click()
    await dialog.getByLabel('Mark of the pour').fill('Q1')
    await dialog.getByRole('button', { name: 'Put it into the job' }).click()
    await heading(page, 'Pour Q1')
    await page.goto('/')
  }
  await heading(page, 'Jobs')
  expect(await page.getByRole('heading', { name: 'Quick edges, not yet filed' }).count()).toBe(0)
})

test('long edges print on one side as well', async () => {
  const { page } = await openVisit(browser, { origin: product.origin, size: 'wide' })
  await arrive(page, '/quick-edge', product.signInOf('detailer'))
  for (const count of [40, 90]) {
    await pasteBox(page).fill(Array.from({ length: count }, (_, at) => `${600 + 1200 * at}`).join('\n'))
    await page.getByText(`${count} anchors read`).waitFor()
    await proposed(page)
    expect(pagesOf(await page.pdf({ preferCSSPageSize: true }))).toBe(1)
  }
})

test('what is typed survives a reload, and a line that cannot be read is named', async () => {
  const { page } = await openVisit(browser, { origin: product.origin, size: 'wide' })
  await arrive(page, '/quick-edge', product.signInOf('detailer'))
  await pasteBox(page).fill('600 110 4\nsixteen')
  await page.getByText(/^Line 2\. /).waitFor()
  await page.getByLabel('Thickness, mm').fill('260')
  await page.reload()
  await heading(page, 'Quick edge')
  expect(await pasteBox(page).inputValue()).toBe('600 110 4\nsixteen')
  expect(await page.getByLabel('Thickness, mm').inputValue()).toBe('260')
})

test('somebody whose role makes none is told whose does', async () => {
  const { page } = await openVisit(browser, { origin: product.origin, size: 'phone' })
  await arrive(page, '/quick-edge', product.signInOf('inspector'))
  await page.getByText('Your role does not make quick edges.').waitFor()
})
