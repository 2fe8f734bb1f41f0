import type { Anchor, Hardware, Layout } from '@wedgeline/engine'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { accepting, checkAt, checksAt, compared, K4 } from './anchor-checks'
import { anchor, B7, D4, deadEnd, layout, S4, SETTINGS, type Parts } from './sample-layout'

const P = 4 * 0.8 * 184_000
const F = 1.2 * P

/** Seven dead ends at 1750 on the north edge; the fourth is looked at. */
function deadRow(change: Partial<Anchor> = {}, parts: Parts = {}): Layout {
  const anchors = [1, 2, 3, 4, 5, 6, 7].map((n) => deadEnd('E4', n, { chainage: 900 + 1750 * n, ...change }))
  return layout({ hardware: [S4, K4, B7, D4], anchors, ...parts })
}

const judged = (of: Layout) => accepting(of, 'en-steel-300', 'en-dead-end', 'en-window')
const at = (of: Layout, family: Parameters<typeof checkAt>[1]) => compared(checkAt(judged(of), family))

describe('Bonded dead end: all force at the bulbs, 0.25 P (1 - splay / s) (engineering judgement)', () => {
  test('in plan the splay of 300 in a spacing of 1750', () => {
    // 0.25 * 706.56 * (1750 - 300) / 1750 = 146.4 kN; at 300 MPa 487.9 mm2
    expect(at(deadRow(), 'bursting-plan').demand).toBeCloseTo((0.25 * F * (1750 - 300)) / 1750 / 300, 6)
  })

  test('in the thickness by the depth of the bulbs, 80 in 220', () => {
    expect(at(deadRow(), 'bursting-thickness').demand).toBeCloseTo((0.25 * F * (220 - 80)) / 220 / 300, 6)
  })

  test('steel counts from the bulbs over the lower transmission length (from memory) and one prism', () => {
    // 22 MPa: fctm = 0.3 * 22^(2/3) = 2.3554; fctd = 0.7 * 2.3554 / 1.5 = 1.0992; fbpt = 3.2 * 1.0992 = 3.5174;
    // 588 800 / (4 * 98.7) = 1491.4 MPa; lpt = 0.19 * 12.7 * 1491.4 / 3.5174 = 1023.1; 0.8 of it 818.5; + 220 = 1038.5
    const fctd = (0.7 * 0.3 * 22 ** (2 / 3)) / 1.5
    const lower = (0.8 * 0.19 * 12.7 * (P / (4 * 98.7))) / (3.2 * fctd)
    const check = at(deadRow(), 'bursting-thickness')
    expect(check.steps.find(({ symbol }) => symbol === 'xTo')?.value).toBeCloseTo(lower + 220, 6)
    expect(lower + 220).toBeCloseTo(1038.5, 0)
  })

  test.each([
    { second: 1038, links: 2 },
    { second: 1039, links: 1 },
  ])('of links 100 and $second behind the bulbs $links count', ({ second, links }) => {
    // The window ends at 1038.5.
    const localSteel: Hardware['localSteel'] = {
      kind: 'links',
      isTested: false,
      diameter: 10,
      width: 340,
      height: 140,
      hook: 130,
      count: 2,
      first: 100,
      pitch: second - 100,
    }
    const check = at(deadRow({}, { hardware: [{ ...D4, localSteel }] }), 'bursting-thickness')
    expect(check).toMatchObject({ stage: 'Full' })
    expect(check.limit).toBeCloseTo((links * 2 * Math.PI * 100) / 4, 6)
  })

  test('rests on the reading for bonded dead ends until an engineer accepts it', () => {
    const open = compared(checkAt(accepting(deadRow(), 'en-steel-300'), 'bursting-plan'))
    expect(open.readingIds).toEqual(['en-steel-300', 'en-dead-end'])
    expect(open.status).toBe('needs-judgement')
    expect(open.notes.join(' ')).toContain('No code formula covers a bonded dead end')
    expect(at(deadRow(), 'bursting-plan').status).not.toBe('needs-judgement')
  })

  test('nothing is said of bearing: no plate bears', () => {
    expect(checksAt(deadRow()).filter(({ family }) => family === 'bearing')).toEqual([])
  })

  test('moving towards a face is never a gain', () => {
    const ratio = (height: number) => at(deadRow({ height }), 'bursting-thickness').utilisation ?? Infinity
    fc.assert(
      fc.property(fc.integer({ min: 45, max: 109 }), (height) => {
        expect(ratio(height)).toBeGreaterThanOrEqual(ratio(110) - 1e-12)
      }),
      { numRuns: 15 },
    )
  })

  test('more force never asks for less steel', () => {
    const withRatio = (jackingRatio: number) => {
      const of = deadRow()
      return { ...of, tendons: of.tendons.map((tendon) => ({ ...tendon, jackingRatio })) }
    }
    const ratios = fc.double({ min: 0.3, max: 0.8, noNaN: true })
    fc.assert(
      fc.property(ratios, ratios, (one, other) => {
        const steel = (ratio: number) => at(withRatio(ratio), 'bursting-plan').demand
        expect(steel(Math.max(one, other))).toBeGreaterThanOrEqual(steel(Math.min(one, other)))
      }),
      { numRuns: 10 },
    )
  })
})

