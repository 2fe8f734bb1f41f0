/** Tension along the face beside and between anchors: steel asked for against face steel counted. */

import { siteOfAnchor, sitesOfEdge, type AnchorSite } from '../anchor-site'
import type { TieRule } from '../bases/basis'
import { gapsOfEdge, type Gap, type TendonEnd } from '../gaps'
import { ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import { perConcrete } from '../memo'
import type { Pour, Stage, SteelShape } from '../model'
import type { Check, Compared, Refused, Zone } from '../result'
import { faceForce, ROW, tensionMidway } from '../row-series'
import { stageForce } from '../force'
import type { Step } from '../step'
import { sectionBehind } from '../section'
import { countSteel, setsAcross, type Counted, type SetAcross } from '../steel/count'
import type { CountPlace } from '../steel/crossings'
import { steelOfAnchor } from '../steel/steel-of-anchor'
import { byRatio, refusal, type CheckContext, type Head } from './outcome'

/** Tension at the face reaches 0.19 to 0.20 of the spacing (computed): bars within that of the bearing face count. */
const FACE_SHARE = 0.2

const NAMES = {
  between: 'Face between anchors, all stressed',
  beside: 'Face beside the anchor, this one alone',
  outer: 'Face beyond the outermost anchors',
  uneven: 'Face tension',
} as const

/**
 * Face tension at an anchor, a gap or an edge.
 *
 * Inside a near-equal row the exact row gives the force with all anchors stressed; each anchor alone, before its
 * neighbours, stands in its own prism and gets the basis's floor. Everywhere else no rule by hand holds: an edge whose
 * gaps differ acts as a deep beam over its whole length, and it is not covered.
 */
export function spallingChecks(context: CheckContext, zone: Zone): readonly Check[] {
  const { index } = context
  switch (zone.kind) {
    case 'anchor':
      return [
        atAnchor(context, zone, siteOfAnchor(index, found(index.anchors, zone.id.slice('anchor:'.length), 'anchor'))),
      ]
    case 'gap':
      return atGap(context, zone)
    case 'edge':
      return atEdge(index, zone)
    case 'group':
      return [uneven(headOf(zone, NAMES.uneven, []), 'Anchors that act as one do not stand in a row of equal anchors.')]
    case 'corner':
      return [uneven(headOf(zone, NAMES.uneven, []), 'At a corner the face is no part of a row of equal anchors.')]
    case 'joint':
    case 'pan':
    case 'tendon':
    case 'strip':
    case 'pour':
      return []
  }
}

const gapsById = perConcrete((index, edgeId) => new Map(gapsOfEdge(index, edgeId).map((gap) => [gap.id, gap])))

// At the three kinds of place ----------------------------------------------------------------------------------------

function atAnchor(context: CheckContext, zone: Zone, site: AnchorSite): Check {
  const { index } = context
  const { anchor, edge, hardware, halfGapBefore: before, halfGapAfter: after } = site
  if (edge === null) {
    return uneven(headOf(zone, NAMES.uneven, []), 'The anchor stands in a pan and not in a row along an edge.')
  }
  if (!site.isInEqualRow || before === null || after === null) {
    const gap = 2 * Math.min(before ?? Infinity, after ?? Infinity, site.toStart ?? Infinity, site.toEnd ?? Infinity)
    const row = Number.isFinite(gap) ? rowNotes({ P: site.force.value, a: hardware.plate.width, s: gap }) : []
    return uneven(headOf(zone, NAMES.uneven, row), rowReason(index, edge.id))
  }
  const reach = FACE_SHARE * 2 * Math.min(before, after)
  const local = steelOfAnchor(index, site)
  return faceCheck(
    context,
    headOf(zone, NAMES.beside, [
      'Alone it stands in its own prism, which leaves the face free of tension; the floor of the basis counts. An anchor far off the middle of its edge that is stressed long before the others pulls more on the face.',
      ...local.notes,
    ]),
    {
      pour: site.pour,
      force: site.force.steps,
      forceAt: ({ value }) => ({ T: 0, P: value, steps: [] }),
      place: placeAt(site, anchor.chainage, site.top - site.soffit),
      shapes: local.shapes.filter((shape) => shape.kind === 'edge-bars' || isFlat(shape)),
      reach,
      isBonded: isBonded(site),
    },
  )
}

const isBonded = ({ hardware }: AnchorSite): boolean => hardware.kind === 'bonded-splay'

const isFlat = (shape: SteelShape): boolean => shape.kind === 'hairpins' && shape.lies === 'flat'

function atGap(context: CheckContext, zone: Zone): readonly Check[] {
  const { index } = context
  const gap = gapsById(index, zone.edgeId ?? '').get(zone.id)
  const ends = [gap?.after, gap?.before].filter((end) => end !== null && end !== undefined)
  if (!gap || ends.length === 0) return []
  const spacing = gap.to - gap.from
  const a = Math.min(...ends.map(({ width }) => width))
  const sites = ends.map(({ anchor }) => siteOfAnchor(index, anchor))
  const [largest] = [...sites].sort((one, other) => other.force.value - one.force.value)
  const why = a < spacing ? whyUneven(index, gap) : 'The plates are wider than the gap.'
  if (why !== null || !largest) {
    const row = rowNotes({ P: largest?.force.value ?? 0, a, s: ends.length === 1 ? 2 * spacing : spacing })
    return [uneven(headOf(zone, NAMES.uneven, row), why ?? '')]
  }
  const chainage = (gap.from + gap.to) / 2
  const { frame } = largest
  const setBack = Math.min(...ends.map((end) => end.setBack))
  const reach = FACE_SHARE * nearestSpacing(sites)
  return [
    faceCheck(context, headOf(zone, NAMES.between, setBackNotes(gap)), {
      pour: largest.pour,
      force: largest.force.steps,
      forceAt: ({ value }) => {
        const steps = faceForce({ P: value, a, s: spacing })
        return { T: steps.at(-1)?.value ?? 0, P: value, steps }
      },
      place: { ...placeAt(largest, chainage, frame.topAt(chainage) - frame.soffitAt(chainage)), setBack },
      shapes: edgeBarsOf(index, gap.edgeId),
      reach,
      isBonded: sites.some(isBonded),
    }),
  ]
}

/** The window of the nearest gap, so that a mat bar beyond it, which bursting may have counted, is not counted twice. */
const nearestSpacing = (sites: readonly AnchorSite[]): number =>
  2 *
  Math.min(...sites.flatMap(({ halfGapBefore, halfGapAfter }) => [halfGapBefore ?? Infinity, halfGapAfter ?? Infinity]))

const edgeBarsOf = (index: LayoutIndex, edgeId: string): readonly SteelShape[] =>
  (index.steelOfZone.get(`edge:${edgeId}`) ?? []).flatMap(({ shape }) => (shape.kind === 'edge-bars' ? [shape] : []))

/** Row values stand without the outermost anchor and gap at each end, so the ends of an edge are never covered by them. */
function atEdge(index: LayoutIndex, zone: Zone): readonly Check[] {
  const edgeId = zone.edgeId ?? ''
  if ((index.anchorsOfEdge.get(edgeId) ?? []).length === 0) return []
  const reason = isInRow(index, edgeId)
    ? 'Beyond the outermost two anchors at each end the row has no neighbours to go on with.'
    : rowReason(index, edgeId)
  return [uneven(headOf(zone, NAMES.outer, []), reason)]
}

// Why a row does not count -------------------------------------------------------------------------------------------

const isInRow = (index: LayoutIndex, edgeId: string): boolean =>
  [...sitesOfEdge(index, edgeId).values()].some(({ isInEqualRow }) => isInEqualRow)

const rowReason = (index: LayoutIndex, edgeId: string): string =>
  isInRow(index, edgeId)
    ? 'It is the outermost anchor of its row.'
    : 'The row is not near equal: five or more anchors of equal force with no gap over 1.2 of the smallest.'

function whyUneven(index: LayoutIndex, { after, before, edgeId }: Gap): string | null {
  if (after === null || before === null) return 'It is the face between the outermost anchor and the end of the edge.'
  const inPan = [after, before].find(({ panId }) => panId !== null)
  if (inPan) return 'One of the two tendons ends in a pan and not at this face.'
  const isInside = ({ anchor }: TendonEnd) => siteOfAnchor(index, anchor).isInEqualRow
  if (!isInside(after) || !isInside(before)) {
    return isInRow(index, edgeId) ? 'It is the outermost gap of its row.' : rowReason(index, edgeId)
  }
  return null
}

/** A row has one face. Of two that differ either way gives at most the row's force along bars that run on. */
function setBackNotes({ after, before }: Gap): readonly string[] {
  if (!after || !before || Math.abs(after.setBack - before.setBack) <= ROUNDING) return []
  const both = `${round(after.setBack)} and ${round(before.setBack)}`
  return [`The bearing faces stand at ${both} from the edge; the row takes both in the nearer one.`]
}

const round = (mm: number): number => Math.round(mm)

/** What the row would give, which is too low where gaps differ. */
function rowNotes({ P, a, s }: { readonly P: number; readonly a: number; readonly s: number }): readonly string[] {
  if (a >= s) return []
  const { share } = tensionMidway(a / s)
  const force = ((share * P) / 1000).toFixed(1)
  return [
    `A row of equal anchors ${round(s)} apart would give ${share.toFixed(3)} P = ${force} kN at the face: too low here, by several times beside a wide gap (computed).`,
  ]
}

function headOf(zone: Zone, name: string, notes: readonly string[]): Head {
  return { zoneId: zone.id, family: 'spalling', name, plane: 'plan', stage: null, limitKind: 'C', clause: ROW, notes }
}

const uneven = (head: Head, reason: string): Refused =>
  refusal(head, {
    code: 'UNEVEN_ROW',
    field: 'chainage',
    message: `Uneven row. ${reason} Such an edge acts as a deep beam and asks for an elastic analysis of its whole length.`,
  })

// Demand against steel -----------------------------------------------------------------------------------------------

interface FaceInput {
  readonly pour: Pour
  /** Steps that lead to the force of the anchor, all stages done; the last holds it. */
  readonly force: readonly Step[]
  readonly forceAt: (stage: Step) => { readonly T: number; readonly P: number; readonly steps: readonly Step[] }
  readonly place: CountPlace
  readonly shapes: readonly SteelShape[]
  /** Distance from the bearing face within which bars count. */
  readonly reach: number
  /** Rests on the reading for bonded dead ends: all force at the bulbs. */
  readonly isBonded: boolean
}

interface Answer {
  readonly stage: Stage
  readonly rule: TieRule
  readonly counted: Counted
  readonly steps: readonly Step[]
}

/** The stage whose steel falls shortest; of equal ones the last. */
function faceCheck(context: CheckContext, head: Head, input: FaceInput): Compared {
  const sets = setsAcross({ plane: 'plan', place: input.place, shapes: input.shapes })
  const answers = input.pour.stages.map((stage) => answerAt(context, { ...input, sets }, stage))
  const ratio = ({ rule, counted }: Answer) => (rule.area === 0 ? 0 : rule.area / counted.area)
  const worst = answers.reduce((one, other) => (ratio(other) >= ratio(one) ? other : one))
  const { basis } = context
  const bonded = input.isBonded ? basis.deadEndReading : null
  const readings = [basis.planRow.equalReadingId, basis.steelReading, bonded].filter((id) => id !== null)
  const titles = readings.map((id) => basis.readings.find((reading) => reading.id === id)?.title ?? id)
  const rests = titles.length === 0 ? [] : [`Rests on these readings: ${titles.join('; ')}.`]
  return byRatio(
    context,
    {
      ...head,
      stage: worst.stage.name,
      clause: worst.rule.clause,
      notes: [...rests, ...head.notes, ...worst.rule.notes, ...worst.counted.notes],
    },
    {
      demand: worst.rule.area,
      limit: worst.counted.area,
      unit: 'mm2',
      steps: [...input.force, ...worst.steps, ...worst.rule.steps, ...worst.counted.steps],
      readings,
    },
  )
}

function answerAt(
  { basis }: CheckContext,
  input: FaceInput & { readonly sets: readonly SetAcross[] },
  stage: Stage,
): Answer {
  const { place, reach, sets } = input
  const force = stageForce(input.force.at(-1)?.value ?? 0, stage)
  const { T, P, steps } = input.forceAt(force)
  const rule = basis.faceSteel({ T, P })
  const counted = countSteel({
    plane: 'plan',
    window: { from: Math.max(-reach, Math.min(0, place.cover - place.setBack)), to: reach },
    place,
    sets,
    anchorageOf: ({ diameter, bond }) =>
      basis.anchorage({
        diameter,
        strength: stage.strength,
        stress: rule.stress,
        cd: null,
        isGoodBond: basis.isGoodBond(bond),
        isBent: false,
      }),
  })
  return { stage, rule, counted, steps: [force, ...steps] }
}

function placeAt(site: AnchorSite, chainage: number, depth: number): CountPlace {
  const { anchor, frame, hardware, pour } = site
  const { coverTop, coverSoffit } = sectionBehind(pour, { frame, chainage, depth: anchor.setBack })
  return {
    chainage,
    edgeFrom: frame.from,
    edgeTo: frame.to,
    breaks: frame.steps,
    cover: pour.coverEdge,
    setBack: anchor.setBack,
    plateWidth: hardware.plate.width,
    depth,
    coverTop,
    coverSoffit,
    azimuth: frame.outwardAzimuth,
    mats: pour.mats,
  }
}
