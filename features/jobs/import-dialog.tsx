import type { LayoutFile, Problem } from '@wedgeline/contract'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { router } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { FilePicker } from '@/components/ui/file-picker'
import { Text } from '@/components/ui/text'
import { behindJobs } from '@/lib/behind-jobs'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { CompanyChoice } from './company-choice'
import type { JobDialogProps } from './new-job-dialog'

/** As much as the server takes in one piece. */
const FILE_MAX = 8_000_000

const notTaken = ({ name }: File) => `${name} cannot be taken. Nothing was stored.`
const isRefused = ({ severity }: Problem) => severity === 'refused'

type PickedProblem = Pick<Problem, 'field' | 'message'>

interface Refusal {
  readonly words: string
  readonly problems: readonly PickedProblem[]
}

/** Makes a job from a layout file. A file with problems is refused whole and its problems are listed. */
export function ImportDialog({ companies, onClose }: JobDialogProps) {
  const [companyId, setCompanyId] = useState(companies[0]?.id ?? '')
  const { pick, isBusy, refusal, leftOut, openJob } = useImport({ companyId, onClose })
  return (
    <Dialog
      title="Import a layout"
      isOpen
      onClose={onClose}
      actions={
        openJob ? (
          <Button kind="main" label="Go to the job" onPress={openJob} />
        ) : (
          <Button label="Close" onPress={onClose} />
        )
      }
    >
      {leftOut.length > 0 ? (
        <Banner tone="near" words={`The job was made. ${leftOut.join(' ')}`} isUrgent />
      ) : (
        <View style={styles.all}>
          <Text>
            A layout file of Wedgeline, name.wedgeline.json, becomes a new job. Hardware that your company does not have
            yet is added to it.
          </Text>
          <CompanyChoice companies={companies} companyId={companyId} onChange={setCompanyId} />
          <FilePicker label="Choose a file" accept=".json,application/json" busy={isBusy} onPick={pick} />
          {refusal ? <Refused refusal={refusal} /> : null}
        </View>
      )}
    </Dialog>
  )
}

interface Importing {
  readonly pick: (file: File) => void
  readonly isBusy: boolean
  readonly refusal: Refusal | null
  readonly leftOut: readonly string[]
  /** Given once the job is made and something of the file was left out. */
  readonly openJob: (() => void) | null
}

function useImport({ companyId, onClose }: { companyId: string; onClose: () => void }): Importing {
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const [isReading, setReading] = useState(false)
  const [refusal, setRefusal] = useState<Refusal | null>(null)
  const send = useMutation(trpc.job.importLayout.mutationOptions())
  const openMade = (jobId: string) => {
    onClose()
    router.push(`/jobs/${jobId}`)
  }
  const run = async (file: File) => {
    setRefusal(null)
    setReading(true)
    try {
      const read = await readFile(file)
      if ('words' in read) return setRefusal(read)
      const made = await send.mutateAsync({ companyId, layout: read })
      await queryClient.invalidateQueries(trpc.job.list.queryFilter())
      if (made.leftOut.length === 0) openMade(made.jobId)
    } catch (error) {
      setRefusal(refusalOf(error, file))
    } finally {
      setReading(false)
    }
  }
  const made = send.data
  return {
    pick: (file) => void run(file),
    isBusy: isReading,
    refusal,
    leftOut: made?.leftOut ?? [],
    openJob: made && made.leftOut.length > 0 ? () => openMade(made.jobId) : null,
  }
}

/** The reader of layout files comes with the work chunk: the list of jobs does without it. */
async function readFile(file: File): Promise<Refusal | LayoutFile> {
  if (file.size > FILE_MAX) return { words: 'This file is larger than 8 MB. Nothing was stored.', problems: [] }
  const { readLayoutText } = await behindJobs(() => import('@/features/work'))
  const read = readLayoutText(await file.text())
  return read.ok ? read.layout : { words: notTaken(file), problems: read.problems.filter(isRefused) }
}

function refusalOf(error: unknown, file: File): Refusal {
  const { sentence, problems } = failureOf(error)
  return { words: problems.length > 0 ? notTaken(file) : `${sentence} Nothing was stored.`, problems }
}

function Refused({ refusal: { words, problems } }: { refusal: Refusal }) {
  return (
    <View style={styles.problems}>
      <Banner tone="over" words={words} isUrgent />
      {problems.length > 0 ? (
        <View role="list" aria-label="Problems of the file">
          {problems.map(({ field, message }, index) => (
            <View key={`${field} ${index}`} role="listitem" style={styles.problem}>
              <Text kind="figureStrong">{field}</Text>
              <Text>{message}</Text>
            </View>
          ))}
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  all: { gap: space.l },
  problems: { gap: space.s },
  problem: { paddingVertical: space.s, borderBottomWidth: 1, borderColor: colour.rule },
})
