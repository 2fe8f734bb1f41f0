import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import { Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useJobDraft } from '../editing/job-draft'
import { JobFrame } from './job-frame'

/** Who is on the job: everybody here reads it; what each may change follows their roles. */
export function JobPeopleScreen({ jobId }: { jobId: string }) {
  const { companyId, roles } = useJobDraft()
  const trpc = useTRPC()
  const about = useQuery(trpc.job.byId.queryOptions({ jobId }))
  const canChange = roles.some((role) => role === 'detailer' || role === 'engineer' || role === 'admin')
  const { add, remove } = useMembers(jobId)
  return (
    <JobFrame page="people" title="People of the job" isNarrow>
      {about.data ? (
        <>
          <Section title="On this job">
            <View role="list">
              {about.data.members.map((member) => (
                <View key={member.id} role="listitem" style={styles.row}>
                  <View style={styles.name}>
                    <Text kind="strong">{member.name}</Text>
                    <Text tone="soft">{member.roles.join(', ') || 'no role'}</Text>
                  </View>
                  {canChange && about.data.members.length > 1 ? (
                    <Button
                      kind="quiet"
                      label={`Take ${member.name} off`}
                      onPress={() => remove.mutate({ jobId, personId: member.id })}
                      disabled={remove.isPending}
                    />
                  ) : null}
                </View>
              ))}
            </View>
          </Section>
          {canChange ? (
            <AddPerson
              companyId={companyId}
              taken={about.data.members.map(({ id }) => id)}
              isBusy={add.isPending}
              onAdd={(personId) => add.mutate({ jobId, personId })}
            />
          ) : (
            <Text tone="soft">A detailer, engineer or admin changes who is on the job.</Text>
          )}
        </>
      ) : about.error ? (
        <Failed
          what="The people could not be fetched."
          advice={failureOf(about.error).sentence}
          onRetry={() => void about.refetch()}
        />
      ) : (
        <Waiting what="the people of this job" />
      )}
    </JobFrame>
  )
}

function useMembers(jobId: string) {
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const say = useToast()
  const how = {
    onSuccess: () => queryClient.invalidateQueries(trpc.job.byId.queryFilter({ jobId })),
    onError: (error: unknown) => say(`Nothing was changed. ${failureOf(error).sentence}`),
  }
  return {
    add: useMutation(trpc.job.addMember.mutationOptions(how)),
    remove: useMutation(trpc.job.removeMember.mutationOptions(how)),
  }
}

interface AddPersonProps {
  readonly companyId: string
  readonly taken: readonly string[]
  readonly isBusy: boolean
  readonly onAdd: (personId: string) => void
}

function AddPerson({ companyId, taken, isBusy, onAdd }: AddPersonProps) {
  const people = useQuery(useTRPC().people.list.queryOptions({ companyId }))
  const [chosen, setChosen] = useState<string | null>(null)
  const free = people.data?.filter(({ id }) => !taken.includes(id)) ?? []
  const personId = free.some(({ id }) => id === chosen) ? chosen : null
  return (
    <Section title="Add somebody">
      {people.error ? (
        <Failed
          what="The company’s people could not be fetched."
          advice={failureOf(people.error).sentence}
          onRetry={() => void people.refetch()}
        />
      ) : people.isPending ? (
        <Waiting what="the company’s people" />
      ) : free.length === 0 ? (
        <Text tone="soft">Everybody of the company is on this job. An admin invites others to the company.</Text>
      ) : (
        <View style={styles.add}>
          <View style={styles.choice}>
            <Select
              label="Person"
              options={free.map(({ id, name, roles }) => ({ value: id, label: `${name} (${roles.join(', ')})` }))}
              value={personId}
              onChange={setChosen}
              placeholder="Choose"
            />
          </View>
          <Button
            label="Add to the job"
            disabled={personId === null}
            busy={isBusy}
            onPress={() => personId !== null && onAdd(personId)}
          />
        </View>
      )}
    </Section>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space.m,
    paddingVertical: space.xs,
    minHeight: 40,
    borderBottomWidth: 1,
    borderColor: colour.rule,
  },
  name: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.m, flexShrink: 1 },
  add: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'flex-end', gap: space.m },
  choice: { minWidth: 240, flexGrow: 1, maxWidth: 420 },
})
