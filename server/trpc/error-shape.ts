import { CommandError, type Conflict } from '@wedgeline/contract'
import { TRPCError, type TRPCDefaultErrorShape } from '@trpc/server'
import { z } from 'zod'
import { Failure, type FailureKind, type FieldProblem } from '../failure'

/** The row and field that could not be taken, with what would be right. */
export interface Problem {
  readonly table: string | null
  readonly id: string | null
  readonly field: string | null
  readonly message: string
}

/** What an error carries to the client beside its sentence. Never a stack. */
export interface ErrorData {
  readonly code: TRPCError['code']
  readonly httpStatus: number
  readonly path: string | null
  /** Messages by field of the input ('' for the whole), when it could not be read. */
  readonly fields: Readonly<Record<string, readonly string[]>> | null
  readonly problem: Problem | null
  /** Everything that is wrong with a file that was sent, in its own order. */
  readonly problems: readonly FieldProblem[] | null
  readonly conflicts: readonly Conflict[] | null
  readonly versions: Readonly<Record<string, number>> | null
  readonly retryAfterS: number | null
}

const CODES = {
  missing: 'NOT_FOUND',
  forbidden: 'FORBIDDEN',
  conflict: 'CONFLICT',
  refused: 'BAD_REQUEST',
  throttled: 'TOO_MANY_REQUESTS',
} as const satisfies Record<FailureKind, TRPCError['code']>

/** Our own kinds of failure as tRPC knows them; every other error is returned as it came. */
export function toTrpcError(error: TRPCError): TRPCError {
  const { cause } = error
  if (cause instanceof Failure) return new TRPCError({ code: CODES[cause.kind], message: cause.message, cause })
  if (cause instanceof CommandError) return new TRPCError({ code: 'BAD_REQUEST', message: cause.message, cause })
  return error
}

/** The answer to an error: a sentence for the person and data for the form. */
export function errorShape({ shape, error }: { shape: TRPCDefaultErrorShape; error: TRPCError }) {
  const { code, cause } = error
  const failure = cause instanceof Failure ? cause : null
  const fields = code === 'BAD_REQUEST' && cause instanceof z.ZodError ? fieldsOf(cause) : null
  const data: ErrorData = {
    code,
    httpStatus: shape.data.httpStatus,
    path: shape.data.path ?? null,
    fields,
    problem: problemOf(cause),
    problems: failure?.details.problems ?? null,
    conflicts: failure?.details.conflicts ?? null,
    versions: failure?.details.versions ?? null,
    retryAfterS: failure?.details.retryAfterS ?? null,
  }
  return { code: shape.code, message: sentenceOf(error, fields), data }
}

const SENTENCES: Partial<Record<TRPCError['code'], string>> = {
  INTERNAL_SERVER_ERROR: 'Something went wrong on the server. It was noted there; nothing of this step was stored.',
  PARSE_ERROR: 'This cannot be read: it is not JSON.',
  PAYLOAD_TOO_LARGE: 'This is too large to be sent in one piece. The limit is 8 MB.',
}

function sentenceOf({ code, message }: TRPCError, fields: ErrorData['fields']): string {
  const [first] = fields ? Object.entries(fields) : []
  if (!first) return SENTENCES[code] ?? message
  const [field, messages] = first
  return `This cannot be read: ${field === '' ? '' : `${field} `}${messages.join(', ')}.`
}

function fieldsOf(error: z.ZodError): Record<string, string[]> {
  const fields: Record<string, string[]> = {}
  for (const issue of error.issues) (fields[issue.path.map(String).join('.')] ??= []).push(issue.message)
  return fields
}

function problemOf(cause: unknown): Problem | null {
  if (cause instanceof CommandError) {
    return { table: cause.table, id: cause.id, field: cause.field, message: cause.message }
  }
  if (cause instanceof Failure && cause.details.field !== undefined) {
    return { table: null, id: null, field: cause.details.field, message: cause.message }
  }
  return null
}
