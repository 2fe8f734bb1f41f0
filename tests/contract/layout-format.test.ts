import { readFileSync } from 'node:fs'
import { LIMITS, layoutSchema, readLayoutText } from '@wedgeline/contract'
import { describe, expect, test } from 'vitest'
import { z } from 'zod'

const page = readFileSync(new URL('../../docs/layout-format.md', import.meta.url), 'utf8')
const example = readFileSync(new URL('../../docs/example-layout.json', import.meta.url), 'utf8')

/** Text of the page by its second-level headings. */
const sections = new Map(
  page
    .split(/^## /m)
    .slice(1)
    .map((part) => [part.slice(0, part.indexOf('\n')).trim(), part]),
)
const named = (text: string) => new Set([...text.matchAll(/`([^`\n]+)`/g)].map(([, name]) => name))

interface Node {
  readonly properties?: Readonly<Record<string, Node>>
  readonly items?: Node
  readonly anyOf?: readonly Node[]
  readonly oneOf?: readonly Node[]
  readonly enum?: readonly unknown[]
  readonly const?: unknown
}
const schema = z.toJSONSchema(layoutSchema, { io: 'input' }) as Node

/** Names of fields, and the words that a field may hold, all the way down. */
function wordsOf(node: Node): { fields: string[]; values: string[] } {
  const own = Object.entries(node.properties ?? {})
  const children = [
    ...own.map(([, child]) => child),
    ...(node.items ? [node.items] : []),
    ...(node.anyOf ?? []),
    ...(node.oneOf ?? []),
  ].map(wordsOf)
  const held = [...(node.enum ?? []), ...(node.const === undefined ? [] : [node.const])]
  return {
    fields: [...own.map(([name]) => name), ...children.flatMap(({ fields }) => fields)],
    values: [
      ...held.filter((value): value is string => typeof value === 'string'),
      ...children.flatMap(({ values }) => values),
    ],
  }
}

const tables = Object.entries(schema.properties ?? {}).filter(([name]) => name !== 'format' && name !== 'version')

describe('the page describes every field of the layout file', () => {
  test.each(tables)('%s', (name, node) => {
    const section = sections.get(name)
    if (section === undefined) throw new Error(`the page has no section ${name}`)
    const described = named(section)
    const shapes = named(sections.get('Shapes of bars') ?? '')
    const known = (word: string) => described.has(word) || (['steel', 'hardware'].includes(name) && shapes.has(word))
    const { fields, values } = wordsOf(node)
    expect(fields.length + values.length).toBeGreaterThan(0)
    expect(fields.filter((field) => !known(field))).toEqual([])
    expect(values.filter((value) => !known(value))).toEqual([])
  })

  test('format and version', () => {
    const described = named(sections.get('file') ?? '')
    expect(described.has('format') && described.has('version') && described.has('wedgeline.layout')).toBe(true)
  })
})

test('the page names no field that the file does not have', () => {
  const { fields, values } = wordsOf(schema)
  const known = new Set([...fields, ...values])
  const rows = page.split('\n').filter((line) => line.startsWith('| `'))
  const first = rows.flatMap((row) => [...named(row.split('|')[1] ?? '')])
  expect(first.length).toBeGreaterThan(100)
  expect(first.filter((name) => name !== undefined && !known.has(name))).toEqual([])
})

test.each(Object.entries(LIMITS))('the page gives the limit of %s: %i', (_, limit) => {
  expect(sections.get('Limits')).toContain(limit.toLocaleString('en-GB'))
})

test('the example is read without a problem and is as large as the page says', () => {
  const read = readLayoutText(example)
  expect(read.problems).toEqual([])
  if (!read.ok) throw new Error('not read')
  expect(page).toContain(`${read.layout.anchors.length} anchors and ${read.layout.pans.length} pans`)
})
