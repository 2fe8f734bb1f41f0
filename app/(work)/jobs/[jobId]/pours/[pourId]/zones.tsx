import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const PourZonesScreen = lazy(() =>
  behindJobs(() => import('@/features/work')).then((work) => ({ default: work.PourZonesScreen })),
)

export default function PourZonesRoute() {
  const { jobId, pourId } = useLocalSearchParams<{ jobId: string; pourId: string }>()
  return <PourZonesScreen jobId={jobId} pourId={pourId} />
}
