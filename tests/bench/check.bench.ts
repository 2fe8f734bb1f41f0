import { readLayout, toEngine, type LayoutFile } from '@wedgeline/contract'
import { checkPour, proposeSteel } from '@wedgeline/engine'
import { bench, describe } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { largeLayout } from './large-layout'

/** A copy, for which nothing has been worked out yet. */
const afresh = (file: LayoutFile) => structuredClone(toEngine(file))

const checkAll = (file: LayoutFile, withSteps: boolean): void => {
  const layout = afresh(file)
  for (const { id } of layout.pours) checkPour(layout, { pourId: id, withSteps })
}

const demo = demoLayout()
const thousand = largeLayout(1_000)
const twentyThousand = largeLayout(20_000)

describe('check', () => {
  bench('demo, 104 anchors', () => checkAll(demo, false))
  bench('demo, 104 anchors, with steps', () => checkAll(demo, true))
  bench('1,000 anchors', () => checkAll(thousand, false))
  bench('one pour of 1,000 anchors', () => {
    checkPour(afresh(thousand), { pourId: 'P1' })
  })
})

/** Without its steel, so that every place asks for bars. */
const proposeAll = (file: LayoutFile): void => {
  const layout = { ...toEngine(file), steel: [] }
  for (const { id } of layout.pours) proposeSteel(layout, { pourId: id })
}

describe('propose', () => {
  const once = { iterations: 2, time: 0, warmupIterations: 1, warmupTime: 0 }
  bench('demo, 104 anchors', () => proposeAll(demo), once)
  bench('1,000 anchors', () => proposeAll(thousand), once)
})

describe('read', () => {
  bench('1,000 anchors', () => {
    readLayout(thousand)
  })
  bench('20,000 anchors', () => {
    readLayout(twentyThousand)
  })
})
