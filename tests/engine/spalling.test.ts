import {
  checkPour,
  tensionMidway,
  type Check,
  type Compared,
  type Layout,
  type Steel,
  type SteelShape,
} from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { accepted, row } from './anchor-checks'
import { anchor, deadEnd, inPan, layout, pan } from './sample-layout'
import { evaluated } from './step-text'

const face = (of: Layout, zoneId: string): Check => {
  const zone = checkPour(of, { pourId: 'P1', withSteps: true }).zones.find((one) => one.zone.id === zoneId)
  const check = zone?.checks.find(({ family }) => family === 'spalling')
  if (!check) throw new Error(`No face check at ${zoneId}`)
  return check
}
const compared = (check: Check): Compared => {
  if (check.kind !== 'compared') throw new Error(`${check.name} is ${check.kind}`)
  return check
}
const gap = (after: number | null, before: number | null) =>
  `gap:E4:${after === null ? 'start' : `E4-${after}`}:${before === null ? 'end' : `E4-${before}`}`

const bars = (change: Partial<SteelShape & { kind: 'edge-bars' }> = {}): Steel => ({
  id: 'eb',
  pourId: 'P1',
  zone: { kind: 'edge', edgeId: 'E4' },
  source: 'by-hand',
  isLocked: false,
  shape: {
    kind: 'edge-bars',
    diameter: 12,
    countTop: 2,
    countBottom: 2,
    first: 150,
    pitch: 100,
    from: 30,
    to: 19_170,
    ...change,
  },
})
const TWELVE = (Math.PI * 12 ** 2) / 4

describe('Inside a near-equal row of seven at 1750, plates 220, jacked with 588.8 kN', () => {
  // T by the exact row at a / s = 220 / 1750 (computed: 0.0880 at 0.1, 0.0860 at 0.2); EN: 1.2 T / 300 MPa.
  const share = tensionMidway(220 / 1750).share
  const asked = (1.2 * share * 588_800) / 300

  test('the force lies between the values for 0.1 and 0.2 of the spacing (computed)', () => {
    expect(share).toBeLessThan(0.088)
    expect(share).toBeGreaterThan(0.086)
  })

  test('asks at full force for 1.2 T / 300 (EN 1992-1-1 8.10.3(4), from memory)', () => {
    const check = compared(face(row('S4'), gap(3, 4)))
    expect(check.demand).toBeCloseTo(asked, 6)
    expect(check).toMatchObject({ limit: 0, utilisation: null, stage: 'Full', statusOnceAccepted: 'over' })
  })

  test('counts bars of both layers within 0.2 s = 350 of the bearing face', () => {
    // Bars at 150 and 250 from the edge stand 40 and 140 behind a face set back 110: 4 in all.
    expect(compared(face(row('S4', { steel: [bars()] }), gap(3, 4))).limit).toBeCloseTo(4 * TWELVE, 6)
    // 350 behind the face is 460 from the edge.
    const at = (first: number) =>
      compared(face(row('S4', { steel: [bars({ first, countTop: 1, countBottom: 1 })] }), gap(3, 4)))
    expect(at(460).limit).toBeCloseTo(2 * TWELVE, 6)
    expect(at(461).limit).toBe(0)
    expect(at(461).notes.join(' ')).toContain('not counted')
  })

  test('is needs judgement until the reading of the steel stress is accepted', () => {
    const steel = [bars({ countTop: 3, countBottom: 3, diameter: 16 })]
    expect(face(row('S4', { steel }), gap(3, 4))).toMatchObject({ status: 'needs-judgement' })
    expect(face(accepted(row('S4', { steel })), gap(3, 4))).toMatchObject({ status: 'within' })
  })

  test('a bar that ends in the gap counts for its length past the middle, or not at all', () => {
    // The gap 3 to 4 runs from 6150 to 7900, its middle at 7025.
    const to = (end: number) => compared(face(row('S4', { steel: [bars({ to: end })] }), gap(3, 4))).limit
    expect(to(7025)).toBe(0)
    expect(to(7100)).toBe(0)
    expect(to(7025 + 5000)).toBeCloseTo(4 * TWELVE, 6)
  })

  test('the spare share of a mat counts once: over 0.2 s, from the cover to where bursting begins to count', () => {
    const mat = {
      id: 'm',
      face: 'top',
      azimuth: Math.PI / 2,
      diameter: 10,
      spacing: 200,
      isOuter: true,
      spareShare: 0.5,
      spareBy: 'A. Person',
    } as const
    // From the cover of 30 (80 before a face set back 110) to 350 behind it: 430 x 78.54 / 200 x 0.5.
    const { limit } = compared(face(row('S4', { pour: { mats: [mat] } }), gap(3, 4)))
    expect(limit).toBeCloseTo((430 * ((Math.PI * 100) / 4) * 0.5) / 200, 6)
  })

  test('an anchor alone asks for the floor: 0.03 x 588.8 x 1.2 / (500 / 1.15) (EN 1992-2 J.104.2, from memory)', () => {
    const check = compared(face(row('S4', { steel: [bars()] }), 'anchor:E4-4'))
    expect(check.demand).toBeCloseTo((0.03 * 588_800 * 1.2) / (500 / 1.15), 6)
    expect(check.limit).toBeCloseTo(4 * TWELVE, 6)
  })

  test('a hairpin lying flat counts at its anchor, an upright one does not', () => {
    const hairpin = (lies: 'flat' | 'upright'): Steel => ({
      ...bars(),
      zone: { kind: 'anchor', anchorId: 'E4-4' },
      shape: { kind: 'hairpins', diameter: 12, leg: 600, bend: 400, count: 2, lies, first: 40, pitch: 100 },
    })
    expect(compared(face(row('S4', { steel: [hairpin('flat')] }), 'anchor:E4-4')).limit).toBeCloseTo(2 * TWELVE, 6)
    expect(compared(face(row('S4', { steel: [hairpin('upright')] }), 'anchor:E4-4')).limit).toBe(0)
  })

  test('the same from either end of the edge', () => {
    const of = row('S4', { steel: [bars()] })
    expect(compared(face(of, gap(2, 3))).demand).toBeCloseTo(compared(face(of, gap(5, 6))).demand, 9)
  })

  test('demand grows with the force', () => {
    const given = row('S4')
    const half = { ...given, tendons: given.tendons.map((one) => ({ ...one, jackingRatio: 0.4 })) }
    expect(compared(face(half, gap(3, 4))).demand).toBeCloseTo(asked / 2, 6)
  })

  test('every step evaluates to its value', () => {
    for (const zoneId of [gap(3, 4), 'anchor:E4-4']) {
      for (const line of compared(face(row('S4', { steel: [bars()] }), zoneId)).steps) {
        expect(evaluated(line), line.symbol).toBeCloseTo(line.value, 6)
      }
    }
  })

  test('bonded dead ends beside rest on their reading too', () => {
    const given = row('S4')
    const mixed = {
      ...given,
      anchors: given.anchors.map((one, i) =>
        i % 2 === 1 ? { ...one, ...deadEnd('E4', one.number, { chainage: one.chainage }) } : one,
      ),
    }
    const check = compared(face(mixed, gap(3, 4)))
    const plain = compared(face(given, gap(3, 4)))
    expect(check.readingIds.length).toBe(plain.readingIds.length + 1)
    expect(check.notes.join(' ')).toContain('bearing faces stand at')
  })
})

