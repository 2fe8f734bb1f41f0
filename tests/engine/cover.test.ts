import { describe, expect, test } from 'vitest'
import { coverChecks, layoutIndex, type Anchor, type Check, type Compared } from '../../packages/engine/src'
import { anchor, deadEnd, edge, EAST, inPan, layout, length, pan, S4, WEST, type Parts } from './sample-layout'
import { evaluated } from './step-text'

const checks = (parts: Parts, id: string): Check[] => {
  const index = layoutIndex(layout(parts))
  const one = index.anchors.get(id)
  if (!one) throw new Error(`no anchor ${id}`)
  return coverChecks(index, one)
}

function named(name: string, parts: Parts, id: string): Compared {
  const check = checks(parts, id).find((candidate) => candidate.name === name && candidate.kind === 'compared')
  if (check?.kind !== 'compared')
    throw new Error(
      `no ${name} among ${checks(parts, id)
        .map((c) => c.name)
        .join(', ')}`,
    )
  return check
}

const at = (change: Partial<Anchor>) => ({ anchors: [anchor('E1', 3, { chainage: 9200, ...change })] })

describe('centre of the anchor to soffit and top, hardware asks for 75', () => {
  test.each([
    { height: 74.9, status: 'over' },
    { height: 75, status: 'within' },
    { height: 75.1, status: 'within' },
  ])('$height above the soffit is $status', ({ height, status }) => {
    const check = named('Centre above soffit', at({ height }), 'E1-3')
    expect(check).toMatchObject({ status, demand: height, limit: 75, limitKind: 'H', compares: 'at-least' })
    expect(check.spare).toBeCloseTo(height - 75, 9)
  })

  test.each([
    // 220 - 145 = 75
    { height: 144.9, status: 'within' },
    { height: 145, status: 'within' },
    { height: 145.1, status: 'over' },
  ])('$height is $status below a top at 220', ({ height, status }) => {
    expect(named('Centre below top', at({ height }), 'E1-3')).toMatchObject({ status, limit: 75 })
  })

  test('short by 20 at 55, and the height that mends it', () => {
    expect(named('Centre above soffit', at({ height: 55 }), 'E1-3')).toMatchObject({
      status: 'over',
      spare: -20,
      mend: { field: 'height', value: 75 },
    })
  })

  test('no height mends a slab that is too thin', () => {
    // 2 * 75 = 150 in 140
    const parts = { ...at({ height: 60 }), edges: [edge(WEST, 'd', [length(0, 17400, { top: 140 })])] }
    expect(named('Centre above soffit', parts, 'E1-3').mend).toBeNull()
  })

  test('in an edge beam heights count from its own soffit', () => {
    // B7 at -340 above a soffit at -480: 140 of 160
    const parts = {
      edges: [edge(WEST, 'd', [length(0, 17400, { soffit: -480 })])],
      anchors: [anchor('E1', 1, { hardwareId: 'B7', chainage: 5000, height: -340, setBack: 120 })],
    }
    expect(named('Centre above soffit', parts, 'E1-1')).toMatchObject({ demand: 140, limit: 160, status: 'over' })
  })

  test('an approval with several strengths: each stage has the highest line not above its strength', () => {
    const strength = { spacingAlongMin: 350, spacingHeightMin: 350, edgeAlongMin: 190 }
    const approval = {
      reference: 'INVENTED-1',
      strengths: [
        { ...strength, share: 1, strengthMin: 30, edgeHeightMin: 60 },
        { ...strength, share: 1, strengthMin: 22, edgeHeightMin: 75 },
        { ...strength, share: 0.25, strengthMin: 9, edgeHeightMin: 50 },
      ],
    }
    const parts = { ...at({ height: 70 }), hardware: [{ ...S4, approval }] }
    const centre = checks(parts, 'E1-3').filter((check) => check.name === 'Centre above soffit')
    // 25 % at 9 MPa: 50; full at 22 MPa: 75 (30 MPa is above the stage's)
    expect(centre).toMatchObject([
      { stage: '25 %', limit: 50, status: 'within', clause: { source: 'INVENTED-1' } },
      { stage: 'Full', limit: 75, status: 'over' },
    ])
  })
})

