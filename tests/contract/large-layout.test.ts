import { LIMITS, readLayout, toEngine } from '@wedgeline/contract'
import { checkPour } from '@wedgeline/engine'
import { expect, test } from 'vitest'
import { largeLayout } from '../bench/large-layout'

test('a layout of 1,000 anchors is read and checked without a problem', { timeout: 60_000 }, () => {
  const file = largeLayout(1_000)
  expect(file.anchors).toHaveLength(1_000)
  expect(readLayout(file).problems).toEqual([])
  const layout = toEngine(file)
  const results = layout.pours.map(({ id }) => checkPour(layout, { pourId: id }))
  // Each pour: two edges with a strip behind each, 100 anchors, 51 gaps to an edge, 50 tendons; the outline's short
  // sides carry no edge.
  expect(results.map(({ zones }) => zones.length)).toEqual(Array.from({ length: 10 }, () => 2 + 2 + 100 + 2 * 51 + 50))
})

test('a layout with as many anchors as may be is read', { timeout: 30_000 }, () => {
  const read = readLayout(largeLayout(LIMITS.anchors))
  expect(read.problems).toEqual([])
  expect(read.ok).toBe(true)
})
