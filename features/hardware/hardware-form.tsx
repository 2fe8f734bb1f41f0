import type { JackData } from '@wedgeline/contract'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Checkbox } from '@/components/ui/checkbox'
import { NumberField } from '@/components/ui/number-field'
import { Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { ApprovalSection } from './approval-section'
import { DEPTH_FIELDS, DISTANCE_FIELDS, LENGTH_FIELDS, SIZE_FIELDS, SPLAY_FIELDS } from './fields'
import { LocalSteelSection } from './local-steel-section'
import { gridStyle, NumberGrid, useCellStyle } from './number-grid'
import { asKind, type Errors, type TypedHardware } from './typed'

export interface PartProps {
  readonly typed: TypedHardware
  readonly onChange: (changed: Partial<TypedHardware>) => void
  readonly errors: Errors
  /** For reading: only an admin changes hardware. */
  readonly disabled: boolean
}

/** Everything that a supplier's sheet says of one anchorage, in the order of such a sheet. */
export function HardwareForm({ jacks, ...part }: PartProps & { readonly jacks: readonly JackData[] }) {
  return (
    <View style={styles.form}>
      <NameSection {...part} />
      <SizeSection {...part} />
      <Section title="Distances, at least">
        <NumberGrid {...part} specs={DISTANCE_FIELDS} values={part.typed} />
      </Section>
      <ApprovalSection {...part} />
      <LocalSteelSection {...part} />
      <Section title="Tendon and jack">
        <NumberGrid {...part} specs={LENGTH_FIELDS} values={part.typed} />
        <View style={styles.choice}>
          <Select
            label="Jack"
            options={[{ value: NO_JACK, label: 'none' }, ...jacks.map(({ id, name }) => ({ value: id, label: name }))]}
            value={part.typed.jackId ?? NO_JACK}
            disabled={part.disabled}
            onChange={(id) => part.onChange({ jackId: id === NO_JACK ? null : id })}
          />
        </View>
      </Section>
    </View>
  )
}

const NO_JACK = ''

function NameSection({ typed, onChange, errors, disabled }: PartProps) {
  const cell = useCellStyle()
  return (
    <Section title="What it is">
      <View style={gridStyle.grid}>
        <View style={cell}>
          <TextField
            label="Name"
            hint="As the supplier calls it."
            value={typed.name}
            onChangeText={(name) => onChange({ name })}
            error={errors.name}
            disabled={disabled}
            maxLength={60}
            required
          />
        </View>
        <View style={cell}>
          <Select
            label="Gives its force to the concrete by"
            options={KIND_OPTIONS}
            value={typed.kind}
            disabled={disabled}
            onChange={(kind) => onChange(asKind(typed, kind))}
          />
        </View>
        <View style={cell}>
          <Select
            label="Stands at"
            options={END_OPTIONS.map((option) => ({
              ...option,
              disabled: typed.kind === 'bonded-splay' && option.value !== 'dead',
            }))}
            value={typed.ends}
            disabled={disabled}
            onChange={(ends) => onChange({ ends })}
          />
        </View>
        <View style={cell}>
          <NumberField
            label="Strands, at most"
            usual={{ range: '1 to 7 in slabs', source: 'common practice' }}
            value={typed.strandsMax}
            onCommit={(strandsMax) => onChange({ strandsMax })}
            onType={(strandsMax) => onChange({ strandsMax })}
            error={errors.strandsMax}
            disabled={disabled}
            required
          />
        </View>
      </View>
      <TextField
        label="What it is for"
        value={typed.description}
        onChangeText={(description) => onChange({ description })}
        error={errors.description}
        disabled={disabled}
        maxLength={200}
      />
    </Section>
  )
}

const KIND_OPTIONS = [
  { value: 'plate', label: 'a bearing plate' },
  { value: 'bonded-splay', label: 'a bonded splay' },
] as const
const END_OPTIONS = [
  { value: 'live', label: 'live ends' },
  { value: 'dead', label: 'dead ends' },
  { value: 'both', label: 'live and dead ends' },
] as const

function SizeSection({ typed, onChange, errors, disabled }: PartProps) {
  const { plate, hole, duct, pocket, kind } = typed
  const how = { errors, disabled }
  const isPlate = kind === 'plate'
  return (
    <Section title="Sizes">
      <Text kind="label">{isPlate ? 'Bearing plate' : 'Splay at the bulbs'}</Text>
      <NumberGrid
        {...how}
        specs={SIZE_FIELDS}
        values={plate}
        path="plate"
        onChange={(changed) => onChange({ plate: { ...plate, ...changed } })}
      />
      {isPlate && hole ? (
        <Opening
          {...how}
          name="Hole through the plate"
          path="hole"
          opening={hole}
          onChange={(next) => onChange({ hole: next })}
        />
      ) : null}
      {isPlate ? null : <NumberGrid {...how} specs={SPLAY_FIELDS} values={typed} onChange={onChange} />}
      <Opening {...how} name="Duct" path="duct" opening={duct} onChange={(next) => onChange({ duct: next })} />
      {isPlate ? (
        <Checkbox
          label="It leaves a pocket at the edge"
          checked={pocket !== null}
          disabled={disabled}
          onChange={(has) => onChange({ pocket: has ? { widthMm: null, heightMm: null, depthMm: null } : null })}
        />
      ) : null}
      {pocket ? (
        <NumberGrid
          {...how}
          specs={[...SIZE_FIELDS, ...DEPTH_FIELDS]}
          values={pocket}
          path="pocket"
          onChange={(changed) => onChange({ pocket: { ...pocket, ...changed } })}
        />
      ) : null}
    </Section>
  )
}

interface OpeningProps extends Pick<PartProps, 'errors' | 'disabled'> {
  readonly name: string
  readonly path: string
  readonly opening: TypedHardware['duct']
  readonly onChange: (opening: TypedHardware['duct']) => void
}

const DIAMETER = [{ key: 'widthMm', label: 'Diameter', unit: 'mm' }] as const

function Opening({ name, opening, onChange, ...how }: OpeningProps) {
  return (
    <View style={styles.opening}>
      <Text kind="label">{name}</Text>
      <Checkbox
        label={`${name} is round`}
        checked={opening.isRound}
        disabled={how.disabled}
        onChange={(isRound) => onChange({ ...opening, isRound })}
      />
      <NumberGrid
        {...how}
        specs={opening.isRound ? DIAMETER : SIZE_FIELDS}
        values={opening}
        onChange={(changed) => onChange({ ...opening, ...changed })}
      />
    </View>
  )
}

const styles = StyleSheet.create({
  form: { gap: space.xl, maxWidth: 1100 },
  opening: { gap: space.xs },
  choice: { maxWidth: 340 },
})
