import type { ReactNode } from 'react'
import { StyleSheet } from 'react-native'
import { Text } from './text'

/** Words for people who listen to the page. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <Text style={styles.hidden}>{children}</Text>
}

const styles = StyleSheet.create({
  hidden: { position: 'absolute', width: 1, height: 1, margin: -1, overflow: 'hidden' },
})
