import type { ZoneResult } from '@wedgeline/engine'
import { StyleSheet, View } from 'react-native'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/components/theme'
import { CheckLine } from '../../checks/check-line'
import { notYetText } from '../../checks/words'

/** The checks of a zone by severity, what is not checked here yet, and the way to the calculation. */
export function ZoneChecks({ jobId, result }: { readonly jobId: string; readonly result: ZoneResult | null }) {
  if (!result) return <Text tone="soft">Being worked out …</Text>
  const notYet = notYetText(result.notYetChecked)
  return (
    <View style={styles.list}>
      <View>
        {result.checks.map((check, i) => (
          <CheckLine key={`${check.family}-${check.name}-${check.stage ?? ''}-${i}`} check={check} />
        ))}
      </View>
      {notYet ? (
        <Text kind="small" tone="soft">
          {notYet}
        </Text>
      ) : null}
      <Link href={`/jobs/${jobId}/zones/${encodeURIComponent(result.zone.id)}`}>Calculation, every step</Link>
    </View>
  )
}

const styles = StyleSheet.create({ list: { gap: space.s } })
