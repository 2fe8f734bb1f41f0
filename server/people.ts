import type { Role } from '@wedgeline/contract'
import { write } from '../db/client'
import { conflict, missing } from './failure'
import { companyAccess } from './stores/access'
import { recordAudit } from './stores/audit'
import { hasOtherAdmin, removeMember, setMember, type MemberKey } from './stores/person'
import { renewSessionsOf } from './stores/session'
import type { CompanyCall } from './trpc/context'

const NOBODY = 'There is nobody like that in this company.'
const LAST_ADMIN = 'Somebody has to be admin: make another person admin first.'

/** @throws Failure for somebody who is not in the company, and when nobody would be left as admin. */
export function setRoles(ctx: CompanyCall, { personId, roles }: { personId: string; roles: readonly Role[] }): void {
  const { db, company, person } = ctx
  const key: MemberKey = { companyId: company.id, personId }
  const nowMs = ctx.now()
  write(db, (tx) => {
    const before = companyAccess(tx, key)
    if (!before) throw missing(NOBODY)
    if (before.includes('admin') && !roles.includes('admin') && !hasOtherAdmin(tx, key)) throw conflict(LAST_ADMIN)
    setMember(tx, { ...key, roles, nowMs })
    renewSessionsOf(tx, personId)
    const entry = { companyId: company.id, jobId: null, personId: person.id, atMs: nowMs, what: 'people.setRoles' }
    recordAudit(tx, { ...entry, before: { personId, roles: before }, after: { personId, roles } })
  })
}

/** @throws Failure for somebody who is not in the company, and when nobody would be left as admin. */
export function removePerson(ctx: CompanyCall, { personId }: { personId: string }): void {
  const { db, company, person } = ctx
  const key: MemberKey = { companyId: company.id, personId }
  write(db, (tx) => {
    const before = companyAccess(tx, key)
    if (!before) throw missing(NOBODY)
    if (before.includes('admin') && !hasOtherAdmin(tx, key)) throw conflict(LAST_ADMIN)
    removeMember(tx, key)
    renewSessionsOf(tx, personId)
    const entry = { companyId: company.id, jobId: null, personId: person.id, atMs: ctx.now(), what: 'people.remove' }
    recordAudit(tx, { ...entry, before: { personId, roles: before }, after: null })
  })
}
