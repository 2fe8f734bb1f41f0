import type { Check } from '@wedgeline/engine'
import { useState } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Icon } from '@/components/ui/icon'
import { LimitKindBox } from '@/components/ui/limit-kind'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { OnProposed } from './on-proposed'
import { clauseText, outcomeText, shownQuantity, sidesText } from './words'

/** One check in two lines: what it compares and what came of it. A press opens what else there is to know. */
export function CheckLine({ check }: { readonly check: Check }) {
  const [isOpen, setOpen] = useState(false)
  const notes = check.kind === 'refused' ? [check.message, ...check.notes] : check.notes
  const isLong = check.kind === 'compared' && check.compares !== 'ratio'
  return (
    <View style={styles.line}>
      <Pressable
        role="button"
        aria-expanded={isOpen}
        onPress={() => setOpen(!isOpen)}
        style={(state) => [styles.head, state.hovered && styles.over]}
      >
        <View style={styles.mark}>
          {check.kind === 'advice' ? <Icon name="info" /> : <StatusMark status={check.status} markOnly />}
        </View>
        <View style={styles.words}>
          <View style={styles.name}>
            <Text style={styles.shrink}>{check.stage ? `${check.name}, ${check.stage}` : check.name}</Text>
            <LimitKindBox kind={check.limitKind} />
          </View>
          <Text kind="small" tone="soft">
            {sides(check)}
          </Text>
          <OnProposed check={check} />
        </View>
        <Text kind="figureStrong" tone={toneOf(check)} style={isLong ? styles.outcomeLong : styles.outcome}>
          {outcome(check)}
        </Text>
        <Icon name={isOpen ? 'up' : 'down'} size={12} colour={colour.soft} />
      </Pressable>
      {isOpen ? (
        <View style={styles.notes}>
          <Text kind="small" tone="soft">
            {clauseText(check.clause)}
          </Text>
          {notes.map((note) => (
            <Text key={note} kind="small">
              {note}
            </Text>
          ))}
        </View>
      ) : null}
    </View>
  )
}

function sides(check: Check): string {
  switch (check.kind) {
    case 'compared':
      return sidesText(check)
    case 'refused':
      return 'not covered'
    case 'advice':
      return `${shownQuantity(check.measured, check.unit)}, usually ${check.usual}`
  }
}

function outcome(check: Check): string {
  if (check.kind === 'compared') return outcomeText(check)
  return check.kind === 'advice' ? (check.isUsual ? 'usual' : 'unusual') : ''
}

function toneOf(check: Check): 'ink' | 'over' | 'near' | 'soft' {
  if (check.kind === 'advice') return 'soft'
  if (check.status === 'over' || check.status === 'stop') return 'over'
  return check.status === 'near' ? 'near' : 'ink'
}

const styles = StyleSheet.create({
  line: { borderBottomWidth: 1, borderColor: colour.rule },
  head: { flexDirection: 'row', alignItems: 'center', gap: space.s, paddingVertical: 5, minHeight: 40 },
  over: { backgroundColor: colour.wash },
  mark: { width: 18, alignItems: 'center' },
  words: { flex: 1, minWidth: 0 },
  name: { flexDirection: 'row', alignItems: 'center', gap: 6 },
  shrink: { flexShrink: 1 },
  outcome: { textAlign: 'right', minWidth: 44 },
  outcomeLong: { textAlign: 'right', maxWidth: 120 },
  notes: { paddingLeft: 26, paddingBottom: space.s, gap: space.xs },
})
