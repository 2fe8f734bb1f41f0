import axe from 'axe-core'
import { expect } from 'vitest'

/**
 * Expects no fault against WCAG 2.2 A and AA in what the page holds. Colours are not painted in jsdom: their contrast
 * is computed in theme.test.ts.
 */
export async function expectAccessible(within: Element = document.body): Promise<void> {
  const { violations } = await axe.run(within, {
    runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'],
    rules: { 'color-contrast': { enabled: false } },
  })
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html).join(' ')}`)).toEqual([])
}
