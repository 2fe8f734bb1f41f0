import { useQuery } from '@tanstack/react-query'
import { Redirect } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Form } from '@/components/ui/form'
import { Screen } from '@/components/ui/screen'
import { Failed, Waiting } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { failureOf } from '@/lib/failure'
import { useAcceptInvitation } from '@/lib/session'
import { useTRPC } from '@/lib/trpc'
import { WorkShell } from '../shell/work-shell'
import { PasswordField } from './password-field'

/** What an invitation offers, and the fields that take it. */
export function InvitationScreen({ token }: { token: string }) {
  const trpc = useTRPC()
  const accept = useAcceptInvitation()
  // Once it is being accepted the link is used up: asked for again it would be refused.
  const isOpen = !accept.isPending && !accept.isSuccess
  const invitation = useQuery(
    trpc.invitation.byToken.queryOptions({ token }, { refetchOnWindowFocus: false, enabled: isOpen }),
  )
  if (accept.isSuccess) return <Redirect href="/" />
  return (
    <WorkShell account={null}>
      <Screen title="Invitation" isNarrow>
        {invitation.data ? (
          <AcceptForm token={token} invitation={invitation.data} accept={accept} />
        ) : invitation.error ? (
          <Failed
            what="This invitation cannot be opened."
            advice={failureOf(invitation.error).sentence}
            onRetry={() => void invitation.refetch()}
            actions={<Button label="Sign in" href="/sign-in" />}
          />
        ) : (
          <Waiting what="the invitation" />
        )}
      </Screen>
    </WorkShell>
  )
}

interface AcceptFormProps {
  readonly token: string
  readonly invitation: {
    readonly companyName: string
    readonly email: string | null
    readonly name: string
    readonly roles: readonly string[]
  }
  readonly accept: ReturnType<typeof useAcceptInvitation>
}

function AcceptForm({ token, invitation, accept }: AcceptFormProps) {
  const { companyName, roles } = invitation
  const [email, setEmail] = useState(invitation.email ?? '')
  const [name, setName] = useState(invitation.name)
  const [password, setPassword] = useState('')
  const failure = accept.error ? failureOf(accept.error) : null
  const errors: Readonly<Record<string, string>> = failure?.fields ?? {}
  const send = () => {
    if (accept.isPending) return
    accept.mutate({ token, name, password, ...(invitation.email === null ? { email } : {}) })
  }
  return (
    <Form label="Accept the invitation" onSubmit={send}>
      <View style={styles.form}>
        <Text>{`${companyName} invites you to work with it as ${inWords(roles)}.`}</Text>
        {failure && Object.keys(errors).length === 0 ? <Banner tone="over" words={failure.sentence} isUrgent /> : null}
        <TextField
          label="Mail address"
          value={email}
          onChangeText={setEmail}
          onEnter={send}
          error={errors.email}
          hint={invitation.email === null ? 'You sign in with it.' : 'The invitation is for this address.'}
          disabled={invitation.email !== null}
          inputMode="email"
          autoComplete="username"
          maxLength={254}
          required
        />
        <TextField
          label="Name"
          value={name}
          onChangeText={setName}
          onEnter={send}
          error={errors.name}
          hint="As it stands beside what you accept and change."
          autoComplete="name"
          maxLength={120}
          required
        />
        <PasswordField value={password} onChangeText={setPassword} onEnter={send} error={errors.password} isNew />
        <Text kind="small" tone="soft">
          An address that has an account already is let in with the password of that account.
        </Text>
        <View style={styles.actions}>
          <Button kind="main" label="Accept and sign in" onPress={send} busy={accept.isPending} />
        </View>
      </View>
    </Form>
  )
}

/** admin and detailer; detailer, engineer and drafter. */
function inWords(roles: readonly string[]): string {
  const last = roles.at(-1) ?? ''
  return roles.length < 2 ? last : `${roles.slice(0, -1).join(', ')} and ${last}`
}

const styles = StyleSheet.create({
  form: { gap: space.l, width: '100%', maxWidth: 420 },
  actions: { flexDirection: 'row' },
})
