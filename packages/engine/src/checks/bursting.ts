/** Bursting behind a live anchor, in the thickness and in plan: steel asked for against steel counted in the window. */

import { whyNoRule, type AnchorSite } from '../anchor-site'
import type { Basis, TieRule } from '../bases/basis'
import type { CloseGroup } from '../close-anchors'
import { jackingForce, stageForce } from '../force'
import { found } from '../layout-index'
import type { Stage } from '../model'
import type { Check, Compared } from '../result'
import { sectionStepNear, type SectionStep } from '../section-step'
import type { Step } from '../step'
import { countSteel, type Counted } from '../steel/count'
import type { CountPlace, Plane } from '../steel/crossings'
import { steelOfAnchor } from '../steel/steel-of-anchor'
import { anchorMark } from '../zones'
import { byRatio, refusal, type CheckContext, type Head } from './outcome'
import { planNotes, planPrisms, thicknessPrisms, type Prism } from './prism'

/** Within this share of plate to prism the prism rule follows elastic theory within about 8 % (computed). */
const RATIO_MIN = 0.1
const RATIO_MAX = 0.8
/** Above it, and off centre, the prism rule is low: by 16 % at 0.70 and 40 % at 0.90 (computed). */
const ECCENTRIC_RATIO_MAX = 0.6

interface Asked {
  readonly site: AnchorSite
  readonly context: CheckContext
  readonly plane: Plane
  readonly prisms: readonly Prism[]
  readonly notes: readonly string[]
  /** Beside those that every bursting check rests on. */
  readonly readings: readonly string[]
}

/** Bursting through the thickness; refused beside a step in depth and where anchors act as one. */
export function checkBurstingThickness(site: AnchorSite, context: CheckContext, close: readonly CloseGroup[]): Check {
  const head = headOf(site, 'thickness', context)
  const depth = site.top - site.soffit
  const outside = whyNoRule(site)
  if (outside) return refusal(head, { code: 'OUTSIDE_METHOD', ...outside })
  const group = groupOf(site, head, close)
  if (group) return actsAsOne(site, { head, group, context })
  const change = sectionStepNear(site, depth)
  if (change) return refusal(head, { code: 'DEPTH_CHANGE', field: 'chainage', message: changeMessage(change, depth) })
  if (Math.abs(site.anchor.elevation) > context.basis.inclinationMax.value) {
    return tooInclined(head, 'elevation', site.anchor.elevation)
  }
  const { own, middle } = thicknessPrisms(site)
  if (own.a >= own.b.value) return noPrism(head, own, 'height')
  const isAlone = middle !== null && countsAlone(own, context)
  const prisms = middle === null || isAlone ? [own] : [own, middle]
  const notes = [...ratioNotes(own, middle !== null), ...inclinedNotes(site.anchor.elevation, 'in height')]
  const readings = isAlone ? [context.basis.ownPrismReading.id] : []
  return burst({ site, context, plane: 'thickness', prisms, notes, readings }, head)
}

/** Bursting in plan; refused where anchors act as one. */
export function checkBurstingPlan(site: AnchorSite, context: CheckContext, close: readonly CloseGroup[]): Check {
  const head = headOf(site, 'plan', context)
  const outside = whyNoRule(site)
  if (outside) return refusal(head, { code: 'OUTSIDE_METHOD', ...outside })
  const group = groupOf(site, head, close)
  if (group) return actsAsOne(site, { head, group, context })
  if (Math.abs(site.anchor.skew) > context.basis.inclinationMax.value) {
    return tooInclined(head, 'skew', site.anchor.skew)
  }
  const { own, acrossBoundary } = planPrisms(site)
  const prisms = acrossBoundary === null ? [own] : [own, acrossBoundary]
  const tooSmall = prisms.find(({ a, b }) => a >= b.value)
  if (tooSmall) return noPrism(head, tooSmall, 'chainage')
  const notes = [
    ...ratioNotes(own, false),
    ...inclinedNotes(site.anchor.skew, 'in plan'),
    ...planNotes(site, own),
    ...stepNotes(site),
  ]
  return burst({ site, context, plane: 'plan', prisms, notes, readings: [] }, head)
}

function headOf(site: AnchorSite, plane: Plane, { basis }: CheckContext): Head {
  return {
    zoneId: `anchor:${site.anchor.id}`,
    family: plane === 'plan' ? 'bursting-plan' : 'bursting-thickness',
    name: plane === 'plan' ? 'Bursting in plan' : 'Bursting in the thickness',
    plane,
    stage: null,
    limitKind: 'C',
    clause: basis.clauses.tie,
    notes: [],
  }
}

