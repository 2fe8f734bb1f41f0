import { applyCommands, layoutSchema, type LayoutFile } from '@wedgeline/contract'
import { expect, test } from 'vitest'
import { insertAnchors, removeAnchors } from '@/features/edge/anchor-commands'
import { insertPour, type PlanPoint, type TypedPour } from '@/features/pour/pour-commands'

const start: LayoutFile = layoutSchema.parse({
  format: 'wedgeline.layout',
  version: 1,
  job: { id: 'job', number: 'J1', title: 'Test' },
  levels: [{ id: 'L1', mark: 'L1' }],
  strandTypes: [{ id: 'st', name: '12.7', diameterMm: 12.7, areaMm2: 98.7, breakingLoadKN: 184, proofLoadKN: 165.5 }],
  hardware: [
    {
      id: 'flat',
      name: 'Flat',
      kind: 'plate',
      ends: 'live',
      strandsMax: 4,
      plate: { widthMm: 220, heightMm: 80 },
      hole: { widthMm: 70, heightMm: 20, isRound: false },
      duct: { widthMm: 70, heightMm: 20, isRound: false },
      pocket: { widthMm: 300, heightMm: 120, depthMm: 110 },
      spacingAlongMinMm: 350,
      spacingHeightMinMm: 350,
      edgeAlongMinMm: 190,
      edgeHeightMinMm: 75,
      straightBehindMinMm: 600,
      strandTailMinMm: 600,
      drawInMm: 6,
    },
  ],
  pours: [],
})

const box = ([x0, y0]: [number, number], [x1, y1]: [number, number]): PlanPoint[] => [
  { xMm: x0, yMm: y0 },
  { xMm: x1, yMm: y0 },
  { xMm: x1, yMm: y1 },
  { xMm: x0, yMm: y1 },
]
const typed = (mark: string, outline: readonly PlanPoint[]): TypedPour => ({
  mark,
  title: '',
  level: { id: 'L1' },
  thicknessMm: 220,
  concrete: 'C32/40',
  fckMPa: 32,
  coverTopMm: 30,
  coverSoffitMm: 30,
  coverEdgeMm: 30,
  stages: [{ name: 'full', share: 1, strengthMPa: 22 }],
  outline,
})
let ids = 0
const newId = () => `id-${++ids}`

test('each side of the outline becomes an edge, chainage running east or north', () => {
  const { layout } = applyCommands(
    start,
    insertPour(start, typed('P1', box([0, 0], [12000, 9000])), newId).change.commands,
  )
  expect(layout.edges.map(({ mark }) => mark)).toEqual(['E1', 'E2', 'E3', 'E4'])
  expect(layout.edges.map(({ lengths }) => [lengths[0]?.fromMm, lengths[0]?.toMm])).toEqual([
    [0, 12000],
    [0, 9000],
    [0, 12000],
    [0, 9000],
  ])
  // South and north sides run east (90), west and east sides run north (0).
  expect(layout.edgeLines.map(({ azimuthDeg }) => azimuthDeg)).toEqual([90, 0, 90, 0])
})

test('a clockwise outline is turned round, so that the slab lies left of each side', () => {
  const { layout } = applyCommands(
    start,
    insertPour(start, typed('P1', [...box([0, 0], [12000, 9000])].reverse()), newId).change.commands,
  )
  const points = layout.pours[0]?.outline ?? []
  const twiceArea = points.reduce((sum, a, i) => {
    const b = points[(i + 1) % points.length] ?? a
    return sum + a.xMm * b.yMm - b.xMm * a.yMm
  }, 0)
  expect(twiceArea).toBe(2 * 12000 * 9000)
})

test('a pour beside another shares its lines: chainage goes on along them', () => {
  const first = applyCommands(
    start,
    insertPour(start, typed('P1', box([0, 0], [12000, 9000])), newId).change.commands,
  ).layout
  const both = applyCommands(
    first,
    insertPour(first, typed('P2', box([12000, 0], [20000, 9000])), newId).change.commands,
  ).layout
  expect(both.edgeLines).toHaveLength(5)
  const south = both.edges.find(({ mark }) => mark === 'E1-P2')
  expect([south?.lengths[0]?.fromMm, south?.lengths[0]?.toMm]).toEqual([12000, 20000])
})

test('a typed anchor makes a tendon with its other end open; marks follow the chainage and then hold still', () => {
  const { layout } = applyCommands(
    start,
    insertPour(start, typed('P1', box([0, 0], [12000, 9000])), newId).change.commands,
  )
  const edge = layout.edges[0]
  if (!edge) throw new Error('no edge')
  const place = { layout, edge, newId }
  const four = applyCommands(
    layout,
    insertAnchors(place, [{ chainageMm: 2100 }, { chainageMm: 900, heightMm: 100, strands: 3 }]).commands,
  ).layout
  const marks = (of: LayoutFile) => of.anchors.map(({ number, chainageMm }) => [number, chainageMm])
  expect(marks(four)).toEqual([
    [1, 900],
    [2, 2100],
  ])
  expect(four.tendons.map(({ strands }) => strands)).toEqual([3, 4])
  const five = applyCommands(four, insertAnchors({ ...place, layout: four }, [{ chainageMm: 1500 }]).commands).layout
  expect(marks(five).at(-1)).toEqual([3, 1500])
  // Like the anchor before it at 900: 100 high, 3 strands.
  expect(five.anchors.at(-1)?.heightMm).toBe(100)
  const gone = applyCommands(five, removeAnchors(five, [five.anchors[0]?.id ?? '']).commands).layout
  expect([gone.anchors.length, gone.tendons.length]).toEqual([2, 2])
})
