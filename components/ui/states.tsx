import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from './button'
import { Icon } from './icon'
import { Text } from './text'

/** While what the screen shows is on its way. `what` ends the sentence: `the pours of this job`. */
export function Waiting({ what }: { what: string }) {
  return (
    <View role="status" style={styles.state}>
      <Text tone="soft">{`Fetching ${what} …`}</Text>
    </View>
  )
}

export interface FailedProps {
  /** What did not work, as a sentence. */
  what: string
  /** Why, and what the person can do. */
  advice: string
  onRetry?: () => void
  actions?: ReactNode
}

/** What the screen shows could not be had. */
export function Failed({ what, advice, onRetry, actions }: FailedProps) {
  return (
    <View role="alert" style={[styles.state, styles.failed]}>
      <View style={styles.line}>
        <Icon name="over" colour={colour.over} />
        <Text kind="strong">{what}</Text>
      </View>
      <Text>{advice}</Text>
      <View style={styles.actions}>
        {onRetry ? <Button label="Try again" onPress={onRetry} /> : null}
        {actions}
      </View>
    </View>
  )
}

export interface EmptyProps {
  /** What is not there yet, as a sentence. */
  what: string
  /** The first step, as a sentence. */
  firstStep: string
  /** The button that takes it. */
  action?: ReactNode
}

/** There is nothing yet; says how to begin. */
export function Empty({ what, firstStep, action }: EmptyProps) {
  return (
    <View style={[styles.state, styles.empty]}>
      <Text kind="strong">{what}</Text>
      <Text tone="soft">{firstStep}</Text>
      {action ? <View style={styles.actions}>{action}</View> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  state: { gap: space.s, paddingVertical: space.l, alignItems: 'flex-start', maxWidth: 620 },
  failed: { borderLeftWidth: 4, borderColor: colour.over, paddingLeft: space.m, paddingVertical: space.xs },
  empty: { paddingVertical: space.xl },
  line: { flexDirection: 'row', alignItems: 'center', gap: space.s },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s, paddingTop: space.xs },
})
