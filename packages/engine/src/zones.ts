/** The places of a pour that checks and bars belong to, with stable ids and the names that people use. */

import { groupName, groupsOfEdge, outToOut } from './anchor-groups'
import { cornerId, cornersOfPour } from './corners'
import { gapsOfEdge, type Gap, type TendonEnd } from './gaps'
import { found, type LayoutIndex } from './layout-index'
import type { Anchor, Edge } from './model'
import { hasStrengths } from './strengths'
import type { Zone } from './result'

/** All zones of a pour: edge by edge along chainage with anchors that act as one, then corners, pans with their anchors, joints and tendons, and the strengths of its concrete. */
export function zonesOfPour(index: LayoutIndex, pourId: string): Zone[] {
  return [
    ...(index.edgesOfPour.get(pourId) ?? []).flatMap((edge) => zonesOfEdge(index, edge)),
    ...cornersOfPour(index, pourId).map((corner) =>
      zone({
        id: cornerId(corner),
        kind: 'corner',
        name: `${corner.before.mark}/${corner.after.mark} corner`,
        pourId,
      }),
    ),
    ...panZones(index, pourId),
    ...jointZones(index, pourId),
    ...(index.tendonsOfPour.get(pourId) ?? []).map((tendon) =>
      zone({ id: `tendon:${tendon.id}`, kind: 'tendon', name: `Tendon ${tendon.mark}`, pourId }),
    ),
    ...strengthZones(index, pourId),
  ]
}

/** Edge and two-digit number, E6-03; an anchor in a pan takes the pan's mark. */
export function anchorMark(index: LayoutIndex, anchor: Anchor): string {
  if (anchor.panId !== null) return found(index.pans, anchor.panId, 'pan').mark
  return edgeAnchorMark(found(index.edges, anchor.edgeId ?? '', 'edge'), anchor)
}

/** The mark of an anchor at an edge by the edge's mark and the anchor's number alone. */
export function edgeAnchorMark(edge: { readonly mark: string }, anchor: { readonly number: number }): string {
  return `${edge.mark}-${twoDigits(anchor.number)}`
}

/** E6 gap 03 to 04; E6 gap start to 01. */
function gapName(index: LayoutIndex, gap: Gap): string {
  const { mark } = found(index.edges, gap.edgeId, 'edge')
  return `${mark} gap ${endName(index, gap.after) ?? 'start'} to ${endName(index, gap.before) ?? 'end'}`
}

function zonesOfEdge(index: LayoutIndex, edge: Edge): Zone[] {
  const frame = found(index.frames, edge.id, 'edge')
  const place = { pourId: edge.pourId, edgeId: edge.id }
  const whole = zone({
    ...place,
    id: `edge:${edge.id}`,
    kind: 'edge',
    name: `${edge.mark} edge`,
    from: frame.from,
    to: frame.to,
  })
  const anchors = (index.anchorsOfEdge.get(edge.id) ?? []).map((anchor) => {
    const half = found(index.hardware, anchor.hardwareId, 'hardware').plate.width / 2
    const [from, to] = [anchor.chainage - half, anchor.chainage + half]
    return zone({ ...place, id: `anchor:${anchor.id}`, kind: 'anchor', name: anchorMark(index, anchor), from, to })
  })
  const gaps = gapsOfEdge(index, edge.id).map((gap) =>
    zone({ ...place, id: gap.id, kind: 'gap', name: gapName(index, gap), from: gap.from, to: gap.to }),
  )
  const groups = groupsOfEdge(index, edge.id).map((group) => {
    const { from, to } = outToOut(group.members).along
    return zone({ ...place, id: group.id, kind: 'group', name: groupName(edge.mark, group), from, to })
  })
  return [whole, ...[...gaps, ...anchors, ...groups].sort((a, b) => middle(a) - middle(b)), ...stripOf(index, edge)]
}

/** The strip behind the wedges of an edge at which tendons end. */
function stripOf(index: LayoutIndex, edge: Edge): Zone[] {
  const { from, to } = found(index.frames, edge.id, 'edge')
  if (gapsOfEdge(index, edge.id).every(({ after, before }) => after === null && before === null)) return []
  const name = `${edge.mark} strip`
  return [zone({ id: `strip:${edge.id}`, kind: 'strip', name, pourId: edge.pourId, edgeId: edge.id, from, to })]
}

function panZones(index: LayoutIndex, pourId: string): Zone[] {
  return (index.pansOfPour.get(pourId) ?? []).flatMap((pan) => [
    zone({ id: `pan:${pan.id}`, kind: 'pan', name: `${pan.mark} pan`, pourId, panId: pan.id }),
    ...(index.anchorsOfPan.get(pan.id) ?? []).map((anchor) =>
      zone({ id: `anchor:${anchor.id}`, kind: 'anchor', name: pan.mark, pourId, panId: pan.id }),
    ),
  ])
}

/** A joint belongs to both pours that have an edge on its line. */
function jointZones(index: LayoutIndex, pourId: string): Zone[] {
  return index.layout.joints.flatMap((joint) => {
    const edge = (index.edgesOfLine.get(joint.edgeLineId) ?? []).find((candidate) => candidate.pourId === pourId)
    if (!edge) return []
    const { from, to } = found(index.frames, edge.id, 'edge')
    const name = `${found(index.edgeLines, joint.edgeLineId, 'edge line').mark} joint`
    return [zone({ id: `joint:${joint.id}`, kind: 'joint', name, pourId, edgeId: edge.id, from, to })]
  })
}

/** The concrete of the pour as a whole, once strengths are recorded for it. */
function strengthZones(index: LayoutIndex, pourId: string): Zone[] {
  if (!hasStrengths(index, pourId)) return []
  const name = `${found(index.pours, pourId, 'pour').mark} strength at stressing`
  return [zone({ id: `pour:${pourId}`, kind: 'pour', name, pourId })]
}

function zone(given: Pick<Zone, 'id' | 'kind' | 'name' | 'pourId'> & Partial<Zone>): Zone {
  return { edgeId: null, panId: null, from: null, to: null, ...given }
}

function endName(index: LayoutIndex, end: TendonEnd | null): string | null {
  if (!end) return null
  return end.panId === null ? twoDigits(end.anchor.number) : found(index.pans, end.panId, 'pan').mark
}

const twoDigits = (number: number): string => String(number).padStart(2, '0')

const middle = (place: Zone): number => ((place.from ?? 0) + (place.to ?? 0)) / 2
