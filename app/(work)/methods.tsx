import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const MethodsScreen = lazy(() =>
  behindJobs(() => import('@/features/office')).then((office) => ({ default: office.MethodsScreen })),
)

export default function MethodsRoute() {
  return <MethodsScreen />
}
