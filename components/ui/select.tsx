import { useState } from 'react'
import { Pressable, StyleSheet } from 'react-native'
import { space, TARGET } from '@/components/theme'
import { Button } from './button'
import { Dialog } from './dialog'
import type { FieldProps } from './field'
import { Field } from './field'
import { Text } from './text'

export interface Option<Value extends string> {
  readonly value: Value
  readonly label: string
  readonly disabled?: boolean
}

export interface SelectProps<Value extends string> extends FieldProps {
  options: readonly Option<Value>[]
  /** Null while nothing is chosen. */
  value: Value | null
  onChange: (value: Value) => void
  placeholder?: string | undefined
  disabled?: boolean | undefined
}

/** One of a few, chosen from a list that opens over the screen. */
export function Select<Value extends string>(props: SelectProps<Value>) {
  const { options, value, onChange, placeholder, disabled, ...field } = props
  const [isOpen, setOpen] = useState(false)
  const chosen = options.find((option) => option.value === value)
  return (
    <Field {...field}>
      {(wiring) => (
        <>
          <Button
            id={wiring.id}
            label={chosen?.label ?? placeholder ?? 'Choose'}
            disabled={disabled}
            onPress={() => setOpen(true)}
          />
          <Dialog title={field.label} isOpen={isOpen} onClose={() => setOpen(false)}>
            {options.map((option) => (
              <Pressable
                key={option.value}
                role="radio"
                aria-checked={option.value === value}
                disabled={option.disabled ?? false}
                style={styles.option}
                onPress={() => {
                  setOpen(false)
                  onChange(option.value)
                }}
              >
                <Text kind={option.value === value ? 'strong' : 'body'}>{option.label}</Text>
              </Pressable>
            ))}
          </Dialog>
        </>
      )}
    </Field>
  )
}

const styles = StyleSheet.create({
  option: { minHeight: TARGET.phone, justifyContent: 'center', paddingHorizontal: space.s },
})
