import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const EdgeScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.EdgeScreen })))

export default function EdgeRoute() {
  const { jobId, edgeId } = useLocalSearchParams<{ jobId: string; edgeId: string }>()
  return <EdgeScreen jobId={jobId} edgeId={edgeId} />
}
