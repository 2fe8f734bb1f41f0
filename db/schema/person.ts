import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core'

export const person = sqliteTable('person', {
  id: text('id').primaryKey(),
  email: text('email').notNull().unique(),
  name: text('name').notNull(),
  /** Argon2id, in its own encoded form. */
  passwordHash: text('password_hash').notNull(),
  createdAtMs: integer('created_at_ms').notNull(),
  updatedAtMs: integer('updated_at_ms').notNull(),
})

export const company = sqliteTable('company', {
  id: text('id').primaryKey(),
  name: text('name').notNull(),
  note: text('note').notNull().default(''),
  createdAtMs: integer('created_at_ms').notNull(),
  updatedAtMs: integer('updated_at_ms').notNull(),
})
