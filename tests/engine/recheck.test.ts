import { isDeepStrictEqual } from 'node:util'
import { checkPour, recheck, type Layout, type PourResult } from '@wedgeline/engine'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { edited, STARTS, type Draw } from './recheck-edits'

const share = fc.double({ min: 0, max: 0.999_999, noNaN: true })
const draws = fc.array(fc.tuple(share, share, share), { minLength: 8, maxLength: 8 })

/** Each result of the chain, whole, as against one of a copy of the layout that shares nothing with it. */
function differences(start: Layout, pourId: string, chain: readonly Draw[]): string[] {
  let layout = start
  let result = checkPour(layout, { pourId, withSteps: true })
  return chain.flatMap((draw) => {
    const after = edited(layout, draw)
    const again = recheck({ layout, result }, after, { pourId, withSteps: true })
    const afresh = checkPour(structuredClone(after), { pourId, withSteps: true })
    layout = after
    result = again
    return differing(again, afresh).map((zone) => `${draw.join(' ')}: ${zone}`)
  })
}

function differing(one: PourResult, other: PourResult): string[] {
  const zones = new Map(one.zones.map((result) => [result.zone.id, result]))
  const found = other.zones.filter((result) => !isDeepStrictEqual(zones.get(result.zone.id), result))
  const isWhole = isDeepStrictEqual(one, other)
  return isWhole || found.length > 0 ? found.map(({ zone }) => zone.name) : ['order or counts']
}

describe.each(STARTS)('After random edits of $name', ({ of }) => {
  test('checking again gives what checking afresh gives', { timeout: 600_000 }, () => {
    const start = of()
    const pours = start.pours.map(({ id }) => id)
    fc.assert(
      fc.property(fc.constantFrom(...pours), draws, (pourId, chain) => {
        expect(differences(start, pourId, chain)).toEqual([])
      }),
      { seed: 16, numRuns: 5 },
    )
  })
})
