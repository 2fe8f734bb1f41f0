/** Runs every check of a pour, zone by zone, and says which families are not checked yet. */

import { basisOf } from './bases'
import { CHECKS_OF_FAMILY, FAMILIES_OF_ZONE } from './checks/families'
import { comparison, type CheckContext } from './checks/outcome'
import { layoutIndex, type LayoutIndex } from './layout-index'
import type { Layout } from './model'
import type { Check, Family, PourResult, Zone, ZoneResult } from './result'
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
  const context = contextOf(index)
  const zones = zonesAsked(index, { pourId, edgeId }).map((zone) => checkZone(() => context, { zone, withSteps }))
  return {
    pourId,
    basis: layout.job.basis,
    zones,
    counts: countStatuses(zones.flatMap(({ checks }) => checks)),
  }
}

export function contextOf(index: LayoutIndex): CheckContext {
  const { job } = index.layout
  return { index, basis: basisOf(job), nearFrom: job.settings.nearFrom }
}

/** The zones that an ask is about, in their order. */
export const zonesAsked = (index: LayoutIndex, of: { pourId: string; edgeId: string | undefined }): Zone[] =>
  zonesOfPour(index, of.pourId).filter((zone) => of.edgeId === undefined || zone.edgeId === of.edgeId)

/** Checks that stand as they were made before, of the families that are not made again. */
export interface Standing {
  readonly result: ZoneResult
  readonly isMadeAgain: (family: Family) => boolean
}

interface ZoneAsk {
  readonly zone: Zone
  readonly withSteps: boolean
  readonly standing?: Standing | undefined
}

/** @param contextFor what each family is worked out from. */
export function checkZone(
  contextFor: (family: Family) => CheckContext,
  { zone, withSteps, standing }: ZoneAsk,
): ZoneResult {
  const made = FAMILIES_OF_ZONE[zone.kind].map((family) => {
    if (standing && !standing.isMadeAgain(family)) return stood(standing.result, family)
    const checks = CHECKS_OF_FAMILY[family](contextFor(family), zone)
    return { family, checks: checks ?? [], isNotYet: isNotYet(checks) }
  })
  const checks = made.flatMap((one) => one.checks).sort(bySeverity)
  return {
    zone,
    checks: withSteps ? checks : checks.map(withoutSteps),
    status: worstOf(checks),
    notYetChecked: made.filter((one) => one.isNotYet).map(({ family }) => family),
  }
}

const stood = ({ checks, notYetChecked }: ZoneResult, family: Family) => ({
  family,
  checks: checks.filter((check) => check.family === family),
  isNotYet: notYetChecked.includes(family),
})

function withoutSteps(check: Check): Check {
  if (check.kind !== 'compared' || check.steps.length === 0) return check
  const { demand, limit, unit } = check
  return comparison(check, { demand, limit, unit, steps: [] }, check)
}

const isNotYet = (checks: readonly Check[] | null): boolean =>
  checks === null || checks.some((check) => check.kind === 'refused' && check.code === 'NOT_YET_CHECKED')
