import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import Svg, { Circle, Path } from 'react-native-svg'
import { Dimension } from '@/components/drawing/dimension'
import { DrawingText } from '@/components/drawing/drawing-text'
import { colour, space } from '@/components/theme'
import { Text } from '@/components/ui/text'
import { boundsOf, pathThrough, planScale, type PlanScale } from './plan-scale'
import type { PlanPoint } from './pour-commands'

export interface OutlineDrawingProps {
  readonly corners: readonly PlanPoint[]
  /** Outlines of the level's other pours. */
  readonly others: readonly { readonly mark: string; readonly outline: readonly PlanPoint[] }[]
  /** Whether the outline can be used: one that cannot is drawn as an open line. */
  readonly isSound: boolean
}

/** Always as high, so that a button below does not move from under the thumb that leaves a field. */
const HEIGHT_PX = 300
/** Room for a size of five figures beside the outline. */
const MARGIN_PX = 64

const spot = ({ xMm, yMm }: PlanPoint) => ({ x: xMm, y: yMm })

/** The outline as it is typed, beside the pours that the level has already. */
export function OutlineDrawing({ corners, others, isSound }: OutlineDrawingProps) {
  const [width, setWidth] = useState(0)
  const points = corners.map(spot)
  const drawn = [...points, ...others.flatMap(({ outline }) => outline.map(spot))]
  const scale =
    width > 0 && drawn.length > 0
      ? planScale(boundsOf(drawn), { width, heightMax: HEIGHT_PX, margin: MARGIN_PX, zoom: 1 })
      : null
  return (
    <View style={styles.drawing} onLayout={(event) => setWidth(event.nativeEvent.layout.width)}>
      {scale ? (
        <Svg
          width={scale.width}
          height={scale.height}
          role="img"
          aria-label={`Outline with ${corners.length} corners, north up`}
        >
          {others.map((pour) => (
            <OtherPour key={pour.mark} {...pour} scale={scale} />
          ))}
          {points.length > 0 ? (
            <Path
              d={pathThrough(scale, points, isSound)}
              fill={isSound ? colour.concrete : 'none'}
              stroke={isSound ? colour.ink : colour.over}
              strokeWidth={2}
            />
          ) : null}
          {isSound ? <Sizes points={points} at={scale.at} /> : null}
          {points.map((point, i) => {
            const { x, y } = scale.at(point)
            return <Circle key={i} cx={x} cy={y} r={3} fill={colour.ink} />
          })}
          {isSound
            ? null
            : points.map((point, i) => {
                const { x, y } = scale.at(point)
                return (
                  <DrawingText key={i} x={x + 6} y={y - 6}>
                    {i + 1}
                  </DrawingText>
                )
              })}
        </Svg>
      ) : (
        <Text tone="soft" style={styles.none}>
          The outline is drawn here as it is typed.
        </Text>
      )}
    </View>
  )
}

function OtherPour({ mark, outline, scale }: OutlineDrawingProps['others'][number] & { readonly scale: PlanScale }) {
  const points = outline.map(spot)
  const { left, right, bottom, top } = boundsOf(points)
  const middle = scale.at({ x: (left + right) / 2, y: (bottom + top) / 2 })
  return (
    <>
      <Path
        d={pathThrough(scale, points, true)}
        fill="none"
        stroke={colour.soft}
        strokeWidth={1}
        strokeDasharray="4 3"
      />
      <DrawingText x={middle.x} y={middle.y} fill={colour.soft} textAnchor="middle">
        {mark}
      </DrawingText>
    </>
  )
}

interface SizesProps {
  readonly points: readonly { readonly x: number; readonly y: number }[]
  readonly at: (point: { readonly x: number; readonly y: number }) => { readonly x: number; readonly y: number }
}

/** The whole size east and north, below and beside the outline. */
function Sizes({ points, at }: SizesProps) {
  const { left, right, bottom, top } = boundsOf(points)
  const [southWest, southEast, northWest] = [
    at({ x: left, y: bottom }),
    at({ x: right, y: bottom }),
    at({ x: left, y: top }),
  ]
  return (
    <>
      <Dimension
        from={{ x: southWest.x, y: southWest.y + 14 }}
        to={{ x: southEast.x, y: southEast.y + 14 }}
        label={String(Math.round(right - left))}
        side="right"
      />
      <Dimension
        from={{ x: southWest.x - 12, y: southWest.y }}
        to={{ x: northWest.x - 12, y: northWest.y }}
        label={String(Math.round(top - bottom))}
        side="left"
      />
    </>
  )
}

const styles = StyleSheet.create({
  drawing: {
    height: HEIGHT_PX + 2,
    justifyContent: 'center',
    backgroundColor: colour.sheet,
    borderWidth: 1,
    borderColor: colour.rule,
  },
  none: { padding: space.l },
})
