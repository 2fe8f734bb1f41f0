import type { AnchorData, HardwareData, LayoutFile, TendonData } from '@wedgeline/contract'
import type { Compared, ZoneResult } from '@wedgeline/engine'
import { StyleSheet, View } from 'react-native'
import { Button } from '@/components/ui/button'
import { NumberField } from '@/components/ui/number-field'
import { Select } from '@/components/ui/select'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { space } from '@/components/theme'
import { outcomeText, sidesText } from '../../checks/words'
import { useJobDraft } from '../../editing/job-draft'
import { anchorChange } from '../table/columns'

export interface AnchorFieldsProps {
  readonly anchor: AnchorData
  readonly tendon: TendonData | null
  readonly hardware: HardwareData | null
  readonly mark: string
  readonly result: ZoneResult | null
  /** What checks say stands below each field, unless it stands at the head of the sheet. */
  readonly hasNotes: boolean
}

/** The numbers of one anchor, each with its unit and usual range; what a check has to say stands below its field. */
export function AnchorFields({ anchor, tendon, hardware, mark, result, hasNotes }: AnchorFieldsProps) {
  const { layout, edit, canEdit } = useJobDraft()
  const apply = (changes: Partial<AnchorData>, what: string) => {
    const typed = anchorChange(anchor, changes, `${mark}: ${what}`)
    if (typed.kind === 'change') edit(typed.change)
  }
  const number = (field: NumericField) => ({
    label: field.label,
    unit: field.unit,
    value: anchor[field.key],
    disabled: !canEdit,
    onCommit: (value: number | null) => {
      if (value !== null || field.isOptional) apply({ [field.key]: value }, field.label.toLowerCase())
    },
    onType: (value: number) => apply({ [field.key]: value }, field.label.toLowerCase()),
    note: hasNotes ? (
      <MendNote
        field={field.key}
        result={result}
        value={anchor[field.key]}
        onUse={(value) => apply({ [field.key]: value }, field.label.toLowerCase())}
      />
    ) : null,
    ...(field.usual(hardware, anchor) ? { usual: field.usual(hardware, anchor) } : {}),
    ...(field.isOptional ? {} : { required: true }),
  })
  return (
    <View style={styles.fields}>
      {FIELDS.map((field) => (
        <View key={field.key} style={styles.field}>
          <NumberField {...number(field)} />
        </View>
      ))}
      <View style={styles.field}>
        <NumberField
          label="Strands"
          value={tendon?.strands ?? null}
          disabled={!canEdit || !tendon}
          required
          {...(hardware ? { usual: { range: `up to ${hardware.strandsMax}`, source: hardware.name } } : {})}
          onCommit={(strands) => {
            if (!tendon || strands === null || !Number.isInteger(strands) || strands < 1) return
            edit({
              label: `${mark}: strands`,
              key: `${tendon.id}.strands`,
              commands: [{ type: 'set', table: 'tendons', id: tendon.id, changes: { strands } }],
            })
          }}
        />
      </View>
      <View style={styles.field}>
        <Select
          label="End"
          value={anchor.end}
          disabled={!canEdit}
          options={[
            { value: 'live', label: 'live end' },
            { value: 'dead', label: 'dead end' },
          ]}
          onChange={(end) => apply({ end }, 'end')}
        />
      </View>
      <View style={styles.field}>
        <Select
          label="Hardware"
          value={anchor.hardwareId}
          disabled={!canEdit}
          options={hardwareOptions(layout)}
          onChange={(hardwareId) => apply({ hardwareId }, 'hardware')}
        />
      </View>
    </View>
  )
}

const hardwareOptions = (layout: LayoutFile) => layout.hardware.map(({ id, name }) => ({ value: id, label: name }))

type NumericKey = 'chainageMm' | 'heightMm' | 'setBackMm' | 'straightBehindMm' | 'skewDeg' | 'elevationDeg'

