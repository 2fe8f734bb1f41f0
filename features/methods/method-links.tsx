import type { Check, Step } from '@wedgeline/engine'
import { StyleSheet } from 'react-native'
import { Link } from '@/components/ui/link'
import { clauseText } from '../checks/words'
import { pathOfFamily, pathOfMethod } from './method-paths'

/** The clause of a check, leading to the methods of its family. */
export function CheckClause({ clause, family }: Pick<Check, 'clause' | 'family'>) {
  return (
    <Link kind="small" tone="soft" style={styles.clause} href={pathOfFamily(family)}>
      {clauseText(clause)}
    </Link>
  )
}

/** What a line of a calculation gives, leading to its formula in the list of methods. */
export function StepMeaning({ step, words }: { readonly step: Step; readonly words: string }) {
  return (
    <Link kind="small" tone="soft" style={styles.plain} href={pathOfMethod(step)}>
      {words}
    </Link>
  )
}

const styles = StyleSheet.create({
  clause: { flexShrink: 1, minWidth: 0 },
  // A sheet full of underlined lines is hard to read: the rule under the words is dotted.
  plain: { textDecorationStyle: 'dotted' },
})
