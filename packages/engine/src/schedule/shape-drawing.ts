import type { DimensionName } from './bar-standards'

/** A simple picture of a bent shape, not to scale: a line and its letters in a box of 120 by 60, y downwards. */
export interface ShapeDrawing {
  readonly line: readonly DrawnPoint[]
  readonly labels: readonly (DrawnPoint & { readonly name: DimensionName })[]
}

export interface DrawnPoint {
  readonly x: number
  readonly y: number
}

type Pair = readonly [number, number]
type Label = readonly [DimensionName, number, number]

const drawing = (line: readonly Pair[], labels: readonly Label[]): ShapeDrawing => ({
  line: line.map(([x, y]) => ({ x, y })),
  labels: labels.map(([name, x, y]) => ({ name, x, y })),
})

interface Arc {
  readonly centre: Pair
  readonly radius: number
  /** Degrees, clockwise on the page from three o'clock. */
  readonly from: number
  readonly to: number
}

const SIDES = 24
function arc({ centre: [x, y], radius, from, to }: Arc): readonly Pair[] {
  return Array.from({ length: SIDES + 1 }, (_, k): Pair => {
    const angle = ((from + ((to - from) * k) / SIDES) * Math.PI) / 180
    return [x + radius * Math.cos(angle), y + radius * Math.sin(angle)]
  })
}

const TURNS = 4
const STEPS = 96
/** Turns seen from the side. */
const helixLine: readonly Pair[] = Array.from({ length: STEPS + 1 }, (_, k): Pair => {
  const turn = (TURNS * k) / STEPS
  return [16 + 22 * turn, 30 - 20 * Math.cos(2 * Math.PI * turn)]
})

const DRAWINGS: Readonly<Record<string, ShapeDrawing>> = {
  '00': drawing(
    [
      [8, 30],
      [112, 30],
    ],
    [['A', 60, 22]],
  ),
  '11': drawing(
    [
      [20, 8],
      [20, 50],
      [108, 50],
    ],
    [
      ['A', 12, 30],
      ['B', 64, 42],
    ],
  ),
  '12': drawing(
    [[20, 6], ...arc({ centre: [46, 26], radius: 26, from: 180, to: 90 }), [110, 52]],
    [
      ['A', 12, 28],
      ['B', 78, 44],
      ['R', 46, 30],
    ],
  ),
  '13': drawing(
    [[104, 14], ...arc({ centre: [32, 30], radius: 16, from: 270, to: 90 }), [84, 46]],
    [
      ['A', 68, 6],
      ['B', 8, 32],
      ['C', 62, 56],
    ],
  ),
  '15': drawing(
    [
      [8, 46],
      [64, 46],
      [110, 14],
    ],
    [
      ['A', 36, 37],
      ['C', 82, 24],
      ['D', 114, 32],
      ['B', 88, 56],
    ],
  ),
  '21': drawing(
    [
      [104, 12],
      [20, 12],
      [20, 48],
      [104, 48],
    ],
    [
      ['A', 62, 4],
      ['B', 12, 32],
      ['C', 62, 58],
    ],
  ),
  '22': drawing(
    [[20, 8], [20, 50], [80, 50], ...arc({ centre: [80, 34], radius: 16, from: 90, to: -90 }), [52, 18]],
    [
      ['A', 12, 28],
      ['B', 50, 58],
      ['C', 104, 36],
      ['D', 66, 10],
    ],
  ),
  '25': drawing(
    [
      [6, 14],
      [32, 46],
      [88, 46],
      [114, 14],
    ],
    [
      ['A', 24, 26],
      ['B', 96, 26],
      ['C', 4, 34],
      ['D', 116, 34],
      ['E', 60, 37],
    ],
  ),
  '26': drawing(
    [
      [6, 44],
      [44, 44],
      [74, 18],
      [114, 18],
    ],
    [
      ['A', 24, 35],
      ['B', 54, 28],
      ['C', 94, 9],
      ['D', 80, 36],
    ],
  ),
  '31': drawing(
    [
      [36, 10],
      [20, 10],
      [20, 50],
      [100, 50],
      [100, 18],
    ],
    [
      ['A', 30, 3],
      ['B', 12, 32],
      ['C', 60, 42],
      ['D', 108, 34],
    ],
  ),
  '33': drawing(
    [
      [60, 14],
      ...arc({ centre: [28, 30], radius: 16, from: 270, to: 90 }),
      ...arc({ centre: [92, 30], radius: 16, from: 90, to: -90 }),
      [48, 16],
    ],
    [
      ['A', 60, 56],
      ['B', 8, 32],
      ['C', 54, 26],
    ],
  ),
  '41': drawing(
    [
      [6, 50],
      [32, 50],
      [32, 12],
      [88, 12],
      [88, 50],
      [114, 50],
    ],
    [
      ['A', 18, 41],
      ['B', 26, 30],
      ['C', 60, 4],
      ['D', 94, 30],
      ['E', 102, 41],
    ],
  ),
  '44': drawing(
    [
      [14, 8],
      [14, 30],
      [42, 30],
      [42, 50],
      [90, 50],
      [90, 24],
    ],
    [
      ['A', 8, 20],
      ['B', 28, 21],
      ['C', 36, 42],
      ['D', 66, 41],
      ['E', 97, 36],
    ],
  ),
  '47': drawing(
    [
      [40, 20],
      [40, 8],
      [30, 8],
      [30, 52],
      [90, 52],
      [90, 8],
      [80, 8],
      [80, 20],
    ],
    [
      ['A', 22, 32],
      ['B', 60, 43],
      ['C', 46, 17],
      ['D', 72, 17],
    ],
  ),
  '51': drawing(
    [
      [46, 22],
      [30, 8],
      [92, 8],
      [92, 52],
      [30, 52],
      [30, 8],
      [36, 26],
    ],
    [
      ['A', 22, 32],
      ['B', 62, 43],
      ['C', 50, 28],
      ['D', 40, 34],
    ],
  ),
  '63': drawing(
    [
      [40, 20],
      [26, 8],
      [94, 8],
      [94, 52],
      [26, 52],
      [26, 8],
      [94, 8],
      [80, 20],
    ],
    [
      ['A', 18, 32],
      ['B', 60, 43],
      ['C', 46, 24],
      ['D', 76, 24],
    ],
  ),
  '75': drawing(arc({ centre: [60, 30], radius: 24, from: -60, to: 330 }), [
    ['A', 60, 34],
    ['B', 88, 14],
  ]),
  '77': drawing(helixLine, [
    ['A', 8, 32],
    ['B', 38, 3],
    ['C', 112, 32],
  ]),
  '99': drawing(
    [
      [10, 44],
      [36, 16],
      [62, 36],
      [90, 12],
      [110, 44],
    ],
    [],
  ),
}

/** @returns the picture of a shape; null for a shape that has none here. */
export const shapeDrawing = (code: string): ShapeDrawing | null => DRAWINGS[code] ?? null
