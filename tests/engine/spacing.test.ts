import { describe, expect, test } from 'vitest'
import { layoutIndex, spacingChecks, straightLengthChecks, type Anchor, type Compared } from '../../packages/engine/src'
import {
  anchor,
  deadEnd,
  EAST,
  edge,
  EDGES,
  inPan,
  layout,
  length,
  pan,
  POUR,
  S4,
  SOUTH,
  twoPours,
  type Parts,
} from './sample-layout'

const compared = (parts: Parts, id: string): Compared[] => {
  const index = layoutIndex(layout(parts))
  const one = index.anchors.get(id)
  if (!one) throw new Error(`no anchor ${id}`)
  return spacingChecks(index, one).filter((check) => check.kind === 'compared')
}

function named(name: string, parts: Parts, id: string): Compared {
  const all = compared(parts, id)
  const check = all.find((candidate) => candidate.name === name)
  if (!check) throw new Error(`no ${name} among ${all.map((c) => c.name).join(', ')}`)
  return check
}

const pair = (spacing: number, change: Partial<Anchor> = {}) => ({
  anchors: [anchor('E1', 5, { chainage: 15100 }), anchor('E1', 6, { chainage: 15100 + spacing, ...change })],
})

describe('what mends it is a chainage', () => {
  test('away from the neighbour by what is short, from either side', () => {
    // 15100 and 15400 are 50 short of 350: 15400 - 350 = 15050 or 15100 + 350 = 15450.
    const parts = pair(300)
    expect(named('Spacing to E1-06', parts, 'E1-5').mend).toEqual({ field: 'chainage', value: 15_050 })
    expect(named('Spacing to E1-05', parts, 'E1-6').mend).toEqual({ field: 'chainage', value: 15_450 })
  })

  test.each([
    { third: 15_800, mend: { field: 'chainage', value: 15_450 } },
    { third: 15_799, mend: null },
  ])('with a third anchor at $third', ({ third, mend }) => {
    // At 15450 the third must stand 350 further on: 15800.
    const { anchors } = pair(300)
    const parts = { anchors: [...anchors, anchor('E1', 7, { chainage: third })] }
    expect(named('Spacing to E1-05', parts, 'E1-6').mend).toEqual(mend)
  })

  test('none where nothing is short', () => {
    expect(named('Spacing to E1-06', pair(350), 'E1-5').mend).toBeNull()
  })

  test.each([
    { neighbour: 16_860, mend: { field: 'chainage', value: 17_210 } },
    { neighbour: 16_861, mend: null },
  ])('away from the corner, with a neighbour at $neighbour', ({ neighbour, mend }) => {
    // The edge ends at 17400: 150 is 40 short of 190, so 17250 - 40 = 17210, and 17210 - 350 = 16860 is room enough.
    const anchors = [anchor('E1', 1, { chainage: neighbour }), anchor('E1', 2, { chainage: 17_250 })]
    const check = named('Edge distance to edge E4', { anchors }, 'E1-2')
    expect(check).toMatchObject({ status: 'over', limit: 190 })
    expect(check.demand).toBeCloseTo(150, 9)
    if (mend === null) expect(check.mend).toBeNull()
    else expect(check.mend?.value).toBeCloseTo(mend.value, 9)
  })
})

