import type { Status } from '@wedgeline/engine'
import { STATUS_WORDS } from '@wedgeline/engine/result'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Icon } from './icon'
import type { TextKind, Tone } from './text'
import { Text } from './text'
import { VisuallyHidden } from './visually-hidden'

/** What matters most keeps its colour in the words as well; the shape tells all six apart without any. */
const TONE: Readonly<Record<Status, Tone>> = {
  stop: 'over',
  'not-covered': 'ink',
  over: 'over',
  'needs-judgement': 'ink',
  near: 'near',
  within: 'within',
}

export interface StatusMarkProps {
  status: Status
  /** Stands for the status' own word: `height, short 13`, `2 over`, `0.74`. The word itself is then still read out. */
  words?: string | undefined
  /** Shows the mark alone; the word is read out. */
  markOnly?: boolean | undefined
  kind?: TextKind | undefined
  size?: number | undefined
  /** In a table's row: what does not fit is cut off with an ellipsis. */
  oneLine?: boolean | undefined
}

/** A status: a mark of its own shape and a word. */
export function StatusMark({ status, words, markOnly, kind = 'body', size = 16, oneLine }: StatusMarkProps) {
  const tone = TONE[status]
  const word = STATUS_WORDS[status]
  const isStrong = status === 'over' || status === 'stop'
  return (
    <View style={styles.row}>
      <Icon name={status} size={size} colour={colour[tone]} />
      {markOnly || (words && !words.includes(word)) ? <VisuallyHidden>{`${word}: `}</VisuallyHidden> : null}
      {markOnly ? null : (
        <Text
          kind={kind}
          tone={isStrong ? tone : 'ink'}
          style={styles.words}
          {...(oneLine ? { numberOfLines: 1 } : {})}
        >
          {words ?? word}
        </Text>
      )}
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: space.s, minWidth: 0 },
  words: { flexShrink: 1, minWidth: 0 },
})
