import { useState } from 'react'
import { TextField } from '@/components/ui/text-field'

export interface CommittedTextProps {
  readonly label: string
  readonly hint?: string
  readonly value: string
  readonly required?: boolean
  readonly disabled?: boolean
  /** Called on Enter and on leaving the field, with a text that differs from `value`. */
  readonly onCommit: (text: string) => void
}

/** A text that is taken when the field is left, so that one word is one step of undo. */
export function CommittedText({ label, hint, value, required, disabled, onCommit }: CommittedTextProps) {
  const [text, setText] = useState<{ readonly from: string; readonly typed: string } | null>(null)
  const shown = text?.from === value ? text.typed : value
  const isMissing = Boolean(required) && shown.trim() === ''
  const commit = () => {
    if (shown.trim() !== value && !isMissing) onCommit(shown.trim())
  }
  return (
    <TextField
      label={label}
      hint={hint}
      value={shown}
      required={required}
      disabled={disabled}
      onChangeText={(typed) => setText({ from: value, typed })}
      onBlur={commit}
      onEnter={commit}
      error={isMissing ? `${label} is needed.` : undefined}
    />
  )
}
