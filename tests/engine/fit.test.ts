import { describe, expect, test } from 'vitest'
import type { PlacedBarsShape, SteelShape } from '../../packages/engine/src'
import {
  at,
  edgeBarsOf,
  faultsOf,
  theFit,
  fitOf,
  hairpinsOf,
  linksOf,
  obstruction,
  ofAnchor,
  ofEdge,
  PLAIN,
  spiralOf,
  steel,
  wedgeBarsOf,
} from './fit-cases'
import { edge, EDGES, layout, length, pan, POUR, rectangle, SOUTH, twoPours, type Parts } from './sample-layout'

/** One anchor at chainage 5000 of an edge 220 deep, covers 30, aggregate 20, with one set of steel. */
const behind = (shape: SteelShape, change: Parameters<typeof at>[1] = {}): Parts => ({
  hardware: [PLAIN],
  anchors: [at(5000, change)],
  steel: [steel('s', ofAnchor(), shape)],
})
const ANCHOR = 'anchor:E2-1'
const EDGE = 'edge:E2'
const alongEdge = (...shapes: SteelShape[]): Parts => ({
  hardware: [PLAIN],
  steel: shapes.map((shape, i) => steel(`s${i}`, ofEdge(), shape)),
})
const thick = (thickness: number): Parts => ({
  pour: { thickness },
  edges: [edge(SOUTH, 'a', [length(0, 19200, { top: thickness })]), ...EDGES.slice(1)],
})

