/** Bars as they are entered, in mm: their shapes, and the zone that a set of them belongs to. */

/** A spiral behind a plate. Distances run from the bearing face. */
export interface SpiralShape {
  readonly kind: 'spiral'
  readonly diameter: number
  readonly outside: number
  readonly pitch: number
  /** Turns in all, flat end turns included. */
  readonly turns: number
  readonly flatTurns: number
  readonly first: number
}

/** Closed links standing square to the tendon behind a plate. */
export interface LinksShape {
  readonly kind: 'links'
  readonly diameter: number
  /** Outside, along the edge. */
  readonly width: number
  /** Outside, through the thickness. */
  readonly height: number
  readonly hook: number
  readonly count: number
  readonly first: number
  readonly pitch: number
}

/** U-bars: the bend across, two legs running into the slab. */
export interface HairpinShape {
  readonly kind: 'hairpins'
  readonly diameter: number
  readonly leg: number
  /** Outside length of the bend. */
  readonly bend: number
  readonly count: number
  /** Upright: the bend runs through the thickness. Flat: it lies in plan, along the edge. */
  readonly lies: 'upright' | 'flat'
  /** From the bearing face to the bend, positive into the slab. */
  readonly first: number
  /** Between hairpins along the edge (upright) or in height (flat). */
  readonly pitch: number
}

/** Straight bars along a length of edge, near top and soffit. */
export interface EdgeBarsShape {
  readonly kind: 'edge-bars'
  readonly diameter: number
  readonly countTop: number
  readonly countBottom: number
  /** From the slab edge to the first bar's centre, and between bars. */
  readonly first: number
  readonly pitch: number
  /** Chainage of the two ends. */
  readonly from: number
  readonly to: number
}

/** Straight bars parallel to the edge, spread over the plan window behind an anchor. */
export interface TransverseBarsShape {
  readonly kind: 'transverse-bars'
  readonly diameter: number
  readonly length: number
  /** Positions counted into the slab; at each a bar in every layer. */
  readonly count: number
  readonly layers: 'top' | 'bottom' | 'both'
  readonly first: number
  readonly pitch: number
}

/** Straight bars square to the edge across a gap. */
export interface WedgeBarsShape {
  readonly kind: 'wedge-bars'
  readonly diameter: number
  readonly length: number
  readonly count: number
  readonly layers: 'top' | 'bottom' | 'both'
}

/**
 * Straight bars round a pan or across a joint.
 *
 * Round a pan `along` is parallel to the jack's axis: tie-back and lap bars lie symmetrical about the tendon at
 * `pitch`, their middle at the bearing face; trimmers lie half on each side of the recess, from its sides outwards at
 * `pitch`; diagonals lie `count` at each corner at 45 degrees. At a joint bars run square to it, spread at `pitch`
 * about its middle. `count` is per layer.
 */
export interface PlacedBarsShape {
  readonly kind: 'trimmers' | 'diagonals' | 'tie-back-bars' | 'lap-bars'
  readonly diameter: number
  readonly length: number
  readonly count: number
  readonly layers: 'top' | 'bottom' | 'both'
  readonly runs: 'along' | 'across'
  readonly pitch: number
}

export type SteelShape =
  SpiralShape | LinksShape | HairpinShape | EdgeBarsShape | TransverseBarsShape | WedgeBarsShape | PlacedBarsShape
export type SteelKind = SteelShape['kind']

/** Where a set of bars belongs. A gap names the anchors beside it; null is the end of the edge. */
export type SteelZone =
  | { readonly kind: 'anchor'; readonly anchorId: string }
  | {
      readonly kind: 'gap'
      readonly edgeId: string
      readonly afterAnchorId: string | null
      readonly beforeAnchorId: string | null
    }
  | { readonly kind: 'edge'; readonly edgeId: string }
  | { readonly kind: 'pan'; readonly panId: string }
  | { readonly kind: 'joint'; readonly jointId: string }

export interface Steel {
  readonly id: string
  readonly pourId: string
  readonly zone: SteelZone
  readonly shape: SteelShape
  readonly source: 'by-hand' | 'proposed' | 'hardware'
  readonly isLocked: boolean
}
