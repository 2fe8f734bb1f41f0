import type { EdgeFrame, PlacedBar } from '@wedgeline/engine'
import { useId } from 'react'
import { ClipPath, Defs, G, Line, Path, Rect } from 'react-native-svg'
import { colour } from '@/components/theme'
import { barWidth } from './plan-band'
import type { StripScale } from './scale'
import type { StripEnd, StripLength } from './strip-data'

export interface FaceBandProps {
  readonly scale: StripScale
  readonly frame: EdgeFrame
  readonly top: number
  /** Highest top and lowest soffit of the edge, mm. */
  readonly highest: number
  /** px for a mm of height, the stretch included. */
  readonly pxPerHeight: number
  readonly lengths: readonly StripLength[]
  readonly ends: readonly StripEnd[]
  readonly bars: readonly PlacedBar[]
}

/** Smallest width at which a plate is still told apart, px; it keeps its own proportions. */
const PLATE_MIN_PX = 12

/** The edge seen face on. Heights are stretched; plates, pockets and local steel keep their own proportions. */
export function FaceBand(props: FaceBandProps) {
  const clip = `${useId()}-face`
  const { scale, frame, top, highest, pxPerHeight, lengths, ends, bars } = props
  const y = (height: number) => top + (highest - height) * pxPerHeight
  const lines = bars.filter((bar) => bar.kind === 'edge-bars')
  return (
    <G>
      <Defs>
        <ClipPath id={clip}>
          <Rect x={scale.left - 1} y={top - 2} width={scale.width + 2} height={4000} />
        </ClipPath>
      </Defs>
      <G clipPath={`url(#${clip})`}>
        {lengths.map((length) => (
          <LengthOnFace key={length.id} length={length} scale={scale} y={y} />
        ))}
        {lines.map((bar, i) => (
          <Path
            key={`${bar.zoneId}-${i}`}
            d={`M${bar.path.map((p) => `${scale.x(p.chainage).toFixed(2)} ${y(p.height).toFixed(2)}`).join('L')}`}
            stroke={colour.rust}
            strokeWidth={barWidth(bar, scale)}
            fill="none"
          />
        ))}
        {ends
          .filter(({ isInPan }) => !isInPan)
          .map((end) => (
            <AnchorOnFace key={end.id} end={end} scale={scale} centreY={y(end.heightAbove)} />
          ))}
      </G>
      <Line x1={scale.x(frame.from)} x2={scale.x(frame.from)} y1={y(highest)} y2={y(highest)} stroke={colour.ink} />
    </G>
  )
}

function LengthOnFace(props: {
  readonly length: StripLength
  readonly scale: StripScale
  readonly y: (height: number) => number
}) {
  const { length, scale, y } = props
  const [a, b] = [scale.x(length.from), scale.x(length.to)]
  const [x, width] = [Math.min(a, b), Math.abs(b - a)]
  const covers = [length.top - length.coverTop, length.soffit + length.coverSoffit]
  return (
    <G>
      <Rect
        x={x}
        y={y(length.top)}
        width={width}
        height={y(length.soffit) - y(length.top)}
        fill={length.isAgainst ? colour.rule : colour.concrete}
        stroke={colour.ink}
        strokeWidth={1.4}
      />
      {covers.map((height) => (
        <Line
          key={height}
          x1={x}
          x2={x + width}
          y1={y(height)}
          y2={y(height)}
          stroke={colour.soft}
          strokeWidth={0.8}
          strokeDasharray="2 4"
        />
      ))}
    </G>
  )
}

function AnchorOnFace({ end, scale, centreY }: { end: StripEnd; scale: StripScale; centreY: number }) {
  const x = scale.x(end.chainage)
  const k = Math.max(scale.pxPerMm, PLATE_MIN_PX / end.width)
  const box = (width: number, height: number) => ({
    x: x - (width * k) / 2,
    y: centreY - (height * k) / 2,
    width: width * k,
    height: height * k,
  })
  const isDead = end.end === 'dead'
  return (
    <G>
      {end.local === null ? null : (
        <Rect
          {...box(end.local.width, end.local.height)}
          rx={end.local.isRound ? (end.local.width * k) / 2 : 2}
          fill="none"
          stroke={colour.rust}
          strokeWidth={Math.max(1.3, end.local.diameter * k)}
        />
      )}
      <Rect
        {...box(end.width, end.height)}
        fill={isDead ? colour.sheet : colour.steel}
        stroke={colour.steel}
        strokeWidth={1.4}
        {...(isDead ? { strokeDasharray: '3 2' } : {})}
      />
    </G>
  )
}
