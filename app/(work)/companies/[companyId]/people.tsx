import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const PeopleScreen = lazy(() =>
  behindJobs(() => import('@/features/office')).then((office) => ({ default: office.PeopleScreen })),
)

export default function PeopleRoute() {
  const { companyId } = useLocalSearchParams<{ companyId: string }>()
  return <PeopleScreen companyId={companyId} />
}
