import type { PourData } from '@wedgeline/contract'
import { BASIS_SOURCES } from '@wedgeline/engine/bases'
import type { PourResult, ZoneResult } from '@wedgeline/engine'
import { useMemo } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Link } from '@/components/ui/link'
import { Screen } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { StatusMark } from '@/components/ui/status-mark'
import { Text } from '@/components/ui/text'
import { notYetText } from '../checks/words'
import { calculationPathOf, pathOfZone, readingTitle } from '../checks/zone-words'
import { useJobDraft } from '../editing/job-draft'
import { usePourChecks } from '../editing/pour-checks'
import { jobParents } from '../pour/pour-frame'
import { CheckSheet } from './check-sheet'
import { printPage } from './print-page'
import { shownSteps } from './shown-steps'
import { zonePlace, type ZonePlace } from './zone-places'
import { LIMIT_LETTERS, ZonePrint } from './zone-print'

/** One zone's checks with every line, as they go on one side of A4. */
export function CalculationScreen({ jobId, zoneId }: { readonly jobId: string; readonly zoneId: string }) {
  const job = useJobDraft()
  const { layout } = job
  const place = useMemo(() => zonePlace(layout, decoded(zoneId)), [layout, zoneId])
  const pour = layout.pours.find(({ id }) => id === place?.zone.pourId)
  if (!place || !pour) {
    return (
      <Screen title="Calculation" parents={jobParents(job)}>
        <Failed
          what="This zone is not in the job."
          advice="Its anchors may have been moved or removed. Go to the pour and pick another zone."
        />
      </Screen>
    )
  }
  const base = `/jobs/${jobId}/pours/${pour.id}` as const
  const path = pathOfZone(jobId, place.zone)
  return (
    <Screen
      title={`Calculation, ${place.zone.name}`}
      parents={[
        ...jobParents(job),
        { label: `Pour ${pour.mark}`, href: base },
        { label: 'Zones', href: `${base}/zones` },
      ]}
      actions={
        <View style={styles.actions} dataSet={{ print: 'no' }}>
          <Neighbours jobId={jobId} place={place} />
          {path ? <Button label={path.words} href={path.path} /> : null}
          <Button label="Print" icon={<Icon name="print" />} onPress={printPage} />
        </View>
      }
    >
      <Sheet place={place} pour={pour} />
    </Screen>
  )
}

/** The route gives the id decoded or as it stood in the address, depending on how the page was reached. */
function decoded(zoneId: string): string {
  try {
    return decodeURIComponent(zoneId)
  } catch {
    return zoneId
  }
}

function Neighbours({ jobId, place: { previous, next } }: { readonly jobId: string; readonly place: ZonePlace }) {
  return (
    <>
      {previous ? (
        <Button label={previous.name} icon={<Icon name="back" />} href={calculationPathOf(jobId, previous.id)} />
      ) : null}
      {next ? (
        <Button label={next.name} icon={<Icon name="forward" />} href={calculationPathOf(jobId, next.id)} />
      ) : null}
    </>
  )
}

function Sheet({ place, pour }: { readonly place: ZonePlace; readonly pour: PourData }) {
  const { result, failure } = usePourChecks(pour.id)
  if (failure !== null) {
    return <Failed what="The checks of this pour could not be made." advice={failure} />
  }
  if (!result) return <Waiting what="the checks of this pour" />
  const zone = result.zones.find((candidate) => candidate.zone.id === place.zone.id)
  if (!zone) return <Failed what="This zone has no result." advice="Open the pour's zones and pick it again." />
  return <ZoneSheet zone={zone} pour={pour} basis={result.basis} />
}

interface ZoneSheetProps {
  readonly zone: ZoneResult
  readonly pour: PourData
  readonly basis: PourResult['basis']
}

