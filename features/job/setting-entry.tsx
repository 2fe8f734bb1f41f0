import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Checkbox } from '@/components/ui/checkbox'
import { NumberField } from '@/components/ui/number-field'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import type { BasisForm } from './basis-form'
import type { SettingField } from './setting-fields'

export interface SettingEntryProps {
  readonly field: SettingField
  readonly form: BasisForm
  /** Messages by `settings.<name>`. */
  readonly errors: Readonly<Record<string, string>>
  readonly canSet: boolean
  readonly onChange: (form: BasisForm) => void
}

/** One setting of the job in the field that suits it. */
export function SettingEntry({ field, form, errors, canSet, onChange }: SettingEntryProps) {
  const { name, label, unit, hint, usual } = field
  const value = form.settings[name]
  const set = (next: BasisForm['settings'][typeof name]) =>
    onChange({ ...form, settings: { ...form.settings, [name]: next } })
  const error = errors[`settings.${name}`] ?? errorWithin(errors, name)
  const words = {
    label,
    ...(unit === undefined ? {} : { unit }),
    ...(hint === undefined ? {} : { hint }),
    ...(usual === undefined ? {} : { usual }),
  }
  const text = typeof value === 'string' ? value : ''
  switch (field.kind) {
    case 'text':
      return <TextField {...words} value={text} onChangeText={set} error={error} disabled={!canSet} />
    case 'choice':
      return <Select {...words} options={field.options} value={text} onChange={set} error={error} disabled={!canSet} />
    case 'sizes': {
      const chosen = Array.isArray(value) ? value.filter((size) => typeof size === 'number') : []
      return <Sizes {...{ field, error }} chosen={chosen} canSet={canSet} onChange={set} />
    }
    case 'number':
      return (
        <NumberField
          {...words}
          value={typeof value === 'number' ? value : null}
          onCommit={set}
          onType={set}
          error={error}
          disabled={!canSet}
        />
      )
  }
}

/** A message about one member of a list stands at the list. */
const errorWithin = (errors: SettingEntryProps['errors'], name: string): string | undefined =>
  Object.entries(errors).find(([path]) => path.startsWith(`settings.${name}.`))?.[1]

interface SizesProps {
  readonly field: Extract<SettingField, { kind: 'sizes' }>
  readonly chosen: readonly number[]
  readonly canSet: boolean
  readonly error: string | undefined
  readonly onChange: (sizes: readonly number[]) => void
}

function Sizes({ field, chosen, canSet, error, onChange }: SizesProps) {
  const { label, sizes, unit, usual } = field
  return (
    <View role="group" aria-label={label} style={styles.group}>
      <Text kind="label">{unit === undefined ? label : `${label}, ${unit}`}</Text>
      {usual ? <Text kind="small" tone="soft">{`Usually ${usual.range} (${usual.source}).`}</Text> : null}
      <View style={styles.sizes}>
        {sizes.map((size) => (
          <Checkbox
            key={size}
            label={String(size)}
            checked={chosen.includes(size)}
            disabled={!canSet}
            onChange={(checked) => onChange(sizes.filter((one) => (one === size ? checked : chosen.includes(one))))}
          />
        ))}
      </View>
      {error === undefined ? null : <Text tone="over">{error}</Text>}
    </View>
  )
}

const styles = StyleSheet.create({
  group: { gap: space.xs },
  sizes: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l },
})
