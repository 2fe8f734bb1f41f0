import type { Family, PourResult, Status, SteelKind } from '@wedgeline/engine'
import type { ScheduleWorkbookInput } from './workbook'

export const CAUTIONS = [
  'Results assist a qualified engineer and do not replace one.',
  'Local codes and licensed practice govern.',
] as const

export const STATUS_WORDS: Readonly<Record<Status, string>> = {
  stop: 'stop',
  'not-covered': 'not covered',
  over: 'over',
  'needs-judgement': 'needs judgement',
  near: 'near',
  within: 'within',
}

export const KIND_WORDS: Readonly<Record<SteelKind, string>> = {
  spiral: 'spirals',
  links: 'links',
  hairpins: 'hairpins',
  'edge-bars': 'edge bars',
  'transverse-bars': 'transverse bars',
  'wedge-bars': 'wedge bars',
  trimmers: 'trimmers',
  diagonals: 'diagonal bars',
  'tie-back-bars': 'tie-back bars',
  'lap-bars': 'lap bars',
}

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
