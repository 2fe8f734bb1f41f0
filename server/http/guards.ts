import type { RequestHandler } from 'express'
import helmet from 'helmet'
import { isOwnOrigin, isSecureHost } from './addresses'

const NONE = ["'none'"]
const SELF = ["'self'"]
const YEAR_S = 365 * 24 * 60 * 60

/** Headers of every answer, errors included. */
export function securityHeaders(appUrl: string): RequestHandler {
  const isHttps = appUrl.startsWith('https:')
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: SELF,
        scriptSrc: SELF,
        // react-native-web writes its style sheet at run time.
        styleSrc: [...SELF, "'unsafe-inline'"],
        imgSrc: [...SELF, 'data:', 'blob:'],
        fontSrc: SELF,
        connectSrc: SELF,
        workerSrc: SELF,
        manifestSrc: SELF,
        formAction: SELF,
        baseUri: NONE,
        frameAncestors: NONE,
        objectSrc: NONE,
        // On plain http it would send the browser to a port that answers nothing.
        upgradeInsecureRequests: isHttps ? [] : null,
      },
    },
    strictTransportSecurity: isHttps ? { maxAge: YEAR_S, includeSubDomains: false } : false,
    xFrameOptions: { action: 'deny' },
  })
}

const READS = new Set(['GET', 'HEAD', 'OPTIONS'])

/**
 * Lets a change through only when our own page sent it: its Origin is ours and Sec-Fetch-Site, where the browser sends
 * it, says so too; and only as JSON, which no form of another site can send.
 */
export function ownPagesOnly(appUrl: string): RequestHandler {
  return (request, response, next) => {
    if (READS.has(request.method)) return next()
    const { origin, host } = request.headers
    const site = request.headers['sec-fetch-site']
    const isOurs =
      (origin !== undefined || site !== undefined) &&
      (origin === undefined || isOwnOrigin(appUrl, { origin, host })) &&
      (site === undefined || site === 'same-origin')
    if (!isOurs) {
      response.status(403).json({ message: `Changes are taken from pages of ${appUrl} only.` })
      return
    }
    if (!request.is('application/json')) {
      response.status(415).json({ message: 'Changes are taken as application/json only.' })
      return
    }
    next()
  }
}

export const noStore: RequestHandler = (_request, response, next) => {
  response.setHeader('Cache-Control', 'no-store')
  next()
}

/** Says on every page of an address without https why signing in does not work there, and how it does. */
export function secureAddressOnly(appUrl: string): RequestHandler {
  const lines = appUrl.startsWith('https:')
    ? [`Open ${appUrl} instead.`]
    : [
        `On the machine that it runs on, open ${appUrl}.`,
        'For others: put a reverse proxy with a certificate in front of it and start it with PUBLIC_URL set to the https address.',
      ]
  const text = [
    'Wedgeline: this address has no https.',
    'Signing in and the bar-check walk need https: without it a browser keeps neither the session nor unsent work.',
    ...lines,
  ].join('\n\n')
  return (request, response, next) => {
    if (isSecureHost(appUrl, request.headers.host)) return next()
    response.status(403).type('text/plain').setHeader('Cache-Control', 'no-store').send(`${text}\n`)
  }
}
