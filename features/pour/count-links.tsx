import { STATUSES, STATUS_WORDS } from '@wedgeline/engine/result'
import type { Status } from '@wedgeline/engine'
import { Pressable, StyleSheet, View } from 'react-native'
import { colour, space, useTargetHeight } from '@/components/theme'
import { follow } from '@/components/ui/follow'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import type { Counts } from '../checks/counts'

export interface CountLinksProps {
  readonly jobId: string
  readonly pourId: string
  readonly counts: Counts
  /** Status that the page shows alone; undefined where the links lead to another page. */
  readonly chosen?: Status | null
}

/** Checks counted by status; each count leads to the zones with those checks alone. */
export function CountLinks({ jobId, pourId, counts, chosen }: CountLinksProps) {
  const minHeight = useTargetHeight()
  const shown = STATUSES.filter((status) => counts[status] > 0 || status === chosen)
  const base = `/jobs/${jobId}/pours/${pourId}/zones` as const
  if (shown.length === 0) return <Text tone="soft">No check is made in this pour yet.</Text>
  return (
    <View role="navigation" aria-label="Checks by status" style={styles.row}>
      {chosen === undefined ? null : (
        <Chip href={base} isChosen={chosen === null} minHeight={minHeight}>
          <Text kind={chosen === null ? 'strong' : 'body'}>all</Text>
        </Chip>
      )}
      {shown.map((status) => (
        <Chip key={status} href={`${base}?status=${status}`} isChosen={status === chosen} minHeight={minHeight}>
          <StatusMark status={status} words={`${counts[status]} ${STATUS_WORDS[status]}`} />
        </Chip>
      ))}
    </View>
  )
}

interface ChipProps {
  readonly href: `/jobs/${string}/pours/${string}/zones${string}`
  readonly isChosen: boolean
  readonly minHeight: number
  readonly children: React.ReactNode
}

function Chip({ href, isChosen, minHeight, children }: ChipProps) {
  return (
    <Pressable
      role="link"
      href={href}
      aria-current={isChosen ? 'true' : undefined}
      onPress={(event) => follow(event, href)}
      style={(state) => [styles.chip, { minHeight }, isChosen && styles.chosen, state.hovered && styles.over]}
    >
      {children}
    </Pressable>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
  chip: {
    justifyContent: 'center',
    paddingHorizontal: space.m,
    borderWidth: 1,
    borderColor: colour.line,
    backgroundColor: colour.sheet,
  },
  chosen: { borderColor: colour.ink, borderWidth: 2, paddingHorizontal: space.m - 1 },
  over: { backgroundColor: colour.wash },
})
