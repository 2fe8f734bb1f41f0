import { useId } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'
import { colour, space, useTargetHeight } from '@/components/theme'
import { Icon } from './icon'
import { Text } from './text'

export interface CheckboxProps {
  label: string
  hint?: string | undefined
  checked: boolean
  onChange: (checked: boolean) => void
  disabled?: boolean | undefined
}

/** Yes or no; the whole line can be pressed. */
export function Checkbox({ label, hint, checked, onChange, disabled }: CheckboxProps) {
  const minHeight = useTargetHeight()
  const id = useId()
  return (
    // react-native-web presses a checkbox on Enter alone; the space bar is the key for it, and must not scroll the page.
    <View
      onKeyDown={(event) => {
        if (event.key !== ' ' || disabled) return
        event.preventDefault()
        onChange(!checked)
      }}
    >
      <Pressable
        role="checkbox"
        aria-checked={checked}
        aria-labelledby={`${id}-label`}
        aria-describedby={hint ? `${id}-hint` : undefined}
        disabled={disabled ?? false}
        onPress={() => onChange(!checked)}
        style={[styles.row, { minHeight }]}
      >
        <View style={[styles.box, disabled && styles.off]}>{checked ? <Icon name="check" size={14} /> : null}</View>
        <View style={styles.words}>
          <Text id={`${id}-label`} tone={disabled ? 'soft' : 'ink'}>
            {label}
          </Text>
          {hint ? (
            <Text kind="small" tone="soft" id={`${id}-hint`}>
              {hint}
            </Text>
          ) : null}
        </View>
      </Pressable>
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: space.s },
  box: {
    width: 20,
    height: 20,
    borderWidth: 1,
    borderColor: colour.ink,
    backgroundColor: colour.input,
    alignItems: 'center',
    justifyContent: 'center',
  },
  off: { borderColor: colour.line, borderStyle: 'dashed', backgroundColor: 'transparent' },
  words: { flexShrink: 1, minWidth: 0 },
})
