import { basisOf, layoutIndex, panNeeds, type Layout, type PlacedBarsShape } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { accepting } from './anchor-checks'
import { mirrored, panCheck, panChecks, withPan } from './pan-layout'
import { anchor, POUR } from './sample-layout'

const area = (diameter: number) => (Math.PI * diameter ** 2) / 4

const MATS = [
  { id: 'tx', face: 'top', azimuth: Math.PI / 2, diameter: 12, spacing: 200, isOuter: false },
  { id: 'ty', face: 'top', azimuth: 0, diameter: 12, spacing: 200, isOuter: true },
  { id: 'bx', face: 'bottom', azimuth: Math.PI / 2, diameter: 10, spacing: 200, isOuter: false },
  { id: 'by', face: 'bottom', azimuth: 0, diameter: 10, spacing: 200, isOuter: true },
] as const
const parts = { pour: { mats: MATS.map((mat) => ({ ...mat, spareShare: 0, spareBy: null })) } }

const TIE: PlacedBarsShape = {
  kind: 'tie-back-bars',
  diameter: 16,
  length: 1000,
  count: 2,
  layers: 'both',
  runs: 'along',
  // Beside the recess: 350 / 2 + 30 cover + 8 = 213 from the tendon.
  pitch: 426,
}
const tieOf = (of: Layout) => panCheck(of, 'Tie behind the anchor', 'compared')

describe('Tie behind the anchor', () => {
  test('a quarter of 588.8 kN at 300 MPa: 490.7 mm2 (reading)', () => {
    const check = tieOf(withPan())
    expect(check.demand).toBeCloseTo((0.25 * 588_800) / 300, 6)
    expect(check).toMatchObject({
      status: 'needs-judgement',
      statusOnceAccepted: 'over',
      utilisation: null,
      stage: 'Full',
    })
  })

  test('the engineer’s own 200 kN at 300 MPa: 666.7 mm2, by a reading of its own, with its reason', () => {
    const own = withPan({ pan: { tieBackForce: 200_000, tieBackReason: 'Strut-and-tie, sheet 4' } })
    const check = tieOf(own)
    expect(check.demand).toBeCloseTo(200_000 / 300, 6)
    expect(check.readingIds).not.toEqual(tieOf(withPan()).readingIds)
    expect(check.notes.join(' ')).toContain('sheet 4')
  })

  test('once the reading is accepted its status counts', () => {
    const [readingId = ''] = tieOf(withPan()).readingIds
    expect(tieOf(accepting(withPan(), readingId)).status).toBe('over')
    expect(tieOf(accepting(withPan({ bars: [TIE] }), readingId)).status).toBe('within')
  })

  /*
   * H16 at 300 MPa in 22 MPa, cover 30: fctk 0.7 x 0.3 x 22^(2/3) = 1.6488, bond 2.25 x 1.6488 / 1.5 = 2.4732,
   * 16 / 4 x 300 / 2.4732 = 485.2, x (1 - 0.15 x 14 / 16) = 0.86875: 421.5. In the first stage, in 9 MPa, the least
   * length governs: 0.3 x 16 / 4 x 300 / 1.3630 = 264.1; below it a bar does not count at all.
   */
  const bond = (2.25 * 0.7 * 0.3 * 22 ** (2 / 3)) / 1.5
  const developed = 0.86875 * 4 * (300 / bond)
  test.each([
    { past: Math.ceil(developed), share: 1 },
    { past: 300, share: 300 / developed },
    { past: 265, share: 265 / developed },
    { past: 264, share: 0 },
  ])('$past past the bearing face on each side counts with $share', ({ past, share }) => {
    const check = tieOf(withPan({ bars: [{ ...TIE, length: 2 * past }] }))
    expect(check.limit).toBeCloseTo(4 * area(16) * share, 4)
  })

  test('top bars in the recess or within cover of it do not count; bottom bars pass under it', () => {
    expect(tieOf(withPan({ bars: [{ ...TIE, pitch: 425 }] })).limit).toBeCloseTo(2 * area(16), 6)
    expect(tieOf(withPan({ bars: [{ ...TIE, pitch: 426 }] })).limit).toBeCloseTo(4 * area(16), 6)
  })

  test('bars across the tendon do not tie it back', () => {
    const check = tieOf(withPan({ bars: [{ ...TIE, runs: 'across' }] }))
    expect(check.limit).toBe(0)
    expect(check.notes.join(' ')).toContain('across the tendon')
  })

  test('bars that meet the edge are developed only as far as the concrete goes', () => {
    // 300 to the edge less 30 cover leaves 270.
    const check = tieOf(withPan({ pan: { y: 17100 }, bars: [TIE] }))
    expect(check.limit).toBeCloseTo((4 * area(16) * 270) / developed, 4)
  })
})

