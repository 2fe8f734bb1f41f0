import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { useJobDraft } from '../editing/job-draft'

type Way = 'own' | 'into'

/** Keeps a quick edge: as a job of its own, or as a pour of a job that is there. */
export function FileDialog({ onClose }: { readonly onClose: () => void }) {
  const [way, setWay] = useState<Way>('own')
  return way === 'own' ? (
    <OwnJob onClose={onClose} onOther={() => setWay('into')} />
  ) : (
    <IntoJob onClose={onClose} onOther={() => setWay('own')} />
  )
}

interface WayProps {
  readonly onClose: () => void
  readonly onOther: () => void
}

const TITLE = 'Keep in a job'

function Ways({ way, onOther }: { readonly way: Way; readonly onOther: () => void }) {
  return (
    <View role="group" aria-label="How it is kept" style={styles.ways}>
      <Button label="A job of its own" aria-pressed={way === 'own'} onPress={way === 'own' ? undefined : onOther} />
      <Button label="Into a job" aria-pressed={way === 'into'} onPress={way === 'into' ? undefined : onOther} />
    </View>
  )
}

function OwnJob({ onClose, onOther }: WayProps) {
  const { jobId, reload } = useJobDraft()
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const [number, setNumber] = useState('')
  const [title, setTitle] = useState('')
  const [isTried, setTried] = useState(false)
  const update = useMutation(
    trpc.job.update.mutationOptions({
      onSuccess: async () => {
        await Promise.all([
          reload(),
          queryClient.invalidateQueries(trpc.job.byId.queryFilter({ jobId })),
          queryClient.invalidateQueries(trpc.job.list.queryFilter()),
        ])
        onClose()
      },
    }),
  )
  const send = () => {
    setTried(true)
    if (number.trim() !== '' && title.trim() !== '') update.mutate({ jobId, number, title })
  }
  const needed = (text: string, words: string) => (isTried && text.trim() === '' ? words : undefined)
  return (
    <Dialog
      title={TITLE}
      isOpen
      onClose={onClose}
      actions={<Buttons label="Keep it" isBusy={update.isPending} onClose={onClose} onSend={send} />}
    >
      <View style={styles.fields}>
        <Ways way="own" onOther={onOther} />
        <Text tone="soft">
          It becomes an ordinary job. Its checks then need judgement until an engineer accepts the readings.
        </Text>
        {update.error ? <Banner tone="over" words={failureOf(update.error).sentence} isUrgent /> : null}
        <TextField
          label="Number"
          value={number}
          onChangeText={setNumber}
          error={needed(number, 'Type the job’s number, as 26-014.')}
          maxLength={40}
          required
          autoFocus
        />
        <TextField
          label="Title"
          value={title}
          onChangeText={setTitle}
          onEnter={send}
          error={needed(title, 'Type what the job is called.')}
          maxLength={120}
          required
        />
      </View>
    </Dialog>
  )
}

const NEW_LEVEL = 'new'

function IntoJob({ onClose, onOther }: WayProps) {
  const { jobId, companyId, layout, flush } = useJobDraft()
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const jobs = useQuery(trpc.job.list.queryOptions())
  const offered = jobs.data?.filter((job) => job.companyId === companyId && !job.isUnfiled) ?? []
  const [picked, setPicked] = useState<string | null>(null)
  const intoJobId = picked ?? offered[0]?.id ?? null
  const target = useQuery({
    ...trpc.layout.byJob.queryOptions({ jobId: intoJobId ?? '' }),
    enabled: intoJobId !== null,
  })
  const levels = target.data?.layout.levels ?? []
  const [pickedLevel, setPickedLevel] = useState<string | null>(null)
  const levelId = levels.some(({ id }) => id === pickedLevel) ? pickedLevel : (levels[0]?.id ?? NEW_LEVEL)
  const level = pickedLevel === NEW_LEVEL ? NEW_LEVEL : levelId
  const [levelMark, setLevelMark] = useState('')
  const [mark, setMark] = useState('')
  const file = useMutation(
    trpc.job.fileQuickEdge.mutationOptions({
      onSuccess: async ({ jobId: madeIn, pourId }) => {
        await queryClient.invalidateQueries(trpc.job.list.queryFilter())
        // A page load: the open job above this page is the one that is gone.
        window.location.assign(`/jobs/${madeIn}/pours/${pourId}`)
      },
    }),
  )
  const isWhole = mark.trim() !== '' && (level !== NEW_LEVEL || levelMark.trim() !== '')
  const send = async () => {
    if (intoJobId === null || level === null || !isWhole) return
    await flush()
    file.mutate({
      jobId,
      intoJobId,
      mark: mark.trim(),
      level: level === NEW_LEVEL ? { mark: levelMark.trim() } : { id: level },
    })
  }
  return (
    <Dialog
      title={TITLE}
      isOpen
      onClose={onClose}
      actions={
        <Buttons
          label="Put it into the job"
          isBusy={file.isPending}
          isOff={!isWhole || intoJobId === null}
          onClose={onClose}
          onSend={() => void send()}
        />
      }
    >
      <View style={styles.fields}>
        <Ways way="into" onOther={onOther} />
        {file.error ? <Banner tone="over" words={failureOf(file.error).sentence} isUrgent /> : null}
        {jobs.data && offered.length === 0 ? (
          <Text>You are on no other job of this company. Give it a job of its own, or ask somebody to add you.</Text>
        ) : (
          <>
            <Text tone="soft">
              {`Its pour, with ${layout.anchors.length} anchors and their bars, goes into the job and is checked on the job’s own basis and settings. It stands beside the pours of its level until you place it. The quick edge is then gone.`}
            </Text>
            <Select
              label="Job"
              options={offered.map(({ id, number, title }) => ({ value: id, label: `${number}  ${title}` }))}
              value={intoJobId}
              onChange={setPicked}
            />
            <Select
              label="Level"
              options={[
                ...levels.map(({ id, mark: name, title }) => ({
                  value: id,
                  label: title ? `${name}, ${title}` : name,
                })),
                { value: NEW_LEVEL, label: 'a new level' },
              ]}
              value={level}
              onChange={setPickedLevel}
            />
            {level === NEW_LEVEL ? (
              <TextField
                label="Mark of the new level"
                value={levelMark}
                onChangeText={setLevelMark}
                maxLength={12}
                required
              />
            ) : null}
            <TextField
              label="Mark of the pour"
              hint="As P4; none of the level’s pours may have it."
              value={mark}
              onChangeText={setMark}
              onEnter={() => void send()}
              maxLength={12}
              required
            />
          </>
        )}
      </View>
    </Dialog>
  )
}

interface ButtonsProps {
  readonly label: string
  readonly isBusy: boolean
  readonly isOff?: boolean
  readonly onClose: () => void
  readonly onSend: () => void
}

function Buttons({ label, isBusy, isOff = false, onClose, onSend }: ButtonsProps) {
  return (
    <>
      <Button label="Cancel" onPress={onClose} />
      <Button kind="main" label={label} onPress={onSend} busy={isBusy} disabled={isOff} />
    </>
  )
}

const styles = StyleSheet.create({
  fields: { gap: space.l },
  ways: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
})
