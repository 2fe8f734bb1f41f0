import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const HardwareListScreen = lazy(() =>
  behindJobs(() => import('@/features/office')).then((office) => ({ default: office.HardwareListScreen })),
)

export default function HardwareListRoute() {
  const { companyId } = useLocalSearchParams<{ companyId: string }>()
  return <HardwareListScreen companyId={companyId} />
}
