import { STEEL_NAMES } from '@wedgeline/engine/result'
import {
  steelShapeSchema,
  toSi,
  type Command,
  type SteelData,
  type SteelShapeData,
  type SteelZoneData,
} from '@wedgeline/contract'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { NumberField } from '@/components/ui/number-field'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { colour, space } from '@/components/theme'
import { useJobDraft } from '../../editing/job-draft'
import { steelWords } from '../steel-words'
import { fieldValue, steelFields, steelOfZone, usualSteel, type Place, type SteelKind } from './steel-fields'

export interface SteelListProps {
  readonly zone: SteelZoneData
  readonly zoneName: string
  readonly kinds: readonly SteelKind[]
  readonly place: Place
  /** Other zones that may take the same bars: the live anchors of the edge, unless `likeWords` calls them otherwise. */
  readonly likeZones: readonly SteelZoneData[]
  readonly likeWords?: string
  /** What a set of bars begins with here, where the kind of zone has usual bars of its own. */
  readonly usual?: (kind: SteelKind) => SteelShapeData | null
}

/** The bars of a zone: read, change, add, take away, or give the same to every like zone of the edge. */
export function SteelList(props: SteelListProps) {
  const { zone, zoneName, kinds, place, likeZones, likeWords = 'live anchors', usual } = props
  const { layout, canEdit, edit } = useJobDraft()
  const [open, setOpen] = useState<string | null>(null)
  const steel = steelOfZone(layout.steel, zone)
  const local = zone.kind === 'anchor' ? place.hardware?.localSteel : null
  const isLocalShown = local && !steel.some(({ shape }) => shape.kind === local.kind)
  const add = (kind: SteelKind) => {
    const shape = usual ? usual(kind) : usualSteel(kind, place)
    if (!shape) return
    const row: SteelData = { id: newId(), pourId: place.pour.id, zone, shape, source: 'by-hand', isLocked: false }
    edit({ label: `${zoneName}: add ${STEEL_NAMES[kind]}`, commands: [{ type: 'insert', table: 'steel', row }] })
    setOpen(row.id)
  }
  return (
    <View style={styles.list}>
      {isLocalShown ? (
        <View style={styles.line}>
          <Text style={styles.words}>{steelWords(toSi(local))}</Text>
          <Text kind="small" tone="soft">
            {local.isTested ? 'with the hardware, as tested' : 'with the hardware'}
          </Text>
        </View>
      ) : null}
      {steel.map((row) => (
        <SteelSet
          key={row.id}
          row={row}
          zoneName={zoneName}
          isOpen={open === row.id}
          onOpen={() => setOpen(open === row.id ? null : row.id)}
          likeZones={likeZones}
          likeWords={likeWords}
        />
      ))}
      {steel.length === 0 && !isLocalShown ? <Text tone="soft">No bars yet.</Text> : null}
      {canEdit ? (
        <View style={styles.actions}>
          {kinds.map((kind) => (
            <Button
              key={kind}
              label={`Add ${STEEL_NAMES[kind]}`}
              icon={<Icon name="plus" size={14} />}
              onPress={() => add(kind)}
            />
          ))}
        </View>
      ) : null}
    </View>
  )
}

