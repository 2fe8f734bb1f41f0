import type { Role } from '@wedgeline/contract'
import { and, eq } from 'drizzle-orm'
import type { Connection } from '../../db/client'
import { job, jobMember } from '../../db/schema/job'
import { membership, membershipRole } from '../../db/schema/membership'

/** What a person is in a company or on a job. Read on every call, so that a change holds from the next one. */

/** Roles of a member, possibly none; null for somebody who is not in the company. */
export function companyAccess(
  db: Connection,
  { personId, companyId }: { personId: string; companyId: string },
): readonly Role[] | null {
  const rows = db
    .select({ role: membershipRole.role })
    .from(membership)
    .leftJoin(
      membershipRole,
      and(eq(membershipRole.companyId, membership.companyId), eq(membershipRole.personId, membership.personId)),
    )
    .where(and(eq(membership.companyId, companyId), eq(membership.personId, personId)))
    .all()
  return rows.length === 0 ? null : rows.flatMap(({ role }) => role ?? [])
}

export interface JobAccess {
  readonly companyId: string
  readonly roles: readonly Role[]
  readonly isOnJob: boolean
}

/** Null for a job that does not exist and for one whose company the person is not in. */
export function jobAccess(db: Connection, { personId, jobId }: { personId: string; jobId: string }): JobAccess | null {
  const found = db
    .select({ companyId: job.companyId, memberId: jobMember.personId })
    .from(job)
    .leftJoin(
      jobMember,
      and(eq(jobMember.companyId, job.companyId), eq(jobMember.jobId, job.id), eq(jobMember.personId, personId)),
    )
    .where(eq(job.id, jobId))
    .get()
  if (!found) return null
  const roles = companyAccess(db, { personId, companyId: found.companyId })
  return roles && { companyId: found.companyId, roles, isOnJob: found.memberId !== null }
}
