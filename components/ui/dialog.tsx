import type { ReactNode } from 'react'
import { useId } from 'react'
import { Modal, ScrollView, StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from './button'
import { Text } from './text'

export interface DialogProps {
  title: string
  isOpen: boolean
  /** Called on Esc and on a press beside the dialog. */
  onClose: () => void
  children: ReactNode
  /** The way out and the main action, in that order; a Close button where not given. */
  actions?: ReactNode
}

/** A question over the page. Focus stays inside and goes back to where it was. */
export function Dialog({ title, isOpen, onClose, children, actions }: DialogProps) {
  const id = useId()
  return (
    <Modal visible={isOpen} transparent animationType="none" onRequestClose={onClose} aria-labelledby={id}>
      <View style={styles.over}>
        <View style={overlayStyle.backdrop} onClick={onClose} />
        <View style={styles.panel}>
          <Text kind="heading" level={2} id={id} style={styles.title}>
            {title}
          </Text>
          <ScrollView style={styles.body} contentContainerStyle={styles.content}>
            {children}
          </ScrollView>
          <View style={styles.actions}>{actions ?? <Button label="Close" onPress={onClose} />}</View>
        </View>
      </View>
    </Modal>
  )
}

export const overlayStyle = StyleSheet.create({
  backdrop: { position: 'absolute', top: 0, right: 0, bottom: 0, left: 0, backgroundColor: '#000', opacity: 0.45 },
})

const styles = StyleSheet.create({
  over: { flex: 1, alignItems: 'center', justifyContent: 'center', padding: space.l },
  panel: {
    width: '100%',
    maxWidth: 520,
    maxHeight: '100%',
    backgroundColor: colour.sheet,
    borderWidth: 1,
    borderColor: colour.ink,
  },
  title: { padding: space.l, paddingBottom: space.s },
  body: { flexGrow: 0, flexShrink: 1 },
  content: { paddingHorizontal: space.l, paddingVertical: space.xs, gap: space.m },
  actions: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'flex-end',
    gap: space.s,
    padding: space.l,
    paddingTop: space.m,
  },
})
