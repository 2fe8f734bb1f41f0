import type { Reading } from '@wedgeline/engine'
import { useMutation } from '@tanstack/react-query'
import { useState } from 'react'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useJobDraft } from '../editing/job-draft'
import { useReadingsChanged } from './reading-section'

interface AcceptDialogProps {
  readonly reading: Reading
  /** The answer to the same question that it takes the place of; null where there is none. */
  readonly replaces: Reading | null
  readonly onClose: () => void
}

/** Asks an engineer for the reason, then records the reading in their name. */
export function AcceptDialog({ reading, replaces, onClose }: AcceptDialogProps) {
  const { jobId, flush } = useJobDraft()
  const trpc = useTRPC()
  const [reason, setReason] = useState('')
  const [isTried, setTried] = useState(false)
  const refresh = useReadingsChanged()
  const accept = useMutation(
    trpc.reading.accept.mutationOptions({
      onMutate: flush,
      onSuccess: async () => {
        await refresh()
        onClose()
      },
    }),
  )
  const failure = accept.error ? failureOf(accept.error) : null
  const isEmpty = reason.trim() === ''
  const send = () => {
    setTried(true)
    if (!isEmpty && !accept.isPending) accept.mutate({ jobId, readingId: reading.id, reason })
  }
  return (
    <Dialog
      title="Accept this reading for the job"
      isOpen
      onClose={onClose}
      actions={
        <>
          <Button label="Cancel" onPress={onClose} />
          <Button kind="main" label="Accept in my name" onPress={send} busy={accept.isPending} />
        </>
      }
    >
      {failure && !failure.fields.reason ? <Banner tone="over" words={failure.sentence} isUrgent /> : null}
      <Text kind="strong">{reading.title}</Text>
      <Text>{reading.text}</Text>
      <Text tone="soft">{`Holds for: ${reading.range}`}</Text>
      {replaces ? <Text>{`It takes the place of: ${replaces.title}.`}</Text> : null}
      <TextField
        label="Reason"
        hint="Why it holds for this job. It stands in every calculation that rests on the reading."
        value={reason}
        onChangeText={setReason}
        error={isTried && isEmpty ? 'Give the reason in a sentence.' : failure?.fields.reason}
        multiline
        maxLength={2000}
        autoFocus
        required
      />
    </Dialog>
  )
}
