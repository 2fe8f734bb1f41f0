/** Where a stressing pan stands: its anchor, tendon and jack, the slab round it, and its own plan coordinates. */

import { add, alongAzimuth, cross, dot, isInside, ROUNDING, scale, sidesOf, subtract, turnedLeft } from './geometry'
import { found, type LayoutIndex } from './layout-index'
import { perIndex } from './memo'
import { sectionAt, type Section } from './section'
import type { Anchor, Hardware, Jack, Pan, Point, Pour, StrandType, Tendon } from './model'

/** Plan coordinates of a pan, mm: along the jack's axis from the bearing face outwards, across to the left of it. */
export interface PanPoint {
  readonly along: number
  readonly across: number
}

/** The anchor that is stressed in a pan, with its tendon. */
export interface PanAnchor {
  readonly anchor: Anchor
  readonly hardware: Hardware
  readonly tendon: Tendon
  readonly strand: StrandType
}

export interface PanPlace extends Section {
  readonly pan: Pan
  readonly pour: Pour
  /** Null where no live anchor stands in the pan. */
  readonly at: PanAnchor | null
  /** The pan's own, else the one that its anchor's hardware names; null where neither does. */
  readonly jack: Jack | null
  readonly local: (point: Point) => PanPoint
  readonly pointAt: (along: number, across: number) => Point
}

export const panPlace = perIndex(placeOf)

function placeOf(index: LayoutIndex, panId: string): PanPlace {
  const pan = found(index.pans, panId, 'pan')
  const pour = found(index.pours, pan.pourId, 'pour')
  const at = panAnchor(index, panId)
  const axis = alongAzimuth(pan.azimuth)
  const side = turnedLeft(axis)
  return {
    pan,
    pour,
    at,
    jack: index.jacks.get(pan.jackId ?? at?.hardware.jackId ?? '') ?? null,
    ...sectionAt(pour, pan),
    local: (point) => {
      const from = subtract(point, pan)
      return { along: dot(from, axis), across: dot(from, side) }
    },
    pointAt: (along, across) => add(add(pan, scale(axis, along)), scale(side, across)),
  }
}

function panAnchor(index: LayoutIndex, panId: string): PanAnchor | null {
  const anchor = (index.anchorsOfPan.get(panId) ?? []).find(({ end }) => end === 'live')
  if (!anchor) return null
  const tendon = found(index.tendons, anchor.tendonId, 'tendon')
  return {
    anchor,
    tendon,
    hardware: found(index.hardware, anchor.hardwareId, 'hardware'),
    strand: found(index.strandTypes, tendon.strandTypeId, 'strand type'),
  }
}

/**
 * Slab in front of the bearing face along the jack's axis, mm: the least over the width of the recess, up to the outline
 * of the pour; 0 where the face itself stands outside.
 */
export function slabBeyond({ pan, pour, pointAt, local }: PanPlace): number {
  const lines = [-pan.across / 2, 0, pan.across / 2]
  if (!lines.every((across) => isInside(pointAt(0, across), pour.outline))) return 0
  return Math.min(...lines.map((across) => reachOf(pour.outline.map(local), across)))
}

/** First crossing of an outline by the line at `across`, from 0 outwards; Infinity where it is not met. */
function reachOf(outline: readonly PanPoint[], across: number): number {
  const met = sidesOf(outline.map(({ along, across: y }) => ({ x: along, y }))).flatMap(([a, b]) => {
    const isCrossed = (a.y - across) * (b.y - across) <= 0 && a.y !== b.y
    const along = isCrossed ? a.x + ((b.x - a.x) * (across - a.y)) / (b.y - a.y) : -1
    return along > ROUNDING ? [along] : []
  })
  return Math.min(Infinity, ...met)
}

/** Clockwise turn of `b` against `a` as its sine: 0 for directions along one line. */
export const sineBetween = (a: number, b: number): number => cross(alongAzimuth(a), alongAzimuth(b))
