import { CommandError, type Conflict, type LayoutFile, type Role } from '@wedgeline/contract'
import { useQuery } from '@tanstack/react-query'
import { TRPCClientError } from '@trpc/client'
import { createStore, get, set } from 'idb-keyval'
import type { ReactNode } from 'react'
import { createContext, useContext, useEffect, useMemo, useSyncExternalStore } from 'react'
import { v7 as newId } from 'uuid'
import { useToast } from '@/components/ui/toast'
import { useTRPC, useTRPCClient, type AppRouter } from '@/lib/trpc'
import type { Change, Unsaved } from './draft'
import { mirroredUnsent, mirrorUnsent } from './unsent-mirror'
import { DraftStore, type DraftPorts, type DraftView, type SaveState, type Sent } from './draft-store'

/** One job open for reading and editing, for all screens behind it. */
export interface JobDraft {
  readonly jobId: string
  readonly companyId: string
  /** A quick edge that is in no job yet: it runs on proposed readings and is not issued. */
  readonly isUnfiled: boolean
  readonly layout: LayoutFile
  readonly roles: readonly Role[]
  /** The layout is theirs to change: a detailer or an engineer. */
  readonly canEdit: boolean
  /** How marks begin and how bars are delivered is theirs to set: a drafter too. */
  readonly canSetDeliveries: boolean
  readonly save: SaveState
  readonly problem: string | null
  readonly savedAtMs: number | null
  readonly conflicts: readonly Conflict[]
  readonly dropped: number
  readonly canUndo: boolean
  readonly canRedo: boolean
  readonly undoLabel: string | null
  readonly edit: (change: Change) => void
  readonly undo: () => void
  readonly redo: () => void
  readonly flush: () => Promise<void>
  readonly reload: () => Promise<void>
  readonly settle: (keep: 'mine' | 'theirs') => Promise<void>
}

export type OpenJob =
  | { readonly state: 'waiting' }
  | { readonly state: 'failed'; readonly message: string; readonly retry: () => void }
  | { readonly state: 'open'; readonly job: JobDraft }

const JobContext = createContext<OpenJob>({ state: 'waiting' })

/** The job that is open, or why it is not: a screen shows all three states. */
export const useOpenJob = (): OpenJob => useContext(JobContext)

/** The open job, below a screen that has shown the other states. @throws outside an open job. */
export function useJobDraft(): JobDraft {
  const open = useContext(JobContext)
  if (open.state !== 'open') throw new Error('useJobDraft needs an open job above it')
  return open.job
}

const unsentStore = createStore('wedgeline-unsent', 'batches')

/** Opens a job's draft and saves it on its own, also when the page is hidden or left. */
export function JobDraftProvider({ jobId, children }: { readonly jobId: string; readonly children: ReactNode }) {
  const trpc = useTRPC()
  const client = useTRPCClient()
  const say = useToast()
  const me = useQuery(trpc.session.me.queryOptions())
  const about = useQuery(trpc.job.byId.queryOptions({ jobId }))
  const personId = me.data?.person.id
  const companyId = about.data?.companyId
  const store = useMemo(
    () =>
      personId && companyId
        ? new DraftStore(portsOf(client, { jobId, key: `${personId}/${companyId}/${jobId}` }))
        : null,
    [client, jobId, personId, companyId],
  )
  const layout = useQuery({
    queryKey: ['draft', personId, companyId, jobId],
    enabled: store !== null,
    staleTime: Infinity,
    gcTime: 0,
    queryFn: () => store?.open().then(() => true) ?? false,
  })
  useSaveOnLeave(store)
  const view = useSyncExternalStore(store?.subscribe ?? never, store?.current ?? nothing, store?.current ?? nothing)
  const failed = me.error ?? about.error ?? layout.error
  const open = useMemo((): OpenJob => {
    if (store && view.draft && about.data) {
      return { state: 'open', job: jobOf({ store, view, about: about.data, say }) }
    }
    if (!failed) return { state: 'waiting' }
    const retry = () => void Promise.all([me.refetch(), about.refetch(), store ? layout.refetch() : null])
    return { state: 'failed', message: failed.message, retry }
  }, [store, view, about, failed, me, layout, say])
  return <JobContext value={open}>{children}</JobContext>
}

