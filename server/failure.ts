import type { Conflict } from '@wedgeline/contract'

export type FailureKind = 'missing' | 'forbidden' | 'conflict' | 'refused' | 'throttled'

export interface FieldProblem {
  readonly field: string
  /** What is wrong and what would be right. */
  readonly message: string
}

export interface FailureDetails {
  /** The field of the input that is meant, as the form names it. */
  readonly field?: string
  /** Everything that is wrong with a file, field by field, in the words of whoever fills it in. */
  readonly problems?: readonly FieldProblem[]
  /** Both values of every field that the sender and somebody else changed. */
  readonly conflicts?: readonly Conflict[]
  /** Today's version of each unit that was touched. */
  readonly versions?: Readonly<Record<string, number>>
  readonly retryAfterS?: number
}

/**
 * A record that is missing, forbidden or in conflict. The message is a sentence for the person who asked; stores and
 * routers throw it and the builders in trpc/ and the routes in http/ turn it into an answer. Anything else that is
 * thrown counts as an impossible state.
 */
export class Failure extends Error {
  override readonly name = 'Failure'
  constructor(
    readonly kind: FailureKind,
    message: string,
    readonly details: FailureDetails = {},
  ) {
    super(message)
  }
}

export const missing = (sentence: string) => new Failure('missing', sentence)
export const forbidden = (sentence: string) => new Failure('forbidden', sentence)
export const conflict = (sentence: string, details: FailureDetails = {}) => new Failure('conflict', sentence, details)
/** Input of the right shape that cannot be taken; `field` says which. */
export const refused = (sentence: string, field: string) => new Failure('refused', sentence, { field })
export const throttled = (sentence: string, retryAfterS: number) => new Failure('throttled', sentence, { retryAfterS })
