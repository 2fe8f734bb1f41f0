import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Menu } from '@/components/ui/menu'
import { useJobDraft } from '../editing/job-draft'
import { exportLayout } from './export-layout'
import { GridSection } from './grid-section'
import { JobFrame } from './job-frame'
import { LevelSection } from './level-section'
import { PeopleSection } from './people-section'
import { PourSection } from './pour-section'
import { ReadingSection } from './reading-section'
import { RenameDialog } from './rename-dialog'

/** One job: what stands in it, what waits for an engineer, and what all of its pours share. */
export function JobScreen({ jobId }: { jobId: string }) {
  const { layout, canEdit } = useJobDraft()
  const [isRenaming, setRenaming] = useState(false)
  const { number, title } = layout.job
  return (
    <JobFrame
      page="job"
      title={`${number}  ${title}`}
      actions={
        <>
          <Menu
            label="More"
            icon={<Icon name="more" />}
            items={[
              { key: 'export', label: 'Export the layout file', onPress: () => exportLayout(layout) },
              ...(canEdit
                ? [{ key: 'rename', label: 'Change number and title', onPress: () => setRenaming(true) }]
                : []),
            ]}
          />
          {canEdit ? <Button kind="main" label="Add a pour" href={`/jobs/${jobId}/pours/new`} /> : null}
        </>
      }
    >
      <PourSection />
      <ReadingSection />
      <GridSection />
      <LevelSection />
      <PeopleSection />
      {isRenaming ? <RenameDialog onClose={() => setRenaming(false)} /> : null}
    </JobFrame>
  )
}