interface NumericField {
  readonly key: NumericKey
  readonly label: string
  readonly unit: string
  readonly isOptional?: boolean
  readonly usual: (hardware: HardwareData | null, anchor: AnchorData) => { range: string; source: string } | undefined
}

const FIELDS: readonly NumericField[] = [
  { key: 'chainageMm', label: 'Chainage', unit: 'mm', usual: () => undefined },
  {
    key: 'heightMm',
    label: 'Height above soffit',
    unit: 'mm',
    usual: (hardware) =>
      (hardware && { range: `${hardware.edgeHeightMinMm} or more from soffit and top`, source: hardware.name }) ||
      undefined,
  },
  {
    key: 'setBackMm',
    label: 'Set-back',
    unit: 'mm',
    usual: (hardware) =>
      hardware?.pocket ? { range: `${hardware.pocket.depthMm}, the pocket`, source: hardware.name } : undefined,
  },
  {
    key: 'straightBehindMm',
    label: 'Straight behind',
    unit: 'mm',
    isOptional: true,
    usual: (hardware) =>
      hardware ? { range: `${hardware.straightBehindMinMm} or more`, source: hardware.name } : undefined,
  },
  { key: 'skewDeg', label: 'Skew, clockwise', unit: '°', usual: () => ({ range: '0', source: 'square to the edge' }) },
  {
    key: 'elevationDeg',
    label: 'Elevation, upwards going out',
    unit: '°',
    usual: () => ({ range: '0 to 5', source: 'common practice' }),
  },
]

/** "62 is 13 short of the 75 that this hardware needs. Kept as typed.", with the value that would just do. */
function MendNote(props: {
  readonly field: string
  readonly result: ZoneResult | null
  readonly value: number | null
  readonly onUse: (value: number) => void
}) {
  const { field, result, value, onUse } = props
  const { canEdit } = useJobDraft()
  const broken = result?.checks.filter((check): check is Compared => isBroken(check, field)) ?? []
  // The value furthest from the one typed does for all of them.
  const mends = broken.flatMap(({ mend }) => mend ?? [])
  const mend = mends.sort((a, b) => Math.abs(b.value - (value ?? 0)) - Math.abs(a.value - (value ?? 0)))[0]
  if (!mend) return null
  return (
    <View style={styles.note}>
      {broken.map((check) => (
        <StatusMark
          key={check.name}
          status={check.status}
          words={`${check.name}: ${sidesText(check)}, ${outcomeText(check)}.`}
          kind="small"
        />
      ))}
      <View style={styles.choices}>
        <Text kind="small">Kept as typed.</Text>
        {canEdit && mend.value !== value ? (
          <Button label={`Use ${Number(mend.value.toFixed(1))}`} onPress={() => onUse(mend.value)} />
        ) : (
          <Text kind="small">Change it, or choose other hardware.</Text>
        )}
      </View>
    </View>
  )
}

/** The same notes on their own, where the fields stand further down. */
export function Mends({ anchor, mark, result }: Pick<AnchorFieldsProps, 'anchor' | 'mark' | 'result'>) {
  const { edit } = useJobDraft()
  return FIELDS.map(({ key, label }) => (
    <MendNote
      key={key}
      field={key}
      result={result}
      value={anchor[key]}
      onUse={(value) => {
        const typed = anchorChange(anchor, { [key]: value }, `${mark}: ${label.toLowerCase()}`)
        if (typed.kind === 'change') edit(typed.change)
      }}
    />
  ))
}

const isBroken = (check: ZoneResult['checks'][number], field: string): boolean =>
  check.kind === 'compared' &&
  (check.status === 'over' || check.status === 'stop') &&
  check.mend !== null &&
  field.startsWith(check.mend.field.replace(/^anchor\./, ''))

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { width: 170, flexGrow: 1 },
  note: { gap: space.xs, alignItems: 'flex-start' },
  choices: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.s },
})
