import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  FAMILIES,
  barsOf,
  newMarks,
  scheduleOf,
  type BarMark,
  type Layout,
  type Steel,
  type SteelShape,
  type SteelZone,
} from '@wedgeline/engine'
import { anchor, D4, inPan, layout, pan, POUR, S4, type Parts } from '../sample-layout'

let made = 0
const steel = (zone: SteelZone, shape: SteelShape, id = `steel-${++made}`): Steel => ({
  id,
  pourId: 'P1',
  zone,
  shape,
  source: 'by-hand',
  isLocked: false,
})

const at = (anchorId: string): SteelZone => ({ kind: 'anchor', anchorId })
const edgeZone: SteelZone = { kind: 'edge', edgeId: 'E2' }

const hairpins = (change: Partial<Extract<SteelShape, { kind: 'hairpins' }>> = {}): SteelShape => ({
  kind: 'hairpins',
  diameter: 10,
  leg: 600,
  bend: 150,
  count: 2,
  lies: 'upright',
  first: 50,
  pitch: 200,
  ...change,
})

const transverse = (length: number, count = 5): SteelShape => ({
  kind: 'transverse-bars',
  diameter: 12,
  length,
  count,
  layers: 'both',
  first: 100,
  pitch: 150,
})

const edgeBars = (to: number): SteelShape => ({
  kind: 'edge-bars',
  diameter: 12,
  countTop: 1,
  countBottom: 1,
  first: 60,
  pitch: 50,
  from: 0,
  to,
})

const THREE = [1, 2, 3].map((number) => anchor('E2', number, { chainage: 2000 * number }))
const scheduled = (parts: Parts) => scheduleOf(layout({ anchors: THREE, ...parts }), 'P1')
const shown = (of: Layout) =>
  scheduleOf(of, 'P1').rows.map((row) =>
    [row.member?.name ?? '-', row.mark, row.typeAndSize, row.members, row.inEach, row.total, row.length, row.code].join(
      ' ',
    ),
  )

