import {
  anchorageForce,
  checkPour,
  forceProfile,
  layoutIndex,
  type Advice,
  type Check,
  type ForceProfile,
  type Layout,
} from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { anchor, inPan, pan } from './sample-layout'
import { scaled } from './scaled'
import { evaluated } from './step-text'
import { allPairs, oneTendon } from './tendon-layout'

const profile = (of: Layout): ForceProfile => {
  const made = forceProfile(layoutIndex(of), 'T')
  if ('code' in made) throw new Error(made.message)
  return made
}
const checks = (of: Layout, zoneId: string): readonly Check[] => {
  const zone = checkPour(of, { pourId: 'P1', withSteps: true }).zones.find((one) => one.zone.id === zoneId)
  if (!zone) throw new Error(`No zone ${zoneId}`)
  return zone.checks
}
const named = (of: Layout, zoneId: string, name: RegExp): Check | undefined =>
  checks(of, zoneId).find((check) => name.test(check.name))
const advice = (of: Layout, name: RegExp): Advice | undefined => {
  const check = named(of, 'tendon:T', name)
  return check?.kind === 'advice' ? check : undefined
}
const lockOff = (of: Layout) => named(of, 'anchor:E4-1', /after lock-off/)

/** Sum of trapezia between neighbouring points of two lines of a diagram. */
function area({ points }: ForceProfile['nominal']): number {
  return points.slice(1).reduce((sum, point, i) => {
    const before = points[i] ?? point
    return sum + ((point.at - before.at) * (point.jacked - point.locked + before.jacked - before.locked)) / 2
  }, 0)
}

describe('Draw-in', () => {
  // w E A = 6 x 195,000 x 4 x 98.7 = 461.9e6 N mm.
  const W = 6 * 195_000 * 4 * 98.7

  test.each([
    { what: 'felt over a part of the tendon', settings: allPairs(0.25, 0.01e-3), length: 60_000 },
    { what: 'felt as far as the dead end', settings: allPairs(0.1, 0.002e-3), length: 17_180 },
    { what: 'without any friction', settings: allPairs(0, 0), length: 17_180 },
  ])('$what: the area between the diagrams makes up w E A', ({ settings, length }) => {
    expect(area(profile(oneTendon({ settings, tendon: { length } })).nominal)).toBeCloseTo(W, -6.3)
    expect(area(profile(oneTendon({ settings, tendon: { length } })).nominal) / W).toBeCloseTo(1, 2)
  })

  test('longer than the tendon: the force at the dead end falls as well', () => {
    const { points } = profile(oneTendon({ settings: allPairs(0.1, 0.002e-3) })).nominal
    expect(points.at(-1)?.locked).toBeLessThan(points.at(-1)?.jacked ?? 0)
  })

  test('just as long as the tendon: both forms give one force', () => {
    // 1 - e^-u = sqrt(W u / (L P0)): with u = 0.1 and P0 = 588,800, L = W u / (P0 (1 - e^-0.1)^2).
    const L = (W * 0.1) / (588_800 * (1 - Math.exp(-0.1)) ** 2)
    const at = (length: number) =>
      profile(oneTendon({ settings: allPairs(0.1, 0), tendon: { length, drape: 1 } })).nominal.points[0]?.locked ?? 0
    expect(at(L)).toBeCloseTo(588_800 * Math.exp(-0.2), 0)
    expect(at(L * (1 - 1e-6))).toBeCloseTo(at(L * (1 + 1e-6)), 0)
  })

  test('that would take the whole force is refused', () => {
    // 60 x 195,000 x 394.8 / 6000 = 769.9 kN, more than the 588.8 kN jacked.
    const of = oneTendon({ settings: allPairs(0, 0), tendon: { length: 6000 }, drawIn: 60 })
    expect(forceProfile(layoutIndex(of), 'T')).toMatchObject({ code: 'OUTSIDE_METHOD', field: 'tendon.length' })
  })
})