describe('Transmission length (EN 1992-1-1 8.10.2.2, from memory)', () => {
  const named = (of: Layout) => {
    const check = checksAt(judged(of)).find(({ name }) => name.startsWith('Transmission length'))
    if (!check) throw new Error('No transmission length')
    return check
  }
  const given = (transmissionLength: number | null) => deadRow({}, { hardware: [{ ...D4, transmissionLength }] })

  test.each([
    // 1.2 * 1023.11 = 1227.7
    { length: 1227.7, status: 'over' },
    { length: 1227.8, status: 'within' },
    { length: 1228, status: 'within' },
  ])('hardware that gives $length: $status', ({ length, status }) => {
    const check = compared(named(given(length)))
    expect(check).toMatchObject({ status, compares: 'at-least', stage: 'Full' })
    expect(check.limit).toBeCloseTo(1227.7, 1)
  })

  test('says from where on precompression counts: 300 + 1228', () => {
    expect(named(given(1228)).notes.join(' ')).toContain('before 1528 from the slab edge')
  })

  test('without a length the field is named', () => {
    expect(named(given(null))).toMatchObject({ code: 'MISSING_INPUT', field: 'hardware.transmissionLength' })
  })
})

describe('Splay', () => {
  test.each([
    { straightBehind: 899, status: 'over' },
    { straightBehind: 900, status: 'within' },
  ])('$straightBehind straight against a splay of 900: $status', ({ straightBehind, status }) => {
    const check = checksAt(deadRow({ straightBehind })).find(({ name }) => name === 'Straight length for the splay')
    expect(check).toMatchObject({ status, limit: 900 })
  })

  test.each([
    { setBack: 149, isUsual: false },
    { setBack: 150, isUsual: true },
  ])('bulbs $setBack from the edge, 150 usual (from memory, unsure)', ({ setBack, isUsual }) => {
    const check = checksAt(deadRow({ setBack })).find(({ name }) => name === 'Bulbs from the slab edge')
    expect(check).toMatchObject({ kind: 'advice', isUsual, clause: { tag: 'memory-unsure' } })
  })
})

describe('Dead end with a plate', () => {
  const plate = (change: Partial<Hardware> = {}, parts: Parts = {}) => {
    const hardware = [{ ...K4, ends: 'both' as const, ...change }]
    return deadRow({ hardwareId: 'K4', setBack: 110 }, { hardware, ...parts })
  }
  const live = () => {
    const anchors = [1, 2, 3, 4, 5, 6, 7].map((n) => anchor('E4', n, { chainage: 900 + 1750 * n, hardwareId: 'K4' }))
    return layout({ hardware: [K4], anchors })
  }

  test.each(['bearing', 'bursting-thickness', 'bursting-plan'] as const)('%s as at a live end', (family) => {
    const [dead, asLive] = [at(plate(), family), at(live(), family)]
    expect([dead.demand, dead.limit]).toEqual([asLive.demand, asLive.limit])
  })

  test('hardware for live ends alone is not covered there', () => {
    const check = checkAt(plate({ ends: 'live' }), 'dead-end')
    expect(check).toMatchObject({ status: 'not-covered', field: 'hardwareId' })
  })

  test('the force after friction counts where the job says so: less steel, and it is said', () => {
    const parts = plate()
    const tendons = parts.tendons.map((tendon) => ({ ...tendon, length: 17_000, drape: 0.3 }))
    const after: Layout = {
      ...parts,
      tendons,
      job: { ...parts.job, settings: { ...SETTINGS, deadEndForce: 'after-friction' } },
    }
    // Lowest pair: 0.15 (0.3 + 0.005 * 17) = 0.05775; exp(-0.05775) = 0.9439
    const ratio = at(after, 'bursting-plan').demand / at(plate(), 'bursting-plan').demand
    expect(ratio).toBeCloseTo(Math.exp(-0.15 * (0.3 + 0.085)), 6)
    expect(at(after, 'bursting-plan').notes.join(' ')).toContain('after friction')
  })
})
