import { lazy } from 'react'
import { behindJobs } from '@/lib/behind-jobs'

const QuickEdgeScreen = lazy(() =>
  behindJobs(() => import('@/features/quick-edge/quick-edge-screen')).then((screen) => ({
    default: screen.QuickEdgeScreen,
  })),
)

export default function QuickEdgeRoute() {
  return <QuickEdgeScreen />
}
