import { isTimeZone, jobSettingsSchema, type JobData, type Role } from '@wedgeline/contract'
import {
  BASIS_SOURCES,
  STATUSES,
  bySeverity,
  factorProblems,
  onProposedReadings,
  type PourResult,
  type Status,
} from '@wedgeline/engine'
import { write, type Connection } from '../db/client'
import { checkStored, overtakeJob } from './checking'
import { conflict, missing, refused } from './failure'
import { keyOf, stampOf } from './job-call'
import { companyAccess } from './stores/access'
import { recordAudit } from './stores/audit'
import { companyById } from './stores/company'
import {
  deleteJobMember,
  deleteReading,
  insertJob,
  insertJobMember,
  jobById,
  jobData,
  jobPeople,
  jobRow,
  jobsOf,
  updateJobBasis,
  updateJobTitle,
} from './stores/job'
import type { JobKey } from './stores/job-key'
import { membersOf } from './stores/person'
import { acceptedReadingIds, anchorCounts, pourSummaries, resultsOf } from './stores/result'
import type { CompanyCall, JobCall } from './trpc/context'

type Counts = PourResult['counts']

export interface PourSummary {
  readonly id: string
  readonly mark: string
  readonly title: string
  readonly state: 'draft'
  readonly anchors: number
  readonly counts: Counts
  /** Of a quick edge, whose counts are on readings that are not accepted; null elsewhere and where all is within. */
  readonly worst: WorstHere | null
}

interface WorstHere {
  readonly zone: string
  readonly check: string
  readonly status: Status
}

const NO_COUNTS = Object.fromEntries(STATUSES.map((status) => [status, 0])) as Counts

/** Jobs that have the person among their people, with how their pours stand. */
export function listJobs(db: Connection, personId: string) {
  const anchors = anchorCounts(db, personId)
  const accepted = acceptedReadingIds(db, personId)
  const pours = pourSummaries(db, personId)
  return jobsOf(db, personId).map((job) => {
    const own = pours.filter(({ jobId }) => jobId === job.id)
    const isOpen = (readingId: string) => !accepted.has(`${job.id} ${readingId}`)
    const isWaiting = own.some(({ readingIds }) => readingIds?.some(isOpen))
    return {
      ...job,
      readingsProposed: isWaiting ? openReadings(job.basis, isOpen) : 0,
      pours: own.map(({ id, mark, title, counts }): PourSummary => ({
        id,
        mark,
        title,
        state: 'draft',
        anchors: anchors.get(`${job.id} ${id}`) ?? 0,
        counts: counts ?? NO_COUNTS,
        worst: null,
        ...(job.isUnfiled ? quickSummary(db, { companyId: job.companyId, jobId: job.id }, id) : {}),
      })),
    }
  })
}

/** A quick edge runs on the proposed readings: its counts as they are with those, and its worst check. */
function quickSummary(db: Connection, key: JobKey, pourId: string): Partial<Pick<PourSummary, 'counts' | 'worst'>> {
  const [stored] = resultsOf(db, key, [pourId])
  if (!stored) return {}
  const { zones, counts } = onProposedReadings({ ...stored, basis: '' })
  const checks = zones.flatMap(({ zone, checks: [first] }) =>
    first && first.kind !== 'advice' ? [{ zone: zone.name, check: first }] : [],
  )
  const [worst] = checks.sort((one, other) => bySeverity(one.check, other.check))
  if (!worst || worst.check.status === 'within') return { counts, worst: null }
  return { counts, worst: { zone: worst.zone, check: worst.check.name, status: worst.check.status } }
}

/**
 * How many proposed readings of a basis wait. A result names the first reading only that it waits for, so the basis says
 * which there are; a question that has another answer already waits no longer.
 */
function openReadings(basis: string, isOpen: (readingId: string) => boolean): number {
  const offered = BASIS_SOURCES.find(({ id }) => id === basis)?.readings ?? []
  const answered = new Set(offered.flatMap(({ id, choice }) => (choice === undefined || isOpen(id) ? [] : [choice])))
  return offered.filter(
    ({ id, proposed, choice }) => proposed && isOpen(id) && (choice === undefined || !answered.has(choice)),
  ).length
}

/** A job with its people and what the caller is in its company. */
export function describeJob(ctx: JobCall) {
  const { db, company } = ctx
  const key = keyOf(ctx)
  return {
    ...jobData(db, key),
    isUnfiled: jobRow(db, key).isUnfiled,
    companyId: key.companyId,
    companyName: companyById(db, key.companyId)?.name ?? '',
    members: peopleOf(db, key),
    myRoles: company.roles,
  }
}

function peopleOf(db: Connection, key: JobKey): { id: string; name: string; roles: readonly Role[] }[] {
  const roles = new Map(membersOf(db, key.companyId).map((member) => [member.id, member.roles]))
  return jobPeople(db, key).map((person) => ({ ...person, roles: roles.get(person.id) ?? [] }))
}

export type NewJob = Pick<JobData, 'id' | 'number' | 'title' | 'timeZone' | 'basis'>