describe('cover', () => {
  // Outside 150: its soffit side stands 75 under the centre; cover 30.
  test.each([
    { height: 105, there: 30, status: 'within' },
    { height: 104, there: 29, status: 'over' },
    { height: 76, there: 1, status: 'over' },
    { height: 75, there: 0, status: 'stop' },
  ])('spiral of 150 at $height: $there to the soffit is $status', ({ height, there, status }) => {
    expect(theFit(behind(spiralOf(), { height }), ANCHOR, /^Spiral of E2-01 to soffit/)).toEqual({
      status,
      there,
      asked: 30,
    })
  })

  test('it says the figures in a sentence, and the height that mends it', () => {
    const [check] = fitOf(layout(behind(spiralOf(), { height: 80 })), ANCHOR)
    // 80 - 75 = 5 of 30; 80 + 25 = 105
    expect(check).toMatchObject({
      name: 'Spiral of E2-01 to soffit',
      notes: ['Spiral of E2-01 to soffit 5, needs 30: short by 25.'],
      mend: { field: 'height', value: 105 },
    })
  })

  // A bar of 12 at `first` from the edge: first - 6.
  test.each([
    { first: 36, status: 'within' },
    { first: 35, status: 'over' },
    { first: 6, status: 'stop' },
  ])('edge bar at $first from its edge is $status', ({ first, status }) => {
    const there = first - 6
    expect(theFit(alongEdge(edgeBarsOf({ first })), EDGE, /to (edge E2|top)$/)).toEqual({ status, there, asked: 30 })
  })

  test.each([
    { from: 30, status: 'within' },
    { from: 29, status: 'over' },
    { from: 0, status: 'stop' },
    { from: -1, status: 'stop' },
  ])('a bar ends flat: from $from of edge E1 is $status', ({ from, status }) => {
    const found = theFit(alongEdge(edgeBarsOf({ from })), EDGE, /to (edge E1|top)$/)
    expect(found).toEqual({ status, there: from, asked: 30 })
  })

  // Beam along the edge, 600 wide, soffit -480, cover 40, links of 10.
  const beam = (change: Partial<Parts> & Pick<Parts, 'steel' | 'anchors'>): Parts => ({
    hardware: [PLAIN],
    pour: {
      regions: [
        {
          id: 'r',
          mark: 'EB9',
          kind: 'edge-beam',
          outline: rectangle(19200, 600),
          top: 220,
          soffit: -480,
          cover: 40,
          linkDiameter: 10,
        },
      ],
    },
    edges: [edge(SOUTH, 'a', [length(0, 19200, { soffit: -480 })]), ...EDGES.slice(1)],
    ...change,
  })

  // Inside the links: 40 + 10. -480 + 75 + 50 = -355
  test.each([
    { height: -355, there: 50, status: 'within' },
    { height: -356, there: 49, status: 'over' },
  ])('in a beam a spiral lies inside its links: $there is $status (common practice)', ({ height, there, status }) => {
    const parts = beam({ anchors: [at(5000, { height })], steel: [steel('s', ofAnchor(), spiralOf())] })
    expect(theFit(parts, ANCHOR, /to soffit/)).toEqual({ status, there, asked: 50 })
  })

  // Between the links: 40. -480 + 70 + 40 = -370
  test.each([
    { height: -370, there: 40, status: 'within' },
    { height: -371, there: 39, status: 'over' },
  ])('closed links stand between those of the beam: $there is $status (common practice)', (expected) => {
    const { height, there, status } = expected
    const parts = beam({ anchors: [at(5000, { height })], steel: [steel('s', ofAnchor(), linksOf())] })
    expect(theFit(parts, ANCHOR, /to soffit/)).toEqual({ status, there, asked: 40 })
  })

  // A bottom bar of 10 in the beam, 600 wide: 600 - 545 - 5 = 50 to its inner side.
  test.each([
    { depth: 545, there: 50, status: 'within' },
    { depth: 546, there: 49, status: 'over' },
  ])('bottom bar at $depth: $there to the inner side of the beam is $status', ({ depth, there, status }) => {
    const shape: SteelShape = {
      kind: 'transverse-bars',
      diameter: 10,
      length: 1500,
      count: 1,
      layers: 'bottom',
      first: depth - 110,
      pitch: 100,
    }
    const parts = beam({ anchors: [at(5000)], steel: [steel('s', ofAnchor(), shape)] })
    expect(theFit(parts, ANCHOR, /to (side of EB9|soffit)/)).toEqual({ status, there, asked: 50 })
  })

  // 5000 + 75 + 30 = 5105
  test.each([
    { side: 5105, there: 30, status: 'within' },
    { side: 5104, there: 29, status: 'over' },
  ])('opening $there beside a spiral is $status', ({ side, there, status }) => {
    const opening = obstruction('opening', [side, 50, side + 300, 600], { mark: 'O2' })
    const parts = { ...behind(spiralOf({ outside: 150 }), { height: 110 }), more: { obstructions: [opening] } }
    expect(theFit(parts, ANCHOR, /to opening O2|to top/)).toEqual({ status, there, asked: 30 })
  })
})

describe('depth', () => {
  // Outside + 30 + 30 in 220.
  test.each([
    { outside: 160, asked: 220, status: 'within' },
    { outside: 161, asked: 221, status: 'over' },
    { outside: 219, asked: 279, status: 'over' },
    { outside: 220, asked: 280, status: 'stop' },
  ])('spiral of $outside and two covers: $asked in 220 is $status', ({ outside, asked, status }) => {
    expect(theFit(behind(spiralOf({ outside })), ANCHOR, /^Depth/)).toEqual({ status, there: 220, asked })
  })
})

