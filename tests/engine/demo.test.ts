import { toEngine } from '@wedgeline/contract'
import { checkPour, type Compared, type Layout, type ZoneResult } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { scaled } from './scaled'
import { evaluated } from './step-text'

const demo = toEngine(demoLayout())
const zonesOf = (layout: Layout): ZoneResult[] =>
  layout.pours.flatMap(({ id }) => checkPour(layout, { pourId: id, withSteps: true }).zones)
const comparedIn = (zones: readonly ZoneResult[]): Compared[] =>
  zones.flatMap(({ checks }) => checks.filter((check) => check.kind === 'compared'))
const zones = zonesOf(demo)
const compared = comparedIn(zones)

test('every step of every check has a text that evaluates to the value beside it', () => {
  const steps = compared.flatMap((check) => check.steps)
  expect(new Set(compared.map(({ family }) => family)).size).toBeGreaterThanOrEqual(7)
  for (const line of steps) {
    const difference = Math.abs(evaluated(line) - line.value)
    expect(difference, `${line.symbol} = ${line.formula}`).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(line.value)))
  }
})

test('lengths x 2 and forces x 4 leave every ratio and every status of a distance', () => {
  // Bursting in plan and the face aside: EN 8.4 has lengths in mm of its own (250 for good bond, 100 at the least).
  // The fit aside: aggregate, bar sizes and what counts as touching stay as they are.
  // Anchorage and laps aside: bars above 16 bend by 3.5 diameters, up to 16 by 2 (EN 1992-1-1 Table 8.1N); a bar of 10
  // is one of 20 here. Their least lengths are in mm as well (8.4.4: 100, 8.7.3: 200).
  const aside = ['bursting-plan', 'spalling', 'fit', 'anchorage']
  const shown = (layout: Layout) =>
    comparedIn(zonesOf(layout))
      .filter(({ family }) => !aside.includes(family))
      .map((check) => [check.zoneId, check.name, check.stage, check.status, check.utilisation?.toFixed(9)].join(' '))
  expect(shown(scaled(demo, 2)).sort()).toEqual(shown(demo).sort())
})

test('no message and no note holds a word of code', () => {
  const said = zones.flatMap(({ checks }) =>
    checks.flatMap((check) => [...check.notes, ...(check.kind === 'refused' ? [check.message] : [])]),
  )
  expect(said.length).toBeGreaterThan(100)
  // kN is the only word that goes on with a capital.
  const isCode = (text: string) => /\b(?!kN\b)[a-z]+[A-Z]|\ben-[a-z]|_|\bnull\b|\bundefined\b|NaN|Infinity/.test(text)
  expect(said.filter(isCode)).toEqual([])
})

describe('The planted faults are found, each with its figures (from the demo as it was drawn up)', () => {
  const found = (anchorId: string, name: RegExp) => {
    const check = compared.find((one) => one.zoneId === `anchor:${anchorId}` && name.test(one.name))
    if (!check) throw new Error(`No ${String(name)} at ${anchorId}`)
    return { status: check.status, demand: Number(check.demand.toFixed(6)), limit: check.limit }
  }

  test.each([
    // 55 above the soffit; the pocket of 120 then ends 5 below it: 55 - 60.
    { anchorId: 'L1P1-E03W', name: /^Centre above soffit/, status: 'over', demand: 55, limit: 75 },
    { anchorId: 'L1P1-E03W', name: /^Pocket to soffit/, status: 'stop', demand: -5, limit: 25 },
    // 300 apart; their pockets of 300 touch: 300 - 150 - 150.
    { anchorId: 'L1P1-E05W', name: /^Spacing to/, status: 'over', demand: 300, limit: 350 },
    { anchorId: 'L1P1-E06W', name: /^Pocket to pocket/, status: 'stop', demand: 0, limit: 25 },
    // 120 from the re-entrant edge; the pocket ends 30 beyond it: 120 - 150.
    { anchorId: 'L2P3-N08N', name: /^Edge distance to edge E7-ER/, status: 'over', demand: 120, limit: 190 },
    { anchorId: 'L2P3-N08N', name: /^Pocket to edge E7-ER/, status: 'stop', demand: -30, limit: 25 },
    { anchorId: 'EB2-T1S', name: /^Centre above soffit/, status: 'over', demand: 140, limit: 160 },
    { anchorId: 'EB2-T2S', name: /^Centre above soffit/, status: 'over', demand: 140, limit: 160 },
  ])('$anchorId: $demand of $limit is $status', ({ anchorId, name, ...figures }) => {
    expect(found(anchorId, name)).toEqual(figures)
  })

  test('no other distance of an anchor is short', () => {
    const short = compared.filter(
      ({ compares, family, statusOnceAccepted }) =>
        compares === 'at-least' && family !== 'fit' && statusOnceAccepted !== 'within',
    )
    const planted = ['L1P1-E03W', 'L1P1-E05W', 'L1P1-E06W', 'L2P3-N08N', 'EB2-T1S', 'EB2-T2S']
    // The pour's strengths are short as well: 17.2 and 21.4 of 22.
    const zoneIds = [...planted.map((id) => `anchor:${id}`), 'pan:PN03', 'pour:P2']
    expect([...new Set(short.map(({ zoneId }) => zoneId))].sort()).toEqual(zoneIds.sort())
  })

  test('their approvals no longer cover them, and no other anchor is outside its approval', () => {
    const outside = zones.filter(({ checks }) =>
      checks.some((check) => check.kind === 'refused' && check.code === 'OUTSIDE_APPROVAL'),
    )
    expect(outside.map(({ zone }) => zone.id).sort()).toEqual(
      ['EB2-T1S', 'EB2-T2S', 'L1P1-E03W', 'L1P1-E05W', 'L1P1-E06W', 'L2P3-N08N'].map((id) => `anchor:${id}`),
    )
  })
})

test('jacked at 0.8 of breaking load every tendon stands exactly at the limit: near, not over', () => {
  // min(0.8 x 184, 0.9 x 165.5) = min(147.2, 148.95): the demand is 0.8 x 184 x n as well.
  const jacking = compared.filter(({ name }) => name === 'Force while jacking')
  expect(jacking.length).toBeGreaterThan(50)
  for (const { demand, limit, status } of jacking) {
    expect(demand).toBeCloseTo(limit, 6)
    expect(status).toBe('near')
  }
})
