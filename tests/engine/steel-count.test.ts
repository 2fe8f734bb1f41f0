import type { LinksShape, SpiralShape, SteelShape, TransverseBarsShape } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { countSteel, setsAcross, type CountInput } from '../../packages/engine/src/steel/count'
import type { CountPlace } from '../../packages/engine/src/steel/crossings'
import { evaluated } from './step-text'

const A10 = (Math.PI * 10 ** 2) / 4
const A12 = (Math.PI * 12 ** 2) / 4

const PLACE: CountPlace = {
  chainage: 5000,
  edgeFrom: 0,
  edgeTo: 10_000,
  breaks: [],
  cover: 30,
  setBack: 110,
  plateWidth: 220,
  depth: 220,
  coverTop: 30,
  coverSoffit: 30,
  azimuth: 0,
  mats: [],
}

const LINKS: LinksShape = {
  kind: 'links',
  diameter: 10,
  width: 300,
  height: 140,
  hook: 130,
  count: 4,
  first: 30,
  pitch: 50,
}
const SPIRAL: SpiralShape = {
  kind: 'spiral',
  diameter: 12,
  outside: 230,
  pitch: 55,
  turns: 6,
  flatTurns: 2,
  first: 0,
}
const TRANSVERSE: TransverseBarsShape = {
  kind: 'transverse-bars',
  diameter: 12,
  length: 2000,
  count: 8,
  layers: 'top',
  first: 400,
  pitch: 150,
}

/** 300 mm of anchorage wanted past the line, 120 the least. */
const ANCHORAGE = {
  bond: 3,
  required: 300,
  least: 120,
  length: 300,
  clause: { source: '', section: '', tag: 'derived' },
} as const

function count(shapes: readonly SteelShape[], change: Partial<CountInput> = {}) {
  const asked = { plane: 'thickness', window: { from: 44, to: 220 }, place: PLACE, ...change } as const
  return countSteel({ anchorageOf: () => ANCHORAGE, ...asked, sets: setsAcross({ ...asked, shapes }) })
}
const inPlan = (shapes: readonly SteelShape[], place: Partial<CountPlace> = {}) =>
  count(shapes, { plane: 'plan', window: { from: 350, to: 1750 }, place: { ...PLACE, ...place } })

describe('Closed links', () => {
  test('cross with two legs each; the one at 30 stands before the window from 44', () => {
    // Links at 30, 80, 130, 180: three inside 44 to 220, 3 * 2 * 78.54 = 471.2 mm2
    const { area, notes } = count([LINKS])
    expect(area).toBeCloseTo(3 * 2 * A10, 9)
    expect(notes.join()).toContain('1 of 4 links not counted in the thickness: 1 before the window')
  })

  test.each([
    { first: 43.9, counted: 3 },
    { first: 44, counted: 4 },
    { first: 70, counted: 4 },
    { first: 70.1, counted: 3 },
  ])('first at $first: $counted inside 44 to 220, both ends included', ({ first, counted }) => {
    expect(count([{ ...LINKS, first }]).area).toBeCloseTo(counted * 2 * A10, 9)
  })

  test('in plan they end before the window, and a sentence says by how much', () => {
    const { area, notes } = inPlan([LINKS])
    expect(area).toBe(0)
    // The last stands at 180, the window starts at 350.
    expect(notes).toEqual([
      '4 links not counted in plan: they end 170 before the window (350 to 1750 behind the bearing face).',
    ])
  })

  test('they count in plan where the window is near: plan window 100 to 500', () => {
    // 130 and 180 stand inside.
    expect(count([LINKS], { plane: 'plan', window: { from: 100, to: 500 } }).area).toBeCloseTo(2 * 2 * A10, 9)
  })
})

describe('Spiral', () => {
  test('a turn crosses twice, flat end turns do not count', () => {
    // Four turns between two flat ones: middles at 27.5, 82.5, 137.5, 192.5; three inside 44 to 220.
    const { area, notes } = count([SPIRAL])
    expect(area).toBeCloseTo(3 * 2 * A12, 9)
    expect(notes.join()).toContain('2 flat end turns do not count')
  })

  test('counts alike in both planes for the same window', () => {
    expect(count([SPIRAL], { plane: 'plan' }).area).toBeCloseTo(count([SPIRAL]).area, 9)
  })
})

