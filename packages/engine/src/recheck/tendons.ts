/** Tendons whose own checks hang on a whole edge: its strip, and which kind of end their neighbours have. */

import { tendonEndsOfEdge } from '../gaps'
import type { LayoutIndex } from '../layout-index'
import type { Anchor } from '../model'
import { isNoForce } from '../tendon/friction'
import { stripOfEdge, type StripShare } from '../tendon/strip'
import { isSame } from './edit'
import type { TouchedEdge } from './touched'

interface Indexes {
  readonly was: LayoutIndex
  readonly index: LayoutIndex
}

/** Those of the touched edges of a pour whose share of the strip or whose run of equal ends is another than before. */
export function otherTendons(
  indexes: Indexes,
  { touched, pourId }: { readonly touched: readonly TouchedEdge[]; readonly pourId: string },
): ReadonlySet<string> {
  const ids = touched
    .filter(({ edge }) => edge.pourId === pourId)
    .flatMap(({ edge }) => [...otherShares(indexes, edge.id), ...otherRuns(indexes, edge.id)])
  return new Set(ids)
}

function otherShares({ was, index }: Indexes, edgeId: string): string[] {
  const [before, after] = [stripOfEdge(was, edgeId), stripOfEdge(index, edgeId)]
  if (before && after && !isNoForce(before) && !isNoForce(after) && before.depth === after.depth) {
    const known = new Map(before.shares.flatMap((share) => tendonsOf(share).map((id) => [id, share])))
    return after.shares.flatMap((share) => tendonsOf(share).filter((id) => !isAlike(known.get(id), share)))
  }
  const isUnchanged = (before === null || isNoForce(before)) && isSame(before, after)
  return isUnchanged ? [] : tendonEndsOfEdge(index, edgeId).map(({ anchor }) => anchor.tendonId)
}

const tendonsOf = ({ ends }: StripShare): string[] => ends.map(({ anchor }) => anchor.tendonId)

const isAlike = (before: StripShare | undefined, after: StripShare): boolean =>
  before !== undefined && before.area === after.area && before.nominal === after.nominal && before.high === after.high

function otherRuns({ was, index }: Indexes, edgeId: string): string[] {
  const [before, after] = [was, index].map((one) => runsOf(one.anchorsOfEdge.get(edgeId) ?? []))
  return [...(after ?? [])].flatMap(([anchorId, { tendonId, run }]) =>
    before?.get(anchorId)?.run === run ? [] : [tendonId],
  )
}

/** How many neighbours with the same kind of end each anchor of a row stands among. */
function runsOf(anchors: readonly Anchor[]): Map<string, { readonly tendonId: string; readonly run: number }> {
  const runs = new Map<string, { tendonId: string; run: number }>()
  let from = 0
  for (let to = 1; to <= anchors.length; to++) {
    if (anchors[to]?.end === anchors[from]?.end && to < anchors.length) continue
    for (const { id, tendonId } of anchors.slice(from, to)) {
      runs.set(id, { tendonId, run: anchors.length < 2 ? 0 : to - from })
    }
    from = to
  }
  return runs
}
