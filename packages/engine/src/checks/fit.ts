/** Whether the steel of a zone can be fixed: its cover, its gaps, and what stands in its way. */

import { basisOfIndex } from '../bases/of-index'
import { ROUNDING } from '../geometry'
import { coversOf, type Cover } from '../fit/cover'
import { barsOfZone, memberKeyOf, memberOf, type Member } from '../fit/members'
import { itemsBeside, pairsAmong, pairsInSets, pairsOf, type Pair } from '../fit/pairs'
import { found, type LayoutIndex } from '../layout-index'
import { perIndex } from '../memo'
import type { Check, Compared, Zone } from '../result'
import type { Clause } from '../step'
import { bendChecks, depthCheck, firstTurnCheck, type SetOfBars } from './fit-shape'
import { comparison, type CheckContext } from './outcome'

const COVER: Clause = { source: 'Nominal cover of the pour or region', section: 'as entered', tag: 'practice' }
const ROOM: Clause = { source: 'Geometry', section: 'two bodies in one place', tag: 'derived' }

/** Bars that stand in one another by no more than this touch: tolerance of bending and of ribs, mm (common practice). */
const TOUCHING = 1

/** Checks of the bars of one zone; none where it has no bars. */
export function fitChecks(context: CheckContext, zone: Zone): readonly Check[] {
  const key = memberKeyOf(zone)
  if (key === null) return []
  const { index } = context
  const fit = fitOfMember(index, key).get(zone.id)
  const sets = setsOfMember(index, key).get(zone.id) ?? []
  return checksFrom(index, zone, { fit, sets, mend: fit?.cover ? heightMend(index, fit.cover) : null })
}

/**
 * The same for bars that are tried in a zone, without what would mend it: everything else is taken from `settled`, where
 * it is worked out once.
 *
 * @param index differs from `settled` in the zone's own steel alone.
 */
export function fitChecksOfTrial(index: LayoutIndex, zone: Zone, settled: LayoutIndex): readonly Check[] {
  const key = memberKeyOf(zone)
  if (key === null) return []
  const { bars: all, bodies, ...place } = memberOf(settled, key)
  const bars = barsOfZone(index, key, zone.id)
  const rest = all.filter(({ bar }) => bar.zoneId !== zone.id)
  const pairs = pairsAmong(index, bars, [...rest, ...bodies, ...itemsBeside(settled, key)])
  const member = { ...place, bars, bodies }
  const fit = fitsOf(index, member, [...pairs, ...pairsInSets(index, bars)]).get(zone.id)
  return checksFrom(index, zone, { fit, sets: setsOf(index, member).get(zone.id) ?? [], mend: null })
}

interface Found {
  readonly fit: ZoneFit | undefined
  readonly sets: readonly SetOfBars[]
  readonly mend: Compared['mend']
}

function checksFrom(index: LayoutIndex, zone: Zone, { fit, sets, mend }: Found): Check[] {
  return [
    ...(fit?.cover ? [coverCheck(zone, fit.cover, mend)] : []),
    ...(fit?.gap ? [gapCheck(index, zone, fit.gap)] : []),
    ...(fit?.clash ? [clashCheck(zone, fit.clash)] : []),
    ...sets.flatMap((set) => [
      ...firstTurnCheck(zone, set),
      ...depthCheck(index, zone, set),
      ...bendChecks(index, zone, set),
    ]),
  ]
}

/** The worst of a kind, and how many are short in all. */
interface Worst<T> {
  worst: T
  spare: number
  short: number
}

interface ZoneFit {
  cover: Worst<Cover> | null
  gap: Worst<Pair> | null
  clash: Worst<Pair> | null
}

/** Worked out once for all zones of an edge, a pan or a joint. */
const fitOfMember = perIndex((index: LayoutIndex, key: string) =>
  fitsOf(index, memberOf(index, key), pairsOf(index, key)),
)

