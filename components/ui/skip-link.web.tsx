import { colour, font, space } from '@/components/theme'

/** The first stop of the keyboard: past the header to the screen itself. Shown only while it has the focus. */
export function SkipLink() {
  return (
    <div data-layer="skip">
      <a
        href="#main"
        style={style}
        onClick={(event) => {
          // The address must not change: routes would take it for a page.
          event.preventDefault()
          document.getElementById('main')?.focus()
        }}
      >
        Skip to the page
      </a>
    </div>
  )
}

const style = {
  display: 'block',
  padding: space.m,
  fontFamily: font.text,
  fontWeight: 600,
  color: colour.ink,
  background: colour.input,
  border: `1px solid ${colour.ink}`,
} as const
