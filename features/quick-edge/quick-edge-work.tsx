import { useMemo, useState, type ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'
import { space, useWide } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Screen, Section } from '@/components/ui/screen'
import { Failed } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import type { Me } from '@/lib/session'
import { printPage } from '../calculation/print-page'
import { countChecks } from '../checks/counts'
import { StatusMarks } from '../checks/status-counts'
import { BarsSection, QuickStrip, WorstSection } from './quick-answer'
import { useQuickDraft } from './quick-draft'
import { QuickFields } from './quick-fields'
import { formProblems, usualForm, type QuickForm } from './quick-form'
import { nameOf, quickLayout, type CompanyHardware, type QuickLayout } from './quick-layout'
import { AnchorsRead, QuickPaste, readQuick } from './quick-paste'
import { QuickSheet } from './quick-sheet'
import { useKeep, type Keeping } from './use-keep'
import { useQuickWork, type QuickWork } from './use-quick-answer'

interface WorkProps {
  readonly person: Me['person']
  readonly companyId: string
  readonly company: CompanyHardware
  readonly choice: ReactNode
}

const PARENTS = [{ label: 'Jobs', href: '/' }] as const

/** Typed on the left, answered on the right; nothing is stored until somebody keeps it. */
export function QuickEdgeWork({ person, companyId, company, choice }: WorkProps) {
  const isWide = useWide()
  const { draft, change, forget } = useQuickDraft(person.id, companyId)
  const form = useMemo(() => draft.form ?? usualForm(company), [draft.form, company])
  const pasted = useMemo(() => readQuick(draft.text, company.hardware), [draft.text, company])
  const problems = useMemo(() => formProblems(form, company), [form, company])
  const made = useMemo((): QuickLayout | null => {
    if (pasted.anchors.length === 0 || Object.keys(problems).length > 0) return null
    const name = nameOf(draft.begunAtMs, Intl.DateTimeFormat().resolvedOptions().timeZone)
    return quickLayout({ form, anchors: pasted.anchors, company, name })
  }, [form, pasted, problems, company, draft.begunAtMs])
  const work = useQuickWork(made?.ok ? made.layout : null)
  const keep = useKeep(companyId, forget)
  const shown = made?.ok ? (work.answer?.layout ?? made.layout) : null
  return (
    <Screen
      title="Quick edge"
      parents={PARENTS}
      summary={<Summary work={work} />}
      actions={<Actions work={work} isReady={made?.ok === true} keep={keep} onClear={draft.text ? forget : null} />}
    >
      {keep.failure ? <Banner tone="over" words={`Not kept. ${keep.failure}`} isUrgent /> : null}
      {keep.leftOut.length > 0 ? <Banner tone="near" words={keep.leftOut.join(' ')} isUrgent /> : null}
      <View style={isWide ? styles.wide : styles.phone}>
        <View style={isWide ? styles.entry : styles.phone}>
          {choice}
          <QuickPaste text={draft.text} pasted={pasted} onChange={(text) => change({ text })} />
          {made && !made.ok
            ? made.problems.map((problem) => (
                <Text key={problem} tone="over">
                  {problem}
                </Text>
              ))
            : null}
          <Slab isOpenAtFirst={isWide} form={form} hasProblem={Object.keys(problems).length > 0}>
            <QuickFields
              {...{ form, problems }}
              hardware={company.hardware}
              strandTypes={company.strandTypes}
              onChange={(changes) => change({ form: { ...form, ...changes } })}
            />
          </Slab>
        </View>
        <View style={styles.answer}>
          {work.failure ? <Failed what="The checks could not be worked out." advice={work.failure} /> : null}
          {shown ? (
            <>
              <QuickStrip layout={shown} result={work.answer?.result ?? null} />
              <View style={styles.halves}>
                <View style={styles.half}>
                  <Bars work={work} />
                </View>
                <View style={styles.half}>
                  {work.answer ? <WorstSection result={work.answer.result} proposal={work.proposal} /> : null}
                </View>
              </View>
              <Section title="Anchors as read">
                <AnchorsRead layout={shown} />
              </Section>
            </>
          ) : (
            <HowTo hasProblem={Object.keys(problems).length > 0} />
          )}
        </View>
      </View>
      {work.answer ? (
        <QuickSheet answer={work.answer} preparedBy={person.name} notes={work.proposal?.notes ?? []} />
      ) : null}
    </Screen>
  )
}

