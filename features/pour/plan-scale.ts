/** Between mm on the ground (x east, y north) and px on the page (y downwards). */

export interface Spot {
  readonly x: number
  readonly y: number
}

export interface Bounds {
  readonly left: number
  readonly right: number
  readonly bottom: number
  readonly top: number
}

export interface PlanScale {
  readonly pxPerMm: number
  /** Size of the whole drawing, px. */
  readonly width: number
  readonly height: number
  readonly at: (point: Spot) => Spot
}

/** The smallest rectangle round some points. @throws without any. */
export function boundsOf(points: readonly Spot[]): Bounds {
  if (points.length === 0) throw new Error('Nothing to draw has no bounds.')
  const [xs, ys] = [points.map(({ x }) => x), points.map(({ y }) => y)]
  return { left: Math.min(...xs), right: Math.max(...xs), bottom: Math.min(...ys), top: Math.max(...ys) }
}

export interface Fit {
  /** Room for the drawing, px. */
  readonly width: number
  readonly heightMax: number
  /** Kept free round the drawn things, px: marks and bubbles stand there. */
  readonly margin: number
  /** 1 shows the whole; 2 twice as large. */
  readonly zoom: number
}

/** One scale both ways, so that the bounds fill the room's width or height, times the zoom; north is up. */
export function planScale(bounds: Bounds, { width, heightMax, margin, zoom }: Fit): PlanScale {
  const wide = Math.max(1, bounds.right - bounds.left)
  const high = Math.max(1, bounds.top - bounds.bottom)
  const free = (room: number) => Math.max(1, room - 2 * margin)
  const pxPerMm = Math.min(free(width) / wide, free(heightMax) / high) * zoom
  const drawn = { width: wide * pxPerMm + 2 * margin, height: high * pxPerMm + 2 * margin }
  const sheet = { width: Math.max(width, drawn.width), height: drawn.height }
  const left = (sheet.width - wide * pxPerMm) / 2
  return {
    pxPerMm,
    ...sheet,
    at: ({ x, y }) => ({ x: left + (x - bounds.left) * pxPerMm, y: margin + (bounds.top - y) * pxPerMm }),
  }
}

/** Where a line through a point crosses the bounds; null where it passes them by. */
export function lineAcross(bounds: Bounds, through: Spot, direction: Spot): readonly [Spot, Spot] | null {
  let [from, to] = [-Infinity, Infinity]
  const sides = [
    [through.x, direction.x, bounds.left, bounds.right],
    [through.y, direction.y, bounds.bottom, bounds.top],
  ] as const
  for (const [at, step, least, most] of sides) {
    if (Math.abs(step) < 1e-9) {
      if (at < least || at > most) return null
      continue
    }
    const [a, b] = [(least - at) / step, (most - at) / step]
    from = Math.max(from, Math.min(a, b))
    to = Math.min(to, Math.max(a, b))
  }
  if (from > to) return null
  const along = (t: number): Spot => ({ x: through.x + t * direction.x, y: through.y + t * direction.y })
  return [along(from), along(to)]
}

/** A path for an svg: through the points, closed for an area. */
export function pathThrough(scale: PlanScale, points: readonly Spot[], isClosed: boolean): string {
  const written = points.map((point) => {
    const { x, y } = scale.at(point)
    return `${x.toFixed(1)} ${y.toFixed(1)}`
  })
  return `M${written.join('L')}${isClosed ? 'Z' : ''}`
}
