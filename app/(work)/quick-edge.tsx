import { lazy } from 'react'

const QuickEdgeScreen = lazy(() => import('@/features/work').then((work) => ({ default: work.QuickEdgeScreen })))

export default function QuickEdgeRoute() {
  return <QuickEdgeScreen />
}
