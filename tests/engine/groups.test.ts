import { checkPour, type Anchor, type Check, type Layout, type Steel, type SteelShape } from '@wedgeline/engine'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { accepted, compared } from './anchor-checks'
import { anchor, EDGES, layout, length, twoPours, type Parts } from './sample-layout'

const F = 1.2 * 4 * 0.8 * 184_000
const A12 = (Math.PI * 12 ** 2) / 4

const pair = (apart: number, parts: Parts = {}, change: Partial<Anchor> = {}): Layout =>
  layout({
    anchors: [
      anchor('E4', 1, { chainage: 4000 }),
      anchor('E4', 2, { chainage: 9000 }),
      anchor('E4', 3, { chainage: 9000 + apart, ...change }),
      anchor('E4', 4, { chainage: 14_000 }),
    ],
    ...parts,
  })

const zonesOf = (of: Layout) => checkPour(of, { pourId: 'P1', withSteps: true }).zones
const groupsOf = (of: Layout) => zonesOf(of).filter(({ zone }) => zone.kind === 'group')
const at = (of: Layout, zoneId: string, family: Check['family'] = 'bursting-plan'): Check => {
  const check = zonesOf(accepted(of))
    .find(({ zone }) => zone.id === zoneId)
    ?.checks.find((one) => one.family === family)
  if (!check) throw new Error(`No ${family} at ${zoneId}`)
  return check
}

const bars = (anchorId: string, change: Partial<SteelShape> = {}): Steel => ({
  id: `bars-${anchorId}`,
  pourId: 'P1',
  zone: { kind: 'anchor', anchorId },
  shape: {
    kind: 'transverse-bars',
    diameter: 12,
    length: 4000,
    count: 20,
    layers: 'both',
    first: 150,
    pitch: 150,
    ...change,
  } as SteelShape,
  source: 'by-hand',
  isLocked: false,
})

describe('The zone of anchors that act as one', () => {
  test('has an id from its members, whatever the order of the list, and a name that people use', () => {
    const of = pair(400)
    expect(groupsOf(of).map(({ zone }) => zone)).toMatchObject([
      { id: 'group:E4-2:E4-3', name: 'E4-02 to 03 together', edgeId: 'E4', from: 8890, to: 9510 },
    ])
    expect(groupsOf({ ...of, anchors: [...of.anchors].reverse() }).map(({ zone }) => zone.id)).toEqual([
      'group:E4-2:E4-3',
    ])
  })

  test('numbers that are left out between are not said', () => {
    const of = pair(400)
    const anchors = of.anchors.map((one) => (one.number === 3 ? { ...one, number: 7 } : one))
    expect(groupsOf({ ...of, anchors }).map(({ zone }) => zone.name)).toEqual(['E4-02, 07 together'])
  })

  test('is there only while they are close: 0.3 of the prism, 0.3 * 5000', () => {
    // Centre 9250 + ...; with 5000 to both sides 2 * min(l1, l2) is 5000 at the most: 1500.
    expect(groupsOf(pair(1000))).toHaveLength(1)
    expect(groupsOf(pair(1600))).toHaveLength(0)
  })
})

