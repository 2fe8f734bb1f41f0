import type { LimitKind } from '@wedgeline/engine'
import { StyleSheet, View } from 'react-native'
import { colour, font } from '@/components/theme'
import { Text } from './text'

/** What each letter stands for. */
export const LIMIT_KIND_WORD: Readonly<Record<LimitKind, string>> = {
  C: 'limit of the code',
  H: 'limit of the hardware',
  P: 'common practice',
}

/** Where a limit comes from: C, H or P in a small box. */
export function LimitKindBox({ kind }: { kind: LimitKind }) {
  return (
    <View style={styles.box} role="img" aria-label={LIMIT_KIND_WORD[kind]}>
      <Text style={styles.letter} aria-hidden>
        {kind}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  box: {
    borderWidth: 1,
    borderColor: colour.soft,
    width: 16,
    height: 16,
    alignItems: 'center',
    justifyContent: 'center',
  },
  letter: { fontFamily: font.figures, fontSize: 11, lineHeight: 14, fontWeight: '600' },
})
