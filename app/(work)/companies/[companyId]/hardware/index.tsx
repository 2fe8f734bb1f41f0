import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

const HardwareListScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.HardwareListScreen })))

export default function HardwareListRoute() {
  const { companyId } = useLocalSearchParams<{ companyId: string }>()
  return <HardwareListScreen companyId={companyId} />
}