describe('Bars cut', () => {
  const cut = (runs: 'along' | 'across', of: Layout) => panCheck(of, `Bars cut, ${runs} the pan, top`, 'compared')

  // With 30 cover on both sides: 940 + 60 = 1000 holds five spacings of 200 and meets six bars, 999 five.
  test.each([
    { along: 940, bars: 6 },
    { along: 939, bars: 5 },
  ])('recess $along long: $bars bars across it', ({ along, bars }) => {
    expect(cut('across', withPan({ pan: { along }, parts })).demand).toBeCloseTo(bars * area(12), 6)
  })

  test('bottom bars are cut only where the recess reaches them: 30 + 10 + 10 over the soffit', () => {
    const names = (depth: number) =>
      panChecks(withPan({ pan: { depth }, parts })).flatMap(({ name }) => (name.endsWith('bottom') ? [name] : []))
    const strip = 'Bars across the strip in front, bottom'
    expect(names(170)).toEqual([strip])
    expect(names(171)).toContain('Bars cut, across the pan, bottom')
    expect(names(171)).not.toContain('Bars cut, along the pan, bottom')
  })

  const TRIM: PlacedBarsShape = { ...TIE, kind: 'trimmers', diameter: 12, layers: 'top', pitch: 75 }

  /*
   * H12 at 434.8 MPa in 32 MPa, cover 30: bond 2.25 x 0.7 x 0.3 x 32^(2/3) / 1.5 = 3.175, 12 / 4 x 434.8 / 3.175 = 410.9,
   * x (1 - 0.15 x 18 / 12) = 0.775: 318.4. The recess is 1000 long, 350 wide.
   */
  test.each([
    { runs: 'along', length: 1637, count: 4, full: 4 },
    { runs: 'along', length: 1637, count: 5, full: 4 },
    { runs: 'across', length: 987, count: 6, full: 6 },
  ] as const)('$count trimmers of $length $runs the pan: $full count', ({ runs, length, count, full }) => {
    const check = cut(runs, withPan({ parts, bars: [{ ...TRIM, runs, length, count }] }))
    expect(check.limit).toBeCloseTo(full * area(12), 6)
  })

  test('a trimmer that is too short counts in proportion, and one in the other face not at all', () => {
    const bond = (2.25 * 0.7 * 0.3 * 32 ** (2 / 3)) / 1.5
    const developed = 0.775 * 3 * (500 / 1.15 / bond)
    const short = cut('along', withPan({ parts, bars: [{ ...TRIM, length: 1400 }] }))
    expect(short.limit).toBeCloseTo((2 * area(12) * 200) / developed, 4)
    expect(cut('along', withPan({ parts, bars: [{ ...TRIM, length: 2000, layers: 'bottom' }] })).limit).toBe(0)
  })

  test('without mats it is said that the bars are not known', () => {
    expect(panCheck(withPan(), 'Bars cut', 'refused')).toMatchObject({ code: 'MISSING_INPUT', field: 'pour.mats' })
  })
})

describe('Strip in front', () => {
  const strip = (of: Layout, face = 'top') => panCheck(of, `Bars across the strip in front, ${face}`, 'compared')

  // 4 x 165.5 kN / 500 = 1324 for the force; at 110 in 220, cover 30, bars to 20: x 110 / 170 = 856.7 for the moment.
  test('bars for the force and the moment of the tendon (derived)', () => {
    expect(strip(withPan()).demand).toBeCloseTo((1324 * 110) / 170, 6)
    expect(strip(withPan(), 'bottom').demand).toBeCloseTo((1324 * 110) / 170, 6)
  })

  test('an anchor lower down: half of the force governs at the top, the moment at the bottom', () => {
    const low = withPan()
    const lowered = { ...low, anchors: low.anchors.map((one) => ({ ...one, height: 80 })) }
    expect(strip(lowered).demand).toBeCloseTo(1324 / 2, 6)
    expect(strip(lowered, 'bottom').demand).toBeCloseTo((1324 * 140) / 170, 6)
  })

  const BARS: PlacedBarsShape = { ...TIE, kind: 'lap-bars', count: 6, layers: 'bottom', pitch: 250, length: 10_740 }
  /** Neighbours 1800 to each side: the strip is 900 wide on each side, the wedge (900 - 110) / (2 / 3) = 1185 deep. */
  const between = {
    anchors: [anchor('E4', 1, { chainage: 7800 }), anchor('E4', 2, { chainage: 11_400 })],
  }

  // 5400 to the edge less 30 cover; the middle of the bar lies at the bearing face.
  test.each([
    { length: 10_740, counts: 6 },
    { length: 10_739, counts: 0 },
  ])('bars of $length: $counts reach the edge', ({ length, counts }) => {
    const check = strip(withPan({ parts: between, bars: [{ ...BARS, length }] }), 'bottom')
    expect(check.limit).toBeCloseTo(counts * area(16), 6)
  })

  test('the crack steel that the job chose counts over the width of the strip (EN 7.3.2; table from memory)', () => {
    // fctm 3.0238; phi = 20 / (3.0238 / 2.9 x 220 / (8 x 40)) = 27.90; 200 - 40 x 2.90 / 7 = 183.4 MPa;
    // 3.0238 x 220,000 / 183.4 = 3627 mm2/m; over 900 + 900 = 1.8 m and two faces: 3264 mm2.
    const chosen = accepting(withPan({ parts: between }), 'en-crack-minimum')
    expect(Math.abs(strip(chosen).demand - 3264)).toBeLessThan(2)
    expect(strip(withPan({ parts: between })).demand).toBeCloseTo((1324 * 110) / 170, 6)
  })

  test('bars outside half the gap to the next tendon do not count', () => {
    // Six at 361: the outermost stand at 902.5.
    expect(strip(withPan({ parts: between, bars: [{ ...BARS, pitch: 361 }] }), 'bottom').limit).toBeCloseTo(
      4 * area(16),
      6,
    )
    expect(strip(withPan({ parts: between, bars: [{ ...BARS, pitch: 360 }] }), 'bottom').limit).toBeCloseTo(
      6 * area(16),
      6,
    )
  })
})

