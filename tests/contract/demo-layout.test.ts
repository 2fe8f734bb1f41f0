import { layoutProblems, toEngine } from '@wedgeline/contract'
import { anchorMark, edgeFrame, found, gapsOfEdge, layoutIndex } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'

const file = demoLayout()
const layout = toEngine(file)
const index = layoutIndex(layout)

test('the demo has no problem: its planted faults are for the checks, not for the reader', () => {
  expect(layoutProblems(file)).toEqual([])
})

describe('counts of the demo scenario', () => {
  test.each([
    ['levels', 2],
    ['pours', 3],
    ['edges', 14],
    ['pans', 8],
    ['tendons', 52],
    ['anchors', 104],
  ] as const)('%s: %i', (table, count) => {
    expect(file[table]).toHaveLength(count)
  })

  test('56 live and 48 dead ends', () => {
    expect(file.anchors.filter(({ end }) => end === 'live')).toHaveLength(56)
    expect(file.anchors.filter(({ end }) => end === 'dead')).toHaveLength(48)
  })

  // One gap more than the tendon ends square to an edge, those in pans included:
  // P1: E1 9 + 1, E2-P1 11 + 1, J1-P1 7 + 1, E4-P1 6 + 5 in pans + 1 = 10 + 12 + 8 + 12 = 42
  // P2: E2-P2 9 + 1, E3 9 + 1, E4-P2 9 + 1, J1-P2 7 + 1 = 10 + 10 + 10 + 8 = 38
  // P3: E5 10 + 1, E7-E 6 + 1, E7-NR 2 + 1, E7-ER 0 + 1, E7-N 8 + 1, E6 3 + 3 in pans + 1 = 11 + 7 + 3 + 1 + 9 + 7 = 38
  test.each([
    ['P1', 42],
    ['P2', 38],
    ['P3', 38],
  ])('gaps of %s: %i', (pourId, count) => {
    const edges = file.edges.filter((edge) => edge.pourId === pourId)
    expect(edges.flatMap(({ id }) => gapsOfEdge(index, id))).toHaveLength(count)
  })
})

describe('bearing faces stand where the scenario puts them', () => {
  // Pour P2 begins 19,200 along lines E2 and E4, so its anchors' chainage is 19,200 more than from its own corner.
  test.each([
    ['L1P1-N01S', 900, 0 + 110], // E2 runs east at y = 0; 110 into the slab is north
    ['L1P1-N02S', 2650, 0 + 300],
    ['L1P1-N02N', 2650, 17400 - 110], // E4 runs east at y = 17,400; into the slab is south
    ['L1P1-E03W', 0 + 110, 9200], // E1 runs north at x = 0; into the slab is east
    ['L1P1-E06J', 19200 - 300, 15600], // J1 seen from P1: into the slab is west
    ['L1P2-E01J', 19200 + 300, 7500], // J1 seen from P2: into the slab is east
    ['L1P2-N04S', 19200 + 5850, 300],
    ['L1P2-N06N', 19200 + 9350, 17400 - 110],
    ['EB1-T1E', 34200 - 120, 170], // E3 runs north at x = 34,200
    ['EB2-T2S', 19200 + 14830, 120],
    ['L2P3-N08N', 12480, 17400 - 110],
    ['L2P3-N09N', 12600 + 1250, 10800 - 300], // E7-NR starts at the re-entrant corner (12,600, 10,800)
    ['L2P3-E05W', 300, 1900],
  ])('%s at x %i, y %i', (id, x, y) => {
    const anchor = found(index.anchors, id, 'anchor')
    const frame = edgeFrame(layout, anchor.edgeId ?? '')
    const point = frame.pointAt(anchor.chainage, anchor.setBack)
    expect(Math.abs(point.x - x)).toBeLessThan(1)
    expect(Math.abs(point.y - y)).toBeLessThan(1)
  })
})

test('numbers run by chainage along each edge', () => {
  for (const edge of file.edges) {
    const anchors = file.anchors.filter((anchor) => anchor.edgeId === edge.id)
    const byChainage = [...anchors].sort((a, b) => a.chainageMm - b.chainageMm)
    expect(byChainage.map(({ number }) => number)).toEqual(byChainage.map((_, i) => i + 1))
  }
})

test('an anchor is marked by edge and number', () => {
  // The two tendons of EB1 come first on E1, so the first slab anchor from the south is the third.
  expect(anchorMark(index, found(index.anchors, 'L1P1-E01W', 'anchor'))).toBe('E1-03')
})

test('transverse bars at E2 in P1 carry the bursting in plan of its live anchors (EN 1992-1-1 6.5.3, Eq. 6.58)', () => {
  // Neighbours stand 1750 apart, the prism is twice the nearer of half a gap and the distance to the end of the edge:
  // b = 2 x 875 = 1750 for N01, N03 and N09; N11 is 800 from the joint, b = 2 x 800 = 1600.
  // T = 0.25 x (1 - 220/b) x 1.2 x 588.8 kN: 154.4 kN and 152.3 kN; As = T / 300 MPa = 515 and 508 mm2.
  const needed = new Map([
    [1750, (0.25 * (1 - 220 / 1750) * 1.2 * 588_800) / 300],
    [1600, (0.25 * (1 - 220 / 1600) * 1.2 * 588_800) / 300],
  ])
  const prisms = new Map([
    ['L1P1-N01S', 1750],
    ['L1P1-N03S', 1750],
    ['L1P1-N09S', 1750],
    ['L1P1-N11S', 1600],
  ])
  for (const [anchorId, b] of prisms) {
    const steel = file.steel.find(({ zone }) => zone.kind === 'anchor' && zone.anchorId === anchorId)
    if (steel?.shape.kind !== 'transverse-bars') throw new Error(`${anchorId} has no transverse bars`)
    const { count, firstMm, pitchMm, diameterMm, layers } = steel.shape
    // Counted are bars from 0.2 b to 1.0 b behind the bearing face (the accepted reading for the window).
    const counted = Array.from({ length: count }, (_, i) => firstMm + i * pitchMm).filter((x) => x >= 0.2 * b && x <= b)
    const area = counted.length * (layers === 'both' ? 2 : 1) * (Math.PI / 4) * diameterMm ** 2
    expect(area).toBeGreaterThan(needed.get(b) ?? Infinity)
  }
})
