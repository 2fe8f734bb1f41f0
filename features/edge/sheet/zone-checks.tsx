import type { Check, ZoneResult } from '@wedgeline/engine'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/components/theme'
import { CheckLine } from '../../checks/check-line'
import { notYetText } from '../../checks/words'

/** The checks of a zone by severity, what is not checked here yet, and the way to the calculation. */
export function ZoneChecks({ jobId, result }: { readonly jobId: string; readonly result: ZoneResult | null }) {
  const [isOpen, setOpen] = useState(false)
  if (!result) return <Text tone="soft">Being worked out …</Text>
  const notYet = notYetText(result.notYetChecked)
  const folded = result.checks.filter(isQuiet)
  const shown = isOpen ? result.checks : result.checks.filter((check) => !isQuiet(check))
  return (
    <View style={styles.list}>
      <View>
        {shown.map((check, i) => (
          <CheckLine key={`${check.family}-${check.name}-${check.stage ?? ''}-${i}`} check={check} />
        ))}
      </View>
      {folded.length > 0 ? (
        <View style={styles.more}>
          <Button
            kind="quiet"
            label={isOpen ? 'Fewer' : `${folded.length} more: distances within, and advice`}
            icon={<Icon name={isOpen ? 'up' : 'down'} size={12} />}
            aria-expanded={isOpen}
            onPress={() => setOpen(!isOpen)}
          />
        </View>
      ) : null}
      {notYet ? (
        <Text kind="small" tone="soft">
          {notYet}
        </Text>
      ) : null}
      <Link href={`/jobs/${jobId}/zones/${encodeURIComponent(result.zone.id)}`}>Calculation, every step</Link>
    </View>
  )
}

/** Clearances that are kept and advice fold away, so that strengths and whatever needs a decision stand together. */
const isQuiet = (check: Check): boolean =>
  check.kind === 'advice' || (check.kind === 'compared' && check.status === 'within' && check.compares !== 'ratio')

const styles = StyleSheet.create({ list: { gap: space.s }, more: { alignItems: 'flex-start' } })