describe('gaps (EN 1992-1-1 8.2, from memory): largest of the bar, aggregate + 5, 20, job setting', () => {
  const two = (spacing: number): Parts => ({
    hardware: [{ ...PLAIN, pocket: null }],
    anchors: [at(5000), at(5000 + spacing, {}, 2)],
    steel: [1, 2].map((n) => steel(`s${n}`, ofAnchor(n), spiralOf({ first: 20, pitch: 60 }))),
  })

  // spacing - 150; up to 1 into one another counts as touching
  test.each([
    { spacing: 175, there: 25, status: 'within' },
    { spacing: 174, there: 24, status: 'over' },
    { spacing: 150, there: 0, status: 'over' },
    { spacing: 149, there: -1, status: 'over' },
  ])('spirals of 150 at $spacing: $there is $status', ({ spacing, there, status }) => {
    expect(theFit(two(spacing), ANCHOR, /^Clear gap, spiral/)).toEqual({ status, there, asked: 25 })
    expect(theFit(two(spacing), 'anchor:E2-2', /^Clear gap, spiral/)).toEqual({ status, there, asked: 25 })
  })

  test('at 148 they stand in one place by 2', () => {
    expect(theFit(two(148), ANCHOR, /^In one place, spiral/)).toEqual({ status: 'stop', there: -2, asked: 0 })
  })

  test.each([
    { shape: spiralOf({ pitch: 35 }), there: 25, status: 'within' },
    { shape: spiralOf({ pitch: 34 }), there: 24, status: 'over' },
    // A hook beside its link: 45 - 2 x 10
    { shape: linksOf({ pitch: 45 }), there: 25, status: 'within' },
    { shape: linksOf({ pitch: 44 }), there: 24, status: 'over' },
    { shape: hairpinsOf({ count: 2, pitch: 135 }), there: 125, status: 'within' },
    { shape: hairpinsOf({ count: 2, pitch: 34, lies: 'flat', bend: 200 }), there: 24, status: 'over' },
  ])('within a set of $shape.kind at $shape.pitch: $there is $status', ({ shape, there, status }) => {
    expect(theFit(behind(shape), ANCHOR, /^Clear gap/)).toEqual({ status, there, asked: 25 })
  })

  test.each([
    { diameter: 12, aggregate: 20, pitch: 37, asked: 25, status: 'within' },
    { diameter: 12, aggregate: 20, pitch: 36, asked: 25, status: 'over' },
    { diameter: 12, aggregate: 32, pitch: 49, asked: 37, status: 'within' },
    { diameter: 12, aggregate: 32, pitch: 48, asked: 37, status: 'over' },
    { diameter: 32, aggregate: 20, pitch: 64, asked: 32, status: 'within' },
    { diameter: 32, aggregate: 20, pitch: 63, asked: 32, status: 'over' },
    { diameter: 12, aggregate: 10, pitch: 32, asked: 20, status: 'within' },
    { diameter: 12, aggregate: 10, pitch: 31, asked: 20, status: 'over' },
  ])('edge bars of $diameter at $pitch, aggregate $aggregate: $status', (of) => {
    const { diameter, aggregate, pitch, asked, status } = of
    const parts = { ...alongEdge(edgeBarsOf({ diameter, pitch, countTop: 2 })), pour: { aggregate } }
    expect(theFit(parts, EDGE, /^Clear gap/)).toEqual({ status, there: pitch - diameter, asked })
  })

  // thickness - 2 x 30 - 2 x 20
  test.each([
    { thickness: 125, there: 25, status: 'within' },
    { thickness: 124, there: 24, status: 'over' },
  ])('two layers of 20 in $thickness: $there is $status', ({ thickness, there, status }) => {
    const zone = { kind: 'gap', edgeId: 'E2', afterAnchorId: null, beforeAnchorId: null } as const
    const bars = steel('s', zone, wedgeBarsOf({ diameter: 20, layers: 'both' }))
    expect(theFit({ ...thick(thickness), steel: [bars] }, 'gap:E2:start:end', /^Clear gap/)).toEqual({
      status,
      there,
      asked: 25,
    })
  })

  test('bars lapped over half their length are one run; over more, one stands there twice', () => {
    const run = (from: number) => alongEdge(edgeBarsOf({ from: 4000, to: 6000 }), edgeBarsOf({ from, to: from + 2000 }))
    // 6000 - 5000 = 1000, half of 2000
    expect(faultsOf(run(5000), EDGE)).toEqual([])
    expect(theFit(run(4999), EDGE, /^In one place/)).toEqual({ status: 'stop', there: -12, asked: 0 })
  })
})

