/** A bar as a line in space, and the few things that every kind of bar is drawn from. */

import type { LocalPoint } from '../frame'
import type { SteelKind } from '../model'

export type Face = 'top' | 'bottom'

export interface PlacedBar {
  /** Null for steel that comes with the hardware and has not been entered. */
  readonly steelId: string | null
  /** The zone that the bar belongs to, as in `Zone`. */
  readonly zoneId: string
  readonly anchorId: string | null
  readonly kind: SteelKind
  readonly diameter: number
  /** Centre line. Bends are drawn square; `roundedPath` gives them their radius. */
  readonly path: readonly LocalPoint[]
  /** The last point joins the first. */
  readonly isClosed: boolean
  /** The turns of a spiral, by distance from the bearing face along the tendon; empty for other bars. */
  readonly turns: readonly SpiralTurn[]
  /** The face that a straight bar lies against; null for bent bars. */
  readonly layer: Face | null
}

export interface SpiralTurn {
  /** Middle of the turn, mm behind the bearing face. */
  readonly behind: number
  /** A flat end turn, which closes the spiral and is not counted. */
  readonly isFlat: boolean
}

export type Drawn = Pick<PlacedBar, 'path'> & Partial<Pick<PlacedBar, 'isClosed' | 'turns' | 'layer'>>

export function evenly(count: number, first: number, pitch: number): number[] {
  return Array.from({ length: count }, (_, i) => first + i * pitch)
}

/** Evenly on both sides of a middle. */
export const about = (middle: number, count: number, pitch: number): number[] =>
  evenly(count, middle - ((count - 1) * pitch) / 2, pitch)
