import { TRPCClientError } from '@trpc/client'
import type { AppRouter } from './trpc'

/** Why a call failed, for a screen: a sentence, and what a form puts beside its fields. */
export interface CallFailure {
  /** 'unreachable' when no answer came, otherwise tRPC's code: UNAUTHORIZED, FORBIDDEN, NOT_FOUND, CONFLICT ... */
  readonly code: string
  readonly sentence: string
  /** First message of each field of the input that could not be taken. */
  readonly fields: Readonly<Record<string, string>>
  /** Everything that is wrong with a file that was sent, field by field. */
  readonly problems: readonly { readonly field: string; readonly message: string }[]
  readonly retryAfterS: number | null
}

const UNREACHABLE = 'The server does not answer. Check the connection, then try again.'

/** Reads whatever a query or mutation threw. */
export function failureOf(error: unknown): CallFailure {
  const data = error instanceof TRPCClientError ? (error as TRPCClientError<AppRouter>).data : null
  if (!data) return { code: 'unreachable', sentence: UNREACHABLE, fields: {}, problems: [], retryAfterS: null }
  const { code, fields, problem, problems, retryAfterS } = data
  const named = Object.entries(fields ?? {}).map(([field, messages]) => [field, messages[0] ?? ''] as const)
  const own = problem && problem.field !== null ? [[problem.field, problem.message] as const] : []
  const all = Object.fromEntries([...named, ...own].map(([field, message]) => [field, asSentence(message)]))
  return { code, sentence: sentenceOf(error), fields: all, problems: problems ?? [], retryAfterS }
}

/** 'must be a mail address' stands alone beside a box as 'It must be a mail address.' */
const asSentence = (message: string): string => (/^[a-z]/.test(message) ? `It ${message}.` : message)

const sentenceOf = (error: unknown): string => (error instanceof Error ? error.message : UNREACHABLE)

/** An answer by the server, which the same question would get again; without one a retry may help. */
export const isAnswer = (error: unknown): boolean =>
  error instanceof TRPCClientError && (error as TRPCClientError<AppRouter>).data !== null
