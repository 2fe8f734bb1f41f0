import { FAMILY_WORDS, type ScheduleRow, type Step } from '@wedgeline/engine'
import { columnLetter, onSheet, type BookWriter, type CellValue, type Column, type SheetWriter } from './book-writer'
import { CAUTIONS, editionLine, notYetChecked, statusLine } from './wording'
import type { ScheduleWorkbookInput, WorkbookPart } from './workbook'

/** Columns of a BS 8666 schedule, left to right (from memory). */
const COLUMNS: readonly Column[] = [
  { title: 'Member', width: 12 },
  { title: 'Bar mark', width: 9, style: { align: 'center', format: '@' } },
  { title: 'Type and size', width: 9, style: { align: 'center' } },
  { title: 'No. of members', width: 10 },
  { title: 'No. in each', width: 9 },
  { title: 'Total no.', width: 9 },
  { title: 'Length of each bar (mm)', width: 13 },
  { title: 'Shape code', width: 9, style: { align: 'center', format: '@' } },
  ...['A', 'B', 'C', 'D', 'E/R'].map((title): Column => ({ title, width: 8 })),
  { title: 'Rev letter', width: 8, style: { align: 'center' } },
]
/** Beside the table and outside the print: what the frozen numbers come from. */
const BESIDE = ['Length by formula (mm)', 'Mass (kg)', 'Mass by formula (kg)', 'Notes', 'Delivery'] as const
const BESIDE_FROM = COLUMNS.length + 2

export const SCHEDULE_SHEET = 'Schedule'
const HEAD_ROW = 9
const LAST = columnLetter(COLUMNS.length)

export function writeSchedule(book: BookWriter, input: WorkbookPart): void {
  const { rows } = input.schedule
  const name = input.sheetName(SCHEDULE_SHEET)
  const sheet = book.sheet(name)
  sheet.widths([...COLUMNS.map((column) => column.width), 3, 13, 11, 13, 40, 20])
  writeHeader(sheet, input)
  sheet.table({
    name: input.rangeName('BarSchedule'),
    row: HEAD_ROW,
    columns: COLUMNS,
    rows: rows.map((row, k) => tableRow(row, HEAD_ROW + 1 + k)),
  })
  const head = { isHead: true, isBold: true, isWrapped: true, align: 'center' } as const
  BESIDE.forEach((title, k) => sheet.put(HEAD_ROW, BESIDE_FROM + k, { value: title, style: head }))
  const deliveries = new Map(input.schedule.deliveries.map(({ id, name }) => [id, name]))
  rows.forEach((row, k) => writeBeside(sheet, { row, at: HEAD_ROW + 1 + k, deliveries }))
  sheet.freeze(HEAD_ROW)
  const lastRow = HEAD_ROW + rows.length
  sheet.page({
    area: `A1:${LAST}${lastRow}`,
    titleRows: `${HEAD_ROW}:${HEAD_ROW}`,
    footer: `${input.reference} ${statusLine(input)}`,
  })
  for (const [range, column] of RANGES) {
    book.name(input.rangeName(range), onSheet(name, `$${column}$${HEAD_ROW + 1}:$${column}$${lastRow}`))
  }
}

const RANGES = [
  ['BarMarks', 'B'],
  ['BarTypes', 'C'],
  ['BarTotals', 'F'],
  ['BarLengths', 'G'],
  ['BarMasses', 'Q'],
  ['BarDeliveries', 'T'],
] as const

