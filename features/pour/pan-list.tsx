import type { LayoutIndex, PourResult } from '@wedgeline/engine'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Link } from '@/components/ui/link'
import { Section } from '@/components/ui/screen'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { worstWords } from '../checks/words'

export interface PanListProps {
  readonly jobId: string
  readonly pourId: string
  readonly index: LayoutIndex
  readonly result: PourResult | null
}

/** The stressing pans of a pour, each with its worst check; nothing where the pour has none. */
export function PanList({ jobId, pourId, index, result }: PanListProps) {
  const pans = index.pansOfPour.get(pourId) ?? []
  if (pans.length === 0) return null
  return (
    <Section title="Pans">
      <View>
        {pans.map(({ id, mark }) => {
          const zone = result?.zones.find((each) => each.zone.id === `pan:${id}`)
          const worst = zone ? worstWords(zone) : null
          return (
            <View key={id} style={styles.line}>
              <Link href={`/jobs/${jobId}/pans/${id}`}>{`Pan ${mark}`}</Link>
              {worst ? (
                <StatusMark status={worst.status} words={worst.words} size={14} kind="figure" />
              ) : (
                <Text tone="soft">{result ? '–' : '…'}</Text>
              )}
            </View>
          )
        })}
      </View>
    </Section>
  )
}

const styles = StyleSheet.create({
  line: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: space.l,
    minHeight: 36,
    paddingVertical: space.xs,
    borderBottomWidth: 1,
    borderColor: colour.rule,
  },
})
