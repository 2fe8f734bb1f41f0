import { FAMILY_WORDS } from '@wedgeline/engine/result'
import type { Check, Clause, Compared, Family, Status, ZoneResult } from '@wedgeline/engine'

/** How checks read on screen; the same words everywhere. */

/** A ratio rounds up at two decimals, so that 1.001 never reads 1.00; null is a demand with no steel at all. */
export function ratioText(ratio: number | null): string {
  if (ratio === null) return 'no steel'
  // 0.7 * 100 is 70.00000000000001 in binary: what is not a figure anybody typed is taken off before rounding up.
  const hundredths = Math.ceil(Number((ratio * 100).toPrecision(12)))
  return (hundredths / 100).toFixed(2)
}

/** A figure with its unit, to the figures that matter: no more than one decimal above 10, two below. */
export function quantityText(value: number, unit: string): string {
  const figures = Math.abs(value) >= 100 ? 0 : Math.abs(value) >= 10 ? 1 : 2
  const text = trimmed(value.toFixed(figures))
  return unit === '-' ? text : `${text} ${unitText(unit)}`
}

/** Figures and unit in the size in which people use them: N as kN. */
export function shownQuantity(value: number, unit: string): string {
  if (unit === 'N') return quantityText(value / 1000, 'kN')
  if (unit === 'rad') return quantityText((value * 180) / Math.PI, 'deg')
  return quantityText(value, unit)
}

export const unitText = (unit: string): string => unit.replaceAll('mm2', 'mm²').replace('deg', '°')

const trimmed = (figures: string): string => (figures.includes('.') ? figures.replace(/\.?0+$/, '') : figures)

/** What a comparison came to: 0.84, spare 35 mm, short by 13 mm. */
export function outcomeText(check: Compared): string {
  if (check.compares === 'ratio') return ratioText(check.utilisation)
  const spare = check.spare ?? 0
  return spare < 0 ? `short by ${shownQuantity(-spare, check.unit)}` : `spare ${shownQuantity(spare, check.unit)}`
}

/** Both sides of a comparison: 377 of 452 mm², or 62 mm, needs 75. */
export function sidesText(check: Compared): string {
  const demand = shownQuantity(check.demand, check.unit)
  const limit = shownQuantity(check.limit, check.unit)
  if (check.compares === 'ratio') return `${demand} of ${limit}`
  return check.compares === 'at-least' ? `${demand}, needs ${limit}` : `${demand}, at most ${limit}`
}

export interface Worst {
  readonly status: Status
  readonly words: string
}

/** A zone's worst check in a few words; null where nothing but advice was made. */
export function worstWords({ status, checks }: ZoneResult): Worst | null {
  const [first] = checks
  if (status === null || !first || first.kind === 'advice') return null
  return { status, words: checkWords(first) }
}

/** A check by name and outcome: Bursting in plan 0.84; Height above soffit, short by 13 mm. */
export function checkWords(check: Exclude<Check, { readonly kind: 'advice' }>): string {
  if (check.kind === 'refused') return check.name
  const outcome = outcomeText(check)
  const isFigure = check.compares === 'ratio' && check.utilisation !== null
  return isFigure ? `${check.name} ${outcome}` : `${check.name}, ${outcome}`
}

export const TAG_WORDS = {
  read: '',
  digest: 'read in a digest',
  secondary: 'read in a secondary source',
  memory: 'from memory',
  'memory-unsure': 'from memory, unsure',
  derived: 'derived',
  computed: 'computed',
  practice: 'common practice',
} as const

/** A clause with how sure we are of it, where that has to be said: EN 1992-1-1, 6.5.3 (read in a digest). */
export function clauseText({ source, section, tag }: Clause): string {
  const sure = TAG_WORDS[tag]
  return `${source}, ${section}${sure ? ` (${sure})` : ''}`
}

/** A zone's worst check as short as a strip needs it: bursting in plan 2.58; cover, short 30. */
export function worstShort({ status, checks }: ZoneResult): Worst | null {
  const [first] = checks
  if (status === null || !first || first.kind === 'advice') return null
  const family = FAMILY_SHORT[first.family]
  if (first.kind === 'refused') return { status, words: family }
  if (first.compares === 'ratio') {
    const joint = first.utilisation === null ? ', ' : ' '
    return { status, words: `${family}${joint}${ratioText(first.utilisation)}` }
  }
  const spare = Math.round(first.spare ?? 0)
  return { status, words: spare < 0 ? `${family}, short ${-spare}` : `${family}, spare ${spare}` }
}

const FAMILY_SHORT: Readonly<Record<Family, string>> = {
  bearing: 'bearing',
  'bursting-thickness': 'thickness',
  'bursting-plan': 'plan',
  spalling: 'spalling',
  'depth-change': 'depth',
  cover: 'cover',
  spacing: 'spacing',
  'straight-length': 'straight',
  'edge-wedge': 'wedge',
  joint: 'joint',
  'pan-access': 'access',
  'pan-bars': 'pan bars',
  tendon: 'force',
  'dead-end': 'dead end',
  precompression: 'P/A',
  fit: 'fit',
  anchorage: 'anchorage',
  strength: 'strength',
}

/** What this version does not check at a zone, as one sentence; null where nothing is left. */
export function notYetText(families: readonly Family[]): string | null {
  if (families.length === 0) return null
  return `Not yet checked here: ${families.map((family) => FAMILY_WORDS[family]).join(', ')}.`
}
