import { Pressable, StyleSheet, View } from 'react-native'
import { space, useTargetHeight } from '@/components/theme'
import type { Path } from './follow'
import { follow } from './follow'
import { barStyle } from './tabs'
import { Text } from './text'

export interface NavItem {
  readonly href: Path
  readonly label: string
  readonly isHere: boolean
}

/** The pages that belong together, each with a path of its own. */
export function NavBar({ label, items }: { label: string; items: readonly NavItem[] }) {
  const minHeight = useTargetHeight()
  return (
    <View role="navigation" aria-label={label} style={styles.bar}>
      {items.map((item) => (
        <Pressable
          key={item.href}
          href={item.href}
          role="link"
          aria-current={item.isHere ? 'page' : undefined}
          onPress={(event) => follow(event, item.href)}
          style={[barStyle.item, { minHeight }, item.isHere && barStyle.here]}
        >
          <Text kind={item.isHere ? 'strong' : 'body'} tone={item.isHere ? 'ink' : 'soft'}>
            {item.label}
          </Text>
        </Pressable>
      ))}
    </View>
  )
}

const styles = StyleSheet.create({ bar: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l } })
