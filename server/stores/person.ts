import type { Role } from '@wedgeline/contract'
import { and, asc, eq, ne } from 'drizzle-orm'
import type { Connection, Tx } from '../../db/client'
import { jobMember } from '../../db/schema/job'
import { membership, membershipRole } from '../../db/schema/membership'
import { company, person } from '../../db/schema/person'

export interface PersonRow {
  readonly id: string
  readonly name: string
  readonly email: string
}

export interface Member extends PersonRow {
  readonly roles: readonly Role[]
}

export interface CompanyOfPerson {
  readonly id: string
  readonly name: string
  readonly roles: readonly Role[]
}

/** Which member of which company. */
export interface MemberKey {
  readonly companyId: string
  readonly personId: string
}

const columns = { id: person.id, name: person.name, email: person.email }

/** The person and the password's hash, for checking it and for nothing else. */
export const credentialsByEmail = (db: Connection, email: string) =>
  db
    .select({ ...columns, passwordHash: person.passwordHash })
    .from(person)
    .where(eq(person.email, email))
    .get()

export const hasAnyPerson = (db: Connection): boolean =>
  db.select({ id: person.id }).from(person).limit(1).get() !== undefined

export function insertPerson(
  tx: Tx,
  { passwordHash, nowMs, ...row }: PersonRow & { passwordHash: string; nowMs: number },
): void {
  tx.insert(person)
    .values({ ...row, passwordHash, createdAtMs: nowMs, updatedAtMs: nowMs })
    .run()
}

export function setPasswordHash(
  tx: Tx,
  { personId, passwordHash, nowMs }: { personId: string; passwordHash: string; nowMs: number },
): void {
  tx.update(person).set({ passwordHash, updatedAtMs: nowMs }).where(eq(person.id, personId)).run()
}

/** Everybody in a company with their roles, by name. */
export function membersOf(db: Connection, companyId: string): Member[] {
  const rows = db
    .select({ ...columns, role: membershipRole.role })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .leftJoin(
      membershipRole,
      and(eq(membershipRole.companyId, membership.companyId), eq(membershipRole.personId, membership.personId)),
    )
    .where(eq(membership.companyId, companyId))
    .orderBy(asc(person.name), asc(person.id), asc(membershipRole.role))
    .all()
  const members = new Map<string, PersonRow & { roles: Role[] }>()
  for (const { role, ...row } of rows) {
    const member = members.get(row.id) ?? { ...row, roles: [] }
    if (role) member.roles.push(role)
    members.set(row.id, member)
  }
  return [...members.values()]
}

/** Companies that a person is in, by name, with the roles there. */
export function companiesOf(db: Connection, personId: string): CompanyOfPerson[] {
  const rows = db
    .select({ id: company.id, name: company.name, role: membershipRole.role })
    .from(membership)
    .innerJoin(company, eq(company.id, membership.companyId))
    .leftJoin(
      membershipRole,
      and(eq(membershipRole.companyId, membership.companyId), eq(membershipRole.personId, membership.personId)),
    )
    .where(eq(membership.personId, personId))
    .orderBy(asc(company.name), asc(company.id), asc(membershipRole.role))
    .all()
  const companies = new Map<string, { id: string; name: string; roles: Role[] }>()
  for (const { role, ...row } of rows) {
    const known = companies.get(row.id) ?? { ...row, roles: [] }
    if (role) known.roles.push(role)
    companies.set(row.id, known)
  }
  return [...companies.values()]
}

/** Whether anybody but this person is an admin of the company. */
export const hasOtherAdmin = (db: Connection, { companyId, personId }: MemberKey): boolean =>
  db
    .select({ personId: membershipRole.personId })
    .from(membershipRole)
    .where(
      and(
        eq(membershipRole.companyId, companyId),
        eq(membershipRole.role, 'admin'),
        ne(membershipRole.personId, personId),
      ),
    )
    .limit(1)
    .get() !== undefined

/** Adds the person to the company if they are not in it, and gives them exactly these roles. */
export function setMember(
  tx: Tx,
  { companyId, personId, roles, nowMs }: MemberKey & { roles: readonly Role[]; nowMs: number },
): void {
  tx.insert(membership).values({ companyId, personId, createdAtMs: nowMs }).onConflictDoNothing().run()
  clearRoles(tx, { companyId, personId })
  for (const role of new Set(roles)) tx.insert(membershipRole).values({ companyId, personId, role }).run()
}

/** Takes somebody out of a company and off its jobs; what they did stays recorded under their name. */
export function removeMember(tx: Tx, { companyId, personId }: MemberKey): void {
  tx.delete(jobMember)
    .where(and(eq(jobMember.companyId, companyId), eq(jobMember.personId, personId)))
    .run()
  clearRoles(tx, { companyId, personId })
  tx.delete(membership)
    .where(and(eq(membership.companyId, companyId), eq(membership.personId, personId)))
    .run()
}

function clearRoles(tx: Tx, { companyId, personId }: MemberKey): void {
  tx.delete(membershipRole)
    .where(and(eq(membershipRole.companyId, companyId), eq(membershipRole.personId, personId)))
    .run()
}
