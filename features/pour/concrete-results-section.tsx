import { toEngine, type PourData } from '@wedgeline/contract'
import { strengthAtStages } from '@wedgeline/engine/geometry'
import { useMemo, useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { colour, space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Section } from '@/components/ui/screen'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { useJobDraft } from '../editing/job-draft'
import { ConcreteResultDialog, type ConcreteResultData, type ConcreteResultValues } from './concrete-result-dialog'
import { setRows, stageWords, type SetRow } from './concrete-results'
import { useRowEdit } from './use-row-edit'

const TABLE = 'concreteResults'

/** Strengths recorded for a pour, set by set, against the stages of stressing. */
export function ConcreteResultsSection({ pour }: { readonly pour: PourData }) {
  const { layout } = useJobDraft()
  const { apply, refusal, canEdit } = useRowEdit()
  const [open, setOpen] = useState<ConcreteResultData | 'new' | null>(null)
  const found = useMemo(() => strengthsOf(layout, pour.id), [layout, pour.id])
  const dataOf = (id: string) => layout.concreteResults.find((result) => result.id === id)
  const store = (values: ConcreteResultValues): boolean =>
    open === 'new' || open === null
      ? apply({
          label: 'Add a set of specimens',
          commands: [{ type: 'insert', table: TABLE, row: { id: newId(), pourId: pour.id, ...values } }],
        })
      : apply({
          label: 'Set of specimens',
          commands: [{ type: 'set', table: TABLE, id: open.id, changes: { ...values } }],
        })
  const remove = () => {
    if (open === null || open === 'new') return
    apply({ label: 'Remove a set of specimens', commands: [{ type: 'remove', table: TABLE, id: open.id }] })
    setOpen(null)
  }
  return (
    <Section
      title="Concrete results"
      actions={canEdit ? <Button label="Add a set" icon={<Icon name="plus" />} onPress={() => setOpen('new')} /> : null}
    >
      {refusal ? <Banner tone="over" words={refusal} isUrgent /> : null}
      <View style={styles.stages}>
        {found.stages.map((at) => (
          <Text key={at.stage.id}>{stageWords(at)}</Text>
        ))}
      </View>
      {found.rows.length === 0 ? (
        <Text tone="soft">
          No strengths are entered. Add each set of specimens with its age; the lowest of a set counts.
        </Text>
      ) : null}
      {found.rows.map((row) => {
        const data = dataOf(row.set.id)
        return data ? (
          <SetLine key={row.set.id} row={row} data={data} onOpen={canEdit ? () => setOpen(data) : null} />
        ) : null
      })}
      {open === null ? null : (
        <ConcreteResultDialog
          result={open === 'new' ? null : open}
          onStore={store}
          onRemove={remove}
          onClose={() => setOpen(null)}
        />
      )}
    </Section>
  )
}

interface SetLineProps {
  readonly row: SetRow
  readonly data: ConcreteResultData
  /** Null for somebody who may only read. */
  readonly onOpen: (() => void) | null
}

function SetLine({ row: { set, against }, data, onOpen }: SetLineProps) {
  const mean = Math.round(set.mean * 100) / 100
  return (
    <View style={styles.set}>
      <View style={styles.age}>
        <Text kind="figure">{`${set.ageHours} h`}</Text>
        <Text tone="soft">{data.cured || 'curing not given'}</Text>
      </View>
      <View style={styles.strengths}>
        <Text kind="figure">{`lowest ${set.lowest}, mean ${mean} MPa`}</Text>
        <Text tone="soft">{`${data.specimensMPa.join(', ')}${data.certificate ? `; ${data.certificate}` : ''}`}</Text>
      </View>
      <View style={styles.against}>
        {against.map(({ stageId, status, words }) => (
          <StatusMark key={stageId} status={status} words={words} kind="figure" />
        ))}
      </View>
      {onOpen ? <Button kind="quiet" label={`Change the set at ${set.ageHours} h`} onPress={onOpen} /> : null}
    </View>
  )
}

function strengthsOf(layout: Parameters<typeof toEngine>[0], pourId: string) {
  const { pours, concreteResults } = toEngine(layout)
  const pour = pours.find(({ id }) => id === pourId)
  if (!pour) return { stages: [], rows: [] }
  return { stages: strengthAtStages(pour, concreteResults), rows: setRows(pour, concreteResults) }
}

const styles = StyleSheet.create({
  stages: { gap: space.xs },
  set: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'flex-start',
    columnGap: space.l,
    rowGap: space.xs,
    borderBottomWidth: 1,
    borderColor: colour.rule,
    paddingVertical: space.s,
  },
  age: { flexBasis: 180, flexGrow: 0, minWidth: 0 },
  strengths: { flexBasis: 260, flexGrow: 1, minWidth: 0 },
  against: { flexBasis: 240, flexGrow: 1, minWidth: 0, gap: space.xs },
})
