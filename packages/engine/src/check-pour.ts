/** Runs every check of a pour, zone by zone, and says which families are not checked yet. */

import { sitesOfEdge, type AnchorSite } from './anchor-site'
import { basisOf } from './bases'
import { checkBearing } from './checks/bearing'
import { checkBurstingPlan, checkBurstingThickness } from './checks/bursting'
import { closeAnchors, type CloseGroup } from './close-anchors'
import { coverChecks } from './checks/cover'
import { notYetChecked } from './checks/not-yet'
import { comparison, type CheckContext } from './checks/outcome'
import { spacingChecks } from './checks/spacing'
import { straightLengthChecks } from './checks/straight-length'
import { checkJackingForce } from './checks/tendon'
import { found, layoutIndex, type LayoutIndex } from './layout-index'
import type { Anchor, Layout } from './model'
import type { Check, Family, PourResult, Zone, ZoneKind, ZoneResult } from './result'
import { bySeverity, countStatuses, worstOf } from './severity'
import { zonesOfPour } from './zones'

export interface PourAsk {
  readonly pourId: string
  /** Only the zones of this edge. */
  readonly edgeId?: string
  /** Without it the steps of each check are left out. */
  readonly withSteps?: boolean
}

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

/** What the zones of one run have in common; what an edge needs is worked out when its first anchor asks. */
interface Run {
  readonly context: CheckContext
  readonly siteOf: (edgeId: string, anchorId: string) => AnchorSite
  readonly closeOf: (edgeId: string) => readonly CloseGroup[]
}

/**
 * Checks of one pour, or of one edge of it.
 *
 * @throws where the layout refers to what it does not hold; references are checked on the way in.
 */
export function checkPour(layout: Layout, { pourId, edgeId, withSteps = false }: PourAsk): PourResult {
  const index = layoutIndex(layout)
  const run = runOf(index)
  const zones = zonesOfPour(index, pourId)
    .filter((zone) => edgeId === undefined || zone.edgeId === edgeId)
    .map((zone) => checkZone(run, zone, withSteps))
  return { pourId, basis: layout.job.basis, zones, counts: countStatuses(zones.flatMap(({ checks }) => checks)) }
}

function runOf(index: LayoutIndex): Run {
  const { job } = index.layout
  const sites = perEdge((edgeId) => sitesOfEdge(index, edgeId))
  return {
    context: { index, basis: basisOf(job), nearFrom: job.settings.nearFrom },
    siteOf: (edgeId, anchorId) => found(sites(edgeId), anchorId, 'anchor'),
    closeOf: perEdge((edgeId) => closeAnchors(index, edgeId)),
  }
}

/** Works something out once for each edge that asks. */
function perEdge<T>(make: (edgeId: string) => T): (edgeId: string) => T {
  const made = new Map<string, { readonly value: T }>()
  return (edgeId) => {
    const known = made.get(edgeId) ?? { value: make(edgeId) }
    made.set(edgeId, known)
    return known.value
  }
}

function checkZone(run: Run, zone: Zone, withSteps: boolean): ZoneResult {
  const made = FAMILIES_OF_ZONE[zone.kind].map((family) => ({ family, checks: checksOf(run, zone, family) }))
  const checks = made.flatMap((one) => one.checks ?? []).sort(bySeverity)
  return {
    zone,
    checks: withSteps ? checks : checks.map(withoutSteps),
    status: worstOf(checks),
    notYetChecked: made.filter((one) => isNotYet(one.checks)).map(({ family }) => family),
  }
}

function withoutSteps(check: Check): Check {
  if (check.kind !== 'compared' || check.steps.length === 0) return check
  const { demand, limit, unit } = check
  return comparison(check, { demand, limit, unit, steps: [] }, check)
}

const isNotYet = (checks: readonly Check[] | null): boolean =>
  checks === null || checks.some((check) => check.kind === 'refused' && check.code === 'NOT_YET_CHECKED')

/** The one place that maps a family to its function; null where this version does not make it at such a zone. */
function checksOf(run: Run, zone: Zone, family: Family): readonly Check[] | null {
  if (zone.kind === 'anchor') return anchorChecks(run, zone, family)
  if (zone.kind === 'pan' && family === 'pan-bars') {
    const what = 'A stressing pan is stored and drawn; access for the jack and the bars round it'
    return [notYetChecked(zone, family, `${what} are not yet checked.`)]
  }
  return null
}

function anchorChecks(run: Run, zone: Zone, family: Family): readonly Check[] | null {
  const { context, siteOf, closeOf } = run
  const anchor = found(context.index.anchors, zone.id.slice('anchor:'.length), 'anchor')
  const site = anchor.edgeId !== null && anchor.end === 'live' ? siteOf(anchor.edgeId, anchor.id) : null
  switch (family) {
    case 'bearing':
      return site ? checkBearing(site, context) : behindPan(zone, anchor)
    case 'bursting-thickness':
      return site ? [checkBurstingThickness(site, context, closeOf(site.edge.id))] : null
    case 'bursting-plan':
      return site ? [checkBurstingPlan(site, context, closeOf(site.edge.id))] : null
    case 'tendon':
      return forceChecks(context, zone, anchor)
    case 'dead-end':
      return deadEnd(zone, anchor)
    case 'cover':
      return anchor.edgeId === null ? null : coverChecks(context.index, anchor)
    case 'spacing':
      return anchor.edgeId === null ? null : spacingChecks(context.index, anchor)
    case 'straight-length':
      return straightLengthChecks(context.index, anchor)
    case 'spalling':
    case 'depth-change':
    case 'edge-wedge':
    case 'joint':
    case 'pan-access':
    case 'pan-bars':
    case 'precompression':
    case 'fit':
    case 'anchorage':
      return null
  }
}

function behindPan(zone: Zone, { panId }: Anchor): readonly Check[] | null {
  if (panId === null) return null
  const message =
    'An anchor in a stressing pan is stored and drawn; bearing and bursting behind it are not yet checked.'
  return [notYetChecked(zone, 'bearing', message)]
}

function deadEnd(zone: Zone, { end }: Anchor): readonly Check[] {
  if (end === 'live') return []
  const message = 'A dead end is stored and drawn; bearing, bursting and spread behind it are not yet checked.'
  return [notYetChecked(zone, 'dead-end', message)]
}

function forceChecks({ index, ...rest }: CheckContext, zone: Zone, anchor: Anchor): readonly Check[] {
  if (anchor.end === 'dead') return []
  const tendon = found(index.tendons, anchor.tendonId, 'tendon')
  const strand = found(index.strandTypes, tendon.strandTypeId, 'strand type')
  const stage = found(index.pours, zone.pourId, 'pour').stages.at(-1)?.name ?? null
  return [checkJackingForce({ zoneId: zone.id, tendon, strand, stage }, { index, ...rest })]
}
