import { basisOf, checkPour, type Advice, type Anchor, type Layout } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { anchor, deadEnd, layout } from '../engine/sample-layout'

/**
 * Worked by hand, W26 to W34: edge wedges by geometry (derived) at arctan(2/3) (EN 1992-1-1 8.10.3(5), from memory) and
 * 45 degrees (common practice); crack steel of EN 1992-1-1 7.3 (tables and Eq. 7.7N from memory) and AS 3600 9.5.3
 * (secondary).
 */

function wedge(anchors: readonly Anchor[], zoneId: string): Advice {
  const given: Layout = layout({ anchors })
  const zone = checkPour(given, { pourId: 'P1' }).zones.find((one) => one.zone.id === zoneId)
  const advice = zone?.checks.find(({ name }) => name === 'Depth of the edge wedge')
  if (advice?.kind !== 'advice') throw new Error(`No wedge at ${zoneId}`)
  return advice
}

describe('Two plates of 220, 2000 apart, one set back 110 and the other 60', () => {
  const advice = wedge(
    [anchor('E2', 1, { chainage: 6000, setBack: 110 }), anchor('E2', 2, { chainage: 8000, setBack: 60 })],
    'gap:E2:E2-1:E2-2',
  )

  test('W26: at arctan(2/3) 1420 deep, 1.358 m2', () => {
    /*
     * 2000 - 220 = 1780 between the plates. From the first 110 + 1.5 x, from the second 60 + 1.5 (1780 - x): they meet at
     * 3 x = 60 + 2670 - 110, x = 873.33; 110 + 1310 = 1420 deep.
     * In front of the half plates 110 x 110 = 12 100 and 110 x 60 = 6600.
     * 110 x 873.33 + 0.75 x 873.33^2 = 96 067 + 572 033 = 668 100; 60 x 906.67 + 0.75 x 906.67^2 = 54 400 + 616 533 = 670 933.
     * 12 100 + 6600 + 668 100 + 670 933 = 1 357 733 mm2.
     */
    expect(advice.measured).toBeCloseTo(1420, 6)
    expect(advice.usual).toContain('1420 deep, 1.358 m2 at 33.7 degrees')
  })

  test('W27: at 45 degrees 975 deep, 0.961 m2', () => {
    // 110 + x = 60 + 1780 - x: x = 865, 975 deep. 110 x 865 + 865^2 / 2 = 95 150 + 374 112.5 = 469 262.5;
    // 60 x 915 + 915^2 / 2 = 54 900 + 418 612.5 = 473 512.5; with 12 100 + 6600: 961 475 mm2.
    expect(advice.usual).toContain('975 deep, 0.961 m2 at 45 degrees')
  })
})

test('W28: 1800 from the end of the edge, plate 220 set back 110: 2645 deep there, 2.340 m2', () => {
  // At the end 110 + 1.5 x (1800 - 110) = 2645. 110 x 110 + 110 x 1690 + 0.75 x 1690^2 = 12 100 + 185 900 + 2 142 075.
  const advice = wedge([anchor('E2', 1, { chainage: 1800, setBack: 110 })], 'gap:E2:start:E2-1')
  expect(advice.measured).toBeCloseTo(2645, 6)
  expect(advice.usual).toContain('2645 deep, 2.340 m2 at 33.7 degrees')
})

test('W29: bonded dead ends, splay 300, bulbs 300 behind the edge, 1750 apart: 2616 deep from lpt2 = 1228, 3.462 m2', () => {
  /*
   * From the end of the transmission length: 300 + 1228 = 1528; (1750 - 300) / 2 = 725; 1528 + 1.5 x 725 = 2615.5.
   * 2 x (1528 x 150 + 1528 x 725 + 0.75 x 725^2) = 2 x (229 200 + 1 107 800 + 394 218.75) = 3 462 438 mm2.
   * From the bulbs alone it would be 300 + 1087.5 = 1387.5.
   */
  const anchors = [deadEnd('E2', 1, { chainage: 6000 }), deadEnd('E2', 2, { chainage: 7750 })]
  const advice = wedge(anchors, 'gap:E2:E2-1:E2-2')
  expect(advice.measured).toBeCloseTo(2615.5, 6)
  expect(advice.usual).toContain('3.462 m2 at 33.7 degrees')
})

describe('Crack steel of edge wedges', () => {
  const { job } = layout()
  const wedgeIn = { thickness: 250, cover: 30, diameter: 12, fck: 30, tensile: null, crackWidth: 0.3, compression: 0 }
  const steel = (basis: string, readingId: string, input: Partial<typeof wedgeIn>): number | undefined =>
    basisOf({ ...job, basis })
      .crackChoices.find((one) => one.readingId === readingId)
      ?.steel({ ...wedgeIn, ...input })?.areaPerMetre

  test('W30: EN, 300 thick, cover 35, 16 mm, fck 40, 0.3 mm: 248.4 MPa, 4238 mm2/m', () => {
    // fctm = 0.3 x 40^(2/3) = 3.5088. Eq. 7.7N backwards: 16 x (2.9 / 3.5088) x 8 x (35 + 8) / 300
    //   = 16 x 0.82649 x 1.14667 = 15.163. Table 7.2N at 0.3 mm: 12 -> 280, 16 -> 240: 280 - 40 x 3.163 / 4 = 248.37 MPa.
    // k = 1.0 up to 300: 3.5088 x 1000 x 300 / 248.37 = 4238 mm2/m.
    const area = steel('en-1992', 'en-crack-minimum', { thickness: 300, cover: 35, diameter: 16, fck: 40 })
    expect(Math.abs((area ?? 0) - 4238.3)).toBeLessThan(0.2)
  })

  test('W31: EN, 250 thick, cover 30, 12 mm, fck 30, 0.2 mm: 221.6 MPa, 3268 mm2/m', () => {
    // fctm = 2.8965; 12 x (2.9 / 2.8965) x 8 x 36 / 250 = 13.841. At 0.2 mm: 12 -> 240, 16 -> 200: 240 - 18.41 = 221.59.
    // 2.8965 x 1000 x 250 / 221.59 = 3267.8 mm2/m.
    const area = steel('en-1992', 'en-crack-minimum', { crackWidth: 0.2 })
    expect(Math.abs((area ?? 0) - 3267.8)).toBeLessThan(0.2)
  })

  test('W32: AS, strong, 600 thick with 0.5 MPa counted: the outer 250 of each face, 2375 mm2/m', () => {
    // (6.0 - 2.5 x 0.5) x 500 = 4.75 x 500 = 2375.
    expect(steel('as-3600', 'as-crack-strong', { thickness: 600, compression: 0.5 })).toBeCloseTo(2375, 6)
  })

  test('W33: AS, moderate, 500 thick is the last that counts whole: 1750 mm2/m, and 501 gives no more', () => {
    // 3.5 x 500 = 1750.
    expect(steel('as-3600', 'as-crack-moderate', { thickness: 500 })).toBeCloseTo(1750, 6)
    expect(steel('as-3600', 'as-crack-moderate', { thickness: 501 })).toBeCloseTo(1750, 6)
  })

  test('W34: AS, minor, 180 thick with 0.3 MPa counted: (1.75 - 0.75) x 180 = 180 mm2/m', () => {
    expect(steel('as-3600', 'as-crack-minor', { thickness: 180, compression: 0.3 })).toBeCloseTo(180, 6)
  })
})
