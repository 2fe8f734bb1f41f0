import { describe, expect, test } from 'vitest'
import { actsAsOne, closeAnchors, closeBelow, layoutIndex, type Anchor } from '../../packages/engine/src'
import { anchor, deadEnd, edge, layout, length, WEST } from './sample-layout'

const groups = (edgeId: string, anchors: readonly Anchor[], plane: 'plan' | 'thickness' = 'plan') =>
  closeAnchors(layoutIndex(layout({ anchors })), edgeId)
    .filter((group) => group.plane === plane)
    .map((group) => group.anchorIds)

const b7 = { hardwareId: 'B7', setBack: 120, height: 110 }

describe('a pair in plan', () => {
  const wide = { plate: 170, toOuterBefore: 300, toOuterAfter: 4000 }

  test('closer than twice the wider plate: two beam anchors 260 apart, plates 170', () => {
    // 2 * 170 = 340; the prism is 2 * 300 = 600 and 0.3 of it 180
    expect(closeBelow(wide).value).toBe(340)
    expect(actsAsOne({ ...wide, spacing: 260 })).toBe(true)
  })

  test.each([
    { spacing: 339.9, isOne: true },
    { spacing: 340, isOne: false },
    { spacing: 340.1, isOne: false },
  ])('$spacing against 340', ({ spacing, isOne }) => {
    expect(actsAsOne({ ...wide, spacing })).toBe(isOne)
  })

  test('0.3 of the prism governs where the pair stands far from others', () => {
    // 0.3 * 2 * min(900, 1000) = 540, more than 340; either side may be the nearer
    expect(closeBelow({ plate: 170, toOuterBefore: 900, toOuterAfter: 1000 }).value).toBeCloseTo(540, 9)
    expect(closeBelow({ plate: 170, toOuterBefore: 1000, toOuterAfter: 900 }).value).toBeCloseTo(540, 9)
  })
})

describe('groups along an edge', () => {
  test('the two tendons of an edge beam at its end, 170 and 430 along', () => {
    const anchors = [
      anchor('E1', 1, { ...b7, chainage: 170 }),
      anchor('E1', 2, { ...b7, chainage: 430 }),
      anchor('E1', 3, { chainage: 7500 }),
    ]
    expect(groups('E1', anchors)).toEqual([['E1-1', 'E1-2']])
  })

  test('an even row 1750 apart has none', () => {
    // 2 * 220 = 440; a pair in the row has 0.3 * 2 * 1750 = 1050 at most
    const anchors = [1, 2, 3, 4].map((n) => anchor('E2', n, { chainage: n * 1750 }))
    expect(groups('E2', anchors)).toEqual([])
  })

  test('a third joins the pair that counts as one', () => {
    // 350 < 440 joins 15600 and 15950. Their centre is 15775; with 15100 the centre is (2 * 15775 + 15100) / 3 = 15550,
    // its prism 2 * (17400 - 15550) = 3700 and 0.3 of that 1110, above the 500 between 15100 and 15600.
    const anchors = [
      anchor('E1', 1, { chainage: 9900 }),
      anchor('E1', 2, { chainage: 15100 }),
      anchor('E1', 3, { chainage: 15600 }),
      anchor('E1', 4, { chainage: 15950 }),
    ]
    expect(groups('E1', anchors)).toEqual([['E1-2', 'E1-3', 'E1-4']])
  })

  test('the order of the list does not matter, nor from which end the edge is read', () => {
    const at = [300, 700, 1100, 5000, 5300, 9000, 9700]
    const anchors = at.map((chainage, i) => anchor('E1', i + 1, { chainage }))
    const mirrored = at.map((chainage, i) => anchor('E1', i + 1, { chainage: 17400 - chainage }))
    const found = groups('E1', anchors)
    expect(found.length).toBeGreaterThan(0)
    expect(groups('E1', [...anchors].reverse())).toEqual(found)
    expect(
      groups('E1', mirrored)
        .map((ids) => [...ids].reverse())
        .reverse(),
    ).toEqual(found)
  })

  test('a wider plate beside a narrow one counts for both', () => {
    // 2 * 300 = 600 with a bonded splay, 2 * 220 = 440 without; the end of the edge keeps 0.3 of the prism at 405.
    const beside = (other: Anchor) => [anchor('E2', 1, { chainage: 400 }), other, anchor('E2', 3, { chainage: 2500 })]
    expect(groups('E2', beside(deadEnd('E2', 2, { chainage: 950 })))).toEqual([['E2-1', 'E2-2']])
    expect(groups('E2', beside(anchor('E2', 2, { chainage: 950 })))).toEqual([])
  })
})

describe('in the thickness', () => {
  const stacked = (apart: number, aside = 0) => [
    anchor('E1', 1, { chainage: 300, height: -100 }),
    anchor('E1', 2, { chainage: 300 + aside, height: -100 + apart }),
  ]
  const deep = (anchors: readonly Anchor[]) =>
    closeAnchors(
      layoutIndex(layout({ anchors, edges: [edge(WEST, 'd', [length(0, 17400, { soffit: -480 })])] })),
      'E1',
    ).filter((group) => group.plane === 'thickness')

  test.each([
    // 0.3 * 700 = 210
    { apart: 209.9, count: 1 },
    { apart: 210, count: 0 },
    { apart: 210.1, count: 0 },
  ])('$apart apart in a section 700 deep', ({ apart, count }) => {
    expect(deep(stacked(apart))).toHaveLength(count)
  })

  test.each([
    { aside: 219, count: 1 },
    { aside: 220, count: 0 },
  ])('plates 220 wide, $aside apart along the edge', ({ aside, count }) => {
    expect(deep(stacked(100, aside))).toHaveLength(count)
  })
})
