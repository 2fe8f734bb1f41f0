import { describe, expect, test } from 'vitest'
import {
  boxRound,
  layoutIndex,
  placedBars,
  turnsOf,
  type Steel,
  type SteelShape,
  type SteelZone,
} from '../../packages/engine/src'
import { anchor, B7, D4, edge, layout, length, S4, SOUTH, WEST, type Parts } from './sample-layout'

const steel = (id: string, zone: SteelZone, shape: SteelShape): Steel => ({
  id,
  pourId: 'P1',
  zone,
  shape,
  source: 'by-hand',
  isLocked: false,
})
const atAnchor: SteelZone = { kind: 'anchor', anchorId: 'E2-1' }
const atEdge: SteelZone = { kind: 'edge', edgeId: 'E2' }
const bars = (parts: Parts) => placedBars(layoutIndex(layout(parts)), 'E2')
const plain = { ...S4, localSteel: null }
const one = [anchor('E2', 1, { chainage: 5000 })]

describe('local steel', () => {
  test('links as tested stand behind the plate, centre lines half a bar inside', () => {
    const placed = bars({ anchors: one })
    expect(placed).toHaveLength(4)
    // First 30 behind a face 110 in, then every 50; 300 x 140 outside with a bar of 10
    expect(placed.map((bar) => bar.path[0]?.depth)).toEqual([140, 190, 240, 290])
    expect(placed[0]).toMatchObject({
      steelId: null,
      anchorId: 'E2-1',
      zoneId: 'anchor:E2-1',
      kind: 'links',
      isClosed: true,
    })
    expect(placed[0]?.path[0]).toEqual({ chainage: 5000 - 145, depth: 140, height: 110 - 65 })
    expect(boxRound(placed[0] ?? fail())).toEqual({
      fromChainage: 4850,
      toChainage: 5150,
      fromDepth: 135,
      toDepth: 145,
      fromHeight: 40,
      toHeight: 180,
    })
  })

  test('steel of the same kind entered for the anchor takes their place; another kind does not', () => {
    const links: SteelShape = {
      kind: 'links',
      diameter: 12,
      width: 300,
      height: 140,
      hook: 130,
      count: 2,
      first: 40,
      pitch: 60,
    }
    const own = bars({ anchors: one, steel: [steel('s', atAnchor, links)] })
    expect(own.map((bar) => bar.steelId)).toEqual(['s', 's'])
    const hairpin: SteelShape = {
      kind: 'hairpins',
      diameter: 10,
      leg: 600,
      bend: 140,
      count: 1,
      lies: 'upright',
      first: 50,
      pitch: 0,
    }
    expect(bars({ anchors: one, steel: [steel('s', atAnchor, hairpin)] }).map((bar) => bar.kind)).toEqual([
      'hairpins',
      'links',
      'links',
      'links',
      'links',
    ])
  })

  test('a spiral: one flat turn at each end, four at the pitch between', () => {
    if (B7.localSteel?.kind !== 'spiral') throw new Error('no spiral')
    // Middles of the four at 55/2, 55 * 3/2 ...; the last flat turn at 4 * 55 = 220
    expect(turnsOf(B7.localSteel)).toEqual([
      { behind: 0, isFlat: true },
      { behind: 27.5, isFlat: false },
      { behind: 82.5, isFlat: false },
      { behind: 137.5, isFlat: false },
      { behind: 192.5, isFlat: false },
      { behind: 220, isFlat: true },
    ])
    const [spiral] = bars({ anchors: [anchor('E2', 1, { chainage: 5000, hardwareId: 'B7', setBack: 120 })] })
    const box = boxRound(spiral ?? fail())
    // 230 outside, from the face 120 in to 340, half a bar of 12 beyond
    expect(box.toChainage - box.fromChainage).toBeCloseTo(230, 6)
    expect(box.toHeight - box.fromHeight).toBeCloseTo(230, 6)
    expect(box.fromDepth).toBeCloseTo(114, 6)
    expect(box.toDepth).toBeCloseTo(346, 6)
    expect(spiral?.turns).toHaveLength(6)
  })

  test('an odd flat turn comes last', () => {
    if (B7.localSteel?.kind !== 'spiral') throw new Error('no spiral')
    expect(turnsOf({ ...B7.localSteel, flatTurns: 1 }).map((turn) => turn.isFlat)).toEqual([
      ...Array<boolean>(5).fill(false),
      true,
    ])
  })
})

