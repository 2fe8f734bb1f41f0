import type { LayoutIndex, ZoneResult } from '@wedgeline/engine'
import { useMemo, useState } from 'react'
import { StyleSheet, View } from 'react-native'
import Svg, { Rect } from 'react-native-svg'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { colour, space, useWide } from '@/components/theme'
import { AXIS_HEIGHT, ChainageAxis } from './chainage-axis'
import { DataRow } from './data-row'
import { dataRows } from './data-rows'
import { FaceBand } from './face-band'
import { Overview } from './overview'
import { PlanBand } from './plan-band'
import { heightStretch, scrolled, showing, stripScale, zoomed, type View as StripView } from './scale'
import type { StripData } from './strip-data'
import { compass } from './view-words'

export interface EdgeStripProps {
  readonly index: LayoutIndex
  readonly data: StripData
  readonly results: ReadonlyMap<string, ZoneResult>
  /** Zone that is picked: an anchor or a gap. */
  readonly selected: string | null
  readonly onSelect: (zoneId: string) => void
  /** The table beside the strip shows heights, forces and steel: those rows fold away. */
  readonly isTableOpen: boolean
}

const PLAN_PX = { wide: 150, phone: 150 } as const
const FACE_PX = { wide: 92, phone: 110 } as const
const GUTTER_PX = { wide: 200, phone: 12 } as const
/** On a phone an anchor every 1.2 m gets about 110 px. */
const PHONE_VIEW_MM = 4000

/** Plan, face and figures of one edge on one chainage axis: the picture that people read an edge from. */
export function EdgeStrip({ index, data, results, selected, onSelect, isTableOpen }: EdgeStripProps) {
  const isWide = useWide()
  const [width, setWidth] = useState(0)
  const [isOnDeck, setOnDeck] = useState(false)
  const edge = useMemo((): StripView => ({ from: data.frame.from, to: data.frame.to }), [data.frame])
  const [asked, setView] = useState<StripView | null>(null)
  const [shown, setShown] = useState<string | null>(null)
  const startView = isWide ? edge : { from: edge.from, to: Math.min(edge.to, edge.from + PHONE_VIEW_MM) }
  const view = asked ? zoomed(asked, edge, { factor: 1, about: asked.from }) : startView
  if (selected !== shown) {
    setShown(selected)
    const place = data.ends.find(({ id }) => `anchor:${id}` === selected)
    if (place) setView(showing(view, edge, place.chainage))
  }
  const gutter = isWide ? GUTTER_PX.wide : GUTTER_PX.phone
  const growsRight = data.frame.runsLeftToRight !== isOnDeck
  const scale = stripScale({ view, left: gutter, width: Math.max(1, width - gutter - (isWide ? 36 : 16)), growsRight })
  const planHeight = isWide ? PLAN_PX.wide : PLAN_PX.phone
  const depth = data.highest - data.lowest
  const stretch = heightStretch(depth, scale.pxPerMm, isWide ? FACE_PX.wide : FACE_PX.phone)
  const faceTop = AXIS_HEIGHT + planHeight + 14
  const faceHeight = depth * scale.pxPerMm * stretch
  const height = faceTop + faceHeight + 10
  const rows = dataRows({ index, data, results, selected, onSelect, isTableOpen })
  const look = { edge, view, setView, scale }
  const step = (by: number) => setView(scrolled(view, edge, by * (view.to - view.from) * 0.8 * (growsRight ? 1 : -1)))
  const tools = <StripTools look={look} isOnDeck={isOnDeck} onDeck={setOnDeck} onStep={step} />
  return (
    <View
      style={styles.strip}
      onLayout={(event) => setWidth(event.nativeEvent.layout.width)}
      role="group"
      aria-label="Edge strip"
    >
      {width === 0 ? null : (
        <>
          {isWide ? <View style={[styles.gutterTools, { width: gutter }]}>{tools}</View> : null}
          <Overview
            edge={edge}
            view={view}
            growsRight={growsRight}
            left={gutter}
            width={scale.width}
            ends={data.ends.map((end) => ({ ...end, status: results.get(`anchor:${end.id}`)?.status ?? null }))}
            onShow={(chainage) => setView(showing(centred(view, chainage), edge, chainage))}
          />
          <View>
            {isWide ? (
              <BandNames
                data={data}
                planHeight={planHeight}
                faceTop={faceTop}
                stretch={stretch}
                scale={scale}
                isOnDeck={isOnDeck}
                gutter={gutter}
              />
            ) : null}
            <Svg width={width} height={height} role="img" aria-label="Plan and face of the edge">
              <ChainageAxis scale={scale} gridCrossings={data.gridCrossings} />
              <PlanBand {...data} scale={scale} top={AXIS_HEIGHT} height={planHeight} />
              <FaceBand {...data} scale={scale} top={faceTop} pxPerHeight={scale.pxPerMm * stretch} />
              <Picked
                {...{ data, selected, scale }}
                top={AXIS_HEIGHT}
                height={faceTop + faceHeight - AXIS_HEIGHT + 4}
              />
            </Svg>
          </View>
          {isWide ? null : <View style={styles.tools}>{tools}</View>}
          {isWide ? null : (
            <Text kind="small" tone="soft" style={styles.note}>
              {notes({ data, stretch, isOnDeck }).join(' · ')}
            </Text>
          )}
          {rows.map((row) => (
            <DataRow
              key={row.label}
              label={row.label}
              cells={row.cells}
              scale={scale}
              height={isWide ? 24 : row.isPressed ? 40 : 22}
              gutter={gutter}
              isLabelAbove={!isWide}
            />
          ))}
        </>
      )}
    </View>
  )
}