function ZoneSheet({ zone, pour, basis }: ZoneSheetProps) {
  const missing = notYetText(zone.notYetChecked)
  const steps = useMemo(() => shownSteps(zone.checks), [zone.checks])
  const facts = useFacts({ pour, basis })
  const readings = useReadings(zone)
  return (
    <>
      <View style={styles.sheet}>
        <SheetHead zone={zone} facts={facts} readings={readings} />
        {zone.checks.length === 0 ? <Text style={styles.none}>No check is made at this zone yet.</Text> : null}
        {zone.checks.map((check, at) => (
          <CheckSheet
            key={`${check.family}-${check.name}-${check.stage ?? ''}-${at}`}
            check={check}
            steps={steps[at] ?? []}
          />
        ))}
        <View style={styles.foot}>
          {missing ? <Text kind="strong">{missing}</Text> : null}
          {FOOT.map((line) => (
            <Text key={line} kind="small">
              {line}
            </Text>
          ))}
        </View>
      </View>
      <ZonePrint
        zone={zone}
        facts={facts}
        readings={readings.map(({ words }) => words)}
        foot={missing ? [missing, ...FOOT] : FOOT}
      />
    </>
  )
}

const FOOT = [
  `Lengths in mm, forces in N, stresses in MPa, angles in rad, as they are put into the formulas. ${LIMIT_LETTERS}.`,
  'Results assist a qualified engineer and do not replace one. Local codes and licensed practice govern.',
]

type Facts = readonly (readonly [string, string])[]

function useFacts({ pour, basis }: Pick<ZoneSheetProps, 'pour' | 'basis'>): Facts {
  const { layout } = useJobDraft()
  const { job } = layout
  const level = layout.levels.find(({ id }) => id === pour.levelId)
  const day = new Intl.DateTimeFormat('en-GB', { timeZone: job.timeZone, dateStyle: 'long' }).format(new Date())
  const title = BASIS_SOURCES.find(({ id }) => id === basis)?.title ?? basis
  return [
    ['Job', `${job.number} ${job.title}`],
    ['Pour', [pour.mark, pour.title, level ? `level ${level.mark}` : ''].filter(Boolean).join(', ')],
    ['Slab', `${pour.thicknessMm} mm, ${pour.concrete}`],
    ['Basis', title],
    ['Date', day],
    ['State', 'draft, not approved'],
  ]
}

interface ReadingLine {
  readonly words: string
  readonly isAccepted: boolean
}

/** The readings that a zone's results rest on. */
function useReadings({ checks }: ZoneResult): readonly ReadingLine[] {
  const { job } = useJobDraft().layout
  const ids = new Set(checks.flatMap((check) => (check.kind === 'compared' ? check.readingIds : [])))
  return [...ids].map((id) => {
    const accepted = job.readings.find(({ readingId }) => readingId === id)
    const state = accepted ? `Accepted by ${accepted.acceptedBy}.` : 'Not accepted yet.'
    return { words: `Reading: ${readingTitle(id)}. ${state}`, isAccepted: accepted !== undefined }
  })
}

interface SheetHeadProps {
  readonly zone: ZoneResult
  readonly facts: Facts
  readonly readings: readonly ReadingLine[]
}

function SheetHead({ zone, facts, readings }: SheetHeadProps) {
  const { jobId } = useJobDraft()
  return (
    <View style={styles.head}>
      <View style={styles.facts}>
        {facts.map(([name, value]) => (
          <View key={name} style={styles.fact}>
            <Text kind="small" tone="soft">
              {name}
            </Text>
            <Text>{value}</Text>
          </View>
        ))}
      </View>
      {zone.status ? <StatusMark status={zone.status} kind="strong" /> : null}
      {readings.map(({ words, isAccepted }) => (
        <View key={words} style={styles.reading}>
          <Text kind="small" style={styles.grow}>
            {words}
          </Text>
          {isAccepted ? null : (
            <Link kind="small" href={`/jobs/${jobId}`}>
              Readings of this job
            </Link>
          )}
        </View>
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s, flexShrink: 1 },
  sheet: {
    width: '100%',
    maxWidth: 1000,
    backgroundColor: colour.sheet,
    borderWidth: 1,
    borderColor: colour.rule,
    padding: space.l,
  },
  head: { gap: space.xs, paddingBottom: space.m },
  facts: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.xl, rowGap: space.xs },
  fact: { minWidth: 120, flexShrink: 1 },
  reading: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.m },
  grow: { flexShrink: 1 },
  none: { paddingVertical: space.l },
  foot: { gap: space.xs, paddingTop: space.m, borderTopWidth: 1, borderColor: colour.ink },
})
