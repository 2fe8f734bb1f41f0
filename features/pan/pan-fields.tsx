import type { LayoutFile, PanData } from '@wedgeline/contract'
import { StyleSheet, View } from 'react-native'
import { NumberField } from '@/components/ui/number-field'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { space } from '@/components/theme'
import { CommittedText } from '../pour/committed-text'
import { useRowEdit } from '../pour/use-row-edit'

type NumericKey =
  'alongMm' | 'acrossMm' | 'depthMm' | 'jackTiltDeg' | 'bentNoseDeg' | 'headroomMm' | 'xMm' | 'yMm' | 'azimuthDeg'

interface NumericField {
  readonly key: NumericKey
  readonly label: string
  readonly unit: string
  readonly usual?: { readonly range: string; readonly source: string }
  readonly isOptional?: boolean
}

const practice = (range: string) => ({ range, source: 'common practice' })

const RECESS: readonly NumericField[] = [
  { key: 'alongMm', label: 'Length along the jack', unit: 'mm', usual: practice('900 to 1200') },
  { key: 'acrossMm', label: 'Width', unit: 'mm', usual: practice('300 to 450') },
  { key: 'depthMm', label: 'Depth at the bearing face', unit: 'mm', usual: practice('60 to 80 left under it') },
  { key: 'xMm', label: 'Bearing face, east', unit: 'mm' },
  { key: 'yMm', label: 'Bearing face, north', unit: 'mm' },
  { key: 'azimuthDeg', label: 'Jack points to, from north clockwise', unit: '°' },
]

const JACK: readonly NumericField[] = [
  { key: 'jackTiltDeg', label: 'Tilt of the jack', unit: '°', usual: practice('10 to 15, at most 20') },
  { key: 'bentNoseDeg', label: 'Bend of the nose', unit: '°' },
  { key: 'headroomMm', label: 'Clear height above the slab', unit: 'mm', isOptional: true },
]

const NO_JACK = ''

export interface PanFieldsProps {
  readonly layout: LayoutFile
  readonly pan: PanData
}

/** The numbers of a pan: its recess, its jack, and the engineer's own tie force with the reason for it. */
export function PanFields({ layout, pan }: PanFieldsProps) {
  const { apply, canEdit, refusal } = useRowEdit()
  const set = (changes: Partial<PanData>, what: string) =>
    apply({
      label: `${pan.mark}: ${what}`,
      key: `${pan.id}.${Object.keys(changes).join()}`,
      commands: [{ type: 'set', table: 'pans', id: pan.id, changes }],
    })
  const number = ({ key, label, unit, usual, isOptional }: NumericField) => (
    <View key={key} style={styles.field}>
      <NumberField
        label={label}
        unit={unit}
        value={pan[key]}
        disabled={!canEdit}
        {...(usual ? { usual } : {})}
        {...(isOptional ? {} : { required: true })}
        onCommit={(value) => {
          if (value !== null || isOptional) set({ [key]: value }, label.toLowerCase())
        }}
      />
    </View>
  )
  return (
    <View style={styles.form}>
      {refusal ? (
        <Text role="alert" tone="over">
          {refusal}
        </Text>
      ) : null}
      <Group title="Recess">{RECESS.map(number)}</Group>
      <Group title="Jack">
        <View style={styles.field}>
          <Select
            label="Jack"
            value={pan.jackId ?? NO_JACK}
            disabled={!canEdit}
            options={[
              { value: NO_JACK, label: 'as its hardware names' },
              ...layout.jacks.map(({ id, name }) => ({ value: id, label: name })),
            ]}
            onChange={(jackId) => set({ jackId: jackId === NO_JACK ? null : jackId }, 'jack')}
          />
        </View>
        {JACK.map(number)}
      </Group>
      <Group title="Tie behind the anchor">
        <View style={styles.field}>
          <NumberField
            label="Own tie force"
            unit="kN"
            value={pan.tieBackForceKN}
            disabled={!canEdit}
            hint="Empty takes the share that the job's reading gives."
            onCommit={(tieBackForceKN) => set({ tieBackForceKN }, 'own tie force')}
          />
        </View>
        <View style={styles.wide}>
          <CommittedText
            label="Reason for it"
            value={pan.tieBackReason}
            required={pan.tieBackForceKN !== null}
            disabled={!canEdit}
            onCommit={(tieBackReason) => set({ tieBackReason }, 'reason for the tie force')}
          />
        </View>
      </Group>
    </View>
  )
}

function Group({ title, children }: { readonly title: string; readonly children: React.ReactNode }) {
  return (
    <View style={styles.group} role="group" aria-label={title}>
      <Text kind="strong">{title}</Text>
      <View style={styles.fields}>{children}</View>
    </View>
  )
}

const styles = StyleSheet.create({
  form: { gap: space.l },
  group: { gap: space.s },
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { width: 170, flexGrow: 1, maxWidth: 260 },
  wide: { minWidth: 260, flexGrow: 2 },
})
