import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  cornerWedges,
  gapAcross,
  gapsOfEdge,
  layoutIndex,
  wedgesOfEdge,
  type Anchor,
  type GapWedge,
  type JobSettings,
  type Layout,
} from '../../../packages/engine/src'
import { usedSpreads, measuredWedge } from '../../../packages/engine/src/wedge/wedges-of-edge'
import { evaluated } from '../step-text'
import {
  anchor,
  D4,
  deadEnd,
  edge,
  inPan,
  layout,
  length,
  NORTH,
  pan,
  rectangle,
  S4,
  SETTINGS,
  SOUTH,
  EDGES,
  twoPours,
  WEST,
  type Parts,
} from '../sample-layout'

/** Spread at 45 degrees throughout, so that depth and reach along the edge are the same number. */
function laid(parts: Parts, settings: Partial<JobSettings> = {}): Layout {
  const made = layout(parts)
  return {
    ...made,
    job: { ...made.job, settings: { ...SETTINGS, wedgeSpread: Math.PI / 4, ...settings } },
    tendons: [...new Map(made.tendons.map((tendon) => [tendon.id, tendon])).values()],
  }
}

/** The wedge of the gap at a place along an edge, counted from 0. */
function wedgeAt(parts: Parts & { settings?: Partial<JobSettings> }, edgeId: string, at: number): GapWedge {
  const index = layoutIndex(laid(parts, parts.settings))
  const gap = gapsOfEdge(index, edgeId)[at]
  const wedge = gap && wedgesOfEdge(index, edgeId).get(gap.id)
  if (!wedge) throw new Error('no wedge')
  return wedge
}

const plate = (name: string, chainage: number, change: Partial<Anchor> = {}) => {
  const [edgeId = '', number = ''] = name.split('/')
  return anchor(edgeId, Number(number), { chainage, setBack: 0, ...change })
}

describe('two plates of 220, spread at 45 degrees', () => {
  const pair = [plate('E2/1', 5000), plate('E2/2', 6750)]

  test('at the edge: a triangle on the 1530 between them', () => {
    const wedge = wedgeAt({ anchors: pair }, 'E2', 1)
    // 1530 / 2 = 765; 1530 * 765 / 2 = 585 225
    expect(wedge.depth).toBeCloseTo(765, 6)
    expect(wedge.area).toBeCloseTo(585_225, 2)
    expect(wedge.apex.chainage).toBeCloseTo(5875, 6)
    expect(wedge.polygons).toHaveLength(1)
  })

  test('set back 110 and 300: uneven sides', () => {
    // Clear 1530; (1530 + 110 + 300) / 2 = 970, apex 860 from the first plate and 670 from the second.
    const anchors = [plate('E2/1', 5000, { setBack: 110 }), plate('E2/2', 6750, { setBack: 300 })]
    const wedge = wedgeAt({ anchors }, 'E2', 1)
    expect(wedge.depth).toBeCloseTo(970, 6)
    expect(wedge.apex.chainage).toBeCloseTo(5110 + 860, 6)
    // 110 * 110 + (110 + 970) / 2 * 860 + (970 + 300) / 2 * 670 + 300 * 110
    expect(wedge.area).toBeCloseTo(12_100 + 464_400 + 425_450 + 33_000, 2)
  })

  test('the spread may start at the end of the device: 60 deeper', () => {
    const parts = { anchors: pair, hardware: [{ ...S4, deviceLength: 60 }] }
    expect(wedgeAt({ ...parts, settings: { spreadStart: 'device-end' } }, 'E2', 1).depth).toBeCloseTo(825, 6)
  })

  test('every angle is shown, the job’s own first; each printed line gives its depth', () => {
    const wedge = wedgeAt({ anchors: pair, settings: { wedgeSpread: Math.atan(0.5) } }, 'E2', 1)
    // 1530 / (2 * 0.5) = 1530; EN 1530 * 0.75 = 1147.5; 45 degrees 765
    expect(wedge.depthBySpread.map(({ depth }) => Math.round(depth * 10) / 10)).toEqual([1530, 1147.5, 765])
    expect(wedge.depth).toBe(wedge.depthBySpread[0]?.depth)
    for (const { steps, depth } of wedge.depthBySpread) {
      expect(steps.map(evaluated)).toEqual([expect.closeTo(depth, 6)])
    }
  })

  test('without an angle of its own the job takes the basis’s, and 45 degrees beside it', () => {
    const wedge = wedgeAt({ anchors: pair, settings: { wedgeSpread: null } }, 'E2', 1)
    expect(wedge.depthBySpread.map(({ depth }) => Math.round(depth * 10) / 10)).toEqual([1147.5, 765])
  })
})

