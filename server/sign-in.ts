import { refused } from './failure'
import { isPassword } from './password'
import { companiesOf, credentialsByEmail, type CompanyOfPerson } from './stores/person'
import { countAttempt, noteSuccess } from './throttle'
import type { Context, Person, ServerDeps } from './trpc/context'

export interface Me {
  readonly person: Person
  readonly companies: readonly CompanyOfPerson[]
}

export const me = ({ db }: Pick<ServerDeps, 'db'>, person: Person): Me => ({
  person,
  companies: companiesOf(db, person.id),
})

/**
 * Starts a session with a new id. An unknown address and a wrong password get the same answer after the same work.
 * @throws Failure when the two do not belong together, or too many attempts were made.
 */
export async function signIn(ctx: Context, { email, password }: { email: string; password: string }): Promise<Me> {
  const person = await personByPassword(ctx, { email, password })
  if (!person) {
    ctx.log.warn({ event: 'sign-in refused', address: ctx.address }, 'Sign-in refused')
    throw refused('This address and password do not belong together.', 'password')
  }
  await ctx.session.start(person.id)
  ctx.log.info({ event: 'signed in', personId: person.id, address: ctx.address }, 'Signed in')
  return me(ctx, person)
}

/**
 * Who has this address and password; null for nobody. Counts as an attempt at guessing.
 * @throws Failure when too many attempts were made.
 */
export async function personByPassword(
  { db, now, address }: Context,
  { email, password }: { email: string; password: string },
): Promise<Person | null> {
  const attempt = { email, address, nowMs: now() }
  countAttempt(db, attempt)
  const found = credentialsByEmail(db, email)
  if (!(await isPassword(found?.passwordHash ?? null, password)) || !found) return null
  noteSuccess(db, attempt)
  return { id: found.id, name: found.name, email: found.email }
}
