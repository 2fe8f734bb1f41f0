import { checkPour, type Layout } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { JACK, mirrored, panCheck, panChecks, SHORT_JACK, standing, withPan } from './pan-layout'
import { anchor, edge, EDGES, layout, length, NORTH, pan, S4 } from './sample-layout'

const wallAt = (y: number) => standing('wall', { x: 0, y }, { x: 19200, y: y + 300 })
const turn = (degrees: number) => (degrees * Math.PI) / 180

/** Nothing but what a test puts there is in the way of a jack. */
const FREE = { jackTilt: turn(12), bentNose: turn(12), headroom: 3000 }

describe('Room along the jack', () => {
  test.each([
    { clear: 1201, status: 'within', spare: 1 },
    { clear: 1200, status: 'within', spare: 0 },
    { clear: 1199, status: 'stop', spare: -1 },
  ])('$clear in front of a jack of 1200 is $status', ({ clear, status, spare }) => {
    const check = panCheck(withPan({ obstructions: [wallAt(12000 + clear)] }), 'Room along the jack', 'compared')
    expect(check.status).toBe(status)
    expect(check.spare).toBeCloseTo(spare, 6)
  })

  test('short, but over and not a stop where another jack of the job fits', () => {
    const short = withPan({ pan: FREE, jacks: [JACK, SHORT_JACK], obstructions: [wallAt(13100)] })
    const check = panCheck(short, 'Room along the jack', 'compared')
    expect(check.status).toBe('over')
    expect(check.notes.join(' ')).toContain('J2')
  })

  test('a tilted axis is longer than its plan: 1170 / cos 15 = 1211.3', () => {
    const tilted = withPan({ pan: { jackTilt: turn(15), bentNose: turn(15) }, obstructions: [wallAt(13170)] })
    const check = panCheck(tilted, 'Room along the jack', 'compared')
    expect(check.demand).toBeCloseTo(1170 / Math.cos(turn(15)), 6)
    expect(check.status).toBe('within')
  })

  test.each([
    { kind: 'opening', stands: false },
    { kind: 'sleeve', stands: false },
    { kind: 'column', stands: true },
    { kind: 'upstand', stands: true },
  ] as const)('a $kind stands in the way: $stands', ({ kind, stands }) => {
    const body = standing(kind, { x: 9500, y: 13100 }, { x: 9700, y: 13300 })
    const { demand } = panCheck(withPan({ obstructions: [body] }), 'Room along the jack', 'compared')
    expect(demand).toBeCloseTo(stands ? 1100 : 2400, 6)
  })

  test.each([
    { from: 9644, ahead: 500 },
    // The body is 45 to each side of 9600: a column from 9645 stands beside it.
    { from: 9645, ahead: 2400 },
  ])('a column from x = $from', ({ from, ahead }) => {
    const column = standing('column', { x: from, y: 12500 }, { x: from + 500, y: 13000 })
    expect(panCheck(withPan({ obstructions: [column] }), 'Room along the jack', 'compared').demand).toBeCloseTo(
      ahead,
      5,
    )
  })
})

describe('The jack as a body', () => {
  test.each([
    { beside: 51, status: 'within' },
    { beside: 50, status: 'within' },
    { beside: 49, status: 'stop' },
    { beside: 0, status: 'stop' },
  ])('$beside beside it, 50 asked for: $status', ({ beside, status }) => {
    const wall = standing('wall', { x: 9645 + beside, y: 12000 }, { x: 9945, y: 14000 })
    const check = panCheck(withPan({ obstructions: [wall] }), 'Room beside the jack', 'compared')
    expect(check.demand).toBeCloseTo(beside, 6)
    expect(check.status).toBe(status)
  })

  // Level jack at 110 in 220: 110 + 45 - 220 + 600 = 535 above the slab.
  test.each([
    { headroom: 535, status: 'within' },
    { headroom: 534, status: 'stop' },
  ])('$headroom clear above the slab: $status', ({ headroom, status }) => {
    const check = panCheck(withPan({ pan: { headroom } }), 'Headroom above the slab', 'compared')
    expect(check.limit).toBeCloseTo(535, 6)
    expect(check.status).toBe(status)
  })

  test('headroom that nobody has given is not passed over', () => {
    expect(panCheck(withPan({ pan: { headroom: null } }), 'Headroom above the slab', 'refused').kind).toBe('refused')
  })

  /*
   * Tilted by 20 degrees the nose at the bearing face governs: floor at 220 - depth, nose 30 / cos 20 = 31.925 below the
   * axis at 110. Clear height 110 - 31.925 - 220 + depth = depth - 141.925.
   */
  test.each([
    { depth: 143, status: 'within', gap: 1.075 },
    { depth: 141, status: 'stop', gap: -0.925 },
  ])('recess $depth deep: $status', ({ depth, status, gap }) => {
    const place = withPan({ pan: { depth, jackTilt: turn(20), bentNose: turn(15) } })
    const check = panCheck(place, 'Jack clear of the recess', 'compared')
    expect(check.demand).toBeCloseTo(gap, 3)
    expect(check.status).toBe(status)
  })

  test('a level jack meets the rising floor at the far end of the recess: 110 - 45 - 220 = -155', () => {
    expect(panCheck(withPan(), 'Jack clear of the recess', 'compared').demand).toBeCloseTo(-155, 6)
  })

  test.each([
    { across: 190, status: 'within' },
    { across: 189, status: 'stop' },
  ])('recess $across wide, 90 and twice 50 asked for: $status', ({ across, status }) => {
    const check = panCheck(withPan({ pan: { across } }), 'Jack between the sides of the recess', 'compared')
    expect(check.status).toBe(status)
  })

  test.each([
    { bentNose: 15, status: 'within' },
    { bentNose: 15.1, status: 'stop' },
  ])('nose bent by $bentNose of 15 degrees: $status', ({ bentNose, status }) => {
    expect(panCheck(withPan({ pan: { bentNose: turn(bentNose) } }), 'Bend of the nose', 'compared').status).toBe(status)
  })
})

