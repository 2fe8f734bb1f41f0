import { useState } from 'react'
import { View } from 'react-native'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { useJobDraft } from '../editing/job-draft'
import { FileDialog } from './file-dialog'

/** Over every screen of a quick edge that is in no job yet: what that means, and how to file it. */
export function UnfiledNotice() {
  const { isUnfiled, canEdit } = useJobDraft()
  const [isFiling, setFiling] = useState(false)
  if (!isUnfiled) return null
  return (
    <View>
      <Banner
        tone="near"
        words="Quick edge, not filed. It runs on readings that nobody has accepted, and cannot be issued."
        actions={canEdit ? <Button label="Keep in a job" onPress={() => setFiling(true)} /> : null}
      />
      {isFiling ? <FileDialog onClose={() => setFiling(false)} /> : null}
    </View>
  )
}
