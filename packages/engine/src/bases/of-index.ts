import type { LayoutIndex } from '../layout-index'
import { perConcrete } from '../memo'
import type { Basis } from './basis'
import { basisOf } from './index'

const made = perConcrete(({ layout }: LayoutIndex): Basis => basisOf(layout.job))

/** The basis of a layout's job, made once for all that is tried in it. */
export const basisOfIndex = (index: LayoutIndex): Basis => made(index, '')
