/** What was worked out before an edit and still stands, carried over to the index after it. */

import { groupsOfEdge } from '../anchor-groups'
import { isEqualRow, sitesOfEdge, type AnchorSite } from '../anchor-site'
import { closeAnchors } from '../close-anchors'
import type { LayoutIndex } from '../layout-index'
import { carryOver, madeAlready, remember } from '../memo'
import { forcesKept } from '../tendon/profile'
import { stripOfEdge } from '../tendon/strip'
import { usedSpreads, wedgesOfEdge, wedgesOfGaps, type GapWedge } from '../wedge/wedges-of-edge'
import type { TouchedEdge } from './touched'

export interface Carrying {
  readonly was: LayoutIndex
  readonly index: LayoutIndex
  /** The part round what is touched. */
  readonly kept: LayoutIndex
  readonly touched: readonly TouchedEdge[]
  readonly tendonIds: ReadonlySet<string>
}

/** Edges and tendons that are not touched keep everything; a touched edge keeps what stands away from the touched places. */
export function carryForward({ was, index, kept, touched, tendonIds }: Carrying): void {
  const touchedIds = new Set(touched.map(({ edge }) => edge.id))
  const isAsBefore = (edgeId: string) => !touchedIds.has(edgeId)
  for (const memo of [sitesOfEdge, closeAnchors, groupsOfEdge, wedgesOfEdge, usedSpreads, stripOfEdge]) {
    carryOver(memo, { from: was, to: index, isAsBefore })
  }
  for (const memo of Object.values(forcesKept)) {
    carryOver(memo, { from: was, to: index, isAsBefore: (tendonId) => !tendonIds.has(tendonId) })
  }
  for (const one of touched) {
    carrySites({ was, index, kept }, one)
    carryWedges({ was, index, kept }, one)
  }
}

type Indexes = Pick<Carrying, 'was' | 'index' | 'kept'>

function carrySites({ was, index, kept }: Indexes, { edge, anchorIds }: TouchedEdge): void {
  const before = madeAlready(sitesOfEdge, was, edge.id)
  if (!before) return
  const anchors = index.anchorsOfEdge.get(edge.id) ?? []
  const isEqual = isEqualRow(index, anchors)
  const near = sitesOfEdge(kept, edge.id)
  const rowCount = anchors.length
  const sites = anchors.flatMap(({ id }, at): [string, AnchorSite][] => {
    const site = (anchorIds.has(id) ? undefined : before.get(id)) ?? near.get(id)
    if (!site) return []
    const isInEqualRow = isEqual && at > 0 && at < rowCount - 1
    const isAsItWas = site.rowCount === rowCount && site.isInEqualRow === isInEqualRow
    return [[id, isAsItWas ? site : { ...site, rowCount, isInEqualRow }]]
  })
  if (sites.length === rowCount) remember(sitesOfEdge, { index, key: edge.id }, new Map(sites))
}

/** Where no tendon compresses behind a gap, ends from anywhere count: the whole edge is worked out again. */
function carryWedges({ was, index, kept }: Indexes, { edge, gaps, gapIds }: TouchedEdge): void {
  const before = madeAlready(wedgesOfEdge, was, edge.id)
  if (!before) return
  const touched = gaps.filter(({ id }) => gapIds.has(id))
  const near = wedgesOfGaps(kept, edge.id, touched)
  const wedges = gaps.flatMap(({ id }): [string, GapWedge][] => {
    const wedge = gapIds.has(id) ? near.get(id) : before.get(id)
    return wedge && wedge.throughs.length === 0 ? [[id, wedge]] : []
  })
  if (wedges.length === gaps.length) remember(wedgesOfEdge, { index, key: edge.id }, new Map(wedges))
}

/** Whether an edge's anchors are told by their whole row something else than before: how many stand there, or how equal. */
export function isRowOther({ was, index }: Pick<Carrying, 'was' | 'index'>, edgeId: string): boolean {
  const [before, after] = [was, index].map((one) => one.anchorsOfEdge.get(edgeId) ?? [])
  if (!before || !after) return true
  const [wasEqual, isEqual] = [isEqualRow(was, before), isEqualRow(index, after)]
  return wasEqual !== isEqual || (!isEqual && before.length !== after.length)
}
