/** Everything round one anchor, at an edge or in a pan, that its checks ask for, gathered once. */

import { facesFromCentre, type NearFace } from './faces'
import { anchorageForce, jackingForce, type AnchorageForce } from './force'
import type { AnchorFrame, EdgeFrame } from './frame'
import { cross, isInside, ROUNDING, subtract } from './geometry'
import { found, type LayoutIndex } from './layout-index'
import { perConcrete } from './memo'
import type { Anchor, Edge, Hardware, Pan, Pour, StrandType, Tendon } from './model'
import { neighboursOf, rowOfPan } from './neighbours'
import { panFrame } from './pan-frame'

/** Another anchor of the same row, with the distances between the two centres. */
interface Neighbour {
  readonly anchor: Anchor
  readonly hardware: Hardware
  readonly along: number
  readonly inHeight: number
}

export interface AnchorSite {
  readonly anchor: Anchor
  readonly hardware: Hardware
  readonly tendon: Tendon
  readonly strand: StrandType
  readonly pour: Pour
  /** Of edge and pan exactly one is there. */
  readonly edge: Edge | null
  readonly pan: Pan | null
  readonly frame: AnchorFrame
  /** While jacking, all stages done: what bearing, bursting and spalling are checked for. */
  readonly force: AnchorageForce
  readonly top: number
  readonly soffit: number
  /** From the anchor's centre to the concrete above and below. */
  readonly toTop: number
  readonly toSoffit: number
  /** From the centre down to the floor of the recess in front of a pan's bearing face; null at an edge. */
  readonly toFloor: number | null
  /** From the centre to the ends of the edge; null where the slab goes on past that end. */
  readonly toStart: number | null
  readonly toEnd: number | null
  /** The nearest other face of concrete in plan: the end of the edge, an opening, a deeper length. */
  readonly sideFace: NearFace | null
  /** Half the gap to the next anchor along the edge on either side; null where there is none. */
  readonly halfGapBefore: number | null
  readonly halfGapAfter: number | null
  /** Likewise to the next anchor across a pour boundary, once both pours are cast; null where none is there. */
  readonly jointGapBefore: number | null
  readonly jointGapAfter: number | null
  /** Anchors of its row that a rule for few anchors has to do with, itself among them. */
  readonly rowCount: number
  /** Stands inside a near-equal row: five or more anchors of one force, no gap over 1.2 of the smallest, not the outermost. */
  readonly isInEqualRow: boolean
  /** Anchors near enough for spread or spacing to matter, nearest along the edge first. */
  readonly neighbours: readonly Neighbour[]
}

/** The site of any anchor; made once for each. */
export function siteOfAnchor(index: LayoutIndex, anchor: Anchor): AnchorSite {
  if (anchor.edgeId === null) return siteInPan(index, anchor.id)
  return found(sitesOfEdge(index, anchor.edgeId), anchor.id, 'anchor')
}

/** The sites of all anchors of an edge, by anchor id. */
export const sitesOfEdge = perConcrete(makeSites)

function makeSites(index: LayoutIndex, edgeId: string): ReadonlyMap<string, AnchorSite> {
  const edge = found(index.edges, edgeId, 'edge')
  const frame = found(index.frames, edgeId, 'edge')
  const pour = found(index.pours, edge.pourId, 'pour')
  const anchors = index.anchorsOfEdge.get(edgeId) ?? []
  const goesOn = openEnds(edge, pour, frame)
  const reach = reachOf(index, index.rowOfEdge.get(edgeId) ?? anchors)
  const isEqual = isEqualRow(index, anchors)
  const boundary = acrossBoundary(index, edge, frame)
  return new Map(
    anchors.map((anchor, at): [string, AnchorSite] => {
      const [before, after] = [halfGap(anchors, at, -1), halfGap(anchors, at, 1)]
      const site: AnchorSite = {
        ...partsOf(index, anchor),
        ...heightsOf(frame, anchor),
        pour,
        edge,
        pan: null,
        frame,
        toFloor: null,
        toStart: goesOn.start ? null : anchor.chainage - frame.from,
        toEnd: goesOn.end ? null : frame.to - anchor.chainage,
        sideFace: facesFromCentre(index, anchor)[0] ?? null,
        halfGapBefore: before,
        halfGapAfter: after,
        jointGapBefore: before === null ? gapAcross(anchor, boundary.before) : null,
        jointGapAfter: after === null ? gapAcross(anchor, boundary.after) : null,
        rowCount: anchors.length,
        isInEqualRow: isEqual && at > 0 && at < anchors.length - 1,
        neighbours: nearRow(index, anchor, reach),
      }
      return [anchor.id, site]
    }),
  )
}

