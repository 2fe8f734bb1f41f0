import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const JobBasisScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.JobBasisScreen })))

export default function JobBasisRoute() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>()
  return <JobBasisScreen jobId={jobId} />
}
