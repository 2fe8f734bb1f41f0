import { barStandardById, type BarStandard, type ScheduleRow } from '@wedgeline/engine'
import type { BookWriter, CellValue, Column } from './book-writer'
import { PICTURE, shapePicture } from './shape-picture'
import { editionLine, statusLine } from './wording'
import type { WorkbookPart } from './workbook'

const COLUMNS: readonly Column[] = [
  { title: 'Shape code', width: 10, style: { align: 'center', format: '@' } },
  { title: 'Shape', width: 26, style: { isWrapped: true } },
  { title: 'Drawing, not to scale', width: 30 },
  { title: 'Length on the centre line', width: 38, style: { isWrapped: true } },
  { title: 'Bar marks', width: 30, style: { isWrapped: true } },
]
const HEAD_ROW = 4
const DRAWING_COLUMN = 3
const ROW_POINTS = 92
/** Drawn for print at three pixels a point; shown at half of that. */
const SHOWN = 0.5

/** The shapes of the schedule as this product draws them, with the length by formula and the marks bent to them. */
export function writeShapes(book: BookWriter, input: WorkbookPart): void {
  const { rows } = input.schedule
  const sheet = book.sheet(input.sheetName('Shapes'))
  const standard = barStandardById(input.schedule.standardId)
  const codes = [...new Set(rows.filter(({ member }) => member).map(({ code }) => code))].sort()
  sheet.widths(COLUMNS.map(({ width }) => width))
  sheet.put(1, 1, { value: `Shapes of schedule ${input.reference}`, style: { isBold: true, size: 14 } })
  sheet.put(2, 1, { value: editionLine(input), style: { size: 9 } })
  sheet.table({
    name: input.rangeName('BarShapes'),
    row: HEAD_ROW,
    columns: COLUMNS,
    rows: codes.map((code) => shapeRow(code, rows, standard)),
  })
  codes.forEach((code, k) => {
    const picture = shapePicture(code)
    const row = HEAD_ROW + 1 + k
    sheet.rowHeight(row, ROW_POINTS)
    if (!picture) return
    const [width, height] = [PICTURE.width * SHOWN, PICTURE.height * SHOWN]
    sheet.picture(row, DRAWING_COLUMN, { png: picture, width, height })
  })
  sheet.freeze(HEAD_ROW)
  sheet.page({
    area: `A1:E${HEAD_ROW + codes.length}`,
    titleRows: `${HEAD_ROW}:${HEAD_ROW}`,
    footer: `${input.reference} ${statusLine(input)}`,
  })
}

function shapeRow(code: string, rows: readonly ScheduleRow[], standard: BarStandard | undefined): readonly CellValue[] {
  const own = rows.filter((row) => row.code === code && row.member !== null)
  const formulas = [...new Set(own.flatMap(({ steps: [first] }) => (first ? [first.formula] : [])))]
  const rule = standard?.shapes.find((shape) => shape.code === code)
  const marks = [...new Map(own.map(({ markNumber, mark }) => [markNumber, mark]))].sort(([a], [b]) => a - b)
  return [code, rule?.title ?? '', null, formulas.join('; '), marks.map(([, mark]) => mark).join(', ')]
}
