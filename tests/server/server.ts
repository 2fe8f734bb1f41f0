import { createHash } from 'node:crypto'
import { mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { Readable } from 'node:stream'
import { hash } from '@node-rs/argon2'
import type { Express } from 'express'
import request from 'supertest'
import { write, type Db } from '@/db/client'
import { buildApp } from '@/server/app'
import { serverLog } from '@/server/log'
import type { FileStore } from '@/server/files/file-store'
import type { Message } from '@/server/mail/mailer'
import { SESSION_COOKIE, sessionReader } from '@/server/session'
import { insertPerson, setMember } from '@/server/stores/person'
import type { Role } from '@wedgeline/contract'
import { engineHere } from './check-here'
import { openTestCompany, type TestCompany } from './company'

/** The whole server on a company of its own in memory, with its log, mail and files to look at. */

export const PASSWORD = 'eleven blue cranes'
/** Cheap on purpose: a hash says its own cost, and the real one is tested once. */
export const PASSWORD_HASH = await hash(PASSWORD, { memoryCost: 8, timeCost: 1, parallelism: 1 })

export interface TestServer {
  readonly app: Express
  readonly db: Db
  readonly company: TestCompany
  readonly files: FileStore
  readonly mails: Message[]
  /** Everything that was logged, as it was written. */
  log(): string
  /** Value of a Cookie header for somebody who is signed in. */
  cookieOf(personId: string): Promise<string>
}

interface Options {
  readonly appUrl?: string
  readonly dist?: string
  readonly now?: () => number
}

export function openTestServer({ appUrl, dist, now = () => Date.now() }: Options = {}): TestServer {
  const company = openTestCompany()
  const { db } = company
  const lines: string[] = []
  const mails: Message[] = []
  const files = filesInMemory()
  const app = buildApp({
    db,
    files,
    mail: { send: (message) => Promise.resolve(void mails.push(message)) },
    log: serverLog({ level: 'debug', stream: { write: (line) => void lines.push(line) } }),
    ...engineHere,
    now,
    appUrl: appUrl ?? 'http://localhost:4180',
    dist: dist ?? mkdtempSync(join(tmpdir(), 'wedgeline-dist-')),
    proxies: 0,
  })
  const readSession = sessionReader(db, now)
  return {
    app,
    db,
    company,
    files,
    mails,
    log: () => lines.join(''),
    async cookieOf(personId) {
      let cookie = ''
      const { session } = await readSession({ header: undefined, set: (value) => (cookie = value) })
      await session.start(personId)
      return cookie.split(';')[0] ?? ''
    },
  }
}

function filesInMemory(): FileStore {
  const contents = new Map<string, Uint8Array>()
  return {
    save(companyId, bytes) {
      const sha256 = createHash('sha256').update(bytes).digest('hex')
      contents.set(`${companyId}/${sha256}`, bytes)
      return Promise.resolve({ sha256, sizeBytes: bytes.byteLength })
    },
    open(companyId, sha256) {
      const bytes = contents.get(`${companyId}/${sha256}`)
      return bytes ? Promise.resolve(Readable.from([bytes])) : Promise.reject(new Error('There is no such file.'))
    },
  }
}

/** Somebody who can sign in with `PASSWORD`. */
export function addPerson(
  { db, company }: TestServer,
  { email, roles }: { email: string; roles: readonly Role[] },
): string {
  const id = `person-${email.replace(/[^a-z]/g, '-')}`
  write(db, (tx) => {
    insertPerson(tx, { id, email, name: email, passwordHash: PASSWORD_HASH, nowMs: 0 })
    setMember(tx, { companyId: company.id, personId: id, roles, nowMs: 0 })
  })
  return id
}

/** A change as our own page sends it. supertest's agent drops `__Host-` cookies, so the header goes by hand. */
export function post({ app }: TestServer, path: string, { cookie = '' }: { cookie?: string } = {}) {
  const call = request(app).post(`/trpc/${path}`).set('Sec-Fetch-Site', 'same-origin').type('application/json')
  return cookie === '' ? call : call.set('Cookie', cookie)
}

export function get({ app }: TestServer, path: string, { cookie = '' }: { cookie?: string } = {}) {
  const call = request(app).get(path)
  return cookie === '' ? call : call.set('Cookie', cookie)
}

/** Address of a query with its input. */
export const query = (path: string, input?: unknown): string =>
  `/trpc/${path}${input === undefined ? '' : `?input=${encodeURIComponent(JSON.stringify(input))}`}`

/** The cookie's value that an answer sets, null when it sets none. */
export function setCookieOf(response: { headers: Record<string, unknown> }): string | null {
  const header = response.headers['set-cookie'] as string[] | undefined
  return header?.find((value) => value.startsWith(`${SESSION_COOKIE}=`)) ?? null
}

export const signIn = (server: TestServer, email: string, password = PASSWORD) =>
  post(server, 'session.signIn').send({ email, password })
