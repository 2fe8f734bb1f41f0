import { useQuery } from '@tanstack/react-query'
import type { Status } from '@wedgeline/engine'
import { useEffect, useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space, useWide } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Link } from '@/components/ui/link'
import { Screen, Section } from '@/components/ui/screen'
import { Empty, Failed, Waiting } from '@/components/ui/states'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { behindJobs } from '@/lib/behind-jobs'
import { failureOf } from '@/lib/failure'
import { useSession, type Me } from '@/lib/session'
import { useTRPC } from '@/lib/trpc'
import type { Counts } from '../checks/counts'
import { StatusLine } from '../checks/status-counts'
import { ImportDialog } from './import-dialog'
import { NewJobDialog } from './new-job-dialog'
import { worstFirst } from './worst-first'

export interface JobInList {
  readonly id: string
  readonly companyName: string
  readonly number: string
  readonly title: string
  /** A quick edge that is in no job yet. */
  readonly isUnfiled: boolean
  readonly readingsProposed: number
  readonly pours: readonly PourInList[]
}

interface PourInList {
  readonly id: string
  readonly mark: string
  readonly title: string
  readonly anchors: number
  readonly counts: Counts
  /** Of a quick edge: the check that comes first. */
  readonly worst: { readonly zone: string; readonly check: string; readonly status: Status } | null
}

type Asked = 'new' | 'import' | null

/** What waits for this person: the jobs that they are on, the worst one first. */
export function JobsScreen() {
  const trpc = useTRPC()
  const session = useSession()
  const [asked, setAsked] = useState<Asked>(null)
  const jobs = useQuery(trpc.job.list.queryOptions(undefined, { meta: { keep: true } }))
  useWorkFetched(jobs.isSuccess)
  const companies = session.state === 'in' ? session.me.companies : []
  const own = companies.filter(({ roles }) => roles.some((role) => role === 'detailer' || role === 'engineer'))
  return (
    <Screen
      title="Jobs"
      actions={
        own.length > 0 ? (
          <>
            <Button label="Quick edge" href="/quick-edge" />
            <Button label="Import a layout" icon={<Icon name="upload" />} onPress={() => setAsked('import')} />
            <Button kind="main" label="New job" onPress={() => setAsked('new')} />
          </>
        ) : null
      }
    >
      {jobs.data ? (
        <JobList jobs={jobs.data} companies={companies} canMake={own.length > 0} onNew={() => setAsked('new')} />
      ) : jobs.error ? (
        <Failed
          what="The jobs could not be fetched."
          advice={failureOf(jobs.error).sentence}
          onRetry={() => void jobs.refetch()}
        />
      ) : (
        <Waiting what="the jobs" />
      )}
      {asked === 'new' ? <NewJobDialog companies={own} onClose={() => setAsked(null)} /> : null}
      {asked === 'import' ? <ImportDialog companies={own} onClose={() => setAsked(null)} /> : null}
    </Screen>
  )
}

/** Everything behind the jobs is fetched once they have painted, so that the first press on one is quick. */
function useWorkFetched(hasPainted: boolean): void {
  useEffect(() => {
    if (!hasPainted) return
    // Without the network the page that is opened asks again, and says so.
    const timer = setTimeout(() => void behindJobs(() => import('@/features/work')).catch(() => undefined), 300)
    return () => clearTimeout(timer)
  }, [hasPainted])
}

interface JobListProps {
  readonly jobs: readonly JobInList[]
  readonly companies: Me['companies']
  readonly canMake: boolean
  readonly onNew: () => void
}

function JobList({ jobs, companies, canMake, onNew }: JobListProps) {
  const quick = jobs.filter(({ isUnfiled }) => isUnfiled)
  const filed = jobs.filter(({ isUnfiled }) => !isUnfiled)
  if (jobs.length > 0) {
    return (
      <>
        {filed.length > 0 ? (
          <View role="list" aria-label="Jobs">
            {worstFirst(filed, ({ pours }) => pours).map((job) => (
              <JobEntry key={job.id} job={job} hasCompany={companies.length > 1} />
            ))}
          </View>
        ) : null}
        {quick.length > 0 ? <QuickEdges jobs={quick} hasCompany={companies.length > 1} /> : null}
      </>
    )
  }
  if (companies.length === 0) {
    return (
      <Empty
        what="You are in no company at present."
        firstStep="An admin of a company sends you an invitation; open its link while you are signed in here."
      />
    )
  }
  return canMake ? (
    <Empty
      what="You are on no job yet."
      firstStep="Begin one with its number and title, or import a layout file."
      action={<Button label="Begin a job" onPress={onNew} />}
    />
  ) : (
    <Empty
      what="You are on no job yet."
      firstStep="A detailer or engineer who is on a job adds you to its people; it then stands here."
    />
  )
}

