import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const HardwareScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.HardwareScreen })))

export default function HardwareRoute() {
  const { companyId, hardwareId } = useLocalSearchParams<{ companyId: string; hardwareId: string }>()
  return <HardwareScreen companyId={companyId} hardwareId={hardwareId} />
}
