import { StyleSheet } from 'react-native'
import { Text } from '@/components/ui/text'
import type { FormulaPart } from './formula-text'

/** A formula with its symbols' lower letters set below the line. */
export function Formula({ parts }: { readonly parts: readonly FormulaPart[] }) {
  return (
    <Text kind="figure">
      {parts.map(({ text, below }, at) => (
        <Text key={at} kind="figure">
          {text}
          {below === undefined ? null : (
            <Text kind="figure" style={styles.below}>
              {below}
            </Text>
          )}
        </Text>
      ))}
    </Text>
  )
}

const styles = StyleSheet.create({ below: { fontSize: 11, lineHeight: 12, position: 'relative', top: 3 } })
