import { shapeDrawing, type DrawnPoint } from '@wedgeline/engine'
import { png } from './png'

/** Pixels to one unit of the drawing, whose box with its margin is 132 by 76. */
const SCALE = 3
const MARGIN = { x: 6, y: 8 }
export const PICTURE = { width: 132 * SCALE, height: 76 * SCALE } as const
/** Half the thickness of a bar, in pixels. */
const HALF_BAR = 3

/** Letters of dimensions, five by seven. */
const LETTERS: Readonly<Record<string, readonly string[]>> = {
  A: ['.###.', '#...#', '#...#', '#####', '#...#', '#...#', '#...#'],
  B: ['####.', '#...#', '#...#', '####.', '#...#', '#...#', '####.'],
  C: ['.####', '#....', '#....', '#....', '#....', '#....', '.####'],
  D: ['####.', '#...#', '#...#', '#...#', '#...#', '#...#', '####.'],
  E: ['#####', '#....', '#....', '####.', '#....', '#....', '#####'],
  R: ['####.', '#...#', '#...#', '####.', '#.#..', '#..#.', '#...#'],
}
const LETTER_PIXEL = 3

const made = new Map<string, Buffer>()

/** The picture of a shape with its letters as PNG, the same line that the screen draws; null where it has none. */
export function shapePicture(code: string): Buffer | null {
  const known = made.get(code)
  if (known) return known
  const drawing = shapeDrawing(code)
  if (!drawing) return null
  const pixels = new Uint8Array(PICTURE.width * PICTURE.height).fill(255)
  drawing.line.slice(1).forEach((to, i) => {
    const from = drawing.line[i]
    if (from) drawLine(pixels, placed(from), placed(to))
  })
  for (const { name, x, y } of drawing.labels) drawLetter(pixels, name, placed({ x, y }))
  const picture = png({ ...PICTURE, pixels })
  made.set(code, picture)
  return picture
}

const placed = ({ x, y }: DrawnPoint): DrawnPoint => ({ x: (x + MARGIN.x) * SCALE, y: (y + MARGIN.y) * SCALE })

/** Darkens each pixel near the line by how much of it the bar covers, so that slopes look smooth. */
function drawLine(pixels: Uint8Array, from: DrawnPoint, to: DrawnPoint): void {
  const reach = HALF_BAR + 1
  const [left, right] = [Math.min(from.x, to.x) - reach, Math.max(from.x, to.x) + reach]
  const [top, bottom] = [Math.min(from.y, to.y) - reach, Math.max(from.y, to.y) + reach]
  for (let y = Math.max(0, Math.floor(top)); y <= Math.min(PICTURE.height - 1, bottom); y++) {
    for (let x = Math.max(0, Math.floor(left)); x <= Math.min(PICTURE.width - 1, right); x++) {
      const covered = HALF_BAR + 0.5 - distance({ x: x + 0.5, y: y + 0.5 }, from, to)
      darken(pixels, { x, y }, Math.min(1, Math.max(0, covered)))
    }
  }
}

function distance(point: DrawnPoint, from: DrawnPoint, to: DrawnPoint): number {
  const [dx, dy] = [to.x - from.x, to.y - from.y]
  const length = dx * dx + dy * dy
  const share = length === 0 ? 0 : ((point.x - from.x) * dx + (point.y - from.y) * dy) / length
  const held = Math.min(1, Math.max(0, share))
  return Math.hypot(point.x - from.x - held * dx, point.y - from.y - held * dy)
}

function drawLetter(pixels: Uint8Array, name: string, { x, y }: DrawnPoint): void {
  const rows = LETTERS[name] ?? []
  const left = Math.round(x - (5 * LETTER_PIXEL) / 2)
  const top = Math.round(y - (7 * LETTER_PIXEL) / 2)
  rows.forEach((row, j) =>
    [...row].forEach((sign, i) => {
      if (sign !== '#') return
      for (let k = 0; k < LETTER_PIXEL * LETTER_PIXEL; k++) {
        const at = {
          x: left + i * LETTER_PIXEL + (k % LETTER_PIXEL),
          y: top + j * LETTER_PIXEL + Math.floor(k / LETTER_PIXEL),
        }
        darken(pixels, at, 1)
      }
    }),
  )
}

function darken(pixels: Uint8Array, { x, y }: DrawnPoint, share: number): void {
  if (share === 0 || x < 0 || y < 0 || x >= PICTURE.width || y >= PICTURE.height) return
  const at = y * PICTURE.width + x
  pixels[at] = Math.min(pixels[at] ?? 255, Math.round(255 * (1 - share)))
}