/** Whether an accepted reading lets the own prism count alone, within that reading's range. */
const countsAlone = ({ a, b }: Prism, { basis }: CheckContext): boolean =>
  basis.isAccepted(basis.ownPrismReading.id) && a <= basis.ownPrismReading.ratioMax * b.value

// Demand against steel ----------------------------------------------------------------------------------------------

interface Answer {
  readonly stage: Stage
  readonly prism: Prism
  readonly rule: TieRule
  readonly counted: Counted
  readonly steps: readonly Step[]
}

/** The worst of all prisms and stages is the answer; what the other prisms give is said in notes. */
function burst(asked: Asked, head: Head): Compared {
  const { site, context, prisms, notes } = asked
  const { basis } = context
  const steel = steelOfAnchor(context.index, site)
  const place = placeOf(site)
  const answers = prisms.map((prism) =>
    worst(site.pour.stages.map((stage) => answerOf({ asked, prism, stage, place, shapes: steel.shapes }))),
  )
  const governing = worst(answers)
  const others = answers
    .filter((answer) => answer !== governing)
    .map((answer) => otherNote(answer, governing, asked.plane))
  const face = faceNote(governing, basis.window(governing.prism.b.value))
  const readings = [basis.windowReading, basis.steelReading, ...asked.readings].filter((id) => id !== null)
  const result = byRatio(
    context,
    {
      ...head,
      stage: governing.stage.name,
      clause: governing.rule.clause,
      notes: [
        ...restsOn(basis, readings),
        ...governing.rule.notes,
        ...others,
        ...notes,
        ...steel.notes,
        ...governing.counted.notes,
        ...(face === null ? [] : [face]),
      ],
    },
    {
      demand: governing.rule.area,
      limit: governing.counted.area,
      unit: 'mm2',
      steps: [...governing.steps, ...governing.counted.steps],
      readings,
    },
  )
  return face === null ? result : judged(result)
}

const restsOn = (basis: Basis, readings: readonly string[]): readonly string[] =>
  readings.length === 0 ? [] : [`Rests on these readings: ${readings.map((id) => titleOf(basis, id)).join('; ')}.`]

const titleOf = ({ readings }: Basis, readingId: string): string =>
  readings.find(({ id }) => id === readingId)?.title ?? readingId

function answerOf(of: {
  readonly asked: Asked
  readonly prism: Prism
  readonly stage: Stage
  readonly place: CountPlace
  readonly shapes: Parameters<typeof countSteel>[0]['shapes']
}): Answer {
  const { asked, prism, stage, place, shapes } = of
  const { basis } = asked.context
  const jacking = jackingForce(asked.site.tendon, asked.site.strand)
  const force = stageForce(jacking.value, stage)
  const rule = basis.tie({ P: force.value, a: prism.a, b: prism.b.value })
  const counted = countSteel({
    plane: asked.plane,
    window: basis.window(prism.b.value),
    place,
    shapes,
    anchorageOf: (diameter) =>
      basis.anchorage({
        diameter,
        strength: stage.strength,
        stress: rule.stress,
        cd: null,
        isGoodBond: basis.isGoodBond(place.depth),
        isBent: false,
      }),
  })
  return { stage, prism, rule, counted, steps: [jacking, force, prism.b, ...rule.steps] }
}

const ratioOf = ({ rule, counted }: Answer): number => (counted.area > 0 ? rule.area / counted.area : Infinity)

/** By ratio; without any steel by the area asked for, so that the last stage is the one that shows. */
function worst(answers: readonly Answer[]): Answer {
  return answers.reduce((one, other) => {
    const [a, b] = [ratioOf(one), ratioOf(other)]
    return b > a || (a === b && other.rule.area >= one.rule.area) ? other : one
  })
}

function placeOf({ anchor, frame, hardware, pour, top, soffit }: AnchorSite): CountPlace {
  return {
    chainage: anchor.chainage,
    edgeFrom: frame.from,
    edgeTo: frame.to,
    breaks: frame.steps,
    cover: pour.coverEdge,
    setBack: anchor.setBack,
    plateWidth: hardware.plate.width,
    depth: top - soffit,
    azimuth: frame.outwardAzimuth,
    mats: pour.mats,
  }
}

/** A result whose steel does not go on to the face is for an engineer to judge, however much is counted. */
function judged(result: Compared): Compared {
  const isMet = (status: Compared['status']) => status === 'within' || status === 'near'
  return {
    ...result,
    status: isMet(result.status) ? 'needs-judgement' : result.status,
    statusOnceAccepted: isMet(result.statusOnceAccepted) ? 'needs-judgement' : result.statusOnceAccepted,
  }
}

