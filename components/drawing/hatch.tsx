import { Defs, Line, Pattern } from 'react-native-svg'
import { colour } from '@/components/theme'

export interface HatchProps {
  /** Unique on the page; fill a shape with `hatchFill(id)`. */
  id: string
  stroke?: string
  /** Between lines, px. */
  spacing?: number
}

/** Lines at 45 degrees for an area, ochre for an edge wedge. Stands inside the svg that uses it. */
export function Hatch({ id, stroke = colour.ochre, spacing = 7 }: HatchProps) {
  return (
    <Defs>
      <Pattern
        id={id}
        patternUnits="userSpaceOnUse"
        width={spacing}
        height={spacing}
        patternTransform="rotate(45)"
        x={0}
        y={0}
      >
        <Line x1={0} x2={0} y1={0} y2={spacing} stroke={stroke} strokeWidth={1.5} />
      </Pattern>
    </Defs>
  )
}

/** The fill that draws a hatch. */
export function hatchFill(id: string): string {
  return `url(#${id})`
}
