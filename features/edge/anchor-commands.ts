import type { AnchorData, Command, EdgeData, HardwareData, LayoutFile, TendonData } from '@wedgeline/contract'
import type { Change } from '../editing/draft'

/** What somebody types for one anchor at an edge; what is left out is taken from the anchor before it. */
export interface TypedAnchor {
  readonly chainageMm: number
  readonly heightMm?: number | undefined
  readonly strands?: number | undefined
  readonly end?: AnchorData['end'] | undefined
  readonly hardwareId?: string | undefined
  readonly setBackMm?: number | undefined
}

interface Place {
  readonly layout: LayoutFile
  readonly edge: EdgeData
  readonly newId: () => string
}

/**
 * Commands that put anchors on an edge. Each makes a tendon whose other end is open. Numbers follow the chainage on
 * an edge that had none; later anchors take the next free numbers, so that marks already given hold still.
 */
export function insertAnchors({ layout, edge, newId }: Place, typed: readonly TypedAnchor[]): Change {
  const onEdge = layout.anchors.filter(({ edgeId }) => edgeId === edge.id)
  const firstNumber = Math.max(0, ...onEdge.map(({ number }) => number)) + 1
  const ordered = [...typed].sort((a, b) => a.chainageMm - b.chainageMm)
  const commands = ordered.flatMap((anchor, i): readonly Command[] => {
    const like = likeness(layout, edge, anchor)
    const tendon = newTendon(
      { layout, edge, newId },
      { number: firstNumber + i, strands: anchor.strands ?? like.strands },
    )
    const row: AnchorData = {
      id: newId(),
      tendonId: tendon.id,
      edgeId: edge.id,
      panId: null,
      number: firstNumber + i,
      end: anchor.end ?? like.end,
      hardwareId: anchor.hardwareId ?? like.hardware?.id ?? '',
      castWithPourId: edge.pourId,
      stressedWithPourId: edge.pourId,
      chainageMm: anchor.chainageMm,
      heightMm: anchor.heightMm ?? like.heightMm,
      setBackMm: anchor.setBackMm ?? like.setBackMm,
      skewDeg: 0,
      elevationDeg: 0,
      straightBehindMm: like.straightBehindMm,
    }
    return [
      { type: 'insert', table: 'tendons', row: tendon },
      { type: 'insert', table: 'anchors', row },
    ]
  })
  const label = typed.length === 1 ? 'Add an anchor' : `Add ${typed.length} anchors`
  return { label, commands }
}

interface Likeness {
  readonly heightMm: number
  readonly strands: number
  readonly setBackMm: number
  /** What is drawn until somebody types another: as the anchor before, or the least that the hardware asks for. */
  readonly straightBehindMm: number | null
  readonly end: AnchorData['end']
  readonly hardware: HardwareData | undefined
}

/** What a new anchor takes from the one before it on the edge, or from the pour and the hardware where it is the first. */
function likeness(layout: LayoutFile, edge: EdgeData, { chainageMm, hardwareId, end }: TypedAnchor): Likeness {
  const before = layout.anchors
    .filter((anchor) => anchor.edgeId === edge.id && anchor.chainageMm <= chainageMm)
    .sort((a, b) => a.chainageMm - b.chainageMm)
    .at(-1)
  const wantedEnd = end ?? before?.end ?? 'live'
  const sameEnd = before?.end === wantedEnd ? before : undefined
  const hardware =
    layout.hardware.find(({ id }) => id === (hardwareId ?? sameEnd?.hardwareId)) ??
    layout.hardware.find(({ ends }) => ends === wantedEnd || ends === 'both') ??
    layout.hardware[0]
  const strands = layout.tendons.find(({ id }) => id === before?.tendonId)?.strands ?? hardware?.strandsMax ?? 1
  return {
    heightMm: before?.heightMm ?? middleHeight(layout, edge, chainageMm),
    strands,
    setBackMm: sameEnd && sameEnd.hardwareId === hardware?.id ? sameEnd.setBackMm : usualSetBack(hardware),
    straightBehindMm: sameEnd?.straightBehindMm ?? hardware?.straightBehindMinMm ?? null,
    end: wantedEnd,
    hardware,
  }
}

/** Middle of the slab at this chainage, where the edge's lengths say how deep it is. */
function middleHeight(layout: LayoutFile, edge: EdgeData, chainageMm: number): number {
  const length = edge.lengths.find(({ fromMm, toMm }) => fromMm <= chainageMm && chainageMm <= toMm) ?? edge.lengths[0]
  if (length) return (length.topMm + length.soffitMm) / 2
  return (layout.pours.find(({ id }) => id === edge.pourId)?.thicknessMm ?? 0) / 2
}

/** A plate sits at the back of its pocket; a bonded dead end's bulbs stand well inside (300, common practice). */
export const usualSetBack = (hardware: HardwareData | undefined): number =>
  hardware?.kind === 'bonded-splay' ? 300 : (hardware?.pocket?.depthMm ?? 0)

function newTendon(
  { layout, edge, newId }: Place,
  { number, strands }: { readonly number: number; readonly strands: number },
): TendonData {
  const like = layout.tendons.find(({ pourId }) => pourId === edge.pourId) ?? layout.tendons[0]
  return {
    id: newId(),
    pourId: edge.pourId,
    mark: `${edge.mark}-T${String(number).padStart(2, '0')}`,
    strandTypeId: like?.strandTypeId ?? layout.strandTypes[0]?.id ?? '',
    strands,
    jackingRatio: like?.jackingRatio ?? 0.8,
    stressedFrom: 'one-end',
    path: [],
    lengthMm: null,
    drapeDeg: null,
  }
}

/** Commands that take anchors away: their own steel with them, and the tendon where this was its only end. */
export function removeAnchors(layout: LayoutFile, anchorIds: readonly string[]): Change {
  const gone = new Set(anchorIds)
  const anchors = layout.anchors.filter(({ id }) => gone.has(id))
  const steel = layout.steel.filter(({ zone }) => touches(zone, gone))
  const tendonIds = new Set(anchors.map(({ tendonId }) => tendonId))
  const kept = new Set(layout.anchors.filter(({ id }) => !gone.has(id)).map(({ tendonId }) => tendonId))
  const commands: Command[] = [
    ...steel.map(({ id }): Command => ({ type: 'remove', table: 'steel', id })),
    ...anchors.map(({ id }): Command => ({ type: 'remove', table: 'anchors', id })),
    ...[...tendonIds].filter((id) => !kept.has(id)).map((id): Command => ({ type: 'remove', table: 'tendons', id })),
  ]
  return { label: anchors.length === 1 ? 'Remove an anchor' : `Remove ${anchors.length} anchors`, commands }
}

function touches(zone: LayoutFile['steel'][number]['zone'], gone: ReadonlySet<string>): boolean {
  if (zone.kind === 'anchor') return gone.has(zone.anchorId)
  if (zone.kind !== 'gap') return false
  return [zone.afterAnchorId, zone.beforeAnchorId].some((id) => id !== null && gone.has(id))
}
