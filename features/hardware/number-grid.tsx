import { StyleSheet, View } from 'react-native'
import { space, useWide } from '@/components/theme'
import { NumberField } from '@/components/ui/number-field'
import type { NumberSpec } from './fields'
import type { Errors } from './typed'

export interface NumberGridProps<Key extends string> {
  readonly specs: readonly NumberSpec<Key>[]
  readonly values: Readonly<Record<Key, number | null>>
  readonly onChange: (changed: Partial<Readonly<Record<Key, number | null>>>) => void
  /** Messages by path; `path` is where these values stand in the whole. */
  readonly errors: Errors
  readonly path?: string
  readonly disabled: boolean
}

/** Numbers side by side, as many as the width takes. */
export function NumberGrid<Key extends string>(props: NumberGridProps<Key>) {
  const { specs, values, onChange, errors, path = '', disabled } = props
  const cell = useCellStyle()
  return (
    <View style={gridStyle.grid}>
      {specs.map(({ key, isOptional, ...words }) => (
        <View key={key} style={cell}>
          <NumberField
            {...words}
            value={values[key]}
            onCommit={(value) => onChange({ [key]: value } as Partial<Record<Key, number | null>>)}
            onType={(value) => onChange({ [key]: value } as Partial<Record<Key, number | null>>)}
            error={errors[path ? `${path}.${key}` : key]}
            disabled={disabled}
            required={!isOptional}
          />
        </View>
      ))}
    </View>
  )
}

export const gridStyle = StyleSheet.create({
  grid: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l, rowGap: space.m },
  cell: { width: 250 },
  cellOnPhone: { flexBasis: 150, flexGrow: 1 },
})

/** Columns of one width where there is room; on a phone two share the width. */
export const useCellStyle = () => (useWide() ? gridStyle.cell : gridStyle.cellOnPhone)
