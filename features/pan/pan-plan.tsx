import type { Check, PlacedBar } from '@wedgeline/engine'
import { useId, useState } from 'react'
import { View } from 'react-native'
import Svg, { ClipPath, Defs, G, Line, Path, Rect } from 'react-native-svg'
import { Dimension } from '@/components/drawing/dimension'
import { DrawingText } from '@/components/drawing/drawing-text'
import { ScaleBar } from '@/components/drawing/scale-bar'
import { colour } from '@/components/theme'
import { outcomeText } from '../checks/words'
import { comparedBy, type PanView, type Spot } from './pan-view'

export interface PanPlanProps {
  readonly view: PanView
  readonly checks: readonly Check[]
}

const HEAD_PX = 8
const FOOT_PX = 28

/** A pan from above, its jack to the right: recess, plate, tendon, bars, the jack's body and what stands in its way. */
export function PanPlan({ view, checks }: PanPlanProps) {
  const [width, setWidth] = useState(0)
  const clip = useId().replace(/[^a-zA-Z0-9]/g, '')
  const scale = width / (view.to - view.from)
  const height = 2 * view.side * scale
  const x = (along: number) => (along - view.from) * scale
  const y = (across: number) => HEAD_PX + (view.side - across) * scale
  const pathOf = (outline: readonly Spot[]) => `M${outline.map((spot) => at(x(spot.along), y(spot.across))).join('L')}Z`
  const { mark } = view.place.pan
  const draw: Draw = { x, y, scale }
  return (
    <View onLayout={(event) => setWidth(event.nativeEvent.layout.width)}>
      {width === 0 ? null : (
        <Svg
          width={width}
          height={height + HEAD_PX + FOOT_PX}
          role="img"
          aria-label={`Plan of ${mark} at true scale, the jack to the right; the checks say the same in words`}
        >
          <Defs>
            <ClipPath id={clip}>
              <Rect x={0} y={HEAD_PX} width={width} height={height} />
            </ClipPath>
          </Defs>
          <G clipPath={`url(#${clip})`}>
            <Path d={pathOf(view.slab)} fill={colour.concrete} stroke={colour.ink} strokeWidth={2} />
            <Spread view={view} draw={draw} />
            {view.otherPans.map((pan) => (
              <Path key={pan.name} d={pathOf(pan.outline)} fill={colour.sheet} stroke={colour.soft} strokeWidth={1} />
            ))}
            <Recess view={view} draw={draw} />
            {view.bars.map((bar, i) => (
              <BarInPlan key={i} bar={bar} draw={draw} />
            ))}
            <Tendon view={view} draw={draw} />
            {view.obstructions.map((body) => (
              <Path
                key={body.name}
                d={pathOf(body.outline)}
                fill={body.isStanding ? colour.wash : colour.sheet}
                stroke={colour.ink}
                strokeWidth={body.isStanding ? 2 : 1}
                {...(body.isStanding ? {} : { strokeDasharray: '5 3' })}
              />
            ))}
            <JackInPlan view={view} draw={draw} isShort={isShort(checks)} />
          </G>
          <Names view={view} draw={draw} />
          <Room view={view} draw={draw} checks={checks} />
          <ScaleBar x={8} y={height + HEAD_PX + 14} pxPerMm={scale} />
        </Svg>
      )}
    </View>
  )
}

export interface Draw {
  readonly x: (mm: number) => number
  readonly y: (mm: number) => number
  readonly scale: number
}

interface Part {
  readonly view: PanView
  readonly draw: Draw
}

const at = (x: number, y: number): string => `${x.toFixed(1)} ${y.toFixed(1)}`

const ROOM = 'Room along the jack'

const isShort = (checks: readonly Check[]): boolean => (comparedBy(checks, ROOM)?.spare ?? 0) < 0

function Recess({ view: { place }, draw: { x, y, scale } }: Part) {
  const { along, across } = place.pan
  return (
    <Rect
      x={x(0)}
      y={y(across / 2)}
      width={along * scale}
      height={across * scale}
      fill={colour.sheet}
      stroke={colour.ink}
      strokeWidth={2}
    />
  )
}

/** Tendon up to the bearing face, and its plate. */
function Tendon({ view: { place, from }, draw: { x, y, scale } }: Part) {
  if (!place.at) return null
  const half = place.at.hardware.plate.width / 2
  return (
    <G>
      <Line x1={x(from)} y1={y(0)} x2={x(0)} y2={y(0)} stroke={colour.steel} strokeWidth={3} />
      <Rect x={x(0) - 7} y={y(half)} width={7} height={2 * half * scale} fill={colour.steel} />
    </G>
  )
}

