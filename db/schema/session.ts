import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { person } from './person'
import { oneOf } from './columns'

/** Lucia's table: `id` is the SHA-256 of the token in the cookie, so that a copy of the database opens nothing. */
export const session = sqliteTable(
  'session',
  {
    id: text('id').primaryKey(),
    userId: text('person_id')
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    /** Idle end, in seconds as Lucia writes it. */
    expiresAt: integer('expires_at_s').notNull(),
    absoluteEndAtMs: integer('absolute_end_at_ms').notNull(),
    createdAtMs: integer('created_at_ms').notNull(),
    /** The person's roles changed: the next call gets a session of another id in place of this one. */
    isRenewalDue: integer('is_renewal_due', { mode: 'boolean' }).notNull().default(false),
  },
  (t) => [index('session_person').on(t.userId)],
)

/** A one-time link: `id` is the SHA-256 of its token. */
export const verificationToken = sqliteTable(
  'verification_token',
  {
    id: text('id').primaryKey(),
    kind: text('kind').notNull(),
    personId: text('person_id')
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    expiresAtMs: integer('expires_at_ms').notNull(),
    usedAtMs: integer('used_at_ms'),
    createdAtMs: integer('created_at_ms').notNull(),
  },
  (t) => [oneOf('verification_token_kind', t.kind, ['password']), index('verification_token_person').on(t.personId)],
)

/** Attempts in a window of time, by account or by address. */
export const rateLimit = sqliteTable('rate_limit', {
  key: text('key').primaryKey(),
  count: integer('count').notNull(),
  windowEndAtMs: integer('window_end_at_ms').notNull(),
})
