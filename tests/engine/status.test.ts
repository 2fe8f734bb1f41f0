import { expect, test } from 'vitest'
import { statusOfDistance, statusOfRatio } from '../../packages/engine/src'

test.each([
  { spare: 0.01, status: 'within' },
  { spare: 0, status: 'within' },
  { spare: -0.01, status: 'over' },
  // 350 measured through a sine may come out a hair below: rounding is not a distance on site
  { spare: -1e-9, status: 'within' },
])('a distance with $spare to spare is $status, never near', ({ spare, status }) => {
  expect(statusOfDistance(spare)).toBe(status)
})

test.each([
  { clearance: 0.01, spare: -24.99, status: 'over' },
  { clearance: 0, spare: -25, status: 'stop' },
  { clearance: -5, spare: -30, status: 'stop' },
  { clearance: -5, spare: 3, status: 'stop' },
  { clearance: 25, spare: 0, status: 'within' },
])('a body $clearance clear is $status', ({ clearance, spare, status }) => {
  expect(statusOfDistance(spare, clearance)).toBe(status)
})

test.each([
  { demand: 94.9, status: 'within' },
  { demand: 95, status: 'near' },
  { demand: 100, status: 'near' },
  // Rounded to two decimals this would read 1.00
  { demand: 100.0001, status: 'over' },
  { demand: 0, status: 'within' },
])('$demand of 100, near from 0.95, is $status', ({ demand, status }) => {
  expect(statusOfRatio({ demand, limit: 100, nearFrom: 0.95 })).toBe(status)
})

test('a demand over a limit of nothing is over; no demand over nothing is within', () => {
  expect(statusOfRatio({ demand: 1, limit: 0, nearFrom: 0.95 })).toBe('over')
  expect(statusOfRatio({ demand: 0, limit: 0, nearFrom: 0.95 })).toBe('within')
})
