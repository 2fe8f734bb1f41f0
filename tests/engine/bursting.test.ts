import type { Check, Region, Steel, SteelShape } from '@wedgeline/engine'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { accepted, accepting, checkAt, checksAt, compared, row } from './anchor-checks'
import { anchor, layout, length, EDGES, twoPours } from './sample-layout'

const A10 = (Math.PI * 10 ** 2) / 4
const A12 = (Math.PI * 12 ** 2) / 4

const steelAt = (shape: SteelShape, anchorId = 'E4-4'): Steel => ({
  id: `${shape.kind}-${anchorId}`,
  pourId: 'P1',
  zone: { kind: 'anchor', anchorId },
  shape,
  source: 'by-hand',
  isLocked: false,
})

const TRANSVERSE: SteelShape = {
  kind: 'transverse-bars',
  diameter: 12,
  length: 1600,
  count: 6,
  layers: 'top',
  first: 150,
  pitch: 200,
}

const thickness = (...given: Parameters<typeof row>) => checkAt(accepted(row(...given)), 'bursting-thickness')
const plan = (...given: Parameters<typeof row>) => checkAt(accepted(row(...given)), 'bursting-plan')
const asked = (check: Check) => compared(check).demand

describe('Bursting in the thickness, EN 1992-1-1 Eq. 6.58', () => {
  test('plate 80 at mid-height of 220, 588.8 kN: the hardware links carry it', () => {
    // F = 706.56 kN; T = 0.25 * 706.56 * (220 - 80) / 220 = 112.407 kN; As = 374.7 mm2
    // Window 44 to 220: links at 80, 130, 180 count, 3 * 2 * 78.54 = 471.2 mm2; 0.795
    const check = compared(thickness('S4'))
    expect(check.demand).toBeCloseTo((0.25 * 706_560 * 140) / 220 / 300, 6)
    expect(check.limit).toBeCloseTo(3 * 2 * A10, 6)
    expect(check).toMatchObject({ status: 'within', plane: 'thickness', stage: 'Full', unit: 'mm2', limitKind: 'C' })
  })

  test('off centre the mid-thickness value is taken, and the own prism is said beside it', () => {
    // Own prism at height 90: 180: 0.25 * 706 560 * 100 / 180 / 300 = 327.1 mm2; mid-thickness 374.7 mm2.
    const check = thickness('S4', { middle: { height: 90 } })
    expect(asked(check)).toBeCloseTo(374.7, 1)
    expect(check.notes.join(' ')).toContain('By the own prism (180) alone: 327 mm2')
  })

  test('moving towards a face is never a gain', () => {
    const at = (height: number) => compared(thickness('S4', { middle: { height } })).utilisation ?? Infinity
    fc.assert(
      fc.property(fc.integer({ min: 45, max: 109 }), (height) => {
        expect(at(height)).toBeGreaterThanOrEqual(at(110) - 1e-12)
      }),
      { numRuns: 25 },
    )
  })

  test('an accepted reading lets the own prism count alone, up to a plate of 0.6 of it', () => {
    const ids = ['en-window', 'en-steel-300', 'en-own-prism']
    const at = (height: number) => checkAt(accepting(row('S4', { middle: { height } }), ...ids), 'bursting-thickness')
    // Height 90, prism 180: 0.25 * 706 560 * 100 / 180 / 300 = 327.1 mm2
    expect(asked(at(90))).toBeCloseTo((0.25 * 706_560 * 100) / 180 / 300, 6)
    // 80 / (2 * 66) = 0.606 is outside the reading's range: mid-thickness counts again.
    expect(asked(at(67))).toBeCloseTo((0.25 * 706_560 * 54) / 134 / 300, 6)
    expect(asked(at(66))).toBeCloseTo((0.25 * 706_560 * 140) / 220 / 300, 6)
  })

  test('off centre with a plate over 0.6 of its prism warns that the rule is low', () => {
    // 80 / (2 * 66) = 0.606; 80 / (2 * 67) = 0.597
    const said = (height: number) => thickness('S4', { middle: { height } }).notes.join(' ')
    expect(said(66)).toContain('stands off centre')
    expect(said(67)).not.toContain('stands off centre')
  })

  test('no steel at all: over, and no number says by how much', () => {
    const bare = row('S4')
    const hardware = bare.hardware.map((one) => ({ ...one, localSteel: null }))
    expect(checkAt(accepted({ ...bare, hardware }), 'bursting-thickness')).toMatchObject({
      status: 'over',
      limit: 0,
      utilisation: null,
    })
  })

  test('a plate as deep as its prism is refused', () => {
    expect(thickness('S4', { middle: { height: 40 } })).toMatchObject({
      code: 'OUTSIDE_METHOD',
      field: 'height',
    })
  })

  test.each([
    { degrees: 20, kind: 'compared' },
    { degrees: 20.1, kind: 'refused' },
  ])('inclined by $degrees degrees (range from common practice): $kind', ({ degrees, kind }) => {
    const elevation = (degrees * Math.PI) / 180
    expect(thickness('S4', { middle: { elevation } }).kind).toBe(kind)
  })
})

