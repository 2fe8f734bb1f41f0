/** Where wedge bars could take one length: told to whoever schedules, never done behind the engineer's back. */

import type { JobSettings } from '../model'
import { sizeOf, type BarStandard } from './bar-standards'
import type { ZoneBars } from './bars'
import { cutLength, roundedShape } from './cut-length'
import { inText } from './in-text'

interface WedgeSet {
  readonly zoneName: string
  readonly diameter: number
  readonly length: number
  readonly count: number
}

type Limits = Pick<JobSettings, 'oneLengthWithin' | 'oneLengthMass'>

/**
 * Sentences on wedge bars that could share a length: all bars of one wedge where that costs no more than the job's
 * mass, and wedges of a pour whose bars differ by no more than the job's length (common practice, no source).
 */
export function oneLengthChances(
  bars: readonly ZoneBars[],
  standard: BarStandard,
  { oneLengthWithin, oneLengthMass }: Limits,
): readonly string[] {
  const sets = setsOf(bars, standard)
  const within = grouped(sets, ({ zoneName, diameter }) => `${zoneName}|${diameter}`).flatMap((group) => {
    const [first] = group
    const more = extraMass(group, standard)
    if (!first || lengthsOf(group).length < 2 || more > oneLengthMass) return []
    return [
      `${first.zoneName}: one length of ${longestOf(group)} for all wedge bars of ${first.diameter} costs ${kg(more)}.`,
    ]
  })
  const between = grouped(sets, ({ diameter }) => String(diameter)).flatMap((group) =>
    clusters(group, oneLengthWithin).flatMap((cluster) => chance(cluster, standard)),
  )
  return [...within, ...between]
}

function chance(cluster: readonly WedgeSet[], standard: BarStandard): readonly string[] {
  const [first] = cluster
  const zones = [...new Set(cluster.map(({ zoneName }) => zoneName))].sort(inText)
  const lengths = lengthsOf(cluster)
  if (!first || zones.length < 2 || lengths.length < 2) return []
  const fewer = lengths.length - 1
  return [
    `${zones.join(', ')}: wedge bars of ${first.diameter} are ${lengths.join(', ')} long; one length of ` +
      `${longestOf(cluster)} costs ${kg(extraMass(cluster, standard))} and saves ${fewer} mark${fewer === 1 ? '' : 's'}.`,
  ]
}

function setsOf(bars: readonly ZoneBars[], standard: BarStandard): readonly WedgeSet[] {
  const sets = bars.flatMap(({ kind, zoneName, shape, count }): readonly WedgeSet[] => {
    if (kind !== 'wedge-bars') return []
    const cut = cutLength(roundedShape(shape, standard), standard)
    return cut ? [{ zoneName, diameter: shape.diameter, length: cut.length, count }] : []
  })
  return sets.sort((a, b) => a.diameter - b.diameter || inText(a.zoneName, b.zoneName) || a.length - b.length)
}

/** From the longest down: each cluster reaches as far below its longest bar as the job allows. */
function clusters(sets: readonly WedgeSet[], within: number): readonly (readonly WedgeSet[])[] {
  const made: WedgeSet[][] = []
  for (const set of [...sets].sort((a, b) => b.length - a.length)) {
    const last = made.at(-1)
    if (last && (last[0]?.length ?? 0) - set.length <= within) last.push(set)
    else made.push([set])
  }
  return made
}

const lengthsOf = (sets: readonly WedgeSet[]): readonly number[] =>
  [...new Set(sets.map(({ length }) => length))].sort((a, b) => a - b)
const longestOf = (sets: readonly WedgeSet[]): number => Math.max(...sets.map(({ length }) => length))

function extraMass(sets: readonly WedgeSet[], standard: BarStandard): number {
  const longest = longestOf(sets)
  return sets.reduce((sum, { length, count, diameter }) => {
    const perMetre = sizeOf(standard, diameter)?.massPerMetre ?? 0
    return sum + (count * (longest - length) * perMetre) / 1000
  }, 0)
}

const kg = (mass: number): string => `${mass.toFixed(1)} kg`

function grouped(sets: readonly WedgeSet[], keyOf: (set: WedgeSet) => string): readonly (readonly WedgeSet[])[] {
  const groups = new Map<string, WedgeSet[]>()
  for (const set of sets) groups.set(keyOf(set), [...(groups.get(keyOf(set)) ?? []), set])
  return [...groups.values()]
}
