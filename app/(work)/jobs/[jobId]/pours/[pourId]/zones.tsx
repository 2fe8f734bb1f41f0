import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const PourZonesScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.PourZonesScreen })))

export default function PourZonesRoute() {
  const { jobId, pourId } = useLocalSearchParams<{ jobId: string; pourId: string }>()
  return <PourZonesScreen jobId={jobId} pourId={pourId} />
}
