import type { LayoutFile } from '@wedgeline/contract'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { router } from 'expo-router'
import { failureOf } from '@/lib/failure'
import { useTRPC, useTRPCClient } from '@/lib/trpc'

export interface Keeping {
  readonly keep: (layout: LayoutFile) => void
  readonly isBusy: boolean
  /** Why it could not be kept, as a sentence. */
  readonly failure: string | null
  readonly leftOut: readonly string[]
}

/** Stores a quick edge in the company, unfiled, and goes to its edge. */
export function useKeep(companyId: string, onKept: () => void): Keeping {
  const trpc = useTRPC()
  const client = useTRPCClient()
  const queryClient = useQueryClient()
  const send = useMutation({
    mutationFn: async (layout: LayoutFile) => {
      const made = await client.job.importLayout.mutate({ companyId, layout, isUnfiled: true })
      const stored = await client.layout.byJob.query({ jobId: made.jobId })
      return { ...made, edgeId: stored.layout.edges[0]?.id ?? null }
    },
    onSuccess: async ({ jobId, edgeId }) => {
      onKept()
      await queryClient.invalidateQueries(trpc.job.list.queryFilter())
      router.push(edgeId === null ? `/jobs/${jobId}` : `/jobs/${jobId}/edges/${edgeId}`)
    },
  })
  return {
    keep: (layout) => send.mutate(layout),
    isBusy: send.isPending,
    failure: send.error ? failureOf(send.error).sentence : null,
    leftOut: send.data?.leftOut ?? [],
  }
}
