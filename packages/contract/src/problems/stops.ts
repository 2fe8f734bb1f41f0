import { edgeAnchorMark } from '@wedgeline/engine/geometry'
import type { HardwareData } from '../hardware-schema'
import type { AnchorData, EdgeData, LayoutFile } from '../layout'
import { intervalOf, type Interval } from './edges'
import { contains } from './outline'
import { byId, mm, stop, type Path, type Problem } from './problem'

/**
 * What cannot be built but is kept as typed: an anchor off its edge, plates in one another or outside the concrete,
 * hardware that does not suit its end. Rows whose references are broken are passed over.
 */
export function stopProblems(layout: LayoutFile): Problem[] {
  const placed = placedAnchors(layout)
  return [
    ...placed.flatMap(offEdge),
    ...placed.flatMap(outsideConcrete),
    ...overlaps(placed),
    ...panStops(layout),
    ...hardwareStops(layout),
  ]
}

interface PlacedAnchor {
  readonly anchor: AnchorData
  readonly path: Path
  readonly edge: EdgeData
  readonly interval: Interval
  readonly plate: HardwareData['plate']
}

function placedAnchors(layout: LayoutFile): PlacedAnchor[] {
  const edges = byId(layout.edges)
  const hardware = byId(layout.hardware)
  const lookup = { pours: byId(layout.pours), lines: byId(layout.edgeLines) }
  const intervals = new Map(layout.edges.map((edge) => [edge.id, intervalOf(edge, lookup)]))
  return layout.anchors.flatMap((anchor, i) => {
    const edge = edges.get(anchor.edgeId ?? '')
    const plate = hardware.get(anchor.hardwareId)?.plate
    const interval = edge && intervals.get(edge.id)
    return edge && plate && interval ? [{ anchor, edge, interval, plate, path: ['anchors', i] }] : []
  })
}

const isOffEdge = ({ anchor, interval }: PlacedAnchor): boolean =>
  anchor.chainageMm < interval.fromMm || anchor.chainageMm > interval.toMm

function offEdge(placed: PlacedAnchor): Problem[] {
  if (!isOffEdge(placed)) return []
  const { anchor, edge, interval, path } = placed
  const range = `${mm(interval.fromMm)} to ${mm(interval.toMm)}`
  return [stop([...path, 'chainageMm'], `${mm(anchor.chainageMm)} is off edge ${edge.mark}; must lie within ${range}`)]
}

function outsideConcrete(placed: PlacedAnchor): Problem[] {
  if (isOffEdge(placed)) return []
  const { anchor, edge, interval, plate, path } = placed
  const half = plate.widthMm / 2
  const from = anchor.chainageMm - half
  const to = anchor.chainageMm + half
  const problems: Problem[] = []
  if (from < interval.fromMm || to > interval.toMm) {
    const range = `${mm(interval.fromMm + half)} to ${mm(interval.toMm - half)}`
    problems.push(
      stop([...path, 'chainageMm'], `the plate runs beyond the end of edge ${edge.mark}; must lie within ${range}`),
    )
  }
  const passed = edge.lengths.filter((length) => length.fromMm < to && length.toMm > from)
  const soffit = Math.max(...passed.map((length) => length.soffitMm))
  const top = Math.min(...passed.map((length) => length.topMm))
  return passed.length > 0 ? [...problems, ...heightStops(placed, { soffit, top })] : problems
}

function heightStops(
  { anchor, plate, path }: PlacedAnchor,
  { soffit, top }: { soffit: number; top: number },
): Problem[] {
  const half = plate.heightMm / 2
  if (anchor.heightMm - half >= soffit && anchor.heightMm + half <= top) return []
  const face = anchor.heightMm + half > top ? `top at ${mm(top)}` : `soffit at ${mm(soffit)}`
  const range = `${mm(soffit + half)} to ${mm(top - half)}`
  const right = soffit + half <= top - half ? `must lie within ${range}` : 'the plate is higher than the concrete here'
  return [stop([...path, 'heightMm'], `the plate runs beyond the ${face}; ${right}`)]
}

