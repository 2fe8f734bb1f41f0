import { describe, expect, test } from 'vitest'
import { edgeFrame, gapsOfEdge, gridReference, layoutIndex, leanOf, zonesOfPour } from '../../packages/engine/src'
import { anchor, deadEnd, edge, inPan, layout, length, NORTH, pan, SOUTH, WEST, GRID } from './sample-layout'

describe('the frame of an edge', () => {
  const plain = layout()

  test.each([
    { id: 'E2', from: 0, to: 19200, at: { x: 1000, y: 300 }, azimuth: 180, leftToRight: true },
    { id: 'J1', from: 0, to: 17400, at: { x: 18900, y: 1000 }, azimuth: 90, leftToRight: true },
    { id: 'E4', from: 0, to: 19200, at: { x: 1000, y: 17100 }, azimuth: 0, leftToRight: false },
    { id: 'E1', from: 0, to: 17400, at: { x: 300, y: 1000 }, azimuth: 270, leftToRight: false },
  ])('$id: chainage 1000, 300 into the slab', ({ id, from, to, at, azimuth, leftToRight }) => {
    const frame = edgeFrame(plain, id)
    expect(frame).toMatchObject({ from, to, runsLeftToRight: leftToRight })
    expect(frame.pointAt(1000, 300)).toEqual(at)
    expect(frame.local(at)).toEqual({ chainage: 1000, depth: 300 })
    expect((frame.outwardAzimuth * 180) / Math.PI).toBeCloseTo(azimuth, 9)
  })

  test('an edge line that runs the other way turns chainage and nothing else', () => {
    const westward = { ...SOUTH, x: 20000, azimuth: 1.5 * Math.PI }
    const frame = edgeFrame(layout({ edgeLines: [westward], edges: [edge(westward, 'a', [length(800, 20000)])] }), 'E2')
    // Corner b at x 19200 lies 800 from the line's zero at x 20000, corner a 20000 from it.
    expect(frame).toMatchObject({ from: 800, to: 20000, runsLeftToRight: false })
    expect(frame.pointAt(20000 - 1000, 300)).toEqual({ x: 1000, y: 300 })
  })

  test('an oblique side: 3-4-5, 5 along and 5 in', () => {
    // Along (4, 3)/5, inward (-3, 4)/5: 5 along is (4, 3), 5 in is (-3, 4).
    const line = { ...SOUTH, azimuth: Math.atan2(4, 3) }
    const outline = [
      { id: 'a', x: 0, y: 0 },
      { id: 'b', x: 4000, y: 3000 },
      { id: 'c', x: 0, y: 9000 },
    ]
    const frame = edgeFrame(
      layout({ pour: { outline }, edgeLines: [line], edges: [edge(line, 'a', [length(0, 5000)])] }),
      'E2',
    )
    const point = frame.pointAt(5, 5)
    expect(point.x).toBeCloseTo(1, 9)
    expect(point.y).toBeCloseTo(7, 9)
    expect(frame.to).toBeCloseTo(5000, 9)
  })

  test('top and soffit follow the lengths; where two meet, the one that begins there counts', () => {
    const stepped = edge(WEST, 'd', [length(600, 17400), length(0, 600, { soffit: -480 })])
    const frame = edgeFrame(layout({ edges: [stepped] }), 'E1')
    expect([-10, 0, 599, 600, 17400, 17500].map(frame.soffitAt)).toEqual([-480, -480, -480, 0, 0, 0])
  })

  test('a corner that is not in the outline is named', () => {
    expect(() => edgeFrame(layout({ edges: [edge(WEST, 'z', [])] }), 'E1')).toThrow(/corner.*"z"/)
  })

  test('skew leans to the right of somebody outside, whatever way chainage runs', () => {
    // A south edge's tendon with its outward axis at azimuth 177 goes in at azimuth 357, west of north: chainage falls.
    expect(leanOf(edgeFrame(plain, 'E2'), -0.05)).toBe(-0.05)
    // A north edge's at azimuth 3 goes in at 183, west of south: chainage falls as well.
    expect(leanOf(edgeFrame(plain, 'E4'), 0.05)).toBe(-0.05)
  })
})

