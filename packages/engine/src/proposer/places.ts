/** The zones of a pour that may be given steel, with the place that their bars are entered for. */

import { gapsOfEdge } from '../gaps'
import { found, type LayoutIndex } from '../layout-index'
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

/** Bars of an anchor are cast with it; bars of a joint with the pour that is cast first, which alone proposes them. */
function placeOf(index: LayoutIndex, zone: Zone): Place[] {
  const steelZone = steelZoneOf(index, zone)
  if (steelZone === null) return []
  if (steelZone.kind === 'anchor') {
    const { castWithPourId } = found(index.anchors, steelZone.anchorId, 'anchor')
    return [{ zone, steelZone, pourId: castWithPourId }]
  }
  if (steelZone.kind === 'joint' && found(index.joints, steelZone.jointId, 'joint').firstPourId !== zone.pourId)
    return []
  return [{ zone, steelZone, pourId: zone.pourId }]
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
    case 'corner':
    case 'tendon':
    case 'strip':
      return null
  }
}
