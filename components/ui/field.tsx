import type { ReactNode } from 'react'
import { useId } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { FieldLabel } from './field-label'
import { Icon } from './icon'
import { Text } from './text'

/** What is usual here, in words, and where that comes from. */
export interface Usual {
  readonly range: string
  readonly source: string
}

export interface FieldProps {
  label: string
  unit?: string | undefined
  hint?: string | undefined
  usual?: Usual | undefined
  /** Why the text cannot be read and what would be right. Turns the box red, so it is never used for a check that fails. */
  error?: string | undefined
  /** What a check has to say about the value, with its choices. */
  note?: ReactNode
  required?: boolean | undefined
}

/** What the control inside a field has to carry. */
export interface Wiring {
  id: string
  'aria-labelledby': string
  'aria-describedby': string | undefined
  'aria-invalid': boolean
  'aria-required': boolean | undefined
}

/** Label, unit, hint, usual range and message round one control; the control takes its wiring from the argument. */
export function Field(props: FieldProps & { children: (wiring: Wiring) => ReactNode }) {
  const { label, unit, hint, usual, error, note, required, children } = props
  const id = useId()
  const described = [hint || usual ? `${id}-hint` : '', error ? `${id}-error` : '', note ? `${id}-note` : '']
    .filter(Boolean)
    .join(' ')
  return (
    <View style={styles.field}>
      <FieldLabel id={`${id}-label`} htmlFor={id}>
        {label}
        {unit ? `, ${unit}` : ''}
      </FieldLabel>
      {children({
        id,
        'aria-labelledby': `${id}-label`,
        'aria-describedby': described || undefined,
        'aria-invalid': Boolean(error),
        'aria-required': required,
      })}
      {hint || usual ? (
        <Text kind="small" tone="soft" id={`${id}-hint`}>
          {[hint, usual && `Usually ${usual.range} (${usual.source}).`].filter(Boolean).join(' ')}
        </Text>
      ) : null}
      {error ? (
        <View style={styles.error} id={`${id}-error`}>
          <Icon name="unreadable" colour={colour.over} />
          <Text kind="small" tone="over" style={styles.grow}>
            {error}
          </Text>
        </View>
      ) : null}
      {note ? <View id={`${id}-note`}>{note}</View> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  field: { gap: space.xs },
  error: { flexDirection: 'row', gap: space.xs, alignItems: 'flex-start' },
  grow: { flex: 1 },
})
