import type { ReactNode } from 'react'
import { colour, font } from '@/components/theme'

/** Names the field with id `htmlFor`; pressing it goes to the field. */
export function FieldLabel({ id, htmlFor, children }: { id: string; htmlFor: string; children: ReactNode }) {
  return (
    <label id={id} htmlFor={htmlFor} style={style}>
      {children}
    </label>
  )
}

const style = { fontFamily: font.text, fontSize: 13, lineHeight: '18px', fontWeight: 500, color: colour.ink } as const
