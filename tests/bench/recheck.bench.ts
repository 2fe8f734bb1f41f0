import { toEngine } from '@wedgeline/contract'
import { checkPour, recheck, type Anchor, type Layout } from '@wedgeline/engine'
import { bench, describe } from 'vitest'
import { onePour } from './one-pour'

/** One edit after another in one pour, each on what the last one left. */
function editing(anchors: number, change: (one: Anchor, turn: number) => Anchor): () => void {
  const ask = { pourId: 'P1', withSteps: true }
  let layout = toEngine(onePour(anchors))
  let result = checkPour(layout, ask)
  let turn = 0
  return () => {
    turn += 1
    const at = (turn * 137) % anchors
    const after: Layout = { ...layout, anchors: layout.anchors.map((one, i) => (i === at ? change(one, turn) : one)) }
    result = recheck({ layout, result }, after, ask)
    layout = after
  }
}

describe('one edit in a pour of 1,000 anchors', () => {
  bench(
    'an anchor raised',
    editing(1000, (one) => ({ ...one, height: one.height === 110 ? 105 : 110 })),
  )
  bench(
    'an anchor moved along its edge',
    editing(1000, (one, turn) => ({ ...one, chainage: one.chainage + (turn % 2 === 0 ? 20 : -20) })),
  )
})
