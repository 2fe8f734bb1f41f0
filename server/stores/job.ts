import { and, asc, eq } from 'drizzle-orm'
import { jobSettingsSchema, type JobData } from '@wedgeline/contract'
import type { Connection } from '../../db/client'
import { acceptedReading, company, job, jobFactor, jobMember, person } from '../../db/schema'
import { created, ofJob, updated, type JobKey, type Stamp } from './job-key'

const isJob = ({ companyId, jobId }: JobKey) => and(eq(job.companyId, companyId), eq(job.id, jobId))

/** @throws when there is no such job; whoever asks has looked for it already. */
export function jobRow(db: Connection, key: JobKey) {
  const row = db.select().from(job).where(isJob(key)).get()
  if (!row) throw new Error(`There is no job ${key.jobId} in company ${key.companyId}.`)
  return row
}

/** A job as the layout file holds it. */
export function jobData(db: Connection, key: JobKey): JobData {
  const { id, number, title, timeZone, basis, settings } = jobRow(db, key)
  return {
    id,
    number,
    title,
    timeZone,
    basis,
    // Settings that came after the row was stored take their usual value.
    settings: jobSettingsSchema.parse(settings),
    factors: factorsOf(db, key),
    readings: readingsOf(db, key),
  }
}

const factorsOf = (db: Connection, key: JobKey): JobData['factors'] =>
  db
    .select({ name: jobFactor.name, value: jobFactor.value, reason: jobFactor.reason })
    .from(jobFactor)
    .where(ofJob(jobFactor, key))
    .orderBy(asc(jobFactor.position))
    .all()

export const readingsOf = (db: Connection, key: JobKey): JobData['readings'] =>
  db
    .select({
      readingId: acceptedReading.readingId,
      acceptedBy: acceptedReading.acceptedBy,
      acceptedAtMs: acceptedReading.acceptedAtMs,
      reason: acceptedReading.reason,
    })
    .from(acceptedReading)
    .where(ofJob(acceptedReading, key))
    .orderBy(asc(acceptedReading.readingId))
    .all()

/** The job of this id, whatever its company: a job's id names its company. */
export const jobById = (db: Connection, id: string) => db.select().from(job).where(eq(job.id, id)).get()

/** Jobs that have the person among their people, the last changed first. */
export const jobsOf = (db: Connection, personId: string) =>
  db
    .select({
      id: job.id,
      companyId: job.companyId,
      companyName: company.name,
      number: job.number,
      title: job.title,
      basis: job.basis,
      isUnfiled: job.isUnfiled,
      updatedAtMs: job.updatedAtMs,
    })
    .from(jobMember)
    .innerJoin(job, and(eq(job.companyId, jobMember.companyId), eq(job.id, jobMember.jobId)))
    .innerJoin(company, eq(company.id, job.companyId))
    .where(eq(jobMember.personId, personId))
    .orderBy(asc(job.number), asc(job.id))
    .all()
    .sort((a, b) => b.updatedAtMs - a.updatedAtMs)

export function insertJob(
  db: Connection,
  {
    companyId,
    data,
    isUnfiled = false,
    stamp,
  }: { companyId: string; data: JobData; isUnfiled?: boolean; stamp: Stamp },
): void {
  const { id, number, title, timeZone, basis, settings, factors, readings } = data
  const key = { companyId, jobId: id }
  db.insert(job)
    .values({ companyId, id, number, title, timeZone, basis, settings, isUnfiled, ...created(stamp) })
    .run()
  putFactors(db, key, factors)
  for (const reading of readings) insertReading(db, key, { ...reading, personId: stamp.personId })
}

/** Counts one more change of what a job's checks rest on. @returns the count */
export function countChange(db: Connection, key: JobKey): number {
  const changeCount = jobRow(db, key).changeCount + 1
  db.update(job).set({ changeCount }).where(isJob(key)).run()
  return changeCount
}

export function updateJobTitle(
  db: Connection,
  key: JobKey,
  { stamp, ...change }: { number: string; title: string; isUnfiled: boolean; stamp: Stamp },
): void {
  db.update(job)
    .set({ ...change, ...updated(stamp) })
    .where(isJob(key))
    .run()
}

export function updateJobBasis(
  db: Connection,
  key: JobKey,
  { factors, stamp, ...change }: Pick<JobData, 'basis' | 'settings' | 'factors'> & { stamp: Stamp },
): void {
  db.update(job)
    .set({ ...change, ...updated(stamp) })
    .where(isJob(key))
    .run()
  putFactors(db, key, factors)
}

function putFactors(db: Connection, key: JobKey, factors: JobData['factors']): void {
  const { companyId, jobId } = key
  db.delete(jobFactor).where(ofJob(jobFactor, key)).run()
  for (const [position, factor] of factors.entries()) {
    db.insert(jobFactor)
      .values({ companyId, jobId, position, ...factor })
      .run()
  }
}

// People ------------------------------------------------------------------------------------------------------------

export const jobPeople = (db: Connection, key: JobKey) =>
  db
    .select({ id: person.id, name: person.name })
    .from(jobMember)
    .innerJoin(person, eq(person.id, jobMember.personId))
    .where(ofJob(jobMember, key))
    .orderBy(asc(person.name), asc(person.id))
    .all()

export function insertJobMember(
  db: Connection,
  { companyId, jobId }: JobKey,
  { personId, stamp }: { personId: string; stamp: Stamp },
): void {
  db.insert(jobMember)
    .values({ companyId, jobId, personId, createdAtMs: stamp.atMs, createdBy: stamp.personId })
    .onConflictDoNothing()
    .run()
}

export function deleteJobMember(db: Connection, key: JobKey, personId: string): void {
  db.delete(jobMember)
    .where(and(ofJob(jobMember, key), eq(jobMember.personId, personId)))
    .run()
}

/** Takes everybody off a job: nobody's list has it any more. */
export function deleteJobMembers(db: Connection, key: JobKey): void {
  db.delete(jobMember).where(ofJob(jobMember, key)).run()
}

// Readings ----------------------------------------------------------------------------------------------------------

export function insertReading(
  db: Connection,
  { companyId, jobId }: JobKey,
  reading: JobData['readings'][number] & { readonly personId: string },
): void {
  db.insert(acceptedReading)
    .values({ companyId, jobId, ...reading })
    .run()
}

/** True when the reading was accepted and now is not. */
export const deleteReading = (db: Connection, key: JobKey, readingId: string): boolean =>
  db
    .delete(acceptedReading)
    .where(and(ofJob(acceptedReading, key), eq(acceptedReading.readingId, readingId)))
    .run().changes === 1
