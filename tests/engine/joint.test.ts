import { checkPour, type Anchor, type Compared, type Layout, type PlacedBarsShape, type Steel } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { EAST, anchor, deadEnd, edge, EDGES, layout, length, POUR, SETTINGS, S4, D4, B7 } from './sample-layout'
import { evaluated } from './step-text'

const JOINT = 'joint:j'
const READINGS = ['en-joint-strip', 'en-crack-minimum', 'en-tie-back']

/** Pours P1 and P2 side by side; the joint between them runs along x = 19200, 17400 long. Spread at 45 degrees. */
function twoPours(of: {
  anchors: readonly Anchor[]
  steel?: readonly Steel[]
  readings?: readonly string[]
  kind?: 'construction' | 'movement'
  firstPourId?: string
}): Layout {
  const outline = [
    { id: 'q', x: 19200, y: 0 },
    { id: 'r', x: 34200, y: 0 },
    { id: 's', x: 34200, y: 17400 },
    { id: 't', x: 19200, y: 17400 },
  ]
  const west = { ...edge(EAST, 't', [length(0, 17400)]), id: 'J1-P2', mark: 'J1-P2', pourId: 'P2' }
  const made = layout({
    anchors: of.anchors,
    edges: [...EDGES, west],
    steel: of.steel ?? [],
    hardware: [S4, B7, D4],
    more: {
      pours: [POUR, { ...POUR, id: 'P2', mark: 'P2', outline }],
      joints: [{ id: 'j', edgeLineId: 'east', kind: of.kind ?? 'construction', firstPourId: of.firstPourId ?? 'P1' }],
    },
  })
  const readings = (of.readings ?? READINGS).map((readingId) => ({
    readingId,
    acceptedBy: 'A. Engineer',
    acceptedAtMs: 0,
    reason: 'test',
  }))
  return { ...made, job: { ...made.job, readings, settings: { ...SETTINGS, wedgeSpread: Math.PI / 4 } } }
}

const inP2 = (one: Anchor): Anchor => ({ ...one, castWithPourId: 'P2', stressedWithPourId: 'P2' })

/** Plates of 220, set back 110, at 8000 and 9400 on both sides. */
const FOUR = [
  anchor('J1', 1, { chainage: 8000 }),
  anchor('J1', 2, { chainage: 9400 }),
  inP2(anchor('J1-P2', 1, { chainage: 8000 })),
  inP2(anchor('J1-P2', 2, { chainage: 9400 })),
]

const lapBars = (change: Partial<PlacedBarsShape>): Steel => ({
  id: 'lap bars',
  pourId: 'P1',
  zone: { kind: 'joint', jointId: 'j' },
  shape: {
    kind: 'lap-bars',
    diameter: 12,
    length: 3000,
    count: 70,
    layers: 'both',
    runs: 'across',
    pitch: 80,
    ...change,
  },
  source: 'by-hand',
  isLocked: false,
})

function checks(made: Layout, pourId = 'P1'): Compared[] {
  return checkPour(made, { pourId, withSteps: true })
    .zones.filter(({ zone }) => zone.id === JOINT)
    .flatMap((zone) => zone.checks)
    .filter((check): check is Compared => check.kind === 'compared' && check.family === 'joint')
}

function named(made: Layout, name: RegExp, stage: RegExp = /./): Compared {
  const check = checks(made).find((one) => name.test(one.name) && stage.test(one.stage ?? ' '))
  if (!check) throw new Error(`No ${String(name)}`)
  return check
}

const valueOf = (check: Compared, symbol: string) => check.steps.find((line) => line.symbol === symbol)?.value

