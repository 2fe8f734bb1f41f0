import { toEngine } from '@wedgeline/contract'
import { checkPour, type Check, type PourResult, type ZoneResult } from '@wedgeline/engine'
import type { LayoutOnDisk } from './layout-file'

/** What `npm run -s check` prints: every check of every pour, zone by zone. Units stand in `unit`. */
export function checkReport({ layout, problems }: LayoutOnDisk, engineVersion: string) {
  const engineLayout = toEngine(layout)
  return {
    format: 'wedgeline.checks',
    version: 1,
    engineVersion,
    note: 'Results assist a qualified engineer and do not replace one. Local codes and licensed practice govern.',
    job: { number: layout.job.number, title: layout.job.title, basis: layout.job.basis },
    stops: problems.map(({ field, message }) => ({ field, message })),
    pours: layout.pours.map((pour) => {
      const result = checkPour(engineLayout, { pourId: pour.id })
      return { pour: pour.mark, counts: result.counts, zones: result.zones.map((zone) => zoneReport(zone, result)) }
    }),
  }
}

function zoneReport({ zone, status, checks, notYetChecked }: ZoneResult, { basis }: PourResult) {
  return {
    zone: zone.name,
    zoneId: zone.id,
    kind: zone.kind,
    status,
    checks: checks.map((check) => checkLine(check, basis)),
    notYetChecked,
  }
}

function checkLine(check: Check, basis: string) {
  const { name, family, limitKind, clause, plane, stage, notes } = check
  return { check: name, family, basis, kindOfLimit: limitKind, clause, plane, stage, ...outcomeOf(check), notes }
}

function outcomeOf(check: Check) {
  switch (check.kind) {
    case 'compared': {
      const { demand, limit, unit, compares, utilisation, spare, status, statusOnceAccepted, readingIds } = check
      return { demand, limit, unit, compares, utilisation, distance: spare, status, statusOnceAccepted, readingIds }
    }
    case 'refused': {
      const { status, code, field, message } = check
      return { ...NOTHING_COMPARED, status, code, field, message }
    }
    case 'advice': {
      const { measured, usual, unit, isUsual } = check
      return { ...NOTHING_COMPARED, unit, status: null, measured, usual, isUsual }
    }
  }
}

const NOTHING_COMPARED = { demand: null, limit: null, unit: null, utilisation: null, distance: null }
