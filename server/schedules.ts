import { v7 as uuidv7 } from 'uuid'
import { ENGINE_VERSION, toEngine } from '@wedgeline/contract'
import {
  checkPour,
  newMarks,
  scheduleOf,
  type Family,
  type PourResult,
  type Layout,
  type Schedule,
} from '@wedgeline/engine'
import { write, type Connection } from '../db/client'
import { ScheduleBlockedError, scheduleWorkbook } from './exports/workbook'
import { missing, refused } from './failure'
import { keyOf, stampOf } from './job-call'
import { recordAudit } from './stores/audit'
import { insertBarMarks } from './stores/bar-mark'
import { insertFile } from './stores/file'
import type { JobKey } from './stores/job-key'
import { loadLayout } from './stores/layout'
import type { JobCall } from './trpc/context'

const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet'

interface PourSchedule {
  readonly layout: Layout
  readonly timeZone: string
  readonly checks: PourResult
  readonly schedule: Schedule
}

/** The bar schedule of a pour as it stands; marks that nobody has been handed yet may still move. */
export const scheduleOfPour = (ctx: JobCall, pourId: string): Schedule => schedule(ctx.db, keyOf(ctx), pourId).schedule

function schedule(db: Connection, key: JobKey, pourId: string): PourSchedule {
  const file = loadLayout(db, key)
  if (!file.pours.some(({ id }) => id === pourId)) throw missing('There is no such pour in this job.')
  const layout = toEngine(file)
  const checks = checkPour(layout, { pourId, withSteps: false })
  return { layout, timeZone: file.job.timeZone, checks, schedule: scheduleOf(layout, pourId, notChecked(checks)) }
}

const notChecked = ({ zones }: PourResult): Family[] => [...new Set(zones.flatMap((zone) => zone.notYetChecked))]

/**
 * Writes the workbook of a pour's schedule into the file store. The marks in it are stored first: what a yard has been
 * handed keeps its number whatever is added or taken away.
 * @throws Failure while a mark has an error: the yard would bend what is wrong.
 */
export async function exportSchedule(ctx: JobCall, pourId: string): Promise<{ fileId: string; name: string }> {
  const { db, files, person } = ctx
  const key = keyOf(ctx)
  const stamp = stampOf(ctx)
  const made = write(db, (tx) => {
    const found = schedule(tx, key, pourId)
    assertNoError(found.schedule)
    const marks = newMarks(found.schedule, found.layout.barMarks)
    if (marks.length === 0) return found
    insertBarMarks(tx, key, { marks, atMs: stamp.atMs })
    recordAudit(tx, { ...key, ...stamp, what: 'schedule.giveMarks', before: null, after: marks })
    return schedule(tx, key, pourId)
  })
  const { bytes, name } = await workbookOf(made, { pourId, preparedBy: person.name, atMs: stamp.atMs })
  const { sha256, sizeBytes } = await files.save(key.companyId, bytes)
  const fileId = uuidv7()
  write(db, (tx) => {
    const row = { ...key, id: fileId, sha256, name, type: XLSX, bytes: sizeBytes }
    insertFile(tx, { ...row, createdAtMs: stamp.atMs, createdBy: person.id })
    recordAudit(tx, {
      ...key,
      ...stamp,
      what: 'schedule.export',
      before: null,
      after: { fileId, pourId, name, sha256 },
    })
  })
  return { fileId, name }
}

function assertNoError({ problems }: Schedule): void {
  const errors = problems.filter(({ severity }) => severity === 'error')
  if (errors.length > 0) throw refused(new ScheduleBlockedError(errors).message, 'pourId')
}

async function workbookOf(
  { layout, timeZone, checks, schedule }: PourSchedule,
  { pourId, preparedBy, atMs }: { pourId: string; preparedBy: string; atMs: number },
): Promise<{ bytes: Uint8Array; name: string }> {
  const pour = layout.pours.find(({ id }) => id === pourId)
  if (!pour) throw new Error(`Pour ${pourId} was scheduled and is not there.`)
  const { number, title } = layout.job
  const reference = `${number}-${pour.mark}`
  const bytes = await scheduleWorkbook({
    schedule,
    checks,
    job: { number, title },
    pour,
    reference,
    drawing: '',
    preparedBy,
    preparedOn: dayIn(timeZone, atMs),
    preparedAtMs: atMs,
    checkedBy: null,
    approval: null,
    accepted: layout.job.readings,
    engineVersion: ENGINE_VERSION,
  })
  return { bytes, name: `${reference.replace(/[^A-Za-z0-9._-]+/g, '-')} bar schedule.xlsx` }
}

/** YYYY-MM-DD, which is how Sweden writes a day. */
const dayIn = (timeZone: string, atMs: number): string =>
  new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short' }).format(atMs)
