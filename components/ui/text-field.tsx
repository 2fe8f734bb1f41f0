import type { Ref } from 'react'
import type { TextInputProps } from 'react-native'
import { StyleSheet, TextInput } from 'react-native'
import { colour, font, space, useTargetHeight, useWide } from '@/components/theme'
import type { FieldProps } from './field'
import { Field } from './field'

export interface TextFieldProps extends FieldProps {
  value: string
  onChangeText: (text: string) => void
  onBlur?: (() => void) | undefined
  /** Called on Enter. */
  onEnter?: (() => void) | undefined
  multiline?: boolean | undefined
  rows?: number | undefined
  secret?: boolean | undefined
  disabled?: boolean | undefined
  autoFocus?: boolean | undefined
  autoComplete?: TextInputProps['autoComplete']
  inputMode?: TextInputProps['inputMode']
  maxLength?: number | undefined
  ref?: Ref<TextInput> | undefined
}

/** One line or a paragraph of text. */
export function TextField(props: TextFieldProps) {
  const { label, unit, hint, usual, error, note, required, ...rest } = props
  return (
    <Field {...{ label, unit, hint, usual, error, note, required }}>
      {(wiring) => <TextBox {...rest} wiring={wiring} isUnreadable={Boolean(error)} />}
    </Field>
  )
}

interface TextBoxProps extends Omit<TextFieldProps, keyof FieldProps> {
  wiring: TextInputProps
  isUnreadable: boolean
}

function TextBox({ wiring, isUnreadable, onEnter, secret, disabled, multiline, rows = 3, ...rest }: TextBoxProps) {
  const box = useBoxStyle()
  return (
    <TextInput
      {...wiring}
      {...rest}
      {...(multiline ? { multiline, numberOfLines: rows } : { submitBehavior: 'submit' as const })}
      {...(onEnter && !multiline ? { onSubmitEditing: onEnter } : {})}
      secureTextEntry={secret ?? false}
      editable={!disabled}
      autoCapitalize={secret || rest.inputMode === 'email' ? 'none' : 'sentences'}
      style={[box, multiline && styles.paragraph, isUnreadable && boxStyle.unreadable, disabled && boxStyle.off]}
    />
  )
}

/** The look of a box to type in, for the width of this window. */
export function useBoxStyle() {
  const minHeight = useTargetHeight()
  // Below 16 px a phone zooms in on a field that gets the keyboard.
  const fontSize = useWide() ? 15 : 16
  return [boxStyle.box, { minHeight, fontSize }]
}

export const boxStyle = StyleSheet.create({
  box: {
    fontFamily: font.text,
    fontVariant: ['tabular-nums'],
    color: colour.ink,
    backgroundColor: colour.input,
    borderWidth: 1,
    borderColor: colour.ink,
    borderRadius: 0,
    paddingHorizontal: space.s,
    paddingVertical: 3,
    minWidth: 0,
  },
  unreadable: { borderColor: colour.over, borderWidth: 2, paddingHorizontal: space.s - 1, paddingVertical: 2 },
  off: { backgroundColor: 'transparent', borderColor: colour.line, color: colour.soft },
})

const styles = StyleSheet.create({ paragraph: { paddingVertical: space.s, lineHeight: 21 } })
