/**
 * Steel for the zones of a pour that passes every check of its zone, fits, is light and has few different marks.
 *
 * Candidates are sized from what each zone's own checks ask for and are held against those checks as they stand; no rule
 * is written twice. Zones in the same situation are looked at once. Which candidate each takes is then chosen over the
 * whole pour, and the outcome is checked once more with everything in place.
 */

import { basisOf } from '../bases'
import type { CheckContext } from '../checks/outcome'
import { layoutIndex, withSteel, type LayoutIndex } from '../layout-index'
import type { Layout, Steel, SteelShape } from '../model'
import type { Zone } from '../result'
import { barsOf } from '../schedule/bars'
import { benchOf, byKey, tryAll, withPlaced, type Bench, type Place, type Tried } from './bench'
import { candidatesFor, sharedBars } from './candidates'
import { cheapest, choices } from './choose'
import { placesOf } from './places'
import type { Blocked, Proposal, ProposeAsk, ProposedZone } from './proposal'
import { situationsOf, type Situation } from './situations'
import { faultsBefore, outBy, stoppedBy, worstCheck } from './verdict'
import { inWords } from './words'

/** What one different mark less is worth: bending, bundling, tagging and finding another bar (common practice), kg. */
const MASS_PER_MARK = 5

/** Order in which zones are given steel: bars along edges count at anchors, those of anchors where several act as one. */
const ORDER: readonly (readonly Place['zone']['kind'][])[] = [['edge'], ['anchor'], ['group', 'gap', 'joint', 'pan']]

/**
 * @returns what to add and take out in each zone. Steel set by hand or locked stays and counts; steel proposed before is
 *   replaced where something better passes.
 * @throws where the layout refers to what it does not hold.
 */
export function proposeSteel(layout: Layout, ask: ProposeAsk): Proposal {
  const assumed = withCrackChoice(layout)
  const work = workOf(assumed.layout, ask)
  const chosen = chooseAll(work, ask)
  const settled = settle(work, chosen.given)
  const zones = work.places.flatMap((place) => proposedZone(work, settled, place))
  const added = weighed(work, zones)
  return {
    pourId: ask.pourId,
    zones,
    mass: added.mass,
    marks: added.marks,
    curve: chosen.curve,
    point: chosen.point,
    isExact: chosen.isExact,
    notes: assumed.notes,
  }
}

/** A job that has not chosen how far wedges are kept from cracking is proposed steel for the middle choice. */
function withCrackChoice(layout: Layout): { readonly layout: Layout; readonly notes: readonly string[] } {
  const { crackChoices, isAccepted } = basisOf(layout.job)
  const middle = crackChoices[Math.floor(crackChoices.length / 2)]
  if (!middle || crackChoices.some(({ readingId }) => isAccepted(readingId))) return { layout, notes: [] }
  const reading = { readingId: middle.readingId, acceptedBy: '', acceptedAtMs: 0, reason: '' }
  const job = { ...layout.job, readings: [...layout.job.readings, reading] }
  const note = `The job has not chosen the crack steel of its edge wedges. Proposed for the middle choice: ${middle.title}.`
  return { layout: { ...layout, job }, notes: [note] }
}

// What there is to work with ----------------------------------------------------------------------------------------

interface Work {
  /** The layout as it is. */
  readonly before: CheckContext
  /** Without the steel that may be replaced. */
  readonly bare: Bench
  readonly places: readonly Place[]
}

export const isReplaceable = ({ source, isLocked }: Steel): boolean => source === 'proposed' && !isLocked

function workOf(layout: Layout, { pourId, zoneIds }: ProposeAsk): Work {
  const index = layoutIndex(layout)
  const before = { index, basis: basisOf(layout.job), nearFrom: layout.job.settings.nearFrom }
  const places = placesOf(index, pourId, zoneIds)
  const kept = new Map(places.map((place) => [place.key, steelAt(index, place).filter((one) => !isReplaceable(one))]))
  return { before, places, bare: benchOf({ ...before, index: withSteel(index, kept) }) }
}

const steelAt = (index: LayoutIndex, { key }: Place): readonly Steel[] => index.steelOfZone.get(key) ?? []

// Choosing ----------------------------------------------------------------------------------------------------------

