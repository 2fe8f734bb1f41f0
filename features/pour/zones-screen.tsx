import { FAMILY_WORDS, STATUS_WORDS } from '@wedgeline/engine/result'
import type { PourResult } from '@wedgeline/engine'
import { useLocalSearchParams } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space, useWide } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Empty, Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { readingTitle } from '../checks/zone-words'
import { useJobDraft } from '../editing/job-draft'
import { usePourChecks } from '../editing/pour-checks'
import { CountLinks } from './count-links'
import { PourFrame } from './pour-frame'
import { ZoneChecks } from './zone-checks'
import { askedStatus, notYetByFamily, waitingReadings, zoneRows } from './zone-rows'

/** Zones drawn at once; a pour may have thousands. */
const PAGE = 60

/** Every check of a pour by zone, worst first, narrowed to one status by the address. */
export function PourZonesScreen({ jobId, pourId }: { readonly jobId: string; readonly pourId: string }) {
  const { result, failure } = usePourChecks(pourId)
  return (
    <PourFrame pourId={pourId} page="zones">
      {() => {
        if (failure !== null) return <Failed what="The checks of this pour could not be made." advice={failure} />
        if (!result) return <Waiting what="the checks of this pour" />
        return <Zones jobId={jobId} pourId={pourId} result={result} />
      }}
    </PourFrame>
  )
}

interface ZonesProps {
  readonly jobId: string
  readonly pourId: string
  readonly result: PourResult
}

function Zones({ jobId, pourId, result }: ZonesProps) {
  const { status } = useLocalSearchParams<{ status?: string }>()
  const asked = askedStatus(status)
  const [pages, setPages] = useState(1)
  const rows = zoneRows(result, asked)
  const shown = rows.slice(0, pages * PAGE)
  const hasChecks = result.zones.some(({ checks }) => checks.length > 0)
  return (
    <>
      <CountLinks jobId={jobId} pourId={pourId} counts={result.counts} chosen={asked} />
      <Waits jobId={jobId} result={result} />
      <NotYet result={result} />
      {hasChecks ? null : (
        <Empty
          what="Nothing is checked in this pour yet."
          firstStep="Put anchors on one of its edges; every check follows by itself."
          action={<Button kind="main" label="To the plan" href={`/jobs/${jobId}/pours/${pourId}`} />}
        />
      )}
      {hasChecks && rows.length === 0 && asked ? (
        <Text>{`No check of this pour is ${STATUS_WORDS[asked]}.`}</Text>
      ) : null}
      <View style={styles.zones}>
        {shown.map((row) => (
          <ZoneChecks key={row.result.zone.id} jobId={jobId} row={row} isNarrowed={asked !== null} />
        ))}
      </View>
      {rows.length > shown.length ? (
        <View style={styles.row}>
          <Button label={`Show more of ${rows.length} zones`} onPress={() => setPages(pages + 1)} />
        </View>
      ) : null}
    </>
  )
}

function Waits({ jobId, result }: { readonly jobId: string; readonly result: PourResult }) {
  const { layout } = useJobDraft()
  const isWide = useWide()
  const readings = waitingReadings(result, new Set(layout.job.readings.map(({ readingId }) => readingId)))
  if (readings.length === 0) return null
  const count = readings.length === 1 ? 'One reading waits' : `${readings.length} readings wait`
  const list = readings.map(
    ({ readingId, checks }) => `${readingTitle(readingId)} (${checks} ${checks === 1 ? 'check' : 'checks'})`,
  )
  return (
    <Banner
      // The job's page has them all with their text; a phone has no room to say them twice.
      words={isWide ? `${count} for an engineer to accept: ${list.join('; ')}.` : `${count} for an engineer to accept.`}
      actions={<Button label="Readings of this job" href={`/jobs/${jobId}`} />}
    />
  )
}

function NotYet({ result }: { readonly result: PourResult }) {
  const families = notYetByFamily(result)
  if (families.length === 0) return null
  const list = families.map(
    ({ family, zones }) => `${FAMILY_WORDS[family]} (${zones} ${zones === 1 ? 'zone' : 'zones'})`,
  )
  return <Text tone="soft">{`Not yet checked in this pour: ${list.join(', ')}.`}</Text>
}

const styles = StyleSheet.create({
  zones: { gap: space.xl },
  row: { flexDirection: 'row' },
})