describe('bodies in one place', () => {
  // A pocket 110 deep and 160 high reaches to 190, past the bar at 178 to 190: first - 6 - 110
  test.each([
    { first: 116, there: 0, status: 'within' },
    { first: 115, there: 0, status: 'within' },
    { first: 114, there: -2, status: 'stop' },
  ])('edge bar at $first beside a block-out 110 deep is $status', ({ first, there, status }) => {
    const hardware = [{ ...PLAIN, pocket: { width: 300, height: 160, depth: 110 } }]
    const parts = { ...alongEdge(edgeBarsOf({ first })), hardware, anchors: [at(5000)] }
    const name = status === 'stop' ? /^In one place, edge bar of E2 and pocket/ : /^Clear of one another/
    expect(theFit(parts, EDGE, name)).toEqual({ status, there, asked: 0 })
  })

  // Hole 130 to duct 70 over 900: half width 55 at 300 behind. Bend at half the pitch, bar of 10 at 295 + 5.
  test.each([
    { pitch: 120, status: 'within' },
    { pitch: 118, status: 'stop' },
  ])('hairpins at $pitch beside a duct that flares are $status', ({ pitch, status }) => {
    const hardware = [{ ...PLAIN, hole: { width: 130, height: 20, isRound: false } }]
    const parts = { ...behind(hairpinsOf({ count: 2, pitch, first: 295 })), hardware }
    const { there, ...rest } = theFit(parts, ANCHOR, /hairpin of E2-01 and duct/)
    expect(rest).toEqual({ status, asked: 0 })
    // Square to the side, which turns by 30 in 900: (pitch / 2 - 55) x cos - 5
    const clear = (pitch / 2 - 55) * Math.cos(Math.atan(30 / 900)) - 5
    expect(there).toBeCloseTo(status === 'stop' ? clear : 0, 3)
    // Without the flare, 35 half wide, both are clear.
    expect(faultsOf(behind(hairpinsOf({ count: 2, pitch, first: 295 })), ANCHOR)).toEqual([])
  })

  test.each([
    { first: 0, status: 'within' },
    { first: -1, status: 'stop' },
  ])('first turn of a spiral $first behind the bearing face is $status', ({ first, status }) => {
    expect(theFit(behind(spiralOf({ first })), ANCHOR, /first turn/)).toEqual({ status, there: first, asked: 0 })
  })

  // A link's near side at the plate: first - 5; without a pocket the plate itself stands there.
  test.each([
    { first: 4, status: 'within' },
    { first: 3, status: 'stop' },
  ])('links that begin $first behind the plate are $status', ({ first, status }) => {
    const parts = { ...behind(linksOf({ width: 200, height: 70, first })), hardware: [{ ...PLAIN, pocket: null }] }
    expect(theFit(parts, ANCHOR, /links of E2-01 and plate/).status).toBe(status)
  })

  // Hairpin of 10 bent at 20 inside, its inner faces at depth 175 and height 190; bar of 12 at height 184. The bar
  // touches the arc where its centre is 20 - 6 from the arc's centre, 1 more is let pass: 14^2 + (20 - x)^2 <= 15^2.
  test.each([
    // 14^2 + 5^2 = 14.87^2
    { x: 15, status: 'within' },
    // 14^2 + 6^2 = 15.23^2
    { x: 14, status: 'stop' },
  ])('bar $x inside the bend that holds it is $status', ({ x, status }) => {
    const hairpin = hairpinsOf({ bend: 180, first: 55, count: 2, pitch: 200 })
    const parts = {
      ...behind(hairpin),
      steel: [steel('s', ofAnchor(), hairpin), steel('e', ofEdge(), edgeBarsOf({ first: 175 + x }))],
    }
    const found = theFit(parts, ANCHOR, /hairpin of E2-01 and edge bar of E2/)
    expect(found.status).toBe(status)
    // A bend is taken in straight pieces, which lie up to 25 x (1 - cos 4.5 deg) = 0.08 inside it.
    if (status === 'stop') expect(Math.abs(found.there - (14 - Math.hypot(14, 6)))).toBeLessThan(0.08)
  })

  // Bars of 25 at 40 + 10 + 12.5 in from the sides: 462.5 from the edge, less 12.5 and 6
  test.each([
    { first: 444, there: 0, status: 'within' },
    { first: 445, there: 0, status: 'within' },
    { first: 446, there: -2, status: 'stop' },
  ])("edge bar at $first beside a column's bar is $status (common practice)", ({ first, there, status }) => {
    const cage = { mark: 'B2', cageCover: 40, cageBars: '4H25, H10 links' }
    const column = obstruction('column', [4750, 400, 5250, 900], cage)
    const parts = { ...alongEdge(edgeBarsOf({ first })), more: { obstructions: [column] } }
    expect(theFit(parts, EDGE, /bar of column B2/)).toEqual({ status, there, asked: 0 })
  })

  test('local steel that comes with the hardware is a body too', () => {
    const hardware = [{ ...PLAIN, localSteel: { ...linksOf(), isTested: true } }]
    const parts = { hardware, anchors: [at(5000), at(5300, {}, 2)] }
    // 300 wide at 300: they touch.
    expect(theFit(parts, ANCHOR, /^Clear gap, links/)).toEqual({ status: 'over', there: 0, asked: 25 })
  })
})

