/** Plate and pocket of an anchor as boxes in its edge's own coordinates. */

import type { Anchor, Hardware } from './model'

/** Ranges in mm: chainage along the edge line, depth into the slab, height above the pour's soffit datum. */
export interface Box {
  readonly fromChainage: number
  readonly toChainage: number
  readonly fromDepth: number
  readonly toDepth: number
  readonly fromHeight: number
  readonly toHeight: number
}

/**
 * The plate's bearing face, or the face of a bonded dead end's splay at its bulbs.
 *
 * Square to the edge: the few millimetres by which skew and elevation turn the plate are not applied.
 */
export function plateBox(anchor: Anchor, hardware: Hardware): Box {
  return faceBox(anchor, hardware.plate, anchor.setBack)
}

/** The pocket, from the slab edge in to the bearing face; null where the hardware has none. Square to the edge. */
export function pocketBox(anchor: Anchor, hardware: Hardware): Box | null {
  return hardware.pocket && faceBox(anchor, hardware.pocket, 0)
}

/**
 * Clear distance in mm between two boxes as seen on the face of the edge: negative by how far they overlap.
 *
 * Depth is left out: a tendon behind one plate runs through whatever stands deeper in the same place of the face.
 */
export function faceClearance(a: Box, b: Box): number {
  const along = Math.max(a.fromChainage - b.toChainage, b.fromChainage - a.toChainage)
  const up = Math.max(a.fromHeight - b.toHeight, b.fromHeight - a.toHeight)
  return along > 0 && up > 0 ? Math.hypot(along, up) : Math.max(along, up)
}

function faceBox(
  anchor: Anchor,
  { width, height }: { readonly width: number; readonly height: number },
  fromDepth: number,
): Box {
  return {
    fromChainage: anchor.chainage - width / 2,
    toChainage: anchor.chainage + width / 2,
    fromDepth,
    toDepth: anchor.setBack,
    fromHeight: anchor.height - height / 2,
    toHeight: anchor.height + height / 2,
  }
}
