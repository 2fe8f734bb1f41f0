import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const CompanyScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.CompanyScreen })))

export default function CompanyRoute() {
  const { companyId } = useLocalSearchParams<{ companyId: string }>()
  return <CompanyScreen companyId={companyId} />
}
