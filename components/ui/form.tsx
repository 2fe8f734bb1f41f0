import type { ReactNode } from 'react'
import { View } from 'react-native'

export interface FormProps {
  /** Names the form; read out. */
  label: string
  onSubmit: () => void
  children: ReactNode
}

/** Fields that are sent together. */
export function Form({ label, children }: FormProps) {
  return (
    <View role="form" aria-label={label} style={{ minWidth: 0 }}>
      {children}
    </View>
  )
}
