import {
  bySeverity,
  checkPour,
  FAMILIES,
  FAMILIES_OF_ZONE,
  STATUSES,
  worstOf,
  type Check,
  type Compared,
  type Hardware,
  type Layout,
  type PourResult,
  type SteelShape,
  type Zone,
} from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { accepted, checksAt, K4, row, S4_APPROVED } from './anchor-checks'
import { anchor, B7, D4, deadEnd, inPan, layout, pan, S4 } from './sample-layout'
import { scaled } from './scaled'
import { evaluated } from './step-text'

/** Every kind of anchor: approved, plain, off centre, skew, beam plate, too close, dead, in a pan. */
function everyKind(): Layout {
  const anchors = [
    anchor('E4', 1, { chainage: 900 }),
    anchor('E4', 2, { chainage: 2650, hardwareId: 'K4' }),
    anchor('E4', 3, { chainage: 4400, hardwareId: 'S4A', height: 90 }),
    anchor('E4', 4, { chainage: 6150, skew: 0.05, elevation: 0.05 }),
    anchor('E4', 5, { chainage: 9000, hardwareId: 'B7' }),
    anchor('E4', 6, { chainage: 12_000 }),
    anchor('E4', 7, { chainage: 12_300 }),
    deadEnd('E4', 8, { chainage: 15_000 }),
  ]
  const bars: SteelShape = {
    kind: 'transverse-bars',
    diameter: 12,
    length: 500,
    count: 8,
    layers: 'both',
    first: 150,
    pitch: 200,
  }
  return layout({
    hardware: [S4, S4_APPROVED, K4, B7, D4],
    anchors: [...anchors, inPan('PN1')],
    pans: [pan('PN1', { x: 9000, y: 9000 })],
    steel: [
      {
        id: 'st',
        pourId: 'P1',
        zone: { kind: 'anchor', anchorId: 'E4-1' },
        shape: bars,
        source: 'by-hand',
        isLocked: false,
      },
    ],
  })
}

const run = (of: Layout, edgeId?: string): PourResult =>
  checkPour(of, { pourId: 'P1', withSteps: true, ...(edgeId === undefined ? {} : { edgeId }) })
const zoneOf = (result: PourResult, id: string) => {
  const zone = result.zones.find((one) => one.zone.id === id)
  if (!zone) throw new Error(`No zone ${id}`)
  return zone
}
const comparedIn = (result: PourResult): Compared[] =>
  result.zones.flatMap(({ checks }) => checks.filter((check) => check.kind === 'compared'))

/** Worst first; a check that waits for something to be entered comes after those that need judgement. */
function rankOf(check: Check): number {
  if (check.kind === 'advice') return STATUSES.length
  const waits = check.kind === 'refused' && check.code === 'MISSING_INPUT'
  return waits ? STATUSES.indexOf('needs-judgement') + 0.5 : STATUSES.indexOf(check.status)
}

describe('Every step of every check', () => {
  const lines = comparedIn(run(everyKind())).flatMap(({ steps }) => steps)

  test('is there to walk', () => {
    expect(lines.length).toBeGreaterThan(100)
  })

  test('has a text that evaluates to the value printed beside it', () => {
    for (const line of lines) {
      const difference = Math.abs(evaluated(line) - line.value)
      expect(difference, `${line.symbol} = ${line.formula}`).toBeLessThanOrEqual(
        1e-9 * Math.max(1, Math.abs(line.value)),
      )
    }
  })

  test('carries its source, its section and how sure we are of it', () => {
    for (const { clause } of lines) {
      expect(clause.source).not.toBe('')
      expect(clause.section).not.toBe('')
    }
  })

  test('is left out when not asked for, and nothing else changes', () => {
    const without = checkPour(everyKind(), { pourId: 'P1' })
    expect(comparedIn(without).every(({ steps }) => steps.length === 0)).toBe(true)
    expect(comparedIn(without).map(({ utilisation }) => utilisation)).toEqual(
      comparedIn(run(everyKind())).map(({ utilisation }) => utilisation),
    )
  })
})

