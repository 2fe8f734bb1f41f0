import { colour, font, space, useTargetHeight, useWide } from '@/components/theme'
import { Field } from './field'
import type { SelectProps } from './select'

export type { Option, SelectProps } from './select'

/** One of a few. The page's own select: its list works with every keyboard, thumb and reader. */
export function Select<Value extends string>(props: SelectProps<Value>) {
  const { options, value, onChange, placeholder, disabled, ...field } = props
  const minHeight = useTargetHeight()
  const fontSize = useWide() ? 15 : 16
  return (
    <Field {...field}>
      {(wiring) => (
        <select
          {...wiring}
          value={value ?? ''}
          disabled={disabled}
          onChange={(event) => {
            const chosen = options.find((option) => option.value === event.target.value)
            if (chosen) onChange(chosen.value)
          }}
          style={{ ...style, minHeight, fontSize, borderColor: field.error ? colour.over : colour.ink }}
        >
          {value === null ? (
            <option value="" disabled>
              {placeholder ?? 'Choose'}
            </option>
          ) : null}
          {options.map((option) => (
            <option key={option.value} value={option.value} disabled={option.disabled}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  )
}

const style = {
  fontFamily: font.text,
  color: colour.ink,
  background: colour.input,
  borderWidth: 1,
  borderStyle: 'solid',
  borderRadius: 0,
  padding: `3px ${space.xs}px`,
  width: '100%',
  minWidth: 0,
} as const
