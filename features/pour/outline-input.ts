import { selfCrossing, signedArea } from '@wedgeline/engine/geometry'
import { parseNumber } from '@/components/ui/number-text'
import type { PlanPoint } from './pour-commands'

/** A corner as far as it is typed. */
export interface TypedCorner {
  readonly xMm: number | null
  readonly yMm: number | null
}

/** The four corners of a rectangle from its south-west corner, counter-clockwise. */
export function rectangle(size: { along: number; across: number }, origin: PlanPoint): readonly PlanPoint[] {
  const [x, y] = [origin.xMm, origin.yMm]
  return [
    { xMm: x, yMm: y },
    { xMm: x + size.along, yMm: y },
    { xMm: x + size.along, yMm: y + size.across },
    { xMm: x, yMm: y + size.across },
  ]
}

/** Corners whose two figures are both there. */
export const wholeCorners = (corners: readonly TypedCorner[]): readonly PlanPoint[] =>
  corners.flatMap(({ xMm, yMm }) => (xMm === null || yMm === null ? [] : [{ xMm, yMm }]))

/** Why an outline cannot be used and what would be right; null where it can. */
export function outlineProblem(corners: readonly TypedCorner[]): string | null {
  const half = corners.findIndex(({ xMm, yMm }) => (xMm === null) !== (yMm === null))
  if (half >= 0) return `Corner ${half + 1} has one figure of two. Give both x and y.`
  const points = wholeCorners(corners)
  if (points.length < 3) {
    return `The outline has ${points.length} ${points.length === 1 ? 'corner' : 'corners'}. It needs three or more.`
  }
  const repeated = points.findIndex((point, i) => {
    const next = points[(i + 1) % points.length] ?? point
    return Math.hypot(next.xMm - point.xMm, next.yMm - point.yMm) < 1
  })
  if (repeated >= 0) {
    const next = ((repeated + 1) % points.length) + 1
    return `Corners ${repeated + 1} and ${next} stand at one place. Leave one out; the last corner needs no repeat of the first.`
  }
  const plane = points.map(({ xMm, yMm }) => ({ x: xMm, y: yMm }))
  const [first, second] = plane
  const isLine = first && second && plane.every((point) => Math.abs(signedArea([first, second, point])) < 1)
  if (isLine) return 'The corners stand on one line. The outline must enclose the slab.'
  const crossing = selfCrossing(plane)
  if (!crossing) return null
  return `The outline crosses itself: the side from corner ${crossing.first + 1} meets the side from corner ${crossing.second + 1}. Put the corners in the order in which one walks round the slab.`
}

/** Corners copied out of a spreadsheet: x and y in two columns, or separated by a semicolon or spaces. */
export function readCorners(text: string): {
  readonly corners: readonly TypedCorner[]
  readonly problem: string | null
} {
  const lines = text
    .replace(/\r/g, '')
    .split('\n')
    .map((line) => line.trim())
  const filled = lines.filter((line) => line !== '')
  const corners: TypedCorner[] = []
  for (const [at, line] of filled.entries()) {
    const cells = line.split(line.includes('\t') ? /\t+/ : line.includes(';') ? /\s*;\s*/ : /\s+|,\s+/)
    const [x, y] = [numberOf(cells[0]), numberOf(cells[1])]
    // A first line of words names the columns.
    if (at === 0 && x === null && y === null) continue
    if (x === null || y === null || cells.length > 2) {
      return {
        corners: [],
        problem: `Line ${at + 1}, "${line}", is not an x and a y. Each line needs two figures in mm.`,
      }
    }
    corners.push({ xMm: x, yMm: y })
  }
  return { corners, problem: corners.length === 0 ? 'There are no figures in what was pasted.' : null }
}

function numberOf(cell: string | undefined): number | null {
  if (cell === undefined) return null
  const read = parseNumber(cell, { unit: 'mm', separator: '.' })
  return read.kind === 'number' ? read.value : null
}
