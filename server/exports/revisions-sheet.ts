import type { BookWriter, Column } from './book-writer'
import { statusLine } from './wording'
import type { WorkbookPart } from './workbook'

const COLUMNS: readonly Column[] = [
  { title: 'Rev letter', width: 12, style: { align: 'center' } },
  { title: 'Date', width: 14 },
  { title: 'By', width: 28 },
  { title: 'What changed', width: 80, style: { isWrapped: true } },
]
const HEAD_ROW = 3

/** Issues of the schedule; what has not been issued is one draft without a letter. */
export function writeRevisions(book: BookWriter, input: WorkbookPart): void {
  const sheet = book.sheet(input.sheetName('Revisions'))
  sheet.widths(COLUMNS.map(({ width }) => width))
  sheet.put(1, 1, { value: `Revisions of schedule ${input.reference}`, style: { isBold: true, size: 14 } })
  sheet.table({
    name: input.rangeName('BarRevisions'),
    row: HEAD_ROW,
    columns: COLUMNS,
    rows: [['-', input.preparedOn, input.preparedBy, 'First draft: not issued, without a revision letter.']],
  })
  sheet.freeze(HEAD_ROW)
  sheet.page({
    area: `A1:D${HEAD_ROW + 1}`,
    titleRows: `${HEAD_ROW}:${HEAD_ROW}`,
    footer: `${input.reference} ${statusLine(input)}`,
  })
}