/** Behind a pan's bearing face the slab has its whole thickness; its ends are faces of concrete beside the face. */
const siteInPan = perConcrete((index, anchorId): AnchorSite => {
  const anchor = found(index.anchors, anchorId, 'anchor')
  const pan = found(index.pans, anchor.panId ?? '', 'pan')
  const frame = panFrame(index, pan.id)
  const row = rowOfPan(index, anchor)
  const at = row.findIndex(({ id }) => id === anchorId)
  const heights = heightsOf(frame, anchor)
  return {
    ...partsOf(index, anchor),
    ...heights,
    pour: found(index.pours, pan.pourId, 'pour'),
    edge: null,
    pan,
    frame,
    toFloor: anchor.height - (heights.top - pan.depth),
    toStart: anchor.chainage - frame.from,
    toEnd: frame.to - anchor.chainage,
    sideFace: facesFromCentre(index, anchor)[0] ?? null,
    halfGapBefore: halfGap(row, at, -1),
    halfGapAfter: halfGap(row, at, 1),
    jointGapBefore: null,
    jointGapAfter: null,
    rowCount: row.length,
    isInEqualRow: false,
    neighbours: nearRow(index, anchor, reachOf(index, row)),
  }
})

function partsOf(index: LayoutIndex, anchor: Anchor) {
  const tendon = found(index.tendons, anchor.tendonId, 'tendon')
  return {
    anchor,
    hardware: found(index.hardware, anchor.hardwareId, 'hardware'),
    tendon,
    strand: found(index.strandTypes, tendon.strandTypeId, 'strand type'),
    force: anchorageForce(index, anchor),
  }
}

function heightsOf({ topAt, soffitAt }: AnchorFrame, { chainage, height }: Anchor) {
  const [top, soffit] = [topAt(chainage), soffitAt(chainage)]
  return { top, soffit, toTop: top - height, toSoffit: height - soffit }
}

/** Distance to the nearer of soffit and top. */
export const nearerFace = ({ toTop, toSoffit }: AnchorSite): number => Math.min(toTop, toSoffit)

/** A dead end whose strands bond in the concrete: no plate bears, and rules for plates say nothing of it. */
export const isBonded = ({ anchor, hardware }: Pick<AnchorSite, 'anchor' | 'hardware'>): boolean =>
  anchor.end === 'dead' && hardware.kind === 'bonded-splay'

/** Why no rule holds: hardware of another end, or a centre that is not in the concrete; null where one may. */
export function whyNoRule(site: AnchorSite): { readonly field: string; readonly message: string } | null {
  const { anchor, frame, hardware, top, soffit, pan, pour } = site
  if (hardware.kind !== 'plate' && !isBonded(site)) {
    return { field: 'hardwareId', message: `${hardware.name} is a bonded dead end; a live anchor needs a plate.` }
  }
  if (pan !== null && !isInside(pan, pour.outline)) {
    return { field: 'pan.x', message: `The bearing face of pan ${pan.mark} is not within the outline of the pour.` }
  }
  if (site.toFloor !== null && site.toFloor <= 0) {
    const message = `The centre at height ${anchor.height} is not above the floor of the recess (${anchor.height - site.toFloor}).`
    return { field: 'height', message }
  }
  if (nearerFace(site) <= 0) {
    const message = `The centre at height ${anchor.height} is not between soffit (${soffit}) and top (${top}).`
    return { field: 'height', message }
  }
  if (pan !== null || (anchor.chainage > frame.from && anchor.chainage < frame.to)) return null
  const message = `Chainage ${anchor.chainage} is not on the edge, which runs from ${frame.from} to ${frame.to}.`
  return { field: 'chainage', message }
}

/** At a re-entrant or straight corner of the outline the slab goes on past the end of the edge. */
function openEnds(edge: Edge, pour: Pour, frame: EdgeFrame): { start: boolean; end: boolean } {
  const at = pour.outline.findIndex(({ id }) => id === edge.cornerId)
  const first = isOpen(pour, at)
  const second = isOpen(pour, at + 1)
  return frame.runsLeftToRight ? { start: first, end: second } : { start: second, end: first }
}

