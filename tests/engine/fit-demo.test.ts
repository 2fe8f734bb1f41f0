import { toEngine } from '@wedgeline/contract'
import { checkPour, type Compared } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'

const demo = toEngine(demoLayout())
const fits = demo.pours
  .flatMap(({ id }) => checkPour(demo, { pourId: id }).zones)
  .flatMap(({ checks }) =>
    checks.filter((check): check is Compared => check.family === 'fit' && check.kind === 'compared'),
  )

const found = (zoneId: string, name: RegExp) => {
  const check = fits.find((one) => one.zoneId === zoneId && name.test(one.name))
  if (!check) throw new Error(`No ${String(name)} at ${zoneId}`)
  return { status: check.status, there: Number(check.demand.toFixed(3)), asked: check.limit }
}

describe('planted faults of the demo (from the demo as it was drawn up)', () => {
  test.each([
    // F5: centre 140 above the soffit of the beam, spiral 230 outside: 140 - 115 = 25 of 40 + link 10.
    { zone: 'anchor:EB2-T1S', name: /^Spiral of E2-P2-08 to soffit/, status: 'over', there: 25, asked: 50 },
    { zone: 'anchor:EB2-T2S', name: /^Spiral of E2-P2-09 to soffit/, status: 'over', there: 25, asked: 50 },
    // F1: centre 55 above the soffit, links 140 high: 55 - 70 = -15.
    { zone: 'anchor:L1P1-E03W', name: /^Links of E1-05 to soffit/, status: 'stop', there: -15, asked: 30 },
  ])('$zone: $there of $asked is $status', ({ zone, name, ...figures }) => {
    expect(found(zone, name)).toEqual(figures)
  })

  // F7: 120 from the re-entrant edge, links 300 wide: 120 - 150 = -30. The tendon is skewed by 0.44 degrees: the last
  // link, 185 behind the face, stands 185 sin 0.44 = 1.4 nearer or farther, the first one 30 sin 0.44 = 0.2.
  test('links at the re-entrant edge end 30 outside', () => {
    const { status, there, asked } = found('anchor:L2P3-N08N', /^Links of E7-N-08 to edge E7-ER/)
    expect({ status, asked }).toEqual({ status: 'stop', asked: 30 })
    expect(Math.abs(there + 30)).toBeLessThan(1.4)
  })

  // F6: 300 apart, links 300 wide; one of the two is skewed by 0.61 degrees: 30 sin 0.61 = 0.3.
  test.each(['anchor:L1P1-E05W', 'anchor:L1P1-E06W'])('links touch at %s', (zone) => {
    const { status, there, asked } = found(zone, /^Clear gap, links of E1-07 and links of E1-08/)
    expect({ status, asked }).toEqual({ status: 'over', asked: 25 })
    expect(Math.abs(there)).toBeLessThan(0.4)
  })
})

/** Where the fit is short besides, and why. */
const REASONS: Readonly<Record<string, string>> = {
  'anchor:EB2-T1S': 'F5',
  'anchor:EB2-T2S': 'F5',
  'anchor:L1P1-E03W': 'F1',
  'anchor:L1P1-E05W': 'F6',
  'anchor:L1P1-E06W': 'F6',
  'anchor:L2P3-N08N': 'F7',
  'edge:E2-P2': 'F5: lowered by 80 the spiral takes the place of the bottom edge bar',
  'edge:E3': 'F5: lowered by 80 the pocket takes the place of the end of the bottom edge bar',
  'edge:E7-ER': 'F7: moved towards the edge the pocket takes the place of its edge bars',
  'edge:E4-P1': 'F2: moved towards the wall the recess takes the place of the top edge bar',
  'pan:PN03': 'F2: the same',
}

test('no other zone is over or a stop', () => {
  const short = fits.filter(({ status }) => status !== 'within').map(({ zoneId }) => zoneId)
  expect([...new Set(short)].sort()).toEqual(Object.keys(REASONS).sort())
})

test('a second transverse bar 230 behind the first would stand 5 from the inner side of the beam: 600 - 590 - 5', () => {
  // 110 set-back + 250 + 230 = 590; the demo has them at 260, past the side.
  const steel = demo.steel.map((one) =>
    one.shape.kind === 'transverse-bars' ? { ...one, shape: { ...one.shape, pitch: 230 } } : one,
  )
  const beam = checkPour({ ...demo, steel }, { pourId: 'P1', edgeId: 'E2-P1' })
    .zones.flatMap(({ checks }) => checks)
    .find(({ name }) => name.startsWith('Transverse bar of E2-P1-01 to side of EB1'))
  expect(beam).toMatchObject({ status: 'over', limit: 50 })
  expect(beam?.kind === 'compared' && Number(beam.demand.toFixed(3))).toBe(5)
})

test('every anchor at an edge shows that the fit of its steel was checked', () => {
  const checked = new Set(fits.map(({ zoneId }) => zoneId))
  const without = demo.anchors.filter(({ id }) => !checked.has(`anchor:${id}`))
  expect(without).toEqual([])
})
