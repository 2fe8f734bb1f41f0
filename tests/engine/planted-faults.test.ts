import { toEngine } from '@wedgeline/contract'
import { checkPour, layoutIndex, zonesOfPour, type Check, type Family, type Layout, type Zone } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { zonesOverWithReason } from './planted-faults-reasons'
import { withProposals } from './with-proposals'

/** Faults that were planted in the demo when it was drawn up (invented), each found where it is, with its figure. */

const demo = toEngine(demoLayout())
const index = layoutIndex(demo)
const zones = demo.pours.flatMap(({ id }) => zonesOfPour(index, id))

interface Made {
  readonly zone: Zone
  readonly check: Check
}

const madeIn = (layout: Layout): Made[] =>
  layout.pours.flatMap(({ id }) =>
    checkPour(layout, { pourId: id }).zones.flatMap(({ zone, checks }) => checks.map((check) => ({ zone, check }))),
  )

const made = madeIn(demo)

/** Middle of a zone on its edge line; a demo anchor's own chainage counts from its edge's start. */
const middle = ({ from, to }: Zone): number | null => (from === null || to === null ? null : (from + to) / 2)

interface Fault {
  readonly fault: string
  readonly zoneId: string
  /** Edge or pan mark with the anchor's number, or the gap. */
  readonly mark: string
  readonly chainage: number | null
  readonly family: Family
  readonly name: RegExp
  readonly measured: number
  readonly required: number
  readonly status: 'over' | 'stop'
}

const DESIGN: readonly Fault[] = [
  // F1: 55 above the soffit; links of 110 are 70 below the centre: 55 - 70 = -15; the pocket of 120: 55 - 60 = -5.
  ...[
    { family: 'cover' as const, name: /^Centre above soffit/, measured: 55, required: 75, status: 'over' as const },
    { family: 'fit' as const, name: /^Links .* to soffit/, measured: -15, required: 30, status: 'stop' as const },
    { family: 'cover' as const, name: /^Pocket to soffit/, measured: -5, required: 25, status: 'stop' as const },
  ].map((found) => ({ ...found, fault: 'F1', zoneId: 'anchor:L1P1-E03W', mark: 'E1-05', chainage: 9200 })),
  // F2: 700 in plan to the core wall, 700 / cos 12 deg = 715.6 along the tilted jack; the recess asks for 1000.
  ...[
    {
      family: 'pan-access' as const,
      name: /^Room along the jack/,
      measured: 700 / Math.cos(Math.PI / 15),
      required: 1200,
    },
    { family: 'pan-access' as const, name: /^Slab in front/, measured: 700, required: 1000 },
  ].map((found) => ({
    ...found,
    status: 'stop' as const,
    fault: 'F2',
    zoneId: 'pan:PN03',
    mark: 'PN03 pan',
    chainage: null,
  })),
  // F5, F11: the spiral of 230 round a centre 140 above the soffit: 140 - 115 = 25 against 40 cover + 10 link.
  ...[
    { zoneId: 'anchor:EB2-T1S', mark: 'E2-P2-08', chainage: 33_770 },
    { zoneId: 'anchor:EB2-T2S', mark: 'E2-P2-09', chainage: 34_030 },
  ].flatMap((at) => [
    {
      ...at,
      fault: 'F5',
      family: 'fit' as const,
      name: /^Spiral .* to soffit/,
      measured: 25,
      required: 50,
      status: 'over' as const,
    },
    {
      ...at,
      fault: 'F11',
      family: 'cover' as const,
      name: /^Centre above soffit/,
      measured: 140,
      required: 160,
      status: 'over' as const,
    },
  ]),
  // F6: 15 400 - 15 100 = 300; pockets of 300 touch.
  ...[
    { zoneId: 'anchor:L1P1-E05W', mark: 'E1-07', chainage: 15_100 },
    { zoneId: 'anchor:L1P1-E06W', mark: 'E1-08', chainage: 15_400 },
  ].flatMap((at) => [
    {
      ...at,
      fault: 'F6',
      family: 'spacing' as const,
      name: /^Spacing to E1-0[78]/,
      measured: 300,
      required: 350,
      status: 'over' as const,
    },
    {
      ...at,
      fault: 'F6',
      family: 'cover' as const,
      name: /^Pocket to pocket/,
      measured: 0,
      required: 25,
      status: 'stop' as const,
    },
  ]),
  // F7: 12 600 - 12 480 = 120; the pocket of 300 ends 30 outside.
  ...[
    {
      family: 'spacing' as const,
      name: /^Edge distance to edge E7-ER/,
      measured: 120,
      required: 190,
      status: 'over' as const,
    },
    { family: 'cover' as const, name: /^Pocket to edge E7-ER/, measured: -30, required: 25, status: 'stop' as const },
  ].map((found) => ({ ...found, fault: 'F7', zoneId: 'anchor:L2P3-N08N', mark: 'E7-N-08', chainage: 12_480 })),
]

