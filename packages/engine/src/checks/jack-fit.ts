/** What a jack needs in a pan against what it finds there, comparison by comparison. */

import { ROUNDING } from '../geometry'
import type { LayoutIndex } from '../layout-index'
import type { Jack } from '../model'
import type { PanAnchor, PanPlace } from '../pan-place'
import { ahead, beside } from '../pan-room'
import { step, type Clause, type Step } from '../step'

/** One comparison of a jack: what is there against what is asked for, in mm, or rad where it is an angle. */
export interface JackNeed {
  readonly name: string
  readonly demand: number
  readonly limit: number
  readonly unit: 'mm' | 'rad'
  readonly compares: 'at-least' | 'at-most'
  /** Clear room between jack and concrete: none is a stop. */
  readonly isClearance: boolean
  readonly steps: readonly Step[]
  readonly notes: readonly string[]
}

/** Room counts as far as this many times what the jack needs where nothing stands in front of it. */
const LOOKED_FOR = 2

export const jackClause = ({ name }: Jack): Clause => ({ source: `Jack ${name}`, section: 'as entered', tag: 'read' })

/** Length that a jack takes up in front of a bearing face, mm: closed, its stroke, the tail and a hand behind it. */
export function jackLength(jack: Jack): Step {
  const { closedLength, stroke, strandTail, handRoom } = jack
  return step(
    {
      symbol: 'Lj',
      meaning: `Length that jack ${jack.name} needs: closed, stroke, strand tail, hand room`,
      formula: 'Lc + st + tl + hr',
      unit: 'mm',
      clause: jackClause(jack),
    },
    { Lc: closedLength, st: stroke, tl: strandTail, hr: handRoom },
    (v) => v.Lc + v.st + v.tl + v.hr,
  )
}

interface Seat {
  readonly index: LayoutIndex
  readonly place: PanPlace
  readonly at: PanAnchor
  readonly jack: Jack
  readonly clause: Clause
}

/** All comparisons of one jack in a pan. The headroom is left out where it is not given. */
export function jackNeeds(index: LayoutIndex, { place, at, jack }: Pick<Seat, 'place' | 'at' | 'jack'>): JackNeed[] {
  const seat = { index, place, at, jack, clause: jackClause(jack) }
  return [roomAlong(seat), ...roomBeside(seat), ...roomAbove(seat), underJack(seat), betweenSides(seat), bend(seat)]
}

/** Whether a comparison is met. */
export const isMet = ({ demand, limit, compares, isClearance }: JackNeed): boolean =>
  compares === 'at-most'
    ? demand <= limit + ROUNDING
    : demand >= limit - ROUNDING && (!isClearance || demand > ROUNDING)

const TILTED: Clause = { source: 'Geometry', section: 'along the tilted axis', tag: 'derived' }

function roomAlong({ index, place, jack }: Seat): JackNeed {
  const need = jackLength(jack)
  const met = ahead(index, place, jack.bodyDiameter / 2)
  const tilt = place.pan.jackTilt
  const looked = LOOKED_FOR * need.value * Math.cos(tilt)
  const plan = met?.distance ?? looked
  const room = step(
    { symbol: 'La', meaning: 'Room along the axis of the jack', formula: 'Lp / cos(t)', unit: 'mm', clause: TILTED },
    { Lp: plan, t: tilt },
    (v) => v.Lp / Math.cos(v.t),
  )
  const notes = met
    ? [`In plan ${Math.round(plan)} to ${met.name}.`]
    : ['Nothing rises in front of the pan; the room is counted as far as twice what the jack needs.']
  return atLeast('Room along the jack', { demand: room.value, limit: need.value, steps: [need, room], notes })
}

function roomBeside({ index, place, jack }: Seat): JackNeed[] {
  const length = jackLength(jack).value * Math.cos(place.pan.jackTilt)
  const met = beside(index, place, { half: jack.bodyDiameter / 2, length })
  if (!met) return []
  const notes = [`Beside the jack stands ${met.name}.`]
  return [
    {
      ...atLeast('Room beside the jack', { demand: met.distance, limit: jack.sideRoom, steps: [], notes }),
      isClearance: true,
    },
  ]
}

