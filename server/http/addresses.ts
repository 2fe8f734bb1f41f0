const LOOPBACK = new Set(['localhost', '127.0.0.1', '[::1]'])

/** Whether a URL's host name means this machine itself, which browsers count as secure without https. */
export const isLoopback = (hostname: string): boolean => LOOPBACK.has(hostname) || hostname.endsWith('.localhost')

/** A URL from text that somebody else wrote; null when it is none. */
export const readUrl = (text: string): URL | null => (URL.canParse(text) ? new URL(text) : null)

/**
 * Whether a request of this Host comes in under an address on which signing in works: the product's own over https, or
 * this machine itself.
 */
export function isSecureHost(appUrl: string, host: string | undefined): boolean {
  const asked = readUrl(`http://${host ?? ''}`)
  if (!asked) return false
  const own = new URL(appUrl)
  return isLoopback(asked.hostname) || (own.protocol === 'https:' && own.host === asked.host)
}

/**
 * Whether a page of this origin is ours. On this machine alone every port counts that the request itself came to, since
 * localhost and 127.0.0.1 are one.
 */
export function isOwnOrigin(appUrl: string, { origin, host }: { origin: string; host: string | undefined }): boolean {
  const own = new URL(appUrl)
  if (origin === own.origin) return true
  const asked = readUrl(origin)
  return asked !== null && isLoopback(own.hostname) && isLoopback(asked.hostname) && asked.host === host
}
