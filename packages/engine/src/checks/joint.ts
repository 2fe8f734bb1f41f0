/** Construction joints: bars across the strip without precompression, and the tie behind anchors that stand at it. */

import type { TieRule } from '../bases/basis'
import { anchorageForce } from '../force'
import { ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, PlacedBarsShape } from '../model'
import type { Check, Compared, Zone } from '../result'
import { sectionBehind } from '../section'
import { step, type Clause, type Step } from '../step'
import { jointStrips, type JointStrip, type StripLength } from '../wedge/joint-strip'
import { anchorMark } from '../zones'
import {
  anchorageOf,
  crackDemand,
  lapOf,
  spareMats,
  steelAcross,
  type BarsAcross,
  type CrackPlace,
} from './crack-steel'
import { byRatio, type CheckContext, type Head } from './outcome'

const STRIP: Clause = { source: 'Geometry of spread', section: 'both sides of a joint', tag: 'derived' }
const PLACED: Clause = { source: 'Geometry of bars', section: 'areas across the joint', tag: 'derived' }

/** Bars across every length of a construction joint, and its tie-back in two stages; nothing crosses a movement joint. */
export function jointChecks(context: CheckContext, zone: Zone): readonly Check[] {
  const { index } = context
  const joint = found(index.joints, zone.id.slice('joint:'.length), 'joint')
  if (joint.kind === 'movement') return []
  return jointStrips(index, joint.id)
    .filter(({ first, second }) => [first.pourId, second.pourId].includes(zone.pourId))
    .flatMap((strip) => [
      ...strip.lengths.map((length) => barsCheck(context, zone, { strip, length })),
      ...tieBackChecks(context, zone, strip),
    ])
}

const headOf = ({ id }: Zone, clause: Clause): Head => ({
  zoneId: id,
  family: 'joint',
  name: '',
  plane: 'plan',
  stage: null,
  limitKind: 'C',
  clause,
  notes: [],
})

// Strip and bars across it -------------------------------------------------------------------------------------------

interface Place {
  readonly strip: JointStrip
  readonly length: StripLength
}

function barsCheck(context: CheckContext, zone: Zone, { strip, length }: Place): Compared {
  const { index, basis } = context
  const { governing, fromBulbs, fromBond } = length
  const shapes = barsAt(index, zone)
  const place = placeOf(index, strip, { at: governing.at, shapes })
  const demand = crackDemand(context, place)
  const sets = shapes.flatMap((shape) => barsOver(context, { shape, strip, length, place }))
  const frame = found(index.frames, strip.first.id, 'edge')
  const steel = steelAcross(sets, length.to - length.from, spareMats(place.pour, frame))
  const lap = lapStep(lapOf(basis, place, { diameter: place.diameter ?? demand.diameter, layers: 'both' }))
  const width = widthStep(governing)
  const needed = neededStep(governing, lap)
  const stated =
    `The strip is ${whole(governing.width)} wide, deepest at chainage ${whole(governing.at)}: ${whole(governing.first)} on the side ` +
    `of ${strip.first.mark}, ${whole(governing.second)} on that of ${strip.second.mark}. Bars across it lap on both sides: ` +
    `${whole(needed.value)} long about the joint.`
  const bond =
    fromBond && fromBond.width > fromBulbs.width
      ? [
          `From the bulbs of bonded dead ends it would be ${whole(fromBulbs.width)} wide; from the end of their bond counts.`,
        ]
      : []
  return byRatio(
    context,
    {
      ...headOf(zone, demand.rule?.clause ?? STRIP),
      name: `Bars across the joint, ${placeName(index, length)}`,
      notes: [stated, ...bond, ...crossingNotes(index, strip), ...demand.notes, ...steel.notes],
    },
    {
      demand: demand.rule?.areaPerMetre ?? 0,
      limit: steel.perMetre,
      unit: 'mm2/m',
      steps: [width, lap, needed, ...(demand.rule?.steps ?? []), ...steel.steps],
      readings: [basis.jointReading, demand.choice.readingId],
    },
  )
}

const widthStep = ({ first, second }: StripLength['governing']): Step =>
  step(
    {
      symbol: 'w',
      meaning: 'Width of the strip without precompression, both sides',
      formula: 'd1 + d2',
      unit: 'mm',
      clause: STRIP,
    },
    { d1: first, d2: second },
    (v) => v.d1 + v.d2,
  )

const lapStep = (lap: number): Step =>
  step(
    { symbol: 'l0', meaning: 'Lap of a bar across', formula: 'lap', unit: 'mm', clause: PLACED },
    { lap },
    (v) => v.lap,
  )

