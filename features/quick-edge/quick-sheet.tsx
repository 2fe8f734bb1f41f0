import { toEngine } from '@wedgeline/contract'
import { BASIS_SOURCES } from '@wedgeline/engine/bases'
import { layoutIndex } from '@wedgeline/engine/geometry'
import { useMemo } from 'react'
import { StyleSheet, View } from 'react-native'
import Svg from 'react-native-svg'
import { colour, space } from '@/components/theme'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { countChecks } from '../checks/counts'
import { READING_NOT_ACCEPTED } from '../checks/proposed'
import { StatusMarks } from '../checks/status-counts'
import { readingTitle } from '../checks/zone-words'
import { AXIS_HEIGHT, ChainageAxis } from '../edge/strip/chainage-axis'
import { FaceBand } from '../edge/strip/face-band'
import { PlanBand } from '../edge/strip/plan-band'
import { heightStretch, stripScale } from '../edge/strip/scale'
import { stripData } from '../edge/strip/strip-data'
import { massText } from '../schedule/schedule-words'
import { markLines } from './mark-lines'
import { EDGE_ID } from './quick-layout'
import { anchorLines } from './quick-paste'
import { SheetColumns, type SheetColumn } from './sheet-columns'
import type { QuickAnswer } from './use-quick-answer'
import { worstKinds } from './worst-kinds'

/** Widths of the sheet in its own px, by the rows of its longest list; theme.css scales each to the width of A4. */
const SIZES = [
  { density: 'large', width: 1060, rowsMost: 20 },
  { density: 'small', width: 1460, rowsMost: 44 },
  { density: 'tiny', width: 1830, rowsMost: Infinity },
] as const

const sizeOf = ({ layout, schedule }: QuickAnswer): (typeof SIZES)[number] => {
  const rows = Math.max(layout.anchors.length, markLines(schedule).length)
  return SIZES.find(({ rowsMost }) => rows <= rowsMost) ?? SIZES[2]
}
const PLAN_PX = 190
const FACE_PX = 90

/** As much of each list as one side of A4 holds; the rest is named as a number. */
const MOST = { anchors: 60, marks: 24, worst: 12, readings: 8 } as const

interface SheetProps {
  readonly answer: QuickAnswer
  readonly preparedBy: string
  /** Where bars were proposed: whole sentences about them. */
  readonly notes: readonly string[]
}

/** What is printed: one side of A4 with everything that stands on the page. On screen it is not there. */
export function QuickSheet({ answer, preparedBy, notes }: SheetProps) {
  const { density, width } = sizeOf(answer)
  return (
    <View style={[styles.sheet, { width }]} dataSet={{ print: 'a4', density }}>
      <SheetHead answer={answer} preparedBy={preparedBy} />
      <SheetDrawing answer={answer} width={width} />
      <View style={styles.columns}>
        <View style={styles.half}>
          <Anchors answer={answer} />
        </View>
        <View style={styles.half}>
          <Bars answer={answer} />
        </View>
      </View>
      <Worst answer={answer} />
      <Readings answer={answer} />
      <View style={styles.foot}>
        {notes.map((note) => (
          <Text key={note} kind="small">
            {note}
          </Text>
        ))}
        <Text kind="small">
          {`Shapes, dimensions and lengths follow ${answer.schedule.edition}; reinforcement ${answer.schedule.grade}. Lengths in mm, forces in kN.`}
        </Text>
        <Text kind="small">
          Results assist a qualified engineer and do not replace one. Local codes and licensed practice govern.
          Stressing is never cleared by this sheet: a named engineer does that.
        </Text>
      </View>
    </View>
  )
}

