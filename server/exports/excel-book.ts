import ExcelJS from 'exceljs'
import type { BookProperties, BookWriter, CellStyle, CellValue, SheetWriter, TableBlock } from './book-writer'
import { withoutTimes } from './zip-times'

const FONT = 'Calibri'
const A4 = 9
const FILL = 'FFE7E2D6'
const RULE = 'FFD2CCBD'

/** An Excel workbook in memory. The same calls give the same bytes. */
export function excelBook(properties: BookProperties): BookWriter {
  const book = new ExcelJS.Workbook()
  const at = new Date(properties.atMs)
  book.title = properties.title
  book.subject = properties.subject
  book.creator = properties.author
  book.lastModifiedBy = properties.author
  book.created = at
  book.modified = at
  return {
    sheet: (name) => sheetWriter(book, book.addWorksheet(name)),
    name: (name, range) => book.definedNames.add(range, name),
    finish: async () => withoutTimes(Buffer.from(await book.xlsx.writeBuffer())),
  }
}

function sheetWriter(book: ExcelJS.Workbook, sheet: ExcelJS.Worksheet): SheetWriter {
  return {
    put(row, column, { value, style }) {
      const cell = sheet.getCell(row, column)
      cell.value = cellValue(value)
      styled(cell, style)
    },
    table: (block) => writeTable(sheet, block),
    widths: (widths) =>
      widths.forEach((width, k) => {
        sheet.getColumn(k + 1).width = width
      }),
    rowHeight(row, points) {
      sheet.getRow(row).height = points
    },
    picture(row, column, { png, width, height }) {
      const imageId = book.addImage({ base64: Buffer.from(png).toString('base64'), extension: 'png' })
      const place = { tl: { col: column - 1 + 0.1, row: row - 1 + 0.05 }, ext: { width, height } }
      sheet.addImage(imageId, { ...place, editAs: 'oneCell' })
    },
    freeze(rows) {
      sheet.views = [{ state: 'frozen', xSplit: 0, ySplit: rows }]
    },
    page({ area, titleRows, footer }) {
      const pageSetup = {
        paperSize: A4,
        orientation: 'landscape',
        fitToPage: true,
        fitToWidth: 1,
        fitToHeight: 0,
      } as const
      // The library puts a dollar before each letter alone; an area with rows that shift is not taken everywhere.
      const printArea = area.replaceAll(/\d+/g, (row) => `$${row}`)
      Object.assign(sheet.pageSetup, pageSetup, { printArea, printTitlesRow: titleRows })
      fitRows(sheet)
      // An ampersand begins a code in a footer; two of them print one.
      sheet.headerFooter.oddFooter = `&L${footer.replaceAll('&', '&&')}&RPage &P of &N`
    },
  }
}

const LINE_PT = 15
/** Letters of a text are narrower than the digits in which widths of columns count; bold ones are as wide. */
const PER_DIGIT = { plain: 1.1, bold: 0.95 } as const

/** Rows as high as their wrapped texts need: not every program works that out when it opens a file. */
function fitRows(sheet: ExcelJS.Worksheet): void {
  sheet.eachRow((row) => {
    let lines = 1
    row.eachCell((cell) => {
      if (cell.alignment?.wrapText !== true || typeof cell.value !== 'string') return
      const width = (sheet.getColumn(Number(cell.col)).width ?? 9) - 1
      lines = Math.max(lines, linesOf(cell.value, width * (cell.font?.bold ? PER_DIGIT.bold : PER_DIGIT.plain)))
    })
    if (lines === 1) return
    row.height = Math.max(row.height ?? 0, lines * LINE_PT)
    row.eachCell((cell) => {
      if (cell.alignment?.vertical === undefined) {
        cell.style = { ...cell.style, alignment: { ...cell.alignment, vertical: 'top' } }
      }
    })
  })
}

/** Lines that a text takes when its words wrap at so many letters. */
function linesOf(text: string, width: number): number {
  let [lines, used] = [1, 0]
  for (const word of text.split(' ')) {
    const next = used === 0 ? word.length : used + 1 + word.length
    if (next > width && used > 0) [lines, used] = [lines + 1, word.length]
    else used = next
    while (used > width) [lines, used] = [lines + 1, used - width]
  }
  return lines
}

function writeTable(sheet: ExcelJS.Worksheet, { name, row, columns, rows }: TableBlock): void {
  sheet.addTable({
    name,
    ref: `A${row}`,
    headerRow: true,
    style: { showRowStripes: false },
    columns: columns.map(({ title }) => ({ name: title })),
    rows: rows.map((cells) => cells.map(cellValue)),
  })
  columns.forEach(({ style }, k) => {
    styled(sheet.getCell(row, k + 1), { isHead: true, isBold: true, isWrapped: true, align: 'center' })
    rows.forEach((_, below) => styled(sheet.getCell(row + 1 + below, k + 1), style))
  })
}

function cellValue(value: CellValue): ExcelJS.CellValue {
  if (value === null || typeof value !== 'object') return value
  return { formula: value.formula, result: value.result }
}

/**
 * A style of its own for every cell that needs one: the library shares style objects between cells, and a change would
 * leak. Plain cells get none, which keeps long schedules quick.
 */
function styled(cell: ExcelJS.Cell, style: CellStyle = {}): void {
  const { isBold = false, isWrapped = false, isHead = false, align, format, size } = style
  if (isBold || size !== undefined) cell.font = { name: FONT, size: size ?? 11, bold: isBold }
  if (isWrapped || isHead || align !== undefined) {
    cell.alignment = { vertical: isHead ? 'middle' : 'top', wrapText: isWrapped, ...(align && { horizontal: align }) }
  }
  if (format !== undefined) cell.numFmt = format
  if (!isHead) return
  cell.fill = { type: 'pattern', pattern: 'solid', fgColor: { argb: FILL } }
  cell.border = { bottom: { style: 'thin', color: { argb: RULE } } }
}
