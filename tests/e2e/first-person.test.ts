import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { startProduct, type Product } from './product'
import { fillSignIn, heading, launchBrowser, openVisit } from './visit'

/** A database with nobody in it lets one person in by the link that the server prints, once. */

let product: Product
let browser: Browser
beforeAll(async () => {
  ;[product, browser] = await Promise.all([startProduct({ withDemo: false }), launchBrowser()])
})
afterAll(async () => {
  await browser?.close()
  await product?.stop()
})

const FIRST = { email: 'first@north.example', password: 'seven odd herons wade' }

test('accepts the printed invitation and begins a job', async () => {
  const visit = await openVisit(browser, { origin: product.origin, size: 'phone' })
  const { page } = visit
  await page.goto(product.invitationPath ?? '')
  await heading(page, 'Invitation')
  await page.getByText(/as admin and detailer\./).waitFor()
  await page.getByLabel('Mail address').fill(FIRST.email)
  await page.getByLabel('Name').fill('First Person')
  await page.getByLabel('Password', { exact: true }).fill(FIRST.password)
  await page.getByRole('button', { name: 'Accept and sign in' }).click()
  await heading(page, 'Jobs')
  await page.getByText('You are on no job yet.').waitFor()

  await page.getByRole('button', { name: 'Begin a job' }).click()
  const dialog = page.getByRole('dialog', { name: 'New job' })
  await dialog.getByRole('button', { name: 'Begin the job' }).click()
  await dialog.getByText('Type the job number.').waitFor()
  await dialog.getByLabel('Number').fill('1')
  await dialog.getByLabel('Title').fill('First job')
  await dialog.getByRole('button', { name: 'Begin the job' }).click()
  await heading(page, /First job/)
  await page.getByText('There is no pour yet.').waitFor()
})

test('the link works once; the person signs in with what they chose, and not with anything else', async () => {
  const visit = await openVisit(browser, { origin: product.origin, size: 'wide' })
  const { page } = visit
  // Both refusals are answers with a status that the browser notes.
  visit.expect(/^console: Failed to load resource: .* (400|401|403|404) /)
  await page.goto(product.invitationPath ?? '')
  await page.getByRole('alert').filter({ hasText: 'This invitation cannot be opened.' }).waitFor()
  await page.goto('/sign-in')
  await fillSignIn(page, { ...FIRST, password: 'seven odd herons fly' })
  await page.getByText('This address and password do not belong together.').waitFor()
  expect(new URL(page.url()).pathname).toBe('/sign-in')
  await fillSignIn(page, FIRST)
  await heading(page, 'Jobs')
  await page.getByRole('link', { name: /First job/ }).waitFor()
})
