import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  barsOf,
  basisOf,
  cutRun,
  edgeBarPieces,
  layoutIndex,
  scheduleOf,
  type EdgeBarsShape,
  type Run,
  type Span,
  type Steel,
  type SteelShape,
  type SteelZone,
} from '@wedgeline/engine'
import { anchor, edge, EDGES, layout, length, S4, SETTINGS, SOUTH, type Parts } from '../sample-layout'

const run = (change: Partial<Run> = {}): Run => ({
  from: 0,
  to: 19_000,
  lap: 600,
  stockLength: 12_000,
  keepClear: [],
  isStaggered: true,
  stagger: 1.3,
  ...change,
})
const lengths = (pieces: readonly Span[] = []) => pieces.map(({ from, to }) => to - from)
const laps = (pieces: readonly Span[]) => pieces.slice(1).map(({ from }, k) => ({ from, to: pieces[k]?.to ?? 0 }))
const middle = ({ from, to }: Span) => (from + to) / 2

describe('cutting one long bar', () => {
  test('a bar of the stock length stays whole; 1 mm more is two pieces', () => {
    expect(cutRun(run({ to: 12_000 }))?.pieces).toEqual([{ from: 0, to: 12_000 }])
    expect(cutRun(run({ to: 12_001 }))?.pieces).toHaveLength(2)
  })

  test('two pieces as long as the bar and a lap: 19000 + 600 = 12000 + 7600', () => {
    const cut = cutRun(run())
    expect(lengths(cut?.pieces)).toEqual([12_000, 7600])
    expect(laps(cut?.pieces ?? [])).toEqual([{ from: 11_400, to: 12_000 }])
  })

  test('the other bar is the same pieces from the other end, its lap in another section', () => {
    // laps 11400..12000 and 7000..7600: middles 11700 and 7300, more than 1.3 x 600 apart
    const cut = cutRun(run())
    expect(lengths(cut?.mirrored)).toEqual([7600, 12_000])
    expect(laps(cut?.mirrored ?? [])).toEqual([{ from: 7000, to: 7600 }])
    expect(cut?.isStaggered).toBe(true)
  })

  test('laps stand in different sections from the stagger on, and not 1 mm below', () => {
    // As above: middles 11700 and 7300 are 4400 apart, 7.3333 x 600. With two pieces no lap can lie farther out.
    expect(cutRun(run({ stagger: 4400 / 600 }))?.pieces).toHaveLength(2)
    expect(cutRun(run({ stagger: 4401 / 600 }))?.pieces).toHaveLength(3)
  })

  test('two pieces reach 2 x 12000 - 600 = 23400 and no further', () => {
    const alone = { isStaggered: false }
    expect(cutRun(run({ to: 23_400, ...alone }))?.pieces).toHaveLength(2)
    expect(cutRun(run({ to: 23_401, ...alone }))?.pieces).toHaveLength(3)
    // two whole stock lengths leave no room to move the lap: a third piece lets every second bar be lapped elsewhere
    const staggered = cutRun(run({ to: 23_400 }))
    expect(staggered?.pieces).toHaveLength(3)
    expect(staggered?.isStaggered).toBe(true)
  })

  test('a single bar takes equal pieces: one mark', () => {
    // (19000 + 600) / 2 = 9800, clear of an anchor at 12000 where the stock length would lap
    const cut = cutRun(run({ isStaggered: false, keepClear: [{ from: 11_500, to: 11_900 }] }))
    expect(lengths(cut?.pieces)).toEqual([9800, 9800])
  })

  test('no lap over a body where there is room beside it, touching allowed and 1 mm less not', () => {
    // One lap of 600 between two bodies 600 apart, and none elsewhere
    const bodies = [
      { from: 0, to: 8400 },
      { from: 9000, to: 19_000 },
    ]
    const cut = cutRun(run({ isStaggered: false, keepClear: bodies }))
    expect(laps(cut?.pieces ?? [])).toEqual([{ from: 8400, to: 9000 }])
    expect(cut?.clearance).toBe(0)
    const tight = cutRun(
      run({
        isStaggered: false,
        keepClear: [
          { from: 0, to: 8401 },
          { from: 9000, to: 19_000 },
        ],
      }),
    )
    expect(tight?.clearance).toBe(-1)
  })

  test('a lap that leaves no room for pieces gives none', () => {
    expect(cutRun(run({ lap: 4001 }))).toBeNull()
    expect(cutRun(run({ lap: 4000 }))).not.toBeNull()
  })

  test('pieces cover the bar, hold to stock and lap by the lap or up to a step more', () => {
    const whole = fc.record({
      to: fc.integer({ min: 12_001, max: 90_000 }),
      lap: fc.integer({ min: 40, max: 300 }).map((n) => n * 5),
      gap: fc.integer({ min: 900, max: 4000 }),
      isStaggered: fc.boolean(),
    })
    fc.assert(
      fc.property(whole, ({ to, lap, gap, isStaggered }) => {
        const keepClear = Array.from({ length: Math.floor(to / gap) }, (_, k) => ({
          from: (k + 0.5) * gap - 150,
          to: (k + 0.5) * gap + 150,
        }))
        const cut = cutRun(run({ to, lap, keepClear, isStaggered }))
        if (!cut) throw new Error('no cut')
        for (const pieces of [cut.pieces, cut.mirrored]) {
          expect(pieces[0]?.from).toBe(0)
          expect(pieces.at(-1)?.to).toBe(to)
          for (const each of lengths(pieces)) {
            expect(each).toBeLessThanOrEqual(12_000)
            expect(each % 25).toBe(0)
          }
          for (const each of laps(pieces)) {
            expect(each.to - each.from).toBeGreaterThanOrEqual(lap)
            expect(each.to - each.from).toBeLessThan(lap + 25)
          }
        }
        if (!isStaggered || !cut.isStaggered) return
        for (const one of laps(cut.pieces)) {
          for (const other of laps(cut.mirrored)) {
            expect(Math.abs(middle(one) - middle(other))).toBeGreaterThanOrEqual(1.3 * lap - 1e-6)
          }
        }
      }),
      { numRuns: 60 },
    )
  })
})