describe('bars across the strip without precompression', () => {
  const between = (made: Layout) => named(made, /^Bars across the joint, J1-01 to J1-02/)

  test('each side 110 + (1400 - 220) / 2 = 700: 1400 together, with a lap on both sides', () => {
    const check = between(twoPours({ anchors: FOUR }))
    expect(valueOf(check, 'w')).toBeCloseTo(1400, 6)
    // EN 8.4, 8.7 (from memory): lbd = 12 / 4 * 434.78 / 3.1750 = 410.82, all lapped at one section 1.5: 616.2.
    expect(valueOf(check, 'l0')).toBeCloseTo(616.2, 1)
    expect(valueOf(check, 'lBar')).toBeCloseTo(2 * (700 + 616.2), 0)
    for (const line of check.steps) expect(evaluated(line)).toBeCloseTo(line.value, 6)
  })

  test('one length along the joint for each gap, and to both ends', () => {
    expect(checks(twoPours({ anchors: FOUR })).map(({ name }) => name)).toEqual(
      expect.arrayContaining([
        'Bars across the joint, start to J1-01',
        'Bars across the joint, J1-01 to J1-02',
        'Bars across the joint, J1-02 to end',
      ]),
    )
  })

  test('bars at 80 about the middle of the joint: those between 8000 and 9400 count', () => {
    // 70 bars at 80: from 8700 - 69 * 40 = 5940 every 80. Between 8000 and 9400: 8020 to 9380, 18 bars, in both layers 36.
    // 36 * 113.097 / 1.4 = 2908.2 mm2/m against 2668 asked for.
    const check = between(twoPours({ anchors: FOUR, steel: [lapBars({})] }))
    expect(check.limit).toBeCloseTo(2908.2, 0)
    expect(check.status).toBe('within')
  })

  test('bars that are too short count for less, and not at all where they end within the strip', () => {
    // Half of 2 * (700 + 308.1): half of the lap.
    const half = between(twoPours({ anchors: FOUR, steel: [lapBars({ length: 2016.2 })] }))
    expect(half.limit).toBeCloseTo(2908.2 / 2, 0)
    expect(half.status).toBe('over')
    const none = between(twoPours({ anchors: FOUR, steel: [lapBars({ length: 1400 })] }))
    expect(none.limit).toBe(0)
    expect(none.notes.join(' ')).toMatch(/are not counted/)
  })

  test('needs judgement until the width of the strip is accepted, and until the crack steel is chosen', () => {
    const open = (readings: readonly string[]) => between(twoPours({ anchors: FOUR, steel: [lapBars({})], readings }))
    expect(open([]).status).toBe('needs-judgement')
    expect(open(['en-crack-minimum']).status).toBe('needs-judgement')
    expect(open(['en-joint-strip']).status).toBe('needs-judgement')
    expect(open(['en-joint-strip', 'en-crack-minimum']).status).toBe('within')
    expect(open([]).statusOnceAccepted).toBe('within')
  })

  test('bonded dead ends count from their bond: 600 between bulbs on the lines becomes 3056', () => {
    const anchors = [deadEnd('J1', 1, { chainage: 8000 }), inP2(deadEnd('J1-P2', 1, { chainage: 8000 }))]
    const check = named(twoPours({ anchors }), /start to J1-01/)
    // 8000 - 150 = 7850 aside of the splay, on 300 + 1228 = 1528 set back, both sides: 2 * (1528 + 7850).
    expect(valueOf(check, 'w')).toBeCloseTo(2 * (1528 + 7850), 6)
  })
})

describe('tie-back across the joint', () => {
  const stages = (made: Layout) => [named(made, /^Tie-back/, /^before/), named(made, /^Tie-back/, /^after/)]

  test('nothing to tie before the second pour is stressed; a quarter of 588.8 kN at 300 MPa after', () => {
    // 4 * 0.8 * 184 = 588.8 kN; 0.25 * 588.8 = 147.2 kN; at 0.6 * 500: 490.7 mm2 (podium: 491).
    const [before, after] = stages(twoPours({ anchors: FOUR }))
    expect(before).toMatchObject({ stage: 'before pour P2 is stressed', demand: 0, status: 'within' })
    expect(after).toMatchObject({ stage: 'after pour P2 is stressed', status: 'over', limit: 0 })
    expect(after?.demand).toBeCloseTo(490.67, 1)
  })

  test('bars between half the gaps beside the anchor count where they are developed past its bearing face', () => {
    // At 8000 the half gaps run from 0 to 8700: bars from 5940 on: 35 of them (5940 to 8660), in both layers 70.
    const [, after] = stages(twoPours({ anchors: FOUR, steel: [lapBars({})] }))
    expect(after?.limit).toBeCloseTo(70 * 113.097, 0)
    expect(after?.status).toBe('within')
    // 2 * (110 + 205.4): half of the anchorage of 410.8.
    const [, half] = stages(twoPours({ anchors: FOUR, steel: [lapBars({ length: 630.82 })] }))
    expect(half?.limit).toBeCloseTo((70 * 113.097) / 2, 0)
  })

  test('the pour that is cast first is the joint’s to say', () => {
    const [before] = stages(twoPours({ anchors: FOUR, firstPourId: 'P2' }))
    expect(before?.stage).toBe('before pour P1 is stressed')
    expect(before?.notes.join(' ')).toMatch(/Anchors of pour P2 are stressed against a free face/)
  })

  test('needs judgement until its reading is accepted', () => {
    const [, after] = stages(twoPours({ anchors: FOUR, readings: ['en-joint-strip'] }))
    expect(after).toMatchObject({ status: 'needs-judgement', statusOnceAccepted: 'over' })
  })
})

test('both pours see the joint; nothing crosses a movement joint', () => {
  expect(checks(twoPours({ anchors: FOUR }), 'P2').map(({ name }) => name)).toEqual(
    checks(twoPours({ anchors: FOUR })).map(({ name }) => name),
  )
  expect(checks(twoPours({ anchors: FOUR, kind: 'movement' }))).toEqual([])
})
