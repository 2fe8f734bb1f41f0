/** Runs every check of a pour, zone by zone, and says which families are not checked yet. */

import { basisOf } from './bases'
import { CHECKS_OF_FAMILY, FAMILIES_OF_ZONE } from './checks/families'
import { comparison, type CheckContext } from './checks/outcome'
import { layoutIndex } from './layout-index'
import type { Layout } from './model'
import type { Check, PourResult, Zone, ZoneResult } from './result'
import { bySeverity, countStatuses, worstOf } from './severity'
import { zonesOfPour } from './zones'

export interface PourAsk {
  readonly pourId: string
  /** Only the zones of this edge. */
  readonly edgeId?: string
  /** Without it the steps of each check are left out. */
  readonly withSteps?: boolean
}

/**
 * Checks of one pour, or of one edge of it.
 *
 * @throws where the layout refers to what it does not hold; references are checked on the way in.
 */
export function checkPour(layout: Layout, { pourId, edgeId, withSteps = false }: PourAsk): PourResult {
  const index = layoutIndex(layout)
  const { job } = layout
  const context = { index, basis: basisOf(job), nearFrom: job.settings.nearFrom }
  const zones = zonesOfPour(index, pourId)
    .filter((zone) => edgeId === undefined || zone.edgeId === edgeId)
    .map((zone) => checkZone(context, zone, withSteps))
  return { pourId, basis: job.basis, zones, counts: countStatuses(zones.flatMap(({ checks }) => checks)) }
}

function checkZone(context: CheckContext, zone: Zone, withSteps: boolean): ZoneResult {
  const made = FAMILIES_OF_ZONE[zone.kind].map((family) => ({
    family,
    checks: CHECKS_OF_FAMILY[family](context, zone),
  }))
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
