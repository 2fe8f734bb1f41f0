/** The room that a jack finds in front of a pan and beside it, in plan. */

import { distanceBetweenSegments, isInside, ROUNDING, sidesOf } from './geometry'
import type { LayoutIndex } from './layout-index'
import type { Obstruction, Point } from './model'
import { panOutline } from './pan-outline'
import type { PanPlace, PanPoint } from './pan-place'

/** Something that stands in the way, as a person says it, and how far away it is in plan, mm. */
export interface InTheWay {
  readonly name: string
  readonly distance: number
}

/** What rises above the slab; an upstand counts with any height, since none is given. */
const RISES: readonly Obstruction['kind'][] = ['wall', 'column', 'upstand']

/** The nearest body in front of the bearing face within `half` of the jack's axis in plan; null where there is none. */
export function ahead(index: LayoutIndex, place: PanPlace, half: number): InTheWay | null {
  const met = standing(index, place).flatMap(({ name, outline }) => {
    const inside = clipped(outline, { from: 0, to: Infinity, half })
    return inside.length > 0 ? [{ name, distance: Math.min(...inside.map(({ along }) => along)) }] : []
  })
  return nearest(met)
}

/**
 * The nearest body beside the jack, measured from its side, over the length that it takes up in plan; null where there
 * is none. What stands in front of the jack is not beside it.
 */
export function beside(
  index: LayoutIndex,
  place: PanPlace,
  jack: { readonly half: number; readonly length: number },
): InTheWay | null {
  const { half, length } = jack
  const met = standing(index, place).flatMap(({ name, outline }) => {
    const isAhead = clipped(outline, { from: 0, to: length, half }).length > 0
    const inside = isAhead ? [] : clipped(outline, { from: 0, to: length, half: Infinity })
    return inside.length > 0
      ? [{ name, distance: Math.min(...inside.map(({ across }) => Math.abs(across))) - half }]
      : []
  })
  return nearest(met)
}

/** The nearest recess or opening to a pan's own recess; 0 where they overlap or touch. */
export function nextRecess(index: LayoutIndex, { pan, pour }: PanPlace): InTheWay | null {
  const own = panOutline(pan)
  const pans = (index.pansOfPour.get(pour.id) ?? []).filter(({ id }) => id !== pan.id)
  const openings = index.openingsOfLevel.get(pour.levelId) ?? []
  return nearest([
    ...pans.map((other) => ({ name: `pan ${other.mark}`, distance: between(own, panOutline(other)) })),
    ...openings.map(({ mark, outline }) => ({ name: `opening ${mark}`, distance: between(own, outline) })),
  ])
}

function between(one: readonly Point[], other: readonly Point[]): number {
  if (one.some((corner) => isInside(corner, other)) || other.some((corner) => isInside(corner, one))) return 0
  const others = sidesOf(other)
  return Math.min(...sidesOf(one).flatMap((side) => others.map((next) => distanceBetweenSegments(side, next))))
}

function standing(index: LayoutIndex, { pour, local }: PanPlace) {
  return index.layout.obstructions
    .filter(({ levelId, kind }) => levelId === pour.levelId && RISES.includes(kind))
    .map(({ kind, mark, outline }) => ({ name: `${kind} ${mark}`, outline: outline.map(local) }))
}

const nearest = (met: readonly InTheWay[]): InTheWay | null =>
  [...met].sort((a, b) => a.distance - b.distance)[0] ?? null

interface Strip {
  readonly from: number
  readonly to: number
  readonly half: number
}

/** The part of an outline inside a strip, empty where they only touch: half-plane by half-plane (Sutherland, Hodgman). */
function clipped(outline: readonly PanPoint[], { from, to, half }: Strip): readonly PanPoint[] {
  const insides: readonly ((point: PanPoint) => number)[] = [
    ({ along }) => along - from - ROUNDING,
    ...(to < Infinity ? [({ along }: PanPoint) => to - along - ROUNDING] : []),
    ...(half < Infinity
      ? [({ across }: PanPoint) => half - across - ROUNDING, ({ across }: PanPoint) => half + across - ROUNDING]
      : []),
  ]
  return insides.reduce(keep, outline)
}

function keep(outline: readonly PanPoint[], inside: (point: PanPoint) => number): readonly PanPoint[] {
  return outline.flatMap((point, i) => {
    const next = outline[(i + 1) % outline.length] ?? point
    const [here, there] = [inside(point), inside(next)]
    const share = here / (here - there)
    const crossing = {
      along: point.along + share * (next.along - point.along),
      across: point.across + share * (next.across - point.across),
    }
    return [...(here > 0 ? [point] : []), ...(here > 0 !== there > 0 ? [crossing] : [])]
  })
}
