import type { SteelShape } from '../model'

/** Steel that may do for a zone. */
export interface Candidate {
  readonly shapes: readonly SteelShape[]
}

export const area = (diameter: number): number => (Math.PI * diameter ** 2) / 4

/** A hair above a whole step is no reason for another one. */
const HAIR = 1e-6
export const upTo = (value: number, step: number): number => Math.ceil(value / step - HAIR) * step
export const downTo = (value: number, step: number): number => Math.floor(value / step + HAIR) * step
