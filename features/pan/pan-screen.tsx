import { toEngine, type PanData, type PourData, type SteelZoneData } from '@wedgeline/contract'
import type { Check, LayoutIndex, ZoneResult } from '@wedgeline/engine'
import { gridReference, layoutIndex, slabBeyond } from '@wedgeline/engine/geometry'
import { useMemo, type ReactNode } from 'react'
import { ScrollView, StyleSheet, View } from 'react-native'
import { Screen } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { colour, space, useWide } from '@/components/theme'
import { countZones } from '../checks/counts'
import { StatusMarks } from '../checks/status-counts'
import { KINDS_OF_ZONE, type Place } from '../edge/sheet/steel-fields'
import { SteelList } from '../edge/sheet/steel-list'
import { ZoneChecks } from '../edge/sheet/zone-checks'
import { useJobDraft } from '../editing/job-draft'
import { usePourChecks, type PourChecks } from '../editing/pour-checks'
import { SaveState } from '../editing/save-state'
import { UndoButton } from '../editing/undo-button'
import { PanFields } from './pan-fields'
import { PanPlan } from './pan-plan'
import { PanSection } from './pan-section'
import { PAN_STEEL, usualPanSteel } from './pan-steel'
import { panView, tendonMark, type PanView } from './pan-view'

/** One stressing pan: plan and section at true scale, its checks, its bars and its numbers. */
export function PanScreen({ jobId, panId }: { readonly jobId: string; readonly panId: string }) {
  const { layout } = useJobDraft()
  const pan = layout.pans.find(({ id }) => id === panId)
  const pour = layout.pours.find(({ id }) => id === pan?.pourId)
  if (!pan || !pour) {
    return (
      <Screen title="Pan" parents={[{ label: layout.job.title, href: `/jobs/${jobId}` }]}>
        <Failed what="This pan is not in the job." advice="It may have been removed. Its pour lists the pans." />
      </Screen>
    )
  }
  return <OpenPan jobId={jobId} pan={pan} pour={pour} />
}

interface OpenPanProps {
  readonly jobId: string
  readonly pan: PanData
  readonly pour: PourData
}

function OpenPan({ jobId, pan, pour }: OpenPanProps) {
  const { layout } = useJobDraft()
  const isWide = useWide()
  const checks = usePourChecks(pour.id)
  const index = useMemo(() => layoutIndex(toEngine(layout)), [layout])
  const view = useMemo(() => panView(index, pan.id, isWide ? 'wide' : 'phone'), [index, pan.id, isWide])
  const results = useMemo(
    () => checks.result?.zones.filter(({ zone }) => zone.panId === pan.id) ?? [],
    [checks.result, pan.id],
  )
  const resultOf = (zoneId: string) => results.find(({ zone }) => zone.id === zoneId) ?? null
  const own = resultOf(`pan:${pan.id}`)
  const base = `/jobs/${jobId}/pours/${pour.id}` as const
  const drawings = <Drawings index={index} view={view} checks={own?.checks ?? []} />
  const parts = (
    <Parts {...{ jobId, pan, pour, view, own }} anchorResult={resultOf(`anchor:${view.place.at?.anchor.id}`)} />
  )
  return (
    <Screen
      title={`Pan ${pan.mark}`}
      fills={isWide}
      parents={[
        { label: layout.job.title, href: `/jobs/${jobId}` },
        { label: `Pour ${pour.mark}`, href: base },
      ]}
      summary={<Summary results={results} isStale={checks.isStale} />}
      actions={<Actions />}
    >
      <State checks={checks} />
      {isWide ? (
        <View style={styles.beside}>
          <View style={styles.drawings}>{drawings}</View>
          <ScrollView
            style={styles.pane}
            contentContainerStyle={styles.paneContent}
            tabIndex={0}
            role="region"
            aria-label="Checks, bars and numbers of the pan"
          >
            {parts}
          </ScrollView>
        </View>
      ) : (
        <View style={styles.stacked}>
          {drawings}
          {parts}
        </View>
      )}
    </Screen>
  )
}

function State({ checks: { failure, result } }: { readonly checks: PourChecks }) {
  if (failure) return <Failed what="The checks could not be worked out." advice={failure} />
  return result === null ? <Waiting what="the checks of this pan" /> : null
}