describe('hairpins', () => {
  const hairpins = (lies: 'upright' | 'flat'): SteelShape => ({
    kind: 'hairpins',
    diameter: 10,
    leg: 600,
    bend: 140,
    count: 2,
    lies,
    first: 50,
    pitch: 100,
  })
  const drawn = (lies: 'upright' | 'flat') =>
    bars({ hardware: [plain, D4], anchors: one, steel: [steel('s', atAnchor, hairpins(lies))] })

  test('upright: the bend through the thickness, side by side along the edge', () => {
    // Outside of the bend 50 behind the face at 110: centre line at 165; leg ends 650 behind: 760. Bend 140 - 10 = 130.
    expect(drawn('upright').map((bar) => bar.path)).toEqual(
      [4950, 5050].map((chainage) => [
        { chainage, depth: 760, height: 175 },
        { chainage, depth: 165, height: 175 },
        { chainage, depth: 165, height: 45 },
        { chainage, depth: 760, height: 45 },
      ]),
    )
  })

  test('flat: the bend along the edge, one above the other', () => {
    expect(drawn('flat').map((bar) => bar.path)).toEqual(
      [60, 160].map((height) => [
        { chainage: 5065, depth: 760, height },
        { chainage: 5065, depth: 165, height },
        { chainage: 4935, depth: 165, height },
        { chainage: 4935, depth: 760, height },
      ]),
    )
  })
})

describe('a turned tendon turns its local steel', () => {
  const link = (change: Parameters<typeof anchor>[2]) => {
    const [first] = bars({ anchors: [anchor('E2', 1, { chainage: 5000, ...change })] })
    const path = first?.path ?? fail()
    const mean = (of: (point: (typeof path)[number]) => number) =>
      path.reduce((sum, point) => sum + of(point), 0) / path.length
    return { chainage: mean((p) => p.chainage), depth: mean((p) => p.depth), height: mean((p) => p.height) }
  }

  test('skew: 30 behind on a line that leans to growing chainage', () => {
    const centre = link({ skew: 0.1 })
    expect(centre.chainage).toBeCloseTo(5000 + 30 * Math.sin(0.1), 9)
    expect(centre.depth).toBeCloseTo(110 + 30 * Math.cos(0.1), 9)
    expect(link({ skew: -0.1 }).chainage).toBeCloseTo(5000 - 30 * Math.sin(0.1), 9)
  })

  test('an axis that rises outward falls inward', () => {
    expect(link({ elevation: 0.1 }).height).toBeCloseTo(110 - 30 * Math.sin(0.1), 9)
  })
})

