import { useState } from 'react'
import { View } from 'react-native'
import { Checkbox } from '@/components/ui/checkbox'
import { TextField } from '@/components/ui/text-field'

export interface PasswordFieldProps {
  readonly value: string
  readonly onChangeText: (text: string) => void
  readonly onEnter: () => void
  readonly error: string | undefined
  /** Whether the person makes it up now or gives the one that they have. */
  readonly isNew: boolean
}

/** A password: pasted or typed, and shown to whoever wants to see it. */
export function PasswordField({ isNew, ...rest }: PasswordFieldProps) {
  const [isShown, setShown] = useState(false)
  return (
    <View>
      <TextField
        {...rest}
        label="Password"
        hint={isNew ? '8 characters or more; a few odd words do well.' : undefined}
        secret={!isShown}
        autoComplete={isNew ? 'new-password' : 'current-password'}
        maxLength={256}
        required
      />
      <Checkbox label="Show the password" checked={isShown} onChange={setShown} />
    </View>
  )
}
