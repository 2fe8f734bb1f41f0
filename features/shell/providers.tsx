import type { ReactNode } from 'react'
import { ThemeProvider } from '@/components/theme'
import { ToastProvider } from '@/components/ui/toast'
import { TrailProvider } from '@/components/ui/trail'

/** Everything that stands round the whole product, outermost first. */
export function Providers({ children }: { children: ReactNode }) {
  return (
    <ThemeProvider>
      <ToastProvider>
        <TrailProvider>{children}</TrailProvider>
      </ToastProvider>
    </ThemeProvider>
  )
}
