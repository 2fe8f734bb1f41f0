import { StyleSheet, View } from 'react-native'
import { colour, space, useWide } from '@/components/theme'
import { Text } from '@/components/ui/text'
import { Formula } from '../calculation/formula'
import { formulaParts, symbolPart } from '../calculation/formula-text'
import { unitText } from '../checks/words'
import type { Method, Proof } from './method'
import { surenessOf, surenessWords, type Sureness } from './method-words'

interface MethodEntryProps {
  readonly method: Method
  /** A calculation led here. */
  readonly isAsked: boolean
}

/** The place of a formula on the page. */
export const anchorOf = (id: string): string => `method-${id}`

/** One formula: what it gives, how it is written, what it rests on, and what shows that it is right. */
export function MethodEntry({ method, isAsked }: MethodEntryProps) {
  const isWide = useWide()
  const { id, symbol, meaning, formula, unit, clauses, proofs } = method
  const part = isWide ? styles.part : null
  return (
    <View
      role="listitem"
      id={anchorOf(id)}
      aria-current={isAsked ? 'true' : undefined}
      style={[styles.entry, isWide && styles.wide, isAsked && styles.asked]}
    >
      <View style={[part, isWide && styles.rule]}>
        <Text>{isAsked ? `${meaning} (asked for)` : meaning}</Text>
        <View style={styles.formula}>
          <Formula parts={[symbolPart(symbol), { text: ' = ' }, ...formulaParts(formula)]} />
          {unit === '' || unit === '-' ? null : <Text kind="small" tone="soft">{`  ${unitText(unit)}`}</Text>}
        </View>
      </View>
      <View style={part}>
        {clauses.map((clause) => (
          <View key={`${clause.source} ${clause.section}`} style={styles.clause}>
            <Text kind="small">{`${clause.source}, ${clause.section}`}</Text>
            <SurenessTag sureness={surenessOf(clause)} />
          </View>
        ))}
      </View>
      <View style={part}>
        {proofs.map((proof) => (
          <ProofLine key={`${proof.test} ${proof.name}`} {...proof} />
        ))}
      </View>
    </View>
  )
}

function SurenessTag({ sureness }: { readonly sureness: Sureness }) {
  return (
    <Text kind="small" tone="soft" style={styles.tag}>
      {surenessWords(sureness)}
    </Text>
  )
}

/** A title that stands for several cases names its inputs as $width: here their place alone. */
const titleOf = (name: string): string => name.replace(/\$[\w.]+/g, '…')

function ProofLine({ value, test, name }: Proof) {
  return (
    <View style={styles.proof}>
      <Text kind="small">{value}</Text>
      <Text kind="small" tone="soft">{`${test.replace(/^tests\//, '')}: ${titleOf(name)}`}</Text>
    </View>
  )
}

const styles = StyleSheet.create({
  entry: {
    paddingVertical: space.s,
    paddingHorizontal: space.s,
    borderBottomWidth: 1,
    borderColor: colour.rule,
    gap: space.s,
  },
  wide: { flexDirection: 'row', gap: space.xl },
  asked: { backgroundColor: colour.wash },
  part: { flex: 3, minWidth: 0 },
  rule: { flex: 4 },
  formula: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline' },
  clause: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline', columnGap: space.s },
  tag: { borderWidth: 1, borderColor: colour.rule, paddingHorizontal: 4 },
  proof: { paddingBottom: space.xs },
})
