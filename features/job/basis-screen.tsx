import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { NumberField } from '@/components/ui/number-field'
import { Section } from '@/components/ui/screen'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { useToast } from '@/components/ui/toast'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useJobDraft } from '../editing/job-draft'
import { basisFormOf, factorsOf, readBasisForm, type BasisForm } from './basis-form'
import { FactorEntry } from './factor-entry'
import { JobFrame } from './job-frame'
import { SETTING_FIELDS, type SettingField } from './setting-fields'

/** The code of practice with its factors, and what the pours of the job have in common. */
export function JobBasisScreen({ jobId }: { jobId: string }) {
  const { layout, roles } = useJobDraft()
  const [form, setForm] = useState(() => basisFormOf(layout.job))
  const [isTried, setTried] = useState(false)
  const canSet = roles.includes('engineer')
  const { change, errors } = readBasisForm(form, { ...layout.job, id: jobId })
  const save = useSaveBasis()
  const isChanged = JSON.stringify(form) !== JSON.stringify(basisFormOf(layout.job))
  const send = () => {
    setTried(true)
    if (change) save.mutate(change)
  }
  const shown = isTried ? errors : NO_ERRORS
  return (
    <JobFrame
      page="basis"
      title="Basis and settings"
      actions={
        canSet ? (
          <>
            {isChanged ? (
              <Button label="Put back" onPress={() => setForm(basisFormOf(layout.job))} disabled={save.isPending} />
            ) : null}
            <Button kind="main" label="Keep for the job" onPress={send} disabled={!isChanged} busy={save.isPending} />
          </>
        ) : null
      }
    >
      {save.error ? <Banner tone="over" isUrgent words={`Not kept. ${failureOf(save.error).sentence}`} /> : null}
      {isTried && !change ? (
        <Banner tone="over" isUrgent words="Not kept yet: some values below need another look." />
      ) : null}
      {canSet ? null : <Text tone="soft">An engineer of the job sets these.</Text>}
      <Section title="Design basis">
        <Text>EN 1992-1-1:2004. Every result names its clause, and how sure the clause is.</Text>
      </Section>
      <Section title="Factors">
        <View style={styles.grid}>
          {factorsOf(layout.job.basis).map((factor) => (
            <FactorEntry
              key={factor.name}
              factor={factor}
              typed={form.factors[factor.name] ?? { value: factor.recommended, reason: '' }}
              errors={shown}
              canSet={canSet}
              onChange={(typed) => setForm({ ...form, factors: { ...form.factors, [factor.name]: typed } })}
            />
          ))}
        </View>
      </Section>
      <Section title="Settings of the job">
        <View style={styles.grid}>
          {SETTING_FIELDS.map((field) => (
            <View key={field.name} style={styles.cell}>
              <SettingEntry field={field} form={form} errors={shown} canSet={canSet} onChange={setForm} />
            </View>
          ))}
        </View>
      </Section>
    </JobFrame>
  )
}

const NO_ERRORS: Readonly<Record<string, string>> = {}

/** Every pour is checked again with it, so everything that was read of the job is fetched anew. */
function useSaveBasis() {
  const { reload } = useJobDraft()
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const say = useToast()
  return useMutation(
    trpc.job.setBasis.mutationOptions({
      onSuccess: async () => {
        await Promise.all([reload(), queryClient.invalidateQueries(trpc.job.pathFilter())])
        say('Kept. Every pour of the job was checked with it.')
      },
    }),
  )
}

interface SettingEntryProps {
  readonly field: SettingField
  readonly form: BasisForm
  readonly errors: Readonly<Record<string, string>>
  readonly canSet: boolean
  readonly onChange: (form: BasisForm) => void
}

function SettingEntry({ field, form, errors, canSet, onChange }: SettingEntryProps) {
  const { name, kind, ...words } = field
  const value = form.settings[name]
  const set = (next: string | number | null) => onChange({ ...form, settings: { ...form.settings, [name]: next } })
  const error = errors[`settings.${name}`]
  return kind === 'text' ? (
    <TextField
      {...words}
      value={typeof value === 'string' ? value : ''}
      onChangeText={set}
      error={error}
      disabled={!canSet}
    />
  ) : (
    <NumberField
      {...words}
      value={typeof value === 'number' ? value : null}
      onCommit={set}
      onType={set}
      error={error}
      disabled={!canSet}
    />
  )
}

const styles = StyleSheet.create({
  grid: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.xl, rowGap: space.l, paddingTop: space.s },
  cell: { width: 320, maxWidth: '100%' },
})
