import type { Role } from '@wedgeline/contract'
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { colour, space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Section } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { useToast } from '@/components/ui/toast'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { RoleBoxes } from './role-boxes'

/** Open invitations and the form for another. */
export function InvitationSection({ companyId }: { companyId: string }) {
  return (
    <>
      <InviteForm companyId={companyId} />
      <OpenInvitations companyId={companyId} />
    </>
  )
}

const NO_FORM: { email: string; name: string; roles: readonly Role[] } = { email: '', name: '', roles: [] }

function InviteForm({ companyId }: { companyId: string }) {
  const [form, setForm] = useState(NO_FORM)
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const invite = useMutation(
    trpc.invitation.create.mutationOptions({
      onSuccess: async () => {
        setForm(NO_FORM)
        await queryClient.invalidateQueries(trpc.invitation.list.queryFilter({ companyId }))
      },
    }),
  )
  const failure = invite.error ? failureOf(invite.error) : null
  const errors: Readonly<Record<string, string>> = failure?.fields ?? {}
  const send = () => invite.mutate({ companyId, email: form.email, name: form.name, roles: [...form.roles] })
  return (
    <Section title="Invite somebody">
      {failure && Object.keys(errors).length === 0 ? <Banner tone="over" isUrgent words={failure.sentence} /> : null}
      {invite.data ? <MadeLink link={invite.data.link} /> : null}
      <TextField
        label="Mail address"
        value={form.email}
        onChangeText={(email) => setForm({ ...form, email })}
        error={errors.email}
        inputMode="email"
        autoComplete="off"
        maxLength={254}
        required
      />
      <TextField
        label="Name"
        value={form.name}
        onChangeText={(name) => setForm({ ...form, name })}
        error={errors.name}
        autoComplete="off"
        maxLength={120}
        required
      />
      <RoleBoxes
        label="Roles of the invited person"
        roles={form.roles}
        onChange={(roles) => setForm({ ...form, roles })}
        error={errors.roles}
      />
      <View style={styles.line}>
        <Button kind="main" label="Invite" onPress={send} busy={invite.isPending} />
      </View>
    </Section>
  )
}

/** The link is shown this once: the server keeps no copy that opens anything. */
function MadeLink({ link }: { link: string }) {
  const say = useToast()
  const copy = () =>
    navigator.clipboard.writeText(link).then(
      () => say('The link is on the clipboard.'),
      () => say('The browser does not let this page copy: mark the link and copy it.'),
    )
  return (
    <View style={styles.made} role="status">
      <Text kind="strong">Invited. This link works once, for seven days:</Text>
      <Text selectable style={styles.link}>
        {link}
      </Text>
      <Text kind="small" tone="soft">
        It was mailed as well. On a computer without a mail server the mail lies in the local outbox, a folder beside
        the database; pass the link on yourself then.
      </Text>
      <View style={styles.line}>
        <Button label="Copy the link" onPress={() => void copy()} />
      </View>
    </View>
  )
}

function OpenInvitations({ companyId }: { companyId: string }) {
  const trpc = useTRPC()
  const queryClient = useQueryClient()
  const say = useToast()
  const open = useQuery(trpc.invitation.list.queryOptions({ companyId }))
  const withdraw = useMutation(
    trpc.invitation.withdraw.mutationOptions({
      onSuccess: () => queryClient.invalidateQueries(trpc.invitation.list.queryFilter({ companyId })),
      onError: (error) => say(`Not withdrawn. ${failureOf(error).sentence}`),
    }),
  )
  return (
    <Section title="Open invitations">
      {open.data?.length === 0 ? <Text tone="soft">None.</Text> : null}
      {open.data?.map(({ id, name, email, roles, expiresAtMs }) => (
        <View key={id} style={styles.row}>
          <View style={styles.words}>
            <Text kind="strong">{name || 'first person'}</Text>
            <Text tone="soft">{email || 'any address'}</Text>
            <Text>{roles.join(', ')}</Text>
            <Text tone="soft">{`until ${dateText(expiresAtMs)}`}</Text>
          </View>
          <Button
            kind="quiet"
            label={`Withdraw ${name}`}
            disabled={withdraw.isPending}
            onPress={() => withdraw.mutate({ companyId, invitationId: id })}
          />
        </View>
      ))}
      {open.error ? (
        <Failed
          what="The invitations could not be fetched."
          advice={failureOf(open.error).sentence}
          onRetry={() => void open.refetch()}
        />
      ) : open.isPending ? (
        <Waiting what="the invitations" />
      ) : null}
    </Section>
  )
}

const dateText = (atMs: number): string => new Intl.DateTimeFormat('en-GB', { dateStyle: 'long' }).format(atMs)

const styles = StyleSheet.create({
  line: { flexDirection: 'row' },
  made: { gap: space.s, padding: space.m, borderWidth: 1, borderLeftWidth: 4, borderColor: colour.ink },
  link: { overflowWrap: 'anywhere' },
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
