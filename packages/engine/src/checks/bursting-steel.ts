/** Steel that bursting asks for against steel counted in the window, for one anchor or several that act as one. */

import type { AnchorSite } from '../anchor-site'
import type { Basis, TieRule, Window } from '../bases/basis'
import { stageForce } from '../force'
import type { Stage } from '../model'
import type { Compared } from '../result'
import { countSteel, setsAcross, type Counted, type SetAcross } from '../steel/count'
import { countPlaceOf } from '../steel/count-place'
import type { CountPlace, Plane } from '../steel/crossings'
import { steelOfAnchor } from '../steel/steel-of-anchor'
import { step, type Clause, type Step } from '../step'
import { byRatio, type CheckContext, type Head } from './outcome'
import type { Prism } from './prism'

const STATICS: Clause = { source: 'Statics', section: 'sum of forces', tag: 'derived' }

/** Where steel counts behind a prism at a stage, with the lines that lead to it. */
export interface WindowAt {
  readonly window: Window
  readonly steps: readonly Step[]
}

export interface Asked {
  readonly context: CheckContext
  readonly plane: Plane
  /** One, or all that act as one: their forces add up and their steel is counted together. */
  readonly members: readonly [AnchorSite, ...AnchorSite[]]
  /** Where the plane stands, along the edge and in height. */
  readonly centre: { readonly chainage: number; readonly height: number }
  readonly prisms: readonly Prism[]
  readonly windowAt: (prism: Prism, stage: Stage) => WindowAt
  readonly notes: readonly string[]
  readonly readings: readonly string[]
  /** What the result rests on; null takes that of the basis's own rule. */
  readonly clause: Clause | null
}

interface Answer {
  readonly stage: Stage
  readonly prism: Prism
  readonly rule: TieRule
  readonly window: Window
  readonly counted: Counted
  readonly steps: readonly Step[]
}

/** The worst of all prisms and stages is the answer; what the other prisms give is said in notes. */
export function burst(asked: Asked, head: Head): Compared {
  const { context, members, prisms, notes, readings } = asked
  const { stages } = members[0].pour
  const behind = behindOf(asked)
  const answers = prisms.map((prism) => worst(stages.map((stage) => answerOf({ asked, prism, stage, behind }))))
  const governing = worst(answers)
  const others = answers.filter((answer) => answer !== governing)
  const face = faceNote(governing)
  const result = byRatio(
    context,
    {
      ...head,
      stage: governing.stage.name,
      clause: asked.clause ?? governing.rule.clause,
      notes: [
        ...restsOn(context.basis, readings),
        ...governing.rule.notes,
        ...others.map((answer) => otherNote(answer, governing, asked.plane)),
        ...notes,
        ...new Set(members.flatMap(({ force }) => force.notes)),
        ...behind.notes,
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

/** Steel behind the members, each set at its distance from the plane; bars that run along the edge once. */
interface Behind {
  readonly sets: readonly SetAcross[]
  readonly place: CountPlace
  readonly notes: readonly string[]
}

function behindOf({ context, members, plane, centre }: Asked): Behind {
  const [lead, ...rest] = members
  const sets = members.flatMap((site) => {
    const steel = steelOfAnchor(context.index, site)
    const { chainage, height } = site.anchor
    const aside = plane === 'plan' ? Math.abs(chainage - centre.chainage) : Math.abs(height - centre.height)
    const own = site === lead ? steel.shapes : steel.shapes.filter(({ kind }) => kind !== 'edge-bars')
    return [{ shapes: own, aside, notes: steel.notes }]
  })
  const setBack = rest.reduce((most, { anchor }) => Math.max(most, anchor.setBack), lead.anchor.setBack)
  const place = { ...countPlaceOf(lead), chainage: centre.chainage, setBack }
  return {
    sets: setsAcross({
      plane,
      place,
      shapes: sets.flatMap(({ shapes }) => shapes),
      asides: sets.flatMap(({ shapes, aside }) => shapes.map(() => aside)),
    }),
    place,
    notes: [...new Set(sets.flatMap(({ notes }) => notes))],
  }
}

function answerOf(of: {
  readonly asked: Asked
  readonly prism: Prism
  readonly stage: Stage
  readonly behind: Behind
}): Answer {
  const { asked, prism, stage, behind } = of
  const { basis } = asked.context
  const forces = forceSteps(asked.members)
  const force = stageForce(forces.at(-1)?.value ?? 0, stage)
  const rule = basis.tie({ P: force.value, a: prism.a, b: prism.b.value })
  const { window, steps } = asked.windowAt(prism, stage)
  const counted = countSteel({
    plane: asked.plane,
    window,
    place: behind.place,
    sets: behind.sets,
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
  return { stage, prism, rule, window, counted, steps: [...forces, force, prism.b, ...rule.steps, ...steps] }
}

/** The last step holds the force, all stages done, N. */
function forceSteps(members: Asked['members']): readonly Step[] {
  const [first, ...rest] = members
  if (rest.length === 0) return first.force.steps
  const values = Object.fromEntries(members.map(({ force }, i) => [`P${i + 1}`, force.value]))
  const line = { symbol: 'Pjack', meaning: 'Forces of the anchors together', unit: 'N', clause: STATICS }
  return [
    step({ ...line, formula: Object.keys(values).join(' + ') }, values, (v) =>
      Object.values(v).reduce((sum, value) => sum + value, 0),
    ),
  ]
}

const ratioOf = ({ rule, counted }: Answer): number => (counted.area > 0 ? rule.area / counted.area : Infinity)

/** By ratio; without any steel by the area asked for, so that the last stage is the one that shows. */
function worst(answers: readonly Answer[]): Answer {
  return answers.reduce((one, other) => {
    const [a, b] = [ratioOf(one), ratioOf(other)]
    return b > a || (a === b && other.rule.area >= one.rule.area) ? other : one
  })
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

const whole = (value: number): string => String(Math.round(value))

function otherNote({ prism, rule, counted }: Answer, governing: Answer, plane: Plane): string {
  const numbers = `${whole(rule.area)} mm2 asked for, ${whole(counted.area)} mm2 counted`
  const why =
    plane === 'plan'
      ? 'both are checked, for the next pour may be there or not'
      : 'so that moving towards a face is no gain'
  return `By the ${prism.title} (${whole(prism.b.value)}) alone: ${numbers}. The ${governing.prism.title} governs, ${why}.`
}

/** The reading asks for the same intensity from the face to the window; null where it is there. */
function faceNote({ rule, counted, window: { from, to } }: Answer): string | null {
  const asked = (rule.area * from) / (to - from)
  if (counted.isCarriedToFace || counted.beforeWindow >= asked) return null
  const numbers = `${whole(asked)} mm2 over the first ${whole(from)}, ${whole(counted.beforeWindow)} mm2 there`
  return `The steel does not go on to the face with the same intensity: ${numbers}.`
}
