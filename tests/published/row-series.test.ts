import { faceForce, tensionMidway, tensionOnLine } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { evaluated } from '../engine/step-text'

/** The series itself, term by term, with the zero of its stress found by halving. */
function bySum(ratio: number, midway: boolean): { depth: number; share: number } {
  const sum = (term: (n: number, x: number) => number, x: number) =>
    Array.from({ length: 4000 }, (_, i) => i + 1).reduce(
      (total, n) =>
        total +
        ((2 * Math.sin(n * Math.PI * ratio)) / (n * Math.PI * ratio)) *
          term(n, x) *
          Math.exp(-2 * Math.PI * n * x) *
          (midway && n % 2 === 1 ? -1 : 1),
      0,
    )
  const stress = (x: number) => sum((n, at) => -(1 - 2 * Math.PI * n * at), x)
  let [low, high] = [0.01, 0.4]
  for (let i = 0; i < 50; i++) {
    const half = (low + high) / 2
    if (stress(half) > 0 === stress(low) > 0) low = half
    else high = half
  }
  return { depth: low, share: Math.abs(sum((_, x) => x, low)) }
}

describe('Endless row of equal anchors (computed: exact series, finite elements agree within 0.2 %)', () => {
  // From the table computed for the design: plate over spacing; force over P and zero over s, midway and on the line.
  const TABLE = [
    { ratio: 0.1, midway: 0.08799, zeroMidway: 0.20226, line: 0.21166, zeroLine: 0.0733 },
    { ratio: 0.2, midway: 0.08604, zeroMidway: 0.19857, line: 0.16099, zeroLine: 0.10931 },
    { ratio: 0.3, midway: 0.08274, zeroMidway: 0.19232, line: 0.1242, zeroLine: 0.13545 },
  ]

  test.each(TABLE)('plate $ratio of the spacing: midway $midway P, on the line $line P', (row) => {
    expect(tensionMidway(row.ratio).share).toBeCloseTo(row.midway, 4)
    expect(tensionMidway(row.ratio).depthShare).toBeCloseTo(row.zeroMidway, 4)
    expect(tensionOnLine(row.ratio).share).toBeCloseTo(row.line, 4)
    expect(tensionOnLine(row.ratio).depthShare).toBeCloseTo(row.zeroLine, 4)
  })

  test.each([0.1, 0.2, 0.3, 0.5, 0.8])('the closed form is the sum of the series at %s', (ratio) => {
    const [face, line] = [bySum(ratio, true), bySum(ratio, false)]
    expect(tensionMidway(ratio).share).toBeCloseTo(face.share, 6)
    expect(tensionMidway(ratio).depthShare).toBeCloseTo(face.depth, 6)
    expect(tensionOnLine(ratio).share).toBeCloseTo(line.share, 6)
    expect(tensionOnLine(ratio).depthShare).toBeCloseTo(line.depth, 6)
  })

  test('towards a point load: 0.0886 P midway, P / pi on the line', () => {
    expect(tensionMidway(1e-6).share).toBeCloseTo(0.0886, 4)
    expect(tensionOnLine(1e-6).share).toBeCloseTo(1 / Math.PI, 3)
  })

  test('a wider plate never gives more', () => {
    const shares = [0.05, 0.1, 0.2, 0.4, 0.6, 0.8, 0.95].map((ratio) => tensionMidway(ratio).share)
    expect(shares).toEqual([...shares].sort((a, b) => b - a))
  })

  test('the steps hold the table and their text evaluates to them', () => {
    const steps = faceForce({ P: 588_800, a: 175, s: 1750 })
    expect(steps.at(-1)?.value).toBeCloseTo(0.08799 * 588_800, -1)
    for (const line of steps) expect(evaluated(line)).toBeCloseTo(line.value, 6)
  })
})
