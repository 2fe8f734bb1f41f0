import type { PanData, PourData, SteelShapeData } from '@wedgeline/contract'
import type { SteelKind } from '../edge/sheet/steel-fields'

/** The kinds of bars that stand round a pan. */
export const PAN_STEEL: readonly SteelKind[] = ['tie-back-bars', 'trimmers', 'diagonals', 'lap-bars']

const up5 = (value: number): number => Math.ceil(value / 5) * 5

/** Anchorage past a line as somebody would begin with it: 40 bar diameters (common practice). */
const past = (diameterMm: number): number => 40 * diameterMm

/** A set of bars as somebody would begin with it round this pan; every value is then changed as wished. */
export function usualPanSteel(kind: SteelKind, { pan, pour }: { pan: PanData; pour: PourData }): SteelShapeData | null {
  const set = { layers: 'top', runs: 'along', pitchMm: 75 } as const
  switch (kind) {
    case 'tie-back-bars':
    case 'lap-bars': {
      const diameterMm = 16
      const pitchMm = 2 * up5(pan.acrossMm / 2 + pour.coverTopMm + diameterMm / 2)
      return { kind, ...set, diameterMm, lengthMm: 2 * past(diameterMm), count: 2, layers: 'both', pitchMm }
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
