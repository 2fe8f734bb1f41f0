import { and, count, eq, inArray, isNull, lte, ne, or } from 'drizzle-orm'
import type { PourResult } from '@wedgeline/engine'
import type { Connection } from '../../db/client'
import { acceptedReading, anchor, hardware, jobMember, pan, pour, pourResult, tendon } from '../../db/schema'
import { ofJob, type JobKey } from './job-key'

export interface StoredResult extends JobKey {
  /** Without steps: they are computed when somebody opens a calculation. */
  readonly result: PourResult
  readonly engineVersion: string
  readonly changeNumber: number
  readonly atMs: number
}

/** Stores results of a pour in place of what was there, unless that is of a later change. */
export function putResult(db: Connection, { companyId, jobId, result, ...rest }: StoredResult): void {
  const row = { results: [...result.zones], counts: result.counts, readingIds: readingIdsOf(result), ...rest }
  db.insert(pourResult)
    .values({ companyId, jobId, pourId: result.pourId, ...row })
    .onConflictDoUpdate({
      target: [pourResult.companyId, pourResult.jobId, pourResult.pourId],
      set: row,
      setWhere: lte(pourResult.changeNumber, row.changeNumber),
    })
    .run()
}

/** No engine's version: results that a stored change has overtaken and that are about to be made again. */
const OVERTAKEN = ''

/** Results of these pours are of the layout before a change; they stay until the new ones are there. */
export function markOvertaken(db: Connection, key: JobKey, pourIds: readonly string[]): void {
  db.update(pourResult)
    .set({ engineVersion: OVERTAKEN })
    .where(and(ofJob(pourResult, key), inArray(pourResult.pourId, [...pourIds])))
    .run()
}

/** Those of these pours that the job still has. */
export const poursAmong = (db: Connection, key: JobKey, pourIds: readonly string[]): ReadonlySet<string> =>
  new Set(
    db
      .select({ id: pour.id })
      .from(pour)
      .where(and(ofJob(pour, key), inArray(pour.id, [...pourIds])))
      .all()
      .map(({ id }) => id),
  )

/** Whether each of these pours that the job still has holds results of its layout as it is. */
export function areChecked(db: Connection, key: JobKey, pourIds: readonly string[]): boolean {
  const checked = db
    .select({ pourId: pourResult.pourId })
    .from(pourResult)
    .where(
      and(ofJob(pourResult, key), inArray(pourResult.pourId, [...pourIds]), ne(pourResult.engineVersion, OVERTAKEN)),
    )
    .all()
  return checked.length === poursAmong(db, key, pourIds).size
}

/** Latest results of some pours of a job, in the order in which the pours are named; a pour without any is left out. */
export function resultsOf(db: Connection, key: JobKey, pourIds: readonly string[]) {
  const rows = db
    .select({ pourId: pourResult.pourId, zones: pourResult.results, counts: pourResult.counts })
    .from(pourResult)
    .where(and(ofJob(pourResult, key), inArray(pourResult.pourId, [...pourIds])))
    .all()
  return pourIds.flatMap((pourId) => rows.find((row) => row.pourId === pourId) ?? [])
}

function readingIdsOf({ zones }: PourResult): string[] {
  const checks = zones.flatMap((zone) => zone.checks)
  return [...new Set(checks.flatMap((check) => (check.kind === 'compared' ? check.readingIds : [])))].sort()
}

/** Pours of the jobs that have the person among their people, with the counts of their latest results. */
export const pourSummaries = (db: Connection, personId: string) =>
  db
    .select({
      jobId: pour.jobId,
      id: pour.id,
      mark: pour.mark,
      title: pour.title,
      counts: pourResult.counts,
      readingIds: pourResult.readingIds,
    })
    .from(jobMember)
    .innerJoin(pour, and(eq(pour.companyId, jobMember.companyId), eq(pour.jobId, jobMember.jobId)))
    .leftJoin(
      pourResult,
      and(eq(pourResult.companyId, pour.companyId), eq(pourResult.jobId, pour.jobId), eq(pourResult.pourId, pour.id)),
    )
    .where(eq(jobMember.personId, personId))
    .all()

/** Anchors by the pour that they are cast with, in the jobs that have the person among their people. */
export const anchorCounts = (db: Connection, personId: string): ReadonlyMap<string, number> =>
  new Map(
    db
      .select({ jobId: anchor.jobId, pourId: anchor.castWithPourId, count: count() })
      .from(jobMember)
      .innerJoin(anchor, and(eq(anchor.companyId, jobMember.companyId), eq(anchor.jobId, jobMember.jobId)))
      .where(eq(jobMember.personId, personId))
      .groupBy(anchor.companyId, anchor.jobId, anchor.castWithPourId)
      .all()
      .map(({ jobId, pourId, count }) => [`${jobId} ${pourId}`, count]),
  )

/** Readings accepted in the jobs that have the person among their people, as `job reading`. */
export const acceptedReadingIds = (db: Connection, personId: string): ReadonlySet<string> =>
  new Set(
    db
      .select({ jobId: acceptedReading.jobId, readingId: acceptedReading.readingId })
      .from(jobMember)
      .innerJoin(
        acceptedReading,
        and(eq(acceptedReading.companyId, jobMember.companyId), eq(acceptedReading.jobId, jobMember.jobId)),
      )
      .where(eq(jobMember.personId, personId))
      .all()
      .map(({ jobId, readingId }) => `${jobId} ${readingId}`),
  )

/** Jobs with a pour whose results are of another version of the engine, overtaken or not there. */
export const jobsNotCheckedBy = (db: Connection, engineVersion: string): JobKey[] =>
  db
    .selectDistinct({ companyId: pour.companyId, jobId: pour.jobId })
    .from(pour)
    .leftJoin(
      pourResult,
      and(eq(pourResult.companyId, pour.companyId), eq(pourResult.jobId, pour.jobId), eq(pourResult.pourId, pour.id)),
    )
    .where(or(isNull(pourResult.engineVersion), ne(pourResult.engineVersion, engineVersion)))
    .all()

/** Jobs of a company that press or bear on one of its hardware, jacks or strand types. */
export function jobsUsing(db: Connection, companyId: string, id: string): string[] {
  const uses = [
    db
      .select({ jobId: anchor.jobId })
      .from(anchor)
      .where(and(eq(anchor.companyId, companyId), eq(anchor.hardwareId, id)))
      .all(),
    db
      .select({ jobId: pan.jobId })
      .from(pan)
      .where(and(eq(pan.companyId, companyId), eq(pan.jackId, id)))
      .all(),
    db
      .select({ jobId: tendon.jobId })
      .from(tendon)
      .where(and(eq(tendon.companyId, companyId), eq(tendon.strandTypeId, id)))
      .all(),
    db
      .select({ jobId: anchor.jobId })
      .from(anchor)
      .innerJoin(hardware, and(eq(hardware.companyId, anchor.companyId), eq(hardware.id, anchor.hardwareId)))
      .where(and(eq(anchor.companyId, companyId), eq(hardware.jackId, id)))
      .all(),
  ]
  return [...new Set(uses.flat().map(({ jobId }) => jobId))].sort()
}
