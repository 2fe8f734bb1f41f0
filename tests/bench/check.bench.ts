import { readLayout, toEngine, type LayoutFile } from '@wedgeline/contract'
import { checkPour } from '@wedgeline/engine'
import { bench, describe } from 'vitest'
import { demoLayout } from '../../db/seed/demo-layout'
import { largeLayout } from './large-layout'

const checkAll = (file: LayoutFile, withSteps: boolean): void => {
  const layout = toEngine(file)
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
    checkPour(toEngine(thousand), { pourId: 'P1' })
  })
})

describe('read', () => {
  bench('1,000 anchors', () => {
    readLayout(thousand)
  })
  bench('20,000 anchors', () => {
    readLayout(twentyThousand)
  })
})
