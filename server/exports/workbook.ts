import type { Pour, PourResult, Schedule, ScheduleProblem } from '@wedgeline/engine'
import { writeChecks } from './checks-sheet'
import { excelBook } from './excel-book'
import { writeNotes } from './notes-sheet'
import { writeSchedule } from './schedule-sheet'
import { writeSummary } from './summary-sheet'

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

/**
 * The workbook of a pour's bar schedule (xlsx).
 *
 * @throws ScheduleBlockedError while any mark, or the schedule as a whole, has an error.
 */
export async function scheduleWorkbook(input: ScheduleWorkbookInput): Promise<Buffer> {
  const errors = input.schedule.problems.filter((problem) => problem.severity === 'error')
  if (errors.length > 0) throw new ScheduleBlockedError(errors)
  const book = excelBook({
    title: `Bar schedule ${input.reference}`,
    subject: `${input.job.number} ${input.job.title}, pour ${input.pour.mark}`,
    author: input.preparedBy,
    atMs: input.preparedAtMs,
  })
  writeSchedule(book, input)
  writeSummary(book, input)
  writeChecks(book, input)
  writeNotes(book, input)
  return book.finish()
}
