import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const NewPourScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.NewPourScreen })))

export default function NewPourRoute() {
  const { jobId } = useLocalSearchParams<{ jobId: string }>()
  return <NewPourScreen jobId={jobId} />
}
