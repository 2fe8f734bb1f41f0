import { step, type Clause } from '../step'
import type { Anchorage, AnchorageInput, BondPlace, GapInput, Transmission, TransmissionInput } from './basis'

/** AS 3600:2018, 13.1 and 13.2 as read in a secondary source. */
const DEVELOPMENT: Clause = { source: 'AS 3600:2018', section: '13.1.2.2 to 13.1.2.6', tag: 'secondary' }

/** Standard hook of 135 or 180 degrees: straight past its bend, 4 diameters and 70 at least. */
const LINK_HOOK: Clause = { source: 'AS 3600:2018', section: '13.1.2.7', tag: 'secondary' }

/** Straight length past the bend that the hook of a closed link needs, mm. */
export const linkHook = (diameter: number): { readonly length: number; readonly clause: Clause } => ({
  length: Math.max(4 * diameter, 70),
  clause: LINK_HOOK,
})

/** The code asks that concrete can be placed and compacted and names no figure; the figures are usual ones. */
const CLEAR_GAP: Clause = {
  source: 'Clear gap between bars',
  section: 'largest of the bar, 1.5 times the aggregate, 25 and the job setting (usual with AS 3600:2018 17.1.3)',
  tag: 'memory-unsure',
}

/** Clear gap between bars side by side: the bar, 1.5 times the aggregate, 25 mm (from memory, not sure). */
export const clearGap = ({ diameter, aggregate }: GapInput): { readonly value: number; readonly clause: Clause } => ({
  value: Math.max(diameter, 1.5 * aggregate, 25),
  clause: CLEAR_GAP,
})

/** Laps with 0.3 of a lap length between their ends stand in different sections (13.2.2; from memory, not sure). */
export const LAP_STAGGER = 1.3

/** 13.3, from memory. */
const TRANSMISSION: Clause = { source: 'AS 3600:2018', section: '13.3.2', tag: 'memory' }

/** No more than this strength counts in the length, MPa. */
const STRENGTH_MAX = 65

/** With no more concrete than this below a bar, it lies in good bond, mm. */
const BELOW_MAX = 300

/** Strand diameters over which a strand gives its force to the concrete. */
const STRAND_DIAMETERS = 60

const between = (least: number, value: number, most: number): number => Math.min(Math.max(value, least), most)

/** Whether a level bar has 300 or less of concrete cast below it (13.1.2.2, k1), taken to its centre. */
export const isGoodBond = ({ depth, fromSoffit }: BondPlace): boolean => (fromSoffit ?? depth) <= BELOW_MAX

/** Factor for the concrete cast below the bar. */
const placeFactor = (input: AnchorageInput): number => (input.isGoodBond ? 1 : 1.3)

/** Basic length to develop the yield strength, without the least value; no credit where cd is not known. */
function basicLength(input: AnchorageInput, fsy: number): number {
  const { diameter, strength, cd } = input
  const k2 = (132 - diameter) / 100
  const k3 = cd === null ? 1 : between(0.7, 1 - (0.15 * (cd - diameter)) / diameter, 1)
  return (0.5 * placeFactor(input) * k3 * fsy * diameter) / (k2 * Math.sqrt(Math.min(strength, STRENGTH_MAX)))
}

const leastLength = (input: AnchorageInput, fsy: number): number => 0.058 * fsy * placeFactor(input) * input.diameter

/** Length beyond a line that a bar needs to carry `stress` there; half of it with a hook or cog. `fsy` MPa. */
export function anchorage(input: AnchorageInput, fsy: number): Anchorage {
  const { diameter, stress, isBent } = input
  const yieldLength = Math.max(basicLength(input, fsy), leastLength(input, fsy))
  const required = (stress / fsy) * yieldLength
  const least = 12 * diameter
  return {
    bond: (diameter * fsy) / (4 * yieldLength),
    required,
    least,
    length: Math.max(required, least) * (isBent ? 0.5 : 1),
    clause: DEVELOPMENT,
  }
}

/**
 * Lap length (13.2.2): k7 times the length for yield, k7 1.0 where no more than half of the bars are lapped at one
 * section and half their strength is enough, else 1.25. The least value of the length is no part of the product.
 */
export function lap(input: AnchorageInput, share: number, fsy: number): number {
  const k7 = share <= 0.5 && input.stress <= fsy / 2 ? 1 : 1.25
  return Math.max(k7 * basicLength(input, fsy), leastLength(input, fsy))
}

/** One value without bounds: 60 strand diameters, whatever stress and strength. */
export function transmission({ diameter }: TransmissionInput): Transmission {
  const length = step(
    {
      symbol: 'Lpt',
      meaning: 'Transmission length of strand; the clause has one value, without bounds',
      formula: '60 * db',
      unit: 'mm',
      clause: TRANSMISSION,
    },
    { db: diameter },
    (v) => STRAND_DIAMETERS * v.db,
  )
  const { value } = length
  return { lower: value, length: value, upper: value, clause: TRANSMISSION, steps: [length] }
}
