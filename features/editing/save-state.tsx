import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { useJobDraft, type JobDraft } from './job-draft'

/** How what was typed here stands: saved 10:42, saving, not sent. For the head of a screen. */
export function SaveState() {
  const job = useJobDraft()
  const { save } = job
  const atMs = useSavedAt(job)
  const isHeld = save === 'not-sent' || save === 'conflict' || save === 'refused'
  return (
    <View role="status" style={styles.line}>
      {isHeld ? <Icon name="near" /> : null}
      <Text kind="small" tone={isHeld ? 'ink' : 'soft'}>
        {save === 'saved'
          ? atMs === null
            ? 'Saved'
            : `Saved ${clockText(atMs, job.layout.job.timeZone)}`
          : WORDS[save]}
      </Text>
    </View>
  )
}

const WORDS: Readonly<Record<Exclude<JobDraft['save'], 'saved'>, string>> = {
  saving: 'Saving …',
  unsaved: 'Saving …',
  'not-sent': 'Not sent, kept on this device',
  conflict: 'Not saved: changed by two people',
  refused: 'Not saved',
}

/** When the last edit was confirmed while this screen was open; null while none was. */
function useSavedAt({ save }: Pick<JobDraft, 'save'>): number | null {
  const [before, setBefore] = useState(save)
  const [atMs, setAtMs] = useState<number | null>(null)
  if (save !== before) {
    setBefore(save)
    if (save === 'saved') setAtMs(Date.now())
  }
  return atMs
}

/** 10:42, in the job's time zone. */
const clockText = (atMs: number, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone }).format(atMs)

const styles = StyleSheet.create({ line: { flexDirection: 'row', alignItems: 'center', gap: space.xs } })
