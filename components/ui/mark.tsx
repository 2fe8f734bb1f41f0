import Svg, { Path } from 'react-native-svg'
import { colour } from '@/components/theme'
import { MARK } from './mark-lines'

/** The product's mark; the name stands beside it. */
export function Mark({ height = 18 }: { height?: number }) {
  return (
    <Svg width={(height * 30) / 18} height={height} viewBox="0 0 30 18" aria-hidden>
      <Path d={MARK.wedges} fill={colour.ochre} />
      <Path d={MARK.tendons} fill={colour.steel} />
      <Path d={MARK.edge} fill={colour.ink} />
    </Svg>
  )
}
