/** One bar past a line, or lapped with another, against the length that the basis asks for. */

import type { Anchorage, AnchorageInput } from '../bases/basis'
import type { Compared, Zone } from '../result'
import { developedShare } from '../steel/developed'
import { step, type Clause, type Step } from '../step'
import { distanceCheck } from './distance-check'
import type { CheckContext } from './outcome'

const LENGTHS: Clause = { source: 'Geometry of the bars', section: 'length past the line', tag: 'derived' }

export interface Past {
  readonly name: string
  readonly past: Step
  readonly input: AnchorageInput
  /** What counts the bar with a share of its area where it is short; null where nothing does. */
  readonly countedBy: string | null
}

/** A bar that must run on past a line, by the anchorage of the basis. */
export function pastCheck({ basis }: CheckContext, zone: Zone, { name, past, input, countedBy }: Past): Compared {
  const anchorage = basis.anchorage(input)
  const steps = anchorageSteps(input, anchorage)
  const limit = countedBy === null ? anchorage.length : anchorage.least
  return distanceCheck({
    zoneId: zone.id,
    family: 'anchorage',
    name,
    stage: null,
    limitKind: 'C',
    clause: anchorage.clause,
    notes: [shareNote(past.value, anchorage, countedBy)].filter((note) => note !== null),
    demand: past.value,
    limit,
    isClearance: false,
    steps: [past, ...steps],
    mend: null,
  })
}

function shareNote(past: number, anchorage: Anchorage, countedBy: string | null): string | null {
  if (past >= anchorage.length) return null
  const full = `${Math.ceil(anchorage.length)} would develop it in full`
  if (countedBy === null) return `${Math.floor(past)} past the line; ${full}.`
  const share = developedShare(past, anchorage)
  const least = `${Math.ceil(anchorage.least)} is the least`
  return share === 0
    ? `Does not count ${countedBy}: ${least}.`
    : `Counts ${countedBy} with ${share.toFixed(2)} of its area: ${full}, ${least}.`
}

function anchorageSteps(input: AnchorageInput, { bond, required, least, length, clause }: Anchorage): readonly Step[] {
  const basic = step(
    {
      symbol: 'lb',
      meaning: `Basic length to develop the stress in concrete of ${Math.round(input.strength * 10) / 10} MPa`,
      formula: 'd / 4 * sigma / fb',
      unit: 'mm',
      clause,
    },
    { d: input.diameter, sigma: input.stress, fb: bond },
    (v) => ((v.d / 4) * v.sigma) / v.fb,
  )
  return [
    basic,
    step(
      { symbol: 'lmin', meaning: 'Least length that counts', formula: 'least', unit: 'mm', clause },
      { least },
      (v) => v.least,
    ),
    step(
      {
        symbol: 'ld',
        meaning: 'Length that develops it in full; k by cover and bend',
        formula: 'k * max(lb, lmin)',
        unit: 'mm',
        clause,
      },
      { k: length / Math.max(required, least), lb: required, lmin: least },
      (v) => v.k * Math.max(v.lb, v.lmin),
    ),
  ]
}

/** Of several sets of one kind the one with the least to spare. */
export function worstOfEach(checks: readonly Compared[]): readonly Compared[] {
  const worst = new Map<string, Compared>()
  for (const check of checks) {
    const before = worst.get(check.name)
    if (!before || (check.spare ?? 0) < (before.spare ?? 0)) worst.set(check.name, check)
  }
  return [...worst.values()]
}

export interface PastLine {
  readonly meaning: string
  readonly formula: string
  readonly values: Readonly<Record<string, number>>
}

/** The length of bar past its line, as a step. */
export const pastLine = ({ meaning, formula, values }: PastLine, value: number): Step =>
  step({ symbol: 'past', meaning, formula, unit: 'mm', clause: LENGTHS }, values, () => value)

/** What a lap is worked out from, as a step. `share` is the part of the bars lapped at one section. */
export function lapStep({ basis }: CheckContext, input: AnchorageInput, share: number): Step {
  const { diameter, strength, cd } = input
  const cover = cd === null ? 'no credit for cover' : `cd ${Math.round(cd)}`
  const meaning =
    `Lap of bars of ${diameter} in concrete of ${Math.round(strength * 10) / 10} MPa, ${cover}, ` +
    `${Math.round(share * 100)} % lapped at one section`
  const line = { symbol: 'l0', meaning, formula: 'lap', unit: 'mm', clause: basis.clauses.lap }
  return step(line, { lap: basis.lap(input, share) }, (v) => v.lap)
}

interface LapCheck {
  readonly name: string
  readonly past: Step
  /** Lap asked for, with its clause. */
  readonly lap: Step
  readonly notes: readonly string[]
}

/** A lap, or a bar that must run on past a line by one. */
export function lapCheck(zone: Zone, { name, past, lap, notes }: LapCheck): Compared {
  return distanceCheck({
    zoneId: zone.id,
    family: 'anchorage',
    name,
    stage: null,
    limitKind: 'C',
    clause: lap.clause,
    notes,
    demand: past.value,
    limit: lap.value,
    isClearance: false,
    steps: [past, lap],
    mend: null,
  })
}
