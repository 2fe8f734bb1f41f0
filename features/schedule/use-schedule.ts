import { useMutation, useQuery } from '@tanstack/react-query'
import { useEffect, useRef } from 'react'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useJobDraft } from '../editing/job-draft'

/** The schedule as the server holds it, asked for again whenever what was typed here has been saved. */
export function useSchedule(pourId: string) {
  const { jobId, save } = useJobDraft()
  const trpc = useTRPC()
  // Enabled anew, it asks anew: an answer is stale at once.
  return useQuery({ ...trpc.schedule.byPour.queryOptions({ jobId, pourId }), enabled: save === 'saved' })
}

export interface WorkbookExport {
  readonly isBusy: boolean
  readonly problem: string | null
  /** File that was written last; null before the first. */
  readonly file: { readonly fileId: string; readonly name: string } | null
  readonly start: () => void
}

/** Saves what is unsaved, has the server write the workbook, and downloads it. */
export function useWorkbookExport(pourId: string): WorkbookExport {
  const { jobId, flush, save } = useJobDraft()
  const trpc = useTRPC()
  const lastSave = useRef(save)
  useEffect(() => {
    lastSave.current = save
  }, [save])
  const exported = useMutation(trpc.schedule.export.mutationOptions())
  const all = useMutation({
    mutationFn: async () => {
      await flush()
      // One turn for the screen to hear how the saving went.
      await new Promise((resolve) => setTimeout(resolve, 0))
      if (lastSave.current !== 'saved') throw new NotSavedError()
      const file = await exported.mutateAsync({ jobId, pourId })
      if (typeof window !== 'undefined') window.location.assign(`/exports/${file.fileId}`)
      return file
    },
  })
  return {
    isBusy: all.isPending,
    problem: all.error ? sentenceOf(all.error) : null,
    file: all.data ?? null,
    start: () => all.mutate(),
  }
}

/** The workbook is written from what the server holds, so nothing may be missing there. */
class NotSavedError extends Error {
  override readonly name = 'NotSavedError'
  override readonly message = 'Not exported: the last edits are not saved yet. Once they are, export again.'
}

const sentenceOf = (error: Error): string =>
  error instanceof NotSavedError ? error.message : failureOf(error).sentence