describe('spreads that overlap', () => {
  test('behind two pans the spread of the edge’s own anchors comes first', () => {
    // Plates at 4000 and 8000 at the edge, pans between them 3400 in. Depth c - 4110 and 7890 - c, meeting at 6000.
    const parts = {
      anchors: [plate('E4/1', 4000), plate('E4/2', 8000), inPan('PN01'), inPan('PN02')],
      pans: [pan('PN01', { x: 5500, y: 14000 }), pan('PN02', { x: 6500, y: 14000 })],
    }
    const between = wedgeAt(parts, 'E4', 2)
    expect(between.depth).toBeCloseTo(1890, 6)
    // 2 * (1390 + 1890) / 2 * 500
    expect(between.area).toBeCloseTo(1_640_000, 2)
    // From 4110 to 5500, where 1390 is reached.
    expect(wedgeAt(parts, 'E4', 1).depth).toBeCloseTo(1390, 6)
    expect(wedgeAt(parts, 'E4', 1).area).toBeCloseTo(1390 ** 2 / 2, 2)
  })

  test('anchors of another edge count by their direction: one 30 degrees aside does, one square to it does not', () => {
    // A bevelled pour: the bevel from (10000, 0) to (19200, 5311.6) is 30 degrees off the south edge.
    const bevel = { ...SOUTH, id: 'bevel', mark: 'E9', x: 10000, azimuth: Math.PI / 3 }
    const outline = [
      { id: 'a', x: 0, y: 0 },
      { id: 'b', x: 10000, y: 0 },
      { id: 'e', x: 19200, y: 9200 / Math.sqrt(3) },
      { id: 'c', x: 19200, y: 17400 },
      { id: 'd', x: 0, y: 17400 },
    ]
    const parts = (more: readonly Anchor[]): Parts => ({
      pour: { outline },
      edgeLines: [SOUTH, WEST, bevel],
      edges: [
        edge(SOUTH, 'a', [length(0, 10000)]),
        edge(WEST, 'd', [length(0, 17400)]),
        edge(bevel, 'b', [length(0, 10000)]),
      ],
      anchors: [plate('E2/1', 6000), ...more],
    })
    const alone = wedgeAt(parts([]), 'E2', 1)
    // Plate's side at 6110, end of the edge 3890 from it.
    expect(alone.depth).toBeCloseTo(3890, 6)
    expect(wedgeAt(parts([plate('E9/1', 500)]), 'E2', 1).depth).toBeLessThan(3000)
    expect(wedgeAt(parts([plate('E1/1', 500)]), 'E2', 1).depth).toBeCloseTo(3890, 6)
  })
})

describe('both ends of a tendon', () => {
  const low: Parts = {
    pour: { outline: rectangle(19200, 6000) },
    edgeLines: [SOUTH, { ...NORTH, y: 6000 }],
    edges: [edge(SOUTH, 'a', [length(0, 19200)]), edge(NORTH, 'c', [length(0, 19200)])],
  }
  const through = (n: number, chainage: number) => [
    plate(`E2/${n}`, chainage, { tendonId: `T${n}` }),
    plate(`E4/${n}`, chainage, { tendonId: `T${n}` }),
  ]

  test('short tendons far apart leave a length that goes through from edge to edge', () => {
    // 6000 long, 8000 apart: half-way in, each reaches 110 + 3000 aside: nothing from 7110 to 8890.
    const wedge = wedgeAt({ ...low, anchors: [...through(1, 4000), ...through(2, 12000)] }, 'E2', 1)
    expect(wedge.throughs).toEqual([{ from: expect.closeTo(7110, 6) as number, to: expect.closeTo(8890, 6) as number }])
    // From this edge: (8000 - 220) / 2 = 3890; the rest is the other edge's.
    expect(wedge.depth).toBeCloseTo(3890, 6)
    expect(wedge.area).toBeCloseTo(3890 ** 2, 2)
  })

  test('near enough they leave none', () => {
    // 6220 apart the spreads just meet half-way in: (6220 - 220) / 2 = 3000.
    const wedge = wedgeAt({ ...low, anchors: [...through(1, 4000), ...through(2, 10200)] }, 'E2', 1)
    expect(wedge.throughs).toEqual([])
    expect(wedge.depth).toBeCloseTo(2990, 6)
  })

  test('a tendon that stops short in a pan compresses only between its two ends', () => {
    // From the south edge at 9600 to a pan 2000 in: 110 + 1000 aside at the widest, 1000 in.
    // Left of 8490 the tendon at 4000 counts: 8490 - 4110 = 4380; without the other end it would be 2690.
    const parts: Parts = {
      anchors: [
        plate('E2/1', 4000),
        plate('E2/2', 9600, { tendonId: 'T2' }),
        plate('E2/3', 15200),
        { ...inPan('PN01'), tendonId: 'T2' },
      ],
      pans: [pan('PN01', { x: 9600, y: 2000 })],
    }
    const wedge = wedgeAt(parts, 'E2', 1)
    expect(wedge.depth).toBeCloseTo(4380, 6)
    expect(wedge.apex.chainage).toBeCloseTo(8490, 6)
    expect(wedge.area).toBeCloseTo(4380 ** 2 / 2 + 1000 ** 2 / 2, 2)
    expect(wedge.throughs).toEqual([])
  })
})

