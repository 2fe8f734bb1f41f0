import { toEngine, type LayoutFile } from '@wedgeline/contract'
import type { PourResult, Schedule } from '@wedgeline/engine'
import { layoutIndex } from '@wedgeline/engine/geometry'
import { useMemo, useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Icon } from '@/components/ui/icon'
import { Section } from '@/components/ui/screen'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { CheckLine } from '../checks/check-line'
import { countOnProposed, READING_NOT_ACCEPTED } from '../checks/proposed'
import { EdgeStrip } from '../edge/strip/edge-strip'
import { stripData } from '../edge/strip/strip-data'
import { BarsTable } from './bars-table'
import { EDGE_ID } from './quick-layout'
import type { QuickWork } from './use-quick-answer'
import { worstKinds, type WorstKind } from './worst-kinds'

/** Plan and face of the edge as it is typed; checks and bars follow as soon as they are worked out. */
export function QuickStrip({ layout, result }: { readonly layout: LayoutFile; readonly result: PourResult | null }) {
  const index = useMemo(() => layoutIndex(toEngine(layout)), [layout])
  const data = useMemo(() => stripData(index, EDGE_ID), [index])
  const results = useMemo(() => new Map((result?.zones ?? []).map((each) => [each.zone.id, each])), [result])
  const [selected, setSelected] = useState<string | null>(null)
  const picked = selected === null ? undefined : results.get(selected)
  return (
    <View style={styles.part}>
      <EdgeStrip
        {...{ index, data, results, selected }}
        onSelect={(zone) => setSelected((now) => (now === zone ? null : zone))}
        isTableOpen={false}
      />
      {picked ? (
        <Section title={`Checks of ${picked.zone.name}`}>
          {picked.checks.map((check, at) => (
            <CheckLine key={`${check.name}-${check.stage ?? ''}-${at}`} check={check} />
          ))}
        </Section>
      ) : null}
    </View>
  )
}

/** Kinds of checks on a list before the rest is a number. */
const SHOWN = 10

/** What is not within, and what nothing passes for. */
export function WorstSection({ result, proposal }: { readonly result: PourResult } & Pick<QuickWork, 'proposal'>) {
  const kinds = worstKinds(result.zones)
  const resting = countOnProposed(result.zones)
  const blocked = proposal?.zones.filter((zone) => zone.blocked.length > 0) ?? []
  return (
    <Section title="Worst checks">
      {kinds.length === 0 ? <Text>Every check is within its limit.</Text> : null}
      <View role="list">
        {kinds.slice(0, SHOWN).map((kind) => (
          <WorstLine key={`${kind.status}-${kind.name}`} kind={kind} />
        ))}
      </View>
      {kinds.length > SHOWN ? <Text tone="soft">{`and ${kinds.length - SHOWN} more kinds of checks`}</Text> : null}
      {blocked.map(({ zone, blocked: [first, ...others] }) => (
        <Text key={zone.id} tone="over">
          {`${zone.name}: no bars pass. ${first ? `${first.candidate}: ${first.check}, ${first.by}.` : ''}${others.length > 0 ? ` ${others.length} more were tried.` : ''}`}
        </Text>
      ))}
      {resting > 0 ? (
        <View style={styles.line}>
          <Icon name="needs-judgement" size={14} colour={colour.soft} />
          <Text tone="soft" style={styles.grow}>
            {`${resting} checks rest on readings that no engineer has accepted: each says “${READING_NOT_ACCEPTED}”.`}
          </Text>
        </View>
      ) : null}
    </Section>
  )
}

function WorstLine({ kind: { name, status, words, place, isOnProposed } }: { readonly kind: WorstKind }) {
  return (
    <View role="listitem" style={styles.worst}>
      <StatusMark status={status} markOnly />
      <View style={styles.grow}>
        <Text kind="strong">{name}</Text>
        <Text kind="small" tone="soft">
          {`${place}: ${words}${isOnProposed ? ` (${READING_NOT_ACCEPTED})` : ''}`}
        </Text>
      </View>
    </View>
  )
}

export function BarsSection({ schedule, proposal }: { readonly schedule: Schedule } & Pick<QuickWork, 'proposal'>) {
  const errors = schedule.problems.filter(({ severity }) => severity === 'error')
  return (
    <Section title={`Bars, ${schedule.mass.toFixed(0)} kg`}>
      <BarsTable schedule={schedule} />
      {proposal?.notes.map((note) => (
        <Text key={note} tone="soft">
          {note}
        </Text>
      ))}
      {errors.map(({ where, message }, at) => (
        <Text key={at} tone="over">{`${where}: ${message}`}</Text>
      ))}
    </Section>
  )
}

const styles = StyleSheet.create({
  part: { gap: space.l },
  line: { flexDirection: 'row', alignItems: 'center', gap: space.s },
  grow: { flex: 1, minWidth: 0 },
  worst: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    paddingVertical: space.xs,
    borderBottomWidth: 1,
    borderColor: colour.rule,
  },
})
