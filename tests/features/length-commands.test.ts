import { expect, test } from 'vitest'
import { joined, movedEnd, split } from '@/features/pour/length-commands'

const length = (id: string, [fromMm, toMm]: readonly [number, number], soffitMm = 0) => ({
  id,
  fromMm,
  toMm,
  kind: 'free' as const,
  topMm: 220,
  soffitMm,
  jackClearMm: null,
  access: '',
})
const two = [length('a', [0, 6000]), length('b', [6000, 18_000], -200)]
const ends = (lengths: readonly { id: string; fromMm: number; toMm: number }[] | null) =>
  lengths?.map(({ id, fromMm, toMm }) => [id, fromMm, toMm])

test('moving an end takes the neighbour along', () => {
  expect(ends(movedEnd(two, 'a', 7500))).toEqual([
    ['a', 0, 7500],
    ['b', 7500, 18_000],
  ])
})

test('an end stays between the ends of the two lengths', () => {
  expect(movedEnd(two, 'a', 0)).toBeNull()
  expect(movedEnd(two, 'a', 1)).not.toBeNull()
  expect(movedEnd(two, 'a', 17_999)).not.toBeNull()
  expect(movedEnd(two, 'a', 18_000)).toBeNull()
})

test('the last length ends where the edge does', () => {
  expect(movedEnd(two, 'b', 17_000)).toBeNull()
})

test('a split parts a length in its middle, and both keep what it was', () => {
  const three = split(two, 'b', 'c')
  expect(ends(three)).toEqual([
    ['a', 0, 6000],
    ['b', 6000, 12_000],
    ['c', 12_000, 18_000],
  ])
  expect(three.map(({ soffitMm }) => soffitMm)).toEqual([0, -200, -200])
})

test('a length too short for whole millimetres is not split', () => {
  expect(ends(split([length('a', [0, 1])], 'a', 'b'))).toEqual([['a', 0, 1]])
})

test('the neighbour takes the place of a length that goes', () => {
  expect(ends(joined(two, 'b'))).toEqual([['a', 0, 18_000]])
  expect(ends(joined(two, 'a'))).toEqual([['b', 0, 18_000]])
  expect(ends(joined([length('a', [0, 6000])], 'a'))).toEqual([['a', 0, 6000]])
})
