import type { Href } from 'expo-router'
import { Redirect } from 'expo-router'
import type { ReactNode } from 'react'
import { Suspense, useState } from 'react'
import { View } from 'react-native'
import { space } from '@/components/theme'
import type { MenuItem } from '@/components/ui/menu'
import { Screen } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import type { Me } from '@/lib/session'
import { useSession, useSignOut } from '@/lib/session'
import type { Account } from './header'
import { pageInAddressBar, signInPath } from './way-back'
import { WorkShell } from './work-shell'

/** Everything that needs somebody signed in: who is not goes to sign in and comes back to the page asked for. */
export function WorkLayout({ children }: { children: ReactNode }) {
  const session = useSession()
  const signOut = useSignOut()
  const asked = useAskedPage(session.state === 'in')
  if (session.state === 'out') return <Redirect href={signInPath(asked()) as Href} />
  if (session.state !== 'in') {
    return (
      <WorkShell account={null}>
        <Screen title="Wedgeline">
          {session.state === 'waiting' ? (
            <Waiting what="who is signed in" />
          ) : (
            <Failed
              what="Whether you are signed in could not be asked."
              advice={session.failure.sentence}
              onRetry={session.retry}
            />
          )}
        </Screen>
      </WorkShell>
    )
  }
  return (
    <WorkShell account={accountOf(session.me, () => signOut.mutate())}>
      <Suspense fallback={<PageOnItsWay />}>{children}</Suspense>
    </WorkShell>
  )
}

/**
 * The page that somebody who is not signed in wants. Until a layout has its pages, the router writes an address that
 * leaves them out: what stood there at first counts until somebody is in.
 */
function useAskedPage(isIn: boolean): () => string {
  const [atFirst] = useState(pageInAddressBar)
  const [wasIn, setWasIn] = useState(isIn)
  if (isIn && !wasIn) setWasIn(true)
  return () => (wasIn ? pageInAddressBar() : atFirst)
}

function PageOnItsWay() {
  return (
    <View role="main" id="main" style={{ flex: 1, padding: space.l }}>
      <Waiting what="the page" />
    </View>
  )
}

function accountOf({ person, companies }: Me, onSignOut: () => void): Account {
  const isSeveral = companies.length > 1
  const company = companies[0]?.name ?? 'no company'
  return {
    person: person.name,
    company: isSeveral ? `${companies.length} companies` : company,
    items: [
      ...companies.flatMap(({ id, name }, index) => pagesOf({ id, name: isSeveral ? name : '', index })),
      { key: 'methods', label: 'How it is checked', href: '/methods', startsGroup: true },
    ],
    onSignOut,
  }
}

function pagesOf({ id, name, index }: { id: string; name: string; index: number }): readonly MenuItem[] {
  const after = name ? `, ${name}` : ''
  return [
    { key: `hardware-${id}`, label: `Hardware${after}`, href: `/companies/${id}/hardware`, startsGroup: index > 0 },
    { key: `people-${id}`, label: `People${after}`, href: `/companies/${id}/people` },
    { key: `company-${id}`, label: `Company${after}`, href: `/companies/${id}` },
  ]
}
