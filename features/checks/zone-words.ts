import { BASIS_SOURCES } from '@wedgeline/engine/bases'
import type { Zone } from '@wedgeline/engine'

/** A reading by the title under which it is accepted. */
export function readingTitle(readingId: string): string {
  const readings = BASIS_SOURCES.flatMap((basis) => basis.readings)
  return readings.find(({ id }) => id === readingId)?.title ?? 'a reading of this basis'
}

export interface ZonePath {
  readonly path: `/jobs/${string}/edges/${string}` | `/jobs/${string}/pans/${string}`
  /** As a link says it: On its edge. */
  readonly words: string
}

/** Where a zone lies, as a path of the product: its pan, or its edge with the zone picked; null for a zone at neither. */
export function pathOfZone(jobId: string, zone: Pick<Zone, 'id' | 'edgeId' | 'panId'>): ZonePath | null {
  if (zone.panId !== null) return { path: `/jobs/${jobId}/pans/${zone.panId}`, words: 'In its pan' }
  if (zone.edgeId === null) return null
  return { path: `/jobs/${jobId}/edges/${zone.edgeId}?zone=${encodeURIComponent(zone.id)}`, words: 'On its edge' }
}

export function calculationPathOf(jobId: string, zoneId: string): `/jobs/${string}/zones/${string}` {
  return `/jobs/${jobId}/zones/${encodeURIComponent(zoneId)}`
}
