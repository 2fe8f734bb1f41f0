import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import type { Colour, Scheme } from '@/components/palette'
import { COLOURS, PALETTES, SCHEMES } from '@/components/palette'

/** WCAG 2.2, relative luminance. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5]
    .map((at) => Number.parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4))
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

/** WCAG 2.2, contrast ratio. */
function contrast(one: string, other: string): number {
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b)
  return (light + 0.05) / (dark + 0.05)
}

const TEXT: readonly Colour[] = ['ink', 'soft', 'rust', 'steel', 'within', 'near', 'over']
const LINES: readonly Colour[] = ['line', 'rust', 'steel', 'ochre', 'within', 'near', 'over', 'ink']
const GROUNDS: readonly Colour[] = ['paper', 'sheet', 'wash', 'input', 'concrete']
const TEXT_MIN: Record<Scheme, number> = { light: 4.5, dark: 4.5, outdoor: 7 }
const LINE_MIN: Record<Scheme, number> = { light: 3, dark: 3, outdoor: 7 }

test('the arithmetic: black on white is 21, (1 + 0.05) / (0 + 0.05)', () =>
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 10))

describe.each(SCHEMES)('%s', (scheme) => {
  const palette = PALETTES[scheme]
  test.each(TEXT)('%s reads as text on every ground', (name) => {
    for (const ground of GROUNDS)
      expect(contrast(palette[name], palette[ground]), ground).toBeGreaterThanOrEqual(TEXT_MIN[scheme])
  })
  test.each(LINES)('%s shows as a line on every ground', (name) => {
    for (const ground of GROUNDS)
      expect(contrast(palette[name], palette[ground]), ground).toBeGreaterThanOrEqual(LINE_MIN[scheme])
  })
  test('the main action’s words', () =>
    expect(contrast(palette.onRust, palette.rust)).toBeGreaterThanOrEqual(TEXT_MIN[scheme]))
})

describe('public/theme.css', () => {
  const css = readFileSync('public/theme.css', 'utf8')
  const block = (selector: string) => {
    const at = css.indexOf(`${selector} {`)
    expect(at, selector).toBeGreaterThanOrEqual(0)
    const body = css.slice(at, css.indexOf('}', at))
    const pairs = [...body.matchAll(/--(\w+): (#\w+);/g)]
    return Object.fromEntries(pairs.map(([, name = '', value = '']): [string, string] => [name, value]))
  }
  test.each([
    ['light', ':root'],
    ['dark', ':root:not([data-theme])'],
    ['dark', ":root[data-theme='dark']"],
    ['outdoor', ":root[data-theme='outdoor']"],
  ] as const)('%s has the palette’s values in %s', (scheme, selector) =>
    expect(block(selector)).toEqual(PALETTES[scheme]),
  )
  test('print has them all, on white', () =>
    expect(block(':root:root:root')).toEqual({ ...PALETTES.light, paper: '#ffffff', sheet: '#ffffff' }))
  test('every palette names the same colours', () => {
    for (const scheme of SCHEMES) expect(Object.keys(PALETTES[scheme])).toEqual(COLOURS)
  })
  test('no more than five faces, each in the repository', () => {
    const files = [...css.matchAll(/url\('\/(fonts\/[\w-]+\.woff2)'\)/g)].map(([, file]) => file)
    expect(files).toHaveLength(5)
    for (const file of files) expect(readFileSync(`public/${file}`).subarray(0, 4).toString('latin1')).toBe('wOF2')
  })
})

describe('public/index.html', () => {
  const html = readFileSync('public/index.html', 'utf8')
  test('no script in the page itself', () => expect(html).not.toMatch(/<script(?![^>]*\ssrc=)[^>]*>|\son\w+=/))
  test('the mark of the first paint is the mark', async () => {
    const { MARK } = await import('@/components/ui/mark-lines')
    for (const d of Object.values(MARK)) expect(html).toContain(`d="${d}"`)
  })
})
