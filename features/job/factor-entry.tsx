import type { Factor } from '@wedgeline/engine'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { NumberField } from '@/components/ui/number-field'
import { TextField } from '@/components/ui/text-field'
import { clauseText } from '../checks/words'
import type { TypedFactor } from './basis-form'

export interface FactorEntryProps {
  readonly factor: Factor
  readonly typed: TypedFactor
  /** Messages by `<factor>.value` and `<factor>.reason`. */
  readonly errors: Readonly<Record<string, string>>
  readonly canSet: boolean
  readonly onChange: (typed: TypedFactor) => void
}

/** A factor with what the code recommends; a value of the job's own comes with its reason. */
export function FactorEntry({ factor, typed, errors, canSet, onChange }: FactorEntryProps) {
  const { name, title, recommended, least, most, unit, clause } = factor
  const isOwn = typed.value !== recommended
  return (
    <View style={styles.entry}>
      <NumberField
        label={title}
        {...(unit === '-' ? {} : { unit })}
        hint={`Recommended ${recommended}; may be ${least} to ${most}. ${clauseText(clause)}.`}
        value={typed.value}
        onCommit={(value) => onChange({ ...typed, value })}
        onType={(value) => onChange({ ...typed, value })}
        error={errors[`${name}.value`]}
        disabled={!canSet}
        required
      />
      {isOwn && canSet ? (
        <View style={styles.line}>
          <Button
            kind="quiet"
            label={`Back to ${recommended}, the recommended value`}
            onPress={() => onChange({ value: recommended, reason: '' })}
          />
        </View>
      ) : null}
      {isOwn ? (
        <TextField
          label={`Reason for ${typed.value ?? 'another value'}`}
          value={typed.reason}
          onChangeText={(reason) => onChange({ ...typed, reason })}
          error={errors[`${name}.reason`]}
          disabled={!canSet}
          maxLength={500}
          required
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row' },
  entry: { gap: space.s, width: 320, maxWidth: '100%' },
})