describe('bonded dead ends', () => {
  const pair = [anchor('E2', 1, { chainage: 900 }), deadEnd('E2', 2, { chainage: 2650 })]

  test('from the end of their bond, and from their bulbs beside it', () => {
    // Clear 1490: (1490 + 110 + 300) / 2 = 950; (1490 + 110 + 1528) / 2 = 1564
    const wedge = wedgeAt({ anchors: pair }, 'E2', 1)
    expect(wedge.depthFromBulbs).toBeCloseTo(950, 6)
    expect(wedge.depthFromBond).toBeCloseTo(1564, 6)
    expect(wedge.depth).toBe(wedge.depthFromBond)
  })

  test('without test data the transmission length of the basis: lpt2 1228 in 22 MPa (podium, from memory)', () => {
    const hardware = [S4, { ...D4, transmissionLength: null }]
    expect(wedgeAt({ anchors: pair, hardware }, 'E2', 1).depthFromBond).toBeCloseTo(1564, 0)
  })

  test('are deeper than a plate of the same size and set-back', () => {
    const asPlate = { ...D4, kind: 'plate', transmissionLength: null } as const
    const [bonded, plain] = [
      [S4, D4],
      [S4, asPlate],
    ].map((hardware) => wedgeAt({ anchors: pair, hardware }, 'E2', 1))
    expect(bonded?.depth).toBeGreaterThan((plain?.depth ?? Infinity) + 600)
    expect(plain?.depthFromBond).toBeNull()
  })
})

describe('corners', () => {
  const shared = (anchors: readonly Anchor[], parts: Parts = {}) => [
    ...cornerWedges(layoutIndex(laid({ ...parts, anchors })), 'P1').values(),
  ]

  test('the area that is in the wedge of both edges: a triangle of 900 by 900', () => {
    // Plates set back 110 at 900 from the corner: each wedge reaches 110 + (900 - 110) = 900 at the corner.
    const corners = shared([anchor('E2', 1, { chainage: 900 }), anchor('E1', 1, { chainage: 900 })])
    expect(corners.map(({ before, after }) => `${before.id}/${after.id}`)).toEqual(['E1/E2'])
    expect(corners[0]?.area).toBeCloseTo(405_000, 2)
    expect(corners[0]?.alongBefore).toBeCloseTo(900, 6)
    expect(corners[0]?.alongAfter).toBeCloseTo(900, 6)
  })

  test('one anchor nearer to the corner than the other', () => {
    // E2's end wedge, from 400 deep at the corner to 110 before its plate and along it, lies wholly in that of E1:
    // (400 + 110) / 2 * 290 + 110 * 110 = 73 950 + 12 100.
    const [corner] = shared([anchor('E2', 1, { chainage: 400 }), anchor('E1', 1, { chainage: 900 })])
    expect(corner?.area).toBeCloseTo(86_050, 2)
  })

  test('a re-entrant corner: the spread of a tendon beside it starts again there', () => {
    const outline = [
      { id: 'a', x: 0, y: 0 },
      { id: 'b', x: 17400, y: 0 },
      { id: 'c', x: 17400, y: 10800 },
      { id: 'd', x: 12600, y: 10800 },
      { id: 'e', x: 12600, y: 17400 },
      { id: 'f', x: 0, y: 17400 },
    ]
    const inner = { ...NORTH, id: 'inner', mark: 'E7-NR', y: 10800 }
    const side = { ...WEST, id: 'side', mark: 'E7-ER', x: 12600 }
    const parts: Parts = {
      pour: { outline },
      edgeLines: [NORTH, inner, side],
      edges: [
        edge(NORTH, 'e', [length(0, 12600)]),
        edge(inner, 'c', [length(12600, 17400)]),
        edge(side, 'd', [length(10800, 17400)]),
      ],
      anchors: [plate('E4/1', 12000), plate('E7-NR/1', 14600)],
    }
    // From the corner at 12600 and from the plate's side at 14490: 1890 / 2 = 945, area 945^2 + 0.
    const wedge = wedgeAt(parts, 'E7-NR', 0)
    expect(wedge.depth).toBeCloseTo(945, 6)
    expect(wedge.area).toBeCloseTo(945 ** 2, 2)
    // The plate at 12000 meets the inner side at 12600, 490 in.
    expect(wedgeAt(parts, 'E4', 1).depth).toBeCloseTo(490, 6)
    const corners = [...cornerWedges(layoutIndex(laid(parts)), 'P1').values()]
    expect(corners.filter(({ isReentrant }) => isReentrant).map(({ corner }) => corner.id)).toEqual(['d'])
  })
})

