import pino, { type DestinationStream, type Logger } from 'pino'
import { pinoHttp } from 'pino-http'
import type { IncomingMessage, ServerResponse } from 'node:http'

const SECRET_KEYS = ['password', 'passwordHash', 'token', 'tokenHash', 'link', 'cookie', 'authorization']

/**
 * The server's log: JSON, a line an event. Neither headers nor queries nor bodies are written, and no values that went
 * into SQL; the list of keys is a second bar for what somebody logs by mistake.
 */
export const serverLog = ({ level, stream }: { level: string; stream?: DestinationStream }): Logger =>
  pino(
    {
      level,
      redact: SECRET_KEYS.flatMap((key) => [key, `*.${key}`, `*.*.${key}`]),
      serializers: { err: errorOf },
    },
    stream ?? pino.destination(1),
  )

/** A line for each answer. */
export const requestLog = (log: Logger) =>
  pinoHttp<IncomingMessage, ServerResponse>({
    logger: log,
    // What went wrong was logged where it was caught.
    serializers: { req: requestOf, res: responseOf, err: () => undefined },
    wrapSerializers: false,
    customLogLevel: (_request, { statusCode }) => (statusCode >= 500 ? 'error' : 'info'),
    autoLogging: { ignore: ({ url }) => url === '/healthz' || url === '/readyz' },
  })

const responseOf = ({ statusCode }: { statusCode: number }) => ({ statusCode })
const requestOf = ({ id, method, url = '' }: IncomingMessage) => ({ id, method, path: pathOf(url) })

/** Without the query, which holds a procedure's input, and without the token of an invitation or a new password. */
const pathOf = (url: string): string => url.replace(/[?#].*$/s, '').replace(/^(\/(?:invite|reset)\/).+/s, '$1[token]')

/** An error's own words hold the values of a failed query; its place in the code does not. */
function errorOf(error: unknown): Record<string, unknown> {
  if (!(error instanceof Error)) return { type: typeof error }
  const { cause } = error
  const frames = (error.stack ?? '').split('\n').filter((line) => /^\s+at /.test(line))
  return {
    type: error.name,
    message: 'query' in error && 'params' in error ? `Failed query: ${String(error.query)}` : error.message,
    stack: frames.join('\n'),
    ...(cause === undefined ? {} : { cause: errorOf(cause) }),
  }
}
