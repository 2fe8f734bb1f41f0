import { describe, expect, test } from 'vitest'
import {
  BS_8666_2005,
  BS_8666_2020,
  barStandardById,
  newMarks,
  scheduleOf,
  shapeProblems,
  type BarShape,
  type Delivery,
  type Dimensions,
  type Steel,
  type SteelShape,
  type SteelZone,
} from '@wedgeline/engine'
import { anchor, inPan, layout, pan, S4, SETTINGS, type Parts } from '../sample-layout'

let made = 0
const steel = (zone: SteelZone, shape: SteelShape): Steel => ({
  id: `s${++made}`,
  pourId: 'P1',
  zone,
  shape,
  source: 'by-hand',
  isLocked: false,
})
const gap = (after: string | null, before: string | null): SteelZone => ({
  kind: 'gap',
  edgeId: 'E2',
  afterAnchorId: after,
  beforeAnchorId: before,
})
const wedge = (length: number, count = 4, diameter = 12): SteelShape => ({
  kind: 'wedge-bars',
  diameter,
  length,
  count,
  layers: 'top',
})
const trimmers: SteelShape = {
  kind: 'trimmers',
  diameter: 16,
  length: 2000,
  count: 2,
  layers: 'both',
  runs: 'along',
  pitch: 100,
}
const delivery = (id: string, change: Partial<Delivery>): Delivery => ({
  id,
  name: `Delivery ${id}`,
  neededOn: null,
  edgeIds: [],
  panIds: [],
  ...change,
})
const THREE = [1, 2, 3].map((number) => anchor('E2', number, { chainage: 2000 * number }))
const PAN = pan('PN1', { x: 9000, y: 9000 })
const scheduled = (parts: Parts) =>
  scheduleOf(layout({ hardware: [{ ...S4, localSteel: null }], anchors: THREE, ...parts }), 'P1')

describe('first mark and prefix', () => {
  const bars = [steel(gap('E2-1', 'E2-2'), wedge(1500)), steel(gap('E2-2', 'E2-3'), wedge(1800))]

  test('marks count from the first one, after the prefix', () => {
    const { rows } = scheduled({ pour: { markPrefix: 'P', firstMark: 41 }, steel: bars })
    expect(rows.map(({ mark, markNumber }) => [mark, markNumber])).toEqual([
      ['P41', 41],
      ['P42', 42],
    ])
  })

  test('a stored mark keeps its number when the first mark moves; new ones never fall below one given', () => {
    const stored = [{ id: 'm', pourId: 'P1', mark: 7, key: 'B12 00 A1800' }]
    const marks = (firstMark: number) =>
      scheduled({ pour: { firstMark }, steel: bars, more: { barMarks: stored } }).rows.map(({ mark }) => mark)
    expect(marks(1)).toEqual(['07', '08'])
    expect(marks(8)).toEqual(['07', '08'])
    expect(marks(9)).toEqual(['07', '09'])
  })

  test('a mark to store is its number alone, so that another prefix keeps it', () => {
    const schedule = scheduled({ pour: { markPrefix: 'P' }, steel: bars })
    expect(newMarks(schedule, []).map(({ mark }) => mark)).toEqual([1, 2])
  })
})

