import type { Request, Response } from 'express'
import { authoriseCompany, authoriseJob, type Asking } from '../access'
import { Failure, missing, type FailureKind } from '../failure'
import { filesById, type FileRow } from '../stores/file'
import type { Context } from '../trpc/context'

/** Who may call a route: anybody; somebody signed in, who is then checked against the record that is asked for. */
export type RouteAccess = 'anybody' | 'signed-in'

export interface HttpRoute {
  readonly method: 'get'
  readonly path: string
  readonly access: RouteAccess
  readonly answer: (call: RouteCall) => Promise<void>
}

export interface RouteCall {
  readonly context: () => Promise<Context>
  readonly request: Request
  readonly response: Response
}

/** Every route beside the procedures. The access test is made from this table. */
export const HTTP_ROUTES: readonly HttpRoute[] = [
  { method: 'get', path: '/healthz', access: 'anybody', answer: healthz },
  { method: 'get', path: '/readyz', access: 'anybody', answer: readyz },
  { method: 'get', path: '/exports/:id', access: 'signed-in', answer: sendExport },
]

/** The process answers. */
async function healthz({ response }: RouteCall): Promise<void> {
  await Promise.resolve(response.type('text/plain').send('ok\n'))
}

/** The process answers and so does its database. */
async function readyz({ context, response }: RouteCall): Promise<void> {
  const { db } = await context()
  db.$client.prepare('select 1').get()
  response.type('text/plain').send('ready\n')
}

/** A stored file as a download, for the people of its job. */
async function sendExport({ context, request, response }: RouteCall): Promise<void> {
  const { db, person, files } = await context()
  if (!person) {
    response.status(401).type('text/plain').send('Sign in first.\n')
    return
  }
  const { id } = request.params
  const file = filesById(db, String(id)).find((row) => isFor({ db, person }, row))
  if (!file) throw missing('There is no such file, or it is of a job that you are not one of the people of.')
  const stream = await files.open(file.companyId, file.sha256)
  response.attachment(file.name).type(file.type).setHeader('Content-Length', file.bytes)
  stream.on('error', () => response.destroy())
  response.on('close', () => stream.destroy())
  stream.pipe(response)
}

function isFor(asking: Asking, { companyId, jobId }: FileRow): boolean {
  try {
    const company = jobId === null ? authoriseCompany(asking, companyId) : authoriseJob(asking, jobId).company
    return company.id === companyId
  } catch (error) {
    if (error instanceof Failure) return false
    throw error
  }
}

/** HTTP status of each kind of failure. */
export const STATUS = {
  missing: 404,
  forbidden: 403,
  conflict: 409,
  refused: 400,
  throttled: 429,
} as const satisfies Record<FailureKind, number>
