import type { Role } from '@wedgeline/contract'
import { and, asc, eq, gt, isNull } from 'drizzle-orm'
import type { Connection, Tx } from '../../db/client'
import { invitation } from '../../db/schema/membership'
import { company } from '../../db/schema/person'

export interface NewInvitation {
  readonly companyId: string
  readonly id: string
  readonly tokenHash: string
  /** Empty when whoever accepts gives the address: the link that an empty database prints. */
  readonly email: string
  readonly name: string
  readonly roles: readonly Role[]
  readonly createdAtMs: number
  readonly createdBy: string | null
  readonly expiresAtMs: number
}

export interface OpenInvitation {
  readonly id: string
  readonly companyId: string
  readonly companyName: string
  readonly email: string
  readonly name: string
  readonly roles: readonly Role[]
  readonly createdBy: string | null
  readonly createdAtMs: number
  readonly expiresAtMs: number
}

const columns = {
  id: invitation.id,
  companyId: invitation.companyId,
  companyName: company.name,
  email: invitation.email,
  name: invitation.name,
  roles: invitation.roles,
  createdBy: invitation.createdBy,
  createdAtMs: invitation.createdAtMs,
  expiresAtMs: invitation.expiresAtMs,
}

/** Open: neither accepted nor withdrawn nor past its end. */
const isOpen = (nowMs: number) =>
  and(isNull(invitation.acceptedAtMs), isNull(invitation.withdrawnAtMs), gt(invitation.expiresAtMs, nowMs))

export function insertInvitation(tx: Tx, { roles, ...row }: NewInvitation): void {
  tx.insert(invitation)
    .values({ ...row, roles: [...roles] })
    .run()
}

export const openInvitationByToken = (
  db: Connection,
  { tokenHash, nowMs }: { tokenHash: string; nowMs: number },
): OpenInvitation | undefined =>
  db
    .select(columns)
    .from(invitation)
    .innerJoin(company, eq(company.id, invitation.companyId))
    .where(and(eq(invitation.tokenHash, tokenHash), isOpen(nowMs)))
    .get()

export const openInvitationsOf = (
  db: Connection,
  { companyId, nowMs }: { companyId: string; nowMs: number },
): OpenInvitation[] =>
  db
    .select(columns)
    .from(invitation)
    .innerJoin(company, eq(company.id, invitation.companyId))
    .where(and(eq(invitation.companyId, companyId), isOpen(nowMs)))
    .orderBy(asc(invitation.createdAtMs), asc(invitation.id))
    .all()

interface InvitationAt {
  readonly companyId: string
  readonly id: string
  readonly nowMs: number
}

/** True for the one call that took it; an invitation is taken once. */
export const takeInvitation = (tx: Tx, { companyId, id, nowMs }: InvitationAt): boolean =>
  tx
    .update(invitation)
    .set({ acceptedAtMs: nowMs })
    .where(and(eq(invitation.companyId, companyId), eq(invitation.id, id), isOpen(nowMs)))
    .run().changes === 1

/** True when an open invitation was withdrawn. */
export const withdrawInvitation = (tx: Tx, { companyId, id, nowMs }: InvitationAt): boolean =>
  tx
    .update(invitation)
    .set({ withdrawnAtMs: nowMs })
    .where(and(eq(invitation.companyId, companyId), eq(invitation.id, id), isOpen(nowMs)))
    .run().changes === 1