describe('deliveries', () => {
  const bars = [
    steel(gap('E2-1', 'E2-2'), wedge(1500)),
    steel({ kind: 'pan', panId: 'PN1' }, trimmers),
    steel(
      { kind: 'edge', edgeId: 'E4' },
      {
        kind: 'edge-bars',
        diameter: 12,
        countTop: 1,
        countBottom: 0,
        first: 100,
        pitch: 100,
        from: 50,
        to: 10_050,
      },
    ),
  ]
  const parts = { anchors: [...THREE, inPan('PN1')], pans: [PAN], steel: bars }

  test('without deliveries nothing is said of them', () => {
    expect(scheduled(parts).deliveries).toEqual([])
  })

  test('bars by delivery in the order of the pour; members that none names are not assigned', () => {
    const deliveries = [
      delivery('b', { panIds: ['PN1'], neededOn: '2026-03-09' }),
      delivery('a', { edgeIds: ['E2'] }),
      delivery('c', { edgeIds: ['E1'] }),
    ]
    const { deliveries: totals, mass, rows } = scheduled({ ...parts, pour: { deliveries } })
    expect(
      totals.map(({ name, neededOn, members, bars: count, metres }) => [name, neededOn, members, count, metres]),
    ).toEqual([
      // 2 trimmers in each of two layers, 2 m
      ['Delivery b', '2026-03-09', ['PN1'], 4, 8],
      ['Delivery a', null, ['E2'], 4, 6],
      ['Delivery c', null, [], 0, 0],
      ['not assigned', null, ['E4'], 1, 10],
    ])
    // 8 x 1.579 + (6 + 10) x 0.888 = 12.632 + 14.208
    expect(totals.reduce((sum, one) => sum + one.mass, 0)).toBeCloseTo(26.84, 9)
    expect(mass).toBeCloseTo(26.84, 9)
    expect(rows.map(({ member, deliveryId }) => [member?.name, deliveryId])).toEqual([
      ['E2', 'a'],
      ['E4', null],
      ['PN1', 'b'],
    ])
  })

  test('a member in two deliveries counts in the first and is a warning', () => {
    const deliveries = [delivery('a', { edgeIds: ['E2'] }), delivery('b', { edgeIds: ['E2'] })]
    const { deliveries: totals, problems } = scheduled({ ...parts, pour: { deliveries } })
    expect(totals.map(({ bars: count }) => count)).toEqual([4, 0, 5])
    expect(problems).toEqual([
      {
        mark: null,
        where: 'pour',
        field: 'deliveries',
        severity: 'warning',
        message:
          'E2 stands in the deliveries Delivery a and Delivery b; its bars are counted in the first. Take it out of the others.',
      },
    ])
  })
})

describe('sums', () => {
  const bars = [steel(gap('E2-1', 'E2-2'), wedge(1500)), steel({ kind: 'pan', panId: 'PN1' }, trimmers)]
  const parts = { anchors: [...THREE, inPan('PN1')], pans: [PAN], steel: bars }

  test('by kind of bar, arithmetic written out', () => {
    const { kinds } = scheduled(parts)
    expect(kinds.map(({ kind, bars: count, metres }) => [kind, count, metres])).toEqual([
      ['wedge-bars', 4, 6],
      ['trimmers', 4, 8],
    ])
    // 6 x 0.888 and 8 x 1.579
    expect(kinds[0]?.mass).toBeCloseTo(5.328, 9)
    expect(kinds[1]?.mass).toBeCloseTo(12.632, 9)
  })

  test('the longest bar with its mark', () => {
    expect(scheduled(parts).longest).toEqual({ mark: '02', length: 2000 })
    expect(scheduled({}).longest).toBeNull()
  })

  test('a row over 2000 kg says how many bundles (from memory, unsure)', () => {
    // 100 x 2 x 12 m x 0.888 = 2131.2 kg
    const many = steel(gap('E2-1', 'E2-2'), { ...wedge(12_000, 100), kind: 'wedge-bars', layers: 'both' } as SteelShape)
    expect(scheduled({ steel: [many] }).rows[0]?.notes).toContain('2131 kg: 2 bundles of 2000 kg or less')
    const fewer = steel(gap('E2-1', 'E2-2'), wedge(12_000, 187))
    // 187 x 12 x 0.888 = 1992.7
    expect(scheduled({ steel: [fewer] }).rows[0]?.notes).toEqual([])
  })
})