/** Bars lie with their middle at the joint, so that the deeper side sets both. */
const neededStep = ({ first, second }: StripLength['governing'], lap: Step): Step =>
  step(
    {
      symbol: 'lBar',
      meaning: 'Length of a bar across, its middle at the joint',
      formula: '2 * (max(d1, d2) + l0)',
      unit: 'mm',
      clause: PLACED,
    },
    { d1: first, d2: second, l0: lap.value },
    (v) => 2 * (Math.max(v.d1, v.d2) + v.l0),
  )

const barsAt = (index: LayoutIndex, { id }: Zone): PlacedBarsShape[] =>
  (index.steelOfZone.get(id) ?? []).flatMap(({ shape }) =>
    shape.kind === 'lap-bars' || shape.kind === 'tie-back-bars' ? [shape] : [],
  )

/** The section on the side of the thicker pour counts for both. */
function placeOf(
  index: LayoutIndex,
  { first, second }: JointStrip,
  { at, shapes }: { readonly at: number; readonly shapes: readonly PlacedBarsShape[] },
): CrackPlace {
  const diameters = shapes.map(({ diameter }) => diameter)
  const sides = [first, second].map(({ id, pourId }): CrackPlace => {
    const pour = found(index.pours, pourId, 'pour')
    const frame = found(index.frames, id, 'edge')
    const section = sectionBehind(pour, { frame, chainage: at, depth: 1 })
    return {
      pour,
      thickness: Math.min(pour.thickness, section.top - section.soffit),
      cover: Math.max(pour.coverTop, pour.coverSoffit),
      diameter: diameters.length === 0 ? null : Math.max(...diameters),
    }
  })
  return sides.reduce((thicker, side) => (side.thickness > thicker.thickness ? side : thicker))
}

/** The bars of a set within a length of the joint; they are spread at their pitch about the middle of the joint. */
function barsOver(
  { index, basis }: CheckContext,
  of: Place & { readonly shape: PlacedBarsShape; readonly place: CrackPlace },
): BarsAcross[] {
  const { shape, strip, length, place } = of
  const bars = countBetween(index, { strip, shape, from: length.from, to: length.to })
  if (bars === 0) return []
  const { first, second } = length.governing
  return [
    {
      diameter: shape.diameter,
      bars,
      past: shape.length / 2 - Math.max(first, second),
      pastNeeded: lapOf(basis, place, shape),
    },
  ]
}

function countBetween(
  index: LayoutIndex,
  of: { readonly strip: JointStrip; readonly shape: PlacedBarsShape; readonly from: number; readonly to: number },
): number {
  const { strip, shape, from, to } = of
  const { first, second } = strip
  const frames = [first, second].map(({ id }) => found(index.frames, id, 'edge'))
  const [start, end] = [Math.max(...frames.map((one) => one.from)), Math.min(...frames.map((one) => one.to))]
  const zero = (start + end) / 2 - ((shape.count - 1) * shape.pitch) / 2
  const places = Array.from({ length: shape.count }, (_, i) => zero + i * shape.pitch)
  const within = places.filter((place) => place >= from - ROUNDING && place < to - ROUNDING).length
  return within * (shape.layers === 'both' ? 2 : 1)
}

/** Tendons that run through the joint in a beam are not counted on either side of it. */
function crossingNotes(index: LayoutIndex, { first, second }: JointStrip): string[] {
  const through = index.layout.tendons.filter(({ id }) => {
    const pours = (index.anchorsOfTendon.get(id) ?? []).map(({ edgeId, panId }) => {
      const edge = edgeId === null ? undefined : index.edges.get(edgeId)
      return edge?.pourId ?? index.pans.get(panId ?? '')?.pourId
    })
    return pours.includes(first.pourId) && pours.includes(second.pourId)
  })
  if (through.length === 0) return []
  return [
    `Not counted, for they end at neither side of the joint: tendons ${through.map(({ mark }) => mark).join(', ')}.`,
  ]
}

function placeName(index: LayoutIndex, { gap }: StripLength): string {
  const [after, before] = [gap.after, gap.before].map((end) => end && anchorMark(index, end.anchor))
  return `${after ?? 'start'} to ${before ?? 'end'}`
}

// Tie-back -----------------------------------------------------------------------------------------------------------

interface Tied {
  readonly anchor: Anchor
  readonly force: Step
  readonly rule: TieRule | null
  readonly provided: number
  readonly steps: readonly Step[]
}

/**
 * An anchor of the pour cast first is stressed against a free face: nothing behind it to tie. Once the second pour is
 * there and stressed, concrete stands behind every anchor at the joint and is pulled by it.
 */
