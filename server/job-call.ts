import type { JobKey, Stamp } from './stores/job-key'
import type { CompanyCall, JobCall } from './trpc/context'

/** As much of a call as storing something for a company needs. */
export type StoringCall = Pick<CompanyCall, 'db' | 'now' | 'person' | 'company'>

export const keyOf = ({ job }: JobCall): JobKey => ({ companyId: job.companyId, jobId: job.id })

/** Who calls, and the instant that everything of this call is stored under. */
export const stampOf = ({ person, now }: Pick<CompanyCall, 'person' | 'now'>): Stamp => ({
  personId: person.id,
  atMs: now(),
})
