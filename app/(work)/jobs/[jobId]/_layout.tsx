import { Slot, useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const OpenJob = lazy(() => behindJobs(() => import('@/features/work')).then((work) => ({ default: work.OpenJob })))

export default function JobLayout() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>()
  return (
    <OpenJob jobId={jobId}>
      <Slot />
    </OpenJob>
  )
}
