import type { Status } from '@wedgeline/engine'
import { Pressable, StyleSheet, View } from 'react-native'
import { Icon } from '@/components/ui/icon'
import { colour } from '@/components/theme'
import { stripScale, type View as StripView } from './scale'

export interface OverviewProps {
  readonly edge: StripView
  readonly view: StripView
  readonly growsRight: boolean
  readonly left: number
  readonly width: number
  readonly ends: readonly {
    readonly id: string
    readonly chainage: number
    readonly end: 'live' | 'dead'
    readonly status: Status | null
  }[]
  readonly onShow: (chainage: number) => void
}

const HEIGHT = 34

const isFault = (status: Status | null): status is Status =>
  status === 'stop' || status === 'over' || status === 'not-covered' || status === 'needs-judgement'

/** The whole edge in one line with its faults marked, and the part in view framed. A press brings that place into view. */
export function Overview({ edge, view, growsRight, left, width, ends, onShow }: OverviewProps) {
  const scale = stripScale({ view: edge, left: 0, width, growsRight })
  const [a, b] = [scale.x(view.from), scale.x(view.to)]
  return (
    <Pressable
      aria-label="Whole edge. Press a place to bring it into view."
      role="button"
      onPress={(event) => onShow(scale.chainage(event.nativeEvent.locationX))}
      style={[styles.line, { marginLeft: left, width, height: HEIGHT }]}
    >
      <View style={styles.edge} pointerEvents="none" />
      {ends.map(({ id, chainage, end, status }) => (
        <View key={id} pointerEvents="none" style={[styles.end, { left: scale.x(chainage) - 7 }]}>
          <View style={styles.fault}>
            {isFault(status) ? (
              <Icon
                name={status}
                size={12}
                colour={status === 'over' || status === 'stop' ? colour.over : colour.ink}
              />
            ) : null}
          </View>
          <View style={[styles.square, end === 'live' ? styles.live : null]} />
        </View>
      ))}
      <View
        pointerEvents="none"
        style={[styles.window, { left: Math.min(a, b), width: Math.max(8, Math.abs(b - a)) }]}
      />
    </Pressable>
  )
}

const styles = StyleSheet.create({
  line: { position: 'relative' },
  edge: { position: 'absolute', left: 0, right: 0, bottom: 6, height: 2, backgroundColor: colour.ink },
  end: { position: 'absolute', bottom: 7, width: 14, alignItems: 'center' },
  fault: { height: 14, justifyContent: 'center' },
  square: { width: 7, height: 7, borderWidth: 1.2, borderColor: colour.steel, backgroundColor: colour.sheet },
  live: { backgroundColor: colour.steel },
  window: { position: 'absolute', top: 1, bottom: 1, borderWidth: 1.5, borderColor: colour.ink },
})