describe('spacing along the edge, hardware asks for 350', () => {
  test.each([
    { spacing: 350.1, status: 'within' },
    { spacing: 350, status: 'within' },
    { spacing: 349.9, status: 'over' },
    { spacing: 300, status: 'over' },
  ])('$spacing apart is $status, from either side', ({ spacing, status }) => {
    const one = named('Spacing to E1-06', pair(spacing), 'E1-5')
    expect(one).toMatchObject({ status, limit: 350, limitKind: 'H', family: 'spacing', zoneId: 'anchor:E1-5' })
    expect(one.demand).toBeCloseTo(spacing, 9)
    expect(named('Spacing to E1-05', pair(spacing), 'E1-6')).toMatchObject({ status, limit: 350 })
  })

  test('two kinds of hardware: the larger counts, from either side, and it is said', () => {
    const wide = { ...S4, id: 'K4', name: 'K4', spacingAlongMin: 450 }
    const parts = { ...pair(400, { hardwareId: 'K4' }), hardware: [S4, wide] }
    expect(named('Spacing to E1-06', parts, 'E1-5')).toMatchObject({ limit: 450, status: 'over' })
    expect(named('Spacing to E1-05', parts, 'E1-6')).toMatchObject({ limit: 450, status: 'over' })
    expect(named('Spacing to E1-06', parts, 'E1-5').notes.join()).toMatch(/larger spacing/)
  })

  test('the neighbours are shown, further ones only where they are short', () => {
    const row = (pitch: number) => ({
      anchors: [1, 2, 3, 4].map((n) => anchor('E1', n, { chainage: 5000 + n * pitch })),
    })
    const names = (parts: Parts) =>
      compared(parts, 'E1-1').flatMap(({ name }) => (name.startsWith('Spacing') ? [name] : []))
    expect(names(row(1000))).toEqual(['Spacing to E1-02'])
    expect(names(row(170))).toEqual(['Spacing to E1-02', 'Spacing to E1-03'])
  })

  test('an approval with several strengths: each stage by its own line', () => {
    const line = { spacingHeightMin: 350, edgeAlongMin: 190, edgeHeightMin: 75 }
    const approval = {
      reference: 'INVENTED-1',
      strengths: [
        { ...line, share: 0.25, strengthMin: 9, spacingAlongMin: 250 },
        { ...line, share: 1, strengthMin: 22, spacingAlongMin: 350 },
        { ...line, share: 1, strengthMin: 22.1, spacingAlongMin: 280 },
      ],
    }
    const checks = compared({ ...pair(300), hardware: [{ ...S4, approval }] }, 'E1-5').filter(
      ({ name }) => name === 'Spacing to E1-06',
    )
    expect(checks).toMatchObject([
      { stage: '25 %', limit: 250, status: 'within' },
      { stage: 'Full', limit: 350, status: 'over' },
    ])
  })

  test('from pour to pour on one edge line, with the stage in which it counts', () => {
    const parts = twoPours([
      anchor('E2', 11, { chainage: 19050 }),
      anchor('E2-P2', 1, { chainage: 19350, castWithPourId: 'P2' }),
    ])
    const check = named('Spacing to E2-01', parts, 'E2-11')
    expect(check).toMatchObject({ demand: 300, status: 'over' })
    expect(check.notes.join()).toMatch(/pour P2.*both pours/)
  })

  test('the two sides of a joint are two rows', () => {
    const parts = twoPours([
      deadEnd('J1', 1, { chainage: 7500 }),
      deadEnd('J1-P2', 1, { chainage: 7500, castWithPourId: 'P2' }),
    ])
    const far = { ...edge(EAST, 't', [length(0, 17400)]), id: 'J1-P2', pourId: 'P2' }
    const west = { ...parts, edges: [...(parts.edges ?? []), far] }
    expect(compared(west, 'J1-1').filter(({ name }) => name.startsWith('Spacing'))).toEqual([])
  })
})

describe('one anchor above the other, hardware asks for 350 in height', () => {
  const above = (apart: number, aside = 0) => pair(aside, { height: 110 + apart })

  test.each([
    { apart: 350.1, status: 'within' },
    { apart: 350, status: 'within' },
    { apart: 349.9, status: 'over' },
  ])('$apart apart in height is $status', ({ apart, status }) => {
    const check = named('Spacing in height to E1-06', above(apart), 'E1-5')
    expect(check).toMatchObject({ status, limit: 350 })
    expect(check.demand).toBeCloseTo(apart, 9)
  })

  test('far enough in either direction is enough', () => {
    expect(named('Spacing to E1-06', above(100, 350), 'E1-5').status).toBe('within')
    expect(named('Spacing in height to E1-06', above(350, 100), 'E1-5').status).toBe('within')
  })

  test('near in both is over, shown in the direction that is less short', () => {
    // Short by 50 along and by 250 in height; then by 250 along and 50 in height
    expect(named('Spacing to E1-06', above(100, 300), 'E1-5')).toMatchObject({ spare: -50, status: 'over' })
    expect(named('Spacing in height to E1-06', above(300, 100), 'E1-5')).toMatchObject({ spare: -50, status: 'over' })
  })
})

