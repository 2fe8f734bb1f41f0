import type { ReactNode } from 'react'
import { useId, useRef } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'
import { colour, space, useTargetHeight } from '@/components/theme'
import { Text } from './text'
import type { WebKeyEvent } from './web-key-event'

export interface Tab<Key extends string> {
  readonly key: Key
  readonly label: string
}

export interface TabsProps<Key extends string> {
  /** Names the set of tabs; read out. */
  label: string
  tabs: readonly Tab<Key>[]
  selected: Key
  onSelect: (key: Key) => void
  /** What belongs to the selected tab. */
  children: ReactNode
}

/** Parts of one page, one shown at a time. Arrows, Home and End move. For pages with a path of their own: NavBar. */
export function Tabs<Key extends string>({ label, tabs, selected, onSelect, children }: TabsProps<Key>) {
  const id = useId()
  const rows = useRef<(View | null)[]>([])
  const minHeight = useTargetHeight()
  const at = tabs.findIndex((tab) => tab.key === selected)
  const onKeyDown = (event: WebKeyEvent) => {
    const next = movedTo(event.key, at, tabs.length)
    const tab = next === null ? undefined : tabs[next]
    if (next === null || !tab) return
    event.preventDefault()
    rows.current[next]?.focus()
    onSelect(tab.key)
  }
  return (
    <View style={styles.all}>
      <View role="tablist" aria-label={label} style={styles.list} onKeyDown={onKeyDown}>
        {tabs.map((tab, index) => (
          <Pressable
            key={tab.key}
            ref={(row) => {
              rows.current[index] = row
            }}
            role="tab"
            id={`${id}-${tab.key}`}
            aria-selected={tab.key === selected}
            aria-controls={tab.key === selected ? `${id}-panel` : undefined}
            tabIndex={tab.key === selected ? 0 : -1}
            onPress={() => onSelect(tab.key)}
            style={[barStyle.item, { minHeight }, tab.key === selected && barStyle.here]}
          >
            <Text kind={tab.key === selected ? 'strong' : 'body'} tone={tab.key === selected ? 'ink' : 'soft'}>
              {tab.label}
            </Text>
          </Pressable>
        ))}
      </View>
      <View role="tabpanel" id={`${id}-panel`} aria-labelledby={`${id}-${selected}`} tabIndex={0} style={styles.panel}>
        {children}
      </View>
    </View>
  )
}

function movedTo(key: string, at: number, count: number): number | null {
  switch (key) {
    case 'ArrowRight':
      return (at + 1) % count
    case 'ArrowLeft':
      return (at - 1 + count) % count
    case 'Home':
      return 0
    case 'End':
      return count - 1
    default:
      return null
  }
}

export const barStyle = StyleSheet.create({
  item: {
    justifyContent: 'center',
    paddingHorizontal: space.xs,
    borderBottomWidth: 2,
    borderColor: 'transparent',
  },
  here: { borderColor: colour.ink },
})

const styles = StyleSheet.create({
  all: { flexShrink: 1, minWidth: 0 },
  list: { flexDirection: 'row', gap: space.l, borderBottomWidth: 1, borderColor: colour.rule, flexWrap: 'wrap' },
  panel: { paddingTop: space.m },
})
