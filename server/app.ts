import { createExpressMiddleware } from '@trpc/server/adapters/express'
import compression from 'compression'
import express, { type ErrorRequestHandler, type Express, type Request, type Response } from 'express'
import type { Logger } from 'pino'
import { Failure } from './failure'
import { noStore, ownPagesOnly, secureAddressOnly, securityHeaders } from './http/guards'
import { HTTP_ROUTES, STATUS } from './http/routes'
import { appPage, staticFiles } from './http/static-files'
import { requestLog } from './log'
import { appRouter } from './router'
import { sessionReader, type ReadSession } from './session'
import type { Context, ServerDeps } from './trpc/context'

const BODY_MAX_BYTES = 8 * 1024 * 1024
const BATCH_MAX = 20

export interface AppDeps extends ServerDeps {
  /** Folder of the built client. */
  readonly dist: string
  /** How many reverse proxies stand in front; their headers say where a request came from. */
  readonly proxies: number
}

/** The whole of the server as an Express app. Listens to nothing and starts nothing. */
export function buildApp(deps: AppDeps): Express {
  const { appUrl, dist, log } = deps
  const readSession = sessionReader(deps.db, deps.now)
  const app = express()
  app.disable('x-powered-by')
  app.set('trust proxy', deps.proxies)
  app.use(requestLog(log))
  app.use(securityHeaders(appUrl))
  app.use(ownPagesOnly(appUrl))
  app.use(['/trpc', ...HTTP_ROUTES.map(({ path }) => path)], noStore)
  app.use(compression())
  app.use('/trpc', procedures(deps, readSession))
  for (const { method, path, answer } of HTTP_ROUTES) {
    app[method](path, (request, response) =>
      answer({ request, response, context: () => contextOf({ deps, readSession, request, response }) }),
    )
  }
  app.use(secureAddressOnly(appUrl))
  app.use(staticFiles(dist))
  app.use(appPage(dist))
  app.use((_request, response) => {
    response.status(404).setHeader('Cache-Control', 'no-store')
    response.json({ message: 'There is nothing at this address.' })
  })
  app.use(failed(log))
  return app
}

function procedures(deps: AppDeps, readSession: ReadSession) {
  return createExpressMiddleware({
    router: appRouter,
    maxBodySize: BODY_MAX_BYTES,
    maxBatchSize: BATCH_MAX,
    createContext: ({ req, res }) => contextOf({ deps, readSession, request: req, response: res }),
    onError: ({ error, path }) => {
      if (error.code !== 'INTERNAL_SERVER_ERROR') return
      deps.log.error({ event: 'impossible state', path, err: error.cause ?? error }, 'A procedure failed')
    },
  })
}

interface Call {
  readonly deps: AppDeps
  readonly readSession: ReadSession
  readonly request: Request
  readonly response: Response
}

async function contextOf({ deps, readSession, request, response }: Call): Promise<Context> {
  const jar = { header: request.headers.cookie, set: (value: string) => response.setHeader('Set-Cookie', value) }
  const { person, session } = await readSession(jar)
  return { ...deps, person, session, address: request.ip ?? '' }
}

/** A sentence and never a stack. What nobody foresaw is logged here, once. */
function failed(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) return next(error)
    const status = statusOf(error)
    if (status >= 500) log.error({ event: 'impossible state', path: request.path, err: error }, 'A request failed')
    response.status(status).setHeader('Cache-Control', 'no-store')
    response.json({ message: error instanceof Failure ? error.message : sentenceOf(status) })
  }
}

function statusOf(error: unknown): number {
  if (error instanceof Failure) return STATUS[error.kind]
  const status = error instanceof Error && 'status' in error ? Number(error.status) : 500
  return status >= 400 && status < 500 ? status : 500
}

const sentenceOf = (status: number): string =>
  status < 500 ? 'This request cannot be read.' : 'Something went wrong on the server. It was noted there.'
