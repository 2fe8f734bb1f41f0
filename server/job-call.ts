import type { CompanyOfCall, Context, JobOfCall, Person } from './trpc/context'
import type { JobKey, Stamp } from './stores/job-key'

/** A call by somebody in a company. */
export type CompanyCall = Context & { readonly person: Person; readonly company: CompanyOfCall }
/** As much of a call as storing something for a company needs. */
export type StoringCall = Pick<CompanyCall, 'db' | 'now' | 'person' | 'company'>
/** A call by somebody on a job. */
export type JobCall = CompanyCall & { readonly job: JobOfCall }

export const keyOf = ({ job }: JobCall): JobKey => ({ companyId: job.companyId, jobId: job.id })

/** Who calls, and the instant that everything of this call is stored under. */
export const stampOf = ({ person, now }: Pick<CompanyCall, 'person' | 'now'>): Stamp => ({
  personId: person.id,
  atMs: now(),
})
