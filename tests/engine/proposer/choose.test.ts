import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { cheapest, choices, type Choice, type Group } from '../../../packages/engine/src/proposer/choose'

const NONE: ReadonlySet<string> = new Set()

/** Every combination of options, one by one: the least mass for each number of marks. */
function everyChoice(groups: readonly Group[], free: ReadonlySet<string>): ReadonlyMap<number, number> {
  const least = new Map<number, number>()
  const go = (at: number, mass: number, keys: ReadonlySet<string>): void => {
    const group = groups[at]
    if (!group) {
      const marks = [...keys].filter((key) => !free.has(key)).length
      least.set(marks, Math.min(least.get(marks) ?? Infinity, mass))
      return
    }
    for (const option of group.options) {
      go(at + 1, mass + group.weight * option.mass, new Set([...keys, ...option.keys]))
    }
  }
  go(0, 0, NONE)
  return least
}

const key = fc.constantFrom('a', 'b', 'c', 'd', 'e', 'f')
const option = fc.record({
  mass: fc.integer({ min: 1, max: 30 }),
  keys: fc.uniqueArray(key, { minLength: 1, maxLength: 2 }),
})
const group = fc.record({
  weight: fc.integer({ min: 1, max: 5 }),
  options: fc.array(option, { minLength: 1, maxLength: 4 }),
})
const groups = fc.array(group, { minLength: 1, maxLength: 5 })

describe('Choice of marks over a pour', () => {
  test('two zones: one mark for both costs 1 kg more than two marks', () => {
    // Own bars: 10 + 4 = 14 kg with 2 marks. The first zone's bar in both: 10 + 5 = 15 kg with 1 mark.
    const { curve, isExact } = choices(
      [
        { weight: 1, options: [{ mass: 10, keys: ['long'] }] },
        {
          weight: 1,
          options: [
            { mass: 4, keys: ['short'] },
            { mass: 5, keys: ['long'] },
          ],
        },
      ],
      NONE,
    )
    expect(isExact).toBe(true)
    expect(curve.map(({ marks, mass }) => [marks, mass])).toEqual([
      [1, 15],
      [2, 14],
    ])
    // A mark is worth it up to 1 kg, and at 1 kg the fewer marks win.
    expect(cheapest(curve, 0.9)?.marks).toBe(2)
    expect(cheapest(curve, 1)?.marks).toBe(1)
  })

  test('a mark that the pour has anyway costs nothing more', () => {
    const two = [
      { mass: 4, keys: ['short'] },
      { mass: 5, keys: ['there'] },
    ]
    const { curve } = choices([{ weight: 2, options: two }], new Set(['there']))
    expect(curve.map(({ marks, mass }) => [marks, mass])).toEqual([
      [0, 10],
      [1, 8],
    ])
  })

  test('agrees with every combination, for every number of marks', () => {
    fc.assert(
      fc.property(groups, fc.uniqueArray(key, { maxLength: 2 }), (given, freeKeys) => {
        const free = new Set(freeKeys)
        const least = everyChoice(given, free)
        const { curve, isExact } = choices(given, free)
        expect(isExact).toBe(true)
        const most = Math.max(...least.keys())
        for (let marks = 0; marks <= most; marks++) {
          const every = Math.min(...[...least].filter(([of]) => of <= marks).map(([, mass]) => mass))
          const ours = Math.min(Infinity, ...curve.filter((one) => one.marks <= marks).map(({ mass }) => mass))
          expect(ours).toBe(every)
        }
        for (const point of curve) expect(asGiven(given, free, point)).toEqual({ marks: point.marks, mass: point.mass })
      }),
      { numRuns: 300 },
    )
  })
})

/** Marks and mass of a point, added up from its picks. */
function asGiven(given: readonly Group[], free: ReadonlySet<string>, { picks }: Choice) {
  const taken = given.map(({ weight, options }, at) => ({ weight, option: options[picks[at] ?? 0] }))
  const keys = new Set(taken.flatMap(({ option }) => option?.keys ?? []).filter((one) => !free.has(one)))
  return { marks: keys.size, mass: taken.reduce((sum, { weight, option }) => sum + weight * (option?.mass ?? 0), 0) }
}