function writeHeader(sheet: SheetWriter, input: ScheduleWorkbookInput): void {
  const { job, pour } = input
  sheet.put(1, 1, { value: 'Bar schedule', style: { isBold: true, size: 14 } })
  const pairs: readonly (readonly [number, number, string, string])[] = [
    [1, 8, 'Status', statusLine(input)],
    [2, 1, 'Job', `${job.number} ${job.title}`],
    [2, 8, 'Schedule ref.', input.reference],
    [3, 1, 'Pour', `${pour.mark} ${pour.title}`.trim()],
    [3, 8, 'Drawing', input.drawing],
    [4, 1, 'Prepared by', input.preparedBy],
    [4, 8, 'Date prepared', input.preparedOn],
    [5, 1, 'Checked by', input.checkedBy ?? 'not yet'],
    [5, 8, 'Units', 'mm, kg'],
  ]
  for (const [row, column, name, value] of pairs) {
    sheet.put(row, column, { value: name, style: { isBold: true } })
    sheet.put(row, column + 2, { value })
  }
  const open = notYetChecked(input).map(({ family }) => FAMILY_WORDS[family])
  const families = open.length > 0 ? `Not yet checked: ${open.join(', ')}.` : 'See Checks for what was checked.'
  sheet.put(6, 1, { value: [editionLine(input), ...CAUTIONS].join(' '), style: { size: 8 } })
  twoLines(families).forEach((value, k) => sheet.put(7 + k, 1, { value, style: { size: 9 } }))
}

/** Letters of the small size that the print is wide. */
const LINE_LETTERS = 148

/** A text in one or two cells, none joined, so that the print does not cut it. */
function twoLines(text: string): readonly string[] {
  if (text.length <= LINE_LETTERS) return [text]
  const at = text.lastIndexOf(' ', LINE_LETTERS)
  return [text.slice(0, at), text.slice(at + 1)]
}

function tableRow(row: ScheduleRow, at: number): readonly CellValue[] {
  const { A = null, B = null, C = null, D = null, E, R } = row.dimensions
  return [
    row.member?.name ?? 'cancelled',
    row.mark,
    row.typeAndSize,
    row.members,
    row.inEach,
    { formula: `D${at}*E${at}`, result: row.total },
    row.length,
    row.code,
    A,
    B,
    C,
    D,
    E ?? R ?? null,
    row.revision === '' ? null : row.revision,
  ]
}

interface Beside {
  readonly row: ScheduleRow
  readonly at: number
  /** Names of deliveries by their ids; empty where the pour has none. */
  readonly deliveries: ReadonlyMap<string | null, string>
}

function writeBeside(sheet: SheetWriter, { row, at, deliveries }: Beside): void {
  const [calculated] = row.steps
  const mass = row.massEach === null ? null : row.massEach * row.total
  const perMetre = row.length !== null && row.massEach !== null ? (row.massEach * 1000) / row.length : 0
  const kgPerMetre = Math.round(perMetre * 1000) / 1000
  const cells: readonly CellValue[] = [
    calculated && row.length !== null ? lengthFormula(calculated, row.length, at) : null,
    mass,
    mass === null ? null : { formula: `F${at}*G${at}/1000*${kgPerMetre}`, result: mass },
    row.notes.length > 0 ? row.notes.join('; ') : null,
    row.member === null ? null : (deliveries.get(row.deliveryId) ?? null),
  ]
  const formats = [undefined, '0.00', '0.00', undefined, undefined]
  cells.forEach((value, k) => {
    const format = formats[k]
    sheet.put(at, BESIDE_FROM + k, { value, style: format === undefined ? {} : { format } })
  })
}

/** Cells of the letters that the user may change; d, r and the typed length of a drawn shape stay numbers. */
const LETTER_COLUMNS: Readonly<Record<string, string>> = { A: 'I', B: 'J', C: 'K', D: 'L', E: 'M', R: 'M' }
const FUNCTIONS: Readonly<Record<string, string>> = { sqrt: 'SQRT', max: 'MAX', min: 'MIN', pi: 'PI()' }

/** The step's own text, with cells for its letters; rounded to a millionth before it is taken up to the next 25. */
function lengthFormula({ formula, values }: Step, length: number, at: number): CellValue {
  const inCells = formula.replaceAll(/[A-Za-z]\w*/g, (name) => {
    const column = LETTER_COLUMNS[name]
    return column ? `${column}${at}` : (FUNCTIONS[name] ?? String(values[name] ?? 0))
  })
  return { formula: `CEILING(ROUND(${inCells.replaceAll(' ', '')},6),25)`, result: length }
}
