import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { StatusMark, STATUS_WORD } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { statusesIn, type Counts } from './worst-first'

/** How many checks have each status, worst first, each with its mark and word. */
export function StatusCounts({ counts }: { counts: Counts }) {
  const statuses = statusesIn(counts)
  if (statuses.length === 0) return <Text tone="soft">nothing checked yet</Text>
  return (
    <View style={styles.line}>
      {statuses.map((status) => (
        <StatusMark key={status} status={status} words={`${counts[status]} ${STATUS_WORD[status]}`} />
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l, rowGap: space.xs, flexShrink: 1, minWidth: 0 },
})
