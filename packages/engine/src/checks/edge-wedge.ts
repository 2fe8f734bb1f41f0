/** Edge wedges at gaps and corners: how deep they reach, the steel against cracks in them, and the spacing of tendons. */

import type { Gap } from '../gaps'
import { found, type LayoutIndex } from '../layout-index'
import type { WedgeBarsShape } from '../model'
import type { Advice, Check, Compared, Zone } from '../result'
import { sectionBehind } from '../section'
import type { Clause } from '../step'
import { cornerWedges, type CornerWedge } from '../wedge/corner-wedge'
import { gapAcross, type JoinedGap } from '../wedge/joined-gap'
import { wedgesOfEdge, type GapWedge } from '../wedge/wedges-of-edge'
import { anchorageOf, crackDemand, spareMats, steelAcross, type BarsAcross, type CrackPlace } from './crack-steel'
import { byRatio, comparison, type CheckContext, type Head } from './outcome'

const SPACING: Clause = { source: 'ACI 318M-19', section: '7.7.6.3', tag: 'secondary' }
const EDGE_BARS: Clause = { source: 'Common practice', section: 'edge bars: 2 top and 2 bottom', tag: 'practice' }
const RE_ENTRANT: Clause = { source: 'Common practice', section: 'trimming of re-entrant corners', tag: 'practice' }
const GEOMETRY: Clause = { source: 'Geometry of spread', section: 'outline of the spreads', tag: 'derived' }

/** Largest spacing of tendons, and that above which bars from the edge inwards are added, mm. */
const SPACING_MAX = 1800
const SPACING_WITHOUT_BARS_MAX = 1400
const EDGE_BARS_USUAL = 4

/** Depth and steel of one gap's wedge, and its width as tendon spacing. */
export function gapWedgeChecks(context: CheckContext, zone: Zone): readonly Check[] {
  const { index } = context
  const wedge = wedgesOfEdge(index, zone.edgeId ?? '').get(zone.id)
  if (!wedge) return []
  const head = headOf(zone)
  return [
    ...crackChecks(context, zone, wedge),
    depthAdvice(head, wedge),
    ...spacingAdvice(head, wedge.gap),
    ...joinedAdvice(head, gapAcross(index, wedge.gap)),
  ]
}

const headOf = ({ id }: Zone): Head => ({
  zoneId: id,
  family: 'edge-wedge',
  name: 'Crack steel in the edge wedge',
  plane: 'plan',
  stage: null,
  limitKind: 'C',
  clause: GEOMETRY,
  notes: [],
})

// Steel --------------------------------------------------------------------------------------------------------------

function crackChecks(context: CheckContext, zone: Zone, wedge: GapWedge): Check[] {
  const { index, basis } = context
  const shapes = wedgeBarsOf(index, zone)
  const place = placeOf(index, wedge, shapes)
  const demand = crackDemand(context, place)
  const { gap } = wedge
  const frame = found(index.frames, gap.edgeId, 'edge')
  const sets = shapes.map((shape) => barsAcross(context, { shape, wedge, place }))
  const steel = steelAcross(sets, gap.to - gap.from, spareMats(place.pour, frame))
  const isBonded = [gap.after, gap.before].some((end) => end?.hardware.kind === 'bonded-splay')
  const head = {
    ...headOf(zone),
    clause: demand.rule?.clause ?? wedge.clause,
    notes: [...demand.notes, ...throughNotes(wedge), ...steel.notes],
  }
  const compared = byRatio(context, head, {
    demand: demand.rule?.areaPerMetre ?? 0,
    limit: steel.perMetre,
    unit: 'mm2/m',
    steps: [...wedge.depthBySpread.flatMap(({ steps }) => steps), ...(demand.rule?.steps ?? []), ...steel.steps],
    readings: [demand.choice.readingId, ...(isBonded ? [basis.deadEndReading] : [])],
  })
  const onlyEdgeBars = demand.rule === null ? [edgeBarsAdvice(index, head, gap.edgeId)] : []
  return [
    compared,
    ...pitchChecks(compared, { gap, shapes, spacingMax: demand.rule?.spacingMax ?? null }),
    ...onlyEdgeBars,
  ]
}

const wedgeBarsOf = (index: LayoutIndex, { id }: Zone): WedgeBarsShape[] =>
  (index.steelOfZone.get(id) ?? []).flatMap(({ shape }) => (shape.kind === 'wedge-bars' ? [shape] : []))