interface Given {
  readonly shapes: readonly SteelShape[]
  readonly blocked: readonly Blocked[]
  /** Where steel was tried for all zones in the same situation. */
  readonly lookedAt?: Zone
}

interface Chosen {
  readonly given: ReadonlyMap<string, Given>
  readonly curve: Proposal['curve']
  readonly point: number
  readonly isExact: boolean
}

function chooseAll(work: Work, ask: ProposeAsk): Chosen {
  let bench = work.bare
  const found: { situation: Situation; tried: Tried }[] = []
  for (const kinds of ORDER) {
    const places = work.places.filter(({ zone }) => kinds.includes(zone.kind))
    const tried = triedOf(bench, places)
    found.push(...tried)
    bench = withPlaced(bench, lightestPlaced(tried))
  }
  const open = found.filter(({ tried }) => tried.options.length > 0)
  const groups = open.map(({ situation, tried }) => ({ weight: situation.places.length, options: tried.options }))
  const { curve, isExact } = choices(groups, marksThere(work, ask.pourId))
  const within = curve.filter(({ marks }) => ask.marksAtMost === undefined || marks <= ask.marksAtMost)
  const choice = cheapest(within.length > 0 ? within : curve.slice(0, 1), ask.massPerMark ?? MASS_PER_MARK)
  const given = new Map<string, Given>()
  for (const [at, { situation, tried }] of open.entries()) {
    const option = tried.options[choice?.picks[at] ?? 0]
    for (const { zone } of situation.places) given.set(zone.id, { shapes: option?.shapes ?? [], blocked: [] })
  }
  for (const { situation, tried } of found) {
    if (tried.options.length > 0) continue
    for (const { zone } of situation.places) {
      given.set(zone.id, { shapes: [], blocked: tried.blocked, lookedAt: situation.example.zone })
    }
  }
  return { given, curve: curve.map(({ marks, mass }) => ({ marks, mass })), point: choice?.marks ?? 0, isExact }
}

function triedOf(bench: Bench, places: readonly Place[]): { situation: Situation; tried: Tried }[] {
  const situations = situationsOf(bench, places)
  const shared = sharedBars(bench, situations)
  return situations.map((situation) => ({
    situation,
    tried: tryAll(bench, situation.example, candidatesFor(bench, situation.example, shared)),
  }))
}

function lightestPlaced(tried: readonly { situation: Situation; tried: Tried }[]): Map<string, Steel[]> {
  const shapesOf = new Map(
    tried.flatMap(({ situation, tried: { options } }) =>
      situation.places.map((place): [Place, readonly SteelShape[]] => [place, options[0]?.shapes ?? []]),
    ),
  )
  return byKey([...shapesOf.keys()], (place) => shapesOf.get(place) ?? [])
}

/** Marks that the pour has whatever is proposed: of steel that stays and of the hardware's own. */
function marksThere({ bare }: Work, pourId: string): ReadonlySet<string> {
  const { bars } = barsOf(bare.context.index.layout, pourId)
  return new Set(bars.map(({ shape }) => bare.keyOf(shape)))
}

// Settling ----------------------------------------------------------------------------------------------------------

/** Rounds in which zones whose steel does not pass beside that of its neighbours look for other steel. */
const ROUNDS = 3

/** Checks every zone with all steel in place; one that no longer passes looks again, with the rest as it is. */
function settle(work: Work, chosen: ReadonlyMap<string, Given>): Settled {
  const given = new Map(chosen)
  let all = everythingIn(work, given)
  for (let round = 0; round < ROUNDS; round++) {
    const failing = work.places.filter((place) => isSet(given, place) && stopOf(work, all, place) !== null)
    if (failing.length === 0) return { given, all }
    for (const place of failing) given.set(place.zone.id, foundAlone(work, given, place))
    all = everythingIn(work, given)
  }
  for (const place of work.places.filter((one) => isSet(given, one))) withoutStopped(work, { given, all }, place)
  return { given, all: everythingIn(work, given) }
}

