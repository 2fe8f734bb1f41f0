import type { CurvePoint } from '@wedgeline/engine'
import { View } from 'react-native'
import Svg, { Circle, Line, Path } from 'react-native-svg'
import { DrawingText } from '@/components/drawing/drawing-text'
import { Select } from '@/components/ui/select'
import { colour, space } from '@/components/theme'
import { kg } from './proposal-words'

export interface MarksCurveProps {
  readonly curve: readonly CurvePoint[]
  /** The point that the list below stands at. */
  readonly marks: number
  readonly onPick: (marks: number) => void
}

const WIDTH = 320
const HEIGHT = 120
const LEFT = 56
const BOTTOM = 26
const TOP = 14

/** Mass against the number of different new marks; a point of it is picked from the list beside it. */
export function MarksCurve({ curve, marks, onPick }: MarksCurveProps) {
  const [first, last] = [curve[0], curve.at(-1)]
  if (!first || !last || curve.length < 2) return null
  const x = (of: number) => LEFT + ((of - first.marks) / (last.marks - first.marks)) * (WIDTH - LEFT - 16)
  const y = (of: number) => TOP + ((first.mass - of) / (first.mass - last.mass)) * (HEIGHT - TOP - BOTTOM)
  const line = curve.map((point) => `${x(point.marks)} ${y(point.mass)}`).join('L')
  return (
    <View style={{ gap: space.s }}>
      <Svg
        width="100%"
        height={HEIGHT}
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        role="img"
        aria-label={`Mass of the new bars against their different marks: from ${kg(first.mass)} with ${first.marks} to ${kg(last.mass)} with ${last.marks}`}
      >
        <Line x1={LEFT} y1={HEIGHT - BOTTOM + 6} x2={WIDTH - 8} y2={HEIGHT - BOTTOM + 6} stroke={colour.rule} />
        <Path d={`M${line}`} stroke={colour.steel} strokeWidth={1.5} fill="none" />
        {curve.map((point) => (
          <Circle
            key={point.marks}
            cx={x(point.marks)}
            cy={y(point.mass)}
            r={point.marks === marks ? 6 : 3}
            fill={point.marks === marks ? colour.rust : colour.steel}
          />
        ))}
        <DrawingText x={4} y={y(first.mass) + 4}>{`${first.mass.toFixed(0)} kg`}</DrawingText>
        <DrawingText x={4} y={y(last.mass) + 4}>{`${last.mass.toFixed(0)} kg`}</DrawingText>
        <DrawingText x={x(first.marks)} y={HEIGHT - 4} textAnchor="middle">
          {String(first.marks)}
        </DrawingText>
        <DrawingText x={x(last.marks)} y={HEIGHT - 4} textAnchor="end">
          {`${last.marks} marks`}
        </DrawingText>
      </Svg>
      <Select
        label="Different new marks"
        hint="Fewer marks are quicker to bend, bundle and find, and take more steel."
        value={String(marks)}
        options={curve.map((point) => ({ value: String(point.marks), label: `${point.marks}: ${kg(point.mass)}` }))}
        onChange={(value) => onPick(Number(value))}
      />
    </View>
  )
}
