import type { PourData } from '@wedgeline/contract'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { colour, space } from '@/components/theme'
import { useSession } from '@/lib/session'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Icon } from '@/components/ui/icon'
import { NumberField } from '@/components/ui/number-field'
import { Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { useJobDraft } from '../editing/job-draft'

type Mat = PourData['mats'][number]

const SIZES = [6, 8, 10, 12, 16, 20, 25, 32, 40] as const

export interface PourMatsProps {
  readonly pour: PourData
  readonly onSet: (mats: readonly Mat[], label: string) => void
}

/** The bars that the slab has anyway, by layer, with the share that an engineer says is spare. */
export function PourMats({ pour, onSet }: PourMatsProps) {
  const { canEdit } = useJobDraft()
  const add = () => {
    const face = pour.mats.some((mat) => mat.face === 'bottom') ? 'top' : 'bottom'
    const isOuter = !pour.mats.some((mat) => mat.face === face && mat.isOuter)
    const mat: Mat = {
      id: newId(),
      face,
      azimuthDeg: 0,
      diameterMm: 10,
      spacingMm: 200,
      isOuter,
      spareShare: 0,
      spareBy: null,
    }
    onSet([...pour.mats, mat], 'Add a layer of the mats')
  }
  return (
    <Section
      title="Mats already there"
      actions={canEdit ? <Button label="Add a layer" icon={<Icon name="plus" />} onPress={add} /> : null}
    >
      {pour.mats.length === 0 ? (
        <Text tone="soft">No mat bars are entered. None count against bursting or at edge wedges.</Text>
      ) : null}
      {pour.mats.map((mat) => (
        <MatFields
          key={mat.id}
          mat={mat}
          onSet={(changes, label) =>
            onSet(
              pour.mats.map((other) => (other.id === mat.id ? { ...other, ...changes } : other)),
              label,
            )
          }
          onRemove={() =>
            onSet(
              pour.mats.filter(({ id }) => id !== mat.id),
              'Remove a layer of the mats',
            )
          }
        />
      ))}
    </Section>
  )
}

interface MatFieldsProps {
  readonly mat: Mat
  readonly onSet: (changes: Partial<Mat>, label: string) => void
  readonly onRemove: () => void
}

function MatFields({ mat, onSet, onRemove }: MatFieldsProps) {
  const { canEdit } = useJobDraft()
  const disabled = !canEdit
  return (
    <View style={styles.mat}>
      <View style={styles.field}>
        <Select
          label="Face"
          options={[
            { value: 'top', label: 'top' },
            { value: 'bottom', label: 'bottom' },
          ]}
          value={mat.face}
          disabled={disabled}
          onChange={(face) => onSet({ face }, 'Face of a mat')}
        />
      </View>
      <View style={styles.field}>
        <Select
          label="Bar, mm"
          options={SIZES.map((size) => ({ value: String(size), label: String(size) }))}
          value={String(mat.diameterMm)}
          disabled={disabled}
          onChange={(size) => {
            const diameterMm = SIZES.find((candidate) => String(candidate) === size)
            if (diameterMm) onSet({ diameterMm }, 'Bar of a mat')
          }}
        />
      </View>
      <View style={styles.field}>
        <NumberField
          label="Spacing"
          unit="mm"
          value={mat.spacingMm}
          usual={{ range: '100 to 300', source: 'common practice' }}
          disabled={disabled}
          onCommit={(spacingMm) => spacingMm !== null && onSet({ spacingMm }, 'Spacing of a mat')}
        />
      </View>
      <View style={styles.field}>
        <NumberField
          label="Direction of the bars"
          unit="°"
          hint="Clockwise from north: 0 runs north, 90 east."
          value={mat.azimuthDeg}
          disabled={disabled}
          onCommit={(azimuthDeg) => azimuthDeg !== null && onSet({ azimuthDeg }, 'Direction of a mat')}
        />
      </View>
      <SpareField mat={mat} onSet={onSet} />
      <View style={styles.end}>
        <Checkbox
          label="Outer layer"
          checked={mat.isOuter}
          disabled={disabled}
          onChange={(isOuter) => onSet({ isOuter }, 'Layer of a mat')}
        />
        {disabled ? null : (
          <Button kind="quiet" label="Remove this layer" iconOnly icon={<Icon name="remove" />} onPress={onRemove} />
        )}
      </View>
    </View>
  )
}

/** Only an engineer may say that bars of a mat are spare, and the layer keeps the name. */
function SpareField({ mat, onSet }: Pick<MatFieldsProps, 'mat' | 'onSet'>) {
  const { roles } = useJobDraft()
  const session = useSession()
  const isEngineer = roles.includes('engineer')
  const share = Math.round(mat.spareShare * 1000) / 10
  const [refused, setRefused] = useState<number | null>(null)
  const name = session.state === 'in' ? session.me.person.name : null
  const by = mat.spareBy === null ? '' : ` Said by ${mat.spareBy}.`
  return (
    <View style={styles.field}>
      <NumberField
        label="Spare share"
        unit="%"
        hint={`${isEngineer ? 'Kept with your name.' : 'An engineer of this job sets it.'}${by}`}
        usual={{ range: '0', source: 'nothing counts unless somebody says so' }}
        value={refused ?? share}
        disabled={!isEngineer || name === null}
        error={refused === null ? undefined : `${refused} % is not between 0 and 100. ${share} % still holds.`}
        onCommit={(percent) => {
          const isOut = percent !== null && (percent < 0 || percent > 100)
          setRefused(isOut ? percent : null)
          if (percent === null || isOut) return
          onSet({ spareShare: percent / 100, spareBy: percent === 0 ? null : name }, 'Spare share of a mat')
        }}
      />
    </View>
  )
}

const styles = StyleSheet.create({
  mat: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.m,
    borderBottomWidth: 1,
    borderColor: colour.rule,
    paddingBottom: space.s,
  },
  field: { flexGrow: 1, flexBasis: 140, maxWidth: 260, minWidth: 0 },
  end: { flexDirection: 'row', alignItems: 'center', gap: space.m },
})
