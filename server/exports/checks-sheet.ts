import {
  BASIS_SOURCES,
  FAMILY_WORDS,
  STATUSES,
  STATUS_WORDS,
  type Check,
  type Status,
  type ZoneResult,
} from '@wedgeline/engine'
import type { BookWriter, CellValue, Column } from './book-writer'
import { notYetChecked, statusLine } from './wording'
import type { WorkbookPart } from './workbook'

/** What an engineer must see before the bars are ordered. */
const LISTED: readonly Status[] = ['stop', 'not-covered', 'over', 'needs-judgement']

const COLUMNS: readonly Column[] = [
  { title: 'Zone', width: 22 },
  { title: 'Check', width: 30, style: { isWrapped: true } },
  { title: 'Status', width: 16 },
  { title: 'Kind of limit', width: 9, style: { align: 'center' } },
  { title: 'Stage', width: 12 },
  { title: 'Plane', width: 10 },
  { title: 'Demand', width: 11, style: { format: '0.00' } },
  { title: 'Limit', width: 11, style: { format: '0.00' } },
  { title: 'Unit', width: 8 },
  { title: 'Demand over limit', width: 10, style: { format: '0.00' } },
  { title: 'Spare or short (mm, MPa)', width: 12, style: { format: '0.0' } },
  { title: 'Clause', width: 30, style: { isWrapped: true } },
  { title: 'Remarks', width: 60, style: { isWrapped: true } },
]
const HEAD_ROW = 5

interface Listed {
  readonly zone: ZoneResult
  readonly check: Exclude<Check, { kind: 'advice' }>
}

const basisTitle = (basis: string): string => BASIS_SOURCES.find(({ id }) => id === basis)?.title ?? basis

export function writeChecks(book: BookWriter, input: WorkbookPart): void {
  const { checks } = input
  const sheet = book.sheet(input.sheetName('Checks'))
  const listed = listedChecks(checks.zones)
  sheet.widths(COLUMNS.map((column) => column.width))
  sheet.put(1, 1, { value: `Checks of pour ${input.pour.mark}`, style: { isBold: true, size: 14 } })
  sheet.put(2, 1, { value: statusLine(input) })
  const counts = STATUSES.map((status) => `${STATUS_WORDS[status]} ${checks.counts[status]}`).join(', ')
  sheet.put(3, 1, { value: `Basis ${basisTitle(checks.basis)}. Checks by status: ${counts}.` })
  if (listed.length > 0) {
    sheet.table({ name: input.rangeName('OpenChecks'), row: HEAD_ROW, columns: COLUMNS, rows: listed.map(checkRow) })
  } else {
    sheet.put(HEAD_ROW, 1, { value: 'No check that was made is a stop, not covered, over or in need of judgement.' })
  }
  const below = HEAD_ROW + listed.length + 2
  const open = notYetChecked(input)
  if (open.length > 0) {
    sheet.table({
      name: input.rangeName('NotYetChecked'),
      row: below,
      columns: [
        { title: 'Not yet checked', width: 22 },
        { title: 'Zones that it would apply to', width: 30, style: { align: 'left', format: '0' } },
      ],
      rows: open.map(({ family, zones }) => [FAMILY_WORDS[family], zones]),
    })
  } else {
    sheet.put(below, 1, { value: 'Every family of checks that applies was made.' })
  }
  sheet.freeze(HEAD_ROW)
  sheet.page({
    area: `A1:M${below + open.length}`,
    titleRows: `${HEAD_ROW}:${HEAD_ROW}`,
    footer: `${input.reference} ${statusLine(input)}`,
  })
}

function listedChecks(zones: readonly ZoneResult[]): readonly Listed[] {
  const all = zones.flatMap((zone) =>
    zone.checks.flatMap((check): Listed[] =>
      check.kind === 'advice' || !LISTED.includes(check.status) ? [] : [{ zone, check }],
    ),
  )
  return LISTED.flatMap((status) => all.filter(({ check }) => check.status === status))
}

function checkRow({ zone, check }: Listed): readonly CellValue[] {
  const head = [
    zone.zone.name,
    check.name,
    STATUS_WORDS[check.status],
    check.limitKind,
    check.stage ?? null,
    check.plane ?? null,
  ]
  const clause = `${check.clause.source} ${check.clause.section}`
  if (check.kind === 'refused') {
    const remarks = [`${check.field}: ${check.message}`, ...check.notes].join(' ')
    return [...head, null, null, null, null, null, clause, remarks]
  }
  const { per, unit } = SHOWN_UNITS[check.unit] ?? { per: 1, unit: check.unit }
  return [
    ...head,
    check.demand / per,
    check.limit / per,
    unit,
    // A shown ratio rounds up: 1.001 must not read 1.00.
    check.utilisation === null ? null : Math.ceil(check.utilisation * 100) / 100,
    check.spare,
    clause,
    check.notes.length > 0 ? check.notes.join(' ') : null,
  ]
}

const SHOWN_UNITS: Readonly<Record<string, { readonly per: number; readonly unit: string }>> = {
  N: { per: 1000, unit: 'kN' },
  rad: { per: Math.PI / 180, unit: 'deg' },
}