const never = () => () => undefined
const EMPTY: DraftView = { draft: null, save: 'saved', problem: null, savedAtMs: null, dropped: 0 }
const nothing = () => EMPTY

interface About {
  readonly id: string
  readonly companyId: string
  readonly isUnfiled: boolean
  readonly myRoles: readonly Role[]
}

const mayEdit = (role: Role): boolean => role === 'detailer' || role === 'engineer'

function jobOf(of: { store: DraftStore; view: DraftView; about: About; say: (words: string) => void }): JobDraft {
  const { store, view, about, say } = of
  const { draft, save, problem, savedAtMs, dropped } = view
  if (!draft) throw new Error('the draft is open here')
  return {
    jobId: about.id,
    companyId: about.companyId,
    isUnfiled: about.isUnfiled,
    layout: draft.layout,
    roles: about.myRoles,
    canEdit: about.myRoles.some(mayEdit),
    canSetDeliveries: about.myRoles.some((role) => role === 'drafter' || mayEdit(role)),
    save,
    problem,
    savedAtMs,
    conflicts: draft.conflicts,
    dropped,
    canUndo: draft.undo.length > 0,
    canRedo: draft.redo.length > 0,
    undoLabel: draft.undo.at(-1)?.label ?? null,
    edit: (change) => {
      try {
        store.edit(change)
      } catch (error) {
        // A value that the layout cannot hold: nothing was changed, and the field keeps what was typed.
        if (!(error instanceof CommandError)) throw error
        say(`${change.label}: ${error.message}.`)
      }
    },
    undo: () => store.undo(),
    redo: () => store.redo(),
    flush: () => store.flush(),
    reload: () => store.reload(),
    settle: (keep) => store.settle(keep),
  }
}

function portsOf(
  client: ReturnType<typeof useTRPCClient>,
  { jobId, key }: { readonly jobId: string; readonly key: string },
): DraftPorts {
  return {
    load: () => client.layout.byJob.query({ jobId }),
    send: (batch) =>
      client.layout.applyBatch.mutate(batch).then(({ versions }): Sent => ({ kind: 'stored', versions }), refusal),
    keep: (unsaved) => {
      mirrorUnsent(key, unsaved)
      return set(key, unsaved, unsentStore)
    },
    kept: async () => mirroredUnsent(key) ?? (await get<Unsaved>(key, unsentStore)) ?? null,
    newId: () => newId(),
    later: (run, ms) => {
      const timer = setTimeout(run, ms)
      return () => clearTimeout(timer)
    },
  }
}

/** A refusal is an answer; anything else means that the wire or the server failed and the batch goes again. */
function refusal(error: unknown): Sent {
  if (!(error instanceof TRPCClientError)) throw error
  const { data } = error as TRPCClientError<AppRouter>
  if (data?.code === 'CONFLICT' && data.conflicts) return { kind: 'stale', conflicts: data.conflicts }
  const isFinal =
    data && data.httpStatus >= 400 && data.httpStatus < 500 && data.httpStatus !== 401 && data.httpStatus !== 429
  if (!isFinal) throw error
  return { kind: 'refused', message: error.message }
}

function useSaveOnLeave(store: DraftStore | null): void {
  useEffect(() => {
    if (!store || typeof window === 'undefined') return
    const flush = () => void store.flush()
    const onHidden = () => document.visibilityState === 'hidden' && flush()
    window.addEventListener('pagehide', flush)
    window.addEventListener('blur', flush)
    document.addEventListener('visibilitychange', onHidden)
    return () => {
      window.removeEventListener('pagehide', flush)
      window.removeEventListener('blur', flush)
      document.removeEventListener('visibilitychange', onHidden)
      flush()
    }
  }, [store])
}
