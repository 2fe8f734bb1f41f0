/** A place said by the building's own lines: A+600 / 1-790. */

import { alongAzimuth, dot, subtract } from './geometry'
import type { GridLine, Layout, Point } from './model'

interface GridOffset {
  readonly line: string
  /** Square to the line, mm: positive to the east of it, or to the north of one that runs more east than north. */
  readonly offset: number
}

/** The nearest line of each of the grid's two directions, those that measure eastwards first. */
function gridOffsets(layout: Pick<Layout, 'gridLines'>, point: Point): GridOffset[] {
  const lines = layout.gridLines.map((line) => ({ line, normal: normalOf(line) }))
  const measuresEast = ({ normal }: { readonly normal: Point }) => Math.abs(normal.x) >= Math.abs(normal.y)
  const families = [lines.filter(measuresEast), lines.filter((line) => !measuresEast(line))]
  return families.flatMap((family) => {
    const offsets = family.map(({ line, normal }) => ({ line: line.name, offset: dot(subtract(point, line), normal) }))
    const nearest = offsets.sort((a, b) => Math.abs(a.offset) - Math.abs(b.offset))[0]
    return nearest ? [nearest] : []
  })
}

/** `A+600 / 1-790` in whole mm; a place on a line reads as the line alone; without a grid the text is empty. */
export function gridReference(layout: Pick<Layout, 'gridLines'>, point: Point): string {
  return gridOffsets(layout, point)
    .map(({ line, offset }) => {
      const whole = Math.round(offset)
      if (whole === 0) return line
      return `${line}${whole > 0 ? '+' : '-'}${Math.abs(whole)}`
    })
    .join(' / ')
}

/** Normal of a grid line, turned to the east, or to the north where it points more north than east. */
function normalOf(line: GridLine): Point {
  const { x, y } = alongAzimuth(line.azimuth)
  const normal = { x: y, y: -x }
  const towards = Math.abs(normal.x) >= Math.abs(normal.y) ? normal.x : normal.y
  return towards >= 0 ? normal : { x: -normal.x, y: -normal.y }
}
