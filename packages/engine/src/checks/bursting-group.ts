/** Bursting behind anchors that act as one: a single plate from out to out with all their force, in the group's prism. */

import { centreOf, outToOut, type AnchorGroup } from '../anchor-groups'
import { whyNoRule, type AnchorSite } from '../anchor-site'
import { anchorMark } from '../zones'
import type { Check, Refused } from '../result'
import type { Plane } from '../steel/crossings'
import { burstingHead, countsAlone } from './bursting'
import { ratioNotes, stepNotes, whole, whyNoPrism, whyNotConstant, whyTooInclined } from './bursting-notes'
import { ruleFor } from './bursting-rule'
import { burst, type Asked } from './bursting-steel'
import { refusal, type CheckContext, type Head } from './outcome'
import { planRowOf } from './plan-row'
import { planNotes, planPrisms, planSides, thicknessPrisms, type Prism } from './prism'

const WHAT = 'width from out to out of its plates'

/** Bursting of a group in one plane; nothing in a plane in which its members stand alone. */
export function checkBurstingOfGroup(group: AnchorGroup, plane: Plane, context: CheckContext): Check[] {
  const close = group.planes.find((one) => one.plane === plane)
  const [first, ...rest] = group.members
  if (!close || !first) return []
  const head = burstingHead(group.id, plane, context)
  const members = [first, ...rest] as const
  const refused = whyNoGroup(head, members, { plane, context })
  if (refused) return [refused]
  const made = plane === 'plan' ? inPlan(head, members, context) : inThickness(head, members, context)
  if ('refused' in made) return [made.refused]
  const rule = ruleFor(members, context)
  const notes = [togetherNote(members, { limit: close.steps.at(-1)?.value, context }), ...rule.notes, ...made.notes]
  const asked: Asked = { ...rule, ...made, context, plane, members, centre: centreOf(members), notes }
  return [burst({ ...asked, readings: [...rule.readings, ...made.readings] }, head)]
}

type Members = Asked['members']

function whyNoGroup(head: Head, members: Members, of: { plane: Plane; context: CheckContext }): Refused | null {
  const { index } = of.context
  for (const site of members) {
    const outside = whyNoRule(site)
    const mark = anchorMark(index, site.anchor)
    if (outside) return refusal(head, { code: 'OUTSIDE_METHOD', ...outside, message: `${mark}: ${outside.message}` })
    const inclined = whyTooInclined(head, site, of)
    if (inclined) return { ...inclined, message: `${mark}: ${inclined.message}` }
  }
  return null
}

type Made = Pick<Asked, 'prisms' | 'notes' | 'readings'> | { readonly refused: Refused }

function inPlan(head: Head, members: Members, context: CheckContext): Made {
  const [first, last] = [members[0], members.at(-1) ?? members[0]]
  const { along } = outToOut(members)
  const sides = planSides(first, last, centreOf(members).chainage)
  const { own, acrossBoundary } = planPrisms(along.to - along.from, sides)
  const prisms: Prism[] = acrossBoundary === null ? [own] : [own, acrossBoundary]
  const row = planRowOf(head, first, context)
  const refused = row.refused ?? whyNoPrism(head, prisms, { what: WHAT, field: 'chainage' })
  if (refused) return { refused }
  const notes = [...ratioNotes(own, { what: WHAT, isEccentric: false }), ...planNotes(sides), ...stepNotes(first)]
  return { prisms, notes, readings: row.readings }
}

function inThickness(head: Head, members: Members, context: CheckContext): Made {
  const [lead] = members
  const { height } = centreOf(members)
  const { up } = outToOut(members)
  const { top, soffit } = lead
  const place = { top, soffit, toTop: top - height, toSoffit: height - soffit }
  const { own, middle } = thicknessPrisms(up.to - up.from, place)
  const what = 'height from out to out of its plates'
  const refused = notConstant(head, members) ?? whyNoPrism(head, [own], { what, field: 'height' })
  if (refused) return { refused }
  const isAlone = middle !== null && countsAlone(own, context)
  return {
    prisms: middle === null || isAlone ? [own] : [own, middle],
    notes: ratioNotes(own, { what, isEccentric: middle !== null }),
    readings: isAlone ? [context.basis.ownPrismReading.id] : [],
  }
}

const notConstant = (head: Head, members: readonly AnchorSite[]): Refused | null =>
  members.map((site) => whyNotConstant(head, site)).find((refused) => refused !== null) ?? null

function togetherNote(members: Members, of: { limit: number | undefined; context: CheckContext }): string {
  const marks = members.map(({ anchor }) => anchorMark(of.context.index, anchor)).join(', ')
  const closer = of.limit === undefined ? '' : ` (closer than ${whole(of.limit)})`
  return (
    `${marks} act as one${closer}: one plate from out to out carries all their force; each alone, while it is stressed, ` +
    'is checked under its own mark. Only steel that crosses the line of the resultant counts.'
  )
}