function SheetHead({ answer: { layout, result, atMs }, preparedBy }: Omit<SheetProps, 'notes'>) {
  const { job } = layout
  const [pour] = layout.pours
  const [edge] = layout.edges
  const day = new Intl.DateTimeFormat('en-GB', { timeZone: job.timeZone, dateStyle: 'long', timeStyle: 'short' })
  const length = edge?.lengths.reduce((sum, { fromMm, toMm }) => sum + toMm - fromMm, 0) ?? 0
  const facts = [
    ['Slab', `${pour?.thicknessMm} mm, ${pour?.concrete}`],
    ['Covers', `${pour?.coverTopMm} top, ${pour?.coverSoffitMm} soffit, ${pour?.coverEdgeMm} edge`],
    ['Stages', pour?.stages.map(({ name, strengthMPa }) => `${name} at ${strengthMPa} MPa`).join(', ') ?? ''],
    ['Edge', `${length} mm, ${layout.anchors.length} anchors`],
    ['Basis', BASIS_SOURCES.find(({ id }) => id === job.basis)?.title ?? job.basis],
    ['Made', `${day.format(atMs)}, ${preparedBy}`],
  ] as const
  return (
    <View style={styles.head}>
      <View style={styles.titles}>
        <Text kind="title">{`${job.number}  ${job.title}`}</Text>
        <Text kind="strong" tone="over">
          QUICK EDGE, NOT FILED. Readings not accepted. Not for construction.
        </Text>
      </View>
      <View style={styles.facts}>
        {facts.map(([name, value]) => (
          <View key={name}>
            <Text kind="small" tone="soft">
              {name}
            </Text>
            <Text>{value}</Text>
          </View>
        ))}
      </View>
      <View style={styles.facts}>
        <StatusMarks counts={countChecks(result.zones)} />
      </View>
    </View>
  )
}

/** Plan and face of the whole edge on one axis. */
function SheetDrawing({ answer: { layout }, width }: Pick<SheetProps, 'answer'> & { readonly width: number }) {
  const { index, data } = useMemo(() => {
    const made = layoutIndex(toEngine(layout))
    return { index: made, data: stripData(made, EDGE_ID) }
  }, [layout])
  const view = { from: data.frame.from, to: data.frame.to }
  const scale = stripScale({ view, left: 20, width: width - 40, growsRight: data.frame.runsLeftToRight })
  const depth = data.highest - data.lowest
  const stretch = heightStretch(depth, scale.pxPerMm, FACE_PX)
  const faceTop = AXIS_HEIGHT + PLAN_PX + 14
  const height = faceTop + depth * scale.pxPerMm * stretch + 8
  const strands = layout.tendons[0] ? index.tendons.get(layout.tendons[0].id) : undefined
  return (
    <View>
      <Svg width={width} height={height} role="img" aria-label="Plan and face of the edge">
        <ChainageAxis scale={scale} gridCrossings={data.gridCrossings} />
        <PlanBand {...data} scale={scale} top={AXIS_HEIGHT} height={PLAN_PX} />
        <FaceBand {...data} scale={scale} top={faceTop} pxPerHeight={scale.pxPerMm * stretch} />
      </Svg>
      <Text kind="small" tone="soft">
        {`Plan from above and face from outside, distances in mm; heights of the face × ${stretch}. Hatched: edge wedge. ` +
          `Jacking at ${strands ? Math.round(strands.jackingRatio * 100) : '–'} % of the breaking load.`}
      </Text>
    </View>
  )
}

type OfAnswer = Pick<SheetProps, 'answer'>

function Anchors({ answer: { layout, result } }: OfAnswer) {
  const lines = anchorLines(layout)
  const status = new Map(result.zones.map(({ zone, status: worst }) => [zone.id, worst]))
  const columns: readonly SheetColumn<(typeof lines)[number]>[] = [
    { head: 'Anchor', share: 3, cell: ({ mark }) => mark },
    { head: 'At', share: 3, isFigure: true, cell: ({ chainageMm }) => chainageMm },
    { head: 'Height', share: 3, isFigure: true, cell: ({ heightMm }) => heightMm },
    { head: 'Strands', share: 3, isFigure: true, cell: ({ strands }) => strands },
    { head: 'End, hardware', share: 5, cell: ({ end, hardware }) => `${end} ${hardware}` },
    { head: 'Worst', share: 2, cell: ({ id }) => <Mark status={status.get(`anchor:${id}`) ?? null} /> },
  ]
  return <SheetColumns title="Anchors" rows={lines} columns={columns} most={MOST.anchors} />
}