describe('No jack chosen', () => {
  test('needs judgement where one of the job fits', () => {
    const check = panCheck(withPan({ pan: { ...FREE, jackId: null } }), 'Room along the jack', 'compared')
    expect(check.status).toBe('needs-judgement')
    expect(check.limit).toBe(1200)
  })

  test('is a stop where none of the job fits', () => {
    const short = withPan({ pan: { ...FREE, jackId: null }, obstructions: [wallAt(12700)] })
    expect(panCheck(short, 'Room along the jack', 'compared').status).toBe('stop')
  })

  test('is refused where the job has none', () => {
    const check = panCheck(withPan({ pan: { jackId: null }, jacks: [] }), 'Room along the jack', 'refused')
    expect(check.kind === 'refused' && check.field).toBe('pan.jackId')
  })
})

describe('The recess', () => {
  test.each([
    { y: 16400, status: 'within' },
    { y: 16401, status: 'stop' },
  ])('1000 long from y = $y, edge at 17400: $status', ({ y, status }) => {
    const check = panCheck(withPan({ pan: { y } }), 'Slab in front of the bearing face', 'compared')
    expect(check.demand).toBeCloseTo(17400 - y, 6)
    expect(check.status).toBe(status)
  })

  test.each([
    { between: 301, stop: false, advice: false },
    { between: 299, stop: false, advice: true },
    { between: 0, stop: true, advice: true },
  ])('$between to the next pan (300, common practice)', ({ between, stop, advice }) => {
    const others = [pan('PM', { x: 9600 + 350 + between, y: 12000 })]
    const found = panChecks(withPan({ others })).filter(({ name }) => name === 'Clear to pan PM')
    expect(found.some((check) => check.kind === 'compared' && check.status === 'stop')).toBe(stop)
    expect(found.some(({ kind }) => kind === 'advice')).toBe(advice)
  })

  test('an opening in the recess is a stop', () => {
    const opening = standing('opening', { x: 9500, y: 12500 }, { x: 9600, y: 12600 })
    expect(panCheck(withPan({ obstructions: [opening] }), 'Clear to opening X1', 'compared').status).toBe('stop')
  })
})

test('turned over from west to east every comparison stays', () => {
  const column = standing('column', { x: 10400, y: 12500 }, { x: 10800, y: 12900 })
  const skewed = withPan({ pan: { ...FREE, azimuth: turn(17) }, obstructions: [column, wallAt(14000)] })
  const shown = (of: Layout) =>
    panChecks(of).map((check) => [
      check.name,
      check.kind === 'compared'
        ? `${check.status} ${check.demand.toFixed(6)} of ${check.limit.toFixed(6)}`
        : check.kind,
    ])
  expect(shown(mirrored(skewed))).toEqual(shown(skewed))
})

describe('Jack access at an edge', () => {
  const atEdge = (jackClear: number | null, jackId: string | null) => {
    const edges = EDGES.map((one) => (one.id === 'E4' ? edge(NORTH, 'c', [length(0, 19200, { jackClear })]) : one))
    const given = layout({
      edges,
      hardware: [{ ...S4, jackId }],
      anchors: [anchor('E4', 1, { chainage: 9600 })],
      more: { jacks: [JACK] },
    })
    const zones = checkPour(given, { pourId: 'P1', withSteps: true }).zones
    return zones.flatMap(({ checks }) => checks).find(({ name }) => name === 'Jack access')
  }

  // The bearing face is set back by 110: 1090 + 110 = 1200.
  test.each([
    { jackClear: 1090, status: 'within' },
    { jackClear: 1089, status: 'stop' },
  ])('$jackClear in front of the edge: $status', ({ jackClear, status }) => {
    expect(atEdge(jackClear, 'J1')).toMatchObject({ kind: 'compared', status, limit: 1200, demand: jackClear + 110 })
  })

  test('room that nobody has given is refused', () => {
    expect(atEdge(null, 'J1')).toMatchObject({ kind: 'refused', field: 'edge.jackClear' })
  })

  // 1390 + 110 = 1500, the most that is usual (common practice).
  test('hardware without a jack: advice with usual room, judgement with less', () => {
    expect(atEdge(1390, null)).toMatchObject({ kind: 'advice', isUsual: true })
    expect(atEdge(1389, null)).toMatchObject({ kind: 'compared', status: 'needs-judgement' })
  })
})