/** From the top of the slab to the highest point of the extended jack, and the room that it needs above. */
function roomAbove({ place, at, jack, clause }: Seat): JackNeed[] {
  const { pan, top } = place
  if (pan.headroom === null) return []
  const need = step(
    {
      symbol: 'Hn',
      meaning: 'Height above the slab that the jack needs',
      formula: 'z + (Lc + st) * sin(t) + d / 2 * cos(t) - zt + ha',
      unit: 'mm',
      clause,
    },
    {
      z: at.anchor.height,
      Lc: jack.closedLength,
      st: jack.stroke,
      t: pan.jackTilt,
      d: jack.bodyDiameter,
      zt: top,
      ha: jack.roomAbove,
    },
    (v) => v.z + (v.Lc + v.st) * Math.sin(v.t) + (v.d / 2) * Math.cos(v.t) - v.zt + v.ha,
  )
  return [atLeast('Headroom above the slab', { demand: pan.headroom, limit: need.value, steps: [need], notes: [] })]
}

/** The floor of a recess rises from full depth at the bearing face to nothing at its far end. */
function underJack(seat: Seat): JackNeed {
  const { pan } = seat.place
  const bodyStart = Math.min(seat.jack.noseLength * Math.cos(pan.jackTilt), pan.along)
  const gaps = [
    gapUnder(seat, { where: 'under the nose at the bearing face', x: 0, d: seat.jack.noseDiameter }),
    gapUnder(seat, { where: 'under the nose at its far end', x: bodyStart, d: seat.jack.noseDiameter }),
    gapUnder(seat, { where: 'under the front of the body', x: bodyStart, d: seat.jack.bodyDiameter }),
    gapUnder(seat, { where: 'at the far end of the recess', x: pan.along, d: seat.jack.bodyDiameter }),
  ]
  const [least] = [...gaps].sort((a, b) => a.line.value - b.line.value)
  const { line, where } = least ?? gapUnder(seat, { where: '', x: 0, d: seat.jack.noseDiameter })
  return {
    ...atLeast('Jack clear of the recess', { demand: line.value, limit: 0, steps: [line], notes: [] }),
    isClearance: true,
    notes: [`Least ${where}; the floor rises evenly from full depth at the bearing face to nothing at its far end.`],
  }
}

function gapUnder({ place, at, clause }: Seat, of: { where: string; x: number; d: number }) {
  const { pan, top } = place
  const line = step(
    {
      symbol: 'g',
      meaning: `Clear height ${of.where}`,
      formula: 'z + x * tan(t) - d / 2 / cos(t) - (zt - dp + dp * x / lp)',
      unit: 'mm',
      clause,
    },
    { z: at.anchor.height, x: of.x, t: pan.jackTilt, d: of.d, zt: top, dp: pan.depth, lp: pan.along },
    (v) => v.z + v.x * Math.tan(v.t) - v.d / 2 / Math.cos(v.t) - (v.zt - v.dp + (v.dp * v.x) / v.lp),
  )
  return { line, where: of.where }
}

function betweenSides({ place, jack, clause }: Seat): JackNeed {
  const line = step(
    { symbol: 'gs', meaning: 'Clear on each side of the jack', formula: '(w - d) / 2', unit: 'mm', clause },
    { w: place.pan.across, d: Math.max(jack.bodyDiameter, jack.noseDiameter) },
    (v) => (v.w - v.d) / 2,
  )
  const notes = ['Measured with the jack on the axis of the tendon.']
  return {
    ...atLeast('Jack between the sides of the recess', {
      demand: line.value,
      limit: jack.sideRoom,
      steps: [line],
      notes,
    }),
    isClearance: true,
  }
}

/** Half a degree: closer than a bent nose is made. */
const SAME_ANGLE = Math.PI / 360

function bend({ place, at, jack }: Seat): JackNeed {
  const { jackTilt, bentNose } = place.pan
  const asked = jackTilt - at.anchor.elevation
  const isSame = Math.abs(asked - bentNose) <= SAME_ANGLE
  const note =
    `The jack is tilted by ${degrees(jackTilt)} and the anchor by ${degrees(at.anchor.elevation)}: ` +
    `the nose would have to bend by ${degrees(asked)}, not by ${degrees(bentNose)}.`
  return {
    name: 'Bend of the nose',
    demand: bentNose,
    limit: jack.bentNoseMax,
    unit: 'rad',
    compares: 'at-most',
    isClearance: false,
    steps: [],
    notes: isSame ? [] : [note],
  }
}

const degrees = (angle: number): string => `${((angle * 180) / Math.PI).toFixed(1)}°`

function atLeast(name: string, of: Pick<JackNeed, 'demand' | 'limit' | 'steps' | 'notes'>): JackNeed {
  return { name, ...of, unit: 'mm', compares: 'at-least', isClearance: false }
}