function Summary({ results, isStale }: { readonly results: readonly ZoneResult[]; readonly isStale: boolean }) {
  const isWide = useWide()
  return (
    <>
      <StatusMarks counts={countZones(results)} isShort={!isWide} />
      {isStale ? <Text tone="soft">working out …</Text> : null}
    </>
  )
}

function Actions() {
  const { canEdit } = useJobDraft()
  return (
    <>
      <SaveState />
      {canEdit ? <UndoButton /> : null}
    </>
  )
}

interface DrawingsProps {
  readonly index: LayoutIndex
  readonly view: PanView
  readonly checks: readonly Check[]
}

/** Plan and section one above the other at one scale, with what they show in a line. */
function Drawings({ index, view, checks }: DrawingsProps) {
  const { pan, jack } = view.place
  const tendon = tendonMark(index, view.place)
  const words = [
    tendon ? `Tendon ${tendon}` : 'No tendon ends here',
    gridReference(index.layout, pan),
    jack ? `jack ${jack.name}: ${jackWords(view)}` : 'no jack',
  ]
  return (
    <View style={styles.drawn}>
      <Text tone="soft">{words.filter(Boolean).join(' · ')}</Text>
      <View style={styles.sheet}>
        <PanPlan view={view} checks={checks} />
        <PanSection view={view} />
      </View>
      <Text kind="small" tone="soft">
        Plan and section through the tendon, one true scale, in mm, the jack to the right. Dashed behind it: stroke,
        strand tail and hand room.
      </Text>
    </View>
  )
}

function jackWords({ place: { jack }, needMm }: PanView): string {
  if (!jack) return ''
  const { closedLength, stroke, strandTail, handRoom } = jack
  return `${closedLength} closed + ${stroke} stroke + ${strandTail} tail + ${handRoom} hand = ${needMm ?? 0}`
}

interface PartsProps extends OpenPanProps {
  readonly view: PanView
  readonly own: ZoneResult | null
  readonly anchorResult: ZoneResult | null
}

function Parts({ jobId, pan, pour, view, own, anchorResult }: PartsProps) {
  const { layout } = useJobDraft()
  const { at, top, soffit } = view.place
  const place: Place = {
    pour,
    hardware: layout.hardware.find(({ id }) => id === at?.hardware.id) ?? null,
    depthMm: top - soffit,
    from: 0,
    to: 0,
    prismMm: pan.acrossMm,
    wedgeDepthMm: 0,
  }
  const round: SteelZoneData = { kind: 'pan', panId: pan.id }
  return (
    <>
      <Part title="Checks">
        <ZoneChecks jobId={jobId} result={own} />
      </Part>
      <Part title="Bars round the pan">
        <SteelList
          zone={round}
          zoneName={pan.mark}
          kinds={PAN_STEEL}
          place={place}
          likeZones={layout.pans
            .filter(({ id, pourId }) => pourId === pour.id && id !== pan.id)
            .map(({ id }) => ({ kind: 'pan', panId: id }))}
          likeWords="pans of the pour"
          usual={(kind) => usualPanSteel(kind, { pan, pour, toEdgeMm: slabBeyond(view.place) })}
        />
      </Part>
      {at ? (
        <>
          <Part title="Anchor in the pan">
            <ZoneChecks jobId={jobId} result={anchorResult} />
          </Part>
          <Part title="Bars behind its plate">
            <SteelList
              zone={{ kind: 'anchor', anchorId: at.anchor.id }}
              zoneName={`${pan.mark} anchor`}
              kinds={KINDS_OF_ZONE.anchor}
              place={place}
              likeZones={[]}
            />
          </Part>
        </>
      ) : null}
      <Part title="Numbers">
        <PanFields layout={layout} pan={pan} />
      </Part>
    </>
  )
}

function Part({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <View style={styles.part}>
      <Text kind="heading" level={2}>
        {title}
      </Text>
      {children}
    </View>
  )
}

const styles = StyleSheet.create({
  beside: { flex: 1, flexDirection: 'row', minHeight: 240, borderTopWidth: 1, borderColor: colour.ink },
  drawings: { flex: 1, minWidth: 0, padding: space.l, overflow: 'scroll' },
  drawn: { gap: space.s },
  sheet: { backgroundColor: colour.sheet, borderWidth: 1, borderColor: colour.rule },
  pane: { width: 480, flexGrow: 0, borderLeftWidth: 1, borderColor: colour.ink, backgroundColor: colour.sheet },
  paneContent: { padding: space.l, gap: space.xl },
  stacked: { gap: space.xl },
  part: { gap: space.s },
})
