import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Icon } from './icon'
import { Text } from './text'

export interface BannerProps {
  tone?: 'info' | 'near' | 'over'
  /** One or two whole sentences. */
  words: string
  actions?: ReactNode
  /** It came up by itself and has to be heard at once. */
  isUrgent?: boolean
}

/** Something about the whole page that stays as long as it is so. */
export function Banner({ tone = 'info', words, actions, isUrgent }: BannerProps) {
  const line = tone === 'info' ? colour.ink : colour[tone]
  return (
    <View style={[styles.box, { borderColor: line }]} {...(isUrgent ? { role: 'alert' as const } : {})}>
      <Icon name={tone} colour={line} size={18} />
      <Text style={styles.words}>{words}</Text>
      {actions ? <View style={styles.actions}>{actions}</View> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  box: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space.s,
    paddingVertical: space.s,
    paddingHorizontal: space.m,
    borderTopWidth: 1,
    borderBottomWidth: 1,
    borderLeftWidth: 4,
    borderRightWidth: 1,
    backgroundColor: colour.sheet,
  },
  words: { flex: 1, minWidth: 200 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
})