describe('Stressed from both ends', () => {
  const both = (change: Parameters<typeof oneTendon>[0] = {}) =>
    oneTendon({
      ...change,
      far: { end: 'live', setBack: 110 },
      tendon: { stressedFrom: 'both-ends', length: 60_000, ...change.tendon },
    })

  test('is the same from either end', () => {
    const { points } = profile(both()).nominal
    for (const { at, jacked, locked } of points) {
      const mirrored = points.find((point) => Math.abs(point.at - (60_000 - at)) < 1e-6)
      expect(mirrored?.jacked).toBeCloseTo(jacked, 3)
      expect(mirrored?.locked).toBeCloseTo(locked, 3)
    }
  })

  test('leaves the larger of the two forces everywhere: in the middle that of half the tendon', () => {
    const middle = profile(both({ settings: allPairs(0.2, 0.01e-3) })).nominal.points.find(({ at }) => at === 30_000)
    // u of half the tendon: 0.2 x (0.3 + 0.01 x 60) / 2 = 0.09.
    expect(middle?.jacked).toBeCloseTo(588_800 * Math.exp(-0.09), 3)
  })

  test('elongates by two halves: 2 x P0 (1 - e^-u/2) / u x L / (E A)', () => {
    const { elongation } = profile(both({ settings: allPairs(0.2, 0.01e-3) })).nominal
    const half = (588_800 * (1 - Math.exp(-0.09)) * 30_000) / (0.09 * 195_000 * 4 * 98.7)
    expect(elongation).toBeCloseTo(2 * half, 6)
  })
})

test('elongates without friction by P0 L / (E A): 588.8 x 17,180 / (195 x 394.8) = 131.4', () => {
  expect(profile(oneTendon({ settings: allPairs(0, 0) })).nominal.elongation).toBeCloseTo(131.4, 1)
})

describe('Friction', () => {
  const far = (settings: Parameters<typeof oneTendon>[0]) => profile(oneTendon(settings)).nominal.points.at(-1)

  test('more of it never leaves more force at the far end, jacked or locked off', () => {
    const forces = [0, 0.05, 0.1, 0.15, 0.19, 0.25, 0.35].map((mu) => far({ settings: allPairs(mu, 0.0075e-3) }))
    for (const [i, force] of forces.slice(1).entries()) {
      expect(force?.jacked).toBeLessThanOrEqual(forces[i]?.jacked ?? 0)
    }
    const drapes = [0, 0.1, 0.3, 0.6, 1].map((drape) => far({ tendon: { drape } }))
    for (const [i, force] of drapes.slice(1).entries()) expect(force?.jacked).toBeLessThan(drapes[i]?.jacked ?? 0)
  })

  test('counts a bend in plan by its angle: 45 degrees and back are a half of pi', () => {
    // From (9600, 17,290) down to (9600, 12,000), aside to (7600, 10,000) at 45 degrees, and down to (7600, 110).
    const path = [
      { x: 9600, y: 12_000 },
      { x: 7600, y: 10_000 },
    ]
    const settings = allPairs(0.2, 0)
    const bent = far({ settings, tendon: { path, drape: 0 }, far: { chainage: 7600, setBack: 110 } })
    expect(bent?.jacked).toBeCloseTo(588_800 * Math.exp(-0.2 * (Math.PI / 2)), 3)
    const back = far({
      settings,
      tendon: { path: [...path].reverse(), drape: 0 },
      far: { chainage: 7600, setBack: 110 },
    })
    expect(back?.jacked).toBeCloseTo(bent?.jacked ?? 0, 6)
  })
})

describe('What is missing is said and never read as 0', () => {
  test.each([
    { what: 'length', change: { tendon: { length: null } }, field: 'tendon.length', code: 'MISSING_INPUT' },
    { what: 'drape', change: { tendon: { drape: null } }, field: 'tendon.drape', code: 'MISSING_INPUT' },
    {
      what: 'a second live end',
      change: { tendon: { stressedFrom: 'both-ends' } },
      field: 'tendon.stressedFrom',
      code: 'OUTSIDE_METHOD',
    },
    { what: 'a dead end', change: { far: { end: 'live' } }, field: 'tendon.stressedFrom', code: 'OUTSIDE_METHOD' },
  ] as const)('$what', ({ change, field, code }) => {
    expect(named(oneTendon(change), 'tendon:T', /^Forces/)).toMatchObject({ kind: 'refused', field, code })
  })

  test('a tendon with one end', () => {
    const of = oneTendon({ parts: { anchors: [anchor('E4', 1, { tendonId: 'T', chainage: 9600 })] } })
    expect(forceProfile(layoutIndex(of), 'T')).toMatchObject({ code: 'MISSING_INPUT', field: 'anchors' })
  })
})

