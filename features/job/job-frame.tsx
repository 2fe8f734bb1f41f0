import type { ReactNode } from 'react'
import { NavBar } from '@/components/ui/nav-bar'
import { Screen } from '@/components/ui/screen'
import { SaveState } from '../editing/save-state'
import { useJobDraft } from '../editing/job-draft'
import { UnfiledNotice } from '../quick-edge/unfiled-notice'

export type JobPage = 'job' | 'basis' | 'people'

export interface JobFrameProps {
  readonly page: JobPage
  readonly title: string
  readonly actions?: ReactNode
  readonly isNarrow?: boolean
  readonly children: ReactNode
}

/** What the pages of one job have in common: its name, how saving stands, and its own bar. */
export function JobFrame({ page, title, actions, isNarrow = false, children }: JobFrameProps) {
  const { jobId, layout } = useJobDraft()
  const jobs = { label: 'Jobs', href: '/' } as const
  const job = { label: layout.job.title, href: `/jobs/${jobId}` } as const
  return (
    <Screen
      title={title}
      parents={page === 'job' ? [jobs] : [jobs, job]}
      summary={<SaveState />}
      actions={actions}
      isNarrow={isNarrow}
      nav={
        <NavBar
          label="Pages of the job"
          items={[
            { href: `/jobs/${jobId}`, label: 'Job', isHere: page === 'job' },
            { href: `/jobs/${jobId}/basis`, label: 'Basis and settings', isHere: page === 'basis' },
            { href: `/jobs/${jobId}/people`, label: 'People', isHere: page === 'people' },
          ]}
        />
      }
    >
      <UnfiledNotice />
      {children}
    </Screen>
  )
}
