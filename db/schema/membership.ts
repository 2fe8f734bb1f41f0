import { foreignKey, index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import type { Role } from '@wedgeline/contract'
import { isJson, oneOf } from './columns'
import { company, person } from './person'

const ROLE_WORDS = ['detailer', 'engineer', 'drafter', 'inspector', 'admin'] as const satisfies readonly Role[]

/** A person in a company; roles are held per company. */
export const membership = sqliteTable(
  'membership',
  {
    companyId: text('company_id')
      .notNull()
      .references(() => company.id),
    personId: text('person_id')
      .notNull()
      .references(() => person.id),
    createdAtMs: integer('created_at_ms').notNull(),
  },
  (t) => [primaryKey({ columns: [t.companyId, t.personId] }), index('membership_person').on(t.personId)],
)

export const membershipRole = sqliteTable(
  'membership_role',
  {
    companyId: text('company_id').notNull(),
    personId: text('person_id').notNull(),
    role: text('role', { enum: ROLE_WORDS }).notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.personId, t.role] }),
    foreignKey({
      columns: [t.companyId, t.personId],
      foreignColumns: [membership.companyId, membership.personId],
    }),
    oneOf('membership_role_role', t.role, ROLE_WORDS),
  ],
)

export const invitation = sqliteTable(
  'invitation',
  {
    companyId: text('company_id')
      .notNull()
      .references(() => company.id),
    id: text('id').notNull(),
    /** SHA-256 of the token in the link. */
    tokenHash: text('token_hash').notNull(),
    email: text('email').notNull(),
    name: text('name').notNull(),
    roles: text('roles', { mode: 'json' }).$type<Role[]>().notNull(),
    createdAtMs: integer('created_at_ms').notNull(),
    /** Null for the link that an empty database prints. */
    createdBy: text('created_by').references(() => person.id),
    expiresAtMs: integer('expires_at_ms').notNull(),
    acceptedAtMs: integer('accepted_at_ms'),
    withdrawnAtMs: integer('withdrawn_at_ms'),
  },
  (t) => [
    primaryKey({ columns: [t.companyId, t.id] }),
    uniqueIndex('invitation_token').on(t.tokenHash),
    isJson('invitation_roles_json', t.roles),
  ],
)
