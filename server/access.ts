import type { Role } from '@wedgeline/contract'
import type { Db } from '../db/client'
import { forbidden, missing } from './failure'
import { companyAccess, jobAccess } from './stores/access'
import type { CompanyOfCall, JobOfCall, Person } from './trpc/context'

/** Who may do what. Procedures and HTTP routes ask here, so that a download is guarded as its procedure is. */

export interface Asking {
  readonly db: Db
  readonly person: Person
}

const NO_COMPANY = 'There is no such company, or you are not in it.'
const NO_JOB = 'There is no such job, or you are not one of its people.'

/** @throws Failure, the same one for a company that does not exist and one that the person is not in. */
export function authoriseCompany({ db, person }: Asking, companyId: string): CompanyOfCall {
  const roles = companyAccess(db, { personId: person.id, companyId })
  if (!roles) throw missing(NO_COMPANY)
  return { id: companyId, roles }
}

/**
 * The job and the person's roles in its company, for somebody on the job (with `adminsToo`, for the company's admins
 * as well).
 * @throws Failure, the same one for an unknown job, another company's and another job.
 */
export function authoriseJob(
  { db, person }: Asking,
  jobId: string,
  { adminsToo = false }: { adminsToo?: boolean } = {},
): { job: JobOfCall; company: CompanyOfCall } {
  const access = jobAccess(db, { personId: person.id, jobId })
  const isIn = access && (access.isOnJob || (adminsToo && access.roles.includes('admin')))
  if (!isIn) throw missing(NO_JOB)
  return { job: { id: jobId, companyId: access.companyId }, company: { id: access.companyId, roles: access.roles } }
}

/** @throws Failure that names the roles that would do. */
export function requireRole(company: CompanyOfCall, roles: readonly Role[]): void {
  if (roles.some((role) => company.roles.includes(role))) return
  throw forbidden(`This needs the role of ${roles.join(' or ')}. Your company's admin sets roles.`)
}
