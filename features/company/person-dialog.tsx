import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Text } from '@/components/ui/text'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import type { PersonInList } from './people-screen'
import { RoleBoxes } from './role-boxes'

export interface PersonDialogProps {
  readonly companyId: string
  readonly person: PersonInList
  readonly onClose: () => void
}

/** Roles of one person, and the way out of the company. */
export function PersonDialog({ companyId, person, onClose }: PersonDialogProps) {
  const [roles, setRoles] = useState(person.roles)
  const [isRemoving, setRemoving] = useState(false)
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const how = {
    onSuccess: async () => {
      // One's own roles may be among those changed.
      await Promise.all([
        queryClient.invalidateQueries(trpc.people.list.queryFilter({ companyId })),
        queryClient.invalidateQueries(trpc.session.me.queryFilter()),
      ])
      onClose()
    },
  }
  const save = useMutation(trpc.people.setRoles.mutationOptions(how))
  const remove = useMutation(trpc.people.remove.mutationOptions(how))
  const error = save.error ?? remove.error
  return (
    <Dialog
      title={person.name}
      isOpen
      onClose={onClose}
      actions={
        isRemoving ? (
          <>
            <Button label="Keep in the company" onPress={() => setRemoving(false)} />
            <Button
              label="Remove from the company"
              busy={remove.isPending}
              onPress={() => remove.mutate({ companyId, personId: person.id })}
            />
          </>
        ) : (
          <>
            <Button kind="quiet" label="Remove …" onPress={() => setRemoving(true)} />
            <Button label="Cancel" onPress={onClose} />
            <Button
              kind="main"
              label="Store"
              busy={save.isPending}
              onPress={() => save.mutate({ companyId, personId: person.id, roles: [...roles] })}
            />
          </>
        )
      }
    >
      {error ? <Banner tone="over" isUrgent words={failureOf(error).sentence} /> : null}
      {isRemoving ? (
        <Text>{`${person.name} then sees none of the company’s jobs. What they entered and accepted stays, in their name.`}</Text>
      ) : (
        <RoleBoxes label={`Roles of ${person.name}`} roles={roles} onChange={setRoles} />
      )}
    </Dialog>
  )
}