/** Length of the sides of the spread that is drawn behind the plate, mm. */
const SPREAD = 600

/** Sides at 45 degrees, as a help to the eye: the basis has its own angle. */
function Spread({ view: { place }, draw: { x, y } }: Part) {
  if (!place.at) return null
  const half = place.at.hardware.plate.width / 2
  return (
    <G>
      {[-1, 1].map((side) => (
        <Line
          key={side}
          x1={x(0)}
          y1={y(side * half)}
          x2={x(-SPREAD)}
          y2={y(side * (half + SPREAD))}
          stroke={colour.ochre}
          strokeWidth={1}
          strokeDasharray="4 3"
        />
      ))}
    </G>
  )
}

/** A placed bar's own coordinates: chainage across the axis, depth behind the bearing face. */
function BarInPlan({ bar, draw: { x, y, scale } }: { readonly bar: PlacedBar; readonly draw: Draw }) {
  const points = bar.path.map((point) => at(x(-point.depth), y(point.chainage)))
  return (
    <Path
      d={`M${points.join('L')}${bar.isClosed ? 'Z' : ''}`}
      fill="none"
      stroke={colour.rust}
      strokeWidth={Math.max(1.6, bar.diameter * scale)}
    />
  )
}

/** Nose and body as far as the jack reaches, then the room for stroke, tail and hand. */
function JackInPlan({ view, draw: { x, y, scale }, isShort: short }: Part & { readonly isShort: boolean }) {
  const { pan, jack } = view.place
  if (!jack || view.needMm === null) return null
  const cos = Math.cos(pan.jackTilt)
  const stroke = short ? colour.over : colour.ink
  const parts = [
    { from: 0, to: jack.noseLength, half: jack.noseDiameter / 2, dash: null },
    { from: jack.noseLength, to: jack.closedLength, half: jack.bodyDiameter / 2, dash: null },
    { from: jack.closedLength, to: view.needMm, half: jack.bodyDiameter / 2, dash: '5 3' },
  ]
  return (
    <G>
      {parts.map(({ from, to, half, dash }) => (
        <Rect
          key={from}
          x={x(from * cos)}
          y={y(half)}
          width={Math.max(0, (to - from) * cos * scale)}
          height={2 * half * scale}
          fill="none"
          stroke={stroke}
          strokeWidth={1.5}
          {...(dash ? { strokeDasharray: dash } : {})}
        />
      ))}
    </G>
  )
}

/** Bodies that the drawing shows, named where they stand. */
function Names({ view, draw: { x, y } }: Part) {
  return (
    <G>
      {[...view.obstructions, ...view.otherPans].flatMap(({ name, outline }) => {
        if (!isSeen(view, outline)) return []
        const words = name === view.beside?.name ? `${name}, ${Math.round(view.beside.distance)} beside the jack` : name
        const width = words.length * 6.4 + 8
        const cx = clamp(x(middle(outline.map((spot) => spot.along))), width / 2, x(view.to) - width / 2)
        const cy = clamp(y(middle(outline.map((spot) => spot.across))), y(view.side) + 14, y(-view.side) - 14)
        return [
          <G key={name}>
            <Rect x={cx - width / 2} y={cy - 9} width={width} height={16} fill={colour.sheet} />
            <DrawingText x={cx} y={cy + 3} textAnchor="middle">
              {words}
            </DrawingText>
          </G>,
        ]
      })}
    </G>
  )
}

const middle = (values: readonly number[]): number => (Math.min(...values) + Math.max(...values)) / 2
const clamp = (value: number, least: number, most: number): number => Math.min(Math.max(value, least), most)

function isSeen({ from, to, side }: PanView, outline: readonly Spot[]): boolean {
  const [alongs, acrosses] = [outline.map((spot) => spot.along), outline.map((spot) => spot.across)]
  const meets = (values: readonly number[], least: number, most: number) =>
    Math.max(...values) > least && Math.min(...values) < most
  return meets(alongs, from, to) && meets(acrosses, -side, side)
}

/** The room in front as the check has it: along the tilted axis, short or to spare. */
function Room({ view, draw: { x, y }, checks }: Part & { readonly checks: readonly Check[] }) {
  const check = comparedBy(checks, ROOM)
  if (!view.ahead || !check) return null
  const level = y(-view.place.pan.across / 2) + 26
  const words = `${Math.round(check.demand)} along the jack, ${outcomeText(check)}`
  return (
    <G>
      <Dimension
        from={{ x: x(0), y: level }}
        to={{ x: Math.min(x(view.ahead.distance), x(view.to)), y: level }}
        label={words}
        side="right"
        stroke={isShort(checks) ? colour.over : colour.ink}
      />
    </G>
  )
}
