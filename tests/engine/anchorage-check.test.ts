import { describe, expect, test } from 'vitest'
import { checkPour, type Compared, type Steel, type SteelShape, type SteelZone } from '@wedgeline/engine'
import { anchor, edge, EDGES, inPan, layout, length, pan, S4, SOUTH, type Parts } from './sample-layout'
import { evaluated } from './step-text'

/**
 * EN 1992-1-1 8.4, 8.7 (digest; Table 8.2, alpha 6 and Fig. 8.5 from memory), gamma C 1.5, bars of 12.
 * 22 MPa, last stage: fctk 0.7 x 0.3 x 22^(2/3) = 1.6488, fbd 2.25 x 1.6488 / 1.5 = 2.4732 MPa.
 * At 300 MPa: lb = 3 x 300 / 2.4732 = 363.9, least max(0.3 lb, 10 d, 100) = 120.
 */
const BARE = { ...S4, localSteel: null }
let made = 0
const set = (zone: SteelZone, shape: SteelShape): Steel => ({
  id: `s${++made}`,
  pourId: 'P1',
  zone,
  shape,
  source: 'by-hand',
  isLocked: false,
})
const AT: SteelZone = { kind: 'anchor', anchorId: 'E2-1' }

function checksOf(zoneId: string, parts: Parts): Compared[] {
  const anchors = [1, 2, 3].map((number) => anchor('E2', number, { chainage: 4000 * number }))
  const of = layout({ hardware: [BARE], anchors, ...parts })
  const result = checkPour(of, { pourId: 'P1', withSteps: true })
  const zone = result.zones.find((one) => one.zone.id === zoneId)
  expect(zone?.notYetChecked).not.toContain('anchorage')
  return (zone?.checks ?? []).filter(
    (check): check is Compared => check.family === 'anchorage' && check.kind === 'compared',
  )
}
const only = (zoneId: string, steel: readonly Steel[], parts: Parts = {}): Compared => {
  const [check, ...more] = checksOf(zoneId, { steel, ...parts })
  if (!check || more.length > 0) throw new Error(`${more.length + 1} checks`)
  for (const line of check.steps) expect(evaluated(line)).toBeCloseTo(line.value, 9)
  return check
}

const transverse = (length: number): SteelShape => ({
  kind: 'transverse-bars',
  diameter: 12,
  length,
  count: 4,
  layers: 'both',
  first: 100,
  pitch: 100,
})
const hairpins = (leg: number): SteelShape => ({
  kind: 'hairpins',
  diameter: 10,
  leg,
  bend: 140,
  count: 2,
  lies: 'upright',
  first: 50,
  pitch: 200,
})
const links = (hook: number): SteelShape => ({
  kind: 'links',
  diameter: 10,
  width: 300,
  height: 140,
  hook,
  count: 4,
  first: 30,
  pitch: 50,
})
const edgeBars = (from: number, to: number): SteelShape => ({
  kind: 'edge-bars',
  diameter: 12,
  countTop: 1,
  countBottom: 1,
  first: 165,
  pitch: 100,
  from,
  to,
})

describe('bars behind an anchor', () => {
  test('transverse bars count from 120 past the line on, and not 1 mm below', () => {
    const on = only('anchor:E2-1', [set(AT, transverse(240))])
    expect(on).toMatchObject({ demand: 120, limit: 120, status: 'within' })
    // 120 / 363.9 = 0.33
    expect(on.notes).toEqual([
      'Counts against bursting in plan with 0.33 of its area: 364 would develop it in full, 120 is the least.',
    ])
    const below = only('anchor:E2-1', [set(AT, transverse(238))])
    expect(below).toMatchObject({ demand: 119, status: 'over', spare: -1 })
    expect(below.notes).toEqual(['Does not count against bursting in plan: 120 is the least.'])
  })

  test('at 364 past the line they count in full: nothing to say', () => {
    expect(only('anchor:E2-1', [set(AT, transverse(728))]).notes).toEqual([])
    expect(only('anchor:E2-1', [set(AT, transverse(726))]).notes).toHaveLength(1)
  })

  test('of two sets the one with less to spare is shown', () => {
    expect(only('anchor:E2-1', [set(AT, transverse(900)), set(AT, transverse(600))]).demand).toBe(300)
  })

  test('legs of hairpins of 10: 2.5 x 300 / 2.4732 = 303.3 past r 20 and d 10', () => {
    // leg 334: 304 straight; leg 333: 303
    expect(only('anchor:E2-1', [set(AT, hairpins(334))]).status).toBe('within')
    const short = only('anchor:E2-1', [set(AT, hairpins(333))])
    expect(short.status).toBe('over')
    expect(short.limit).toBeCloseTo(303.3, 1)
  })

  test('hooks of links of 10: 10 d = 100 straight past the bend (8.5, Fig. 8.5, from memory)', () => {
    // 130 - 20 - 10 = 100
    expect(only('anchor:E2-1', [set(AT, links(130))])).toMatchObject({ demand: 100, limit: 100, status: 'within' })
    expect(only('anchor:E2-1', [set(AT, links(129))]).status).toBe('over')
  })

  test('edge bars that end near an anchor are advice, without a status', () => {
    const edge: SteelZone = { kind: 'edge', edgeId: 'E2' }
    expect(checksOf('anchor:E2-1', { steel: [set(edge, edgeBars(3900, 15_000))] })).toEqual([])
    const of = layout({
      hardware: [BARE],
      anchors: [anchor('E2', 1, { chainage: 4000 })],
      steel: [set(edge, edgeBars(3900, 15_000))],
    })
    const zone = checkPour(of, { pourId: 'P1' }).zones.find(({ zone: { id } }) => id === 'anchor:E2-1')
    expect(zone?.checks.filter(({ family }) => family === 'anchorage')).toMatchObject([
      { kind: 'advice', measured: 100, usual: '364 or more', isUsual: false },
    ])
  })
})

