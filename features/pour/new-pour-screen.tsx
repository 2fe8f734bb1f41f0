import { router } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { space, useWide } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { NumberField } from '@/components/ui/number-field'
import { Screen, Section } from '@/components/ui/screen'
import { Select } from '@/components/ui/select'
import { Failed } from '@/components/ui/states'
import { TextField } from '@/components/ui/text-field'
import type { Usual } from '@/components/ui/field'
import { useJobDraft } from '../editing/job-draft'
import { CONCRETE_CLASSES, OWN_CONCRETE, USUAL } from './concrete'
import { drawnCorners, emptyForm, readForm, type PourField, type PourForm } from './new-pour'
import { OutlineDrawing } from './outline-drawing'
import { OutlineEditor } from './outline-editor'
import { outlineProblem } from './outline-input'
import { insertPour } from './pour-commands'
import { jobParents } from './pour-frame'
import { StagesEditor } from './stages-editor'
import { useRowEdit } from './use-row-edit'

const NEW_LEVEL = 'new'

/** A new pour: what it is called, its concrete, and its outline drawn as it is typed. */
export function NewPourScreen({ jobId }: { readonly jobId: string }) {
  const job = useJobDraft()
  const { layout } = job
  const isWide = useWide()
  const { apply, refusal } = useRowEdit()
  const [form, setForm] = useState(() => emptyForm(layout))
  const [isAsked, setAsked] = useState(false)
  const read = readForm(form, layout)
  const problems = isAsked && !read.ok ? read.problems : {}
  const set = (changes: Partial<PourForm>) => setForm((now) => ({ ...now, ...changes }))
  const make = () => {
    setAsked(true)
    if (!read.ok) return
    const { change, pourId } = insertPour(layout, read.pour, newId)
    if (apply(change)) router.replace(`/jobs/${jobId}/pours/${pourId}`)
  }
  if (!job.canEdit) {
    return (
      <Screen title="New pour" parents={jobParents(job)} isNarrow>
        <Failed
          what="Your role on this job does not add pours."
          advice="A detailer or an engineer of the job adds them; the admin of the company sets roles."
        />
      </Screen>
    )
  }
  const corners = drawnCorners(form.outline)
  const fields = { form, set, problems }
  return (
    <Screen title="New pour" parents={jobParents(job)}>
      <View style={isWide ? styles.wide : styles.phone}>
        <View style={styles.form}>
          <NamesAndConcrete {...fields} levels={layout.levels} />
          <Section title="Outline">
            <OutlineEditor outline={form.outline} onChange={(outline) => set({ outline })} />
            {isWide ? null : <Drawing corners={corners} form={form} layout={layout} />}
            {problems.outline ? <Banner tone="over" words={problems.outline} isUrgent /> : null}
          </Section>
          <Section title="Stages of stressing">
            <StagesEditor
              stages={form.stages}
              onChange={(stages) => set({ stages })}
              newStage={(values) => ({ id: newId(), ...values })}
            />
            {problems.stages ? <Banner tone="over" words={problems.stages} isUrgent /> : null}
          </Section>
          {refusal ? <Banner tone="over" words={refusal} isUrgent /> : null}
          <View style={styles.row}>
            <Button kind="main" label={`Make pour ${form.mark}`.trim()} onPress={make} />
            <Button label="Back to the job" href={`/jobs/${jobId}`} />
          </View>
        </View>
        {isWide ? (
          <View style={styles.beside}>
            <Drawing corners={corners} form={form} layout={layout} />
          </View>
        ) : null}
      </View>
    </Screen>
  )
}

interface DrawingProps {
  readonly corners: ReturnType<typeof drawnCorners>
  readonly form: PourForm
  readonly layout: ReturnType<typeof useJobDraft>['layout']
}

function Drawing({ corners, form, layout }: DrawingProps) {
  const others = layout.pours.filter(({ levelId }) => levelId === form.levelId)
  return <OutlineDrawing corners={corners} others={others} isSound={outlineProblem(corners) === null} />
}

