import { readdirSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import AxeBuilder from '@axe-core/playwright'
import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { startProduct, type Product } from './product'
import { madeUpPaths, screenCases, type Demo, type ScreenCase } from './screens'
import { storedDemo } from './stored-layout'
import { arrive, heading, launchBrowser, openVisit, SIZE_NAMES, SIZES } from './visit'

/** Every screen, from its address alone, at both sizes in light and dark: what axe finds, and a picture to look at. */

const APP = fileURLToPath(new URL('../../app', import.meta.url))
const PICTURES = 'test-results/screens'

let product: Product
let browser: Browser
let demo: Demo
beforeAll(async () => {
  ;[product, browser] = await Promise.all([startProduct({ withDemo: true }), launchBrowser()])
  const stored = await storedDemo(product)
  demo = { jobId: stored.jobId, companyId: stored.companyId, layout: await stored.layout() }
})
afterAll(async () => {
  await browser?.close()
  await product?.stop()
})

/** Names of the cases do not hang on the demo's ids, so they can be listed before it is there. */
const NO_DEMO: Demo = {
  jobId: '',
  companyId: '',
  layout: { pours: [], edges: [], pans: [], anchors: [], hardware: [] },
}
const NAMES = screenCases(NO_DEMO).map(({ name }) => name)

function caseOf(name: string): ScreenCase {
  const found = screenCases(demo).find((each) => each.name === name)
  if (!found) throw new Error(`There is no case ${name}.`)
  return found
}

/** What is on its way has come and the fonts are there. */
async function settled(page: Page): Promise<void> {
  await page
    .getByText(/^(Fetching|Checking|Being worked out|working out)/)
    .first()
    .waitFor({ state: 'detached' })
  await page.evaluate(() => document.fonts.ready.then(() => undefined))
}

/** What lies over a page is asked about alone: the page below has a case of its own. */
function axeOf(page: Page, { isOver, isAgain }: { readonly isOver: boolean; readonly isAgain: boolean }): AxeBuilder {
  // Without frames of other origins the quick way sees as much; reports of what passed take longest to write.
  const axe = new AxeBuilder({ page }).setLegacyMode(true).options({ resultTypes: ['violations'] })
  if (isOver) axe.include('[role=dialog], [role=menu]')
  return isAgain ? axe.withRules(['color-contrast']) : axe
}

/** Pictures and complaints of axe at both sizes in both schemes; colours alone are asked about twice. */
async function lookAt(page: Page, name: string, isOver = false): Promise<readonly string[]> {
  const found: string[] = []
  for (const size of SIZE_NAMES) {
    await page.setViewportSize(SIZES[size])
    for (const scheme of ['light', 'dark'] as const) {
      await page.emulateMedia({ colorScheme: scheme })
      await settled(page)
      await page.screenshot({ path: `${PICTURES}/${name}-${size}-${scheme}.png`, fullPage: true })
      const { violations } = await axeOf(page, { isOver, isAgain: scheme === 'dark' }).analyze()
      for (const { id, nodes } of violations) {
        found.push(
          `${size} ${scheme} ${id}: ${nodes.map(({ html, failureSummary }) => `${html} ${failureSummary}`).join('\n')}`,
        )
      }
      const over = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)
      if (over > 0) found.push(`${size} ${scheme}: the page is ${over} px wider than the window`)
    }
  }
  return found
}

test.each(NAMES)('%s: opens from its address in a new browser, and axe finds nothing', async (name) => {
  const { path, heading: title, role, open } = caseOf(name)
  const { page } = await openVisit(browser, { origin: product.origin, size: 'wide' })
  if (path === '/') {
    await page.goto('/')
    await heading(page, 'Sign in')
  }
  await arrive(page, path, product.signInOf(role))
  await heading(page, title)
  await settled(page)
  await open?.(page)
  expect(await lookAt(page, name, open !== undefined)).toEqual([])
})

const OUTSIDE = [
  { name: 'sign-in', route: 'sign-in.tsx', path: '/sign-in', title: 'Sign in' },
  { name: 'forgotten', route: 'forgotten.tsx', path: '/forgotten', title: /password/i },
  { name: 'reset-made-up', route: 'reset/[token].tsx', path: '/reset/made-up', title: /password/i },
  { name: 'invitation-made-up', route: 'invite/[token].tsx', path: '/invite/made-up', title: 'Invitation' },
  { name: 'not-found', route: '+not-found.tsx', path: '/nowhere/at/all', title: 'No such page' },
] as const

test.each(OUTSIDE)('$name: axe finds nothing', async ({ name, path, title }) => {
  const visit = await openVisit(browser, { origin: product.origin, size: 'wide' })
  // A made-up token is answered with a refusal, which the browser notes.
  visit.expect(/^console: Failed to load resource: .* (400|404) /)
  await visit.page.goto(path)
  await heading(visit.page, title)
  expect(await lookAt(visit.page, name)).toEqual([])
})

test('every route has a case above', () => {
  const routes = readdirSync(APP, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && entry.name !== '_layout.tsx')
    .map((entry) => join(entry.parentPath, entry.name).slice(APP.length + 1))
  const covered = [...screenCases(demo), ...OUTSIDE].map(({ route }) => route)
  expect([...new Set(covered)].sort()).toEqual(routes.sort())
})

describe('what is not there', () => {
  test('a made-up address says so and leads on', async () => {
    const visit = await openVisit(browser, { origin: product.origin, size: 'phone' })
    const { page } = visit
    visit.expect(/^console: Failed to load resource: .* (400|404) /)
    await arrive(page, `/jobs/${demo.jobId}`, product.signInOf('admin'))
    for (const { path, says } of madeUpPaths(demo)) {
      await page.goto(path)
      await page.getByRole('alert').filter({ hasText: says }).waitFor()
      await heading(page, /./)
    }
  })
})
