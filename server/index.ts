import { mkdirSync } from 'node:fs'
import type { AddressInfo } from 'node:net'
import { dirname } from 'node:path'
import { fileURLToPath } from 'node:url'
import { openDatabase, type Db } from '../db/client'
import { buildApp } from './app'
import { recheckOutdated } from './checking'
import { readSettings, type Settings } from './env'
import { localFiles } from './files/local-files'
import { firstInvitationLink } from './invite'
import { serverLog } from './log'
import { localOutbox } from './mail/local-outbox'
import { smtpMailer } from './mail/smtp'

/** Reads the environment, opens the database and listens. Everything else is in app.ts. */

const DIST = fileURLToPath(new URL('../dist', import.meta.url))
/** Time that open answers get to finish once the server was told to stop. */
const STOP_MS = 10_000

const settings = (() => {
  try {
    return readSettings(process.env)
  } catch (error) {
    console.error(error instanceof Error ? error.message : error)
    process.exit(2)
  }
})()

const log = serverLog({ level: settings.logLevel })
mkdirSync(dirname(settings.databasePath), { recursive: true, mode: 0o700 })
const db = openDatabase(settings.databasePath)
recheckOutdated(db, Date.now(), (key, error) =>
  log.error({ event: 'recheck', ...key, err: error }, 'A job was not checked again'),
)
const appUrl = settings.publicUrl ?? `http://localhost:${settings.port}`
const app = buildApp({
  db,
  files: localFiles(settings.filesDir),
  mail: settings.smtpUrl ? smtpMailer(settings.smtpUrl, settings.mailFrom) : localOutbox(settings.outboxDir),
  log,
  now: Date.now,
  appUrl,
  dist: DIST,
  proxies: settings.proxies,
})

const server = app.listen(settings.port, settings.host, (error?: Error) => {
  if (error) {
    console.error(`The server cannot listen on ${settings.host}:${settings.port}: ${error.message}`)
    db.$client.close()
    process.exit(1)
  }
  const { port } = server.address() as AddressInfo
  console.log(`Wedgeline: ${settings.publicUrl ?? `http://localhost:${port}`}`)
  letFirstPeopleIn(db, settings)
})

let isStopping = false
for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, stop)

/** An empty database gets the demo, or a link for its first person. */
function letFirstPeopleIn(database: Db, { outboxDir }: Settings): void {
  const link = firstInvitationLink({ db: database, now: Date.now, appUrl })
  if (link)
    console.log(`Nobody is in the database yet. The first person, admin and detailer, comes in once by\n${link}`)
  if (!settings.smtpUrl) console.log(`Mail goes into ${outboxDir}`)
}

function stop(): void {
  if (isStopping) return
  isStopping = true
  log.info({ event: 'stopping' }, 'Stopping')
  const late = setTimeout(() => server.closeAllConnections(), STOP_MS)
  server.close(() => {
    clearTimeout(late)
    db.$client.close()
    process.exit(0)
  })
  server.closeIdleConnections()
}
