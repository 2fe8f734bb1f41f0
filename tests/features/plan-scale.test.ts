import { expect, test } from 'vitest'
import { boundsOf, lineAcross, pathThrough, planScale } from '@/features/pour/plan-scale'

// A slab of 20 m by 10 m in a room of 440 by 400 px with 20 px kept free: 400 px over 20,000 mm is 0.02 px a mm.
const bounds = boundsOf([
  { x: 0, y: 0 },
  { x: 20_000, y: 10_000 },
])
const fit = { width: 440, heightMax: 400, margin: 20, zoom: 1 }

test('the whole fills the width, at one scale both ways', () => {
  const scale = planScale(bounds, fit)
  expect(scale.pxPerMm).toBeCloseTo(0.02, 12)
  expect([scale.width, scale.height]).toEqual([440, 240])
})

test('a room that is low sets the scale by its height: (140 - 40) / 10,000 = 0.01', () => {
  expect(planScale(bounds, { ...fit, heightMax: 140 }).pxPerMm).toBeCloseTo(0.01, 12)
})

test('north is up: the north-west corner is drawn at the top left', () => {
  const scale = planScale(bounds, fit)
  expect(scale.at({ x: 0, y: 10_000 })).toEqual({ x: 20, y: 20 })
  expect(scale.at({ x: 20_000, y: 0 })).toEqual({ x: 420, y: 220 })
})

test('twice as large is twice the px a mm and a larger sheet', () => {
  const scale = planScale(bounds, { ...fit, zoom: 2 })
  expect(scale.pxPerMm).toBeCloseTo(0.04, 12)
  expect([scale.width, scale.height]).toEqual([840, 440])
})

test('a point alone still has a scale', () => {
  expect(planScale(boundsOf([{ x: 5, y: 5 }]), fit).pxPerMm).toBeGreaterThan(0)
})

test('a line of the grid runs from bound to bound', () => {
  expect(lineAcross(bounds, { x: 5000, y: -900 }, { x: 0, y: 1 })).toEqual([
    { x: 5000, y: 0 },
    { x: 5000, y: 10_000 },
  ])
})

test('a line outside the bounds is not drawn', () => {
  expect(lineAcross(bounds, { x: 20_001, y: 0 }, { x: 0, y: 1 })).toBeNull()
  // y = x + 13,000 is above 10,000 wherever x is 0 or more.
  expect(lineAcross(bounds, { x: -2000, y: 11_000 }, { x: 1, y: 1 })).toBeNull()
})

test('paths are closed where they are areas', () => {
  const scale = planScale(bounds, fit)
  const corners = [
    { x: 0, y: 0 },
    { x: 20_000, y: 0 },
  ]
  expect(pathThrough(scale, corners, true)).toBe('M20.0 220.0L420.0 220.0Z')
  expect(pathThrough(scale, corners, false)).toBe('M20.0 220.0L420.0 220.0')
})
