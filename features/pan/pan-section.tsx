import { useState } from 'react'
import { View } from 'react-native'
import Svg, { G, Line, Path, Rect } from 'react-native-svg'
import { Dimension } from '@/components/drawing/dimension'
import { colour } from '@/components/theme'
import type { PanView } from './pan-view'

/** Tendon drawn behind the plate where its straight length is not given, mm. */
const STRAIGHT = 500

/** The depth of the slab stands at the left end of the section, mm. */
const CLEAR_OF_FIGURES = 160

/** Height shown above the slab, and room for the figures below it. */
const ABOVE_MM = 520
const FOOT_PX = 30

/** A section along the tendon at the scale of the plan: the recess's floor, the tilted jack, what stands in front. */
export function PanSection({ view }: { readonly view: PanView }) {
  const [width, setWidth] = useState(0)
  const { pan, top, soffit, at, jack } = view.place
  const scale = width / (view.to - view.from)
  const x = (along: number) => (along - view.from) * scale
  const y = (height: number) => (top + ABOVE_MM - height) * scale
  const slabEnd = Math.min(view.to, beyond(view))
  const left = top - pan.depth - soffit
  const straight = Math.max(view.from + CLEAR_OF_FIGURES, -(at?.anchor.straightBehind ?? STRAIGHT))
  return (
    <View onLayout={(event) => setWidth(event.nativeEvent.layout.width)}>
      {width === 0 ? null : (
        <Svg
          width={width}
          height={y(soffit) + FOOT_PX}
          role="img"
          aria-label={`Section of ${pan.mark} along its tendon at true scale`}
        >
          <Path
            d={`M${x(view.from)} ${y(top)}H${x(0)}V${y(top - pan.depth)}L${x(Math.min(pan.along, slabEnd))} ${y(top)}H${x(slabEnd)}V${y(soffit)}H${x(view.from)}Z`}
            fill={colour.concrete}
          />
          <Path
            d={`M${x(view.from)} ${y(top)}H${x(0)}V${y(top - pan.depth)}L${x(Math.min(pan.along, slabEnd))} ${y(top)}H${x(slabEnd)}V${y(soffit)}H${x(view.from)}`}
            fill="none"
            stroke={colour.ink}
            strokeWidth={1.5}
          />
          {view.ahead && view.ahead.distance < view.to ? (
            <Rect
              x={x(view.ahead.distance)}
              y={0}
              width={Math.max(6, x(view.to) - x(view.ahead.distance))}
              height={y(top)}
              fill={colour.wash}
              stroke={colour.ink}
              strokeWidth={1.5}
            />
          ) : null}
          {at ? (
            <G>
              <Line
                x1={x(straight)}
                y1={y(at.anchor.height + Math.tan(at.anchor.elevation) * straight)}
                x2={x(0)}
                y2={y(at.anchor.height)}
                stroke={colour.steel}
                strokeWidth={3}
              />
              <Rect
                x={x(0) - 7}
                y={y(at.anchor.height + at.hardware.plate.height / 2)}
                width={7}
                height={at.hardware.plate.height * scale}
                fill={colour.steel}
              />
              {jack && view.needMm !== null ? <Jack view={view} height={at.anchor.height} x={x} y={y} /> : null}
            </G>
          ) : null}
          <Dimension
            from={{ x: x(view.from) + 14, y: y(soffit) }}
            to={{ x: x(view.from) + 14, y: y(top) }}
            label={String(top - soffit)}
            side="right"
          />
          {left > 0 ? (
            <Dimension
              from={{ x: x(60), y: y(soffit) }}
              to={{ x: x(60), y: y(top - pan.depth) }}
              label={`${left} left`}
              side="right"
            />
          ) : null}
        </Svg>
      )}
    </View>
  )
}

/** End of the slab on the axis, or the end of the drawing. */
function beyond({ slab, to }: PanView): number {
  const crossings = slab.flatMap((a, i) => {
    const b = slab[(i + 1) % slab.length]
    if (!b || a.across * b.across > 0 || a.across === b.across) return []
    const along = a.along + ((b.along - a.along) * -a.across) / (b.across - a.across)
    return along > 0 ? [along] : []
  })
  return Math.min(to, ...crossings)
}

function Jack(props: {
  readonly view: PanView
  readonly height: number
  readonly x: (mm: number) => number
  readonly y: (mm: number) => number
}) {
  const { view, height, x, y } = props
  const { pan, jack } = view.place
  if (!jack) return null
  const [sin, cos] = [Math.sin(pan.jackTilt), Math.cos(pan.jackTilt)]
  const spot = (along: number, off: number) =>
    `${x(along * cos - off * sin).toFixed(1)} ${y(height + along * sin + off * cos).toFixed(1)}`
  const body = (from: number, to: number, half: number) =>
    `M${spot(from, -half)}L${spot(to, -half)}L${spot(to, half)}L${spot(from, half)}Z`
  const half = jack.bodyDiameter / 2
  return (
    <G>
      <Path d={body(0, jack.noseLength, jack.noseDiameter / 2)} fill="none" stroke={colour.ink} strokeWidth={1.5} />
      <Path d={body(jack.noseLength, jack.closedLength, half)} fill="none" stroke={colour.ink} strokeWidth={1.5} />
      <Path
        d={body(jack.closedLength, view.needMm ?? jack.closedLength, half)}
        fill="none"
        stroke={colour.ink}
        strokeWidth={1.5}
        strokeDasharray="5 3"
      />
    </G>
  )
}
