import { G, Line, Rect } from 'react-native-svg'
import { colour } from '@/components/theme'
import { DrawingText } from './drawing-text'
import { roundStep } from './ticks'

export interface ScaleBarProps {
  x: number
  y: number
  pxPerMm: number
  /** The bar is at least this long, px. */
  minLengthPx?: number
}

/** A length to measure by: a round number of mm, half of it filled. */
export function ScaleBar({ x, y, pxPerMm, minLengthPx = 60 }: ScaleBarProps) {
  const mm = roundStep(minLengthPx / pxPerMm)
  const length = mm * pxPerMm
  return (
    <G>
      <Rect x={x} y={y} width={length / 2} height={4} fill={colour.ink} />
      <Rect x={x} y={y} width={length} height={4} fill="none" stroke={colour.ink} strokeWidth={1} />
      <Line x1={x} x2={x} y1={y - 3} y2={y + 4} stroke={colour.ink} strokeWidth={1} />
      <Line x1={x + length} x2={x + length} y1={y - 3} y2={y + 4} stroke={colour.ink} strokeWidth={1} />
      <DrawingText x={x + length + 6} y={y + 6}>{`${mm} mm`}</DrawingText>
    </G>
  )
}
