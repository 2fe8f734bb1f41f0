/** Access for the jack: in a pan as a body in plan and height, at an edge by the clear room in front of it. */

import { found, type LayoutIndex } from '../layout-index'
import type { Anchor, Jack } from '../model'
import { panPlace, slabBeyond, type PanAnchor, type PanPlace } from '../pan-place'
import { ahead, nextRecess } from '../pan-room'
import type { Advice, Check, Compared } from '../result'
import { statusOfDistance } from '../status'
import { step, type Clause } from '../step'
import { isMet, jackClause, jackLength, jackNeeds, type JackNeed } from './jack-fit'
import { comparison, refusal, type Head } from './outcome'

const GEOMETRY: Clause = { source: 'Geometry', section: 'recess against concrete and openings', tag: 'derived' }
const IN_FRONT: Clause = { source: 'Common practice', section: 'room in front of a pan', tag: 'practice' }
const APART: Clause = { source: 'Common practice', section: 'pans apart', tag: 'practice' }

const USUAL_IN_FRONT = { least: 500, most: 1000 }
const USUAL_APART = 300
/** With this much room in front of an edge every usual jack finds its place (common practice: 900 to 1500), mm. */
const USUAL_AT_EDGE = { least: 900, most: 1500 }

const headOf = (zoneId: string, name: string, clause: Clause): Head => ({
  zoneId,
  family: 'pan-access',
  name,
  plane: null,
  stage: null,
  limitKind: 'H',
  clause,
  notes: [],
})

// In a pan ------------------------------------------------------------------------------------------------------------

/** The jack's comparisons in a pan, its recess in the slab, and what is usual in front of it. */
export function panAccessChecks(index: LayoutIndex, panId: string): Check[] {
  const place = panPlace(index, panId)
  return [...jackChecks(index, place), insideSlab(place), ...apart(index, place), inFront(index, place)]
}

function jackChecks(index: LayoutIndex, place: PanPlace): Check[] {
  const zoneId = `pan:${place.pan.id}`
  const { at, jack } = place
  if (!at) {
    const message = `No live anchor stands in ${place.pan.mark}: the jack has nothing to pull. Add its anchor.`
    return [
      refusal(headOf(zoneId, 'Room along the jack', GEOMETRY), { code: 'MISSING_INPUT', field: 'pan.anchor', message }),
    ]
  }
  const fitting = jacksThatFit(index, place, at)
  if (!jack) return [withoutJack(index, { place, at, fitting })]
  const needs = jackNeeds(index, { place, at, jack }).map((need) => jackCheck(need, { zoneId, jack, fitting }))
  return place.pan.headroom === null ? [...needs, noHeadroom(place, jack)] : needs
}

/** The jacks of the job that would meet every comparison that can be made here. */
function jacksThatFit(index: LayoutIndex, place: PanPlace, at: PanAnchor): readonly Jack[] {
  return index.layout.jacks.filter((jack) => jackNeeds(index, { place, at, jack }).every(isMet))
}

interface Chosen {
  readonly zoneId: string
  readonly jack: Jack
  readonly fitting: readonly Jack[]
}

/** Short for the chosen jack: over where another of the job's would do, a stop where none would. */
function jackCheck(need: JackNeed, { zoneId, jack, fitting }: Chosen): Compared {
  const { demand, limit, unit, steps, compares } = need
  const spare = compares === 'at-most' ? limit - demand : demand - limit
  const alone = statusOfDistance(spare, need.isClearance ? demand : undefined)
  const status = alone === 'over' && fitting.length === 0 ? 'stop' : alone
  const notes = status === 'within' ? need.notes : [...need.notes, otherJacks(fitting)]
  return comparison(
    { ...headOf(zoneId, need.name, jackClause(jack)), notes },
    { demand, limit, unit, steps },
    { compares, status, statusOnceAccepted: status, utilisation: null, spare, readingIds: [], mend: null },
  )
}