describe('A step in depth', () => {
  const beam = (depth: number): Region => ({
    id: 'beam',
    mark: 'EB1',
    kind: 'edge-beam',
    outline: [
      { x: 0, y: 17_400 - depth },
      { x: 19_200, y: 17_400 - depth },
      { x: 19_200, y: 17_400 },
      { x: 0, y: 17_400 },
    ],
    top: 220,
    soffit: -480,
    cover: 40,
    linkDiameter: 10,
  })
  const deep = EDGES.map((one) => (one.id === 'E4' ? { ...one, lengths: [length(0, 19_200, { soffit: -480 })] } : one))
  const inBeam = (depth: number, middle = {}) =>
    thickness('S4', { edges: deep, pour: { regions: [beam(depth)] }, middle })

  test('behind an edge beam within one prism length is not covered', () => {
    // Beam 600 wide, bearing face 110 in: 490 to the step, under the section depth of 700.
    const check = inBeam(600)
    expect(check).toMatchObject({ status: 'not-covered', code: 'DEPTH_CHANGE' })
    expect(check.kind === 'refused' && check.message).toContain('from 700 to 220 deep 490 behind the bearing face')
  })

  test.each([
    { depth: 809, kind: 'refused' },
    { depth: 810, kind: 'compared' },
  ])('a beam $depth wide, 110 to the face, against a section of 700: $kind', ({ depth, kind }) => {
    expect(inBeam(depth).kind).toBe(kind)
  })

  test.each([
    { at: 8230, kind: 'compared' },
    { at: 8229, kind: 'refused' },
  ])('a deeper length from $at, plate side at 8010, section 220: $kind', ({ at, kind }) => {
    // The anchor stands at 7900, its plate ends at 8010; 8010 + 220 = 8230.
    const edges = EDGES.map((one) =>
      one.id === 'E4' ? { ...one, lengths: [length(0, at), length(at, 19_200, { soffit: -480 })] } : one,
    )
    expect(thickness('S4', { edges }).kind).toBe(kind)
  })

  test.each([
    { aside: 219, kind: 'refused' },
    { aside: 220, kind: 'compared' },
  ])('a fold whose side runs $aside beside the plate, section 220: $kind', ({ aside, kind }) => {
    // Plate from 7790 to 8010; the fold starts 50 behind the bearing face, at 17 240.
    const x = 8010 + aside
    const outline = [
      { x, y: 14_000 },
      { x: x + 2000, y: 14_000 },
      { x: x + 2000, y: 17_240 },
      { x, y: 17_240 },
    ]
    const fold: Region = { ...beam(0), id: 'fold', kind: 'fold', outline, top: 320, soffit: 100 }
    expect(thickness('S4', { pour: { regions: [fold] } }).kind).toBe(kind)
  })

  test('a side of a region that lies on the outline is no step', () => {
    expect(inBeam(5000).kind).toBe('compared')
  })

  test('in plan the step does not refuse', () => {
    const check = plan('S4', { edges: deep, pour: { regions: [beam(600)] } })
    expect(check.kind).toBe('compared')
    expect(check.notes.join(' ')).toContain('A step in depth stands 490 from the anchor')
  })
})

