import type { LayoutIndex } from '@wedgeline/engine'
import { useLayoutEffect, useMemo, useRef, useState } from 'react'
import { StyleSheet, useWindowDimensions, View } from 'react-native'
import Svg, { ClipPath, Defs, G, Path, Rect } from 'react-native-svg'
import { DrawingText } from '@/components/drawing/drawing-text'
import { Hatch, hatchFill } from '@/components/drawing/hatch'
import { ScaleBar } from '@/components/drawing/scale-bar'
import { colour, space, useWide } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { planData, type PlanArea } from './plan-data'
import { PlanAnchors, PlanEdges, PlanGrid } from './plan-parts'
import { PlanKey } from './plan-key'
import { boundsOf, pathThrough, planScale } from './plan-scale'

const WEDGE = 'pour-wedge'
const CORNER = 'pour-corner'
const ZOOM = { least: 1, most: 12, step: 1.5 } as const
const MARGIN = { wide: 78, phone: 62 } as const
const PHONE_HEIGHT = 420

/** On a wide window the plan leaves room for what stands above it, so that it is seen whole. */
const WIDE_HEIGHT = { least: 380, around: 330 } as const

/** Scale in px a mm from which the names of neighbouring pans have room. */
const PAN_NAMES_FROM = 0.018

export interface PourPlanProps {
  readonly index: LayoutIndex
  readonly pourId: string
  readonly onEdge: (edgeId: string) => void
  readonly onPan: (panId: string) => void
}

/** A pour from above: its grid, outline, edges, tendons and their spread. Closer makes it larger and lets it scroll. */
export function PourPlan({ index, pourId, onEdge, onPan }: PourPlanProps) {
  const isWide = useWide()
  const [width, setWidth] = useState(0)
  const [zoom, setZoom] = useState(1)
  const data = useMemo(() => planData(index, pourId), [index, pourId])
  const bounds = useMemo(() => boundsOf(data.outline), [data.outline])
  const margin = isWide ? MARGIN.wide : MARGIN.phone
  const heightMax = useHeightMax(isWide)
  const scale = planScale(bounds, { width, heightMax, margin, zoom })
  const sheet = useKeptMiddle(zoom)
  const areaOf = ({ outline }: PlanArea) => pathThrough(scale, outline, true)
  const outline = pathThrough(scale, data.outline, true)
  return (
    <View style={styles.plan} onLayout={(event) => setWidth(event.nativeEvent.layout.width)}>
      {width === 0 ? null : (
        <>
          <ZoomTools zoom={zoom} onZoom={setZoom} />
          <View
            ref={sheet}
            style={[styles.sheet, { maxHeight: heightMax + 16 }]}
            role="region"
            aria-label="Plan of the pour; the table of edges says the same in words"
            tabIndex={0}
          >
            <Svg width={scale.width} height={scale.height} role="img" aria-label="Plan of the pour, north up">
              <Defs>
                <ClipPath id="pour-outline">
                  <Path d={outline} />
                </ClipPath>
              </Defs>
              <Hatch id={WEDGE} />
              <Hatch id={CORNER} stroke={colour.ink} />
              <Path d={outline} fill={colour.concrete} />
              <G clipPath="url(#pour-outline)">
                {data.regions.map((region) => (
                  <Path key={region.id} d={areaOf(region)} fill={colour.wash} stroke={colour.soft} strokeWidth={1} />
                ))}
                {data.wedges.map((wedge) => (
                  <Path
                    key={wedge.id}
                    d={areaOf(wedge)}
                    fill={hatchFill(WEDGE)}
                    stroke={colour.ochre}
                    strokeWidth={0.75}
                  />
                ))}
                {data.corners.map((corner) => (
                  <Path
                    key={corner.id}
                    d={areaOf(corner)}
                    fill={hatchFill(CORNER)}
                    stroke={colour.ink}
                    strokeWidth={0.75}
                  />
                ))}
              </G>
              <PlanGrid data={data} bounds={bounds} scale={scale} margin={margin} />
              {data.pans.map((pan) => (
                <Path
                  key={pan.id}
                  d={areaOf(pan)}
                  fill={colour.sheet}
                  stroke={colour.ink}
                  strokeWidth={1.2}
                  onPress={() => onPan(pan.id)}
                />
              ))}
              <PlanAnchors data={data} scale={scale} />
              {data.obstructions.map((thing) => (
                <Path key={thing.id} d={areaOf(thing)} fill={colour.soft} stroke={colour.ink} strokeWidth={1} />
              ))}
              <PlanEdges data={data} scale={scale} onEdge={onEdge} />
              {[...data.regions, ...(scale.pxPerMm >= PAN_NAMES_FROM ? data.pans : [])].map((area) => (
                <AreaName key={area.id} area={area} at={scale.at} />
              ))}
              <ScaleBar x={12} y={scale.height - 14} pxPerMm={scale.pxPerMm} />
            </Svg>
          </View>
          <PlanKey data={data} />
        </>
      )}
    </View>
  )
}

