import { found, gridReference } from '@wedgeline/engine/geometry'
import { STATUSES } from '@wedgeline/engine/result'
import type { LayoutIndex, PourResult, ZoneResult } from '@wedgeline/engine'
import { countChecks, type Counts } from '../checks/counts'
import { worstWords, type Worst } from '../checks/words'
import { LENGTH_KIND_WORDS } from './edge-words'

/** One edge of a pour as its list shows it. */
export interface EdgeRow {
  readonly id: string
  readonly mark: string
  /** Grid references of its two ends; empty without a grid. */
  readonly where: string
  readonly kinds: string
  readonly lengthMm: number
  readonly live: number
  readonly dead: number
  readonly counts: Counts | null
  readonly worst: (Worst & { readonly zoneId: string; readonly zoneName: string }) | null
}

/** The edges of a pour; counts and worst check are null until there is a result. */
export function edgeRows(index: LayoutIndex, pourId: string, result: PourResult | null): readonly EdgeRow[] {
  return (index.edgesOfPour.get(pourId) ?? []).map((edge) => {
    const frame = found(index.frames, edge.id, 'edge')
    const anchors = index.anchorsOfEdge.get(edge.id) ?? []
    const zones = result?.zones.filter(({ zone }) => zone.edgeId === edge.id) ?? null
    const ends = [frame.from, frame.to].map((chainage) => gridReference(index.layout, frame.pointAt(chainage, 0)))
    return {
      id: edge.id,
      mark: edge.mark,
      where: ends.every((end) => end !== '') ? ends.join(' to ') : '',
      kinds: [...new Set(edge.lengths.map(({ kind }) => LENGTH_KIND_WORDS[kind]))].join(', '),
      lengthMm: frame.to - frame.from,
      live: anchors.filter(({ end }) => end === 'live').length,
      dead: anchors.filter(({ end }) => end === 'dead').length,
      counts: zones && countChecks(zones),
      worst: zones && worstOfZones(zones),
    }
  })
}

function worstOfZones(zones: readonly ZoneResult[]): EdgeRow['worst'] {
  for (const status of STATUSES) {
    const zone = zones.find((candidate) => candidate.status === status)
    const worst = zone && worstWords(zone)
    if (worst) return { ...worst, zoneId: zone.zone.id, zoneName: zone.zone.name }
  }
  return null
}
