import { Slot } from 'expo-router'
import { WorkLayout } from '@/features/shell/work-layout'

export default function SignedInLayout() {
  return (
    <WorkLayout>
      <Slot />
    </WorkLayout>
  )
}
