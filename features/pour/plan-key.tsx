import type { LengthKind } from '@wedgeline/engine'
import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'
import Svg, { Line, Path, Rect } from 'react-native-svg'
import { Hatch, hatchFill } from '@/components/drawing/hatch'
import { colour, space } from '@/components/theme'
import { Text } from '@/components/ui/text'
import { LENGTH_KIND_WORDS } from './edge-words'
import type { PlanData } from './plan-data'
import { EDGE_LINES } from './plan-parts'

/** Says what the lines and marks of the plan stand for; only what is drawn. */
export function PlanKey({ data }: { readonly data: PlanData }) {
  const kinds = [...new Set(data.edges.flatMap((edge) => edge.lengths.map(({ kind }) => kind)))]
  const hasLive = data.anchors.some(({ isLive }) => isLive)
  const hasDead = data.anchors.some(({ isLive }) => !isLive)
  return (
    <View style={styles.key}>
      {kinds.map((kind) => (
        <Entry key={kind} words={`edge, ${LENGTH_KIND_WORDS[kind]}`}>
          <EdgeSample kind={kind} />
        </Entry>
      ))}
      {hasLive ? (
        <Entry words="live end">
          <Rect x={8} y={3} width={10} height={5} fill={colour.steel} />
        </Entry>
      ) : null}
      {hasDead ? (
        <Entry words="dead end">
          <Path d="M7 9H19L13 2Z" fill={colour.sheet} stroke={colour.steel} strokeWidth={1.3} />
        </Entry>
      ) : null}
      {data.wedges.length > 0 ? (
        <Entry words="edge wedge: no precompression square to the edge">
          <Hatch id="key-wedge" spacing={5} />
          <Rect x={1} y={1} width={24} height={10} fill={hatchFill('key-wedge')} stroke={colour.ochre} />
        </Entry>
      ) : null}
      {data.corners.length > 0 ? (
        <Entry words="corner without precompression either way">
          <Hatch id="key-corner" spacing={5} stroke={colour.ink} />
          <Rect x={1} y={1} width={24} height={10} fill={hatchFill('key-corner')} stroke={colour.ink} />
        </Entry>
      ) : null}
      {data.anchors.length > 0 ? (
        <Entry words="side of the spread">
          <Line x1={1} y1={6} x2={25} y2={6} stroke={colour.ochre} strokeDasharray="3 2" />
        </Entry>
      ) : null}
    </View>
  )
}

function EdgeSample({ kind }: { readonly kind: LengthKind }) {
  const { width, dash } = EDGE_LINES[kind]
  return (
    <Line
      x1={1}
      y1={6}
      x2={25}
      y2={6}
      stroke={colour.ink}
      strokeWidth={width}
      {...(dash ? { strokeDasharray: dash } : {})}
    />
  )
}

function Entry({ words, children }: { readonly words: string; readonly children: ReactNode }) {
  return (
    <View style={styles.entry}>
      <Svg width={26} height={12} aria-hidden>
        {children}
      </Svg>
      <Text kind="small" tone="soft">
        {words}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  key: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    columnGap: space.l,
    rowGap: space.xs,
    padding: space.s,
    borderTopWidth: 1,
    borderColor: colour.rule,
  },
  entry: { flexDirection: 'row', alignItems: 'center', gap: space.xs },
})
