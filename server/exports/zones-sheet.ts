import {
  BASIS_SOURCES,
  FAMILY_WORDS,
  STATUSES,
  STATUS_WORDS,
  type Compared,
  type Refused,
  type ZoneResult,
} from '@wedgeline/engine'
import type { BookWriter, CellValue, Column } from './book-writer'
import { statusLine } from './wording'
import type { WorkbookPart } from './workbook'

const COLUMNS: readonly Column[] = [
  { title: 'Zone', width: 24 },
  { title: 'Worst', width: 16 },
  { title: 'Worst check', width: 38, style: { isWrapped: true } },
  { title: 'Demand over limit', width: 10, style: { format: '0.00' } },
  { title: 'Spare or short', width: 12, style: { format: '0.0' } },
  ...STATUSES.map((status): Column => ({ title: STATUS_WORDS[status], width: 10, style: { format: '0' } })),
  { title: 'Not yet checked', width: 40, style: { isWrapped: true } },
]
const FIRST_COUNT = 6
const HEAD_ROW = 4

type Judged = Compared | Refused

/** Every zone with its worst check and its counts, and below the readings that results rest on, with their state. */
export function writeZones(book: BookWriter, input: WorkbookPart): void {
  const { zones } = input.checks
  const sheet = book.sheet(input.sheetName('Zones'))
  sheet.widths(COLUMNS.map(({ width }) => width))
  sheet.put(1, 1, { value: `Worst check of every zone, pour ${input.pour.mark}`, style: { isBold: true, size: 14 } })
  sheet.put(2, 1, { value: statusLine(input) })
  sheet.table({ name: input.rangeName('ZoneChecks'), row: HEAD_ROW, columns: COLUMNS, rows: zones.map(zoneRow) })
  const last = HEAD_ROW + zones.length
  sheet.put(last + 1, 1, { value: 'All zones', style: { isBold: true } })
  STATUSES.forEach((status, k) => {
    const letter = String.fromCharCode(64 + FIRST_COUNT + k)
    const result = zones.reduce((sum, zone) => sum + judged(zone).filter((check) => check.status === status).length, 0)
    const value = { formula: `SUM(${letter}${HEAD_ROW + 1}:${letter}${last})`, result }
    sheet.put(last + 1, FIRST_COUNT + k, { value, style: { isBold: true, format: '0' } })
  })
  const readings = readingRows(input)
  const below = last + 3
  if (readings.length > 0) {
    sheet.table({ name: input.rangeName('Readings'), row: below, columns: READING_COLUMNS, rows: readings })
  } else {
    sheet.put(below, 1, { value: 'No result rests on a reading.' })
  }
  sheet.freeze(HEAD_ROW)
  sheet.page({
    area: `A1:L${below + readings.length}`,
    titleRows: `${HEAD_ROW}:${HEAD_ROW}`,
    footer: `${input.reference} ${statusLine(input)}`,
  })
}

const judged = ({ checks }: ZoneResult): readonly Judged[] =>
  checks.flatMap((check) => (check.kind === 'advice' ? [] : [check]))

/** Checks come worst first. */
function zoneRow(result: ZoneResult): readonly CellValue[] {
  const checks = judged(result)
  const [worst] = checks
  const compared = worst?.kind === 'compared' ? worst : null
  return [
    result.zone.name,
    result.status === null ? '-' : STATUS_WORDS[result.status],
    worst?.name ?? null,
    roundedUp(compared?.utilisation ?? null),
    compared?.spare ?? null,
    ...STATUSES.map((status) => checks.filter((check) => check.status === status).length),
    result.notYetChecked.length > 0 ? result.notYetChecked.map((family) => FAMILY_WORDS[family]).join(', ') : null,
  ]
}

/** A shown ratio rounds up: 1.001 must not read 1.00. */
const roundedUp = (ratio: number | null): number | null => (ratio === null ? null : Math.ceil(ratio * 100) / 100)

const READING_COLUMNS: readonly Column[] = [
  { title: 'Reading', width: 24, style: { isWrapped: true } },
  { title: 'State', width: 16 },
  { title: 'Accepted by, reason', width: 38, style: { isWrapped: true } },
  { title: 'Checks that rest on it', width: 10, style: { format: '0' } },
]

function readingRows({ checks, accepted }: WorkbookPart): readonly (readonly CellValue[])[] {
  const uses = new Map<string, number>()
  for (const check of checks.zones.flatMap(judged)) {
    if (check.kind !== 'compared') continue
    for (const id of new Set(check.readingIds)) uses.set(id, (uses.get(id) ?? 0) + 1)
  }
  const readings = BASIS_SOURCES.find(({ id }) => id === checks.basis)?.readings ?? []
  const titleOf = (readingId: string) => readings.find(({ id }) => id === readingId)?.title ?? readingId
  return [...uses]
    .map(([id, count]) => ({ title: titleOf(id), count, by: accepted.find(({ readingId }) => readingId === id) }))
    .sort((one, other) => one.title.localeCompare(other.title, 'en'))
    .map(({ title, count, by }) => [
      title,
      by ? 'accepted' : 'not accepted yet',
      by ? `${by.acceptedBy}: ${by.reason}` : null,
      count,
    ])
}