/** Edges that somebody kept without a job; those with the worst check first. */
function QuickEdges({ jobs, hasCompany }: { readonly jobs: readonly JobInList[]; readonly hasCompany: boolean }) {
  const isWide = useWide()
  return (
    <Section title="Quick edges, not yet filed">
      <View role="list" aria-label="Quick edges, not yet filed">
        {worstFirst(jobs, ({ pours }) => pours).map(({ id, number, title, companyName, pours }) => (
          <View key={id} role="listitem" style={[styles.pour, !isWide && styles.pourNarrow]}>
            <Link href={`/jobs/${id}`} style={styles.mark}>{`${number}  ${title}`}</Link>
            <Text tone="soft" style={styles.anchors}>
              {[anchorsText(pours.reduce((sum, { anchors }) => sum + anchors, 0)), hasCompany ? companyName : '']
                .filter(Boolean)
                .join(', ')}
            </Text>
            <QuickWorst pours={pours} />
          </View>
        ))}
      </View>
      <Text kind="small" tone="soft">
        Statuses are on readings that nobody has accepted.
      </Text>
    </Section>
  )
}

const anchorsText = (anchors: number): string => `${anchors} ${anchors === 1 ? 'anchor' : 'anchors'}`

function QuickWorst({ pours }: Pick<JobInList, 'pours'>) {
  const [pour] = worstFirst(pours, (each) => [each])
  if (!pour) return <Text tone="soft">no pour left</Text>
  const { worst, counts } = pour
  if (!worst) return <StatusLine counts={counts} />
  return <StatusMark status={worst.status} words={`${worst.zone}: ${worst.check}`} />
}

function JobEntry({ job, hasCompany }: { job: JobInList; hasCompany: boolean }) {
  const { id, number, title, pours, readingsProposed, companyName } = job
  const isWide = useWide()
  return (
    <View role="listitem" style={styles.job}>
      <View style={styles.head}>
        <Text kind="heading" level={2}>
          <Link kind="heading" href={`/jobs/${id}`} style={styles.name}>{`${number}  ${title}`}</Link>
        </Text>
        {hasCompany ? <Text tone="soft">{companyName}</Text> : null}
        {readingsProposed > 0 ? (
          <View style={styles.readings}>
            <Icon name="needs-judgement" />
            <Text>{`${readingsProposed} ${readingsProposed === 1 ? 'reading waits' : 'readings wait'} for an engineer`}</Text>
          </View>
        ) : null}
      </View>
      {pours.length === 0 ? <Text tone="soft">No pour yet.</Text> : null}
      {worstFirst(pours, (pour) => [pour]).map((pour) => (
        <View key={pour.id} style={[styles.pour, !isWide && styles.pourNarrow]}>
          <Link href={`/jobs/${id}/pours/${pour.id}`} style={styles.mark}>
            {pour.title ? `Pour ${pour.mark}, ${pour.title}` : `Pour ${pour.mark}`}
          </Link>
          <Text tone="soft" style={styles.anchors}>
            {`${anchorsText(pour.anchors)}, draft`}
          </Text>
          <StatusLine counts={pour.counts} />
        </View>
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  job: { gap: space.xs, paddingBottom: space.xl },
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: space.xl,
    rowGap: space.xs,
    borderBottomWidth: 1,
    borderColor: colour.ink,
    paddingBottom: space.xs,
  },
  name: { textDecorationLine: 'none', lineHeight: 28 },
  readings: { flexDirection: 'row', alignItems: 'center', gap: space.s },
  pour: {
    flexDirection: 'row',
    alignItems: 'center',
    columnGap: space.l,
    paddingVertical: 6,
    borderBottomWidth: 1,
    borderColor: colour.rule,
  },
  pourNarrow: { flexDirection: 'column', alignItems: 'flex-start', rowGap: space.xs, paddingVertical: space.s },
  mark: { minWidth: 220, lineHeight: 28 },
  anchors: { minWidth: 130 },
})
