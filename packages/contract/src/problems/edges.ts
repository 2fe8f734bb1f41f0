import type { EdgeData, EdgeLineData, LayoutFile, PourData } from '../layout'
import { alongLine } from './outline'
import { topProblems } from './pours'
import { byId, mm, refused, type Path, type Problem } from './problem'

/** How far the two corners of an edge may stand off its edge line, and how far its lengths may miss its ends. */
const OFF_LINE_MAX_MM = 5
const LENGTH_GAP_MAX_MM = 1

export interface Interval {
  readonly fromMm: number
  readonly toMm: number
}

/** Edges against the outlines and edge lines that they lie on, and joints. */
export function edgeProblems(layout: LayoutFile): Problem[] {
  const pours = byId(layout.pours)
  const lines = byId(layout.edgeLines)
  return [
    ...sharedCorners(layout.edges),
    ...layout.edges.flatMap((edge, i) => {
      const pour = pours.get(edge.pourId)
      const line = lines.get(edge.edgeLineId)
      return pour && line ? problemsOf({ edge, pour, line }, ['edges', i]) : []
    }),
    ...jointProblems(layout),
  ]
}

interface Placed {
  readonly edge: EdgeData
  readonly pour: PourData
  readonly line: EdgeLineData
}

function problemsOf({ edge, pour, line }: Placed, path: Path): Problem[] {
  const side = sideOf(edge, pour)
  if (!side) {
    return [
      refused(
        [...path, 'cornerId'],
        `"${edge.cornerId}" is no corner of pour ${pour.mark}; must be where the edge starts`,
      ),
    ]
  }
  const levels = line.levelId === pour.levelId ? [] : [refused([...path, 'edgeLineId'], wrongLevel(line, pour))]
  const [start, end] = side.map((corner) => alongLine(line, corner))
  if (!start || !end) return levels
  const off = offLine(line, [start.offMm, end.offMm], [...path, 'edgeLineId'])
  if (off.length > 0) return [...levels, ...off]
  const interval = {
    fromMm: Math.min(start.chainageMm, end.chainageMm),
    toMm: Math.max(start.chainageMm, end.chainageMm),
  }
  return [...levels, ...lengthProblems(edge, interval, [...path, 'lengths'])]
}

const wrongLevel = (line: EdgeLineData, pour: PourData): string =>
  `edge line ${line.mark} belongs to another level than pour ${pour.mark}; must be a line of the pour's level`

/** The two corners of an edge; null where its corner is not one of the pour's. */
function sideOf(edge: EdgeData, pour: PourData) {
  const at = pour.outline.findIndex((corner) => corner.id === edge.cornerId)
  const from = pour.outline[at]
  const to = pour.outline[(at + 1) % pour.outline.length]
  return from && to ? ([from, to] as const) : null
}

/** The edge's interval on its edge line; null where a reference is broken. */
export function intervalOf(edge: EdgeData, layout: Pick<Lookup, 'pours' | 'lines'>): Interval | null {
  const pour = layout.pours.get(edge.pourId)
  const line = layout.lines.get(edge.edgeLineId)
  const side = pour && sideOf(edge, pour)
  if (!side || !line) return null
  const [start, end] = side.map((corner) => alongLine(line, corner).chainageMm)
  if (start === undefined || end === undefined) return null
  return { fromMm: Math.min(start, end), toMm: Math.max(start, end) }
}

interface Lookup {
  readonly pours: ReadonlyMap<string, PourData>
  readonly lines: ReadonlyMap<string, EdgeLineData>
}

function offLine(line: EdgeLineData, offs: readonly [number, number], path: Path): Problem[] {
  const [start, end] = offs
  if (Math.max(Math.abs(start), Math.abs(end)) <= OFF_LINE_MAX_MM) return []
  const right = `both corners must stand within ${OFF_LINE_MAX_MM} mm of it`
  const isParallel = Math.abs(start - end) <= OFF_LINE_MAX_MM
  const wrong = isParallel
    ? `the edge stands ${mm(Math.abs(start))} beside edge line ${line.mark}`
    : `the edge is not parallel to edge line ${line.mark}: its corners stand ${mm(Math.abs(start))} and ${mm(Math.abs(end))} off it`
  return [refused(path, `${wrong}; ${right}`)]
}

function lengthProblems(edge: EdgeData, interval: Interval, path: Path): Problem[] {
  const problems = edge.lengths.flatMap((length, i) => topProblems(length, [...path, i]))
  let reached = interval.fromMm
  for (const [i, length] of edge.lengths.entries()) {
    const { fromMm, toMm } = length
    const missing = fromMm - reached
    if (toMm <= fromMm) {
      problems.push(refused([...path, i, 'toMm'], `${mm(toMm)} is not beyond fromMm at ${mm(fromMm)}; must be more`))
    } else if (missing > LENGTH_GAP_MAX_MM) {
      problems.push(refused([...path, i, 'fromMm'], notCovered(i, reached, fromMm)))
    } else if (missing < -LENGTH_GAP_MAX_MM) {
      problems.push(refused([...path, i, 'fromMm'], tooEarly(i, reached, fromMm)))
    }
    reached = Math.max(reached, toMm)
  }
  const over = reached - interval.toMm
  if (Math.abs(over) > LENGTH_GAP_MAX_MM) {
    const what = over > 0 ? 'runs beyond' : 'stops short of'
    const at = [...path, edge.lengths.length - 1, 'toMm']
    problems.push(refused(at, `${mm(reached)} ${what} the end of the edge; must be ${mm(interval.toMm)}`))
  }
  return problems
}

const notCovered = (i: number, reached: number, from: number): string =>
  `${mm(from)} leaves the edge from ${mm(reached)} uncovered; must be ${mm(reached)}, ${whereItStarts(i)}`

const tooEarly = (i: number, reached: number, from: number): string =>
  i === 0
    ? `${mm(from)} stands before the edge; must be ${mm(reached)}, ${whereItStarts(i)}`
    : `${mm(from)} overlaps the length before; must be ${mm(reached)}, ${whereItStarts(i)}`

const whereItStarts = (i: number): string => (i === 0 ? 'where the edge starts' : 'where the length before ends')

function sharedCorners(edges: readonly EdgeData[]): Problem[] {
  const first = new Map<string, number>()
  return edges.flatMap((edge, i) => {
    const key = JSON.stringify([edge.pourId, edge.cornerId])
    const taken = first.get(key)
    if (taken === undefined) {
      first.set(key, i)
      return []
    }
    return [refused(['edges', i, 'cornerId'], `edges[${taken}] starts at this corner already; one side is one edge`)]
  })
}

function jointProblems(layout: LayoutFile): Problem[] {
  const sides = new Set(layout.edges.map((edge) => JSON.stringify([edge.edgeLineId, edge.pourId])))
  return layout.joints.flatMap((joint, i) => {
    if (sides.has(JSON.stringify([joint.edgeLineId, joint.firstPourId]))) return []
    const message = 'the pour cast first has no edge on the line of this joint; must be one of the pours beside it'
    return [refused(['joints', i, 'firstPourId'], message)]
  })
}
