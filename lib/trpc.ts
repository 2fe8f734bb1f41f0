import { createTRPCClient, httpBatchLink, type TRPCClient } from '@trpc/client'
import { createTRPCContext } from '@trpc/tanstack-react-query'
import type { AppRouter } from '../server/router'

/** The procedures as the client sees them. The one place that knows the server, by its types alone. */

export type { AppRouter }
export const { TRPCProvider, useTRPC, useTRPCClient } = createTRPCContext<AppRouter>()

/** Calls in one request, as the server allows, and the longest address that proxies let through. */
const BATCH_MAX = 20
const ADDRESS_MAX = 2000

export const createApiClient = (): TRPCClient<AppRouter> =>
  createTRPCClient<AppRouter>({
    links: [httpBatchLink({ url: '/trpc', maxItems: BATCH_MAX, maxURLLength: ADDRESS_MAX })],
  })
