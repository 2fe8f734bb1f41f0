import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const PeopleScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.PeopleScreen })))

export default function PeopleRoute() {
  const { companyId } = useLocalSearchParams<{ companyId: string }>()
  return <PeopleScreen companyId={companyId} />
}
