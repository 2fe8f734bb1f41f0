import type { EdgeFrame, PlacedBar } from '@wedgeline/engine'
import { useId } from 'react'
import { ClipPath, Defs, G, Line, Path, Rect } from 'react-native-svg'
import { Hatch, hatchFill } from '@/components/drawing/hatch'
import { colour } from '@/components/theme'
import type { StripScale } from './scale'
import type { StripData, StripEnd, StripWedge } from './strip-data'

export interface PlanBandProps {
  readonly scale: StripScale
  readonly frame: EdgeFrame
  readonly top: number
  readonly height: number
  readonly ends: readonly StripEnd[]
  readonly wedges: readonly StripWedge[]
  readonly corners: StripData['corners']
  readonly bars: readonly PlacedBar[]
  readonly obstructions: readonly (readonly { readonly chainage: number; readonly depth: number }[])[]
  readonly pans: readonly (readonly { readonly chainage: number; readonly depth: number }[])[]
}

/** Slab outside the edge that is drawn, px: room for the edge line and for what stands in front of it. */
const OUTSIDE_PX = 8

/** The first metres of slab behind the edge, from above; the reader stands below, outside. One scale both ways. */
export function PlanBand(props: PlanBandProps) {
  // A page may hold two strips, the one on screen and the one that is printed.
  const id = useId()
  const [clip, wedge, corner] = [`${id}-plan`, `${id}-wedge`, `${id}-corner`]
  const { scale, frame, top, height, ends, wedges, corners, bars, obstructions, pans } = props
  const edgeY = top + height - OUTSIDE_PX
  const y = (depth: number) => edgeY - depth * scale.pxPerMm
  const point = (p: { readonly chainage: number; readonly depth: number }) =>
    `${px(scale.x(p.chainage))} ${px(y(p.depth))}`
  const closed = (points: readonly { readonly chainage: number; readonly depth: number }[]) =>
    `M${points.map(point).join('L')}Z`
  const sides = (outline: StripWedge['outline']) => `M${withoutEnds(outline).map(point).join('L')}`
  const [x0, x1] = [scale.x(frame.from), scale.x(frame.to)]
  return (
    <G>
      <Defs>
        <ClipPath id={clip}>
          <Rect x={scale.left} y={top} width={scale.width} height={height} />
        </ClipPath>
      </Defs>
      <Hatch id={wedge} />
      <Hatch id={corner} stroke={colour.ink} />
      <G clipPath={`url(#${clip})`}>
        <Rect x={Math.min(x0, x1)} y={top} width={Math.abs(x1 - x0)} height={edgeY - top} fill={colour.concrete} />
        {wedges.map(({ zoneId, outline }) => (
          <G key={zoneId}>
            <Path d={closed(outline)} fill={hatchFill(wedge)} />
            <Path d={sides(outline)} fill="none" stroke={colour.ochre} strokeWidth={1} />
          </G>
        ))}
        {corners.map((area) => (
          <Path key={closed(area)} d={closed(area)} fill={hatchFill(corner)} stroke={colour.ink} strokeWidth={0.75} />
        ))}
        {pans.map((pan) => (
          <Path key={closed(pan)} d={closed(pan)} fill={colour.sheet} stroke={colour.ink} strokeWidth={1.2} />
        ))}
        {bars.filter(isStraight).map((bar, i) => (
          <Path
            key={`${bar.zoneId}-${i}`}
            d={`M${bar.path.map(point).join('L')}`}
            stroke={colour.rust}
            strokeWidth={barWidth(bar, scale)}
            fill="none"
          />
        ))}
        {ends.map((end) => (
          <TendonEndInPlan key={end.id} end={end} scale={scale} y={y} top={top} />
        ))}
        {obstructions.map((outline) => (
          <Path key={closed(outline)} d={closed(outline)} fill={colour.rule} stroke={colour.soft} strokeWidth={1} />
        ))}
      </G>
      <Line x1={x0} x2={x1} y1={edgeY} y2={edgeY} stroke={colour.ink} strokeWidth={2.5} />
    </G>
  )
}

/** The sides of the spread alone: without the lines square to the edge, where the next wedge begins. */
function withoutEnds(outline: StripWedge['outline']): StripWedge['outline'] {
  const isSquare = (at: number, beside: number) => outline.at(at)?.chainage === outline.at(beside)?.chainage
  return outline.slice(isSquare(0, 1) ? 1 : 0, isSquare(-1, -2) ? -1 : undefined)
}

/** A live end is filled, a dead end open and dashed at its set-back; the tendon runs in behind it. */
function TendonEndInPlan(props: {
  readonly end: StripEnd
  readonly scale: StripScale
  readonly y: (depth: number) => number
  readonly top: number
}) {
  const { end, scale, y, top } = props
  const x = scale.x(end.chainage)
  const faceY = y(end.setBack)
  const half = Math.max((end.width * scale.pxPerMm) / 2, 5)
  const thick = Math.max(end.height * 0.5 * scale.pxPerMm, 4)
  const lean = Math.tan(end.lean) * (faceY - top) * (scale.growsRight ? 1 : -1)
  const isDead = end.end === 'dead'
  const line = { stroke: colour.steel, strokeWidth: 2, ...(isDead ? { strokeDasharray: '5 3' } : {}) }
  const pocket = end.pocketWidth === null ? null : (end.pocketWidth * scale.pxPerMm) / 2
  return (
    <G>
      {pocket !== null && !end.isInPan ? (
        <Path
          d={`M${px(x - pocket)} ${px(y(0))}L${px(x - half)} ${px(faceY)}H${px(x + half)}L${px(x + pocket)} ${px(y(0))}Z`}
          fill={colour.sheet}
          stroke={colour.soft}
          strokeWidth={1}
        />
      ) : null}
      <Line x1={x} y1={faceY} x2={x + lean} y2={top} stroke={colour.steel} strokeWidth={1.8} />
      {isDead ? (
        <Path
          d={`M${px(x)} ${px(faceY - 14)}L${px(x - half)} ${px(faceY)}H${px(x + half)}Z`}
          fill={colour.sheet}
          {...line}
          strokeWidth={1.4}
        />
      ) : (
        <Rect x={x - half} y={faceY - thick} width={2 * half} height={thick} fill={colour.steel} />
      )}
    </G>
  )
}

/** Spirals, links and hairpins are read in the face and on the anchor's own sheet; in plan they would be a blot. */
const isStraight = (bar: PlacedBar): boolean => bar.path.length === 2

export const barWidth = (bar: PlacedBar, scale: StripScale): number => Math.max(1.3, bar.diameter * scale.pxPerMm)

const px = (value: number): string => value.toFixed(2)
