/** Which bodies may touch, and how near bars may come to one another. */

import { basisOfIndex } from '../bases/of-index'
import { ROUNDING } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import { perIndex } from '../memo'
import type { SteelKind } from '../model'
import { bodiesOfLevel } from './bodies-of'
import { boxesNear, boxOf, type Box3, type Piece } from './distance'
import { clearOfBar, clearOfBody, REACH, TO_BODY, type FitBar, type FitBody, type Item } from './items'
import { memberOf, membersBeside } from './members'

export interface Pair {
  readonly bar: FitBar
  readonly other: Item
  /** Clear distance, mm; negative where the two stand in one place. */
  readonly clear: number
  /** Clear gap that is asked for between the two, mm; null where they may touch, as tied bars do. */
  readonly need: number | null
}

/** Bars up to this much out of parallel run side by side. */
const PARALLEL_SINE = Math.sin(Math.PI / 18)

/** A piece that rises by less than this is laid over or under what crosses it. */
const LEVEL_SINE = 0.1

/** Every pair with a bar of the member in it that lies near, once. */
export const pairsOf = perIndex((index: LayoutIndex, key: string): readonly Pair[] => {
  const { bars, bodies, edgeFrame } = memberOf(index, key)
  const { x, y } = edgeFrame?.along ?? { x: 1, y: 0 }
  const near = { others: itemsBeside(index, key), axis: Math.abs(x) >= Math.abs(y) ? 'x' : 'y' } as const
  return [...pairsSwept(index, [...bars, ...bodies], near), ...pairsInSets(index, bars)]
})

/** What stands beside a member and is no part of it. */
export const itemsBeside = perIndex((index: LayoutIndex, key: string): readonly Item[] => {
  const beside = membersBeside(index, key).flatMap((other) => {
    const { bars, bodies } = memberOf(index, other)
    return [...bars, ...bodies]
  })
  return [...beside, ...bodiesOfLevel(index, memberOf(index, key).levelId)]
})

/** Pairs of two of the first items, or of one of them with one of the others. */
export function pairsAmong(index: LayoutIndex, own: readonly Item[], others: readonly Item[]): Pair[] {
  const round = boxRound(own)
  if (!round) return []
  const axis = round.max.x - round.min.x >= round.max.y - round.min.y ? 'x' : 'y'
  if (own.length > FEW) return pairsSwept(index, own, { others, axis })
  const near = others.filter(({ box }) => boxesNear(box, round, REACH))
  const pairs = pairsSwept(index, own, { others: [], axis })
  const met = (one: Item, other: Item) => {
    const pair = pairOf(index, one, other)
    if (pair) pairs.push(pair)
  }
  for (const one of own) {
    for (const other of near) if (boxesNear(one.box, other.box, reachOf(one, other))) met(one, other)
  }
  return pairs
}

interface Near {
  readonly others: readonly Item[]
  /** Along which the items are sorted. */
  readonly axis: 'x' | 'y'
}

/**
 * In the order in which the items begin along the axis: which of a pair is named first does not hang on what stands
 * further away.
 */
function pairsSwept(index: LayoutIndex, own: readonly Item[], { others, axis }: Near): Pair[] {
  const round = boxRound(own)
  if (!round) return []
  const near = others.filter(({ box }) => boxesNear(box, round, REACH))
  const pairs: Pair[] = []
  sweep(own, { others: near, axis }, (one, other) => {
    const pair = pairOf(index, one, other)
    if (pair) pairs.push(pair)
  })
  return pairs
}

/** Up to so many items are held against every other one: sorting those takes longer. */
const FEW = 100

function boxRound(items: readonly Item[]): Box3 | null {
  return items.length === 0
    ? null
    : boxOf(
        items.flatMap(({ box }) => [box.min, box.max]),
        0,
      )
}

/** Calls for each two whose boxes are near: two of the first list, or one of each. */
function sweep(own: readonly Item[], { others, axis }: Near, met: (one: Item, other: Item) => void): void {
  const all = [...own.map((item) => ({ item, isOwn: true })), ...others.map((item) => ({ item, isOwn: false }))].sort(
    (a, b) => a.item.box.min[axis] - b.item.box.min[axis],
  )
  for (const [i, { item, isOwn }] of all.entries()) {
    const end = item.box.max[axis] + REACH
    for (let j = i + 1; j < all.length; j++) {
      const next = all[j]
      if (!next || next.item.box.min[axis] > end) break
      if ((isOwn || next.isOwn) && boxesNear(item.box, next.item.box, reachOf(item, next.item))) met(item, next.item)
    }
  }
}

