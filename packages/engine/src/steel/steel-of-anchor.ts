/** Which steel stands behind an anchor. */

import type { AnchorSite } from '../anchor-site'
import { steelKey, type LayoutIndex } from '../layout-index'
import type { SteelShape } from '../model'

/** Steel entered or proposed for the anchor itself. */
export function handSteelOf(index: LayoutIndex, anchorId: string): readonly SteelShape[] {
  return (index.steelOfZone.get(steelKey({ kind: 'anchor', anchorId })) ?? []).map(({ shape }) => shape)
}

/** Bars that run along the whole edge. */
function steelAlong(index: LayoutIndex, edgeId: string): readonly SteelShape[] {
  return (index.steelOfZone.get(steelKey({ kind: 'edge', edgeId })) ?? []).map(({ shape }) => shape)
}

interface SteelOfAnchor {
  readonly shapes: readonly SteelShape[]
  readonly notes: readonly string[]
}

/** The anchor's own steel, the hardware's local steel where none of its kind is entered, and the bars of its edge. */
export function steelOfAnchor(index: LayoutIndex, { anchor, hardware, edge }: AnchorSite): SteelOfAnchor {
  const own = handSteelOf(index, anchor.id)
  const { localSteel } = hardware
  const isReplaced = localSteel === null || own.some(({ kind }) => kind === localSteel.kind)
  const along = edge === null ? [] : steelAlong(index, edge.id)
  const note = `Counted with it: the ${localSteel?.kind ?? 'steel'} that ${hardware.name} comes with, none being entered.`
  return {
    shapes: [...(isReplaced ? [] : [localSteel]), ...own, ...along],
    notes: isReplaced ? [] : [note],
  }
}
