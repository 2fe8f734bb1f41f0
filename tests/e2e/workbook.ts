import type { Schedule } from '@wedgeline/engine'
import ExcelJS from 'exceljs'

type Value = string | number | null

/** Cells of each sheet as somebody reads them, by row and column from 1; a formula counts with the value beside it. */
export type Workbook = ReadonlyMap<string, ReadonlyMap<string, Value>>

export async function readWorkbook(path: string): Promise<Workbook> {
  const book = new ExcelJS.Workbook()
  await book.xlsx.readFile(path)
  return new Map(
    book.worksheets.map((sheet) => {
      const cells = new Map<string, Value>()
      sheet.eachRow((row, at) => row.eachCell((cell, column) => cells.set(`${at}:${column}`, valueOf(cell))))
      return [sheet.name, cells] as const
    }),
  )
}

/** The cell's model, since the reader leaves a result of 0 out of the value that it gives. */
function valueOf({ value, model }: ExcelJS.Cell): Value {
  if (typeof value === 'string' || typeof value === 'number' || value === null) return value
  if (typeof model.result === 'number') return model.result
  throw new Error(`A cell holds ${JSON.stringify(value)}, which is neither a text nor a number.`)
}

/** A row of the schedule's table: the fourteen columns of BS 8666 (from memory), then mass beside it. */
export type ScheduleCells = readonly Value[]

const HEAD = ['Member', 'Bar mark', 'Type and size', 'No. of members', 'No. in each', 'Total no.']
const WIDTH = 14
/** Length by formula stands in column 16, mass in 17. */
const MASS = 17

/** Every row below the head of the bar schedule. @throws where there is no such head. */
export function scheduleRows(book: Workbook): readonly ScheduleCells[] {
  return rowsBelow(book, { sheet: 'Schedule', head: HEAD, columns: [...columns(WIDTH), MASS] })
}

/** Every row below the head of the summary, the sum of all last: size, bars, metres, kg a metre, kg. */
export function totalRows(book: Workbook): readonly ScheduleCells[] {
  return rowsBelow(book, { sheet: 'Summary', head: ['Type and size', 'No. of bars'], columns: columns(5) })
}

const columns = (count: number): number[] => Array.from({ length: count }, (_, at) => at + 1)

function rowsBelow(
  book: Workbook,
  wanted: { readonly sheet: string; readonly head: readonly string[]; readonly columns: readonly number[] },
): readonly ScheduleCells[] {
  const cells = book.get(wanted.sheet)
  const at = (row: number, column: number): Value => cells?.get(`${row}:${column}`) ?? null
  const headRow = columns(40).find((row) => wanted.head.every((title, k) => at(row, k + 1) === title))
  if (headRow === undefined) throw new Error(`Sheet ${wanted.sheet} has no row with ${wanted.head.join(', ')}.`)
  const rows: ScheduleCells[] = []
  for (let row = headRow + 1; at(row, 1) !== null; row += 1) rows.push(wanted.columns.map((column) => at(row, column)))
  return rows
}

/** What the engine's schedule says in the same columns. */
export function engineRows({ rows }: Schedule): readonly ScheduleCells[] {
  return rows.map((row) => {
    const { A = null, B = null, C = null, D = null, E, R } = row.dimensions
    const counts = [row.members, row.inEach, row.members * row.inEach]
    const mass = (row.massEach ?? 0) * row.total
    return [
      ...[row.member?.name ?? 'cancelled', row.mark, row.typeAndSize],
      ...[...counts, row.length, row.code, A, B, C, D, E ?? R ?? null],
      ...[row.revision === '' ? null : row.revision, mass],
    ]
  })
}
