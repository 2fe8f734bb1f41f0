import { toEngine } from '@wedgeline/contract'
import { checkPour, type Check, type Compared } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { EXPECTED_PANS, EXPECTED_TIE_BACK } from '../published/demo-expected-pans'

const demo = toEngine(demoLayout())
const zones = demo.pours.flatMap(({ id }) => checkPour(demo, { pourId: id, withSteps: true }).zones)

function checkOf(panId: string, name: string): Compared {
  const checks: readonly Check[] = zones.find(({ zone }) => zone.id === `pan:${panId}`)?.checks ?? []
  const check = checks.find((one): one is Compared => one.kind === 'compared' && one.name === name)
  if (!check) throw new Error(`No ${name} at ${panId}`)
  return check
}

const stepOf = ({ steps }: Compared, symbol: string) => steps.find((line) => line.symbol === symbol)?.value

describe.each(EXPECTED_PANS)('$pan (the demonstration as it was drawn up)', (expected) => {
  const room = checkOf(expected.pan, 'Room along the jack')

  test('room along the tilted jack, within 1 mm', () => {
    expect(Math.abs(room.demand - expected.alongJack)).toBeLessThanOrEqual(1)
    expect(room.limit).toBe(expected.needed)
    expect(room.status).toBe(expected.access)
    expect(stepOf(room, 'La')).toBe(room.demand)
    expect(room.notes.join(' ')).toContain(`In plan ${expected.inPlan} to wall`)
  })

  test('clear height under the jack, slab beyond, concrete under the recess', () => {
    expect(Math.abs(checkOf(expected.pan, 'Jack clear of the recess').demand - expected.underJack)).toBeLessThan(0.1)
    const slab = checkOf(expected.pan, 'Slab in front of the bearing face')
    expect(slab.demand).toBeCloseTo(expected.slabBeyond, 6)
    expect(slab.status).toBe(expected.slabBeyond < 1000 ? 'stop' : 'within')
    expect(checkOf(expected.pan, 'Concrete under the recess').demand).toBeCloseTo(expected.leftUnder, 6)
  })

  test('bars cut in the worst position; those within cover of the recess count besides', () => {
    const across = checkOf(expected.pan, 'Bars cut, across the pan, top')
    const along = checkOf(expected.pan, 'Bars cut, along the pan, top')
    expect(across.steps.find(({ symbol }) => symbol.startsWith('Ncut'))?.value).toBe(expected.cutAcross)
    expect(along.steps.find(({ symbol }) => symbol.startsWith('Ncut'))?.value).toBe(expected.cutAlong)
    // The demonstration leaves out bars that only stand within cover: 1000 + 60 holds 5 spacings of 200, 350 + 60 holds 2.
    expect(across.demand).toBeCloseTo(6 * Math.PI * 36, 6)
    expect(along.demand).toBeCloseTo(3 * Math.PI * 36, 6)
  })

  test('tie behind the anchor by the reading, within 1 mm2, with the other rules beside it', () => {
    const tie = checkOf(expected.pan, 'Tie behind the anchor')
    expect(Math.abs(tie.demand - EXPECTED_TIE_BACK.area)).toBeLessThan(1)
    expect(tie.status).toBe('needs-judgement')
    for (const force of EXPECTED_TIE_BACK.others) expect(tie.notes.join(' ')).toContain(`${force} kN`)
  })
})

test('PN03 is short by 484, and no other pan is', () => {
  expect(checkOf('PN03', 'Room along the jack').spare).toBeCloseTo(700 / Math.cos((12 * Math.PI) / 180) - 1200, 6)
  expect(Math.round(checkOf('PN03', 'Room along the jack').spare ?? 0)).toBe(-484)
  const stopped = zones.filter(({ zone, status }) => zone.kind === 'pan' && status === 'stop')
  expect(stopped.map(({ zone }) => zone.panId)).toEqual(['PN03'])
})

test('every live anchor at an edge has room for its jack', () => {
  const access = zones.flatMap(({ checks }) => checks.filter(({ name }) => name === 'Jack access'))
  expect(access.length).toBe(demo.anchors.filter(({ end, edgeId }) => end === 'live' && edgeId !== null).length)
  expect(access.filter((check) => check.kind !== 'compared' || check.status !== 'within')).toEqual([])
})
