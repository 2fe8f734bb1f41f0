import { useMutation } from '@tanstack/react-query'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Form } from '@/components/ui/form'
import { Screen } from '@/components/ui/screen'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { failureOf } from '@/lib/failure'
import { useTRPC } from '@/lib/trpc'
import { WorkShell } from '../shell/work-shell'

/** Asks for a link to a new password. What it says afterwards is the same for every address. */
export function ForgottenScreen() {
  const ask = useMutation(useTRPC().session.askReset.mutationOptions())
  return (
    <WorkShell account={null}>
      <Screen title="Forgotten password" isNarrow>
        {ask.isSuccess ? (
          <View style={styles.form}>
            <Banner
              tone="info"
              words="If an account has this address, a mail with a link is on its way to it. The link works once, for an hour."
              isUrgent
            />
            <View style={styles.actions}>
              <Button label="Sign in" href="/sign-in" />
            </View>
          </View>
        ) : (
          <AskForm ask={ask} />
        )}
      </Screen>
    </WorkShell>
  )
}

interface Asking {
  readonly mutate: (input: { email: string }) => void
  readonly isPending: boolean
  readonly error: unknown
}

function AskForm({ ask }: { ask: Asking }) {
  const [email, setEmail] = useState('')
  const [isMissing, setMissing] = useState(false)
  const failure = ask.error ? failureOf(ask.error) : null
  const send = () => {
    setMissing(email.trim() === '')
    if (email.trim() !== '' && !ask.isPending) ask.mutate({ email })
  }
  return (
    <Form label="Ask for a new password" onSubmit={send}>
      <View style={styles.form}>
        {failure && failure.fields.email === undefined ? (
          <Banner tone="over" words={failure.sentence} isUrgent />
        ) : null}
        <TextField
          label="Mail address"
          value={email}
          onChangeText={setEmail}
          onEnter={send}
          error={isMissing ? 'Type your mail address.' : failure?.fields.email}
          hint="A link to a new password is sent there."
          inputMode="email"
          autoComplete="username"
          maxLength={254}
          required
        />
        <View style={styles.actions}>
          <Button kind="main" label="Send the link" onPress={send} busy={ask.isPending} />
          <Button label="Back to sign-in" href="/sign-in" />
        </View>
        <Text tone="soft">The password that you have stays as it is until you take a new one.</Text>
      </View>
    </Form>
  )
}

const styles = StyleSheet.create({
  form: { gap: space.l, width: '100%', maxWidth: 420 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
})
