import type { LayoutFile, PourData } from '@wedgeline/contract'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { colour, space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Icon } from '@/components/ui/icon'
import { NumberField } from '@/components/ui/number-field'
import { Section } from '@/components/ui/screen'
import { Text } from '@/components/ui/text'
import { useJobDraft } from '../editing/job-draft'
import { CommittedText } from '../pour/committed-text'
import { useRowEdit } from '../pour/use-row-edit'

type Delivery = PourData['deliveries'][number]

/** How marks begin, and which edges and pans come together: what a drafter sets for a pour's schedule. */
export function DeliveriesSection({ pourId }: { readonly pourId: string }) {
  const { layout, canSetDeliveries } = useJobDraft()
  const { refusal, apply } = useRowEdit()
  const pour = layout.pours.find(({ id }) => id === pourId)
  if (!pour) return null
  const set = (label: string, changes: Partial<PourData>) =>
    apply({ label, commands: [{ type: 'set', table: 'pours', id: pourId, changes }] })
  const setDelivery = (id: string, label: string, changes: Partial<Delivery>) =>
    set(label, { deliveries: pour.deliveries.map((one) => (one.id === id ? { ...one, ...changes } : one)) })
  const add = () => {
    const name = `Delivery ${pour.deliveries.length + 1}`
    const delivery: Delivery = { id: newId(), name, neededOn: null, edgeIds: [], panIds: [] }
    set('Add a delivery', { deliveries: [...pour.deliveries, delivery] })
  }
  return (
    <Section
      title="Marks and deliveries"
      actions={canSetDeliveries ? <Button label="Add a delivery" icon={<Icon name="plus" />} onPress={add} /> : null}
    >
      {refusal ? <Banner tone="over" words={refusal} isUrgent /> : null}
      <MarkFields pour={pour} disabled={!canSetDeliveries} onSet={set} />
      {pour.deliveries.length === 0 ? (
        <Text tone="soft">No deliveries yet: all bars of the pour come together.</Text>
      ) : null}
      {pour.deliveries.map((delivery) => (
        <DeliveryFields
          key={delivery.id}
          delivery={delivery}
          members={membersOf(layout, pour)}
          disabled={!canSetDeliveries}
          onSet={(label, changes) => setDelivery(delivery.id, label, changes)}
          onRemove={() =>
            set('Remove a delivery', { deliveries: pour.deliveries.filter(({ id }) => id !== delivery.id) })
          }
        />
      ))}
    </Section>
  )
}

interface MarkFieldsProps {
  readonly pour: PourData
  readonly disabled: boolean
  readonly onSet: (label: string, changes: Partial<PourData>) => void
}

function MarkFields({ pour, disabled, onSet }: MarkFieldsProps) {
  return (
    <View style={styles.fields}>
      <View style={styles.field}>
        <CommittedText
          label="Prefix of marks"
          hint="Before each number, up to 6 letters."
          value={pour.markPrefix}
          disabled={disabled}
          onCommit={(markPrefix) => onSet('Prefix of marks', { markPrefix })}
        />
      </View>
      <View style={styles.field}>
        <NumberField
          label="First mark"
          hint="New marks count from here. A mark that a yard has keeps its number."
          value={pour.firstMark}
          required
          disabled={disabled}
          onCommit={(firstMark) => firstMark !== null && onSet('First mark', { firstMark })}
        />
      </View>
    </View>
  )
}

interface DeliveryMember {
  readonly id: string
  readonly mark: string
  readonly list: 'edgeIds' | 'panIds'
}

const membersOf = ({ edges, pans }: LayoutFile, { id }: PourData): readonly DeliveryMember[] => [
  ...edges
    .filter(({ pourId }) => pourId === id)
    .map((edge) => ({ id: edge.id, mark: edge.mark, list: 'edgeIds' as const })),
  ...pans.filter(({ pourId }) => pourId === id).map((pan) => ({ id: pan.id, mark: pan.mark, list: 'panIds' as const })),
]

interface DeliveryFieldsProps {
  readonly delivery: Delivery
  readonly members: readonly DeliveryMember[]
  readonly disabled: boolean
  readonly onSet: (label: string, changes: Partial<Delivery>) => void
  readonly onRemove: () => void
}

function DeliveryFields({ delivery, members, disabled, onSet, onRemove }: DeliveryFieldsProps) {
  const toggle = ({ id, list }: DeliveryMember, isIn: boolean) =>
    onSet('Members of a delivery', {
      [list]: isIn ? [...delivery[list], id] : delivery[list].filter((one) => one !== id),
    })
  return (
    <View role="group" aria-label={delivery.name} style={styles.delivery}>
      <View style={styles.fields}>
        <View style={styles.field}>
          <CommittedText
            label="Delivery"
            value={delivery.name}
            required
            disabled={disabled}
            onCommit={(name) => onSet('Name of a delivery', { name })}
          />
        </View>
        <View style={styles.field}>
          <CommittedText
            label="Needed on"
            hint="Year, month and day: 2026-03-09. Empty where none is agreed."
            value={delivery.neededOn ?? ''}
            disabled={disabled}
            onCommit={(day) => onSet('Day of a delivery', { neededOn: day === '' ? null : day })}
          />
        </View>
        {disabled ? null : <Button label={`Remove ${delivery.name}`} icon={<Icon name="minus" />} onPress={onRemove} />}
      </View>
      <View style={styles.members}>
        {members.map((member) => (
          <Checkbox
            key={member.id}
            label={member.mark}
            checked={delivery[member.list].includes(member.id)}
            disabled={disabled}
            onChange={(isIn) => toggle(member, isIn)}
          />
        ))}
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m, alignItems: 'flex-start' },
  field: { flexGrow: 1, flexBasis: 220, maxWidth: 360, minWidth: 0 },
  delivery: { gap: space.s, paddingTop: space.m, borderTopWidth: 1, borderTopColor: colour.line },
  members: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l },
})
