import type { ReactNode } from 'react'
import { Text } from './text'

/** Names the field with id `htmlFor`. */
export function FieldLabel({ id, children }: { id: string; htmlFor: string; children: ReactNode }) {
  return (
    <Text kind="label" id={id}>
      {children}
    </Text>
  )
}
