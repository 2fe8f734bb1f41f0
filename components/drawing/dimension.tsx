import { G, Line } from 'react-native-svg'
import { colour } from '@/components/theme'
import { DrawingText } from './drawing-text'

export interface DimensionProps {
  from: { readonly x: number; readonly y: number }
  to: { readonly x: number; readonly y: number }
  label: string
  /** Ink where it only informs; the colour of a status where a check speaks of it. */
  stroke?: string
  /** On which side of the line, seen from `from` to `to`, the figure stands. */
  side?: 'left' | 'right'
  size?: number
}

const BAR = 5

/** A dimension line with square ends; the figure stands beside it, upright, never on it. */
export function Dimension({ from, to, label, stroke = colour.ink, side = 'left', size = 12 }: DimensionProps) {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1
  const across = { x: (to.y - from.y) / length, y: -(to.x - from.x) / length }
  const way = side === 'left' ? 1 : -1
  const middle = { x: (from.x + to.x) / 2 + across.x * way * 8, y: (from.y + to.y) / 2 + across.y * way * 8 }
  const lean = across.x * way
  return (
    <G>
      <Line x1={from.x} y1={from.y} x2={to.x} y2={to.y} stroke={stroke} strokeWidth={1.25} />
      {[from, to].map((end, index) => (
        <Line
          key={index}
          x1={end.x - across.x * BAR}
          y1={end.y - across.y * BAR}
          x2={end.x + across.x * BAR}
          y2={end.y + across.y * BAR}
          stroke={stroke}
          strokeWidth={1.25}
        />
      ))}
      <DrawingText
        x={middle.x}
        y={middle.y + size * (0.36 - across.y * way * -0.3)}
        size={size}
        fill={stroke}
        isStrong
        textAnchor={lean > 0.5 ? 'start' : lean < -0.5 ? 'end' : 'middle'}
      >
        {label}
      </DrawingText>
    </G>
  )
}