function useHeightMax(isWide: boolean): number {
  const window = useWindowDimensions()
  return isWide ? Math.max(WIDE_HEIGHT.least, window.height - WIDE_HEIGHT.around) : PHONE_HEIGHT
}

/** What stands in the middle of the window stays there when the drawing grows. */
function useKeptMiddle(zoom: number) {
  const sheet = useRef<View>(null)
  const last = useRef(zoom)
  useLayoutEffect(() => {
    const box = sheet.current as unknown as HTMLElement | null
    const grown = zoom / last.current
    last.current = zoom
    if (!box || grown === 1) return
    box.scrollLeft = (box.scrollLeft + box.clientWidth / 2) * grown - box.clientWidth / 2
    box.scrollTop = (box.scrollTop + box.clientHeight / 2) * grown - box.clientHeight / 2
  }, [zoom])
  return sheet
}

function ZoomTools({ zoom, onZoom }: { readonly zoom: number; readonly onZoom: (zoom: number) => void }) {
  const to = (next: number) => onZoom(Math.min(ZOOM.most, Math.max(ZOOM.least, next)))
  return (
    <View style={styles.tools} dataSet={{ print: 'no' }}>
      <Button
        kind="quiet"
        label="Closer"
        iconOnly
        icon={<Icon name="plus" />}
        disabled={zoom >= ZOOM.most}
        onPress={() => to(zoom * ZOOM.step)}
      />
      <Button
        kind="quiet"
        label="Further away"
        iconOnly
        icon={<Icon name="minus" />}
        disabled={zoom <= ZOOM.least}
        onPress={() => to(zoom / ZOOM.step)}
      />
      <Button kind="quiet" label="Whole pour" disabled={zoom === ZOOM.least} onPress={() => to(ZOOM.least)} />
    </View>
  )
}

function AreaName(props: {
  readonly area: PlanArea
  readonly at: (point: { readonly x: number; readonly y: number }) => { readonly x: number; readonly y: number }
}) {
  const { area, at } = props
  const points = area.outline.map(at)
  const middle = (values: readonly number[]) => (Math.min(...values) + Math.max(...values)) / 2
  const [x, y] = [middle(points.map((point) => point.x)), middle(points.map((point) => point.y))]
  const width = area.mark.length * 6 + 6
  return (
    <G>
      <Rect x={x - width / 2} y={y - 7} width={width} height={14} fill={colour.sheet} />
      <DrawingText x={x} y={y + 4} size={11} textAnchor="middle">
        {area.mark}
      </DrawingText>
    </G>
  )
}

const styles = StyleSheet.create({
  plan: { backgroundColor: colour.sheet, borderWidth: 1, borderColor: colour.rule, minWidth: 0 },
  sheet: { overflow: 'scroll', minWidth: 0 },
  tools: { flexDirection: 'row', justifyContent: 'flex-end', paddingHorizontal: space.s },
})
