import { Circle, G, Line } from 'react-native-svg'
import { colour } from '@/components/theme'
import { DrawingText } from './drawing-text'

export interface GridBubbleProps {
  /** Centre of the bubble, px. */
  x: number
  y: number
  label: string
  radius?: number
  /** How far down the line of the grid runs, px; no line where not given. */
  lineTo?: number
}

/** A line of the grid: its name in a ring, a chain line below. */
export function GridBubble({ x, y, label, radius = 10, lineTo }: GridBubbleProps) {
  // Three letters and more get smaller figures, so that they stay inside the ring.
  const size = label.length > 2 ? 9 : 12
  return (
    <G>
      {lineTo === undefined ? null : (
        <Line
          x1={x}
          x2={x}
          y1={y + radius}
          y2={lineTo}
          stroke={colour.soft}
          strokeWidth={1}
          strokeDasharray="10 3 2 3"
        />
      )}
      <Circle cx={x} cy={y} r={radius} fill={colour.sheet} stroke={colour.ink} strokeWidth={1.25} />
      <DrawingText x={x} y={y + size * 0.36} size={size} isStrong textAnchor="middle">
        {label}
      </DrawingText>
    </G>
  )
}
