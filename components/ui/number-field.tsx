import type { Ref } from 'react'
import { useState } from 'react'
import type { TextInput } from 'react-native'
import { StyleSheet, TextInput as NativeTextInput, View } from 'react-native'
import { colour, font, space } from '@/components/theme'
import { Button } from './button'
import type { FieldProps } from './field'
import { Field } from './field'
import { Icon } from './icon'
import type { NumberText, Separator } from './number-text'
import { formatNumber, parseNumber } from './number-text'
import { Text } from './text'
import { boxStyle, useBoxStyle } from './text-field'

export interface NumberFieldProps extends Omit<FieldProps, 'error'> {
  /** In `unit`; null while there is none. */
  value: number | null
  /** Called on Enter and on leaving the field, with a value that differs from `value`. */
  onCommit: (value: number | null) => void
  /** Called with each key that leaves another number, so that nothing typed is lost with the tab; Esc gives the number from before. */
  onType?: ((value: number) => void) | undefined
  /** The person's setting; without one, a text with two meanings is asked about. */
  separator?: Separator
  /** A message about the text from outside: the server or the contract could not take it. */
  error?: string | undefined
  disabled?: boolean | undefined
  ref?: Ref<TextInput> | undefined
}

/**
 * A number as somebody types it. The typed text stays as it is, a value that a check refuses included; only a text
 * that cannot be read turns the box red. Enter commits, Esc brings back what was there.
 */
export function NumberField(props: NumberFieldProps) {
  const { label, unit, hint, usual, note, required, error, value, separator = null } = props
  const draft = useDraft(props)
  const box = useBoxStyle()
  const unread = draft.isLeft && draft.read.kind === 'unreadable' ? draft.read.message : undefined
  const missing = draft.isLeft && required && draft.read.kind === 'empty' ? `${label} is needed.` : undefined
  const hasMore = (draft.read.kind === 'number' && draft.read.shownAs) || draft.read.kind === 'ambiguous'
  const message = unread ?? missing ?? error
  return (
    <Field
      {...{ label, unit, hint, usual, required }}
      error={message}
      note={
        hasMore || note ? (
          <View style={styles.notes}>
            <Understood draft={draft} separator={separator} unit={unit} />
            {note}
          </View>
        ) : null
      }
    >
      {(wiring) => (
        <NativeTextInput
          {...wiring}
          ref={props.ref}
          value={draft.text}
          onChangeText={draft.type}
          onFocus={draft.enter}
          onBlur={draft.leave}
          onSubmitEditing={draft.commit}
          onKeyUp={(event) => {
            if (event.key !== 'Escape' || !draft.isOpen) return
            // The dialog or sheet that the field stands in would close on the same key.
            event.stopPropagation()
            draft.restore()
          }}
          submitBehavior="submit"
          inputMode="decimal"
          autoComplete="off"
          editable={!props.disabled}
          placeholder={value === null && !required ? '–' : ''}
          placeholderTextColor={colour.soft}
          style={[box, styles.figures, message !== undefined && boxStyle.unreadable, props.disabled && boxStyle.off]}
        />
      )}
    </Field>
  )
}

interface Draft {
  readonly text: string
  readonly read: NumberText
  /** Something is typed that is not committed. */
  readonly isOpen: boolean
  /** The field was left, or Enter pressed, with this text. */
  readonly isLeft: boolean
  readonly type: (text: string) => void
  readonly enter: () => void
  readonly leave: () => void
  readonly commit: () => void
  readonly restore: () => void
  readonly take: (value: number) => void
}

/** A typed text, and the value that it was typed against: a value that changes from outside puts the text away. */
interface Typed {
  readonly text: string
  readonly against: number | null
  readonly isLeft: boolean
}

function useDraft({ value, onCommit, onType, unit, separator = null }: NumberFieldProps): Draft {
  const [typed, setTyped] = useState<Typed | null>(null)
  const [isFocused, setFocused] = useState(false)
  const [before, setBefore] = useState(value)
  const live = typed && (isFocused || typed.against === value) ? typed : null
  const text = live ? live.text : value === null ? '' : formatNumber(value, separator)
  const reading = { unit: unit ?? null, separator }
  const read = parseNumber(text, reading)
  const take = (next: number | null, kept: string) => {
    setTyped({ text: kept, against: next, isLeft: true })
    setBefore(next)
    if (next !== value) onCommit(next)
  }
  const commit = () => {
    if (!live) return
    if (read.kind === 'number') take(read.value, text)
    else if (read.kind === 'empty') take(null, '')
    else setTyped({ ...live, against: value, isLeft: true })
  }
  return {
    text,
    read,
    isOpen: live !== null && !(read.kind === 'number' && read.value === value && (!onType || before === value)),
    isLeft: live?.isLeft ?? false,
    type: (next) => {
      setTyped({ text: next, against: value, isLeft: false })
      const now = parseNumber(next, reading)
      if (now.kind === 'number' && now.value !== value) onType?.(now.value)
    },
    enter: () => {
      // A text typed against an older value was put away; focus must not bring it back, nor leaving commit it.
      if (typed && typed.against !== value) setTyped(null)
      setFocused(true)
      setBefore(value)
    },
    leave: () => {
      setFocused(false)
      commit()
    },
    commit,
    restore: () => {
      setTyped(null)
      if (before !== null && before !== value) onType?.(before)
    },
    take: (next) => take(next, formatNumber(next, separator)),
  }
}

/** The value as it was understood, where it was typed in another unit; the question, where it has two meanings. */
function Understood({ draft, separator, unit }: { draft: Draft; separator: Separator; unit: string | undefined }) {
  const { read } = draft
  if (read.kind === 'number' && read.shownAs) return <Text kind="small" tone="soft">{`= ${read.shownAs}`}</Text>
  if (read.kind !== 'ambiguous' || !draft.isLeft) return null
  return (
    <View style={styles.notes}>
      <View style={styles.choices}>
        <Icon name="help" />
        <Text kind="small" style={styles.question}>
          {read.message}
        </Text>
      </View>
      <View style={styles.choices}>
        {read.choices.map((choice) => (
          <Button
            key={choice}
            label={[formatNumber(choice, separator), unit].filter(Boolean).join(' ')}
            onPress={() => draft.take(choice)}
          />
        ))}
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  figures: { fontFamily: font.figures },
  notes: { gap: space.xs },
  choices: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
  question: { flex: 1 },
})
