import { toEngine } from '@wedgeline/contract'
import { checkPour, recheck, type Checked, type Layout } from '@wedgeline/engine'
import { bench, describe } from 'vitest'
import { onePour } from './one-pour'

const ask = { pourId: 'P1', withSteps: true }
const file = onePour(1_000)

/** The anchor at a place of the list moved along its edge, every other row as it was. */
const moved = (layout: Layout, at: number, by: number): Layout => ({
  ...layout,
  anchors: layout.anchors.map((anchor, i) => (i === at ? { ...anchor, chainage: anchor.chainage + by } : anchor)),
})

describe('one pour of 1,000 anchors', () => {
  let before: Checked | null = null
  let edits = 0

  bench(
    'all checks',
    () => {
      checkPour(structuredClone(toEngine(file)), ask)
    },
    { iterations: 2, time: 0, warmupIterations: 1, warmupTime: 0 },
  )

  bench(
    'one anchor moved, what that reaches checked again',
    () => {
      const from = before ?? checked(toEngine(file))
      edits += 1
      // Each time another anchor, well apart from the one before.
      const layout = moved(from.layout, (edits * 137) % 1_000, edits % 2 === 0 ? 20 : -20)
      before = { layout, result: recheck(from, layout, ask) }
    },
    { iterations: 30, time: 0, warmupIterations: 3, warmupTime: 0 },
  )
})

const checked = (layout: Layout): Checked => ({ layout, result: checkPour(layout, ask) })