describe('Bursting in plan', () => {
  test('a cage of links alone fails: the links end before the window', () => {
    // T = 0.25 * 706.56 * (1750 - 220) / 1750 = 154.434 kN; As = 514.8 mm2 in 350 to 1750; links end at 180.
    const check = compared(plan('S4'))
    expect(check.demand).toBeCloseTo((0.25 * 706_560 * 1530) / 1750 / 300, 6)
    expect(check).toMatchObject({ status: 'over', limit: 0 })
    expect(check.notes).toContain(
      '4 links not counted in plan: they end 170 before the window (350 to 1750 behind the bearing face).',
    )
  })

  test('the same cage counted in the thickness passes there', () => {
    expect(thickness('S4')).toMatchObject({ status: 'within' })
  })

  test('transverse bars in the window mend it', () => {
    // At 150, 350, ..., 1150: five inside 350 to 1750; 5 * 113.1 = 565.5 mm2 against 514.8: 0.910
    const check = compared(plan('S4', { steel: [steelAt(TRANSVERSE)] }))
    expect(check.limit).toBeCloseTo(5 * A12, 6)
    expect(check).toMatchObject({ status: 'within', statusOnceAccepted: 'within' })
  })

  test('steel that does not go on to the face needs judgement, however much is counted', () => {
    // First bar at 400, pitch 100; only links before the window. Without the hardware's links there is nothing there.
    const bars: SteelShape = { ...TRANSVERSE, first: 400, pitch: 100, count: 10 }
    const given = row('S4', { steel: [steelAt(bars)] })
    const hardware = given.hardware.map((one) => ({ ...one, localSteel: null }))
    const check = checkAt(accepted({ ...given, hardware }), 'bursting-plan')
    expect(check).toMatchObject({ status: 'needs-judgement', statusOnceAccepted: 'needs-judgement' })
    // 514.8 * 350 / 1400 = 128.7 mm2 over the first 350
    expect(check.notes.join(' ')).toContain('129 mm2 over the first 350, 0 mm2 there')
    // With the links, 4 * 2 * 78.54 = 628 mm2 stand there.
    expect(checkAt(accepted(given), 'bursting-plan')).toMatchObject({ status: 'within' })
  })

  test('bars above the lower 250 of a section count with poor bond (EN 1992-1-1 8.4.2, from memory)', () => {
    // 22 MPa, 300 MPa: fctm = 0.3 * 22^(2/3) = 2.355; fbd = 2.25 * 0.7 * 2.355 / 1.5 = 2.473 MPa; lb,rqd of 12 mm
    // = 3 * 300 / 2.473 = 363.9 mm, in poor bond 363.9 / 0.7 = 519.9 mm. Bars reach 400 past the line.
    const given = (thickness: number) => {
      const edges = EDGES.map((one) =>
        one.id === 'E4' ? { ...one, lengths: [length(0, 19_200, { top: thickness })] } : one,
      )
      const steel = [steelAt({ ...TRANSVERSE, length: 800 })]
      return compared(plan('S4', { edges, pour: { thickness }, steel })).limit
    }
    // Centre of bars at the top: thickness - 30 - 6, so 250 in a section of 286.
    expect(given(286)).toBeCloseTo(5 * A12, 6)
    expect(given(287) / (5 * A12)).toBeCloseTo(400 / 519.9, 3)
  })

  test('the nearer half-gap sets the prism, and a wide gap beside it is said', () => {
    // Neighbours at 6150 and 9650; moved to 7500: half-gaps 675 and 1075; b = 1350.
    const check = plan('S4', { middle: { chainage: 7500 } })
    expect(asked(check)).toBeCloseTo((0.25 * 706_560 * (1350 - 220)) / 1350 / 300, 6)
    expect(check.notes.join(' ')).toContain('Beside a wide gap (675 and 1075 to its two sides)')
  })

  test('the end of the edge sets the prism of the last anchor', () => {
    const alone = accepted(layout({ anchors: [anchor('E4', 1, { chainage: 500 })] }))
    const check = checksAt(alone, 'E4-1').find(({ family }) => family === 'bursting-plan')
    // b = 2 * 500; 0.25 * 706 560 * 780 / 1000 / 300
    expect(check && asked(check)).toBeCloseTo((0.25 * 706_560 * 780) / 1000 / 300, 6)
    expect(check?.notes.join(' ')).toContain('near a corner')
  })

  test('a re-entrant side does not shrink the prism', () => {
    // The slab goes on past the west end of the short north edge at (9600, 9000).
    const outline = [
      { id: 'a', x: 0, y: 0 },
      { id: 'b', x: 19_200, y: 0 },
      { id: 'c', x: 19_200, y: 9000 },
      { id: 'r', x: 9600, y: 9000 },
      { id: 's', x: 9600, y: 17_400 },
      { id: 'd', x: 0, y: 17_400 },
    ]
    const line = { id: 'inner', levelId: 'L1', mark: 'E7', x: 0, y: 9000, azimuth: Math.PI / 2 }
    const inner = {
      ...EDGES[0],
      id: 'E7',
      mark: 'E7',
      pourId: 'P1',
      edgeLineId: 'inner',
      cornerId: 'c',
      isChord: false,
    }
    const edges = [{ ...inner, lengths: [length(9600, 19_200)] }]
    const anchors = [anchor('E7', 1, { chainage: 10_100 }), anchor('E7', 2, { chainage: 11_700 })]
    const check = checksAt(layout({ pour: { outline }, edgeLines: [line], edges, anchors }), 'E7-1').find(
      ({ family }) => family === 'bursting-plan',
    )
    // Half-gap 800 to the one neighbour, and not the 500 to the re-entrant corner.
    expect(check && compared(check).steps.find(({ symbol }) => symbol === 'b')?.value).toBe(1600)
  })

  test('inside a near-equal row the row value stands beside', () => {
    // a / s = 220 / 1750 = 0.1257, b = pi a / s = 0.3949; the sum is greatest at x / s = 0.083 (computed row):
    // 2 * 0.083 / 0.3949 * atan(sin b / (e^(2 pi 0.083) - cos b)) = 0.4203 * atan(0.3848 / 0.7616) = 0.1966 P = 115.8 kN
    expect(plan('S4').notes.join(' ')).toContain('0.197 P = 115.8 kN')
  })

  test('skew beyond 20 degrees is refused (common practice)', () => {
    expect(plan('S4', { middle: { skew: 0.36 } })).toMatchObject({ code: 'OUTSIDE_METHOD', field: 'skew' })
  })
})