function fitsOf(index: LayoutIndex, member: Member, pairs: readonly Pair[]): ReadonlyMap<string, ZoneFit> {
  const fits = new Map<string, ZoneFit>()
  for (const bar of member.bars) {
    const fit = fitOf(fits, bar.bar.zoneId)
    for (const cover of coversOf(index, member, bar)) fit.cover = worse(fit.cover, cover, cover.measured - cover.need)
  }
  for (const pair of pairs) {
    const { bar, other, clear, need } = pair
    const otherZone = other.kind === 'bar' ? other.bar.zoneId : other.zoneId
    const kind = need === null || clear < -TOUCHING ? 'clash' : 'gap'
    const spare = need === null || kind === 'clash' ? clear + TOUCHING : clear - need
    const fit = fitOf(fits, bar.bar.zoneId)
    fit[kind] = worse(fit[kind], pair, spare)
    if (otherZone === null || otherZone === bar.bar.zoneId) continue
    const itsFit = fitOf(fits, otherZone)
    itsFit[kind] = worse(itsFit[kind], pair, spare)
  }
  return fits
}

function fitOf(fits: Map<string, ZoneFit>, zoneId: string): ZoneFit {
  const known = fits.get(zoneId)
  if (known) return known
  const made: ZoneFit = { cover: null, gap: null, clash: null }
  fits.set(zoneId, made)
  return made
}

/** Of two that are equally bad the first stays, so that the same layout names the same pair. */
function worse<T>(known: Worst<T> | null, worst: T, spare: number): Worst<T> {
  const isShort = spare < -ROUNDING ? 1 : 0
  if (!known) return { worst, spare, short: isShort }
  known.short += isShort
  if (spare < known.spare - ROUNDING) Object.assign(known, { worst, spare })
  return known
}

/** The sets of bars of each zone, each by one of its bars. */
const setsOfMember = perIndex((index: LayoutIndex, key: string) => setsOf(index, memberOf(index, key)))

function setsOf(index: LayoutIndex, member: Member): ReadonlyMap<string, readonly SetOfBars[]> {
  const zones = new Map<string, SetOfBars[]>()
  const seen = new Set<string>()
  for (const bar of member.bars) {
    const { anchorId, steelId, zoneId } = bar.bar
    if (seen.has(bar.setId)) continue
    seen.add(bar.setId)
    const anchor = anchorId === null ? null : found(index.anchors, anchorId, 'anchor')
    const entered = (index.steelOfZone.get(zoneId) ?? []).find(({ id }) => id === steelId)?.shape
    const shape = entered ?? (anchor && found(index.hardware, anchor.hardwareId, 'hardware').localSteel)
    if (!shape) continue
    const sets = zones.get(zoneId) ?? []
    sets.push({ bar, member, anchor, shape })
    zones.set(zoneId, sets)
  }
  return zones
}

// As results --------------------------------------------------------------------------------------------------------

const shown = (mm: number): string => String(Math.round(mm * 10) / 10)
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)

const sentence = (what: string, measured: number, need: number): string => {
  const spare = measured - need
  const outcome = spare < -ROUNDING ? `short by ${shown(-spare)}` : `spare ${shown(spare)}`
  return `${capital(what)} ${shown(measured)}, needs ${shown(need)}: ${outcome}.`
}

const others = (short: number, what: string): string[] =>
  short > 1 ? [`${short - 1} more ${short === 2 ? `${what} is` : `${what}s are`} short; this is the worst.`] : []

/** Cover that is left is over where it is short; none left is a bar outside the concrete. */
function coverCheck(zone: Zone, { worst, spare, short }: Worst<Cover>, mend: Compared['mend']): Compared {
  const { bar, face, measured, need } = worst
  const what = `${bar.name} to ${face}`
  const isShort = spare < -ROUNDING
  return compared(zone, {
    name: `${capital(bar.name)} to ${face}`,
    clause: COVER,
    limitKind: 'C',
    notes: [sentence(what, measured, need), ...others(short, 'cover')],
    demand: measured,
    limit: need,
    status: isShort ? (measured <= ROUNDING ? 'stop' : 'over') : 'within',
    mend,
  })
}

