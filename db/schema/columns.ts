import { sql, type SQL } from 'drizzle-orm'
import { check, integer, text, type AnySQLiteColumn } from 'drizzle-orm/sqlite-core'
import { person } from './person'

/** Who stored a row, and who changed it last. */
export const stamps = () => ({
  createdAtMs: integer('created_at_ms').notNull(),
  createdBy: text('created_by')
    .notNull()
    .references(() => person.id),
  updatedAtMs: integer('updated_at_ms').notNull(),
  updatedBy: text('updated_by')
    .notNull()
    .references(() => person.id),
})

/** CHECK of a column against one of a list of words. */
export const oneOf = (name: string, column: AnySQLiteColumn, words: readonly string[]) =>
  check(name, sql`${column} in (${sql.raw(words.map((word) => `'${word}'`).join(', '))})`)

/** CHECK that each column is above 0; an empty column passes. */
export const allPositive = (name: string, columns: readonly AnySQLiteColumn[]) => check(name, every(columns, sql`> 0`))

/** CHECK that each column is 0 or more; an empty column passes. */
export const noneNegative = (name: string, columns: readonly AnySQLiteColumn[]) =>
  check(name, every(columns, sql`>= 0`))

const every = (columns: readonly AnySQLiteColumn[], rule: SQL): SQL =>
  sql.join(
    columns.map((column) => sql`${column} ${rule}`),
    sql` and `,
  )

/** CHECK that a text column holds JSON. */
export const isJson = (name: string, column: AnySQLiteColumn) => check(name, sql`json_valid(${column})`)
