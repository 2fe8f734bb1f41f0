import type { Family, Step } from '@wedgeline/engine'
import type { Path } from '@/components/ui/follow'
import { methodId } from './method'

/** Where a line of a calculation stands in the list of methods. */
export const pathOfMethod = (step: Pick<Step, 'symbol' | 'formula'>): Path => `/methods?method=${methodId(step)}`

/** The methods of one family of checks. */
export const pathOfFamily = (family: Family): Path => `/methods?family=${family}`
