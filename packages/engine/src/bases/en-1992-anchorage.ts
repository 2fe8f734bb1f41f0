import type { Clause } from '../step'
import type { Anchorage, AnchorageInput, BondPlace, GapInput } from './basis'

/** EN 1992-1-1:2004, 8.4 and 8.7: how far a bar must run on before it carries its stress. */
const ANCHORAGE: Clause = { source: 'EN 1992-1-1:2004', section: '8.4.2 to 8.4.4', tag: 'digest' }

/** Laps: Eq. 8.10 and 8.11; alpha 6 from memory. */
export const LAP: Clause = { source: 'EN 1992-1-1:2004', section: '8.7.3', tag: 'memory' }

const LINK_HOOK: Clause = { source: 'EN 1992-1-1:2004', section: '8.5, Fig. 8.5', tag: 'memory' }

/** A link bent by 90 degrees runs on straight for 10 d and 70 mm at least (8.5, Fig. 8.5; from memory). */
export const linkHook = (diameter: number): { readonly length: number; readonly clause: Clause } => ({
  length: Math.max(10 * diameter, 70),
  clause: LINK_HOOK,
})

/** The job's own setting is added by who asks. */
const CLEAR_GAP: Clause = {
  source: 'Clear gap between bars',
  section: 'largest of the bar, aggregate + 5, 20 and the job setting (EN 1992-1-1 8.2)',
  tag: 'memory',
}

/** Clear gap between bars side by side: the bar, the aggregate and 5, 20 mm (8.2; from memory). */
export const clearGap = ({ diameter, aggregate }: GapInput): { readonly value: number; readonly clause: Clause } => ({
  value: Math.max(diameter, aggregate + 5, 20),
  clause: CLEAR_GAP,
})

/**
 * Laps whose middles lie within 0.65 of a lap length of a section count as lapped there (8.7.3, from memory), so two
 * laps stand in different sections from twice that on.
 */
export const LAP_STAGGER = 1.3

interface BondFactors {
  readonly gammaC: number
  readonly alphaCt: number
}

/** The bond rule may not count on more than a C60/75 concrete (8.4.2(2)). */
const STRENGTH_FOR_BOND_MAX = 60

/** Good bond (8.4.2(2), Fig. 8.2; from memory): up to DEEP the lower part of a section, beyond it all but the top, mm. */
const GOOD_BOND_LOWER = 250
const DEEP = 600
const POOR_BOND_TOP = 300

/**
 * Whether a level bar lies in good bond (8.4.2(2), Fig. 8.2; from memory): in the lower 250 of a section up to 600 deep,
 * in a deeper one anywhere but in its top 300.
 */
export function isGoodBond({ depth, fromSoffit }: BondPlace): boolean {
  const goodTo = depth > DEEP ? depth - POOR_BOND_TOP : GOOD_BOND_LOWER
  return (fromSoffit ?? depth) <= goodTo
}

/** Mean tensile strength, MPa (Table 3.1). */
export const meanTensile = (fck: number): number =>
  fck <= 50 ? 0.3 * Math.cbrt(fck) ** 2 : 2.12 * Math.log(1 + (fck + 8) / 10)

const between = (least: number, value: number, most: number): number => Math.min(Math.max(value, least), most)

/** Table 8.2, bars in tension; no credit where cd is not known. From memory. */
function shapeFactors({ diameter, cd, isBent }: AnchorageInput): number {
  if (cd === null) return 1
  const alpha1 = isBent && cd > 3 * diameter ? 0.7 : 1
  const alpha2 = between(0.7, 1 - (0.15 * (cd - (isBent ? 3 : 1) * diameter)) / diameter, 1)
  return alpha1 * alpha2
}

/** Length beyond a line that a bar needs to carry `stress` there: Eq. 8.2, 8.3, 8.4, 8.6. */
export function anchorage(input: AnchorageInput, { gammaC, alphaCt }: BondFactors): Anchorage {
  const { diameter, strength, stress } = input
  const fctk = 0.7 * meanTensile(Math.min(strength, STRENGTH_FOR_BOND_MAX))
  const eta1 = input.isGoodBond ? 1 : 0.7
  const eta2 = diameter <= 32 ? 1 : (132 - diameter) / 100
  const bond = (2.25 * eta1 * eta2 * alphaCt * fctk) / gammaC
  const required = (diameter / 4) * (stress / bond)
  const least = Math.max(0.3 * required, 10 * diameter, 100)
  return { bond, required, least, length: Math.max(shapeFactors(input) * required, least), clause: ANCHORAGE }
}

/** Lap length, Eq. 8.10 and 8.11; alpha6 from the share of bars lapped at one section. From memory. */
export function lap(input: AnchorageInput, share: number, factors: BondFactors): number {
  const alpha6 = between(1, Math.sqrt((share * 100) / 25), 1.5)
  const { required } = anchorage(input, factors)
  return Math.max(shapeFactors(input) * alpha6 * required, 0.3 * alpha6 * required, 15 * input.diameter, 200)
}
