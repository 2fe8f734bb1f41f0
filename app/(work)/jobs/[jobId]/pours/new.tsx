import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const NewPourScreen = lazy(() =>
  behindJobs(() => import('@/features/work')).then((work) => ({ default: work.NewPourScreen })),
)

export default function NewPourRoute() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>()
  return <NewPourScreen jobId={jobId} />
}