describe('two plates in one place', () => {
  test.each([
    // Plates 220 wide
    { spacing: 220.1, stops: 0 },
    { spacing: 220, stops: 1 },
    { spacing: 100, stops: 1 },
    { spacing: 0, stops: 1 },
  ])('$spacing apart: $stops stop', ({ spacing, stops }) => {
    const plates = compared(pair(spacing), 'E1-5').filter(({ name }) => name.startsWith('Plate to plate'))
    expect(plates.filter(({ status }) => status === 'stop')).toHaveLength(stops)
    expect(plates).toHaveLength(stops)
  })

  test('a dead end deeper in the same place of the face counts too', () => {
    const anchors = [anchor('E1', 5, { chainage: 15100 }), deadEnd('E1', 6, { chainage: 15100 })]
    expect(named('Plate to plate of E1-06', { anchors }, 'E1-5').status).toBe('stop')
  })
})

describe('edge distance, hardware asks for 190', () => {
  test.each([
    { away: 190.1, status: 'within' },
    { away: 190, status: 'within' },
    { away: 189.9, status: 'over' },
  ])('$away from the end of the edge is $status, at both ends', ({ away, status }) => {
    const start = { anchors: [anchor('E2', 1, { chainage: away })] }
    const end = { anchors: [anchor('E2', 1, { chainage: 19200 - away })] }
    expect(named('Edge distance to edge E1', start, 'E2-1')).toMatchObject({ status, limit: 190, limitKind: 'H' })
    expect(named('Edge distance to edge J1', end, 'E2-1')).toMatchObject({ status, limit: 190 })
    expect(named('Edge distance to edge J1', end, 'E2-1').demand).toBeCloseTo(away, 6)
  })

  test('at an oblique corner it is square to the other face', () => {
    // East side leans 45 deg inward from (5000, 0): anchor at 4500, 110 in lies (500 - 110) / sqrt 2 = 275.8 from it
    const outline = [
      { id: 'a', x: 0, y: 0 },
      { id: 'b', x: 5000, y: 0 },
      { id: 'c', x: 2000, y: 3000 },
      { id: 'd', x: 0, y: 3000 },
    ]
    const parts = {
      pour: { outline },
      edges: [edge(SOUTH, 'a', [length(0, 5000)])],
      anchors: [anchor('E2', 1, { chainage: 4500 })],
    }
    expect(named('Edge distance to the next side of the outline', parts, 'E2-1').demand).toBeCloseTo(
      (500 - 110) / Math.SQRT2,
      6,
    )
  })

  test('a side in line with the edge is no other face', () => {
    const outline = [...POUR.outline.slice(0, 1), { id: 'm', x: 9000, y: 0 }, ...POUR.outline.slice(1)]
    const parts = {
      pour: { outline },
      edges: [edge(SOUTH, 'a', [length(0, 9000)])],
      anchors: [anchor('E2', 1, { chainage: 8950 })],
    }
    // The nearest other face is the west side, 8950 away.
    expect(named('Edge distance to the next side of the outline', parts, 'E2-1').demand).toBeCloseTo(8950, 6)
  })

  test('the next chord of a curved edge is no other face; a corner is', () => {
    // Chords of 3000 that turn by atan(300 / 3000), 5.7 deg
    const outline = [
      { id: 'a', x: 0, y: 0 },
      { id: 'b', x: 3000, y: 0 },
      { id: 'c', x: 6000, y: 300 },
      { id: 'd', x: 0, y: 6000 },
    ]
    const next = { ...SOUTH, id: 'next', mark: 'E3', x: 3000, azimuth: Math.atan2(3000, 300) }
    const parts = (isChord: boolean) => ({
      pour: { outline },
      edgeLines: [SOUTH, next],
      edges: [
        { ...edge(SOUTH, 'a', [length(0, 3000)]), isChord },
        { ...edge(next, 'b', [length(0, 3015)]), isChord },
      ],
      anchors: [anchor('E2', 1, { chainage: 2900 })],
    })
    const names = (isChord: boolean) => compared(parts(isChord), 'E2-1').map(({ name }) => name)
    expect(names(true)).not.toContain('Edge distance to edge E3')
    expect(names(false)).toContain('Edge distance to edge E3')
  })
})

