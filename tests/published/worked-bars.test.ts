import { basisOf, type Basis } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { panCheck, withPan } from '../engine/pan-layout'
import { layout, POUR } from '../engine/sample-layout'

/**
 * Worked by hand, W35 to W44: anchorage and laps of EN 1992-1-1 8.4, 8.7 (digest; Table 8.2 and 8.3 from memory) and AS
 * 3600 13.1, 13.2 (secondary); transmission of EN 8.10.2.2 (from memory); pans.
 */

const { job } = layout()
const en = basisOf(job)
const as = basisOf({ ...job, basis: 'as-3600' })
const FULL = 500 / 1.15

type Input = Parameters<Basis['anchorage']>[0]

describe('EN 1992-1-1: H16 in C25/30, cd 25, poor bond', () => {
  /*
   * fctk,0.05 = 0.7 x 0.3 x 25^(2/3) = 1.7955; fctd = 1.7955 / 1.5 = 1.1970; fbd = 2.25 x 0.7 x 1.1970 = 1.8852 MPa.
   * lb,rqd = 16 / 4 x 434.78 / 1.8852 = 922.5; alpha2 = 1 - 0.15 x (25 - 16) / 16 = 0.91563; lbd = 844.7.
   */
  const bar: Input = { diameter: 16, strength: 25, stress: FULL, cd: 25, isGoodBond: false, isBent: false }

  test('W35: anchored 844.7', () => {
    expect(en.anchorage(bar).length).toBeCloseTo(844.66, 1)
  })

  test.each([
    // alpha6 = sqrt(share / 25 %), 1.0 to 1.5: 1.0, 1.14891, 1.41421, 2.0 cut to 1.5.
    { id: 'W36', share: 0.25, lap: 844.66 },
    { id: 'W37', share: 0.33, lap: 970.44 },
    { id: 'W38', share: 0.5, lap: 1194.53 },
    { id: 'W39', share: 1, lap: 1266.99 },
  ])('$id: $share of the bars lapped at one section: $lap', ({ share, lap }) => {
    expect(en.lap(bar, share)).toBeCloseTo(lap, 1)
  })
})

test('W40: EN: bent H16 in C40/50, cd 60, good bond: 293.3', () => {
  // fctd = 0.7 x 0.3 x 40^(2/3) / 1.5 = 1.6374; fbd = 3.6843; lb,rqd = 4 x 434.78 / 3.6843 = 472.0.
  // cd 60 > 3 x 16: alpha1 = 0.7; alpha2 = 1 - 0.15 x (60 - 48) / 16 = 0.8875; 0.62125 x 472.04 = 293.26.
  const bent: Input = { diameter: 16, strength: 40, stress: FULL, cd: 60, isGoodBond: true, isBent: true }
  expect(en.anchorage(bent).length).toBeCloseTo(293.26, 1)
  // With cd 48 the bend gives nothing: alpha1 = 1, alpha2 = 1 - 0.15 x (48 - 48) / 16 = 1: 472.04.
  expect(en.anchorage({ ...bent, cd: 48 }).length).toBeCloseTo(472.04, 1)
})

test('W41: AS: N20 in 32 MPa, cd 40, 300 of concrete below it: 872.0, lap 1090.1', () => {
  // k1 1.3; k2 = (132 - 20) / 100 = 1.12; k3 = 1 - 0.15 x (40 - 20) / 20 = 0.85.
  // 0.5 x 1.3 x 0.85 x 500 x 20 / (1.12 x sqrt(32)) = 5525 / 6.33568 = 872.05; floor 0.058 x 500 x 1.3 x 20 = 754.
  // Lap 1.25 x 872.05 = 1090.06.
  const bar: Input = { diameter: 20, strength: 32, stress: 500, cd: 40, isGoodBond: false, isBent: false }
  expect(as.anchorage(bar).length).toBeCloseTo(872.05, 1)
  expect(as.lap(bar, 1)).toBeCloseTo(1090.06, 1)
})

test('W42: EN: 12.7 mm strand at 1200 MPa in fck(t) 30: 669 mm, 536 and 803', () => {
  // fctm = 2.8965; fctd = 0.7 x 2.8965 / 1.5 = 1.35169; fbpt = 3.2 x 1.35169 = 4.32539.
  // lpt = 0.19 x 12.7 x 1200 / 4.32539 = 669.44; x 0.8 = 535.55; x 1.2 = 803.33.
  const { lower, length, upper } = en.transmission({ diameter: 12.7, stress: 1200, strength: 30 })
  expect(length).toBeCloseTo(669.44, 1)
  expect(lower).toBeCloseTo(535.55, 1)
  expect(upper).toBeCloseTo(803.33, 1)
})

describe('A pan of 1000 by 350 in a slab with 12 at 200 both ways at the top', () => {
  const mats = [
    { id: 'tx', azimuth: Math.PI / 2, isOuter: false },
    { id: 'ty', azimuth: 0, isOuter: true },
  ].map((mat) => ({ ...mat, face: 'top' as const, diameter: 12, spacing: 200, spareShare: 0, spareBy: null }))
  const given = withPan({ parts: { pour: { mats: mats } } })

  test('W43: bars cut or within 30 of cover, in the worst place: 3 along the pan, 339 mm2, and 6 across it, 679 mm2', () => {
    // Along: 350 / 200 = 1.75, floor + 1 = 2 cut; with cover 350 + 60 = 410: 2.05, 3 counted; 3 x 113.10 = 339.3.
    // Across: 1000 + 60 = 1060: 5.3, floor + 1 = 6; 6 x 113.10 = 678.6.
    expect(POUR.coverTop).toBe(30)
    const along = panCheck(given, 'Bars cut, along the pan, top', 'compared')
    expect(along.demand).toBeCloseTo(339.29, 1)
    expect(along.steps.filter(({ symbol }) => /^Ncut/.test(symbol)).map(({ value }) => value)).toEqual([2])
    expect(panCheck(given, 'Bars cut, across the pan, top', 'compared').demand).toBeCloseTo(678.58, 1)
  })

  test('W44: tie behind it, both bases: a quarter of 800 kN at 0.6 of 500 MPa, 666.7 mm2', () => {
    // 0.25 x 800 000 / 300 = 666.67 mm2 (reading); 0.35 x 1.2 x 800 = 336 kN and 0.20 x 1.2 x 800 = 192 kN beside it.
    for (const basis of [en, as]) {
      expect(basis.tieBack.rule({ P: 800_000, own: null }).area).toBeCloseTo(666.67, 2)
    }
    expect(
      en.tieBack
        .beside(800_000)
        .map(({ force }) => Math.round(force / 1000))
        .sort(),
    ).toEqual([192, 336])
  })
})
