import type { LayoutIndex, PlacedBar } from '@wedgeline/engine'
import { anchorMark, found, plateBox, pocketBox } from '@wedgeline/engine/geometry'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import Svg, { Circle, G, Line, Path, Rect } from 'react-native-svg'
import { Dimension } from '@/components/drawing/dimension'
import { ScaleBar } from '@/components/drawing/scale-bar'
import { Text } from '@/components/ui/text'
import { colour, space } from '@/components/theme'

export interface AnchorDrawingProps {
  readonly index: LayoutIndex
  readonly anchorId: string
  readonly bars: readonly PlacedBar[]
}

/** Slab shown behind the bearing face, mm, and beside the plate. */
const BEHIND_MM = 700
const BESIDE_MM = 120
const GAP_PX = 44
const FOOT_PX = 40
/** Room above for the set-back's dimension. */
const HEAD_PX = 26

/** Face and section of one anchor at one true scale, with the dimensions that are looked for on the deck. */
export function AnchorDrawing({ index, anchorId, bars }: AnchorDrawingProps) {
  const [width, setWidth] = useState(0)
  const anchor = found(index.anchors, anchorId, 'anchor')
  const hardware = found(index.hardware, anchor.hardwareId, 'hardware')
  if (anchor.edgeId === null) return null
  const frame = found(index.frames, anchor.edgeId, 'edge')
  const [top, soffit] = [frame.topAt(anchor.chainage), frame.soffitAt(anchor.chainage)]
  const faceMm = (hardware.pocket?.width ?? hardware.plate.width) + 2 * BESIDE_MM
  const sectionMm = anchor.setBack + BEHIND_MM
  const scale = Math.min((width - 3 * GAP_PX) / (faceMm + sectionMm), 240 / (top - soffit))
  const height = (top - soffit) * scale
  const own = bars.filter((bar) => bar.anchorId === anchorId || bar.kind === 'edge-bars')
  const y = (h: number) => HEAD_PX + (top - h) * scale
  const face = (c: number) =>
    GAP_PX + ((frame.runsLeftToRight ? c - anchor.chainage : anchor.chainage - c) + faceMm / 2) * scale
  const depth = (d: number) => 2 * GAP_PX + faceMm * scale + d * scale
  const plate = plateBox(anchor, hardware)
  const pocket = pocketBox(anchor, hardware)
  const isDead = anchor.end === 'dead'
  const straight = anchor.straightBehind
  return (
    <View onLayout={(event) => setWidth(event.nativeEvent.layout.width)} style={styles.drawing}>
      {width === 0 ? null : (
        <Svg
          width={width}
          height={height + FOOT_PX + HEAD_PX}
          role="img"
          aria-label={`${anchorMark(index, anchor)}: face and section at true scale`}
        >
          <Rect
            x={GAP_PX}
            y={y(top)}
            width={faceMm * scale}
            height={height}
            fill={colour.concrete}
            stroke={colour.ink}
          />
          <Rect x={depth(0)} y={y(top)} width={sectionMm * scale} height={height} fill={colour.concrete} />
          <Path
            d={`M${depth(sectionMm)} ${y(top)}H${depth(0)}V${y(soffit)}H${depth(sectionMm)}`}
            stroke={colour.ink}
            fill="none"
          />
          {pocket ? (
            <>
              <Path
                d={`M${depth(0)} ${y(pocket.toHeight)}L${depth(pocket.toDepth)} ${y(plate.toHeight)}V${y(plate.fromHeight)}L${depth(0)} ${y(pocket.fromHeight)}Z`}
                fill={colour.sheet}
                stroke={colour.soft}
              />
              <BoxAt
                a={face(pocket.fromChainage)}
                b={face(pocket.toChainage)}
                y0={y(pocket.toHeight)}
                y1={y(pocket.fromHeight)}
                fill={colour.sheet}
              />
            </>
          ) : null}
          <G>
            {own.map((bar, i) => (
              <BarOnFace key={i} bar={bar} x={face} y={y} scale={scale} />
            ))}
            {own.filter(isInSection(sectionMm)).map((bar, i) => (
              <BarInSection key={i} bar={bar} x={depth} y={y} scale={scale} chainage={anchor.chainage} />
            ))}
          </G>
          <Rect
            x={Math.min(face(plate.fromChainage), face(plate.toChainage))}
            y={y(plate.toHeight)}
            width={hardware.plate.width * scale}
            height={hardware.plate.height * scale}
            fill={isDead ? colour.sheet : colour.steel}
            stroke={colour.steel}
            {...(isDead ? { strokeDasharray: '4 2' } : {})}
          />
          <Rect
            x={depth(anchor.setBack)}
            y={y(plate.toHeight)}
            width={Math.max(3, 20 * scale)}
            height={hardware.plate.height * scale}
            fill={colour.steel}
          />
          <Line
            x1={depth(anchor.setBack)}
            y1={y(anchor.height)}
            x2={depth(sectionMm)}
            y2={y(anchor.height) + Math.tan(anchor.elevation) * BEHIND_MM * scale}
            stroke={colour.steel}
            strokeWidth={2}
          />
          <Dimension
            from={{ x: GAP_PX - 10, y: y(soffit) }}
            to={{ x: GAP_PX - 10, y: y(anchor.height) }}
            label={`${anchor.height - soffit}`}
            side="left"
          />
          <Dimension
            from={{ x: depth(0), y: y(top) - 8 }}
            to={{ x: depth(anchor.setBack), y: y(top) - 8 }}
            label={`${anchor.setBack}`}
            side="left"
          />
          {straight === null ? null : (
            <Dimension
              from={{ x: depth(anchor.setBack), y: y(soffit) + 12 }}
              to={{ x: depth(Math.min(anchor.setBack + straight, sectionMm)), y: y(soffit) + 12 }}
              label={straight > BEHIND_MM ? `straight ${straight}, cut off here` : `straight ${straight}`}
              side="right"
            />
          )}
          <ScaleBar x={GAP_PX} y={y(soffit) + 26} pxPerMm={scale} minLengthPx={40} />
        </Svg>
      )}
      <Text kind="small" tone="soft">
        Face from outside and section through the tendon, one true scale. Dimensions in mm.
      </Text>
    </View>
  )
}

