import type { Check, ZoneResult } from '@wedgeline/engine'
import { STATUS_WORDS } from '@wedgeline/engine/result'
import { StyleSheet, View } from 'react-native'
import { colour } from '@/components/theme'
import { LIMIT_KIND_WORD } from '@/components/ui/limit-kind'
import { Text } from '@/components/ui/text'
import { clauseText, outcomeText, shownQuantity } from '../checks/words'
import { isPlain, meaningOf, nameOf } from './check-words'
import { printedChecks, printSize, type PrintedCheck } from './print-size'
import { StepSum } from './step-text'

export interface ZonePrintProps {
  readonly zone: ZoneResult
  /** Job, pour, basis and the like, as name and value. */
  readonly facts: readonly (readonly [string, string])[]
  /** The readings that the results rest on and who accepted them, a sentence each. */
  readonly readings: readonly string[]
  readonly foot: readonly string[]
}

/**
 * One zone on one side of A4, in two columns: what is to be decided in full; what is within as a table, whose lines add
 * the steps that stand nowhere above; then advice. On screen it is not there.
 */
export function ZonePrint({ zone, facts, readings, foot }: ZonePrintProps) {
  const printed = printedChecks(zone.checks)
  const { density } = printSize(printed, 6 + readings.length + foot.length)
  const full = printed.filter(({ check }) => check.kind !== 'advice' && !isPlain(check))
  const within = printed.filter(({ check }) => isPlain(check))
  const advice = printed.filter(({ check }) => check.kind === 'advice')
  return (
    <View style={styles.sheet} dataSet={{ print: 'a4', density }} aria-hidden>
      <View style={styles.head}>
        <Text kind="heading">{`Calculation, ${zone.zone.name}`}</Text>
        <Words>
          {[...facts.map(([name, value]) => `${name}: ${value}`), zone.status ? STATUS_WORDS[zone.status] : '']
            .filter(Boolean)
            .join('  ·  ')}
        </Words>
        {readings.map((reading) => (
          <Words key={reading}>{reading}</Words>
        ))}
      </View>
      <View dataSet={{ print: 'columns' }}>
        {full.map((one, at) => (
          <PrintedBlock key={at} printed={one} />
        ))}
        {within.length > 0 ? <PartTitle>Within: there is or demand, limit, outcome, clause</PartTitle> : null}
        {within.map((one, at) => (
          <PrintedBlock key={at} printed={one} />
        ))}
        {advice.length > 0 ? <PartTitle>Common practice, without a status</PartTitle> : null}
        {advice.map((one, at) => (
          <PrintedBlock key={at} printed={one} />
        ))}
      </View>
      <View style={styles.foot}>
        {foot.map((line) => (
          <Words key={line}>{line}</Words>
        ))}
      </View>
    </View>
  )
}

function PrintedBlock({ printed: { check, steps, notes } }: { readonly printed: PrintedCheck }) {
  return (
    <View style={styles.block} dataSet={{ print: 'flow' }}>
      <View dataSet={{ print: 'head' }}>
        <Text style={styles.words}>
          <Text style={styles.strong}>{`${nameOf(check)}: ${resultOf(check)}`}</Text>
          <Text style={styles.soft}>{`  ${check.limitKind}, ${clauseText(check.clause)}`}</Text>
        </Text>
      </View>
      {steps.map(({ step, isAbove }, at) => (
        <View key={at} style={styles.step} dataSet={{ print: 'together' }}>
          <Text style={styles.words}>
            <StepSum step={step} isPrinted />
            <Text style={styles.soft}>{`  ${isAbove ? 'as above' : meaningOf(step, check)}`}</Text>
          </Text>
        </View>
      ))}
      {notes.map((note, at) => (
        <View key={at} style={styles.step} dataSet={{ print: 'together' }}>
          <Text style={styles.soft}>{`– ${note}`}</Text>
        </View>
      ))}
    </View>
  )
}

function resultOf(check: Check): string {
  if (check.kind === 'refused') return `not covered. ${check.message}`
  if (check.kind === 'advice') {
    return `${shownQuantity(check.measured, check.unit)}, usually ${check.usual}${check.isUsual ? '' : ': not usual'}`
  }
  const [demand, limit] = [shownQuantity(check.demand, check.unit), shownQuantity(check.limit, check.unit)]
  const sides =
    check.compares === 'ratio'
      ? `${demand} / ${limit} = ${outcomeText(check)}`
      : `${demand}, ${LIMIT_WORD[check.compares]} ${limit}, ${outcomeText(check)}`
  const waits = check.status === 'needs-judgement' && check.readingIds.length > 0 ? ', reading not accepted' : ''
  return `${sides}, ${STATUS_WORDS[check.status]}${waits}`
}

const LIMIT_WORD = { 'at-least': 'needs', 'at-most': 'at most' } as const

const Words = ({ children }: { readonly children: string }) => <Text style={styles.words}>{children}</Text>

const PartTitle = ({ children }: { readonly children: string }) => (
  <View style={styles.part} dataSet={{ print: 'head' }}>
    <Text style={styles.strong}>{children}</Text>
  </View>
)

/** What the letters before a clause stand for. */
export const LIMIT_LETTERS = (Object.entries(LIMIT_KIND_WORD) as readonly [string, string][])
  .map(([letter, word]) => `${letter} ${word}`)
  .join(', ')

const styles = StyleSheet.create({
  sheet: { backgroundColor: colour.sheet },
  head: { gap: 1, paddingBottom: 4, borderBottomWidth: 1, borderColor: colour.ink, marginBottom: 4 },
  foot: { paddingTop: 3, marginTop: 4, borderTopWidth: 1, borderColor: colour.ink },
  part: { borderTopWidth: 1, borderColor: colour.ink, marginTop: 4, paddingTop: 2 },
  block: { borderTopWidth: 1, borderColor: colour.rule, paddingVertical: 2 },
  step: { paddingLeft: 10 },
  words: { fontSize: 13, lineHeight: 16 },
  strong: { fontSize: 13, lineHeight: 16, fontWeight: '600' },
  soft: { fontSize: 13, lineHeight: 16, color: colour.soft },
})
