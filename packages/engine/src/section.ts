/** Top, soffit and cover of the concrete at a place in plan. */

import type { AnchorFrame } from './frame'
import { isInside } from './geometry'
import type { Point, Pour, Region } from './model'

export interface Section {
  readonly top: number
  readonly soffit: number
  readonly coverTop: number
  readonly coverSoffit: number
  readonly coverEdge: number
  /** Links that lie in the cover's shadow, outside other bars; 0 without. */
  readonly linkDiameter: number
}

/** The region of a pour at a place; where regions overlap the deepest, null where there is none. */
export function regionAt(pour: Pour, point: Point): Region | null {
  const here = pour.regions.filter((region) => isInside(point, region.outline))
  return here.sort((a, b) => b.top - b.soffit - (a.top - a.soffit))[0] ?? null
}

/**
 * The section behind an edge or a pan's bearing face, at a chainage and a depth into the slab.
 *
 * A region gives its own top, soffit and cover. Behind a region the slab's thickness counts; where the edge has no
 * region nothing says that its section changes further in, so the edge's own top and soffit count throughout.
 */
export function sectionBehind(
  pour: Pour,
  { frame, chainage, depth }: { readonly frame: AnchorFrame; readonly chainage: number; readonly depth: number },
): Section {
  const region = regionAt(pour, frame.pointAt(chainage, depth))
  if (region) return regionSection(region)
  const isBehindRegion = regionAt(pour, frame.pointAt(chainage, 0)) !== null
  return {
    top: isBehindRegion ? pour.thickness : frame.topAt(chainage),
    soffit: isBehindRegion ? 0 : frame.soffitAt(chainage),
    coverTop: pour.coverTop,
    coverSoffit: pour.coverSoffit,
    coverEdge: pour.coverEdge,
    linkDiameter: 0,
  }
}

/** The section at a place that belongs to no edge: its region's, or the slab's. */
export function sectionAt(pour: Pour, point: Point): Section {
  const region = regionAt(pour, point)
  if (region) return regionSection(region)
  const { thickness: top, coverTop, coverSoffit, coverEdge } = pour
  return { top, soffit: 0, coverTop, coverSoffit, coverEdge, linkDiameter: 0 }
}

function regionSection({ top, soffit, cover, linkDiameter }: Region): Section {
  return { top, soffit, coverTop: cover, coverSoffit: cover, coverEdge: cover, linkDiameter }
}