function Summary({ work: { answer, isStale } }: { readonly work: QuickWork }) {
  const isWide = useWide()
  return (
    <>
      <Text tone="soft">not filed, readings not accepted</Text>
      {answer ? <StatusMarks counts={countChecks(answer.result.zones)} isShort={!isWide} /> : null}
      {isStale ? <Text tone="soft">working out …</Text> : null}
    </>
  )
}

interface ActionsProps {
  readonly work: QuickWork
  readonly isReady: boolean
  readonly keep: Keeping
  readonly onClear: (() => void) | null
}

function Actions({ work, isReady, keep, onClear }: ActionsProps) {
  const layout = work.answer?.layout ?? null
  const isBusy = work.isStale || work.isProposing
  return (
    <>
      {onClear ? <Button kind="quiet" label="Start afresh" onPress={onClear} /> : null}
      <Button
        kind={work.proposal ? 'ordinary' : 'main'}
        label="Propose bars"
        busy={work.isProposing}
        disabled={!isReady}
        onPress={work.propose}
      />
      <Button
        kind={work.proposal ? 'main' : 'ordinary'}
        label="Print on one A4"
        icon={<Icon name="print" />}
        disabled={!isReady || isBusy}
        onPress={printPage}
      />
      <Button
        label="Keep it"
        busy={keep.isBusy}
        disabled={!isReady || isBusy || layout === null}
        onPress={() => layout && keep.keep(layout)}
      />
    </>
  )
}

/** Bars as proposed, those of the hardware included; or how to get them. */
function Bars({ work: { answer, proposal, isOutdated, isProposing } }: { readonly work: QuickWork }) {
  if (!answer) return null
  return (
    <>
      {isOutdated && !isProposing ? (
        <Banner
          tone="near"
          words="Something was typed since bars were proposed, so they are put away. Propose again."
        />
      ) : null}
      {proposal || isOutdated ? null : (
        <Text tone="soft">
          Only the hardware’s own steel is counted so far. Propose bars to see what the edge needs.
        </Text>
      )}
      <BarsSection schedule={answer.schedule} proposal={proposal} />
    </>
  )
}

/** On a phone what is usual stays folded, so that the answer is near the paste. */
function Slab(props: {
  readonly isOpenAtFirst: boolean
  readonly form: QuickForm
  readonly hasProblem: boolean
  readonly children: ReactNode
}) {
  const { isOpenAtFirst, form, hasProblem, children } = props
  const [isOpen, setOpen] = useState(isOpenAtFirst)
  const shown = isOpen || hasProblem
  return (
    <Section
      title="Slab, hardware, edge"
      actions={
        isOpenAtFirst ? null : (
          <Button
            kind="quiet"
            label={shown ? 'Fold' : 'Change'}
            icon={<Icon name={shown ? 'up' : 'down'} />}
            aria-expanded={shown}
            onPress={() => setOpen(!shown)}
          />
        )
      }
    >
      {shown ? (
        children
      ) : (
        <Text>{`${form.thicknessMm} mm of ${form.concrete}, ${form.strands} strands at ${Math.round((form.jackingRatio ?? 0) * 100)} %, covers ${form.coverTopMm}, ${form.coverSoffitMm} and ${form.coverEdgeMm} mm.`}</Text>
      )}
    </Section>
  )
}

function HowTo({ hasProblem }: { readonly hasProblem: boolean }) {
  return (
    <View style={styles.howTo}>
      <Text kind="strong">{hasProblem ? 'A field on this page cannot be used yet.' : 'Paste an edge to see it.'}</Text>
      <Text tone="soft">
        {hasProblem
          ? 'What is wrong stands under it; plan, face and checks follow.'
          : 'Plan, face and checks appear as soon as one anchor is read; every field has a usual value until you change it. Nothing is stored until you keep it.'}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  wide: { flexDirection: 'row', gap: space.xl, alignItems: 'flex-start' },
  phone: { gap: space.l },
  entry: { width: 380, gap: space.l },
  answer: { flex: 1, minWidth: 0, gap: space.xl },
  halves: { flexDirection: 'row', flexWrap: 'wrap', gap: space.xl },
  half: { flexGrow: 1, flexShrink: 1, flexBasis: 340, minWidth: 0, gap: space.m },
  howTo: { gap: space.s, paddingVertical: space.xl },
})