describe('Design faults of the demo', () => {
  test.each(DESIGN)('$fault at $mark: $family, $measured against $required is $status', (fault) => {
    const zone = zones.find(({ id }) => id === fault.zoneId)
    expect(zone?.name).toBe(fault.mark)
    expect(zone && middle(zone)).toBe(fault.chainage)
    const found = made.find(
      ({ zone: { id }, check }) => id === fault.zoneId && check.family === fault.family && fault.name.test(check.name),
    )?.check
    if (found?.kind !== 'compared') throw new Error(`${fault.fault} is not found.`)
    expect(found.demand).toBeCloseTo(fault.measured, 6)
    expect(found.limit).toBe(fault.required)
    expect(found.status).toBe(fault.status)
  })

  test('F2 stands where the pan was moved to', () => {
    const pan = demo.pans.find(({ id }) => id === 'PN03')
    expect([pan?.x, pan?.y]).toEqual([9650, 16_700])
  })

  test.each([
    // The tendon at 26 800 is left out: 28 550 - 25 050 = 3500. Depth and area as drawn up with the demo.
    { mark: 'E2-P2 gap 04 to 05', zoneId: 'gap:E2-P2:L1P2-N04S:L1P2-N06S', depth: 3891, area: '9.111 m2' },
    { mark: 'E4-P2 gap 04 to 05', zoneId: 'gap:E4-P2:L1P2-N04N:L1P2-N06N', depth: 2407, area: '4.146 m2' },
  ])('F3 at $mark: spacing 3500, wedge $depth deep, $area', ({ mark, zoneId, depth, area }) => {
    const at = made.filter(({ zone }) => zone.id === zoneId)
    expect(at[0]?.zone).toMatchObject({ name: mark, from: 25_050, to: 28_550 })
    const advice = at.flatMap(({ check }) => (check.kind === 'advice' ? [check] : []))
    const spacing = advice.find(({ name }) => name === 'Tendon spacing')
    expect(spacing).toMatchObject({ measured: 3500, usual: 'up to 1800', isUsual: false })
    const wedge = advice.find(({ name }) => name === 'Depth of the edge wedge')
    expect(Math.round(wedge?.measured ?? 0)).toBe(depth)
    expect(wedge?.usual).toContain(area)
  })

  test('F3 is the only gap between tendons of an edge that was not meant to be wide', () => {
    // Bands east-west stand further apart by design; the demo's north-south tendons stand at 1750.
    const wide = made.filter(
      ({ zone, check }) =>
        check.kind === 'advice' && check.name === 'Tendon spacing' && !check.isUsual && /^E[24]-P/.test(zone.name),
    )
    expect(wide.map(({ zone }) => zone.name).sort()).toEqual(['E2-P2 gap 04 to 05', 'E4-P2 gap 04 to 05'])
  })

  test('an edge wedge of a fault asks for steel that is not there once the readings are accepted', () => {
    const steel = made.filter(({ zone, check }) => /N04.:L1P2-N06/.test(zone.id) && check.family === 'edge-wedge')
    const statuses = steel.flatMap(({ check }) => (check.kind === 'compared' ? [check.statusOnceAccepted] : []))
    expect(statuses).toEqual(['over', 'over'])
  })
})

describe('Strengths of the demo, once they are entered', () => {
  const strengths = made.filter(({ check }) => check.family === 'strength')
  const over = strengths.flatMap(({ zone, check }) =>
    check.kind === 'compared' && check.status !== 'within' ? [{ zone, check }] : [],
  )

  test.each([
    { fault: 'F4', name: 'Lowest specimen at 96 h', lowest: 17.2, mean: '17.5' },
    { fault: 'F12', name: 'Lowest specimen at 144 h', lowest: 21.4, mean: '22.3' },
  ])('$fault: $name is $lowest of 22, mean $mean', ({ name, lowest, mean }) => {
    const found = over.find(({ check }) => check.name === name)
    expect(found?.zone.name).toBe('P2 strength at stressing')
    expect(found?.check).toMatchObject({ demand: lowest, limit: 22, status: 'over', stage: 'full' })
    expect(found?.check.notes[0]).toContain(`mean of the set is ${mean} MPa`)
  })

  test('no other set is short', () => {
    expect(over.map(({ check }) => check.name).sort()).toEqual(['Lowest specimen at 144 h', 'Lowest specimen at 96 h'])
    expect(strengths).toHaveLength(5)
  })

  test('none is found while none is entered', () => {
    const without = madeIn({ ...demo, concreteResults: [] })
    expect(without.filter(({ check }) => check.family === 'strength')).toEqual([])
  })
})

test('with all readings accepted and steel proposed, nothing else is over its limit but what is listed with a reason', () => {
  const over = madeIn(withProposals(demo)).filter(
    ({ check }) => check.kind === 'compared' && (check.status === 'over' || check.status === 'stop'),
  )
  const unexplained = over.filter((one) => !zonesOverWithReason.some(({ covers }) => covers(one)))
  expect(unexplained.map(({ zone, check }) => `${zone.id}: ${check.name}`)).toEqual([])
  // What was planted is still found with all the steel in place, and what was open and is mended leaves the list.
  const idle = zonesOverWithReason.filter(({ covers }) => !over.some(covers))
  expect(idle.map(({ reason }) => reason)).toEqual([])
}, 300_000)
