import type { AnchorData, LayoutFile } from '../layout'
import { byId, refused, type Path, type Problem } from './problem'

/** Tendons, anchors and steel that name one another in a way that cannot be built. */
export function anchorProblems(layout: LayoutFile): Problem[] {
  return [...placeProblems(layout), ...tendonProblems(layout.anchors), ...sharedPans(layout.anchors)]
}

function placeProblems(layout: LayoutFile): Problem[] {
  const edges = byId(layout.edges)
  const pans = byId(layout.pans)
  return layout.anchors.flatMap((anchor, i) => {
    const path: Path = ['anchors', i]
    const { edgeId, panId } = anchor
    if ((edgeId === null) === (panId === null)) {
      const wrong = edgeId === null ? 'the anchor has neither edge nor pan' : 'the anchor has both an edge and a pan'
      return [refused([...path, 'edgeId'], `${wrong}; must have edgeId or panId, and null in the other`)]
    }
    const home = edgeId === null ? pans.get(panId ?? '') : edges.get(edgeId)
    if (!home || home.pourId === anchor.castWithPourId) return []
    const message = `the anchor's ${edgeId === null ? 'pan' : 'edge'} belongs to pour "${home.pourId}"; must be cast with it`
    return [refused([...path, 'castWithPourId'], message)]
  })
}

const ENDS_MAX = 2

function tendonProblems(anchors: readonly AnchorData[]): Problem[] {
  const ends = new Map<string, number>()
  return anchors.flatMap((anchor, i) => {
    const count = (ends.get(anchor.tendonId) ?? 0) + 1
    ends.set(anchor.tendonId, count)
    if (count <= ENDS_MAX) return []
    return [
      refused(['anchors', i, 'tendonId'], `tendon "${anchor.tendonId}" has two anchors already; a tendon has two ends`),
    ]
  })
}

function sharedPans(anchors: readonly AnchorData[]): Problem[] {
  const first = new Map<string, number>()
  return anchors.flatMap((anchor, i) => {
    if (anchor.panId === null) return []
    const taken = first.get(anchor.panId)
    if (taken === undefined) {
      first.set(anchor.panId, i)
      return []
    }
    return [refused(['anchors', i, 'panId'], `anchors[${taken}] stands in this pan already; a pan holds one anchor`)]
  })
}
