import { basisOf } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { layout } from '../engine/sample-layout'

const { job } = layout()
const basis = basisOf(job)
type Wedge = Parameters<(typeof basis.crackChoices)[number]['steel']>[0]
const choice = (readingId: string) => {
  const found = basis.crackChoices.find((one) => one.readingId === readingId)
  if (!found) throw new Error(readingId)
  return found
}

describe('EX21-L1: EN 1992-1-1 8.10.2.2 (from memory), transmission length', () => {
  test('15.2 mm strand at 1300 MPa in fck(t) 25: 980 mm, 784 and 1176', () => {
    // fctm = 0.3 * 25^(2/3) = 2.565; fctd = 0.7 * 2.565 / 1.5 = 1.197; fbpt = 3.2 * 1.197 = 3.830
    // lpt = 0.19 * 15.2 * 1300 / 3.830 = 980.2
    const found = basis.transmission({ diameter: 15.2, stress: 1300, strength: 25 })
    expect(found.length).toBeCloseTo(980.17, 1)
    expect(found.lower).toBeCloseTo(784.14, 1)
    expect(found.upper).toBeCloseTo(1176.21, 1)
  })
})

describe('Eq. 7.1 (read), Table 7.2N and Eq. 7.7N (from memory): crack steel in edge wedges', () => {
  const wedge: Wedge = {
    thickness: 220,
    cover: 30,
    diameter: 12,
    fck: 32,
    tensile: null,
    crackWidth: 0.3,
    compression: 0,
  }
  const area = (input: Partial<Wedge>, readingId = 'en-crack-minimum') =>
    choice(readingId).steel({ ...wedge, ...input })?.areaPerMetre ?? NaN

  test('220 thick, cover 30, 12 mm bars, 0.3 mm: 249 MPa in place of 280, about 2667 mm2/m', () => {
    // fctm = 0.3 * 32^(2/3) = 3.0238; phi = 12 / (3.0238 / 2.9 * 220 / (8 * 36)) = 15.07
    // between 280 (12) and 240 (16): 280 - 40 * 3.07 / 4 = 249.3; 3.0238 * 1000 * 220 / 249.3 = 2668
    const rule = choice('en-crack-minimum').steel(wedge)
    expect(rule?.steps.find(({ symbol }) => symbol === 'sigmaS')?.value).toBeCloseTo(249.3, 1)
    expect(Math.abs((rule?.areaPerMetre ?? 0) - 2668)).toBeLessThan(1)
    expect(rule?.spacingMax).toBeNull()
  })

  test('C04: at 280 MPa, that is 12 mm read in the table, 2376 mm2/m', () => {
    // A section for which Eq. 7.7N changes nothing: 8 (c + 6) = 220 * 3.0238 / 2.9 = 229.39, c = 22.674
    expect(Math.abs(area({ cover: (220 * 3.02381) / 2.9 / 8 - 6 }) - 2375.9)).toBeLessThan(1)
  })

  test('0.2 mm asks for more than 0.3, 0.3 for more than 0.4; between columns the narrower counts', () => {
    expect(area({ crackWidth: 0.2 })).toBeGreaterThan(area({ crackWidth: 0.3 }))
    expect(area({ crackWidth: 0.3 })).toBeGreaterThan(area({ crackWidth: 0.4 }))
    expect(area({ crackWidth: 0.29 })).toBeCloseTo(area({ crackWidth: 0.2 }), 6)
  })

  test('one step less: 0.3 gives what 0.2 gives; 0.2 asks for twice its own, 0.1 for half of a width of 0.1', () => {
    expect(area({}, 'en-crack-stronger')).toBeCloseTo(area({ crackWidth: 0.2 }), 6)
    expect(area({ crackWidth: 0.2 }, 'en-crack-stronger')).toBeCloseTo(2 * area({ crackWidth: 0.2 }), 6)
    expect(area({ crackWidth: 0.1 }, 'en-crack-stronger')).toBeCloseTo(4 * area({ crackWidth: 0.2 }), 6)
  })

  test('self-stress: k is 1.0 up to 300 thick, 0.825 at 550, 0.65 from 800', () => {
    const k = (thickness: number) =>
      choice('en-crack-minimum')
        .steel({ ...wedge, thickness })
        ?.steps.find(({ symbol }) => symbol === 'k')?.value
    expect(k(300)).toBe(1)
    expect(k(550)).toBeCloseTo(0.825, 9)
    expect(k(800)).toBe(0.65)
    expect(k(1200)).toBe(0.65)
  })

  test('the tensile strength of the job counts in place of the 28-day mean', () => {
    // 12 / (1.5 / 2.9 * 220 / 288) = 30.37: between 200 (25) and 160 (32): 200 - 40 * 5.37 / 7 = 169.3
    expect(area({ tensile: 1.5 })).toBeCloseTo(
      (1.5 * 220_000) / (200 - (40 * (12 / ((1.5 / 2.9) * (220 / 288)) - 25)) / 7),
      6,
    )
  })

  test('beyond the last row the stress goes on falling, never below it by a jump', () => {
    // 16 / (1 / 2.9 * 100 / (8 * 58)) = 215.3: 160 * 32 / 215.3 = 23.8 MPa; 1.0 * 100 000 / 23.8
    const asked = { thickness: 100, cover: 50, diameter: 16, tensile: 1 }
    expect(area(asked)).toBeCloseTo(100_000 / ((160 * 32) / (16 / ((1 / 2.9) * (100 / 464)))), 6)
  })

  test('compression that is counted does not lower it, and edge bars only ask for nothing', () => {
    expect(area({ compression: 1.2 })).toBe(area({}))
    expect(basis.crackChoices[0]?.steel(wedge)).toBeNull()
  })

  test('the stress never exceeds the yield strength', () => {
    // Thick section, small bars: the table alone would give its highest stress, 450.
    const soft = basisOf({ ...job, settings: { ...job.settings, fyk: 250 } })
    const steel = soft.crackChoices[1]?.steel({ ...wedge, thickness: 800, diameter: 8 })
    expect(steel?.steps.find(({ symbol }) => symbol === 'sigmaS')?.value).toBe(250)
  })
})

