import { basisOf, type Job } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { layout } from '../engine/sample-layout'

const { job } = layout()
const basis = basisOf(job)
const accepting = (readingId: string): Job => ({
  ...job,
  readings: [{ readingId, acceptedBy: 'A. Engineer', acceptedAtMs: 1, reason: 'test' }],
})

describe('EX17-L1: EN 1992-1-1 Eq. 6.58 (digest), 8.10.3(4) and 2.4.2.2(3) (from memory)', () => {
  // F = 1.2 * 800 = 960 kN
  test('thickness: plate 75 in a 200 slab', () => {
    const { steps, area, stress } = basis.tie({ P: 800_000, a: 75, b: 200 })
    const value = (symbol: string) => steps.find((line) => line.symbol === symbol)?.value
    expect(value('F')).toBeCloseTo(960_000, 6)
    // T = 0.25 * 960 * (200 - 75) / 200 = 150 kN; As = 150 000 / 300 = 500 mm2
    expect(value('T')).toBeCloseTo(150_000, 6)
    expect(area).toBeCloseTo(500, 6)
    expect(stress).toBe(300)
  })

  test('plan: plate 220 at spacing 1000', () => {
    // T = 0.25 * 960 * (1000 - 220) / 1000 = 187.2 kN; As = 187 200 / 300 = 624 mm2
    expect(basis.tie({ P: 800_000, a: 220, b: 1000 }).area).toBeCloseTo(624, 6)
  })

  test('spread at arctan(2/3): 93.75 mm in the thickness, 585 mm in plan', () => {
    const depth = (a: number, b: number) => (b - a) / (2 * Math.tan(basis.spread.value))
    expect(depth(75, 200)).toBeCloseTo(93.75, 6)
    expect(depth(220, 1000)).toBeCloseTo(585, 6)
  })

  test('the alternative reading asks for the larger of T / fyd and (T / 1.2) / 300', () => {
    // 150 000 / 434.78 = 345.0; 150 000 / 1.2 / 300 = 416.7 mm2, 0.83 of 500
    const other = basisOf(accepting('en-steel-alt')).tie({ P: 800_000, a: 75, b: 200 })
    expect(other.area).toBeCloseTo(150_000 / 1.2 / 300, 6)
  })

  test('with a low yield strength the first part of the alternative governs', () => {
    // fyd = 250 / 1.15 = 217.4 MPa: 150 000 / 217.4 = 690 mm2
    const soft = { ...accepting('en-steel-alt'), settings: { ...job.settings, fyk: 250 } }
    expect(basisOf(soft).tie({ P: 800_000, a: 75, b: 200 }).area).toBeCloseTo(690, 6)
  })
})

describe('EX19-L1, first half: EN 1992-1-1 5.10.2.1 and 5.10.3 (from memory)', () => {
  // One strand of 150 mm2: Fpk = 1860 * 150 = 279 kN, Fp0.1k = 1640 * 150 = 246 kN
  const strand = {
    id: 's',
    name: '15.7',
    diameter: 15.7,
    area: 150,
    breakingLoad: 279_000,
    proofLoad: 246_000,
    modulus: 195_000,
  }

  test('jacking: min(0.8 fpk, 0.9 fp0.1k) = 1476 MPa, 885.6 kN in four strands', () => {
    const force = basis.jackingLimit(strand, 4).at(-1)?.value ?? 0
    expect(force).toBeCloseTo(885_600, 6)
    expect(force / (4 * 150)).toBeCloseTo(1476, 6)
  })

  test('after lock-off: min(0.75 fpk, 0.85 fp0.1k) = min(1395, 1394) MPa', () => {
    expect(basis.lockOffLimit?.(strand, 1).at(-1)?.value).toBeCloseTo(0.85 * 246_000, 6)
  })

  test('with a high proof load the breaking load governs', () => {
    expect(basis.jackingLimit({ ...strand, proofLoad: 270_000 }, 1).at(-1)?.value).toBeCloseTo(0.8 * 279_000, 6)
  })
})

describe('Factors of EN 1992-1-1 that a job sets', () => {
  test('the value and its reason stand in the place of the recommended one', () => {
    const set = basisOf({ ...job, factors: [{ name: 'gammaP', value: 1.3, reason: 'National annex' }] })
    expect(set.factors.find(({ name }) => name === 'gammaP')).toMatchObject({ value: 1.3, reason: 'National annex' })
    // As = 0.25 * 1.3 * 800 000 * (200 - 75) / 200 / 300
    expect(set.tie({ P: 800_000, a: 75, b: 200 }).area).toBeCloseTo((0.25 * 1.3 * 800_000 * 125) / 200 / 300, 6)
  })

  test('every factor has a recommended value inside its own range', () => {
    for (const { recommended, least, most, name } of basis.factors) {
      expect(recommended, name).toBeGreaterThanOrEqual(least)
      expect(recommended, name).toBeLessThanOrEqual(most)
    }
  })
})