test('across a pour boundary two end gaps are one once both pours are stressed', () => {
  const index = layoutIndex(
    laid(twoPours([plate('E2/1', 18400), { ...plate('E2-P2/1', 19800), castWithPourId: 'P2' }])),
  )
  const [, last] = gapsOfEdge(index, 'E2')
  if (!last) throw new Error('no gap')
  // 1400 apart: (1400 - 220) / 2 = 590 as one; 800 - 110 = 690 for the first pour alone.
  expect(gapAcross(index, last)).toMatchObject({ otherMark: 'E2', from: 18400, to: 19800 })
  expect(gapAcross(index, last)?.depth).toBeCloseTo(590, 6)
  expect(gapAcross(index, last)?.area).toBeCloseTo(590 ** 2, 2)
  expect(wedgesOfEdge(index, 'E2').get(last.id)?.depth).toBeCloseTo(690, 6)
  const [first] = gapsOfEdge(index, 'E2')
  expect(first && gapAcross(index, first)).toBeNull()
})

describe('a thousand edges at random', () => {
  const EDGE = 19200
  const one = fc.record({
    step: fc.integer({ min: 150, max: 4000 }),
    setBack: fc.integer({ min: 0, max: 400 }),
    skew: fc.integer({ min: -15, max: 15 }),
    isDead: fc.boolean(),
  })
  const rows = fc.array(one, { minLength: 1, maxLength: 9 })
  type Row = readonly { step: number; setBack: number; skew: number; isDead: boolean }[]

  const anchorsOf = (row: Row): Anchor[] => {
    let chainage = 0
    return row.flatMap(({ step, setBack, skew, isDead }, i) => {
      chainage += step
      const change = { chainage, setBack, skew: (skew * Math.PI) / 180 }
      return chainage > EDGE - 200 ? [] : [(isDead ? deadEnd : anchor)('E2', i + 1, change)]
    })
  }
  const figures = (anchors: readonly Anchor[]) => {
    const index = layoutIndex(laid({ anchors, edges: EDGES.slice(0, 1) }, { wedgeSpread: Math.atan(2 / 3) }))
    return { index, wedges: gapsOfEdge(index, 'E2').map((gap) => wedgesOfEdge(index, 'E2').get(gap.id)) }
  }
  const options = { numRuns: 334, seed: 20261201 }

  test('the wedges of the gaps together are the wedge of the whole edge', () => {
    fc.assert(
      fc.property(rows, (row) => {
        const { index, wedges } = figures(anchorsOf(row))
        const whole = measuredWedge(usedSpreads(index, 'E2').fromBulbs, { from: 0, to: EDGE })
        const parts = wedges.reduce((sum, wedge) => sum + (wedge?.areaFromBulbs ?? NaN), 0)
        expect(parts / whole.area).toBeCloseTo(1, 9)
        expect(Math.max(...wedges.map((wedge) => wedge?.depthFromBulbs ?? NaN))).toBeCloseTo(whole.apex.depth, 5)
      }),
      options,
    )
  })

  test('an edge turned round has the same wedges from the other end', () => {
    fc.assert(
      fc.property(rows, (row) => {
        const anchors = anchorsOf(row)
        const turned = anchors.map((each) => ({ ...each, chainage: EDGE - each.chainage, skew: -each.skew }))
        const [straight, mirrored] = [figures(anchors).wedges, figures(turned).wedges.reverse()]
        expect(mirrored).toHaveLength(straight.length)
        for (const [i, wedge] of straight.entries()) {
          expect(mirrored[i]?.depth).toBeCloseTo(wedge?.depth ?? NaN, 5)
          expect(((mirrored[i]?.area ?? NaN) - (wedge?.area ?? NaN)) / 1e6).toBeCloseTo(0, 8)
        }
      }),
      options,
    )
  })

  test('the order in which anchors are listed does not matter, and no outline is deeper than its depth', () => {
    fc.assert(
      fc.property(rows, (row) => {
        const anchors = anchorsOf(row)
        const [straight, reversed] = [figures(anchors).wedges, figures([...anchors].reverse()).wedges]
        expect(reversed.map((wedge) => wedge?.area)).toEqual(straight.map((wedge) => wedge?.area))
        for (const wedge of straight) {
          const depths = wedge?.polygons[0]?.map(({ depth }) => depth) ?? []
          expect(Math.max(...depths)).toBeCloseTo(wedge?.depth ?? NaN, 5)
          expect(wedge?.steps.map(evaluated)).toEqual([expect.closeTo(wedge?.depth ?? NaN, 5)])
        }
      }),
      options,
    )
  })
})
