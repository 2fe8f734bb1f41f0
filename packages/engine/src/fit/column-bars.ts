import { sidesOf, signedArea } from '../geometry'
import type { Obstruction, Point } from '../model'
import { roundBody, type FitBody } from './items'

/** Upright bars reach through the slab whatever its level, mm. */
const THROUGH = 100_000

/** 8H25, H10 links: number and size of the upright bars, size of the links. */
const UPRIGHTS = /(\d+)\s*[A-Z]+(\d+)/
const LINKS = /[A-Z]+(\d+)\s+links/i

/**
 * The upright bars of a column's cage, one at each corner and the rest spread evenly over the sides (common practice).
 * A cage whose cover or bars are not given has none.
 */
export function columnBars({ outline, mark, cageCover, cageBars }: Obstruction): FitBody[] {
  const [count, diameter] = (UPRIGHTS.exec(cageBars) ?? []).slice(1).map(Number)
  if (cageCover === null || count === undefined || diameter === undefined) return []
  const link = Number(LINKS.exec(cageBars)?.[1] ?? 0)
  const line = insetBy(outline, cageCover + link + diameter / 2)
  return spread(line, count).map(({ x, y }) =>
    roundBody(
      { a: { x, y, z: -THROUGH }, b: { x, y, z: THROUGH }, from: diameter / 2, to: diameter / 2 },
      { what: 'column bar', name: `bar of column ${mark}`, zoneId: null },
    ),
  )
}

/** Each corner moved inwards so that both its sides are moved in by the same. */
function insetBy(outline: readonly Point[], by: number): Point[] {
  const turn = Math.sign(signedArea(outline))
  return outline.map((corner, i) => {
    const before = outline.at(i - 1) ?? corner
    const after = outline[(i + 1) % outline.length] ?? corner
    const [u, v] = [unitTo(before, corner), unitTo(corner, after)]
    const sine = u.x * v.y - u.y * v.x
    if (Math.abs(sine) < 1e-9) return { x: corner.x - turn * u.y * by, y: corner.y + turn * u.x * by }
    const out = (turn * by) / sine
    return { x: corner.x + out * (v.x - u.x), y: corner.y + out * (v.y - u.y) }
  })
}

function unitTo(from: Point, to: Point): Point {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1
  return { x: (to.x - from.x) / length, y: (to.y - from.y) / length }
}

function spread(line: readonly Point[], count: number): Point[] {
  const more = Math.max(0, count - line.length)
  return sidesOf(line).flatMap(([a, b], i) => {
    const here = Math.floor(more / line.length) + (i < more % line.length ? 1 : 0)
    return Array.from({ length: here + 1 }, (_, k) => {
      const share = k / (here + 1)
      return { x: a.x + share * (b.x - a.x), y: a.y + share * (b.y - a.y) }
    })
  })
}