describe('Bursting of the group in plan: one plate from out to out with all the force', () => {
  test('its prism runs to the middle of the outer gaps', () => {
    // Members at 9000 and 9400: centre 9200; outer middles at 6500 and 11700; b = 2 * 2500 = 5000 by the nearer.
    // a = 400 + 220; T = 0.25 * 2 F * (5000 - 620) / 5000
    const check = compared(at(pair(400), 'group:E4-2:E4-3'))
    expect(check.steps.find(({ symbol }) => symbol === 'b')?.value).toBe(5000)
    expect(check.demand).toBeCloseTo((0.25 * 2 * F * (5000 - 620)) / 5000 / 300, 6)
  })

  test('a member is checked alone with its own prism, as a stage of stressing', () => {
    // 9000 to the middles at 6500 and 11700: b = 2 * 2500; a = 220.
    const check = compared(at(pair(400), 'anchor:E4-2'))
    expect(check.demand).toBeCloseTo((0.25 * F * (5000 - 220)) / 5000 / 300, 6)
    expect(check.notes.join(' ')).toContain('Checked alone here')
    expect(check.notes.join(' ')).toContain('E4-02 to 03 together')
  })

  test('it asks for more than either member alone, and for less than both alone together', () => {
    const group = compared(at(pair(400), 'group:E4-2:E4-3')).demand
    const alone = ['anchor:E4-2', 'anchor:E4-3'].map((id) => compared(at(pair(400), id)).demand)
    expect(group).toBeGreaterThan(Math.max(...alone))
    expect(group).toBeLessThan(alone.reduce((sum, one) => sum + one, 0))
  })

  test('a cage of links behind each does not carry it: links do not cross the line between', () => {
    const check = compared(at(pair(400), 'group:E4-2:E4-3'))
    expect(check).toMatchObject({ status: 'over', limit: 0 })
    expect(check.notes.join(' ')).toContain('200 beside the middle of the group')
  })

  test('transverse bars of its members count where they cross the line of the resultant', () => {
    // At 150, 300, ..., 3000 behind the face; in 1000 to 5000: 1050 to 3000, 14 places, two bars each, two members.
    const of = pair(400, { steel: [bars('E4-2'), bars('E4-3')] })
    const check = compared(at(of, 'group:E4-2:E4-3'))
    expect(check.limit).toBeCloseTo(2 * 14 * 2 * A12, 4)
    // 2 F: 0.25 * 1413.12 kN * 0.876 / 300 = 1031.6 mm2 against 6333 mm2
    expect(check.status).toBe('within')
  })

  test('a bar too short to reach past it does not count', () => {
    // Half of 620 less 200 aside leaves 110 past the line, under the least of 120 (10 diameters).
    const of = pair(400, { steel: [bars('E4-2', { length: 620 }), bars('E4-3', { length: 620 })] })
    expect(compared(at(of, 'group:E4-2:E4-3')).limit).toBe(0)
  })

  test('bars along the edge count once', () => {
    const along = (steelId: string): Steel => ({
      ...bars('x'),
      id: steelId,
      zone: { kind: 'edge', edgeId: 'E4' },
      shape: {
        kind: 'edge-bars',
        diameter: 12,
        countTop: 3,
        countBottom: 3,
        first: 1300,
        pitch: 200,
        from: 100,
        to: 19_100,
      },
    })
    // Bearing face 110 in: 1190, 1390, 1590 behind it, in 1000 to 5000.
    expect(compared(at(pair(400, { steel: [along('e')] }), 'group:E4-2:E4-3')).limit).toBeCloseTo(6 * A12, 6)
  })

  test.each([
    // Out to out 405 + 220 = 625; centre 317.5, prism 635.
    { first: 115, kind: 'compared' },
    // The first plate touches the end of the edge: 410 + 220 = 630, and 2 * 315 = 630.
    { first: 110, kind: 'refused' },
  ])('from $first to 520 beside the end of the edge: $kind', ({ first, kind }) => {
    const anchors = [first, 520, 4000].map((chainage, i) => anchor('E4', i + 1, { chainage }))
    const check = at(layout({ anchors }), 'group:E4-1:E4-2')
    expect(check.kind).toBe(kind)
    if (check.kind === 'refused') expect(check).toMatchObject({ code: 'OUTSIDE_METHOD', field: 'chainage' })
  })

  test('in the other plane its members stand alone and the group says nothing', () => {
    const zone = groupsOf(pair(400))[0]
    expect(zone?.checks.some(({ family }) => family === 'bursting-thickness')).toBe(false)
    expect(at(pair(400), 'anchor:E4-2', 'bursting-thickness').kind).toBe('compared')
  })
})

