import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const CompanyScreen = lazy(() =>
  behindJobs(() => import('@/features/office')).then((office) => ({ default: office.CompanyScreen })),
)

export default function CompanyRoute() {
  const { companyId } = useLocalSearchParams<{ companyId: string }>()
  return <CompanyScreen companyId={companyId} />
}
