import type { ReactNode } from 'react'
import { useId, useState } from 'react'
import { Modal, Pressable, ScrollView, StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from './button'
import { overlayStyle } from './dialog'
import { Icon } from './icon'
import { Text } from './text'

export interface BottomSheetProps {
  title: string
  /** Stands under the title. */
  detail?: string | undefined
  isOpen: boolean
  onClose: () => void
  children: ReactNode
  /** Buttons in reach of the thumb, below what scrolls. */
  bar?: ReactNode
}

/** A sheet of a phone: rises to half the screen, leaves the drawing above in sight, and grows to the whole. */
export function BottomSheet({ title, detail, isOpen, onClose, children, bar }: BottomSheetProps) {
  const [isFull, setFull] = useState(false)
  const id = useId()
  return (
    <Modal visible={isOpen} transparent animationType="none" onRequestClose={onClose} aria-labelledby={id}>
      <View style={styles.over}>
        <View style={styles.above} onClick={onClose}>
          {isFull ? <View style={overlayStyle.backdrop} /> : null}
        </View>
        <View style={[styles.sheet, isFull ? styles.full : styles.half]}>
          <Pressable
            role="button"
            aria-label={isFull ? 'Half height' : 'Full height'}
            aria-expanded={isFull}
            style={styles.grip}
            onPress={() => setFull(!isFull)}
          >
            <View style={styles.handle} />
          </Pressable>
          <View style={styles.head}>
            <View style={styles.title}>
              <Text kind="title" level={2} id={id}>
                {title}
              </Text>
              {detail ? (
                <Text kind="small" tone="soft">
                  {detail}
                </Text>
              ) : null}
            </View>
            <Button label="Close" kind="quiet" iconOnly icon={<Icon name="close" />} onPress={onClose} />
          </View>
          <ScrollView style={styles.body} contentContainerStyle={styles.content}>
            {children}
          </ScrollView>
          {bar ? <View style={styles.bar}>{bar}</View> : null}
        </View>
      </View>
    </Modal>
  )
}

const styles = StyleSheet.create({
  over: { flex: 1 },
  above: { flex: 1 },
  sheet: { backgroundColor: colour.sheet, borderTopWidth: 2, borderColor: colour.ink },
  half: { height: '50%' },
  full: { height: '94%' },
  grip: { height: 24, flexShrink: 0, alignItems: 'center', justifyContent: 'center' },
  handle: { width: 44, height: 4, backgroundColor: colour.line },
  head: {
    flexShrink: 0,
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.s,
    paddingLeft: space.l,
    paddingRight: space.xs,
  },
  title: { flex: 1, minWidth: 0 },
  body: { flex: 1 },
  content: { padding: space.l, paddingTop: space.xs, gap: space.m },
  bar: { flexShrink: 0, flexDirection: 'row', borderTopWidth: 1, borderColor: colour.ink },
})
