import Svg, { Path } from 'react-native-svg'
import { colour as palette } from '@/components/theme'
import type { IconName } from './icon-lines'
import { iconLines } from './icon-lines'

export interface IconProps {
  name: IconName
  size?: number
  colour?: string
}

/** An icon for the eye alone: the word stands beside it or is the label of what carries it. */
export function Icon({ name, size = 16, colour = palette.ink }: IconProps) {
  return (
    <Svg width={size} height={size} viewBox="0 0 16 16" aria-hidden>
      {iconLines(name).map((line) =>
        line.filled ? (
          <Path key={line.d} d={line.d} fill={colour} />
        ) : (
          <Path
            key={line.d}
            d={line.d}
            fill="none"
            stroke={colour}
            strokeWidth={line.width ?? 1.5}
            {...(line.dash ? { strokeDasharray: line.dash } : {})}
          />
        ),
      )}
    </Svg>
  )
}
