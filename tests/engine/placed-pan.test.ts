import { expect, test } from 'vitest'
import { layoutIndex, type SteelShape } from '../../packages/engine/src'
import { barsOfPan } from '../../packages/engine/src/placed/round-pan'
import { panFrame } from '../../packages/engine/src/placed/pan-frame'
import { steel } from './fit-cases'
import { inPan, layout, pan } from './sample-layout'

/** Recess 1000 along and 350 across, covers 30, slab 220; bars of 12. */
const bars = (shape: Partial<SteelShape>) =>
  barsOfPan(
    layoutIndex(
      layout({
        pans: [pan('PN1', { x: 5000, y: 5000 })],
        steel: [
          steel('s', { kind: 'pan', panId: 'PN1' }, {
            diameter: 12,
            length: 1500,
            layers: 'top',
            runs: 'along',
            pitch: 100,
            count: 2,
            ...shape,
          } as SteelShape),
        ],
      }),
    ),
    'PN1',
  ).map(({ path }) => path.map(({ chainage, depth }) => [chainage, depth]))

test('tie-back bars lie about the tendon, their middle at the bearing face', () => {
  expect(bars({ kind: 'tie-back-bars', count: 3 })).toEqual(
    [-100, 0, 100].map((chainage) => [
      [chainage, -750],
      [chainage, 750],
    ]),
  )
})

test('trimmers lie on both sides of the recess, from a cover outside it, the odd one on the first (common practice)', () => {
  // 350 / 2 + 30 + 6 = 211; the middle of the recess stands 500 before the face
  expect(bars({ kind: 'trimmers', count: 3 }).map(([a, b]) => [a?.[0], a?.[1], b?.[1]])).toEqual([
    [-211, -1250, 250],
    [-311, -1250, 250],
    [211, -1250, 250],
  ])
  expect(bars({ kind: 'trimmers', runs: 'across' }).map(([a, b]) => [a?.[1], a?.[0], b?.[0]])).toEqual([
    [36, -750, 750],
    [-1036, -750, 750],
  ])
})

test('diagonals at each corner at 45 degrees, square to the line from the middle of the recess (common practice)', () => {
  const placed = bars({ kind: 'diagonals', count: 1 })
  expect(placed).toHaveLength(4)
  // 36 out of the corner at (175, 0): its middle at 175 + 36 / sqrt 2 and 36 / sqrt 2
  const middles = placed.map(([a, b]) => [0, 1].map((i) => ((a?.[i] ?? 0) + (b?.[i] ?? 0)) / 2))
  const out = 36 * Math.SQRT1_2
  const expected = [
    [-175 - out, out],
    [-175 - out, -1000 - out],
    [175 + out, out],
    [175 + out, -1000 - out],
  ]
  for (const [i, middle] of middles.entries()) {
    expect(middle[0]).toBeCloseTo(expected[i]?.[0] ?? 0, 9)
    expect(middle[1]).toBeCloseTo(expected[i]?.[1] ?? 0, 9)
  }
})

test("links of the hardware stand behind the pan's plate, against the jack's direction", () => {
  const index = layoutIndex(layout({ pans: [pan('PN1', { x: 5000, y: 5000 })], anchors: [inPan('PN1')] }))
  const placed = barsOfPan(index, 'PN1')
  expect(placed.map(({ path }) => path[0]?.depth)).toEqual([30, 80, 130, 180])
  // The jack points north: behind is south.
  expect(panFrame({ x: 5000, y: 5000, azimuth: 0 }).pointAt(0, 30)).toEqual({ x: 5000, y: 4970 })
})
