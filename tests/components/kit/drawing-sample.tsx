import Svg, { Polygon, Rect } from 'react-native-svg'
import { Axis } from '@/components/drawing/axis'
import { Dimension } from '@/components/drawing/dimension'
import { GridBubble } from '@/components/drawing/grid-bubble'
import { Hatch, hatchFill } from '@/components/drawing/hatch'
import { ScaleBar } from '@/components/drawing/scale-bar'
import { colour } from '@/components/theme'

/** A slab edge with one wedge, drawn with every part of the drawing kit. */
export function DrawingSample() {
  const at = (mm: number) => 20 + mm * 0.06
  return (
    <Svg width={360} height={220} viewBox="0 0 360 220" role="img" aria-label="Edge E6 from 0 to 5000">
      <Hatch id="kit-wedge" />
      <Rect x={20} y={60} width={300} height={90} fill={colour.concrete} />
      <Axis scale={{ fromMm: 0, toMm: 5000, at }} y={60} />
      <GridBubble x={at(1500)} y={14} label="A" lineTo={60} />
      <GridBubble x={at(4200)} y={14} label="B12" lineTo={60} />
      <Rect x={at(900) - 8} y={142} width={16} height={8} fill={colour.steel} />
      <Rect x={at(3300) - 8} y={142} width={16} height={8} fill={colour.steel} />
      <Polygon
        points={`${at(900)},150 ${at(2100)},90 ${at(3300)},150`}
        fill={hatchFill('kit-wedge')}
        stroke={colour.ochre}
        strokeWidth={1.5}
      />
      <Dimension from={{ x: at(900), y: 165 }} to={{ x: at(3300), y: 165 }} side="right" label="2400" />
      <Dimension from={{ x: 330, y: 60 }} to={{ x: 330, y: 150 }} label="62" stroke={colour.over} />
      <ScaleBar x={20} y={205} pxPerMm={0.06} />
    </Svg>
  )
}
