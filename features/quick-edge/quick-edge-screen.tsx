import { useQuery } from '@tanstack/react-query'
import { useState, type ReactNode } from 'react'
import { Button } from '@/components/ui/button'
import { Screen } from '@/components/ui/screen'
import { Empty, Failed, Waiting } from '@/components/ui/states'
import { failureOf } from '@/lib/failure'
import { useSession, type Me } from '@/lib/session'
import { useTRPC } from '@/lib/trpc'
import { CompanyChoice } from '../jobs/company-choice'
import { QuickEdgeWork } from './quick-edge-work'

const TITLE = 'Quick edge'
const PARENTS = [{ label: 'Jobs', href: '/' }] as const

/** One edge with no job set up: who may make one, of which company, and with what hardware. */
export function QuickEdgeScreen() {
  const session = useSession()
  if (session.state !== 'in')
    return <Frame>{session.state === 'waiting' ? <Waiting what="who you are" /> : null}</Frame>
  const own = session.me.companies.filter(({ roles }) =>
    roles.some((role) => role === 'detailer' || role === 'engineer'),
  )
  const [first] = own
  if (!first) {
    return (
      <Frame>
        <Failed
          what="Your role does not make quick edges."
          advice="A detailer or an engineer of a company makes them; its admin sets roles."
        />
      </Frame>
    )
  }
  return <OfCompany me={session.me} own={own} firstId={first.id} />
}

function Frame({ children }: { readonly children: ReactNode }) {
  return (
    <Screen title={TITLE} parents={PARENTS}>
      {children}
    </Screen>
  )
}

interface OfCompanyProps {
  readonly me: Me
  readonly own: Me['companies']
  readonly firstId: string
}

function OfCompany({ me, own, firstId }: OfCompanyProps) {
  const [companyId, setCompanyId] = useState(firstId)
  const trpc = useTRPC()
  const hardware = useQuery(trpc.hardware.list.queryOptions({ companyId }, { staleTime: Infinity }))
  const choice = <CompanyChoice companies={own} companyId={companyId} onChange={setCompanyId} />
  const { data } = hardware
  if (!data) {
    return (
      <Frame>
        {hardware.error ? (
          <Failed
            what="The company’s hardware could not be fetched."
            advice={failureOf(hardware.error).sentence}
            onRetry={() => void hardware.refetch()}
          />
        ) : (
          <Waiting what="the company’s hardware" />
        )}
      </Frame>
    )
  }
  if (data.hardware.length === 0 || data.strandTypes.length === 0) {
    const isAdmin = own.some(({ id, roles }) => id === companyId && roles.includes('admin'))
    return (
      <Frame>
        {choice}
        <Empty
          what={`The company has no ${data.hardware.length === 0 ? 'hardware' : 'strand type'} yet.`}
          firstStep="An admin enters it under Hardware in the menu at the top; then an edge can be pasted here."
          action={isAdmin ? <Button kind="main" label="Enter it" href={`/companies/${companyId}/hardware`} /> : null}
        />
      </Frame>
    )
  }
  return <QuickEdgeWork key={companyId} person={me.person} companyId={companyId} company={data} choice={choice} />
}
