import { shapeDrawing } from '@wedgeline/engine/geometry'
import Svg, { Path } from 'react-native-svg'
import { DrawingText } from '@/components/drawing/drawing-text'
import { colour } from '@/components/theme'
import { Text } from '@/components/ui/text'

/** The picture of a shape with the letters of its dimensions, not to scale. */
export function ShapeFigure({ code, size = 1 }: { readonly code: string; readonly size?: number }) {
  const drawing = shapeDrawing(code)
  if (!drawing) return <Text tone="soft">no picture</Text>
  const line = drawing.line.map(({ x, y }) => `${x} ${y}`).join('L')
  return (
    <Svg
      width={132 * size}
      height={76 * size}
      viewBox="-6 -8 132 76"
      role="img"
      aria-label={`Shape ${code}, with ${drawing.labels.map(({ name }) => name).join(', ') || 'no letters'}`}
    >
      <Path d={`M${line}`} stroke={colour.rust} strokeWidth={2} fill="none" />
      {drawing.labels.map(({ name, x, y }) => (
        <DrawingText key={name} x={x} y={y + 4} size={size < 1 ? 13 : 11} textAnchor="middle">
          {name}
        </DrawingText>
      ))}
    </Svg>
  )
}
