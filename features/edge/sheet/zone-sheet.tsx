import type { EdgeData, SteelZoneData } from '@wedgeline/contract'
import type { LayoutIndex, ZoneResult } from '@wedgeline/engine'
import { edgeAnchorMark, gridReference } from '@wedgeline/engine/geometry'
import { useMemo, useState, type ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'
import { Button } from '@/components/ui/button'
import { Text } from '@/components/ui/text'
import { space, useWide } from '@/components/theme'
import { useJobDraft } from '../../editing/job-draft'
import { ProposalDialog } from '../../proposal/proposal-dialog'
import { removeAnchors } from '../anchor-commands'
import type { StripData } from '../strip/strip-data'
import { AnchorDrawing } from './anchor-drawing'
import { AnchorFields, Mends } from './anchor-fields'
import { KINDS_OF_ZONE, type Place } from './steel-fields'
import { SteelList } from './steel-list'
import { ZoneChecks } from './zone-checks'

export interface ZoneSheetProps {
  readonly edge: EdgeData
  readonly index: LayoutIndex
  readonly data: StripData
  readonly zoneId: string
  readonly result: ZoneResult | null
  readonly onClose: () => void
}

export interface SheetTitle {
  readonly title: string
  readonly detail: string
}

/** What a sheet is headed with: E6-03, live end; A + 1800, 62 above soffit, 158 below top. */
export function sheetTitle({
  edge,
  index,
  data,
  zoneId,
}: Pick<ZoneSheetProps, 'edge' | 'index' | 'data' | 'zoneId'>): SheetTitle {
  const end = data.ends.find(({ id }) => `anchor:${id}` === zoneId)
  if (end) {
    const { frame } = data
    const above = end.heightAbove - frame.soffitAt(end.chainage)
    const below = frame.topAt(end.chainage) - end.heightAbove
    const place =
      gridReference(index.layout, frame.pointAt(end.chainage, end.setBack)) || `${end.chainage} along the edge`
    return { title: `${end.mark}, ${end.end} end`, detail: `${place}, ${above} above soffit, ${below} below top` }
  }
  const wedge = data.wedges.find((each) => each.zoneId === zoneId)
  if (wedge) {
    const { depth, area } = wedge
    const detail = `edge wedge ${depth.toFixed(0)} mm deep, area ${(area / 1e6).toFixed(3)} m²`
    return { title: `Gap of ${edge.mark}`, detail }
  }
  return { title: `Edge ${edge.mark}`, detail: 'bars along the whole edge' }
}

/** One zone's numbers, checks and bars. */
export function ZoneSheet(props: ZoneSheetProps) {
  const { edge, index, data, zoneId, result, onClose } = props
  const { layout, jobId, canEdit, edit } = useJobDraft()
  const isWide = useWide()
  const [isProposing, setProposing] = useState(false)
  const anchor = layout.anchors.find(({ id }) => `anchor:${id}` === zoneId) ?? null
  const zone = useMemo(() => steelZoneOf(edge.id, zoneId), [edge.id, zoneId])
  const pour = layout.pours.find(({ id }) => id === edge.pourId)
  if (!pour || !zone) return null
  const hardware = layout.hardware.find(({ id }) => id === anchor?.hardwareId) ?? null
  const wedge = data.wedges.find((each) => each.zoneId === zoneId)
  const place: Place = {
    pour,
    hardware,
    depthMm: anchor ? data.frame.topAt(anchor.chainageMm) - data.frame.soffitAt(anchor.chainageMm) : pour.thicknessMm,
    from: result?.zone.from ?? data.frame.from,
    to: result?.zone.to ?? data.frame.to,
    prismMm: anchor ? prismOf(data, anchor.chainageMm) : 0,
    wedgeDepthMm: wedge?.depth ?? 0,
  }
  const name = anchor ? edgeAnchorMark(edge, anchor) : sheetTitle(props).title
  const likeZones = zone.kind === 'anchor' ? otherLiveAnchors(layout.anchors, edge.id, zone.anchorId) : []
  const numbers = anchor ? (
    <AnchorFields
      anchor={anchor}
      hardware={hardware}
      mark={name}
      result={result}
      hasNotes={!isWide}
      tendon={layout.tendons.find(({ id }) => id === anchor.tendonId) ?? null}
    />
  ) : null
  return (
    <View style={styles.sheet}>
      {anchor ? <AnchorDrawing index={index} anchorId={anchor.id} bars={data.bars} /> : null}
      {isWide ? null : numbers}
      {anchor && isWide ? <Mends anchor={anchor} mark={name} result={result} /> : null}
      <Part title="Checks">
        <ZoneChecks jobId={jobId} result={result} />
      </Part>
      <Part title="Bars">
        <SteelList
          zone={zone}
          zoneName={name}
          kinds={KINDS_OF_ZONE[zone.kind === 'anchor' ? 'anchor' : zone.kind === 'gap' ? 'gap' : 'edge']}
          place={place}
          likeZones={likeZones}
        />
        {canEdit ? <Button label={`Propose bars for ${name}`} onPress={() => setProposing(true)} /> : null}
      </Part>
      {isProposing ? (
        <ProposalDialog pourId={edge.pourId} zoneIds={[zoneId]} what={name} onClose={() => setProposing(false)} />
      ) : null}
      {isWide && numbers ? <Part title="Numbers">{numbers}</Part> : null}
      {anchor && canEdit ? (
        <Button
          kind="quiet"
          label={`Remove ${name}`}
          onPress={() => {
            edit(removeAnchors(layout, [anchor.id]))
            onClose()
          }}
        />
      ) : null}
    </View>
  )
}

function Part({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <View style={styles.part}>
      <Text kind="heading" level={3}>
        {title}
      </Text>
      {children}
    </View>
  )
}

/** The zone that bars entered on a sheet belong to. */
export function steelZoneOf(edgeId: string, zoneId: string): SteelZoneData | null {
  if (zoneId.startsWith('anchor:')) return { kind: 'anchor', anchorId: zoneId.slice('anchor:'.length) }
  if (zoneId.startsWith('edge:')) return { kind: 'edge', edgeId }
  const [kind, , after, before] = zoneId.split(':')
  if (kind !== 'gap' || !after || !before) return null
  return {
    kind: 'gap',
    edgeId,
    afterAnchorId: after === 'start' ? null : after,
    beforeAnchorId: before === 'end' ? null : before,
  }
}

const otherLiveAnchors = (
  anchors: readonly { readonly id: string; readonly edgeId: string | null; readonly end: string }[],
  edgeId: string,
  anchorId: string,
): readonly SteelZoneData[] =>
  anchors
    .filter((each) => each.edgeId === edgeId && each.end === 'live' && each.id !== anchorId)
    .map(({ id }) => ({ kind: 'anchor', anchorId: id }))

/** Twice the nearer half-gap or distance to the end of the edge: where transverse bars are usually placed. */
function prismOf(data: StripData, chainage: number): number {
  const others = data.ends
    .filter((end) => end.chainage !== chainage)
    .map((end) => Math.abs(end.chainage - chainage) / 2)
  return 2 * Math.min(chainage - data.frame.from, data.frame.to - chainage, ...others)
}

const styles = StyleSheet.create({ sheet: { gap: space.l }, part: { gap: space.s } })