describe('Force after lock-off against min(0.75 Fpk, 0.85 Fp0.1k) (EN 1992-1-1 5.10.3, from memory)', () => {
  // 4 x min(0.75 x 184, 0.85 x 165.5) = 4 x min(138, 140.675) = 552 kN.
  test('without friction P0 - w E A / L: 588.8 - 461.916 / 17.18 = 561.9 kN is over', () => {
    const check = lockOff(oneTendon({ settings: allPairs(0, 0) }))
    expect(check).toMatchObject({ kind: 'compared', status: 'over', limit: 552_000 })
    expect(check).toMatchObject({ demand: expect.closeTo(588_800 - (6 * 195_000 * 394.8) / 17_180, 3) as number })
  })

  // Without friction P0 - w E A / L, at the limit for w = (588,800 - 552,000) x 17,180 / (195,000 x 394.8) = 8.2123.
  test.each([
    { drawIn: 8.2, status: 'over' },
    { drawIn: 8.2124, status: 'near' },
    { drawIn: 20, status: 'within' },
  ])('draw-in $drawIn: $status', ({ drawIn, status }) => {
    expect(lockOff(oneTendon({ settings: allPairs(0, 0), drawIn }))).toMatchObject({ status })
  })

  test('without the drape: within by a bound that no drape exceeds, and said so', () => {
    const of = oneTendon({ tendon: { drape: null }, drawIn: 20 })
    const check = lockOff(of)
    expect(check).toMatchObject({ kind: 'compared', status: 'within' })
    expect(check?.notes.join(' ')).toContain('The drape of tendon')
    const demand = (drape: number | null) => {
      const made = lockOff(oneTendon({ tendon: { drape }, drawIn: 20 }))
      return made?.kind === 'compared' ? made.demand : Infinity
    }
    for (const drape of [0, 0.2, 0.5, 1, 2]) expect(demand(drape)).toBeLessThanOrEqual(demand(null))
  })

  test('without the drape and beyond the limit by that bound: not covered', () => {
    const of = oneTendon({ tendon: { drape: null }, settings: allPairs(0, 0) })
    expect(lockOff(of)).toMatchObject({ kind: 'refused', code: 'MISSING_INPUT', field: 'tendon.drape' })
  })

  test('a basis that sets no limit compares nothing', () => {
    const given = oneTendon()
    expect(lockOff({ ...given, job: { ...given.job, basis: 'as-3600' } })).toBeUndefined()
  })

  test('each step evaluates to its value', () => {
    for (const settings of [allPairs(0, 0), allPairs(0.1, 0.002e-3), allPairs(0.3, 0.01e-3)]) {
      const check = lockOff(oneTendon({ settings }))
      if (check?.kind !== 'compared') throw new Error('The force is known.')
      for (const line of check.steps) expect(evaluated(line)).toBeCloseTo(line.value, 6)
    }
  })

  test('lengths x k and forces x k^2 leave the ratio', () => {
    const ratio = (of: Layout) => {
      const check = lockOff(of)
      return check?.kind === 'compared' ? check.utilisation : null
    }
    expect(ratio(scaled(oneTendon(), 3))).toBeCloseTo(ratio(oneTendon()) ?? NaN, 9)
  })
})

