import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { NumberField } from '@/components/ui/number-field'
import { CommittedText } from './committed-text'
import { USUAL } from './concrete'

export interface StageValues {
  readonly id: string
  readonly name: string
  readonly share: number
  readonly strengthMPa: number
}

export interface StagesEditorProps<Stage extends StageValues> {
  readonly stages: readonly Stage[]
  readonly disabled?: boolean
  readonly onChange: (stages: readonly Stage[], label: string) => void
  /** Makes the stage that is put before the last one. */
  readonly newStage: (values: Omit<StageValues, 'id'>) => Stage
}

/** The steps of stressing with their share of the force and the strength that the concrete must have reached. */
export function StagesEditor<Stage extends StageValues>(props: StagesEditorProps<Stage>) {
  const { stages, disabled = false, onChange, newStage } = props
  const set = (id: string, changes: Partial<StageValues>) =>
    onChange(
      stages.map((stage) => (stage.id === id ? { ...stage, ...changes } : stage)),
      'Stage of stressing',
    )
  const add = () => {
    const [last, before] = [stages.at(-1), stages.at(-2)]
    const share = Math.round((((before?.share ?? 0) + 1) / 2) * 100) / 100
    const strengthMPa = last?.strengthMPa ?? 22
    const stage = newStage({ name: `${Math.round(share * 100)} %`, share, strengthMPa })
    onChange([...stages.slice(0, -1), stage, ...stages.slice(-1)], 'Add a stage of stressing')
  }
  return (
    <View style={styles.stages}>
      {stages.map((stage, at) => (
        <View key={stage.id} style={styles.stage}>
          <View style={styles.field}>
            <CommittedText
              label={`Stage ${at + 1}`}
              value={stage.name}
              required
              disabled={disabled}
              onCommit={(name) => set(stage.id, { name })}
            />
          </View>
          <View style={styles.field}>
            <NumberField
              label="Share of the force"
              unit="%"
              value={Math.round(stage.share * 1000) / 10}
              required
              disabled={disabled}
              onCommit={(percent) => percent !== null && set(stage.id, { share: percent / 100 })}
            />
          </View>
          <View style={styles.field}>
            <NumberField
              label="Concrete before it, cylinder"
              unit="MPa"
              value={stage.strengthMPa}
              usual={stage.share === 1 ? USUAL.fullStrength : USUAL.firstStrength}
              required
              disabled={disabled}
              onCommit={(strengthMPa) => strengthMPa !== null && set(stage.id, { strengthMPa })}
            />
          </View>
          {disabled || at === stages.length - 1 ? (
            <View style={styles.noRemove} />
          ) : (
            <Button
              kind="quiet"
              label={`Remove stage ${stage.name}`}
              iconOnly
              icon={<Icon name="remove" />}
              onPress={() =>
                onChange(
                  stages.filter(({ id }) => id !== stage.id),
                  'Remove a stage of stressing',
                )
              }
            />
          )}
        </View>
      ))}
      {disabled || stages.length >= 6 ? null : (
        <View style={styles.add}>
          <Button label="Add a stage" icon={<Icon name="plus" />} onPress={add} />
        </View>
      )}
    </View>
  )
}

const styles = StyleSheet.create({
  stages: { gap: space.s },
  stage: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.m,
    alignItems: 'flex-start',
    borderBottomWidth: 1,
    borderColor: colour.rule,
    paddingBottom: space.s,
  },
  field: { flexGrow: 1, flexBasis: 150, maxWidth: 320, minWidth: 0 },
  noRemove: { width: 32 },
  add: { flexDirection: 'row' },
})
