import { G, Line } from 'react-native-svg'
import { colour } from '@/components/theme'
import { DrawingText } from './drawing-text'
import type { AxisScale } from './ticks'
import { ticksOf } from './ticks'

export interface AxisProps {
  scale: AxisScale
  /** Where the ticks end, px; the figures stand above. */
  y: number
  /** What a tick says; the chainage in mm where not given. */
  labelOf?: (mm: number) => string
  minGapPx?: number
}

/** Ticks and figures of chainage along the top of a drawing. */
export function Axis({ scale, y, labelOf = String, minGapPx = 64 }: AxisProps) {
  return (
    <G>
      {ticksOf(scale, minGapPx).map((mm) => (
        <G key={mm}>
          <Line x1={scale.at(mm)} x2={scale.at(mm)} y1={y - 6} y2={y} stroke={colour.soft} strokeWidth={1} />
          <DrawingText x={scale.at(mm)} y={y - 10} fill={colour.soft} textAnchor="middle">
            {labelOf(mm)}
          </DrawingText>
        </G>
      ))}
    </G>
  )
}