/** Plates of one edge seen square to it: where two cover one another, one tendon would run into the other's plate. */
function overlaps(placed: readonly PlacedAnchor[]): Problem[] {
  const rows = new Map<string, PlacedAnchor[]>()
  for (const one of placed) {
    const row = rows.get(one.edge.id)
    if (row) row.push(one)
    else rows.set(one.edge.id, [one])
  }
  return [...rows.values()].flatMap(overlapsInRow)
}

function overlapsInRow(row: readonly PlacedAnchor[]): Problem[] {
  const ordered = [...row].sort((a, b) => a.anchor.chainageMm - b.anchor.chainageMm)
  const widest = ordered.reduce((width, { plate }) => Math.max(width, plate.widthMm), 0)
  return ordered.flatMap((one, i) => {
    const problems: Problem[] = []
    for (let j = i + 1; j < ordered.length; j++) {
      const other = ordered[j]
      if (!other) break
      const apart = other.anchor.chainageMm - one.anchor.chainageMm
      if (apart >= widest) break
      const message = overlapMessage(one, other, apart)
      if (message) problems.push(stop([...other.path, 'chainageMm'], message))
    }
    return problems
  })
}

function overlapMessage(one: PlacedAnchor, other: PlacedAnchor, apart: number): string | null {
  const along = (one.plate.widthMm + other.plate.widthMm) / 2
  const inHeight = (one.plate.heightMm + other.plate.heightMm) / 2
  const raised = Math.abs(other.anchor.heightMm - one.anchor.heightMm)
  if (apart >= along || raised >= inHeight) return null
  const name = edgeAnchorMark(one.edge, one.anchor)
  return `the plate overlaps that of ${name}, ${mm(apart)} away; must be ${mm(along)} away or more`
}

function panStops(layout: LayoutFile): Problem[] {
  const pours = byId(layout.pours)
  const pans = byId(layout.pans)
  const plates = new Map(layout.hardware.map((row) => [row.id, row.plate]))
  const outside = layout.pans.flatMap((pan, i) => {
    const pour = pours.get(pan.pourId)
    if (!pour || contains(pour.outline, pan)) return []
    return [stop(['pans', i, 'xMm'], `the bearing face stands outside pour ${pour.mark}; must lie in its outline`)]
  })
  const raised = layout.anchors.flatMap((anchor, i) => {
    const pour = pours.get(pans.get(anchor.panId ?? '')?.pourId ?? '')
    const plate = plates.get(anchor.hardwareId)
    if (!pour || !plate) return []
    const half = plate.heightMm / 2
    if (anchor.heightMm >= half && anchor.heightMm <= pour.thicknessMm - half) return []
    const range = `${mm(half)} to ${mm(pour.thicknessMm - half)}`
    return [stop(['anchors', i, 'heightMm'], `the plate runs beyond the slab; must lie within ${range}`)]
  })
  return [...outside, ...raised]
}

function hardwareStops(layout: LayoutFile): Problem[] {
  const hardware = byId(layout.hardware)
  const tendons = byId(layout.tendons)
  return layout.anchors.flatMap((anchor, i) => {
    const row = hardware.get(anchor.hardwareId)
    if (!row) return []
    const path: Path = ['anchors', i, 'hardwareId']
    const strands = tendons.get(anchor.tendonId)?.strands ?? 0
    const problems: Problem[] = []
    if (row.ends !== 'both' && row.ends !== anchor.end) {
      problems.push(stop(path, `${row.name} is for ${row.ends} ends and this is a ${anchor.end} end; must suit it`))
    }
    if (strands > row.strandsMax) {
      problems.push(
        stop(path, `${row.name} holds ${row.strandsMax} strands and the tendon has ${strands}; must hold them`),
      )
    }
    return problems
  })
}
