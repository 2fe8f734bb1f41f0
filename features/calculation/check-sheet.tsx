import type { Check } from '@wedgeline/engine'
import { STATUS_WORDS } from '@wedgeline/engine/result'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space, useWide } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { LimitKindBox } from '@/components/ui/limit-kind'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { outcomeText, ratioText, shownQuantity } from '../checks/words'
import { CheckClause, StepMeaning } from '../methods/method-links'
import { isPlain, meaningOf, nameOf } from './check-words'
import type { ShownStep } from './shown-steps'
import { StepSum } from './step-text'

export interface CheckSheetProps {
  readonly check: Check
  readonly steps: readonly ShownStep[]
}

/** One check as it is calculated: every line, then demand against limit. One that is within folds to its outcome. */
export function CheckSheet({ check, steps }: CheckSheetProps) {
  const isWide = useWide()
  const isFolding = isPlain(check) && steps.length + check.notes.length > 0
  const [isOpen, setOpen] = useState(false)
  const isShown = isOpen || !isFolding
  // A distance says what came of it in its first line.
  const isShort = isWide && check.kind === 'compared' && check.compares !== 'ratio'
  return (
    <View style={styles.check}>
      <View style={styles.head}>
        <View style={styles.mark}>
          {check.kind === 'advice' ? <Icon name="info" /> : <StatusMark status={check.status} markOnly />}
        </View>
        <Text kind="strong" level={2} style={styles.name}>
          {nameOf(check)}
        </Text>
        <LimitKindBox kind={check.limitKind} />
        {isShort ? <Text kind="strong">{comparedText(check)}</Text> : null}
        <CheckClause clause={check.clause} family={check.family} />
        {isFolding ? (
          <Button
            kind="quiet"
            label={`${isOpen ? 'Fold' : 'Steps and notes of'} ${nameOf(check)}`}
            iconOnly
            icon={<Icon name={isOpen ? 'up' : 'down'} size={12} />}
            aria-expanded={isOpen}
            onPress={() => setOpen(!isOpen)}
          />
        ) : null}
      </View>
      {isShown ? steps.map((line, at) => <StepLine key={at} line={line} check={check} isWide={isWide} />) : null}
      {isShort ? null : <Outcome check={check} />}
      {isShown
        ? check.notes.map((note, at) => (
            <Text key={at} kind="small" tone="soft" style={styles.note}>
              {note}
            </Text>
          ))
        : null}
    </View>
  )
}

interface StepLineProps {
  readonly line: ShownStep
  readonly check: Check
  readonly isWide: boolean
}

function StepLine({ line: { step, isAbove }, check, isWide }: StepLineProps) {
  return (
    <View style={[styles.step, isWide && styles.stepWide]}>
      <View style={styles.sum}>
        <StepSum step={step} />
      </View>
      <Text kind="small" tone="soft" style={isWide ? styles.meaningWide : styles.meaning}>
        {isAbove ? 'as above' : <StepMeaning step={step} words={meaningOf(step, check)} />}
      </Text>
    </View>
  )
}

function Outcome({ check }: { readonly check: Check }) {
  if (check.kind === 'refused') return <Text style={styles.outcome}>{`Not covered. ${check.message}`}</Text>
  if (check.kind === 'advice') {
    const measured = shownQuantity(check.measured, check.unit)
    return (
      <Text style={styles.outcome}>
        {`Measured ${measured}, usually ${check.usual}: ${check.isUsual ? 'as usual' : 'not usual'}. Common practice gives no status.`}
      </Text>
    )
  }
  return (
    <View style={styles.outcome}>
      <StatusMark status={check.status} words={comparedText(check)} kind="strong" />
    </View>
  )
}

function comparedText(check: Extract<Check, { kind: 'compared' }>): string {
  const [demand, limit] = [shownQuantity(check.demand, check.unit), shownQuantity(check.limit, check.unit)]
  const sides =
    check.compares === 'ratio'
      ? `Demand ${demand}, limit ${limit}: ${check.utilisation === null ? 'no steel counts' : ratioText(check.utilisation)}`
      : `There is ${demand}, ${check.compares === 'at-least' ? 'needs' : 'at most'} ${limit}: ${outcomeText(check)}`
  const isWaiting = check.status === 'needs-judgement' && check.readingIds.length > 0
  return isWaiting
    ? `${sides}. Needs judgement: the reading it rests on is not accepted`
    : `${sides}, ${STATUS_WORDS[check.status]}`
}

const styles = StyleSheet.create({
  check: { paddingVertical: 6, borderTopWidth: 1, borderColor: colour.rule, gap: 2 },
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.s },
  mark: { width: 18 },
  name: { flexShrink: 1 },
  step: { paddingLeft: 26, paddingVertical: 1 },
  stepWide: { flexDirection: 'row', alignItems: 'baseline', columnGap: space.l },
  sum: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline', flexGrow: 1, flexShrink: 1, flexBasis: '56%' },
  meaning: { paddingBottom: space.xs },
  meaningWide: { flexBasis: '44%', flexShrink: 1 },
  outcome: { paddingLeft: 26 },
  note: { paddingLeft: 26 },
})
