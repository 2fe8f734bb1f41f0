import { and, eq, gt, lte, sql } from 'drizzle-orm'
import type { Connection, Tx } from '../../db/client'
import { rateLimit } from '../../db/schema/session'

export interface Count {
  readonly count: number
  /** When the count is forgotten. */
  readonly windowEndAtMs: number
}

/** The count under a key; nothing once its window is over. */
export function countOf(db: Connection, key: string, nowMs: number): Count | null {
  const row = db.select().from(rateLimit).where(eq(rateLimit.key, key)).get()
  return row && row.windowEndAtMs > nowMs ? row : null
}

/** Counts one more and starts the window anew from now. */
export function countUp(tx: Tx, key: string, { nowMs, windowMs }: { nowMs: number; windowMs: number }): void {
  const count = (countOf(tx, key, nowMs)?.count ?? 0) + 1
  const windowEndAtMs = nowMs + windowMs
  tx.insert(rateLimit)
    .values({ key, count, windowEndAtMs })
    .onConflictDoUpdate({ target: rateLimit.key, set: { count, windowEndAtMs } })
    .run()
}

/** Takes one off a count that has any. */
export function countBack(tx: Tx, key: string): void {
  tx.update(rateLimit)
    .set({ count: sql`${rateLimit.count} - 1` })
    .where(and(eq(rateLimit.key, key), gt(rateLimit.count, 0)))
    .run()
}

/** Ends a count before its window does. */
export function forget(tx: Tx, key: string): void {
  tx.delete(rateLimit).where(eq(rateLimit.key, key)).run()
}

/** Drops counts whose window has ended. */
export function forgetOld(tx: Tx, nowMs: number): void {
  tx.delete(rateLimit).where(lte(rateLimit.windowEndAtMs, nowMs)).run()
}