function SteelSet(props: {
  readonly row: SteelData
  readonly zoneName: string
  readonly isOpen: boolean
  readonly onOpen: () => void
  readonly likeZones: readonly SteelZoneData[]
  readonly likeWords: string
}) {
  const { row, zoneName, isOpen, onOpen, likeZones, likeWords } = props
  const { layout, canEdit, edit } = useJobDraft()
  const name = STEEL_NAMES[row.shape.kind]
  const set = (key: string, value: string | number | null) => {
    if (value === null) return
    const shape = { ...row.shape, [key]: value }
    edit({
      label: `${zoneName}: ${name}`,
      key: `${row.id}.${key}`,
      // What a person changes is theirs from then on: no proposal replaces it.
      commands: [{ type: 'set', table: 'steel', id: row.id, changes: { shape, source: 'by-hand' } }],
    })
  }
  const remove = () =>
    edit({ label: `${zoneName}: remove ${name}`, commands: [{ type: 'remove', table: 'steel', id: row.id }] })
  const isKept = row.isLocked || row.source !== 'proposed'
  const lockOrRelease = () =>
    edit({
      label: `${zoneName}: ${isKept ? 'release' : 'lock'} ${name}`,
      commands: [
        {
          type: 'set',
          table: 'steel',
          id: row.id,
          changes: isKept ? { isLocked: false, source: 'proposed' } : { isLocked: true },
        },
      ],
    })
  const giveToAll = () => {
    const commands = likeZones.flatMap((zone): Command[] => {
      const old = steelOfZone(layout.steel, zone).filter(({ shape }) => shape.kind === row.shape.kind)
      return [
        ...old.map(({ id }): Command => ({ type: 'remove', table: 'steel', id })),
        { type: 'insert', table: 'steel', row: { ...row, id: newId(), zone, source: 'by-hand' } },
      ]
    })
    edit({ label: `Same ${name} at ${likeZones.length + 1} ${likeWords}`, commands })
  }
  return (
    <View>
      <View style={styles.line}>
        <Text style={styles.words}>{`${name}: ${steelWords(toSi(row.shape))}${stateWords(row)}`}</Text>
        {canEdit ? (
          <>
            <Button
              kind="quiet"
              label={`Keep ${name} when bars are proposed`}
              iconOnly
              icon={<Icon name="lock" />}
              aria-pressed={isKept}
              onPress={lockOrRelease}
            />
            <Button kind="quiet" label={isOpen ? 'Close' : 'Change'} aria-expanded={isOpen} onPress={onOpen} />
            <Button kind="quiet" label={`Remove ${name}`} iconOnly icon={<Icon name="remove" />} onPress={remove} />
          </>
        ) : null}
      </View>
      {isOpen ? (
        <View style={styles.fields}>
          {steelFields(row.shape.kind).map((field) => {
            const value = fieldValue(row.shape, field.key)
            return (
              <View key={field.key} style={styles.field}>
                {field.choices ? (
                  <Select
                    label={field.label}
                    {...(field.unit ? { unit: field.unit } : {})}
                    value={String(value)}
                    options={field.choices}
                    onChange={(next) => set(field.key, field.key === 'diameterMm' ? Number(next) : next)}
                  />
                ) : (
                  <NumberField
                    label={field.label}
                    {...(field.unit ? { unit: field.unit } : {})}
                    {...(field.usual ? { usual: field.usual } : {})}
                    value={typeof value === 'number' ? value : null}
                    onCommit={(next) => set(field.key, next)}
                    onType={(next) => canHold(row.shape, field.key, next) && set(field.key, next)}
                    required
                  />
                )}
              </View>
            )
          })}
          {likeZones.length > 0 ? (
            <Button label={`Give the same to the other ${likeZones.length} ${likeWords}`} onPress={giveToAll} />
          ) : null}
        </View>
      ) : null}
    </View>
  )
}

/** Proposed bars are replaced by the next proposal unless they are locked; those entered by hand are kept until released. */
const stateWords = ({ source, isLocked }: SteelData): string => {
  if (isLocked) return ', locked'
  return source === 'proposed' ? ', proposed' : ''
}

/** Whether a value may stand while it is typed; one that may not is said when the field is left. */
const canHold = (shape: SteelShapeData, key: string, value: number): boolean =>
  steelShapeSchema.safeParse({ ...shape, [key]: value }).success

const styles = StyleSheet.create({
  list: { gap: space.xs },
  line: { flexDirection: 'row', alignItems: 'center', gap: space.s, minHeight: 32 },
  words: { flex: 1, minWidth: 0 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s, paddingTop: space.xs },
  fields: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.m,
    padding: space.m,
    borderLeftWidth: 2,
    borderColor: colour.rust,
  },
  field: { width: 168, flexGrow: 1, maxWidth: 240 },
})
