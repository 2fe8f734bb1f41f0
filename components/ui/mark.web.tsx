import { colour } from '@/components/theme'
import { MARK } from './mark-lines'

/** The product's mark; the name stands beside it. public/index.html draws the same for the first paint. */
export function Mark({ height = 18 }: { height?: number }) {
  return (
    <svg width={(height * 30) / 18} height={height} viewBox="0 0 30 18" aria-hidden focusable={false}>
      <path d={MARK.wedges} style={{ fill: colour.ochre }} />
      <path d={MARK.tendons} style={{ fill: colour.steel }} />
      <path d={MARK.edge} style={{ fill: colour.ink }} />
    </svg>
  )
}
