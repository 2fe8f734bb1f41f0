/** How high bars lie in their section: what a basis judges their bond by. */

import type { BondPlace } from '../bases/basis'
import type { SteelShape } from '../model'

export type Layers = 'top' | 'bottom' | 'both'

/** Depth of a section with its covers, mm. */
export interface Covered {
  readonly depth: number
  readonly coverTop: number
  readonly coverSoffit: number
}

/**
 * Straight bars against the cover of their face; where they lie in both, those at the top, which are never better off.
 * Links and mats would move top bars down, to better bond, and are left out.
 */
export function bondPlace(
  { depth, coverTop, coverSoffit }: Covered,
  { layers, diameter }: { readonly layers: Layers; readonly diameter: number },
): BondPlace {
  const fromSoffit = layers === 'bottom' ? coverSoffit + diameter / 2 : depth - coverTop - diameter / 2
  return { depth, fromSoffit }
}

/** The same for a set of any kind; of bent bars no height is known here. */
export function bondPlaceOf(covered: Covered, shape: SteelShape): BondPlace {
  const { diameter } = shape
  if (shape.kind === 'edge-bars') return bondPlace(covered, { layers: shape.countTop > 0 ? 'top' : 'bottom', diameter })
  if ('layers' in shape) return bondPlace(covered, { layers: shape.layers, diameter })
  return { depth: covered.depth, fromSoffit: null }
}