describe('laps of edge bars', () => {
  const EDGE: SteelZone = { kind: 'edge', edgeId: 'E2' }

  // At 434.78 MPa: lb,rqd 3 x 434.78 / 2.4732 = 527.4; cd 30: alpha 2 0.775; all lapped: 1.5: l0 = 613.1
  test('two sets: 614 of overlap is enough, 613 is not', () => {
    const lap = (overlap: number) =>
      only('edge:E2', [set(EDGE, edgeBars(50, 9000)), set(EDGE, edgeBars(9000 - overlap, 17_000))])
    expect(lap(614)).toMatchObject({ name: 'Laps of edge bars', status: 'within', demand: 614 })
    expect(lap(613)).toMatchObject({ status: 'over' })
    expect(lap(613).limit).toBeCloseTo(613.1, 1)
    expect(lap(613).clause.tag).toBe('memory')
  })

  // 520 deep: top bars above the lower 250, poor bond: 613.1 / 0.7 = 875.8 (Fig. 8.2, from memory)
  test('in a deep edge bars at the top need the lap of poor bond, bars at the bottom alone do not', () => {
    const deep = edge(SOUTH, 'a', [length(0, 19_200, { soffit: -300 })])
    const lap = (overlap: number, countTop: number) => {
      const sets = [edgeBars(50, 9000), edgeBars(9000 - overlap, 17_000)].map((shape) => ({ ...shape, countTop }))
      const steel = sets.map((shape) => set(EDGE, shape as SteelShape))
      return only('edge:E2', steel, { edges: [deep, ...EDGES.slice(1)] })
    }
    expect(lap(876, 1)).toMatchObject({ status: 'within', demand: 876 })
    expect(lap(875, 1).status).toBe('over')
    expect(lap(875, 1).notes).toContain('Poor bond is taken: these bars lie high in a deep section.')
    expect(lap(614, 0)).toMatchObject({ status: 'within', demand: 614 })
    expect(lap(613, 0).status).toBe('over')
    expect(lap(614, 0).notes.join()).not.toContain('Poor bond')
  })

  test('sets that do not overlap, or lie at another depth, are not lapped', () => {
    expect(checksOf('edge:E2', { steel: [set(EDGE, edgeBars(50, 9000)), set(EDGE, edgeBars(9000, 17_000))] })).toEqual(
      [],
    )
    const deeper = { ...edgeBars(8000, 17_000), first: 265 } as SteelShape
    expect(checksOf('edge:E2', { steel: [set(EDGE, edgeBars(50, 9000)), set(EDGE, deeper)] })).toEqual([])
  })

  test('bars split at the stock length are lapped by 615 or more, clear of the anchors', () => {
    const check = only('edge:E2', [set(EDGE, edgeBars(50, 19_150))])
    expect(check).toMatchObject({ name: 'Laps of split edge bars', status: 'within' })
    expect(check.demand).toBeGreaterThanOrEqual(615)
    expect(check.notes.join()).not.toContain('No place clear')
  })
})

describe('bars round a pan', () => {
  const PAN: SteelZone = { kind: 'pan', panId: 'PN1' }
  const parts: Parts = { anchors: [inPan('PN1')], pans: [pan('PN1', { x: 9000, y: 9000 })] }
  const bars = (kind: 'trimmers' | 'diagonals', length: number): SteelShape => ({
    kind,
    diameter: 12,
    length,
    count: 2,
    layers: 'both',
    runs: 'along',
    pitch: 100,
  })
  /** 32 MPa: fctk 0.7 x 0.3 x 32^(2/3) = 2.1167, fbd 3.175; lb,rqd = 3 x 434.78 / 3.175 = 410.8, least 123.2. */
  test('trimmers of a recess of 1000: (l - 1000) / 2 past each end', () => {
    expect(only('pan:PN1', [set(PAN, bars('trimmers', 1248))], parts)).toMatchObject({ demand: 124, status: 'within' })
    expect(only('pan:PN1', [set(PAN, bars('trimmers', 1246))], parts)).toMatchObject({ demand: 123, status: 'over' })
  })

  test('diagonal bars develop half their length in full: 822 is enough, 821 is not', () => {
    expect(only('pan:PN1', [set(PAN, bars('diagonals', 822))], parts).status).toBe('within')
    expect(only('pan:PN1', [set(PAN, bars('diagonals', 821))], parts).status).toBe('over')
  })
})
