import type { LengthKind } from '@wedgeline/engine'
import { G, Line, Path, Rect } from 'react-native-svg'
import { DrawingText } from '@/components/drawing/drawing-text'
import { GridBubble } from '@/components/drawing/grid-bubble'
import { colour } from '@/components/theme'
import type { PlanAnchor, PlanData, PlanEdge } from './plan-data'
import { lineAcross, pathThrough, type Bounds, type PlanScale, type Spot } from './plan-scale'

/** A bubble and a little air. */
const BUBBLE_PX = 25

/** Lines of the grid over the pour, named beyond its north or west side. */
export function PlanGrid(props: {
  readonly data: PlanData
  readonly bounds: Bounds
  readonly scale: PlanScale
  /** Room round the slab, px: bubbles stand at its outside, marks of edges between them and the slab. */
  readonly margin: number
}) {
  const { data, bounds, scale, margin } = props
  const out = (margin - BUBBLE_PX) / scale.pxPerMm
  const stub = 10 / scale.pxPerMm
  const room = {
    left: bounds.left - out,
    right: bounds.right + stub,
    bottom: bounds.bottom - stub,
    top: bounds.top + out,
  }
  return (
    <G>
      {data.gridLines.map(({ name, point, direction }) => {
        const crossing = lineAcross(room, point, direction)
        if (!crossing) return null
        const [a, b] = [scale.at(crossing[0]), scale.at(crossing[1])]
        const runsUp = Math.abs(direction.y) >= Math.abs(direction.x)
        const head = runsUp === a.y < b.y || (!runsUp && a.x < b.x) ? a : b
        const bubble = runsUp ? { x: head.x, y: head.y - 12 } : { x: head.x - 12, y: head.y }
        return (
          <G key={name}>
            <Line
              x1={a.x}
              y1={a.y}
              x2={b.x}
              y2={b.y}
              stroke={colour.soft}
              strokeWidth={0.75}
              strokeDasharray="10 3 2 3"
            />
            <GridBubble {...bubble} label={name} />
          </G>
        )
      })}
    </G>
  )
}

/** Tendons with the sides of their spread; live ends filled, dead ends open. */
export function PlanAnchors({ data, scale }: { readonly data: PlanData; readonly scale: PlanScale }) {
  return (
    <G>
      {data.anchors.flatMap(({ id, spread }) =>
        spread.map((side, at) => (
          <Path
            key={`${id}-${at}`}
            d={pathThrough(scale, side, false)}
            stroke={colour.ochre}
            strokeWidth={0.75}
            strokeDasharray="3 2"
            fill="none"
          />
        )),
      )}
      {data.tendons.map(({ id, path, isOpen }) => (
        <Path
          key={id}
          d={pathThrough(scale, path, false)}
          stroke={colour.steel}
          strokeWidth={1.4}
          fill="none"
          {...(isOpen ? { strokeDasharray: '6 4' } : {})}
        />
      ))}
      {data.anchors.map((anchor) => (
        <Plate key={anchor.id} anchor={anchor} scale={scale} />
      ))}
    </G>
  )
}

function Plate({ anchor, scale }: { readonly anchor: PlanAnchor; readonly scale: PlanScale }) {
  const { x, y } = scale.at(anchor.point)
  const inward = { x: anchor.inward.x, y: -anchor.inward.y }
  const across = { x: inward.y, y: -inward.x }
  const half = Math.max((anchor.width * scale.pxPerMm) / 2, 3.5)
  const deep = anchor.isLive ? 4 : Math.max(6, half)
  const corner = (side: number, depth: number) =>
    `${(x + across.x * side * half + inward.x * depth).toFixed(1)} ${(y + across.y * side * half + inward.y * depth).toFixed(1)}`
  const body = anchor.isLive
    ? `M${corner(-1, 0)}L${corner(1, 0)}L${corner(1, deep)}L${corner(-1, deep)}Z`
    : `M${corner(-1, 0)}L${corner(1, 0)}L${corner(0, deep)}Z`
  return <Path d={body} fill={anchor.isLive ? colour.steel : colour.sheet} stroke={colour.steel} strokeWidth={1.3} />
}

/** How a length of edge is drawn; the line says the kind without any colour. */
export const EDGE_LINES: Readonly<Record<LengthKind, { readonly width: number; readonly dash?: string }>> = {
  free: { width: 3 },
  'construction-joint': { width: 3, dash: '12 4' },
  'movement-joint': { width: 3, dash: '3 4' },
  'against-wall': { width: 6 },
}

export function PlanEdges(props: {
  readonly data: PlanData
  readonly scale: PlanScale
  readonly onEdge: (edgeId: string) => void
}) {
  const { data, scale, onEdge } = props
  return (
    <G>
      {data.edges.map((edge) => (
        <G key={edge.id} onPress={() => onEdge(edge.id)}>
          {edge.lengths.map((length, at) => {
            const { width, dash } = EDGE_LINES[length.kind]
            return (
              <Stroke
                key={at}
                {...{ from: scale.at(length.from), to: scale.at(length.to), width, dash, stroke: colour.ink }}
              />
            )
          })}
          <Stroke from={scale.at(edge.from)} to={scale.at(edge.to)} width={24} stroke="transparent" />
          <EdgeMark edge={edge} scale={scale} />
        </G>
      ))}
    </G>
  )
}

function Stroke(props: { from: Spot; to: Spot; width: number; stroke: string; dash?: string | undefined }) {
  const { from, to, width, stroke, dash } = props
  return (
    <Line
      x1={from.x}
      y1={from.y}
      x2={to.x}
      y2={to.y}
      stroke={stroke}
      strokeWidth={width}
      {...(dash ? { strokeDasharray: dash } : {})}
    />
  )
}

/** The mark of an edge stands outside the slab, beside its middle. */
function EdgeMark({ edge, scale }: { readonly edge: PlanEdge; readonly scale: PlanScale }) {
  const [a, b] = [scale.at(edge.from), scale.at(edge.to)]
  const way = { x: edge.outward.x, y: -edge.outward.y }
  const x = (a.x + b.x) / 2 + way.x * 14
  const y = (a.y + b.y) / 2 + way.y * 14 + 4
  const anchor = way.x > 0.5 ? 'start' : way.x < -0.5 ? 'end' : 'middle'
  const width = edge.mark.length * 6.5 + 6
  const left = anchor === 'start' ? x - 3 : anchor === 'end' ? x - width + 3 : x - width / 2
  return (
    <G>
      <Rect x={left} y={y - 11} width={width} height={14} fill={colour.sheet} />
      <DrawingText x={x} y={y} isStrong textAnchor={anchor}>
        {edge.mark}
      </DrawingText>
    </G>
  )
}