describe('Nothing reads within that was not checked', () => {
  const result = run(accepted(everyKind()))

  test('the families of a zone are checked or named, never silent', () => {
    for (const { zone, checks, notYetChecked } of result.zones) {
      const made = new Set(checks.map(({ family }) => family))
      const silent = FAMILIES_OF_ZONE[zone.kind].filter(
        (family) => !made.has(family) && !notYetChecked.includes(family),
      )
      expect(
        silent.filter((family) => !nothingToSay(zone).includes(family)),
        zone.name,
      ).toEqual([])
    }
  })

  /** Far from a step in depth; a live anchor under dead ends; bonded strands under bearing; a group in the other plane. */
  function nothingToSay({ id, kind, edgeId }: Zone): readonly string[] {
    // Bars stand at anchors alone here: elsewhere there is nothing to fit or to anchor.
    const noBars = ['fit', 'anchorage']
    // At an edge without anchors nothing pulls on the face.
    if ((kind === 'edge' || kind === 'gap') && edgeId !== 'E4') return ['spalling', ...noBars]
    if (kind === 'group') return ['bursting-thickness', ...noBars]
    if (kind !== 'anchor') return noBars
    // The bonded end has no bars.
    if (id === 'anchor:E4-8') return ['depth-change', 'bearing', 'tendon', 'pan-access', ...noBars]
    // In a pan the room for the jack is a check of the pan.
    if (id === 'anchor:PN1-anchor') return ['depth-change', 'dead-end', 'pan-access']
    // Hardware B7 has a spiral alone: it closes on itself, so that no end of a bar is to be anchored.
    return ['depth-change', 'dead-end', ...(id === 'anchor:E4-5' ? ['anchorage'] : [])]
  }

  test('of a live anchor only what is still to come is named', () => {
    const { notYetChecked } = zoneOf(result, 'anchor:E4-1')
    for (const family of ['bearing', 'bursting-thickness', 'bursting-plan', 'depth-change', 'dead-end']) {
      expect(notYetChecked).not.toContain(family)
    }
  })

  test('a bonded dead end is checked in bursting and for its bond, and says nothing of bearing', () => {
    const { checks, notYetChecked } = zoneOf(result, 'anchor:E4-8')
    const families = checks.map(({ family }) => family)
    expect(families).toEqual(expect.arrayContaining(['bursting-thickness', 'bursting-plan', 'dead-end']))
    expect([...families, ...notYetChecked]).not.toContain('bearing')
  })

  test('an anchor in a pan is checked in bearing and bursting as one at an edge', () => {
    const families = zoneOf(result, 'anchor:PN1-anchor').checks.map(({ family }) => family)
    expect(families).toEqual(
      expect.arrayContaining(['bearing', 'bursting-thickness', 'bursting-plan', 'cover', 'spacing']),
    )
  })

  test('a gap between anchors says what is with its face', () => {
    const gap = result.zones.find(({ zone }) => zone.kind === 'gap' && zone.edgeId === 'E4')
    expect(gap?.checks).toContainEqual(expect.objectContaining({ family: 'spalling', code: 'UNEVEN_ROW' }))
  })

  test('every family belongs to some kind of zone', () => {
    const used = new Set(Object.values(FAMILIES_OF_ZONE).flat())
    expect(FAMILIES.filter((family) => !used.has(family))).toEqual([])
  })
})

describe('Force while jacking: at most min(0.8 Fpk, 0.9 Fp0.1k) (EN 1992-1-1 5.10.2.1, from memory)', () => {
  const force = (jackingRatio: number) => {
    const given = row('S4')
    const tendons = given.tendons.map((tendon) => ({ ...tendon, jackingRatio }))
    return checksAt({ ...given, tendons }).find(({ name }) => name === 'Force while jacking')
  }

  // Limit 0.8 * 184 = 147.2 kN a strand (0.9 * 165.5 = 148.95): 0.8 is on it, 0.76 is 0.95 of it.
  test.each([
    { ratio: 0.75, status: 'within' },
    { ratio: 0.761, status: 'near' },
    { ratio: 0.8, status: 'near' },
    { ratio: 0.801, status: 'over' },
  ])('jacked at $ratio of the breaking load: $status', ({ ratio, status }) => {
    expect(force(ratio)).toMatchObject({ kind: 'compared', status, limit: 588_800 })
  })
})

describe('An anchor whose centre is outside the concrete', () => {
  test.each([
    { where: 'below the soffit', middle: { height: -1 }, field: 'height' },
    { where: 'on the soffit', middle: { height: 0 }, field: 'height' },
    { where: 'above the top', middle: { height: 300 }, field: 'height' },
    { where: 'before the edge', middle: { chainage: -900 }, field: 'chainage' },
    { where: 'beyond the edge', middle: { chainage: 25_000 }, field: 'chainage' },
  ])('$where: no rule gives a result', ({ middle, field }) => {
    for (const hardwareId of ['K4', 'S4A']) {
      const checks = checksAt(row(hardwareId, { middle })).filter(({ family }) =>
        ['bearing', 'bursting-thickness', 'bursting-plan'].includes(family),
      )
      expect(checks).toHaveLength(4)
      for (const check of checks) expect(check).toMatchObject({ status: 'not-covered', code: 'OUTSIDE_METHOD', field })
    }
  })
})

