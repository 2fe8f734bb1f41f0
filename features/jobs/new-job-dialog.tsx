import { useMutation, useQueryClient } from '@tanstack/react-query'
import { router } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Select } from '@/components/ui/select'
import { TextField } from '@/components/ui/text-field'
import { failureOf } from '@/lib/failure'
import type { Me } from '@/lib/session'
import { useTRPC } from '@/lib/trpc'
import { BASIS_OPTIONS } from './bases'
import { CompanyChoice } from './company-choice'

export interface JobDialogProps {
  /** Those in which the person may begin a job; at least one. */
  readonly companies: Me['companies']
  readonly onClose: () => void
}

/** Begins a job and goes to it. */
export function NewJobDialog({ companies, onClose }: JobDialogProps) {
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  // The same id on every press: a second press after a lost answer makes no second job.
  const [id] = useState(() => newId())
  const [companyId, setCompanyId] = useState(companies[0]?.id ?? '')
  const [number, setNumber] = useState('')
  const [title, setTitle] = useState('')
  const [basis, setBasis] = useState(BASIS_OPTIONS[0].value)
  const [isTried, setTried] = useState(false)
  const create = useMutation(
    trpc.job.create.mutationOptions({
      onSuccess: async (made) => {
        await queryClient.invalidateQueries(trpc.job.list.queryFilter())
        onClose()
        router.push(`/jobs/${made.id}`)
      },
    }),
  )
  const failure = create.error ? failureOf(create.error) : null
  const send = () => {
    setTried(true)
    if (number.trim() === '' || title.trim() === '' || create.isPending) return
    create.mutate({ id, companyId, number, title, basis, timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone })
  }
  const needed = (text: string, words: string) => (isTried && text.trim() === '' ? words : undefined)
  return (
    <Dialog
      title="New job"
      isOpen
      onClose={onClose}
      actions={
        <>
          <Button label="Cancel" onPress={onClose} />
          <Button kind="main" label="Begin the job" onPress={send} busy={create.isPending} />
        </>
      }
    >
      <View style={styles.fields}>
        {failure && !failure.fields.number && !failure.fields.title ? (
          <Banner tone="over" words={failure.sentence} isUrgent />
        ) : null}
        <CompanyChoice companies={companies} companyId={companyId} onChange={setCompanyId} />
        <TextField
          label="Number"
          hint="As your office files it, 2301 for instance."
          value={number}
          onChangeText={setNumber}
          onEnter={send}
          error={needed(number, 'Type the job number.') ?? failure?.fields.number}
          maxLength={40}
          autoFocus
          required
        />
        <TextField
          label="Title"
          hint="The building or structure."
          value={title}
          onChangeText={setTitle}
          onEnter={send}
          error={needed(title, 'Type what the job is called.') ?? failure?.fields.title}
          maxLength={120}
          required
        />
        <Select
          label="Design basis"
          hint="With its recommended factors; an engineer sets those of a country on the job’s basis page."
          options={BASIS_OPTIONS}
          value={basis}
          onChange={setBasis}
          required
        />
      </View>
    </Dialog>
  )
}

const styles = StyleSheet.create({ fields: { gap: space.l } })
