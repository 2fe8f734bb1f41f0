import { checkPour, forceProfile, layoutIndex, type Anchor, type ForceProfile, type Layout } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { anchor, layout, SETTINGS } from '../engine/sample-layout'
import { allPairs, oneTendon } from '../engine/tendon-layout'

/** Worked by hand, W19 to W25: friction, elongation, draw-in (EN 1992-1-1 5.10.5, from memory; derived) and P/A. */

function lineOf(of: Layout): ForceProfile['nominal'] {
  const profile = forceProfile(layoutIndex(of), 'T')
  if ('code' in profile) throw new Error(profile.message)
  return profile.nominal
}
const first = (of: Layout) => lineOf(of).points[0]
const last = (of: Layout) => lineOf(of).points.at(-1)

/** 4 x 150 mm2, 860 kN: EA = 195 000 x 600 = 117.0e6 N. */
const TWO_ENDS = {
  settings: allPairs(0.2, 0.01e-3),
  tendon: { length: 40_000, drape: 0.4, strands: 4, jackingRatio: 1 },
  strand: { area: 150, breakingLoad: 215_000, modulus: 195_000 },
  drawIn: 0,
}
const STRESSED_AT_BOTH = {
  ...TWO_ENDS,
  tendon: { ...TWO_ENDS.tendon, stressedFrom: 'both-ends' as const },
  far: { end: 'live' as const },
}

describe('40 m, 0.4 rad, mu 0.2, k 0.01 /m inside mu, 860 kN', () => {
  // Whole tendon u = 0.2 x (0.4 + 0.01 x 40) = 0.16; half of it 0.08.
  test('W19: from one end 732.8 kN are left, elongation 271.7 mm', () => {
    // 860 x e^-0.16 = 860 x 0.852144 = 732.84 kN.
    // 860 000 x (1 - 0.852144) / 0.16 x 40 000 / 117.0e6 = 860 000 x 0.924101 x 3.418803e-4 = 271.70 mm.
    expect((last(oneTendon(TWO_ENDS))?.jacked ?? 0) / 1000).toBeCloseTo(732.84, 2)
    expect(lineOf(oneTendon(TWO_ENDS)).elongation).toBeCloseTo(271.7, 1)
  })

  test('W20: from both ends 793.9 kN at the middle, elongation 282.6 mm over both ends', () => {
    // Middle: 860 x e^-0.08 = 793.88 kN.
    // 860 000 x (1 - 0.923116) / 0.08 x 40 000 / 117.0e6 = 860 000 x 0.961046 x 3.418803e-4 = 282.56 mm.
    const { points, elongation } = lineOf(oneTendon(STRESSED_AT_BOTH))
    const middle = points.find(({ at }) => Math.abs(at - 20_000) < 1)
    expect((middle?.jacked ?? 0) / 1000).toBeCloseTo(793.88, 2)
    expect(elongation).toBeCloseTo(282.56, 1)
    expect(points.at(-1)?.jacked).toBeCloseTo(860_000, 3)
  })
})