describe('bending (BS 8666:2005 Table 2, read in a digest)', () => {
  // 180 less two covers of 30: 120. A closed link's hook, and so each side: 130 of 10 mm, 115 of 8 mm.
  test.each([
    { diameter: 10, height: 120, hook: 130, asked: 130, status: 'stop' },
    { diameter: 8, height: 120, hook: 115, asked: 115, status: 'within' },
    { diameter: 10, height: 130, hook: 130, asked: 130, status: 'within' },
    { diameter: 10, height: 129, hook: 130, asked: 130, status: 'stop' },
    { diameter: 8, height: 115, hook: 115, asked: 115, status: 'within' },
    { diameter: 8, height: 114, hook: 115, asked: 115, status: 'stop' },
  ])('closed link of $diameter, $height high, in 180 is $status', ({ diameter, height, hook, asked, status }) => {
    const links = linksOf({ diameter, height, hook })
    const parts = { ...thick(180), ...behind(links, { height: 90 }) }
    const found = theFit(parts, ANCHOR, /^Bending/)
    expect(found).toMatchObject({ status, asked })
    if (status === 'stop') expect(found.there).toBe(height)
  })

  // 10 d of a 10 mm bar overall between two bends
  test.each([
    { bend: 100, status: 'within' },
    { bend: 99, status: 'stop' },
  ])('hairpin of 10 with a bend of $bend is $status', ({ bend, status }) => {
    expect(theFit(behind(hairpinsOf({ bend })), ANCHOR, /^Bending/)).toEqual({ status, there: bend, asked: 100 })
  })

  test('a size that the standard does not list is not covered', () => {
    const { status } = theFit(behind(hairpinsOf({ diameter: 11 })), ANCHOR, /^Depth/)
    expect(status).toBe('within')
    expect(() => theFit(behind(hairpinsOf({ diameter: 11 })), ANCHOR, /^Bending/)).toThrow(/Bending of hairpin/)
  })
})

