import { v7 as uuidv7 } from 'uuid'
import { ENGINE_VERSION, toEngine, type LayoutFile, type PourData } from '@wedgeline/contract'
import type { Schedule } from '@wedgeline/engine'
import { write, type Connection } from '../db/client'
import { ScheduleBlockedError } from './exports/workbook'
import { conflict, missing, refused } from './failure'
import { keyOf, stampOf } from './job-call'
import { recordAudit } from './stores/audit'
import { countBarMarks, insertBarMarks } from './stores/bar-mark'
import { insertFile } from './stores/file'
import type { JobKey } from './stores/job-key'
import { jobRow } from './stores/job'
import { loadLayout } from './stores/layout'
import type { JobCall } from './trpc/context'

const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet'

/** The bar schedule of a pour as it stands; marks that nobody has been handed yet may still move. */
export function scheduleOfPour(ctx: JobCall, pourId: string): Promise<Schedule> {
  const { file } = readPour(ctx.db, keyOf(ctx), pourId)
  return ctx.schedule({ layout: toEngine(file), pourId })
}

interface Read {
  readonly file: LayoutFile
  readonly pour: PourData
  /** Another one when the layout, its basis or its marks have changed. */
  readonly state: string
}

function readPour(db: Connection, key: JobKey, pourId: string): Read {
  const file = loadLayout(db, key)
  const pour = file.pours.find(({ id }) => id === pourId)
  if (!pour) throw missing('There is no such pour in this job.')
  return { file, pour, state: stateOf(db, key) }
}

const stateOf = (db: Connection, key: JobKey): string => `${jobRow(db, key).changeCount} ${countBarMarks(db, key)}`

/** A workbook is written of a layout as it was read; where that is changed meanwhile it is written again, so often. */
const TRIES = 4

/**
 * Writes the workbook of a pour's schedule into the file store. The marks in it are stored before anybody has it: what
 * a yard has been handed keeps its number whatever is added or taken away.
 * @throws Failure while a mark has an error, because the yard would bend what is wrong, or where edits never rest.
 */
export async function exportSchedule(ctx: JobCall, pourId: string): Promise<{ fileId: string; name: string }> {
  for (let tried = 0; tried < TRIES; tried++) {
    const read = readPour(ctx.db, keyOf(ctx), pourId)
    const bytes = await writtenOf(ctx, read)
    if (bytes) return await storeWorkbook(ctx, read, bytes)
  }
  throw conflict('The layout was changed while its workbook was written. Export it again once the edits are done.')
}

const referenceOf = ({ file, pour }: Read): string => `${file.job.number}-${pour.mark}`

/** The workbook, its new marks stored; null where what was read is no longer how it stands, and nothing is stored. */
async function writtenOf(ctx: JobCall, read: Read): Promise<Uint8Array | null> {
  const { db, person } = ctx
  const key = keyOf(ctx)
  const stamp = stampOf(ctx)
  const made = await ctx.writeWorkbook({
    layout: toEngine(read.file),
    pourId: read.pour.id,
    about: {
      reference: referenceOf(read),
      preparedBy: person.name,
      preparedOn: dayIn(read.file.job.timeZone, stamp.atMs),
      preparedAtMs: stamp.atMs,
      engineVersion: ENGINE_VERSION,
    },
  })
  if (!made.isWritten) throw refused(new ScheduleBlockedError(made.errors).message, 'pourId')
  return write(db, (tx) => {
    if (stateOf(tx, key) !== read.state) return null
    if (made.newMarks.length > 0) {
      insertBarMarks(tx, key, { marks: made.newMarks, atMs: stamp.atMs })
      recordAudit(tx, { ...key, ...stamp, what: 'schedule.giveMarks', before: null, after: made.newMarks })
    }
    return made.bytes
  })
}

async function storeWorkbook(ctx: JobCall, read: Read, bytes: Uint8Array): Promise<{ fileId: string; name: string }> {
  const { db, files, person } = ctx
  const key = keyOf(ctx)
  const stamp = stampOf(ctx)
  const pourId = read.pour.id
  const name = `${referenceOf(read).replace(/[^A-Za-z0-9._-]+/g, '-')} bar schedule.xlsx`
  const { sha256, sizeBytes } = await files.save(key.companyId, bytes)
  const fileId = uuidv7()
  write(db, (tx) => {
    const row = { ...key, id: fileId, sha256, name, type: XLSX, bytes: sizeBytes }
    insertFile(tx, { ...row, createdAtMs: stamp.atMs, createdBy: person.id })
    const after = { fileId, pourId, name, sha256 }
    recordAudit(tx, { ...key, ...stamp, what: 'schedule.export', before: null, after })
  })
  return { fileId, name }
}

/** YYYY-MM-DD, which is how Sweden writes a day. */
const dayIn = (timeZone: string, atMs: number): string =>
  new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short' }).format(atMs)
