/** The centre line of a bent bar with its bends at their radius. */

/** A place in space, mm: x east, y north, z up from the pour's soffit datum. */
export interface Vec {
  readonly x: number
  readonly y: number
  readonly z: number
}

/** Straight pieces in one bend: at 9 degrees each they leave a bend of radius 25 by 0.1 mm at most. */
const PIECES_PER_BEND = 10

/**
 * The path with each corner bent at a radius, mm, of the centre line; a corner whose sides are too short for it takes
 * the largest radius that they leave. Closed: the last point joins the first.
 */
export function roundedPath(path: readonly Vec[], isClosed: boolean, radius: number): Vec[] {
  return path.flatMap((corner, i) => {
    const before = path[i - 1] ?? (isClosed ? path.at(-1) : undefined)
    const after = path[i + 1] ?? (isClosed ? path[0] : undefined)
    return before && after ? bend(before, corner, { after, radius }) : [corner]
  })
}

function bend(before: Vec, corner: Vec, { after, radius }: { after: Vec; radius: number }): Vec[] {
  const [u, v] = [towards(corner, before), towards(corner, after)]
  const cosine = u.x * v.x + u.y * v.y + u.z * v.z
  // Straight on, or back the way it came: there is no bend to draw.
  if (Math.abs(cosine) > 1 - 1e-9) return [corner]
  const half = Math.acos(cosine) / 2
  const tangent = Math.min(radius / Math.tan(half), u.length / 2, v.length / 2)
  const r = tangent * Math.tan(half)
  const sum = Math.hypot(u.x + v.x, u.y + v.y, u.z + v.z)
  const out = r / Math.sin(half) / sum
  const centre = { x: corner.x + (u.x + v.x) * out, y: corner.y + (u.y + v.y) * out, z: corner.z + (u.z + v.z) * out }
  const [from, to] = [spoke(centre, corner, { way: u, tangent }), spoke(centre, corner, { way: v, tangent })]
  const turn = Math.PI - 2 * half
  return Array.from({ length: PIECES_PER_BEND + 1 }, (_, i) => {
    const share = i / PIECES_PER_BEND
    const a = Math.sin((1 - share) * turn) / Math.sin(turn)
    const b = Math.sin(share * turn) / Math.sin(turn)
    return {
      x: centre.x + a * from.x + b * to.x,
      y: centre.y + a * from.y + b * to.y,
      z: centre.z + a * from.z + b * to.z,
    }
  })
}

function towards(from: Vec, to: Vec): Vec & { readonly length: number } {
  const [x, y, z] = [to.x - from.x, to.y - from.y, to.z - from.z]
  const length = Math.hypot(x, y, z) || 1
  return { x: x / length, y: y / length, z: z / length, length }
}

function spoke(centre: Vec, corner: Vec, { way, tangent }: { way: Vec; tangent: number }): Vec {
  return {
    x: corner.x + way.x * tangent - centre.x,
    y: corner.y + way.y * tangent - centre.y,
    z: corner.z + way.z * tangent - centre.z,
  }
}
