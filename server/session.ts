import { createHash, randomBytes } from 'node:crypto'
import { Lucia, TimeSpan, type Adapter, type Session } from 'lucia'
import type { Db } from '../db/client'
import { retireSession, sessionAdapter } from './stores/session'
import type { Person, RequestSession } from './trpc/context'

/**
 * Sessions, through Lucia. The cookie holds a random token and the table its SHA-256 as the session's id: a copy of the
 * table opens nothing. Whatever is written to the cookie is the token, never `session.id`.
 */

export const SESSION_COOKIE = '__Host-session'
const IDLE_END = new TimeSpan(7, 'd')
/** However often it is used, a session ends this long after sign-in. */
const ABSOLUTE_END = new TimeSpan(30, 'd')
/** The idle time counts from the last use; that is written down at most this often. */
const USE_NOTED_EVERY_MS = 60_000
/** Calls that were on their way when a session got another id are still answered. */
const RETIRED_FOR_MS = 60_000
const TOKEN_BYTES = 32

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof luciaOn>
    DatabaseSessionAttributes: { createdAtMs: number; absoluteEndAtMs: number; isRenewalDue: boolean }
    DatabaseUserAttributes: { name: string; email: string }
  }
}

const luciaOn = (adapter: Adapter) =>
  new Lucia(adapter, {
    sessionExpiresIn: IDLE_END,
    // Secure also on http://localhost, which browsers count as secure.
    sessionCookie: { name: SESSION_COOKIE, attributes: { secure: true, sameSite: 'lax', path: '/' } },
    getSessionAttributes: ({ createdAtMs, absoluteEndAtMs, isRenewalDue }) => ({
      createdAtMs,
      absoluteEndAtMs,
      isRenewalDue,
    }),
    getUserAttributes: ({ name, email }) => ({ name, email }),
  })

export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex')
export const newToken = (): string => randomBytes(TOKEN_BYTES).toString('base64url')

interface SessionEnds {
  readonly createdAtMs: number
  readonly absoluteEndAtMs: number
}

const newEnds = (nowMs: number): SessionEnds => ({
  createdAtMs: nowMs,
  absoluteEndAtMs: nowMs + ABSOLUTE_END.milliseconds(),
})

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

/** Reads who sent a request. Its session's idle time counts anew, and it gets another id where that is due. */
export function sessionReader(db: Db, now: () => number): ReadSession {
  const adapter = sessionAdapter(db)
  const lucia = luciaOn(adapter)

  const start = async (personId: string, jar: CookieJar, ends: SessionEnds = newEnds(now())): Promise<string> => {
    const token = newToken()
    await lucia.createSession(personId, { ...ends, isRenewalDue: false }, { sessionId: hashToken(token) })
    jar.set(lucia.createSessionCookie(token).serialize())
    return token
  }

  const noteUse = async (session: Session, { token, jar }: { token: string; jar: CookieJar }): Promise<void> => {
    const endsAtMs = now() + IDLE_END.milliseconds()
    if (!session.fresh && endsAtMs - session.expiresAt.getTime() < USE_NOTED_EVERY_MS) return
    await adapter.updateSessionExpiration(session.id, new Date(endsAtMs))
    jar.set(lucia.createSessionCookie(token).serialize())
  }

  /** @returns the token of the session that stands in place of this one */
  const renewed = async (session: Session, { token, jar }: { token: string; jar: CookieJar }): Promise<string> => {
    const { id, userId, createdAtMs, absoluteEndAtMs, isRenewalDue } = session
    const nowMs = now()
    if (isRenewalDue) {
      // Of several calls at once the first one gets the other id; the rest are answered under the old one.
      const isFirst = retireSession(db, id, Math.min(absoluteEndAtMs, nowMs + RETIRED_FOR_MS))
      return isFirst ? start(userId, jar, { createdAtMs, absoluteEndAtMs }) : token
    }
    // One that ends so soon may be a retired one, whose cookie must not come back.
    if (absoluteEndAtMs - nowMs > RETIRED_FOR_MS) await noteUse(session, { token, jar })
    return token
  }

  const readToken = async (token: string, jar: CookieJar): Promise<{ person: Person; token: string } | null> => {
    const { session, user } = await lucia.validateSession(hashToken(token))
    if (!session) return null
    if (session.absoluteEndAtMs <= now()) {
      await lucia.invalidateSession(session.id)
      return null
    }
    const person = { id: user.id, name: user.name, email: user.email }
    return { person, token: await renewed(session, { token, jar }) }
  }

  return async (jar) => {
    const token = lucia.readSessionCookie(jar.header ?? '')
    const read = token === null ? null : await readToken(token, jar)
    const person = read?.person ?? null
    const endOld = async () => {
      for (const each of new Set([token, read?.token ?? null])) {
        if (each !== null) await lucia.invalidateSession(hashToken(each))
      }
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