function BoxAt({ a, b, y0, y1, fill }: { a: number; b: number; y0: number; y1: number; fill: string }) {
  return (
    <Rect
      x={Math.min(a, b)}
      y={y0}
      width={Math.abs(b - a)}
      height={y1 - y0}
      fill={fill}
      stroke={colour.soft}
      strokeDasharray="2 3"
    />
  )
}

interface Drawn {
  readonly bar: PlacedBar
  readonly x: (mm: number) => number
  readonly y: (mm: number) => number
  readonly scale: number
}

/** Bars that lie wholly behind the cut are not in the picture. */
const isInSection =
  (sectionMm: number) =>
  ({ path }: PlacedBar) =>
    path.some((point) => point.depth <= sectionMm)

const widthOf = (bar: PlacedBar, scale: number) => Math.max(1.4, bar.diameter * scale)

/** Links, spirals and hairpins are seen in outline; straight bars along the edge end-on or as lines beside the plate. */
function BarOnFace({ bar, x, y, scale }: Drawn) {
  if (bar.kind === 'edge-bars' || bar.kind === 'transverse-bars') return null
  const points = bar.path.map((p) => `${x(p.chainage).toFixed(1)} ${y(p.height).toFixed(1)}`)
  return (
    <Path
      d={`M${points.join('L')}${bar.isClosed ? 'Z' : ''}`}
      fill="none"
      stroke={colour.rust}
      strokeWidth={widthOf(bar, scale)}
    />
  )
}

/** Bars that cross the section are dots; those that lie in it are lines. */
function BarInSection({ bar, x, y, scale, chainage }: Drawn & { readonly chainage: number }) {
  const crosses = bar.path.some((p) => p.chainage <= chainage) && bar.path.some((p) => p.chainage >= chainage)
  if (!crosses && bar.kind !== 'hairpins') return null
  const isAlong = bar.kind === 'edge-bars' || bar.kind === 'transverse-bars'
  const [first] = bar.path
  if (isAlong && first) {
    return (
      <Circle cx={x(first.depth)} cy={y(first.height)} r={Math.max(2, (bar.diameter / 2) * scale)} fill={colour.rust} />
    )
  }
  const points = bar.path.map((p) => `${x(p.depth).toFixed(1)} ${y(p.height).toFixed(1)}`)
  return <Path d={`M${points.join('L')}`} fill="none" stroke={colour.rust} strokeWidth={widthOf(bar, scale)} />
}

const styles = StyleSheet.create({ drawing: { gap: space.xs } })