function otherJacks(fitting: readonly Jack[]): string {
  if (fitting.length === 0) return 'No jack of the job fits here.'
  return `Of the job's jacks these fit here: ${fitting.map(({ name }) => name).join(', ')}.`
}

/** Without a jack the room is held against the shortest of the job that fits, or else of all; it needs judgement. */
function withoutJack(
  index: LayoutIndex,
  of: { readonly place: PanPlace; readonly at: PanAnchor; readonly fitting: readonly Jack[] },
): Check {
  const { place, at, fitting } = of
  const zoneId = `pan:${place.pan.id}`
  const all = index.layout.jacks
  const [shortest] = [...(fitting.length > 0 ? fitting : all)].sort((a, b) => jackLength(a).value - jackLength(b).value)
  if (!shortest) {
    const message = `${place.pan.mark} has no jack and the job holds none. Add the jack that stresses here.`
    return refusal(headOf(zoneId, 'Room along the jack', GEOMETRY), {
      code: 'MISSING_INPUT',
      field: 'pan.jackId',
      message,
    })
  }
  const [room] = jackNeeds(index, { place, at, jack: shortest })
  const { demand, limit, steps } = room ?? { demand: 0, limit: jackLength(shortest).value, steps: [] }
  const status = fitting.length === 0 ? 'stop' : 'needs-judgement'
  const note = `No jack is chosen; measured for ${shortest.name}, the shortest that comes into question.`
  return comparison(
    { ...headOf(zoneId, 'Room along the jack', jackClause(shortest)), notes: [note, otherJacks(fitting)] },
    { demand, limit, unit: 'mm', steps },
    {
      compares: 'at-least',
      status,
      statusOnceAccepted: status,
      utilisation: null,
      spare: demand - limit,
      readingIds: [],
      mend: null,
    },
  )
}

function noHeadroom({ pan }: PanPlace, jack: Jack): Check {
  const message = `The clear height above the slab at ${pan.mark} is not given; jack ${jack.name} needs ${jack.roomAbove} above it.`
  const head = headOf(`pan:${pan.id}`, 'Headroom above the slab', jackClause(jack))
  return refusal(head, { code: 'MISSING_INPUT', field: 'pan.headroom', message })
}

/** A recess that runs out of the slab is outside the concrete: a stop. */
function insideSlab(place: PanPlace): Compared {
  const { pan } = place
  const demand = Math.min(slabBeyond(place), pan.along * 100)
  const spare = demand - pan.along
  const status = spare < 0 ? statusOfDistance(spare, 0) : 'within'
  return comparison(
    { ...headOf(`pan:${pan.id}`, 'Slab in front of the bearing face', GEOMETRY), limitKind: 'C' },
    { demand, limit: pan.along, unit: 'mm', steps: [] },
    { compares: 'at-least', status, statusOnceAccepted: status, utilisation: null, spare, readingIds: [], mend: null },
  )
}

/** Two recesses in one place are a stop; how far apart they usually are is advice. */
function apart(index: LayoutIndex, place: PanPlace): Check[] {
  const next = nextRecess(index, place)
  if (!next) return []
  const head = headOf(`pan:${place.pan.id}`, `Clear to ${next.name}`, GEOMETRY)
  const status = statusOfDistance(next.distance, next.distance)
  const advice: Advice = {
    ...head,
    kind: 'advice',
    limitKind: 'P',
    clause: APART,
    measured: next.distance,
    usual: `${USUAL_APART} or more`,
    unit: 'mm',
    isUsual: next.distance >= USUAL_APART,
  }
  const clear = comparison(
    { ...head, limitKind: 'C' },
    { demand: next.distance, limit: 0, unit: 'mm', steps: [] },
    {
      compares: 'at-least',
      status,
      statusOnceAccepted: status,
      utilisation: null,
      spare: next.distance,
      readingIds: [],
      mend: null,
    },
  )
  return next.distance >= USUAL_APART ? [clear] : [clear, advice]
}

