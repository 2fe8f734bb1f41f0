/** The strip of slab behind the wedges of an edge: what each tendon that ends at the edge brings to its own width. */

import type { EdgeFrame } from '../frame'
import { gapsOfEdge, tendonEndsOfEdge, type TendonEnd } from '../gaps'
import { ROUNDING, sidesOf } from '../geometry'
import { found, type LayoutIndex } from '../layout-index'
import { perConcrete } from '../memo'
import type { Pour } from '../model'
import { sectionBehind } from '../section'
import { wedgesOfEdge } from '../wedge/wedges-of-edge'
import { isNoForce, type NoForce } from './friction'
import { tendonForces, type TendonForces } from './profile'

/** One place along the edge at which tendons end, one above the other where there are several. */
export interface StripShare {
  readonly ends: readonly TendonEnd[]
  /** Half the gap to the next place on either side, or to the end of the edge, mm. */
  readonly from: number
  readonly to: number
  /** Section over that width, mm2. */
  readonly area: number
  /** Square to the edge after friction and draw-in, N: with the nominal pair, and with the high one. */
  readonly nominal: number
  readonly high: number
}

export interface Strip {
  readonly edgeId: string
  /** From the slab edge to where the strip begins, mm: the deepest wedge between two tendons. */
  readonly depth: number
  /** Section over the whole edge, mm2. */
  readonly area: number
  readonly shares: readonly StripShare[]
}

/** The strip behind an edge; why its forces are not known; null where no tendon ends at the edge. */
export const stripOfEdge: (index: LayoutIndex, edgeId: string) => Strip | NoForce | null = perConcrete(
  (index, edgeId) => {
    const ends = tendonEndsOfEdge(index, edgeId)
    if (ends.length === 0) return null
    const edge = found(index.edges, edgeId, 'edge')
    const frame = found(index.frames, edgeId, 'edge')
    const pour = found(index.pours, edge.pourId, 'pour')
    const forces = forcesOf(index, ends)
    if (isNoForce(forces)) return forces
    const depth = depthBehind(index, edgeId, ends)
    const areaOver = (from: number, to: number) => sectionArea({ pour, frame, depth }, from, to)
    const places = placesOf(ends)
    const shares = places.map((here, i): StripShare => {
      const [before, after] = [places[i - 1], places[i + 1]]
      const from = before ? (chainageOf(before) + chainageOf(here)) / 2 : frame.from
      const to = after ? (chainageOf(here) + chainageOf(after)) / 2 : frame.to
      const sum = (pair: 'nominal' | 'high') =>
        here.reduce((total, end) => total + forceBehind(end, depth, forces.get(end.anchor.tendonId)?.[pair]), 0)
      return { ends: here, from, to, area: areaOver(from, to), nominal: sum('nominal'), high: sum('high') }
    })
    return { edgeId, depth, area: areaOver(frame.from, frame.to), shares }
  },
)

interface Pair {
  readonly nominal: TendonForces
  readonly high: TendonForces
}

/** All must be known: a sum that leaves one out would say less than is there. */
function forcesOf(index: LayoutIndex, ends: readonly TendonEnd[]): ReadonlyMap<string, Pair> | NoForce {
  const known = new Map<string, Pair>()
  const unknown: NoForce[] = []
  for (const tendonId of new Set(ends.map(({ anchor }) => anchor.tendonId))) {
    const nominal = tendonForces(index, tendonId, 'nominal')
    const high = tendonForces(index, tendonId, 'high')
    if (isNoForce(nominal)) unknown.push(nominal)
    else if (isNoForce(high)) unknown.push(high)
    else known.set(tendonId, { nominal, high })
  }
  const [first] = unknown
  if (!first) return known
  const others = unknown.length - 1
  const more = others === 0 ? '' : ` So it is with ${others} more of the tendons that end at this edge.`
  return { ...first, message: `${first.message}${more}` }
}

const chainageOf = (place: readonly TendonEnd[]): number => place[0]?.chainage ?? 0

function placesOf(ends: readonly TendonEnd[]): readonly (readonly TendonEnd[])[] {
  const places: TendonEnd[][] = []
  for (const end of ends) {
    const last = places.at(-1)
    if (last && end.chainage - chainageOf(last) <= ROUNDING) last.push(end)
    else places.push([end])
  }
  return places
}

/** Beyond the outermost tendon the wedge runs on to the end of the edge and sets no strip. */
function depthBehind(index: LayoutIndex, edgeId: string, ends: readonly TendonEnd[]): number {
  const wedges = wedgesOfEdge(index, edgeId)
  const between = gapsOfEdge(index, edgeId).filter(({ after, before }) => after !== null && before !== null)
  const depths = between.map(({ id }) => wedges.get(id)?.depth ?? 0).filter(Number.isFinite)
  return Math.max(...ends.map(({ setBack }) => setBack), ...depths)
}

/** The part of a tendon's force that stands square to the edge, that deep behind it. */
function forceBehind({ anchor, setBack, lean }: TendonEnd, depth: number, forces: TendonForces | undefined): number {
  if (!forces) return 0
  const along = Math.min(forces.length, Math.max(0, depth - setBack) / Math.cos(lean))
  const place = forces.ends[0].id === anchor.id ? along : forces.length - along
  return forces.lockedAt(place) * Math.cos(lean)
}

/** Cut where a part of another thickness begins or ends, so that each piece has one thickness. */
function sectionArea(
  { pour, frame, depth }: { readonly pour: Pour; readonly frame: EdgeFrame; readonly depth: number },
  from: number,
  to: number,
): number {
  const cuts = [from, ...frame.steps, ...regionCuts(pour, frame, depth), to]
    .filter((chainage) => chainage >= from && chainage <= to)
    .sort((a, b) => a - b)
  return cuts.slice(1).reduce((sum, end, i) => {
    const start = cuts[i] ?? end
    const { top, soffit } = sectionBehind(pour, { frame, chainage: (start + end) / 2, depth })
    return sum + (end - start) * (top - soffit)
  }, 0)
}

function regionCuts(pour: Pour, frame: EdgeFrame, depth: number): number[] {
  return pour.regions.flatMap(({ outline }) =>
    sidesOf(outline).flatMap(([one, other]) => {
      const [a, b] = [frame.local(one), frame.local(other)]
      if (a.depth > depth === b.depth > depth) return []
      return [a.chainage + ((depth - a.depth) / (b.depth - a.depth)) * (b.chainage - a.chainage)]
    }),
  )
}
