/** The one place that maps a family of checks to its function, and says where each family applies. */

import { groupsOfEdge } from '../anchor-groups'
import { siteOfAnchor, type AnchorSite } from '../anchor-site'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor } from '../model'
import type { Check, Family, Zone, ZoneKind } from '../result'
import type { Plane } from '../steel/crossings'
import { anchorageChecks } from './anchorage'
import { checkBearing } from './bearing'
import { checkBurstingPlan, checkBurstingThickness } from './bursting'
import { checkBurstingOfGroup } from './bursting-group'
import { coverChecks } from './cover'
import { deadEndChecks } from './dead-end'
import { depthChangeChecks } from './depth-change'
import { cornerWedgeChecks, gapWedgeChecks } from './edge-wedge'
import { jointChecks } from './joint'
import { fitChecks } from './fit'
import type { CheckContext } from './outcome'
import { jackAccessChecks, panAccessChecks } from './pan-access'
import { panBarsChecks } from './pan-bars'
import { spacingChecks } from './spacing'
import { straightLengthChecks } from './straight-length'
import { precompressionChecks } from './precompression'
import { spallingChecks } from './spalling'
import { forceChecks } from './tendon'
import { strengthChecks } from './strength'
import { tendonChecks } from './tendon-advice'

/** Which families of checks belong to which kind of zone: the table of methods, in its order. */
export const FAMILIES_OF_ZONE: Readonly<Record<ZoneKind, readonly Family[]>> = {
  anchor: [
    'bearing',
    'bursting-thickness',
    'bursting-plan',
    'spalling',
    'depth-change',
    'cover',
    'spacing',
    'straight-length',
    'pan-access',
    'tendon',
    'dead-end',
    'fit',
    'anchorage',
  ],
  group: ['bursting-thickness', 'bursting-plan', 'spalling', 'fit', 'anchorage'],
  gap: ['spalling', 'edge-wedge', 'fit', 'anchorage'],
  edge: ['spalling', 'fit', 'anchorage'],
  corner: ['spalling', 'edge-wedge', 'fit', 'anchorage'],
  joint: ['joint', 'fit', 'anchorage'],
  pan: ['pan-access', 'pan-bars', 'fit', 'anchorage'],
  tendon: ['tendon', 'precompression'],
  strip: ['precompression'],
  pour: ['strength'],
}

/** Checks of a family at a zone; null where this version does not make them there. */
type FamilyChecks = (context: CheckContext, zone: Zone) => readonly Check[] | null

export const CHECKS_OF_FAMILY: Readonly<Record<Family, FamilyChecks>> = {
  bearing: (context, zone) => atSite(context, zone, (site) => checkBearing(site, context)),
  'bursting-thickness': (context, zone) =>
    atGroup(context, zone, 'thickness') ?? atSite(context, zone, (site) => [checkBurstingThickness(site, context)]),
  'bursting-plan': (context, zone) =>
    atGroup(context, zone, 'plan') ?? atSite(context, zone, (site) => [checkBurstingPlan(site, context)]),
  spalling: spallingChecks,
  'depth-change': (context, zone) => atSite(context, zone, (site) => depthChangeChecks(site, context)),
  cover: (context, zone) => atAnchor(context, zone, (anchor) => coverChecks(context.index, anchor)),
  spacing: (context, zone) => atAnchor(context, zone, (anchor) => spacingChecks(context.index, anchor)),
  'straight-length': (context, zone) =>
    atAnchor(context, zone, (anchor) => straightLengthChecks(context.index, anchor)),
  'edge-wedge': (context, zone) =>
    zone.kind === 'corner' ? cornerWedgeChecks(context, zone) : gapWedgeChecks(context, zone),
  joint: jointChecks,
  'pan-access': (context, zone) =>
    atPan(zone, (panId) => panAccessChecks(context.index, panId)) ??
    atAnchor(context, zone, (anchor) => jackAccessChecks(context.index, anchor)),
  'pan-bars': (context, zone) => atPan(zone, (panId) => panBarsChecks(context, panId)),
  tendon: (context, zone) =>
    zone.kind === 'tendon'
      ? tendonChecks(context, zone)
      : atAnchor(context, zone, (anchor) => forceChecks(context, zone.id, anchor)),
  'dead-end': (context, zone) => atSite(context, zone, (site) => deadEndChecks(site, context)),
  precompression: precompressionChecks,
  fit: fitChecks,
  anchorage: anchorageChecks,
  strength: strengthChecks,
}

type OfAnchor = (anchor: Anchor) => readonly Check[] | null

const atAnchor = ({ index }: CheckContext, zone: Zone, make: OfAnchor): readonly Check[] | null =>
  zone.kind === 'anchor' ? make(anchorOf(index, zone)) : null

const atPan = ({ kind, panId }: Zone, make: (panId: string) => readonly Check[]): readonly Check[] | null =>
  kind === 'pan' && panId !== null ? make(panId) : null

const atSite = (
  context: CheckContext,
  zone: Zone,
  make: (site: AnchorSite) => readonly Check[],
): readonly Check[] | null => atAnchor(context, zone, (anchor) => make(siteOfAnchor(context.index, anchor)))

function atGroup(context: CheckContext, zone: Zone, plane: Plane): readonly Check[] | null {
  if (zone.kind !== 'group') return null
  const group = groupsOfEdge(context.index, zone.edgeId ?? '').find(({ id }) => id === zone.id)
  return group ? checkBurstingOfGroup(group, plane, context) : null
}

const anchorOf = (index: LayoutIndex, { id }: Zone): Anchor =>
  found(index.anchors, id.slice('anchor:'.length), 'anchor')
