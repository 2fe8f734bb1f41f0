/** The zones of a pour that may be given steel, with the place that their bars are entered for. */

import { centreOf, groupsOfEdge } from '../anchor-groups'
import type { AnchorSite } from '../anchor-site'
import { gapsOfEdge } from '../gaps'
import { found, steelKey, type LayoutIndex } from '../layout-index'
import type { SteelZone } from '../model'
import type { Zone } from '../result'
import { zonesOfPour } from '../zones'
import type { Place } from './bench'

export function placesOf(index: LayoutIndex, pourId: string, zoneIds?: readonly string[]): Place[] {
  const asked = zoneIds && new Set(zoneIds)
  return zonesOfPour(index, pourId)
    .filter(({ id }) => !asked || asked.has(id))
    .flatMap((zone) => placeOf(index, zone))
}

/** Bars of an anchor are cast with it; bars of a joint with the pour that is cast first. */
function placeOf(index: LayoutIndex, zone: Zone): Place[] {
  const steelZone = steelZoneOf(index, zone)
  if (steelZone === null) return []
  const key = steelKey(steelZone)
  if (steelZone.kind === 'anchor') {
    const { castWithPourId } = found(index.anchors, steelZone.anchorId, 'anchor')
    return [{ zone, steelZone, key, pourId: castWithPourId }]
  }
  if (steelZone.kind === 'joint') {
    return [{ zone, steelZone, key, pourId: found(index.joints, steelZone.jointId, 'joint').firstPourId }]
  }
  return [{ zone, steelZone, key, pourId: zone.pourId }]
}

function steelZoneOf(index: LayoutIndex, { id, kind, edgeId }: Zone): SteelZone | null {
  const record = id.slice(kind.length + 1)
  switch (kind) {
    case 'anchor':
      return { kind, anchorId: record }
    case 'edge':
      return { kind, edgeId: record }
    case 'pan':
      return { kind, panId: record }
    case 'joint':
      return { kind, jointId: record }
    case 'gap': {
      const gap = gapsOfEdge(index, edgeId ?? '').find((one) => one.id === id)
      if (!gap) return null
      const [after, before] = [gap.after?.anchor.id ?? null, gap.before?.anchor.id ?? null]
      return { kind, edgeId: gap.edgeId, afterAnchorId: after, beforeAnchorId: before }
    }
    case 'group':
      return middleOf(index, edgeId ?? '', id)
    case 'corner':
    case 'tendon':
    case 'strip':
    case 'pour':
      return null
  }
}

/** Bars for anchors that act as one are entered for the member nearest to their resultant. */
function middleOf(index: LayoutIndex, edgeId: string, groupId: string): SteelZone | null {
  const group = groupsOfEdge(index, edgeId).find(({ id }) => id === groupId)
  if (!group) return null
  const centre = centreOf(group.members).chainage
  const away = ({ anchor }: AnchorSite) => Math.round(Math.abs(anchor.chainage - centre))
  const room = ({ toStart, toEnd }: AnchorSite) => Math.min(toStart ?? Infinity, toEnd ?? Infinity)
  // Of two that are as near the one with more room to the ends of the edge.
  const nearest = [...group.members].sort(
    (a, b) => away(a) - away(b) || Number(room(b) > room(a)) - Number(room(a) > room(b)),
  )[0]
  return nearest ? { kind: 'anchor', anchorId: nearest.anchor.id } : null
}
