import { QueryClientProvider } from '@tanstack/react-query'
import { createTRPCClient, TRPCClientError, type TRPCLink } from '@trpc/client'
import { observable } from '@trpc/server/observable'
import { render } from '@testing-library/react'
import type { ReactNode } from 'react'
import { ThemeProvider } from '@/components/theme'
import { ToastProvider } from '@/components/ui/toast'
import { TrailProvider } from '@/components/ui/trail'
import { createQueryClient } from '@/lib/query'
import { TRPCProvider, type AppRouter } from '@/lib/trpc'

/** What each procedure answers, by its path; it throws what the server would refuse with, and never answers if left out. */
export type Answers = Readonly<Record<string, (input: unknown) => unknown>>

/** What a refusal by the server carries. */
export interface Refusal {
  readonly code: string
  readonly fields?: Readonly<Record<string, readonly string[]>>
}

export function refusal(message: string, { code, fields }: Refusal): Error {
  const data = { code, httpStatus: 400, path: null, fields: fields ?? null, problem: null, retryAfterS: null }
  return new TRPCClientError(message, { result: { error: { code: -32600, message, data } } as never })
}

/** Renders part of the product over procedures that answer as the test says. */
export function renderOver(answers: Answers, children: ReactNode) {
  const calls: { path: string; input: unknown }[] = []
  const link: TRPCLink<AppRouter> =
    () =>
    ({ op: { path, input } }) =>
      observable((observer) => {
        calls.push({ path, input })
        const answer = answers[path]
        if (!answer) return
        try {
          observer.next({ result: { type: 'data', data: answer(input) } })
          observer.complete()
        } catch (error) {
          observer.error(error as TRPCClientError<AppRouter>)
        }
      })
  const queryClient = createQueryClient()
  const trpcClient = createTRPCClient<AppRouter>({ links: [link] })
  render(
    <ThemeProvider>
      <ToastProvider>
        <QueryClientProvider client={queryClient}>
          <TRPCProvider trpcClient={trpcClient} queryClient={queryClient}>
            <TrailProvider>{children}</TrailProvider>
          </TRPCProvider>
        </QueryClientProvider>
      </ToastProvider>
    </ThemeProvider>,
  )
  return { calls }
}
