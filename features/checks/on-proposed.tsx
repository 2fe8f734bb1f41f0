import type { Check } from '@wedgeline/engine'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { isOnProposed, READING_NOT_ACCEPTED } from './proposed'

/** The mark of such a check, beside its status. */
export function OnProposed({ check }: { readonly check: Check }) {
  if (!isOnProposed(check)) return null
  return (
    <View style={styles.row}>
      <Icon name="needs-judgement" size={12} colour={colour.soft} />
      <Text kind="small" tone="soft">
        {READING_NOT_ACCEPTED}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({ row: { flexDirection: 'row', alignItems: 'center', gap: space.xs } })