/** The section at the apex counts: behind an edge beam that is the slab. */
function placeOf(index: LayoutIndex, { gap, apex }: GapWedge, shapes: readonly WedgeBarsShape[]): CrackPlace {
  const pour = found(index.pours, gap.pourId, 'pour')
  const frame = found(index.frames, gap.edgeId, 'edge')
  const { top, soffit, coverTop, coverSoffit, linkDiameter } = sectionBehind(pour, { frame, ...apex })
  const diameters = shapes.map(({ diameter }) => diameter)
  return {
    pour,
    thickness: top - soffit,
    cover: Math.max(coverTop, coverSoffit) + linkDiameter,
    diameter: diameters.length === 0 ? null : Math.max(...diameters),
  }
}

/** Bars begin at the edge's cover and must reach past the apex by their anchorage length. */
function barsAcross(
  { index, basis }: CheckContext,
  of: { readonly shape: WedgeBarsShape; readonly wedge: GapWedge; readonly place: CrackPlace },
): BarsAcross {
  const { shape, wedge, place } = of
  const frame = found(index.frames, wedge.gap.edgeId, 'edge')
  const { coverEdge } = sectionBehind(place.pour, { frame, chainage: wedge.apex.chainage, depth: 0 })
  return {
    diameter: shape.diameter,
    bars: shape.count * (shape.layers === 'both' ? 2 : 1),
    past: coverEdge + shape.length - wedge.depth,
    pastNeeded: anchorageOf(basis, place, shape),
  }
}

/** Where the rule sets a largest spacing, of each set of bars. */
function pitchChecks(
  head: Compared,
  of: { readonly gap: Gap; readonly shapes: readonly WedgeBarsShape[]; readonly spacingMax: number | null },
): Compared[] {
  const { gap, shapes, spacingMax } = of
  if (spacingMax === null) return []
  return shapes.map(({ count, diameter }) => {
    const pitch = (gap.to - gap.from) / count
    const spare = spacingMax - pitch
    const met = spare >= 0 ? 'within' : 'over'
    return comparison(
      { ...head, name: `Spacing of ${diameter} mm bars in the edge wedge`, notes: [] },
      { demand: pitch, limit: spacingMax, unit: 'mm', steps: head.steps.filter(({ symbol }) => symbol === 'sMax') },
      {
        compares: 'at-most',
        status: head.status === 'needs-judgement' ? 'needs-judgement' : met,
        statusOnceAccepted: met,
        utilisation: null,
        spare,
        readingIds: head.readingIds,
        mend: null,
      },
    )
  })
}

/** Where the job asks for ordinary edge bars only: those entered for the edge. */
function edgeBarsAdvice(index: LayoutIndex, head: Head, edgeId: string): Advice {
  const bars = (index.steelOfZone.get(`edge:${edgeId}`) ?? []).reduce(
    (count, { shape }) => (shape.kind === 'edge-bars' ? count + shape.countTop + shape.countBottom : count),
    0,
  )
  return advice(
    { ...head, name: 'Edge bars', clause: EDGE_BARS },
    { measured: bars, unit: 'bars', usual: '2 top and 2 bottom', isUsual: bars >= EDGE_BARS_USUAL },
  )
}

function throughNotes({ throughs }: Pick<GapWedge, 'throughs'>): string[] {
  return throughs.map(
    ({ from, to }) =>
      `From chainage ${whole(from)} to ${whole(to)} no tendon that ends along this edge compresses the concrete at any ` +
      'depth from side to side: the wedge of the opposite edge begins where this one ends, and bars across run through or lap.',
  )
}

// Advice -------------------------------------------------------------------------------------------------------------

type Measured = Pick<Advice, 'measured' | 'usual' | 'unit' | 'isUsual'>

const advice = (head: Head, measured: Measured): Advice => ({
  ...head,
  ...measured,
  kind: 'advice',
  limitKind: 'P',
})

/** The depth in use, with every other angle of spread beside it. */
function depthAdvice(head: Head, wedge: GapWedge): Advice {
  const beside = wedge.depthBySpread.map(
    ({ depth, area, angle, title }) =>
      `${whole(depth)} deep, ${squareMetres(area)} m2 at ${degrees(angle)} degrees (${title})`,
  )
  const bond =
    wedge.depthFromBond === null || wedge.depthFromBond <= wedge.depthFromBulbs
      ? []
      : [
          `With the spread of bonded dead ends from their bulbs ${whole(wedge.depthFromBulbs)}, from the end of their ` +
            `transmission length ${whole(wedge.depthFromBond)}: the deeper one counts.`,
        ]
  return advice(
    { ...head, name: 'Depth of the edge wedge', clause: wedge.clause, notes: [...bond, ...throughNotes(wedge)] },
    { measured: wedge.depth, unit: 'mm', usual: beside.join('; '), isUsual: true },
  )
}

