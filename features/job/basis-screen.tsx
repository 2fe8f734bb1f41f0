import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useJobDraft } from '../editing/job-draft'
import { BASIS_OPTIONS } from '../jobs/bases'
import { basisFormOf, lossOf, readBasisForm, sourceOf, withBasis } from './basis-form'
import { FactorEntry } from './factor-entry'
import { JobFrame } from './job-frame'
import { SettingEntry } from './setting-entry'
import { settingGroups } from './setting-fields'

/** The code of practice with its factors, and what the pours of the job have in common. */
export function JobBasisScreen({ jobId }: { jobId: string }) {
  const { layout, roles } = useJobDraft()
  const [form, setForm] = useState(() => basisFormOf(layout.job))
  const [isTried, setTried] = useState(false)
  const canSet = roles.includes('engineer')
  const { change, errors } = readBasisForm(form, { ...layout.job, id: jobId })
  const save = useSaveBasis()
  const loss = lossOf(layout.job, form.basis)
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
        <View style={styles.cell}>
          <Select
            label="Code of practice"
            hint="Every result names its clause, and how sure the clause is."
            options={BASIS_OPTIONS}
            value={form.basis}
            onChange={(basis) => setForm(withBasis(form, basis, layout.job))}
            disabled={!canSet}
          />
        </View>
        {loss === null ? null : <Banner tone="near" isUrgent words={loss} />}
      </Section>
      <Section title="Factors">
        <View style={styles.grid}>
          {sourceOf(form.basis).factors.map((factor) => (
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
        {settingGroups(form.basis).map(({ title, fields }) => (
          <View key={title} style={styles.group}>
            <Text kind="strong" level={3}>
              {title}
            </Text>
            <View style={styles.grid}>
              {fields.map((field) => (
                <View key={field.name} style={styles.cell}>
                  <SettingEntry field={field} form={form} errors={shown} canSet={canSet} onChange={setForm} />
                </View>
              ))}
            </View>
          </View>
        ))}
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

const styles = StyleSheet.create({
  group: { paddingTop: space.m },
  grid: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.xl, rowGap: space.l, paddingTop: space.s },
  cell: { width: 320, maxWidth: '100%' },
})
