import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const PourScreen = lazy(() =>
  behindJobs(() => import('@/features/work')).then((work) => ({ default: work.PourScreen })),
)

export default function PourRoute() {
  const { jobId, pourId } = useLocalSearchParams<{ jobId: string; pourId: string }>()
  return <PourScreen jobId={jobId} pourId={pourId} />
}