describe('EN 1992-2 J.104.2 (from memory): the face has steel for 0.03 of the factored force at least', () => {
  test('2500 kN at 250 MPa: 360 mm2, as a published sheet has it', () => {
    // 0.03 * 2 500 000 * 1.2 / 250 = 360
    const soft = basisOf({
      ...job,
      settings: { ...job.settings, fyk: 250 },
      factors: [{ name: 'gammaS', value: 1, reason: 'stress of the sheet' }],
    })
    const rule = soft.faceSteel({ T: 0, P: 2_500_000 })
    expect(rule.area).toBeCloseTo(360, 6)
    expect(rule.clause.section).toBe('J.104.2')
    expect(rule.stress).toBe(250)
  })

  test('a row asks for more: 0.088 P factored at 300 MPa', () => {
    // 1.2 * 0.088 * 588 800 / 300 = 207.3 mm2 against 0.03 * 588 800 * 1.2 / 434.8 = 48.8
    const rule = basis.faceSteel({ T: 0.088 * 588_800, P: 588_800 })
    expect(rule.area).toBeCloseTo((1.2 * 0.088 * 588_800) / 300, 6)
    expect(rule.stress).toBe(300)
  })
})

describe('Tie behind an anchor inside the slab: no clause gives a number (shares from memory and digests)', () => {
  test('a quarter of 588.8 kN at 0.6 of 500 MPa: 147.2 kN, 491 mm2', () => {
    const rule = basis.tieBack.rule({ P: 588_800, own: null })
    expect(rule.steps[0]?.value).toBeCloseTo(147_200, 6)
    expect(rule.area).toBeCloseTo(490.67, 2)
    expect(rule.stress).toBe(300)
  })

  test('the engineer’s own force takes its place', () => {
    expect(basis.tieBack.rule({ P: 588_800, own: 180_000 }).area).toBeCloseTo(600, 6)
  })

  test('beside it, for information: 0.35 of 1.2 P is 247.3 kN, 0.20 of it 141.3 kN', () => {
    const forces = basis.tieBack.beside(588_800).map(({ force }) => Math.round(force / 100) / 10)
    expect(forces).toEqual([141.3, 247.3])
  })
})

describe('Readings', () => {
  test('every reading that a result rests on is offered by the basis', () => {
    const offered = basis.readings.map(({ id }) => id)
    const { tieBack, deadEndReading, jointReading, planRow } = basis
    const named = [
      ...basis.crackChoices.map(({ readingId }) => readingId),
      tieBack.readingId,
      tieBack.ownReadingId,
      deadEndReading,
      jointReading,
      basis.ownPrismReading.id,
      ...[basis.steelReading, basis.windowReading, planRow.equalReadingId].filter((id) => id !== null),
    ]
    for (const id of named) expect(offered, id).toContain(id)
    expect(new Set(offered).size).toBe(offered.length)
  })
})
