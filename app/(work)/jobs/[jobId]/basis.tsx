import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const JobBasisScreen = lazy(() =>
  behindJobs(() => import('@/features/work')).then((work) => ({ default: work.JobBasisScreen })),
)

export default function JobBasisRoute() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>()
  return <JobBasisScreen jobId={jobId} />
}
