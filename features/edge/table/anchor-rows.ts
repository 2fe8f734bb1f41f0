import { toSi, type AnchorData, type EdgeData, type LayoutFile, type TendonData } from '@wedgeline/contract'
import { edgeAnchorMark } from '@wedgeline/engine/geometry'
import type { ZoneResult } from '@wedgeline/engine'
import { worstShort, worstWords, type Worst } from '../../checks/words'
import { steelWords } from '../steel-words'

/** One line of the anchor table. */
export interface AnchorRow {
  readonly anchor: AnchorData
  readonly tendon: TendonData | null
  readonly mark: string
  readonly hardwareName: string
  readonly fromLastMm: number | null
  readonly steel: string
  readonly worst: Worst | null
  /** The same as short as a phone needs it. */
  readonly worstShort: Worst | null
}

export interface RowsOf {
  readonly layout: LayoutFile
  readonly edge: EdgeData
  readonly results: ReadonlyMap<string, ZoneResult>
}

/** The anchors of an edge by chainage, with what the table shows beside what was typed. */
export function anchorRows({ layout, edge, results }: RowsOf): readonly AnchorRow[] {
  const tendons = new Map(layout.tendons.map((tendon) => [tendon.id, tendon]))
  const hardware = new Map(layout.hardware.map((each) => [each.id, each]))
  const anchors = layout.anchors
    .filter(({ edgeId }) => edgeId === edge.id)
    .sort((a, b) => a.chainageMm - b.chainageMm || a.number - b.number)
  return anchors.map((anchor, i) => {
    const before = anchors[i - 1]
    const result = results.get(`anchor:${anchor.id}`)
    const item = hardware.get(anchor.hardwareId)
    return {
      anchor,
      tendon: tendons.get(anchor.tendonId) ?? null,
      mark: edgeAnchorMark(edge, anchor),
      hardwareName: item?.name ?? '',
      fromLastMm: before ? anchor.chainageMm - before.chainageMm : null,
      steel: steelOf(layout, anchor, item?.localSteel?.kind ?? null),
      worst: result ? worstWords(result) : null,
      worstShort: result ? worstShort(result) : null,
    }
  })
}

/** Own steel in words, and the hardware's where the anchor has none of that kind. */
function steelOf(layout: LayoutFile, anchor: AnchorData, localKind: string | null): string {
  const shapes = layout.steel
    .filter(({ zone }) => zone.kind === 'anchor' && zone.anchorId === anchor.id)
    .map(({ shape }) => shape)
  const words = shapes.map((shape) => steelWords(toSi(shape)))
  const isLocalMissing = localKind !== null && !shapes.some(({ kind }) => kind === localKind)
  return [...(isLocalMissing ? [`${localKind} of the hardware`] : []), ...words].join(', ')
}