/** What does not pass beside its neighbours to the end is not proposed. */
function withoutStopped(work: Work, of: { given: Map<string, Given>; all: Bench }, place: Place): void {
  const shapes = of.given.get(place.zone.id)?.shapes ?? []
  const stopped = shapes.length > 0 ? stopOf(work, of.all, place) : null
  if (!stopped) return
  const blocked = { candidate: inWords(shapes, work.bare.letter), check: stopped.name, by: outBy(stopped) }
  of.given.set(place.zone.id, { shapes: [], blocked: [blocked] })
}

interface Settled {
  readonly given: ReadonlyMap<string, Given>
  /** With everything that is given in its place. */
  readonly all: Bench
}

const everythingIn = (work: Work, given: ReadonlyMap<string, Given>): Bench =>
  withPlaced(
    work.bare,
    byKey(work.places, ({ zone }) => given.get(zone.id)?.shapes ?? []),
  )

const isSet = (given: ReadonlyMap<string, Given>, { zone }: Place): boolean => given.get(zone.id)?.blocked.length === 0

const whole = (context: CheckContext) => ({ context, near: null })

const stopOf = (work: Work, all: Bench, { zone }: Place) =>
  stoppedBy(whole(all.context), zone, faultsBefore(whole(work.bare.context), zone))

function foundAlone(work: Work, given: ReadonlyMap<string, Given>, place: Place): Given {
  const others = new Map([...given].filter(([id]) => id !== place.zone.id))
  const bench = everythingIn(work, others)
  const { options, blocked } = tryAll(bench, place, candidatesFor(bench, place, []))
  const [lightest] = options
  if (lightest) return { shapes: lightest.shapes, blocked: [] }
  return { shapes: [], blocked }
}

// What is shown -----------------------------------------------------------------------------------------------------

function proposedZone(work: Work, { given, all }: Settled, place: Place): ProposedZone[] {
  const { zone } = place
  const { shapes = [], blocked = [], lookedAt } = given.get(zone.id) ?? {}
  // Steel of anchors that act as one stands with one of them, and is shown as old there.
  const old = zone.kind === 'group' ? [] : steelAt(work.before.index, place)
  // Where nothing passes, what was there stays.
  const removes = blocked.length > 0 ? [] : old.filter(isReplaceable).filter(({ pourId }) => pourId === place.pourId)
  if (blocked.length === 0 && isUnchanged(work, given, place)) return []
  const kept = old.filter((steel) => !removes.includes(steel)).map(({ shape }) => shape)
  const at = { zone: place.steelZone, pourId: place.pourId }
  return [
    {
      zone,
      place: place.steelZone,
      pourId: place.pourId,
      old,
      removes: removes.map(({ id }) => id),
      adds: shapes,
      massOld: work.bare.weigh(
        old.map(({ shape }) => shape),
        at,
      ).mass,
      massNew: work.bare.weigh([...kept, ...shapes], at).mass,
      before: worstCheck(work.before, zone),
      after: worstCheck(all.context, zone),
      blocked,
      notes: lookedAt && lookedAt.id !== zone.id ? [`Tried once for all places like it, at ${lookedAt.name}.`] : [],
    },
  ]
}

/** Whether a place ends with the bars that were proposed for it before; anchors that act as one share theirs. */
function isUnchanged(work: Work, given: Settled['given'], { key }: Place): boolean {
  const here = work.places.filter((place) => place.key === key)
  const now = here.flatMap(({ zone }) => given.get(zone.id)?.shapes ?? [])
  const before = here.slice(0, 1).flatMap((place) => steelAt(work.before.index, place).filter(isReplaceable))
  const textOf = (shape: SteelShape) => JSON.stringify(Object.entries(shape).sort(([a], [b]) => (a < b ? -1 : 1)))
  const listed = (shapes: readonly SteelShape[]) => shapes.map(textOf).sort().join()
  return listed(now) === listed(before.map(({ shape }) => shape))
}

function weighed(work: Work, zones: readonly ProposedZone[]): { readonly mass: number; readonly marks: number } {
  const there = marksThere(work, work.places[0]?.zone.pourId ?? '')
  const all = zones.map(({ adds, place, pourId }) => work.bare.weigh(adds, { zone: place, pourId }))
  const fresh = new Set(all.flatMap(({ keys }) => keys).filter((key) => !there.has(key)))
  return { mass: all.reduce((sum, { mass }) => sum + mass, 0), marks: fresh.size }
}
