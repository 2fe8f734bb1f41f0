import type { PourData } from '@wedgeline/contract'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { space, useWide } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { NumberField } from '@/components/ui/number-field'
import { Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import type { Usual } from '@/components/ui/field'
import { CommittedText } from './committed-text'
import { ConcreteResultsSection } from './concrete-results-section'
import { CONCRETE_CLASSES, fckOf, OWN_CONCRETE, USUAL } from './concrete'
import { PourMats } from './pour-mats'
import { StagesEditor } from './stages-editor'
import { useRowEdit } from './use-row-edit'

type NumberName = 'thicknessMm' | 'coverTopMm' | 'coverSoffitMm' | 'coverEdgeMm' | 'aggregateMm'

const NUMBERS: readonly { readonly name: NumberName; readonly label: string; readonly usual: Usual }[] = [
  { name: 'thicknessMm', label: 'Thickness', usual: USUAL.thickness },
  { name: 'coverTopMm', label: 'Cover at the top', usual: USUAL.cover },
  { name: 'coverSoffitMm', label: 'Cover at the soffit', usual: USUAL.cover },
  { name: 'coverEdgeMm', label: 'Cover at edges', usual: USUAL.cover },
  { name: 'aggregateMm', label: 'Largest aggregate', usual: USUAL.aggregate },
]

/** What is known of a pour beside its outline, each value with its unit and what is usual. */
export function PourDataForm({ pour }: { readonly pour: PourData }) {
  const { apply, refusal, canEdit } = useRowEdit()
  const field = useWide() ? styles.fifth : styles.field
  const set = (changes: Partial<PourData>, label: string) =>
    apply({ label, commands: [{ type: 'set', table: 'pours', id: pour.id, changes }] })
  const isClass = fckOf(pour.concrete) !== null
  return (
    <>
      <Section title="Slab">
        {refusal ? <Banner tone="over" words={refusal} isUrgent /> : null}
        <View style={styles.fields}>
          <View style={field}>
            <CommittedText
              label="Mark"
              value={pour.mark}
              required
              disabled={!canEdit}
              onCommit={(mark) => set({ mark }, 'Mark of the pour')}
            />
          </View>
          <View style={field}>
            <CommittedText
              label="Title"
              value={pour.title}
              disabled={!canEdit}
              onCommit={(title) => set({ title }, 'Title of the pour')}
            />
          </View>
          <View style={field}>
            <Select
              label="Concrete"
              options={[
                ...CONCRETE_CLASSES.map(({ name }) => ({ value: name, label: name })),
                { value: OWN_CONCRETE, label: isClass ? 'another' : pour.concrete },
              ]}
              value={isClass ? pour.concrete : OWN_CONCRETE}
              disabled={!canEdit}
              onChange={(name) => set(concreteOf(name, pour), 'Concrete')}
            />
          </View>
          <View style={field}>
            <NumberField
              label="Cylinder strength at 28 days"
              unit="MPa"
              value={pour.fckMPa}
              usual={USUAL.fck}
              disabled={!canEdit || isClass}
              onCommit={(fckMPa) => fckMPa !== null && set({ fckMPa }, 'Strength of the concrete')}
            />
          </View>
          {NUMBERS.map(({ name, label, usual }) => (
            <View key={name} style={field}>
              <NumberField
                label={label}
                unit="mm"
                value={pour[name]}
                usual={usual}
                disabled={!canEdit}
                onCommit={(value) => value !== null && set({ [name]: value }, label)}
              />
            </View>
          ))}
        </View>
      </Section>
      <Section title="Stages of stressing">
        <StagesEditor
          stages={pour.stages}
          disabled={!canEdit}
          onChange={(stages, label) => set({ stages: [...stages] }, label)}
          newStage={(values) => ({ id: newId(), ...values })}
        />
      </Section>
      <ConcreteResultsSection pour={pour} />
      <PourMats pour={pour} onSet={(mats, label) => set({ mats: [...mats] }, label)} />
    </>
  )
}

/** A class carries its strength; other concrete starts from the strength that was there. */
function concreteOf(name: string, pour: PourData): Partial<PourData> {
  const fckMPa = fckOf(name)
  return fckMPa === null ? { concrete: `fck ${pour.fckMPa}` } : { concrete: name, fckMPa }
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  /** Five in a line, those of the second line under those of the first. */
  fifth: { width: '19%', minWidth: 0 },
  field: { flexGrow: 1, flexBasis: 150, maxWidth: 320, minWidth: 0 },
})
