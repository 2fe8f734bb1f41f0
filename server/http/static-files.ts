import { existsSync, readdirSync } from 'node:fs'
import { extname, join, relative, sep } from 'node:path'
import type { Request, RequestHandler, Response } from 'express'

/** Smallest first; as a browser names them and as the build ends its files. */
const ENCODINGS = [
  ['br', '.br'],
  ['gzip', '.gz'],
] as const
const HASHED = /[.-][0-9a-f]{8,}\.[a-z0-9]+$/
const IMMUTABLE = 'public, max-age=31536000, immutable'
/** Never answered with the app's page: what is missing there is missing. */
const NOT_PAGES =
  /^\/(trpc|files|exports|healthz|readyz|_expo|assets|fonts)(\/|$)|\.(js|css|map|json|ico|svg|png|woff2|ttf|txt|webmanifest)$/

/**
 * The built client from `folder`: each file as the build compressed it, hashed names for good, every other name asked
 * after each time. The folder is read once; a path that is not one of its files goes on.
 */
export function staticFiles(folder: string): RequestHandler {
  const files = new Set(existsSync(folder) ? listFiles(folder) : [])
  return (request, response, next) => {
    if (request.method !== 'GET' && request.method !== 'HEAD') return next()
    if (!files.has(request.path)) return next()
    send(request, response, { folder, files, path: request.path })
  }
}

/** The app's one page for every address that is a screen of it. */
export function appPage(folder: string): RequestHandler {
  const files = new Set(existsSync(folder) ? listFiles(folder) : [])
  const path = '/index.html'
  return (request, response, next) => {
    const isPage = (request.method === 'GET' || request.method === 'HEAD') && !NOT_PAGES.test(request.path)
    if (!isPage || !request.accepts('html')) return next()
    if (files.has(path)) return send(request, response, { folder, files, path })
    response.status(503).type('text/plain').setHeader('Cache-Control', 'no-store')
    response.send('The web client has not been built. Run npm start.\n')
  }
}

interface Asset {
  readonly folder: string
  readonly files: ReadonlySet<string>
  readonly path: string
}

function send(request: Request, response: Response, { folder, files, path }: Asset): void {
  const [encoding, ending] =
    ENCODINGS.find(([name, end]) => files.has(path + end) && request.acceptsEncodings(name) !== false) ?? []
  response.type(extname(path))
  response.vary('Accept-Encoding')
  response.setHeader('Cache-Control', HASHED.test(path) ? IMMUTABLE : 'no-cache')
  if (encoding) response.setHeader('Content-Encoding', encoding)
  response.sendFile(`${path}${ending ?? ''}`, { root: folder, cacheControl: false, acceptRanges: false })
}

/** Paths as a URL has them. Names that begin with a dot are the build's own. */
function listFiles(folder: string): string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => `/${relative(folder, join(entry.parentPath, entry.name)).split(sep).join('/')}`)
    .filter((path) => !path.includes('/.'))
}
