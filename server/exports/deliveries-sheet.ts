import type { BookWriter, CellValue, Column } from './book-writer'
import { statusLine } from './wording'
import type { WorkbookPart } from './workbook'

const COLUMNS: readonly Column[] = [
  { title: 'Delivery', width: 26 },
  { title: 'Needed on', width: 14 },
  { title: 'Members', width: 44, style: { isWrapped: true } },
  { title: 'No. of bars', width: 12, style: { format: '0' } },
  { title: 'Length (m)', width: 14, style: { format: '0.00' } },
  { title: 'Mass (kg)', width: 14, style: { format: '0.00' } },
]
const HEAD_ROW = 4

/** Bars by delivery; without deliveries there is no such sheet. */
export function writeDeliveries(book: BookWriter, input: WorkbookPart): void {
  const { deliveries } = input.schedule
  if (deliveries.length === 0) return
  const name = input.sheetName('Deliveries')
  const sheet = book.sheet(name)
  const [names, totals, lengths, masses] = ['BarDeliveries', 'BarTotals', 'BarLengths', 'BarMasses'].map(
    input.rangeName,
  )
  sheet.widths(COLUMNS.map(({ width }) => width))
  sheet.put(1, 1, { value: `Bars by delivery, schedule ${input.reference}`, style: { isBold: true, size: 14 } })
  sheet.put(2, 1, { value: statusLine(input) })
  const rows = deliveries.map((delivery, k): readonly CellValue[] => {
    const at = HEAD_ROW + 1 + k
    return [
      delivery.name,
      delivery.neededOn ?? 'no day agreed',
      delivery.members.length > 0 ? delivery.members.join(', ') : 'no bars',
      { formula: `SUMIFS(${totals},${names},A${at})`, result: delivery.bars },
      { formula: `SUMPRODUCT((${names}=A${at})*${totals}*${lengths})/1000`, result: delivery.metres },
      { formula: `SUMIFS(${masses},${names},A${at})`, result: delivery.mass },
    ]
  })
  sheet.table({ name: input.rangeName('BarsByDelivery'), row: HEAD_ROW, columns: COLUMNS, rows })
  const [first, last] = [HEAD_ROW + 1, HEAD_ROW + rows.length]
  const sum = (of: 'bars' | 'metres' | 'mass') => deliveries.reduce((all, one) => all + one[of], 0)
  sheet.put(last + 1, 1, { value: 'All bars', style: { isBold: true } })
  for (const [column, letter, of, format] of [
    [4, 'D', 'bars', '0'],
    [5, 'E', 'metres', '0.00'],
    [6, 'F', 'mass', '0.00'],
  ] as const) {
    const value = { formula: `SUM(${letter}${first}:${letter}${last})`, result: sum(of) }
    sheet.put(last + 1, column, { value, style: { isBold: true, format } })
  }
  sheet.freeze(HEAD_ROW)
  sheet.page({
    area: `A1:F${last + 1}`,
    titleRows: `${HEAD_ROW}:${HEAD_ROW}`,
    footer: `${input.reference} ${statusLine(input)}`,
  })
}
