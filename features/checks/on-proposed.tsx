import type { Check, ZoneResult } from '@wedgeline/engine'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'

export const READING_NOT_ACCEPTED = 'reading not accepted'

/** Whether the status shown is one on a reading that nobody has accepted, as in a quick edge. */
export const isOnProposed = (check: Check): boolean => check.kind === 'compared' && check.isOnProposed === true

/** How many of the checks stand on readings that are not accepted. */
export const countOnProposed = (zones: readonly ZoneResult[]): number =>
  zones.reduce((total, { checks }) => total + checks.filter(isOnProposed).length, 0)

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