describe('Beside them', () => {
  test.each([
    { depth: 220, status: 'stop' },
    { depth: 191, status: 'over' },
    { depth: 190, status: 'within' },
  ])('recess $depth deep in 220, cover 30: $status', ({ depth, status }) => {
    expect(panCheck(withPan({ pan: { depth } }), 'Concrete under the recess', 'compared').status).toBe(status)
  })

  test.each([
    { depth: 160, isUsual: true },
    { depth: 161, isUsual: false },
  ])('60 left under a recess is usual (common practice): $depth deep', ({ depth, isUsual }) => {
    expect(panCheck(withPan({ pan: { depth } }), 'Concrete under the recess', 'advice')).toMatchObject({ isUsual })
  })

  test('diagonals: two bars of 12 at each corner are usual (common practice); 0.04 x 1.2 x 588.8 = 28.3 kN beside', () => {
    const corners = (count: number) =>
      panCheck(
        withPan({ bars: [{ ...TIE, kind: 'diagonals', diameter: 12, layers: 'top', count }] }),
        'Diagonals at each corner',
        'advice',
      )
    expect(corners(1)).toMatchObject({ measured: area(12), isUsual: false })
    expect(corners(2)).toMatchObject({ measured: 2 * area(12), isUsual: true })
    expect(corners(2).notes.join(' ')).toContain('28.3 kN')
  })
})

describe('Needs', () => {
  const needsOf = (of: Layout) => panNeeds(layoutIndex(of), basisOf(of.job), 'PN')

  test('the bars that a need names meet it', () => {
    const neighbours = [anchor('E4', 1, { chainage: 7800 }), anchor('E4', 2, { chainage: 11_400 })]
    const empty = withPan({ parts: { ...parts, anchors: neighbours } })
    const needs = needsOf(empty)
    const bars = needs.flatMap((need) => need.shapeOf(need.diameter ?? 16) ?? [])
    expect(bars).toHaveLength(needs.length)
    const checks = panChecks(withPan({ parts: { ...parts, anchors: neighbours }, bars }))
    const ratios = checks.filter((check) => check.kind === 'compared' && check.compares === 'ratio')
    expect(ratios).toHaveLength(5)
    for (const check of ratios) expect(check.kind === 'compared' && check.statusOnceAccepted).not.toBe('over')
  })

  test('more force never asks for less steel', () => {
    const areas = [1, 2, 3, 4, 5, 6].map((strands) => {
      const one = withPan({ parts })
      return needsOf({ ...one, tendons: one.tendons.map((tendon) => ({ ...tendon, strands })) }).map(
        (need) => need.area,
      )
    })
    for (const [at, these] of areas.entries()) {
      for (const [i, least] of (areas[at - 1] ?? []).entries()) expect(these[i]).toBeGreaterThanOrEqual(least)
    }
  })

  test('turned over from west to east the needs stay', () => {
    const skewed = withPan({ parts, pan: { x: 8000, azimuth: 0.2 } })
    const areas = (of: Layout) => needsOf(of).map((need) => [need.name, need.area.toFixed(6)])
    expect(areas(mirrored(skewed))).toEqual(areas(skewed))
  })

  test('the stage that asks for most is the one that is shown', () => {
    expect(POUR.stages.map(({ share }) => share)).toEqual([0.25, 1])
    const ties = needsOf(withPan()).filter(({ purpose }) => purpose === 'tie-back')
    // 0.25 x 588.8 x 0.25 / 300 = 122.7; in full 490.7.
    expect(ties.map((need) => Math.round(need.area))).toEqual([123, 491])
  })
})
