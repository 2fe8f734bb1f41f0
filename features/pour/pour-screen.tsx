import { toEngine, type PourData } from '@wedgeline/contract'
import { layoutIndex } from '@wedgeline/engine/geometry'
import type { PourResult } from '@wedgeline/engine'
import { router } from 'expo-router'
import { useMemo, useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space, useWide } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Icon } from '@/components/ui/icon'
import { Section } from '@/components/ui/screen'
import { Empty, Failed } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { useJobDraft } from '../editing/job-draft'
import { usePourChecks } from '../editing/pour-checks'
import { ProposalDialog } from '../proposal/proposal-dialog'
import { CountLinks } from './count-links'
import { EdgeLengths } from './edge-lengths'
import { EdgeList } from './edge-list'
import { PanList } from './pan-list'
import { PourDataForm } from './pour-data'
import { PourFrame } from './pour-frame'
import { PourPlan } from './pour-plan'
import { boundsOf } from './plan-scale'

/** A pour from above with its edges, checks counted by status, and what is known of the slab. */
export function PourScreen({ jobId, pourId }: { readonly jobId: string; readonly pourId: string }) {
  const job = useJobDraft()
  const [isProposing, setProposing] = useState(false)
  return (
    <PourFrame
      pourId={pourId}
      page="plan"
      actions={
        <>
          {job.canUndo ? (
            <Button
              label={job.undoLabel ? `Undo: ${job.undoLabel}` : 'Undo'}
              icon={<Icon name="undo" />}
              onPress={job.undo}
            />
          ) : null}
          {job.canEdit ? <Button label="Propose bars" onPress={() => setProposing(true)} /> : null}
        </>
      }
    >
      {(pour) => (
        <>
          <PourParts jobId={jobId} pour={pour} />
          {isProposing ? (
            <ProposalDialog pourId={pour.id} what={`pour ${pour.mark}`} onClose={() => setProposing(false)} />
          ) : null}
        </>
      )}
    </PourFrame>
  )
}

function PourParts({ jobId, pour }: { readonly jobId: string; readonly pour: PourData }) {
  const { layout } = useJobDraft()
  const { result, failure } = usePourChecks(pour.id)
  const index = useMemo(() => layoutIndex(toEngine(layout)), [layout])
  const [lengthsOf, setLengthsOf] = useState<string | null>(null)
  const hasAnchors = (index.tendonsOfPour.get(pour.id) ?? []).length > 0
  const isWide = useWide()
  const isBeside = isWide && !isLong(pour)
  const firstEdge = index.edgesOfPour.get(pour.id)?.[0]
  return (
    <>
      {hasAnchors ? <Checks jobId={jobId} pourId={pour.id} result={result} failure={failure} /> : null}
      {hasAnchors ? null : (
        <Empty
          what="This pour has no anchors yet."
          firstStep="Open an edge and type or paste its anchors: distance along the edge, height, strands."
          action={
            firstEdge ? (
              <Button kind="main" label={`Open edge ${firstEdge.mark}`} href={`/jobs/${jobId}/edges/${firstEdge.id}`} />
            ) : null
          }
        />
      )}
      <View style={isBeside ? styles.beside : styles.stacked}>
        <View style={isBeside ? styles.plan : null}>
          <PourPlan
            index={index}
            pourId={pour.id}
            onEdge={(edgeId) => router.push(`/jobs/${jobId}/edges/${edgeId}`)}
            onPan={(panId) => router.push(`/jobs/${jobId}/pans/${panId}`)}
          />
        </View>
        <View style={isBeside ? styles.list : styles.stacked}>
          <Section title="Edges">
            <EdgeList
              jobId={jobId}
              pourId={pour.id}
              index={index}
              result={result}
              onLengths={setLengthsOf}
              isColumn={!isWide || isBeside}
            />
          </Section>
          <PanList jobId={jobId} pourId={pour.id} index={index} result={result} />
        </View>
      </View>
      <PourDataForm pour={pour} />
      <EdgeLengths edgeId={lengthsOf} onClose={() => setLengthsOf(null)} />
    </>
  )
}

interface ChecksProps {
  readonly jobId: string
  readonly pourId: string
  readonly result: PourResult | null
  readonly failure: string | null
}

function Checks({ jobId, pourId, result, failure }: ChecksProps) {
  if (failure !== null) return <Failed what="The checks of this pour could not be made." advice={failure} />
  return (
    <View style={styles.checks} role="status">
      {result ? (
        <CountLinks jobId={jobId} pourId={pourId} counts={result.counts} />
      ) : (
        <Text tone="soft">Checking the pour …</Text>
      )}
    </View>
  )
}

/** A pour much longer than it is deep takes the whole width for its plan. */
function isLong({ outline }: PourData): boolean {
  const { left, right, top, bottom } = boundsOf(outline.map(({ xMm, yMm }) => ({ x: xMm, y: yMm })))
  return right - left > LONG_FROM * (top - bottom)
}

const LONG_FROM = 2

const styles = StyleSheet.create({
  checks: { minHeight: space.xl },
  stacked: { gap: space.xl },
  beside: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xl },
  plan: { flex: 1, minWidth: 0 },
  list: { width: 440, gap: space.xl },
})
