import {
  alongLine,
  type Command,
  type EdgeData,
  type EdgeLineData,
  type LayoutFile,
  type PourData,
} from '@wedgeline/contract'
import { signedArea } from '@wedgeline/engine/geometry'
import type { Change } from '../editing/draft'

export interface PlanPoint {
  readonly xMm: number
  readonly yMm: number
}

/** What somebody types for a new pour; the rest is made from it. */
export interface TypedPour {
  readonly mark: string
  readonly title: string
  readonly level: { readonly id: string } | { readonly mark: string; readonly title: string }
  readonly thicknessMm: number
  readonly concrete: string
  readonly fckMPa: number
  readonly coverTopMm: number
  readonly coverSoffitMm: number
  readonly coverEdgeMm: number
  readonly stages: readonly { readonly name: string; readonly share: number; readonly strengthMPa: number }[]
  readonly outline: readonly PlanPoint[]
}

/** How far a side may lie off a line and still share it, mm. */
const ON_LINE_MM = 1

/**
 * Commands that make a pour with an edge on each side of its outline. A side on a line that the level has already
 * shares that line; every other side gets a line of its own, whose chainage runs east or north from the side's start.
 */
export function insertPour(
  layout: LayoutFile,
  typed: TypedPour,
  newId: () => string,
): { change: Change; pourId: string } {
  const level = 'id' in typed.level ? null : { id: newId(), ...typed.level }
  const levelId = 'id' in typed.level ? typed.level.id : (level?.id ?? '')
  const corners = counterClockwise(typed.outline).map((point) => ({ id: newId(), ...point }))
  const pour: PourData = {
    id: newId(),
    levelId,
    mark: typed.mark,
    title: typed.title,
    thicknessMm: typed.thicknessMm,
    concrete: typed.concrete,
    fckMPa: typed.fckMPa,
    aggregateMm: 20,
    coverTopMm: typed.coverTopMm,
    coverSoffitMm: typed.coverSoffitMm,
    coverEdgeMm: typed.coverEdgeMm,
    outline: corners,
    regions: [],
    mats: [],
    stages: typed.stages.map((stage) => ({ id: newId(), ...stage })),
    markPrefix: '',
    firstMark: 1,
    deliveries: [],
  }
  const sides = edgesOfOutline({ layout, pour, newId })
  const commands: Command[] = [
    ...(level ? [{ type: 'insert', table: 'levels', row: level } as const] : []),
    { type: 'insert', table: 'pours', row: pour },
    ...sides.lines.map((row): Command => ({ type: 'insert', table: 'edgeLines', row })),
    ...sides.edges.map((row): Command => ({ type: 'insert', table: 'edges', row })),
  ]
  return { change: { label: `Add pour ${typed.mark}`, commands }, pourId: pour.id }
}

interface Sides {
  readonly lines: readonly EdgeLineData[]
  readonly edges: readonly EdgeData[]
}

function edgesOfOutline(made: { layout: LayoutFile; pour: PourData; newId: () => string }): Sides {
  const { layout, pour, newId } = made
  const known = layout.edgeLines.filter(({ levelId }) => levelId === pour.levelId)
  let nextNumber = Math.max(0, ...layout.edgeLines.map(({ mark }) => Number(/^E(\d+)/.exec(mark)?.[1] ?? 0))) + 1
  const lines: EdgeLineData[] = []
  const edges = pour.outline.map((corner, i): EdgeData => {
    const next = pour.outline[(i + 1) % pour.outline.length] ?? corner
    const shared = [...known, ...lines].find((line) => isOn(line, corner) && isOn(line, next))
    const line = shared ?? lineThrough(corner, next, { id: newId(), levelId: pour.levelId, mark: `E${nextNumber++}` })
    if (!shared) lines.push(line)
    const chainages = [chainageOn(line, corner), chainageOn(line, next)]
    return {
      id: newId(),
      pourId: pour.id,
      edgeLineId: line.id,
      mark: shared ? `${line.mark}-${pour.mark}` : line.mark,
      cornerId: corner.id,
      isChord: false,
      lengths: [
        {
          id: newId(),
          fromMm: Math.min(...chainages),
          toMm: Math.max(...chainages),
          kind: 'free',
          topMm: pour.thicknessMm,
          soffitMm: 0,
          jackClearMm: null,
          access: '',
        },
      ],
    }
  })
  return { lines, edges }
}

function lineThrough(a: PlanPoint, b: PlanPoint, named: Pick<EdgeLineData, 'id' | 'levelId' | 'mark'>): EdgeLineData {
  const [start, end] = runsEastOrNorth(a, b) ? [a, b] : [b, a]
  const azimuthDeg = (Math.atan2(end.xMm - start.xMm, end.yMm - start.yMm) * 180) / Math.PI
  return { ...named, xMm: start.xMm, yMm: start.yMm, azimuthDeg }
}

function runsEastOrNorth(a: PlanPoint, b: PlanPoint): boolean {
  const [dx, dy] = [b.xMm - a.xMm, b.yMm - a.yMm]
  return Math.abs(dx) >= Math.abs(dy) ? dx > 0 : dy > 0
}

/** Chainage to a thousandth, so that what trigonometry leaves over is not stored. */
const chainageOn = (line: EdgeLineData, point: PlanPoint): number =>
  Math.round(alongLine(line, point).chainageMm * 1000) / 1000

const isOn = (line: EdgeLineData, point: PlanPoint): boolean => Math.abs(alongLine(line, point).offMm) <= ON_LINE_MM

function counterClockwise(outline: readonly PlanPoint[]): readonly PlanPoint[] {
  const area = signedArea(outline.map(({ xMm, yMm }) => ({ x: xMm, y: yMm })))
  return area < 0 ? [...outline].reverse() : outline
}