interface FieldsProps {
  readonly form: PourForm
  readonly set: (changes: Partial<PourForm>) => void
  readonly problems: Readonly<Partial<Record<PourField, string>>>
}

type NumberName = 'thicknessMm' | 'coverTopMm' | 'coverSoffitMm' | 'coverEdgeMm'
const NUMBERS: readonly { readonly name: NumberName; readonly label: string; readonly usual: Usual }[] = [
  { name: 'thicknessMm', label: 'Thickness', usual: USUAL.thickness },
  { name: 'coverTopMm', label: 'Cover at the top', usual: USUAL.cover },
  { name: 'coverSoffitMm', label: 'Cover at the soffit', usual: USUAL.cover },
  { name: 'coverEdgeMm', label: 'Cover at edges', usual: USUAL.cover },
]

function NamesAndConcrete(props: FieldsProps & { readonly levels: DrawingProps['layout']['levels'] }) {
  const { form, set, problems, levels } = props
  return (
    <Section title="Slab">
      <View style={styles.fields}>
        <View style={styles.field}>
          <TextField
            label="Mark"
            value={form.mark}
            onChangeText={(mark) => set({ mark })}
            required
            maxLength={12}
            error={problems.mark}
          />
        </View>
        <View style={styles.field}>
          <TextField label="Title" value={form.title} onChangeText={(title) => set({ title })} maxLength={120} />
        </View>
        <View style={styles.field}>
          <Select
            label="Level"
            options={[
              ...levels.map(({ id, mark, title }) => ({ value: id, label: title ? `${mark}, ${title}` : mark })),
              { value: NEW_LEVEL, label: 'a new level' },
            ]}
            value={form.levelId ?? NEW_LEVEL}
            onChange={(value) => set({ levelId: value === NEW_LEVEL ? null : value })}
          />
        </View>
        {form.levelId === null ? (
          <View style={styles.field}>
            <TextField
              label="Mark of the new level"
              value={form.levelMark}
              onChangeText={(levelMark) => set({ levelMark })}
              required
              maxLength={12}
              error={problems.levelMark}
            />
          </View>
        ) : null}
        <ConcreteFields {...props} />
        {NUMBERS.map(({ name, label, usual }) => (
          <View key={name} style={styles.field}>
            <NumberField
              label={label}
              unit="mm"
              value={form[name]}
              usual={usual}
              required
              error={problems[name]}
              onCommit={(value) => set({ [name]: value })}
            />
          </View>
        ))}
      </View>
    </Section>
  )
}

function ConcreteFields({ form, set, problems }: FieldsProps) {
  return (
    <>
      <View style={styles.field}>
        <Select
          label="Concrete"
          hint="Cylinder over cube strength."
          options={[
            ...CONCRETE_CLASSES.map(({ name }) => ({ value: name, label: name })),
            { value: OWN_CONCRETE, label: 'own' },
          ]}
          value={form.concrete}
          onChange={(concrete) => set({ concrete })}
        />
      </View>
      {form.concrete === OWN_CONCRETE ? (
        <>
          <View style={styles.field}>
            <TextField
              label="Name of the concrete"
              value={form.ownName}
              onChangeText={(ownName) => set({ ownName })}
              maxLength={20}
            />
          </View>
          <View style={styles.field}>
            <NumberField
              label="Cylinder strength at 28 days"
              unit="MPa"
              value={form.ownFckMPa}
              usual={USUAL.fck}
              required
              error={problems.ownFckMPa}
              onCommit={(ownFckMPa) => set({ ownFckMPa })}
            />
          </View>
        </>
      ) : null}
    </>
  )
}

const styles = StyleSheet.create({
  wide: { flexDirection: 'row', gap: space.xxl, alignItems: 'flex-start' },
  phone: { gap: space.xl },
  form: { flex: 3, gap: space.xl, minWidth: 0 },
  beside: { flex: 2, minWidth: 0 },
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { flexGrow: 1, flexBasis: 150, maxWidth: 340, minWidth: 0 },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
})
