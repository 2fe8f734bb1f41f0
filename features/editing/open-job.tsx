import type { ReactNode } from 'react'
import { useEffect } from 'react'
import { View } from 'react-native'
import { Button } from '@/components/ui/button'
import { Screen } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { JobDraftProvider, useJobDraft, useOpenJob } from './job-draft'
import { SaveBar } from './save-bar'

/** Opens a job for every screen below it: waits, says why it cannot be opened, or shows the screen. */
export function OpenJob({ jobId, children }: { jobId: string; children: ReactNode }) {
  return (
    <JobDraftProvider key={jobId} jobId={jobId}>
      <Opened>{children}</Opened>
    </JobDraftProvider>
  )
}

function Opened({ children }: { children: ReactNode }) {
  const open = useOpenJob()
  if (open.state === 'open') {
    return (
      <>
        <UndoKeys />
        <View dataSet={{ stays: 'top' }}>
          <SaveBar />
        </View>
        {children}
      </>
    )
  }
  return (
    <Screen title="Job">
      {open.state === 'waiting' ? (
        <Waiting what="the job" />
      ) : (
        <Failed
          what="This job cannot be opened."
          advice={open.message}
          onRetry={open.retry}
          actions={<Button label="Jobs" href="/" />}
        />
      )}
    </Screen>
  )
}

/** Ctrl+Z and Ctrl+Shift+Z (or Ctrl+Y) anywhere but in a box to type in, which has an undo of its own. */
function UndoKeys() {
  const { undo, redo, canSetDeliveries } = useJobDraft()
  useEffect(() => {
    if (!canSetDeliveries || typeof window === 'undefined') return
    const onKeyDown = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey || isTypedIn(event.target)) return
      const key = event.key.toLowerCase()
      const step = key === 'z' ? (event.shiftKey ? redo : undo) : key === 'y' ? redo : null
      if (!step) return
      event.preventDefault()
      step()
    }
    window.addEventListener('keydown', onKeyDown)
    return () => window.removeEventListener('keydown', onKeyDown)
  }, [undo, redo, canSetDeliveries])
  return null
}

const NO_TEXT = ['checkbox', 'radio', 'button', 'submit', 'range', 'file']

function isTypedIn(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false
  if (target instanceof HTMLInputElement) return !NO_TEXT.includes(target.type)
  return target instanceof HTMLTextAreaElement || target.isContentEditable
}
