import { lazy } from 'react'

const MethodsScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.MethodsScreen })))

export default function MethodsRoute() {
  return <MethodsScreen />
}
