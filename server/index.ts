import { mkdirSync } from 'node:fs'
import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { dirname } from 'node:path'
import { fileURLToPath } from 'node:url'
import type { Logger } from 'pino'
import { openDatabase, type Db } from '../db/client'
import { buildApp } from './app'
import { recheckOutdated } from './checking'
import { readSettings, type Settings } from './env'
import { localFiles } from './files/local-files'
import { firstInvitationLink } from './invite'
import { serverLog } from './log'
import { localOutbox } from './mail/local-outbox'
import type { Mailer } from './mail/mailer'
import { smtpMailer } from './mail/smtp'
import { seedDemo } from './seed-demo'
import { enginePool, type CheckTask } from './workers/engine-pool'

/** Reads the environment, opens the database and listens. Everything else is in app.ts. */

const DIST = fileURLToPath(new URL('../dist', import.meta.url))
/** Time that open answers get to finish once the server was told to stop. */
const STOP_MS = 10_000

try {
  await serve(readSettings(process.env))
} catch (error) {
  console.error(error instanceof Error ? error.message : error)
  process.exitCode = 2
}

async function serve(settings: Settings): Promise<void> {
  const log = serverLog({ level: settings.logLevel })
  mkdirSync(dirname(settings.databasePath), { recursive: true, mode: 0o700 })
  const db = openDatabase(settings.databasePath)
  const engine = enginePool()
  const { check, schedule, writeWorkbook } = engine
  const server = createServer()
  const stop = async () => {
    server.closeAllConnections()
    server.close()
    await engine.close()
    db.$client.close()
  }
  try {
    const appUrl = settings.publicUrl ?? `http://localhost:${await listen(server, settings)}`
    const app = buildApp({
      db,
      files: localFiles(settings.filesDir),
      mail: mailerOf(settings, log),
      log,
      check,
      schedule,
      writeWorkbook,
      now: Date.now,
      appUrl,
      dist: DIST,
      proxies: settings.proxies,
    })
    server.on('request', app)
    await recheckOutdated({ db, check }, Date.now(), ({ jobId }, error) =>
      log.error({ event: 'not checked', jobId, err: error }, 'A job could not be checked again'),
    )
    stopOnSignal(server, stop)
    await letFirstPeopleIn(db, { settings, appUrl, check })
    console.log(`Wedgeline is at ${appUrl}`)
  } catch (error) {
    await stop()
    throw error
  }
}

/** Without a mail server each message becomes a file, and the log says which. */
function mailerOf({ smtpUrl, mailFrom, outboxDir }: Settings, log: Logger): Mailer {
  if (smtpUrl) return smtpMailer(smtpUrl, mailFrom)
  return localOutbox(outboxDir, (path) => log.info({ event: 'mail stored', path }, 'A mail lies in the local outbox'))
}

/** @returns the port, which the system chooses where it is given as 0 */
function listen(server: Server, { host, port }: Settings): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', ({ message }) => reject(new Error(`The server cannot listen on ${host}:${port}: ${message}`)))
    server.listen(port, host, () => resolve((server.address() as AddressInfo).port))
  })
}

/** An empty database gets the demo, or a link for its first person. Both are printed once. */
async function letFirstPeopleIn(
  db: Db,
  { settings, appUrl, check }: { settings: Settings; appUrl: string; check: CheckTask },
): Promise<void> {
  const { isDemoWanted, publicUrl, smtpUrl, outboxDir } = settings
  const signIns = isDemoWanted ? await seedDemo({ db, check, now: Date.now, publicUrl }) : null
  if (signIns) {
    console.log('The demo is in the database. Its sign-ins, shown this once:')
    for (const { email, password, roles } of signIns) console.log(`  ${email}  ${password}  (${roles.join(', ')})`)
  }
  const link = firstInvitationLink({ db, now: Date.now, appUrl })
  if (link) console.log(`Nobody is in the database yet. This link lets the first person in, once:\n  ${link}`)
  if (!smtpUrl) console.log(`Mail is not sent: it goes into ${outboxDir}`)
}

function stopOnSignal(server: Server, close: () => Promise<void>): void {
  let isStopping = false
  const stop = () => {
    if (isStopping) return
    isStopping = true
    const late = setTimeout(() => server.closeAllConnections(), STOP_MS)
    server.close(() => {
      clearTimeout(late)
      void close().finally(() => process.exit(0))
    })
    server.closeIdleConnections()
  }
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, stop)
}
