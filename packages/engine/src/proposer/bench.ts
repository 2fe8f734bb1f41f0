/** A layout in which steel is tried: what stays of its own steel, and one zone at a time with a candidate in it. */

import type { CheckContext } from '../checks/outcome'
import { withSteel, type LayoutIndex } from '../layout-index'
import type { Steel, SteelShape, SteelZone } from '../model'
import type { Zone } from '../result'
import { typeLetterOf } from '../schedule/bar-key'
import type { BarSize } from '../schedule/bar-standards'
import { barStandardById, BS_8666_2020 } from '../schedule/bs-8666'
import type { Candidate, Candidates } from './candidate'
import type { Blocked } from './proposal'
import { faultsBefore, needsOf, outBy, stoppedBy, unmetOf } from './verdict'
import { weigherOf, type Weigher } from './weigh'
import { inWords } from './words'

export interface Bench extends Weigher {
  readonly context: CheckContext
  /** Letter before a bar's size. */
  readonly letter: string
  /** Sizes that the job allows, as its bar standard has them, smallest first. */
  readonly sizes: readonly BarSize[]
  /** Between two bars side by side, mm. */
  readonly clearGap: number
}

/** A zone with the steel zone that its bars are entered for. */
export interface Place {
  /** Whose checks decide. */
  readonly zone: Zone
  /** Where its bars are entered, and the key that steel is found by there. */
  readonly steelZone: SteelZone
  readonly key: string
  readonly pourId: string
}

/** Steel that passes every check of its zone. */
export interface Option extends Candidate {
  readonly mass: number
  readonly keys: readonly string[]
}

export interface Tried {
  /** Lightest first; no two with the same marks. */
  readonly options: readonly Option[]
  readonly blocked: readonly Blocked[]
}

export function benchOf(context: CheckContext): Bench {
  const { layout } = context.index
  const { settings } = layout.job
  const standard = barStandardById(settings.barStandard) ?? BS_8666_2020
  const sizes = standard.sizes.filter(({ diameter }) => settings.barSizes.includes(diameter))
  return {
    context,
    ...weigherOf(context),
    letter: typeLetterOf(settings.reinforcementGrade),
    sizes: [...sizes].sort((a, b) => a.diameter - b.diameter),
    clearGap: settings.clearGapMin,
  }
}

/** The same bench with more steel in place. */
export function withPlaced(bench: Bench, placed: ReadonlyMap<string, readonly Steel[]>): Bench {
  const { index } = bench.context
  const whole = new Map([...placed].map(([key, steel]) => [key, [...steelIn(index, key), ...steel]]))
  return { ...bench, context: { ...bench.context, index: withSteel(index, whole) } }
}

const steelIn = (index: LayoutIndex, key: string): readonly Steel[] => index.steelOfZone.get(key) ?? []

/** Steel by the key of the place that it is entered for; places that share one have theirs together. */
export function byKey(
  places: readonly Place[],
  shapesOf: (place: Place) => readonly SteelShape[],
): Map<string, Steel[]> {
  const steel = new Map<string, Steel[]>()
  for (const place of places) {
    steel.set(place.key, [...(steel.get(place.key) ?? []), ...asSteel(place, shapesOf(place))])
  }
  return steel
}

/** Steel of a candidate as the layout would hold it; its ids stand for nothing outside a trial. */
export const asSteel = ({ zone, steelZone, pourId }: Place, shapes: readonly SteelShape[]): Steel[] =>
  shapes.map((shape, i) => ({
    id: `proposed:${zone.id}:${i}`,
    pourId,
    zone: steelZone,
    shape,
    source: 'proposed',
    isLocked: false,
  }))

/** The checks' context with a candidate in its zone. */
export const contextWith = (bench: Bench, place: Place, shapes: readonly SteelShape[]): CheckContext =>
  withPlaced(bench, new Map([[place.key, asSteel(place, shapes)]])).context

/** Distinct sets of marks that are kept for the choice over the pour. */
const OPTIONS_KEPT = 8
/** Reasons that are worth reading where nothing passes. */
const BLOCKED_KEPT = 6

/** Tries candidates in their zone, lightest first, by the real checks of the zone. */
export function tryAll(bench: Bench, place: Place, { candidates, blocked: impossible }: Candidates): Tried {
  const before = faultsBefore(bench.context, place.zone)
  const weighed = candidates
    .map(({ shapes }, at) => ({ shapes, at, ...bench.weigh(shapes, place.steelZone) }))
    .sort((a, b) => a.mass - b.mass || a.shapes.length - b.shapes.length || a.at - b.at)
  const options = new Map<string, Option>()
  const blocked: Blocked[] = [...impossible]
  for (const { shapes, mass, keys, problem } of weighed) {
    const id = keys.join('+')
    if (options.has(id)) continue
    if (options.size >= OPTIONS_KEPT) break
    const words = inWords(shapes, bench.letter)
    if (problem !== null) {
      blocked.push({ candidate: words, check: 'Bar shape', by: problem })
      continue
    }
    const stopped = stoppedBy(contextWith(bench, place, shapes), place.zone, before)
    if (stopped) blocked.push({ candidate: words, check: stopped.name, by: outBy(stopped) })
    else options.set(id, { shapes, mass, keys })
  }
  if (weighed.length === 0 && blocked.length === 0) blocked.push(...nothingToTry(bench, place))
  return { options: [...options.values()], blocked: spread(blocked) }
}

/** A need that no steel of this kind of zone meets is named by itself. */
function nothingToTry(bench: Bench, { zone }: Place): Blocked[] {
  return unmetOf(needsOf(bench.context, zone)).map((need) => ({
    candidate: inWords([], bench.letter),
    check: need.name,
    by: outBy(need),
  }))
}

/** One of each kind of reason first, then more of them. */
function spread(blocked: readonly Blocked[]): Blocked[] {
  const seen = new Set<string>()
  const firsts = blocked.filter(({ check }) => !seen.has(check) && seen.add(check))
  return [...firsts, ...blocked.filter((one) => !firsts.includes(one))].slice(0, BLOCKED_KEPT)
}
