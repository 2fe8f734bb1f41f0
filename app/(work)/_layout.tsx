import { Slot } from 'expo-router'
import { WorkShell } from '@/features/shell/work-shell'

export default function WorkLayout() {
  return (
    <WorkShell account={null}>
      <Slot />
    </WorkShell>
  )
}
