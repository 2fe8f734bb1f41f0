import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const EdgeScreen = lazy(() =>
  behindJobs(() => import('@/features/work')).then((work) => ({ default: work.EdgeScreen })),
)

export default function EdgeRoute() {
  const { jobId, edgeId } = useLocalSearchParams<{ jobId: string; edgeId: string }>()
  return <EdgeScreen jobId={jobId} edgeId={edgeId} />
}