describe('One above the other', () => {
  const deep = EDGES.map((one) => (one.id === 'E4' ? { ...one, lengths: [length(0, 19_200, { soffit: -480 })] } : one))
  const stacked = (apart: number) =>
    layout({
      edges: deep,
      anchors: [
        anchor('E4', 1, { chainage: 9000, height: -130 - apart / 2 }),
        anchor('E4', 2, { chainage: 9000, height: -130 + apart / 2 }),
      ],
    })

  test('closer than 0.3 D = 210 they act as one in the thickness too, in one zone', () => {
    // Centre at -130, the middle of 220 and -480: b = 700; a = 200 + 80; T = 0.25 * 2 F * 420 / 700
    const groups = groupsOf(stacked(200))
    expect(groups).toHaveLength(1)
    const check = compared(at(stacked(200), 'group:E4-1:E4-2', 'bursting-thickness'))
    expect(check.demand).toBeCloseTo((0.25 * 2 * F * 420) / 700 / 300, 6)
  })

  test('210 apart they do not, though they do in plan: one plate wide, twice the force', () => {
    const checks = groupsOf(accepted(stacked(210)))[0]?.checks ?? []
    expect(checks.some(({ family }) => family === 'bursting-thickness')).toBe(false)
    const check = compared(at(stacked(210), 'group:E4-1:E4-2'))
    // 9000 to the nearer end of the edge: b = 18 000; a = 220.
    expect(check.demand).toBeCloseTo((0.25 * 2 * F * (18_000 - 220)) / 18_000 / 300, 6)
  })

  test('three in a stack, each 200 from the next, are one group', () => {
    const anchors = [-330, -130, 70].map((height, i) => anchor('E4', i + 1, { chainage: 9000, height }))
    const groups = groupsOf(layout({ edges: deep, anchors }))
    expect(groups.map(({ zone }) => zone.id)).toEqual(['group:E4-1:E4-2:E4-3'])
  })
})

describe('Across a pour boundary', () => {
  const across = (beyond: number) =>
    layout(
      twoPours([
        anchor('E2', 1, { chainage: 16_000 }),
        anchor('E2', 2, { chainage: 19_000 }),
        anchor('E2-P2', 1, { chainage: beyond, castWithPourId: 'P2' }),
        anchor('E2-P2', 2, { chainage: 23_000, castWithPourId: 'P2' }),
      ]),
    )

  test('a pair that would act as one with the next pour cast is said and not covered', () => {
    // 400 under 2 * 220 = 440
    const check = at(across(19_400), 'anchor:E2-2')
    expect(check).toMatchObject({ status: 'not-covered', code: 'ANCHORS_ACT_AS_ONE' })
    expect(check.kind === 'refused' && check.message).toContain('E2-01 of the next pour')
  })

  test('further away each is checked with both prisms', () => {
    expect(at(across(20_400), 'anchor:E2-2').kind).toBe('compared')
  })
})

describe('Properties', () => {
  const chainages = fc.uniqueArray(fc.integer({ min: 2, max: 60 }), { minLength: 2, maxLength: 8 })

  test('mirrored along the edge a group asks for the same steel', () => {
    const demands = (places: readonly number[]) =>
      groupsOf(layout({ anchors: places.map((chainage, i) => anchor('E4', i + 1, { chainage })) }))
        .flatMap(({ checks }) => checks.filter(({ family }) => family === 'bursting-plan'))
        .map((check) => (check.kind === 'compared' ? check.demand.toFixed(4) : check.kind))
        .sort()
    fc.assert(
      fc.property(chainages, (places) => {
        const at300 = places.map((place) => place * 300)
        expect(demands(at300.map((place) => 19_200 - place))).toEqual(demands(at300))
      }),
      { numRuns: 25 },
    )
  })

  test('a refusal never turns into within when its readings are accepted', () => {
    fc.assert(
      fc.property(chainages, (places) => {
        const of = layout({ anchors: places.map((place, i) => anchor('E4', i + 1, { chainage: place * 300 })) })
        const refused = (one: Layout) =>
          zonesOf(one).flatMap(({ zone, checks }) =>
            checks.filter(({ kind }) => kind === 'refused').map((check) => `${zone.id} ${check.family} ${check.name}`),
          )
        expect(refused(accepted(of))).toEqual(refused(of))
      }),
      { numRuns: 10 },
    )
  })

  test('more force on one member never asks for less steel of the group', () => {
    const ratio = fc.double({ min: 0.3, max: 0.8, noNaN: true })
    const with3 = (jackingRatio: number) => {
      const of = pair(400)
      return { ...of, tendons: of.tendons.map((tendon) => ({ ...tendon, jackingRatio })) }
    }
    fc.assert(
      fc.property(ratio, ratio, (one, other) => {
        const steel = (r: number) => compared(at(with3(r), 'group:E4-2:E4-3')).demand
        expect(steel(Math.max(one, other))).toBeGreaterThanOrEqual(steel(Math.min(one, other)))
      }),
      { numRuns: 10 },
    )
  })
})
