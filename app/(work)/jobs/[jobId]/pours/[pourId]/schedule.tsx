import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const ScheduleScreen = lazy(() =>
  behindJobs(() => import('@/features/work')).then((work) => ({ default: work.ScheduleScreen })),
)

export default function ScheduleRoute() {
  const { jobId, pourId } = useLocalSearchParams<{ jobId: string; pourId: string }>()
  return <ScheduleScreen jobId={jobId} pourId={pourId} />
}