// Notes and refusals ------------------------------------------------------------------------------------------------

const whole = (value: number): string => String(Math.round(value))
const degrees = (angle: number): string => String(Math.round((angle * 1800) / Math.PI) / 10)

function otherNote({ prism, rule, counted }: Answer, governing: Answer, plane: Plane): string {
  const numbers = `${whole(rule.area)} mm2 asked for, ${whole(counted.area)} mm2 counted`
  const why =
    plane === 'plan'
      ? 'both are checked, for the next pour may be there or not'
      : 'so that moving towards a face is no gain'
  return `By the ${prism.title} (${whole(prism.b.value)}) alone: ${numbers}. The ${governing.prism.title} governs, ${why}.`
}

function ratioNotes({ a, b }: Prism, isEccentric: boolean): readonly string[] {
  const ratio = a / b.value
  const said = `The plate takes ${ratio.toFixed(2)} of its prism`
  if (isEccentric && ratio > ECCENTRIC_RATIO_MAX) {
    return [`${said} and stands off centre: the prism rule is low there, by 16 % at 0.70 and 40 % at 0.90 (computed).`]
  }
  if (ratio >= RATIO_MIN && ratio <= RATIO_MAX) return []
  return [`${said}, outside 0.1 to 0.8, where the rule follows elastic theory within about 8 % (computed).`]
}

/** In plan a step of depth does not refuse the rule, but the reader must know of it. */
function stepNotes(site: AnchorSite): readonly string[] {
  const change = sectionStepNear(site, site.top - site.soffit)
  if (!change) return []
  return [
    `A step in depth stands ${whole(change.distance)} from the anchor; the rule in plan takes the section as constant.`,
  ]
}

function inclinedNotes(angle: number, how: string): readonly string[] {
  if (angle === 0) return []
  return [`The tendon stands ${degrees(Math.abs(angle))} degrees out of square ${how}; the rule takes it as square.`]
}

/** The reading asks for the same intensity from the face to the window; null where it is there. */
function faceNote({ rule, counted }: Answer, { from, to }: { from: number; to: number }): string | null {
  const asked = (rule.area * from) / (to - from)
  if (counted.isCarriedToFace || counted.beforeWindow >= asked) return null
  const numbers = `${whole(asked)} mm2 over the first ${whole(from)}, ${whole(counted.beforeWindow)} mm2 there`
  return `The steel does not go on to the face with the same intensity: ${numbers}.`
}

const groupOf = ({ anchor }: AnchorSite, { plane }: Head, close: readonly CloseGroup[]): CloseGroup | undefined =>
  close.find((group) => group.plane === plane && group.anchorIds.includes(anchor.id))

function actsAsOne(site: AnchorSite, of: { head: Head; group: CloseGroup; context: CheckContext }): Check {
  const { index } = of.context
  const others = of.group.anchorIds.filter((id) => id !== site.anchor.id)
  const marks = others.map((id) => anchorMark(index, found(index.anchors, id, 'anchor'))).join(', ')
  const below = of.group.steps.at(-1)?.value
  const distance = below === undefined ? '' : ` (closer than ${whole(below)})`
  return refusal(of.head, {
    code: 'ANCHORS_ACT_AS_ONE',
    field: of.group.plane === 'plan' ? 'chainage' : 'height',
    message: `Acts as one with ${marks}${distance}: the rule for a single anchor does not hold, and groups are not yet checked.`,
  })
}

const noPrism = (head: Head, { a, b }: Prism, field: string) =>
  refusal(head, {
    code: 'OUTSIDE_METHOD',
    field,
    message: `The plate (${whole(a)}) must be smaller than its prism (${whole(b.value)}). Move the anchor or choose a smaller plate.`,
  })

const tooInclined = (head: Head, field: string, angle: number) =>
  refusal(head, {
    code: 'OUTSIDE_METHOD',
    field,
    message: `The tendon stands ${degrees(Math.abs(angle))} degrees out of square; the rule is used up to 20 degrees.`,
  })

function changeMessage({ where, distance, topBeyond, soffitBeyond }: SectionStep, depth: number): string {
  const beyond = topBeyond - soffitBeyond
  const place = where === 'behind' ? 'behind the bearing face' : 'beside the plate along the edge'
  return (
    `The section changes from ${whole(depth)} to ${whole(beyond)} deep ${whole(distance)} ${place}, within one prism ` +
    `length (${whole(depth)}): the rule for a constant section does not hold. The smaller section's prism is ` +
    `${whole(Math.min(depth, beyond))}; the re-entrant corner there needs a model of its own.`
  )
}
