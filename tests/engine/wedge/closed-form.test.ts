import { describe, expect, test } from 'vitest'
import {
  edgeWedge,
  gapsOfEdge,
  layoutIndex,
  USUAL_SPREAD,
  type Anchor,
  type EdgeWedge,
} from '../../../packages/engine/src'
import { anchor, B7, D4, deadEnd, inPan, layout, pan, S4, SOUTH, edge, length, type Parts } from '../sample-layout'
import { evaluated } from '../step-text'

/** EN 1992-1-1 8.10.3(5), from memory: tan(beta) = 2/3. */
const EN = Math.atan(2 / 3)

function wedges(edgeId: string, parts: Parts, angle: number = USUAL_SPREAD): (EdgeWedge | null)[] {
  const index = layoutIndex(layout(parts))
  const frame = index.frames.get(edgeId)
  if (!frame) throw new Error(`no edge ${edgeId}`)
  return gapsOfEdge(index, edgeId).map((gap) => edgeWedge(frame, gap, { angle, startsAt: 'bearing-face' }))
}

function wedgeAt(gap: number, anchors: readonly Anchor[], angle?: number): EdgeWedge {
  const wedge = wedges('E2', { anchors }, angle)[gap]
  if (!wedge) throw new Error('no wedge')
  return wedge
}

describe('closed form between two plates with set-back 0 (checks-scheduling Z05, derived)', () => {
  const pair = [anchor('E2', 1, { chainage: 5000, setBack: 0 }), anchor('E2', 2, { chainage: 6750, setBack: 0 })]

  test('1750 apart, plates 220', () => {
    // (1750 - 220) / (2 tan 45) = 765; with tan 2/3: 1530 / (4/3) = 1147.5
    expect(wedgeAt(1, pair).depth).toBeCloseTo(765, 9)
    expect(wedgeAt(1, pair, EN).depth).toBeCloseTo(1147.5, 9)
  })

  test('its area is a triangle on the clear distance between the plates', () => {
    // 1530 * 1147.5 / 2 = 877 837.5 mm2
    expect(wedgeAt(1, pair, EN).area).toBeCloseTo(877_837.5, 3)
  })

  test('its printed line evaluates to its depth', () => {
    for (const line of wedgeAt(1, pair, EN).steps) {
      expect(evaluated(line)).toBeCloseTo(line.value, 9)
      expect(line.value).toBeCloseTo(1147.5, 9)
    }
    expect(wedgeAt(1, pair, EN).steps).toHaveLength(1)
  })
})

describe('a live plate beside a bonded dead end: 220 at 110 and 300 at 300, lpt2 1228', () => {
  const pair = [anchor('E2', 1, { chainage: 900 }), deadEnd('E2', 2, { chainage: 2650 })]

  test('45 deg: clear 1490 on both set-backs, halved', () => {
    // bulb (1490 + 110 + 300) / 2 = 950; bond (1490 + 110 + 1528) / 2 = 1564
    const wedge = wedgeAt(1, pair)
    expect(wedge.depthFromBulbs).toBeCloseTo(950, 9)
    expect(wedge.depthFromBond).toBeCloseTo(1564, 9)
    expect(wedge.depth).toBe(wedge.depthFromBond)
  })

  test('EN: clear 1490 over 4/3, set-backs in the middle', () => {
    // bulb 1490 * 0.75 + (110 + 300) / 2 = 1322.5; bond 1117.5 + (110 + 1528) / 2 = 1936.5
    const wedge = wedgeAt(1, pair, EN)
    expect(wedge.depthFromBulbs).toBeCloseTo(1322.5, 9)
    expect(wedge.depthFromBond).toBeCloseTo(1936.5, 9)
  })

  test('apex and area', () => {
    // From the live plate's edge at 900 + 110: apex at 1010 + (1564 - 110) = 2464, before the dead end's splay at 2500.
    // Area: 110 * (110 + 1454) + 1454^2 / 2 on the live side, 1528 * (150 + 36) + 36^2 / 2 on the dead one.
    const wedge = wedgeAt(1, pair)
    expect(wedge.apex.chainage).toBeCloseTo(2464, 6)
    expect(wedge.area).toBeCloseTo(110 * 1564 + 1454 ** 2 / 2 + 1528 * 186 + 36 ** 2 / 2, 3)
  })

  test('the end of the edge: set-back and the clear distance from the plate', () => {
    // 110 + (900 - 110) = 900; EN 110 + 790 * 1.5 = 1295; area 45: 900 * 110 + 790^2 / 2 = 411 050
    expect(wedgeAt(0, pair).depth).toBeCloseTo(900, 9)
    expect(wedgeAt(0, pair, EN).depth).toBeCloseTo(1295, 9)
    expect(wedgeAt(0, pair).area).toBeCloseTo(411_050, 3)
    expect(wedgeAt(0, pair).apex.chainage).toBe(0)
    expect(wedgeAt(0, pair).depthFromBond).toBeNull()
  })
})

test.each([
  // 110 + (s - 220) / 2 and 110 + (s - 220) * 0.75
  { spacing: 700, usual: 350, en: 470 },
  { spacing: 1000, usual: 500, en: 695 },
  { spacing: 220, usual: 110, en: 110 },
])('two live plates $spacing apart', ({ spacing, usual, en }) => {
  const pair = [anchor('E2', 1, { chainage: 5000 }), anchor('E2', 2, { chainage: 5000 + spacing })]
  expect(wedgeAt(1, pair).depth).toBeCloseTo(usual, 9)
  expect(wedgeAt(1, pair, EN).depth).toBeCloseTo(en, 9)
})

