import { StyleSheet } from 'react-native'
import { Text } from '@/components/ui/text'
import type { FormulaPart } from './formula-text'

export interface FormulaProps {
  readonly parts: readonly FormulaPart[]
  /** In the lines of a printed sheet, where nothing may be smaller than its words. */
  readonly isPrinted?: boolean
}

/** A formula with its symbols' lower letters set below the line. */
export function Formula({ parts, isPrinted = false }: FormulaProps) {
  const figure = isPrinted ? printedFigure : null
  return (
    <Text kind="figure" style={figure}>
      {parts.map(({ text, below }, at) => (
        <Text key={at} kind="figure" style={figure}>
          {text}
          {below === undefined ? null : (
            <Text kind="figure" style={isPrinted ? styles.belowPrinted : styles.below}>
              {below}
            </Text>
          )}
        </Text>
      ))}
    </Text>
  )
}

const styles = StyleSheet.create({
  below: { fontSize: 11, lineHeight: 12, position: 'relative', top: 3 },
  printed: { fontSize: 14, lineHeight: 16 },
  belowPrinted: { fontSize: 13, lineHeight: 13, position: 'relative', top: 3 },
})

export const printedFigure = styles.printed