describe('plate and pocket to soffit and top', () => {
  test.each([
    // Plate 80 high: 70 - 40 = 30 of the pour's cover 30
    { height: 70, status: 'within' },
    { height: 69.9, status: 'over' },
    { height: 40.1, status: 'over' },
    { height: 40, status: 'stop' },
    { height: 39.9, status: 'stop' },
  ])('plate centred $height above the soffit is $status', ({ height, status }) => {
    expect(named('Plate to soffit', at({ height }), 'E1-3')).toMatchObject({ status, limit: 30, limitKind: 'C' })
  })

  test.each([
    // Pocket 120 high: 85 - 60 = 25 of the job's 25; at 55 it ends 5 below the soffit
    { height: 85, clear: 25, status: 'within' },
    { height: 84.9, clear: 24.9, status: 'over' },
    { height: 60, clear: 0, status: 'stop' },
    { height: 55, clear: -5, status: 'stop' },
  ])('pocket centred $height above the soffit is $status', ({ height, clear, status }) => {
    const check = named('Pocket to soffit', at({ height }), 'E1-3')
    expect(check).toMatchObject({ status, limit: 25, clause: { source: 'Job setting' } })
    expect(check.demand).toBeCloseTo(clear, 9)
  })

  test('upside down gives the same against the top', () => {
    const below = named('Pocket to soffit', at({ height: 80 }), 'E1-3')
    const above = named('Pocket to top', at({ height: 140 }), 'E1-3')
    expect(above.demand).toBe(below.demand)
    expect(above.status).toBe(below.status)
  })

  test('a region has its own cover', () => {
    const outline = [
      { x: 0, y: 0 },
      { x: 600, y: 0 },
      { x: 600, y: 17400 },
      { x: 0, y: 17400 },
    ]
    const region = { id: 'r', mark: 'EB', kind: 'edge-beam', outline, top: 220, soffit: 0, cover: 40, linkDiameter: 10 }
    const parts = { ...at({}), pour: { regions: [{ ...region, kind: 'edge-beam' as const }] } }
    expect(named('Plate to soffit', parts, 'E1-3').limit).toBe(40)
  })
})

test('the height that mends a plate or pocket too near to a surface', () => {
  // The plate is 80 high and the cover 30: 0 + 30 + 40 = 70. The pocket is 120 high and the job asks for 25: 85.
  const parts = { anchors: [anchor('E1', 3, { chainage: 8000, height: 60 })] }
  expect(named('Plate to soffit', parts, 'E1-3').mend).toEqual({ field: 'height', value: 70 })
  expect(named('Pocket to soffit', parts, 'E1-3').mend).toEqual({ field: 'height', value: 85 })
})

describe('plate and pocket to the next face', () => {
  /** The north end of the east edge, 17400 along, is the corner with the north edge. */
  const nearCorner = (away: number) => ({ anchors: [anchor('J1', 1, { chainage: 17400 - away })] })

  test.each([
    // Pocket 300 wide: 175 - 150 = 25
    { away: 175.1, status: 'within' },
    { away: 175, status: 'within' },
    { away: 174.9, status: 'over' },
    { away: 150, status: 'stop' },
    { away: 120, status: 'stop' },
  ])('pocket centred $away from the corner is $status', ({ away, status }) => {
    const check = named('Pocket to edge E4', nearCorner(away), 'J1-1')
    expect(check.status).toBe(status)
    expect(check.demand).toBeCloseTo(away - 150, 6)
  })

  test('the mirrored place at the other end gives the same', () => {
    const south = named('Pocket to edge E2', { anchors: [anchor('J1', 1, { chainage: 160 })] }, 'J1-1')
    expect(south.demand).toBeCloseTo(named('Pocket to edge E4', nearCorner(160), 'J1-1').demand, 9)
  })

  test('a re-entrant edge beside the anchor is a face', () => {
    // Anchor 120 from x = 12600: pocket 30 outside the concrete, plate 10 inside
    const outline = [
      { id: 'a', x: 0, y: 0 },
      { id: 'b', x: 17400, y: 0 },
      { id: 'c', x: 17400, y: 10800 },
      { id: 'd', x: 12600, y: 10800 },
      { id: 'e', x: 12600, y: 17400 },
      { id: 'f', x: 0, y: 17400 },
    ]
    const inner = { ...EAST, id: 'inner', mark: 'E7-ER', x: 12600 }
    const north = { ...EAST, id: 'n', mark: 'E7-N', x: 0, y: 17400, azimuth: Math.PI / 2 }
    const parts = {
      pour: { outline },
      edgeLines: [inner, north],
      edges: [edge(inner, 'd', [length(10800, 17400)]), edge(north, 'e', [length(0, 12600)])],
      anchors: [anchor('E7-N', 8, { chainage: 12480 })],
    }
    expect(named('Pocket to edge E7-ER', parts, 'E7-N-8')).toMatchObject({ demand: -30, status: 'stop' })
    expect(named('Plate to edge E7-ER', parts, 'E7-N-8')).toMatchObject({ demand: 10, limit: 30, status: 'over' })
  })

  test('an opening beside the anchor is a face', () => {
    const outline = [
      { x: 200, y: 9300 },
      { x: 800, y: 9300 },
      { x: 800, y: 9900 },
      { x: 200, y: 9900 },
    ]
    const opening = { id: 'o', levelId: 'L1', kind: 'opening', mark: 'O2', note: '', outline, cageCover: null } as const
    const parts = { ...at({}), more: { obstructions: [{ ...opening, cageBars: '' }] } }
    // Bearing face 110 in, its plate from 9090 to 9310; the opening begins 200 in and at 9300
    expect(named('Plate to opening O2', parts, 'E1-3').demand).toBeCloseTo(90, 9)
  })

  test('beside a deeper length what hangs below the slab has the side of the beam as a face', () => {
    // Beam from 0 to 600: B7 pocket 220 wide at 430 ends at 540, 60 from its side; a plate of 170 at 515, 85
    const parts = {
      edges: [edge(WEST, 'd', [length(0, 600, { soffit: -480 }), length(600, 17400)])],
      anchors: [anchor('E1', 1, { hardwareId: 'B7', chainage: 430, height: 0, setBack: 120 })],
    }
    expect(named('Pocket to the side of the next length of the edge', parts, 'E1-1').demand).toBe(60)
    expect(named('Plate to the side of the next length of the edge', parts, 'E1-1').demand).toBe(85)
  })
})

