import { QueryCache, QueryClient, type Query } from '@tanstack/react-query'
import { persistQueryClientRestore, persistQueryClientSubscribe } from '@tanstack/react-query-persist-client'
import { createAsyncStoragePersister } from '@tanstack/query-async-storage-persister'
import { clear, createStore, del, get, set } from 'idb-keyval'
import { failureOf, isAnswer } from './failure'

/** What was read from the server, and the part of it that outlives a reload. */

const DAY_MS = 24 * 60 * 60_000
/** As long as an idle session; a timer cannot run for more than 24 days. */
const KEPT_MS = 7 * DAY_MS
const RETRIES = 2
const kept = createStore('wedgeline-queries', 'answers')

/** Key under which tRPC keeps `session.me`. */
const isMe = ({ queryKey: [path] }: Pick<Query, 'queryKey'>): boolean =>
  Array.isArray(path) && path.join('.') === 'session.me'

/**
 * An answer shows at once and is asked for again. An error that the server answered is final; where no answer came it
 * tries again. When a session turns out to be over, who is signed in is asked anew, and the shell goes by that.
 */
export function createQueryClient(): QueryClient {
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({
      onError(error, query) {
        if (failureOf(error).code !== 'UNAUTHORIZED' || isMe(query)) return
        void client.invalidateQueries({ predicate: isMe })
      },
    }),
    defaultOptions: {
      queries: { staleTime: 0, gcTime: KEPT_MS, retry: (count, error) => !isAnswer(error) && count < RETRIES },
      mutations: { retry: false },
    },
  })
  return client
}

/** Whose answers: never shown to another person, nor after the company or the build has changed. */
export interface Owner {
  readonly personId: string
  readonly companyIds: readonly string[]
}

const keyOf = ({ personId, companyIds }: Owner): string => [personId, ...[...companyIds].sort()].join('/')

/**
 * Brings back what this owner kept and keeps from then on every answer whose query says `meta: { keep: true }`.
 * @returns stops keeping
 */
export function keepAnswers(client: QueryClient, owner: Owner): () => void {
  const persister = createAsyncStoragePersister({
    key: keyOf(owner),
    storage: {
      getItem: (key) => get<string>(key, kept),
      setItem: (key, value) => set(key, value, kept),
      removeItem: (key) => del(key, kept),
    },
  })
  const options = { queryClient: client, persister, buster: buildName(), maxAge: KEPT_MS }
  const shouldDehydrateQuery = ({ meta, state }: Query) => meta?.keep === true && state.status === 'success'
  let stop: (() => void) | null = null
  let isOver = false
  const start = () => {
    if (!isOver) stop = persistQueryClientSubscribe({ ...options, dehydrateOptions: { shouldDehydrateQuery } })
  }
  // Where storage is refused (a private window) nothing is kept, and nothing else changes.
  persistQueryClientRestore(options).then(start, () => undefined)
  return () => {
    isOver = true
    stop?.()
  }
}

/** Forgets every answer but who is signed in, in memory and on the device. */
export async function forgetAnswers(client: QueryClient): Promise<void> {
  client.removeQueries({ predicate: (query) => !isMe(query) })
  await clear(kept).catch(() => undefined)
}

/** The build that runs: the name of its first script, which holds a hash of what is in it. */
function buildName(): string {
  if (typeof document === 'undefined') return 'no page'
  return document.querySelector<HTMLScriptElement>('script[src*="/_expo/"]')?.src.split('/').at(-1) ?? 'development'
}
