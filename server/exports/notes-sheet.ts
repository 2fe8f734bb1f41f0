import type { BookWriter } from './book-writer'
import { CAUTIONS, editionLine, statusLine } from './wording'
import type { ScheduleWorkbookInput, WorkbookPart } from './workbook'

export function writeNotes(book: BookWriter, input: WorkbookPart): void {
  const sheet = book.sheet(input.sheetName('Notes'))
  const lines = noteLines(input)
  sheet.widths([18, 120])
  sheet.put(1, 1, { value: `Notes to schedule ${input.reference}`, style: { isBold: true, size: 14 } })
  lines.forEach(([topic, text], k) => {
    sheet.put(k + 3, 1, { value: topic, style: { isBold: true } })
    sheet.put(k + 3, 2, { value: text, style: { isWrapped: true } })
  })
  sheet.freeze(1)
  sheet.page({ area: `A1:B${lines.length + 2}`, titleRows: '1:1', footer: `${input.reference} ${statusLine(input)}` })
}

type Line = readonly [topic: string, text: string]

function noteLines(input: ScheduleWorkbookInput): readonly Line[] {
  const { schedule, pour, checks } = input
  const ofMarks = new Map<string, Set<string>>()
  for (const { mark, notes } of schedule.rows) {
    for (const note of notes) ofMarks.set(mark, (ofMarks.get(mark) ?? new Set<string>()).add(note))
  }
  return [
    ['Status', statusLine(input)],
    ...CAUTIONS.map((text): Line => ['Caution', text]),
    ['Standard', editionLine(input)],
    ['Reinforcement', schedule.grade],
    ['Concrete', `${pour.concrete}, slab ${pour.thickness} mm`],
    ['Cover', `top ${pour.coverTop}, soffit ${pour.coverSoffit}, edge ${pour.coverEdge} mm, as the pour has them`],
    [
      'Laps',
      `Straight bars over the stock length of ${schedule.stockLength} mm are split and lapped by the basis, for full stress at the strength of the last stage; every second bar the other way round, and clear of anchors where there is room.`,
    ],
    ...schedule.chances.map((text): Line => ['One length', text]),
    ['Counting', 'Where bars lie in two layers, top and bottom are counted together. A member is an edge or a pan.'],
    ...[...ofMarks].map(([mark, notes]): Line => [`Mark ${mark}`, [...notes].join('; ')]),
    ...schedule.problems.map(({ mark, message }): Line => [`Mark ${mark ?? '-'}`, message]),
    ...schedule.notes.map((text): Line => ['Source', text]),
    ['Made with', `Wedgeline engine ${input.engineVersion}, basis ${checks.basis}`],
  ]
}
