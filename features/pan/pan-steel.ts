import type { PanData, PourData, SteelShapeData } from '@wedgeline/contract'
import type { SteelKind } from '../edge/sheet/steel-fields'

/** The kinds of bars that stand round a pan. */
export const PAN_STEEL: readonly SteelKind[] = ['tie-back-bars', 'trimmers', 'diagonals', 'lap-bars']

const down5 = (value: number): number => Math.floor(value / 5) * 5
const up5 = (value: number): number => Math.ceil(value / 5) * 5

/** A usual stock length, and room between two sets of bars. */
const STOCK_MM = 12_000
const GAP_MM = 60

export interface PanSteelPlace {
  readonly pan: PanData
  readonly pour: PourData
  /** From the bearing face to the edge in front. */
  readonly toEdgeMm: number
}

/** Anchorage past a line as somebody would begin with it: 40 bar diameters (common practice). */
const past = (diameterMm: number): number => 40 * diameterMm

/** A set of bars as somebody would begin with it round this pan; every value is then changed as wished. */
export function usualPanSteel(kind: SteelKind, { pan, pour, toEdgeMm }: PanSteelPlace): SteelShapeData | null {
  const beside = 2 * up5(pan.acrossMm / 2 + pour.coverTopMm + 8)
  const set = { layers: 'top', runs: 'along', pitchMm: 75 } as const
  switch (kind) {
    case 'tie-back-bars':
      return { kind, ...set, diameterMm: 16, lengthMm: 2 * past(16), count: 2, layers: 'both', pitchMm: beside }
    case 'lap-bars': {
      // Their middle lies at the bearing face: as far on both sides as it is to the edge, beside the tie-back bars.
      const lengthMm = Math.max(2 * past(16), Math.min(STOCK_MM, down5(2 * (toEdgeMm - pour.coverEdgeMm))))
      return { kind, ...set, diameterMm: 16, lengthMm, count: 2, layers: 'both', pitchMm: beside + 2 * GAP_MM }
    }
    case 'trimmers':
      return { kind, ...set, diameterMm: 12, lengthMm: up5(pan.alongMm + 2 * past(12)), count: 4 }
    case 'diagonals':
      return { kind, ...set, diameterMm: 12, lengthMm: 1100, count: 2 }
    case 'spiral':
    case 'links':
    case 'hairpins':
    case 'edge-bars':
    case 'transverse-bars':
    case 'wedge-bars':
      return null
  }
}
