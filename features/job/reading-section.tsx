import type { Reading } from '@wedgeline/engine'
import { BASIS_SOURCES, CRACK_CHOICE } from '@wedgeline/engine/bases'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Section } from '@/components/ui/screen'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { clauseText } from '../checks/words'
import { useJobDraft, type JobDraft } from '../editing/job-draft'
import { AcceptDialog } from './accept-dialog'
import { dateTimeText } from './job-dates'

type Accepted = JobDraft['layout']['job']['readings'][number]

/** Where the basis is silent: what is taken to hold, accepted once by an engineer for the whole job. */
export function ReadingSection() {
  const { layout } = useJobDraft()
  const [asked, setAsked] = useState<Reading | null>(null)
  const { basis, readings } = layout.job
  const offered = BASIS_SOURCES.find(({ id }) => id === basis)?.readings ?? []
  const acceptedOf = ({ id }: Reading) => readings.find(({ readingId }) => readingId === id) ?? null
  const alone = offered.filter(({ choice }) => choice === undefined)
  const ordered = [...alone].sort((a, b) => rank(a, acceptedOf(a)) - rank(b, acceptedOf(b)))
  const answers = offered.filter(({ choice }) => choice === CRACK_CHOICE)
  const answer = answers.find(acceptedOf) ?? null
  return (
    <Section title="Readings">
      <Text tone="soft" style={styles.text}>
        Where a clause is silent or stretched, an engineer says once for the job how it is read. Results that rest on a
        reading need judgement until it is accepted.
      </Text>
      {ordered.map((reading) => (
        <ReadingEntry
          key={reading.id}
          reading={reading}
          accepted={acceptedOf(reading)}
          onAccept={() => setAsked(reading)}
        />
      ))}
      <CrackQuestion isAnswered={answer !== null} />
      {answers.map((reading) => (
        <ReadingEntry
          key={reading.id}
          reading={reading}
          accepted={acceptedOf(reading)}
          isAnswered={answer !== null}
          onAccept={() => setAsked(reading)}
        />
      ))}
      {asked ? (
        <AcceptDialog
          reading={asked}
          replaces={asked.choice === CRACK_CHOICE ? answer : null}
          onClose={() => setAsked(null)}
        />
      ) : null}
    </Section>
  )
}

/** How much crack control edge wedges need: one answer for the job, given with its exposure and restraint in view. */
function CrackQuestion({ isAnswered }: { isAnswered: boolean }) {
  const { exposure, restraint } = useJobDraft().layout.job.settings
  return (
    <View style={styles.question}>
      <Text kind="strong" level={3}>
        Crack steel in edge wedges: one of these
      </Text>
      <Text style={styles.text}>
        {isAnswered
          ? 'Accepting another takes the place of the one accepted.'
          : 'Until one is accepted, edge wedges need judgement and show the steel of each.'}
      </Text>
      <Text style={styles.text}>
        {`Exposure: ${exposure === '' ? 'not given' : exposure}. Restraint: ${restraint === '' ? 'not given' : restraint}. Both stand on the page Basis and settings.`}
      </Text>
    </View>
  )
}

/** What waits comes first, then what is accepted, then what could be chosen instead. */
const rank = ({ proposed }: Reading, accepted: Accepted | null): number => (accepted ? 1 : proposed ? 0 : 2)

interface ReadingEntryProps {
  readonly reading: Reading
  readonly accepted: Accepted | null
  /** The question that it is an answer to has another one. */
  readonly isAnswered?: boolean
  readonly onAccept: () => void
}

function ReadingEntry({ reading, accepted, isAnswered = false, onAccept }: ReadingEntryProps) {
  const { roles, layout } = useJobDraft()
  const isWaiting = reading.proposed && !isAnswered
  const isEngineer = roles.includes('engineer')
  return (
    <View style={styles.reading}>
      <View style={styles.head}>
        <View style={styles.title}>
          <Icon name={accepted ? 'check' : isWaiting ? 'needs-judgement' : 'info'} />
          <Text kind="strong" level={3} style={styles.grow}>
            {reading.title}
          </Text>
        </View>
        {isEngineer && !accepted ? (
          <Button label={isAnswered ? 'Accept instead …' : 'Accept …'} onPress={onAccept} />
        ) : null}
        {isEngineer && accepted ? <WithdrawButton reading={reading} /> : null}
      </View>
      <Text style={styles.text}>{reading.text}</Text>
      <Text kind="small" tone="soft" style={styles.text}>
        {`Holds for: ${reading.range} ${clauseText(reading.clause)}.`}
      </Text>
      <Text style={styles.text}>
        {accepted
          ? `Accepted by ${accepted.acceptedBy}, ${dateTimeText(accepted.acceptedAtMs, layout.job.timeZone)}: ${accepted.reason}`
          : isWaiting
            ? `Proposed${isEngineer ? '.' : '; an engineer of the job accepts it.'}`
            : 'Can be chosen; not in use.'}
      </Text>
    </View>
  )
}

function WithdrawButton({ reading }: { reading: Reading }) {
  const { jobId } = useJobDraft()
  const refresh = useReadingsChanged()
  const say = useToast()
  const trpc = useTRPC()
  const withdraw = useMutation(
    trpc.reading.withdraw.mutationOptions({
      onSuccess: refresh,
      onError: (error) => say(`Not withdrawn. ${failureOf(error).sentence}`),
    }),
  )
  return (
    <Button
      kind="quiet"
      label="Withdraw"
      busy={withdraw.isPending}
      onPress={() => withdraw.mutate({ jobId, readingId: reading.id })}
    />
  )
}

/** Every pour was checked again on the server: what is on screen is fetched anew. */
export function useReadingsChanged(): () => Promise<void> {
  const { reload } = useJobDraft()
  const queryClient = useQueryClient()
  const trpc = useTRPC()
  return async () => {
    await Promise.all([
      reload(),
      queryClient.invalidateQueries(trpc.job.byId.queryFilter()),
      queryClient.invalidateQueries(trpc.job.list.queryFilter()),
    ])
  }
}

const styles = StyleSheet.create({
  text: { maxWidth: 820 },
  question: { gap: space.xs, paddingTop: space.m },
  reading: { gap: space.xs, paddingVertical: space.s, borderBottomWidth: 1, borderColor: colour.rule },
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', justifyContent: 'space-between', gap: space.s },
  title: { flexDirection: 'row', alignItems: 'center', gap: space.s, flexShrink: 1 },
  grow: { flexShrink: 1 },
})