/** To a body a bar needs no gap: only what all but touches it is looked at. */
const reachOf = (one: Item, other: Item): number => (one.kind === 'bar' && other.kind === 'bar' ? REACH : TO_BODY)

function pairOf(index: LayoutIndex, one: Item, other: Item): Pair | null {
  if (one.kind === 'body') return other.kind === 'bar' ? withBody(other, one) : null
  return other.kind === 'body' ? withBody(one, other) : ofBars(index, one, other)
}

// Bars and bodies ---------------------------------------------------------------------------------------------------

/** Their places along the gap or round the pan follow from their spread: the fixer moves them clear of what they meet. */
const SPREAD: readonly SteelKind[] = ['wedge-bars', 'diagonals', 'tie-back-bars', 'lap-bars']
const LOCAL: readonly SteelKind[] = ['spiral', 'links', 'hairpins']
const isSpread = ({ bar }: FitBar) => SPREAD.includes(bar.kind)
const isLocal = ({ bar }: FitBar) => LOCAL.includes(bar.kind)

/** A spiral stands against its own plate, whose first turn has a check of its own; spread bars pass a column's bars. */
function withBody(bar: FitBar, other: FitBody): Pair | null {
  const isOwnFace = (other.what === 'plate' || other.what === 'pocket') && other.zoneId === bar.bar.zoneId
  if (isOwnFace && bar.bar.kind === 'spiral') return null
  if (other.what === 'column bar' && isSpread(bar)) return null
  const clear = clearOfBody(bar, other)
  return clear <= TO_BODY ? { bar, other, clear, need: null } : null
}

// Bars --------------------------------------------------------------------------------------------------------------

/**
 * Common practice, with contact at crossings:
 * - local steel of two anchors keeps the clear gap;
 * - straight bars along one another keep it, unless they lap or lie in one line for different zones;
 * - straight bars that cross in one face lie one over the other, whatever height was worked out for them;
 * - straight bars are tied to local steel: they may touch it, and lie over or under its level legs where they cross.
 */
function ofBars(index: LayoutIndex, one: FitBar, other: FitBar): Pair | null {
  if (one.setId === other.setId) return null
  const [ones, others] = [isLocal(one), isLocal(other)]
  if (ones && others) {
    const isTied = one.bar.anchorId === other.bar.anchorId
    const need = isTied ? null : gapOf(index, one, other)
    return pair(one, other, { clear: clearOfBar(one, other, { matters: need ?? TOUCHING }), need })
  }
  if (ones !== others) {
    const [local, straight] = ones ? [one, other] : [other, one]
    if (isSpread(straight)) return null
    return pair(local, straight, {
      clear: clearOfBar(local, straight, { matters: TOUCHING, counts: notLaidOver }),
      need: null,
    })
  }
  return ofStraightBars(index, one, other)
}

function pair(bar: FitBar, other: FitBar, { clear, need }: Pick<Pair, 'clear' | 'need'>): Pair | null {
  return clear <= REACH ? { bar, other, clear, need } : null
}

/** A level leg that crosses a straight bar lies over or under it; everything else keeps its place. */
function notLaidOver(leg: Piece, bar: Piece): boolean {
  const [u, v] = [wayOf(leg), wayOf(bar)]
  return Math.abs(u.z) > LEVEL_SINE || Math.abs(u.x * v.y - u.y * v.x) < Math.SQRT1_2
}

function wayOf({ a, b }: Piece) {
  const [x, y, z] = [b.x - a.x, b.y - a.y, b.z - a.z]
  const length = Math.hypot(x, y, z) || 1
  return { x: x / length, y: y / length, z: z / length }
}

function ofStraightBars(index: LayoutIndex, one: FitBar, other: FitBar): Pair | null {
  const [piece, beside] = [one.pieces()[0], other.pieces()[0]]
  if (!piece || !beside) return null
  const [u, v] = [wayOf(piece), wayOf(beside)]
  const isAlong = Math.abs(u.x * v.y - u.y * v.x) <= PARALLEL_SINE
  if (!isAlong && one.bar.layer === other.bar.layer) return null
  const isOneZone = one.bar.zoneId === other.bar.zoneId
  if (isAlong && !isOneZone && (isSpread(one) || isSpread(other))) return null
  const clear = clearOfBar(one, other, { matters: REACH })
  if (isAlong && !isSideBySide(piece, beside, { clear, isOneZone })) return null
  return pair(one, other, { clear, need: isAlong ? gapOf(index, one, other) : null })
}