test('plates that overlap leave the strip before the bearing faces', () => {
  const pair = [anchor('E2', 1, { chainage: 5000 }), anchor('E2', 2, { chainage: 5150 })]
  // 110 deep over 150
  expect(wedgeAt(1, pair).depth).toBe(110)
  expect(wedgeAt(1, pair).area).toBeCloseTo(110 * 150, 6)
})

test('beside a pan that stops short the spread of the edge anchor reaches the pan line first', () => {
  // Dead end at 4400, pan line at 6150, its face 3400 in: 300 + (1750 - 150) = 1900; EN 300 + 1600 * 1.5 = 2700.
  const parts = {
    anchors: [deadEnd('E4', 3, { chainage: 4400 }), inPan('PN01')],
    pans: [pan('PN01', { x: 6150, y: 14000 })],
  }
  expect(wedges('E4', parts)[1]?.depthFromBulbs).toBeCloseTo(1900, 9)
  expect(wedges('E4', parts, EN)[1]?.depthFromBulbs).toBeCloseTo(2700, 9)
})

test('an edge that no tendon points at has no wedge of this form', () => {
  expect(wedges('E2', {})).toEqual([null])
})

test('a skewed tendon opens its spread on the side that it leans to', () => {
  // South edge, chainage to the right: positive skew leans right, so the gap on the right closes sooner.
  const skewed = (skew: number) => [anchor('E2', 1, { chainage: 5000, skew }), anchor('E2', 2, { chainage: 6750 })]
  // Its plate's side stands 110 cos along and, turned with the tendon, 110 sin nearer to the edge.
  const t = Math.tan(Math.PI / 4 + 0.05)
  const clear = 1750 - 110 * Math.cos(0.05) - 110
  const start = 110 - 110 * Math.sin(0.05)
  expect(wedgeAt(1, skewed(0.05)).depth).toBeCloseTo((clear + start * t + 110) / (t + 1), 9)
  expect(wedgeAt(1, skewed(0.05)).depth).toBeLessThan(wedgeAt(1, skewed(0)).depth)
  expect(wedgeAt(1, skewed(-0.05)).depth).toBeGreaterThan(wedgeAt(1, skewed(0)).depth)
})

test('a skewed anchor before the end of its edge: 3 deg away from it, plate 220 at 110', () => {
  // Plate side 110 cos 3 = 109.85 along and 110 + 110 sin 3 = 115.76 in; 2050 to the end:
  // 115.76 + (2050 - 109.85) / tan 42 = 115.76 + 1940.15 / 0.90040 = 2270.5
  const anchors = [anchor('E2', 1, { chainage: 19200 - 2050, skew: (-3 * Math.PI) / 180 })]
  expect(wedgeAt(1, anchors).depth).toBeCloseTo(2270.5, 1)
})

test('a lean beyond the spread leaves no closed form', () => {
  expect(wedges('E2', { anchors: [anchor('E2', 1, { chainage: 5000, skew: -0.8 })] })[1]).toBeNull()
})

test('an edge line that runs the other way gives the mirrored wedge', () => {
  const pair = [anchor('E2', 1, { chainage: 900 }), deadEnd('E2', 2, { chainage: 2650 })]
  const westward = { ...SOUTH, x: 19200, azimuth: 1.5 * Math.PI }
  const mirrored = wedges('E2', {
    edgeLines: [westward],
    edges: [edge(westward, 'a', [length(0, 19200)])],
    anchors: pair.map((one) => ({ ...one, chainage: 19200 - one.chainage })),
  })[1]
  expect(mirrored?.depth).toBeCloseTo(1564, 9)
  expect(mirrored?.apex.chainage).toBeCloseTo(19200 - 2464, 6)
  expect(mirrored?.area).toBeCloseTo(wedgeAt(1, pair).area, 3)
})

test('the spread may start at the end of the device', () => {
  const index = layoutIndex(
    layout({
      hardware: [{ ...S4, deviceLength: 60 }],
      anchors: [anchor('E2', 1, { chainage: 5000 }), anchor('E2', 2, { chainage: 5700 })],
    }),
  )
  const frame = index.frames.get('E2')
  const gap = gapsOfEdge(index, 'E2')[1]
  if (!frame || !gap) throw new Error('no gap')
  // 110 + 60 + (700 - 220) / 2 = 410
  expect(edgeWedge(frame, gap, { angle: USUAL_SPREAD, startsAt: 'device-end' })?.depth).toBeCloseTo(410, 9)
})

test('lengths x k make depths x k and areas x k2', () => {
  const k = 2.5
  const big = (hardware: typeof S4) => ({
    ...hardware,
    plate: { width: hardware.plate.width * k, height: hardware.plate.height * k },
    transmissionLength: hardware.transmissionLength && hardware.transmissionLength * k,
  })
  const pair = [anchor('E2', 1, { chainage: 900 }), deadEnd('E2', 2, { chainage: 2650 })]
  const scaled = wedges('E2', {
    hardware: [big(S4), big(D4), B7],
    anchors: pair.map((one) => ({ ...one, chainage: one.chainage * k, setBack: one.setBack * k })),
  })[1]
  expect(scaled?.depth).toBeCloseTo(1564 * k, 6)
  expect(scaled?.area).toBeCloseTo(wedgeAt(1, pair).area * k ** 2, 2)
})
