import { toEngine, type EdgeData } from '@wedgeline/contract'
import type { LayoutIndex, ZoneResult } from '@wedgeline/engine'
import { layoutIndex } from '@wedgeline/engine/geometry'
import { router, useLocalSearchParams } from 'expo-router'
import { useCallback, useMemo, useState, type ReactNode } from 'react'
import { ScrollView, StyleSheet, View } from 'react-native'
import { v7 as newId } from 'uuid'
import { BottomSheet } from '@/components/ui/bottom-sheet'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Screen } from '@/components/ui/screen'
import { Empty, Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { colour, space, useWide } from '@/components/theme'
import { countZones } from '../checks/counts'
import { StatusMarks } from '../checks/status-counts'
import { useCompanyRoles } from '../company/company-roles'
import { useJobDraft } from '../editing/job-draft'
import { usePourChecks } from '../editing/pour-checks'
import { SaveState } from '../editing/save-state'
import { UndoButton } from '../editing/undo-button'
import { ProposalDialog } from '../proposal/proposal-dialog'
import { UnfiledNotice } from '../quick-edge/unfiled-notice'
import { insertAnchors, removeAnchors } from './anchor-commands'
import { PhoneAnchors, SheetBar } from './phone-anchors'
import { readPasted, type Pasted } from './paste'
import { PasteDialog } from './paste-dialog'
import { sheetTitle, ZoneSheet } from './sheet/zone-sheet'
import { EdgeStrip } from './strip/edge-strip'
import { stripData, type StripData } from './strip/strip-data'
import { compass } from './strip/view-words'
import { anchorRows } from './table/anchor-rows'
import { AnchorTable } from './table/anchor-table'

/** One edge: its strip, its anchors, and the sheet of what is picked. */
export function EdgeScreen({ jobId, edgeId }: { readonly jobId: string; readonly edgeId: string }) {
  const { layout } = useJobDraft()
  const edge = layout.edges.find(({ id }) => id === edgeId)
  if (!edge) {
    return (
      <Screen title="Edge" parents={[{ label: layout.job.title, href: `/jobs/${jobId}` }]}>
        <Failed what="This edge is not in the job." advice="It may have been removed. The job lists its edges." />
      </Screen>
    )
  }
  return <OpenEdge jobId={jobId} edge={edge} />
}

function OpenEdge({ jobId, edge }: { readonly jobId: string; readonly edge: EdgeData }) {
  const { zone: selected = null } = useLocalSearchParams<{ zone?: string }>()
  const { layout, companyId, edit, canEdit } = useJobDraft()
  const isAdmin = useCompanyRoles(companyId).includes('admin')
  const isWide = useWide()
  const [isPasting, setPasting] = useState(false)
  const [isProposing, setProposing] = useState(false)
  const checks = usePourChecks(edge.pourId)
  const index = useMemo(() => layoutIndex(toEngine(layout)), [layout])
  const data = useMemo(() => stripData(index, edge.id), [index, edge.id])
  const results = useMemo(() => resultsOf(checks.result?.zones ?? [], data), [checks.result, data])
  const rows = useMemo(() => anchorRows({ layout, edge, results }), [layout, edge, results])
  const select = useCallback((zone: string | null) => router.setParams({ zone: zone ?? '' }), [])
  const put = useCallback(
    ({ anchors }: Pasted) => edit(insertAnchors({ layout, edge, newId: () => newId() }, anchors)),
    [edit, layout, edge],
  )
  const insertText = (text: string): string | null => {
    const pasted = readPasted(text, { hardware: layout.hardware })
    const [problem] = pasted.problems
    if (problem) return problem.message
    if (pasted.anchors.length > 0) put(pasted)
    return null
  }
  const pour = layout.pours.find(({ id }) => id === edge.pourId)
  const zone = selected === '' ? null : selected
  const missing = whatIsMissing(layout)
  // Without hardware or a strand type nothing can be typed: the notice above says what comes first.
  const canType = canEdit && missing === null
  const strip = (
    <EdgeStrip index={index} data={data} results={results} selected={zone} onSelect={select} isTableOpen={isWide} />
  )
  const sheet = zone ? (
    <ZoneSheet
      key={zone}
      {...{ edge, index, data, zoneId: zone, result: results.get(zone) ?? null }}
      onClose={() => select(null)}
    />
  ) : null
  return (
    <Screen
      title={`Edge ${edge.mark}, ${compass(outward(index, edge.id))}`}
      fills={isWide}
      parents={[
        { label: layout.job.title, href: `/jobs/${jobId}` },
        { label: `Pour ${pour?.mark ?? ''}`, href: `/jobs/${jobId}/pours/${edge.pourId}` },
      ]}
      summary={<Summary results={results} isStale={checks.isStale} />}
      actions={
        <Actions
          edgeId={edge.id}
          canType={canType}
          onPaste={() => setPasting(true)}
          onPropose={() => setProposing(true)}
          onSelect={select}
        />
      }
    >
      <UnfiledNotice />
      {missing ? (
        <View style={styles.missing}>
          <Empty
            {...missing}
            action={isAdmin ? <Button kind="main" label="Enter it" href={`/companies/${companyId}/hardware`} /> : null}
          />
        </View>
      ) : null}
      {checks.failure ? (
        <Failed what="The checks could not be worked out." advice={checks.failure} />
      ) : checks.result === null ? (
        <Waiting what="the checks of this edge" />
      ) : null}
      {strip}
      {isWide ? (
        <View style={styles.below}>
          <View style={styles.table}>
            <AnchorTable
              {...{ layout, edge, rows, selected: zone }}
              canEdit={canType}
              onSelect={select}
              onEdit={edit}
              onInsert={insertText}
              onRemove={(ids) => edit(removeAnchors(layout, ids))}
            />
          </View>
          <SheetPane {...{ edge, index, data }} zoneId={zone}>
            {sheet}
          </SheetPane>
        </View>
      ) : (
        <PhoneAnchors {...{ rows, zone }} canEdit={canType} onSelect={select} onInsert={insertText} />
      )}
      {!isWide && zone ? (
        <BottomSheet
          {...sheetTitle({ edge, index, data, zoneId: zone })}
          isOpen
          onClose={() => select(null)}
          bar={<SheetBar rows={rows} zone={zone} onSelect={select} />}
        >
          {sheet}
        </BottomSheet>
      ) : null}
      {isProposing ? (
        <ProposalDialog
          pourId={edge.pourId}
          zoneIds={[...results.keys()]}
          what={`edge ${edge.mark}`}
          onClose={() => setProposing(false)}
        />
      ) : null}
      <PasteDialog
        isOpen={isPasting}
        context={{ hardware: layout.hardware }}
        onClose={() => setPasting(false)}
        onPaste={put}
      />
    </Screen>
  )
}

/** How many zones of the edge stand at each status, and whether that is being worked out again. */
function Summary({
  results,
  isStale,
}: {
  readonly results: ReadonlyMap<string, ZoneResult>
  readonly isStale: boolean
}) {
  const isWide = useWide()
  return (
    <>
      <StatusMarks counts={countZones([...results.values()])} isShort={!isWide} />
      {isStale ? <Text tone="soft">working out …</Text> : null}
    </>
  )
}

/** Saving, undo, and what is entered for the whole edge. */
function Actions(props: {
  readonly edgeId: string
  readonly canType: boolean
  readonly onPaste: () => void
  readonly onPropose: () => void
  readonly onSelect: (zoneId: string) => void
}) {
  const { canEdit } = useJobDraft()
  const isWide = useWide()
  return (
    <>
      <SaveState />
      {canEdit ? (
        <>
          <UndoButton />
          <Button
            label="Paste anchors"
            icon={<Icon name="paste" />}
            iconOnly={!isWide}
            disabled={!props.canType}
            onPress={props.onPaste}
          />
          <Button label="Propose bars" disabled={!props.canType} onPress={props.onPropose} />
        </>
      ) : null}
      <Button label="Edge bars" onPress={() => props.onSelect(`edge:${props.edgeId}`)} />
    </>
  )
}

const outward = (index: LayoutIndex, edgeId: string) => {
  const frame = index.frames.get(edgeId)
  return frame ? { x: -frame.inward.x, y: -frame.inward.y } : { x: 0, y: 1 }
}

/** Results of the edge's own zones, and of the anchors in pans that face it. */
function resultsOf(zones: readonly ZoneResult[], data: StripData): ReadonlyMap<string, ZoneResult> {
  const inPans = new Set(data.ends.filter(({ isInPan }) => isInPan).map(({ id }) => `anchor:${id}`))
  const own = zones.filter(({ zone }) => zone.edgeId === data.frame.edgeId || inPans.has(zone.id))
  return new Map(own.map((each) => [each.zone.id, each]))
}

/** Without hardware or a strand type no anchor can be entered: says which, and where to enter it. */
function whatIsMissing({
  hardware,
  strandTypes,
}: {
  readonly hardware: readonly unknown[]
  readonly strandTypes: readonly unknown[]
}) {
  if (hardware.length > 0 && strandTypes.length > 0) return null
  const what = hardware.length === 0 ? 'hardware' : 'strand type'
  return {
    what: `The company has no ${what} yet.`,
    firstStep: `An admin enters ${what} under Hardware in the menu at the top; then anchors can be typed here.`,
  }
}

/** Beside the table on a wide screen: the picked zone's sheet, or how to begin. */
function SheetPane(props: {
  readonly edge: EdgeData
  readonly index: LayoutIndex
  readonly data: StripData
  readonly zoneId: string | null
  readonly children: ReactNode
}) {
  const { zoneId, children } = props
  if (zoneId === null) {
    return (
      <View style={styles.pane}>
        <Text tone="soft" style={styles.paneHint}>
          Pick an anchor or a gap, on the strip or in the table, to see its checks and bars.
        </Text>
      </View>
    )
  }
  const { title, detail } = sheetTitle({ ...props, zoneId })
  return (
    <ScrollView
      style={styles.pane}
      contentContainerStyle={styles.paneContent}
      tabIndex={0}
      role="region"
      aria-label={title}
    >
      <View style={styles.paneHead}>
        <Text kind="title" level={2}>
          {title}
        </Text>
        <Text tone="soft">{detail}</Text>
      </View>
      {children}
    </ScrollView>
  )
}

const styles = StyleSheet.create({
  missing: { paddingHorizontal: space.l },
  below: { flex: 1, flexDirection: 'row', minHeight: 240, borderTopWidth: 1, borderColor: colour.ink },
  table: { flex: 1, minWidth: 0, backgroundColor: colour.paper },
  pane: { width: 480, flexGrow: 0, borderLeftWidth: 1, borderColor: colour.ink, backgroundColor: colour.sheet },
  paneHint: { padding: space.l },
  paneHead: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    columnGap: space.m,
  },
  paneContent: { padding: space.l, gap: space.m },
})
