import { createHash, randomBytes } from 'node:crypto'
import { Lucia, TimeSpan } from 'lucia'
import type { Db } from '../db/client'
import { sessionAdapter } from './stores/session'
import type { Person, RequestSession } from './trpc/context'

/**
 * Sessions, through Lucia. The cookie holds a random token and the table its SHA-256 as the session's id: a copy of the
 * table opens nothing. Whatever is written to the cookie is the token, never `session.id`.
 */

export const SESSION_COOKIE = '__Host-session'
const IDLE_END = new TimeSpan(7, 'd')
/** However often it is used, a session ends this long after sign-in. */
const ABSOLUTE_END = new TimeSpan(30, 'd')
const TOKEN_BYTES = 32

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof luciaOn>
    DatabaseSessionAttributes: { createdAtMs: number; absoluteEndAtMs: number }
    DatabaseUserAttributes: { name: string; email: string }
  }
}

const luciaOn = (db: Db) =>
  new Lucia(sessionAdapter(db), {
    sessionExpiresIn: IDLE_END,
    // Secure also on http://localhost, which browsers count as secure.
    sessionCookie: { name: SESSION_COOKIE, attributes: { secure: true, sameSite: 'lax', path: '/' } },
    getSessionAttributes: ({ absoluteEndAtMs }) => ({ absoluteEndAtMs }),
    getUserAttributes: ({ name, email }) => ({ name, email }),
  })

export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex')
export const newToken = (): string => randomBytes(TOKEN_BYTES).toString('base64url')

export interface CookieJar {
  /** The request's Cookie header. */
  readonly header: string | undefined
  /** Takes the value of a Set-Cookie header; a later one stands for an earlier one. */
  readonly set: (setCookie: string) => void
}

export interface SignedIn {
  readonly person: Person | null
  readonly session: RequestSession
}

export type ReadSession = (jar: CookieJar) => Promise<SignedIn>

/** Reads who sent a request, renews the session when more than half of its idle time is over. */
export function sessionReader(db: Db, now: () => number): ReadSession {
  const lucia = luciaOn(db)

  const start = async (personId: string, jar: CookieJar): Promise<void> => {
    const token = newToken()
    const createdAtMs = now()
    const attributes = { createdAtMs, absoluteEndAtMs: createdAtMs + ABSOLUTE_END.milliseconds() }
    await lucia.createSession(personId, attributes, { sessionId: hashToken(token) })
    jar.set(lucia.createSessionCookie(token).serialize())
  }

  const personOf = async (token: string | null, jar: CookieJar): Promise<Person | null> => {
    if (token === null) return null
    const { session, user } = await lucia.validateSession(hashToken(token))
    if (!session) return null
    if (session.absoluteEndAtMs <= now()) {
      await lucia.invalidateSession(session.id)
      return null
    }
    if (session.fresh) jar.set(lucia.createSessionCookie(token).serialize())
    return { id: user.id, name: user.name, email: user.email }
  }

  return async (jar) => {
    const token = lucia.readSessionCookie(jar.header ?? '')
    const person = await personOf(token, jar)
    const endOld = async () => {
      if (token !== null) await lucia.invalidateSession(hashToken(token))
    }
    return {
      person,
      session: {
        async start(personId) {
          await endOld()
          await start(personId, jar)
        },
        async end() {
          await endOld()
          jar.set(lucia.createBlankSessionCookie().serialize())
        },
      },
    }
  }
}
