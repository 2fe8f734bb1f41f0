import type { ReactNode } from 'react'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Text } from '@/components/ui/text'

export interface SmallDialogProps {
  readonly title: string
  readonly isAdmin: boolean
  /** Why it was not stored; null while nothing went wrong. */
  readonly failure: string | null
  readonly isBusy: boolean
  readonly onStore: () => void
  readonly onClose: () => void
  readonly children: ReactNode
}

/** A form over the list, for something of a few numbers. */
export function SmallDialog({ title, isAdmin, failure, isBusy, onStore, onClose, children }: SmallDialogProps) {
  return (
    <Dialog
      title={title}
      isOpen
      onClose={onClose}
      actions={
        <>
          <Button label={isAdmin ? 'Cancel' : 'Close'} onPress={onClose} />
          {isAdmin ? <Button kind="main" label="Store" onPress={onStore} busy={isBusy} /> : null}
        </>
      }
    >
      {failure ? <Banner tone="over" isUrgent words={`Not stored. ${failure}`} /> : null}
      {isAdmin ? null : <Text tone="soft">An admin of the company changes it.</Text>}
      {children}
    </Dialog>
  )
}
