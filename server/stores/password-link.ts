import { and, count, eq, gt, isNull, lte } from 'drizzle-orm'
import type { Connection, Tx } from '../../db/client'
import { person } from '../../db/schema/person'
import { verificationToken } from '../../db/schema/session'

/** One-time links to a new password. The table keeps the token's hash alone. */

const isOpen = (nowMs: number) =>
  and(
    eq(verificationToken.kind, 'password'),
    isNull(verificationToken.usedAtMs),
    gt(verificationToken.expiresAtMs, nowMs),
  )

export interface NewPasswordLink {
  readonly tokenHash: string
  readonly personId: string
  readonly nowMs: number
  readonly expiresAtMs: number
}

/** Stores a link; those that ran out go. */
export function insertPasswordLink(tx: Tx, { tokenHash, personId, nowMs, expiresAtMs }: NewPasswordLink): void {
  tx.delete(verificationToken).where(lte(verificationToken.expiresAtMs, nowMs)).run()
  tx.insert(verificationToken)
    .values({ id: tokenHash, kind: 'password', personId, expiresAtMs, createdAtMs: nowMs })
    .run()
}

export const openPasswordLinks = (db: Connection, personId: string, nowMs: number): number =>
  db
    .select({ count: count() })
    .from(verificationToken)
    .where(and(eq(verificationToken.personId, personId), isOpen(nowMs)))
    .get()?.count ?? 0

interface LinkAt {
  readonly tokenHash: string
  readonly nowMs: number
}

/** Whose open link this is. */
export const personOfLink = (db: Connection, { tokenHash, nowMs }: LinkAt) =>
  db
    .select({ id: person.id, email: person.email })
    .from(verificationToken)
    .innerJoin(person, eq(person.id, verificationToken.personId))
    .where(and(eq(verificationToken.id, tokenHash), isOpen(nowMs)))
    .get()

/** True for the one call that took it. */
export const takePasswordLink = (tx: Tx, { tokenHash, nowMs }: LinkAt): boolean =>
  tx
    .update(verificationToken)
    .set({ usedAtMs: nowMs })
    .where(and(eq(verificationToken.id, tokenHash), isOpen(nowMs)))
    .run().changes === 1

/** Every other link of a person opens nothing any more. */
export function closePasswordLinks(tx: Tx, personId: string, nowMs: number): void {
  tx.update(verificationToken)
    .set({ usedAtMs: nowMs })
    .where(and(eq(verificationToken.personId, personId), isOpen(nowMs)))
    .run()
}
