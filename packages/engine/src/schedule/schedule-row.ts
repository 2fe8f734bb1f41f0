import type { Step } from '../step'
import type { TypeLetter } from './bar-key'
import type { Dimensions, ShapeProblem } from './bar-standards'
import type { Member } from './bars'

/** One line of a schedule: a mark in one member with one number in each; mm and kg. */
export interface ScheduleRow {
  /** Null for a cancelled mark, whose bars are no longer in the pour. */
  readonly member: Member | null
  readonly markNumber: number
  /** The pour's prefix and two digits or more, with leading zeros. */
  readonly mark: string
  readonly key: string
  readonly letter: TypeLetter
  readonly diameter: number
  readonly typeAndSize: string
  readonly members: number
  readonly inEach: number
  readonly total: number
  /** Length of each bar; null where the shape has an error. */
  readonly length: number | null
  readonly code: string
  readonly dimensions: Dimensions
  /** Letter of the issue in which the row last changed; empty before the first issue. */
  readonly revision: string
  readonly massEach: number | null
  /** Cut length as printed: formula, then rounded up. */
  readonly steps: readonly Step[]
  readonly notes: readonly string[]
  /** Names of the zones that hold these bars. */
  readonly zones: readonly string[]
  /** The delivery that its member belongs to; null where none names it. */
  readonly deliveryId: string | null
}

export interface ScheduleProblem extends ShapeProblem {
  /** Null where the steel has no mark. */
  readonly mark: string | null
  readonly where: string
}