function tieBackChecks(context: CheckContext, zone: Zone, strip: JointStrip): Compared[] {
  const { index, basis } = context
  const later = found(index.pours, strip.second.pourId, 'pour').mark
  const sides = [strip.first, strip.second].map(({ id }) => index.anchorsOfEdge.get(id) ?? [])
  const [first = [], both] = [sides[0], sides.flat()]
  const stages = [
    {
      anchors: first.filter(({ stressedWithPourId }) => stressedWithPourId !== strip.second.pourId),
      stage: `before pour ${later} is stressed`,
      isTied: false,
      note: `Anchors of pour ${found(index.pours, strip.first.pourId, 'pour').mark} are stressed against a free face: no concrete behind them is pulled yet.`,
    },
    {
      anchors: both,
      stage: `after pour ${later} is stressed`,
      isTied: true,
      note: 'Concrete now stands behind every anchor at the joint: each is tied back like one inside the slab.',
    },
  ]
  return stages.flatMap(({ anchors, stage, isTied, note }) => {
    const tied = anchors.map((anchor) => tieOf(context, { zone, strip, anchor, isTied }))
    const worst = worstOf(tied)
    if (!worst) return []
    const title = `Tie behind ${anchorMark(index, worst.anchor)}, the worst of ${anchors.length} anchors.`
    return [
      byRatio(
        context,
        {
          ...headOf(zone, worst.rule?.clause ?? STRIP),
          name: 'Tie-back across the joint',
          stage,
          notes: [note, ...(isTied ? [title, ...besideNotes(context, worst.force.value)] : [])],
        },
        {
          demand: worst.rule?.area ?? 0,
          limit: worst.provided,
          unit: 'mm2',
          steps: isTied ? worst.steps : [],
          readings: isTied ? [basis.tieBack.readingId, basis.jointReading] : [basis.jointReading],
        },
      ),
    ]
  })
}

function tieOf(
  context: CheckContext,
  of: { readonly zone: Zone; readonly strip: JointStrip; readonly anchor: Anchor; readonly isTied: boolean },
): Tied {
  const { index, basis } = context
  const { zone, strip, anchor, isTied } = of
  const force = anchorageForce(index, anchor)
  const last = force.steps.at(-1) ?? forceStep(force.value)
  const rule = isTied ? basis.tieBack.rule({ P: force.value, own: null }) : null
  const shapes = barsAt(index, zone)
  const place = placeOf(index, strip, { at: anchor.chainage, shapes })
  const range = halfGaps(index, anchor)
  const sets = shapes.map((shape) => ({
    diameter: shape.diameter,
    bars: countBetween(index, { strip, shape, ...range }),
    past: shape.length / 2 - anchor.setBack,
    pastNeeded: anchorageOf(basis, place, shape),
  }))
  const width = range.to - range.from
  const steel = steelAcross(
    sets.filter(({ bars }) => bars > 0),
    width,
    null,
  )
  const provided = step(
    {
      symbol: 'AsTie',
      meaning: 'Bars across between half the gaps beside the anchor',
      formula: 'AsAcross * b / 1000',
      unit: 'mm2',
      clause: PLACED,
    },
    { AsAcross: steel.perMetre, b: width },
    (v) => (v.AsAcross * v.b) / 1000,
  )
  return {
    anchor,
    force: last,
    rule,
    provided: provided.value,
    steps: [...force.steps, ...(rule?.steps ?? []), ...steel.steps, provided],
  }
}

const forceStep = (value: number): Step =>
  step(
    { symbol: 'P', meaning: 'Force while jacking', formula: 'P', unit: 'N', clause: STRIP },
    { P: value },
    (v) => v.P,
  )

/** Half-way to the anchors beside it in its own pour, or to the end of the edge. */
function halfGaps(
  index: LayoutIndex,
  { id, edgeId, chainage }: Anchor,
): { readonly from: number; readonly to: number } {
  const frame = found(index.frames, edgeId ?? '', 'edge')
  const others = (index.anchorsOfEdge.get(edgeId ?? '') ?? []).filter((other) => other.id !== id)
  const before = others.findLast((other) => other.chainage < chainage)
  const after = others.find((other) => other.chainage > chainage)
  return {
    from: before ? (before.chainage + chainage) / 2 : frame.from,
    to: after ? (chainage + after.chainage) / 2 : frame.to,
  }
}

function worstOf(tied: readonly Tied[]): Tied | undefined {
  const ratio = ({ rule, provided }: Tied) => (provided > 0 ? (rule?.area ?? 0) / provided : Infinity)
  const isWorse = (one: Tied, other: Tied) =>
    ratio(one) > ratio(other) || (ratio(one) === ratio(other) && (one.rule?.area ?? 0) > (other.rule?.area ?? 0))
  return tied.reduce<Tied | undefined>((worst, one) => (worst && !isWorse(one, worst) ? worst : one), undefined)
}

const besideNotes = ({ basis }: CheckContext, P: number): string[] =>
  basis.tieBack
    .beside(P)
    .map(
      ({ title, force, clause }) =>
        `Beside it, ${title}: ${whole(force / 1000)} kN (${clause.source} ${clause.section}).`,
    )

const whole = (value: number): string => String(Math.round(value))