describe('from steel to bars', () => {
  test('hardware brings its links to every anchor that has none of its own', () => {
    const own = steel(at('E2-2'), {
      kind: 'links',
      diameter: 8,
      width: 300,
      height: 140,
      hook: 115,
      count: 3,
      first: 30,
      pitch: 50,
    })
    const { bars } = barsOf(layout({ anchors: THREE, steel: [own] }), 'P1')
    expect(bars.map(({ zoneName, source, count }) => ({ zoneName, source, count }))).toEqual([
      { zoneName: 'E2-02', source: 'layout', count: 3 },
      { zoneName: 'E2-01', source: 'hardware', count: 4 },
      { zoneName: 'E2-03', source: 'hardware', count: 4 },
    ])
  })

  test('steel of another kind at an anchor leaves its links in place', () => {
    const { bars } = barsOf(layout({ anchors: THREE, steel: [steel(at('E2-2'), hairpins())] }), 'P1')
    expect(bars.filter(({ kind }) => kind === 'links')).toHaveLength(3)
  })

  test('local steel belongs to the pour that the anchor is cast with', () => {
    const anchors = [anchor('E2', 1, { castWithPourId: 'P2' })]
    const of = layout({ anchors, more: { pours: [POUR, { ...POUR, id: 'P2', mark: 'P2' }] } })
    expect(barsOf(of, 'P1').bars).toEqual([])
    expect(barsOf(of, 'P2').bars).toHaveLength(1)
  })

  test.each<{ shape: SteelShape; code: string; dimensions: object; count: number }>([
    {
      shape: { kind: 'spiral', diameter: 12, outside: 230, pitch: 55, turns: 6, flatTurns: 2, first: 0 },
      code: '77',
      dimensions: { A: 230, B: 55, C: 6 },
      count: 1,
    },
    {
      shape: { kind: 'links', diameter: 10, width: 300, height: 140, hook: 130, count: 4, first: 30, pitch: 50 },
      code: '51',
      dimensions: { A: 300, B: 140, C: 130, D: 130 },
      count: 4,
    },
    { shape: hairpins({ count: 3 }), code: '21', dimensions: { A: 600, B: 150, C: 600 }, count: 3 },
    // a bar in each of two layers at each of five positions
    { shape: transverse(1400), code: '00', dimensions: { A: 1400 }, count: 10 },
    {
      shape: { kind: 'wedge-bars', diameter: 12, length: 1800, count: 6, layers: 'top' },
      code: '00',
      dimensions: { A: 1800 },
      count: 6,
    },
    {
      shape: { kind: 'diagonals', diameter: 12, length: 1200, count: 4, layers: 'both', runs: 'along', pitch: 100 },
      code: '00',
      dimensions: { A: 1200 },
      count: 8,
    },
  ])('$shape.kind become shape $code', ({ shape, code, dimensions, count }) => {
    const { bars } = barsOf(
      layout({ anchors: [anchor('E2', 1, { hardwareId: 'D4' })], steel: [steel(at('E2-1'), shape)] }),
      'P1',
    )
    expect(bars).toHaveLength(1)
    expect(bars[0]).toMatchObject({ count, shape: { code, dimensions, diameter: shape.diameter } })
  })

  test('edge bars are as long as the chainage between their ends', () => {
    const { bars } = barsOf(
      layout({ steel: [steel(edgeZone, { ...edgeBars(11_000), from: 400, countTop: 2 } as SteelShape)] }),
      'P1',
    )
    expect(bars[0]).toMatchObject({ count: 3, shape: { dimensions: { A: 10_600 } }, zoneName: 'E2 edge' })
  })

  test('bars in a pan are listed with the pan', () => {
    const parts = {
      pans: [pan('PN1', { x: 5000, y: 5000 })],
      anchors: [inPan('PN1')],
      steel: [
        steel(
          { kind: 'pan', panId: 'PN1' },
          { kind: 'trimmers', diameter: 12, length: 2000, count: 2, layers: 'top', runs: 'along', pitch: 100 },
        ),
      ],
    }
    expect(shown(layout(parts))).toEqual(['PN1 01 B12 1 2 2 2000 00', 'PN1 02 B10 1 4 4 1050 51'])
  })

  test('steel in a gap that an added anchor has split is an error that names it', () => {
    const gap: SteelZone = { kind: 'gap', edgeId: 'E2', afterAnchorId: 'E2-1', beforeAnchorId: 'E2-3' }
    const bars = steel(gap, { kind: 'wedge-bars', diameter: 12, length: 1800, count: 6, layers: 'both' }, 'wedge')
    const { problems } = scheduled({ steel: [bars] })
    expect(problems).toMatchObject([{ mark: null, where: 'steel wedge', field: 'zone', severity: 'error' }])
    const whole = { ...bars, zone: { ...gap, beforeAnchorId: 'E2-2' } }
    expect(scheduled({ steel: [whole] }).rows.find((row) => row.code === '00')?.zones).toEqual(['E2 gap 01 to 02'])
  })
})

