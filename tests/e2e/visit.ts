import type { Browser, BrowserContext, Page } from 'playwright-core'
import { chromium } from 'playwright-core'
import { expect, onTestFinished } from 'vitest'
import { launchOptions } from '../../scripts/chromium.mjs'
import type { SignIn } from './product'

export const SIZES = { phone: { width: 390, height: 844 }, wide: { width: 1440, height: 900 } } as const
export type Size = keyof typeof SIZES
export const SIZE_NAMES = ['phone', 'wide'] as const satisfies readonly Size[]

/** How long anything on screen may take before the test fails. Two cores are shared with the server. */
const PATIENCE_MS = 15_000

export const launchBrowser = (): Promise<Browser> => chromium.launch(launchOptions())

export interface VisitOptions {
  readonly origin: string
  readonly size: Size
  readonly scheme?: 'light' | 'dark'
}

/** One person's browser window, open until the test ends. */
export interface Visit {
  readonly context: BrowserContext
  readonly page: Page
  /** Another tab of the same person. */
  readonly newTab: () => Promise<Page>
  /** Complaints of the browser that this test brings about itself, a refused edit for instance. */
  readonly expect: (...complaints: readonly RegExp[]) => void
}

let failures = 0

/**
 * Opens a window inside a test. When the test ends it fails for every console error, failed request and request to
 * elsewhere; a test that fails leaves pictures of its tabs in test-results.
 */
export async function openVisit(browser: Browser, { origin, size, scheme = 'light' }: VisitOptions): Promise<Visit> {
  const context = await browser.newContext({
    baseURL: origin,
    viewport: SIZES[size],
    colorScheme: scheme,
    hasTouch: size === 'phone',
    isMobile: size === 'phone',
    locale: 'en-GB',
    timezoneId: 'Europe/London',
    acceptDownloads: true,
  })
  context.setDefaultTimeout(PATIENCE_MS)
  const complaints: string[] = []
  const expected: RegExp[] = []
  context.on('page', (page) => watch(page, origin, complaints))
  onTestFinished(async ({ task }) => {
    if (task.result?.state === 'fail') await picture(context, complaints)
    await context.close()
    expect(complaints.filter((complaint) => !expected.some((pattern) => pattern.test(complaint)))).toEqual([])
  })
  return {
    context,
    page: await context.newPage(),
    newTab: () => context.newPage(),
    expect: (...patterns) => expected.push(...patterns),
  }
}

async function picture(context: BrowserContext, complaints: readonly string[]): Promise<void> {
  for (const page of context.pages()) {
    failures += 1
    const path = `test-results/failed-${failures}.png`
    await page.screenshot({ path, timeout: 5000 }).catch(() => undefined)
    console.error(`${path} shows ${page.url()}`, complaints)
  }
}

function watch(page: Page, origin: string, complaints: string[]): void {
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(`console: ${message.text()} (${message.location().url})`)
  })
  page.on('pageerror', (error) => complaints.push(`thrown: ${error.stack ?? error.message}`))
  page.on('request', (request) => {
    const { protocol, origin: asked } = new URL(request.url())
    if (asked !== origin && protocol !== 'data:' && protocol !== 'blob:') complaints.push(`elsewhere: ${request.url()}`)
  })
  page.on('requestfailed', (request) => {
    // A page that is left gives up what it had asked for.
    const why = request.failure()?.errorText ?? ''
    if (why !== 'net::ERR_ABORTED') complaints.push(`failed: ${why} ${request.url()}`)
  })
}

/** Fills in the sign-in page that is open. */
export async function fillSignIn(page: Page, { email, password }: SignIn): Promise<void> {
  await page.getByLabel('Mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('main').getByRole('button', { name: 'Sign in' }).click()
}

/** Goes to a page that needs somebody signed in, signs in, and is back at that page. */
export async function arrive(page: Page, path: string, signIn: SignIn): Promise<void> {
  await page.goto(path)
  await page.waitForURL(/\/sign-in/)
  await fillSignIn(page, signIn)
  // The router writes a colon as it is.
  await page.waitForURL((url) => decodeURIComponent(url.pathname + url.search) === decodeURIComponent(path))
}

/** The heading of the page that is open, once it is there. */
export const heading = (page: Page, name: string | RegExp) => page.getByRole('heading', { level: 1, name }).waitFor()