const SHAPE: EdgeBarsShape = {
  kind: 'edge-bars',
  diameter: 12,
  countTop: 1,
  countBottom: 1,
  first: 100,
  pitch: 100,
  from: 50,
  to: 19_150,
}
const EDGE_ZONE: SteelZone = { kind: 'edge', edgeId: 'E2' }
const set = (shape: SteelShape, zone: SteelZone = EDGE_ZONE): Steel => ({
  id: 'bars',
  pourId: 'P1',
  zone,
  shape,
  source: 'by-hand',
  isLocked: false,
})
const piecesOf = (parts: Parts, shape = SHAPE) => {
  const of = layout({ steel: [set(shape)], ...parts })
  return edgeBarPieces(layoutIndex(of), basisOf(of.job), { shape, edgeId: 'E2' })
}

describe('pieces of edge bars', () => {
  /**
   * EN 1992-1-1 8.4, 8.7 (Table 8.2 and alpha 6 from memory), 22 MPa at the last stage:
   * fctk 0.7 x 0.3 x 22^(2/3) = 1.6487, fbd 2.25 x 1.6487 / 1.5 = 2.4731; lb,rqd = 3 x 434.78 / 2.4731 = 527.4;
   * cd 30: alpha 2 = 1 - 0.15 x 18 / 12 = 0.775; one bar a layer: all lapped at one section, alpha 6 = 1.5:
   * l0 = 0.775 x 1.5 x 527.4 = 613.1, taken up to 615.
   */
  test('two bars of 19.1 m at 22 MPa: lap of 615, 12000 + 7725, the lower one turned round', () => {
    const { pieces, lapNeeded, share, notes } = piecesOf({})
    expect(lapNeeded).toBe(615)
    expect(share).toBe(1)
    // 19100 + 615 - 12000 = 7715, up to 7725
    expect(pieces).toEqual([
      { layer: 'top', bar: 0, from: 50, to: 12_050 },
      { layer: 'top', bar: 0, from: 11_425, to: 19_150 },
      { layer: 'bottom', bar: 0, from: 50, to: 7775 },
      { layer: 'bottom', bar: 0, from: 7150, to: 19_150 },
    ])
    expect(notes).toEqual([
      'Split at the stock length of 12000: 12000 + 7725, lapped 615, every second bar the other way round.',
    ])
  })

  test('no lap lies over a plate, spiral or links of an anchor', () => {
    const anchors = Array.from({ length: 10 }, (_, k) => anchor('E2', k + 1, { chainage: 900 + 1900 * k }))
    const { laps: placed, clearance } = piecesOf({ anchors })
    expect(clearance).toBeGreaterThanOrEqual(0)
    for (const { chainage } of anchors) {
      for (const lap of placed) {
        // links 300 wide, wider than the plate of 220
        expect(Math.max(lap.from - (chainage + 150), chainage - 150 - lap.to)).toBeGreaterThanOrEqual(0)
      }
    }
  })

  test('where anchors stand too close for any lap, the farthest place is taken and said', () => {
    const anchors = Array.from({ length: 31 }, (_, k) => anchor('E2', k + 1, { chainage: 600 + 600 * k }))
    const { clearance, notes } = piecesOf({ anchors })
    expect(clearance).toBeLessThan(0)
    expect(notes.at(-1)).toContain('No place clear of every anchor')
  })

  test('bars are cut where the edge steps', () => {
    const stepped = edge(SOUTH, 'a', [length(0, 8000), length(8000, 19_200, { soffit: -300 })])
    const { pieces, notes, lapNeeded } = piecesOf({ edges: [stepped, ...EDGES.slice(1)] })
    expect(lapNeeded).toBeNull()
    // top bars may run on through the step of the soffit; lower ones of the deep length end with its edge cover of 30
    expect(pieces.map(({ layer, from, to }) => [layer, from, to])).toEqual([
      ['top', 50, 8000],
      ['top', 8000, 19_150],
      ['bottom', 50, 8000],
      ['bottom', 8030, 19_150],
    ])
    expect(notes).toEqual(['Cut where the edge steps, at chainage 8000.'])
  })

  test('in an edge 520 deep the top bars take the longer lap of poor bond, those below do not (from memory)', () => {
    // Poor bond: 613.1 / 0.7 = 875.8, taken up to 880. 19100 + 880 - 12000 = 7980, up to 8000.
    const deep = edge(SOUTH, 'a', [length(0, 19_200, { soffit: -300 })])
    const { pieces, lapNeeded, notes } = piecesOf({ edges: [deep, ...EDGES.slice(1)] })
    expect(lapNeeded).toBe(880)
    expect(pieces).toEqual([
      { layer: 'top', bar: 0, from: 50, to: 12_050 },
      { layer: 'top', bar: 0, from: 11_150, to: 19_150 },
      { layer: 'bottom', bar: 0, from: 50, to: 7775 },
      { layer: 'bottom', bar: 0, from: 7150, to: 19_150 },
    ])
    expect(notes).toEqual([
      'Top bars split at the stock length of 12000: 12000 + 8000, lapped 880, every second bar the other way round.',
      'Bottom bars split at the stock length of 12000: 12000 + 7725, lapped 615, every second bar the other way round.',
    ])
  })

  test('the schedule orders the pieces: two marks, two bars each, no error', () => {
    const of = layout({ hardware: [{ ...S4, localSteel: null }], steel: [set(SHAPE)] })
    const { rows, problems } = scheduleOf(of, 'P1')
    expect(rows.map(({ length: each, total }) => [each, total])).toEqual([
      [7725, 2],
      [12_000, 2],
    ])
    expect(rows[0]?.notes.join()).toContain('lapped 615')
    expect(problems).toEqual([])
  })

  test('other straight bars are split too: 13 m of wedge bar without credit for cover', () => {
    // l0 = 1.0 x 1.5 x 527.4 = 791.1, up to 795, no credit for cd: 13000 + 795 = 12000 + 1795, up to 1800
    const zone: SteelZone = { kind: 'gap', edgeId: 'E2', afterAnchorId: null, beforeAnchorId: null }
    const shape: SteelShape = { kind: 'wedge-bars', diameter: 12, length: 13_000, count: 1, layers: 'top' }
    const { bars } = barsOf(layout({ steel: [set(shape, zone)] }), 'P1')
    // One bar: equal pieces, (13000 + 795) / 2 = 6897.5, up to 6900
    expect(bars.map(({ count, shape: { dimensions } }) => [count, dimensions.A])).toEqual([[2, 6900]])
  })

  test('a shorter stock length is the job’s', () => {
    const of = layout({ steel: [set(SHAPE)] })
    const short = { ...of, job: { ...of.job, settings: { ...SETTINGS, stockLength: 6000 } } }
    const { pieces } = edgeBarPieces(layoutIndex(short), basisOf(short.job), { shape: SHAPE, edgeId: 'E2' })
    // 19100 in pieces of 6000 with laps of 615: (19100 - 615) / 5385 = 3.43, so 4 each
    expect(pieces).toHaveLength(8)
    expect(Math.max(...pieces.map(({ from, to }) => to - from))).toBeLessThanOrEqual(6000)
  })
})
