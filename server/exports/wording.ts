import type { Family, PourResult } from '@wedgeline/engine'
import type { ScheduleWorkbookInput } from './workbook'

export const CAUTIONS = [
  'Results assist a qualified engineer and do not replace one.',
  'Local codes and licensed practice govern.',
] as const

export const statusLine = ({ approval }: ScheduleWorkbookInput): string =>
  approval ? `APPROVED by ${approval.by} on ${approval.on}` : 'DRAFT: NOT FOR CONSTRUCTION'

export const editionLine = ({ schedule }: ScheduleWorkbookInput): string =>
  `Shapes, dimensions and lengths follow ${schedule.edition}. Its tables were not read in the original print: see Notes.`

/** Families that this schedule or any of its zones was not checked for, with the number of zones. */
export function notYetChecked({
  schedule,
  checks,
}: ScheduleWorkbookInput): readonly { family: Family; zones: number }[] {
  const zones = new Map<Family, number>(schedule.notYetChecked.map((family) => [family, 0]))
  for (const family of missing(checks)) zones.set(family, (zones.get(family) ?? 0) + 1)
  return [...zones].map(([family, count]) => ({ family, zones: count }))
}

const missing = (checks: PourResult): readonly Family[] => checks.zones.flatMap((zone) => zone.notYetChecked)
