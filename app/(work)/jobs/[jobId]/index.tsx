import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const JobScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.JobScreen })))

export default function JobRoute() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>()
  return <JobScreen jobId={jobId} />
}
