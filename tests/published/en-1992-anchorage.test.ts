import { basisOf } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { layout } from '../engine/sample-layout'

/**
 * EN 1992-1-1 8.4.2 to 8.4.4 and 8.7.3 with recommended values, gamma C 1.5, alpha ct 1.0, fyd 500 / 1.15 = 434.8 MPa.
 * Formulas from a digest; Table 8.2 (alpha 1, alpha 2) and alpha 6 from memory; numbers recomputed. Lengths mm.
 */
const basis = basisOf(layout().job)
const FYD = 500 / 1.15

const CASES = [
  { id: 'E01', diameter: 12, strength: 32, cd: 30, bond: 3.175, required: 410.8, length: 318.4, lap: 477.6 },
  { id: 'E02', diameter: 16, strength: 32, cd: 30, bond: 3.175, required: 547.8, length: 475.9, lap: 713.8 },
  {
    id: 'E03',
    diameter: 10,
    strength: 32,
    cd: 30,
    isGoodBond: false,
    bond: 2.223,
    required: 489.1,
    length: 342.3,
    lap: 513.5,
  },
  { id: 'E04', diameter: 12, strength: 25, cd: 25, bond: 2.693, required: 484.3, length: 405.6, lap: 608.4 },
  { id: 'E05', diameter: 12, strength: 32, cd: 40, isBent: true, bond: 3.175, required: 410.8, length: 273.2 },
  {
    id: 'E06',
    diameter: 20,
    strength: 40,
    cd: 40,
    share: 0.5,
    bond: 3.684,
    required: 590.1,
    length: 501.5,
    lap: 709.3,
  },
  { id: 'E07', diameter: 8, strength: 32, cd: 30, bond: 3.175, required: 273.9, length: 191.7, lap: 287.6 },
]

describe('EN 1992-1-1 8.4 and 8.7, anchorage and laps (digest; Table 8.2 from memory)', () => {
  test.each(CASES)('$id: $diameter mm in $strength MPa, cd $cd', (one) => {
    const { diameter, strength, cd, isGoodBond = true, isBent = false } = one
    const input = { diameter, strength, cd, isGoodBond, isBent, stress: FYD }
    const found = basis.anchorage(input)
    expect(found.bond).toBeCloseTo(one.bond, 2)
    expect(Math.abs(found.required - one.required)).toBeLessThan(0.5)
    expect(Math.abs(found.length - one.length)).toBeLessThan(0.5)
    if (one.lap !== undefined) expect(Math.abs(basis.lap(input, one.share ?? 1) - one.lap)).toBeLessThan(0.5)
  })

  test('the least length holds where little stress is asked for: max(0.3 lb,rqd, 10 d, 100)', () => {
    // 10 MPa in a 12 mm bar: lb,rqd = 3 * 10 / 3.175 = 9.4 mm; 10 d = 120 governs over 100.
    const input = { diameter: 12, strength: 32, cd: null, isGoodBond: true, isBent: false, stress: 10 }
    expect(basis.anchorage(input).length).toBe(120)
    expect(basis.anchorage({ ...input, diameter: 8 }).length).toBe(100)
  })

  test('without cd no credit is taken: the length is lb,rqd', () => {
    const found = basis.anchorage({
      diameter: 12,
      strength: 32,
      cd: null,
      isGoodBond: true,
      isBent: false,
      stress: FYD,
    })
    expect(found.length).toBe(found.required)
  })

  test('bond counts on no more than C60/75 (8.4.2(2), from memory)', () => {
    const input = { diameter: 12, cd: null, isGoodBond: true, isBent: false, stress: FYD }
    expect(basis.anchorage({ ...input, strength: 61 }).bond).toBe(basis.anchorage({ ...input, strength: 60 }).bond)
    expect(basis.anchorage({ ...input, strength: 59 }).bond).toBeLessThan(
      basis.anchorage({ ...input, strength: 60 }).bond,
    )
  })
})

describe('EN 1992-1-1 8.4.2(2), Fig. 8.2 (from memory): where level bars lie in good bond', () => {
  const isGood = (depth: number) => (fromSoffit: number | null) => basis.isGoodBond({ depth, fromSoffit })

  test('sections up to 250 deep: every bar', () => {
    expect([30, 220, 250, null].map(isGood(250))).toEqual([true, true, true, true])
    // One deeper: a bar whose height is not known may lie in the top millimetre.
    expect(isGood(251)(null)).toBe(false)
  })

  test('up to 600 deep: the lower 250', () => {
    for (const depth of [251, 400, 600]) expect([249, 250, 251].map(isGood(depth))).toEqual([true, true, false])
  })

  test('deeper: all but the top 300', () => {
    // 601 - 300 = 301; 1000 - 300 = 700
    expect([300, 301, 302].map(isGood(601))).toEqual([true, true, false])
    expect([699, 700, 701].map(isGood(1000))).toEqual([true, true, false])
    expect(isGood(1000)(null)).toBe(false)
  })
})

describe('EN 1992-1-1 8.2 and 8.7.3 (from memory): room between bars and laps', () => {
  test('clear gap: the bar, aggregate + 5, 20', () => {
    const gap = (diameter: number, aggregate: number) => basis.clearGap({ diameter, aggregate }).value
    expect([gap(12, 20), gap(25, 20), gap(26, 20), gap(12, 15), gap(12, 14), gap(12, 16)]).toEqual([
      25, 25, 26, 20, 20, 21,
    ])
  })

  test('laps count in one section within 0.65 of a lap length on both sides of it', () => {
    expect(basis.lapStagger).toBe(2 * 0.65)
  })
})
