/** Plan geometry that the layout file's own rules need; x east, y north, mm. */
export interface Spot {
  readonly xMm: number
  readonly yMm: number
}

const next = <T>(list: readonly T[], i: number): T | undefined => list[(i + 1) % list.length]

/** Twice the turn from a to b to c: positive to the left, zero in line. */
const turn = (a: Spot, b: Spot, c: Spot): number =>
  (b.xMm - a.xMm) * (c.yMm - a.yMm) - (b.yMm - a.yMm) * (c.xMm - a.xMm)

/** Signed area in mm2: positive where the points run counter-clockwise. */
export function signedArea(points: readonly Spot[]): number {
  let twice = 0
  points.forEach((a, i) => {
    const b = next(points, i) ?? a
    twice += a.xMm * b.yMm - b.xMm * a.yMm
  })
  return twice / 2
}

/** Index of the first point that stands where the next one does; null where none does. */
export function repeatedPoint(points: readonly Spot[]): number | null {
  const at = points.findIndex((a, i) => {
    const b = next(points, i)
    return b !== undefined && Math.hypot(b.xMm - a.xMm, b.yMm - a.yMm) < 1
  })
  return at < 0 ? null : at
}

/** Indices of the first two sides, each from its point to the next, that meet anywhere but at a shared corner. */
export function crossingSides(points: readonly Spot[]): [number, number] | null {
  const last = points.length - 1
  for (let i = 0; i <= last; i++) {
    for (let j = i + 1; j <= last; j++) {
      if (sidesMeet(points, i, j)) return [i, j]
    }
  }
  return null
}

function sidesMeet(points: readonly Spot[], i: number, j: number): boolean {
  const a = points[i]
  const b = next(points, i)
  const c = points[j]
  const d = next(points, j)
  if (!a || !b || !c || !d) return false
  if (b === c) return foldsBack(a, b, d)
  if (d === a) return foldsBack(c, a, b)
  return segmentsMeet(a, b, c, d)
}

/** Two neighbouring sides meet besides their corner only where the second runs back over the first. */
const foldsBack = (from: Spot, corner: Spot, to: Spot): boolean =>
  turn(from, corner, to) === 0 &&
  (corner.xMm - from.xMm) * (to.xMm - corner.xMm) + (corner.yMm - from.yMm) * (to.yMm - corner.yMm) < 0

function segmentsMeet(...[a, b, c, d]: [Spot, Spot, Spot, Spot]): boolean {
  const c1 = turn(a, b, c)
  const d1 = turn(a, b, d)
  const a1 = turn(c, d, a)
  const b1 = turn(c, d, b)
  if (c1 * d1 < 0 && a1 * b1 < 0) return true
  return (
    (c1 === 0 && isBetween(a, b, c)) ||
    (d1 === 0 && isBetween(a, b, d)) ||
    (a1 === 0 && isBetween(c, d, a)) ||
    (b1 === 0 && isBetween(c, d, b))
  )
}

const isBetween = (a: Spot, b: Spot, p: Spot): boolean =>
  Math.min(a.xMm, b.xMm) <= p.xMm &&
  p.xMm <= Math.max(a.xMm, b.xMm) &&
  Math.min(a.yMm, b.yMm) <= p.yMm &&
  p.yMm <= Math.max(a.yMm, b.yMm)

/** Whether a point lies in an outline or on it. */
export function contains(points: readonly Spot[], p: Spot): boolean {
  let isInside = false
  for (const [i, a] of points.entries()) {
    const b = next(points, i) ?? a
    if (turn(a, b, p) === 0 && isBetween(a, b, p)) return true
    if (a.yMm > p.yMm === b.yMm > p.yMm) continue
    const x = a.xMm + ((p.yMm - a.yMm) * (b.xMm - a.xMm)) / (b.yMm - a.yMm)
    if (p.xMm < x) isInside = !isInside
  }
  return isInside
}

export interface Line extends Spot {
  readonly azimuthDeg: number
}

/** Chainage of a point along a line, and how far it stands off it to the left. */
export function alongLine(line: Line, p: Spot): { readonly chainageMm: number; readonly offMm: number } {
  const angle = (line.azimuthDeg * Math.PI) / 180
  const east = Math.sin(angle)
  const north = Math.cos(angle)
  const dx = p.xMm - line.xMm
  const dy = p.yMm - line.yMm
  return { chainageMm: dx * east + dy * north, offMm: dy * east - dx * north }
}
