import type { Role } from '@wedgeline/contract'
import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Button } from '@/components/ui/button'
import { Screen, Section } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { CompanyNav } from './company-nav'
import { useCompanyRoles } from './company-roles'
import { InvitationSection } from './invitation-section'
import { PersonDialog } from './person-dialog'

export interface PersonInList {
  readonly id: string
  readonly name: string
  readonly email: string
  readonly roles: readonly Role[]
}

/** Everybody of the company with their roles; an admin invites, changes and takes away. */
export function PeopleScreen({ companyId }: { companyId: string }) {
  const people = useQuery(useTRPC().people.list.queryOptions({ companyId }))
  const isAdmin = useCompanyRoles(companyId).includes('admin')
  const [open, setOpen] = useState<PersonInList | null>(null)
  return (
    <Screen title="People" nav={<CompanyNav companyId={companyId} here="people" />} isNarrow>
      {people.data ? (
        <>
          <Section title="In the company">
            <View role="list">
              {people.data.map((person) => (
                <View key={person.id} role="listitem" style={styles.row}>
                  <View style={styles.words}>
                    <Text kind="strong">{person.name}</Text>
                    <Text tone="soft">{person.email}</Text>
                    <Text>{person.roles.join(', ') || 'no role'}</Text>
                  </View>
                  {isAdmin ? (
                    <Button label={`Change ${person.name}`} kind="quiet" onPress={() => setOpen(person)} />
                  ) : null}
                </View>
              ))}
            </View>
          </Section>
          {isAdmin ? (
            <InvitationSection companyId={companyId} />
          ) : (
            <Text tone="soft">An admin of the company invites people and sets roles.</Text>
          )}
        </>
      ) : people.error ? (
        <Failed
          what="The people could not be fetched."
          advice={failureOf(people.error).sentence}
          onRetry={() => void people.refetch()}
        />
      ) : (
        <Waiting what="the people of the company" />
      )}
      {open ? <PersonDialog companyId={companyId} person={open} onClose={() => setOpen(null)} /> : null}
    </Screen>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space.m,
    paddingVertical: space.xs,
    borderBottomWidth: 1,
    borderColor: colour.rule,
  },
  words: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l, flexShrink: 1 },
})
