import { expect, test } from 'vitest'
import { outlineProblem, readCorners, rectangle } from '@/features/pour/outline-input'

const corners = (...pairs: [number | null, number | null][]) => pairs.map(([xMm, yMm]) => ({ xMm, yMm }))

test('a rectangle runs counter-clockwise from its south-west corner', () => {
  expect(rectangle({ along: 18_000, across: 9000 }, { xMm: 500, yMm: -200 })).toEqual(
    corners([500, -200], [18_500, -200], [18_500, 8800], [500, 8800]),
  )
})

test('a sound outline has no problem, whichever way it runs', () => {
  expect(outlineProblem(corners([0, 0], [10, 0], [10, 10], [0, 10]))).toBeNull()
  expect(outlineProblem(corners([0, 0], [0, 10], [10, 10], [10, 0]))).toBeNull()
})

test('two corners are one too few, three are enough', () => {
  expect(outlineProblem(corners([0, 0], [10, 0]))).toContain('has 2 corners. It needs three')
  expect(outlineProblem(corners([0, 0], [10, 0], [10, 10]))).toBeNull()
})

test('empty rows count for nothing, a half-typed one is named', () => {
  expect(outlineProblem(corners([0, 0], [10, 0], [10, 10], [null, null]))).toBeNull()
  expect(outlineProblem(corners([0, 0], [10, null], [10, 10]))).toContain('Corner 2 has one figure of two')
})

test('an outline like an hour-glass crosses itself, and the sides are named', () => {
  // From (0,0) to (10,10) and from (10,0) to (0,10): both pass through (5,5).
  expect(outlineProblem(corners([0, 0], [10, 10], [10, 0], [0, 10]))).toContain(
    'the side from corner 1 meets the side from corner 3',
  )
})

test('a first corner repeated at the end is said to be needless', () => {
  expect(outlineProblem(corners([0, 0], [10, 0], [10, 10], [0, 0]))).toContain('Corners 4 and 1 stand at one place')
})

test('corners on one line enclose nothing', () => {
  expect(outlineProblem(corners([0, 0], [10, 0], [20, 0]))).toContain('on one line')
})

test('a block of a spreadsheet is read, with heads or without', () => {
  const expected = corners([0, 0], [18_000, 0], [18_000, 9000])
  expect(readCorners('x\ty\r\n0\t0\r\n18000\t0\r\n18000\t9000\r\n').corners).toEqual(expected)
  expect(readCorners('0; 0\n18000; 0\n18000; 9000').corners).toEqual(expected)
  expect(readCorners('0 0\n18000 0\n18000 9000').corners).toEqual(expected)
})

test('a line that is no corner is named and nothing is taken', () => {
  const read = readCorners('0\t0\nabc\t5')
  expect(read.corners).toEqual([])
  expect(read.problem).toContain('Line 2, "abc\t5", is not an x and a y')
})

test('nothing but words has no corners', () => {
  expect(readCorners('x y').problem).toContain('no figures')
})
