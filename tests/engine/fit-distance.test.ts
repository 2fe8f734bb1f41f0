import { describe, expect, test } from 'vitest'
import { convex, pieceToConvex } from '../../packages/engine/src/fit/convex'
import { segmentsApart } from '../../packages/engine/src/fit/distance'
import { roundedPath, type Vec } from '../../packages/engine/src/placed/centre-line'

const v = (x: number, y: number, z: number): Vec => ({ x, y, z })
const apart = (...[a, b, c, d]: readonly [Vec, Vec, Vec, Vec]) => segmentsApart(a, b, [c, d]).distance

describe('segments', () => {
  test('crossing 7 above one another', () => {
    expect(apart(v(0, 0, 0), v(10, 0, 0), v(5, -5, 7), v(5, 5, 7))).toBe(7)
  })
  test('along one another, side by side and end to end', () => {
    expect(apart(v(0, 0, 0), v(10, 0, 0), v(2, 3, 4), v(8, 3, 4))).toBe(5)
    expect(apart(v(0, 0, 0), v(10, 0, 0), v(14, 3, 0), v(20, 3, 0))).toBe(5)
  })
  test('askew beyond both ends: corner to corner', () => {
    // From (10, 0, 0) to (12, 3, 6): 2, 3, 6
    expect(apart(v(0, 0, 0), v(10, 0, 0), v(12, 3, 6), v(20, 9, 9))).toBe(7)
  })
  test('a point counts as a segment without length; swapping changes nothing', () => {
    expect(apart(v(3, 4, 0), v(3, 4, 0), v(0, 0, 0), v(10, 0, 0))).toBe(4)
    expect(apart(v(0, 0, 0), v(10, 0, 0), v(3, 4, 0), v(3, 4, 0))).toBe(4)
  })
})

describe('a body with flat sides, 100 x 60 x 20', () => {
  const end = (y: number) => [v(0, y, 0), v(100, y, 0), v(100, y, 20), v(0, y, 20)]
  const body = convex({ near: end(0), far: end(60) })
  const clear = (a: Vec, b: Vec, radius = 0) => pieceToConvex({ a, b, radius }, body)

  test('over a face, past a rib and past a corner', () => {
    expect(clear(v(50, 30, 27), v(50, 30, 90), 2)).toBeCloseTo(5, 9)
    // 3 beside and 4 above
    expect(clear(v(103, 10, 24), v(103, 50, 24))).toBeCloseTo(5, 9)
    expect(clear(v(102, 63, 26), v(150, 90, 60))).toBeCloseTo(7, 9)
  })
  test('through it: by as far as it would have to move', () => {
    // 8 below the top, 12 above the bottom
    expect(clear(v(-50, 30, 12), v(150, 30, 12), 5)).toBeCloseTo(-13, 9)
  })
})

test('a recess whose floor rises to nothing', () => {
  const side = (x: number) => [v(x, 0, 220), v(x, 0, 70), v(x, 1000, 220)]
  const body = convex({ near: side(-175), far: side(175) })
  // At 400 the floor stands 70 + 150 x 0.4 = 130; square to it: x cos(atan 0.15)
  const below = (130 - 120) * Math.cos(Math.atan(0.15))
  expect(pieceToConvex({ a: v(-500, 400, 120), b: v(500, 400, 120), radius: 6 }, body)).toBeCloseTo(below - 6, 6)
  expect(pieceToConvex({ a: v(-500, 400, 140), b: v(500, 400, 140), radius: 6 }, body)).toBeCloseTo(-below - 6, 6)
})

describe('bends', () => {
  const length = (path: readonly Vec[], isClosed = false) =>
    (isClosed ? [...path, ...path.slice(0, 1)] : path)
      .slice(1)
      .reduce(
        (sum, { x, y, z }, i) => sum + Math.hypot(x - (path[i]?.x ?? 0), y - (path[i]?.y ?? 0), z - (path[i]?.z ?? 0)),
        0,
      )

  test('a right angle of radius 25 takes 2 x 25 off its corner and puts a quarter circle in', () => {
    const path = roundedPath([v(0, 0, 0), v(500, 0, 0), v(500, 0, 300)], false, 25)
    // 800 - 50 + 25 pi / 2; in pieces of 9 degrees 0.1 % shorter
    expect(length(path)).toBeCloseTo(800 - 50 + (25 * Math.PI) / 2, 1)
  })
  test('a closed link has four', () => {
    const square = [v(0, 0, 0), v(290, 0, 0), v(290, 0, 130), v(0, 0, 130)]
    expect(length(roundedPath(square, true, 25), true)).toBeCloseTo(840 - 200 + 50 * Math.PI, 0)
  })
  test('sides too short for the radius take what they leave', () => {
    const path = roundedPath([v(0, 0, 0), v(20, 0, 0), v(20, 0, 300)], false, 25)
    // Half of 20 is left: radius 10
    expect(path[1]).toEqual(v(10, 0, 0))
  })
})