describe('Force for the checks at an anchor', () => {
  const at = (of: Layout, anchorId: string) => {
    const index = layoutIndex(of)
    const found = index.anchors.get(anchorId)
    if (!found) throw new Error(`No anchor ${anchorId}`)
    return anchorageForce(index, found)
  }
  const afterFriction = { deadEndForce: 'after-friction' } as const

  test('live: the jacking force, 4 x 0.8 x 184 = 588.8 kN, whatever the setting', () => {
    expect(at(oneTendon(), 'E4-1').value).toBeCloseTo(588_800, 6)
    expect(at(oneTendon({ settings: afterFriction }), 'E4-1').value).toBeCloseTo(588_800, 6)
  })

  test('dead: the jacking force, or after friction with the lowest pair (Eq. 5.45, from memory)', () => {
    expect(at(oneTendon(), 'E2-1').value).toBeCloseTo(588_800, 6)
    // Lowest pair: 0.15 x (0.3 + 0.005e-3 x 17,180) = 0.057885.
    const { value, steps } = at(oneTendon({ settings: afterFriction }), 'E2-1')
    expect(value).toBeCloseTo(588_800 * Math.exp(-0.057885), 3)
    expect(steps.at(-1)?.value).toBe(value)
    for (const line of steps) expect(evaluated(line)).toBeCloseTo(line.value, 6)
  })

  test.each([{ drape: null }, { length: null }])(
    'dead and %o: the jacking force, never 0, and it says so',
    (tendon) => {
      const { value, notes } = at(oneTendon({ settings: afterFriction, tendon }), 'E2-1')
      expect(value).toBeCloseTo(588_800, 6)
      expect(notes.join(' ')).toMatch(/not entered.*jacking force counts/)
    },
  )
})

describe('What is usual for a tendon (common practice)', () => {
  test.each([
    { length: 5_999, isUsual: false },
    { length: 6_000, isUsual: true },
    { length: 40_000, isUsual: true },
    { length: 40_001, isUsual: false },
  ])('$length from one end: $isUsual', ({ length, isUsual }) => {
    expect(advice(oneTendon({ tendon: { length } }), /^Length/)).toMatchObject({ measured: length, isUsual })
  })

  test('70 m from both ends is usual, more is not', () => {
    const both = (length: number) => oneTendon({ far: { end: 'live' }, tendon: { stressedFrom: 'both-ends', length } })
    expect(advice(both(70_000), /^Length/)).toMatchObject({ isUsual: true })
    expect(advice(both(70_001), /^Length/)).toMatchObject({ isUsual: false })
  })

  test.each([
    { aside: 1000, isUsual: true },
    { aside: 1251, isUsual: false },
  ])('led aside by $aside over 10,000: $isUsual', ({ aside, isUsual }) => {
    const path = [{ x: 9600 - aside, y: 7290 }]
    const of = oneTendon({ tendon: { path }, far: { chainage: 9600 - aside, setBack: 110 } })
    expect(advice(of, /^Sharpest/)).toMatchObject({ measured: expect.closeTo(10_000 / aside, 9) as number, isUsual })
  })

  test('a straight tendon has no bend to speak of', () => {
    expect(advice(oneTendon(), /^Sharpest/)).toBeUndefined()
  })

  test('beyond 24 m live and dead ends in turn', () => {
    const row = (second: 'live' | 'dead', length: number) =>
      oneTendon({
        parts: {
          anchors: [
            anchor('E4', 1, { tendonId: 'T', chainage: 9600 }),
            anchor('E2', 1, { tendonId: 'T', chainage: 9600, end: 'dead' }),
            anchor('E4', 2, { tendonId: 'T2', chainage: 11_350, end: second }),
          ],
        },
        tendon: { length },
      })
    expect(advice(row('live', 24_001), /in a row/)).toMatchObject({ measured: 2, isUsual: false })
    expect(advice(row('dead', 24_001), /in a row/)).toMatchObject({ measured: 1, isUsual: true })
    expect(advice(row('live', 24_000), /in a row/)).toBeUndefined()
  })

  test('forces at both ends and the elongation stand there for information', () => {
    const said = checks(oneTendon(), 'tendon:T').map(({ name }) => name)
    expect(said).toEqual(
      expect.arrayContaining([
        'Elongation while jacking',
        'Force at E4-01 after lock-off, live end',
        'Force at E2-01 after lock-off, dead end',
      ]),
    )
  })
})

test('a live anchor in a pan is checked like one at an edge', () => {
  const far = anchor('E2', 1, { tendonId: 'T', chainage: 9600, end: 'dead' })
  const of = oneTendon({
    parts: {
      anchors: [{ ...inPan('PN1'), tendonId: 'T' }, far],
      pans: [pan('PN1', { x: 9600, y: 15_000 })],
    },
  })
  expect(named(of, 'anchor:PN1-anchor', /after lock-off/)).toMatchObject({ kind: 'compared' })
})