/** An anchor's local steel moves up or down with it, where the section leaves room for that. */
function heightMend(index: LayoutIndex, { worst, spare }: Worst<Cover>): Compared['mend'] {
  const { bar, face, measured, need } = worst
  const { anchorId, layer } = bar.bar
  if (spare >= -ROUNDING) return null
  if (anchorId === null || layer !== null || (face !== 'top' && face !== 'soffit')) return null
  const { height } = found(index.anchors, anchorId, 'anchor')
  const value = face === 'top' ? height - (need - measured) : height + (need - measured)
  return roomAt(index, anchorId, value - height) ? { field: 'height', value } : null
}

function roomAt(index: LayoutIndex, anchorId: string, by: number): boolean {
  const anchor = found(index.anchors, anchorId, 'anchor')
  if (anchor.edgeId === null) return false
  const member = memberOf(index, `edge:${anchor.edgeId}`)
  const face = by > 0 ? 'top' : 'soffit'
  return member.bars
    .filter(({ bar }) => bar.anchorId === anchorId && bar.layer === null)
    .flatMap((bar) => coversOf(index, member, bar))
    .every((cover) => cover.face !== face || cover.measured - Math.abs(by) >= cover.need - ROUNDING)
}

function gapCheck(index: LayoutIndex, zone: Zone, { worst, spare, short }: Worst<Pair>): Compared {
  const { bar, other, clear, need } = worst
  const limit = need ?? 0
  const { aggregate } = found(index.pours, bar.pourId, 'pour')
  const what = nameOf(worst)
  return compared(zone, {
    name: `Clear gap, ${what}`,
    clause: basisOfIndex(index).clearGap({ diameter: bar.bar.diameter, aggregate }).clause,
    limitKind: 'C',
    notes: [
      sentence(`clear gap, ${what}`, clear, limit),
      ...(bar.bar.kind === 'links' && other.kind === 'bar' && bar.setId === other.setId
        ? ['The hook at the closing corner lies beside its link and is taken off the gap.']
        : []),
      ...others(short, 'gap'),
    ],
    demand: clear,
    limit,
    status: spare < -ROUNDING ? 'over' : 'within',
    mend: null,
  })
}

/** Two bodies in one place cannot be fixed; up to the tolerance they touch, which tied bars do. */
function clashCheck(zone: Zone, { worst, spare, short }: Worst<Pair>): Compared {
  const isClash = spare < -ROUNDING
  const demand = isClash ? worst.clear : Math.max(0, worst.clear)
  const what = nameOf(worst)
  const touching = `Up to ${TOUCHING} into one another counts as touching, which tied bars do.`
  return compared(zone, {
    name: isClash ? `In one place, ${what}` : `Clear of one another, ${what}`,
    clause: ROOM,
    limitKind: 'C',
    notes: [
      isClash
        ? `${capital(what)} stand in one place by ${shown(-demand)}.`
        : `${capital(what)} ${shown(demand)} apart.`,
      touching,
      ...(short > 1 ? [`${short - 1} more in one place; this is the worst.`] : []),
    ],
    demand,
    limit: 0,
    status: isClash ? 'stop' : 'within',
    mend: null,
  })
}

function nameOf({ bar, other }: Pair): string {
  if (other.kind === 'bar' && other.setId === bar.setId) {
    return bar.bar.kind === 'spiral' ? `turns of ${bar.name}` : `between bars, ${bar.name}`
  }
  return `${bar.name} and ${other.name}`
}

type Outcome = Pick<Compared, 'name' | 'clause' | 'limitKind' | 'notes' | 'demand' | 'limit' | 'status' | 'mend'>

function compared(zone: Zone, { demand, limit, status, mend, ...head }: Outcome): Compared {
  return comparison(
    { zoneId: zone.id, family: 'fit', stage: null, ...head },
    { demand, limit, unit: 'mm', steps: [] },
    {
      compares: 'at-least',
      status,
      statusOnceAccepted: status,
      utilisation: null,
      spare: demand - limit,
      readingIds: [],
      mend,
    },
  )
}
