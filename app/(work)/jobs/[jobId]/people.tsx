import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const JobPeopleScreen = lazy(() =>
  behindJobs(() => import('@/features/work')).then((work) => ({ default: work.JobPeopleScreen })),
)

export default function JobPeopleRoute() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>()
  return <JobPeopleScreen jobId={jobId} />
}
