import { layoutIndex, zonesOfPour } from '@wedgeline/engine/geometry'
import type { LayoutFile } from '@wedgeline/contract'
import { toEngine } from '@wedgeline/contract'
import type { Zone } from '@wedgeline/engine'

export interface ZonePlace {
  readonly zone: Zone
  /** Zones before and after it on the same edge, or among those of the pour that stand at no edge. */
  readonly previous: Zone | null
  readonly next: Zone | null
}

/** Looks a zone up among those of every pour; null where it is gone. */
export function zonePlace(layout: LayoutFile, zoneId: string): ZonePlace | null {
  const index = layoutIndex(toEngine(layout))
  for (const pour of layout.pours) {
    const zones = zonesOfPour(index, pour.id)
    const zone = zones.find(({ id }) => id === zoneId)
    if (!zone) continue
    const row = zones.filter(({ edgeId }) => edgeId === zone.edgeId)
    const at = row.findIndex(({ id }) => id === zoneId)
    return { zone, previous: row[at - 1] ?? null, next: row[at + 1] ?? null }
  }
  return null
}
