import type { AcceptedReading, Pour, PourResult, Schedule, ScheduleProblem } from '@wedgeline/engine'
import { writeChecks } from './checks-sheet'
import { writeDeliveries } from './deliveries-sheet'
import { excelBook } from './excel-book'
import { writeNotes } from './notes-sheet'
import { writeRevisions } from './revisions-sheet'
import { writeSchedule } from './schedule-sheet'
import { writeShapes } from './shapes-sheet'
import { writeSummary } from './summary-sheet'
import { writeZones } from './zones-sheet'

/** Everything that the workbook shows; nothing is looked up or timed here, so that the same input gives the same cells. */
export interface ScheduleWorkbookInput {
  readonly schedule: Schedule
  readonly checks: PourResult
  readonly job: { readonly number: string; readonly title: string }
  readonly pour: Pick<Pour, 'mark' | 'title' | 'thickness' | 'concrete' | 'coverTop' | 'coverSoffit' | 'coverEdge'>
  readonly reference: string
  readonly drawing: string
  readonly preparedBy: string
  /** YYYY-MM-DD in the job's time zone. */
  readonly preparedOn: string
  readonly preparedAtMs: number
  readonly checkedBy: string | null
  /** Null until an engineer has approved the revision. */
  readonly approval: { readonly by: string; readonly on: string } | null
  /** Readings that the job has accepted. */
  readonly accepted: readonly AcceptedReading[]
  readonly engineVersion: string
}

/** A schedule with an error in it is not written: the yard would bend what is wrong. */
export class ScheduleBlockedError extends Error {
  constructor(readonly problems: readonly ScheduleProblem[]) {
    const lines = problems.map(
      ({ mark, where, message }) => `${mark === null ? where : `Mark ${mark}, ${where}`}: ${message}`,
    )
    super(`The schedule has errors. ${lines.join(' ')}`)
    this.name = 'ScheduleBlockedError'
  }
}

/** One pour's part of a workbook: what it shows, and how its sheets and ranges are called there. */
export interface WorkbookPart extends ScheduleWorkbookInput {
  /** Schedule, or Schedule P1 where several pours share the workbook. */
  readonly sheetName: (name: string) => string
  /** BarTotals, or BarTotals_2: a name may stand once in a workbook. */
  readonly rangeName: (name: string) => string
}

/**
 * The workbook of a pour's bar schedule, or of several pours with sheets of their own for each (xlsx).
 *
 * @throws ScheduleBlockedError while any mark, or a schedule as a whole, has an error.
 */
export async function scheduleWorkbook(
  first: ScheduleWorkbookInput,
  ...more: readonly ScheduleWorkbookInput[]
): Promise<Buffer> {
  const inputs = [first, ...more]
  const errors = inputs.flatMap(({ schedule }) => schedule.problems).filter(({ severity }) => severity === 'error')
  if (errors.length > 0) throw new ScheduleBlockedError(errors)
  const marks = inputs.map(({ pour }) => pour.mark).join(', ')
  const book = excelBook({
    title: `Bar schedule ${inputs.map(({ reference }) => reference).join(', ')}`,
    subject: `${first.job.number} ${first.job.title}, pour ${marks}`,
    author: first.preparedBy,
    atMs: first.preparedAtMs,
  })
  inputs.forEach((input, at) => {
    const isAlone = more.length === 0
    const part: WorkbookPart = {
      ...input,
      sheetName: (name) => (isAlone ? name : `${name} ${input.pour.mark.replaceAll(NOT_IN_A_SHEET_NAME, ' ')}`),
      rangeName: (name) => (isAlone ? name : `${name}_${at + 1}`),
    }
    writeSchedule(book, part)
    writeSummary(book, part)
    writeDeliveries(book, part)
    writeShapes(book, part)
    writeZones(book, part)
    writeChecks(book, part)
    writeNotes(book, part)
    writeRevisions(book, part)
  })
  return book.finish()
}

/** Signs that a spreadsheet does not take in the name of a sheet. */
const NOT_IN_A_SHEET_NAME = /[\\/?*:[\]']/g