describe('Elsewhere an uneven row is not covered, and the value of the row stands there as too low', () => {
  const uneven = { kind: 'refused', status: 'not-covered', code: 'UNEVEN_ROW' }

  test.each([
    { where: 'outermost gap', zoneId: gap(1, 2) },
    { where: 'end of the edge', zoneId: gap(7, null) },
    { where: 'outermost anchor', zoneId: 'anchor:E4-1' },
    { where: 'outer edge', zoneId: 'edge:E4' },
  ])('$where of a near-equal row', ({ zoneId }) => {
    expect(face(row('S4'), zoneId)).toMatchObject(uneven)
  })

  const gaps = (wide: number, count = 7) =>
    layout({
      anchors: Array.from({ length: count }, (_, i) =>
        anchor('E4', i + 1, { chainage: 2000 + 1500 * i + (i >= 3 ? wide - 1500 : 0) }),
      ),
    })

  test('gaps at 1.2 of the smallest are near equal, above they are not', () => {
    expect(face(gaps(1800), gap(3, 4))).toMatchObject({ kind: 'compared' })
    expect(face(gaps(1801), gap(3, 4))).toMatchObject(uneven)
  })

  test('five anchors make a row, four do not', () => {
    expect(face(gaps(1500, 5), gap(2, 3))).toMatchObject({ kind: 'compared' })
    expect(face(gaps(1500, 4), gap(2, 3))).toMatchObject(uneven)
  })

  test('the value of the row is said to be too low', () => {
    // 0.0877 P at 220 / 2500 of 588.8 kN.
    const share = tensionMidway(220 / 2500).share
    const said = face(gaps(2500), gap(3, 4)).notes.join(' ')
    expect(said).toContain(`${(share * 588.8).toFixed(1)} kN`)
    expect(said).toContain('too low')
  })

  test('an anchor in a pan', () => {
    const of = layout({ anchors: [inPan('PN1')], pans: [pan('PN1', { x: 9000, y: 9000 })] })
    expect(face(of, 'anchor:PN1-anchor')).toMatchObject(uneven)
  })
})

describe('By AS 3600 (digest): the force unfactored at 150 MPa, no floor of its own', () => {
  const as = (of: Layout): Layout => ({ ...of, job: { ...of.job, basis: 'as-3600' } })

  test('between anchors T / 150, resting on the reading for a near-equal row', () => {
    const check = compared(face(as(row('S4')), gap(3, 4)))
    expect(check.demand).toBeCloseTo((tensionMidway(220 / 1750).share * 588_800) / 150, 6)
    expect(check.readingIds.length).toBe(1)
  })

  test('beside an anchor alone nothing is asked for', () => {
    expect(compared(face(as(row('S4')), 'anchor:E4-4'))).toMatchObject({ demand: 0, statusOnceAccepted: 'within' })
  })
})
