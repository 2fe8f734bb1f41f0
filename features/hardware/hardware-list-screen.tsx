import type { HardwareData, JackData, StrandTypeData } from '@wedgeline/contract'
import { useQuery } from '@tanstack/react-query'
import { router } from 'expo-router'
import { useState } from 'react'
import { useWide } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Screen, Section } from '@/components/ui/screen'
import { Empty, Failed, Waiting } from '@/components/ui/states'
import { Table, type Column } from '@/components/ui/table'
import { Text } from '@/components/ui/text'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { CompanyNav } from '../company/company-nav'
import { useCompanyRoles } from '../company/company-roles'
import { JackDialog } from './jack-dialog'
import { StrandDialog } from './strand-dialog'

interface Lists {
  readonly hardware: readonly HardwareData[]
  readonly jacks: readonly JackData[]
  readonly strandTypes: readonly StrandTypeData[]
}

/** What the company anchors, stresses and threads with; every job takes from it. */
export function HardwareListScreen({ companyId }: { companyId: string }) {
  const list = useQuery(useTRPC().hardware.list.queryOptions({ companyId }))
  const isAdmin = useCompanyRoles(companyId).includes('admin')
  return (
    <Screen
      title="Hardware"
      nav={<CompanyNav companyId={companyId} here="hardware" />}
      actions={
        isAdmin ? <Button kind="main" label="New hardware" href={`/companies/${companyId}/hardware/new`} /> : null
      }
    >
      {list.data ? (
        <>
          <HardwareSection companyId={companyId} lists={list.data} isAdmin={isAdmin} />
          <JackSection companyId={companyId} jacks={list.data.jacks} isAdmin={isAdmin} />
          <StrandSection companyId={companyId} strandTypes={list.data.strandTypes} isAdmin={isAdmin} />
        </>
      ) : list.error ? (
        <Failed
          what="The hardware could not be fetched."
          advice={failureOf(list.error).sentence}
          onRetry={() => void list.refetch()}
        />
      ) : (
        <Waiting what="the hardware" />
      )}
    </Screen>
  )
}

/** A long text wraps in its place where there is room; on a phone it stands last, in one line. */
function useColumns<Row>(columns: readonly Column<Row>[], about: Column<Row>): readonly Column<Row>[] {
  const isWide = useWide()
  return isWide
    ? [...columns.slice(0, 1), { ...about, wraps: true, width: 280 }, ...columns.slice(1)]
    : [...columns, about]
}

const END_WORDS = { live: 'live', dead: 'dead', both: 'live and dead' } as const
const KIND_WORDS = { plate: 'plate', 'bonded-splay': 'bonded splay' } as const

interface HardwareSectionProps {
  readonly companyId: string
  readonly lists: Lists
  readonly isAdmin: boolean
}

function HardwareSection({ companyId, lists: { hardware, jacks }, isAdmin }: HardwareSectionProps) {
  const jackOf = ({ jackId }: HardwareData) => jacks.find(({ id }) => id === jackId)?.name ?? 'none'
  const own: Column<HardwareData>[] = [
    { key: 'name', head: 'Name', isRowHead: true, cell: ({ name }) => name },
    { key: 'kind', head: 'Kind', cell: ({ kind }) => KIND_WORDS[kind] },
    { key: 'ends', head: 'Ends', cell: ({ ends }) => END_WORDS[ends] },
    { key: 'strands', head: 'Strands, at most', align: 'end', cell: ({ strandsMax }) => strandsMax },
    { key: 'plate', head: 'Plate, mm', cell: ({ plate }) => `${plate.widthMm} × ${plate.heightMm}` },
    { key: 'jack', head: 'Jack', cell: jackOf },
    {
      key: 'approval',
      head: 'Approval',
      wraps: true,
      width: 220,
      cell: ({ approval }) => approval?.reference ?? 'none',
    },
  ]
  const columns = useColumns(own, {
    key: 'description',
    head: 'What it is for',
    cell: ({ description }) => description || '–',
  })
  return (
    <Section title="Anchorages">
      {hardware.length === 0 ? (
        <Empty
          what="The company has no anchorage yet."
          firstStep={
            isAdmin
              ? 'Enter one from its supplier’s sheet: plate, duct, pocket, distances and approval.'
              : 'An admin enters them from their suppliers’ sheets.'
          }
          action={isAdmin ? <Button label="Enter the first" href={`/companies/${companyId}/hardware/new`} /> : null}
        />
      ) : (
        <Table
          caption="Anchorages of the company"
          columns={columns}
          rows={hardware}
          rowKey={({ id }) => id}
          onSelect={({ id }) => router.push(`/companies/${companyId}/hardware/${id}`)}
        />
      )}
    </Section>
  )
}

