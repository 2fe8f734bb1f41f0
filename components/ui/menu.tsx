import { router } from 'expo-router'
import type { ReactNode } from 'react'
import { useRef, useState } from 'react'
import type { WebKeyEvent } from './web-key-event'
import { Modal, Pressable, StyleSheet, useWindowDimensions, View } from 'react-native'
import { colour, space, useTargetHeight } from '@/components/theme'
import { Button } from './button'
import type { Path } from './follow'
import { follow } from './follow'
import { Icon } from './icon'
import { Text } from './text'

export interface MenuItem {
  readonly key: string
  readonly label: string
  readonly href?: Path
  readonly onPress?: () => void
  /** Given where the items are choices: a tick stands before the one that holds. */
  readonly isChosen?: boolean
  readonly disabled?: boolean
  /** A rule above: another group begins. */
  readonly startsGroup?: boolean
}

export interface MenuProps {
  label: string
  items: readonly MenuItem[]
  icon?: ReactNode
  iconOnly?: boolean
  kind?: 'ordinary' | 'quiet'
}

/** A button that opens a list of actions under itself. Arrows, Home, End and first letters move, Esc closes. */
export function Menu({ label, items, icon, iconOnly, kind = 'ordinary' }: MenuProps) {
  const [corner, setCorner] = useState<{ top: number; right: number } | null>(null)
  const trigger = useRef<View>(null)
  const { width } = useWindowDimensions()
  const open = () =>
    trigger.current?.measureInWindow((...box) => {
      const [left, top, wide, high] = box
      // The list hangs from the button's end and stays inside a narrow window.
      setCorner({ top: top + high + 2, right: Math.max(space.s, Math.min(width - left - wide, width - LIST_MIN)) })
    })
  const close = () => setCorner(null)
  return (
    <>
      <Button
        ref={trigger}
        {...{ label, icon, iconOnly, kind }}
        aria-haspopup="menu"
        aria-expanded={corner !== null}
        onPress={open}
      />
      <Modal visible={corner !== null} transparent animationType="none" onRequestClose={close} aria-label={label}>
        <View style={styles.over}>
          <View style={styles.beside} onClick={close} />
          <MenuList label={label} items={items} onClose={close} corner={corner ?? { top: 0, right: 0 }} />
        </View>
      </Modal>
    </>
  )
}

const LIST_MIN = 220

interface MenuListProps {
  label: string
  items: readonly MenuItem[]
  onClose: () => void
  corner: { top: number; right: number }
}

function MenuList({ label, items, onClose, corner }: MenuListProps) {
  const rows = useRef<(View | null)[]>([])
  const at = useRef(0)
  const minHeight = useTargetHeight()
  const go = (index: number) => {
    at.current = (index + items.length) % items.length
    rows.current[at.current]?.focus()
  }
  const onKeyDown = (event: WebKeyEvent) => {
    // Enter presses by itself; react-native-web leaves the space bar to buttons alone.
    const here = items[at.current]
    if (event.key === ' ' && here && !here.disabled) {
      event.preventDefault()
      onClose()
      here.onPress?.()
      if (here.href) router.push(here.href)
      return
    }
    const next = targetOf(event.key, at.current, items)
    if (next === null) return
    event.preventDefault()
    go(next)
  }
  return (
    <View role="menu" aria-label={label} style={[styles.list, corner]} onKeyDown={onKeyDown}>
      {items.map((item, index) => (
        <Pressable
          key={item.key}
          ref={(row) => {
            rows.current[index] = row
          }}
          {...(item.href ? { href: item.href } : {})}
          role="menuitem"
          aria-current={item.isChosen ? 'true' : undefined}
          disabled={item.disabled ?? false}
          onFocus={() => {
            at.current = index
          }}
          onPress={(event) => {
            onClose()
            item.onPress?.()
            if (item.href) follow(event, item.href)
          }}
          style={(state) => [
            styles.item,
            { minHeight },
            item.startsGroup && styles.group,
            (state.hovered || state.focused) && styles.under,
          ]}
        >
          {item.isChosen === undefined ? null : (
            <View style={styles.tick}>{item.isChosen ? <Icon name="check" size={14} /> : null}</View>
          )}
          <Text tone={item.disabled ? 'soft' : 'ink'}>{item.label}</Text>
        </Pressable>
      ))}
    </View>
  )
}

/** Index that a key moves to; null where the key is none of the menu's. */
function targetOf(key: string, at: number, items: readonly MenuItem[]): number | null {
  if (key === 'ArrowDown') return at + 1
  if (key === 'ArrowUp') return at - 1
  if (key === 'Home') return 0
  if (key === 'End') return items.length - 1
  if (key.length !== 1 || key === ' ') return null
  const begins = (item: MenuItem) => item.label.toLowerCase().startsWith(key.toLowerCase())
  const after = items.findIndex((item, index) => index > at && begins(item))
  const found = after >= 0 ? after : items.findIndex(begins)
  return found >= 0 ? found : null
}

const styles = StyleSheet.create({
  over: { flex: 1 },
  beside: { position: 'absolute', top: 0, right: 0, bottom: 0, left: 0 },
  list: {
    position: 'absolute',
    minWidth: LIST_MIN,
    maxWidth: '100%',
    backgroundColor: colour.sheet,
    borderWidth: 1,
    borderColor: colour.ink,
    paddingVertical: space.xs,
  },
  item: { flexDirection: 'row', alignItems: 'center', gap: space.s, paddingHorizontal: space.m },
  group: { borderTopWidth: 1, borderColor: colour.rule },
  under: { backgroundColor: colour.wash },
  tick: { width: 16 },
})
