import { toEngine } from '@wedgeline/contract'
import { checkPour, type Check, type Compared, type ZoneResult } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'

const demo = toEngine(demoLayout())
const zones = demo.pours.flatMap(({ id }) => checkPour(demo, { pourId: id, withSteps: true }).zones)
const zoneOf = (id: string): ZoneResult => {
  const zone = zones.find((one) => one.zone.id === id)
  if (!zone) throw new Error(`No zone ${id}`)
  return zone
}
const at = (zoneId: string, family: Check['family'], stage?: string): Compared => {
  const check = zoneOf(zoneId).checks.find(
    (one) => one.family === family && (stage === undefined || one.stage === stage),
  )
  if (check?.kind !== 'compared') throw new Error(`${family} of ${zoneId} is ${check?.kind ?? 'missing'}`)
  return check
}

test('each of the 104 anchors is checked in bursting in both planes, and in bearing where a plate bears', () => {
  expect(demo.anchors).toHaveLength(104)
  for (const anchor of demo.anchors) {
    const families = new Set(zoneOf(`anchor:${anchor.id}`).checks.map(({ family }) => family))
    expect(families, anchor.id).toContain('bursting-thickness')
    expect(families, anchor.id).toContain('bursting-plan')
    expect(families.has('bearing'), anchor.id).toBe(anchor.hardwareId !== 'D4')
    expect(families.has('dead-end'), anchor.id).toBe(anchor.end === 'dead')
  }
})

describe('Bearing of the plain plate, as the demo was drawn up', () => {
  test.each(['L1P1-N02N', 'L1P2-N02N', 'L1P2-N08N'])('%s', (id) => {
    const [quarter, full] = [at(`anchor:${id}`, 'bearing', '25 %'), at(`anchor:${id}`, 'bearing', 'full')]
    expect([full.demand, full.limit, full.utilisation].map((value) => value?.toFixed(3))).toEqual([
      '20.991',
      '26.889',
      '0.781',
    ])
    expect(quarter.demand).toBeCloseTo(5.25, 2)
    expect(quarter.limit).toBeCloseTo(11, 6)
    expect(quarter.utilisation).toBeCloseTo(0.477, 3)
  })
})

test('all eight pans stand within their approval, so that no formula decides there', () => {
  for (const { id, panId } of demo.anchors.filter((anchor) => anchor.panId !== null)) {
    expect(at(`anchor:${id}`, 'bearing', 'full'), panId ?? '').toMatchObject({ limitKind: 'H', status: 'within' })
  }
})

test('48 bonded dead ends: 1228 by the hardware against 1227.7 (EN 1992-1-1 8.10.2.2, from memory)', () => {
  const dead = demo.anchors.filter(({ end }) => end === 'dead')
  expect(dead).toHaveLength(48)
  for (const { id } of dead) {
    const check = at(`anchor:${id}`, 'dead-end')
    expect(check).toMatchObject({ demand: 1228, statusOnceAccepted: 'within', status: 'needs-judgement' })
    expect(check.limit).toBeCloseTo(1227.7, 1)
  }
})

describe('Anchors that act as one', () => {
  test('each edge beam has its pair at both ends', () => {
    const pairs = zones.filter(({ zone }) => zone.kind === 'group' && zone.id.includes('EB'))
    expect(pairs.map(({ zone }) => zone.id).sort()).toEqual([
      'group:EB1-T1E:EB1-T2E',
      'group:EB1-T1W:EB1-T2W',
      'group:EB2-T1N:EB2-T2N',
      'group:EB2-T1S:EB2-T2S',
    ])
  })

  test('the pair of EB1 at 170 and 430, plates 170: out to out 430 in a prism of 600', () => {
    // 14 strands of 184 kN at 0.8: 2060.8 kN; 0.25 * 1.2 * 2060.8 * (600 - 430) / 600 / 0.3 = 583.9 mm2
    expect(at('group:EB1-T1W:EB1-T2W', 'bursting-plan').demand).toBeCloseTo(
      (0.25 * 1.2 * 2_060_800 * 170) / 600 / 300,
      6,
    )
  })

  test('in the thickness the anchors of EB1 and EB2 stand beside a step in depth and are not covered', () => {
    for (const id of ['EB1-T1W', 'EB1-T2E', 'EB2-T1S', 'EB2-T2N']) {
      expect(zoneOf(`anchor:${id}`).checks).toContainEqual(
        expect.objectContaining({ family: 'depth-change', code: 'DEPTH_CHANGE', status: 'not-covered' }),
      )
    }
  })
})