describe('Beside a pour boundary', () => {
  const F = 1.2 * 4 * 0.8 * 184_000
  const across = (from: number, beyond: number) => {
    const anchors = [
      anchor('E2', 1, { chainage: 17_000 }),
      anchor('E2', 2, { chainage: from }),
      anchor('E2-P2', 1, { chainage: beyond, castWithPourId: 'P2' }),
    ]
    const check = checksAt(layout(twoPours(anchors)), 'E2-2').find(({ family }) => family === 'bursting-plan')
    if (!check) throw new Error('No bursting in plan')
    return compared(check)
  }

  test('the gap across it is checked beside the own prism, and the worse of the two counts', () => {
    // 500 to the end of the pour: b = 1000. Half-gap across 20400 - 18700 is 850, as is the one before: b = 1700.
    const check = across(18_700, 20_400)
    expect(check.demand).toBeCloseTo((0.25 * F * (1700 - 220)) / 1700 / 300, 6)
    const own = Math.round((0.25 * F * (1000 - 220)) / 1000 / 300)
    expect(check.notes.join(' ')).toContain(`By the own prism (1000) alone: ${own} mm2 asked for`)
    expect(check.notes.join(' ')).toContain('The prism with the next pour cast governs')
  })

  test('where the gap across is the narrower one the own prism governs', () => {
    // 600 to the end: b = 1200. Half-gap across 19400 - 18600 is 400: b = 800, which asks for less.
    const check = across(18_600, 19_400)
    expect(check.demand).toBeCloseTo((0.25 * F * (1200 - 220)) / 1200 / 300, 6)
    expect(check.notes.join(' ')).toContain('By the prism with the next pour cast (800) alone')
  })

  test('where the other side sets both there is one prism and no more is said', () => {
    // Half of 1100 to the anchor before: b = 1100 either way, with 1100 to the end and as much across.
    expect(across(18_100, 20_300).notes.join(' ')).not.toContain('next pour')
  })
})

