import { STATUS_WORDS } from '@wedgeline/engine/result'
import { StyleSheet, View } from 'react-native'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { space } from '@/components/theme'
import { statusesIn, type Counts } from './counts'

interface StatusMarksProps {
  readonly counts: Counts
  /** Figures alone, for a narrow screen; the words are still read out. */
  readonly isShort?: boolean
}

/** How many stand at each status, worst first, each with its mark; a status that nothing has is left out. */
export function StatusMarks({ counts, isShort = false }: StatusMarksProps) {
  return statusesIn(counts).map((status) => (
    <StatusMark
      key={status}
      status={status}
      words={isShort ? String(counts[status]) : `${counts[status]} ${STATUS_WORDS[status]}`}
    />
  ))
}

/** The same as a line of its own, which also says where nothing is checked. */
export function StatusLine({ counts }: Pick<StatusMarksProps, 'counts'>) {
  if (statusesIn(counts).length === 0) return <Text tone="soft">nothing checked yet</Text>
  return (
    <View style={styles.line}>
      <StatusMarks counts={counts} />
    </View>
  )
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l, rowGap: space.xs, flexShrink: 1, minWidth: 0 },
})
