import type { ErrorBoundaryProps } from 'expo-router'
import { Button } from '@/components/ui/button'
import { Screen } from '@/components/ui/screen'
import { Failed } from '@/components/ui/states'

/** What stands in place of a screen that broke. Typed work is kept outside the screen and is still there. */
export function CrashScreen({ error, retry }: ErrorBoundaryProps) {
  return (
    <Screen title="This page has broken">
      <Failed
        what="Something went wrong that should not have."
        advice={`Your work is kept. Try again, or open the jobs and come back. What the program says: ${error.message}`}
        onRetry={() => void retry()}
        actions={<Button label="Jobs" href="/" />}
      />
    </Screen>
  )
}
