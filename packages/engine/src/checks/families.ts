/** The one place that maps a family of checks to its function, and says where each family applies. */

import { siteOfAnchor, type AnchorSite } from '../anchor-site'
import { closeAnchors } from '../close-anchors'
import { found, type LayoutIndex } from '../layout-index'
import type { Anchor } from '../model'
import type { Check, Family, Zone, ZoneKind } from '../result'
import { checkBearing } from './bearing'
import { checkBurstingPlan, checkBurstingThickness } from './bursting'
import { coverChecks } from './cover'
import { notYetChecked } from './not-yet'
import type { CheckContext } from './outcome'
import { jackAccessChecks, panAccessChecks } from './pan-access'
import { panBarsChecks } from './pan-bars'
import { spacingChecks } from './spacing'
import { straightLengthChecks } from './straight-length'
import { forceChecks } from './tendon'
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
}

/** Checks of a family at a zone; null where this version does not make them there. */
type FamilyChecks = (context: CheckContext, zone: Zone) => readonly Check[] | null

export const CHECKS_OF_FAMILY: Readonly<Record<Family, FamilyChecks>> = {
  bearing: (context, zone) => atAnchor(context, zone, (anchor) => bearing(context, zone, anchor)),
  'bursting-thickness': (context, zone) =>
    atSite(context, zone, (site) => [checkBurstingThickness(site, context, closeOf(context.index, site))]),
  'bursting-plan': (context, zone) =>
    atSite(context, zone, (site) => [checkBurstingPlan(site, context, closeOf(context.index, site))]),
  spalling: () => null,
  'depth-change': () => null,
  cover: ({ index }, zone) => anchorAtEdge(index, zone, (anchor) => coverChecks(index, anchor)),
  spacing: ({ index }, zone) => anchorAtEdge(index, zone, (anchor) => spacingChecks(index, anchor)),
  'straight-length': (context, zone) =>
    atAnchor(context, zone, (anchor) => straightLengthChecks(context.index, anchor)),
  'edge-wedge': () => null,
  joint: () => null,
  'pan-access': (context, zone) =>
    atPan(zone, (panId) => panAccessChecks(context.index, panId)) ??
    atAnchor(context, zone, (anchor) => jackAccessChecks(context.index, anchor)),
  'pan-bars': (context, zone) => atPan(zone, (panId) => panBarsChecks(context, panId)),
  tendon: (context, zone) =>
    zone.kind === 'tendon'
      ? tendonChecks(context, zone)
      : atAnchor(context, zone, (anchor) => forceChecks(context, zone.id, anchor)),
  'dead-end': (context, zone) => atAnchor(context, zone, (anchor) => deadEnd(zone, anchor)),
  precompression: () => null,
  fit: () => null,
  anchorage: () => null,
}

const closeOf = (index: LayoutIndex, { edge }: AnchorSite) => (edge === null ? [] : closeAnchors(index, edge.id))

type OfAnchor = (anchor: Anchor) => readonly Check[] | null

const atAnchor = ({ index }: CheckContext, zone: Zone, make: OfAnchor): readonly Check[] | null =>
  zone.kind === 'anchor' ? make(anchorOf(index, zone)) : null

const atPan = ({ kind, panId }: Zone, make: (panId: string) => readonly Check[]): readonly Check[] | null =>
  kind === 'pan' && panId !== null ? make(panId) : null

const anchorAtEdge = (index: LayoutIndex, zone: Zone, make: OfAnchor): readonly Check[] | null => {
  const anchor = anchorOf(index, zone)
  return anchor.edgeId === null ? null : make(anchor)
}

function atSite(
  { index }: CheckContext,
  zone: Zone,
  make: (site: AnchorSite) => readonly Check[],
): readonly Check[] | null {
  if (zone.kind !== 'anchor') return null
  const anchor = anchorOf(index, zone)
  return anchor.edgeId === null || anchor.end === 'dead' ? null : make(siteOfAnchor(index, anchor))
}

const anchorOf = (index: LayoutIndex, { id }: Zone): Anchor =>
  found(index.anchors, id.slice('anchor:'.length), 'anchor')

function bearing(context: CheckContext, zone: Zone, { panId }: Anchor): readonly Check[] | null {
  if (panId === null) return atSite(context, zone, (site) => checkBearing(site, context))
  const message =
    'An anchor in a stressing pan is stored and drawn; bearing and bursting behind it are not yet checked.'
  return [notYetChecked(zone, 'bearing', message)]
}

function deadEnd(zone: Zone, { end }: Anchor): readonly Check[] {
  if (end === 'live') return []
  const message = 'A dead end is stored and drawn; bearing, bursting and spread behind it are not yet checked.'
  return [notYetChecked(zone, 'dead-end', message)]
}
