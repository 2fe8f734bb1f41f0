import type { EdgeData } from '@wedgeline/contract'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { colour, space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Icon } from '@/components/ui/icon'
import { NumberField } from '@/components/ui/number-field'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { useJobDraft } from '../editing/job-draft'
import { CommittedText } from './committed-text'
import { LENGTH_KIND_WORDS, LENGTH_KINDS } from './edge-words'
import { inOrder, joined, movedEnd, split } from './length-commands'
import { useRowEdit } from './use-row-edit'

type Length = EdgeData['lengths'][number]

export interface EdgeLengthsProps {
  /** Null while no edge's lengths are asked for. */
  readonly edgeId: string | null
  readonly onClose: () => void
}

/** The lengths of an edge: where each begins and ends, what it is, its top and soffit, and the room for a jack. */
export function EdgeLengths({ edgeId, onClose }: EdgeLengthsProps) {
  const { layout } = useJobDraft()
  const row = useRowEdit()
  const edge = layout.edges.find(({ id }) => id === edgeId)
  const pour = layout.pours.find(({ id }) => id === edge?.pourId)
  const set = (lengths: readonly Length[], label: string): boolean =>
    edge !== undefined &&
    row.apply({ label, commands: [{ type: 'set', table: 'edges', id: edge.id, changes: { lengths } }] })
  const lengths = inOrder(edge?.lengths ?? [])
  return (
    <Dialog title={edge ? `Lengths of edge ${edge.mark}` : 'Lengths'} isOpen={edge !== undefined} onClose={onClose}>
      <Text kind="small" tone="soft">
        Chainage runs along the edge line. Heights stand above the soffit of the slab
        {pour ? `, whose top is at ${pour.thicknessMm} mm` : ''}. The lengths cover the edge from end to end.
      </Text>
      {row.refusal ? <Banner tone="over" words={row.refusal} isUrgent /> : null}
      {edge
        ? lengths.map((length, at) => (
            <LengthFields
              key={length.id}
              length={length}
              isLast={at === lengths.length - 1}
              isOnly={lengths.length === 1}
              canEdit={row.canEdit}
              onSet={(changes, label) =>
                set(
                  lengths.map((other) => (other.id === length.id ? { ...other, ...changes } : other)),
                  `${label} of edge ${edge.mark}`,
                )
              }
              onEnd={(toMm) => {
                const moved = movedEnd(lengths, length.id, toMm)
                return moved !== null && set(moved, `End of a length of edge ${edge.mark}`)
              }}
              onSplit={() => set(split(lengths, length.id, newId()), `Split a length of edge ${edge.mark}`)}
              onRemove={() => set(joined(lengths, length.id), `Join two lengths of edge ${edge.mark}`)}
            />
          ))
        : null}
    </Dialog>
  )
}

interface LengthFieldsProps {
  readonly length: Length
  readonly isLast: boolean
  readonly isOnly: boolean
  readonly canEdit: boolean
  readonly onSet: (changes: Partial<Length>, label: string) => void
  readonly onEnd: (toMm: number) => boolean
  readonly onSplit: () => void
  readonly onRemove: () => void
}

function LengthFields(props: LengthFieldsProps) {
  const { length, isLast, isOnly, canEdit, onSet, onEnd, onSplit, onRemove } = props
  return (
    <View style={styles.length}>
      <View style={styles.head}>
        <Text kind="strong" level={3}>
          {`${Math.round(length.fromMm)} to ${Math.round(length.toMm)} mm`}
        </Text>
        {canEdit ? (
          <View style={styles.tools}>
            <Button kind="quiet" label="Split in two" onPress={onSplit} />
            {isOnly ? null : <Button kind="quiet" label="Join" icon={<Icon name="remove" />} onPress={onRemove} />}
          </View>
        ) : null}
      </View>
      <View style={styles.fields}>
        {isLast ? null : (
          <View style={styles.field}>
            <NumberField
              label="Ends at chainage"
              unit="mm"
              value={length.toMm}
              disabled={!canEdit}
              onCommit={(toMm) => toMm !== null && onEnd(toMm)}
            />
          </View>
        )}
        <View style={styles.field}>
          <Select
            label="Kind"
            options={LENGTH_KINDS.map((kind) => ({ value: kind, label: LENGTH_KIND_WORDS[kind] }))}
            value={length.kind}
            disabled={!canEdit}
            onChange={(kind) => onSet({ kind }, 'Kind of a length')}
          />
        </View>
        <View style={styles.field}>
          <NumberField
            label="Top"
            unit="mm"
            value={length.topMm}
            disabled={!canEdit}
            onCommit={(topMm) => topMm !== null && onSet({ topMm }, 'Top of a length')}
          />
        </View>
        <View style={styles.field}>
          <NumberField
            label="Soffit"
            unit="mm"
            hint="0 is the slab's soffit; an edge beam lies below, as −300."
            value={length.soffitMm}
            disabled={!canEdit}
            onCommit={(soffitMm) => soffitMm !== null && onSet({ soffitMm }, 'Soffit of a length')}
          />
        </View>
        <View style={styles.field}>
          <NumberField
            label="Clear room for the jack"
            unit="mm"
            hint="Outside the edge. Closed jack, stroke, strand tail and hand room stand there; empty while not known."
            value={length.jackClearMm}
            disabled={!canEdit}
            onCommit={(jackClearMm) => onSet({ jackClearMm }, 'Room for the jack')}
          />
        </View>
        <View style={styles.field}>
          <CommittedText
            label="Access for stressing"
            hint="Scaffold, edge protection, what has to be moved."
            value={length.access}
            disabled={!canEdit}
            onCommit={(access) => onSet({ access }, 'Access')}
          />
        </View>
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  length: { borderTopWidth: 1, borderColor: colour.rule, paddingTop: space.s, gap: space.s },
  head: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', alignItems: 'center' },
  tools: { flexDirection: 'row', gap: space.s },
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { flexGrow: 1, flexBasis: 200, minWidth: 0 },
})
