import type { Role } from '@wedgeline/contract'
import { v7 as uuidv7 } from 'uuid'
import { write, type Tx } from '../db/client'
import { conflict, missing, refused } from './failure'
import { newPasswordHash } from './password'
import { hashToken, newToken } from './session'
import { me, personByPassword, type Me } from './sign-in'
import { recordAudit } from './stores/audit'
import { companyById, firstCompanyId, insertCompany } from './stores/company'
import {
  insertInvitation,
  openInvitationByToken,
  openInvitationsOf,
  takeInvitation,
  withdrawInvitation,
  type OpenInvitation,
} from './stores/invitation'
import { companyAccess } from './stores/access'
import { credentialsByEmail, hasAnyPerson, insertPerson, membersOf, setMember } from './stores/person'
import { renewSessionsOf } from './stores/session'
import type { CompanyCall, Context, Person, ServerDeps } from './trpc/context'

const OPEN_FOR_MS = 7 * 24 * 60 * 60_000
const FIRST_ROLES: readonly Role[] = ['admin', 'detailer']
const NOT_OPEN = 'This invitation is not open: it was used, withdrawn or ran out. Ask for a new one.'

export interface InviteInput {
  readonly email: string
  readonly name: string
  readonly roles: readonly Role[]
}

const linkOf = ({ appUrl }: Pick<ServerDeps, 'appUrl'>, token: string): string => `${appUrl}/invite/${token}`

/** Stores an invitation and mails its link, which is given back as well: the table keeps the token's hash alone. */
export async function invite(ctx: CompanyCall, input: InviteInput): Promise<{ id: string; link: string }> {
  const { db, company, person } = ctx
  const id = uuidv7()
  const token = newToken()
  const nowMs = ctx.now()
  write(db, (tx) => {
    if (membersOf(tx, company.id).some(({ email }) => email === input.email)) {
      throw conflict(`${input.email} is in this company already.`, { field: 'email' })
    }
    insertInvitation(tx, {
      ...input,
      ...{ companyId: company.id, id, tokenHash: hashToken(token), createdBy: person.id },
      ...{ createdAtMs: nowMs, expiresAtMs: nowMs + OPEN_FOR_MS },
    })
    const entry = { companyId: company.id, jobId: null, personId: person.id, atMs: nowMs }
    recordAudit(tx, { ...entry, what: 'invitation.create', before: null, after: { id, ...input } })
  })
  const link = linkOf(ctx, token)
  await mailLink(ctx, { to: input.email, name: input.name, link })
  return { id, link }
}

async function mailLink(ctx: CompanyCall, { to, name, link }: { to: string; name: string; link: string }) {
  const companyName = companyById(ctx.db, ctx.company.id)?.name ?? ''
  const text = [
    `${name},`,
    `${ctx.person.name} invites you to ${companyName} in Wedgeline. This link works once, for seven days:`,
    link,
    'Whoever has the link can use it: pass it on to nobody.',
  ].join('\n\n')
  try {
    await ctx.mail.send({ to, subject: `Invitation to ${companyName}`, text })
  } catch (error) {
    // The admin has the link on the screen; the invitation stands without the mail.
    ctx.log.error({ event: 'mail failed', err: error }, 'An invitation could not be mailed')
  }
}

/**
 * What an invitation offers, for whoever holds its token. `email` is null when whoever accepts gives it.
 * @throws Failure when it is not open.
 */
export function invitationByToken({ db, now }: Context, token: string) {
  const { companyName, email, name, roles } = openInvitation({ db, now }, token)
  return { companyName, email: email || null, name, roles }
}

function openInvitation({ db, now }: Pick<ServerDeps, 'db' | 'now'>, token: string): OpenInvitation {
  const found = openInvitationByToken(db, { tokenHash: hashToken(token), nowMs: now() })
  if (!found) throw missing(NOT_OPEN)
  return found
}

