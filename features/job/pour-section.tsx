import type { EdgeData, LayoutFile, PourData } from '@wedgeline/contract'
import { useQuery } from '@tanstack/react-query'
import { StyleSheet, View } from 'react-native'
import { colour, space, useWide } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Link } from '@/components/ui/link'
import { Section } from '@/components/ui/screen'
import { Empty } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { useTRPC } from '@/lib/trpc'
import type { Counts } from '../checks/counts'
import { StatusLine } from '../checks/status-counts'
import { useCompanyRoles } from '../company/company-roles'
import { useJobDraft } from '../editing/job-draft'

/** The pours with how they stand, and under each a link to every edge. */
export function PourSection() {
  const { jobId, layout, canEdit, save } = useJobDraft()
  const trpc = useTRPC()
  const jobs = useQuery(trpc.job.list.queryOptions(undefined, { enabled: save === 'saved' }))
  const stored = jobs.data?.find(({ id }) => id === jobId)?.pours ?? []
  if (layout.pours.length === 0) {
    return (
      <Section title="Pours">
        <Empty
          what="There is no pour yet."
          firstStep={
            canEdit
              ? 'Add the first one: its outline, thickness, concrete and cover. Its edges come with it.'
              : 'A detailer or engineer of this job adds them.'
          }
          action={canEdit ? <Button label="Add the first pour" href={`/jobs/${jobId}/pours/new`} /> : null}
        />
        <HardwareNote />
      </Section>
    )
  }
  return (
    <Section title="Pours">
      <HardwareNote />
      {layout.pours.map((pour) => (
        <PourEntry key={pour.id} pour={pour} counts={stored.find(({ id }) => id === pour.id)?.counts ?? null} />
      ))}
    </Section>
  )
}

/** Without hardware no anchor can be entered: said here, before somebody stands at an edge. */
function HardwareNote() {
  const { layout, companyId } = useJobDraft()
  const isAdmin = useCompanyRoles(companyId).includes('admin')
  const missing = [
    ...(layout.hardware.length === 0 ? ['anchorage'] : []),
    ...(layout.strandTypes.length === 0 ? ['strand type'] : []),
  ]
  if (missing.length === 0) return null
  return (
    <Banner
      tone="info"
      words={`The company has no ${missing.join(' and no ')} yet; anchors need both.${isAdmin ? '' : ' An admin enters them.'}`}
      actions={isAdmin ? <Button label="Enter hardware" href={`/companies/${companyId}/hardware`} /> : null}
    />
  )
}

function PourEntry({ pour, counts }: { pour: PourData; counts: Counts | null }) {
  const { jobId, layout } = useJobDraft()
  const isWide = useWide()
  const base = `/jobs/${jobId}/pours/${pour.id}` as const
  const level = layout.levels.find(({ id }) => id === pour.levelId)
  const edges = layout.edges.filter(({ pourId }) => pourId === pour.id)
  return (
    <View style={styles.pour}>
      <View style={styles.head}>
        <Text kind="strong" level={3}>
          <Link kind="strong" href={base}>
            {pour.title ? `Pour ${pour.mark}, ${pour.title}` : `Pour ${pour.mark}`}
          </Link>
        </Text>
        <Text tone="soft">{`${level ? `${level.mark}, ` : ''}${pour.thicknessMm} mm, draft`}</Text>
        {counts ? <StatusLine counts={counts} /> : null}
      </View>
      <View style={[styles.parts, !isWide && styles.partsNarrow]}>
        <View role="list" aria-label={`Edges of pour ${pour.mark}`} style={styles.edges}>
          {edges.map((edge) => (
            <EdgeLink key={edge.id} edge={edge} layout={layout} jobId={jobId} />
          ))}
        </View>
        <View style={styles.pages}>
          <Button label="Plan" href={base} />
          <Button label="Zones" href={`${base}/zones`} />
          <Button label="Bar schedule" href={`${base}/schedule`} />
        </View>
      </View>
    </View>
  )
}

function EdgeLink({ edge, layout, jobId }: { edge: EdgeData; layout: LayoutFile; jobId: string }) {
  return (
    <View role="listitem" style={styles.edge}>
      <Link kind="figureStrong" href={`/jobs/${jobId}/edges/${edge.id}`} style={styles.edgeMark}>
        {edge.mark}
      </Link>
      <Text kind="figure" tone="soft">
        {`${lengthText(edge)}, ${anchorText(layout, edge.id)}`}
      </Text>
    </View>
  )
}

const lengthText = ({ lengths }: EdgeData): string => {
  const ends = lengths.flatMap(({ fromMm, toMm }) => [fromMm, toMm])
  return `${((Math.max(...ends) - Math.min(...ends)) / 1000).toFixed(2)} m`
}

/** 12 live, 4 dead; no anchor. */
function anchorText({ anchors }: LayoutFile, edgeId: string): string {
  const own = anchors.filter((anchor) => anchor.edgeId === edgeId)
  const live = own.filter(({ end }) => end === 'live').length
  const parts = [live > 0 ? `${live} live` : '', own.length > live ? `${own.length - live} dead` : '']
  return parts.filter(Boolean).join(', ') || 'no anchor'
}

const styles = StyleSheet.create({
  pour: { gap: space.s, paddingVertical: space.s, borderBottomWidth: 1, borderColor: colour.rule },
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.xl, rowGap: space.xs },
  parts: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'flex-start', gap: space.l },
  partsNarrow: { flexDirection: 'column' },
  edges: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.xl, flexShrink: 1 },
  edge: { flexDirection: 'row', alignItems: 'center', gap: space.s, minHeight: 32 },
  edgeMark: { paddingVertical: space.xs, minWidth: 24 },
  pages: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
})
