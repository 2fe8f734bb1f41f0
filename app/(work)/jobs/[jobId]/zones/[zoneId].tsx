import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const CalculationScreen = lazy(() =>
  behindJobs(() => import('@/features/work')).then((work) => ({ default: work.CalculationScreen })),
)

export default function CalculationRoute() {
  const { jobId, zoneId } = useLocalSearchParams<{ jobId: string; zoneId: string }>()
  return <CalculationScreen jobId={jobId} zoneId={zoneId} />
}
