import {
  checkPour,
  newMarks,
  scheduleOf,
  type Family,
  type Layout,
  type NewMark,
  type PourResult,
  type Schedule,
  type ScheduleProblem,
} from '@wedgeline/engine'
import { scheduleWorkbook, type ScheduleWorkbookInput } from '../exports/workbook'

/** A layout in the engine's units and the pour of it that is scheduled. */
export interface ScheduleTask {
  readonly layout: Layout
  readonly pourId: string
}

/** The bar schedule of a pour as it stands; in a worker thread where the pool calls it. */
export const scheduleTask = ({ layout, pourId }: ScheduleTask): Schedule =>
  scheduleOf(layout, pourId, notChecked(checkPour(layout, { pourId, withSteps: false })))

/** What a workbook says beside the pour, its checks and its schedule. */
export type AboutWorkbook = Pick<
  ScheduleWorkbookInput,
  'reference' | 'preparedBy' | 'preparedOn' | 'preparedAtMs' | 'engineVersion'
>

export interface WorkbookTask extends ScheduleTask {
  readonly about: AboutWorkbook
}

export type WrittenWorkbook =
  | { readonly isWritten: false; readonly errors: readonly ScheduleProblem[] }
  | { readonly isWritten: true; readonly bytes: Uint8Array; readonly newMarks: readonly NewMark[] }

/**
 * Writes the workbook of a pour as it stands once its new marks are stored, which is left to the caller; nothing while a
 * mark has an error: the yard would bend what is wrong.
 */
export async function workbookTask({ layout, pourId, about }: WorkbookTask): Promise<WrittenWorkbook> {
  const checks = checkPour(layout, { pourId, withSteps: false })
  const before = scheduleOf(layout, pourId, notChecked(checks))
  const errors = before.problems.filter(({ severity }) => severity === 'error')
  if (errors.length > 0) return { isWritten: false, errors }
  const marks = newMarks(before, layout.barMarks)
  const given = marks.map((mark, at) => ({ ...mark, id: `new-${at}` }))
  const barMarks = [...layout.barMarks, ...given]
  const schedule = marks.length === 0 ? before : scheduleOf({ ...layout, barMarks }, pourId, notChecked(checks))
  const pour = layout.pours.find(({ id }) => id === pourId)
  if (!pour) throw new Error(`Pour ${pourId} was scheduled and is not there.`)
  const { number, title, readings } = layout.job
  const bytes = await scheduleWorkbook({
    ...about,
    schedule,
    checks,
    job: { number, title },
    pour,
    drawing: '',
    checkedBy: null,
    approval: null,
    accepted: readings,
  })
  return { isWritten: true, bytes, newMarks: marks }
}

const notChecked = ({ zones }: PourResult): Family[] => [...new Set(zones.flatMap((zone) => zone.notYetChecked))]
