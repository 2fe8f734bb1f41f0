/** What screens need of results beside their types: the words and the order of statuses, and how a quick edge shows them. */
export { FAMILIES, FAMILY_WORDS, STATUSES } from './result'
export { onProposedReadings } from './proposed-readings'
