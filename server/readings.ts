import { BASIS_SOURCES, type Reading } from '@wedgeline/engine'
import { write } from '../db/client'
import { checkStored, overtakeJob } from './checking'
import { conflict, missing, refused } from './failure'
import { keyOf, stampOf } from './job-call'
import { recordAudit } from './stores/audit'
import { deleteReading, insertReading, jobRow, readingsOf } from './stores/job'
import type { JobCall } from './trpc/context'

/**
 * Accepts a reading of the job's basis in the caller's name and checks every pour again. Where it is one of several
 * answers to a question, the answer accepted before is withdrawn.
 * @throws Failure for a reading that the basis does not offer or that is accepted already.
 */
export async function acceptReading(
  ctx: JobCall,
  { readingId, reason }: { readingId: string; reason: string },
): Promise<void> {
  const { db, person } = ctx
  const key = keyOf(ctx)
  const toCheck = write(db, (tx) => {
    const { basis } = jobRow(tx, key)
    const offered = BASIS_SOURCES.find(({ id }) => id === basis)?.readings ?? []
    const asked = offered.find(({ id }) => id === readingId)
    if (!asked) {
      throw refused(
        `"${readingId}" is no reading of this job's basis: ${offered.map(({ id }) => id).join(', ')}.`,
        'readingId',
      )
    }
    const accepted = readingsOf(tx, key)
    if (accepted.some((each) => each.readingId === readingId)) {
      throw conflict('This reading is accepted already. Withdraw it first to give another reason.')
    }
    const stamp = stampOf(ctx)
    const replaced = accepted.filter((each) => isOtherAnswer(asked, offered, each.readingId))
    for (const before of replaced) {
      deleteReading(tx, key, before.readingId)
      recordAudit(tx, { ...key, ...stamp, what: 'reading.withdraw', before, after: null })
    }
    const reading = { readingId, acceptedBy: person.name, acceptedAtMs: stamp.atMs, reason }
    insertReading(tx, key, { ...reading, personId: person.id })
    recordAudit(tx, { ...key, ...stamp, what: 'reading.accept', before: null, after: reading })
    return overtakeJob(tx, key, stamp.atMs)
  })
  await checkStored(ctx, key, toCheck)
}

const isOtherAnswer = ({ choice }: Reading, offered: readonly Reading[], readingId: string): boolean =>
  choice !== undefined && offered.some((one) => one.id === readingId && one.choice === choice)

/** @throws Failure for a reading that is not accepted. */
export async function withdrawReading(ctx: JobCall, readingId: string): Promise<void> {
  const key = keyOf(ctx)
  const toCheck = write(ctx.db, (tx) => {
    const before = readingsOf(tx, key).find((each) => each.readingId === readingId)
    if (!before) throw missing('This reading is not accepted for this job.')
    const stamp = stampOf(ctx)
    deleteReading(tx, key, readingId)
    recordAudit(tx, { ...key, ...stamp, what: 'reading.withdraw', before, after: null })
    return overtakeJob(tx, key, stamp.atMs)
  })
  await checkStored(ctx, key, toCheck)
}
