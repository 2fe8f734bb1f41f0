import { StyleSheet, View } from 'react-native'
import { Checkbox } from '@/components/ui/checkbox'
import { Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import { HAIRPIN_FIELDS, LINK_FIELDS, SPIRAL_FIELDS } from './fields'
import type { PartProps } from './hardware-form'
import { NumberGrid } from './number-grid'
import { newSteel, type TypedSteel } from './typed'

const KINDS = [
  { value: 'none', label: 'none' },
  { value: 'spiral', label: 'spiral' },
  { value: 'links', label: 'links' },
  { value: 'hairpins', label: 'hairpins' },
] as const

/** The steel that comes with the anchorage, as its supplier draws it. */
export function LocalSteelSection({ typed, onChange, errors, disabled }: PartProps) {
  const steel = typed.localSteel
  const set = (localSteel: TypedSteel) => onChange({ localSteel })
  return (
    <Section title="Steel behind the plate">
      <View style={styles.choice}>
        <Select
          label="Kind"
          options={KINDS}
          value={steel?.kind ?? 'none'}
          disabled={disabled}
          onChange={(kind) => onChange({ localSteel: kind === 'none' ? null : newSteel(kind) })}
        />
      </View>
      {steel ? (
        <>
          <Checkbox
            label="As it was tested for the approval"
            checked={steel.isTested}
            disabled={disabled}
            onChange={(isTested) => set({ ...steel, isTested })}
          />
          <SteelNumbers steel={steel} onChange={set} errors={errors} disabled={disabled} />
        </>
      ) : null}
    </Section>
  )
}

interface SteelNumbersProps extends Pick<PartProps, 'errors' | 'disabled'> {
  readonly steel: TypedSteel
  readonly onChange: (steel: TypedSteel) => void
}

function SteelNumbers({ steel, onChange, ...rest }: SteelNumbersProps) {
  const how = { ...rest, path: 'localSteel' }
  switch (steel.kind) {
    case 'spiral':
      return (
        <NumberGrid
          {...how}
          specs={SPIRAL_FIELDS}
          values={steel}
          onChange={(changed) => onChange({ ...steel, ...changed })}
        />
      )
    case 'links':
      return (
        <NumberGrid
          {...how}
          specs={LINK_FIELDS}
          values={steel}
          onChange={(changed) => onChange({ ...steel, ...changed })}
        />
      )
    case 'hairpins':
      return (
        <>
          <NumberGrid
            {...how}
            specs={HAIRPIN_FIELDS}
            values={steel}
            onChange={(changed) => onChange({ ...steel, ...changed })}
          />
          <View style={styles.choice}>
            <Select
              label="They lie"
              options={LIES}
              value={steel.lies}
              disabled={rest.disabled}
              onChange={(lies) => onChange({ ...steel, lies })}
            />
          </View>
        </>
      )
  }
}

const LIES = [
  { value: 'upright', label: 'upright, legs above each other' },
  { value: 'flat', label: 'flat, legs beside each other' },
] as const

const styles = StyleSheet.create({ choice: { maxWidth: 340 } })
