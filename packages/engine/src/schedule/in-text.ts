const TEXT_ORDER = new Intl.Collator('en', { numeric: true })
/** Order of names in which numbers count as numbers: E2 before E10. */
export const inText = (a: string, b: string): number => TEXT_ORDER.compare(a, b) || (a < b ? -1 : a > b ? 1 : 0)
