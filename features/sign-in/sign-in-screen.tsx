import type { Href } from 'expo-router'
import { Redirect, useLocalSearchParams } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Form } from '@/components/ui/form'
import { Screen } from '@/components/ui/screen'
import { Text } from '@/components/ui/text'
import { TextField } from '@/components/ui/text-field'
import { failureOf, type CallFailure } from '@/lib/failure'
import { useSession, useSignIn } from '@/lib/session'
import { pathAfterSignIn } from '../shell/way-back'
import { WorkShell } from '../shell/work-shell'
import { PasswordField } from './password-field'

const NO_ERRORS: Readonly<Record<string, string>> = {}

/** Two plain fields that the server reads; afterwards back to the page that was asked for. */
export function SignInScreen() {
  const { to } = useLocalSearchParams<{ to?: string }>()
  const session = useSession()
  const signIn = useSignIn()
  const [email, setEmail] = useState('')
  const [password, setPassword] = useState('')
  const [missing, setMissing] = useState(NO_ERRORS)
  const failure = signIn.error ? failureOf(signIn.error) : null
  const errors = { ...(failure?.fields ?? NO_ERRORS), ...missing }
  const send = () => {
    const empty = emptyFields({ email, password })
    setMissing(empty)
    if (Object.keys(empty).length > 0 || signIn.isPending) return
    signIn.mutate({ email, password })
  }
  if (session.state === 'in') return <Redirect href={pathAfterSignIn(to) as Href} />
  return (
    <WorkShell account={null}>
      <Screen title="Sign in" isNarrow>
        <Form label="Sign in" onSubmit={send}>
          <View style={styles.form}>
            {failure && Object.keys(failure.fields).length === 0 ? (
              <Banner tone="over" words={whyNot(failure)} isUrgent />
            ) : null}
            <TextField
              label="Mail address"
              value={email}
              onChangeText={setEmail}
              onEnter={send}
              error={errors.email}
              inputMode="email"
              autoComplete="username"
              maxLength={254}
              required
            />
            <PasswordField
              value={password}
              onChangeText={setPassword}
              onEnter={send}
              error={errors.password}
              isNew={false}
            />
            <View style={styles.actions}>
              <Button kind="main" label="Sign in" onPress={send} busy={signIn.isPending} />
              <Button label="Forgotten password" href="/forgotten" />
            </View>
            <Text tone="soft">No account yet? An admin of your company sends an invitation, whose link makes one.</Text>
          </View>
        </Form>
      </Screen>
    </WorkShell>
  )
}

function emptyFields({ email, password }: { email: string; password: string }): Readonly<Record<string, string>> {
  return {
    ...(email.trim() === '' ? { email: 'Type your mail address.' } : {}),
    ...(password === '' ? { password: 'Type your password.' } : {}),
  }
}

function whyNot({ sentence, retryAfterS }: CallFailure): string {
  if (retryAfterS === null) return sentence
  const minutes = Math.max(1, Math.ceil(retryAfterS / 60))
  return `${sentence} It can be tried again in ${minutes} ${minutes === 1 ? 'minute' : 'minutes'}.`
}

const styles = StyleSheet.create({
  form: { gap: space.l, width: '100%', maxWidth: 420 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
})