describe('rows', () => {
  test('zones with the same number of the same bar are one row; another number in each is another row of the mark', () => {
    const of = layout({
      anchors: THREE,
      hardware: [{ ...S4, localSteel: null }],
      steel: [steel(at('E2-1'), hairpins()), steel(at('E2-2'), hairpins()), steel(at('E2-3'), hairpins({ count: 3 }))],
    })
    // 600 + 150 + 600 - 20 - 2 * 10 = 1310, up to 1325
    expect(shown(of)).toEqual(['E2 01 B10 2 2 4 1325 21', 'E2 01 B10 1 3 3 1325 21'])
  })

  test('two sets of one bar in one zone are added together', () => {
    const of = layout({
      anchors: [anchor('E2', 1, { hardwareId: 'D4' })],
      steel: [steel(at('E2-1'), hairpins()), steel(at('E2-1'), hairpins({ first: 300 }))],
    })
    expect(shown(of)).toEqual(['E2 01 B10 1 4 4 1325 21'])
  })

  test('one mark serves two members, a row each', () => {
    const anchors = [anchor('E2', 1, { chainage: 2000 }), anchor('E4', 1, { chainage: 2000 })]
    // 2 * (300 + 140 + 130) - 2.5 * 20 - 5 * 10 = 1040, up to 1050
    expect(shown(layout({ anchors }))).toEqual(['E2 01 B10 1 4 4 1050 51', 'E4 01 B10 1 4 4 1050 51'])
  })

  test('flat turns are said and make a bar of its own', () => {
    const spiral = (flatTurns: number): SteelShape => ({
      kind: 'spiral',
      diameter: 12,
      outside: 230,
      pitch: 55,
      turns: 6,
      flatTurns,
      first: 0,
    })
    const { rows } = scheduled({
      hardware: [{ ...S4, localSteel: null }],
      steel: [steel(at('E2-1'), spiral(2)), steel(at('E2-2'), spiral(0))],
    })
    // pitch 55 is above 230 / 5 = 46: 6 * sqrt((pi * 218)^2 + 55^2) = 4122.4, up to 4125
    expect(rows.map((row) => [row.mark, row.length, row.notes])).toEqual([
      ['01', 4125, []],
      ['02', 4125, ['6 turns of which 2 flat']],
    ])
  })

  test('a dimension that moves by rounding is said', () => {
    const { rows } = scheduled({
      hardware: [{ ...S4, localSteel: null }],
      steel: [steel(at('E2-1'), hairpins({ bend: 143 }))],
    })
    expect(rows[0]?.dimensions.B).toBe(145)
    expect(rows[0]?.notes).toEqual(['B 143 is scheduled as 145'])
  })

  test('totals by type and size: metres and kilograms, arithmetic written out', () => {
    const { totals, mass, metres } = scheduled({
      hardware: [{ ...S4, localSteel: null }],
      steel: [steel(at('E2-1'), hairpins()), steel(edgeZone, edgeBars(11_000)), steel(at('E2-2'), transverse(1400))],
    })
    // 10 mm: 2 x 1.325 = 2.65 m x 0.616; 12 mm: 2 x 11 + 10 x 1.4 = 36 m x 0.888
    expect(totals).toMatchObject([
      { typeAndSize: 'B10', bars: 2 },
      { typeAndSize: 'B12', bars: 12 },
    ])
    expect(totals.map((total) => total.metres)).toEqual([2.65, 36])
    expect(totals[0]?.mass).toBeCloseTo(1.6324, 6)
    expect(totals[1]?.mass).toBeCloseTo(31.968, 6)
    expect(metres).toBeCloseTo(38.65, 9)
    expect(mass).toBeCloseTo(33.6004, 6)
  })

  test('a bent bar over the stock length keeps its row and is an error with its mark', () => {
    // 6000 + 150 + 6000 - 20 - 20 = 12110, up to 12125
    const long = steel(at('E2-1'), hairpins({ leg: 6000 }))
    const { rows, problems } = scheduled({ hardware: [{ ...S4, localSteel: null }], steel: [long] })
    expect(rows).toMatchObject([{ mark: '01', length: 12_125 }])
    expect(problems).toEqual([
      {
        mark: '01',
        where: 'E2-01',
        field: 'length',
        severity: 'error',
        message: '12125 is longer than the 12000 stock length; split it into lapped bars.',
      },
    ])
  })

  test('a pour without bars, and a standard that is not known, are said', () => {
    const empty = layout()
    const strange = { ...empty, job: { ...empty.job, settings: { ...empty.job.settings, barStandard: 'own' } } }
    expect(scheduleOf(empty, 'P1').problems).toMatchObject([{ field: 'steel', severity: 'error' }])
    expect(scheduleOf(strange, 'P1').problems.map((problem) => problem.field)).toEqual(['barStandard', 'steel'])
  })

  test('families not checked pass through; all of them where nobody checked', () => {
    expect(scheduleOf(layout(), 'P1').notYetChecked).toEqual(FAMILIES)
    expect(scheduleOf(layout(), 'P1', ['fit']).notYetChecked).toEqual(['fit'])
  })
})

const HAIRPIN = 'B10 21 A600 B150 C600'
const LINK = 'B10 51 A300 B140 C130 D130'
const mark = (number: number, key: string): BarMark => ({ id: `m${number}`, pourId: 'P1', mark: number, key })

