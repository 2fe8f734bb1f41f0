import {
  checkPour,
  type Advice,
  type Anchor,
  type Check,
  type JobSettings,
  type Layout,
  type Pour,
} from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { anchor, layout, SETTINGS } from './sample-layout'
import { allPairs } from './tendon-layout'

/** Live plates on the north edge, dead plates on the south edge at the same places, 17,180 between the faces. */
function across(
  places: readonly number[],
  change: { settings?: Partial<JobSettings>; pour?: Partial<Pour> } = {},
): Layout {
  const anchors = places.flatMap((chainage, i): Anchor[] => [
    anchor('E4', i + 1, { tendonId: `T${i}`, chainage }),
    anchor('E2', i + 1, { tendonId: `T${i}`, chainage, end: 'dead' }),
  ])
  const given = layout({ anchors, pour: change.pour ?? {} })
  const tendons = given.tendons.filter(({ id }, i, all) => all.findIndex((one) => one.id === id) === i)
  return {
    ...given,
    job: { ...given.job, settings: { ...SETTINGS, ...change.settings } },
    tendons: tendons.map((tendon) => ({ ...tendon, length: 17_180, drape: 0 })),
  }
}

const checks = (of: Layout, zoneId: string): readonly Check[] => {
  const zone = checkPour(of, { pourId: 'P1' }).zones.find((one) => one.zone.id === zoneId)
  if (!zone) throw new Error(`No zone ${zoneId}`)
  return zone.checks.filter(({ family }) => family === 'precompression')
}
const advice = (of: Layout, zoneId: string, name: RegExp): Advice => {
  const check = checks(of, zoneId).find((one) => name.test(one.name))
  if (check?.kind !== 'advice') throw new Error(`No advice ${String(name)}`)
  return check
}

// Without friction and draw-in every tendon keeps its 588.8 kN; the edge is 19,200 long and 220 thick.
const kept = { settings: allPairs(0, 0) }
const withoutDrawIn = (of: Layout): Layout => ({ ...of, hardware: of.hardware.map((one) => ({ ...one, drawIn: 0 })) })

describe('Precompression behind an edge', () => {
  const places = [2400, 7200, 12_000, 16_800]

  test('average: 4 x 588,800 / (19,200 x 220) = 0.5576 MPa, below the usual', () => {
    const made = advice(withoutDrawIn(across(places, kept)), 'strip:E4', /average/)
    expect(made.measured).toBeCloseTo((4 * 588_800) / (19_200 * 220), 9)
    expect(made).toMatchObject({ unit: 'MPa', isUsual: false, limitKind: 'P' })
  })

  test('even places: the least is the average', () => {
    const of = withoutDrawIn(across(places, kept))
    expect(advice(of, 'strip:E4', /least/).measured).toBeCloseTo(advice(of, 'strip:E4', /average/).measured, 9)
  })

  test('uneven places: the least is that of the widest share', () => {
    // Shares of 2400, 7200 and 12,000 end at the middles 4800 and 9600; the last takes 9600 to 19,200.
    const of = withoutDrawIn(across(places.slice(0, 3), kept))
    const made = advice(of, 'strip:E4', /least/)
    expect(made.measured).toBeCloseTo(588_800 / (9600 * 220), 9)
    expect(made.name).toContain('E4-03')
  })

  test.each([
    // 588,800 / (w x 220) for one tendon over 19,200 and n of them: n x 0.1394.
    { count: 5, isUsual: false },
    { count: 6, isUsual: true },
    { count: 21, isUsual: true },
    { count: 22, isUsual: false },
  ])('$count tendons: usual $isUsual (0.7 to 3, common practice)', ({ count, isUsual }) => {
    const even = Array.from({ length: count }, (_, i) => ((i + 0.5) * 19_200) / count)
    const made = advice(withoutDrawIn(across(even, kept)), 'strip:E4', /average/)
    expect(made.measured).toBeCloseTo((count * 588_800) / (19_200 * 220), 9)
    expect(made.isUsual).toBe(isUsual)
  })

  test('counts what friction leaves, less by the high pair', () => {
    // Without draw-in, which in a short tendon takes more at the dead end the less friction holds it back.
    const { measured, notes } = advice(withoutDrawIn(across(places)), 'strip:E2', /average/)
    expect(measured).toBeLessThan((4 * 588_800) / (19_200 * 220))
    const high = Number(/^([\d.]+) MPa with the high/.exec(notes[0] ?? '')?.[1])
    expect(high).toBeLessThan(measured)
  })

  test('a band of twice the thickness behind the wedges takes its share of the section', () => {
    // From 0 to 9600 the slab is 440 deep all the way: (9600 x 440 + 9600 x 220) in place of 19,200 x 220.
    const outline = [
      { x: 0, y: 0 },
      { x: 9600, y: 0 },
      { x: 9600, y: 17_400 },
      { x: 0, y: 17_400 },
    ]
    const band = {
      id: 'b',
      mark: 'B1',
      kind: 'band',
      outline,
      top: 220,
      soffit: -220,
      cover: 30,
      linkDiameter: 0,
    } as const
    const of = withoutDrawIn(across(places, { ...kept, pour: { regions: [band] } }))
    const measured = (4 * 588_800) / (9600 * 440 + 9600 * 220)
    expect(advice(of, 'strip:E4', /average/).measured).toBeCloseTo(measured, 9)
  })

  test('a tendon says what it brings to its own width at each end', () => {
    const of = withoutDrawIn(across(places, kept))
    const names = checks(of, 'tendon:T1').map(({ name }) => name)
    expect(names.sort()).toEqual(['Precompression over its width behind E2', 'Precompression over its width behind E4'])
  })

  test('is not covered where the force of one tendon is not known, and none is counted as 0', () => {
    const given = across(places)
    const of = { ...given, tendons: given.tendons.map((one, i) => (i === 1 ? { ...one, drape: null } : one)) }
    expect(checks(of, 'strip:E4')).toEqual([
      expect.objectContaining({ kind: 'refused', code: 'MISSING_INPUT', field: 'tendon.drape' }),
    ])
    expect(checks(of, 'tendon:T0')[0]).toMatchObject({ kind: 'refused', code: 'MISSING_INPUT' })
  })

  test('an edge at which no tendon ends has no strip', () => {
    const zones = checkPour(across(places), { pourId: 'P1' }).zones.map(({ zone }) => zone)
    expect(zones.filter(({ kind }) => kind === 'strip').map(({ name }) => name)).toEqual(['E2 strip', 'E4 strip'])
  })
})
