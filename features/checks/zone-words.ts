import { BASIS_SOURCES } from '@wedgeline/engine/bases'
import type { Zone } from '@wedgeline/engine'

/** A reading by the title under which it is accepted. */
export function readingTitle(readingId: string): string {
  const readings = BASIS_SOURCES.flatMap((basis) => basis.readings)
  return readings.find(({ id }) => id === readingId)?.title ?? 'a reading of this basis'
}

/** Where a zone lies, as a path of the product: its edge with the zone picked; null for a zone at no edge. */
export function edgePathOf(jobId: string, zone: Pick<Zone, 'id' | 'edgeId'>): `/jobs/${string}/edges/${string}` | null {
  return zone.edgeId === null ? null : `/jobs/${jobId}/edges/${zone.edgeId}?zone=${encodeURIComponent(zone.id)}`
}

export function calculationPathOf(jobId: string, zoneId: string): `/jobs/${string}/zones/${string}` {
  return `/jobs/${jobId}/zones/${encodeURIComponent(zoneId)}`
}
