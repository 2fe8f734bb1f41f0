import { basisOf, closeAnchors, layoutIndex } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { anchor, edge, layout, length, WEST } from '../engine/sample-layout'

/** Check values that no other file holds, by their ids; where each comes from stands in its name. */

const { job } = layout()
const en = basisOf(job)
const as = basisOf({ ...job, basis: 'as-3600' })

test('C05: EN 1992-1-1 7.3.2(2) (read) with bars at their yield stress of 500 MPa: 1330.5 mm2/m in 220 of fck 32', () => {
  // Eq. 7.1: 1.0 x 1.0 x fctm x h / sigma = 0.3 x 32^(2/3) x 1000 x 220 / 500 = 3.0238 x 440 = 1330.5.
  // The table by crack width never lets a bar go so far: its least steel stands well above.
  const yielding = (0.3 * 32 ** (2 / 3) * 1000 * 220) / 500
  expect(Math.abs(yielding - 1330.5)).toBeLessThan(1)
  const wedge = { thickness: 220, cover: 30, diameter: 12, fck: 32, tensile: null, crackWidth: 0.3, compression: 0 }
  const rule = en.crackChoices.find(({ readingId }) => readingId === 'en-crack-minimum')?.steel(wedge)
  const sigma = rule?.steps.find(({ symbol }) => symbol === 'sigmaS')?.value ?? NaN
  expect(((rule?.areaPerMetre ?? NaN) * sigma) / 500).toBeCloseTo(yielding, 6)
})

describe('AS 3600 12.5.3 (read): closer than 0.3 D two anchors act as one', () => {
  // Pairs one above the other: 0.3 x 220 = 66 and 0.3 x 1000 = 300.
  const PAIR_APART_IN_HEIGHT = [
    { id: 'Z08', apart: 60, depth: 220, asOne: true },
    { id: 'Z08 above', apart: 66, depth: 220, asOne: false },
    { id: 'EX15-L1 below', apart: 299, depth: 1000, asOne: true },
    { id: 'EX15-L1', apart: 300, depth: 1000, asOne: false },
    { id: 'EX15-L1 as it stands', apart: 700, depth: 1000, asOne: false },
  ] as const

  const isOne = (apart: number, depth: number): boolean => {
    const anchors = [0, apart].map((above, at) => anchor('E1', at + 1, { chainage: 3000, height: 80 + above }))
    const edges = [edge(WEST, 'd', [length(0, 17_400, { top: depth, soffit: 0 })])]
    const index = layoutIndex(layout({ anchors, edges, pour: { thickness: depth } }))
    return closeAnchors(index, 'E1').some(({ plane }) => plane === 'thickness')
  }

  test.each(PAIR_APART_IN_HEIGHT)('$id: $apart apart in $depth: $asOne', ({ apart, depth, asOne }) => {
    expect(isOne(apart, depth)).toBe(asOne)
  })
})

test('K03: AS 3600 13.1.2.7 (secondary), N16 hook of 180 degrees round a pin of 5 db: 220.8 mm of bar', () => {
  // pi / 2 x (5 x 16 + 16) = 150.8 along the centre line, and max(4 x 16, 70) = 70 straight past it.
  expect((Math.PI / 2) * 6 * 16 + as.linkHook(16).length).toBeCloseTo(220.8, 1)
})

test('Z07 and EX22-L1: tie-back rules of other codes stand beside the reading (read): 0.35 and 0.20 of the factored force', () => {
  // Z07: 0.35 x 706.56 = 247.3 kN, that is 1.2 x 588.8. EX22-L1: 0.20 x 1000 = 200 kN, factored, from 1000 / 1.2 jacked.
  const forces = (P: number) => en.tieBack.beside(P).map(({ force }) => force)
  expect(forces(588_800).some((force) => Math.abs(force - 247_300) < 100)).toBe(true)
  expect(forces(1_000_000 / 1.2).some((force) => Math.abs(force - 200_000) < 1)).toBe(true)
})
