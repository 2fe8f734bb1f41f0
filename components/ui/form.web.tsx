import type { FormProps } from './form'

export type { FormProps } from './form'

/** A real form: password managers look for one, and offer to keep what was sent with it. */
export function Form({ label, onSubmit, children }: FormProps) {
  return (
    <form
      aria-label={label}
      noValidate
      style={{ minWidth: 0 }}
      onSubmit={(event) => {
        event.preventDefault()
        onSubmit()
      }}
    >
      {children}
    </form>
  )
}