function spacingAdvice(head: Head, { after, before, from, to }: Gap): Advice[] {
  return after && before ? [spacingOf({ ...head, name: 'Tendon spacing' }, to - from)] : []
}

function spacingOf(head: Head, spacing: number): Advice {
  const added =
    spacing > SPACING_WITHOUT_BARS_MAX
      ? [
          `Above ${SPACING_WITHOUT_BARS_MAX} bars parallel to the tendons are added there, from the edge inwards at ` +
            'least as long as the spacing (ACI 318M-19; advice in other bases).',
        ]
      : []
  return advice(
    { ...head, clause: SPACING, notes: added },
    { measured: spacing, unit: 'mm', usual: `up to ${SPACING_MAX}`, isUsual: spacing <= SPACING_MAX },
  )
}

/** Across a pour boundary, once both pours are stressed. */
function joinedAdvice(head: Head, joined: JoinedGap | null): Advice[] {
  if (!joined) return []
  const { otherMark, otherPour, from, to, depth } = joined
  const stage = `with pour ${otherPour} stressed`
  return [
    spacingOf({ ...head, stage, name: `Tendon spacing across the joint, with ${otherMark}` }, to - from),
    advice(
      { ...head, stage, name: `Depth as one with ${otherMark}`, clause: GEOMETRY },
      {
        measured: depth,
        unit: 'mm',
        usual: 'not deeper than each gap alone, which stands until both pours are stressed',
        isUsual: true,
      },
    ),
  ]
}

// Corners ------------------------------------------------------------------------------------------------------------

/** The area that neither edge's tendons compress, and the steel that both gaps beside the corner bring into it. */
export function cornerWedgeChecks(context: CheckContext, zone: Zone): readonly Check[] {
  const wedge = cornerWedges(context.index, zone.pourId).get(zone.id)
  if (!wedge) return []
  return wedge.isReentrant
    ? [reentrantAdvice(zone, wedge)]
    : [...cornerSteel(context, zone, wedge), cornerAdvice(zone, wedge)]
}

/** Bars square to each edge cross the corner: each of the two directions by its own gap's bars. */
function cornerSteel(context: CheckContext, zone: Zone, corner: CornerWedge): Check[] {
  return [
    { edge: corner.before, wedge: corner.wedgeBefore },
    { edge: corner.after, wedge: corner.wedgeAfter },
  ].flatMap(({ edge, wedge }) => {
    if (!wedge || corner.area === 0) return []
    const gapZone = { ...zone, id: wedge.gap.id, edgeId: edge.id }
    const [compared] = crackChecks(context, gapZone, wedge)
    return compared ? [{ ...compared, zoneId: zone.id, name: `Crack steel in the corner, square to ${edge.mark}` }] : []
  })
}

function cornerAdvice(zone: Zone, corner: CornerWedge): Advice {
  const { area, before, after, alongBefore, alongAfter } = corner
  return advice(
    {
      ...headOf(zone),
      name: 'Corner without precompression either way',
      notes: [`It reaches ${whole(alongBefore)} along ${before.mark} and ${whole(alongAfter)} along ${after.mark}.`],
    },
    { measured: area / 1e6, unit: 'm2', usual: 'part of the wedges of both edges', isUsual: true },
  )
}

/** Behind a re-entrant corner the spread starts again. */
function reentrantAdvice(zone: Zone, { before, after, wedgeBefore, wedgeAfter }: CornerWedge): Advice {
  const depths = [
    { mark: before.mark, wedge: wedgeBefore },
    { mark: after.mark, wedge: wedgeAfter },
  ].flatMap(({ mark, wedge }) => (wedge ? [`${whole(wedge.depth)} behind ${mark}`] : []))
  return advice(
    {
      ...headOf(zone),
      name: 'Re-entrant corner',
      clause: RE_ENTRANT,
      notes: [
        'The spread of tendons that pass the corner starts again there. Tendons are carried past its line, or 2 to 3 ' +
          'diagonals are placed top and bottom and anchored past both sides (from memory).',
      ],
    },
    {
      measured: Math.max(wedgeBefore?.depth ?? 0, wedgeAfter?.depth ?? 0),
      unit: 'mm',
      usual: `wedges beside it: ${depths.join(', ')}`,
      isUsual: true,
    },
  )
}

const whole = (value: number): string => String(Math.round(value))
const degrees = (angle: number): string => String(Math.round((angle * 1800) / Math.PI) / 10)
const squareMetres = (area: number): string => (area / 1e6).toFixed(3)
