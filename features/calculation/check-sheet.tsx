import type { Check, Step } from '@wedgeline/engine'
import { STATUS_WORDS } from '@wedgeline/engine/result'
import { StyleSheet, View } from 'react-native'
import { colour, space, useWide } from '@/components/theme'
import { Icon } from '@/components/ui/icon'
import { LimitKindBox } from '@/components/ui/limit-kind'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { clauseText, outcomeText, ratioText, shownQuantity, unitText } from '../checks/words'
import { Formula } from './formula'
import { figureText, formulaParts, putIn, symbolPart } from './formula-text'

const PLANE_WORDS = { thickness: 'in the thickness', plan: 'in plan' } as const

/** One check as it is calculated: every line, then demand against limit. */
export function CheckSheet({ check, isRepeated }: { readonly check: Check; readonly isRepeated: ReadonlySet<Step> }) {
  const isWide = useWide()
  const steps = check.kind === 'compared' ? check.steps : []
  // A distance says what came of it in its first line, so that a zone with many keeps to one side of A4.
  const isShort = isWide && check.kind === 'compared' && check.compares !== 'ratio'
  return (
    <View style={styles.check} dataSet={{ print: 'together' }}>
      <View style={styles.head}>
        <View style={styles.mark}>
          {check.kind === 'advice' ? <Icon name="info" /> : <StatusMark status={check.status} markOnly />}
        </View>
        <Text kind="strong" level={2} style={styles.name}>
          {nameOf(check)}
        </Text>
        <LimitKindBox kind={check.limitKind} />
        {isShort ? <Text kind="strong">{comparedText(check)}</Text> : null}
        <Text kind="small" tone="soft" style={styles.clause}>
          {clauseText(check.clause)}
        </Text>
      </View>
      {steps.map((step, at) => (
        <StepLine
          key={`${step.symbol}-${at}`}
          step={step}
          isWide={isWide}
          says={isRepeated.has(step) ? 'as above' : meaningOf(step, check)}
        />
      ))}
      {isShort ? null : <Outcome check={check} />}
      {check.notes.length > 0 ? (
        <Text kind="small" tone="soft" style={styles.note}>
          {check.notes.join(' ')}
        </Text>
      ) : null}
    </View>
  )
}

function nameOf({ name, plane, stage }: Check): string {
  const place = plane === null || name.includes(PLANE_WORDS[plane]) ? '' : ` ${PLANE_WORDS[plane]}`
  return `${name}${place}${stage === null ? '' : `, stage ${stage}`}`
}

interface StepLineProps {
  readonly step: Step
  readonly isWide: boolean
  /** What stands beside the line: its meaning and clause, or that it stands above. */
  readonly says: string
}

/** The clause is left out where it is the one that the head of the check names. */
function meaningOf({ meaning, clause }: Step, check: Check): string {
  const own = clauseText(clause)
  return own === clauseText(check.clause) ? meaning : `${meaning}; ${own}`
}

function StepLine({ step, isWide, says }: StepLineProps) {
  const numbers = putIn(step.formula, step.values)
  const result = figureText(step.value)
  return (
    <View style={[styles.step, isWide && styles.stepWide]}>
      <View style={styles.sum}>
        <Formula parts={[symbolPart(step.symbol), { text: ' = ' }, ...formulaParts(step.formula)]} />
        {numbers === result || isBare(step) ? null : <Text kind="figure">{` = ${numbers}`}</Text>}
        <Text kind="figureStrong">{` = ${result}${step.unit === '-' ? '' : ` ${unitText(step.unit)}`}`}</Text>
      </View>
      <Text kind="small" tone="soft" style={isWide ? styles.meaningWide : styles.meaning}>
        {says}
      </Text>
    </View>
  )
}

/** The formula is a number or one name alone: putting it in would say the result twice. */
const isBare = ({ formula }: Step): boolean => /^[\w.]+$/.test(formula)

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
  clause: { flexShrink: 1, minWidth: 0 },
  step: { paddingLeft: 26, paddingVertical: 1 },
  stepWide: { flexDirection: 'row', alignItems: 'baseline', columnGap: space.l },
  sum: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline', flexGrow: 1, flexShrink: 1, flexBasis: '56%' },
  meaning: { paddingBottom: space.xs },
  meaningWide: { flexBasis: '44%', flexShrink: 1 },
  outcome: { paddingLeft: 26 },
  note: { paddingLeft: 26 },
})
