import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { useJobDraft, type JobDraft } from './job-draft'

/** How what was typed here stands: saved 10:42, saving, not sent. For the head of a screen. */
export function SaveState() {
  const { save, savedAtMs: atMs, layout } = useJobDraft()
  const isHeld = save === 'not-sent' || save === 'conflict' || save === 'refused'
  return (
    <View role="status" style={styles.line}>
      {isHeld ? <Icon name="near" /> : null}
      <Text kind="small" tone={isHeld ? 'ink' : 'soft'}>
        {save === 'saved' ? (atMs === null ? 'Saved' : `Saved ${clockText(atMs, layout.job.timeZone)}`) : WORDS[save]}
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

/** 10:42, in the job's time zone. */
const clockText = (atMs: number, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone }).format(atMs)

const styles = StyleSheet.create({ line: { flexDirection: 'row', alignItems: 'center', gap: space.xs } })
