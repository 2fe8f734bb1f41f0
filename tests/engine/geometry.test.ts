import { describe, expect, test } from 'vitest'
import {
  alongAzimuth,
  azimuthOf,
  distanceToSegment,
  isInside,
  selfCrossing,
  signedArea,
} from '../../packages/engine/src'

const at = (x: number, y: number) => ({ x, y })
const SQUARE = [at(0, 0), at(10, 0), at(10, 10), at(0, 10)]
/** An L: the north-east quarter is missing. */
const ELL = [at(0, 0), at(10, 0), at(10, 5), at(5, 5), at(5, 10), at(0, 10)]

describe('azimuths turn clockwise from north', () => {
  test.each([
    { degrees: 0, x: 0, y: 1 },
    { degrees: 90, x: 1, y: 0 },
    { degrees: 180, x: 0, y: -1 },
    { degrees: 270, x: -1, y: 0 },
    { degrees: -90, x: -1, y: 0 },
    { degrees: 450, x: 1, y: 0 },
  ])('$degrees deg is exact', ({ degrees, x, y }) => {
    expect(alongAzimuth((degrees * Math.PI) / 180)).toEqual({ x, y })
  })

  test('30 deg points half as far east as its length, and reads back', () => {
    const vector = alongAzimuth(Math.PI / 6)
    expect(vector.x).toBeCloseTo(0.5, 12)
    expect(azimuthOf(vector)).toBeCloseTo(Math.PI / 6, 12)
    expect(azimuthOf(at(-1, 0))).toBeCloseTo(1.5 * Math.PI, 12)
  })
})

test('area is positive counter-clockwise and negative clockwise', () => {
  // L of two rectangles: 10 * 5 + 5 * 5 = 75
  expect(signedArea(ELL)).toBe(75)
  expect(signedArea([...ELL].reverse())).toBe(-75)
})

test('distance to a segment is square to it inside its length and to its nearer end outside', () => {
  expect(distanceToSegment(at(5, 3), at(0, 0), at(10, 0))).toBe(3)
  // 3-4-5 from the end (10, 0)
  expect(distanceToSegment(at(13, 4), at(0, 0), at(10, 0))).toBe(5)
  expect(distanceToSegment(at(3, 4), at(0, 0), at(0, 0))).toBe(5)
})

describe('inside an outline with a re-entrant corner', () => {
  test.each([
    { point: at(2, 8), inside: true },
    { point: at(8, 2), inside: true },
    { point: at(8, 8), inside: false },
    { point: at(5, 7), inside: true },
    { point: at(5.01, 7), inside: false },
    { point: at(4.99, 7), inside: true },
    { point: at(-0.01, 5), inside: false },
  ])('$point', ({ point, inside }) => {
    expect(isInside(point, ELL)).toBe(inside)
  })
})

describe('an outline that crosses itself', () => {
  test('square and L do not', () => {
    expect(selfCrossing(SQUARE)).toBeNull()
    expect(selfCrossing(ELL)).toBeNull()
  })

  test('a bow tie does, at its first and third side', () => {
    expect(selfCrossing([at(0, 0), at(10, 0), at(0, 10), at(10, 10)])).toEqual({ first: 1, second: 3 })
  })

  test('a corner that touches another side counts', () => {
    expect(selfCrossing([at(0, 0), at(10, 0), at(10, 10), at(5, 0), at(0, 10)])).toEqual({ first: 0, second: 2 })
  })

  test('a side that runs back over the one before counts', () => {
    expect(selfCrossing([at(0, 0), at(10, 0), at(5, 0), at(5, 5)])).toEqual({ first: 0, second: 1 })
  })
})
