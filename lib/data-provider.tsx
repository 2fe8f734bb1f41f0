import { QueryClientProvider } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { useEffect, useState } from 'react'
import { createQueryClient, keepAnswers } from './query'
import { useSession } from './session'
import { TRPCProvider, createApiClient } from './trpc'

/** Gives everything below it the procedures and what was read through them. */
export function DataProvider({ children }: { readonly children: ReactNode }) {
  const [queryClient] = useState(createQueryClient)
  const [trpcClient] = useState(createApiClient)
  return (
    <QueryClientProvider client={queryClient}>
      <TRPCProvider trpcClient={trpcClient} queryClient={queryClient}>
        <KeepAnswers queryClient={queryClient} />
        {children}
      </TRPCProvider>
    </QueryClientProvider>
  )
}

/** Draws nothing: keeps answers for as long as one person is signed in to the same companies. */
function KeepAnswers({ queryClient }: { readonly queryClient: ReturnType<typeof createQueryClient> }) {
  const session = useSession()
  const personId = session.state === 'in' ? session.me.person.id : null
  const companies = session.state === 'in' ? session.me.companies.map(({ id }) => id).join(' ') : ''
  useEffect(() => {
    if (personId === null) return undefined
    return keepAnswers(queryClient, { personId, companyIds: companies.split(' ') })
  }, [queryClient, personId, companies])
  return null
}