function isOpen({ outline }: Pour, at: number): boolean {
  const count = outline.length
  const [before, corner, after] = [outline[(at - 1 + count) % count], outline[at % count], outline[(at + 1) % count]]
  if (!before || !corner || !after) return false
  return cross(subtract(corner, before), subtract(after, corner)) <= ROUNDING
}

const EQUAL_ROW_ANCHORS_MIN = 5
const EQUAL_ROW_GAPS_MAX = 1.2

/** Whether the anchors of an edge, by chainage, are a near-equal row. */
export function isEqualRow(index: LayoutIndex, anchors: readonly Anchor[]): boolean {
  if (anchors.length < EQUAL_ROW_ANCHORS_MIN) return false
  const gaps = anchors.slice(1).map((anchor, i) => anchor.chainage - (anchors[i]?.chainage ?? 0))
  const forces = anchors.map(({ tendonId }) => {
    const tendon = found(index.tendons, tendonId, 'tendon')
    return jackingForce(tendon, found(index.strandTypes, tendon.strandTypeId, 'strand type')).value
  })
  const isEqualForce = Math.max(...forces) - Math.min(...forces) <= ROUNDING * Math.max(...forces)
  return isEqualForce && Math.max(...gaps) <= EQUAL_ROW_GAPS_MAX * Math.min(...gaps)
}

/** Farther than this along the edge no spread and no smallest spacing reaches. */
function reachOf(index: LayoutIndex, anchors: readonly Anchor[]): number {
  const types = [...new Set(anchors.map(({ hardwareId }) => hardwareId))].map((id) =>
    found(index.hardware, id, 'hardware'),
  )
  return Math.max(0, ...types.flatMap((one) => [3 * one.plate.width, one.spacingAlongMin, ...approvalSpacings(one)]))
}

const approvalSpacings = ({ approval }: Hardware): number[] =>
  (approval?.strengths ?? []).map(({ spacingAlongMin }) => spacingAlongMin)

/** Anchors one above the other have no gap between them: the next one beside counts. */
function halfGap(anchors: readonly Anchor[], at: number, way: 1 | -1): number | null {
  const own = anchors[at]
  for (let i = at + way; own && i >= 0 && i < anchors.length; i += way) {
    const gap = Math.abs((anchors[i]?.chainage ?? own.chainage) - own.chainage)
    if (gap > ROUNDING) return gap / 2
  }
  return null
}

/** Two edges nearer than this carry on into one another, mm. */
const BOUNDARY_GAP_MAX = 1

/** Chainage of the nearest anchor beyond each end of an edge, where another pour's edge carries on in its line. */
function acrossBoundary(index: LayoutIndex, edge: Edge, frame: EdgeFrame) {
  const next = (index.edgesOfLine.get(edge.edgeLineId) ?? []).filter(
    (other) =>
      other.pourId !== edge.pourId && found(index.frames, other.id, 'edge').runsLeftToRight === frame.runsLeftToRight,
  )
  const meets = (at: number, end: 'from' | 'to') =>
    next.find((other) => Math.abs(found(index.frames, other.id, 'edge')[end] - at) <= BOUNDARY_GAP_MAX)
  const anchorsOf = (other: Edge | undefined) => index.anchorsOfEdge.get(other?.id ?? '') ?? []
  return {
    before: anchorsOf(meets(frame.from, 'to')).at(-1)?.chainage ?? null,
    after: anchorsOf(meets(frame.to, 'from'))[0]?.chainage ?? null,
  }
}

const gapAcross = ({ chainage }: Anchor, beyond: number | null): number | null =>
  beyond === null ? null : Math.abs(beyond - chainage) / 2

function nearRow(index: LayoutIndex, own: Anchor, reach: number): readonly Neighbour[] {
  return neighboursOf(index, own, reach)
    .within.map((anchor) => ({
      anchor,
      hardware: found(index.hardware, anchor.hardwareId, 'hardware'),
      along: Math.abs(anchor.chainage - own.chainage),
      inHeight: Math.abs(anchor.height - own.height),
    }))
    .sort((one, other) => one.along - other.along)
}
