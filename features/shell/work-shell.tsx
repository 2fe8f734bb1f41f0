import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'
import { SkipLink } from '@/components/ui/skip-link'
import type { Account } from './header'
import { Header } from './header'

/** The signed-in frame round a screen. */
export function WorkShell({ account, children }: { account: Account | null; children: ReactNode }) {
  return (
    <View style={styles.shell}>
      <SkipLink />
      <Header account={account} />
      {children}
    </View>
  )
}

const styles = StyleSheet.create({ shell: { flex: 1, minWidth: 0 } })