describe('pans and joints', () => {
  const PAN = 'pan:PN1'
  const round = (shape: SteelShape, change: Parameters<typeof pan>[1] = {}): Parts => ({
    hardware: [PLAIN],
    pans: [pan('PN1', { x: 5000, y: 5000, ...change })],
    steel: [steel('s', { kind: 'pan', panId: 'PN1' }, shape)],
  })
  const placed = (change: Partial<PlacedBarsShape> & Pick<PlacedBarsShape, 'kind'>): SteelShape => ({
    diameter: 12,
    length: 1500,
    count: 2,
    layers: 'top',
    runs: 'along',
    pitch: 100,
    ...change,
  })

  // Middle of the recess at 5500: to 6250. Up to 1 into the wall counts as touching.
  test.each([
    { wall: 6249, there: 0, status: 'within' },
    { wall: 6248, there: -2, status: 'stop' },
  ])('trimmer to 6250 with a wall from $wall is $status', ({ wall, there, status }) => {
    const parts = {
      ...round(placed({ kind: 'trimmers' })),
      more: { obstructions: [obstruction('wall', [0, wall, 10000, wall + 200])] },
    }
    expect(theFit(parts, PAN, /trimmer of PN1 and wall W9/)).toEqual({ status, there, asked: 0 })
  })

  // The jack points south: bars from 5000 - length / 2 towards the south edge.
  test.each([
    { length: 9940, there: 30, status: 'within' },
    { length: 9942, there: 29, status: 'over' },
    { length: 10_000, there: 0, status: 'stop' },
    { length: 10_002, there: -1, status: 'stop' },
  ])('lap of $length with 5000 of slab beyond: $there is $status', ({ length: long, there, status }) => {
    const shape = placed({ kind: 'lap-bars', length: long, pitch: 500 })
    expect(theFit(round(shape, { azimuth: Math.PI }), PAN, /to (edge E2|top)$/)).toEqual({ status, there, asked: 30 })
  })

  // Recess 350 across: half the pitch - 175 - 6
  test.each([
    { pitch: 362, there: 0, status: 'within' },
    { pitch: 360, there: 0, status: 'within' },
    { pitch: 358, there: -2, status: 'stop' },
  ])('bars $pitch apart beside a recess of 350 are $status', ({ pitch, there, status }) => {
    expect(theFit(round(placed({ kind: 'tie-back-bars', pitch })), PAN, /recess of PN1/)).toEqual({
      status,
      there,
      asked: 0,
    })
  })

  // Recess 150 deep of 220: floor at 70 by the plate. Bottom bar of 12 reaches to 42.
  test('under the recess a bottom bar is clear', () => {
    expect(faultsOf(round(placed({ kind: 'tie-back-bars', count: 1, layers: 'bottom' })), PAN)).toEqual([])
    expect(faultsOf(round(placed({ kind: 'tie-back-bars', count: 1 })), PAN)).toHaveLength(1)
  })

  // Pour P2 runs from 19200 to 34200: half the length + 30 = 15000
  test.each([
    { length: 29_940, there: 30, status: 'within' },
    { length: 29_942, there: 29, status: 'over' },
  ])('bars of $length across a joint end $there from the far edge: $status', ({ length: long, there, status }) => {
    const parts = twoPours([])
    const east = { ...edge({ ...SOUTH, id: 'east', mark: 'J1', x: 19200, y: 0, azimuth: 0 }, 's', [length(0, 17400)]) }
    const shape = placed({ kind: 'lap-bars', length: long })
    const joint = { id: 'J', edgeLineId: 'east', kind: 'construction', firstPourId: 'P2' } as const
    const outline = [
      { id: 'q', x: 19200, y: 0 },
      { id: 'r', x: 34200, y: 0 },
      { id: 'u', x: 34200, y: 17400 },
      { id: 's', x: 19200, y: 17400 },
    ]
    const all = {
      ...parts,
      edges: [...EDGES, { ...east, id: 'J1-P2', pourId: 'P2' }],
      more: { pours: [POUR, { ...POUR, id: 'P2', mark: 'P2', outline }], joints: [joint] },
      steel: [steel('s', { kind: 'joint', jointId: 'J' }, shape)],
    }
    expect(theFit(all, 'joint:J', /^Lap bar of joint J1 to/)).toEqual({ status, there, asked: 30 })
  })
})

test('nothing depends on the order of the steel, and a zone without bars has no checks', () => {
  const sets = [steel('a', ofAnchor(), spiralOf({ first: 20 })), steel('b', ofEdge(), edgeBarsOf())]
  const parts = { hardware: [PLAIN], anchors: [at(5000)] }
  const names = (list: typeof sets) => faultsOf({ ...parts, steel: list }, ANCHOR)
  expect(names(sets)).toEqual(names([...sets].reverse()))
  expect(faultsOf({}, EDGE)).toEqual([])
})