export interface AcceptInput {
  readonly token: string
  readonly name: string
  readonly password: string
  readonly email?: string | undefined
}

/**
 * Takes an invitation, once: makes the person unless the address has an account, puts them into the company and signs
 * them in. Whoever has an account gives its password, so that an invitation cannot take an account over.
 * @throws Failure when it is not open, or the address or password cannot be taken.
 */
export async function acceptInvitation(ctx: Context, input: AcceptInput): Promise<Me> {
  const found = openInvitation(ctx, input.token)
  const email = found.email || input.email
  if (email === undefined) throw refused('Give your mail address.', 'email')
  const known = credentialsByEmail(ctx.db, email)
  const person = known ? await knownPerson(ctx, { ...input, email }) : { id: uuidv7(), name: input.name, email }
  const passwordHash = known ? null : await newPasswordHash(input.password, email)
  const nowMs = ctx.now()
  write(ctx.db, (tx) => {
    if (!takeInvitation(tx, { companyId: found.companyId, id: found.id, nowMs })) throw missing(NOT_OPEN)
    if (passwordHash !== null) {
      if (credentialsByEmail(tx, email)) throw conflict('This address got an account just now. Try again.')
      insertPerson(tx, { ...person, passwordHash, nowMs })
    }
    join(tx, { found, person, nowMs })
  })
  await ctx.session.start(person.id)
  return me(ctx, person)
}

async function knownPerson(ctx: Context, input: { email: string; password: string }): Promise<Person> {
  const person = await personByPassword(ctx, input)
  if (!person) throw refused('This address has an account: give the password of that.', 'password')
  return person
}

function join(tx: Tx, { found, person, nowMs }: { found: OpenInvitation; person: Person; nowMs: number }): void {
  const { companyId } = found
  const before = companyAccess(tx, { personId: person.id, companyId })
  const roles = [...new Set([...(before ?? []), ...found.roles])]
  setMember(tx, { companyId, personId: person.id, roles, nowMs })
  renewSessionsOf(tx, person.id)
  const after = { invitationId: found.id, name: person.name, email: person.email, roles }
  const entry = { companyId, jobId: null, personId: person.id, atMs: nowMs }
  recordAudit(tx, { ...entry, what: 'invitation.accept', before: before && { roles: before }, after })
}

/** @throws Failure when there is no such open invitation in the company. */
export function withdraw({ db, company, person, now }: CompanyCall, invitationId: string): void {
  const nowMs = now()
  write(db, (tx) => {
    if (!withdrawInvitation(tx, { companyId: company.id, id: invitationId, nowMs })) throw missing(NOT_OPEN)
    const entry = { companyId: company.id, jobId: null, personId: person.id, atMs: nowMs }
    recordAudit(tx, { ...entry, what: 'invitation.withdraw', before: { id: invitationId }, after: null })
  })
}

/**
 * The link that lets the first person in, as admin and detailer; null once there is anybody. It works once; each call
 * withdraws the link of the call before.
 */
export function firstInvitationLink(deps: Pick<ServerDeps, 'db' | 'now' | 'appUrl'>): string | null {
  const { db } = deps
  const token = newToken()
  const nowMs = deps.now()
  const isMade = write(db, (tx) => {
    if (hasAnyPerson(tx)) return false
    const companyId = firstCompanyId(tx) ?? uuidv7()
    if (!companyById(tx, companyId)) insertCompany(tx, { id: companyId, name: 'Our company', note: '', nowMs })
    for (const { id } of openInvitationsOf(tx, { companyId, nowMs })) withdrawInvitation(tx, { companyId, id, nowMs })
    insertInvitation(tx, {
      ...{ companyId, id: uuidv7(), tokenHash: hashToken(token), email: '', name: '', roles: FIRST_ROLES },
      ...{ createdAtMs: nowMs, createdBy: null, expiresAtMs: nowMs + OPEN_FOR_MS },
    })
    return true
  })
  return isMade ? linkOf(deps, token) : null
}