/** Bars tied side by side in a lap, mm. */
const TOUCHING = 1

/**
 * Whether a gap is asked for between two bars along one another. It is not where one ends before the other begins, nor
 * where they touch in a lap: in one zone over no more than half of the shorter, for more would be one bar entered twice.
 */
function isSideBySide(one: Piece, other: Piece, { clear, isOneZone }: { clear: number; isOneZone: boolean }): boolean {
  const way = wayOf(one)
  const along = ({ x, y, z }: Piece['a']) => x * way.x + y * way.y + z * way.z
  const range = ({ a, b, radius }: Piece) => {
    const ends = [along(a), along(b)]
    return { from: Math.min(...ends) - radius, to: Math.max(...ends) + radius }
  }
  const [first, second] = [range(one), range(other)]
  const over = Math.min(first.to, second.to) - Math.max(first.from, second.from)
  if (over <= ROUNDING) return false
  const isLap = !isOneZone || over <= Math.min(first.to - first.from, second.to - second.from) / 2
  return clear > TOUCHING || !isLap
}

/** That of the basis, and the job's own where it is more, mm. */
export function gapOf(index: LayoutIndex, one: FitBar, other: FitBar): number {
  const { aggregate } = found(index.pours, one.pourId, 'pour')
  const diameter = Math.max(one.bar.diameter, other.bar.diameter)
  const { value } = basisOfIndex(index).clearGap({ diameter, aggregate })
  return Math.max(value, index.layout.job.settings.clearGapMin)
}

// Bars of one set ---------------------------------------------------------------------------------------------------

/** Bars of a set against the others of it; in a spiral turn against turn. */
export function pairsInSets(index: LayoutIndex, bars: readonly FitBar[]): Pair[] {
  const sets = new Map<string, FitBar[]>()
  for (const bar of bars) {
    const set = sets.get(bar.setId)
    if (set) set.push(bar)
    else sets.set(bar.setId, [bar])
  }
  return [...sets.values()].flatMap((set) => {
    const [first, second] = set
    if (!first) return []
    const clear = isLocal(first) ? alikeApart(first, second) : null
    if (clear !== null) return [{ bar: first, other: second ?? first, clear, need: gapOf(index, first, first) }]
    return isLocal(first) ? [] : straightSet(index, set)
  })
}

/**
 * Clear distance between local bars of one set, which are alike and stand one pitch apart; null for a single bar. At
 * the closing corner a link's hook lies beside it and takes one bar more of the gap.
 */
function alikeApart({ bar, path }: FitBar, second: FitBar | undefined): number | null {
  if (bar.kind === 'spiral') return turnsApart(bar.turns.map(({ behind }) => behind)) - bar.diameter
  const [a, b] = [path[0], second?.path[0]]
  if (!a || !b) return null
  const pitch = Math.hypot(a.x - b.x, a.y - b.y, a.z - b.z)
  return pitch - bar.diameter * (bar.kind === 'links' ? 2 : 1)
}

/** The pitch of a spiral, between its turns that rise; a flat turn closes against the turn beside it. */
function turnsApart(behind: readonly number[]): number {
  const steps = behind.slice(1).map((at, i) => at - (behind[i] ?? at))
  return steps.reduce((most, step) => Math.max(most, step), 0) || Infinity
}

function straightSet(index: LayoutIndex, set: readonly FitBar[]): Pair[] {
  return set.flatMap((one, i) =>
    set.slice(i + 1).flatMap((other): Pair[] => {
      const [piece, beside] = [one.pieces()[0], other.pieces()[0]]
      if (!piece || !beside || !boxesNear(one.box, other.box, REACH)) return []
      const [u, v] = [wayOf(piece), wayOf(beside)]
      const isAlong = Math.abs(u.x * v.y - u.y * v.x) <= PARALLEL_SINE
      const clear = clearOfBar(one, other, { matters: REACH })
      // Pieces of one run follow each other at a step of the edge.
      if (!isAlong || clear > REACH || !isSideBySide(piece, beside, { clear, isOneZone: true })) return []
      return [{ bar: one, other, clear, need: gapOf(index, one, other) }]
    }),
  )
}