describe('Readings', () => {
  test('until one is accepted the result needs judgement and says what it would be', () => {
    expect(checkAt(row('S4'), 'bursting-thickness')).toMatchObject({
      status: 'needs-judgement',
      statusOnceAccepted: 'within',
      readingIds: ['en-window', 'en-steel-300'],
    })
    expect(checkAt(accepting(row('S4'), 'en-window'), 'bursting-thickness')).toMatchObject({
      status: 'needs-judgement',
      readingIds: ['en-window', 'en-steel-300'],
    })
    expect(thickness('S4')).toMatchObject({ status: 'within' })
  })

  test('the readings are named as people read them', () => {
    const notes = thickness('S4').notes.join(' ')
    expect(notes).toContain(
      'Rests on these readings: Bursting steel counts from 0.2 b to 1.0 b behind the bearing face; ' +
        'Bursting steel at 300 MPa for 1.2 times the jacking force.',
    )
    expect(notes).not.toContain('en-')
  })

  test('the alternative asks for 0.83 of the steel: T / 1.2 / 300', () => {
    const check = compared(checkAt(accepting(row('S4'), 'en-window', 'en-steel-alt'), 'bursting-thickness'))
    expect(check.demand).toBeCloseTo((0.25 * 588_800 * 140) / 220 / 300, 6)
  })
})

describe('Properties', () => {
  const shares = fc.double({ min: 0.3, max: 0.9, noNaN: true })
  const withRatio = (jackingRatio: number) => {
    const given = row('S4')
    return { ...given, tendons: given.tendons.map((tendon) => ({ ...tendon, jackingRatio })) }
  }

  test('more force never asks for less steel', () => {
    fc.assert(
      fc.property(shares, shares, (one, other) => {
        const steel = (ratio: number) => asked(checkAt(withRatio(ratio), 'bursting-plan'))
        expect(steel(Math.max(one, other))).toBeGreaterThanOrEqual(steel(Math.min(one, other)))
      }),
      { numRuns: 15 },
    )
  })

  test('mirrored along the edge and in height every ratio stays', () => {
    const chainages = fc.uniqueArray(fc.integer({ min: 3, max: 30 }), { minLength: 2, maxLength: 6 })
    const ratios = (places: readonly number[], height: number) =>
      places.map((chainage, i) => {
        const anchors = places.map((at, k) => anchor('E4', k + 1, { chainage: at, height }))
        expect(chainage).toBe(anchors[i]?.chainage)
        return checksAt(layout({ anchors }), `E4-${i + 1}`).map((check) =>
          check.kind === 'compared' ? (check.utilisation ?? check.spare) : check.kind,
        )
      })
    fc.assert(
      fc.property(chainages, fc.integer({ min: 80, max: 140 }), (places, height) => {
        const positions = places.map((place) => place * 600)
        const mirrored = ratios(
          positions.map((at) => 19_200 - at),
          220 - height,
        )
        const sorted = (all: readonly unknown[]) =>
          all
            .map((value) => (typeof value === 'number' ? value.toFixed(6) : value))
            .map(String)
            .sort()
        for (const [i, one] of ratios(positions, height).entries()) {
          expect(sorted(mirrored[i] ?? [])).toEqual(sorted(one))
        }
      }),
      { numRuns: 10 },
    )
  })
})
