import type { Locator, Page } from 'playwright-core'

/** The anchor table of an edge on a wide screen, by what its rows and columns are called. */

export const grid = (page: Page): Locator => page.getByRole('grid', { name: /^Anchors of edge/ })

/** A cell by the anchor's mark, or `next` for the last row, and the head of its column. */
export async function cell(page: Page, row: string, column: string): Promise<Locator> {
  const heads = await grid(page).getByRole('columnheader').allTextContents()
  const at = heads.indexOf(column)
  if (at < 0) throw new Error(`The table has no column ${column}: ${heads.join(', ')}.`)
  const head = page.getByRole('rowheader', { name: row, exact: true })
  return grid(page)
    .getByRole('row')
    .filter({ has: head })
    .getByRole('gridcell')
    .nth(at - 1)
}

/** Puts the focus on a cell; a second press on one would begin to edit it. */
export async function focusCell(page: Page, row: string, column: string): Promise<void> {
  const target = await cell(page, row, column)
  await target.click()
  if ((await target.getByRole('textbox').count()) > 0) await page.keyboard.press('Escape')
  await target.and(page.locator(':focus')).waitFor()
}

/** Types over a cell, without leaving it. */
export async function typeOver(page: Page, at: { row: string; column: string; text: string }): Promise<void> {
  await focusCell(page, at.row, at.column)
  await page.keyboard.type(at.text)
}
