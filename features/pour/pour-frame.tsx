import type { PourData } from '@wedgeline/contract'
import type { ReactNode } from 'react'
import { Failed } from '@/components/ui/states'
import { NavBar } from '@/components/ui/nav-bar'
import { Screen } from '@/components/ui/screen'
import type { Counts } from '../checks/counts'
import { StatusMarks } from '../checks/status-counts'
import { useJobDraft, type JobDraft } from '../editing/job-draft'
import { SaveState } from '../editing/save-state'
import { UnfiledNotice } from '../quick-edge/unfiled-notice'

export type PourPage = 'plan' | 'zones' | 'schedule'

export interface PourFrameProps {
  readonly pourId: string
  readonly page: PourPage
  readonly counts?: Counts | undefined
  readonly actions?: ReactNode
  readonly children: (pour: PourData) => ReactNode
}

const PAGE_WORDS: Readonly<Record<PourPage, string>> = { plan: '', zones: ', zones', schedule: ', bar schedule' }

/** What the pages of one pour have in common: its name, how it stands, its own bar, and that it is there at all. */
export function PourFrame({ pourId, page, counts, actions, children }: PourFrameProps) {
  const job = useJobDraft()
  const { jobId, layout } = job
  const pour = layout.pours.find(({ id }) => id === pourId)
  const parents = jobParents(job)
  if (!pour) {
    return (
      <Screen title="Pour" parents={parents}>
        <Failed
          what="This pour is not in the job."
          advice="It may have been removed, or an undo took it back. Go to the job and pick another."
        />
      </Screen>
    )
  }
  const base = `/jobs/${jobId}/pours/${pourId}` as const
  return (
    <Screen
      title={`Pour ${pour.mark}${PAGE_WORDS[page]}`}
      parents={page === 'plan' ? parents : [...parents, { label: `Pour ${pour.mark}`, href: base }]}
      summary={<Summary counts={counts} />}
      actions={actions}
      nav={
        <NavBar
          label={`Pages of pour ${pour.mark}`}
          items={[
            { href: base, label: 'Plan', isHere: page === 'plan' },
            { href: `${base}/zones`, label: 'Zones', isHere: page === 'zones' },
            { href: `${base}/schedule`, label: 'Schedule', isHere: page === 'schedule' },
          ]}
        />
      }
    >
      <UnfiledNotice />
      {children(pour)}
    </Screen>
  )
}

/** The pages above every page of a job's pours. */
export const jobParents = ({ jobId, layout }: Pick<JobDraft, 'jobId' | 'layout'>) =>
  [
    { label: 'Jobs', href: '/' },
    { label: layout.job.title, href: `/jobs/${jobId}` },
  ] as const

function Summary({ counts }: Pick<PourFrameProps, 'counts'>) {
  return (
    <>
      {counts ? <StatusMarks counts={counts} /> : null}
      <SaveState />
    </>
  )
}
