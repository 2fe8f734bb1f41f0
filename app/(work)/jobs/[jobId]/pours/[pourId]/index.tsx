import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const PourScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.PourScreen })))

export default function PourRoute() {
  const { jobId, pourId } = useLocalSearchParams<{ jobId: string; pourId: string }>()
  return <PourScreen jobId={jobId} pourId={pourId} />
}