describe('gaps', () => {
  const gaps = (parts: Parameters<typeof layout>[0], id: string) =>
    gapsOfEdge(layoutIndex(layout(parts)), id).map((gap) => gap.id)

  test('pans that face the edge stand in its row; those that face another do not', () => {
    // The podium's north edge: N03 at the edge, pans behind the core wall, N09 at the edge.
    const parts = {
      anchors: [
        deadEnd('E4', 3, { chainage: 4400 }),
        deadEnd('E4', 9, { chainage: 14900 }),
        inPan('PN01'),
        inPan('PN05'),
        inPan('PN06'),
      ],
      pans: [
        pan('PN05', { x: 13150, y: 14000 }),
        pan('PN01', { x: 6150, y: 14000 }),
        pan('PN06', { x: 1600, y: 7500, azimuth: 1.5 * Math.PI }),
      ],
    }
    expect(gaps(parts, 'E4')).toEqual([
      'gap:E4:start:E4-3',
      'gap:E4:E4-3:PN01-anchor',
      'gap:E4:PN01-anchor:PN05-anchor',
      'gap:E4:PN05-anchor:E4-9',
      'gap:E4:E4-9:end',
    ])
    expect(gaps(parts, 'E1')).toEqual(['gap:E1:start:PN06-anchor', 'gap:E1:PN06-anchor:end'])
    expect(gaps(parts, 'J1')).toEqual(['gap:J1:start:end'])
  })

  test('a pan behind a re-entrant corner belongs to the edge that its jack meets first', () => {
    const outline = [
      { id: 'a', x: 0, y: 0 },
      { id: 'b', x: 17400, y: 0 },
      { id: 'c', x: 17400, y: 10800 },
      { id: 'd', x: 12600, y: 10800 },
      { id: 'e', x: 12600, y: 17400 },
      { id: 'f', x: 0, y: 17400 },
    ]
    const inner = { ...NORTH, id: 'inner', mark: 'E7-NR', y: 10800 }
    const parts = {
      pour: { outline },
      edgeLines: [NORTH, inner],
      edges: [edge(NORTH, 'e', [length(0, 12600)]), edge(inner, 'c', [length(12600, 17400)])],
      anchors: [inPan('PN1'), inPan('PN2')],
      pans: [pan('PN1', { x: 12000, y: 9000 }), pan('PN2', { x: 13000, y: 9000 })],
    }
    expect(gaps(parts, 'E4')).toEqual(['gap:E4:start:PN1-anchor', 'gap:E4:PN1-anchor:end'])
    expect(gaps(parts, 'E7-NR')).toEqual(['gap:E7-NR:start:PN2-anchor', 'gap:E7-NR:PN2-anchor:end'])
  })

  test('anchors one above the other have no gap between them', () => {
    const anchors = [
      anchor('E2', 2, { chainage: 5000, height: 300 }),
      anchor('E2', 1, { chainage: 5000 }),
      anchor('E2', 3, { chainage: 5001 }),
    ]
    expect(gaps({ anchors }, 'E2')).toEqual(['gap:E2:start:E2-1', 'gap:E2:E2-2:E2-3', 'gap:E2:E2-3:end'])
  })

  test('the order in which anchors are listed does not matter', () => {
    const anchors = [3, 1, 2].map((n) => anchor('E2', n, { chainage: n * 1000 }))
    expect(gaps({ anchors }, 'E2')).toEqual(gaps({ anchors: [...anchors].reverse() }, 'E2'))
  })
})

describe('zones of a pour', () => {
  const zones = zonesOfPour(
    layoutIndex(
      layout({
        anchors: [
          anchor('E1', 4, { chainage: 9000 }),
          anchor('E1', 3, { chainage: 7500 }),
          anchor('E4', 12, { chainage: 900 }),
          inPan('PN01'),
        ],
        pans: [pan('PN01', { x: 6150, y: 14000 })],
        more: { joints: [{ id: 'j', edgeLineId: 'east', kind: 'construction', firstPourId: 'P1' }] },
      }),
    ),
    'P1',
  )
  const named = (name: string) => zones.find((zone) => zone.name === name)

  test('names as people say them, ids that hold still', () => {
    expect(named('E1-03')).toMatchObject({ id: 'anchor:E1-3', kind: 'anchor', from: 7390, to: 7610 })
    expect(named('E1 gap start to 03')).toMatchObject({ id: 'gap:E1:start:E1-3', from: 0, to: 7500 })
    expect(named('E1 gap 03 to 04')).toMatchObject({ id: 'gap:E1:E1-3:E1-4', from: 7500, to: 9000 })
    expect(named('E4 gap 12 to PN01')).toMatchObject({ id: 'gap:E4:E4-12:PN01-anchor' })
    expect(named('E1 edge')).toMatchObject({ id: 'edge:E1', from: 0, to: 17400 })
    expect(named('PN01')).toMatchObject({ id: 'anchor:PN01-anchor', panId: 'PN01', from: null })
    expect(named('PN01 pan')).toMatchObject({ id: 'pan:PN01', kind: 'pan' })
    expect(named('J1 joint')).toMatchObject({ id: 'joint:j', edgeId: 'J1' })
    expect(named('Tendon TE1-3')).toMatchObject({ id: 'tendon:TE1-3', kind: 'tendon' })
  })

  test('along an edge they follow its chainage', () => {
    expect(zones.filter((zone) => zone.edgeId === 'E1').map((zone) => zone.name)).toEqual([
      'E1 edge',
      'E1 gap start to 03',
      'E1-03',
      'E1 gap 03 to 04',
      'E1-03 to 04 together',
      'E1-04',
      'E1 gap 04 to end',
      'E1 strip',
    ])
  })

  test('no id comes twice', () => {
    expect(new Set(zones.map((zone) => zone.id)).size).toBe(zones.length)
  })

  test('every edge of the pour has its zone, and a pour without edges none', () => {
    expect(zones.filter(({ kind }) => kind === 'edge').map(({ name }) => name)).toEqual([
      'E2 edge',
      'J1 edge',
      'E4 edge',
      'E1 edge',
    ])
    expect(zonesOfPour(layoutIndex(layout()), 'P2')).toEqual([])
  })
})

describe('grid reference', () => {
  test.each([
    // A at 300, B at 8700, C at 17100; 1 at 900, 2 at 8700, 3 at 17100
    { x: 900, y: 110, text: 'A+600 / 1-790' },
    { x: 900, y: 17100, text: 'A+600 / 3' },
    { x: 300, y: 1400, text: 'A / 1+500' },
    { x: 7900, y: 14000, text: 'B-800 / 3-3100' },
    { x: 300.4, y: 899.6, text: 'A / 1' },
  ])('$text', ({ x, y, text }) => {
    expect(gridReference({ gridLines: GRID }, { x, y })).toBe(text)
  })

  test('a line drawn the other way measures the same way', () => {
    const turned = GRID.map((line) => ({ ...line, azimuth: line.azimuth + Math.PI }))
    expect(gridReference({ gridLines: turned }, { x: 900, y: 110 })).toBe('A+600 / 1-790')
  })

  test('without a grid it is empty', () => {
    expect(gridReference({ gridLines: [] }, { x: 1, y: 2 })).toBe('')
  })
})
