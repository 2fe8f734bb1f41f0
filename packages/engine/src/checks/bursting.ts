/** Bursting behind a single anchor, in the thickness and in plan: steel asked for against steel counted in the window. */

import { groupIn, groupName, groupsOfEdge, type AnchorGroup } from '../anchor-groups'
import { siteOfAnchor, whyNoRule, type AnchorSite } from '../anchor-site'
import { actsAsOne } from '../close-anchors'
import { found } from '../layout-index'
import { neighboursOf } from '../neighbours'
import type { Check } from '../result'
import type { Plane } from '../steel/crossings'
import { anchorMark } from '../zones'
import {
  inclinedNotes,
  panNotes,
  ratioNotes,
  stepNotes,
  whatBears,
  whyNoPrism,
  whyNotConstant,
  whyTooInclined,
} from './bursting-notes'
import { ruleFor } from './bursting-rule'
import { burst } from './bursting-steel'
import { refusal, type CheckContext, type Head } from './outcome'
import { planNotes, planPrisms, planSides, rowNotes, thicknessPrisms, type PlanSides, type Prism } from './prism'
import { planRowOf } from './plan-row'

/** Bursting through the thickness; refused beside a step in depth. */
export function checkBurstingThickness(site: AnchorSite, context: CheckContext): Check {
  const head = burstingHead(`anchor:${site.anchor.id}`, 'thickness', context)
  const outside = whyNoRule(site)
  if (outside) return refusal(head, { code: 'OUTSIDE_METHOD', ...outside })
  const what = whatBears(site)
  const { own, middle } = thicknessPrisms(site.hardware.plate.height, site)
  const refused =
    whyNotConstant(head, site) ??
    whyTooInclined(head, site, { plane: 'thickness', context }) ??
    whyNoPrism(head, [own], { what, field: 'height' })
  if (refused) return refused
  const isAlone = middle !== null && countsAlone(own, context)
  const notes = [
    ...aloneNotes(groupOf(site, 'thickness', context), context),
    ...ratioNotes(own, { what, isEccentric: middle !== null }),
    ...inclinedNotes(site.anchor.elevation, 'in height'),
    ...panNotes(site),
  ]
  const rule = ruleFor([site], context)
  return burst(
    {
      ...rule,
      context,
      plane: 'thickness',
      members: [site],
      centre: site.anchor,
      prisms: middle === null || isAlone ? [own] : [own, middle],
      notes: [...rule.notes, ...notes],
      readings: [...rule.readings, ...(isAlone ? [context.basis.ownPrismReading.id] : [])],
    },
    head,
  )
}

/** Bursting in plan; a member of a group is checked alone, as a stage of stressing. */
export function checkBurstingPlan(site: AnchorSite, context: CheckContext): Check {
  const head = burstingHead(`anchor:${site.anchor.id}`, 'plan', context)
  const outside = whyNoRule(site)
  if (outside) return refusal(head, { code: 'OUTSIDE_METHOD', ...outside })
  const group = groupOf(site, 'plan', context)
  const what = whatBears(site)
  const sides = sidesOf(site, group)
  const { own, acrossBoundary } = planPrisms(site.hardware.plate.width, sides)
  const prisms = acrossBoundary === null ? [own] : [own, acrossBoundary]
  const row = planRowOf(head, site, context)
  const refused =
    (group === null ? acrossTheBoundary(head, site, context) : null) ??
    whyTooInclined(head, site, { plane: 'plan', context }) ??
    row.refused ??
    whyNoPrism(head, prisms, { what, field: site.pan === null ? 'chainage' : 'pan.x' })
  if (refused) return refused
  const rule = ruleFor([site], context)
  const notes = [
    ...aloneNotes(group, context),
    ...ratioNotes(own, { what, isEccentric: false }),
    ...inclinedNotes(site.anchor.skew, 'in plan'),
    ...planNotes(sides),
    ...rowNotes(site, own),
    ...stepNotes(site),
    ...panNotes(site),
  ]
  return burst(
    {
      ...rule,
      context,
      plane: 'plan',
      members: [site],
      centre: site.anchor,
      prisms,
      notes: [...rule.notes, ...notes],
      readings: [...rule.readings, ...row.readings],
    },
    head,
  )
}

/** The head of a bursting check at an anchor or a group. */
export function burstingHead(zoneId: string, plane: Plane, { basis }: CheckContext): Head {
  return {
    zoneId,
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
export const countsAlone = ({ a, b }: Prism, { basis }: CheckContext): boolean =>
  basis.isAccepted(basis.ownPrismReading.id) && a <= basis.ownPrismReading.ratioMax * b.value

const groupOf = ({ anchor, edge }: AnchorSite, plane: Plane, { index }: CheckContext): AnchorGroup | null =>
  edge === null ? null : groupIn(groupsOfEdge(index, edge.id), anchor.id, plane)

/** Beside members that are not yet stressed an anchor's force spreads as far as that of the whole group. */
function sidesOf(site: AnchorSite, group: AnchorGroup | null): PlanSides {
  const [first, last] = [group?.members[0] ?? site, group?.members.at(-1) ?? site]
  return planSides(first, last, site.anchor.chainage)
}

/** Stressing order: each anchor alone with its own prism, then all. */
function aloneNotes(group: AnchorGroup | null, { index }: CheckContext): readonly string[] {
  if (group === null) return []
  const name = groupName(found(index.edges, group.edgeId, 'edge').mark, group)
  return [`Checked alone here, as it is while it is stressed by itself; all at once are checked under ${name}.`]
}

/** A pair on two sides of a pour boundary that acts as one once both pours are cast. */
function acrossTheBoundary(head: Head, site: AnchorSite, { index }: CheckContext): Check | null {
  if (site.edge === null || (site.jointGapBefore === null && site.jointGapAfter === null)) return null
  const { nearest } = neighboursOf(index, site.anchor, 0)
  const beyond = nearest.map((anchor) => siteOfAnchor(index, anchor)).find((other) => isOneWith(site, other))
  if (!beyond) return null
  return refusal(head, {
    code: 'ANCHORS_ACT_AS_ONE',
    field: 'chainage',
    message:
      `Acts as one with ${anchorMark(index, beyond.anchor)} of the next pour once both are cast: ` +
      'groups across a pour boundary are not checked. Move one of the two along the edge.',
  })
}

function isOneWith(site: AnchorSite, other: AnchorSite): boolean {
  if (site.pour.id === other.pour.id) return false
  const spacing = Math.abs(other.anchor.chainage - site.anchor.chainage)
  const [first, last] = site.anchor.chainage < other.anchor.chainage ? [site, other] : [other, site]
  const { own } = planSides(first, last, (first.anchor.chainage + last.anchor.chainage) / 2)
  const plate = Math.max(site.hardware.plate.width, other.hardware.plate.width)
  return actsAsOne({ spacing, plate, toOuterBefore: own.before, toOuterAfter: own.after })
}
