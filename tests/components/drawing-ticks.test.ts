import { describe, expect, test } from 'vitest'
import { roundStep, ticksOf } from '@/components/drawing/ticks'

describe('round steps', () => {
  test.each([
    [0.2, 1],
    [1, 1],
    [1.01, 2],
    [2, 2],
    [2.01, 5],
    [5, 5],
    [5.01, 10],
    [999, 1000],
    [1000, 1000],
    [1001, 2000],
  ])('not below %d: %d', (least, step) => expect(roundStep(least)).toBe(step))
})

describe('ticks of a run', () => {
  // 0.06 px per mm and 64 px between ticks ask for 64 / 0.06 = 1067 mm: the next round step is 2000.
  const at = (mm: number) => 20 + mm * 0.06
  test('multiples of the step inside the run', () =>
    expect(ticksOf({ fromMm: 0, toMm: 5000, at }, 64)).toEqual([0, 2000, 4000]))
  test('a run that starts off the step, below nought', () =>
    expect(ticksOf({ fromMm: -1500, toMm: 4000, at }, 64)).toEqual([0, 2000, 4000]))
  test('a run drawn from right to left has the same ticks', () =>
    expect(ticksOf({ fromMm: 0, toMm: 5000, at: (mm) => 320 - mm * 0.06 }, 64)).toEqual([0, 2000, 4000]))
  test('no length on the drawing, no ticks', () => {
    expect(ticksOf({ fromMm: 0, toMm: 0, at }, 64)).toEqual([])
    expect(ticksOf({ fromMm: 0, toMm: 100, at: () => 20 }, 64)).toEqual([])
  })
  test('never more than 400, even where asked for one each px', () =>
    expect(ticksOf({ fromMm: 0, toMm: 100_000, at: (mm) => mm }, 0).length).toBeLessThanOrEqual(401))
})
