import { G } from 'react-native-svg'
import { Axis } from '@/components/drawing/axis'
import { GridBubble } from '@/components/drawing/grid-bubble'
import type { StripScale } from './scale'

export interface ChainageAxisProps {
  readonly scale: StripScale
  readonly gridCrossings: readonly { readonly name: string; readonly chainage: number }[]
}

/** Height of the axis with its grid bubbles, px. */
export const AXIS_HEIGHT = 50

const BUBBLE_PX = 10

/** Chainage figures with the building's grid lines above them, on the axis of all bands. */
export function ChainageAxis({ scale, gridCrossings }: ChainageAxisProps) {
  const inView = gridCrossings.filter(({ chainage }) => chainage >= scale.from - 1 && chainage <= scale.to + 1)
  return (
    <G>
      <Axis scale={{ fromMm: scale.from, toMm: scale.to, at: (mm) => scale.x(mm) }} y={AXIS_HEIGHT} />
      {inView.map(({ name, chainage }) => (
        <GridBubble
          key={`${name}-${chainage}`}
          x={scale.x(chainage)}
          y={BUBBLE_PX + 1}
          radius={BUBBLE_PX}
          label={name}
          lineTo={AXIS_HEIGHT}
        />
      ))}
    </G>
  )
}
