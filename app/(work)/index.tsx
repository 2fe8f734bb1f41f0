import { JobsScreen } from '@/features/jobs/jobs-screen'

export default function JobsRoute() {
  return <JobsScreen />
}
