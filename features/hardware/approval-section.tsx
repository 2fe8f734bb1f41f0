import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Section } from '@/components/ui/screen'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { DISTANCE_FIELDS, STRENGTH_FIELDS } from './fields'
import type { PartProps } from './hardware-form'
import { NumberGrid } from './number-grid'
import { NEW_STRENGTH, type TypedApproval } from './typed'

const STRENGTHS_MAX = 12

/** The approval with a row for each smallest strength at which the anchorage was tested. */
export function ApprovalSection({ typed, onChange, errors, disabled }: PartProps) {
  const { approval } = typed
  const set = (changed: Partial<TypedApproval>) => approval && onChange({ approval: { ...approval, ...changed } })
  return (
    <Section title="Approval">
      <Checkbox
        label="It has an approval"
        hint="Without one, bearing is checked by the formula of the job’s basis."
        checked={approval !== null}
        disabled={disabled}
        onChange={(has) => onChange({ approval: has ? { reference: '', strengths: [NEW_STRENGTH] } : null })}
      />
      {approval ? (
        <>
          <TextField
            label="Reference"
            hint="Document and issue, as it is quoted in the calculation."
            value={approval.reference}
            onChangeText={(reference) => set({ reference })}
            error={errors['approval.reference']}
            disabled={disabled}
            maxLength={120}
            required
          />
          {errors['approval.strengths'] ? <Text tone="over">{errors['approval.strengths']}</Text> : null}
          {approval.strengths.map((line, at) => (
            <View key={at} style={styles.line}>
              <Text kind="label">{`Strength ${at + 1} of ${approval.strengths.length}`}</Text>
              <NumberGrid
                specs={[...STRENGTH_FIELDS, ...DISTANCE_FIELDS]}
                values={line}
                onChange={(changed) => set({ strengths: approval.strengths.with(at, { ...line, ...changed }) })}
                errors={errors}
                path={`approval.strengths.${at}`}
                disabled={disabled}
              />
              {!disabled && approval.strengths.length > 1 ? (
                <View style={styles.row}>
                  <Button
                    kind="quiet"
                    label={`Remove strength ${at + 1}`}
                    onPress={() => set({ strengths: approval.strengths.toSpliced(at, 1) })}
                  />
                </View>
              ) : null}
            </View>
          ))}
          {!disabled && approval.strengths.length < STRENGTHS_MAX ? (
            <View style={styles.row}>
              <Button
                label="Add a smallest strength"
                onPress={() => set({ strengths: [...approval.strengths, NEW_STRENGTH] })}
              />
            </View>
          ) : null}
        </>
      ) : null}
    </Section>
  )
}

const styles = StyleSheet.create({
  line: { gap: space.s, paddingLeft: space.m, borderLeftWidth: 2, borderColor: colour.rule },
  row: { flexDirection: 'row' },
})