test('lengths x k leave every status as it was', () => {
  const k = 3
  const scaled: Parts = {
    pour: { outline: POUR.outline.map(({ id, x, y }) => ({ id, x: x * k, y: y * k })) },
    edges: EDGES.map((one) => ({ ...one, lengths: one.lengths.map((l) => ({ ...l, to: l.to * k, top: l.top * k })) })),
    edgeLines: [SOUTH],
    hardware: [
      {
        ...S4,
        plate: { width: S4.plate.width * k, height: S4.plate.height * k },
        spacingAlongMin: 350 * k,
        spacingHeightMin: 350 * k,
        edgeAlongMin: 190 * k,
      },
    ],
  }
  const anchors = [180, 500, 900].map((chainage, i) => anchor('E2', i + 1, { chainage }))
  const statuses = (parts: Parts) => compared(parts, 'E2-2').map(({ name, status }) => [name, status])
  const onlySouth = { edgeLines: [SOUTH], edges: EDGES.slice(0, 1) }
  expect(
    statuses({
      ...scaled,
      edges: (scaled.edges ?? []).slice(0, 1),
      anchors: anchors.map((one) => ({ ...one, chainage: one.chainage * k, height: 110 * k, setBack: 110 * k })),
    }),
  ).toEqual(statuses({ ...onlySouth, anchors }))
})

test('the order of the list does not matter', () => {
  const anchors = [180, 500, 900, 1100].map((chainage, i) => anchor('E2', i + 1, { chainage }))
  expect(compared({ anchors: [...anchors].reverse() }, 'E2-2')).toEqual(compared({ anchors }, 'E2-2'))
})

test('an anchor in a pan has no spacing check here', () => {
  expect(compared({ anchors: [inPan('PN01')], pans: [pan('PN01', {})] }, 'PN01-anchor')).toEqual([])
})

describe('straight length behind, hardware asks for 600', () => {
  const checks = (straightBehind: number | null) => {
    const index = layoutIndex(layout({ anchors: [anchor('E1', 1, { chainage: 5000, straightBehind })] }))
    const one = index.anchors.get('E1-1')
    if (!one) throw new Error('no anchor')
    return straightLengthChecks(index, one)
  }

  test.each([
    { straightBehind: 600.1, status: 'within' },
    { straightBehind: 600, status: 'within' },
    { straightBehind: 599.9, status: 'over' },
  ])('$straightBehind is $status', ({ straightBehind, status }) => {
    expect(checks(straightBehind)[0]).toMatchObject({ kind: 'compared', status, limit: 600, limitKind: 'H' })
  })

  test.each([
    { straightBehind: 500, isUsual: true },
    { straightBehind: 499.9, isUsual: false },
  ])('common practice of 500 or more: $straightBehind', ({ straightBehind, isUsual }) => {
    expect(checks(straightBehind)[1]).toMatchObject({ kind: 'advice', isUsual, limitKind: 'P' })
  })

  test('not given is not covered, with the field', () => {
    expect(checks(null)).toMatchObject([{ kind: 'refused', code: 'MISSING_INPUT', field: 'straightBehind' }])
  })
})
