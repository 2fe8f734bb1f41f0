import { Slot } from 'expo-router'
import { CrashScreen } from '@/features/shell/crash-screen'
import { Providers } from '@/features/shell/providers'

export const ErrorBoundary = CrashScreen

export default function RootLayout() {
  return (
    <Providers>
      <Slot />
    </Providers>
  )
}
