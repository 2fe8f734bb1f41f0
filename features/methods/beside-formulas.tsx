import { BASIS_SOURCES } from '@wedgeline/engine/bases'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Section } from '@/components/ui/screen'
import { Text } from '@/components/ui/text'
import { clauseText } from '../checks/words'

/** What results rest on beside formulas: factors that a job may set, and readings that an engineer accepts. */
export function FactorsAndReadings({ basis }: { readonly basis: string | null }) {
  const shown = BASIS_SOURCES.filter(({ id }) => basis === null || id === basis)
  return shown.map(({ id, title, factors, readings }) => (
    <Section key={id} title={`Factors and readings, ${title}`}>
      <View role="list" style={styles.list}>
        {factors.map((factor) => (
          <View key={factor.name} role="listitem">
            <Text>{`${factor.title}: ${factor.recommended} recommended, ${factor.least} to ${factor.most} may be set`}</Text>
            <Text kind="small" tone="soft">
              {clauseText(factor.clause)}
            </Text>
          </View>
        ))}
        {readings.map((reading) => (
          <View key={reading.id} role="listitem">
            <Text>{`Reading: ${reading.title}. ${reading.text}`}</Text>
            <Text kind="small" tone="soft">{`Holds for: ${reading.range} ${clauseText(reading.clause)}`}</Text>
          </View>
        ))}
      </View>
    </Section>
  ))
}

/** What no formula of the list answers, said before somebody looks for it. */
const NOT_CHECKED = [
  'Tension at the face of an uneven row, and behind an anchor beside a wide gap: needs elastic analysis of the whole edge. Shown as not covered, with the value of the row as too low.',
  'Anchors within one prism length of a step in depth: the rules of a constant section are refused there.',
  'Anchors inclined or turned beyond the range of the simple rules, and plates as large as their prism: refused.',
  'Long-term losses, stresses in service and the strength of the slab: the design of the tendons is taken as given.',
  'Stressing itself: the tool records strengths and never clears it. A named engineer does.',
]

export function NotChecked() {
  return (
    <Section title="What is not checked">
      <View role="list" style={styles.list}>
        {NOT_CHECKED.map((text) => (
          <View key={text} role="listitem">
            <Text>{text}</Text>
          </View>
        ))}
      </View>
    </Section>
  )
}

const styles = StyleSheet.create({ list: { gap: space.s, maxWidth: 900 } })
