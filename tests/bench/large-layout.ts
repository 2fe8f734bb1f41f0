import { layoutSchema, type LayoutFile, type LayoutInput } from '@wedgeline/contract'
import { demoLayout } from '../../db/seed/demo-layout'

const TENDONS_PER_POUR = 50
const SPACING_MM = 900
const DEPTH_MM = 30_000

/**
 * A layout of the demo's hardware with as many anchors as asked for: square pours in a row on one level, each with 50
 * tendons from its south to its north edge, live and dead ends in turn, edge bars and transverse bars.
 * @param anchors a multiple of 100
 */
export function largeLayout(anchors: number): LayoutFile {
  const { job, hardware, jacks, strandTypes } = demoLayout()
  const count = anchors / (2 * TENDONS_PER_POUR)
  if (!Number.isInteger(count)) throw new Error(`${anchors} anchors do not fill whole pours; must be a multiple of 100`)
  const pours = Array.from({ length: count }, (_, i) => pourAt(i))
  return layoutSchema.parse({
    format: 'wedgeline.layout',
    version: 1,
    job,
    hardware,
    jacks,
    strandTypes,
    levels: [{ id: 'L1', mark: 'L1' }],
    edgeLines: [
      { id: 'south', levelId: 'L1', mark: 'S', xMm: 0, yMm: 0, azimuthDeg: 90 },
      { id: 'north', levelId: 'L1', mark: 'N', xMm: 0, yMm: DEPTH_MM, azimuthDeg: 90 },
    ],
    pours: pours.map(({ pour }) => pour),
    edges: pours.flatMap(({ edges }) => edges),
    tendons: pours.flatMap(({ tendons }) => tendons),
    anchors: pours.flatMap(({ anchors: own }) => own),
    steel: pours.flatMap(({ steel }) => steel),
  } satisfies LayoutInput)
}

const WIDTH_MM = TENDONS_PER_POUR * SPACING_MM

function pourAt(i: number) {
  const id = `P${i + 1}`
  const from = i * WIDTH_MM
  const to = from + WIDTH_MM
  const corner = (n: number, xMm: number, yMm: number) => ({ id: `${id}-${n}`, xMm, yMm })
  const pour = {
    id,
    levelId: 'L1',
    mark: id,
    thicknessMm: 220,
    concrete: 'C32/40',
    fckMPa: 32,
    coverTopMm: 30,
    coverSoffitMm: 30,
    coverEdgeMm: 30,
    outline: [corner(1, from, 0), corner(2, to, 0), corner(3, to, DEPTH_MM), corner(4, from, DEPTH_MM)],
    stages: [
      { id: `${id}-25`, name: '25 %', share: 0.25, strengthMPa: 9 },
      { id: `${id}-full`, name: 'full', share: 1, strengthMPa: 22 },
    ],
  }
  const edges = [edgeOf({ id, line: 'south', corner: 1, from, to }), edgeOf({ id, line: 'north', corner: 3, from, to })]
  const tendons = Array.from({ length: TENDONS_PER_POUR }, (_, t) => ({
    id: `${id}-T${t + 1}`,
    pourId: id,
    mark: `T${t + 1}`,
    strandTypeId: 'strand-12.7',
    strands: 4,
    jackingRatio: 0.8,
    lengthMm: DEPTH_MM - 410,
  }))
  const anchors = tendons.flatMap((tendon, t) => endsOf({ id, tendonId: tendon.id, t, from }))
  return { pour, edges, tendons, anchors, steel: steelOf(id, edges, anchors) }
}

interface Side {
  readonly id: string
  readonly line: string
  readonly corner: number
  readonly from: number
  readonly to: number
}

function edgeOf({ id, line, corner, from, to }: Side) {
  const edgeId = `${id}-${line}`
  return {
    id: edgeId,
    pourId: id,
    edgeLineId: line,
    mark: `${line === 'south' ? 'S' : 'N'}-${id}`,
    cornerId: `${id}-${corner}`,
    lengths: [{ id: `${edgeId}-1`, fromMm: from, toMm: to, kind: 'free' as const, topMm: 220, soffitMm: 0 }],
  }
}

/** Live and dead ends in turn along each edge. */
function endsOf({ id, tendonId, t, from }: { id: string; tendonId: string; t: number; from: number }) {
  return ['south', 'north'].map((line, side) => {
    const isLive = (t + side) % 2 === 0
    return {
      id: `${tendonId}-${line}`,
      tendonId,
      edgeId: `${id}-${line}`,
      panId: null,
      number: t + 1,
      end: isLive ? ('live' as const) : ('dead' as const),
      hardwareId: isLive ? 'S4' : 'D4',
      castWithPourId: id,
      stressedWithPourId: id,
      chainageMm: from + SPACING_MM * (t + 0.5),
      heightMm: 110,
      setBackMm: isLive ? 110 : 300,
      straightBehindMm: 900,
    }
  })
}

function steelOf(
  pourId: string,
  edges: readonly ReturnType<typeof edgeOf>[],
  anchors: readonly ReturnType<typeof endsOf>[number][],
): NonNullable<LayoutInput['steel']> {
  const edgeBars = edges.map(({ id, lengths }) => ({
    id: `bars-${id}`,
    pourId,
    zone: { kind: 'edge' as const, edgeId: id },
    shape: {
      kind: 'edge-bars' as const,
      ...{ diameterMm: 12, countTop: 1, countBottom: 1, firstMm: 165, pitchMm: 100 },
      fromMm: (lengths[0]?.fromMm ?? 0) + 50,
      toMm: (lengths[0]?.fromMm ?? 0) + 11_050,
    },
  }))
  const transverse = anchors.map(({ id }) => ({
    id: `bars-${id}`,
    pourId,
    zone: { kind: 'anchor' as const, anchorId: id },
    shape: {
      kind: 'transverse-bars' as const,
      ...{ diameterMm: 10, lengthMm: 800, count: 4, layers: 'both' as const, firstMm: 250, pitchMm: 200 },
    },
  }))
  return [...edgeBars, ...transverse]
}