const centred = (view: StripView, about: number): StripView => {
  const half = (view.to - view.from) / 2
  return { from: about - half, to: about + half }
}

type Data = StripData
type Scale = ReturnType<typeof stripScale>

function notes({ data, stretch, isOnDeck }: { data: Data; stretch: number; isOnDeck: boolean }): string[] {
  return [
    `${isOnDeck ? 'Seen from the deck' : 'Seen from outside'}, chainage runs ${compass(data.frame.along)}`,
    `face ${data.highest - data.lowest} mm deep, heights × ${stretch}`,
  ]
}

function BandNames(props: {
  readonly data: Data
  readonly planHeight: number
  readonly faceTop: number
  readonly stretch: number
  readonly scale: Scale
  readonly isOnDeck: boolean
  readonly gutter: number
}) {
  const { data, planHeight, faceTop, stretch, scale, isOnDeck, gutter } = props
  const line = (text: string) => (
    <Text kind="small" tone="soft" style={styles.bandName}>
      {text}
    </Text>
  )
  return (
    <>
      <View style={[styles.bandNames, { top: 22, width: gutter }]}>
        {line(`Chainage, mm, runs ${compass(data.frame.along)}`)}
      </View>
      <View style={[styles.bandNames, { top: AXIS_HEIGHT + 4, width: gutter }]}>
        {line(isOnDeck ? 'Plan, seen from the deck' : 'Plan, from above')}
        {line(`${Math.floor(planHeight / scale.pxPerMm / 100) * 100} mm of slab`)}
      </View>
      <View style={[styles.bandNames, { top: faceTop, width: gutter }]}>
        {line(isOnDeck ? 'Face, seen from the deck' : 'Face, from outside')}
        {line(`${data.highest - data.lowest} mm deep, heights × ${stretch}`)}
      </View>
    </>
  )
}

function StripTools(props: {
  readonly look: { edge: StripView; view: StripView; setView: (view: StripView | null) => void; scale: Scale }
  readonly isOnDeck: boolean
  readonly onDeck: (isOnDeck: boolean) => void
  readonly onStep: (by: number) => void
}) {
  const { look, isOnDeck, onDeck, onStep } = props
  const zoom = (factor: number) => {
    const about = (look.view.from + look.view.to) / 2
    look.setView(zoomed(look.view, look.edge, { factor, about }))
  }
  return (
    <>
      <Button kind="quiet" label="Scroll left" iconOnly icon={<Icon name="back" />} onPress={() => onStep(-1)} />
      <Button kind="quiet" label="Scroll right" iconOnly icon={<Icon name="forward" />} onPress={() => onStep(1)} />
      <Button kind="quiet" label="Closer" iconOnly icon={<Icon name="plus" />} onPress={() => zoom(0.5)} />
      <Button kind="quiet" label="Further away" iconOnly icon={<Icon name="minus" />} onPress={() => zoom(2)} />
      <Button
        kind="quiet"
        label="Whole edge"
        iconOnly
        icon={<Icon name="whole" />}
        onPress={() => look.setView(look.edge)}
      />
      <Button
        kind="quiet"
        label={isOnDeck ? 'See from outside' : 'See from the deck'}
        iconOnly
        icon={<Icon name="turn" />}
        aria-pressed={isOnDeck}
        onPress={() => onDeck(!isOnDeck)}
      />
    </>
  )
}

/** Frames what is picked across all bands. */
function Picked(props: {
  readonly data: Data
  readonly selected: string | null
  readonly scale: Scale
  readonly top: number
  readonly height: number
}) {
  const { data, selected, scale, top, height } = props
  const end = data.ends.find(({ id }) => `anchor:${id}` === selected)
  if (!end) return null
  const half = Math.max((end.width * scale.pxPerMm) / 2 + 8, 16)
  const x = scale.x(end.chainage)
  if (x < scale.left - half || x > scale.left + scale.width + half) return null
  return (
    <Rect x={x - half} y={top} width={2 * half} height={height} fill="none" stroke={colour.ink} strokeWidth={1.6} />
  )
}

const styles = StyleSheet.create({
  strip: { backgroundColor: colour.sheet, paddingBottom: space.s },
  tools: { flexDirection: 'row', justifyContent: 'space-between', paddingHorizontal: space.s },
  gutterTools: { position: 'absolute', top: 2, left: 0, flexDirection: 'row', justifyContent: 'flex-end', zIndex: 1 },
  bandNames: { position: 'absolute', left: 0, alignItems: 'flex-end', paddingRight: space.s, zIndex: 1 },
  bandName: { textAlign: 'right' },
  note: { paddingHorizontal: space.m, paddingVertical: space.xs },
})
