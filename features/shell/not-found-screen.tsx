import { Button } from '@/components/ui/button'
import { Screen } from '@/components/ui/screen'
import { Empty } from '@/components/ui/states'
import { WorkShell } from './work-shell'

/** An address that leads nowhere. */
export function NotFoundScreen() {
  return (
    <WorkShell account={null}>
      <Screen title="No such page">
        <Empty
          what="Nothing is kept at this address."
          firstStep="It may have been mistyped or moved. Start from the jobs."
          action={<Button kind="main" label="Jobs" href="/" />}
        />
      </Screen>
    </WorkShell>
  )
}
