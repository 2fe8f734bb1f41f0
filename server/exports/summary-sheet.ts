import { STEEL_NAMES } from '@wedgeline/engine'
import { onSheet, type BookWriter, type CellValue, type Column, type SheetWriter } from './book-writer'
import { statusLine } from './wording'
import type { WorkbookPart } from './workbook'

const COLUMNS: readonly Column[] = [
  { title: 'Type and size', width: 16 },
  { title: 'No. of bars', width: 12, style: { format: '0' } },
  { title: 'Length (m)', width: 14, style: { format: '0.00' } },
  { title: 'Mass per metre (kg/m)', width: 14, style: { format: '0.000' } },
  { title: 'Mass (kg)', width: 14, style: { format: '0.00' } },
]
const HEAD_ROW = 4

export function writeSummary(book: BookWriter, input: WorkbookPart): void {
  const { totals, metres, mass } = input.schedule
  const sheet = book.sheet(input.sheetName('Summary'))
  const [totalsRange, typesRange, lengthsRange] = ['BarTotals', 'BarTypes', 'BarLengths'].map(input.rangeName)
  sheet.widths(COLUMNS.map((column) => column.width))
  sheet.put(1, 1, { value: `Bars by type and size, schedule ${input.reference}`, style: { isBold: true, size: 14 } })
  sheet.put(2, 1, { value: statusLine(input) })
  const rows = totals.map((total, k): readonly CellValue[] => {
    const at = HEAD_ROW + 1 + k
    return [
      total.typeAndSize,
      { formula: `SUMIFS(${totalsRange},${typesRange},A${at})`, result: total.bars },
      { formula: `SUMPRODUCT((${typesRange}=A${at})*${totalsRange}*${lengthsRange})/1000`, result: total.metres },
      total.massPerMetre,
      { formula: `C${at}*D${at}`, result: total.mass },
    ]
  })
  if (rows.length > 0) sheet.table({ name: input.rangeName('BarSummary'), row: HEAD_ROW, columns: COLUMNS, rows })
  const [first, last, sumRow] = [HEAD_ROW + 1, HEAD_ROW + rows.length, HEAD_ROW + rows.length + 1]
  const sums: readonly (readonly [number, CellValue, string])[] = [
    [1, 'All bars', '@'],
    [2, { formula: `SUM(B${first}:B${last})`, result: totals.reduce((all, total) => all + total.bars, 0) }, '0'],
    [3, { formula: `SUM(C${first}:C${last})`, result: metres }, '0.00'],
    [5, { formula: `SUM(E${first}:E${last})`, result: mass }, '0.00'],
  ]
  if (rows.length > 0) {
    for (const [column, value, format] of sums) sheet.put(sumRow, column, { value, style: { isBold: true, format } })
    book.name(input.rangeName('AllMetres'), onSheet(input.sheetName('Summary'), `$C$${sumRow}`))
    book.name(input.rangeName('AllMass'), onSheet(input.sheetName('Summary'), `$E$${sumRow}`))
  }
  const lastRow = writeKinds(sheet, input, sumRow + 2)
  sheet.freeze(HEAD_ROW)
  sheet.page({
    area: `A1:E${lastRow}`,
    titleRows: `${HEAD_ROW}:${HEAD_ROW}`,
    footer: `${input.reference} ${statusLine(input)}`,
  })
}

const KIND_COLUMNS: readonly Column[] = [
  { title: 'Kind of bar', width: 16 },
  { title: 'Bars of it', width: 12, style: { format: '0' } },
  { title: 'Metres of it', width: 14, style: { format: '0.00' } },
  { title: 'Mass of it (kg)', width: 14, style: { format: '0.00' } },
]

/** By kind of bar, and the longest bar; answers the last row. */
function writeKinds(sheet: SheetWriter, input: WorkbookPart, from: number): number {
  const { kinds, longest } = input.schedule
  const rows = kinds.map(({ kind, bars, metres, mass }): readonly CellValue[] => [
    STEEL_NAMES[kind],
    bars,
    metres,
    mass,
  ])
  if (rows.length > 0) sheet.table({ name: input.rangeName('BarKinds'), row: from, columns: KIND_COLUMNS, rows })
  if (!longest) return from + rows.length
  const [totals, lengths] = ['BarTotals', 'BarLengths'].map(input.rangeName)
  const at = from + rows.length + 2
  sheet.put(at, 1, { value: 'Longest bar (mm)', style: { isBold: true } })
  const formula = `SUMPRODUCT(MAX((${totals}>0)*${lengths}))`
  sheet.put(at, 2, { value: { formula, result: longest.length }, style: { format: '0' } })
  sheet.put(at, 3, { value: `mark ${longest.mark}` })
  return at
}
