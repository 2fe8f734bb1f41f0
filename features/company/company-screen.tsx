import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { View } from 'react-native'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Screen } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { useToast } from '@/components/ui/toast'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { CompanyNav } from './company-nav'
import { useCompanyRoles } from './company-roles'

/** The company's name, as it stands in exports and invitations. */
export function CompanyScreen({ companyId }: { companyId: string }) {
  const company = useQuery(useTRPC().company.byId.queryOptions({ companyId }))
  return (
    <Screen title="Company" nav={<CompanyNav companyId={companyId} here="company" />} isNarrow>
      {company.data ? (
        <CompanyForm companyId={companyId} stored={company.data} />
      ) : company.error ? (
        <Failed
          what="The company could not be fetched."
          advice={failureOf(company.error).sentence}
          onRetry={() => void company.refetch()}
        />
      ) : (
        <Waiting what="the company" />
      )}
    </Screen>
  )
}

interface CompanyFormProps {
  readonly companyId: string
  readonly stored: { readonly name: string; readonly note: string }
}

function CompanyForm({ companyId, stored }: CompanyFormProps) {
  const isAdmin = useCompanyRoles(companyId).includes('admin')
  const [name, setName] = useState(stored.name)
  const [note, setNote] = useState(stored.note)
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const say = useToast()
  const update = useMutation(
    trpc.company.update.mutationOptions({
      onSuccess: async () => {
        await Promise.all([
          queryClient.invalidateQueries(trpc.company.pathFilter()),
          queryClient.invalidateQueries(trpc.session.me.queryFilter()),
        ])
        say('Stored.')
      },
    }),
  )
  const failure = update.error ? failureOf(update.error) : null
  const errors: Readonly<Record<string, string>> = failure?.fields ?? {}
  const isChanged = name !== stored.name || note !== stored.note
  const send = () => update.mutate({ companyId, name, note })
  return (
    <>
      {failure && Object.keys(errors).length === 0 ? <Banner tone="over" isUrgent words={failure.sentence} /> : null}
      <TextField
        label="Name"
        hint="It stands in schedules and invitations."
        value={name}
        onChangeText={setName}
        onEnter={send}
        error={errors.name}
        disabled={!isAdmin}
        maxLength={120}
        required
      />
      <TextField
        label="Note"
        value={note}
        onChangeText={setNote}
        error={errors.note}
        disabled={!isAdmin}
        maxLength={500}
        multiline
      />
      {isAdmin ? (
        <View style={{ flexDirection: 'row' }}>
          <Button kind="main" label="Store" onPress={send} busy={update.isPending} disabled={!isChanged} />
        </View>
      ) : (
        <Text tone="soft">An admin of the company changes these.</Text>
      )}
    </>
  )
}