interface JackSectionProps {
  readonly companyId: string
  readonly jacks: readonly JackData[]
  readonly isAdmin: boolean
}

function JackSection({ companyId, jacks, isAdmin }: JackSectionProps) {
  const [open, setOpen] = useState<JackData | 'new' | null>(null)
  const own: Column<JackData>[] = [
    { key: 'name', head: 'Name', isRowHead: true, cell: ({ name }) => name },
    { key: 'closed', head: 'Closed, mm', align: 'end', cell: ({ closedLengthMm }) => closedLengthMm },
    { key: 'stroke', head: 'Stroke, mm', align: 'end', cell: ({ strokeMm }) => strokeMm },
    { key: 'body', head: 'Body, mm', align: 'end', cell: ({ bodyDiameterMm }) => bodyDiameterMm },
    { key: 'nose', head: 'Bent nose, up to', align: 'end', cell: ({ bentNoseMaxDeg }) => `${bentNoseMaxDeg}°` },
  ]
  const columns = useColumns(own, {
    key: 'description',
    head: 'What it is for',
    cell: (jack) => jack.description || '–',
  })
  return (
    <Section title="Jacks" actions={isAdmin ? <Button label="New jack" onPress={() => setOpen('new')} /> : null}>
      {jacks.length === 0 ? (
        <Text tone="soft">No jack yet. Room for stressing is checked against the jack of the hardware.</Text>
      ) : (
        <Table
          caption="Jacks of the company"
          columns={columns}
          rows={jacks}
          rowKey={({ id }) => id}
          onSelect={setOpen}
        />
      )}
      {open ? (
        <JackDialog
          companyId={companyId}
          jack={open === 'new' ? null : open}
          isAdmin={isAdmin}
          onClose={() => setOpen(null)}
        />
      ) : null}
    </Section>
  )
}

interface StrandSectionProps {
  readonly companyId: string
  readonly strandTypes: readonly StrandTypeData[]
  readonly isAdmin: boolean
}

function StrandSection({ companyId, strandTypes, isAdmin }: StrandSectionProps) {
  const [open, setOpen] = useState<StrandTypeData | 'new' | null>(null)
  return (
    <Section
      title="Strand types"
      actions={isAdmin ? <Button label="New strand type" onPress={() => setOpen('new')} /> : null}
    >
      {strandTypes.length === 0 ? (
        <Text tone="soft">No strand type yet. Tendons need one before anchors can be entered.</Text>
      ) : (
        <Table
          caption="Strand types of the company"
          columns={[
            { key: 'name', head: 'Name', isRowHead: true, cell: ({ name }) => name },
            { key: 'diameter', head: 'Diameter, mm', align: 'end', cell: ({ diameterMm }) => diameterMm },
            { key: 'area', head: 'Area, mm²', align: 'end', cell: ({ areaMm2 }) => areaMm2 },
            { key: 'breaking', head: 'Breaking load, kN', align: 'end', cell: ({ breakingLoadKN }) => breakingLoadKN },
            { key: 'proof', head: 'Proof load, kN', align: 'end', cell: ({ proofLoadKN }) => proofLoadKN },
          ]}
          rows={strandTypes}
          rowKey={({ id }) => id}
          onSelect={setOpen}
        />
      )}
      {open ? (
        <StrandDialog
          companyId={companyId}
          strandType={open === 'new' ? null : open}
          isAdmin={isAdmin}
          onClose={() => setOpen(null)}
        />
      ) : null}
    </Section>
  )
}
