import { z } from 'zod'
import { idSchema, label, text } from './fields'
import { hardwareSchema, jackSchema, strandTypeSchema } from './hardware-schema'
import { BASES, acceptedReadingSchema, jobSettingsSchema } from './layout'

/** Inputs of the procedures that are not layout edits. Forms and procedures read the same schema. */

export const ROLES = ['detailer', 'engineer', 'drafter', 'inspector', 'admin'] as const
const roleSchema = z.enum(ROLES)
export type Role = (typeof ROLES)[number]

const emailSchema = z.string().trim().toLowerCase().max(254).email('must be a mail address')
/** 8 or more, no composition rules, paste allowed (ASVS 5, 6.2). */
const passwordSchema = z.string().min(8, 'must have 8 characters or more').max(256)

export const signInSchema = z.strictObject({
  email: emailSchema,
  password: z.string().min(1, 'must not be empty').max(256),
})
/** Asks for a link to a new password; the link goes to the address alone. */
export const askResetSchema = z.strictObject({ email: emailSchema })
export const invitationSchema = z.strictObject({
  companyId: idSchema,
  email: emailSchema,
  name: label(120),
  roles: z.array(roleSchema).min(1, 'needs at least one role').max(ROLES.length),
})
export const invitationTokenSchema = z.strictObject({ token: z.string().min(20).max(200) })
export const acceptInvitationSchema = z.strictObject({
  token: invitationTokenSchema.shape.token,
  /** Only for an invitation that names no address: the first person of an empty database. */
  email: emailSchema.optional(),
  name: label(120),
  password: passwordSchema,
})
export const resetPasswordSchema = z.strictObject({
  token: invitationTokenSchema.shape.token,
  password: passwordSchema,
})
export const withdrawInvitationSchema = z.strictObject({ companyId: idSchema, invitationId: idSchema })
export const memberSchema = z.strictObject({ companyId: idSchema, personId: idSchema })
export const setRolesSchema = z.strictObject({
  companyId: idSchema,
  personId: idSchema,
  roles: z.array(roleSchema).max(ROLES.length),
})

export const newJobSchema = z.strictObject({
  id: idSchema,
  companyId: idSchema,
  number: label(40),
  title: label(120),
  timeZone: label(60).default('Europe/London'),
  basis: z.enum(BASES).default('en-1992'),
})
export const jobBasisSchema = z.strictObject({
  jobId: idSchema,
  basis: z.enum(BASES),
  settings: jobSettingsSchema,
  factors: z
    .array(z.strictObject({ name: label(40), value: z.number().positive().max(100), reason: label(500) }))
    .max(40),
})
export const jobTitleSchema = z.strictObject({ jobId: idSchema, number: label(40), title: label(120) })
export const jobMemberSchema = z.strictObject({ jobId: idSchema, personId: idSchema })

export const acceptReadingSchema = z.strictObject({
  jobId: idSchema,
  readingId: acceptedReadingSchema.shape.readingId,
  reason: label(2000),
})
export const withdrawReadingSchema = z.strictObject({ jobId: idSchema, readingId: label(64) })

export const saveHardwareSchema = z.strictObject({ companyId: idSchema, hardware: hardwareSchema })
export const saveJackSchema = z.strictObject({ companyId: idSchema, jack: jackSchema })
export const saveStrandTypeSchema = z.strictObject({ companyId: idSchema, strandType: strandTypeSchema })

export const byCompanySchema = z.strictObject({ companyId: idSchema })
export const byJobSchema = z.strictObject({ jobId: idSchema })
export const byPourSchema = z.strictObject({ jobId: idSchema, pourId: idSchema })
export const companyNameSchema = z.strictObject({ companyId: idSchema, name: label(120), note: text(500).default('') })
/** `layout` is read by readLayout, whose messages name its fields as the file's writer knows them. */
export const importLayoutSchema = z.strictObject({
  companyId: idSchema,
  layout: z.unknown(),
  /** A quick edge: kept, and in no job of its own yet. */
  isUnfiled: z.boolean().default(false),
})
/** Puts the pour of a quick edge into another job, on a level of it or on a new one. */
export const fileQuickEdgeSchema = z.strictObject({
  jobId: idSchema,
  intoJobId: idSchema,
  mark: label(12),
  level: z.union([z.strictObject({ id: idSchema }), z.strictObject({ mark: label(12) })]),
})
/** A page of what was done on a job, newest first; `before` is the last entry that was seen. */
export const auditListSchema = z.strictObject({
  jobId: idSchema,
  limit: z.number().int().min(1).max(200).default(50),
  before: z.strictObject({ atMs: z.number().int(), id: idSchema }).optional(),
})
