import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const PanScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.PanScreen })))

export default function PanRoute() {
  const { jobId, panId } = useLocalSearchParams<{ jobId: string; panId: string }>()
  return <PanScreen jobId={jobId} panId={panId} />
}