describe('pocket to pocket, the job asks for 25', () => {
  const pair = (spacing: number, height = 110) => ({
    anchors: [anchor('E1', 5, { chainage: 15100 }), anchor('E1', 6, { chainage: 15100 + spacing, height })],
  })

  test.each([
    // Pockets 300 wide
    { spacing: 325.1, status: 'within' },
    { spacing: 325, status: 'within' },
    { spacing: 324.9, status: 'over' },
    { spacing: 300.1, status: 'over' },
    { spacing: 300, status: 'stop' },
    { spacing: 250, status: 'stop' },
  ])('$spacing apart is $status, from either side', ({ spacing, status }) => {
    const [one, other] = [
      named('Pocket to pocket of E1-06', pair(spacing), 'E1-5'),
      named('Pocket to pocket of E1-05', pair(spacing), 'E1-6'),
    ]
    expect(one.status).toBe(status)
    expect(other.status).toBe(status)
    expect(one.demand).toBeCloseTo(spacing - 300, 9)
  })

  test('one above the other counts in height', () => {
    // 160 - 120 = 40
    expect(named('Pocket to pocket of E1-06', pair(0, 270), 'E1-5').demand).toBe(40)
  })

  test('a bonded dead end has no pocket', () => {
    const anchors = [deadEnd('E1', 5, { chainage: 15100 }), anchor('E1', 6, { chainage: 15400 })]
    expect(checks({ anchors }, 'E1-5').filter(({ name }) => name.startsWith('Pocket'))).toEqual([])
    expect(checks({ anchors }, 'E1-6').filter(({ name }) => name.startsWith('Pocket to pocket'))).toEqual([])
  })
})

describe('advice on the place in the thickness carries no status', () => {
  const advice = (height: number, soffit = 0) => {
    const edges = [edge(WEST, 'd', [length(0, 17400, { soffit })])]
    return checks({ ...at({ height }), edges }, 'E1-3').find(({ kind }) => kind === 'advice')
  }

  test.each([
    { height: 120, isUsual: true },
    { height: 120.1, isUsual: false },
    { height: 100, isUsual: true },
    { height: 99.9, isUsual: false },
  ])('220 thick, centre at $height: 10 off the middle', ({ height, isUsual }) => {
    expect(advice(height)).toMatchObject({ isUsual, limitKind: 'P', name: 'Off the middle of the thickness' })
  })

  test.each([
    // Soffit -30: 250 thick from there on
    { height: 120, soffit: -30, isUsual: true },
    { height: 120.1, soffit: -30, isUsual: false },
    { height: 120.1, soffit: -29.9, isUsual: false },
  ])('soffit $soffit, centre at $height: 100 to a surface', ({ height, soffit, isUsual }) => {
    expect(advice(height, soffit)).toMatchObject({ isUsual })
  })
})

describe('An anchor in a pan', () => {
  const inSlab = (depth: number) => ({
    anchors: [inPan('PN01')],
    pans: [pan('PN01', { x: 9600, y: 8700, azimuth: 0, depth })],
  })

  // Slab 220, centre at 110, plate 80: its lower side at 70.
  test.each([
    { depth: 149, status: 'stop', demand: -1 },
    { depth: 150, status: 'within', demand: 0 },
    { depth: 151, status: 'within', demand: 1 },
  ])('recess $depth deep: $demand from plate to floor is $status', ({ depth, ...figures }) => {
    expect(named('Plate above the floor of the recess', inSlab(depth), 'PN01-anchor')).toMatchObject(figures)
  })

  test('has its recess in place of a pocket', () => {
    expect(checks(inSlab(150), 'PN01-anchor').filter(({ name }) => name.startsWith('Pocket'))).toEqual([])
  })
})

test('every printed line evaluates to the value beside it', () => {
  const steps = [at({ height: 55 }), at({ height: 160 })].flatMap((parts) =>
    checks(parts, 'E1-3').flatMap((check) => (check.kind === 'compared' ? check.steps : [])),
  )
  expect(steps).toHaveLength(6)
  for (const line of steps) expect(evaluated(line)).toBeCloseTo(line.value, 9)
})

test('a turned anchor says that its pocket is measured square to the edge', () => {
  expect(named('Pocket to soffit', at({ skew: 0.05 }), 'E1-3').notes.join()).toMatch(/square to the edge/)
  expect(named('Pocket to soffit', at({}), 'E1-3').notes).toEqual([])
})
