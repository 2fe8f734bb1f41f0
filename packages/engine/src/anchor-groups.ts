/** Anchors that act as one, as places of their own: who belongs to them, how far they reach, and in which planes. */

import { siteOfAnchor, type AnchorSite } from './anchor-site'
import { closeAnchors, type CloseGroup } from './close-anchors'
import { found } from './layout-index'
import { perConcrete } from './memo'

export interface AnchorGroup {
  /** Made of its members' ids alone, so that it stays when they move. */
  readonly id: string
  readonly edgeId: string
  /** By chainage, then height. */
  readonly members: readonly AnchorSite[]
  /** In plan, in the thickness, or in both, with the comparisons by which its members were joined. */
  readonly planes: readonly CloseGroup[]
}

/** The groups of an edge. */
export const groupsOfEdge = perConcrete((index, edgeId): readonly AnchorGroup[] => {
  const groups = new Map<string, AnchorGroup>()
  for (const close of closeAnchors(index, edgeId)) {
    const id = `group:${[...close.anchorIds].sort().join(':')}`
    const members = close.anchorIds.map((anchorId) => siteOfAnchor(index, found(index.anchors, anchorId, 'anchor')))
    groups.set(id, { id, edgeId, members, planes: [...(groups.get(id)?.planes ?? []), close] })
  }
  return [...groups.values()]
})

/** The group in which an anchor acts in a plane; null where it stands alone. */
export const groupIn = (
  groups: readonly AnchorGroup[],
  anchorId: string,
  plane: CloseGroup['plane'],
): AnchorGroup | null =>
  groups.find(
    ({ members, planes }) =>
      planes.some((one) => one.plane === plane) && members.some(({ anchor }) => anchor.id === anchorId),
  ) ?? null

/** E1-05 to 06 together; E1-05, 07 together where numbers are left out between. */
export function groupName(edgeMark: string, { members }: AnchorGroup): string {
  const numbers = members.map(({ anchor }) => anchor.number).sort((a, b) => a - b)
  const [first, last] = [numbers[0] ?? 0, numbers.at(-1) ?? 0]
  const isUnbroken = last - first === numbers.length - 1
  const said = isUnbroken ? `${twoDigits(first)} to ${twoDigits(last)}` : numbers.map(twoDigits).join(', ')
  return `${edgeMark}-${said} together`
}

const twoDigits = (number: number): string => String(number).padStart(2, '0')

/** From the outer side of its first plate to that of its last, along the edge and in height, mm. */
export function outToOut(members: readonly AnchorSite[]) {
  const range = (values: readonly (readonly [number, number])[]) => ({
    from: values.reduce((least, [middle, size]) => Math.min(least, middle - size / 2), Infinity),
    to: values.reduce((most, [middle, size]) => Math.max(most, middle + size / 2), -Infinity),
  })
  return {
    along: range(members.map(({ anchor, hardware }) => [anchor.chainage, hardware.plate.width])),
    up: range(members.map(({ anchor, hardware }) => [anchor.height, hardware.plate.height])),
  }
}

/** Where the resultant of the members' forces stands. */
export function centreOf(members: readonly AnchorSite[]): { readonly chainage: number; readonly height: number } {
  const total = members.reduce((sum, { force }) => sum + force.value, 0)
  const weighted = (of: (site: AnchorSite) => number) =>
    members.reduce((sum, site) => sum + site.force.value * of(site), 0) / total
  return { chainage: weighted(({ anchor }) => anchor.chainage), height: weighted(({ anchor }) => anchor.height) }
}
