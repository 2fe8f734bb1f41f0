import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const HardwareScreen = lazy(() =>
  behindJobs(() => import('@/features/office')).then((office) => ({ default: office.HardwareScreen })),
)

export default function HardwareRoute() {
  const { companyId, hardwareId } = useLocalSearchParams<{ companyId: string; hardwareId: string }>()
  return <HardwareScreen companyId={companyId} hardwareId={hardwareId} />
}
