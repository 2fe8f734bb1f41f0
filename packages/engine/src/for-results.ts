/** What screens need of results beside their types: the words for statuses, families and bars, and how a quick edge shows them. */
export { FAMILIES, FAMILY_WORDS, STATUSES, STATUS_WORDS } from './result'
export { STEEL_NAMES } from './steel-names'
export { onProposedReadings } from './proposed-readings'