describe('marks', () => {
  test('stored marks keep their bars; new bars take the next free number', () => {
    const of = layout({ anchors: THREE, steel: [steel(at('E2-1'), hairpins())], more: { barMarks: [mark(7, LINK)] } })
    const schedule = scheduleOf(of, 'P1')
    expect(schedule.rows.map((row) => [row.mark, row.code])).toEqual([
      ['07', '51'],
      ['08', '21'],
    ])
    expect(newMarks(schedule, of.barMarks)).toEqual([{ pourId: 'P1', mark: 8, key: HAIRPIN }])
  })

  test('a mark whose bars are gone stays with none and its number is not given again', () => {
    const of = layout({ anchors: THREE, more: { barMarks: [mark(1, HAIRPIN)] } })
    const { rows } = scheduleOf(of, 'P1')
    expect(rows).toMatchObject([
      { mark: '02', code: '51', total: 12 },
      { mark: '01', code: '21', member: null, members: 0, inEach: 0, total: 0, notes: ['cancelled'] },
    ])
    expect(newMarks(scheduleOf(of, 'P1'), of.barMarks)).toEqual([{ pourId: 'P1', mark: 2, key: LINK }])
  })

  test("another pour's marks are another pour's", () => {
    const of = layout({ anchors: THREE, more: { barMarks: [{ ...mark(9, LINK), pourId: 'P2' }] } })
    expect(scheduleOf(of, 'P1').rows[0]?.mark).toBe('01')
  })

  test('one number for two bars is an error', () => {
    const of = layout({ anchors: THREE, more: { barMarks: [mark(1, LINK), { ...mark(1, HAIRPIN), id: 'again' }] } })
    expect(scheduleOf(of, 'P1').problems).toMatchObject([{ mark: '01', field: 'barMarks', severity: 'error' }])
  })

  test('marks past 99 take three digits', () => {
    const of = layout({ anchors: THREE, more: { barMarks: [mark(99, HAIRPIN)] } })
    expect(scheduleOf(of, 'P1').rows[0]?.mark).toBe('100')
  })
})

describe('holding still', () => {
  const anySteel = fc.array(
    fc.record({
      zone: fc.constantFrom<SteelZone>(at('E2-1'), at('E2-2'), at('E2-3'), edgeZone),
      shape: fc.oneof(
        fc.integer({ min: 500, max: 700 }).map((leg) => hairpins({ leg })),
        fc
          .tuple(fc.integer({ min: 1000, max: 1500 }), fc.integer({ min: 1, max: 4 }))
          .map(([length, count]) => transverse(length, count)),
        fc.integer({ min: 9000, max: 14_000 }).map(edgeBars),
      ),
    }),
    { minLength: 1, maxLength: 12 },
  )
  const of = (list: readonly Steel[], barMarks: readonly BarMark[] = []) =>
    layout({ anchors: THREE, hardware: [S4, D4], steel: list, more: { barMarks } })

  test('the order of the steel in the layout changes nothing', () => {
    fc.assert(
      fc.property(anySteel, fc.integer(), (list, seed) => {
        const all = list.map(({ zone, shape }, k) => steel(zone, shape, `s${k}`))
        const turn = Math.abs(seed) % all.length
        const shuffled = [...all.slice(turn), ...all.slice(0, turn)].reverse()
        expect(scheduleOf(of(shuffled), 'P1')).toEqual(scheduleOf(of(all), 'P1'))
      }),
    )
  })

  test('adding or removing steel never renumbers a stored mark', () => {
    fc.assert(
      fc.property(anySteel, anySteel, (first, second) => {
        const before = first.map(({ zone, shape }, k) => steel(zone, shape, `a${k}`))
        const schedule = scheduleOf(of(before), 'P1')
        const stored = newMarks(schedule, []).map((each, k) => ({ ...each, id: `m${k}` }))
        const after = second.map(({ zone, shape }, k) => steel(zone, shape, `b${k}`))
        const numbers = new Map(stored.map((each) => [each.key, each.mark]))
        for (const list of [[...before, ...after], after]) {
          const next = scheduleOf(of(list, stored), 'P1')
          for (const row of next.rows) {
            if (numbers.has(row.key)) expect(row.markNumber).toBe(numbers.get(row.key))
            else expect(row.markNumber).toBeGreaterThan(stored.length)
          }
        }
      }),
    )
  })

  test('every bar of the pour is on the schedule once', () => {
    fc.assert(
      fc.property(anySteel, (list) => {
        const all = of(list.map(({ zone, shape }, k) => steel(zone, shape, `s${k}`)))
        const counted = barsOf(all, 'P1').bars.reduce((sum, bars) => sum + bars.count, 0)
        expect(scheduleOf(all, 'P1').rows.reduce((sum, row) => sum + row.total, 0)).toBe(counted)
      }),
    )
  })
})
