import type { Role } from '@wedgeline/contract'
import type { Logger } from 'pino'
import type { Db } from '../../db/client'
import type { FileStore } from '../files/file-store'
import type { Mailer } from '../mail/mailer'
import type { EngineTasks } from '../workers/engine-pool'

/** What the server is made of; tests pass their own. The engine's tasks run in threads outside tests. */
export interface ServerDeps extends EngineTasks {
  readonly db: Db
  readonly files: FileStore
  readonly mail: Mailer
  readonly log: Logger
  /** Instant in epoch milliseconds. */
  readonly now: () => number
  /** Address under which people reach the product, without a slash at the end; links begin with it. */
  readonly appUrl: string
}

export interface Person {
  readonly id: string
  readonly name: string
  readonly email: string
}

/** The session of one request; nothing outside server/session.ts knows a token. */
export interface RequestSession {
  /** Ends the session that came with the request, if any, and starts one with a new id. */
  start(personId: string): Promise<void>
  end(): Promise<void>
}

export interface Context extends ServerDeps {
  readonly person: Person | null
  readonly session: RequestSession
  /** Where the request came from; throttling counts by it. */
  readonly address: string
}

/** The company of a call and what the person is in it, read anew on every call. */
export interface CompanyOfCall {
  readonly id: string
  readonly roles: readonly Role[]
}

export interface JobOfCall {
  readonly id: string
  readonly companyId: string
}

/** A call by somebody who is in the company that it names. */
export interface CompanyCall extends Context {
  readonly person: Person
  readonly company: CompanyOfCall
}

/** A call by somebody on the job that it names. */
export interface JobCall extends CompanyCall {
  readonly job: JobOfCall
}