test('a live anchor on a bonded dead end gets no result by rules for plates', () => {
  const checks = checksAt(row('D4')).filter(({ family }) => family === 'bearing' || family === 'bursting-plan')
  expect(checks).toHaveLength(3)
  for (const check of checks) expect(check).toMatchObject({ code: 'OUTSIDE_METHOD', field: 'hardwareId' })
})

test('a tendon jacked too high is mended by the ratio that would just do', () => {
  const given = row('S4')
  const tendons = given.tendons.map((tendon) => ({ ...tendon, jackingRatio: 0.85 }))
  const check = checksAt({ ...given, tendons }).find(({ name }) => name === 'Force while jacking')
  expect(check).toMatchObject({ status: 'over', mend: { field: 'tendon.jackingRatio', value: 0.8 } })
})

describe('Order and counts', () => {
  test('checks of a zone stand worst first and the zone has the worst status', () => {
    for (const { checks, status } of run(everyKind()).zones) {
      const ranks = checks.map(rankOf)
      expect(ranks).toEqual([...ranks].sort((a, b) => a - b))
      expect(status).toBe(worstOf(checks))
    }
  })

  test('what only waits to be entered comes after what is wrong, and before what is near', () => {
    const waits: Check = {
      ...like({}),
      kind: 'refused',
      status: 'not-covered',
      code: 'MISSING_INPUT',
      field: 'tendon.drape',
      message: 'The drape is not entered.',
    }
    const outside: Check = { ...waits, code: 'OUTSIDE_METHOD' }
    const judged = like({ status: 'needs-judgement', statusOnceAccepted: 'within' })
    const near = like({ status: 'near', statusOnceAccepted: 'near' })
    const checks = [near, waits, judged, like({}), outside]
    expect([...checks].sort(bySeverity)).toEqual([outside, like({}), judged, waits, near])
    expect(worstOf(checks)).toBe('not-covered')
    expect(worstOf([near, waits, like({})])).toBe('over')
    expect(worstOf([near, waits])).toBe('not-covered')
  })

  test('counts are the checks by status, advice left out', () => {
    const result = run(everyKind())
    const checks = result.zones.flatMap((zone) => zone.checks).filter(({ kind }) => kind !== 'advice')
    expect(Object.values(result.counts).reduce((sum, count) => sum + count, 0)).toBe(checks.length)
  })

  const over = comparedIn(run(accepted(row('K4')))).filter(({ status }) => status === 'over')[0]
  const like = (change: Partial<Compared>): Check => {
    if (!over) throw new Error('The row of plain plates has a check that is over.')
    return { ...over, ...change }
  }

  test('ratios by ratio with no steel first, distances by what is short', () => {
    const none = like({ utilisation: null })
    const high = like({ utilisation: 1.4 })
    const low = like({ utilisation: 1.1 })
    const short = like({ compares: 'at-least', utilisation: null, spare: -20 })
    const shorter = like({ compares: 'at-least', utilisation: null, spare: -5 })
    const stop = like({ status: 'stop', statusOnceAccepted: 'stop', utilisation: 1.01 })
    expect([shorter, low, short, none, stop, high].sort(bySeverity)).toEqual([stop, none, high, low, short, shorter])
  })

  test('nothing but advice has no status', () => {
    expect(worstOf([])).toBeNull()
  })
})

describe('One edge of a pour', () => {
  test('gives the same as that edge within the whole pour', () => {
    const whole = run(everyKind()).zones.filter(({ zone }) => zone.edgeId === 'E4')
    expect(run(everyKind(), 'E4').zones).toEqual(whole)
  })
})

describe('Scaling: lengths x k and forces x k^2 leave every ratio unchanged', () => {
  test.each([0.37, 3.7])('k = %s', (k) => {
    // Transverse bars long enough that the least lengths of EN 8.4, which are in mm, do not enter.
    const bars: SteelShape = {
      kind: 'transverse-bars',
      diameter: 12,
      length: 6000,
      count: 8,
      layers: 'both',
      first: 150,
      pitch: 200,
    }
    const hardware: readonly Hardware[] = [S4, K4, S4_APPROVED]
    const of = row('K4', {
      hardware,
      steel: [
        {
          id: 's',
          pourId: 'P1',
          zone: { kind: 'anchor', anchorId: 'E4-4' },
          shape: bars,
          source: 'by-hand',
          isLocked: false,
        },
      ],
      middle: { height: 95 },
    })
    const ratios = (one: Layout) =>
      comparedIn(run(one))
        .filter(({ compares }) => compares === 'ratio')
        .map((check) => [check.zoneId, check.family, check.stage, check.utilisation?.toFixed(9)].join(' '))
    expect(ratios(of).length).toBeGreaterThan(20)
    expect(ratios(scaled(of, k)).sort()).toEqual(ratios(of).sort())
  })
})
