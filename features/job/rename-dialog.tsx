import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { TextField } from '@/components/ui/text-field'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useJobDraft } from '../editing/job-draft'

/** Number and title of the job. */
export function RenameDialog({ onClose }: { onClose: () => void }) {
  const { jobId, layout, reload } = useJobDraft()
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const [number, setNumber] = useState(layout.job.number)
  const [title, setTitle] = useState(layout.job.title)
  const update = useMutation(
    trpc.job.update.mutationOptions({
      onSuccess: async () => {
        await Promise.all([
          reload(),
          queryClient.invalidateQueries(trpc.job.byId.queryFilter({ jobId })),
          queryClient.invalidateQueries(trpc.job.list.queryFilter()),
        ])
        onClose()
      },
    }),
  )
  const failure = update.error ? failureOf(update.error) : null
  const errors: Readonly<Record<string, string>> = failure?.fields ?? {}
  const send = () => update.mutate({ jobId, number, title })
  return (
    <Dialog
      title="Number and title"
      isOpen
      onClose={onClose}
      actions={
        <>
          <Button label="Cancel" onPress={onClose} />
          <Button kind="main" label="Keep" onPress={send} busy={update.isPending} />
        </>
      }
    >
      {failure && Object.keys(errors).length === 0 ? <Banner tone="over" words={failure.sentence} isUrgent /> : null}
      <TextField
        label="Number"
        value={number}
        onChangeText={setNumber}
        onEnter={send}
        error={errors.number}
        maxLength={40}
        autoFocus
        required
      />
      <TextField
        label="Title"
        value={title}
        onChangeText={setTitle}
        onEnter={send}
        error={errors.title}
        maxLength={120}
        required
      />
    </Dialog>
  )
}