function inFront(index: LayoutIndex, place: PanPlace): Advice {
  const met = ahead(index, place, place.pan.across / 2)
  const measured = met?.distance ?? USUAL_IN_FRONT.most
  const far = `Nothing rises in front of the pan: ${USUAL_IN_FRONT.most} and more is there.`
  return {
    ...headOf(`pan:${place.pan.id}`, 'Room in front of the bearing face', IN_FRONT),
    kind: 'advice',
    limitKind: 'P',
    notes: [met ? `In plan to ${met.name}.` : far],
    measured,
    usual: `${USUAL_IN_FRONT.least} to ${USUAL_IN_FRONT.most} for short jacks, 900 to 1500 otherwise`,
    unit: 'mm',
    isUsual: measured >= USUAL_IN_FRONT.least,
  }
}

// At an edge ----------------------------------------------------------------------------------------------------------

/** Clear room outside the edge and set-back of a live anchor, along its axis, against its hardware's jack. */
export function jackAccessChecks(index: LayoutIndex, anchor: Anchor): Check[] {
  if (anchor.edgeId === null || anchor.end === 'dead') return []
  const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
  const { jackClear, access } = found(index.frames, anchor.edgeId, 'edge').lengthAt(anchor.chainage)
  const jack = index.jacks.get(hardware.jackId ?? '') ?? null
  const head = headOf(`anchor:${anchor.id}`, 'Jack access', jack ? jackClause(jack) : IN_FRONT)
  if (jackClear === null) {
    const message =
      'The clear room outside this length of the edge is not given, so the jack is not checked against it.'
    return [refusal(head, { code: 'MISSING_INPUT', field: 'edge.jackClear', message })]
  }
  const room = step(
    {
      symbol: 'La',
      meaning: 'Room from the bearing face along the axis of the tendon',
      formula: '(jc + sb) / cos(sk) / cos(el)',
      unit: 'mm',
      clause: GEOMETRY,
    },
    { jc: jackClear, sb: anchor.setBack, sk: anchor.skew, el: anchor.elevation },
    (v) => (v.jc + v.sb) / Math.cos(v.sk) / Math.cos(v.el),
  )
  const notes = access === '' ? [] : [`Access here: ${access}.`]
  if (!jack) return [edgeWithoutJack({ ...head, notes }, room.value)]
  const need = jackLength(jack)
  const spare = room.value - need.value
  const fitting = index.layout.jacks.filter((one) => jackLength(one).value <= room.value)
  const status = spare < 0 && fitting.length === 0 ? 'stop' : statusOfDistance(spare)
  return [
    comparison(
      { ...head, notes: status === 'within' ? notes : [...notes, otherJacks(fitting)] },
      { demand: room.value, limit: need.value, unit: 'mm', steps: [need, room] },
      {
        compares: 'at-least',
        status,
        statusOnceAccepted: status,
        utilisation: null,
        spare,
        readingIds: [],
        mend: null,
      },
    ),
  ]
}

/** Room for every usual jack is advice; less than that needs judgement, since nobody has said which jack comes. */
function edgeWithoutJack(head: Head, room: number): Check {
  const { least, most } = USUAL_AT_EDGE
  const notes = [...head.notes, 'The hardware names no jack.']
  if (room >= most) {
    const usual = `${least} to ${most}`
    return { ...head, kind: 'advice', limitKind: 'P', notes, measured: room, usual, unit: 'mm', isUsual: true }
  }
  return comparison(
    { ...head, limitKind: 'P', notes },
    { demand: room, limit: most, unit: 'mm', steps: [] },
    {
      compares: 'at-least',
      status: 'needs-judgement',
      statusOnceAccepted: 'needs-judgement',
      utilisation: null,
      spare: room - most,
      readingIds: [],
      mend: null,
    },
  )
}
