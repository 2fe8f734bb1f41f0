/** A layout in which steel is tried: what stays of its own steel, and one zone at a time with a candidate in it. */

import type { CheckContext } from '../checks/outcome'
import { withSteel, type LayoutIndex } from '../layout-index'
import type { Steel, SteelShape, SteelZone } from '../model'
import type { Zone } from '../result'
import { typeLetterOf } from '../schedule/bar-key'
import type { BarSize } from '../schedule/bar-standards'
import { bentShape } from '../schedule/bars'
import { barStandardById, BS_8666_2020 } from '../schedule/bs-8666'
import type { Candidate, Candidates } from './candidate'
import { nearbyIndex } from './nearby'
import type { Blocked } from './proposal'
import { faultsBefore, heldBy, needsOf, outBy, stoppedBy, unmetOf, type Ground } from './verdict'
import { weigherOf, type Weigher } from './weigh'
import { inWords } from './words'

export interface Bench extends Weigher {
  readonly context: CheckContext
  /** The layout round one zone, for what is worked out member by member. */
  readonly near: (zone: Zone) => LayoutIndex
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
    near: nearOf(context),
    ...weigherOf(context),
    letter: typeLetterOf(settings.reinforcementGrade),
    sizes: [...sizes].sort((a, b) => a.diameter - b.diameter),
    clearGap: settings.clearGapMin,
  }
}

/** Made once for each zone that asks, so that what does not hang on steel is worked out once for all its candidates. */
function nearOf(context: CheckContext): Bench['near'] {
  const made = new Map<string, LayoutIndex>()
  return (zone) => {
    const known = made.get(zone.id) ?? nearbyIndex(context.index, zone)
    made.set(zone.id, known)
    return known
  }
}

/** The same bench with more steel in place. */
export function withPlaced(bench: Bench, placed: ReadonlyMap<string, readonly Steel[]>): Bench {
  const context = contextPlus(bench.context, placed)
  return { ...bench, context, near: nearOf(context) }
}

const contextPlus = (context: CheckContext, placed: ReadonlyMap<string, readonly Steel[]>): CheckContext => ({
  ...context,
  index: indexPlus(context.index, placed),
})

function indexPlus(index: LayoutIndex, placed: ReadonlyMap<string, readonly Steel[]>): LayoutIndex {
  const whole = new Map([...placed].map(([key, steel]) => [key, [...steelIn(index, key), ...steel]]))
  return withSteel(index, whole)
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
  contextPlus(bench.context, new Map([[place.key, asSteel(place, shapes)]]))

/** What is wrong with a zone's own bars before anything is tried; made once for each. */
export const faultsAt = perBench((bench, place) => faultsBefore(groundWith(bench, place, []), place.zone))

/** Works something out once for each bench and zone that asks. */
export function perBench<T>(make: (bench: Bench, place: Place) => T): (bench: Bench, place: Place) => T {
  const ofBench = new WeakMap<Bench, Map<string, { readonly value: T }>>()
  return (bench, place) => {
    const made = ofBench.get(bench) ?? new Map<string, { readonly value: T }>()
    ofBench.set(bench, made)
    const known = made.get(place.zone.id) ?? { value: make(bench, place) }
    made.set(place.zone.id, known)
    return known.value
  }
}

/** Whether steel alone stands in nothing's way and has its cover, whatever its zone still needs beside it. */
export const isFixable = (bench: Bench, place: Place, shapes: readonly SteelShape[]): boolean =>
  heldBy(groundWith(bench, place, shapes), place.zone, faultsAt(bench, place)) === null

/** What the checks of a zone are asked with, a candidate in its place. */
export function groundWith(bench: Bench, place: Place, shapes: readonly SteelShape[]): Ground {
  const placed = new Map([[place.key, asSteel(place, shapes)]])
  const settled = bench.near(place.zone)
  // Bars for anchors that act as one stand with one of them.
  const zone = { ...place.zone, id: place.key, kind: place.steelZone.kind }
  return { context: contextPlus(bench.context, placed), near: { trial: indexPlus(settled, placed), settled, zone } }
}

/** Distinct sets of marks that are kept for the choice over the pour. */
const OPTIONS_KEPT = 5
/** Candidates that are tried in one zone: where so many of the lightest do not pass, heavier ones are stopped by the same. */
const TRIES_MAX = 60
/** Reasons that are worth reading where nothing passes. */
const BLOCKED_KEPT = 6

/** Tries candidates in their zone, lightest first, by the real checks of the zone. */
export function tryAll(bench: Bench, place: Place, { candidates, blocked: impossible }: Candidates): Tried {
  const before = faultsAt(bench, place)
  const ordered = candidates
    .map(({ shapes }, at) => ({ shapes, at, mass: bench.roughly(shapes) }))
    .sort((a, b) => a.mass - b.mass || a.shapes.length - b.shapes.length || a.at - b.at)
  const options = new Map<string, Option>()
  const blocked: Blocked[] = [...impossible]
  for (const { shapes } of ordered) {
    if (options.size >= OPTIONS_KEPT || blocked.length - impossible.length >= TRIES_MAX) break
    const id = barsIn(shapes)
    if (options.has(id)) continue
    const refused = refusedBy(bench, place, { shapes, before })
    if (refused) blocked.push({ candidate: inWords(shapes, bench.letter), ...refused })
    else {
      const { mass, keys } = bench.weigh(shapes, { zone: place.steelZone, pourId: place.pourId })
      options.set(id, { shapes, mass, keys })
    }
  }
  if (ordered.length === 0 && blocked.length === 0) blocked.push(...nothingToTry(bench, place))
  return { options: [...options.values()], blocked: spread(blocked) }
}

/** Sets of the same bars, wherever they stand, have the same marks. */
const barsIn = (shapes: readonly SteelShape[]): string => JSON.stringify(shapes.map(bentShape))

/** The bar that cannot be bent, or the check that does not pass; null where the candidate does. */
function refusedBy(
  bench: Bench,
  place: Place,
  { shapes, before }: Candidate & { readonly before: ReadonlySet<string> },
): Pick<Blocked, 'check' | 'by'> | null {
  const stopped = stoppedBy(groundWith(bench, place, shapes), place.zone, before)
  if (stopped) return { check: stopped.name, by: outBy(stopped) }
  const { problem } = bench.weigh(shapes, { zone: place.steelZone, pourId: place.pourId })
  return problem === null ? null : { check: 'Bar shape', by: problem }
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
