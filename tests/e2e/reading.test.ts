import { BASIS_SOURCES } from '@wedgeline/engine'
import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { startProduct, type Product } from './product'
import { storedDemo, type Stored } from './stored-layout'
import { arrive, heading, launchBrowser, openVisit } from './visit'

/** A reading is accepted once for the job; what rested on it is then compared like anything else. */

let product: Product
let browser: Browser
let stored: Stored
beforeAll(async () => {
  ;[product, browser] = await Promise.all([startProduct({ withDemo: true }), launchBrowser()])
  stored = await storedDemo(product)
})
afterAll(async () => {
  await browser?.close()
  await product?.stop()
})

/** Those of the demo's basis that stand alone; crack steel is a question with several answers. */
const proposed = BASIS_SOURCES.filter(({ id }) => id === 'en-1992')
  .flatMap(({ readings }) => readings)
  .filter((reading) => reading.proposed && reading.choice === undefined)

async function accept(page: Page, title: string): Promise<void> {
  await page.getByRole('button', { name: 'Accept …' }).first().click()
  const dialog = page.getByRole('dialog', { name: 'Accept this reading for the job' })
  await dialog.getByText(title).waitFor()
  await dialog.getByRole('button', { name: 'Accept in my name' }).click()
  await dialog.getByText('Give the reason in a sentence.').waitFor()
  await dialog.getByLabel('Reason').fill('Agreed with the office for flat slabs of this depth.')
  await dialog.getByRole('button', { name: 'Accept in my name' }).click()
  await dialog.waitFor({ state: 'detached' })
}

/** How many sides of A4 the page takes in print. */
async function sidesOf(page: Page): Promise<number> {
  const pdf = await page.pdf({ preferCSSPageSize: true })
  return pdf.toString('latin1').match(/\/Type \/Page\b/g)?.length ?? 0
}

test('an engineer accepts the readings, and bursting in plan is no longer a matter of judgement', async () => {
  const { page } = await openVisit(browser, { origin: product.origin, size: 'wide' })
  const { anchors, edges } = await stored.layout()
  const edge = edges.find(({ mark }) => mark === 'E2-P1')
  const anchor = anchors.find(({ edgeId, number }) => edgeId === edge?.id && number === 3)
  const calculation = `/jobs/${stored.jobId}/zones/${encodeURIComponent(`anchor:${anchor?.id}`)}`
  await arrive(page, calculation, product.signInOf('engineer'))
  await heading(page, 'Calculation, E2-P1-03')
  const judged = page.getByText(/Demand 515 mm², limit 785 mm²: 0\.66\. Needs judgement/)
  await judged.waitFor()
  expect(await sidesOf(page)).toBe(1)

  await page.goto(`/jobs/${stored.jobId}`)
  await heading(page, /Quillmarsh/)
  for (const { title } of proposed) await accept(page, title)
  expect((await stored.layout()).job.readings.map(({ acceptedBy }) => acceptedBy)).toEqual(
    proposed.map(() => 'Enoch Vale'),
  )

  await page.goto(calculation)
  await heading(page, 'Calculation, E2-P1-03')
  await page.getByText('Demand 515 mm², limit 785 mm²: 0.66, within').waitFor()
  expect(await judged.count()).toBe(0)
})

test('a detailer sees the readings and cannot accept one', async () => {
  const { page } = await openVisit(browser, { origin: product.origin, size: 'phone' })
  await arrive(page, `/jobs/${stored.jobId}`, product.signInOf('detailer'))
  await page.getByRole('heading', { level: 2, name: 'Readings' }).waitFor()
  expect(await page.getByRole('button', { name: /^(Accept|Withdraw)/ }).count()).toBe(0)
})