describe('Draw-in of 6 mm, 4 x 98.7 mm2, EA = 195 000 x 394.8 = 76.986e6 N, 588.8 kN', () => {
  // w E A = 6 x 76.986e6 = 461.916e6 N mm.
  test('W21: 50 m, 0.6 rad, mu 0.2, 0.002 /m beside mu: felt over 13.76 m, 521.6 kN after lock-off', () => {
    // u = 0.2 x 0.6 + 0.002 x 50 = 0.22; lambda = 4.4e-6 /mm.
    // (1 - e^-(lambda l))^2 = 461.916e6 x 4.4e-6 / 588 800 = 0.00345182, root 0.0587522.
    // l = -ln(1 - 0.0587522) / 4.4e-6 = 0.0605488 / 4.4e-6 = 13 761 mm; P = 588.8 x 0.9412478^2 = 521.65 kN.
    const of = oneTendon({
      settings: { ...allPairs(0.2, 0.002e-3), frictionFamily: 'outside' },
      tendon: { length: 50_000, drape: 0.6 },
      drawIn: 6,
    })
    expect(lineOf(of).points.some(({ at }) => Math.abs(at - 13_761) < 1)).toBe(true)
    expect((first(of)?.locked ?? 0) / 1000).toBeCloseTo(521.65, 2)
    // Beyond it nothing changes: 588.8 x e^-0.22 = 472.52 kN before and after.
    expect((last(of)?.jacked ?? 0) / 1000).toBeCloseTo(472.52, 2)
    expect((last(of)?.locked ?? 0) / 1000).toBeCloseTo(472.52, 2)
  })

  test('W22: 10 m, 0.1 rad, mu 0.15, k 0.005 /m inside mu: longer than the tendon, 530.0 kN and 542.1 kN at the far end', () => {
    /*
     * u = 0.15 x (0.1 + 0.005 x 10) = 0.0225; lambda = 2.25e-6 /mm. Root of 461.916e6 x 2.25e-6 / 588 800 = 0.042013
     * is more than 1 - e^-0.0225 = 0.022249: the whole tendon slips. After it C e^(lambda x) with
     * (P0 (1 - e^-u) - C (e^u - 1)) / lambda = w E A:
     * C = (588 800 x 0.0222488 - 461.916e6 x 2.25e-6) / 0.0227550 = (13 100.1 - 1039.3) / 0.0227550 = 530 026 N,
     * and C e^0.0225 = 542 087 N at the far end, where 588.8 x e^-0.0225 = 575.70 kN stood while it was jacked.
     */
    const of = oneTendon({ settings: allPairs(0.15, 0.005e-3), tendon: { length: 10_000, drape: 0.1 }, drawIn: 6 })
    expect((first(of)?.locked ?? 0) / 1000).toBeCloseTo(530.03, 2)
    expect((last(of)?.locked ?? 0) / 1000).toBeCloseTo(542.09, 2)
    expect((last(of)?.jacked ?? 0) / 1000).toBeCloseTo(575.7, 2)
  })

  test('W23: without friction 12 m lose 6 mm evenly: 550.3 kN from end to end', () => {
    // 6 x 195 000 / 12 000 = 97.5 MPa; x 394.8 = 38.493 kN; 588.8 - 38.493 = 550.307 kN.
    const of = oneTendon({ settings: allPairs(0, 0), tendon: { length: 12_000, drape: 0.2 }, drawIn: 6 })
    expect((first(of)?.locked ?? 0) / 1000).toBeCloseTo(550.307, 3)
    expect((last(of)?.locked ?? 0) / 1000).toBeCloseTo(550.307, 3)
  })
})

describe('Precompression behind an edge of 19.2 m, P/A', () => {
  const across = (places: readonly number[], thickness: number): Layout => {
    const anchors = places.flatMap((chainage, i): Anchor[] => [
      anchor('E4', i + 1, { tendonId: `T${i}`, chainage }),
      anchor('E2', i + 1, { tendonId: `T${i}`, chainage, end: 'dead' }),
    ])
    const given = layout({ anchors, pour: { thickness } })
    return {
      ...given,
      job: { ...given.job, settings: { ...SETTINGS, ...allPairs(0, 0) } },
      hardware: given.hardware.map((one) => ({ ...one, drawIn: 0 })),
      edges: given.edges.map((edge) => ({
        ...edge,
        lengths: edge.lengths.map((one) => ({ ...one, top: thickness })),
      })),
      tendons: given.tendons
        .filter(({ id }, i, all) => all.findIndex((one) => one.id === id) === i)
        .map((tendon) => ({ ...tendon, length: 17_180, drape: 0 })),
    }
  }
  const average = (of: Layout): number | undefined => {
    const zone = checkPour(of, { pourId: 'P1' }).zones.find((one) => one.zone.id === 'strip:E4')
    const advice = zone?.checks.find(({ family, kind }) => family === 'precompression' && kind === 'advice')
    return advice?.kind === 'advice' ? advice.measured : undefined
  }

  test('W24: six tendons in 220: 6 x 588 800 / (19 200 x 220) = 0.836 MPa', () => {
    // 3 532 800 / 4 224 000 = 0.8364.
    expect(average(across([1600, 4800, 8000, 11_200, 14_400, 17_600], 220))).toBeCloseTo(0.8364, 4)
  })

  test('W25: twelve tendons in 250: 12 x 588 800 / (19 200 x 250) = 1.472 MPa', () => {
    // 7 065 600 / 4 800 000 = 1.472.
    const places = Array.from({ length: 12 }, (_, at) => 800 + 1600 * at)
    expect(average(across(places, 250))).toBeCloseTo(1.472, 4)
  })
})