/** What a job of this basis begins with: the usual settings, and the friction usual in its code. */
export function settingsOf(basis: NewJob['basis']): JobData['settings'] {
  const friction = BASIS_SOURCES.find(({ id }) => id === basis)?.friction
  if (!friction) return jobSettingsSchema.parse({})
  const { nominal, low, high } = friction.begin
  return jobSettingsSchema.parse({
    frictionFamily: friction.family,
    frictionMu: nominal.mu,
    frictionWobblePerM: nominal.wobblePerM,
    frictionMuLow: low.mu,
    frictionWobbleLowPerM: low.wobblePerM,
    frictionMuHigh: high.mu,
    frictionWobbleHighPerM: high.wobblePerM,
  })
}

/**
 * Stores a new job; whoever makes it is on it.
 * @throws Failure when the id is in use for something else; the same call again changes nothing.
 */
export function createJob(
  ctx: CompanyCall,
  { job, settings }: { job: NewJob; settings: JobData['settings'] },
): { id: string } {
  const { db, company, person } = ctx
  const key: JobKey = { companyId: company.id, jobId: job.id }
  assertTimeZone(job.timeZone)
  write(db, (tx) => {
    if (isRepeat(ctx, tx, job)) return
    const stamp = stampOf(ctx)
    insertJob(tx, { companyId: company.id, data: { ...job, settings, factors: [], readings: [] }, stamp })
    insertJobMember(tx, key, { personId: person.id, stamp })
    recordAudit(tx, { ...key, ...stamp, what: 'job.create', before: null, after: job })
  })
  return { id: job.id }
}

function isRepeat({ company, person }: CompanyCall, db: Connection, job: NewJob): boolean {
  const row = jobById(db, job.id)
  if (!row) return false
  const isSame =
    row.companyId === company.id &&
    row.createdBy === person.id &&
    row.number === job.number &&
    row.title === job.title &&
    row.timeZone === job.timeZone &&
    row.basis === job.basis
  if (!isSame) throw conflict('This id is in use already. Make a new one.')
  return true
}

/** @throws Failure for a name that is no IANA time zone. */
function assertTimeZone(timeZone: string): void {
  if (!isTimeZone(timeZone)) throw refused(`"${timeZone}" is no time zone; write one as Europe/London.`, 'timeZone')
}

/** Gives a job its number and title; a quick edge becomes an ordinary job by it. */
export function renameJob(ctx: JobCall, change: { number: string; title: string }): void {
  const key = keyOf(ctx)
  write(ctx.db, (tx) => {
    const stamp = stampOf(ctx)
    const { number, title, isUnfiled } = jobRow(tx, key)
    const after = { ...change, isUnfiled: false }
    updateJobTitle(tx, key, { ...after, stamp })
    recordAudit(tx, { ...key, ...stamp, what: 'job.update', before: { number, title, isUnfiled }, after })
  })
}

/**
 * Stores the job's basis with its factors and settings, and checks every pour again. Readings of another basis hold no
 * longer: they are withdrawn.
 * @throws Failure for a factor that the basis does not have or whose value lies outside its range.
 */
export async function setBasis(ctx: JobCall, change: Pick<JobData, 'basis' | 'settings' | 'factors'>): Promise<void> {
  const key = keyOf(ctx)
  assertFactors(change)
  const toCheck = write(ctx.db, (tx) => {
    const stamp = stampOf(ctx)
    const { basis, settings, factors, readings } = jobData(tx, key)
    updateJobBasis(tx, key, { ...change, stamp })
    for (const before of readings.filter(({ readingId }) => !isOffered(change.basis, readingId))) {
      deleteReading(tx, key, before.readingId)
      recordAudit(tx, { ...key, ...stamp, what: 'reading.withdraw', before, after: null })
    }
    recordAudit(tx, { ...key, ...stamp, what: 'job.setBasis', before: { basis, settings, factors }, after: change })
    return overtakeJob(tx, key, stamp.atMs)
  })
  await checkStored(ctx, key, toCheck)
}

const isOffered = (basis: string, readingId: string): boolean =>
  BASIS_SOURCES.some(({ id, readings }) => id === basis && readings.some((reading) => reading.id === readingId))

function assertFactors(job: Pick<JobData, 'basis' | 'factors'>): void {
  const [problem] = factorProblems(job)
  if (problem) throw refused(problem.message, problem.field.replace(/^job\./, ''))
}

/** @throws Failure for somebody who is not in the job's company. */
export function addJobMember(ctx: JobCall, personId: string): void {
  const key = keyOf(ctx)
  write(ctx.db, (tx) => {
    if (!companyAccess(tx, { companyId: key.companyId, personId }))
      throw missing('There is nobody like that in this company.')
    const stamp = stampOf(ctx)
    insertJobMember(tx, key, { personId, stamp })
    recordAudit(tx, { ...key, ...stamp, what: 'job.addMember', before: null, after: { personId } })
  })
}

/** @throws Failure for somebody who is not on the job, and for the last one who is. */
export function removeJobMember(ctx: JobCall, personId: string): void {
  const key = keyOf(ctx)
  write(ctx.db, (tx) => {
    const people = jobPeople(tx, key)
    if (!people.some(({ id }) => id === personId)) throw missing('There is nobody like that on this job.')
    if (people.length === 1) throw conflict('Somebody has to be on the job: add another person first.')
    deleteJobMember(tx, key, personId)
    recordAudit(tx, { ...key, ...stampOf(ctx), what: 'job.removeMember', before: { personId }, after: null })
  })
}
