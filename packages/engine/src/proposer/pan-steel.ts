/** Candidates of bars round a pan: one set for each purpose, by size, with the ties beside the trimmers. */

import type { PlacedBarsShape } from '../model'
import type { BarSize } from '../schedule/bar-standards'
import { panNeeds, type PanNeed } from '../pan-needs'
import { placedAt } from '../checks/pan-bars'
import { isFixable, type Bench, type Place } from './bench'
import type { Candidates } from './candidate'

/** Ties are set out further from the tendon by these, until they pass the trimmers, mm. */
const ASIDE = [0, 25, 50, 75, 100, 125, 150, 200, 250, 300] as const

const SHORTER = [0, 5, 10, 15, 20] as const

export function panSteel(bench: Bench, place: Place): Candidates {
  const { zone } = place
  if (zone.panId === null) return { candidates: [], blocked: [] }
  const there = placedAt(bench.context.index, zone.panId)
  const needs = panNeeds(bench.context.index, bench.context.basis, zone.panId)
  const unmet = needs.filter((need) => need.area > need.count(there).area)
  const strips = unmet.filter(({ purpose }) => purpose === 'strip')
  const cuts = unmet.filter(({ purpose }) => purpose === 'cut-bars')
  // Of sets of one size the first that can be fixed; where none can, the first, for its reason to be named.
  const fixable = (sets: readonly PlacedBarsShape[][]) => {
    const first = sets.find((set) => isFixable(bench, place, set)) ?? sets[0]
    return first ? [first] : []
  }
  const parts = [
    ...worstTie(unmet).map((tie) => ({
      needs: [tie],
      sets: bench.sizes.flatMap((size) => fixable(tiesAside(tie, size))),
    })),
    ...cuts.map((cut) => ({ needs: [cut], sets: [setOf([cut], cut.diameter ?? 0)].filter((set) => set !== null) })),
    // Bars of one size at both faces: one mark.
    ...(strips.length > 0
      ? [{ needs: strips, sets: bench.sizes.flatMap((size) => fixable(stripsOf(strips, size))) }]
      : []),
  ]
  const without = parts.filter(({ sets }) => sets.length === 0).flatMap((part) => part.needs)
  return {
    candidates: combined(parts.map(({ sets }) => sets)).map((shapes) => ({ shapes })),
    blocked: without.map(({ name, area, kind }) => ({
      candidate: `${kind.replaceAll('-', ' ')} in every size of the job`,
      check: name,
      by: `${Math.ceil(area)} mm2 asked for; no set of bars has room`,
    })),
  }
}

/** Each stage of stressing asks for a tie; the one that asks for most has the bars for all. */
const worstTie = (needs: readonly PanNeed[]): readonly PanNeed[] =>
  needs
    .filter(({ purpose }) => purpose === 'tie-back')
    .sort((a, b) => b.area - a.area)
    .slice(0, 1)

function tiesAside(tie: PanNeed, { diameter }: BarSize): PlacedBarsShape[][] {
  const shape = tie.shapeOf(diameter)
  return shape ? ASIDE.map((aside) => [{ ...shape, pitch: shape.pitch + 2 * aside }]) : []
}

/** Bars that end at the cover of the edge are cut to the step of the schedule, not to that of lengths. */
function stripsOf(needs: readonly PanNeed[], { diameter }: BarSize): PlacedBarsShape[][] {
  const set = setOf(needs, diameter)
  return set ? SHORTER.map((by) => set.map((shape) => ({ ...shape, length: shape.length - by }))) : []
}

/** Bars of one size for each need; null where one of them has none. */
function setOf(needs: readonly PanNeed[], diameter: number): PlacedBarsShape[] | null {
  const shapes = needs.flatMap((need) => need.shapeOf(diameter) ?? [])
  return shapes.length === needs.length ? shapes : null
}

const combined = (parts: readonly PlacedBarsShape[][][]): PlacedBarsShape[][] =>
  parts.reduce<PlacedBarsShape[][]>((all, sets) => all.flatMap((one) => sets.map((set) => [...one, ...set])), [[]])
