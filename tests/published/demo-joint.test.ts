import { toEngine } from '@wedgeline/contract'
import { jointStrips, layoutIndex, type Layout } from '@wedgeline/engine'
import { describe, expect, test } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { EXPECTED_STRIP } from './demo-wedges'

const demo = toEngine(demoLayout())
const withSpread = (wedgeSpread: number): Layout => ({
  ...demo,
  job: { ...demo.job, settings: { ...demo.job.settings, wedgeSpread } },
})

describe('strip without precompression at J1, both sides together (drawn up with the podium)', () => {
  const [usual] = jointStrips(layoutIndex(withSpread(Math.PI / 4)), 'J1')
  const [ofBasis] = jointStrips(layoutIndex(withSpread(Math.atan(2 / 3))), 'J1')

  test('pour P1 is cast first', () => {
    expect(usual?.first.id).toBe('J1-P1')
    expect(usual?.second.id).toBe('J1-P2')
    expect(usual?.lengths).toHaveLength(EXPECTED_STRIP.length)
  })

  test.each(EXPECTED_STRIP.map((row, at) => ({ ...row, at })))('$from to $to: $widths', ({ at, from, to, widths }) => {
    const lengths = [usual?.lengths[at], ofBasis?.lengths[at]]
    expect([lengths[0]?.gap.after?.anchor.id ?? null, lengths[0]?.gap.before?.anchor.id ?? null]).toEqual([from, to])
    const found = lengths.flatMap((length) => [length?.fromBulbs.width ?? NaN, length?.fromBond?.width ?? NaN])
    for (const [i, width] of widths.entries()) expect(Math.abs((found[i] ?? NaN) - width)).toBeLessThanOrEqual(1)
  })
})