describe('Hairpins', () => {
  const hairpin = { kind: 'hairpins', diameter: 10, leg: 600, bend: 140, count: 2, first: 45, pitch: 150 } as const

  test('upright: only the bend crosses the thickness, once, and nothing crosses in plan', () => {
    expect(count([{ ...hairpin, lies: 'upright' }]).area).toBeCloseTo(2 * A10, 9)
    expect(inPlan([{ ...hairpin, lies: 'upright', first: 400 }])).toMatchObject({ area: 0 })
  })

  test('flat: the bend crosses in plan', () => {
    expect(inPlan([{ ...hairpin, lies: 'flat', first: 400 }]).area).toBeCloseTo(2 * A10, 9)
  })

  test('those beside the reach of the anchor do not count', () => {
    // Reach 220 / 2 + 220 / 2 = 220. Three at 250: one in the middle, two 250 aside.
    const { area, notes } = count([{ ...hairpin, lies: 'upright', count: 3, pitch: 250 }])
    expect(area).toBeCloseTo(A10, 9)
    expect(notes.join()).toContain('2 of 3 hairpins not counted')
  })
})

describe('Transverse bars', () => {
  test('count in plan at each position of the window, a bar in every layer', () => {
    // 400 to 1450: all 8 inside 350 to 1750; both layers 16 bars.
    expect(inPlan([TRANSVERSE]).area).toBeCloseTo(8 * A12, 9)
    expect(inPlan([{ ...TRANSVERSE, layers: 'both' }]).area).toBeCloseTo(16 * A12, 9)
  })

  test.each([
    { length: 239.9, share: 0 },
    { length: 240, share: 120 / 300 },
    { length: 450, share: 225 / 300 },
    { length: 600, share: 1 },
    { length: 601, share: 1 },
  ])('$length long: half of it past the line counts with $share', ({ length, share }) => {
    expect(inPlan([{ ...TRANSVERSE, length }]).area).toBeCloseTo(8 * A12 * share, 9)
  })

  test('the end of the edge cuts them short', () => {
    // 230 to the end less 30 cover = 200 past the line of 300 wanted.
    const { area, notes } = inPlan([TRANSVERSE], { chainage: 230 })
    expect(area).toBeCloseTo((8 * A12 * 200) / 300, 9)
    expect(notes.join()).toContain('200 past')
  })

  test('do not count in the thickness', () => {
    expect(count([TRANSVERSE])).toMatchObject({ area: 0, steps: [{ formula: '0' }] })
  })
})

describe('Edge bars', () => {
  const bars = { kind: 'edge-bars', diameter: 12, countTop: 2, countBottom: 1, first: 560, pitch: 100 } as const

  test('lie from the slab edge: set-back comes off before the window is asked', () => {
    // 560 - 110 = 450 and 550 behind the face, both inside 350 to 1750: two top and one bottom.
    expect(inPlan([{ ...bars, from: 0, to: 10_000 }]).area).toBeCloseTo(3 * A12, 9)
    expect(inPlan([{ ...bars, first: 459, pitch: 1, from: 0, to: 10_000 }]).area).toBeCloseTo(A12, 9)
  })

  test('count as far as the bar runs past the line, and a step of the edge ends it', () => {
    expect(inPlan([{ ...bars, from: 4850, to: 10_000 }]).area).toBeCloseTo((3 * A12 * 150) / 300, 9)
    expect(inPlan([{ ...bars, from: 0, to: 10_000 }], { breaks: [5150] }).area).toBeCloseTo((3 * A12 * 150) / 300, 9)
  })

  test('bars that do not pass the anchor do not count', () => {
    expect(inPlan([{ ...bars, from: 5000, to: 10_000 }]).area).toBe(0)
  })
})

describe('Mat bars', () => {
  const mat = {
    id: 'm',
    face: 'top',
    azimuth: Math.PI / 2,
    diameter: 12,
    spacing: 200,
    isOuter: true,
    spareShare: 0.25,
    spareBy: 'A. Engineer',
  } as const

  test('count with the spare share only, along the edge', () => {
    // 0.25 * 113.1 / 200 over 1400 mm = 197.9 mm2
    expect(inPlan([], { mats: [mat] }).area).toBeCloseTo((0.25 * A12 * 1400) / 200, 9)
  })

  test('nothing is spare until somebody says so; bars along the tendon do not cross', () => {
    expect(inPlan([], { mats: [{ ...mat, spareShare: 0 }] }).area).toBe(0)
    expect(inPlan([], { mats: [{ ...mat, azimuth: 0 }] }).area).toBeCloseTo(0, 9)
  })
})

test('the total is the sum of its lines and every text evaluates to its value', () => {
  const { steps, area } = inPlan([LINKS, TRANSVERSE, { ...TRANSVERSE, diameter: 10, first: 450 }])
  for (const line of steps) expect(evaluated(line)).toBeCloseTo(line.value, 9)
  expect(area).toBeCloseTo(8 * A12 + 8 * A10, 9)
})

test('steel carries on to the face where its first bar stands within one pitch of it', () => {
  expect(count([LINKS]).isCarriedToFace).toBe(true)
  expect(count([{ ...LINKS, first: 51 }]).isCarriedToFace).toBe(false)
  // Before the window only the link at 30 stands.
  expect(count([LINKS]).beforeWindow).toBeCloseTo(2 * A10, 9)
})
