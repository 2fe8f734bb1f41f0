import { colour as palette } from '@/components/theme'
import type { IconProps } from './icon'
import { iconLines } from './icon-lines'

/**
 * An icon for the eye alone: the word stands beside it or is the label of what carries it.
 * The page's own svg: the first load does without the drawing package.
 */
export function Icon({ name, size = 16, colour = palette.ink }: IconProps) {
  return (
    <svg width={size} height={size} viewBox="0 0 16 16" aria-hidden focusable={false} style={{ flexShrink: 0 }}>
      {iconLines(name).map((line) =>
        line.filled ? (
          <path key={line.d} d={line.d} style={{ fill: colour }} />
        ) : (
          <path
            key={line.d}
            d={line.d}
            strokeWidth={line.width ?? 1.5}
            strokeDasharray={line.dash}
            style={{ fill: 'none', stroke: colour }}
          />
        ),
      )}
    </svg>
  )
}
