import { useState } from 'react'
import { StyleSheet, View } from 'react-native'
import { space } from '@/components/theme'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Form } from '@/components/ui/form'
import { Screen } from '@/components/ui/screen'
import { Failed } from '@/components/ui/states'
import { Text } from '@/components/ui/text'
import { failureOf } from '@/lib/failure'
import { useResetPassword } from '@/lib/session'
import { WorkShell } from '../shell/work-shell'
import { PasswordField } from './password-field'

/** Takes a new password in exchange for the link that was mailed. */
export function ResetScreen({ token }: { token: string }) {
  const reset = useResetPassword()
  const failure = reset.error ? failureOf(reset.error) : null
  return (
    <WorkShell account={null}>
      <Screen title="New password" isNarrow>
        {reset.isSuccess ? (
          <View style={styles.form}>
            <Banner
              tone="info"
              words="The password is changed. Whoever was signed in with the old one no longer is."
              isUrgent
            />
            <View style={styles.actions}>
              <Button kind="main" label="Sign in" href="/sign-in" />
            </View>
          </View>
        ) : failure?.code === 'NOT_FOUND' || failure?.fields.token !== undefined ? (
          <Failed
            what="This link cannot be used."
            advice={failure.code === 'NOT_FOUND' ? failure.sentence : 'It is not whole: open it from the mail again.'}
            actions={<Button label="Ask for a new link" href="/forgotten" />}
          />
        ) : (
          <ResetForm token={token} reset={reset} />
        )}
      </Screen>
    </WorkShell>
  )
}

interface ResetFormProps {
  readonly token: string
  readonly reset: ReturnType<typeof useResetPassword>
}

function ResetForm({ token, reset }: ResetFormProps) {
  const [password, setPassword] = useState('')
  const [isMissing, setMissing] = useState(false)
  const failure = reset.error ? failureOf(reset.error) : null
  const send = () => {
    setMissing(password === '')
    if (password !== '' && !reset.isPending) reset.mutate({ token, password })
  }
  return (
    <Form label="Take a new password" onSubmit={send}>
      <View style={styles.form}>
        <Text>The link works once, for an hour after it was asked for.</Text>
        {failure && failure.fields.password === undefined ? (
          <Banner tone="over" words={failure.sentence} isUrgent />
        ) : null}
        <PasswordField
          value={password}
          onChangeText={setPassword}
          onEnter={send}
          error={isMissing ? 'Type a new password.' : failure?.fields.password}
          isNew
        />
        <View style={styles.actions}>
          <Button kind="main" label="Change the password" onPress={send} busy={reset.isPending} />
        </View>
      </View>
    </Form>
  )
}

const styles = StyleSheet.create({
  form: { gap: space.l, width: '100%', maxWidth: 420 },
  actions: { flexDirection: 'row' },
})
