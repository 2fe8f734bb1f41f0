import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const PanScreen = lazy(() =>
  behindJobs(() => import('@/features/pan/pan-screen')).then((pan) => ({ default: pan.PanScreen })),
)

export default function PanRoute() {
  const { jobId, panId } = useLocalSearchParams<{ jobId: string; panId: string }>()
  return <PanScreen jobId={jobId} panId={panId} />
}
