import type { Locator, Page } from 'playwright-core'
import { cell, focusCell, grid, typeOver } from './anchor-grid'

/** What a person does at an edge, in the way of a wide screen with a keyboard or of a phone. */
export interface Hands {
  readonly typeAnchors: (page: Page, chainages: readonly number[]) => Promise<void>
  /** Chainages as the table shows them. */
  readonly chainages: (page: Page) => Promise<readonly number[]>
  /** Opens the anchor's sheet and types its height. */
  readonly typeHeight: (page: Page, mark: string, height: number) => Promise<void>
  readonly openAnchor: (page: Page, mark: string) => Promise<void>
  readonly heightOf: (page: Page, mark: string) => Promise<number>
  /** What is open of the anchor that is picked. */
  readonly sheet: (page: Page, mark: string) => Locator
}

const HEIGHT = 'Height, mm'

const numbers = (texts: readonly string[]): readonly number[] => texts.map(Number)

export const keyboard: Hands = {
  async typeAnchors(page, chainages) {
    const next = await cell(page, 'next', 'Chainage, mm')
    await next.click()
    for (const chainage of chainages) {
      await page.keyboard.type(String(chainage))
      await page.keyboard.press('Enter')
    }
    await page.keyboard.press('Escape')
  },
  async chainages(page) {
    const heads = await grid(page).getByRole('columnheader').allTextContents()
    const rows = await grid(page).getByRole('row').filter({ hasText: 'live' }).all()
    const at = heads.indexOf('Chainage, mm') - 1
    return numbers(
      await Promise.all(rows.map(async (row) => (await row.getByRole('gridcell').nth(at).innerText()).trim())),
    )
  },
  async typeHeight(page, mark, height) {
    await typeOver(page, { row: mark, column: HEIGHT, text: String(height) })
    await page.keyboard.press('Enter')
    await keyboard.openAnchor(page, mark)
  },
  async openAnchor(page, mark) {
    await focusCell(page, mark, HEIGHT)
    await keyboard.sheet(page, mark).waitFor()
  },
  heightOf: async (page, mark) => Number(await (await cell(page, mark, HEIGHT)).innerText()),
  sheet: (page, mark) => page.getByRole('region', { name: `${mark}, live end` }),
}

const sheet = (page: Page) => page.getByRole('dialog')
const anchorTable = (page: Page) => page.getByRole('table', { name: 'Anchors of this edge' })
const heightField = (page: Page) => sheet(page).getByLabel('Height above soffit, mm')

export const thumbs: Hands = {
  async typeAnchors(page, chainages) {
    const next = page.getByLabel('Next anchor: distance, height, strands')
    for (const [at, chainage] of chainages.entries()) {
      // The first says everything; the rest take height and strands from it.
      await next.fill(at === 0 ? `${chainage} 110 4` : String(chainage))
      if (at % 2 === 0) await next.press('Enter')
      else await page.getByRole('button', { name: 'Add', exact: true }).tap()
    }
  },
  async chainages(page) {
    const rows = await anchorTable(page).getByRole('row').filter({ hasText: 'live' }).all()
    return numbers(await Promise.all(rows.map((row) => row.getByRole('cell').first().innerText())))
  },
  async typeHeight(page, mark, height) {
    await thumbs.openAnchor(page, mark)
    await heightField(page).fill(String(height))
  },
  async openAnchor(page, mark) {
    await anchorTable(page).getByRole('button', { name: mark }).tap()
    await heightField(page).waitFor()
  },
  heightOf: async (page) => Number(await heightField(page).inputValue()),
  sheet,
}
