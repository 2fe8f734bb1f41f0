import type { SteelShape } from '../model'
import type { Blocked } from './proposal'

/** Steel that may do for a zone. */
export interface Candidate {
  readonly shapes: readonly SteelShape[]
}

/** What can be tried in a zone, and needs for which nothing can be made at all. */
export interface Candidates {
  readonly candidates: readonly Candidate[]
  readonly blocked: readonly Blocked[]
}

export const area = (diameter: number): number => (Math.PI * diameter ** 2) / 4

/** A hair above a whole step is no reason for another one. */
const HAIR = 1e-6
export const upTo = (value: number, step: number): number => Math.ceil(value / step - HAIR) * step
export const downTo = (value: number, step: number): number => Math.floor(value / step + HAIR) * step
