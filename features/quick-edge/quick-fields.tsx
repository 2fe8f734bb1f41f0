import type { LayoutFile } from '@wedgeline/contract'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Checkbox } from '@/components/ui/checkbox'
import { NumberField } from '@/components/ui/number-field'
import { Select } from '@/components/ui/select'
import { BASIS_OPTIONS } from '../jobs/bases'
import { CONCRETE_CLASSES } from '../pour/concrete'
import { NUMBER_RULES, ofHardware, type NumberRule, type QuickForm, type QuickProblems } from './quick-form'

export interface QuickFieldsProps {
  readonly form: QuickForm
  readonly problems: QuickProblems
  readonly hardware: readonly LayoutFile['hardware'][number][]
  readonly strandTypes: readonly LayoutFile['strandTypes'][number][]
  readonly onChange: (changes: Partial<QuickForm>) => void
}

const named = (rows: readonly { readonly id: string; readonly name: string }[]) =>
  rows.map(({ id, name }) => ({ value: id, label: name }))

const SLAB = ['thicknessMm', 'firstStrengthMPa', 'fullStrengthMPa', 'coverTopMm', 'coverSoffitMm', 'coverEdgeMm']
const TENDON = ['strands', 'jackingRatio']

/** Everything that holds for the whole edge; each field begins with what is usual. */
export function QuickFields(props: QuickFieldsProps) {
  const { form, problems, hardware, strandTypes, onChange } = props
  const live = hardware.filter(({ ends }) => ends !== 'dead')
  const pickHardware = (hardwareId: string) => {
    const picked = hardware.find(({ id }) => id === hardwareId)
    onChange({ hardwareId, ...(picked ? ofHardware(picked) : {}) })
  }
  const rules = (names: readonly string[]) => NUMBER_RULES.filter(({ name }) => names.includes(name))
  const rest = NUMBER_RULES.filter(({ name }) => !SLAB.includes(name) && !TENDON.includes(name))
  return (
    <View style={styles.fields}>
      <View style={styles.field}>
        <Select
          label="Hardware of live ends"
          hint="Sets strands and strengths to its own."
          options={named(live.length > 0 ? live : hardware)}
          value={form.hardwareId}
          onChange={pickHardware}
          error={problems.hardwareId}
        />
      </View>
      <View style={styles.field}>
        <Select
          label="Strand"
          options={named(strandTypes)}
          value={form.strandTypeId}
          onChange={(strandTypeId) => onChange({ strandTypeId })}
          error={problems.strandTypeId}
        />
      </View>
      <Numbers rules={rules(TENDON)} {...props} />
      <View style={styles.field}>
        <Select
          label="Concrete"
          hint="Cylinder over cube strength at 28 days."
          options={CONCRETE_CLASSES.map(({ name }) => ({ value: name, label: name }))}
          value={form.concrete}
          onChange={(concrete) => onChange({ concrete })}
        />
      </View>
      <Numbers rules={rules(SLAB)} {...props} />
      <View style={styles.field}>
        <Select
          label="Design basis"
          options={BASIS_OPTIONS}
          value={form.basis}
          onChange={(basis) => onChange({ basis })}
        />
      </View>
      <Numbers rules={rest} {...props} />
      <View style={styles.line}>
        <Checkbox
          label="The slab goes on past the start"
          checked={form.goesOnAtStart}
          onChange={(goesOnAtStart) => onChange({ goesOnAtStart })}
        />
        <Checkbox
          label="The slab goes on past the end"
          hint="It is taken as going on with anchors as far apart: half of such a gap is counted."
          checked={form.goesOnAtEnd}
          onChange={(goesOnAtEnd) => onChange({ goesOnAtEnd })}
        />
      </View>
    </View>
  )
}

function Numbers({
  rules,
  form,
  problems,
  onChange,
}: Pick<QuickFieldsProps, 'form' | 'problems' | 'onChange'> & { readonly rules: readonly NumberRule[] }) {
  return rules.map(({ name, label, unit, usual, hint, isOptional }) => (
    <View key={name} style={styles.field}>
      <NumberField
        label={label}
        unit={unit}
        usual={usual}
        hint={hint}
        value={form[name]}
        required={!isOptional}
        error={problems[name]}
        onType={(value) => onChange({ [name]: value })}
        onCommit={(value) => onChange({ [name]: value })}
      />
    </View>
  ))
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { flexGrow: 1, flexBasis: 160, maxWidth: 340, minWidth: 0 },
  line: { flexBasis: '100%', gap: space.s },
})
