import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const JobScreen = lazy(() => behindJobs(() => import('@/features/work')).then((work) => ({ default: work.JobScreen })))

export default function JobRoute() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>()
  return <JobScreen jobId={jobId} />
}
