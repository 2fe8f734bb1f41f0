import type { ReactNode, Ref } from 'react'
import type { GestureResponderEvent, View } from 'react-native'
import { Pressable, StyleSheet } from 'react-native'
import { colour, space, TARGET, useTargetHeight } from '@/components/theme'
import type { Path } from './follow'
import { follow } from './follow'
import { Text } from './text'

export interface ButtonProps {
  label: string
  /** `main` is the one main action of a screen; `quiet` has no box. */
  kind?: 'main' | 'ordinary' | 'quiet'
  onPress?: ((event: GestureResponderEvent) => void) | undefined
  /** A page of the product: the button is then a link and opens in a new tab where that is asked for. */
  href?: Path | undefined
  /** A file that the server sends: the button is then a plain link that downloads. */
  fileHref?: string | undefined
  disabled?: boolean | undefined
  /** The action is under way: pressing again does nothing and the label says so. */
  busy?: boolean | undefined
  /** Stands before the label, or alone with `iconOnly`; the label is then read out. */
  icon?: ReactNode
  iconOnly?: boolean | undefined
  /** Height of the walk's answers. */
  large?: boolean | undefined
  id?: string | undefined
  ref?: Ref<View> | undefined
  'aria-expanded'?: boolean | undefined
  'aria-haspopup'?: 'menu' | 'dialog' | undefined
  'aria-controls'?: string | undefined
  'aria-describedby'?: string | undefined
  'aria-pressed'?: boolean | undefined
}

/** A thing to press. Rust is kept for the main action. */
export function Button(props: ButtonProps) {
  const { label, kind = 'ordinary', onPress, href, fileHref, disabled, busy, icon, iconOnly, large, ...rest } = props
  const target = useTargetHeight()
  const height = large ? TARGET.walk : target
  const off = Boolean(disabled || busy)
  const link = fileHref ?? href
  return (
    <Pressable
      {...rest}
      {...(link ? { href: link, role: 'link' as const } : { role: 'button' as const })}
      {...(fileHref ? { hrefAttrs: { download: true } } : {})}
      {...(iconOnly ? { 'aria-label': label } : {})}
      {...(busy ? { 'aria-busy': true } : {})}
      disabled={off}
      onPress={(event) => {
        onPress?.(event)
        if (href) follow(event, href)
      }}
      style={(state) => [
        styles.box,
        { minHeight: height, minWidth: height, paddingHorizontal: iconOnly ? 0 : large ? space.l : space.m },
        styles[kind],
        state.hovered && !off && styles[`${kind}Over`],
        state.pressed && !off && styles.pressed,
        off && styles.off,
      ]}
    >
      {icon}
      {iconOnly ? null : (
        <Text kind="strong" numberOfLines={2} tone={off ? 'soft' : kind === 'main' ? 'onRust' : 'ink'}>
          {busy ? `${label} …` : label}
        </Text>
      )}
    </Pressable>
  )
}

const styles = StyleSheet.create({
  box: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.s,
    borderWidth: 1,
    borderColor: 'transparent',
  },
  main: { backgroundColor: colour.rust, borderColor: colour.rust },
  mainOver: { borderColor: colour.ink },
  ordinary: { backgroundColor: colour.input, borderColor: colour.ink },
  ordinaryOver: { backgroundColor: colour.wash },
  quiet: {},
  quietOver: { backgroundColor: colour.wash },
  pressed: { opacity: 0.75 },
  off: { backgroundColor: 'transparent', borderColor: colour.line, borderStyle: 'dashed' },
})