describe('one length for wedges (common practice, no source)', () => {
  const at = (first: number, second: number, counts = [4, 4]) => [
    steel(gap('E2-1', 'E2-2'), wedge(first, counts[0])),
    steel(gap('E2-2', 'E2-3'), wedge(second, counts[1])),
  ]

  test('wedges within 100 of each other could share a length: mass and marks written out', () => {
    // 4 x 0.1 m x 0.888 = 0.3552 kg
    expect(scheduled({ steel: at(1500, 1600) }).chances).toEqual([
      'E2 gap 01 to 02, E2 gap 02 to 03: wedge bars of 12 are 1500, 1600 long; one length of 1600 costs 0.4 kg and saves 1 mark.',
    ])
  })

  test('125 apart they are left alone; one length already says nothing', () => {
    expect(scheduled({ steel: at(1500, 1625) }).chances).toEqual([])
    expect(scheduled({ steel: at(1500, 1500) }).chances).toEqual([])
  })

  test('two lengths in one wedge: one of them unless it costs more than 5 kg', () => {
    const both = (count: number) => [
      steel(gap('E2-1', 'E2-2'), wedge(1500, count)),
      steel(gap('E2-1', 'E2-2'), wedge(2000, 4)),
    ]
    // 11 x 0.5 m x 0.888 = 4.884; 12 x 0.5 x 0.888 = 5.328
    expect(scheduled({ steel: both(11) }).chances).toEqual([
      'E2 gap 01 to 02: one length of 2000 for all wedge bars of 12 costs 4.9 kg.',
    ])
    expect(scheduled({ steel: both(12) }).chances).toEqual([])
  })

  test('the bars themselves stay as the engineer gave them', () => {
    expect(scheduled({ steel: at(1500, 1600) }).rows.map(({ length }) => length)).toEqual([1500, 1600])
  })
})

describe('both editions', () => {
  test('the job chooses, the schedule prints it, and the smallest legs follow', () => {
    const leg = (standard: string) => {
      const of = layout({
        hardware: [{ ...S4, localSteel: null }],
        anchors: THREE,
        steel: [
          steel(
            { kind: 'anchor', anchorId: 'E2-1' },
            {
              kind: 'hairpins',
              diameter: 12,
              leg: 125,
              bend: 150,
              count: 1,
              lies: 'upright',
              first: 0,
              pitch: 0,
            },
          ),
        ],
      })
      return scheduleOf({ ...of, job: { ...of.job, settings: { ...SETTINGS, barStandard: standard } } }, 'P1')
    }
    // P of a 12 mm bar: 125 in 2005 (read), 130 for 2020 (two secondary sources)
    expect(leg('bs-8666-2005').edition).toBe('BS 8666:2005')
    expect(leg('bs-8666-2005').problems).toEqual([])
    expect(leg('bs-8666-2020').edition).toBe('BS 8666:2020')
    expect(leg('bs-8666-2020').problems.map(({ field }) => field)).toEqual(['A', 'C'])
  })

  test('each says where its tables come from and what is from memory', () => {
    for (const id of ['bs-8666-2005', 'bs-8666-2020']) {
      const said = barStandardById(id)?.provenance.join('\n') ?? ''
      expect(said).toContain('was read in the original print')
      expect(said).toContain('From memory')
      expect(said).toContain('BS 4449')
    }
  })
})

describe('a bent bar goes by road up to 2750 across (from memory)', () => {
  const problems = (code: string, dimensions: Dimensions) => {
    const bar: BarShape = { code, diameter: 16, dimensions, typedLength: null, flatTurns: 0 }
    const [one, other] = [BS_8666_2005, BS_8666_2020].map((standard) => shapeProblems(bar, standard, 12_000))
    expect(one).toEqual(other)
    return one?.map(({ field, severity }) => [field, severity])
  }

  test.each<{ code: string; on: Dimensions; above: Dimensions; field: string }>([
    { code: '11', on: { A: 4000, B: 2750 }, above: { A: 4000, B: 2755 }, field: 'B' },
    { code: '21', on: { A: 2750, B: 3000, C: 300 }, above: { A: 2755, B: 3000, C: 300 }, field: 'A' },
    { code: '51', on: { A: 2750, B: 2800 }, above: { A: 2755, B: 2800 }, field: 'A' },
  ])('shape $code: 2750 passes, 2755 is a warning', ({ code, on, above, field }) => {
    expect(problems(code, on)).toEqual([])
    expect(problems(code, above)).toEqual([[field, 'warning']])
  })

  test('one side may be longer, and a straight bar is not bent', () => {
    expect(problems('21', { A: 300, B: 8000, C: 300 })).toEqual([])
    expect(problems('00', { A: 11_000 })).toEqual([])
  })
})
