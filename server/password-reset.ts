import { write } from '../db/client'
import { missing } from './failure'
import { newPasswordHash } from './password'
import { hashToken, newToken } from './session'
import { recordAudit } from './stores/audit'
import {
  closePasswordLinks,
  insertPasswordLink,
  openPasswordLinks,
  personOfLink,
  takePasswordLink,
} from './stores/password-link'
import { companiesOf, credentialsByEmail, setPasswordHash } from './stores/person'
import { endSessionsOf } from './stores/session'
import { countReset } from './throttle'
import type { Context } from './trpc/context'

/** A forgotten password: a link to the address of the account, and a new password in exchange for it. */

const OPEN_FOR_MS = 60 * 60_000
/** More mails than this an hour are not sent to anybody, however often they are asked for. */
const OPEN_LINKS_MAX = 3
const NOT_OPEN = 'This link is not open: it was used, or it is older than an hour. Ask for a new one.'

/**
 * Mails a link where the address has an account. The answer is the same where it has none, and is given before either
 * is looked up, so that its time says nothing either.
 * @throws Failure when too many links were asked for.
 */
export function askReset(ctx: Context, email: string): void {
  countReset(ctx.db, { email, address: ctx.address, nowMs: ctx.now() })
  setImmediate(() => {
    mailLink(ctx, email).catch((error: unknown) => {
      ctx.log.error({ event: 'mail failed', err: error }, 'A link to a new password could not be mailed')
    })
  })
}

async function mailLink(ctx: Context, email: string): Promise<void> {
  const { db, appUrl } = ctx
  const person = credentialsByEmail(db, email)
  if (!person) return
  const token = newToken()
  const nowMs = ctx.now()
  const isMade = write(db, (tx) => {
    if (openPasswordLinks(tx, person.id, nowMs) >= OPEN_LINKS_MAX) return false
    const expiresAtMs = nowMs + OPEN_FOR_MS
    insertPasswordLink(tx, { tokenHash: hashToken(token), personId: person.id, nowMs, expiresAtMs })
    return true
  })
  if (!isMade) return
  const text = [
    `${person.name},`,
    'Somebody asked for a new password of your account in Wedgeline. This link takes one, once, within an hour:',
    `${appUrl}/reset/${token}`,
    'If it was not you, there is nothing to do: the password stays as it is. Pass the link on to nobody.',
  ].join('\n\n')
  await ctx.mail.send({ to: person.email, subject: 'A new password', text })
  ctx.log.info({ event: 'password link mailed', personId: person.id, address: ctx.address }, 'Password link mailed')
}

/**
 * Takes a new password in exchange for a link, once. Whoever was signed in as that person no longer is.
 * @throws Failure when the link is not open or the password is one that anybody would try.
 */
export async function resetPassword(ctx: Context, input: { token: string; password: string }): Promise<void> {
  const { db } = ctx
  const tokenHash = hashToken(input.token)
  const person = personOfLink(db, { tokenHash, nowMs: ctx.now() })
  if (!person) throw missing(NOT_OPEN)
  const passwordHash = await newPasswordHash(input.password, person.email)
  const nowMs = ctx.now()
  write(db, (tx) => {
    if (!takePasswordLink(tx, { tokenHash, nowMs })) throw missing(NOT_OPEN)
    closePasswordLinks(tx, person.id, nowMs)
    setPasswordHash(tx, { personId: person.id, passwordHash, nowMs })
    endSessionsOf(tx, person.id)
    const entry = { jobId: null, personId: person.id, atMs: nowMs, what: 'session.resetPassword' }
    for (const { id } of companiesOf(tx, person.id)) {
      recordAudit(tx, { companyId: id, ...entry, before: null, after: { personId: person.id } })
    }
  })
  ctx.log.info({ event: 'password changed', personId: person.id, address: ctx.address }, 'Password changed')
}
