import { toEngine } from '@wedgeline/contract'
import { layoutIndex, zonesOfPour } from '@wedgeline/engine/geometry'
import { FAMILY_WORDS } from '@wedgeline/engine/result'
import type { Schedule } from '@wedgeline/engine'
import { useMemo } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Link } from '@/components/ui/link'
import { Section } from '@/components/ui/screen'
import { Empty, Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { failureOf } from '@/lib/failure'
import { pathOfZone, type ZonePath } from '../checks/zone-words'
import { useJobDraft } from '../editing/job-draft'
import { PourFrame } from '../pour/pour-frame'
import { problemLines, type ProblemLine } from './schedule-words'
import { DeliveriesTable, KindsTable, ScheduleTables, TotalsTable } from './schedule-table'
import { DeliveriesSection } from './deliveries-section'
import { useSchedule, useWorkbookExport } from './use-schedule'

/** The bar schedule of a pour, and its workbook. */
export function ScheduleScreen({ jobId, pourId }: { readonly jobId: string; readonly pourId: string }) {
  const { roles, save } = useJobDraft()
  const schedule = useSchedule(pourId)
  const workbook = useWorkbookExport(pourId)
  const mayExport = roles.some((role) => role === 'drafter' || role === 'detailer' || role === 'engineer')
  const errors = schedule.data?.problems.filter(({ severity }) => severity === 'error').length ?? 0
  return (
    <PourFrame
      pourId={pourId}
      page="schedule"
      actions={
        mayExport ? (
          <Button
            kind="main"
            label="Export workbook"
            icon={<Icon name="download" colour={errors > 0 || workbook.isBusy ? colour.soft : colour.onRust} />}
            busy={workbook.isBusy}
            disabled={!schedule.data || errors > 0}
            onPress={workbook.start}
          />
        ) : null
      }
    >
      {() => (
        <>
          <Banner tone="near" words="DRAFT: not for construction. No engineer has approved this pour." />
          {workbook.problem ? <Banner tone="over" words={workbook.problem} isUrgent /> : null}
          {workbook.file ? <Written {...workbook.file} /> : null}
          {schedule.data ? (
            <ScheduleParts jobId={jobId} pourId={pourId} schedule={schedule.data} />
          ) : schedule.error ? (
            <Failed
              what="The schedule could not be had."
              advice={failureOf(schedule.error).sentence}
              onRetry={() => void schedule.refetch()}
            />
          ) : (
            <Waiting what={save === 'saved' ? 'the bar schedule' : 'the bar schedule, once the last edits are saved'} />
          )}
        </>
      )}
    </PourFrame>
  )
}

function Written({ fileId, name }: { readonly fileId: string; readonly name: string }) {
  return (
    <Banner
      words={`${name} is written.`}
      actions={<Button label="Download it again" fileHref={`/exports/${fileId}`} />}
    />
  )
}

interface PartsProps {
  readonly jobId: string
  readonly pourId: string
  readonly schedule: Schedule
}

function ScheduleParts({ jobId, pourId, schedule }: PartsProps) {
  if (schedule.rows.length === 0) {
    return (
      <Empty
        what="This pour has no bars yet."
        firstStep="Give an anchor or an edge its steel; every set of bars becomes a mark here."
        action={<Button kind="main" label="To the plan" href={`/jobs/${jobId}/pours/${pourId}`} />}
      />
    )
  }
  return (
    <>
      <Problems jobId={jobId} pourId={pourId} schedule={schedule} />
      <Section title="Bar marks">
        <ScheduleTables schedule={schedule} />
      </Section>
      <Totals schedule={schedule} />
      {schedule.chances.length > 0 ? (
        <Section title="Bars that could take one length">
          {schedule.chances.map((chance) => (
            <Text key={chance}>{chance}</Text>
          ))}
        </Section>
      ) : null}
      <DeliveriesSection pourId={pourId} />
      <Section title="Notes">
        <Text>{`Shapes, dimensions and lengths follow ${schedule.edition}; reinforcement ${schedule.grade}.`}</Text>
        {rowNotes(schedule).map((note) => (
          <Text key={note}>{note}</Text>
        ))}
        {schedule.notes.map((note) => (
          <Text key={note} tone="soft">
            {note}
          </Text>
        ))}
        {schedule.notYetChecked.length > 0 ? (
          <Text kind="strong">
            {`Not yet checked in this pour: ${schedule.notYetChecked.map((family) => FAMILY_WORDS[family]).join(', ')}.`}
          </Text>
        ) : null}
        <Text tone="soft">
          Results assist a qualified engineer and do not replace one. Local codes and licensed practice govern.
        </Text>
      </Section>
    </>
  )
}

function Totals({ schedule }: { readonly schedule: Schedule }) {
  const { longest } = schedule
  return (
    <View style={styles.halves}>
      <View style={styles.half}>
        <Section title="Totals">
          <TotalsTable schedule={schedule} />
          {longest ? <Text>{`Longest bar: ${longest.length} mm, mark ${longest.mark}.`}</Text> : null}
        </Section>
      </View>
      <View style={styles.half}>
        <Section title="By kind of bar">
          <KindsTable schedule={schedule} />
        </Section>
      </View>
      {schedule.deliveries.length > 0 ? (
        <View style={styles.half}>
          <Section title="By delivery">
            <DeliveriesTable schedule={schedule} />
          </Section>
        </View>
      ) : null}
    </View>
  )
}

function Problems({ jobId, pourId, schedule }: PartsProps) {
  const { layout } = useJobDraft()
  const { lines, edgeOf } = useMemo(() => {
    const index = layoutIndex(toEngine(layout))
    const zones = zonesOfPour(index, pourId)
    return {
      lines: problemLines(schedule, index, new Map(zones.map(({ id, name }) => [name, id]))),
      edgeOf: new Map(zones.map((zone) => [zone.id, pathOfZone(jobId, zone)?.path ?? null])),
    }
  }, [layout, schedule, pourId, jobId])
  if (lines.length === 0) return null
  const errors = lines.filter(({ severity }) => severity === 'error')
  const warnings = lines.filter(({ severity }) => severity === 'warning')
  const list = (some: readonly ProblemLine[]) =>
    some.map((line, at) => (
      <Problem key={at} line={line} href={line.zoneId === null ? null : (edgeOf.get(line.zoneId) ?? null)} />
    ))
  return (
    <>
      {errors.length > 0 ? <Section title="What keeps the workbook from being written">{list(errors)}</Section> : null}
      {warnings.length > 0 ? <Section title="To look at before issue">{list(warnings)}</Section> : null}
    </>
  )
}

interface ProblemProps {
  readonly line: ProblemLine
  readonly href: ZonePath['path'] | null
}

function Problem({ line: { severity, about, message }, href }: ProblemProps) {
  return (
    <View style={styles.problem}>
      <Icon name={severity === 'error' ? 'over' : 'near'} colour={severity === 'error' ? colour.over : colour.near} />
      <View style={styles.words}>
        <Text kind="strong">{about}</Text>
        <Text>{message}</Text>
        {href ? <Link href={href}>Open it on its edge</Link> : null}
      </View>
    </View>
  )
}

/** What a mark's bars need to be known by: turns, roundings, how they were split and lapped. */
const rowNotes = ({ rows }: Schedule): readonly string[] => {
  const notes = new Map<string, Set<string>>()
  for (const { mark, notes: own } of rows) {
    for (const note of own) notes.set(note, (notes.get(note) ?? new Set<string>()).add(mark))
  }
  return [...notes].map(([note, marks]) => `Mark ${[...marks].join(', ')}: ${note}`)
}

const styles = StyleSheet.create({
  halves: { flexDirection: 'row', flexWrap: 'wrap', gap: space.xl },
  half: { flexGrow: 1, flexBasis: 320, minWidth: 0 },
  problem: { flexDirection: 'row', gap: space.s, paddingVertical: space.xs },
  words: { flex: 1, minWidth: 0, gap: 2 },
})
