/** The engine's plane geometry for points as the layout file writes them: x east, y north, mm. */

import { alongAzimuth, dot, isInside, selfCrossing, signedArea, subtract, turnedLeft } from '@wedgeline/engine/geometry'

export interface Spot {
  readonly xMm: number
  readonly yMm: number
}

interface Line extends Spot {
  readonly azimuthDeg: number
}

const point = ({ xMm, yMm }: Spot) => ({ x: xMm, y: yMm })

/** Area in mm2: positive where the points run counter-clockwise. */
export const areaOf = (points: readonly Spot[]): number => signedArea(points.map(point))

/** Index of the first point that stands where the next one does, to less than 1 mm; null where none does. */
export function repeatedPoint(points: readonly Spot[]): number | null {
  const at = points.findIndex((a, i) => {
    const b = points[(i + 1) % points.length]
    return b !== undefined && Math.hypot(b.xMm - a.xMm, b.yMm - a.yMm) < 1
  })
  return at < 0 ? null : at
}

/** Indices of the first two sides, each from its point to the next, that meet anywhere but at a shared corner. */
export const crossingSides = (points: readonly Spot[]) => selfCrossing(points.map(point))

/** Whether a point lies in an outline or on it. */
export const contains = (points: readonly Spot[], spot: Spot): boolean => isInside(point(spot), points.map(point))

/** Chainage of a point along a line, and how far it stands off it to the left, mm. */
export function alongLine(line: Line, spot: Spot): { readonly chainageMm: number; readonly offMm: number } {
  const along = alongAzimuth((line.azimuthDeg * Math.PI) / 180)
  const from = subtract(point(spot), point(line))
  return { chainageMm: dot(from, along), offMm: dot(from, turnedLeft(along)) }
}
