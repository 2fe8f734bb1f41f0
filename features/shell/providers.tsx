import type { ReactNode } from 'react'
import { ThemeProvider } from '@/components/theme'
import { ToastProvider } from '@/components/ui/toast'
import { TrailProvider } from '@/components/ui/trail'
import { DataProvider } from '@/lib/data-provider'

/** Everything that stands round the whole product, outermost first. */
export function Providers({ children }: { children: ReactNode }) {
  return (
    <ThemeProvider>
      <ToastProvider>
        <DataProvider>
          <TrailProvider>{children}</TrailProvider>
        </DataProvider>
      </ToastProvider>
    </ThemeProvider>
  )
}