function Mark({ status }: { readonly status: Parameters<typeof StatusMark>[0]['status'] | null }) {
  return status ? <StatusMark status={status} markOnly size={12} /> : null
}

function Bars({ answer: { schedule } }: OfAnswer) {
  const lines = markLines(schedule)
  const columns: readonly SheetColumn<(typeof lines)[number]>[] = [
    { head: 'Mark', share: 2, cell: ({ mark }) => mark },
    { head: 'Size', share: 2, cell: ({ typeAndSize }) => typeAndSize },
    { head: 'Bars', share: 2, isFigure: true, cell: ({ total }) => total },
    { head: 'Length', share: 3, isFigure: true, cell: ({ lengthMm }) => lengthMm ?? '–' },
    { head: 'kg', share: 2, isFigure: true, cell: ({ massKg }) => massText(massKg) },
    { head: 'Shape', share: 2, isFigure: true, cell: ({ code }) => code },
    { head: 'Dimensions', share: 6, cell: ({ dimensions }) => dimensions },
  ]
  return (
    <SheetColumns
      title={`Bars, ${massText(schedule.mass)} kg in all`}
      rows={lines}
      columns={columns}
      most={MOST.marks}
    />
  )
}

function Worst({ answer: { result } }: OfAnswer) {
  const kinds = worstKinds(result.zones)
  return (
    <View style={styles.part}>
      <Text kind="strong">Worst checks</Text>
      {kinds.length === 0 ? <Text kind="small">Every check is within its limit.</Text> : null}
      {kinds.slice(0, MOST.worst).map(({ status, name, place, words, isOnProposed }) => (
        <View key={`${status}-${name}`} style={styles.line}>
          <View style={styles.status}>
            <StatusMark status={status} kind="small" size={12} />
          </View>
          <Text kind="small" style={styles.grow} numberOfLines={2}>
            {`${name}, ${place}: ${words}${isOnProposed ? ` (${READING_NOT_ACCEPTED})` : ''}`}
          </Text>
        </View>
      ))}
      {kinds.length > MOST.worst ? <Text kind="small">{`and ${kinds.length - MOST.worst} more kinds`}</Text> : null}
    </View>
  )
}

/** The readings that the figures rest on and that nobody has accepted. */
function Readings({ answer: { result } }: OfAnswer) {
  const ids = result.zones.flatMap(({ checks }) =>
    checks.flatMap((check) => (check.kind === 'compared' && check.isOnProposed ? check.readingIds : [])),
  )
  const readings = [...new Set(ids)]
  if (readings.length === 0) return null
  const more = readings.length - MOST.readings
  return (
    <View style={styles.part}>
      <Text kind="strong">Readings not accepted</Text>
      {readings.slice(0, MOST.readings).map((id) => (
        <Text key={id} kind="small" numberOfLines={1}>
          {readingTitle(id)}
        </Text>
      ))}
      {more > 0 ? <Text kind="small">{`and ${more} more`}</Text> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  sheet: { gap: space.s, backgroundColor: colour.sheet },
  head: { gap: space.xs, borderBottomWidth: 1, borderColor: colour.ink, paddingBottom: space.xs },
  titles: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'baseline', gap: space.xl },
  facts: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l, rowGap: space.xs },
  columns: { flexDirection: 'row', gap: space.xl, alignItems: 'flex-start' },
  half: { flex: 1, minWidth: 0 },
  part: { gap: 1 },
  line: { flexDirection: 'row', gap: space.s, alignItems: 'flex-start' },
  status: { width: 110 },
  grow: { flex: 1, minWidth: 0 },
  foot: { borderTopWidth: 1, borderColor: colour.ink, paddingTop: space.xs },
})