describe('bars along and across', () => {
  test('edge bars lie half a bar inside the cover, in pieces where the soffit steps', () => {
    const shape: SteelShape = {
      kind: 'edge-bars',
      diameter: 16,
      countTop: 1,
      countBottom: 2,
      first: 60,
      pitch: 80,
      from: 100,
      to: 19000,
    }
    const edges = [edge(SOUTH, 'a', [length(0, 600, { soffit: -480 }), length(600, 19200)])]
    const placed = bars({ hardware: [plain], edges, steel: [steel('s', atEdge, shape)] })
    // Top 220 - 30 - 8 = 182; bottom -480 + 30 + 8 = -442 to a cover of 30 before the step at 600, then 38
    expect(placed.map((bar) => bar.path)).toEqual([
      line([100, 600], { depth: 60, height: 182 }),
      line([600, 19000], { depth: 60, height: 182 }),
      line([100, 570], { depth: 60, height: -442 }),
      line([600, 19000], { depth: 60, height: 38 }),
      line([100, 570], { depth: 140, height: -442 }),
      line([600, 19000], { depth: 140, height: 38 }),
    ])
  })

  test('in a region they lie inside its links, behind it against the slab', () => {
    const outline = [
      { x: 0, y: 0 },
      { x: 19200, y: 0 },
      { x: 19200, y: 600 },
      { x: 0, y: 600 },
    ]
    const region = {
      id: 'r',
      mark: 'EB',
      kind: 'edge-beam' as const,
      outline,
      top: 220,
      soffit: -480,
      cover: 40,
      linkDiameter: 10,
    }
    const shape: SteelShape = {
      kind: 'transverse-bars',
      diameter: 12,
      length: 1200,
      count: 2,
      layers: 'bottom',
      first: 390,
      pitch: 200,
    }
    const placed = bars({
      hardware: [plain],
      pour: { regions: [region] },
      edges: [edge(SOUTH, 'a', [length(0, 19200, { soffit: -480 })])],
      anchors: one,
      steel: [steel('s', atAnchor, shape)],
    })
    // 110 + 390 = 500: -480 + 40 + 10 + 6 = -424; 700, behind the beam: 30 + 6 = 36
    expect(placed.map((bar) => bar.path)).toEqual([
      line([4400, 5600], { depth: 500, height: -424 }),
      line([4400, 5600], { depth: 700, height: 36 }),
    ])
  })

  test('transverse bars in both layers, counted from the bearing face', () => {
    const shape: SteelShape = {
      kind: 'transverse-bars',
      diameter: 12,
      length: 1000,
      count: 1,
      layers: 'both',
      first: 350,
      pitch: 0,
    }
    const placed = bars({ hardware: [plain], anchors: one, steel: [steel('s', atAnchor, shape)] })
    expect(placed.map((bar) => bar.path)).toEqual([
      line([4500, 5500], { depth: 460, height: 184 }),
      line([4500, 5500], { depth: 460, height: 36 }),
    ])
  })

  test('with a mat each lies in the layer that runs its way, inside the outer bars where it crosses them (common practice)', () => {
    const mat = (id: string, azimuth: number, isOuter: boolean) => ({
      id,
      face: 'top' as const,
      azimuth,
      diameter: 16,
      spacing: 200,
      isOuter,
      spareShare: 0,
      spareBy: null,
    })
    const heightOf = (outerAzimuth: number) => {
      const mats = [mat('o', outerAzimuth, true), mat('i', outerAzimuth + Math.PI / 2, false)]
      const zone: SteelZone = { kind: 'gap', edgeId: 'E2', afterAnchorId: null, beforeAnchorId: null }
      const along: SteelShape = {
        kind: 'edge-bars',
        diameter: 12,
        countTop: 1,
        countBottom: 0,
        first: 60,
        pitch: 0,
        from: 100,
        to: 900,
      }
      const into: SteelShape = { kind: 'wedge-bars', diameter: 12, length: 900, count: 1, layers: 'top' }
      const placed = bars({ pour: { mats }, steel: [steel('a', atEdge, along), steel('b', zone, into)] })
      return placed.map((bar) => bar.path[0]?.height)
    }
    // The edge runs east. Outer bars north: the edge bar inside them, 220 - 30 - 16 - 6; the wedge bar 220 - 30 - 6.
    expect(heightOf(0)).toEqual([168, 184])
    expect(heightOf(Math.PI / 2)).toEqual([184, 168])
  })

  test('wedge bars are spread evenly over their gap, from the cover inward', () => {
    const anchors = [...one, anchor('E2', 2, { chainage: 6000 })]
    const zone: SteelZone = { kind: 'gap', edgeId: 'E2', afterAnchorId: 'E2-1', beforeAnchorId: 'E2-2' }
    const shape: SteelShape = { kind: 'wedge-bars', diameter: 12, length: 1500, count: 4, layers: 'top' }
    const placed = bars({ hardware: [plain], anchors, steel: [steel('s', zone, shape)] })
    // 1000 over four: 125, 375, 625, 875
    expect(placed.map((bar) => bar.path)).toEqual(
      [5125, 5375, 5625, 5875].map((chainage) => [
        { chainage, depth: 30, height: 184 },
        { chainage, depth: 1530, height: 184 },
      ]),
    )
    expect(placed[0]).toMatchObject({ zoneId: 'gap:E2:E2-1:E2-2', anchorId: null })
  })

  test('steel of another edge is left out', () => {
    const shape: SteelShape = {
      kind: 'edge-bars',
      diameter: 12,
      countTop: 1,
      countBottom: 0,
      first: 60,
      pitch: 0,
      from: 0,
      to: 100,
    }
    const elsewhere = steel('s', { kind: 'edge', edgeId: WEST.mark }, shape)
    expect(bars({ steel: [elsewhere] })).toEqual([])
  })
})

function line([from, to]: readonly [number, number], place: { depth: number; height: number }) {
  return [from, to].map((chainage) => ({ chainage, ...place }))
}

function fail(): never {
  throw new Error('nothing placed')
}
